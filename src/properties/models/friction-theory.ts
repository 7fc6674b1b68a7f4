import type { Point } from './point.ts';

/** Triples A0, A1, A2 of each friction coefficient and its power of tau, for pressures in bar; a coefficient that the paper leaves out is missing. */
export interface FrictionConstants {
  readonly temperature: number;
  /** What is taken off exp(tau) and exp(tau^2). */
  readonly offsets: readonly number[];
  /** Rows [A0, A1, A2, N]: of the ideal, attractive and repulsive pressure. */
  readonly ideal: readonly number[];
  readonly attractive: readonly number[];
  readonly repulsive: readonly number[];
  readonly idealSquare?: readonly number[];
  readonly attractiveSquare?: readonly number[];
  readonly repulsiveSquare?: readonly number[];
  /** Of the square of the repulsive pressure less the ideal one. */
  readonly excessSquare?: readonly number[];
  readonly attractiveCube?: readonly number[];
  readonly repulsiveCube?: readonly number[];
}

/**
 * Viscosity beyond the dilute gas as friction between layers, from the parts of the pressure.
 *
 * @param c  constants as printed
 * @returns  viscosity [Pa s] at a point, with the specific gas constant [J/(kg K)]
 * @source   Quinones-Cisneros and Deiters, J. Phys. Chem. B 110 (2006) 12820
 */
export function frictionTheory(c: FrictionConstants): (at: Point, gasConstant: number) => number {
  const [c1, c2] = c.offsets as [number, number];
  return (at, gasConstant) => {
    const tau = c.temperature / at.temperature;
    const psi1 = Math.exp(tau) - c1;
    const psi2 = Math.exp(tau * tau) - c2;
    const k = (row: readonly number[] | undefined): number => {
      if (row === undefined) return 0;
      const [a0, a1, a2, n] = row as [number, number, number, number];
      return (a0 + a1 * psi1 + a2 * psi2) * tau ** n;
    };
    const bar = 1e-5;
    const repulsive = at.temperature * (at.thermalExpansion / at.compressibility) * bar;
    const attractive = at.pressure * bar - repulsive;
    const ideal = at.density * gasConstant * at.temperature * bar;
    const excess = repulsive - ideal;
    return (
      k(c.attractive) * attractive + k(c.repulsive) * excess + k(c.ideal) * ideal
      + k(c.attractiveSquare) * attractive ** 2 + k(c.excessSquare) * excess ** 2 + k(c.repulsiveSquare) * repulsive ** 2 + k(c.idealSquare) * ideal ** 2
      + k(c.repulsiveCube) * repulsive ** 3 + k(c.attractiveCube) * attractive ** 3
    );
  };
}
