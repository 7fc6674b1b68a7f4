import { Problem } from '../problems/index.ts';
import { comparisonCautions, comparisonSays } from './compareWords.ts';
import type { CompareOptions, Comparison, KnownTable, TableComparison } from './comparison.ts';
import { judgeDeviation } from './deviation.ts';
import { matchColumns, needColumn, type KnownColumn, type Matched } from './match.ts';
import { norms, rangeOf } from './norms.ts';
import { halfWidths, headOfKnown } from './parts.ts';
import { atPoints } from './profile.ts';
import type { Table } from './table.ts';

/**
 * A result held against a table of known numbers: columns found by name and unit, the result interpolated to the known points
 * and never extrapolated, norms, the largest deviation with its place, the outcome with E = S - D and its uncertainty.
 *
 * @param known    the table
 * @param result   the table of results
 * @param options  limit, uncertainties, measure, interpolation
 * @returns        one comparison for each known column that the file has
 * @throws         {Problem} missing-column, wrong-dimension, no-overlap, too-few-points, same-place, those of the limits
 * @source         ASME V&V 20 (2009); points compared by interpolating the result: common practice
 */
export function compareTable(known: KnownTable, result: Table, options: CompareOptions): TableComparison {
  const [coordinate, ...valueColumns] = known.columns as [KnownColumn, ...KnownColumn[]];
  const matched = matchColumns(known.columns, result);
  const places = needColumn(matched, coordinate, result);
  const pairs = matched.filter((pair) => pair !== places);
  if (pairs.length === 0) needColumn(matched, valueColumns[0] ?? coordinate, result);
  const columns = pairs.map((pair) => compareColumn(known, result, places, pair, options));
  const outcome = (['missed', 'cannot tell', 'met'] as const).find((one) => columns.some((column) => column.outcome === one)) ?? 'cannot tell';
  return {
    title: known.title,
    coordinate: { name: coordinate.name, unit: coordinate.unit, column: places.column.name },
    columns: columns as unknown as [Comparison, ...Comparison[]],
    missing: valueColumns.filter((one) => !pairs.some((pair) => pair.known === one)).map((one) => one.name),
    outcome,
  };
}

function compareColumn(known: KnownTable, result: Table, places: Matched, pair: Matched, options: CompareOptions): Comparison {
  const column = (one: KnownColumn): number[] => known.rows.map((row) => row[known.columns.indexOf(one)] as number);
  const points = column(places.known);
  const all = column(pair.known);
  const found = atPoints(result, places.at, pair.at, points, options.interpolation ?? 'pchip');
  const span = `${Math.min(...points)} .. ${Math.max(...points)} ${places.known.unit === '1' ? '' : places.known.unit}`.trim();
  if (found.covered.length === 0) throw new Problem({ code: 'no-overlap', message: `${places.column.name} in the file and ${places.known.name} of the known answer do not overlap`, file: result.file, line: places.column.line, column: places.column.column, expected: `places within ${span}` });
  const data = found.covered.map((i) => all[i] as number);
  const distance = norms(found.values, data, rangeOf(all));
  const at = found.covered[distance.at] as number;

  const band = known.band > 0 ? known.band : (options.uncertainty ?? 0) * Math.abs(all[at] as number);
  const head = headOfKnown(pair.known);
  const { parts, limit } = halfWidths(head, options, distance.scale, band);
  const measure = options.measure ?? 'largest';
  const deviation = measure === 'largest' ? distance.largest : distance.l2;
  const verdict = judgeDeviation(deviation, limit, parts);
  const outside = points.filter((_, i) => !found.covered.includes(i));
  const thin = 2 * found.covered.length < points.length;
  const inBand = found.values.filter((s, i) => Math.abs(s - (data[i] as number)) <= (known.band > 0 ? known.band : (options.uncertainty ?? 0) * Math.abs(data[i] as number))).length;
  const facts = {
    ...verdict,
    outcome: thin && verdict.outcome === 'met' ? ('cannot tell' as const) : verdict.outcome,
    name: pair.known.name,
    unit: pair.known.unit,
    column: pair.column.name,
    by: pair.by,
    norms: distance,
    deviation,
    measure,
    limit,
    place: { at: points[at] as number, result: found.values[distance.at] as number, known: all[at] as number },
    parts,
    points: found.covered.length,
    outside,
    ...(band > 0 ? { withinBand: inBand / data.length } : {}),
  };
  const about = { head, coordinate: { name: places.known.name, unit: places.known.unit }, interpolationError: found.interpolationError, thin };
  return { ...facts, says: comparisonSays(facts, about), cautions: comparisonCautions(facts, about) };
}
