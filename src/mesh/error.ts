import { quantity, way, type Definition } from '../workings/index.ts';

const forecast = 'leading truncation error of the scheme on a profile of the layer; within a factor of 3';
const topology = 'choice.mesh-topology';

/** The error that a mesh is expected to leave, before a run, and the cells an accuracy needs. */
export const meshErrors: Definition[] = [
  quantity('plannedOrder', { symbol: 'p', name: 'order of accuracy to plan with', unit: '1' }, [
    way({ needs: [], when: { 'choice.convection-scheme': ['upwind-1', 'blended', 'shock-capturing'] }, as: 'decided', value: () => 1, formula: 'p = 1', source: 'a first-order term sets the order' }),
    way({ needs: [], when: { [topology]: ['hybrid', 'unstructured', 'cut-cell', 'overlapping'] }, as: 'decided', value: () => 1.5, formula: 'p = 1.5', source: 'common practice: irregular cells, limiters, size steps; 1 to 2 in practice' }),
    way({ needs: [], as: 'decided', value: () => 2, formula: 'p = 2', source: 'second order on aligned cells' }),
  ]),
  quantity('wallError', { symbol: 'e_w', name: 'error of the gradient at the wall', unit: '1' }, [
    way({ needs: ['thinnestLayer', 'firstCellHeight'], when: { regime: 'laminar' }, scatter: 2, value: ({ thinnestLayer, firstCellHeight }) => firstCellHeight / (4 * thinnestLayer), formula: 'e_w = h_1/(4 delta_min), linear in the first cell', source: 'parabolic layer' }),
    way({ needs: ['coreError'], when: { 'choice.near-wall-treatment': ['law-of-the-wall', 'rough-law'] }, value: ({ coreError }) => coreError, formula: 'e_w = e_c: a law holds the wall, its own error is no mesh error', source: 'definition' }),
    way({ needs: ['cellsInLayer'], scatter: 2, value: ({ cellsInLayer }) => 3.5 / Math.max(1, cellsInLayer) ** 2, formula: 'e_w = 3.5/n_l^2', source: `${forecast}: exponential layer` }),
  ]),
  quantity('coreError', { symbol: 'e_c', name: 'error made away from walls', unit: '1' }, [
    way({ needs: ['frontCells'], scatter: 2, value: ({ frontCells }) => 2.66 / frontCells ** 2, formula: 'e_c = 2.66/n_f^2', source: `${forecast}: tanh layer, second-order upwind` }),
  ]),
  quantity('meshError', { symbol: 'e_2', name: 'error expected of the medium mesh', unit: '1' }, [
    way({ needs: ['wallError', 'coreError'], when: { wallBounded: 'yes' }, value: ({ wallError, coreError }) => 0.7 * wallError + 0.3 * coreError, formula: 'e_2 = 0.7 e_w + 0.3 e_c', source: 'common practice: share of a wall target made at the wall' }),
    way({ needs: ['coreError'], value: ({ coreError }) => coreError, formula: 'e_2 = e_c', source: 'no wall' }),
  ]),
  quantity('meshErrorCoarse', { symbol: 'e_3', name: 'error expected of the coarse mesh', unit: '1' }, [way({ needs: ['meshError', 'refinementRatio', 'plannedOrder'], value: (of) => of.meshError * of.refinementRatio ** of.plannedOrder, formula: 'e_3 = e_2 r^p', source: 'order of accuracy' })]),
  quantity('meshErrorFine', { symbol: 'e_1', name: 'error expected of the fine mesh', unit: '1' }, [way({ needs: ['meshError', 'refinementRatio', 'plannedOrder'], value: (of) => of.meshError / of.refinementRatio ** of.plannedOrder, formula: 'e_1 = e_2 r^-p', source: 'order of accuracy' })]),
  quantity('meshChange', { symbol: 'eps_21', name: 'change of the target expected from medium to fine', unit: '1' }, [way({ needs: ['meshError', 'meshErrorFine'], value: ({ meshError, meshErrorFine }) => meshError - meshErrorFine, formula: 'eps_21 = e_2 - e_1', source: 'definition' })]),
  quantity('cellCountNeeded', { symbol: 'N_W', name: 'cells at which the mesh error fits the accuracy asked', unit: '1' }, [
    way({ needs: ['cellCount', 'meshError', 'meshTolerance', 'plannedOrder', 'meshDimension'], value: (of) => of.cellCount * ((1.25 * of.meshError) / of.meshTolerance) ** (of.meshDimension / of.plannedOrder), formula: 'N_W = N (1.25 e_2/w_h)^(d/p)', source: 'order of accuracy; safety factor of Roache 1998' }),
  ]),
];
