import { quantity, way, ways, type Definition } from '../workings/index.ts';

const body = { flowClass: 'body', imposedFlow: 'yes' } as const;

/** Onset of turbulence: what it makes of friction and heat transfer, and how much of a surface stays laminar. */
export const onset: Definition[] = [
  quantity('turbulenceFactorFriction', { symbol: 'F_t,f', name: 'turbulent over laminar friction at the same group', unit: '1' }, [
    way({ needs: ['frictionTurbulent', 'frictionLaminar'], value: ({ frictionTurbulent, frictionLaminar }) => frictionTurbulent / frictionLaminar, formula: 'F = f_turb/f_lam', source: 'definition' }),
  ]),
  quantity('turbulenceFactorNusselt', { symbol: 'F_t,Nu', name: 'turbulent over laminar heat transfer at the same group', unit: '1' }, [
    way({ needs: ['nusseltTurbulent', 'nusseltLaminar'], value: ({ nusseltTurbulent, nusseltLaminar }) => nusseltTurbulent / nusseltLaminar, formula: 'F = Nu_turb/Nu_lam', source: 'definition' }),
  ]),
  quantity('transitionReynolds', { symbol: 'Re_tr', name: 'Reynolds number on the run at which a layer turns turbulent', unit: '1' }, [
    way({ needs: ['inlet.turbulence.intensity'], when: body, scatter: 0.3, range: { 'inlet.turbulence.intensity': [0, 0.06] }, value: (of) => Math.max(1e5, ((163 + Math.exp(6.91 - 100 * of['inlet.turbulence.intensity'])) / 0.664) ** 2), formula: 'Re_tr = ((163 + exp(6.91 - Tu))/0.664)^2, Tu in %, not below 1e5', source: 'Abu-Ghannam and Shaw, J. Mech. Eng. Sci. 22 (1980) 213' }),
    way({ needs: [], when: body, as: 'assumed', scatter: 1, value: () => 5e5, formula: 'Re_tr = 5e5', source: 'Incropera and DeWitt, Fundamentals of Heat and Mass Transfer; 1e5 to 3e6 by the stream' }),
  ]),
  ways('laminarShare', [
    way({ needs: ['transitionReynolds', 'reynolds'], when: body, value: ({ transitionReynolds, reynolds }) => Math.min(1, transitionReynolds / reynolds), formula: 's = Re_tr/Re, at most 1', source: 'surface judged as a flat plate' }),
    way({ needs: ['rayleigh'], when: { flowClass: 'body', imposedFlow: 'no' }, value: ({ rayleigh }) => Math.min(1, Math.cbrt(1e9 / rayleigh)), formula: 's = (1e9/Ra)^(1/3), at most 1', source: 'surface judged as an upright plate: Ra grows with the cube of the height' }),
  ]),
  quantity('transitionFactorFriction', { symbol: 'F_tr', name: 'drag of a plate with a laminar run over that of a plate turbulent from its edge', unit: '1' }, [
    way({ needs: ['reynolds'], when: body, range: { reynolds: [5e5, 1e9] }, value: ({ reynolds }) => 1 - (1614 * Math.log10(reynolds) ** 2.58) / (0.455 * reynolds), formula: 'F = 1 - (1614/Re)/(0.455/log10(Re)^2.58)', source: 'Schlichting and Gersten, Boundary-Layer Theory; the constant 1614 for Re_tr = 5e5 from the laminar law' }),
  ]),
];
