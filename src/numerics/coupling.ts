import { quantity, way, type Definition } from '../workings/index.ts';

const passes = 'gain of one alternating pass; read within a factor of 2, a pilot run replaces it';
const gain = (id: string, symbol: string, name: string, list: Parameters<typeof quantity>[2]): Definition => quantity(id, { symbol, name, unit: '1', signed: true }, list);
const gains = ['gainBuoyancy', 'gainViscosity', 'gainHeating', 'gainWall'] as const;

/** How strongly the equations drive each other: the factor by which an alternating pass multiplies its error. */
export const coupling: Definition[] = [
  gain('gainBuoyancy', 'q_b', 'gain of the loop of temperature and speed by buoyancy', [
    way({ needs: ['richardson'], when: { energySolved: 'yes', imposedFlow: 'yes' }, value: ({ richardson }) => -richardson / 2, formula: 'q_b = -Ri/2', source: `${passes}: heated lid-driven square` }),
    way({ needs: ['timeStep', 'freeFallTime'], when: { energySolved: 'yes', imposedFlow: 'no', 'choice.run-character': ['march', 'transient'] }, value: (of) => -((of.timeStep / of.freeFallTime) ** 2) / 2, formula: 'q_b = -(dt/t_ff)^2/2 within a step', source: `${passes}: side-heated square, steps up to t_ff` }),
    way({ needs: ['rayleigh'], when: { energySolved: 'yes', imposedFlow: 'no' }, value: ({ rayleigh }) => -0.9 * (rayleigh / 1e4) ** 0.85, formula: 'q_b = -0.9 (Ra/1e4)^0.85', source: `${passes}: side-heated square, Ra 1e3 to 1e7` }),
    way({ needs: [], value: () => 0, formula: 'q_b = 0', source: 'no loop' }),
  ]),
  gain('gainViscosity', 'q_mu', 'gain of the loop of temperature and speed by viscosity', [
    way({ needs: ['viscosityBulk', 'viscosityWall'], when: { energySolved: 'yes' }, value: ({ viscosityBulk, viscosityWall }) => -Math.abs(Math.log(viscosityBulk / viscosityWall)) / 2, formula: 'q_mu = -|ln(mu_b/mu_w)|/2', source: `${passes}, common practice` }),
    way({ needs: [], value: () => 0, formula: 'q_mu = 0', source: 'no loop' }),
  ]),
  gain('gainHeating', 'q_Na', 'gain of the loop of viscous heating and viscosity', [
    way({ needs: ['nahme'], when: { energySolved: 'yes' }, value: ({ nahme }) => -nahme / 8, formula: 'q_Na = -Na/8', source: `${passes}: core rise mu U^2/(8 k) between cooled walls` }),
    way({ needs: [], value: () => 0, formula: 'q_Na = 0', source: 'no loop' }),
  ]),
  gain('gainWall', 'q_FS', 'gain of the pass between fluid and wall, fluid takes temperature', [
    way({ needs: ['biotWall'], when: { energySolved: 'yes', 'has.layers': 'yes' }, value: ({ biotWall }) => -biotWall, formula: 'q_FS = -K_f/K_s', source: 'Giles, Int. J. Numer. Methods Fluids 25 (1997) 421' }),
    way({ needs: [], value: () => 0, formula: 'q_FS = 0', source: 'no wall is solved' }),
  ]),
  quantity('largestGain', { symbol: 'q', name: 'largest gain of a loop, by magnitude', unit: '1' }, [
    way({ needs: gains, value: (of) => Math.max(...gains.map((id) => Math.abs(of[id]))), formula: 'q = max |q_i|', source: 'definition' }),
  ]),
  quantity('loopRelaxation', { symbol: 'w_r', name: 'relaxation of the strongest loop', unit: '1' }, [
    way({ needs: ['largestGain'], value: ({ largestGain }) => (largestGain < 0.3 ? 1 : 2 / (2 + largestGain)), formula: 'w_r = 1 below |q| = 0.3, else 2/(2 + |q|)', source: 'fastest decay for real gains between q and 0' }),
  ]),
  quantity('loopPasses', { symbol: 'n_p', name: 'passes to a thousandth', unit: '1' }, [
    way({ needs: ['largestGain'], value: ({ largestGain }) => passesOf(largestGain), formula: 'n_p = ln(1e-3)/ln(factor), factor |q| or |q|/(2 + |q|)', source: 'geometric decay' }),
  ]),
  quantity('slowestTime', { symbol: 't_slow', name: 'slowest time that is solved', unit: 's' }, [
    way({ needs: ['flowThroughTime', 'crossDiffusionTime'], value: (of) => Math.max(of.flowThroughTime, of.crossDiffusionTime), formula: 't_slow = max(t_ft, t_nu)', source: 'definition' }),
    way({ needs: ['flowThroughTime'], value: (of) => of.flowThroughTime, formula: 't_slow = t_ft', source: 'definition' }),
  ]),
  quantity('fastestTime', { symbol: 't_fast', name: 'fastest time that is solved', unit: 's' }, [
    way({ needs: ['timeStepConvective', 'timeStepAcoustic'], when: { 'choice.density-law': 'temperature-and-pressure' }, value: (of) => Math.min(of.timeStepConvective, of.timeStepAcoustic), formula: 't_fast = min(dt_u, dt_c)', source: 'definition' }),
    way({ needs: ['timeStepConvective', 'timeStepDiffusive'], value: (of) => Math.min(of.timeStepConvective, of.timeStepDiffusive), formula: 't_fast = min(dt_u, dt_nu)', source: 'definition' }),
  ]),
  quantity('stiffness', { symbol: 'S', name: 'slowest over fastest time that is solved', unit: '1' }, [
    way({ needs: ['slowestTime', 'fastestTime'], value: (of) => of.slowestTime / of.fastestTime, formula: 'S = t_slow/t_fast', source: 'definition' }),
  ]),
];

function passesOf(gain: number): number {
  const factor = gain < 0.3 ? gain : gain / (2 + gain);
  return gain < 1e-3 ? 1 : Math.max(2, Math.ceil(Math.log(1e-3) / Math.log(factor)));
}
