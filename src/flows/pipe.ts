import { laminarEntranceLength, laminarNusselt, pipeEntryLoss } from '../quantities/index.ts';
import { way, ways, type Definition } from '../workings/index.ts';
import { inlet, outlet, wall } from './boundaries.ts';
import type { Flow } from './define.ts';
import { passageDefinitions, turbulentLength } from './passage.ts';
import { pipeLadder } from './pipe-ladder.ts';
import { straightDefinitions } from './straight.ts';

const geometry = 'geometry';

const scales: Definition[] = [
  ways('length', [way({ needs: ['sizes.diameter'], value: (of) => of['sizes.diameter'], formula: 'L = D', source: 'definition' })]),
  ways('hydraulicDiameter', [way({ needs: ['sizes.diameter'], value: (of) => of['sizes.diameter'], formula: 'D_h = D', source: geometry })]),
  ways('gap', [way({ needs: ['sizes.diameter'], value: (of) => of['sizes.diameter'], formula: 'H = D', source: geometry })]),
  ways('flowArea', [way({ needs: ['sizes.diameter'], value: (of) => (Math.PI * of['sizes.diameter'] ** 2) / 4, formula: 'A = pi D^2/4', source: geometry })]),
  ways('wettedPerimeter', [way({ needs: ['sizes.diameter'], value: (of) => Math.PI * of['sizes.diameter'], formula: 'P = pi D', source: geometry })]),
  ways('wallArea', [way({ needs: ['sizes.diameter', 'sizes.length'], value: (of) => Math.PI * of['sizes.diameter'] * of['sizes.length'], formula: 'A_w = pi D L', source: geometry })]),
  ways('passageHeight', [
    way({ needs: ['sizes.length'], when: { axis: 'upright' }, value: (of) => of['sizes.length'], formula: 'H_g = L', source: geometry }),
    way({ needs: ['sizes.diameter'], when: { axis: 'level' }, value: (of) => of['sizes.diameter'], formula: 'H_g = D', source: geometry }),
    way({ needs: ['sizes.diameter', 'sizes.length', 'inclination'], value: (of) => of['sizes.length'] * Math.abs(Math.sin(of.inclination)) + of['sizes.diameter'] * Math.abs(Math.cos(of.inclination)), formula: 'H_g = L sin(theta) + D cos(theta)', source: geometry }),
  ]),
  ways('regionSpan', [way({ needs: ['sizes.diameter'], value: (of) => (Math.PI * of['sizes.diameter']) / 4, formula: 'pi D/4, so that across times span is the section', source: geometry })]),
];

const regime: Definition[] = [
  ways('regimeGroup', [way({ needs: ['reynolds'], value: ({ reynolds }) => reynolds, symbol: 'Re', formula: 'Re on D', source: 'definition' })]),
  ways('regimeLow', [
    way({ needs: ['rheology.index'], when: { rheologyLaw: 'power-law' }, scatter: 0.1, value: (of) => 2100 + 875 * (1 - of['rheology.index']), formula: 'Re_lo = 2100 + 875 (1 - n)', source: 'Darby, Chemical Engineering Fluid Mechanics, 2nd ed. (2001); 2100 of Metzner and Reed (1955) at n = 1' }),
    way({ needs: [], value: () => 2300, formula: 'Re_lo = 2300', source: 'Schiller 1922; turbulence can be kept up from 2040 on, Avila et al., Science 333 (2011) 192' }),
  ]),
  ways('regimeHigh', [
    way({ needs: ['rheology.index'], when: { rheologyLaw: 'power-law' }, scatter: 0.1, value: (of) => 4150 + 1150 * (1 - of['rheology.index']), formula: 'Re_hi = 4150 + 1150 (1 - n)', source: 'Darby, Chemical Engineering Fluid Mechanics, 2nd ed. (2001)' }),
    way({ needs: [], value: () => 4000, formula: 'Re_hi = 4000', source: 'Moody, Trans. ASME 66 (1944) 671' }),
  ]),
];

const laws: Definition[] = passageDefinitions({
  needs: [],
  frictionReynolds: { value: () => 64, formula: 'f = 64/Re', source: 'axial momentum balance (Hagen 1839, Poiseuille 1840)' },
  turbulentScatter: { friction: 0.1, heat: 0.1 },
  nusselt: {
    temperature: () => laminarNusselt.pipe.temperature,
    flux: () => laminarNusselt.pipe.flux,
    formula: { temperature: 'Nu = 3.657, wall temperature uniform', flux: 'Nu = 48/11, wall flux uniform' },
    source: 'Graetz 1883; Shah and London, Laminar Flow Forced Convection in Ducts (1978)',
  },
  thermalEntrance: { temperature: () => 0.0335, flux: () => 0.0431, source: 'Shah and London, Laminar Flow Forced Convection in Ducts (1978), chapter V', scatter: 0.05 },
});

const lengths: Definition[] = [
  ways('entranceLength', [
    way({ needs: ['reynoldsBulk', 'sizes.diameter'], when: { regime: ['laminar', 'transitional'] }, scatter: 0.1, value: (of) => laminarEntranceLength({ reynolds: of.reynoldsBulk, passage: 'pipe' }) * of['sizes.diameter'], formula: 'L_e = (0.619^1.6 + (0.0567 Re)^1.6)^(1/1.6) D', source: 'Durst, Ray, Unsal and Bayoumi, J. Fluids Eng. 127 (2005) 1154' }),
    turbulentLength,
  ]),
  ways('entryLoss', [
    way({ needs: ['reynoldsBulk'], when: { regime: ['laminar', 'transitional'] }, scatter: 0.1, value: ({ reynoldsBulk }) => pipeEntryLoss({ reynolds: reynoldsBulk }), formula: 'K_inf = 1.20 + 38/Re', source: 'Chen, J. Fluids Eng. 95 (1973) 153' }),
    way({ needs: [], when: { regime: 'turbulent' }, scatter: 1, value: () => 0.1, formula: 'K_inf = 0.1', source: 'common practice' }),
  ]),
  ways('peakOverMean', [
    way({ needs: [], when: { regime: ['laminar', 'transitional'] }, value: () => 2, formula: 'u_max/U = 2', source: 'axial momentum balance' }),
    way({ needs: ['frictionPlain'], when: { regime: 'turbulent' }, scatter: 0.03, value: ({ frictionPlain }) => 1 + 1.29 * Math.sqrt(frictionPlain), formula: 'u_max/U = 1 + 1.29 sqrt(f)', source: 'logarithmic law over the section' }),
  ]),
];

export const pipe: Flow = {
  id: 'pipe',
  title: 'Round pipe',
  lengthIs: 'diameter',
  speedIs: 'mean speed over the section',
  sizes: [
    { key: 'diameter', name: 'inner diameter', unit: 'm' },
    { key: 'length', name: 'length that counts', unit: 'm' },
  ],
  walls: [],
  answers: ['pressureDrop', 'outletTemperature', 'heatRate', 'heatTransferCoefficient', 'nusselt', 'wallTemperature', 'frictionFactorDarcy', 'wallShear', 'entranceLength'],
  stations: ['worst', 'target'],
  regions: ['entry', 'run'],
  words: { flow: 'pipe', flowClass: 'internal', imposedFlow: 'yes', wallBounded: 'yes', attached: 'yes', separated: 'no', ductSection: 'round', infiniteDepth: 'no' },
  definitions: [...scales, ...regime, ...laws, ...lengths, ...straightDefinitions],
  leastRegion: 'Without gravity, swirl or one-sided heating: a slice with the axis as one edge, or a wedge one cell thick. With buoyancy in a level pipe: one half, cut upright. Resolved turbulence: the whole section with repeating ends, 5 diameters long for means, 25 for the largest motions.',
  cuts: [
    { option: 'axisymmetric', holdsIf: 'upright, or buoyancy is left out; no swirl; straight for 50 diameters ahead; the wall is heated evenly all round; turbulence is averaged' },
    { option: 'mirror-left-right', holdsIf: 'level or inclined, mean flow only, heating alike on both sides' },
    { option: 'periodic-along-flow', holdsIf: 'flow and temperature profile developed over the whole length' },
  ],
  domain: [
    { side: 'upstream', id: 'domainUpstream', source: 'entrance length, or none where the profile is given' },
    { side: 'downstream', id: 'domainDownstream', source: 'common practice' },
  ],
  boundaries: [inlet(), wall('wall'), outlet()],
  simplifications: [
    'Steady and axisymmetric holds for an upright pipe, or where buoyancy is left out, with no swirl and more than 50 diameters of straight pipe ahead.',
    'It fails in a level heated pipe with laminar flow (two rolls side by side), behind bends, and with heating on one side.',
    'From 10 um to 1 mm of diameter the laws stay those of large pipes once inlet losses and roughness are counted; then heat along the wall, heat of friction, slip of gases and charge layers of liquids need a look, and a short passage lies within its thermal entrance.',
  ],
  look: {
    mustShow: [
      'laminar: parabola with twice the mean on the axis, mean speed at 0.707 of the radius',
      'turbulent: mean speed at 0.223 R from the wall, axis at 1 + 1.29 sqrt(f) times the mean',
      'axis speed within 1 % of its end value at the entrance length, pressure a straight line behind it with slope f rho U^2/(2 D)',
      'bulk temperature falling to the wall temperature as exp(-4 Nu x/(D Re Pr)); straight with a uniform flux',
      'level, heated, laminar: two rolls mirrored on the upright plane, wall hottest on top',
    ],
    probes: ['axis at half, one and two entrance lengths of {entranceLength}', '0.223 R from the wall at nine tenths of {flowLength}', 'wall temperature at 0.1, 0.5 and 0.9 of the length, top and bottom where gravity acts'],
    wrong: [
      'laminar axis speed stays below 1.9 times the mean: not developed, or swirl',
      'pressure line bends in the last diameter: outlet condition',
      'Nusselt number falls below 3.657 or 4.364: numerical diffusion along the flow, or a bulk temperature weighted by area',
    ],
  },
  ladder: pipeLadder,
};
