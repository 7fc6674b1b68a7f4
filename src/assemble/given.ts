import type { Case } from '../case/index.ts';
import type { Given } from '../workings/index.ts';

/** An operating range: the plant goes from one end to the other. */
export interface Range {
  readonly path: string;
  readonly from: number;
  readonly to: number;
}

/**
 * Numbers of the case as the workings take them: value, spread, operating ranges apart.
 *
 * @param on  the case
 * @returns   given numbers by path, and operating ranges (their middle is the value)
 */
export function givenOf(on: Case): { given: Record<string, Given>; ranges: Range[] } {
  const given: Record<string, Given> = {};
  const ranges: Range[] = [];
  for (const e of on.entries.values()) {
    if (e.kind !== 'quantity' || typeof e.value !== 'number' || !Number.isFinite(e.value) || e.share !== undefined || e.path.startsWith('targets.')) continue;
    const ignorance = e.range?.bounds === true ? Math.abs(e.range.to - e.range.from) / 2 : undefined;
    if (e.range !== undefined && !e.range.bounds) ranges.push({ path: e.path, from: e.range.from, to: e.range.to });
    const half = e.spread === undefined ? (ignorance === undefined ? undefined : { half: ignorance }) : e.spread.relative === undefined ? { half: e.spread.half } : { half: e.spread.relative, relative: true };
    given[e.path] = { value: e.value, kind: 'given', ...half };
  }
  return { given, ranges };
}
