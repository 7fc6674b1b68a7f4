/** Values of the residual part and its derivatives, overwritten by the next evaluation. */
export interface Residual {
  a: number;
  /** Derivative by delta. */
  d: number;
  dd: number;
  /** Derivative by tau. */
  t: number;
  tt: number;
  dt: number;
}

/** Adds its terms to a record. */
export type Adder = (tau: number, delta: number, out: Residual) => void;

/**
 * Terms with any real power of the density and decay in density and temperature: rows [n, d, t, g, l, gt, lt],
 * n delta^d tau^t exp(-g delta^l - gt tau^lt).
 *
 * @param rows  coefficients as printed
 * @returns     adds the terms and their derivatives to a record
 * @source      de Reuck and Craven, Methanol, International Thermodynamic Tables 12, Blackwell 1993
 */
export function decayingPart(rows: readonly (readonly number[])[]): Adder {
  return (tau, delta, out) => {
    for (const row of rows) {
      const [n, d, t, g, l, gt, lt] = row as [number, number, number, number, number, number, number];
      const inDensity = g === 0 ? 0 : g * delta ** l;
      const inTemperature = gt === 0 ? 0 : gt * tau ** lt;
      const v = n * delta ** d * tau ** t * Math.exp(-inDensity - inTemperature);
      const sd = (d - l * inDensity) / delta;
      const st = (t - lt * inTemperature) / tau;
      add(out, v, { sd, st, sdd: (-d - l * (l - 1) * inDensity) / (delta * delta), stt: (-t - lt * (lt - 1) * inTemperature) / (tau * tau) });
    }
  };
}

/**
 * Terms of associating fluids: rows [n, d, t, eta, beta, gamma, epsilon, b],
 * n delta^d tau^t exp(eta (delta - epsilon)^2 + 1/(b + beta (tau - gamma)^2)).
 *
 * @param rows  coefficients as printed
 * @returns     adds the terms and their derivatives to a record
 * @source      Gao, Wu, Bell and Lemmon, J. Phys. Chem. Ref. Data 49 (2020) 013102, eq. (13)
 */
export function associatingPart(rows: readonly (readonly number[])[]): Adder {
  return (tau, delta, out) => {
    for (const row of rows) {
      const [n, d, t, eta, beta, gamma, epsilon, b] = row as [number, number, number, number, number, number, number, number];
      const u = b + beta * (tau - gamma) ** 2;
      const du = 2 * beta * (tau - gamma);
      const v = n * delta ** d * tau ** t * Math.exp(eta * (delta - epsilon) ** 2 + 1 / u);
      add(out, v, { sd: d / delta + 2 * eta * (delta - epsilon), st: t / tau - du / (u * u), sdd: -d / (delta * delta) + 2 * eta, stt: -t / (tau * tau) - (2 * beta) / (u * u) + (2 * du * du) / (u * u * u) });
    }
  };
}

/** Adds a product of a function of delta and one of tau by its logarithmic derivatives, first and second. */
function add(out: Residual, v: number, s: { readonly sd: number; readonly st: number; readonly sdd: number; readonly stt: number }): void {
  out.a += v;
  out.d += v * s.sd;
  out.dd += v * (s.sd * s.sd + s.sdd);
  out.t += v * s.st;
  out.tt += v * (s.st * s.st + s.stt);
  out.dt += v * s.sd * s.st;
}
