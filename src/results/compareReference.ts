import { Problem, type ProblemData } from '../problems/index.ts';
import type { Evaluation, Reference } from '../references/index.ts';
import { compareTable } from './compare.ts';
import { compareValues } from './compareValues.ts';
import type { Allowances, KnownValue, TableComparison, ValueComparison } from './comparison.ts';
import { rungTolerance } from './deviation.ts';
import type { Outcome } from './limit.ts';
import { matchColumns } from './match.ts';
import type { Table } from './table.ts';

/** A result held against a known answer. */
export interface ReferenceComparison {
  readonly reference: string;
  readonly source: string;
  /** Largest relative deviation that the step allows, unless another was asked for [1]. */
  readonly limit: number;
  readonly tables: readonly TableComparison[];
  readonly values: readonly ValueComparison[];
  /** The worst of all. */
  readonly outcome: Outcome;
  /** Defaults taken and inputs outside the range of the answer. */
  readonly flags: readonly string[];
  /** What to look at first; only where the limit is missed. */
  readonly ifMissed?: string;
}

/**
 * A result held against a known answer: a file of one row against its single numbers, a profile against the table whose columns
 * the file has.
 *
 * @param reference   the known answer
 * @param evaluation  the answer for the inputs of the case
 * @param result      the table of results
 * @param options     limit (that of the step unless said) and uncertainties; the number that a rung compares, which then counts under its plain name too
 * @returns           all comparisons the file allows, and the worst outcome
 * @throws            {Problem} those of the evaluation, missing-column where nothing of the file fits, those of compareTable
 */
export function compareReference(reference: Reference, evaluation: Evaluation, result: Table, options: Omit<Allowances, 'limit'> & { readonly limit?: number; readonly compares?: string }): ReferenceComparison {
  if (evaluation.problems.length > 0) throw new Problem(evaluation.problems);
  const limit = options.limit ?? reference.passLimit ?? rungTolerance(reference);
  const allowances = { ...options, limit };
  const measure = reference.kind === 'measured' ? 'rms' : 'largest';
  const values = result.rowCount === 1 ? compareValues(asked(evaluation.values, options.compares, result), result, allowances) : [];
  const misfits: ProblemData[] = [];
  const fitting = evaluation.tables.filter((table) => fits(table.columns, result, misfits));
  const tables = result.rowCount === 1 ? [] : fitting.map((table) => compareTable(table, result, { ...allowances, measure, uncertainty: reference.uncertainty }));
  const outcomes = [...values, ...tables].map((one) => one.outcome);
  const outcome = (['missed', 'cannot tell', 'met'] as const).find((one) => outcomes.includes(one));
  if (outcome === undefined) throw nothingFits(reference, evaluation, result, misfits);
  return { reference: reference.id, source: reference.source, limit, tables, values, outcome, flags: evaluation.flags, ...(outcome === 'missed' ? { ifMissed: reference.ifMissed } : {}) };
}

/**
 * The known numbers as a rung asks for them: where it compares `nusseltUniformFlux` and the file has a plain `nusselt` alone, that
 * column is the one compared, not the number of the same plain name.
 */
function asked(values: readonly KnownValue[], compares: string | undefined, result: Table): readonly KnownValue[] {
  const one = values.find((value) => value.id === compares);
  if (one === undefined || matchColumns([one], result).some((pair) => pair.by === 'name')) return values;
  const plain = values.find((value) => value !== one && one.id.startsWith(value.id) && value.unit === one.unit);
  return plain === undefined ? values : values.flatMap((value) => (value === plain ? [] : value === one ? [{ ...one, id: plain.id }] : [value]));
}

/** Whether the file has the coordinate and a column of a table; a unit that does not fit is kept for the complaint. */
function fits(columns: Evaluation['tables'][number]['columns'], result: Table, misfits: ProblemData[]): boolean {
  try {
    const matched = matchColumns(columns, result);
    return matched.some((pair) => pair.known === columns[0]) && matched.length > 1;
  } catch (error) {
    if (!(error instanceof Problem)) throw error;
    misfits.push(...error.list);
    return false;
  }
}

function nothingFits(reference: Reference, evaluation: Evaluation, result: Table, misfits: readonly ProblemData[]): Problem {
  if (misfits[0] !== undefined) return new Problem(misfits[0]);
  const tables = evaluation.tables.map((table) => table.columns.map((column) => `${column.id} [${column.unit}]`).join(', '));
  const single = evaluation.values.map((value) => value.id);
  const ways = [...tables.map((columns) => `a profile with ${columns}`), ...(single.length > 0 ? [`one row with any of ${single.join(', ')}`] : [])];
  return new Problem({ code: 'missing-column', message: `no column of the file is known to ${reference.id}`, file: result.file, line: result.columns[0]?.line ?? 1, expected: ways.join('; or ') });
}
