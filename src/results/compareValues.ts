import { Problem } from '../problems/index.ts';
import { valueSays } from './compareWords.ts';
import type { Allowances, KnownValue, ValueComparison } from './comparison.ts';
import { judgeDeviation } from './deviation.ts';
import { matchColumns } from './match.ts';
import { halfWidths, headOfKnown } from './parts.ts';
import type { Table } from './table.ts';

/**
 * Single numbers of a result, a table of one row, held against known numbers of the same names.
 *
 * @param known    the known numbers
 * @param result   the table of results
 * @param options  limit and uncertainties; shares are of the known number
 * @returns        one comparison for each known number that the file has; empty where it has none
 * @throws         {Problem} many-rows, wrong-dimension, those of the limits
 * @source         ASME V&V 20 (2009)
 */
export function compareValues(known: readonly KnownValue[], result: Table, options: Allowances): ValueComparison[] {
  const pairs = matchColumns(known, result).filter((pair) => pair.by === 'name');
  if (pairs.length > 0 && result.rowCount > 1) {
    throw new Problem({ code: 'many-rows', message: `the file has ${result.rowCount} rows of ${pairs.map((pair) => pair.column.name).join(', ')}, and the known answer is one number`, ...result.place(1, pairs[0]?.at ?? 0), expected: 'one row' });
  }
  return pairs.map((pair) => {
    const one = known.find((each) => each === pair.known) as KnownValue;
    const head = headOfKnown(one);
    const value = pair.column.values[0] as number;
    const { limit, parts } = halfWidths(head, options, Math.abs(one.value), one.uncertainty * Math.abs(one.value));
    const deviation = value - one.value;
    const facts = { name: one.name, unit: one.unit, column: pair.column.name, result: value, known: one.value, deviation, limit, parts, ...judgeDeviation(deviation, limit, parts) };
    return { ...facts, says: valueSays(facts, head) };
  });
}
