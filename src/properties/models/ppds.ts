import type { Scaled } from './laws.ts';

// Forms of the PPDS data bank that no other law of this room writes, after the ThermoData Engine user's guide as carried by chemicals 1.5.2 (MIT licence).

const toSI = (c: Scaled, y: number): number => (c.gives === undefined ? y : y * c.gives.factor + c.gives.offset);

/** PPDS 2, heat capacity of the ideal gas: y = low + (high - low) z^2 (1 + (z - 1) sum a_i z^i), z = T/(T + scale). */
export const ppdsGasHeat = (c: Scaled & { low: number; high: number; scale: number; terms: readonly number[] }) => (T: number): number => {
  const z = T / (T + c.scale);
  return toSI(c, c.low + (c.high - c.low) * z * z * (1 + (z - 1) * c.terms.reduceRight((sum, a) => sum * z + a, 0)));
};

/** PPDS 3, conductivity of the thin gas: y = sqrt(Tr)/sum a_i Tr^-i, i from 1. */
export const ppdsGasConductivity = (c: Scaled & { critical: number; terms: readonly number[] }) => (T: number): number => {
  const Tr = T / c.critical;
  return toSI(c, Math.sqrt(Tr) / c.terms.reduce((sum, a, i) => sum + a * Tr ** -(i + 1), 0));
};

/** PPDS 5, viscosity of the thin gas: y = A Tr/(1 + B Tr^C (Tr - 1))^(1/6). */
export const ppdsGasViscosity = (c: Scaled & { critical: number; A: number; B: number; C: number }) => (T: number): number => {
  const Tr = T / c.critical;
  return toSI(c, (c.A * Tr) / (1 + c.B * Tr ** c.C * (Tr - 1)) ** (1 / 6));
};

/** PPDS 17, density of the saturated liquid: y = 1/(A (B + C tau)^(1 + tau^(2/7))), tau = 1 - Tr. */
export const ppdsLiquidDensity = (c: Scaled & { critical: number; A: number; B: number; C: number }) => (T: number): number => {
  const tau = Math.max(0, 1 - T / c.critical);
  return toSI(c, 1 / (c.A * (c.B + c.C * tau) ** (1 + tau ** (2 / 7))));
};
