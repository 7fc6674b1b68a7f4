const mostPasses = 60;

/** How a fixed point was found, or that it was not: `lost` where the law cannot be had on the way, `open` where it did not close. */
export type FixedPoint =
  | { readonly found: true; readonly x: number; readonly passes: number; readonly residual: number; readonly slope: number | undefined }
  | { readonly found: false; readonly why: 'lost' | 'open'; readonly passes: number; readonly residual: number; readonly slope: number | undefined };

/**
 * Fixed point x = g(x), by secant steps on g(x) - x. Once the residual has changed its sign, the root stays between the two ends:
 * where a word changes on the way it may jump over zero, and the search then rests at the jump.
 *
 * @param g       the law; NaN where it cannot be had
 * @param start   first trial
 * @param within  relative change at which it counts as closed
 * @param slope   slope of g(x) - x where it was last closed, for the first step
 * @returns       the point with passes, last residual and last slope
 */
export function fixedPoint(g: (x: number) => number, start: number, within: number, slope?: number): FixedPoint {
  let last = slope;
  const ends = (found: boolean, x: number, passes: number, residual: number): FixedPoint => (found ? { found, x, passes, residual, slope: last } : { found, why: Number.isNaN(residual) ? 'lost' : 'open', passes, residual, slope: last });
  let x0 = start;
  let r0 = g(x0) - x0;
  if (Number.isNaN(r0)) return ends(false, x0, 1, r0);
  if (Math.abs(r0) <= within * Math.abs(x0)) return ends(true, x0, 1, r0);
  let x = x0 + (last === undefined ? r0 : -r0 / last);
  let end: { x: number; r: number } | undefined;
  for (let passes = 2; passes <= mostPasses && Number.isFinite(x); passes++) {
    const r = g(x) - x;
    if (Number.isNaN(r)) return ends(false, x, passes, r);
    if (Math.abs(r) <= within * Math.abs(x)) return ends(true, x, passes, r);
    if (r * r0 < 0) end = { x: x0, r: r0 };
    if (end !== undefined && Math.abs(end.x - x) <= Math.max(within, 1e-9) * Math.abs(x)) return ends(true, x, passes, r);
    const steep = (r - r0) / (x - x0);
    const step = -r / steep;
    const good = Number.isFinite(step) && step !== 0;
    if (good) last = steep;
    const stuck = end !== undefined && Math.abs(r) > 0.5 * Math.abs(r0);
    x0 = x;
    r0 = r;
    x += good && Math.abs(step) <= 5 * Math.abs(r) ? step : r;
    if (end !== undefined && (stuck || (x - x0) * (x - end.x) >= 0)) x = (x0 + end.x) / 2;
  }
  return ends(false, x0, mostPasses, r0);
}
