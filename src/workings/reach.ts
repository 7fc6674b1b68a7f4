import type { Bound, Slot } from './slot.ts';

/** What follows from what: next steps, and what they reach, found when first asked for. */
export interface Edges {
  readonly next: readonly (readonly number[])[];
  readonly followers: Map<number, Int32Array>;
  /** By loop variable and the loops around it. */
  readonly moving: Map<string, Int32Array>;
}

/**
 * What can be known at all, whatever the numbers: a fixpoint, so that loops hide nothing and nothing is asked in vain.
 *
 * @param slots  quantities with their ways
 * @param can    1 for each slot known from the start; filled up in place
 * @param open   whether a way counts
 * @returns      `can`, 1 for each slot that some chain of ways reaches
 */
export function knowable(slots: readonly Slot[], can: Uint8Array, open: (way: Bound) => boolean): Uint8Array {
  // Each way waits for the parts it still lacks; the last part to come makes its slot known.
  const lacks: number[] = [];
  const slotOf: number[] = [];
  const waiting: (number[] | undefined)[] = [];
  const found: number[] = [];
  slots.forEach((slot, i) => {
    if (can[i] === 1) return;
    for (const b of slot.ways) {
      if (can[i] === 1 || !open(b)) continue;
      const way = slotOf.push(i) - 1;
      let n = 0;
      for (const need of b.needs) if (can[need] === 0) { n++; (waiting[need] ??= []).push(way); }
      for (const w of b.when) if (can[w.slot] === 0) { n++; (waiting[w.slot] ??= []).push(way); }
      lacks.push(n);
      if (n === 0) { can[i] = 1; found.push(i); }
    }
  });
  for (let i = found.pop(); i !== undefined; i = found.pop()) {
    for (const way of waiting[i] ?? []) {
      lacks[way] = (lacks[way] as number) - 1;
      const slot = slotOf[way] as number;
      if (lacks[way] === 0 && can[slot] === 0) { can[slot] = 1; found.push(slot); }
    }
  }
  return can;
}

/**
 * Who needs whom, backwards, by the ways that can be taken at all.
 *
 * @param slots  quantities with their ways
 * @param can    what can be known
 * @returns      for each slot the slots whose ways read it
 */
export function whoNeeds(slots: readonly Slot[], can: Uint8Array): number[][] {
  const back: number[][] = slots.map(() => []);
  slots.forEach((slot, i) => {
    for (const b of slot.ways) {
      if (!b.needs.every((n) => can[n] === 1) || !b.when.every((w) => can[w.slot] === 1)) continue;
      for (const n of b.needs) back[n]?.push(i);
      for (const w of b.when) back[w.slot]?.push(i);
      if (b.closes >= 0) back[b.closes]?.push(i);
    }
  });
  return back;
}

/** Slots reached from one in any number of steps, itself included, going only through those that let pass. */
export function reached(next: Edges['next'], from: number, through: (slot: number) => boolean): Int32Array {
  const seen = new Set<number>([from]);
  for (const at of seen) for (const f of next[at] as readonly number[]) if (through(f)) seen.add(f);
  return Int32Array.from(seen);
}
