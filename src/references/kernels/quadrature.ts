import { at } from './at.ts';

const nodes = [0.1488743389816312, 0.4333953941292472, 0.6794095682990244, 0.8650633666889845, 0.9739065285171717];
const weights = [0.2955242247147529, 0.2692667193099963, 0.219086362515982, 0.1494513491505806, 0.0666713443086881];

/**
 * Integral by ten-point Gauss rules on equal panels.
 *
 * @param f       function of one number
 * @param from    lower end
 * @param to      upper end
 * @param panels  number of panels
 * @returns       the integral
 * @source        Abramowitz and Stegun, table 25.4
 */
export function integrate(f: (x: number) => number, from: number, to: number, panels = 8): number {
  const half = (to - from) / panels / 2;
  let sum = 0;
  for (let p = 0; p < panels; p++) {
    const middle = from + (2 * p + 1) * half;
    for (let i = 0; i < 5; i++) sum += at(weights, i) * (f(middle - half * at(nodes, i)) + f(middle + half * at(nodes, i)));
  }
  return sum * half;
}
