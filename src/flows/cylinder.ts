import { quantity, way, ways, type Definition } from '../workings/index.ts';
import { cylinderLaws } from './cylinder-laws.ts';
import { entraining, open, slipping, stream as streaming, wall } from './boundaries.ts';
import type { Flow, Rung } from './define.ts';

const geometry = 'geometry';
const practice = 'common practice';
const stream = { imposedFlow: 'yes' };
const still = { imposedFlow: 'no' };
const diameters = (n: number, formula: string, source: string, when: Record<string, string | string[]> = {}): ReturnType<typeof way> => way({ needs: ['sizes.diameter'], when, scatter: 0.3, value: (of) => n * of['sizes.diameter'], formula, source });

const scales: Definition[] = [
  quantity('cylinderSpan', { symbol: 'B', name: 'length of the cylinder', unit: 'm' }, [
    way({ needs: ['sizes.span'], value: (of) => of['sizes.span'], formula: 'B as given', source: 'the case' }),
    way({ needs: [], when: { infiniteDepth: 'yes' }, value: () => 1, formula: 'B = 1 m', source: 'convention: force and heat per metre', dimensional: 'the metre of length is a convention' }),
  ]),
  ways('length', [way({ needs: ['sizes.diameter'], value: (of) => of['sizes.diameter'], formula: 'L = D', source: 'definition' })]),
  ways('speed', [way({ needs: ['gravity', 'thermalExpansion', 'temperatureDifference', 'length'], when: still, scatter: 0.5, value: (of) => Math.sqrt(of.gravity * Math.abs(of.thermalExpansion) * of.temperatureDifference * of.length), formula: 'U_N = sqrt(g |beta| dT D)', source: 'buoyancy against inertia' })]),
  ways('flowLength', [way({ needs: ['sizes.diameter'], value: (of) => of['sizes.diameter'], formula: 'L_x = D', source: geometry })]),
  ways('flowArea', [way({ needs: ['sizes.channelHeight', 'cylinderSpan'], value: (of) => of['sizes.channelHeight'] * of.cylinderSpan, formula: 'A = H B', source: geometry })]),
  ways('span', [way({ needs: ['sizes.span'], value: (of) => of['sizes.span'], formula: 'L_z = B', source: geometry })]),
  ways('wallArea', [way({ needs: ['sizes.diameter', 'cylinderSpan'], value: (of) => Math.PI * of['sizes.diameter'] * of.cylinderSpan, formula: 'A_w = pi D B', source: geometry })]),
  ways('passageHeight', [
    way({ needs: ['cylinderSpan'], when: { axis: 'upright' }, value: ({ cylinderSpan }) => cylinderSpan, formula: 'H_g = B', source: geometry }),
    way({ needs: ['sizes.diameter'], when: { axis: ['level', 'inclined'] }, value: (of) => of['sizes.diameter'], formula: 'H_g = D', source: geometry }),
  ]),
];

const extents: Definition[] = [
  ways('domainUpstream', [diameters(15, 'L_up = 15 D', `${practice}, 10 to 15 D`, stream), diameters(5, 'L_up = 5 D below', practice, still)]),
  ways('domainDownstream', [diameters(25, 'L_dn = 25 D', `${practice}, 20 to 30 D`, stream), diameters(20, 'L_dn = 20 D above', practice, still)]),
  ways('domainSides', [
    way({ needs: ['sizes.channelHeight', 'sizes.diameter'], when: stream, value: (of) => (of['sizes.channelHeight'] - of['sizes.diameter']) / 2, formula: 'L_s = (H - D)/2: the walls that are there', source: geometry }),
    diameters(20, 'L_s = 20 D', `${practice}: blockage below 3 %`, stream),
    diameters(10, 'L_s = 10 D; a wire with Ra below 1 above 100 D', practice, still),
  ]),
  ways('regionAlong@near', [diameters(2 * Math.PI, '2 pi D, a ring from D/2 to 1.5 D', practice)]),
  ways('regionAlong@wake', [diameters(10, '10 D', practice)]),
  ways('regionAlong@far', [way({ needs: ['domainUpstream', 'domainDownstream', 'sizes.diameter'], value: (of) => of.domainUpstream + of.domainDownstream + of['sizes.diameter'], formula: 'L_up + D + L_dn', source: practice })]),
  ways('regionAcross@near', [way({ needs: ['sizes.diameter', 'domainSides'], value: (of) => Math.min(of['sizes.diameter'], of.domainSides), formula: 'D, at most to the wall beside', source: practice })]),
  ways('regionAcross@wake', [way({ needs: ['sizes.diameter', 'domainSides'], value: (of) => Math.min(4 * of['sizes.diameter'], 2 * of.domainSides + of['sizes.diameter']), formula: '4 D, at most the whole', source: practice })]),
  ways('regionAcross@far', [way({ needs: ['sizes.diameter', 'domainSides'], value: (of) => 2 * of.domainSides + of['sizes.diameter'], formula: '2 L_s + D', source: practice })]),
  ways('regionSpan', [
    diameters(2 * Math.PI, '2 pi D, ends repeating: the slice that the chosen cut leaves', `${practice}; pi D at least for the eddies along the span`, { 'choice.dimension-and-cuts': 'periodic-along-span' }),
    way({ needs: ['sizes.span'], value: (of) => of['sizes.span'], formula: 'B', source: geometry }),
    diameters(Math.PI, 'pi D, ends repeating; 2 pi D preferred', practice, { infiniteDepth: 'yes' })]),
  ways('regionCoarsening@wake', [way({ needs: [], value: () => 2, formula: 'a_c = 2', source: `${practice}: 0.05 to 0.1 D along the wake` })]),
  ways('regionCoarsening@far', [way({ needs: [], value: () => 16, formula: 'a_c = 16', source: `${practice}, mean of a mesh that grows outwards` })]),
];

const rungs: Definition[] = [
  ...([['Steady', 20], ['Wake', 40], ['Shedding', 100]] as const).map(([which, re]) => quantity(`cylinderRung${which}`, { symbol: 'Re', name: 'Reynolds number of a rung', unit: '1' }, [way({ needs: [], value: () => re, formula: `Re = ${re}`, source: 'the reference of the rung' })])),
  ...([['Inner', 0.5], ['Outer', 5]] as const).map(([which, n]) => quantity(`cylinderRung${which}`, { symbol: 'r', name: 'radius of the ring of a rung', unit: 'm' }, [way({ needs: ['sizes.diameter'], value: (of) => n * of['sizes.diameter'], formula: `r = ${n} D`, source: 'choice of the rung' })])),
];

const ladder: Rung[] = [
  { reference: 'cylinder-in-channel', changes: 'Re 20 in the channel of the benchmark, steady', compares: 'dragCoefficient', with: { reynolds: 'cylinderRungSteady' }, when: stream, limit: 0.01, order: 2, ifMissed: 'cylinder 5 mm off the middle; coefficients with the mean speed; cells round the cylinder' },
  { reference: 'cylinder-in-channel', changes: 'Re 100 in the same channel, shedding', compares: 'strouhal', with: { reynolds: 'cylinderRungShedding' }, when: stream, limit: 0.01, ifMissed: 'step at most a hundredth of the period; scheme in time; record of 20 periods' },
  { reference: 'cylinder-free-stream', changes: 'Re 40 without walls, closed steady wake', compares: 'wakeOverDiameter', with: { reynolds: 'cylinderRungWake' }, when: stream, limit: 0.06, order: 2, ifMissed: 'sides at least 20 diameters away; cells in the wake; measured 2.13, computed 2.2 to 2.3' },
  { reference: 'cylinder-free-stream', changes: 'Re 100 without walls, shedding', compares: 'strouhal', with: { reynolds: 'cylinderRungShedding' }, when: stream, limit: 0.02, ifMissed: 'blockage; seed; step; record' },
  { reference: 'cylinder-free-stream', changes: 'the same, mean drag', compares: 'dragCoefficient', with: { reynolds: 'cylinderRungShedding' }, when: stream, limit: 0.03, ifMissed: 'blockage; cells at the front; whole periods in the mean' },
  { reference: 'shell-cylinder', changes: 'conduction in a ring of fluid at rest', compares: 'heatPerLength', with: { innerRadius: 'cylinderRungInner', outerRadius: 'cylinderRungOuter', temperatureDifference: 'temperatureDifference', thermalConductivity: 'thermalConductivity' }, when: still, limit: 0.005, order: 2, ifMissed: 'cells round the cylinder; wall gradient one-sided' },
  { reference: 'upright-plate-similarity', changes: 'laminar layer on the unrolled surface, upright', compares: 'heatSimilar', with: { prandtl: 'prandtl' }, when: { imposedFlow: 'no', axis: 'upright' }, limit: 0.01, order: 2, ifMissed: 'curvature of a thin cylinder; open boundaries; first 5 % left out' },
];

export const cylinder: Flow = {
  id: 'cylinder',
  title: 'Round cylinder across a stream, or in still fluid',
  lengthIs: 'diameter',
  speedIs: 'free stream, or the mean of a channel around; buoyant speed in still fluid',
  sizes: [
    { key: 'diameter', name: 'outer diameter', unit: 'm' },
    { key: 'span', name: 'length of the cylinder', unit: 'm', infinite: true },
    { key: 'channelHeight', name: 'height of the channel around the cylinder', unit: 'm', optional: true },
  ],
  walls: [],
  answers: ['heatRate', 'heatTransferCoefficient', 'nusselt', 'wallTemperature', 'dragCoefficient', 'dragForce', 'sheddingFrequency'],
  stations: ['worst', 'target'],
  regions: ['near', 'wake', 'far'],
  words: { flow: 'cylinder', flowClass: 'body', wallBounded: 'yes', attached: 'no', separated: 'yes', ductSection: 'other' },
  definitions: [...scales, ...cylinderLaws, ...extents, ...rungs],
  leastRegion: 'Half, two-dimensional, below Re 47; the whole, two-dimensional, from 47 to 180; three-dimensional above, a slice of pi D, better 2 pi D, of a long cylinder with its ends repeating, the whole span below 20 D. In still fluid: half, two-dimensional, steady, while the plume does not sway; upright: axisymmetric.',
  cuts: [
    { option: 'two-dimensional', holdsIf: 'a long cylinder below Re 180, or averaged turbulence of mean loads' },
    { option: 'mirror-top-bottom', holdsIf: 'steady wake: Re below 47 in an even stream' },
    { option: 'mirror-left-right', holdsIf: 'level in still fluid, Ra below 1e6: no swaying plume' },
    { option: 'axisymmetric', holdsIf: 'upright in still fluid' },
    { option: 'periodic-along-span', holdsIf: 'across a stream, three-dimensional wake, span of 20 D or more: the ends do not matter to means over the span' },
  ],
  domain: [
    { side: 'upstream', id: 'domainUpstream', source: 'common practice' },
    { side: 'downstream', id: 'domainDownstream', source: 'common practice' },
    { side: 'sides', id: 'domainSides', source: 'blockage below 3 %' },
  ],
  boundaries: [
    streaming('inlet', { when: stream }),
    wall('cylinder', 'wall'),
    slipping('sides', { when: stream, velocity: [{ says: 'sticks: the walls of the channel, {sizes.channelHeight} apart' }, { says: 'slips, {domainSides} away' }] }),
    open('outlet', { when: stream, velocity: [{ says: 'leaves freely; eddies pass out at {speed}' }], temperature: 'no slope', turbulence: 'no slope' }),
    entraining('sides and below', { when: still }),
    open('above', { when: still, pressure: 'value 0 above the hydrostatic pressure of the fluid at {farTemperature}', turbulence: 'no slope; low where it returns' }),
  ],
  simplifications: [
    'Attached below Re 5; closed steady wake to 47; laminar shedding to 180 or 190; three-dimensional beyond; drag crisis between 2e5 and 4e5.',
    'The steady half body holds only below Re 47: forced on the flow it gives a drag of 1.06 in place of 1.33 at Re 100, and no frequency.',
    'A two-dimensional unsteady run gives a drag about 10 % high at Re 300 and 50 % at Re 1000.',
    'Half of a level cylinder in still fluid fails once the plume sways, Ra from 1e6 to 1e7.',
    'Strouhal and drag between walls follow from the speed on the axis and the speed-up by the walls: 5 to 20 % at a blockage of a quarter.',
  ],
  look: {
    mustShow: [
      'pressure coefficient 1 at the front; separation 126 degrees from it at Re 40; 80 to 85 below the drag crisis, 120 to 140 beyond',
      'Re 20 and 40: closed wake 0.93 and 2.13 diameters long',
      'shedding: lift at f with mean zero, drag at 2 f; rows 5.3 D apart at Re 100',
      'level in still fluid: layer thinnest at the bottom, plume at the top',
    ],
    probes: ['1 and 2 D behind at half a diameter to each side', '5 D behind on the axis and 1 D to each side, D = {length}', 'surface at 90 degrees on both sides'],
    wrong: [
      'symmetric wake above Re 47: no seed, a mirror, or damping of the scheme',
      'drag swings at f, not 2 f: incidence or outlet',
      'mean lift not zero: record or mesh',
      'largest pressure coefficient above 1 by 2 %: inlet or total pressure',
    ],
  },
  ladder,
};
