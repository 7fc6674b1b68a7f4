import { Problem } from '../../problems/index.ts';

/**
 * Root of a function between two points where its sign differs, by Brent's method (1973).
 *
 * @param f          function of one number
 * @param from       one end of the bracket
 * @param to         the other end
 * @param tolerance  absolute width of the bracket at which the search ends
 * @returns          the root
 * @throws           {Problem} no-sign-change when f has the same sign at both ends, not-finite when f is not a number there
 * @source           Brent, Algorithms for Minimization Without Derivatives (1973), chapter 4
 */
export function brent(f: (x: number) => number, from: number, to: number, tolerance = 1e-14): number {
  let a = from, b = to, fa = f(a), fb = f(b);
  if (!Number.isFinite(fa) || !Number.isFinite(fb)) throw new Problem({ code: 'not-finite', message: `the function has no finite value at the ends ${from} and ${to} of the search` });
  if (fa * fb > 0) throw new Problem({ code: 'no-sign-change', message: `no root between ${from} and ${to}: the function has one sign at both ends` });
  let c = a, fc = fa, step = b - a, last = step;
  for (let i = 0; i < 200; i++) {
    if (Math.abs(fc) < Math.abs(fb)) [a, b, c, fa, fb, fc] = [b, c, b, fb, fc, fb];
    const least = 2 * Number.EPSILON * Math.abs(b) + tolerance / 2;
    const half = (c - b) / 2;
    if (Math.abs(half) <= least || fb === 0) return b;
    if (Math.abs(last) < least || Math.abs(fa) <= Math.abs(fb)) last = step = half;
    else {
      const s = fb / fa;
      let p: number, q: number;
      if (a === c) [p, q] = [2 * half * s, 1 - s];
      else {
        const r = fb / fc, t = fa / fc;
        [p, q] = [s * (2 * half * t * (t - r) - (b - a) * (r - 1)), (t - 1) * (r - 1) * (s - 1)];
      }
      if (p > 0) q = -q;
      else p = -p;
      if (2 * p < Math.min(3 * half * q - Math.abs(least * q), Math.abs(last * q))) [last, step] = [step, p / q];
      else last = step = half;
    }
    [a, fa] = [b, fb];
    b += Math.abs(step) > least ? step : Math.sign(half) * least;
    fb = f(b);
    if (fb * fc > 0) [c, fc, last, step] = [a, fa, b - a, b - a];
  }
  return b;
}
