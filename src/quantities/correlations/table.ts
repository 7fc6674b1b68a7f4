/** Rows of argument and value, in rising order of the argument. */
export type Table = readonly (readonly [number, number])[];

/**
 * Straight lines between the rows of a table; the ends are held.
 *
 * @param x      where the value is wanted
 * @param table  rows in rising order
 * @returns      value at x
 */
export function between(x: number, table: Table): number {
  const first = table[0] as readonly [number, number];
  if (x <= first[0]) return first[1];
  for (let i = 1; i < table.length; i++) {
    const [x0, y0] = table[i - 1] as readonly [number, number];
    const [x1, y1] = table[i] as readonly [number, number];
    if (x <= x1) return y0 + ((y1 - y0) * (x - x0)) / (x1 - x0);
  }
  return (table[table.length - 1] as readonly [number, number])[1];
}
