import type { Bound } from './slot.ts';

/** A need of a way that stands outside the way's range. */
export interface OutOfRange {
  readonly need: string;
  readonly value: number;
  readonly range: readonly [number, number];
}

/** How far outside its range a way is, as a logarithm summed over its needs; 0 inside, infinite where a need is no number. */
export function farOutside(b: Bound, values: Float64Array): number {
  const { range, needs } = b.way;
  if (range === undefined) return 0;
  let far = 0;
  for (let k = 0; k < needs.length; k++) {
    const r = range[needs[k] as string];
    if (r === undefined) continue;
    const v = values[b.needs[k] as number] as number;
    if (v > r[1]) far += distance(v, r[1]);
    else if (v < r[0]) far += distance(v, r[0]);
    else if (Number.isNaN(v)) far += Number.POSITIVE_INFINITY;
  }
  return far;
}

/** The needs of a way that lie outside its range. */
export function needsOutside(b: Bound, values: Float64Array): OutOfRange[] {
  const { range, needs } = b.way;
  if (range === undefined) return [];
  return needs.flatMap((name, k) => {
    const own = range[name];
    const value = values[b.needs[k] as number] as number;
    return own !== undefined && (value < own[0] || value > own[1]) ? [{ need: b.ids[k] as string, value, range: own }] : [];
  });
}

function distance(v: number, end: number): number {
  return v > 0 && end > 0 ? Math.abs(Math.log(v / end)) : Math.abs(v - end) / Math.max(Math.abs(end), Math.abs(v));
}
