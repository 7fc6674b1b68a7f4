import { quantity, way, type Definition } from '../workings/index.ts';

const uncalibrated = 'order of magnitude, not calibrated; two short runs replace it';
const run = 'choice.run-character';
const explicit = { 'choice.time-scheme': ['explicit-runge-kutta-3', 'explicit-runge-kutta-4', 'adams-bashforth-2'] };
const perMachine = 'a rate of a machine, per second';
const kilobyte = 1000;

/** Cost of one run on the medium mesh. */
export const work: Definition[] = [
  quantity('memoryPerCell', { symbol: 'm_c', name: 'memory per cell', unit: 'B' }, [
    way({ needs: [], when: explicit, scatter: 1, value: () => 0.2 * kilobyte, formula: 'm_c = 0.2 kB, explicit', source: uncalibrated }),
    way({ needs: [], when: { 'choice.solution-order': ['block', 'monolithic'] }, scatter: 1, value: () => 4.3 * kilobyte, formula: 'm_c = 4.3 kB, equations solved together', source: uncalibrated }),
    way({ needs: [], when: { 'choice.closure': ['k-epsilon', 'k-epsilon-variant', 'k-epsilon-low-re', 'k-omega', 'sst', 'one-equation', 'reynolds-stress', 'transition'] }, scatter: 1, value: () => 1.8 * kilobyte, formula: 'm_c = 1.5 kB + 0.3 kB for the closure', source: uncalibrated }),
    way({ needs: [], scatter: 1, value: () => 1.5 * kilobyte, formula: 'm_c = 1.5 kB, one equation after the other', source: uncalibrated }),
  ]),
  quantity('memory', { symbol: 'M', name: 'memory of the run on the medium mesh', unit: 'B' }, [
    way({ needs: ['cellCount', 'memoryPerCell'], value: ({ cellCount, memoryPerCell }) => cellCount * memoryPerCell, formula: 'M = N m_c', source: 'definition' }),
  ]),
  quantity('cellUpdateRate', { symbol: 'theta', name: 'cells that one core carries one pass further in a second', unit: '1/s' }, [
    way({ needs: ['computing.cellUpdateRate'], value: (of) => of['computing.cellUpdateRate'], formula: 'theta as given', source: 'the case' }),
    way({ needs: [], when: explicit, as: 'assumed', scatter: 2.2, value: () => 3.2e6, formula: 'theta = 3.2e6 1/s, explicit', source: `1e6 to 1e7; ${uncalibrated}`, dimensional: perMachine }),
    way({ needs: [], when: { 'choice.solution-order': ['block', 'monolithic'] }, as: 'assumed', scatter: 1.3, value: () => 4.5e4, formula: 'theta = 4.5e4 1/s, equations solved together', source: `2e4 to 1e5; ${uncalibrated}`, dimensional: perMachine }),
    way({ needs: [], as: 'assumed', scatter: 1.3, value: () => 2.2e5, formula: 'theta = 2.2e5 1/s, one equation after the other', source: `1e5 to 5e5; ${uncalibrated}`, dimensional: perMachine }),
  ]),
  quantity('innerPasses', { symbol: 'n_i', name: 'passes within a time step', unit: '1' }, [
    way({ needs: [], when: explicit, value: () => 3, formula: 'n_i = 3 stages', source: 'definition' }),
    way({ needs: ['loopPasses'], when: { [run]: ['transient', 'march'] }, scatter: 1, value: ({ loopPasses }) => Math.min(20, Math.max(4, loopPasses)), formula: 'n_i = n_p, between 4 and 20', source: 'common practice: 2 to 20' }),
  ]),
  quantity('totalPasses', { symbol: 'N_i', name: 'passes over the whole mesh', unit: '1' }, [
    way({ needs: ['stepCount', 'innerPasses'], when: { [run]: ['transient', 'march'] }, value: ({ stepCount, innerPasses }) => stepCount * innerPasses, formula: 'N_i = N_t n_i', source: 'definition' }),
    way({ needs: ['residualDecades', 'sweepIterations'], when: { [run]: 'steady' }, value: (of) => Math.min(5000, Math.max(500, of.residualDecades * of.sweepIterations)), formula: 'N_i = q_r N_dec, between 500 and 5000', source: 'common practice' }),
  ]),
  quantity('coresMost', { symbol: 'n_max', name: 'cores beyond which sharing gains little', unit: '1' }, [
    way({ needs: ['cellCount'], when: explicit, value: ({ cellCount }) => Math.max(1, Math.floor(cellCount / 1e3)), formula: 'n_max = N/1000, explicit', source: 'common practice: cells per core at which exchange costs as much as work' }),
    way({ needs: ['cellCount'], value: ({ cellCount }) => Math.max(1, Math.floor(cellCount / 1e4)), formula: 'n_max = N/10000', source: 'common practice: cells per core at which exchange costs as much as work' }),
  ]),
  quantity('cores', { symbol: 'n_c', name: 'cores used', unit: '1' }, [
    way({ needs: ['computing.cores', 'coresMost'], value: (of) => Math.min(of['computing.cores'], of.coresMost), formula: 'n_c = min(cores, n_max)', source: 'definition' }),
    way({ needs: ['coresMost'], as: 'assumed', value: ({ coresMost }) => Math.min(16, coresMost), formula: 'n_c = min(16, n_max)', source: 'taken where the case names no machine' }),
  ]),
  quantity('parallelEfficiency', { symbol: 'eta_p', name: 'share of the cores that does work', unit: '1' }, [
    way({ needs: ['cores', 'coresMost'], value: ({ cores, coresMost }) => 1 / (1 + (cores - 1) / coresMost), formula: 'eta_p = 1/(1 + (n_c - 1)/n_max)', source: uncalibrated }),
  ]),
  quantity('coreHours', { symbol: 't_c', name: 'core hours of the run on the medium mesh', unit: '1' }, [
    way({ needs: ['cellCount', 'totalPasses', 'cellUpdateRate', 'parallelEfficiency'], value: (of) => (of.cellCount * of.totalPasses) / (of.cellUpdateRate * of.parallelEfficiency) / 3600, formula: 't_c = N N_i/(theta eta_p)/3600 s', source: 'definition', dimensional: 'hours are counted, of 3600 s each' }),
  ]),
  quantity('wallTime', { symbol: 't_w', name: 'time until the run on the medium mesh is done', unit: 's' }, [
    way({ needs: ['cellCount', 'totalPasses', 'cellUpdateRate', 'parallelEfficiency', 'cores'], value: (of) => (of.cellCount * of.totalPasses) / (of.cellUpdateRate * of.parallelEfficiency * of.cores), formula: 't_w = N N_i/(theta eta_p n_c)', source: 'definition' }),
  ]),
  quantity('fieldSize', { symbol: 'm_f', name: 'file of one state, 8 numbers a cell in double precision', unit: 'B' }, [
    way({ needs: ['cellCount'], value: ({ cellCount }) => 64 * cellCount, formula: 'm_f = 8 x 8 B N', source: 'definition' }),
  ]),
];
