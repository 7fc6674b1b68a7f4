import { at } from './at.ts';

/**
 * Marches a system of ordinary differential equations with the classical fourth-order Runge-Kutta method and equal steps.
 *
 * @param slope  derivative of the state at a place
 * @param start  state at the first place
 * @param from   first place
 * @param to     last place
 * @param steps  number of equal steps
 * @returns      the states at the steps + 1 places, the first included
 * @source       Kutta 1901
 */
export function march(slope: (x: number, y: readonly number[]) => number[], start: readonly number[], from: number, to: number, steps: number): number[][] {
  const h = (to - from) / steps;
  const states: number[][] = [[...start]];
  let y: readonly number[] = start;
  for (let i = 0; i < steps; i++) {
    const x = from + i * h;
    const k1 = slope(x, y);
    const k2 = slope(x + h / 2, shifted(y, k1, h / 2));
    const k3 = slope(x + h / 2, shifted(y, k2, h / 2));
    const k4 = slope(x + h, shifted(y, k3, h));
    const next = y.map((value, j) => value + (h / 6) * (at(k1, j) + 2 * at(k2, j) + 2 * at(k3, j) + at(k4, j)));
    states.push(next);
    y = next;
  }
  return states;
}

function shifted(y: readonly number[], k: readonly number[], by: number): number[] {
  return y.map((value, j) => value + by * at(k, j));
}
