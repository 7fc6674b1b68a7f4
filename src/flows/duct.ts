import { between, ductEntryLoss, ductFrictionReynolds, ductNusseltFlux, ductNusseltTemperature, ductPeakOverMean, jonesDiameterRatio, type Table } from '../quantities/index.ts';
import { quantity, way, ways, type Definition } from '../workings/index.ts';
import { inlet, outlet, wall } from './boundaries.ts';
import type { Flow } from './define.ts';
import { ductLadder } from './duct-ladder.ts';
import { passageDefinitions, turbulentLength } from './passage.ts';
import { straightDefinitions } from './straight.ts';

const geometry = 'geometry';
const sides = ['sizes.width', 'sizes.height'] as const;

// Entrance lengths over Re D_h (profile) and Re Pr D_h (heat) by aspect.
const profileTable: Table = [[0, 0.011], [0.25, 0.075], [0.5, 0.085], [1, 0.09]];
const heatTables: Readonly<Record<'temperature' | 'flux', Table>> = {
  temperature: [[0, 0.008], [0.05, 0.012], [0.125, 0.023], [0.25, 0.051], [0.5, 0.05], [1, 0.043]],
  flux: [[0, 0.0117], [0.05, 0.0145], [0.125, 0.02], [0.25, 0.031], [0.5, 0.048], [1, 0.057]],
};

const scales: Definition[] = [
  quantity('ductAspectRatio', { symbol: 'a', name: 'short side over long side', unit: '1' }, [way({ needs: sides, value: (of) => Math.min(of['sizes.width'], of['sizes.height']) / Math.max(of['sizes.width'], of['sizes.height']), formula: 'a = min(W, H)/max(W, H)', source: geometry })]),
  quantity('ductReynoldsEquivalent', { symbol: 'Re_L', name: 'Reynolds number on the laminar equivalent diameter', unit: '1' }, [way({ needs: ['reynoldsBulk', 'ductAspectRatio'], value: ({ reynoldsBulk, ductAspectRatio }) => reynoldsBulk * jonesDiameterRatio({ aspect: ductAspectRatio }), formula: 'Re_L = Re D_L/D_h', source: 'Jones, J. Fluids Eng. 98 (1976) 173' })]),
  ways('flowArea', [way({ needs: sides, value: (of) => of['sizes.width'] * of['sizes.height'], formula: 'A = W H', source: geometry })]),
  ways('wettedPerimeter', [way({ needs: sides, value: (of) => 2 * (of['sizes.width'] + of['sizes.height']), formula: 'P = 2 (W + H)', source: geometry })]),
  ways('length', [way({ needs: ['hydraulicDiameter'], value: ({ hydraulicDiameter }) => hydraulicDiameter, formula: 'L = D_h = 2 W H/(W + H)', source: 'definition' })]),
  ways('gap', [way({ needs: sides, value: (of) => Math.min(of['sizes.width'], of['sizes.height']), formula: 'H = min(W, H)', source: geometry })]),
  ways('span', [way({ needs: sides, value: (of) => Math.max(of['sizes.width'], of['sizes.height']), formula: 'L_z = max(W, H)', source: geometry })]),
  ways('regionSpan', [way({ needs: sides, value: (of) => Math.max(of['sizes.width'], of['sizes.height']), formula: 'max(W, H)', source: geometry })]),
  ways('wallArea@walls.bottom', [plate()]),
  ways('wallArea@walls.top', [plate()]),
  ...['left', 'right'].map((side) => ways(`wallArea@walls.${side}`, [way({ needs: ['sizes.height', 'sizes.length'], value: (of) => of['sizes.height'] * of['sizes.length'], formula: 'A_w = H L', source: geometry })])),
  ways('passageHeight', [
    way({ needs: ['sizes.length'], when: { axis: 'upright' }, value: (of) => of['sizes.length'], formula: 'H_g = L', source: geometry }),
    way({ needs: ['sizes.height'], when: { axis: 'level' }, value: (of) => of['sizes.height'], formula: 'H_g = H', source: geometry }),
    way({ needs: ['sizes.height', 'sizes.length', 'inclination'], value: (of) => of['sizes.length'] * Math.abs(Math.sin(of.inclination)) + of['sizes.height'] * Math.abs(Math.cos(of.inclination)), formula: 'H_g = L sin(theta) + H cos(theta)', source: geometry }),
  ]),
];

function plate(): ReturnType<typeof way> {
  return way({ needs: ['sizes.width', 'sizes.length'], value: (of) => of['sizes.width'] * of['sizes.length'], formula: 'A_w = W L', source: geometry });
}

const limitSource = 'Hartnett, Koh and McComas, J. Heat Transfer 84 (1962) 82 for the square; the flat end meets parallel plates; straight in between';
const regime: Definition[] = [
  ways('regimeGroup', [way({ needs: ['reynolds'], value: ({ reynolds }) => reynolds, symbol: 'Re', formula: 'Re on D_h', source: 'definition' })]),
  ways('regimeLow', [way({ needs: ['ductAspectRatio'], scatter: 0.1, value: ({ ductAspectRatio }) => 2600 - 600 * ductAspectRatio, formula: 'Re_lo = 2600 - 600 a', source: limitSource })]),
  ways('regimeHigh', [way({ needs: ['ductAspectRatio'], scatter: 0.1, value: ({ ductAspectRatio }) => 6000 - 2000 * ductAspectRatio, formula: 'Re_hi = 6000 - 2000 a', source: limitSource })]),
];

const aspect = (of: Readonly<Record<string, number>>): { aspect: number } => ({ aspect: of['ductAspectRatio'] as number });
const laws: Definition[] = passageDefinitions({
  needs: ['ductAspectRatio'],
  frictionReynolds: { value: (of) => ductFrictionReynolds(aspect(of)), formula: 'f = (96/Re)(1 - 1.3553 a + 1.9467 a^2 - 1.7012 a^3 + 0.9564 a^4 - 0.2537 a^5)', source: 'Shah and London, Laminar Flow Forced Convection in Ducts (1978), eq. 341' },
  frictionDiameter: { value: (of) => jonesDiameterRatio(aspect(of)), formula: 'D_L/D_h = 2/3 + (11/24) a (2 - a)', source: 'Jones, J. Fluids Eng. 98 (1976) 173' },
  turbulentScatter: { friction: 0.12, heat: 0.15 },
  nusselt: {
    temperature: (of) => ductNusseltTemperature(aspect(of)),
    flux: (of) => ductNusseltFlux(aspect(of)),
    formula: { temperature: 'Nu = 7.541 (1 - 2.610 a + 4.970 a^2 - 5.119 a^3 + 2.702 a^4 - 0.548 a^5)', flux: 'Nu = 8.235 (1 - 2.0421 a + 3.0853 a^2 - 2.4765 a^3 + 1.0578 a^4 - 0.1861 a^5)' },
    source: 'Shah and London, Laminar Flow Forced Convection in Ducts (1978), all four sides alike',
    scatter: 0.002,
  },
  thermalEntrance: { temperature: (of) => between(aspect(of).aspect, heatTables.temperature), flux: (of) => between(aspect(of).aspect, heatTables.flux), source: 'marched solution on a quarter of the section, velocity developed, tabulated by aspect; the older tables of Wibulswas 1966 are up to 37 % longer', scatter: 0.3 },
});

const lengths: Definition[] = [
  ways('entranceLength', [
    way({ needs: ['reynoldsBulk', 'hydraulicDiameter', 'ductAspectRatio'], when: { regime: ['laminar', 'transitional'] }, scatter: 0.4, value: (of) => between(of.ductAspectRatio, profileTable) * of.reynoldsBulk * of.hydraulicDiameter, formula: 'L_e = c(a) Re D_h, c = 0.011 (a = 0), 0.075, 0.085, 0.09 (a = 1)', source: 'Wiginton and Dalton, J. Appl. Mech. 37 (1970) 854; the linear solution of Han 1960 gives 15 to 45 % less' }),
    turbulentLength,
  ]),
  ways('entryLoss', [
    way({ needs: ['ductAspectRatio'], when: { regime: ['laminar', 'transitional'] }, scatter: 0.1, value: ({ ductAspectRatio }) => ductEntryLoss({ aspect: ductAspectRatio }), formula: 'K_inf = 2 (alpha - beta) of the developed profile', source: 'Lundgren, Sparrow and Starr, J. Basic Eng. 86 (1964) 620' }),
    way({ needs: [], when: { regime: 'turbulent' }, scatter: 1, value: () => 0.1, formula: 'K_inf = 0.1', source: 'common practice' }),
  ]),
  ways('peakOverMean', [
    way({ needs: ['ductAspectRatio'], when: { regime: ['laminar', 'transitional'] }, value: ({ ductAspectRatio }) => ductPeakOverMean({ aspect: ductAspectRatio }), formula: 'u_max/U of the exact series, 1.5 (a = 0) to 2.096 (a = 1)', source: 'Shah and London, Laminar Flow Forced Convection in Ducts (1978), chapter VII' }),
    way({ needs: ['frictionPlain'], when: { regime: 'turbulent' }, scatter: 0.05, value: ({ frictionPlain }) => 1 + 1.29 * Math.sqrt(frictionPlain), formula: 'u_max/U = 1 + 1.29 sqrt(f)', source: 'logarithmic law, as in a pipe' }),
  ]),
];

export const duct: Flow = {
  id: 'duct',
  title: 'Rectangular duct',
  lengthIs: 'hydraulic diameter',
  speedIs: 'mean speed over the section',
  sizes: [
    { key: 'width', name: 'inner width', unit: 'm' },
    { key: 'height', name: 'inner height', unit: 'm' },
    { key: 'length', name: 'length that counts', unit: 'm' },
  ],
  walls: ['left', 'right', 'top', 'bottom'],
  targetWall: 'bottom',
  answers: ['pressureDrop', 'outletTemperature', 'heatRate', 'heatTransferCoefficient', 'nusselt', 'wallTemperature', 'frictionFactorDarcy', 'wallShear', 'entranceLength'],
  stations: ['worst', 'target'],
  regions: ['entry', 'run'],
  words: { flow: 'duct', flowClass: 'internal', imposedFlow: 'yes', wallBounded: 'yes', attached: 'yes', separated: 'no', ductSection: 'rectangular', infiniteDepth: 'no' },
  definitions: [...scales, ...regime, ...laws, ...lengths, ...straightDefinitions],
  leastRegion: 'A quarter of the section where shape, heating and gravity share both mirror planes; a half where gravity or heating takes one away; all of it for resolved turbulence.',
  cuts: [
    { option: 'mirror-left-right', holdsIf: 'mean flow only, heating alike on both sides, gravity in the plane' },
    { option: 'mirror-top-bottom', holdsIf: 'mean flow only, buoyancy left out, top and bottom heated alike' },
    { option: 'two-dimensional', holdsIf: 'short side below a tenth of the long side, and values wanted on the mid-plane' },
    { option: 'periodic-along-flow', holdsIf: 'flow and temperature profile developed over the whole length' },
  ],
  domain: [
    { side: 'upstream', id: 'domainUpstream', source: 'entrance length, or none where the profile is given' },
    { side: 'downstream', id: 'domainDownstream', source: 'common practice' },
  ],
  boundaries: [inlet(), ...['left', 'right', 'top', 'bottom'].map((side) => wall(`${side} wall`, `walls.${side}`)), outlet()],
  simplifications: [
    'Two-dimensional flow only below a tenth of side ratio: side walls add 13 % to the friction at 0.1 and 6 % at 0.05.',
    'Closures with one eddy viscosity give none of the secondary flow in the corners, 1 to 3 % of the mean speed: take a quadratic or a Reynolds-stress closure where corner heat or the shear along the wall is wanted.',
    'Heat transfer in the corners is 20 to 50 % below the mean; the mean laws do not show it.',
    'The Nusselt numbers are those of four sides alike; with unheated sides they are a first guess.',
    'From 10 um to 1 mm the walls between passages conduct along and across: compute one passage with half of each wall.',
  ],
  look: {
    mustShow: [
      'laminar peak over mean 2.10, 1.99, 1.77 at side ratios 1, 0.5, 0.25; shear zero in the corners and largest in the middle of the long side',
      'turbulent: eight cells in a square section, lines of equal speed bulging into the corners',
      'corner heat flux 20 to 50 % below the mean',
    ],
    probes: ['centre', 'middle of each side', 'corner bisector a tenth of the hydraulic diameter from the corner'],
    wrong: ['no cells in the corners where corner heat is asked: closure', 'cells of 5 % of the speed and more: a bend upstream, or the mesh'],
  },
  ladder: ductLadder,
};
