import { lines, table, type Ground } from '../ground.ts';
import type { Cell, Line, Table } from '../types.ts';
import { meshRegions } from './number-table.ts';

interface Layout {
  readonly blocks: string;
  readonly singular: string;
  /** Names of the ends of the edges: along the flow, across, along the span. */
  readonly along: readonly [string, string];
  readonly across: readonly [string, string];
  readonly span: readonly [string, string];
}

const passage: Layout = { blocks: 'one block from inlet to outlet', singular: 'none', along: ['inlet end', 'outlet end'], across: ['wall', 'opposite wall'], span: ['side', 'opposite side'] };

/** Block layouts of the flows that a few blocks describe. */
const layouts: Readonly<Record<string, Layout>> = {
  pipe: { ...passage, blocks: 'five blocks in the section: an H core within an O ring; core corners at 0.6 of the radius, its sides bowed to 0.8 of that', singular: 'the four corners of the core, 120 degrees each, outside the layers', across: ['wall', 'opposite wall, through the core'], span: ['quarter arc', 'next quarter'] },
  'pipe slice': { ...passage, blocks: 'one block from the axis to the wall', singular: 'none', across: ['wall', 'opposite wall; the slice has half of it'] },
  channel: passage,
  duct: passage,
  plate: { blocks: 'two H blocks, free approach and plate, and one behind; cells gathered on both sides of the leading edge, the first 0.2 to 0.5 % of the length', singular: 'none', along: ['upstream end', 'downstream end'], across: ['plate', 'outer side'], span: ['side', 'opposite side'] },
  cylinder: { blocks: 'an O ring of eight blocks to 1.5 diameters, H blocks around it, a wake block in line', singular: 'where the ring meets the H blocks, one diameter off the wall or more', along: ['front', 'round and downstream'], across: ['wall', 'outer side'], span: ['end', 'opposite end'] },
  sphere: { blocks: 'six-faced ring to 1.5 diameters, H blocks around it', singular: 'eight corners of the ring, 120 degrees each', along: ['front', 'round and downstream'], across: ['wall', 'outer side'], span: ['face', 'next face'] },
  'backward-step': { blocks: 'three H blocks: upstream, above the step, behind it; cells equal on both sides of each line through the lip', singular: 'none; the lip is a singular point of the flow', along: ['inlet end', 'outlet end'], across: ['lower wall', 'upper wall'], span: ['side', 'opposite side'] },
  'packed-bed': { ...passage, blocks: 'one block through free space, bed and free space, lines on both faces of the bed' },
};
const cavity: Layout = { blocks: 'one H block, graded to each pair of walls', singular: 'none', along: ['lower wall', 'upper wall'], across: ['left wall', 'right wall'], span: ['end', 'opposite end'] };

function layoutOf(on: Ground): Layout | undefined {
  const { id } = on.assembled.flow;
  if (id === 'pipe' && on.number('meshDimension') === 2) return layouts['pipe slice'];
  return layouts[id] ?? (on.word('flowClass') === 'enclosure' ? cavity : undefined);
}
const blocky = (on: Ground): boolean => ['structured', 'block-structured'].includes(on.choice('mesh-topology').chosen);

/** How the region is cut into blocks and where lines may not meet. */
export function blockLines(on: Ground): Line[] {
  const layout = layoutOf(on);
  if (layout === undefined || !blocky(on)) return [];
  return lines(`Blocks: ${layout.blocks}. Singular edges: ${layout.singular}.`, 'Opposite edges of a block share their count; where blocks meet, the last spacing of one is the first of the next within a factor of 1.2.');
}

/** The recipe, one line an edge. */
export function blockTable(on: Ground): Table[] {
  const layout = layoutOf(on);
  if (layout === undefined || !blocky(on)) return [];
  const cell = (id: string): Cell => (on.has(id) ? { id } : '');
  const rows = meshRegions(on).flatMap((r): Cell[][] => {
    const walls = on.number(`regionWalls@${r}`) ?? 0;
    const graded = walls > 0 && on.has(`edgeRatio@${r}`);
    const [spans, sideWalls] = [on.number(`cellsSpan@${r}`) ?? 1, on.number(`regionSpanWalls@${r}`) ?? 0];
    return [
      [r, 'along', ...layout.along, cell(`cellsAlong@${r}`), cell(`regionSizeAlong@${r}`), cell(`regionSizeAlong@${r}`), 'equal', '1'],
      [r, 'across', ...layout.across, cell(`cellsAcross@${r}`), graded ? cell('firstCellHeight') : cell(`regionSizeAcross@${r}`), graded ? (walls > 1 ? cell('firstCellHeight') : cell(`edgeLast@${r}`)) : cell(`regionSizeAcross@${r}`), graded ? (walls > 1 ? 'geometric from both ends' : 'geometric') : 'equal', graded ? cell(`edgeRatio@${r}`) : '1'],
      ...(spans > 1 ? [[r, 'span', ...layout.span, cell(`cellsSpan@${r}`), sideWalls > 0 ? cell('firstCellHeight') : cell(`regionSizeSpan@${r}`), sideWalls > 0 ? cell('firstCellHeight') : cell(`regionSizeSpan@${r}`), sideWalls > 0 ? 'geometric from both ends' : 'equal', sideWalls > 0 ? cell('growthRatio') : '1']] : []),
    ];
  });
  return rows.length === 0 ? [] : [table('Block recipe', ['block', 'edge', 'from', 'to', 'cells', 'first spacing', 'last spacing', 'law', 'ratio'], rows)];
}
