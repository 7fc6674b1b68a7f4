import { Problem, type ProblemData } from '../problems/index.ts';
import { dimensionless, dimensionOf, sameDimension } from '../units/index.ts';
import { near } from './header.ts';
import type { Column, Table } from './table.ts';

/** What tells the meshes apart: cells (counted), a size of cells, or a time step. */
export type FineBy = 'cells' | 'size' | 'step';

/** A family of meshes or steps, finest first. */
export interface MeshFamily {
  readonly by: FineBy;
  readonly dimension: 2 | 3;
  /** Cells, size [m] or step [s] of each. */
  readonly marks: readonly number[];
  /** Size or step over the finest, which is 1; rising. */
  readonly sizes: readonly number[];
  /** Size of each over the next finer one. */
  readonly ratios: readonly number[];
  readonly targets: readonly Target[];
  /** What makes the family a poor witness, in words. */
  readonly cautions: readonly string[];
}

export interface Target extends Omit<Column, 'values'> {
  /** Finest first [SI]. */
  readonly values: readonly number[];
}

const units: Readonly<Record<FineBy, string>> = { cells: '1', size: 'm', step: 's' };
const mostMeshes = 50;
const zonePrefix = 'cells in ';
/** 1.3 is asked for; what rounds to it passes. */
const leastRatio = 1.29;
const zoneTolerance = 0.05;

/**
 * A table of meshes as a family: the first column is `cells`, `size [m]` or `step [s]`, columns `cells in NAME` are cells of one
 * zone, the others are targets. Rows may stand in any order.
 *
 * @param table      the table
 * @param dimension  2 or 3: h is proportional to cells to the power -1/dimension
 * @returns          the family, finest first, with what speaks against it
 * @throws           {Problem} too-many-meshes, unknown-column, wrong-dimension, not-positive, same-mesh, one-mesh, no-target
 * @source           Celik et al. 2008, steps 1 and 2; similar zones within 5 %: common practice
 */
export function meshFamily(table: Table, dimension: 2 | 3): MeshFamily {
  const [first, ...others] = table.columns as [Column, ...Column[]];
  if (table.rowCount > mostMeshes) throw new Problem({ code: 'too-many-meshes', message: `the file has ${table.rowCount} rows, one a mesh`, ...table.place(mostMeshes, 0), expected: `at most ${mostMeshes}; a time signal is for series` });
  const by = fineBy(first, table.file);
  const zones = others.filter((column) => column.name.toLowerCase().startsWith(zonePrefix));
  // A second column that tells the meshes apart is no target.
  const seconds = others.filter((column) => column.name.toLowerCase() in units);
  const targets = others.filter((column) => !zones.includes(column) && !seconds.includes(column));
  const problems: ProblemData[] = [first, ...zones, ...seconds].flatMap((column) => notPositive(column, table));
  const order = first.values.map((_, i) => i).sort((a, b) => (by === 'cells' ? -1 : 1) * (at(first.values, a) - at(first.values, b)));
  order.slice(1).forEach((row, k) => {
    const finer = order[k] as number;
    if (at(first.values, row) !== at(first.values, finer)) return;
    const later = Math.max(row, finer);
    problems.push({ code: 'same-mesh', message: `two rows have the same ${first.name}`, ...table.place(later, 0), expected: 'one row for each mesh or step' });
  });
  if (table.rowCount < 2) problems.push({ code: 'one-mesh', message: 'one row tells nothing about the error of a mesh or step', file: table.file, line: table.place(0, 0).line, expected: 'two rows, better three with a ratio of sizes of 1.3 or more' });
  if (targets.length === 0) problems.push({ code: 'no-target', message: `there is no column beside "${first.name}" to judge`, file: table.file, line: first.line, column: first.column, expected: 'targets such as pressure drop [Pa] in the columns behind the first' });
  if (problems.length > 0) throw new Problem(problems);

  const sorted = (column: Column): number[] => order.map((i) => at(column.values, i));
  const marks = sorted(first);
  const finest = marks[0] as number;
  const sizes = marks.map((mark) => (by === 'cells' ? (finest / mark) ** (1 / dimension) : mark / finest));
  const ratios = sizes.slice(1).map((size, k) => size / at(sizes, k));
  const cautions = [...smallRatios(ratios), ...seconds.flatMap((column) => otherwise(column.name, sorted(column), ratios, dimension)), ...unlikeZones(zones.map((zone) => ({ name: zone.name.slice(zonePrefix.length), counts: sorted(zone) })), ratios, dimension)];
  return { by, dimension, marks, sizes, ratios, cautions, targets: targets.map((target) => ({ ...target, values: sorted(target) })) };
}

const at = (list: readonly number[], i: number): number => list[i] as number;

function fineBy(first: Column, file: string): FineBy {
  const by = first.name.toLowerCase();
  const place = { file, line: first.line, column: first.column, length: first.name.length };
  if (by !== 'cells' && by !== 'size' && by !== 'step') throw new Problem({ code: 'unknown-column', message: `the first column is "${first.name}"`, ...place, expected: 'cells, size [m] or step [s] in the first column', ...near(by, Object.keys(units)) });
  const wanted = dimensionOf(units[by]);
  if (sameDimension(first.unit.dimension, wanted)) return by;
  const unitText = first.unitText === '1' && !sameDimension(wanted, dimensionless) ? 'no unit' : `the unit ${first.unitText}`;
  throw new Problem({ code: 'wrong-dimension', message: `${by} has ${unitText}`, ...place, expected: by === 'cells' ? 'cells without a unit' : `${by} [${units[by]}]` });
}

function notPositive(column: Column, table: Table): ProblemData[] {
  const k = table.columns.indexOf(column);
  return column.values.flatMap((value, row) => (value > 0 ? [] : [{ code: 'not-positive', message: `${column.name} is ${value}`, ...table.place(row, k), expected: 'more than zero' }]));
}

function smallRatios(ratios: readonly number[]): string[] {
  const small = ratios.filter((ratio) => ratio < leastRatio);
  if (small.length === 0) return [];
  const shown = small.map((ratio) => ratio.toFixed(2)).join(', ');
  return [`a ratio of sizes of ${shown} is below 1.3: between such near meshes only a small part of the error is seen, and noise is taken for order`];
}

/** A second account of how fine the meshes are that does not agree with the first. */
function otherwise(name: string, marks: readonly number[], ratios: readonly number[], dimension: number): string[] {
  const power = name.toLowerCase() === 'cells' ? -1 / dimension : 1;
  const own = marks.slice(1).map((mark, k) => (mark / at(marks, k)) ** power);
  const unlike = own.findIndex((ratio, k) => Math.abs(ratio / at(ratios, k) - 1) > zoneTolerance);
  return unlike < 0 ? [] : [`the column "${name}" gives a ratio of sizes of ${at(own, unlike).toFixed(2)} where the first column gives ${at(ratios, unlike).toFixed(2)}, which counts: see --dimension`];
}

function unlikeZones(zones: readonly { name: string; counts: readonly number[] }[], ratios: readonly number[], dimension: number): string[] {
  return zones.flatMap(({ name, counts }) => {
    const own = counts.slice(1).map((count, k) => (at(counts, k) / count) ** (1 / dimension));
    const unlike = own.findIndex((ratio, k) => Math.abs(ratio / at(ratios, k) - 1) > zoneTolerance);
    if (unlike < 0) return [];
    return [`the meshes are not similar: the ratio of sizes is ${at(own, unlike).toFixed(2)} in ${name} and ${at(ratios, unlike).toFixed(2)} over all, so the order means little`];
  });
}
