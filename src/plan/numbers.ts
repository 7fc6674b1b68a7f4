import type { Range } from '../assemble/index.ts';
import { stepOf, type Settle, type Spread, type Workings } from '../workings/index.ts';
import type { PlanQuantity } from './types.ts';

/** The ends of the operating ranges, all combinations up to three ranges, beyond that one at a time. */
function cornersOf(ranges: readonly Range[]): Readonly<Record<string, number>>[] {
  if (ranges.length === 0) return [];
  if (ranges.length > 3) return ranges.flatMap((r) => [{ [r.path]: r.from }, { [r.path]: r.to }]);
  let rows: Record<string, number>[] = [{}];
  for (const r of ranges) rows = rows.flatMap((row) => [{ ...row, [r.path]: r.from }, { ...row, [r.path]: r.to }]);
  return rows;
}

/**
 * What the operating range makes of every number: lowest and highest over its ends and the nominal point.
 *
 * @param workings  the graph at its nominal point; it stands there again afterwards
 * @param ranges    operating ranges of the case
 * @param ids       quantities asked for
 * @param settle    settles verdicts and choices at each end
 * @returns         from and to by id; empty without ranges
 */
export function rangesOf(workings: Workings, ranges: readonly Range[], ids: readonly string[], settle: Settle): Map<string, { from: number; to: number }> {
  const out = new Map<string, { from: number; to: number }>();
  const corners = cornersOf(ranges);
  if (corners.length === 0) return out;
  const nominal = new Map(ranges.map((r) => [r.path, workings.get(r.path)]));
  const read = (): void => {
    for (const id of ids) {
      const v = workings.get(id);
      if (v === undefined) continue;
      const at = out.get(id);
      if (at === undefined) out.set(id, { from: v, to: v });
      else {
        at.from = Math.min(at.from, v);
        at.to = Math.max(at.to, v);
      }
    }
  };
  read();
  for (const corner of corners) {
    for (const [path, v] of nominal) workings.set(path, corner[path] ?? v);
    settle(workings);
    read();
  }
  for (const [path, v] of nominal) workings.set(path, v);
  settle(workings);
  for (const [id, at] of out) if (at.from === at.to) out.delete(id);
  return out;
}

/**
 * Ids with all that they need: what the plan must hold so that every number in it can be followed.
 *
 * @param workings  the graph
 * @param ids       ids named anywhere in the plan
 * @returns         the closure, in order of first meeting; unknown ids are left out
 */
export function closure(workings: Workings, ids: Iterable<string>): string[] {
  const seen = new Set<string>();
  const visit = (id: string): void => {
    if (seen.has(id)) return;
    const step = stepOf(workings, id);
    if (step === undefined) return;
    seen.add(id);
    for (const w of step.when) visit(w.id);
    for (const n of step.needs) visit(n);
  };
  for (const id of ids) visit(id);
  return [...seen];
}

/** One quantity of the plan, with spread, range and the flags on its way. */
export function planQuantity(workings: Workings, id: string, spread: Spread | undefined, range: { from: number; to: number } | undefined, outside: readonly string[]): PlanQuantity | undefined {
  const step = stepOf(workings, id);
  if (step === undefined) return undefined;
  return {
    symbol: step.symbol,
    name: step.name,
    value: step.value,
    unit: step.unit,
    kind: step.kind,
    ...(step.at === undefined ? {} : { at: step.at }),
    ...(spread === undefined || typeof step.value === 'string' || spread.high - spread.low <= 1e-6 * Math.abs(step.value) ? {} : { low: spread.low, high: spread.high, coverage: 0.95 }),
    ...(range === undefined ? {} : { range }),
    formula: step.formula,
    needs: step.needs,
    source: step.source,
    withinRange: outside.length === 0,
    ...(outside.length === 0 ? {} : { outside }),
    ...(step.note === undefined ? {} : { note: step.note }),
  };
}
