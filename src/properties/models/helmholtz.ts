import type { EquationOfState, Point, ReducedResidual, SaturationLine, Side } from './point.ts';
import { residualPart, type ResidualTerms } from './helmholtz-terms.ts';
import { column } from './rows.ts';
import { saturationByMaxwell } from './helmholtz-saturation.ts';
import { ancillary, type Ancillary } from './ancillary.ts';

/** Ideal-gas part: its derivatives by tau only, as no absolute entropy is used. */
export interface IdealTerms {
  /** Factor of ln tau. */
  readonly log: number;
  /** Rows [n, t]: n tau^t. */
  readonly power?: readonly (readonly number[])[];
  /** Rows [n, theta]: n ln(1 - exp(-theta tau)). */
  readonly vibration?: readonly (readonly number[])[];
  /** Rows [n, theta, c]: n ln(c + exp(theta tau)). */
  readonly mixed?: readonly (readonly number[])[];
}

/** Saturated densities and pressures as printed: `pressure` of a pure fluid, `bubble` and `dew` of a mixture. */
interface SaturationStart {
  readonly from: number;
  readonly to: number;
  readonly liquid: Ancillary;
  readonly vapour: Ancillary;
  readonly pressure?: Ancillary;
  readonly bubble?: Ancillary;
  readonly dew?: Ancillary;
}

export interface HelmholtzConstants {
  /** Reducing temperature [K] and density [kg/m^3]. */
  readonly temperature: number;
  readonly density: number;
  /** [J/(kg K)] */
  readonly gasConstant: number;
  /** Density that no state of the range reaches [kg/m^3]. */
  readonly densest: number;
  readonly ideal: IdealTerms;
  readonly residual: ResidualTerms;
  /** Start values of the saturation line. */
  readonly saturation?: SaturationStart;
}

/** tau alpha0_tau and tau^2 alpha0_tautau. */
function idealPart(terms: IdealTerms): (tau: number) => { first: number; second: number } {
  const out = { first: 0, second: 0 };
  const [powers, exponents] = [column(terms.power, 0), column(terms.power, 1)];
  const [modes, modesAt] = [column(terms.vibration, 0), column(terms.vibration, 1)];
  const [mixed, mixedAt, mixedWith] = [column(terms.mixed, 0), column(terms.mixed, 1), column(terms.mixed, 2)];
  return (tau) => {
    const log = Math.log(tau);
    let first = terms.log;
    let second = -terms.log;
    for (let i = 0; i < powers.length; i++) {
      const t = exponents[i] as number;
      const v = (powers[i] as number) * t * Math.exp(t * log);
      first += v;
      second += v * (t - 1);
    }
    for (let i = 0; i < modes.length; i++) {
      const n = modes[i] as number;
      const u = (modesAt[i] as number) * tau;
      const e = Math.expm1(u);
      first += (n * u) / e;
      second -= (n * u * u * (e + 1)) / (e * e);
    }
    for (let i = 0; i < mixed.length; i++) {
      const n = mixed[i] as number;
      const u = (mixedAt[i] as number) * tau;
      const e = Math.exp(-u);
      const v = (mixedWith[i] as number) * e + 1;
      first += (n * u) / v;
      second += (n * (mixedWith[i] as number) * u * u * e) / (v * v);
    }
    out.first = first;
    out.second = second;
    return out;
  };
}

/**
 * Equation of state in the Helmholtz energy alpha(tau, delta), tau = T_r/T, delta = rho/rho_r.
 *
 * @param constants  coefficients of one fluid
 * @returns          properties by temperature and pressure or temperature and density
 * @source           Span, Multiparameter Equations of State, Springer 2000, table 3.9 (properties from derivatives)
 */
export function helmholtz(constants: HelmholtzConstants): EquationOfState {
  const { temperature: Tr, density: rhor, gasConstant: R } = constants;
  const residual = residualPart(constants.residual);
  const ideal = idealPart(constants.ideal);
  const start = constants.saturation;
  const liquidStart = start === undefined ? () => 0 : ancillary(start.liquid);
  const vapourStart = start === undefined ? () => constants.densest : ancillary(start.vapour);

  const of = (T: number, rho: number): Point => {
    const tau = Tr / T;
    const delta = rho / rhor;
    const r = residual.all(tau, delta);
    const i = ideal(tau);
    const a1 = 1 + delta * r.d - delta * tau * r.dt;
    const a2 = 1 + 2 * delta * r.d + delta * delta * r.dd;
    const cv = -R * (i.second + tau * tau * r.tt);
    const cp = cv + (R * a1 * a1) / a2;
    return {
      temperature: T,
      pressure: rho * R * T * (1 + delta * r.d),
      density: rho,
      specificHeatCapacity: cp,
      isochoricHeatCapacity: cv,
      speedOfSound: Math.sqrt((R * T * a2 * cp) / cv),
      thermalExpansion: a1 / (T * a2),
      compressibility: 1 / (rho * R * T * a2),
      enthalpy: R * T * (1 + i.first + tau * r.t + delta * r.d),
    };
  };

  const densityAt = (T: number, p: number, side: Side): number => {
    const tau = Tr / T;
    let low = 0;
    let high = constants.densest;
    let rho = p / (R * T);
    if (start !== undefined && T < start.to) {
      const edge = Math.max(T, start.from);
      // The start values err by up to a few parts in a thousand; beyond them lies the region without a stable state.
      if (side === 'liquid') {
        low = liquidStart(edge) * 0.99;
        rho = low * 1.012;
      } else high = Math.min(constants.densest, vapourStart(edge) * 1.05);
    }
    if (!(rho < high)) rho = low + 0.7 * (high - low);
    for (let i = 0; i < 60; i++) {
      const delta = rho / rhor;
      const r = residual.first(tau, delta);
      const off = rho * R * T * (1 + delta * r.d) - p;
      const slope = R * T * (1 + 2 * delta * r.d + delta * delta * r.dd);
      if (off > 0) high = rho;
      else low = rho;
      let next = rho - off / slope;
      if (!(slope > 0) || !(next > low && next < high)) {
        if (Math.abs(off) < 1e-12 * p) return rho;
        next = 0.5 * (low + high);
      }
      if (Math.abs(next - rho) < 1e-11 * rho) return next;
      rho = next;
    }
    return rho;
  };

  const line = start && lineOf(constants, start, residual);
  const residualAt = (T: number, rho: number): ReducedResidual => ({ ...residual.all(Tr / T, rho / rhor), tau: Tr / T, delta: rho / rhor });
  return { gasConstant: R, of, residual: residualAt, at: (T, p, side) => of(T, densityAt(T, p, side)), ...(line === undefined ? {} : { line }) };
}

function lineOf(constants: HelmholtzConstants, start: SaturationStart, residual: ReturnType<typeof residualPart>): SaturationLine {
  if (start.bubble !== undefined && start.dew !== undefined) return { from: start.from, to: start.to, bubble: ancillary(start.bubble), dew: ancillary(start.dew) };
  const equal = saturationByMaxwell({ ...constants, liquid: ancillary(start.liquid), vapour: ancillary(start.vapour), pressure: ancillary(start.pressure as Ancillary), first: residual.first, to: start.to });
  return { from: start.from, to: start.to, bubble: equal, dew: equal };
}
