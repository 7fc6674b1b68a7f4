/** Simple correlations: value in the unit that `gives` names, argument in the unit that `argument` names (kelvin unless said). */
export interface Scaled {
  /** Factor and zero of the unit of the value; the compiled form of `gives`. */
  readonly gives?: { readonly factor: number; readonly offset: number };
  readonly argument?: { readonly factor: number; readonly offset: number };
}

const inUnit = (c: Scaled, T: number): number => (c.argument === undefined ? T : (T - c.argument.offset) / c.argument.factor);
const toSI = (c: Scaled, y: number): number => (c.gives === undefined ? y : y * c.gives.factor + c.gives.offset);

/** y = sum a_i x^i, x the temperature in the printed unit less `origin`, divided by `scale`. */
export const polynomial = (c: Scaled & { terms: readonly number[]; origin?: number; scale?: number }) => (T: number): number => {
  const x = (inUnit(c, T) - (c.origin ?? 0)) / (c.scale ?? 1);
  let y = 0;
  for (let i = c.terms.length - 1; i >= 0; i--) y = y * x + (c.terms[i] as number);
  return toSI(c, y);
};

/** y = sum n x^e over rows [n, e]. */
export const powers = (c: Scaled & { terms: readonly (readonly number[])[] }) => (T: number): number => {
  const x = inUnit(c, T);
  let y = 0;
  for (const [n, e] of c.terms as readonly [number, number][]) y += n * x ** e;
  return toSI(c, y);
};

/** y = value x^exponent. */
export const power = (c: Scaled & { value: number; exponent: number }) => (T: number): number => toSI(c, c.value * inUnit(c, T) ** c.exponent);

/** ln y = sum n x^e + k ln x over rows [n, e]. */
export const logPowers = (c: Scaled & { terms: readonly (readonly number[])[]; log?: number }) => (T: number): number => {
  const x = inUnit(c, T);
  let y = (c.log ?? 0) * Math.log(x);
  for (const [n, e] of c.terms as readonly [number, number][]) y += n * x ** e;
  return toSI(c, Math.exp(y));
};

/** y = y0 + sum n (1 - T/T_c)^e over rows [n, e]: surface tension, saturated density. */
export const criticalPowers = (c: Scaled & { critical: number; terms: readonly (readonly number[])[]; base?: number }) => (T: number): number => {
  const x = Math.max(0, 1 - T / c.critical);
  let y = c.base ?? 0;
  for (const [n, e] of c.terms as readonly [number, number][]) y += n * x ** e;
  return toSI(c, y);
};

/**
 * Sutherland's law of gas viscosity or conductivity, y = y0 (T/T0)^(3/2) (T0 + S)/(T + S).
 *
 * @param c  value at T0, T0 [K], S [K]
 * @returns  function of T [K]
 * @source   Sutherland, Phil. Mag. 36 (1893) 507; form as in White, Viscous Fluid Flow
 */
export const sutherland = (c: { value: number; T0: number; S: number }) => (T: number): number => (c.value * (T / c.T0) ** 1.5 * (c.T0 + c.S)) / (T + c.S);

/**
 * Vogel's law of liquid viscosity, ln y = A + B/(T - C).
 *
 * @param c  A, B [K], C [K]
 * @returns  function of T [K]
 * @source   Vogel, Phys. Z. 22 (1921) 645
 */
export const vogel = (c: Scaled & { A: number; B: number; C: number }) => (T: number): number => toSI(c, Math.exp(c.A + c.B / (T - c.C)));

/** Andrade's law of liquid viscosity, y = A exp(B/T). @source Andrade, Phil. Mag. 17 (1934) 497 and 698 */
export const andrade = (c: Scaled & { A: number; B: number }) => (T: number): number => toSI(c, c.A * Math.exp(c.B / T));

/**
 * Kinematic viscosity of an oil between two known points, log10 log10 (nu + 0.7) = A - B log10 T with nu in mm^2/s.
 *
 * @param c  two temperatures [K] and the kinematic viscosities there [m^2/s]
 * @returns  kinematic viscosity [m^2/s] as a function of T [K]
 * @source   ASTM D341 (form after Walther 1931)
 */
export const walther = (c: { T1: number; nu1: number; T2: number; nu2: number }) => {
  const z = (nu: number): number => Math.log10(Math.log10(nu * 1e6 + 0.7));
  const B = (z(c.nu1) - z(c.nu2)) / (Math.log10(c.T2) - Math.log10(c.T1));
  const A = z(c.nu1) + B * Math.log10(c.T1);
  return (T: number): number => 1e-6 * (10 ** 10 ** (A - B * Math.log10(T)) - 0.7);
};

/** Table with straight lines between its rows [x, y] (or straight in ln y), beyond its ends carried on along the last piece. */
export const table = (c: Scaled & { rows: readonly (readonly number[])[]; interpolate?: string }) => (T: number): number => {
  const x = inUnit(c, T);
  const rows = c.rows as readonly [number, number][];
  let i = 1;
  while (i < rows.length - 1 && x > (rows[i] as [number, number])[0]) i++;
  const [x0, y0] = rows[i - 1] as [number, number];
  const [x1, y1] = rows[i] ?? [x0, y0];
  const share = x1 === x0 ? 0 : (x - x0) / (x1 - x0);
  return toSI(c, c.interpolate === 'logarithm' ? y0 * (y1 / y0) ** share : y0 + (y1 - y0) * share);
};

/** y = value / sum a_i x^i, x the temperature in the printed unit less `origin`. */
export const reciprocalPolynomial = (c: Scaled & { value: number; terms: readonly number[]; origin?: number }) => (T: number): number => {
  const x = inUnit(c, T) - (c.origin ?? 0);
  let below = 0;
  for (let i = c.terms.length - 1; i >= 0; i--) below = below * x + (c.terms[i] as number);
  return toSI(c, c.value / below);
};

/** ln(p/p_c) = (T_c/T) sum n (1 - T/T_c)^e over rows [n, e]: vapour pressure. */
export const saturationPowers = (c: { temperature: number; pressure: number; terms: readonly (readonly number[])[] }) => (T: number): number => {
  const x = Math.max(0, 1 - T / c.temperature);
  let sum = 0;
  for (const [n, e] of c.terms as readonly [number, number][]) sum += n * x ** e;
  return c.pressure * Math.exp((sum * c.temperature) / T);
};

/** A mixture by temperature and share: y (or ln y) = sum c_ij (T - origin)^i (x - share)^j. */
export const mixturePolynomial = (c: Scaled & { origin: number; share: number; rows: readonly (readonly number[])[]; of?: string }) => (T: number, share: number): number => {
  const t = T - c.origin;
  const x = share - c.share;
  let y = 0;
  for (let i = c.rows.length - 1; i >= 0; i--) {
    const row = c.rows[i] as readonly number[];
    let along = 0;
    for (let j = row.length - 1; j >= 0; j--) along = along * x + (row[j] as number);
    y = y * t + along;
  }
  return toSI(c, c.of === 'logarithm' ? Math.exp(y) : y);
};

/** log10 y = A - B/(C + x). */
export const antoine = (c: Scaled & { A: number; B: number; C: number }) => (T: number): number => toSI(c, 10 ** (c.A - c.B / (c.C + inUnit(c, T))));

/** Melting temperature of ice under pressure: the printed melting pressure p/p_t = 1 + sum a (1 - (T/T_t)^b), inverted. */
export const iceMeltingLine = (c: { temperature: number; pressure: number; terms: readonly (readonly number[])[] }) => (p: number): number => {
  const melting = (T: number): number => {
    let sum = 1;
    for (const [a, b] of c.terms as readonly [number, number][]) sum += a * (1 - (T / c.temperature) ** b);
    return sum * c.pressure;
  };
  // The melting pressure falls steeply and smoothly with temperature: secants from both sides of the triple point.
  let [a, b] = [c.temperature, c.temperature - 1];
  let fa = melting(a) - p;
  for (let i = 0; i < 20; i++) {
    const fb = melting(b) - p;
    if (Math.abs(fb) < 1e-9 * p || fb === fa) break;
    const next = Math.min(c.temperature + 0.01, Math.max(251, b - (fb * (b - a)) / (fb - fa)));
    [a, fa, b] = [b, fb, next];
    if (Math.abs(b - a) < 1e-10) break;
  }
  return b;
};
