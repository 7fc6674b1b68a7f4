import type { Outcome } from './limit.ts';

/** Half-widths at 95 % of what may be behind a deviation, in the unit of the deviation. Absent: not known. */
export interface Uncertainties {
  /** Mesh, step and iteration. */
  readonly numerical?: number;
  /** Inputs of the run that are not known exactly. */
  readonly input?: number;
  /** Sampling of what fluctuates. */
  readonly statistical?: number;
  /** The known answer itself. */
  readonly data?: number;
}

export interface DeviationVerdict {
  readonly outcome: Outcome;
  /** Half-width at 95 % of the deviation as achieved: numerical, input and statistical parts; absent while the numerical one is unknown. */
  readonly uncertainty?: number;
  /** Validation uncertainty at 95 %: as before with the data; absent likewise. */
  readonly validation?: number;
  /** Whether the deviation exceeds the validation uncertainty, so that it says something of the model. */
  readonly telling?: boolean;
}

/**
 * A deviation held against its limit: met where |E| + U fits into it, missed where |E| - U does not, else it cannot be told; nor
 * while the numerical uncertainty is unknown, so that no coarse mesh passes by its own error.
 *
 * @param deviation      E = S - D, result minus known answer
 * @param limit          largest deviation allowed, which holds the uncertainty of the known answer already
 * @param uncertainties  half-widths at 95 %, in the same unit
 * @returns              outcome, U = 2 sqrt(u_num^2 + u_input^2 + u_stat^2), U_val = 2 sqrt(u_num^2 + u_input^2 + u_stat^2 + u_D^2)
 * @source               ASME V&V 20 (2009), sections 1 and 6, with coverage factor 2; limits set before the run: common practice
 */
export function judgeDeviation(deviation: number, limit: number, uncertainties: Uncertainties): DeviationVerdict {
  const { numerical, input = 0, statistical = 0, data = 0 } = uncertainties;
  if (numerical === undefined) return { outcome: 'cannot tell' };
  const uncertainty = Math.hypot(numerical, input, statistical);
  const validation = Math.hypot(uncertainty, data);
  const size = Math.abs(deviation);
  const outcome = size + uncertainty <= limit ? 'met' : size - uncertainty > limit ? 'missed' : 'cannot tell';
  return { outcome, uncertainty, validation, telling: size > validation };
}

/**
 * Tolerance of a rung, fixed before the run: W = 2 sqrt(u_ref^2 + u_plan^2), never below 0.5 %.
 *
 * @param uncertainty  relative 95 % half-width of the known answer [1], 0 for exact ones
 * @param kind         exact, benchmark or measured: 0.25 % numerical error is planned for the first two, 1 % for the last
 * @returns            relative tolerance [1]
 * @example            rungTolerance({ uncertainty: 0.02, kind: 'measured' }) // 0.02828
 * @source             common practice
 */
export function rungTolerance({ uncertainty, kind }: { uncertainty: number; kind: 'exact' | 'benchmark' | 'measured' }): number {
  return Math.max(0.005, 2 * Math.hypot(uncertainty / 2, kind === 'measured' ? 0.01 : 0.0025));
}
