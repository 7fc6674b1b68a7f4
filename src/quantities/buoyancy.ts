import { quantity, way, type Definition } from '../workings/index.ts';
import { jacksonFactor, mixedSum, uprightLaminar } from './correlations/index.ts';
import { factor } from './factor.ts';

const definition = 'definition';
const mixed = { imposedFlow: 'yes', energySolved: 'yes' } as const;
const inside = { ...mixed, flowClass: 'internal' } as const;
const along = { axis: ['upright', 'inclined'] } as const;
const jackson = 'Jackson, Cotton and Axcell, Int. J. Heat Fluid Flow 10 (1989) 2';
const churchill = 'Churchill, AIChE J. 23 (1977) 10';

/** Part of gravity along the main direction, positive where heating helps. */
const sine = (inclination: number): number => Math.sin(inclination);
/** Part across it. */
const cosine = (inclination: number): number => Math.abs(Math.cos(inclination));

/** Buoyancy in an imposed flow: the groups that decide, and what it makes of heat transfer and shear. */
export const buoyancy: Definition[] = [...inPassages(), ...elsewhere(), ...natural(), ...factors()];

function inPassages(): Definition[] {
  return [
    quantity('grashofFlux', { symbol: 'Gr_q', name: 'Grashof number on the wall heat flux and D_h, positive where the wall drives the fluid up', unit: '1', signed: true }, [
      way({ needs: ['gravity', 'thermalExpansionBulk', 'wallHeatFlux', 'length', 'thermalConductivityBulk', 'kinematicViscosityBulk'], when: { flowClass: 'internal', wallKind: 'flux' }, value: (of) => (of.gravity * of.thermalExpansionBulk * of.wallHeatFlux * of.length ** 4) / (of.thermalConductivityBulk * of.kinematicViscosityBulk ** 2), formula: 'Gr_q = g beta_b q D_h^4/(k_b nu_b^2)', source: definition }),
      way({ needs: ['gravity', 'thermalExpansionBulk', 'wallTemperature', 'bulkTemperature', 'nusseltPlain', 'length', 'kinematicViscosityBulk'], when: { flowClass: 'internal' }, value: (of) => (of.gravity * of.thermalExpansionBulk * (of.wallTemperature - of.bulkTemperature) * of.nusseltPlain * of.length ** 3) / of.kinematicViscosityBulk ** 2, formula: 'Gr_q = Nu_0 g beta_b (T_w - T_b) D_h^3/nu_b^2', source: 'q = h (T_w - T_b)' }),
    ]),
    quantity('grashofFluxOverReynolds', { symbol: 'Gr_q/Re', name: 'buoyancy over viscous forces along a passage, positive where it helps the flow', unit: '1', signed: true }, [
      way({ needs: ['grashofFlux', 'inclination', 'reynoldsBulk'], when: inside, value: ({ grashofFlux, inclination, reynoldsBulk }) => (grashofFlux * sine(inclination)) / reynoldsBulk, formula: 'Gr_q sin(theta)/Re_b', source: definition }),
    ]),
    quantity('rayleighAcross', { symbol: 'Ra_D', name: 'Rayleigh number on D_h, wall against bulk, gravity across the passage', unit: '1' }, [
      way({ needs: ['grashofBulk', 'prandtlBulk', 'inclination'], when: { flowClass: 'internal' }, value: ({ grashofBulk, prandtlBulk, inclination }) => grashofBulk * prandtlBulk * cosine(inclination), formula: 'Ra_D = Gr_b Pr_b cos(theta)', source: definition }),
    ]),
    quantity('buoyancyHorizontalLaminar', { symbol: 's_h', name: 'secondary rolls of a level laminar passage', unit: '1' }, [
      way({ needs: ['rayleighAcross', 'graetz'], when: inside, scatter: 2, value: ({ rayleighAcross, graetz }) => (0.0083 * rayleighAcross ** 0.75) / Math.max((Math.PI * graetz) / 4, 9.15), formula: 's_h = 0.0083 Ra_D^(3/4)/max(pi Gz/4, 9.15)', source: 'Oliver, Chem. Eng. Sci. 17 (1962) 335; from memory, uncertain to a factor of 3' }),
    ]),
    quantity('jacksonBuoyancy', { symbol: 'Bo*', name: 'buoyancy over turbulent shear along a passage, positive where it helps the flow', unit: '1', signed: true }, [
      way({ needs: ['grashofFlux', 'inclination', 'reynoldsBulk', 'prandtlBulk'], when: inside, value: ({ grashofFlux, inclination, reynoldsBulk, prandtlBulk }) => (grashofFlux * sine(inclination)) / (reynoldsBulk ** 3.425 * prandtlBulk ** 0.8), formula: 'Bo* = Gr_q sin(theta)/(Re_b^3.425 Pr_b^0.8)', source: jackson }),
    ]),
    quantity('grashofFluxLimit', { symbol: 'Gr_lim', name: 'flux Grashof number that moves the local heat transfer of a level turbulent passage by 1 %', unit: '1' }, [
      way({ needs: ['reynoldsBulk', 'prandtlBulk'], when: { flowClass: 'internal' }, scatter: 0.5, value: ({ reynoldsBulk: re, prandtlBulk: pr }) => 3e-5 * re ** 2.75 * Math.sqrt(pr) * (1 + 2.4 * re ** -0.125 * (pr ** (2 / 3) - 1)), formula: 'Gr_lim = 3e-5 Re^2.75 Pr^(1/2) [1 + 2.4 Re^(-1/8) (Pr^(2/3) - 1)]', source: 'Petukhov and Polyakov, Heat Transfer in Turbulent Mixed Convection (1988); from memory' }),
    ]),
    quantity('grashofFluxOverLimit', { symbol: 'Gr_q/Gr_lim', name: 'flux Grashof number across the passage over its limit', unit: '1' }, [
      way({ needs: ['grashofFlux', 'inclination', 'grashofFluxLimit'], when: inside, value: ({ grashofFlux, inclination, grashofFluxLimit }) => (Math.abs(grashofFlux) * cosine(inclination)) / grashofFluxLimit, formula: '|Gr_q| cos(theta)/Gr_lim', source: definition }),
    ]),
  ];
}

function elsewhere(): Definition[] {
  return [
    quantity('buoyancyOverDrag', { symbol: 'N_K', name: 'buoyancy over the drag of the matrix', unit: '1' }, [
      way({ needs: ['gravity', 'thermalExpansion', 'temperatureDifference', 'density', 'flowLength', 'pressureDropPlain'], when: { flowClass: 'continuum' }, value: (of) => (of.density * of.gravity * Math.abs(of.thermalExpansion) * of.temperatureDifference * of.flowLength) / of.pressureDropPlain, formula: 'rho g |beta| dT L/dp', source: definition }),
      way({ needs: ['gravity', 'thermalExpansion', 'temperatureDifference', 'porous.permeability', 'kinematicViscosity', 'speed'], when: { flowClass: 'continuum' }, value: (of) => (of.gravity * Math.abs(of.thermalExpansion) * of.temperatureDifference * of['porous.permeability']) / (of.kinematicViscosity * of.speed), formula: 'g |beta| dT K/(nu U)', source: definition }),
    ]),
    quantity('buoyancyLevelPlate', { symbol: 'Gr/(Re^(5/2) Pr^(1/2))', name: 'pressure by weight across the thermal layer of a level plate over the inertia of the stream', unit: '1' }, [
      way({ needs: ['richardson', 'reynolds', 'prandtl'], when: { ...mixed, flow: 'plate', axis: 'level' }, value: ({ richardson, reynolds, prandtl }) => richardson / Math.sqrt(reynolds * prandtl), formula: 'Ri (Re Pr)^(-1/2)', source: 'Chen, Sparrow and Mucoglu, J. Heat Transfer 99 (1977) 66: Gr/Re^(5/2); the root of Pr, for the thickness of the thermal layer, by the first-order solution of the laminar layer, Pr 0.004 to 10' }),
    ]),
    quantity('jetBuoyancyRatio', { symbol: 'x/l_M', name: 'distance of the target over the length on which momentum leads in a jet', unit: '1' }),
    quantity('jetDropShare', { symbol: 'y/x', name: 'rise or drop of a level jet over its throw', unit: '1' }),
    quantity('jetDrop', { symbol: 'y', name: 'rise or drop of a level jet at the target', unit: 'm' }),
    quantity('conductionRayleigh', { symbol: 'Ra_cond', name: 'Rayleigh number on the height below which a side-heated gap only conducts', unit: '1' }, [
      way({ needs: ['passageHeight', 'gap'], when: { flowClass: 'enclosure' }, scatter: 0.5, value: ({ passageHeight, gap }) => 500 * (passageHeight / gap) ** 4, formula: 'Ra_H = 500 (H/W)^4, from Ra_W = 500 H/W', source: 'Batchelor, Q. Appl. Math. 12 (1954) 209' }),
    ]),
    quantity('gradientRichardson', { symbol: 'Ri_f', name: 'stratification over shear in the sheared layer, with a turbulent Prandtl number of 0.85', unit: '1' },
      ([['internal', 'gap', 0.5, 'H/2'], ['body', 'boundaryLayerThickness', 1, 'delta'], ['enclosure', 'boundaryLayerThickness', 1, 'delta'], ['jet', 'length', 0.5, 'L/2']] as const).map(([flowClass, layer, share, symbol]) =>
        way({ needs: ['gravity', 'thermalExpansion', 'temperatureDifference', 'speed', layer], when: { flowClass }, scatter: 1, value: (of) => ((of.gravity * Math.abs(of.thermalExpansion) * of.temperatureDifference * share * ((of as Readonly<Record<string, number>>)[layer] as number)) / of.speed ** 2) / 0.85, formula: `g |beta| dT delta/(U^2 Pr_t), delta = ${symbol}`, source: 'estimate before a run, common practice' }))),
    quantity('stratificationFactorViscosity', { symbol: 'F_nu', name: 'eddy viscosity in a stable layer over that without stratification', unit: '1' }, [
      way({ needs: ['gradientRichardson'], value: ({ gradientRichardson }) => 1 / Math.sqrt(1 + 10 * 0.85 * gradientRichardson), formula: 'F = (1 + 10 Ri_g)^(-1/2), Ri_g = 0.85 Ri_f', source: 'Munk and Anderson, J. Mar. Res. 7 (1948) 276' }),
    ]),
  ];
}

/** Natural convection of the same body, for the sum with the forced part. */
function natural(): Definition[] {
  const body = { ...mixed, flowClass: 'body' } as const;
  const pr = (p: number): number => (1 + (0.492 / p) ** (9 / 16)) ** (4 / 9);
  return [
    quantity('rayleighFilm', { symbol: 'Ra_f', name: 'Rayleigh number of a body at the film temperature, wall against far', unit: '1' }, [
      way({ needs: ['gravity', 'thermalExpansionFilm', 'wallTemperature', 'farTemperature', 'length', 'kinematicViscosityFilm', 'thermalDiffusivityFilm'], when: { flowClass: 'body' }, value: (of) => (of.gravity * Math.abs(of.thermalExpansionFilm) * Math.abs(of.wallTemperature - of.farTemperature) * of.length ** 3) / (of.kinematicViscosityFilm * of.thermalDiffusivityFilm), formula: 'Ra_f = g |beta_f| |T_w - T_far| L^3/(nu_f alpha_f)', source: definition }),
    ]),
    quantity('nusseltNatural', { symbol: 'Nu_N', name: 'Nusselt number of the body without its stream', unit: '1' }, [
      way({ needs: ['rayleighFilm', 'prandtlFilm'], when: { ...body, flow: 'plate', axis: along.axis }, scatter: 0.1, range: { rayleighFilm: [1, 1e9] }, value: ({ rayleighFilm, prandtlFilm }) => (0.67 * rayleighFilm ** 0.25) / pr(prandtlFilm), formula: 'Nu_N = 0.670 Ra^(1/4)/[1 + (0.492/Pr)^(9/16)]^(4/9)', source: 'Churchill and Chu, Int. J. Heat Mass Transfer 18 (1975) 1323, laminar part' }),
      way({ needs: ['rayleighFilm', 'prandtlFilm'], when: { ...body, flow: 'plate', axis: 'level' }, scatter: 0.3, range: { rayleighFilm: [1e4, 1e7] }, value: ({ rayleighFilm, prandtlFilm }) => (0.54 * rayleighFilm ** 0.25 * pr(0.71)) / pr(prandtlFilm), formula: 'Nu_N = 0.54 Ra^(1/4) C(Pr)/C(0.71), C = [1 + (0.492/Pr)^(9/16)]^(-4/9)', source: 'McAdams, Heat Transmission, 3rd ed. (1954), unstable side, air; Prandtl number as Raithby and Hollands, in Handbook of Heat Transfer (1998), ch. 4' }),
      way({ needs: ['rayleighFilm', 'prandtlFilm'], when: { ...body, flow: 'cylinder' }, scatter: 0.15, range: { rayleighFilm: [1e-6, 1e12] }, value: ({ rayleighFilm, prandtlFilm }) => (0.6 + (0.387 * rayleighFilm ** (1 / 6)) / (1 + (0.559 / prandtlFilm) ** (9 / 16)) ** (8 / 27)) ** 2, formula: 'Nu_N = {0.60 + 0.387 Ra^(1/6)/[1 + (0.559/Pr)^(9/16)]^(8/27)}^2', source: 'Churchill and Chu, Int. J. Heat Mass Transfer 18 (1975) 1049' }),
      way({ needs: ['rayleighFilm', 'prandtlFilm'], when: { ...body, flow: 'sphere' }, scatter: 0.15, range: { rayleighFilm: [1, 1e11] }, value: ({ rayleighFilm, prandtlFilm }) => 2 + (0.589 * rayleighFilm ** 0.25) / (1 + (0.469 / prandtlFilm) ** (9 / 16)) ** (4 / 9), formula: 'Nu_N = 2 + 0.589 Ra^(1/4)/[1 + (0.469/Pr)^(9/16)]^(4/9)', source: 'Churchill, in Heat Exchanger Design Handbook (1983)' }),
    ]),
    quantity('naturalOverForced', { symbol: 'Nu_N/Nu_F', name: 'natural over forced Nusselt number of a body', unit: '1' }, [
      way({ needs: ['nusseltNatural', 'nusseltPlain'], when: body, value: ({ nusseltNatural, nusseltPlain }) => nusseltNatural / nusseltPlain, formula: 'Nu_N/Nu_0', source: definition }),
    ]),
    quantity('buoyancySense', { symbol: 's_b', name: 'sense of buoyancy: 1 helps or acts across, -1 opposes the stream', unit: '1', signed: true }, [
      way({ needs: ['thermalExpansionFilm', 'wallTemperature', 'farTemperature', 'inclination'], when: { ...body, axis: along.axis }, value: (of) => (of.thermalExpansionFilm * (of.wallTemperature - of.farTemperature) * Math.sin(of.inclination) < 0 ? -1 : 1), formula: 'sign of beta (T_w - T_far) sin(theta)', source: definition }),
      way({ needs: [], when: { ...body, axis: 'level' }, value: () => 1, formula: 's_b = 1', source: 'buoyancy across the stream adds as aiding: Churchill, AIChE J. 23 (1977) 10' }),
    ]),
  ];
}

function factors(): Definition[] {
  const laminar = { ...inside, regime: 'laminar' } as const;
  const turbulent = { ...inside, regime: ['transitional', 'turbulent'] } as const;
  const table = 'developed laminar mixed convection in an upright tube, uniform flux: Hallman, Trans. ASME 78 (1956) 1831';
  const range = { grashofFluxOverReynolds: [-400, 1000] } as const;
  const round = { ductSection: 'round' } as const;
  const others = { ductSection: ['rectangular', 'flat', 'other'] } as const;
  const body = { ...mixed, flowClass: 'body' } as const;
  const upright = (which: 'nusselt' | 'shear', symbol: string): ReturnType<typeof way>[] => [round, others].map((section) =>
    way({
      needs: ['grashofFluxOverReynolds'], when: { ...laminar, axis: along.axis, ...section }, range, source: table,
      scatter: section === round ? 0.01 : ({ grashofFluxOverReynolds }) => 0.02 + Math.abs(uprightLaminar({ ratio: grashofFluxOverReynolds })[which] - 1),
      value: ({ grashofFluxOverReynolds }) => uprightLaminar({ ratio: grashofFluxOverReynolds })[which], formula: `${symbol} from a table over Gr_q/Re`,
      ...(section === round ? {} : { note: 'table of a round tube on D_h' }),
    }));
  const churchillSum = (flow: string, axis: string | readonly string[], exponent: number): ReturnType<typeof way> =>
    way({ needs: ['naturalOverForced', 'buoyancySense'], when: { ...body, flow, axis }, scatter: ({ naturalOverForced, buoyancySense }) => Math.min(0.1, Math.abs(mixedSum({ ratio: naturalOverForced, exponent, sense: buoyancySense }) - 1)), range: { naturalOverForced: [0, 3] }, value: ({ naturalOverForced, buoyancySense }) => mixedSum({ ratio: naturalOverForced, exponent, sense: buoyancySense }), formula: `F = |1 +- (Nu_N/Nu_F)^${exponent}|^(1/${exponent})`, source: churchill });
  const any = ['upright', 'inclined', 'level'];
  return [
    ...factor('buoyancyFactorNusselt', { symbol: 'F_b,Nu', name: 'Nusselt number with buoyancy over that without' }, [
      ...upright('nusselt', 'F'),
      way({ needs: ['buoyancyHorizontalLaminar'], when: { ...laminar, axis: 'level' }, range: { buoyancyHorizontalLaminar: [0, 30] }, scatter: ({ buoyancyHorizontalLaminar }) => 0.4 * (1 - (1 + buoyancyHorizontalLaminar) ** (-1 / 3)), value: ({ buoyancyHorizontalLaminar }) => Math.cbrt(1 + buoyancyHorizontalLaminar), formula: 'F = (1 + s_h)^(1/3)', source: 'Oliver, Chem. Eng. Sci. 17 (1962) 335; from memory' }),
      way({ needs: ['jacksonBuoyancy'], when: { ...turbulent, axis: along.axis }, range: { jacksonBuoyancy: [-1e-4, 1e-4] }, scatter: ({ jacksonBuoyancy }) => {
        const { low, high } = jacksonFactor({ buoyancy: jacksonBuoyancy });
        return high > low ? Math.sqrt(high / low) - 1 : jacksonBuoyancy > 2e-6 ? 0.25 : 0.1;
      }, value: ({ jacksonBuoyancy }) => jacksonFactor({ buoyancy: jacksonBuoyancy }).value, formula: 'F = |1 -+ 8e4 Bo* F^-2|^0.46', source: jackson, note: 'helping flow from 2e-6 to 1e-5 has no one number: the spread holds both states' }),
      way({ needs: [], when: { ...turbulent, axis: 'level' }, value: () => 1, formula: 'F = 1', source: 'level turbulent passage: the mean round the circumference moves less than its parts', note: 'no closed form: not counted' }),
      churchillSum('plate', along.axis, 3),
      churchillSum('plate', 'level', 3.5),
      churchillSum('cylinder', any, 4),
      churchillSum('sphere', any, 4),
    ]),
    ...factor('buoyancyFactorShear', { symbol: 'F_b,tau', name: 'wall shear with buoyancy over that without' }, upright('shear', 'F')),
  ];
}
