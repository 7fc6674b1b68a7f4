import type Fraction from 'fraction.js';

type Make = (value: number) => Fraction;

/**
 * Rank and null space of a matrix of rational numbers, by exact elimination.
 *
 * @param rows  the matrix, a row for each condition
 * @param make  makes a fraction of a number
 * @returns     rank, and one vector of smallest whole numbers for each free column
 */
export function nullSpace(rows: readonly (readonly number[])[], make: Make): { readonly rank: number; readonly vectors: readonly (readonly number[])[] } {
  const m = rows.map((row) => row.map((value) => make(Number(value.toPrecision(9)))));
  const width = m[0]?.length ?? 0;
  const pivots: number[] = [];
  for (let column = 0; column < width && pivots.length < m.length; column++) {
    const at = m.findIndex((row, i) => i >= pivots.length && row[column]?.equals(0) === false);
    if (at < 0) continue;
    const top = pivots.length;
    [m[top], m[at]] = [m[at] as Fraction[], m[top] as Fraction[]];
    const lead = m[top][column] as Fraction;
    m[top] = m[top].map((value) => value.div(lead));
    m.forEach((row, i) => {
      const times = row[column] as Fraction;
      if (i !== top && !times.equals(0)) m[i] = row.map((value, k) => value.sub(times.mul((m[top] as Fraction[])[k] as Fraction)));
    });
    pivots.push(column);
  }
  const free = Array.from({ length: width }, (_, k) => k).filter((k) => !pivots.includes(k));
  const vectors = free.map((k) => {
    const vector = Array.from({ length: width }, (_, i) => make(i === k ? 1 : 0));
    pivots.forEach((pivot, i) => { vector[pivot] = ((m[i] as Fraction[])[k] as Fraction).neg(); });
    return whole(vector);
  });
  return { rank: pivots.length, vectors };
}

/** The smallest whole numbers in the same ratio. */
function whole(vector: readonly Fraction[]): number[] {
  const below = vector.reduce((a, v) => (a / divisor(a, v.d)) * v.d, 1n);
  const numbers = vector.map((v) => (v.s * v.n * below) / v.d);
  const common = numbers.reduce((a, b) => divisor(a, b < 0n ? -b : b), 0n);
  return numbers.map((n) => Number(common === 0n ? n : n / common));
}

function divisor(a: bigint, b: bigint): bigint {
  return b === 0n ? a : divisor(b, a % b);
}
