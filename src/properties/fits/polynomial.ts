/**
 * Polynomial of a degree through samples, its errors weighed by the values, so that the relative error is small.
 * It is found in Chebyshev polynomials of the scaled variable, where the equations are well conditioned, and given in powers of the plain one.
 *
 * @param x       samples, rising
 * @param y       values, none zero
 * @param degree  0 to 8
 * @returns       coefficients of 1, x, x^2, ...
 */
export function polynomialThrough(x: readonly number[], y: readonly number[], degree: number): number[] {
  const [low, high] = [x[0] as number, x.at(-1) as number];
  const n = degree + 1;
  const matrix = Array.from({ length: n }, () => Array.from({ length: n + 1 }, () => 0));
  x.forEach((xi, k) => {
    const t = (2 * xi - low - high) / (high - low);
    const basis = [1, t];
    for (let i = 2; i < n; i++) basis.push(2 * t * (basis[i - 1] as number) - (basis[i - 2] as number));
    const weight = 1 / (y[k] as number) ** 2;
    for (let i = 0; i < n; i++) {
      const row = matrix[i] as number[];
      for (let j = 0; j < n; j++) row[j] = (row[j] as number) + weight * (basis[i] as number) * (basis[j] as number);
      row[n] = (row[n] as number) + weight * (basis[i] as number) * (y[k] as number);
    }
  });
  return inPowers(solved(matrix), low, high);
}

/** Gauss elimination with row exchange; the last column is the right side. */
function solved(rows: number[][]): number[] {
  const n = rows.length;
  for (let i = 0; i < n; i++) {
    const best = rows.slice(i).reduce((at, row, k) => (Math.abs(row[i] as number) > Math.abs((rows[at] as number[])[i] as number) ? i + k : at), i);
    [rows[i], rows[best]] = [rows[best] as number[], rows[i] as number[]];
    for (let k = i + 1; k < n; k++) {
      const factor = ((rows[k] as number[])[i] as number) / ((rows[i] as number[])[i] as number);
      for (let j = i; j <= n; j++) (rows[k] as number[])[j] = ((rows[k] as number[])[j] as number) - factor * ((rows[i] as number[])[j] as number);
    }
  }
  const out = Array.from({ length: n }, () => 0);
  for (let i = n - 1; i >= 0; i--) {
    let sum = (rows[i] as number[])[n] as number;
    for (let j = i + 1; j < n; j++) sum -= ((rows[i] as number[])[j] as number) * (out[j] as number);
    out[i] = sum / ((rows[i] as number[])[i] as number);
  }
  return out;
}

/** Chebyshev coefficients on [low, high] as coefficients of plain powers. */
function inPowers(c: readonly number[], low: number, high: number): number[] {
  const [a, b] = [2 / (high - low), -(low + high) / (high - low)];
  const times = (p: readonly number[]): number[] => {
    const out = Array.from({ length: p.length + 1 }, () => 0);
    p.forEach((v, i) => {
      out[i] = (out[i] as number) + b * v;
      out[i + 1] = (out[i + 1] as number) + a * v;
    });
    return out;
  };
  const sum = c.map(() => 0);
  let [before, now] = [[1], [b, a]];
  c.forEach((ck, k) => {
    const basis = k === 0 ? [1] : now;
    basis.forEach((v, i) => {
      sum[i] = (sum[i] as number) + ck * v;
    });
    if (k > 0) [before, now] = [now, times(now).map((v, i) => 2 * v - (before[i] ?? 0))];
  });
  return sum;
}

/** Value of a polynomial given by its coefficients of 1, x, x^2, ... */
export function polynomialAt(c: readonly number[], x: number): number {
  let y = 0;
  for (let i = c.length - 1; i >= 0; i--) y = y * x + (c[i] as number);
  return y;
}
