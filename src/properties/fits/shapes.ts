import { polynomialAt, polynomialThrough } from './polynomial.ts';

/** What is typed into a program: named numbers, or rows with straight lines between them. */
export interface Shape {
  readonly formula: string;
  readonly coefficients: readonly { readonly name: string; readonly value: number }[];
  readonly rows?: readonly (readonly [number, number])[];
  readonly at: (x: number) => number;
}

const rounded = (x: number, digits: number): number => Number(x.toPrecision(digits));

/** y = a0 + a1 x + ... */
export function polynomial(x: readonly number[], y: readonly number[], degree: number, digits: number): Shape {
  const c = polynomialThrough(x, y, degree).map((one) => rounded(one, digits));
  return { formula: `y = ${c.map((_, i) => (i === 0 ? 'a0' : i === 1 ? 'a1 x' : `a${i} x^${i}`)).join(' + ')}`, coefficients: c.map((value, i) => ({ name: `a${i}`, value })), at: (at) => polynomialAt(c, at) };
}

/** y = y0 (x/x0)^n through the middle of the logarithms. */
export function power(x: readonly number[], y: readonly number[], digits: number): Shape {
  const x0 = rounded(x[0] as number, 12);
  const logs = x.map((xi) => Math.log(xi / x0));
  const values = y.map((yi) => Math.log(Math.abs(yi)));
  const [start, slope] = straight(logs, values);
  const n = rounded(slope, digits);
  const mean = (list: readonly number[]): number => list.reduce((a, b) => a + b, 0) / list.length;
  const y0 = rounded(Math.sign(y[0] as number) * Math.exp(start + (slope - n) * mean(logs)), digits);
  return { formula: 'y = y0 (x/x0)^n', coefficients: [{ name: 'y0', value: y0 }, { name: 'x0', value: x0 }, { name: 'n', value: n }], at: (at) => y0 * (at / x0) ** n };
}

/** Sutherland's law, y = y0 (T/T0)^(3/2) (T0 + S)/(T + S): linear in 1/y0 and S/y0 once written as T^1.5/y. */
export function sutherland(x: readonly number[], y: readonly number[], digits: number): Shape {
  const T0 = rounded(x[0] as number, 12);
  // T^1.5/y = T0^1.5/(y0 (T0 + S)) (T + S): a straight line in T; its relative error is that of y.
  const line = polynomialThrough(x, x.map((T, i) => T ** 1.5 / (y[i] as number)), 1);
  const S = rounded((line[0] as number) / (line[1] as number), digits);
  const y0 = rounded(T0 ** 1.5 / ((line[1] as number) * (T0 + S)), digits);
  return { formula: 'y = y0 (x/x0)^1.5 (x0 + S)/(x + S)', coefficients: [{ name: 'y0', value: y0 }, { name: 'x0', value: T0 }, { name: 'S', value: S }], at: (T) => (y0 * (T / T0) ** 1.5 * (T0 + S)) / (T + S) };
}

/** Vogel's law, ln y = A + B/(T - C): a straight line in 1/(T - C), C sought where the largest departure from it is least. */
export function vogel(x: readonly number[], y: readonly number[], digits: number): Shape {
  const logs = y.map((yi) => Math.log(yi));
  const line = (C: number): { readonly A: number; readonly B: number; readonly off: number } => {
    const u = x.map((T) => 1 / (T - C));
    const [A, B] = straight(u, logs);
    return { A, B, off: u.reduce((worst, ui, i) => Math.max(worst, Math.abs(A + B * ui - (logs[i] as number))), 0) };
  };
  // Golden section: C = 0 is Andrade's law, and the pole stays below the range.
  const ratio = (Math.sqrt(5) - 1) / 2;
  let [low, high] = [0, 0.95 * (x[0] as number)];
  for (let i = 0; i < 60; i++) {
    const [a, b] = [high - ratio * (high - low), low + ratio * (high - low)];
    if (line(a).off < line(b).off) high = b;
    else low = a;
  }
  const C = rounded((low + high) / 2, digits);
  const { A, B } = line(C);
  const [a, b] = [rounded(A, digits), rounded(B, digits)];
  return { formula: 'y = exp(A + B/(x - C))', coefficients: [{ name: 'A', value: a }, { name: 'B', value: b }, { name: 'C', value: C }], at: (T) => Math.exp(a + b / (T - C)) };
}

/** Least squares of a straight line: its value at zero and its slope. */
function straight(u: readonly number[], v: readonly number[]): readonly [number, number] {
  const mean = (list: readonly number[]): number => list.reduce((a, b) => a + b, 0) / list.length;
  const [mu, mv] = [mean(u), mean(v)];
  const slope = u.reduce((sum, ui, i) => sum + (ui - mu) * ((v[i] as number) - mv), 0) / u.reduce((sum, ui) => sum + (ui - mu) ** 2, 0);
  return [mv - slope * mu, slope];
}

/** Straight lines between rows. */
function between(rows: readonly (readonly [number, number])[]): (x: number) => number {
  return (x) => {
    let i = 1;
    while (i < rows.length - 1 && x > (rows[i] as readonly [number, number])[0]) i++;
    const [[x0, y0], [x1, y1]] = [rows[i - 1] as readonly [number, number], rows[i] as readonly [number, number]];
    return y0 + ((y1 - y0) * (x - x0)) / (x1 - x0);
  };
}

const ofRows = (rows: readonly (readonly [number, number])[], formula: string): Shape => ({ formula, coefficients: [], rows, at: between(rows) });

/** A table of even steps. */
export function table(x: readonly number[], y: readonly number[], steps: number, digits: number): Shape {
  const rows = Array.from({ length: steps + 1 }, (_, i) => {
    const k = Math.round((i * (x.length - 1)) / steps);
    return [rounded(x[k] as number, 12), rounded(y[k] as number, digits)] as const;
  });
  return ofRows(rows, `${rows.length} rows at even steps, straight lines between them`);
}

/** Straight pieces, each as long as the error allows. */
export function piecewise(x: readonly number[], y: readonly number[], within: number, digits: number): Shape {
  const knot = (k: number): readonly [number, number] => [rounded(x[k] as number, 12), rounded(y[k] as number, digits)];
  const holds = (from: number, to: number): boolean => {
    const line = between([knot(from), knot(to)]);
    for (let k = from + 1; k < to; k++) if (Math.abs(line(x[k] as number) / (y[k] as number) - 1) > within) return false;
    return true;
  };
  const ends = [0];
  while ((ends.at(-1) as number) < x.length - 1) {
    const from = ends.at(-1) as number;
    let to = from + 1;
    while (to < x.length - 1 && holds(from, to + 1)) to++;
    ends.push(to);
  }
  return ofRows(ends.map(knot), `${ends.length - 1} straight pieces between ${ends.length} points`);
}
