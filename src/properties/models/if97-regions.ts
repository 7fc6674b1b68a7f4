import type { Point } from './point.ts';
import { powerSum } from './power-sum.ts';

/** Coefficients of the industrial formulation as printed: rows [I, J, n]; the ideal parts rows [J, n]. */
export interface If97Constants {
  /** [J/(kg K)] */
  readonly gasConstant: number;
  readonly region1: readonly (readonly number[])[];
  readonly region2: readonly (readonly number[])[];
  readonly region2Ideal: readonly (readonly number[])[];
  readonly region3: readonly (readonly number[])[];
  /** Factor of ln delta in region 3. */
  readonly region3Log: number;
  readonly region5: readonly (readonly number[])[];
  readonly region5Ideal: readonly (readonly number[])[];
  readonly saturation: readonly number[];
  readonly boundary23: readonly number[];
}

type Region = (T: number, p: number) => Point;

interface Gibbs { p: number; pp: number; t: number; tt: number; pt: number }

/** Properties from the dimensionless Gibbs energy gamma(pi, tau). */
function fromGibbs(R: number, T: number, p: number, pi: number, tau: number, g: Gibbs): Point {
  const volume = (R * T * pi * g.p) / p;
  const cross = g.p - tau * g.pt;
  const cp = -R * tau * tau * g.tt;
  const cv = cp + (R * cross * cross) / g.pp;
  return {
    temperature: T,
    pressure: p,
    density: 1 / volume,
    specificHeatCapacity: cp,
    isochoricHeatCapacity: cv,
    speedOfSound: Math.sqrt((R * T * g.p * g.p) / ((cross * cross) / (tau * tau * g.tt) - g.pp)),
    thermalExpansion: cross / (T * g.p),
    compressibility: (-pi * g.pp) / (p * g.p),
    enthalpy: R * T * tau * g.t,
  };
}

/**
 * Region 1, liquid water: 273.15 K to 623.15 K, saturation to 100 MPa.
 *
 * @param c  coefficients
 * @returns  properties at T [K] and p [Pa]
 * @source   IAPWS R7-97(2012), eq. (7), tables 2 and 3
 */
export function region1(c: If97Constants): Region {
  const sum = powerSum(c.region1);
  const g: Gibbs = { p: 0, pp: 0, t: 0, tt: 0, pt: 0 };
  return (T, p) => {
    const pi = p / 16.53e6;
    const tau = 1386 / T;
    const s = sum(7.1 - pi, tau - 1.222);
    g.p = -s.x;
    g.pp = s.xx;
    g.t = s.y;
    g.tt = s.yy;
    g.pt = -s.xy;
    return fromGibbs(c.gasConstant, T, p, pi, tau, g);
  };
}

function vapourRegion(R: number, ideal: readonly (readonly number[])[], residual: readonly (readonly number[])[], reducingT: number, shift: number): Region {
  const real = powerSum(residual);
  const gas = powerSum((ideal as readonly (readonly [number, number])[]).map(([J, n]) => [0, J, n]));
  const g: Gibbs = { p: 0, pp: 0, t: 0, tt: 0, pt: 0 };
  return (T, p) => {
    const pi = p / 1e6;
    const tau = reducingT / T;
    const i = gas(1, tau);
    const y = tau - shift;
    const r = real(pi, Math.abs(y) < 1e-9 ? 1e-9 : y);
    g.p = 1 / pi + r.x;
    g.pp = -1 / (pi * pi) + r.xx;
    g.t = i.y + r.y;
    g.tt = i.yy + r.yy;
    g.pt = r.xy;
    return fromGibbs(R, T, p, pi, tau, g);
  };
}

/**
 * Region 2, steam: 273.15 K to 1073.15 K, up to saturation, the boundary to region 3, or 100 MPa.
 *
 * @param c  coefficients
 * @returns  properties at T [K] and p [Pa]
 * @source   IAPWS R7-97(2012), eqs. (15) to (17), tables 10 to 14
 */
export const region2 = (c: If97Constants): Region => vapourRegion(c.gasConstant, c.region2Ideal, c.region2, 540, 0.5);

/**
 * Region 5, hot steam: 1073.15 K to 2273.15 K, up to 50 MPa.
 *
 * @param c  coefficients
 * @returns  properties at T [K] and p [Pa]
 * @source   IAPWS R7-97(2012), eqs. (32) to (34), tables 37 to 41
 */
export const region5 = (c: If97Constants): Region => vapourRegion(c.gasConstant, c.region5Ideal, c.region5, 1000, 0);

/**
 * Region 3, around the critical point, by temperature and density.
 *
 * @param c  coefficients
 * @returns  properties at T [K] and rho [kg/m^3]
 * @source   IAPWS R7-97(2012), eq. (28), tables 30 and 31
 */
export function region3(c: If97Constants): (T: number, rho: number) => Point {
  const sum = powerSum(c.region3);
  const R = c.gasConstant;
  return (T, rho) => {
    const delta = rho / 322;
    const tau = 647.096 / T;
    const s = sum(delta, tau);
    const fd = s.x + c.region3Log / delta;
    const fdd = s.xx - c.region3Log / (delta * delta);
    const a2 = 2 * delta * fd + delta * delta * fdd;
    const a1 = delta * fd - delta * tau * s.xy;
    const cv = -R * tau * tau * s.yy;
    const cp = cv + (R * a1 * a1) / a2;
    return {
      temperature: T,
      pressure: rho * R * T * delta * fd,
      density: rho,
      specificHeatCapacity: cp,
      isochoricHeatCapacity: cv,
      speedOfSound: Math.sqrt((R * T * a2 * cp) / cv),
      thermalExpansion: a1 / (T * a2),
      compressibility: 1 / (rho * R * T * a2),
      enthalpy: R * T * (tau * s.y + delta * fd),
    };
  };
}
