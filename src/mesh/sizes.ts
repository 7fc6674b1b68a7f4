import { quantity, way, type Definition } from '../workings/index.ts';

const practice = 'common practice';
const definition = 'definition';
const treatment = 'choice.turbulence-treatment';
const topology = 'choice.mesh-topology';

/** Sizes away from walls, counts of the mesh and of its family. */
export const sizes: Definition[] = [
  quantity('coreCellSize', { symbol: 'h_c', name: 'cell size away from walls', unit: 'm' }, [
    way({ needs: ['coreLength', 'coreCellsMedium', 'kolmogorovLength'], when: { [treatment]: 'dns' }, as: 'decided', value: (of) => Math.min(of.coreLength / of.coreCellsMedium, 2.1 * of.kolmogorovLength), formula: 'h_c = min(L_c/n_c, 2.1 eta)', source: 'Pope, Turbulent Flows (2000), section 9.1: k_max eta at least 1.5' }),
    way({ needs: ['coreLength', 'coreCellsFine'], when: { [treatment]: 'les' }, as: 'decided', value: (of) => of.coreLength / of.coreCellsFine, formula: 'h_c = L_c/n_c, fine', source: `${practice}: a tenth of the integral length` }),
    way({ needs: ['boundaryLayerThickness'], when: { [treatment]: 'wall-modelled-les' }, as: 'decided', value: (of) => of.boundaryLayerThickness / 15, formula: 'h_c = delta/15', source: 'Choi and Moin, Phys. Fluids 24 (2012) 011702: 10 to 20 in delta' }),
    way({ needs: ['coreLength', 'coreCellsMedium'], as: 'decided', value: (of) => of.coreLength / of.coreCellsMedium, formula: 'h_c = L_c/n_c', source: practice }),
  ]),
  quantity('meshOverhead', { symbol: 'chi', name: 'cells beyond the count by regions: joints, zones, corners', unit: '1' }, [
    way({ needs: [], when: { [topology]: ['hybrid', 'unstructured', 'cut-cell'] }, value: () => 1.7, formula: 'chi = 1.7', source: `${practice}: 1.5 to 2 with size steps of 2 to 1` }),
    way({ needs: [], when: { [topology]: 'structured' }, value: () => 1, formula: 'chi = 1', source: 'one block: the regions are the mesh' }),
    way({ needs: [], value: () => 1.3, formula: 'chi = 1.3', source: `${practice}, hexahedra` }),
  ]),
  quantity('cellCount', { symbol: 'N', name: 'number of cells', unit: '1' }, [
    way({ needs: ['regionCells', 'meshOverhead'], scatter: 1, value: ({ regionCells, meshOverhead }) => Math.ceil(regionCells * meshOverhead), formula: 'N = chi sum(N_r)', source: `${practice}; between half and twice` }),
  ]),
  quantity('refinementRatio', { symbol: 'r', name: 'linear ratio of two meshes of the family', unit: '1' }, [
    way({ needs: ['meshDimension', 'coreCellsCoarse', 'coreCellsFine'], as: 'decided', value: (of) => (of.meshDimension === 2 && of.coreCellsFine >= 4 * of.coreCellsCoarse ? 2 : 1.5), formula: 'r = 2 in two directions, 1.5 in three', source: 'Celik et al., J. Fluids Eng. 130 (2008) 078001: at least 1.3' }),
  ]),
  quantity('countMultiple', { symbol: 'k', name: 'whole number that divides the cells of every edge', unit: '1' }, [
    way({ needs: ['refinementRatio'], value: ({ refinementRatio }) => (refinementRatio === 2 ? 4 : 6), formula: 'k = 6 for 9:6:4, k = 4 for 4:2:1', source: 'exact coarsening' }),
  ]),
  quantity('cellCountMedium', { symbol: 'N_2', name: 'cells of the medium mesh', unit: '1' }, [
    way({ needs: ['cellCount'], value: ({ cellCount }) => cellCount, formula: 'N_2 = N', source: definition }),
  ]),
  quantity('cellCountCoarse', { symbol: 'N_3', name: 'cells of the coarse mesh', unit: '1' }, [
    way({ needs: ['cellCount', 'refinementRatio', 'meshDimension'], value: (of) => Math.round(of.cellCount / of.refinementRatio ** of.meshDimension), formula: 'N_3 = N r^-d', source: 'all spacings times r' }),
  ]),
  quantity('cellCountFine', { symbol: 'N_1', name: 'cells of the fine mesh', unit: '1' }, [
    way({ needs: ['cellCount', 'refinementRatio', 'meshDimension'], value: (of) => Math.round(of.cellCount * of.refinementRatio ** of.meshDimension), formula: 'N_1 = N r^d', source: 'all spacings over r' }),
  ]),
  quantity('coreCellSizeCoarse', { symbol: 'h_c,3', name: 'core cell of the coarse mesh', unit: 'm' }, [way({ needs: ['coreCellSize', 'refinementRatio'], value: (of) => of.coreCellSize * of.refinementRatio, formula: 'h_c,3 = h_c r', source: definition })]),
  quantity('coreCellSizeFine', { symbol: 'h_c,1', name: 'core cell of the fine mesh', unit: 'm' }, [way({ needs: ['coreCellSize', 'refinementRatio'], value: (of) => of.coreCellSize / of.refinementRatio, formula: 'h_c,1 = h_c/r', source: definition })]),
  quantity('smallestDiffusivity', { symbol: 'Gamma', name: 'smallest diffusivity of what is carried', unit: 'm^2/s' }, [
    way({ needs: ['kinematicViscosity', 'thermalDiffusivity', 'diffusivity'], when: { energySolved: 'yes', 'has.species': 'yes' }, value: (of) => Math.min(of.kinematicViscosity, of.thermalDiffusivity, of.diffusivity), formula: 'Gamma = min(nu, alpha, D_m)', source: definition }),
    way({ needs: ['kinematicViscosity', 'diffusivity'], when: { 'has.species': 'yes' }, value: (of) => Math.min(of.kinematicViscosity, of.diffusivity), formula: 'Gamma = min(nu, D_m)', source: definition }),
    way({ needs: ['kinematicViscosity', 'thermalDiffusivity'], when: { energySolved: 'yes' }, value: (of) => Math.min(of.kinematicViscosity, of.thermalDiffusivity), formula: 'Gamma = min(nu, alpha)', source: definition }),
    way({ needs: ['kinematicViscosity'], value: (of) => of.kinematicViscosity, formula: 'Gamma = nu', source: definition }),
  ]),
  quantity('largestDiffusivity', { symbol: 'Gamma_max', name: 'largest diffusivity of what is carried', unit: 'm^2/s' }, [
    way({ needs: ['kinematicViscosity', 'thermalDiffusivity', 'diffusivity'], when: { energySolved: 'yes', 'has.species': 'yes' }, value: (of) => Math.max(of.kinematicViscosity, of.thermalDiffusivity, of.diffusivity), formula: 'Gamma_max = max(nu, alpha, D_m)', source: definition }),
    way({ needs: ['kinematicViscosity', 'diffusivity'], when: { 'has.species': 'yes' }, value: (of) => Math.max(of.kinematicViscosity, of.diffusivity), formula: 'Gamma_max = max(nu, D_m)', source: definition }),
    way({ needs: ['kinematicViscosity', 'thermalDiffusivity'], when: { energySolved: 'yes' }, value: (of) => Math.max(of.kinematicViscosity, of.thermalDiffusivity), formula: 'Gamma_max = max(nu, alpha)', source: definition }),
    way({ needs: ['kinematicViscosity'], value: (of) => of.kinematicViscosity, formula: 'Gamma_max = nu', source: definition }),
  ]),
  quantity('cellPeclet', { symbol: 'Pe_c', name: 'cell Peclet number of the core', unit: '1' }, [
    way({ needs: ['speed', 'coreCellSize', 'smallestDiffusivity'], value: (of) => (of.speed * of.coreCellSize) / of.smallestDiffusivity, formula: 'Pe_c = U h_c/Gamma', source: 'Patankar 1980' }),
  ]),
  quantity('cellReynolds', { symbol: 'Re_c', name: 'cell Reynolds number of the core', unit: '1' }, [
    way({ needs: ['speed', 'coreCellSize', 'kinematicViscosity'], value: (of) => (of.speed * of.coreCellSize) / of.kinematicViscosity, formula: 'Re_c = U h_c/nu', source: definition }),
  ]),
  quantity('wallAspectRatio', { symbol: 'h_x/h_1', name: 'aspect ratio of the cell at the wall', unit: '1', per: ['region'], plain: 'largest' }, [
    way({ needs: ['regionSizeAlong', 'firstCellHeight'], value: (of) => of.regionSizeAlong / of.firstCellHeight, formula: 'h_x/h_1', source: definition }),
  ]),
];
