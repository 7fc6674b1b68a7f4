import { quantity, way, ways, type Definition } from '../workings/index.ts';
import { level as referenceLevel, wall } from './boundaries.ts';
import type { Flow, Rung } from './define.ts';
import { sideHeatedCavityLaws } from './side-heated-cavity-laws.ts';

const geometry = 'geometry';
const practice = 'common practice';
const upright = ['walls.left', 'walls.right'] as const;
const level = ['walls.top', 'walls.bottom'] as const;

const hotCold = (id: 'hotTemperature' | 'coldTemperature'): Definition => {
  const [a, b] = upright.map((w) => `wallTemperature@${w}`) as [string, string];
  const join = id === 'hotTemperature' ? Math.max : Math.min;
  return ways(id, [{ needs: [a, b], value: (of) => join(of[a] as number, of[b] as number), formula: `${id === 'hotTemperature' ? 'warmer' : 'colder'} of left and right wall`, source: 'definition' }]);
};

const scales: Definition[] = [
  quantity('sideHeatedCavityDepth', { symbol: 'B', name: 'extent in the third direction', unit: 'm' }, [
    way({ needs: ['sizes.depth'], value: (of) => of['sizes.depth'], formula: 'B as given', source: 'the case' }),
    way({ needs: [], when: { infiniteDepth: 'yes' }, value: () => 1, formula: 'B = 1 m', source: 'convention: heat per metre of depth', dimensional: 'the metre of depth is a convention' }),
  ]),
  quantity('sideHeatedCavityAspect', { symbol: 'H/W', name: 'height over distance of hot and cold wall', unit: '1' }, [way({ needs: ['sizes.height', 'sizes.width'], value: (of) => of['sizes.height'] / of['sizes.width'], formula: 'H/W', source: 'definition' })]),
  ways('length', [way({ needs: ['sizes.width'], value: (of) => of['sizes.width'], formula: 'L = W', source: 'definition' })]),
  ways('speed', [way({ needs: ['gravity', 'thermalExpansion', 'temperatureDifference', 'length'], scatter: 0.5, value: (of) => Math.sqrt(of.gravity * Math.abs(of.thermalExpansion) * of.temperatureDifference * of.length), formula: 'U_N = sqrt(g |beta| dT W)', source: 'buoyancy against inertia' })]),
  ways('passageHeight', [way({ needs: ['sizes.height'], value: (of) => of['sizes.height'], formula: 'H_g = H', source: geometry })]),
  ways('flowLength', [way({ needs: ['sizes.height'], value: (of) => of['sizes.height'], formula: 'L_x = H', source: geometry })]),
  ways('gap', [way({ needs: ['sizes.width'], value: (of) => of['sizes.width'], formula: 'W', source: geometry })]),
  ways('span', [way({ needs: ['sizes.depth'], value: (of) => of['sizes.depth'], formula: 'L_z = B', source: geometry })]),
  hotCold('hotTemperature'),
  hotCold('coldTemperature'),
  ways('farTemperature', upright.toReversed().map((w) => ({ needs: [`drivingTemperature@${w}`], value: (of: Readonly<Record<string, number>>) => of[`drivingTemperature@${w}`] as number, formula: `temperature given at ${w}`, source: 'convention: a closed box has no undisturbed fluid' }))),
  ...upright.map((w) => ways(`wallArea@${w}`, [way({ needs: ['sizes.height', 'sideHeatedCavityDepth'], value: (of) => of['sizes.height'] * of.sideHeatedCavityDepth, formula: 'A_w = H B', source: geometry })])),
  ...level.map((w) => ways(`wallArea@${w}`, [way({ needs: ['sizes.width', 'sideHeatedCavityDepth'], value: (of) => of['sizes.width'] * of.sideHeatedCavityDepth, formula: 'A_w = W B', source: geometry })])),
];

const extents: Definition[] = [
  ways('regionAlong', [way({ needs: ['sizes.height'], value: (of) => of['sizes.height'], formula: 'H', source: geometry })]),
  ways('regionAcross', [way({ needs: ['sizes.width'], value: (of) => of['sizes.width'], formula: 'W', source: geometry })]),
  ways('regionSpan', [
    way({ needs: ['sizes.depth'], value: (of) => of['sizes.depth'], formula: 'B', source: geometry }),
    way({ needs: ['sizes.width'], when: { infiniteDepth: 'yes' }, scatter: 0.5, value: (of) => of['sizes.width'], formula: 'W, ends repeating', source: practice }),
  ]),
  ways('regionStretch', [way({ needs: ['sideHeatedCavityAspect'], range: { sideHeatedCavityAspect: [10, 1e4] }, value: () => 4, formula: 'a_x = 4 in a tall slot', source: `${practice}: 50 cells along a pair of its cells, 2.5 W long` }), way({ needs: [], value: () => 1, formula: 'a_x = 1', source: practice })]),
  ways('coreLength', [way({ needs: ['sizes.height', 'sizes.width'], value: (of) => Math.min(of['sizes.height'], of['sizes.width']), formula: 'L_c = smaller of H and W', source: practice })]),
  ways('coreCellsCoarse', [way({ needs: [], value: () => 40, formula: 'n_c = 40', source: practice })]),
  ways('coreCellsMedium', [way({ needs: [], value: () => 80, formula: 'n_c = 80', source: practice })]),
  ways('coreCellsFine', [way({ needs: [], value: () => 160, formula: 'n_c = 160', source: practice })]),
];

const rungs: Definition[] = ([['Low', 1e4], ['High', 1e6]] as const).map(([which, ra]) => quantity(`sideHeatedCavityRung${which}`, { symbol: 'Ra', name: 'Rayleigh number of a rung', unit: '1' }, [way({ needs: [], value: () => ra, formula: `Ra = ${ra}`, source: 'the reference of the rung' })]));
const ladder: Rung[] = [
  { reference: 'slab-steady', changes: 'no gravity: conduction between the two walls', compares: 'nusselt', with: {}, limit: 0.005, order: 2, ifMissed: 'wall gradient one-sided; adiabatic floor and lid' },
  { reference: 'side-heated-square', changes: 'square of air at Ra 1e4, linear density law, adiabatic floor and lid', compares: 'nusselt', with: { rayleigh: 'sideHeatedCavityRungLow' }, limit: 0.01, order: 2, ifMissed: 'Pr 0.71; small temperature difference; wall cells small enough for the peak of the flux' },
  { reference: 'side-heated-square', changes: 'the same at Ra 1e6, largest upward speed', compares: 'speedUpScaled', with: { rayleigh: 'sideHeatedCavityRungHigh' }, limit: 0.02, order: 2, ifMissed: 'cells between the wall and the peak of speed; settled core stratification' },
  { reference: 'two-plates-radiation', changes: 'radiation between the two walls added', compares: 'wallHeatFlux', with: { hotTemperature: 'hotTemperature', coldTemperature: 'coldTemperature', emissivity1: 'emissivity', emissivity2: 'emissivity' }, when: { medium: 'gas', 'verdict.radiation': ['include', 'borderline', 'undecided'] }, limit: 0.02, ifMissed: 'rays or ordinates; emissivity of floor and lid' },
];

export const sideHeatedCavity: Flow = {
  id: 'side-heated-cavity',
  title: 'Closed box heated from the side',
  lengthIs: 'distance of the hot and the cold wall',
  speedIs: 'buoyant scale',
  sizes: [
    { key: 'height', name: 'height', unit: 'm' },
    { key: 'width', name: 'distance of the hot and the cold wall', unit: 'm' },
    { key: 'depth', name: 'third direction', unit: 'm', infinite: true },
  ],
  walls: ['left', 'right', 'top', 'bottom'],
  targetWall: 'left',
  answers: ['heatRate', 'heatTransferCoefficient', 'nusselt', 'wallTemperature', 'peakSpeed', 'boundaryLayerThickness'],
  stations: ['worst', 'target'],
  regions: ['box'],
  words: { flow: 'side-heated-cavity', flowClass: 'enclosure', imposedFlow: 'no', wallBounded: 'yes', attached: 'yes', separated: 'no', ductSection: 'rectangular', axis: 'upright', ascent: 'up' },
  definitions: [...scales, ...sideHeatedCavityLaws, ...extents, ...rungs],
  leastRegion: 'Two-dimensional where the depth is above three heights, the end walls are adiabatic and Pr is 0.7 or more; else the whole box. No mirror: the field is symmetric about a point.',
  cuts: [{ option: 'two-dimensional', holdsIf: 'depth above three heights, adiabatic end walls, Pr of 0.7 or more, steady flow' }],
  domain: [],
  boundaries: [wall('left wall', 'walls.left'), wall('right wall', 'walls.right'), wall('floor', 'walls.bottom'), wall('ceiling', 'walls.top'), referenceLevel()],
  simplifications: [
    'Below Ra_W = 500 H/W conduction rules; above it layers stand on the walls and the core is stratified.',
    'Adiabatic floor and lid are rarely true for air: radiation and conduction change the heat by 10 to 30 %.',
    'Air in a square turns unsteady at Ra 1.8e8 in the plane, earlier in three dimensions; liquid metals far earlier; tall slots form cells one above another from Gr_W = 8000, which stand still in air and water up to 1e4 to 4e4: cells alone are no reason for a run in time.',
    'No published law covers the square of air closely: the one used is 4 to 11 % high up to Ra 1e6 and 16 % at 1e8; the benchmark holds there.',
  ],
  look: {
    mustShow: [
      'hot wall in equals cold wall out to 0.1 %; field symmetric about the centre; level isotherms in the core',
      'square of air: largest upward speed 1.19 W Ra^(-1/4) from the wall, 0.218 (alpha/W) Ra^(1/2)',
      'core dT/dz of 0.53, 0.83, 1.07, 0.91 dT/H at Ra 1e3, 1e4, 1e5, 1e6; the wall flux largest at 0.09, 0.14, 0.08, 0.037 H on the hot wall',
    ],
    probes: ['place of the largest upward speed at mid-height, both walls', 'core temperature at 0.25, 0.5 and 0.75 of the height {passageHeight}', 'corner at 0.05 H'],
    wrong: [
      'symmetry broken by more than 1 %: properties vary, then expected, or mesh',
      'core slope far below 0.5 above Ra 1e5: heat lost at adiabatic walls, or time too short',
      'isotherms bent at floor and lid: conduction there',
    ],
  },
  ladder,
};
