export interface AtmosphericWaterConstants {
  /** Constant term of the volume. */
  readonly constant: number;
  /** Rows [a, n] in 10 K/(593 K - T). */
  readonly hot: readonly (readonly number[])[];
  /** Rows [b, m] in 10 K/(T - 232 K). */
  readonly cold: readonly (readonly number[])[];
}

/**
 * Density of liquid water at 0.1 MPa: follows the scientific formulation to about 1e-6.
 *
 * @param c  coefficients as printed
 * @returns  density [kg/m^3] as a function of T [K], 253.15 K to 383.15 K
 * @source   IAPWS SR6-08(2011), eq. (4), table 1
 */
export const atmosphericWaterDensity = (c: AtmosphericWaterConstants) => (T: number): number => {
  const alpha = 10 / (593 - T);
  const beta = 10 / (T - 232);
  let sum = c.constant;
  for (const [a, n] of c.hot as readonly [number, number][]) sum += a * alpha ** n;
  for (const [b, m] of c.cold as readonly [number, number][]) sum += b * beta ** m;
  return 1e5 / (461.51805 * 10 * sum);
};
