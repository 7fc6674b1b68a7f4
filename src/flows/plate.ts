import { quantity, way, ways, wordWay, type Definition } from '../workings/index.ts';
import { entraining, open, slipping, stream as streaming, wall } from './boundaries.ts';
import type { Flow } from './define.ts';
import { plateLadder } from './plate-ladder.ts';
import { plateStill } from './plate-still.ts';
import { plateStream } from './plate-stream.ts';

const geometry = 'geometry';
const practice = 'common practice';
const still = ['upright', 'inclined', 'unstable', 'stable'];
const heated = (facing: string, direction: string, word: string): ReturnType<typeof wordWay> =>
  wordWay({ needs: [], when: { imposedFlow: 'no', axis: 'level', plateFacing: facing, heatDirection: direction }, word: () => word, formula: `level, ${facing === 'up' ? 'upper' : 'lower'} side, ${direction}`, source: 'definition' });

const setting: Definition[] = [
  quantity('plateFacing', { symbol: '', name: 'side of a level plate that exchanges heat', unit: 'word', words: ['up', 'down'] }),
  quantity('plateSetting', { symbol: '', name: 'how the plate stands to stream and gravity', unit: 'word', words: ['stream', ...still] }, [
    wordWay({ needs: [], when: { imposedFlow: 'yes' }, word: () => 'stream', formula: 'a stream is imposed', source: 'definition' }),
    wordWay({ needs: [], when: { imposedFlow: 'no', axis: 'upright' }, word: () => 'upright', formula: 'still fluid, upright', source: 'definition' }),
    wordWay({ needs: [], when: { imposedFlow: 'no', axis: 'inclined' }, word: () => 'inclined', formula: 'still fluid, inclined', source: 'definition' }),
    heated('up', 'heating', 'unstable'),
    heated('down', 'cooling', 'unstable'),
    heated('up', 'cooling', 'stable'),
    heated('down', 'heating', 'stable'),
  ]),
];

const along = (formula: string): ReturnType<typeof way> => way({ needs: ['sizes.length'], value: (of) => of['sizes.length'], formula, source: geometry });
const scales: Definition[] = [
  quantity('plateWidth', { symbol: 'W', name: 'width of the plate', unit: 'm' }, [
    way({ needs: ['sizes.width'], value: (of) => of['sizes.width'], formula: 'W as given', source: 'the case' }),
    way({ needs: [], when: { infiniteDepth: 'yes' }, value: () => 1, formula: 'W = 1 m', source: 'convention: force and heat per metre of width', dimensional: 'the metre of width is a convention' }),
  ]),
  ways('length', [
    way({ needs: ['sizes.length', 'sizes.width'], when: { imposedFlow: 'no', axis: 'level', infiniteDepth: 'no' }, value: (of) => (of['sizes.length'] * of['sizes.width']) / (2 * (of['sizes.length'] + of['sizes.width'])), formula: 'L = area/perimeter', source: 'Goldstein, Sparrow and Jones, Int. J. Heat Mass Transfer 16 (1973) 1025' }),
    way({ needs: ['sizes.length'], when: { imposedFlow: 'no', axis: 'level', infiniteDepth: 'yes' }, value: (of) => of['sizes.length'] / 2, formula: 'L = area/perimeter of an endless strip', source: 'Goldstein, Sparrow and Jones, Int. J. Heat Mass Transfer 16 (1973) 1025' }),
    way({ needs: ['sizes.length'], when: { imposedFlow: 'no', axis: ['upright', 'inclined'] }, value: (of) => of['sizes.length'], formula: 'L = height along the plate', source: 'definition' }),
    way({ needs: ['sizes.length'], when: { imposedFlow: 'yes' }, value: (of) => of['sizes.length'], formula: 'L = length along the stream', source: 'definition' }),
  ]),
  ways('flowLength', [along('L_x = L')]),
  ways('span', [way({ needs: ['sizes.width'], value: (of) => of['sizes.width'], formula: 'L_z = W', source: geometry })]),
  ways('wallArea', [
    way({ needs: ['plateWidth', 'sizes.length', 'sizes.unheatedStart'], value: (of) => of.plateWidth * (of['sizes.length'] - of['sizes.unheatedStart']), formula: 'A_w = W (L - x_0), one side', source: geometry }),
    way({ needs: ['plateWidth', 'sizes.length'], value: (of) => of.plateWidth * of['sizes.length'], formula: 'A_w = W L, one side', source: geometry }),
  ]),
  ways('wettedPerimeter', [way({ needs: ['plateWidth'], value: ({ plateWidth }) => plateWidth, formula: 'P = W, one side', source: geometry })]),
  ways('passageHeight', [
    way({ needs: ['sizes.length', 'inclination'], when: { axis: ['upright', 'inclined'] }, value: (of) => of['sizes.length'] * Math.abs(Math.sin(of.inclination)), formula: 'H_g = L sin(theta)', source: geometry }),
    way({ needs: ['length'], when: { axis: 'level' }, value: ({ length }) => length, formula: 'H_g = L', source: practice }),
  ]),
];

const layersOr = (n: number, share: number, when: Record<string, string | string[]>): ReturnType<typeof way> =>
  way({ needs: ['boundaryLayerThickness', 'sizes.length'], when, scatter: 0.5, value: (of) => Math.max(n * of.boundaryLayerThickness, share * of['sizes.length']), formula: `larger of ${n} delta and ${share} L`, source: practice });
const lengths = (n: number, when: Record<string, string | string[]>, note: string): ReturnType<typeof way> =>
  way({ needs: ['sizes.length'], when, scatter: 0.5, value: (of) => n * of['sizes.length'], formula: `${n} L`, source: `${practice}: ${note}` });
const stream = { plateSetting: 'stream' };
const extents: Definition[] = [
  ways('domainUpstream', [lengths(0.5, stream, 'ahead of the edge, with slip, 0.3 to 1 L'), lengths(0.75, { plateSetting: ['upright', 'inclined'] }, 'below the plate, 0.5 to 1 L'), lengths(1, { plateSetting: ['unstable', 'stable'] }, 'to the sides')]),
  ways('domainDownstream', [way({ needs: [], when: stream, value: () => 0, formula: 'L_dn = 0', source: `${practice}: the outlet stands at the end of an attached layer` }), lengths(1.5, { plateSetting: ['upright', 'inclined'] }, 'above the plate, 1 to 2 L'), lengths(1, { plateSetting: ['unstable', 'stable'] }, 'to the sides')]),
  ways('domainAbove', [layersOr(10, 0.5, stream), layersOr(10, 1, { plateSetting: ['upright', 'inclined'] }), lengths(3, { plateSetting: ['unstable', 'stable'] }, 'above, 2 to 3 L')]),
  ways('regionAlong@surface', [along('L')]),
  ways('regionAlong@outside', [way({ needs: ['domainUpstream', 'domainDownstream'], value: ({ domainUpstream, domainDownstream }) => domainUpstream + domainDownstream, formula: 'L_up + L_dn', source: practice })]),
  ways('regionAcross', [way({ needs: ['domainAbove'], value: ({ domainAbove }) => domainAbove, formula: 'L_a', source: practice })]),
  ways('regionSpan', [
    way({ needs: ['sizes.width'], value: (of) => of['sizes.width'], formula: 'W', source: geometry }),
    way({ needs: ['boundaryLayerThickness'], when: { infiniteDepth: 'yes' }, scatter: 0.5, value: ({ boundaryLayerThickness }) => 4 * boundaryLayerThickness, formula: '4 delta, ends repeating', source: `${practice}: some integral lengths` }),
  ]),
  ways('regionCoarsening@outside', [way({ needs: [], value: () => 2, formula: 'a_c = 2', source: practice })]),
  ways('coreLength', [along('L_c = L')]),
  ...([['Coarse', 50, 40], ['Medium', 100, 80], ['Fine', 200, 160]] as const).map(([which, moving, resting]) => ways(`coreCells${which}`, [
    way({ needs: [], when: stream, value: () => moving, formula: `n_c = ${moving}`, source: practice }),
    way({ needs: [], when: { plateSetting: still }, value: () => resting, formula: `n_c = ${resting}`, source: practice }),
  ])),
];

export const plate: Flow = {
  id: 'plate',
  title: 'Flat plate along a stream, or in still fluid',
  lengthIs: 'length along the stream or up the plate; area over perimeter of a level plate in still fluid',
  speedIs: 'free stream; buoyant speed in still fluid',
  sizes: [
    { key: 'length', name: 'length along the stream, or upwards', unit: 'm' },
    { key: 'width', name: 'width across the stream', unit: 'm', infinite: true },
    { key: 'unheatedStart', name: 'length before the heating begins', unit: 'm', optional: true },
  ],
  walls: [],
  answers: ['heatRate', 'heatTransferCoefficient', 'nusselt', 'wallTemperature', 'wallShear', 'skinFrictionCoefficient', 'boundaryLayerThickness', 'thermalLayerThickness'],
  stations: ['worst', 'target'],
  regions: ['surface', 'outside'],
  words: { flow: 'plate', flowClass: 'body', wallBounded: 'yes', attached: 'yes', separated: 'no', ductSection: 'flat' },
  definitions: [...setting, ...scales, ...plateStream, ...plateStill, ...extents],
  leastRegion: 'Two-dimensional along a stream and on an upright plate. Level, hot side up: the whole plate in three dimensions. Level, hot side down: half, in two.',
  cuts: [
    { option: 'two-dimensional', holdsIf: 'along a stream or upright, away from the side edges, averaged or laminar flow; level with the hot side down' },
    { option: 'mirror-left-right', holdsIf: 'level with the hot side down, or one of two equal sides of an upright plate' },
  ],
  domain: [
    { side: 'upstream', id: 'domainUpstream', source: 'common practice' },
    { side: 'downstream', id: 'domainDownstream', source: 'common practice' },
    { side: 'above', id: 'domainAbove', source: 'common practice: ten layers' },
  ],
  boundaries: [
    streaming('inlet, ahead of the edge', { when: { plateSetting: 'stream' } }),
    slipping('strip before the edge', { when: { plateSetting: 'stream' }, temperature: 'adiabatic' }),
    wall('plate', 'wall'),
    open('top', { when: { plateSetting: 'stream' } }),
    open('outlet', { when: { plateSetting: 'stream' }, temperature: 'no slope', turbulence: 'no slope' }),
    entraining('far side and below', { when: { plateSetting: ['upright', 'inclined'] } }),
    entraining('all sides', { when: { plateSetting: ['unstable', 'stable'] } }),
    open('above', { when: { plateSetting: still }, velocity: 'leaves freely', pressure: 'value 0 above the hydrostatic pressure of the fluid at {farTemperature}', turbulence: 'no slope; low where it returns' }),
  ],
  simplifications: [
    'Two-dimensional and steady holds unless the side edges, the turbulence of the stream or the place of transition matter.',
    'The leading edge is singular: leave the first 5 % of the length out of every comparison.',
    'Upright in still fluid: an adiabatic floor or edge changes the first 5 % only; a temperature of the far fluid that rises by more than a tenth of the difference over the height matters.',
    'Level with the hot side up: steady and two-dimensional is wrong above Ra = 1e5; heat radiation competes with every plate in still gas.',
    'An inclined plate in still fluid is taken as upright with g sin(theta), from 30 degrees on: the lower side of a hot plate, laminar.',
  ],
  look: {
    mustShow: [
      'laminar: delta = 4.91 x Re_x^(-1/2), u/U 0.330, 0.630, 0.846, 0.956, 0.992 at y sqrt(U/(nu x)) = 1 to 5',
      'displacement over momentum thickness 2.59 laminar, 1.3 to 1.4 turbulent; skin friction rising at the transition',
      'upright in still fluid: both layers growing as x^(1/4), the peak of speed well inside the thermal layer, quiet level inflow',
      'level, hot side up: cells and plumes, only the mean in time is steady; hot side down: inflow from all edges',
    ],
    probes: ['a third of the layer at 0.2, 0.5 and 0.9 of the length', 'one and a half layers away: U constant to 1 %', 'still fluid: the peak at half height and three layers away, below 2 % of the peak'],
    wrong: [
      'skin friction high at the edge only: the singular edge, leave 5 % out',
      'a layer at the upper boundary: domain too low; speed outside rising: boundary pushes the stream',
      'transition at the inlet: inlet turbulence',
      'still fluid: recirculation along the far boundary, or far temperature rising: the box is closed or too short',
    ],
  },
  ladder: plateLadder,
};
