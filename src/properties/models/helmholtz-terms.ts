import { associatingPart, decayingPart, type Adder, type Residual } from './helmholtz-rare-terms.ts';
import { column } from './rows.ts';

/** Residual terms of a Helmholtz equation of state, as the papers print them. */
export interface ResidualTerms {
  /** Rows [n, d, t, c]: n delta^d tau^t exp(-delta^c); c = 0 means without the exponential. */
  readonly power: readonly (readonly number[])[];
  /** Rows [n, d, t, alpha, beta, gamma, epsilon]: n delta^d tau^t exp(-alpha (delta - epsilon)^2 - beta (tau - gamma)^2). */
  readonly gaussian?: readonly (readonly number[])[];
  /** Rows [n, a, b, B, C, D, A, beta]: n Delta^b delta psi, the terms that shape the critical region. */
  readonly critical?: readonly (readonly number[])[];
  /** Rows [n, d, t, g, l, gt, lt], any real powers. */
  readonly decaying?: readonly (readonly number[])[];
  /** Rows [n, d, t, eta, beta, gamma, epsilon, b], the terms of associating fluids. */
  readonly associating?: readonly (readonly number[])[];
}

/**
 * Builds the evaluation of the residual part alpha_r(tau, delta).
 *
 * The powers of tau are kept between calls at one temperature, so that a search for the density costs only the powers of delta.
 *
 * @param terms  coefficients as printed
 * @returns      first: alpha_r, its first two derivatives by delta; all: the derivatives by tau as well. Both fill and return one shared record
 * @source       form: Span, Multiparameter Equations of State, Springer 2000, sections 3.1 and 3.3
 */
export function residualPart(terms: ResidualTerms): { first: (tau: number, delta: number) => Residual; all: (tau: number, delta: number) => Residual } {
  const [n, d, t, c] = [0, 1, 2, 3].map((i) => column(terms.power, i)) as [Float64Array, Float64Array, Float64Array, Float64Array];
  const count = n.length;
  const warmed = new Float64Array(count);
  const powers = new Float64Array(Math.max(0, ...d, ...c) + 1);
  const decays = new Float64Array(Math.max(0, ...c) + 1);
  const out: Residual = { a: 0, d: 0, dd: 0, t: 0, tt: 0, dt: 0 };
  let tauKept = Number.NaN;
  const gaussian = gaussianPart(terms.gaussian ?? []);
  const critical = criticalPart(terms.critical ?? []);
  const decaying = terms.decaying && decayingPart(terms.decaying);
  const associating = terms.associating && associatingPart(terms.associating);

  const run = (tau: number, delta: number, full: boolean): Residual => {
    if (tau !== tauKept) {
      const log = Math.log(tau);
      for (let i = 0; i < count; i++) warmed[i] = (n[i] as number) * Math.exp((t[i] as number) * log);
      tauKept = tau;
    }
    powers[0] = 1;
    for (let i = 1; i < powers.length; i++) powers[i] = (powers[i - 1] as number) * delta;
    for (let i = 1; i < decays.length; i++) decays[i] = Math.exp(-(powers[i] as number));
    let a = 0, ad = 0, add = 0, at = 0, att = 0, adt = 0;
    for (let i = 0; i < count; i++) {
      const ci = (c[i] as number);
      const bend = ci === 0 ? 0 : ci * (powers[ci] as number);
      const v = (warmed[i] as number) * (powers[d[i] as number] as number) * (ci === 0 ? 1 : (decays[ci] as number));
      const slope = (d[i] as number) - bend;
      a += v;
      ad += v * slope;
      add += v * (slope * (slope - 1) - ci * bend);
      if (full) {
        const ti = (t[i] as number);
        at += v * ti;
        att += v * ti * (ti - 1);
        adt += v * ti * slope;
      }
    }
    out.a = a;
    out.d = ad / delta;
    out.dd = add / (delta * delta);
    out.t = at / tau;
    out.tt = att / (tau * tau);
    out.dt = adt / (tau * delta);
    if (gaussian !== undefined) gaussian(tau, delta, out);
    if (critical !== undefined) critical(tau, delta, out);
    if (decaying !== undefined) decaying(tau, delta, out);
    if (associating !== undefined) associating(tau, delta, out);
    return out;
  };
  return { first: (tau, delta) => run(tau, delta, false), all: (tau, delta) => run(tau, delta, true) };
}

function gaussianPart(rows: readonly (readonly number[])[]): Adder | undefined {
  if (rows.length === 0) return undefined;
  const [n, d, t, alpha, beta, gamma, epsilon] = [0, 1, 2, 3, 4, 5, 6].map((i) => column(rows, i)) as [Float64Array, Float64Array, Float64Array, Float64Array, Float64Array, Float64Array, Float64Array];
  return (tau, delta, out) => {
    const [logDelta, logTau] = [Math.log(delta), Math.log(tau)];
    for (let i = 0; i < n.length; i++) {
      const [di, ti, ai, bi] = [d[i] as number, t[i] as number, alpha[i] as number, beta[i] as number];
      const x = delta - (epsilon[i] as number);
      const y = tau - (gamma[i] as number);
      const v = (n[i] as number) * Math.exp(di * logDelta + ti * logTau - ai * x * x - bi * y * y);
      const sd = di / delta - 2 * ai * x;
      const st = ti / tau - 2 * bi * y;
      out.a += v;
      out.d += v * sd;
      out.dd += v * (sd * sd - di / (delta * delta) - 2 * ai);
      out.t += v * st;
      out.tt += v * (st * st - ti / (tau * tau) - 2 * bi);
      out.dt += v * sd * st;
    }
  };
}

function criticalPart(rows: readonly (readonly number[])[]): Adder | undefined {
  if (rows.length === 0) return undefined;
  return (tau, delta, out) => {
    // The terms are singular at delta = 1 and tau = 1 exactly: step aside by less than any equation resolves.
    const x = Math.abs(delta - 1) < 1e-9 ? 1e-9 : delta - 1;
    const y = Math.abs(tau - 1) < 1e-9 ? 1e-9 : tau - 1;
    const s = x * x;
    for (const row of rows) {
      const [n, a, b, B, C, D, A, beta] = row as [number, number, number, number, number, number, number, number];
      const exponent = -C * s - D * y * y;
      if (exponent < -500) continue;
      const psi = Math.exp(exponent);
      const theta = -y + A * s ** (1 / (2 * beta));
      const Delta = theta * theta + B * s ** a;
      const ratio = A * (1 / beta) * s ** (1 / (2 * beta) - 1);
      const bend = 2 * B * a * s ** (a - 1);
      const Dd = x * (2 * theta * ratio + bend);
      const Ddd = 2 * theta * ratio + bend + 4 * B * a * (a - 1) * s ** (a - 1) + 2 * s * ratio * ratio + 4 * theta * A * (1 / beta) * (1 / (2 * beta) - 1) * s ** (1 / (2 * beta) - 1);
      const P = Delta ** b;
      const Pd = b * Delta ** (b - 1) * Dd;
      const Pdd = b * (Delta ** (b - 1) * Ddd + (b - 1) * Delta ** (b - 2) * Dd * Dd);
      const Pt = -2 * theta * b * Delta ** (b - 1);
      const Ptt = 2 * b * Delta ** (b - 1) + 4 * theta * theta * b * (b - 1) * Delta ** (b - 2);
      const Pdt = -2 * ratio * b * x * Delta ** (b - 1) - 2 * theta * b * (b - 1) * Delta ** (b - 2) * Dd;
      const psid = -2 * C * x * psi;
      const psidd = (2 * C * s - 1) * 2 * C * psi;
      const psit = -2 * D * y * psi;
      const psitt = (2 * D * y * y - 1) * 2 * D * psi;
      const psidt = 4 * C * D * x * y * psi;
      out.a += n * P * delta * psi;
      out.d += n * (P * (psi + delta * psid) + Pd * delta * psi);
      out.dd += n * (P * (2 * psid + delta * psidd) + 2 * Pd * (psi + delta * psid) + Pdd * delta * psi);
      out.t += n * delta * (Pt * psi + P * psit);
      out.tt += n * delta * (Ptt * psi + 2 * Pt * psit + P * psitt);
      out.dt += n * (P * (psit + delta * psidt) + delta * Pd * psit + Pt * (psi + delta * psid) + Pdt * delta * psi);
    }
  };
}
