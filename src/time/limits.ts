import { plane } from '../mesh/index.ts';
import { quantity, way, type Definition, type Way } from '../workings/index.ts';

const practice = 'common practice';
const treatment = 'choice.turbulence-treatment';
const dimension = (d: 2 | 3) => (of: Readonly<Record<string, number>>): number => {
  const [h1, hx, hc] = [of['firstCellHeight'] as number, of['regionSizeAlong'] as number, of['coreCellSize'] as number];
  return 1 / (2 * (of['largestDiffusivity'] as number) * (h1 ** -2 + hx ** -2 + (d === 3 ? hc ** -2 : 0)));
};

/** Steps per period: least for the frequency, default for amplitudes and means. */
const stepsPerPeriod = 100;

const period: Way[] = [
  way({ needs: ['time.period', 'sheddingFrequency'], value: (of) => Math.min(of['time.period'], 1 / of.sheddingFrequency) / stepsPerPeriod, formula: 'dt = min(T, 1/f_s)/100', source: `${practice}: 100 steps per period` }),
  way({ needs: ['time.period'], value: (of) => of['time.period'] / stepsPerPeriod, formula: 'dt = T/100', source: `${practice}: 100 steps per period` }),
  way({ needs: ['time.ramp'], value: (of) => of['time.ramp'] / stepsPerPeriod, formula: 'dt = t_ramp/100', source: practice }),
  way({ needs: ['sheddingFrequency'], value: ({ sheddingFrequency }) => 1 / (stepsPerPeriod * sheddingFrequency), formula: 'dt = 1/(100 f_s)', source: `${practice}: two-level backward schemes keep 99.96 % of an amplitude per period at 100 steps` }),
];

/** The limits a time step has, each at its own factor: CFL 1, explicit forms. */
export const limits: Definition[] = [
  quantity('peakSpeed', { symbol: 'u_max', name: 'largest speed of the flow', unit: 'm/s' }, [
    way({ needs: ['speed', 'peakOverMean'], value: ({ speed, peakOverMean }) => speed * peakOverMean, formula: 'u_max = U (u_max/U)', source: 'definition' }),
  ]),
  quantity('timeStepConvective', { symbol: 'dt_u', name: 'step in which the fastest fluid crosses one cell', unit: 's' }, [
    way({ needs: ['regionSizeAlong', 'peakSpeed'], value: ({ regionSizeAlong, peakSpeed }) => regionSizeAlong / peakSpeed, formula: 'dt_u = h_x/u_max, CFL = 1', source: 'Courant, Friedrichs and Lewy 1928' }),
    way({ needs: ['coreCellSize', 'peakSpeed'], value: ({ coreCellSize, peakSpeed }) => coreCellSize / peakSpeed, formula: 'dt_u = h_c/u_max, CFL = 1', source: 'Courant, Friedrichs and Lewy 1928' }),
  ]),
  quantity('timeStepDiffusive', { symbol: 'dt_nu', name: 'step that diffusion allows an explicit scheme', unit: 's' }, [
    way({ needs: ['firstCellHeight', 'regionSizeAlong', 'coreCellSize', 'largestDiffusivity'], when: { 'choice.dimension-and-cuts': plane }, value: dimension(2), formula: 'dt_nu = 1/(2 Gamma_max (h_1^-2 + h_x^-2))', source: 'von Neumann analysis, forward Euler with central differences' }),
    way({ needs: ['firstCellHeight', 'regionSizeAlong', 'coreCellSize', 'largestDiffusivity'], value: dimension(3), formula: 'dt_nu = 1/(2 Gamma_max (h_1^-2 + h_x^-2 + h_c^-2))', source: 'von Neumann analysis, forward Euler with central differences' }),
  ]),
  quantity('timeStepAcoustic', { symbol: 'dt_c', name: 'step in which sound crosses the smallest cell', unit: 's' }, [
    way({ needs: ['firstCellHeight', 'regionSizeAlong', 'peakSpeed', 'speedOfSound'], value: (of) => Math.min(of.firstCellHeight, of.regionSizeAlong) / (of.peakSpeed + of.speedOfSound), formula: 'dt_c = h_min/(u_max + c)', source: 'Courant, Friedrichs and Lewy 1928' }),
  ]),
  quantity('timeStepCapillary', { symbol: 'dt_s', name: 'step that explicit surface tension allows', unit: 's' }, [
    way({ needs: ['density', 'surfaceTension', 'coreCellSize'], when: { 'has.otherFluid': 'yes' }, value: ({ density, surfaceTension, coreCellSize }) => Math.sqrt((density * coreCellSize ** 3) / (4 * Math.PI * surfaceTension)), formula: 'dt_s = sqrt(rho h^3/(4 pi sigma)), the lighter phase left out', source: 'Brackbill, Kothe and Zemach, J. Comput. Phys. 100 (1992) 335' }),
  ]),
  quantity('reactionTime', { symbol: 't_r', name: 'time of the fastest reaction', unit: 's' }),
  quantity('timeStepReaction', { symbol: 'dt_r', name: 'step that the fastest reaction allows', unit: 's' }, [
    way({ needs: ['reactionTime'], value: ({ reactionTime }) => 0.1 * reactionTime, formula: 'dt_r = 0.1 t_r', source: practice }),
  ]),
  quantity('timeStepPeriod', { symbol: 'dt_T', name: 'step that the period or ramp asks for', unit: 's' }, period),
  quantity('timeStepBuoyancy', { symbol: 'dt_b', name: 'step that buoyant motion asks for', unit: 's' }, [
    way({ needs: ['freeFallTime'], when: { imposedFlow: 'no' }, value: ({ freeFallTime }) => 0.07 * freeFallTime, formula: 'dt_b = 0.07 t_ff', source: `${practice}: 0.05 to 0.1` }),
  ]),
  quantity('timeStepTurbulence', { symbol: 'dt_t', name: 'step that resolved turbulence asks for', unit: 's' }, [
    way({ needs: ['viscousLength', 'frictionVelocity', 'kolmogorovTime'], when: { [treatment]: 'dns' }, value: (of) => Math.min((0.3 * of.viscousLength) / of.frictionVelocity, 0.07 * of.kolmogorovTime), formula: 'dt_t = min(0.3 nu/u_tau^2, 0.07 tau_eta)', source: 'Choi and Moin, J. Comput. Phys. 113 (1994) 1' }),
    way({ needs: ['viscousLength', 'frictionVelocity'], when: { [treatment]: ['dns', 'les'] }, value: (of) => of.viscousLength / of.frictionVelocity, formula: 'dt_t = nu/u_tau^2', source: 'Choi and Moin, J. Comput. Phys. 113 (1994) 1' }),
    way({ needs: ['coreCellSize', 'speed'], when: { [treatment]: ['wall-modelled-les', 'hybrid'] }, value: ({ coreCellSize, speed }) => (0.3 * coreCellSize) / speed, formula: 'dt_t = 0.3 h_c/U', source: practice }),
  ]),
  quantity('freeFallTime', { symbol: 't_ff', name: 'time of free fall over the length scale', unit: 's' }, [
    way({ needs: ['length', 'gravity', 'thermalExpansion', 'temperatureDifference'], value: (of) => Math.sqrt(of.length / (of.gravity * Math.abs(of.thermalExpansion) * of.temperatureDifference)), formula: 't_ff = sqrt(L/(g |beta| dT))', source: 'definition' }),
  ]),
];
