import { quantity, way, wordWay, type Definition } from '../workings/index.ts';

const practice = 'common practice';

/** Unsteadiness of the flow itself and that imposed from outside. */
export const unsteady: Definition[] = [
  quantity('unsteadyRatio', { symbol: 'x_u/x_on', name: 'group over the value at which the flow becomes unsteady', unit: '1' }, [
    way({ needs: ['unsteadyGroup', 'unsteadyFrom'], value: ({ unsteadyGroup, unsteadyFrom }) => unsteadyGroup / unsteadyFrom, formula: 'x_u/x_on', source: 'regime table of the flow' }),
  ]),
  quantity('turbulentSteadiness', { symbol: '', name: 'how the mean of turbulent flow is customarily had', unit: 'word', words: ['steady', 'doubtful', 'unsteady'] }, [
    wordWay({ needs: [], when: { targetPeak: 'yes' }, word: () => 'unsteady', formula: 'a peak, an rms or a spectrum is asked for', source: practice }),
    wordWay({ needs: [], when: { separated: 'yes', flowClass: 'body' }, word: () => 'unsteady', formula: 'a long body with separation sheds vortices', source: practice }),
    wordWay({ needs: [], when: { separated: 'yes' }, word: () => 'doubtful', formula: 'separation inside a passage', source: practice }),
    wordWay({ needs: [], when: { flowClass: 'enclosure' }, word: () => 'doubtful', formula: 'turbulent flow in a cavity', source: practice }),
    wordWay({ needs: [], when: { attached: 'yes' }, word: () => 'steady', formula: 'attached flow, means asked for', source: practice }),
    wordWay({ needs: [], word: () => 'doubtful', formula: 'no customary answer for this flow', source: practice }),
  ]),
  quantity('angularFrequency', { symbol: 'omega_p', name: 'angular frequency of what is imposed', unit: 'rad/s' }, [
    way({ needs: ['time.period'], value: (of) => (2 * Math.PI) / of['time.period'], formula: 'omega = 2 pi/period', source: 'definition' }),
    way({ needs: ['time.ramp'], value: (of) => Math.PI / (2 * of['time.ramp']), formula: 'omega = pi/(2 t_ramp)', source: practice }),
  ]),
  quantity('imposedTime', { symbol: 't_p', name: 'time of what is imposed: period, ramp or duration', unit: 's' }, ['time.period', 'time.ramp', 'time.duration'].map((path) => way({ needs: [path], value: (of) => of[path] as number, formula: path, source: 'the case' }))),
  quantity('womersleyImposed', { symbol: 'Wo', name: 'Womersley number of what is imposed', unit: '1' }, [
    way({ needs: ['hydraulicDiameter', 'angularFrequency', 'kinematicViscosity'], when: { flowClass: 'internal' }, value: ({ hydraulicDiameter, angularFrequency, kinematicViscosity }) => (hydraulicDiameter / 2) * Math.sqrt(angularFrequency / kinematicViscosity), formula: 'Wo = (D_h/2) sqrt(omega/nu)', source: 'Womersley 1955' }),
  ]),
  quantity('imposedRateTurbulent', { symbol: 'omega R/u_tau', name: 'imposed change against the turbulent time of the passage', unit: '1' }, [
    way({ needs: ['angularFrequency', 'hydraulicDiameter', 'frictionVelocityPlain'], when: { flowClass: 'internal' }, value: ({ angularFrequency, hydraulicDiameter, frictionVelocityPlain }) => (angularFrequency * hydraulicDiameter) / (2 * frictionVelocityPlain), formula: 'omega (D_h/2)/u_tau', source: practice }),
  ]),
  quantity('imposedRateBody', { symbol: 'omega L/U', name: 'imposed change against the passage of the stream', unit: '1' }, [
    way({ needs: ['angularFrequency', 'length', 'speed'], value: ({ angularFrequency, length, speed }) => (angularFrequency * length) / speed, formula: 'omega L/U', source: practice }),
  ]),
  quantity('fourierImposed', { symbol: 'Fo_p', name: 'Fourier number of what is imposed', unit: '1' }, [
    way({ needs: ['thermalDiffusivity', 'imposedTime', 'gap'], value: ({ thermalDiffusivity, imposedTime, gap }) => (thermalDiffusivity * imposedTime) / (gap / 2) ** 2, formula: 'Fo_p = alpha t_p/(H/2)^2', source: 'definition' }),
    way({ needs: ['thermalDiffusivity', 'imposedTime', 'length'], value: ({ thermalDiffusivity, imposedTime, length }) => (thermalDiffusivity * imposedTime) / length ** 2, formula: 'Fo_p = alpha t_p/L^2', source: 'definition' }),
  ]),
  quantity('womersleyFactorFlow', { symbol: 'F_Wo', name: 'amplitude of the flow at a pressure swing, true over quasi-steady', unit: '1' }, [
    way({ needs: ['womersleyImposed'], when: { flowClass: 'internal', regime: 'laminar', ductSection: 'round' }, scatter: 0.02, range: { womersleyImposed: [0, 3] }, value: ({ womersleyImposed: w }) => 1 / Math.sqrt(1 + 0.0285 * w ** 4), formula: 'F = 1/sqrt(1 + 0.0285 Wo^4)', source: 'fit to the exact solution of Womersley 1955 (0.999, 0.986, 0.825 at Wo 0.5, 1, 2)' }),
    way({ needs: [], value: () => 1, formula: 'F = 1', source: 'the effect does not act here' }),
  ]),
];
