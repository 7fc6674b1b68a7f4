/** Constants of the sublimation line as printed: triple point [K], [Pa]; rows [a, b]. */
interface SublimationConstants {
  readonly temperature: number;
  readonly pressure: number;
  readonly terms: readonly (readonly number[])[];
}

/**
 * Pressure of water vapour over ice, ln(p/p_t) = (T_t/T) sum a (T/T_t)^b.
 *
 * @param c  triple point and rows [a, b]
 * @returns  sublimation pressure [Pa] as a function of T [K]
 * @range    50 K to 273.16 K; above it there is no ice
 * @source   IAPWS R14-08(2011), eq. (6); Wagner et al., J. Phys. Chem. Ref. Data 40 (2011) 043103
 */
const sublimationPressure = (c: SublimationConstants) => (T: number): number => {
  const theta = T / c.temperature;
  let sum = 0;
  for (const [a, b] of c.terms as readonly [number, number][]) sum += a * theta ** b;
  return c.pressure * Math.exp(sum / theta);
};

/** The sublimation line of ordinary ice, as the release prints it. */
export const iceSublimation = sublimationPressure({
  temperature: 273.16,
  pressure: 611.657,
  terms: [[-21.2144006, 0.00333333333], [27.3203819, 1.20666667], [-6.1059813, 1.70333333]],
});

/** Lowest frost point that is sought [K]: the steam of the mixtures is not held below. */
export const lowestFrostPoint = 173.15;

/** Of ice at 0 degC [m^3/mol]: 916.7 kg/m^3, IAPWS R10-06. */
export const iceVolume = 1.9652e-5;
