/** A fit of values over mesh sizes, value = atZero + sum of a_k h^p_k. */
export interface Fit {
  readonly atZero: number;
  /** Order of a power law that was fitted, else the fixed power or powers of the fit. */
  readonly order: number;
  readonly form: 'power' | 'linear' | 'square' | 'linear-and-square';
  /** Standard deviation of the fit, unit of the values. */
  readonly deviation: number;
  /** Fitted values at the given sizes. */
  readonly fitted: readonly number[];
}

/** Orders among which a power law is sought; one at either end is none. */
export const searchedOrders = [-4, 8] as const;
const scanStep = 0.05;

/** Weighted linear least squares by normal equations on at most three columns scaled to order one; undefined where they are singular. */
function solve(columns: readonly (readonly number[])[], values: readonly number[], weights: readonly number[]): number[] | undefined {
  const n = columns.length;
  const rows = columns.map((a, i) => [...columns.map((b) => weighted(a, b, weights)), weighted(a, values, weights), i]);
  for (let k = 0; k < n; k++) {
    let pivot = k;
    for (let i = k + 1; i < n; i++) if (Math.abs(at(rows, i, k)) > Math.abs(at(rows, pivot, k))) pivot = i;
    [rows[k], rows[pivot]] = [rows[pivot] as number[], rows[k] as number[]];
    if (Math.abs(at(rows, k, k)) < 1e-14) return undefined;
    for (let i = 0; i < n; i++) {
      if (i === k) continue;
      const factor = at(rows, i, k) / at(rows, k, k);
      for (let j = k; j <= n; j++) (rows[i] as number[])[j] = at(rows, i, j) - factor * at(rows, k, j);
    }
  }
  return rows.map((_, i) => at(rows, i, n) / at(rows, i, i));
}

const at = (rows: readonly (readonly number[])[], i: number, j: number): number => (rows[i] as readonly number[])[j] as number;
const weighted = (a: readonly number[], b: readonly number[], w: readonly number[]): number => a.reduce((sum, x, i) => sum + x * (b[i] as number) * (w[i] as number), 0);

function fitOn(columns: readonly (readonly number[])[], values: readonly number[], weights: readonly number[], unknowns: number): { coefficients: number[]; fitted: number[]; deviation: number } | undefined {
  const coefficients = solve(columns, values, weights);
  if (coefficients === undefined) return undefined;
  const fitted = values.map((_, i) => columns.reduce((sum, column, k) => sum + (column[i] as number) * (coefficients[k] as number), 0));
  const squares = values.reduce((sum, v, i) => sum + (weights[i] as number) * (v - (fitted[i] as number)) ** 2, 0);
  return { coefficients, fitted, deviation: Math.sqrt((values.length * squares) / (values.length - unknowns)) };
}

/** The power law for one trial order, on columns that stay independent as the order passes zero: 1 and (h^p - 1)/p. */
function powerAt(p: number, sizes: readonly number[], values: readonly number[], weights: readonly number[]): Fit | undefined {
  const shape = sizes.map((h) => (Math.abs(p) < 1e-9 ? Math.log(h) : Math.expm1(p * Math.log(h)) / p));
  const scale = Math.max(...shape.map(Math.abs));
  const found = fitOn([sizes.map(() => 1), shape.map((x) => x / scale)], values, weights, 3);
  if (found === undefined) return undefined;
  const [constant, slope] = found.coefficients as [number, number];
  return { atZero: constant - slope / scale / p, order: p, form: 'power', deviation: found.deviation, fitted: found.fitted };
}

/**
 * Power law value = atZero + a h^p of least weighted deviation: a scan over p, then the golden section around the best.
 *
 * @param sizes    mesh sizes, > 0
 * @param values   the target on each mesh
 * @param weights  weight of each mesh, sum 1
 * @returns        the fit, or undefined where the equations are singular
 */
export function powerFit(sizes: readonly number[], values: readonly number[], weights: readonly number[]): Fit | undefined {
  const deviation = (p: number): number => powerAt(p, sizes, values, weights)?.deviation ?? Infinity;
  let best = 0;
  let least = Infinity;
  const [first, last] = searchedOrders.map((p) => Math.round(p / scanStep)) as [number, number];
  for (let k = first; k <= last; k++) {
    const d = deviation(k * scanStep);
    if (d < least) [best, least] = [k * scanStep, d];
  }
  const golden = (Math.sqrt(5) - 1) / 2;
  let low = Math.max(searchedOrders[0], best - scanStep);
  let high = Math.min(searchedOrders[1], best + scanStep);
  for (let i = 0; i < 60; i++) {
    const a = high - golden * (high - low);
    const b = low + golden * (high - low);
    if (deviation(a) < deviation(b)) high = b;
    else low = a;
  }
  return powerAt((low + high) / 2, sizes, values, weights);
}

/**
 * Fit with fixed powers, value = atZero + sum of a_k h^p_k.
 *
 * @param form     name of the form
 * @param powers   the powers, one or two
 * @param sizes    mesh sizes, > 0
 * @param values   the target on each mesh
 * @param weights  weight of each mesh, sum 1
 * @returns        the fit, or undefined where the equations are singular
 */
export function fixedFit(form: Fit['form'], powers: readonly number[], sizes: readonly number[], values: readonly number[], weights: readonly number[]): Fit | undefined {
  const found = fitOn([sizes.map(() => 1), ...powers.map((p) => sizes.map((h) => h ** p))], values, weights, powers.length + 1);
  if (found === undefined) return undefined;
  return { atZero: found.coefficients[0] as number, order: Math.max(...powers), form, deviation: found.deviation, fitted: found.fitted };
}
