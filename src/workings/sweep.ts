import type { Settle } from './spread.ts';
import type { Workings } from './resolve.ts';

/**
 * Values of quantities over a sweep of one input.
 *
 * @param workings  the graph; it stands at its nominal point again afterwards
 * @param input     id of the input, SI
 * @param points    values it takes, SI
 * @param read      reads what is wanted at each point
 * @param settle    settles the words that follow from the numbers
 * @returns         what was read, one entry a point
 */
export function sweep<T>(workings: Workings, input: string, points: readonly number[], read: (workings: Workings, at: number) => T, settle?: Settle): T[] {
  const i = workings.index.get(input);
  const keep = i !== undefined && workings.isPinned(i) ? workings.get(input) : undefined;
  const out = points.map((x) => {
    workings.set(input, x);
    settle?.(workings);
    return read(workings, x);
  });
  workings.set(input, keep);
  settle?.(workings);
  return out;
}

/**
 * Where a reading changes between two points: bisection on the reading itself, for verdicts and words as well as signs.
 *
 * @param read    reading at an input, compared with ===
 * @param a       input at one end
 * @param b       input at the other end, with another reading
 * @param within  relative width at which to stop
 * @returns       the input at which the reading changes, on the side of b
 */
export function flip(read: (x: number) => unknown, a: number, b: number, within = 1e-6): number {
  const first = read(a);
  let [lo, hi] = [a, b];
  const log = lo > 0 && hi > 0;
  for (let k = 0; k < 100 && Math.abs(hi - lo) > within * Math.max(Math.abs(hi), Math.abs(lo)); k++) {
    const m = log ? Math.sqrt(lo * hi) : (lo + hi) / 2;
    if (read(m) === first) lo = m;
    else hi = m;
  }
  return hi;
}
