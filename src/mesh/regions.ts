import { quantity, way, ways, type Definition, type Way } from '../workings/index.ts';
import { plane } from './cuts.ts';
import { geometricRatio } from './grading.ts';

const practice = 'common practice';
const geometry = 'geometry';
const treatment = 'choice.turbulence-treatment';
const perRegion = { per: ['region'] as const };

const stacks = (n: number, where: string): Way => ({ needs: [], value: () => n, formula: `n_w = ${n}: ${where}`, source: geometry });

/** A size along or along the span. Where eddies are resolved cells are not stretched, and wall regions of resolved walls take so many viscous lengths at most. */
function limited(axis: 'x' | 'z', stretch: string, plus: Readonly<Record<'les' | 'dns', number>>): Way[] {
  const sources = { les: 'Piomelli and Balaras, Annu. Rev. Fluid Mech. 34 (2002) 349', dns: 'Moser, Kim and Mansour, Phys. Fluids 11 (1999) 943' };
  return [
    ...(['les', 'dns'] as const).map((word) => way({ needs: ['coreCellSize', 'regionCoarsening', 'regionWalls', 'viscousLength'], when: { [treatment]: word }, value: (of) => (of.regionWalls > 0 ? Math.min(of.coreCellSize * of.regionCoarsening, plus[word] * of.viscousLength) : of.coreCellSize * of.regionCoarsening), formula: `h_${axis} = ${plus[word]} nu/u_tau at walls, at most h_c a_c`, source: sources[word] })),
    way({ needs: ['coreCellSize', 'regionCoarsening'], when: { [treatment]: ['wall-modelled-les', 'hybrid'] }, value: (of) => of.coreCellSize * of.regionCoarsening, formula: `h_${axis} = h_c a_c`, source: 'eddies have no long direction' }),
    way({ needs: ['coreCellSize', 'regionCoarsening', stretch], value: (of) => (of['coreCellSize'] as number) * (of['regionCoarsening'] as number) * (of[stretch] as number), formula: `h_${axis} = h_c a_c a_${axis}`, source: practice }),
  ];
}

/** Up to the next multiple, so that the whole family has whole counts; nothing stays nothing. */
const upTo = (count: number, multiple: number): number => (count <= 0 ? 0 : multiple * Math.ceil(count / multiple - 1e-9));

/** Cells over a width of which so many wall stacks take their part. */
function across(width: string, size: string, walls: string, symbol: string): Way[] {
  return [
    way({ needs: [width, size, walls, 'layerCount', 'layerStackHeight', 'countMultiple'], value: (of) => upTo(Math.max((of[width] as number) / (of[size] as number), (of[walls] as number) * (of['layerCount'] as number) + Math.max(0, (of[width] as number) - (of[walls] as number) * (of['layerStackHeight'] as number)) / (of[size] as number)), of['countMultiple'] as number), formula: `n = n_w N_l + (${symbol} - n_w S)/h, at least ${symbol}/h, up to the multiple`, source: 'layers at each wall, equal cells between' }),
    way({ needs: [width, size, 'countMultiple'], value: (of) => upTo((of[width] as number) / (of[size] as number), of['countMultiple'] as number), formula: `n = ${symbol}/h, up to the multiple`, source: 'equal cells' }),
  ];
}

/** The mesh region by region: extents, sizes and cells in each direction. A flow gives the extents. */
export const regions: Definition[] = [
  quantity('regionAlong', { symbol: 'L_r', name: 'extent of a region along the flow', unit: 'm', ...perRegion }),
  quantity('regionAcross', { symbol: 'W_r', name: 'extent of a region across the flow', unit: 'm', ...perRegion }),
  quantity('regionSpan', { symbol: 'B_r', name: 'extent of a region in the third direction', unit: 'm', ...perRegion }),
  quantity('regionSpanStretch', { symbol: 'a_z', name: 'cell along the span over the cell across', unit: '1', ...perRegion }, [way({ needs: [], value: () => 1, formula: 'a_z = 1', source: practice })]),
  quantity('regionWalls', { symbol: 'n_w', name: 'stacks of wall layers that a line across a region passes', unit: '1', ...perRegion }, [
    way({ needs: ['meshDimension'], when: { flowClass: 'internal', ductSection: 'round' }, value: ({ meshDimension }) => (meshDimension === 3 ? 4 : 2), formula: 'n_w = 4 in three directions: the wall closes round the section', source: geometry }),
    way({ needs: [], when: { flowClass: ['internal', 'enclosure'] }, value: () => 2, formula: 'n_w = 2: walls on both sides', source: geometry }),
    stacks(0, 'no wall in this region'),
  ]),
  ...['near', 'surface', 'layer', 'layers'].map((place) => ways(`regionWalls@${place}`, [{ ...stacks(1, 'one wall'), when: { flowClass: ['body', 'jet'] } }])),
  quantity('regionSpanWalls', { symbol: 'n_wz', name: 'stacks of wall layers along the span', unit: '1', ...perRegion }, [
    way({ needs: [], when: { flowClass: 'internal', ductSection: 'rectangular', infiniteDepth: 'no' }, value: () => 2, formula: 'n_wz = 2: side walls', source: geometry }),
    stacks(0, 'no side walls'),
  ]),
  quantity('regionSizeAcross', { symbol: 'h_y', name: 'cell of a region across the flow, away from walls', unit: 'm', ...perRegion }, [
    way({ needs: ['coreCellSize', 'regionCoarsening'], value: ({ coreCellSize, regionCoarsening }) => coreCellSize * regionCoarsening, formula: 'h_y = h_c a_c', source: practice }),
  ]),
  quantity('regionSizeAlong', { symbol: 'h_x', name: 'cell of a region along the flow', unit: 'm', ...perRegion, plain: 'smallest' }, limited('x', 'regionStretch', { les: 70, dns: 10 })),
  quantity('regionSizeSpan', { symbol: 'h_z', name: 'cell of a region along the span', unit: 'm', ...perRegion }, limited('z', 'regionSpanStretch', { les: 20, dns: 5 })),
  quantity('cellsAlong', { symbol: 'n_x', name: 'cells of a region along the flow', unit: '1', ...perRegion, plain: 'sum' }, [
    way({ needs: ['regionAlong', 'regionSizeAlong', 'countMultiple'], value: ({ regionAlong, regionSizeAlong, countMultiple }) => upTo(regionAlong / regionSizeAlong, countMultiple), formula: 'n_x = L_r/h_x, up to the multiple', source: 'equal cells' }),
  ]),
  quantity('cellsAcross', { symbol: 'n_y', name: 'cells of a region across the flow', unit: '1', ...perRegion }, across('regionAcross', 'regionSizeAcross', 'regionWalls', 'W_r')),
  quantity('cellsSpan', { symbol: 'n_z', name: 'cells of a region along the span', unit: '1', ...perRegion }, [
    way({ needs: [], when: { 'choice.dimension-and-cuts': plane }, value: () => 1, formula: 'n_z = 1', source: 'the chosen cuts' }),
    ...across('regionSpan', 'regionSizeSpan', 'regionSpanWalls', 'B_r'),
  ]),
  quantity('edgeRatio', { symbol: 'g_e', name: 'ratio of neighbouring cells on the edge from the wall, all cells of the edge counted', unit: '1', ...perRegion }, [
    way({ needs: ['regionAcross', 'cellsAcross', 'regionWalls', 'firstCellHeight'], value: (of) => edgeRatio(of), formula: 'g_e: h_1 (g^n - 1)/(g - 1) = W_r over n cells, both halved between two walls', source: 'geometric series, root by bisection and Newton steps' }),
  ]),
  quantity('edgeLast', { symbol: 'h_e', name: 'last cell of the edge from the wall', unit: 'm', ...perRegion }, [
    way({ needs: ['edgeRatio', 'cellsAcross', 'regionWalls', 'firstCellHeight'], value: (of) => of.firstCellHeight * of.edgeRatio ** (of.cellsAcross / Math.min(2, of.regionWalls) - 1), formula: 'h_e = h_1 g_e^(n - 1), n halved between two walls', source: 'geometric series' }),
  ]),
  quantity('regionCells', { symbol: 'N_r', name: 'cells of a region', unit: '1', ...perRegion, plain: 'sum' }, [
    way({ needs: ['cellsAlong', 'cellsAcross', 'cellsSpan', 'cutShare'], value: ({ cellsAlong, cellsAcross, cellsSpan, cutShare }) => cellsAlong * cellsAcross * cellsSpan * cutShare, formula: 'N_r = n_x n_y n_z s_c', source: 'product of the directions' }),
  ]),
  quantity('regionPeclet', { symbol: 'Pe_r', name: 'cell Peclet number of a region, along the flow', unit: '1', ...perRegion }, [
    way({ needs: ['speed', 'regionSizeAlong', 'smallestDiffusivity'], value: ({ speed, regionSizeAlong, smallestDiffusivity }) => (speed * regionSizeAlong) / smallestDiffusivity, formula: 'Pe_r = U h_x/Gamma', source: 'Patankar 1980' }),
  ]),
];

/** Not finite where no wall is met or the cells of the edge are larger than it. */
function edgeRatio(of: { readonly regionAcross: number; readonly cellsAcross: number; readonly regionWalls: number; readonly firstCellHeight: number }): number {
  if (of.regionWalls === 0) return Number.NaN;
  const parts = Math.min(2, of.regionWalls);
  return geometricRatio({ first: of.firstCellHeight, length: of.regionAcross / parts, cells: of.cellsAcross / parts });
}
