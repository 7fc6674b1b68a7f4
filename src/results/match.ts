import { Problem, type ProblemData } from '../problems/index.ts';
import { dimensionOf, dimensionText, sameDimension } from '../units/index.ts';
import { near } from './header.ts';
import type { Column, Table } from './table.ts';

/** A column of known numbers: its id, the name it is shown by, its SI unit. */
export interface KnownColumn {
  readonly id: string;
  readonly name: string;
  readonly unit: string;
}

/** Which column of a result stands for which known column. */
export interface Matched {
  readonly known: KnownColumn;
  readonly column: Column;
  /** Index in the table of results. */
  readonly at: number;
  /** `unit`: the names differ, but no other column of either side has this unit. */
  readonly by: 'name' | 'unit';
}

const plainName = (name: string): string => name.toLowerCase().replaceAll(/[\s_-]/g, '');

/**
 * Columns of a result for known columns: by id or name first (case, blanks, hyphens and underscores do not count), else by a
 * unit that one column alone has on either side. A plain number never matches by its unit.
 *
 * @param known   the known columns
 * @param result  the table of results
 * @returns       the pairs found, in the order of the known columns
 * @throws        {Problem} wrong-dimension, where a name fits and its unit does not
 */
export function matchColumns(known: readonly KnownColumn[], result: Table): Matched[] {
  const problems: ProblemData[] = [];
  const named = known.flatMap((one): Matched[] => {
    const names = [plainName(one.id), plainName(one.name)];
    const at = result.columns.findIndex((column) => names.includes(plainName(column.name)));
    const column = result.columns[at];
    if (column === undefined) return [];
    if (sameDimension(column.unit.dimension, dimensionOf(one.unit))) return [{ known: one, column, at, by: 'name' }];
    problems.push({ code: 'wrong-dimension', message: `the column "${column.name}" has the unit ${column.unitText}`, file: result.file, line: column.line, column: column.column, length: column.name.length, expected: `${one.name} in ${one.unit === '1' ? 'plain numbers' : one.unit}` });
    return [];
  });
  if (problems.length > 0) throw new Problem(problems);
  const openKnown = known.filter((one) => !named.some((pair) => pair.known === one));
  const openResult = result.columns.map((column, at) => ({ column, at })).filter(({ at }) => !named.some((pair) => pair.at === at));
  const byUnit = openKnown.flatMap((one): Matched[] => {
    const dimension = dimensionOf(one.unit);
    const fits = openResult.filter(({ column }) => sameDimension(column.unit.dimension, dimension));
    const rivals = openKnown.filter((other) => sameDimension(dimensionOf(other.unit), dimension));
    const [only] = fits;
    if (only === undefined || fits.length > 1 || rivals.length > 1 || dimensionText(dimension) === '1') return [];
    return [{ known: one, column: only.column, at: only.at, by: 'unit' }];
  });
  return known.flatMap((one) => [...named, ...byUnit].find((pair) => pair.known === one) ?? []);
}

/**
 * The column of a known one, or a problem that names what the file should have.
 *
 * @param matched  the pairs found
 * @param one      the known column
 * @param result   the table of results
 * @returns        its pair
 * @throws         {Problem} missing-column
 */
export function needColumn(matched: readonly Matched[], one: KnownColumn, result: Table): Matched {
  const found = matched.find((pair) => pair.known === one);
  if (found !== undefined) return found;
  const names = result.columns.map((column) => column.name);
  throw new Problem({ code: 'missing-column', message: `no column of the file is "${one.id}" (${one.name})`, file: result.file, line: result.columns[0]?.line ?? 1, expected: `a column ${one.id} [${one.unit}] beside ${names.join(', ')}`, ...near(one.id, names) });
}
