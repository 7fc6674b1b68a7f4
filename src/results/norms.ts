/** How far a result is from known numbers, in their unit and as shares of `scale`. */
export interface Norms {
  /** Mean of the deviations, signed. */
  readonly mean: number;
  /** Mean of their sizes. */
  readonly l1: number;
  /** Root of the mean of their squares. */
  readonly l2: number;
  /** The largest, signed. */
  readonly largest: number;
  /** Index of the largest among the points. */
  readonly at: number;
  /** Largest minus smallest known number; their largest size where they are all equal. */
  readonly scale: number;
  /** sqrt(sum E^2 / sum D^2), absent where the known numbers are all zero. */
  readonly overAll?: number;
}

/**
 * Norms of the deviations E = S - D over the points of a known table, each point counting alike.
 *
 * @param result  S, interpolated to the points, at least one
 * @param known   D
 * @param scale   what shares refer to; the range of the known numbers unless given
 * @returns       the norms, unit of the numbers
 * @example       norms([1, 2, 4], [1, 2, 3]).largest // 1
 * @source        definition
 */
export function norms(result: readonly number[], known: readonly number[], scale?: number): Norms {
  const errors = result.map((s, i) => s - (known[i] as number));
  const sizes = errors.map(Math.abs);
  const at = sizes.reduce((best, size, i) => (size > (sizes[best] as number) ? i : best), 0);
  const sum = (list: readonly number[]): number => list.reduce((a, b) => a + b, 0);
  const squares = sum(errors.map((e) => e * e));
  const knownSquares = sum(known.map((d) => d * d));
  return {
    mean: sum(errors) / errors.length,
    l1: sum(sizes) / errors.length,
    l2: Math.sqrt(squares / errors.length),
    largest: errors[at] as number,
    at,
    scale: scale ?? rangeOf(known),
    ...(knownSquares > 0 ? { overAll: Math.sqrt(squares / knownSquares) } : {}),
  };
}

/** Largest minus smallest of numbers, or their largest size where they are all equal. */
export function rangeOf(numbers: readonly number[]): number {
  const [low, high] = numbers.reduce(([a, b], x) => [Math.min(a, x), Math.max(b, x)], [Infinity, -Infinity]);
  return high > low ? high - low : Math.abs(high);
}
