import type { Scaled } from './laws.ts';

const toSI = (c: Scaled, y: number): number => (c.gives === undefined ? y : y * c.gives.factor + c.gives.offset);

/** Density of a saturated liquid, y = A / B^(1 + (1 - T/C)^D). @source form of Rackett, J. Chem. Eng. Data 15 (1970) 514, as tabulated in Perry's */
export const rackett = (c: Scaled & { A: number; B: number; C: number; D: number }) => (T: number): number => toSI(c, c.A / c.B ** (1 + Math.max(0, 1 - T / c.C) ** c.D));

/** y = A (1 - Tr)^(B + C Tr + D Tr^2 + E Tr^3): heat of vaporisation, surface tension. @source as tabulated in Perry's */
export const reducedPower = (c: Scaled & { critical: number; A: number; terms: readonly number[] }) => (T: number): number => {
  const Tr = T / c.critical;
  return toSI(c, c.A * Math.max(0, 1 - Tr) ** c.terms.reduceRight((sum, term) => sum * Tr + term, 0));
};

/** Gas viscosity or conductivity, y = A T^B / (1 + C/T + D/T^2). @source as tabulated in Perry's */
export const gasPowers = (c: Scaled & { A: number; B: number; C: number; D: number }) => (T: number): number => toSI(c, (c.A * T ** c.B) / (1 + c.C / T + c.D / (T * T)));

/** Liquid viscosity, y = E exp(A X^(1/3) + B X^(4/3)) with X = (C - T)/(T - D). @source VDI Heat Atlas, 2nd ed. (2010), D3.1 */
export const liquidViscosity = (c: Scaled & { A: number; B: number; C: number; D: number; E: number }) => (T: number): number => {
  const root = Math.cbrt((c.C - T) / (T - c.D));
  return toSI(c, c.E * Math.exp(root * (c.A + c.B * root ** 3)));
};
