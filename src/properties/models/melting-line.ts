/** One piece of a melting line between two temperatures [K], from p0 [Pa] at T0. */
export interface MeltingPiece {
  readonly from: number;
  readonly to: number;
  readonly temperature: number;
  readonly pressure: number;
  /** Rows [a, c]: pressure + sum a ((T/T0)^c - 1), or sum a (T/T0 - 1)^c where `shifted`; a in Pa. */
  readonly terms: readonly (readonly number[])[];
  readonly shifted?: string;
}

/**
 * Melting temperature under pressure, from the printed melting pressure.
 *
 * @param pieces  rising pieces, one after the other
 * @returns       temperature [K] of p [Pa]; the ends of the line beyond it
 * @source        form: Simon and Glatzel, Z. anorg. allg. Chem. 178 (1929) 309
 */
export function meltingLine({ pieces }: { readonly pieces: readonly MeltingPiece[] }): (p: number) => number {
  const pressure = (piece: MeltingPiece, T: number): number => {
    let sum = piece.pressure;
    for (const [a, c] of piece.terms as readonly [number, number][]) sum += a * (piece.shifted === undefined ? (T / piece.temperature) ** c - 1 : (T / piece.temperature - 1) ** c);
    return sum;
  };
  return (p) => {
    const piece = pieces.find((one) => p <= pressure(one, one.to)) ?? pieces.at(-1);
    if (piece === undefined) return Number.NaN;
    let [low, high] = [piece.from, piece.to];
    if (p <= pressure(piece, low)) return low;
    if (p >= pressure(piece, high)) return high;
    while (high - low > 1e-9 * high) {
      const middle = 0.5 * (low + high);
      if (pressure(piece, middle) < p) low = middle;
      else high = middle;
    }
    return 0.5 * (low + high);
  };
}
