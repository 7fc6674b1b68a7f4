import { Problem } from '../problems/index.ts';
import { pchip } from '../references/index.ts';
import type { Table } from './table.ts';

export type Interpolation = 'pchip' | 'linear';

/** A result brought to the points of a known table. */
export interface AtPoints {
  /** Indices of the points that the result covers, in their order. */
  readonly covered: readonly number[];
  /** Interpolated result at the covered points. */
  readonly values: readonly number[];
  /** Largest difference between straight lines and monotone cubics at the covered points: what the spacing of the result leaves open. */
  readonly interpolationError: number;
}

/**
 * A result interpolated to given points; never extrapolated.
 *
 * @param table   the table of results
 * @param places  index of its coordinate column; rows may stand in any order
 * @param column  index of its value column
 * @param points  where it is wanted [SI]
 * @param how     monotone cubic or straight lines
 * @returns       values at the points inside the result's range
 * @throws        {Problem} too-few-points, same-place
 */
export function atPoints(table: Table, places: number, column: number, points: readonly number[], how: Interpolation): AtPoints {
  const xs = table.columns[places]?.values ?? [];
  const ys = table.columns[column]?.values ?? [];
  if (xs.length < 2) throw new Problem({ code: 'too-few-points', message: 'a profile of one row cannot be interpolated', file: table.file, expected: 'two rows or more' });
  const order = xs.map((_, i) => i).sort((a, b) => (xs[a] as number) - (xs[b] as number));
  const twice = order.findIndex((row, k) => k > 0 && xs[row] === xs[order[k - 1] as number]);
  if (twice > 0) {
    const row = Math.max(order[twice] as number, order[twice - 1] as number);
    throw new Problem({ code: 'same-place', message: `two rows stand at the same ${table.columns[places]?.name ?? 'place'}`, ...table.place(row, places), expected: 'one row for each place' });
  }
  const x = order.map((i) => xs[i] as number);
  const y = order.map((i) => ys[i] as number);
  const [low, high] = [x[0] as number, x.at(-1) as number];
  const slack = 1e-9 * (high - low);
  const covered = points.flatMap((point, i) => (point >= low - slack && point <= high + slack ? [i] : []));
  const cubic = pchip(x, y);
  const both = covered.map((i) => [cubic(points[i] as number), straight(x, y, points[i] as number)] as const);
  return {
    covered,
    values: both.map(([smooth, line]) => (how === 'pchip' ? smooth : line)),
    interpolationError: both.reduce((most, [smooth, line]) => Math.max(most, Math.abs(smooth - line)), 0),
  };
}

function straight(x: readonly number[], y: readonly number[], at: number): number {
  let low = 0;
  let high = x.length - 1;
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    if ((x[middle] as number) <= at) low = middle;
    else high = middle;
  }
  const [x0, x1, y0, y1] = [x[low], x[high], y[low], y[high]] as [number, number, number, number];
  return y0 + (y1 - y0) * Math.min(1, Math.max(0, (at - x0) / (x1 - x0)));
}
