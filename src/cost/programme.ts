import { quantity, way, type Definition } from '../workings/index.ts';

const run = 'choice.run-character';
const closures = ['k-epsilon', 'k-epsilon-variant', 'k-epsilon-low-re', 'k-omega', 'sst', 'one-equation', 'reynolds-stress', 'transition'];
const part = (id: string, symbol: string, name: string, list: Parameters<typeof quantity>[2]): Definition => quantity(id, { symbol, name, unit: '1' }, list);
const parts = ['runsFamily', 'runsSteps', 'runsDomain', 'runsModel', 'runsInputs', 'runsRungs'] as const;

/** Cost of the whole programme in runs of the medium mesh. */
export const programme: Definition[] = [
  part('costExponent', 'b', 'exponent by which a finer mesh costs more', [
    way({ needs: ['meshDimension'], when: { [run]: ['transient', 'march'] }, value: ({ meshDimension }) => meshDimension + 1, formula: 'b = d + 1: the step follows the cell', source: 'definition' }),
    way({ needs: ['meshDimension'], value: ({ meshDimension }) => 1.2 * meshDimension, formula: 'b = 1.2 d: passes grow as N^0.2', source: 'common practice: N^0.1 to N^0.3' }),
  ]),
  part('runsCoarse', 'c_3', 'cost of the coarse mesh over the medium', [way({ needs: ['refinementRatio', 'costExponent'], value: (of) => of.refinementRatio ** -of.costExponent, formula: 'c_3 = r^-b', source: 'definition' })]),
  part('runsFine', 'c_1', 'cost of the fine mesh over the medium', [way({ needs: ['refinementRatio', 'costExponent'], value: (of) => of.refinementRatio ** of.costExponent, formula: 'c_1 = r^b', source: 'definition' })]),
  part('runsFamily', 'P_h', 'three meshes', [way({ needs: ['runsCoarse', 'runsFine'], value: ({ runsCoarse, runsFine }) => runsCoarse + 1 + runsFine, formula: 'P_h = c_3 + 1 + c_1', source: 'definition' })]),
  part('runsSteps', 'P_t', 'two larger steps on the medium mesh', [
    way({ needs: [], when: { [run]: 'transient' }, value: () => 0.75, formula: 'P_t = 1/2 + 1/4', source: 'definition' }),
    way({ needs: [], value: () => 0, formula: 'P_t = 0: no step to study', source: 'definition' }),
  ]),
  part('runsDomain', 'P_d', 'one run on a region half as long again, coarse mesh', [
    way({ needs: ['runsCoarse'], when: { flowClass: ['body', 'jet', 'internal', 'continuum'] }, value: ({ runsCoarse }) => 1.5 * runsCoarse, formula: 'P_d = 1.5 c_3', source: 'common practice' }),
    way({ needs: [], value: () => 0, formula: 'P_d = 0: the walls are the region', source: 'definition' }),
  ]),
  part('runsModel', 'P_m', 'one run with the second closure, medium mesh', [
    way({ needs: [], when: { 'choice.second-closure': closures }, value: () => 1, formula: 'P_m = 1', source: 'definition' }),
    way({ needs: [], value: () => 0, formula: 'P_m = 0: no closure to compare', source: 'definition' }),
  ]),
  part('runsInputs', 'P_i', 'two uncertain inputs at both ends, coarse mesh', [way({ needs: ['runsCoarse'], value: ({ runsCoarse }) => 4 * runsCoarse, formula: 'P_i = 4 c_3', source: 'common practice' })]),
  part('runsRungs', 'P_r', 'rungs of the ladder, coarse meshes', [way({ needs: ['runsCoarse'], scatter: 1, value: ({ runsCoarse }) => 3 * runsCoarse, formula: 'P_r = 3 c_3', source: 'common practice: rungs are smaller than the case' })]),
  part('runsAll', 'P', 'cost of the programme over one run on the medium mesh', [way({ needs: parts, value: (of) => parts.reduce((sum, id) => sum + of[id], 0), formula: 'P = P_h + P_t + P_d + P_m + P_i + P_r', source: 'definition' })]),
  part('coreHoursAll', 't_all', 'core hours of the programme', [way({ needs: ['coreHours', 'runsAll'], value: ({ coreHours, runsAll }) => coreHours * runsAll, formula: 't_all = t_c P', source: 'definition' })]),
  part('coreHoursFine', 't_1', 'core hours of the fine mesh', [way({ needs: ['coreHours', 'runsFine'], value: ({ coreHours, runsFine }) => coreHours * runsFine, formula: 't_1 = t_c c_1', source: 'definition' })]),
  quantity('wallTimeFine', { symbol: 't_w,1', name: 'time until the fine mesh is done', unit: 's' }, [way({ needs: ['wallTime', 'runsFine'], value: ({ wallTime, runsFine }) => wallTime * runsFine, formula: 't_w,1 = t_w c_1', source: 'definition' })]),
  quantity('memoryFine', { symbol: 'M_1', name: 'memory of the fine mesh', unit: 'B' }, [way({ needs: ['cellCountFine', 'memoryPerCell'], value: (of) => of.cellCountFine * of.memoryPerCell, formula: 'M_1 = N_1 m_c', source: 'definition' })]),
];
