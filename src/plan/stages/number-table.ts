import { stepOf } from '../../workings/index.ts';
import { table, type Ground } from '../ground.ts';
import { nameOf } from '../say.ts';
import type { Table } from '../types.ts';

/** A table of numbers with their formulas, those that can be had; none where nothing can. */
export function numberTable(on: Ground, title: string, ids: readonly string[]): Table[] {
  const had = ids.filter((id) => on.has(id));
  return had.length === 0 ? [] : [table(title, ['number', 'value', 'formula'], had.map((id) => [nameOf(on, id), { id }, stepOf(on.assembled.workings, id)?.formula ?? '']))];
}

/** Regions of the mesh whose cells can be counted. */
export const meshRegions = (on: Ground): readonly string[] => on.assembled.flow.regions.filter((r) => on.has(`regionCells@${r}`));
