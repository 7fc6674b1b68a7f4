import { blendRegimes, bordaCarnot, colebrook, gnielinski, laminarNusselt, petukhovFriction, planeStepReattachment, stepReattachment, turbulentStepReattachment } from '../quantities/index.ts';
import { quantity, way, ways, type Definition } from '../workings/index.ts';

const definition = 'definition';
const practice = 'common practice';
const armaly = 'Armaly, Durst, Pereira and Schoenung, J. Fluid Mech. 127 (1983) 473';
const laminar = { regime: 'laminar' };
const turbulent = { regime: 'turbulent' };
const re = ['backwardStepReynolds'] as const;
/** Smooth flat duct: circular law on two thirds of D_h. */
const channelFriction = (reynolds: number): number => colebrook({ reynolds: (2 * reynolds) / 3, relativeRoughness: 0 });

const regime: Definition[] = [
  quantity('backwardStepReynolds', { symbol: 'Re_D', name: 'Reynolds number on twice the inlet height', unit: '1' }, [way({ needs: ['reynoldsBulk', 'sizes.inletHeight', 'sizes.stepHeight'], value: (of) => (2 * of.reynoldsBulk * of['sizes.inletHeight']) / of['sizes.stepHeight'], formula: 'Re_D = 2 U H_1/nu', source: definition })]),
  ways('regimeGroup', [way({ needs: re, value: ({ backwardStepReynolds }) => backwardStepReynolds, symbol: 'Re', formula: 'Re on 2 H_1', source: definition })]),
  ways('regimeLow', [way({ needs: [], scatter: 0.1, value: () => 1200, formula: 'Re_lo = 1200', source: armaly })]),
  ways('regimeHigh', [way({ needs: [], scatter: 0.1, value: () => 6600, formula: 'Re_hi = 6600', source: armaly })]),
  ways('unsteadyGroup', [way({ needs: re, value: ({ backwardStepReynolds }) => backwardStepReynolds, symbol: 'Re', formula: 'Re on 2 H_1', source: definition })]),
  ways('unsteadyFrom', [way({ needs: [], scatter: 0.2, value: () => 1200, formula: 'Re_on = 1200', source: `${armaly}: steady until transition, three-dimensional from 400` })]),
];

const expansions = [1.8, 2.1] as const;
const lengths: Definition[] = [
  quantity('backwardStepReattachment', { symbol: 'x_R/h', name: 'reattachment length over step height', unit: '1' }, [
    way({ needs: [...re, 'backwardStepExpansion'], when: laminar, range: { backwardStepReynolds: [100, 800], backwardStepExpansion: expansions }, scatter: 0.12, value: ({ backwardStepReynolds }) => stepReattachment({ reynolds: backwardStepReynolds }), formula: 'x_R/h = 3, 5, 8, 14.1 at Re_D = 100, 200, 389, 800, measured', source: armaly, note: 'three-dimensional above Re_D 400: plane runs stay short of it' }),
    way({ needs: [...re, 'regimeLow', 'regimeHigh', 'backwardStepExpansion'], when: { regime: 'transitional' }, scatter: 0.4, value: (of) => blendRegimes({ reynolds: of.backwardStepReynolds, low: of.regimeLow, high: of.regimeHigh, laminar: stepReattachment({ reynolds: of.regimeLow }), turbulent: turbulentStepReattachment({ expansion: of.backwardStepExpansion }) }), formula: 'straight from laminar at Re_lo to turbulent at Re_hi', source: `${practice}; the length falls through the transition, ${armaly}` }),
    way({ needs: ['backwardStepExpansion'], when: turbulent, range: { backwardStepExpansion: [1.1, 1.7] }, scatter: 0.1, value: ({ backwardStepExpansion }) => turbulentStepReattachment({ expansion: backwardStepExpansion }), formula: 'x_R/h = 6.26, 6.28, 7 at ER = 1.125, 1.2, 1.5', source: 'Driver and Seegmiller, AIAA J. 23 (1985) 163; Le, Moin and Kim, J. Fluid Mech. 330 (1997) 349; Kim, Kline and Johnston, J. Fluids Eng. 102 (1980) 302' }),
  ]),
  quantity('backwardStepReattachmentPlane', { symbol: 'x_R/h', name: 'the same of a plane computation at expansion ratio 2', unit: '1' }, [
    way({ needs: [...re, 'backwardStepExpansion'], when: { ...laminar, inletProfile: 'developed' }, range: { backwardStepReynolds: [100, 800], backwardStepExpansion: expansions }, scatter: 0.05, value: ({ backwardStepReynolds }) => planeStepReattachment({ reynolds: backwardStepReynolds, inlet: 'channel' }), formula: 'x_R/h = 2.92, 8.24, 11.83 at Re_D = 100, 400, 800, inlet channel ahead', source: 'Erturk, Comput. Fluids 37 (2008) 633, from memory' }),
    way({ needs: [...re, 'backwardStepExpansion'], when: laminar, range: { backwardStepReynolds: [100, 800], backwardStepExpansion: expansions }, scatter: 0.05, value: ({ backwardStepReynolds }) => planeStepReattachment({ reynolds: backwardStepReynolds, inlet: 'edge' }), formula: 'x_R/h = 3.22, 8.65, 12.20 at Re_D = 100, 400, 800, parabola at the edge', source: 'Gartling, Int. J. Numer. Methods Fluids 11 (1990) 953' }),
  ]),
  ways('reattachmentLength', [way({ needs: ['backwardStepReattachment', 'sizes.stepHeight'], value: (of) => of.backwardStepReattachment * of['sizes.stepHeight'], formula: 'x_R = (x_R/h) h', source: definition })]),
  ways('wakeLength', [way({ needs: ['reattachmentLength', 'sizes.stepHeight'], value: (of) => of.reattachmentLength + 5 * of['sizes.stepHeight'], formula: 'x_R + 5 h', source: practice })]),
  ways('boundaryLayerThickness', [way({ needs: ['sizes.inletHeight'], value: (of) => of['sizes.inletHeight'] / 2, formula: 'delta = H_1/2', source: 'developed channel ahead of the step' })]),
  ways('thermalLayerThickness', [way({ needs: ['sizes.stepHeight'], scatter: 0.5, value: (of) => of['sizes.stepHeight'] / 2, formula: 'delta_T = h/2 around reattachment', source: practice })]),
  ways('entranceLength', [way({ needs: ['sizes.stepHeight'], scatter: 0.4, value: (of) => 35 * of['sizes.stepHeight'], formula: 'recovery over 20 to 50 h', source: practice })]),
  ways('peakOverMean', [way({ needs: [], when: { regime: ['laminar', 'transitional'] }, value: () => 1.5, formula: 'u_max/U = 1.5', source: 'momentum balance between parallel plates' }), way({ needs: [], when: turbulent, scatter: 0.05, value: () => 1.15, formula: 'u_max/U = 1.15', source: practice })]),
];

const momentum: Definition[] = [
  ways('frictionLaminar', [way({ needs: re, value: ({ backwardStepReynolds }) => 96 / backwardStepReynolds, formula: 'f = 96/Re_D of the channel ahead', source: 'momentum balance between parallel plates' })]),
  ways('frictionTurbulent', [way({ needs: re, range: { backwardStepReynolds: [4e3, 1e7] }, scatter: 0.08, value: ({ backwardStepReynolds }) => channelFriction(backwardStepReynolds), formula: '1/sqrt(f) = -2 log10(2.51/(Re sqrt(f))), Re on 2/3 D_h, channel ahead', source: 'Colebrook, J. Inst. Civ. Eng. 11 (1939) 133, smooth; Jones, J. Fluids Eng. 98 (1976) 173' })]),
  ways('frictionBetween', [way({ needs: [...re, 'regimeLow', 'regimeHigh'], scatter: 0.4, value: (of) => blendRegimes({ reynolds: of.backwardStepReynolds, low: of.regimeLow, high: of.regimeHigh, laminar: 96 / of.regimeLow, turbulent: channelFriction(of.regimeHigh) }), formula: 'f straight in Re from laminar to turbulent, channel ahead', source: practice })]),
  ...(['pressureDropPlain', 'pressureDrop'] as const).map((id) => ways(id, [way({ needs: ['backwardStepExpansion', 'densityBulk', 'speedBulk'], scatter: 0.15, value: (of) => (bordaCarnot({ areaRatio: 1 / of.backwardStepExpansion }) * of.densityBulk * of.speedBulk ** 2) / 2, formula: 'dp_0 = (1 - 1/ER)^2 rho U^2/2, loss of total pressure', source: 'Borda 1766, Carnot 1803; momentum balance, even profiles', note: 'the static pressure rises; friction of the walls comes on top' })])),
  ways('wallShear@walls.bottom/target', [way({ needs: ['densityBulk', 'speedBulk'], scatter: 0.5, value: ({ densityBulk, speedBulk }) => (0.0025 * densityBulk * speedBulk ** 2) / 2, formula: '|tau_w| = 0.0025 rho U^2/2 behind the step, away from reattachment', source: practice })]),
  ways('frictionReynolds', [way({ needs: ['frictionVelocityPlain', 'gap', 'kinematicViscosityBulk'], value: (of) => (of.frictionVelocityPlain * of.gap) / (2 * of.kinematicViscosityBulk), formula: 'delta+ = u_tau (H_1/2)/nu, channel ahead', source: definition })]),
  quantity('backwardStepSheddingFrequency', { symbol: 'f_v', name: 'frequency of the large vortices', unit: 'Hz' }, [way({ needs: ['speed', 'sizes.stepHeight'], when: { regime: ['transitional', 'turbulent'] }, scatter: 0.3, value: (of) => (0.2 * of.speed) / of['sizes.stepHeight'], formula: 'f = 0.2 U/h', source: 'Eaton and Johnston, AIAA J. 19 (1981) 1093' })]),
  quantity('backwardStepFlappingFrequency', { symbol: 'f_l', name: 'frequency of the flapping bubble', unit: 'Hz' }, [way({ needs: ['speed', 'sizes.stepHeight'], when: { regime: ['transitional', 'turbulent'] }, scatter: 0.4, value: (of) => (0.065 * of.speed) / of['sizes.stepHeight'], formula: 'f = 0.065 U/h', source: 'Eaton and Johnston, AIAA J. 19 (1981) 1093; from memory of this work' })]),
  ways('strouhal', [way({ needs: [], when: { regime: ['transitional', 'turbulent'] }, scatter: 0.3, value: () => 0.2, formula: 'St = 0.2 on h', source: 'Eaton and Johnston, AIAA J. 19 (1981) 1093' })]),
];

/** Channel behind the step, one wall heated, on D_h = 2 (H_1 + h): the same Reynolds number as ahead. */
const farNeeds = [...re, 'prandtlBulk', 'sizes.inletHeight', 'sizes.stepHeight'] as const;
const onStep = (of: Readonly<Record<(typeof farNeeds)[number], number>>): number => of['sizes.stepHeight'] / (2 * (of['sizes.inletHeight'] + of['sizes.stepHeight']));
const far = 'developed channel far behind; around reattachment 2 to 9 times as much';
const developed = (reynolds: number, prandtl: number): number => gnielinski({ reynolds, prandtl, friction: petukhovFriction({ reynolds }) });
const heat: Definition[] = [
  ways('nusseltLaminar', (['temperature', 'flux'] as const).map((k) => way({ needs: farNeeds, when: { wallKind: k === 'flux' ? 'flux' : ['temperature', 'coefficient', 'adiabatic'] }, scatter: 1, value: (of) => laminarNusselt.oneSided[k] * onStep(of), formula: `Nu = ${k === 'flux' ? '70/13' : '4.861'} h/(2 (H_1 + h)), lower wall heated`, source: 'Shah and London, Laminar Flow Forced Convection in Ducts (1978), chapter VI', note: far }))),
  ways('nusseltBetween', [way({ needs: [...farNeeds, 'nusseltLaminar', 'regimeLow', 'regimeHigh'], scatter: 1, value: (of) => blendRegimes({ reynolds: of.backwardStepReynolds, low: of.regimeLow, high: of.regimeHigh, laminar: of.nusseltLaminar, turbulent: developed(of.regimeHigh, of.prandtlBulk) * onStep(of) }), formula: 'straight in Re from laminar to turbulent', source: practice, note: far })]),
  ways('nusseltTurbulent', [way({ needs: farNeeds, range: { backwardStepReynolds: [3e3, 5e6], prandtlBulk: [0.5, 2000] }, scatter: 1, value: (of) => developed(of.backwardStepReynolds, of.prandtlBulk) * onStep(of), formula: 'Nu = Gnielinski on 2 (H_1 + h), times h/(2 (H_1 + h))', source: 'Gnielinski, Int. Chem. Eng. 16 (1976) 359', note: far })]),
  quantity('backwardStepPeakNusselt', { symbol: 'Nu_max', name: 'largest local Nusselt number, on twice the inlet height', unit: '1' }, [way({ needs: re, when: { medium: 'gas', regime: 'turbulent' }, range: { backwardStepReynolds: [4e3, 1e5] }, scatter: 0.25, value: ({ backwardStepReynolds }) => 0.2 * backwardStepReynolds ** (2 / 3), formula: 'Nu_max = 0.20 Re_D^(2/3), near x_R', source: 'Zemanick and Dougall, J. Heat Transfer 92 (1970) 53, sudden pipe expansion, air' })]),
];

/** What happens behind a sudden step: reattachment, loss, heat. */
export const backwardStepLaws: Definition[] = [...regime, ...lengths, ...momentum, ...heat];
