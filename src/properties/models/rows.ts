/** Coefficients with their exponents, one term a row, as papers print them. */
export type Rows = readonly (readonly number[])[];

/** Sum of n x^e over rows [n, e]. */
export function sumOfPowers(rows: Rows, x: number): number {
  let sum = 0;
  for (const [n, e] of rows as readonly [number, number][]) sum += e === 0 ? n : n * x ** e;
  return sum;
}

/** Sum of n x^d y^t over rows [n, d, t]. */
export function sumOfProducts(rows: Rows, x: number, y: number): number {
  let sum = 0;
  for (const [n, d, t] of rows as readonly [number, number, number][]) sum += n * (d === 0 ? 1 : x ** d) * (t === 0 ? 1 : y ** t);
  return sum;
}

/** One column of rows, for sums that are asked for often. */
export const column = (rows: Rows | undefined, index: number): Float64Array => Float64Array.from(rows ?? [], (row) => row[index] ?? 0);
