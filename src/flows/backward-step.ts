import { quantity, way, ways, type Definition } from '../workings/index.ts';
import { backwardStepLaws } from './backward-step-laws.ts';
import { inlet, outlet, wall } from './boundaries.ts';
import type { Flow, Rung } from './define.ts';

const geometry = 'geometry';
const practice = 'common practice';
const steps = (n: number, formula: string, source: string, when: Record<string, string | string[]> = {}): ReturnType<typeof way> => way({ needs: ['sizes.stepHeight'], when, scatter: 0.3, value: (of) => n * of['sizes.stepHeight'], formula, source });

const scales: Definition[] = [
  quantity('backwardStepWidth', { symbol: 'W', name: 'width of the channel', unit: 'm' }, [
    way({ needs: ['sizes.width'], value: (of) => of['sizes.width'], formula: 'W as given', source: 'the case' }),
    way({ needs: [], when: { infiniteDepth: 'yes' }, value: () => 1, formula: 'W = 1 m', source: 'convention: streams and heat per metre of width', dimensional: 'the metre of width is a convention' }),
  ]),
  quantity('backwardStepRun', { symbol: 'L_2', name: 'length behind the step', unit: 'm' }, [
    way({ needs: ['sizes.length'], value: (of) => of['sizes.length'], formula: 'L as given', source: 'the case' }),
    way({ needs: ['domainDownstream'], value: ({ domainDownstream }) => domainDownstream, formula: 'L = L_dn', source: practice }),
  ]),
  quantity('backwardStepExpansion', { symbol: 'ER', name: 'height behind the step over that ahead of it', unit: '1' }, [way({ needs: ['sizes.inletHeight', 'sizes.stepHeight'], value: (of) => (of['sizes.inletHeight'] + of['sizes.stepHeight']) / of['sizes.inletHeight'], formula: 'ER = (H_1 + h)/H_1', source: 'definition' })]),
  ways('length', [way({ needs: ['sizes.stepHeight'], value: (of) => of['sizes.stepHeight'], formula: 'L = h', source: 'definition' })]),
  ways('hydraulicDiameter', [
    way({ needs: ['sizes.inletHeight', 'sizes.width'], when: { infiniteDepth: 'no' }, value: (of) => (2 * of['sizes.inletHeight'] * of['sizes.width']) / (of['sizes.inletHeight'] + of['sizes.width']), formula: 'D_h = 2 H_1 W/(H_1 + W) ahead of the step', source: geometry }),
    way({ needs: ['sizes.inletHeight'], value: (of) => 2 * of['sizes.inletHeight'], formula: 'D_h = 2 H_1 ahead of the step', source: geometry }),
  ]),
  ways('gap', [way({ needs: ['sizes.inletHeight'], value: (of) => of['sizes.inletHeight'], formula: 'H = H_1', source: geometry })]),
  ways('flowArea', [way({ needs: ['sizes.inletHeight', 'backwardStepWidth'], value: (of) => of['sizes.inletHeight'] * of.backwardStepWidth, formula: 'A = H_1 W', source: geometry })]),
  ways('wettedPerimeter', [way({ needs: ['backwardStepWidth'], value: ({ backwardStepWidth }) => 2 * backwardStepWidth, formula: 'P = 2 W', source: geometry })]),
  ways('flowLength', [way({ needs: ['backwardStepRun'], value: ({ backwardStepRun }) => backwardStepRun, formula: 'L_x = L', source: geometry })]),
  ways('span', [way({ needs: ['sizes.width'], value: (of) => of['sizes.width'], formula: 'L_z = W', source: geometry })]),
  ways('wallArea', [way({ needs: ['backwardStepRun', 'backwardStepWidth'], value: ({ backwardStepRun, backwardStepWidth }) => backwardStepRun * backwardStepWidth, formula: 'A_w = L W behind the step', source: geometry })]),
  ways('passageHeight', [
    way({ needs: ['backwardStepRun'], when: { axis: 'upright' }, value: ({ backwardStepRun }) => backwardStepRun, formula: 'H_g = L', source: geometry }),
    way({ needs: ['sizes.inletHeight', 'sizes.stepHeight'], value: (of) => of['sizes.inletHeight'] + of['sizes.stepHeight'], formula: 'H_g = H_1 + h', source: geometry }),
  ]),
];

const extents: Definition[] = [
  ways('domainUpstream', [steps(5, 'L_up = 5 h', `${practice}: profile given, 5 to 10 h`, { inletProfile: ['developed', 'power', 'log', 'table'] }), steps(10, 'L_up = 10 h', practice)]),
  ways('domainDownstream', [
    way({ needs: ['reattachmentLength', 'sizes.stepHeight'], scatter: 0.3, value: (of) => Math.max(30 * of['sizes.stepHeight'], of.reattachmentLength + 20 * of['sizes.stepHeight']), formula: 'L_dn = x_R + 20 h, at least 30 h', source: practice }),
    steps(30, 'L_dn = 30 h', practice),
  ]),
  ways('regionAlong@upstream', [way({ needs: ['domainUpstream'], value: ({ domainUpstream }) => domainUpstream, formula: 'L_up', source: practice })]),
  ways('regionAlong@separation', [way({ needs: ['reattachmentLength', 'sizes.stepHeight'], value: (of) => of.reattachmentLength + 5 * of['sizes.stepHeight'], formula: 'x_R + 5 h', source: practice })]),
  ways('regionAlong@recovery', [way({ needs: ['domainDownstream', 'reattachmentLength', 'sizes.stepHeight'], value: (of) => Math.max(of['sizes.stepHeight'], of.domainDownstream - of.reattachmentLength - 5 * of['sizes.stepHeight']), formula: 'L_dn - x_R - 5 h', source: practice })]),
  ways('regionAcross@upstream', [way({ needs: ['sizes.inletHeight'], value: (of) => of['sizes.inletHeight'], formula: 'H_1', source: geometry })]),
  ways('regionAcross', [way({ needs: ['sizes.inletHeight', 'sizes.stepHeight'], value: (of) => of['sizes.inletHeight'] + of['sizes.stepHeight'], formula: 'H_1 + h', source: geometry })]),
  ways('regionSpan', [way({ needs: ['sizes.width'], value: (of) => of['sizes.width'], formula: 'W', source: geometry }), steps(4, '4 h, ends repeating', practice, { infiniteDepth: 'yes' })]),
  ways('coreCellsCoarse', [way({ needs: [], value: () => 10, formula: 'n_c = 10 over h', source: practice })]),
  ways('coreCellsMedium', [way({ needs: [], value: () => 20, formula: 'n_c = 20 over h', source: practice })]),
  ways('coreCellsFine', [way({ needs: [], value: () => 40, formula: 'n_c = 40 over h', source: practice })]),
  ways('regionStretch@separation', [way({ needs: [], value: () => 2, formula: 'a_x = 2: h/40 across, h/20 along', source: practice })]),
  ways('regionStretch@recovery', [way({ needs: [], value: () => 5, formula: 'a_x = 5', source: practice })]),
  ways('regionCoarsening@recovery', [way({ needs: [], value: () => 2, formula: 'a_c = 2', source: practice })]),
];

const rungs: Definition[] = ([['Low', 100], ['High', 800]] as const).map(([which, re]) => quantity(`backwardStepRung${which}`, { symbol: 'Re', name: 'Reynolds number of a rung', unit: '1' }, [way({ needs: [], value: () => re, formula: `Re = ${re}`, source: 'the reference of the rung' })]));
const ladder: Rung[] = [
  { reference: 'poiseuille-channel', changes: 'developed laminar channel ahead of the step', compares: 'frictionTimesReynolds', with: {}, limit: 0.005, order: 2, ifMissed: 'compare away from the inlet; factor on twice the height' },
  { reference: 'laminar-step', changes: 'step at Re 100, expansion ratio 2, parabola given at the edge, plane', compares: 'reattachmentOverStep', with: { reynoldsChannel: 'backwardStepRungLow' }, limit: 0.02, order: 2, ifMissed: 'parabola at the edge itself with no speed across; other inlets have other lengths; outlet 20 h behind' },
  { reference: 'laminar-step', changes: 'the same at Re 800, eddy on the upper wall', compares: 'reattachmentOverChannel', with: { reynoldsChannel: 'backwardStepRungHigh' }, limit: 0.02, order: 2, ifMissed: 'cells in the long shear layer; outlet beyond the upper eddy; iteration not ended' },
  { reference: 'turbulent-step', changes: 'turbulent, expansion ratio 1.125', compares: 'reattachmentOverStep', with: {}, when: { regime: ['transitional', 'turbulent'] }, limit: 0.1, ifMissed: 'layer at the lip; closure: two-equation models with wall laws stay 15 to 25 % short' },
];

export const backwardStep: Flow = {
  id: 'backward-step',
  title: 'Sudden step in a channel',
  lengthIs: 'step height',
  speedIs: 'mean at the inlet',
  sizes: [
    { key: 'inletHeight', name: 'height of the channel before the step', unit: 'm' },
    { key: 'stepHeight', name: 'height of the step', unit: 'm' },
    { key: 'width', name: 'width of the channel', unit: 'm', infinite: true },
    { key: 'length', name: 'length behind the step', unit: 'm', optional: true },
  ],
  walls: ['top', 'bottom'],
  targetWall: 'bottom',
  answers: ['pressureDrop', 'outletTemperature', 'heatRate', 'heatTransferCoefficient', 'nusselt', 'wallTemperature', 'frictionFactorDarcy', 'wallShear', 'entranceLength', 'reattachmentLength'],
  stations: ['worst', 'target'],
  regions: ['upstream', 'separation', 'recovery'],
  words: { flow: 'backward-step', flowClass: 'internal', imposedFlow: 'yes', wallBounded: 'yes', attached: 'no', separated: 'yes', ductSection: 'flat' },
  definitions: [...scales, ...backwardStepLaws, ...extents, ...rungs],
  leastRegion: 'Two-dimensional for laminar flow up to Re 400 on twice the inlet height, and for averaged turbulence; the whole width above that in laminar flow.',
  cuts: [{ option: 'two-dimensional', holdsIf: 'width above ten step heights; laminar up to Re 400 on twice the inlet height, or averaged turbulence' }],
  domain: [
    { side: 'upstream', id: 'domainUpstream', source: 'common practice' },
    { side: 'downstream', id: 'domainDownstream', source: 'common practice: 20 step heights behind reattachment' },
  ],
  boundaries: [
    inlet('inlet, ahead of the step', { velocity: [{ says: 'value: developed profile with mean {speed}', when: { inletProfile: 'developed' } }, { says: 'value: the given profile with mean {speed}; its layer at the edge belongs to the result', when: { inletProfile: ['power', 'log', 'table'] } }, { says: 'value: even, {speed}; a thin layer stands at the edge' }] }),
    wall('upper wall', 'walls.top'),
    wall('wall ahead of the step, and its face', 'walls.bottom', { temperature: 'adiabatic' }),
    wall('lower wall behind the step', 'walls.bottom'),
    outlet('outlet', { temperature: 'no slope; returns at {inletTemperature}' }),
  ],
  simplifications: [
    'Steady and two-dimensional holds for laminar flow up to Re 400 on twice the inlet height; steady but three-dimensional from there to 1200.',
    'Reattachment of steady averaged models: 15 to 25 % short with k-epsilon and wall laws, 0 to 10 % long with shear-stress models; a plane unsteady averaged run has no meaning.',
    'A symmetric expansion of 1 to 3 loses its symmetry at Re 40 on half the inlet height and the peak speed: no mirror there.',
    'The laminar length is measured at an expansion ratio of 1.94 and a developed inlet; other inlets shift it by 5 to 10 %.',
  ],
  look: {
    mustShow: [
      'reattachment at the printed length; second eddy on the upper wall, laminar, above Re 400 to 450; corner eddy of 1 to 1.8 h, turbulent',
      'reverse speed of 0.15 to 0.25 U, largest negative shear near 0.6 x_R',
      'pressure rise of 2 s (1 - s) dynamic pressures, s the ratio of sections, by x_R + 5 to 10 h',
      'heated: Nusselt number largest at 0.9 to 1.0 x_R',
    ],
    probes: ['wall shear at 0.6 x_R, with x_R = {reattachmentLength}', 'a tenth of h off the wall at x_R - h and x_R + h', 'x = 4 h at lip height', 'x = 20 h'],
    wrong: ['length moves by more than 10 % with the mesh: not yet there', 'no corner eddy, turbulent: wall law', 'length rises with the place of the outlet: outlet'],
  },
  ladder,
};
