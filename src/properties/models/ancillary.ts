/** One line along saturation as papers print it: a reference value and rows [n, exponent] in theta = 1 - T/T_ref. */
export interface Ancillary {
  readonly reference: number;
  readonly temperature: number;
  /**
   * exp: y = ref exp(sum); exp-tau: y = ref exp(T_ref/T sum); sum: y = ref (1 + sum).
   */
  readonly form: 'exp' | 'exp-tau' | 'sum';
  readonly terms: readonly (readonly number[])[];
  /** Factor of ln(T/T_ref) in the sum, where the paper has one. */
  readonly log?: number;
}

/**
 * Builds y(T) along the saturation line.
 *
 * @param given  constants and form
 * @returns      function of the temperature [K]; above the reference temperature theta is taken as zero
 */
export function ancillary(given: Ancillary): (T: number) => number {
  const { reference, temperature, form, terms, log } = given;
  return (T) => {
    const theta = Math.max(0, 1 - T / temperature);
    let sum = log === undefined ? 0 : log * Math.log(Math.min(1, T / temperature));
    for (const [n, e] of terms as readonly [number, number][]) sum += n * theta ** e;
    if (form === 'sum') return reference * (1 + sum);
    return reference * Math.exp(form === 'exp' ? sum : (sum * temperature) / T);
  };
}
