import { churchillChuPlate, laminarFriction, mixedLowPrandtlPlate, petukhovFriction } from '../quantities/index.ts';
import { quantity, way, ways, wordWay, type Definition } from '../workings/index.ts';
import { entraining, inlet, open, outlet, slipping, stream, wall } from './boundaries.ts';
import type { Flow } from './define.ts';
import { generalBody, generalDrag } from './general-laws.ts';

const analogy = 'by analogy with the nearest named flow; low confidence';
const inside = { generalConfinement: 'inside' };
const outside = { generalConfinement: 'outside' };
const free = { generalConfinement: 'free' };
const still = { imposedFlow: 'no' };
const size = (formula: string): ReturnType<typeof way> => way({ needs: ['sizes.length'], value: (of) => of['sizes.length'], formula, source: 'definition' });

const words: Definition[] = [
  quantity('generalConfinement', { symbol: '', name: 'where the fluid is', unit: 'word', words: ['inside', 'outside', 'free'] }, [wordWay({ needs: [], as: 'assumed', word: () => 'outside', formula: 'round a body', source: 'taken where the case does not say' })]),
  ways('flowClass', [
    wordWay({ needs: [], when: inside, word: () => 'internal', formula: 'fluid inside a passage', source: 'definition' }),
    wordWay({ needs: [], when: outside, word: () => 'body', formula: 'fluid round a body', source: 'definition' }),
    wordWay({ needs: [], when: free, word: () => 'jet', formula: 'free stream', source: 'definition' }),
  ]),
  ways('wallBounded', [wordWay({ needs: [], when: free, word: () => 'no', formula: 'free stream', source: 'definition' }), wordWay({ needs: [], when: { generalConfinement: ['inside', 'outside'] }, word: () => 'yes', formula: 'walls', source: 'definition' })].toReversed()),
  ways('attached', [wordWay({ needs: [], when: inside, word: () => 'yes', formula: 'passage', source: analogy }), wordWay({ needs: [], when: { generalConfinement: ['outside', 'free'] }, word: () => 'no', formula: 'body or free stream', source: analogy })]),
  ways('separated', [wordWay({ needs: [], when: outside, word: () => 'yes', formula: 'blunt body', source: analogy }), wordWay({ needs: [], when: { generalConfinement: ['inside', 'free'] }, word: () => 'no', formula: 'passage or free stream', source: analogy })]),
];

const scales: Definition[] = [
  ways('length', [size('L as given: the length over which the steepest change of speed happens')]),
  ways('hydraulicDiameter', [size('D_h = L')]),
  ways('gap', [size('H = L')]),
  ways('flowLength', [size('L_x = L')]),
  ways('passageHeight', [size('H_g = L')]),
  quantity('generalBuoyantSpeed', { symbol: 'U_buoy', name: 'speed that buoyancy drives', unit: 'm/s' }, [
    way({ needs: ['gravity', 'thermalExpansion', 'temperatureDifference', 'length', 'prandtl'], scatter: 0.2, value: (of) => 0.766 * (0.952 + of.prandtl) ** -0.5 * Math.sqrt(of.gravity * Math.abs(of.thermalExpansion) * of.temperatureDifference * of.length), formula: 'U_buoy = 0.766 (0.952 + Pr)^(-1/2) sqrt(g |beta| dT L)', source: 'Squire, in Modern Developments in Fluid Dynamics (1938); Eckert 1950' }),
  ]),
  ways('speed', [way({ needs: ['generalBuoyantSpeed'], when: still, value: ({ generalBuoyantSpeed }) => generalBuoyantSpeed, formula: 'U = U_buoy', source: analogy })]),
];

const limits = (low: number, high: number, when: Readonly<Record<string, string>>, source: string): [ReturnType<typeof way>, ReturnType<typeof way>] => [
  way({ needs: [], when, scatter: 1, value: () => low, formula: `${low}`, source: `${source}; judged by analogy` }),
  way({ needs: [], when, scatter: 1, value: () => high, formula: `${high}`, source: `${source}; judged by analogy` }),
];
const bands = [
  limits(1e9, 1e10, { ...still }, 'upright layer in still fluid, common practice'),
  limits(2300, 4000, { ...inside, imposedFlow: 'yes' }, 'round pipe'),
  limits(190, 1000, { ...outside, imposedFlow: 'yes' }, 'blunt body, common practice'),
  limits(300, 3000, { ...free, imposedFlow: 'yes' }, 'round jet'),
];
const regime: Definition[] = [
  ways('regimeGroup', [
    way({ needs: ['rayleigh'], when: still, value: ({ rayleigh }) => rayleigh, symbol: 'Ra', formula: 'Ra on L', source: analogy }),
    way({ needs: ['reynolds'], when: { imposedFlow: 'yes' }, value: ({ reynolds }) => reynolds, symbol: 'Re', formula: 'Re on L', source: analogy }),
  ]),
  ways('regimeLow', bands.map(([low]) => low)),
  ways('regimeHigh', bands.map(([, high]) => high)),
  ways('unsteadyGroup', [
    way({ needs: ['rayleigh'], when: still, value: ({ rayleigh }) => rayleigh, symbol: 'Ra', formula: 'Ra on L', source: analogy }),
    way({ needs: ['reynolds'], when: { ...outside, imposedFlow: 'yes' }, value: ({ reynolds }) => reynolds, symbol: 'Re', formula: 'Re on L', source: analogy }),
    way({ needs: ['reynolds'], when: { ...free, imposedFlow: 'yes' }, value: ({ reynolds }) => reynolds, symbol: 'Re', formula: 'Re on L', source: analogy }),
  ]),
  ways('unsteadyFrom', [
    way({ needs: [], when: still, scatter: 1, value: () => 1e9, formula: '1e9', source: 'upright layer in still fluid; judged by analogy' }),
    way({ needs: [], when: { ...outside, imposedFlow: 'yes' }, scatter: 1, value: () => 47, formula: '47', source: 'onset of shedding of a cylinder; judged by analogy' }),
    way({ needs: [], when: { ...free, imposedFlow: 'yes' }, scatter: 1, value: () => 300, formula: '300', source: 'round jet; judged by analogy' }),
  ]),
];

const laws: Definition[] = [
  ways('frictionLaminar', [way({ needs: ['reynoldsBulk'], when: inside, scatter: 1, value: ({ reynoldsBulk }) => laminarFriction({ reynolds: reynoldsBulk }), formula: 'f = 64/Re', source: analogy })]),
  ways('frictionTurbulent', [way({ needs: ['reynoldsBulk'], when: inside, range: { reynoldsBulk: [3e3, 5e6] }, scatter: 1, value: ({ reynoldsBulk }) => petukhovFriction({ reynolds: reynoldsBulk }), formula: 'f = (0.790 ln Re - 1.64)^-2', source: analogy })]),
  ways('dragCoefficient', [way({ needs: ['reynolds'], when: outside, scatter: 1, value: ({ reynolds }) => generalDrag({ reynolds }), formula: 'C_D = (24/Re)(1 + 0.15 Re^0.687) to 300, 1 from 3000, between straight in log Re', source: 'Schiller and Naumann 1933 for spheres; common practice for other shapes' })]),
  ways('nusseltPlain', [
    way({ needs: ['reynolds', 'prandtl'], when: { imposedFlow: 'yes' }, range: { prandtl: [1e-4, 0.2] }, scatter: 1, value: ({ reynolds, prandtl }) => mixedLowPrandtlPlate({ reynolds, prandtl, wall: 'temperature', transition: 5e5 }), formula: 'Nu of Churchill and Ozoe to 5e5, beyond it the growth of 0.979 Pe^(1/2) + 1.093e-3 Re^1.06 Pr^1.207 added', source: `flat plate in a liquid metal, ${analogy}` }),
    way({ needs: ['reynolds', 'prandtl'], when: { imposedFlow: 'yes' }, scatter: 1, value: ({ reynolds, prandtl }) => generalBody({ reynolds, prandtl }), formula: 'Nu = 0.664 Re^(1/2) Pr^(1/3) to 5e5, (0.037 Re^0.8 - 871) Pr^(1/3) beyond', source: `flat plate, ${analogy}` }),
    way({ needs: ['rayleigh', 'prandtl'], when: still, range: { rayleigh: [0, 1e12] }, scatter: 1, value: ({ rayleigh, prandtl }) => churchillChuPlate({ rayleigh, prandtl, wall: 'temperature' }), formula: 'Nu = (0.825 + 0.387 Ra^(1/6)/(1 + (0.492/Pr)^(9/16))^(8/27))^2', source: `Churchill and Chu, Int. J. Heat Mass Transfer 18 (1975) 1323, upright plate, ${analogy}` }),
  ]),
  ways('boundaryLayerThickness', [
    way({ needs: ['length', 'reynolds'], when: { regime: ['laminar', 'transitional'] }, scatter: 0.5, value: ({ length, reynolds }) => (5 * length) / Math.sqrt(reynolds), formula: 'delta = 5 L Re^(-1/2)', source: analogy }),
    way({ needs: ['length', 'reynolds'], when: { regime: 'turbulent' }, scatter: 0.5, value: ({ length, reynolds }) => 0.37 * length * reynolds ** -0.2, formula: 'delta = 0.37 L Re^(-1/5)', source: analogy }),
  ]),
  ways('wakeLength', [way({ needs: ['length'], when: outside, scatter: 0.5, value: ({ length }) => 10 * length, formula: 'L_w = 10 L, between 5 and 15', source: 'common practice' })]),
  ways('strouhal', [way({ needs: [], when: outside, scatter: 0.5, value: () => 0.2, formula: 'St = 0.2', source: 'blunt bodies, common practice' })]),
];

const away = (n: number, symbol: string): ReturnType<typeof way> => way({ needs: ['length'], scatter: 0.5, value: ({ length }) => n * length, formula: `${symbol} = ${n} L`, source: 'common practice' });
const extents: Definition[] = [
  ways('domainUpstream', [away(5, 'L_up')]),
  ways('domainDownstream', [away(15, 'L_dn')]),
  ways('domainSides', [away(7, 'L_s')]),
  ways('domainAbove', [away(7, 'L_a')]),
  ...(['regionAlong', 'regionAcross', 'regionSpan'] as const).map((id) => ways(id, [away(3, id === 'regionAlong' ? 'along' : id === 'regionAcross' ? 'across' : 'span')])),
];

export const general: Flow = {
  id: 'general',
  title: 'A flow known by one length and one speed',
  lengthIs: 'length given, over which the speed changes most',
  speedIs: 'speed given, or the buoyant speed in still fluid',
  sizes: [
    { key: 'length', name: 'length over which the speed changes most', unit: 'm' },
    { key: 'volume', name: 'volume of the fluid', unit: 'm^3', optional: true },
  ],
  walls: [],
  answers: ['heatTransferCoefficient', 'nusselt', 'dragCoefficient', 'sheddingFrequency', 'peakSpeed'],
  stations: ['worst', 'target'],
  regions: ['near'],
  words: { flow: 'general', ductSection: 'other' },
  definitions: [...words, ...scales, ...regime, ...laws, ...extents],
  leastRegion: 'The whole surroundings of the part; no symmetry is granted.',
  cuts: [],
  domain: [
    { side: 'upstream', id: 'domainUpstream', source: 'common practice' },
    { side: 'downstream', id: 'domainDownstream', source: 'common practice' },
    { side: 'sides', id: 'domainSides', source: 'common practice, blockage below 3 to 5 %' },
    { side: 'above', id: 'domainAbove', source: 'common practice, blockage below 3 to 5 %' },
  ],
  boundaries: [
    inlet('inlet', { when: { ...inside, imposedFlow: 'yes' } }),
    stream('inlet', { when: { generalConfinement: ['outside', 'free'], imposedFlow: 'yes' } }),
    wall('walls', 'wall', { when: { generalConfinement: ['inside', 'outside'] } }),
    slipping('far sides', { when: { ...outside, imposedFlow: 'yes' } }),
    entraining('far sides', { when: { ...free, imposedFlow: 'yes' } }),
    entraining('far sides and below', { when: { generalConfinement: ['outside', 'free'], imposedFlow: 'no' } }),
    outlet('outlet', { when: { ...inside, imposedFlow: 'yes' } }),
    open('outlet', { when: { generalConfinement: ['outside', 'free'], imposedFlow: 'yes' } }),
    open('above', { when: { generalConfinement: ['outside', 'free'], imposedFlow: 'no' }, turbulence: 'no slope; low where it returns' }),
    open('openings', { when: { ...inside, imposedFlow: 'no' } }),
  ],
  simplifications: ['None is granted. Every number is by analogy and of low confidence: name the nearest flow instead.'],
  look: {
    mustShow: ['largest speed no more than the driving speed times the ratio of areas, or the buoyant speed', 'layer and wake as long as printed', 'temperatures within those of inflow and walls'],
    probes: ['the target', 'one and five lengths behind it'],
    wrong: ['speeds above sqrt(2 dp/rho): total pressure made by mesh or inlet condition'],
  },
  ladder: [
    { reference: 'manufactured-solution', changes: 'chosen smooth fields with the terms of the case', compares: 'order', with: {}, limit: 0.2, ifMissed: 'scheme order, boundary conditions, source term' },
    { reference: 'poiseuille-pipe', changes: 'the nearest flow with a known answer: a passage', compares: 'frictionTimesReynolds', with: {}, when: { generalConfinement: 'inside' }, limit: 0.01, order: 2, ifMissed: 'developed length; one-sided wall gradient' },
    { reference: 'blasius-plate', changes: 'the nearest flow with a known answer: a surface', compares: 'displacementFactor', with: {}, when: { generalConfinement: ['outside', 'free'] }, limit: 0.01, order: 2, ifMissed: 'cells in the layer; distance of the outer edge' },
  ],
};
