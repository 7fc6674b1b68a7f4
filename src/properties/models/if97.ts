import { ancillary, type Ancillary } from './ancillary.ts';
import { helmholtz, type HelmholtzConstants } from './helmholtz.ts';
import { atmosphericWaterDensity, type AtmosphericWaterConstants } from './water-at-atmosphere.ts';
import { region1, region2, region3, region5, type If97Constants } from './if97-regions.ts';
import type { EquationOfState, Point, Side } from './point.ts';

/** Critical temperature and pressure of water. Source: IAPWS R2-83(1992). */
const criticalTemperature = 647.096;
const criticalPressure = 22.064e6;
const edge13 = 623.15;

export interface WaterConstants extends If97Constants {
  /** Saturated densities, start of the density search in region 3. */
  readonly liquid: Ancillary;
  readonly vapour: Ancillary;
  /** Liquid at 0.1 MPa, which sharpens the density of region 1 near the atmosphere. */
  readonly atmospheric: AtmosphericWaterConstants;
  /** The scientific formulation, for what the industrial one leaves out: above 100 MPa, and by temperature and density. */
  readonly scientific: HelmholtzConstants;
}

/**
 * Saturation pressure of water.
 *
 * @param n  the ten coefficients
 * @returns  pressure [Pa] as a function of T [K], 273.15 K to 647.096 K
 * @source   IAPWS R7-97(2012), eq. (30), table 34
 */
export const saturationPressure = (n: readonly number[]) => (T: number): number => {
  const theta = T + (n[8] as number) / (T - (n[9] as number));
  const A = theta * theta + (n[0] as number) * theta + (n[1] as number);
  const B = (n[2] as number) * theta * theta + (n[3] as number) * theta + (n[4] as number);
  const C = (n[5] as number) * theta * theta + (n[6] as number) * theta + (n[7] as number);
  return 1e6 * ((2 * C) / (-B + Math.sqrt(B * B - 4 * A * C))) ** 4;
};

/**
 * Saturation temperature of water.
 *
 * @param n  the ten coefficients
 * @returns  temperature [K] as a function of p [Pa], 611.213 Pa to 22.064 MPa
 * @source   IAPWS R7-97(2012), eq. (31), table 34
 */
export const saturationTemperature = (n: readonly number[]) => (p: number): number => {
  const beta = (p / 1e6) ** 0.25;
  const E = beta * beta + (n[2] as number) * beta + (n[5] as number);
  const F = (n[0] as number) * beta * beta + (n[3] as number) * beta + (n[6] as number);
  const G = (n[1] as number) * beta * beta + (n[4] as number) * beta + (n[7] as number);
  const D = (2 * G) / (-F - Math.sqrt(F * F - 4 * E * G));
  return ((n[9] as number) + D - Math.sqrt(((n[9] as number) + D) ** 2 - 4 * ((n[8] as number) + (n[9] as number) * D))) / 2;
};

/**
 * Water and steam by the industrial formulation; above 100 MPa, above 50 MPa where region 5 ends, and by (T, rho) the scientific one.
 * Each region is built when it is first asked for: a cold start pays only for what it uses.
 *
 * @param c  coefficients as printed
 * @returns  equation of state with its saturation line
 * @source   IAPWS R7-97(2012) regions 1 to 5; IAPWS R6-95(2018)
 */
export function if97(c: WaterConstants): EquationOfState {
  const first = lazily(() => region1(c));
  const second = lazily(() => region2(c));
  const third = lazily(() => region3(c));
  const fifth = lazily(() => region5(c));
  const scientific = lazily(() => helmholtz(c.scientific));
  const liquid = ancillary(c.liquid);
  const vapour = ancillary(c.vapour);
  const atmospheric = atmosphericWaterDensity(c.atmospheric);
  const psat = saturationPressure(c.saturation);
  const [b1, b2, b3] = c.boundary23 as [number, number, number];
  const boundary = (T: number): number => 1e6 * (b1 + b2 * T + b3 * T * T);

  const byDensity = (T: number, p: number, side: Side): Point => {
    const region = third();
    const two = T < criticalTemperature;
    let low = two && side === 'liquid' ? liquid(T) * 0.97 : 40;
    let high = two && side === 'vapour' ? vapour(T) * 1.06 : 900;
    let rho = two ? (side === 'liquid' ? low * 1.1 : high * 0.9) : 322 * (p / criticalPressure > 1.5 ? 1.6 : 1);
    for (let i = 0; i < 80; i++) {
      const at = region(T, rho);
      const off = at.pressure - p;
      if (off > 0) high = rho;
      else low = rho;
      let next = rho - off * rho * at.compressibility;
      if (!(at.compressibility > 0) || !(next > low && next < high)) next = 0.5 * (low + high);
      if (Math.abs(next - rho) < 1e-12 * rho) return { ...region(T, next), pressure: p };
      rho = next;
    }
    return { ...region(T, rho), pressure: p };
  };

  /** Region 1 with its density scaled to the atmospheric line, by up to 1.5e-5; the scaling fades between 353 K and 383 K. */
  let scaledT = Number.NaN;
  let scale = 1;
  const liquidAt = (T: number, p: number): Point => {
    if (T !== scaledT) {
      const share = T <= 353.15 ? 1 : T >= 383.15 ? 0 : (383.15 - T) / 30;
      scale = share === 0 ? 1 : 1 + share * (atmospheric(T) / first()(T, 1e5).density - 1);
      scaledT = T;
    }
    const point = first()(T, p);
    point.density *= scale;
    return point;
  };

  const at = (T: number, p: number, side: Side): Point => {
    if (p > 100e6) return scientific().at(T, p, 'liquid');
    if (T > 1073.15) return p > 50e6 ? scientific().at(T, p, 'vapour') : fifth()(T, p);
    if (T <= edge13) return side === 'liquid' ? liquidAt(T, p) : second()(T, p);
    return T < 863.15 && p > boundary(T) ? byDensity(T, p, side) : second()(T, p);
  };
  return {
    gasConstant: c.gasConstant,
    at,
    of: (T, rho) => scientific().of(T, rho),
    line: { from: 273.15, to: criticalTemperature, bubble: psat, dew: psat, boiling: saturationTemperature(c.saturation) },
  };
}

function lazily<T>(make: () => T): () => T {
  let made: T | undefined;
  return () => (made ??= make());
}
