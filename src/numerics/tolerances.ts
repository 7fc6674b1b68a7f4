import { quantity, way, type Definition } from '../workings/index.ts';

const chain = 'chain of tolerances: parts add as squares, each a small share of the whole';
const share = (id: string, symbol: string, name: string, n: number): Definition => quantity(id, { symbol, name, unit: '1' }, [way({ needs: ['targetTolerance'], value: ({ targetTolerance }) => targetTolerance / n, formula: `${symbol} = W/${n}`, source: chain })]);

/** From the accuracy asked of the target down to the linear solve. */
export const tolerances: Definition[] = [
  quantity('targetTolerance', { symbol: 'W', name: 'accuracy asked of the strictest target, 95 %', unit: '1' }, [
    way({ needs: [], as: 'assumed', value: () => 0.02, formula: 'W = 2 %', source: 'taken where the case asks for none' }),
  ]),
  share('meshTolerance', 'w_h', 'error the finest mesh may leave, safety factor counted', 3),
  share('stepTolerance', 'w_t', 'error the time step may leave', 5),
  share('statisticsTolerance', 'w_s', 'error averaging may leave', 3),
  share('balanceTolerance', 'w_b', 'imbalance of what is carried, over the flux of the target', 10),
  share('iterationTolerance', 'e_it', 'error iteration may leave', 30),
  quantity('massTolerance', { symbol: 'w_m', name: 'imbalance of mass over the throughput', unit: '1' }, [
    way({ needs: ['balanceTolerance', 'temperatureDifference', 'referenceTemperature'], when: { energySolved: 'yes' }, value: (of) => (of.balanceTolerance * of.temperatureDifference) / of.referenceTemperature, formula: 'w_m = w_b dT/T, temperatures counted from 0 K', source: 'a mass error carries enthalpy at the level of T' }),
    way({ needs: ['balanceTolerance'], value: ({ balanceTolerance }) => balanceTolerance, formula: 'w_m = w_b', source: chain }),
  ]),
  quantity('residualDecades', { symbol: 'q_r', name: 'decades by which residuals must fall, scaled by the throughput', unit: '1' }, [
    way({ needs: ['iterationTolerance'], value: ({ iterationTolerance }) => Math.max(4, Math.log10(1 / iterationTolerance) + 1), formula: 'q_r = max(4, log10(1/e_it) + 1), from rest', source: 'the residual stood 0.8 decade ahead of the error in a relaxed diffusion problem' }),
  ]),
  quantity('residualTarget', { symbol: 'R', name: 'residual over its start, or over the throughput', unit: '1' }, [
    way({ needs: ['residualDecades'], value: ({ residualDecades }) => 10 ** -residualDecades, formula: 'R = 10^-q_r', source: 'definition' }),
  ]),
  quantity('linearFloor', { symbol: 'R_lin', name: 'residual of the linear solve, absolute', unit: '1' }, [
    way({ needs: ['residualTarget'], value: ({ residualTarget }) => residualTarget / 10, formula: 'R_lin = R/10', source: chain }),
  ]),
  quantity('sweepIterations', { symbol: 'N_dec', name: 'iterations in which the error falls by ten, before a run', unit: '1' }, [
    way({ needs: ['cellsAlong'], scatter: 1, value: ({ cellsAlong }) => Math.max(100, 3 * cellsAlong * (0.3 / 0.7)), formula: 'N_dec = 3 n_x (1 - a)/a, a = 0.7, at least 100', source: 'one sweep carries the solution a/(1 - a) cells, common practice' }),
  ]),
  quantity('monitorWindow', { symbol: 'm', name: 'iterations over which a monitor must be flat', unit: '1' }, [
    way({ needs: ['sweepIterations'], value: ({ sweepIterations }) => Math.max(50, Math.ceil(sweepIterations / 3)), formula: 'm = max(50, N_dec/3)', source: 'one sweep through the region' }),
  ]),
  quantity('monitorBand', { symbol: 'B', name: 'change of a target over the window that counts as flat', unit: '1' }, [
    way({ needs: ['iterationTolerance', 'monitorWindow', 'sweepIterations'], value: ({ iterationTolerance, monitorWindow, sweepIterations }) => { const z = 10 ** (-monitorWindow / sweepIterations); return (iterationTolerance * (1 - z)) / z; }, formula: 'B = e_it (1 - z)/z, z = 10^(-m/N_dec)', source: 'geometric decay of the iteration error; Ferziger and Peric 2002' }),
  ]),
];
