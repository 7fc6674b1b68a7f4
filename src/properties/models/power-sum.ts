/** A double power series and its derivatives, overwritten by the next evaluation. */
export interface Sum {
  s: number;
  x: number;
  xx: number;
  y: number;
  yy: number;
  xy: number;
}

/**
 * Evaluates the sum of n x^I y^J with whole exponents, negative ones included, and its first and second derivatives.
 *
 * @param rows  rows [I, J, n] as printed
 * @returns     function of x and y, both nonzero, that fills and returns one shared record
 */
export function powerSum(rows: readonly (readonly number[])[]): (x: number, y: number) => Sum {
  const I = Int32Array.from(rows, (row) => (row[0] as number));
  const J = Int32Array.from(rows, (row) => (row[1] as number));
  const n = Float64Array.from(rows, (row) => (row[2] as number));
  const xs = ladder(I);
  const ys = ladder(J);
  const at = Int32Array.from(I, (i) => i - xs.lowest);
  const to = Int32Array.from(J, (j) => j - ys.lowest);
  const out: Sum = { s: 0, x: 0, xx: 0, y: 0, yy: 0, xy: 0 };
  return (x, y) => {
    xs.fill(x);
    ys.fill(y);
    let s = 0, sx = 0, sxx = 0, sy = 0, syy = 0, sxy = 0;
    for (let k = 0; k < n.length; k++) {
      const v = (n[k] as number) * (xs.values[at[k] as number] as number) * (ys.values[to[k] as number] as number);
      const i = (I[k] as number);
      const j = (J[k] as number);
      s += v;
      sx += v * i;
      sxx += v * i * (i - 1);
      sy += v * j;
      syy += v * j * (j - 1);
      sxy += v * i * j;
    }
    out.s = s;
    out.x = sx / x;
    out.xx = sxx / (x * x);
    out.y = sy / y;
    out.yy = syy / (y * y);
    out.xy = sxy / (x * y);
    return out;
  };
}

/**
 * Evaluates the sum of n x^i y^j, i and j whole and not negative.
 *
 * @param rows  rows [i, j, n] as printed
 * @returns     function of x and y
 */
export function polynomialOfTwo(rows: readonly (readonly number[])[]): (x: number, y: number) => number {
  const width = Math.max(...rows.map((row) => (row[1] as number))) + 1;
  const height = Math.max(...rows.map((row) => (row[0] as number))) + 1;
  const full = new Float64Array(width * height);
  for (const [i, j, n] of rows as readonly [number, number, number][]) full[i * width + j] = n;
  return (x, y) => {
    let sum = 0;
    for (let i = height - 1; i >= 0; i--) {
      let row = 0;
      for (let j = width - 1; j >= 0; j--) row = row * y + (full[i * width + j] as number);
      sum = sum * x + row;
    }
    return sum;
  };
}

/** All whole powers of a number between the lowest and the highest exponent; kept while the number stays the same. */
function ladder(exponents: Int32Array): { lowest: number; values: Float64Array; fill: (x: number) => void } {
  const lowest = Math.min(0, ...exponents);
  const highest = Math.max(0, ...exponents);
  const values = new Float64Array(highest - lowest + 1);
  let kept = Number.NaN;
  return {
    lowest,
    values,
    fill(x) {
      if (x === kept) return;
      kept = x;
      values[-lowest] = 1;
      for (let i = 1 - lowest; i < values.length; i++) values[i] = (values[i - 1] as number) * x;
      const inverse = 1 / x;
      for (let i = -lowest - 1; i >= 0; i--) values[i] = (values[i + 1] as number) * inverse;
    },
  };
}
