/** Exponents of the seven SI base units in the order kg, m, s, K, mol, A, cd. They may be broken numbers (Pa s^0.6). */
export type Dimension = readonly [number, number, number, number, number, number, number];

const bases = ['kg', 'm', 's', 'K', 'mol', 'A', 'cd'] as const;
const none: Dimension = [0, 0, 0, 0, 0, 0, 0];

/** The dimension of a plain number. */
export const dimensionless: Dimension = none;

/**
 * A dimension from a product of SI base units such as `kg m-1 s-2`; the empty text is dimensionless.
 *
 * @param product  base units with whole exponents, separated by single spaces
 * @returns        the exponents
 */
export function baseProduct(product: string): Dimension {
  const out = [...none];
  for (const part of product.split(' ')) {
    const match = /^([A-Za-z]+)(-?\d+)?$/.exec(part);
    const at = bases.findIndex((base) => base === match?.[1]);
    if (at >= 0) out[at] = (out[at] as number) + Number(match?.[2] ?? 1);
  }
  return out as unknown as Dimension;
}

/** `a` plus `times` times `b`: the dimension of a b^times. */
export function addDimension(a: Dimension, b: Dimension, times: number): Dimension {
  return a.map((exponent, i) => exponent + times * (b[i] as number)) as unknown as Dimension;
}

/**
 * Whether two dimensions are the same; broken exponents may differ by rounding (1e-9).
 *
 * @param a  first dimension
 * @param b  second dimension
 * @returns  true where every exponent agrees
 */
export function sameDimension(a: Dimension, b: Dimension): boolean {
  return a.every((exponent, i) => Math.abs(exponent - (b[i] as number)) < 1e-9);
}

/** A dimension as a product of SI base units for messages: `kg m^-1 s^-2`; `1` where there is none. */
export function dimensionText(dimension: Dimension): string {
  const parts = dimension.flatMap((exponent, i) => {
    if (Math.abs(exponent) < 1e-9) return [];
    return [exponent === 1 ? (bases[i] as string) : `${bases[i]}^${Number(exponent.toPrecision(6))}`];
  });
  return parts.length === 0 ? '1' : parts.join(' ');
}
