export * from '../../src/quantities/index.ts';

/** Mean of a local law over its length, by the substitution x = t^4 and the midpoint rule. */
export function sumOfLocal(local: (share: number) => number): number {
  const n = 4000;
  return Array.from({ length: n }, (_, i) => (i + 0.5) / n).reduce((sum, t) => sum + (local(t ** 4) * 4 * t ** 3) / n, 0);
}
