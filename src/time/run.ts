import { quantity, way, type Definition, type Way } from '../workings/index.ts';

const practice = 'common practice';
const run = 'choice.run-character';
const treatment = 'choice.turbulence-treatment';
const resolved = ['les', 'dns', 'wall-modelled-les', 'hybrid'];

const through = (needs: readonly string[], formula: string, when?: Way['when']): Way => ({
  needs: [...needs, 'speed'],
  ...(when === undefined ? {} : { when }),
  value: (of) => needs.reduce((sum, id) => sum + (of[id] as number), 0) / (of['speed'] as number),
  formula,
  source: 'definition',
});

/** How a signal swings before a run: share of the mean and integral time, from the literature, both within a factor of 2. */
const swings: readonly { readonly when: NonNullable<Way['when']>; readonly share: number; readonly needs: readonly string[]; readonly time: (of: Readonly<Record<string, number>>) => number; readonly formula: string }[] = [
  { when: { flowClass: 'internal' }, share: 0.045, needs: ['hydraulicDiameter', 'speed'], time: (of) => (0.4 * (of['hydraulicDiameter'] as number)) / (of['speed'] as number), formula: 'T_int = 0.4 D_h/U' },
  { when: { flowClass: 'body', imposedFlow: 'yes', separated: 'yes' }, share: 0.075, needs: ['sheddingFrequency'], time: (of) => 0.15 / (of['sheddingFrequency'] as number), formula: 'T_int = 0.15/f_s' },
  { when: { flowClass: ['enclosure', 'body'], imposedFlow: 'no' }, share: 0.035, needs: ['freeFallTime'], time: (of) => 4 * (of['freeFallTime'] as number), formula: 'T_int = 4 t_ff' },
  { when: { flowClass: 'body', imposedFlow: 'yes' }, share: 0.08, needs: ['boundaryLayerThickness', 'speed'], time: (of) => (0.5 * (of['boundaryLayerThickness'] as number)) / (of['speed'] as number), formula: 'T_int = 0.5 delta/U' },
  { when: { flowClass: 'jet' }, share: 0.25, needs: ['length', 'speed'], time: (of) => (2 * (of['length'] as number)) / (of['speed'] as number), formula: 'T_int = 2 D/U' },
];

/** How long the run takes: what is thrown away, what is averaged, what error the average has. */
export const runLength: Definition[] = [
  quantity('flowThroughTime', { symbol: 't_ft', name: 'time in which the stream passes the region', unit: 's' }, [
    through(['domainUpstream', 'flowLength', 'domainDownstream'], 't_ft = (L_up + L_x + L_dn)/U', { flowClass: ['internal', 'continuum'] }),
    through(['domainUpstream', 'length', 'domainDownstream'], 't_ft = (L_up + L + L_dn)/U', { flowClass: ['body', 'jet'] }),
    through(['flowLength'], 't_ft = L_x/U'),
    through(['length'], 't_ft = L/U'),
  ]),
  quantity('crossDiffusionTime', { symbol: 't_nu', name: 'time in which viscosity crosses the flow to 99 %', unit: 's' }, [
    way({ needs: ['gap', 'kinematicViscosity'], when: { flowClass: 'internal', ductSection: 'round' }, value: ({ gap, kinematicViscosity }) => (0.79 * (gap / 2) ** 2) / kinematicViscosity, formula: 't_nu = 0.79 R^2/nu', source: 'first mode of the start of pipe flow' }),
    way({ needs: ['gap', 'kinematicViscosity'], when: { flowClass: ['internal', 'enclosure'] }, value: ({ gap, kinematicViscosity }) => (1.86 * (gap / 2) ** 2) / kinematicViscosity, formula: 't_nu = 1.86 (gap/2)^2/nu', source: 'first mode of the start of channel flow' }),
    way({ needs: ['boundaryLayerThickness', 'kinematicViscosity'], value: ({ boundaryLayerThickness, kinematicViscosity }) => boundaryLayerThickness ** 2 / kinematicViscosity, formula: 't_nu = delta^2/nu', source: 'definition' }),
  ]),
  quantity('soundTime', { symbol: 't_c', name: 'time in which sound passes the length scale', unit: 's' }, [
    way({ needs: ['length', 'speedOfSound'], value: ({ length, speedOfSound }) => length / speedOfSound, formula: 't_c = L/c', source: 'definition' }),
  ]),
  quantity('discardTime', { symbol: 't_0', name: 'time thrown away at the start', unit: 's' }, [
    way({ needs: ['freeFallTime'], when: { imposedFlow: 'no' }, value: ({ freeFallTime }) => 70 * freeFallTime, formula: 't_0 = 70 t_ff', source: `${practice}: 50 to 100` }),
    way({ needs: ['flowThroughTime', 'gap', 'frictionVelocity'], when: { [treatment]: resolved, flowClass: 'internal' }, value: ({ flowThroughTime, gap, frictionVelocity }) => Math.max(3 * flowThroughTime, (7.5 * gap) / frictionVelocity), formula: 't_0 = max(3 t_ft, 15 (gap/2)/u_tau)', source: `${practice}: 10 to 20` }),
    way({ needs: ['flowThroughTime'], value: ({ flowThroughTime }) => 3 * flowThroughTime, formula: 't_0 = 3 t_ft', source: practice }),
  ]),
  quantity('fluctuationShare', { symbol: 's/phi', name: 'standard deviation of the target over its mean, before a run', unit: '1' }, swings.map((s) => way({ needs: [], when: s.when, as: 'assumed', scatter: 1, value: () => s.share, formula: `s/phi = ${s.share}`, source: 'order of magnitude in the literature; a pilot run replaces it' }))),
  quantity('integralTime', { symbol: 'T_int', name: 'integral time of the target, before a run', unit: 's' }, swings.map((s) => way({ needs: s.needs, when: s.when, as: 'assumed', scatter: 1, value: s.time, formula: s.formula, source: 'order of magnitude in the literature; a pilot run replaces it' }))),
  quantity('leastWindow', { symbol: 'T_min', name: 'least time of averaging whatever the error', unit: 's' }, [
    way({ needs: ['sheddingFrequency'], value: ({ sheddingFrequency }) => 30 / sheddingFrequency, formula: 'T_min = 30/f_s', source: `${practice}: 20 to 40 cycles` }),
    way({ needs: ['freeFallTime'], when: { imposedFlow: 'no' }, value: ({ freeFallTime }) => 200 * freeFallTime, formula: 'T_min = 200 t_ff', source: practice }),
    way({ needs: ['gap', 'frictionVelocity'], when: { flowClass: 'internal' }, value: ({ gap, frictionVelocity }) => (7.5 * gap) / frictionVelocity, formula: 'T_min = 15 (gap/2)/u_tau', source: `${practice}: 10 to 20` }),
    way({ needs: ['length', 'speed'], value: ({ length, speed }) => (75 * length) / speed, formula: 'T_min = 75 L/U', source: practice }),
  ]),
  quantity('averagingTime', { symbol: 'T_avg', name: 'time over which is averaged', unit: 's' }, [
    way({ needs: ['leastWindow'], when: { [run]: 'transient', regime: 'laminar' }, value: ({ leastWindow }) => leastWindow, formula: 'T_avg = T_min: a pure tone averages out over whole periods', source: practice }),
    way({ needs: ['integralTime', 'fluctuationShare', 'statisticsTolerance', 'leastWindow'], when: { [run]: 'transient' }, value: (of) => Math.max(of.leastWindow, 7.7 * of.integralTime * (of.fluctuationShare / of.statisticsTolerance) ** 2), formula: 'T_avg = max(T_min, 7.7 T_int ((s/phi)/w)^2)', source: '95 % of the mean of a correlated signal: 2 (1.96)^2 T_int (s/(w phi))^2' }),
    way({ needs: ['leastWindow'], when: { [run]: 'transient' }, value: ({ leastWindow }) => leastWindow, formula: 'T_avg = T_min', source: practice }),
  ]),
  quantity('averagingError', { symbol: 'e_s', name: 'error of the mean that the averaging leaves, 95 %', unit: '1' }, [
    way({ needs: ['integralTime', 'fluctuationShare', 'averagingTime'], when: { regime: ['transitional', 'turbulent'] }, value: (of) => of.fluctuationShare * Math.sqrt((7.7 * of.integralTime) / of.averagingTime), formula: 'e_s = (s/phi) sqrt(7.7 T_int/T_avg)', source: '95 % of the mean of a correlated signal' }),
  ]),
  quantity('runTime', { symbol: 't_run', name: 'time that the run covers', unit: 's' }, [
    way({ needs: ['time.duration'], when: { [run]: ['transient', 'march'] }, value: (of) => of['time.duration'], formula: 't_run = the duration asked for', source: 'the case' }),
    way({ needs: ['time.period', 'discardTime'], when: { [run]: 'transient', 'has.period': 'yes' }, value: (of) => Math.max(of.discardTime, 5 * of['time.period']) + 5 * of['time.period'], formula: 't_run = max(t_0, 5 T) + 5 T', source: `${practice}: until cycles repeat, then five` }),
    way({ needs: ['discardTime', 'averagingTime'], when: { [run]: 'transient' }, value: ({ discardTime, averagingTime }) => discardTime + averagingTime, formula: 't_run = t_0 + T_avg', source: 'definition' }),
    way({ needs: ['discardTime'], when: { [run]: 'march' }, value: ({ discardTime }) => discardTime, formula: 't_run = t_0', source: 'until the drift is gone' }),
  ]),
  quantity('stepCount', { symbol: 'N_t', name: 'number of time steps', unit: '1' }, [
    way({ needs: ['runTime', 'timeStep'], value: ({ runTime, timeStep }) => Math.ceil(runTime / timeStep - 1e-9), formula: 'N_t = t_run/dt, rounded up', source: 'definition' }),
  ]),
];
