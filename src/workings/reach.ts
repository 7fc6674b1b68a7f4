import type { Bound, Slot } from './slot.ts';

/** What can be known, and what follows from what by the ways that can be taken; what is found is kept. */
export interface Known {
  /** 1 for each slot that some chain of ways reaches. */
  readonly can: Uint8Array;
  /** Parts each way still lacks: 0 where it can be taken. */
  readonly lacks: Int32Array;
  readonly followers: Map<number, Int32Array>;
  /** By loop variable and the loops around it. */
  readonly moving: Map<string, Int32Array>;
}

/** The ways of a graph by what they wait for, in flat lists: they are walked at every change of what is pinned, most often by code that runs a few times only. */
export class Reach {
  readonly #slots: number;
  /** Way by way: its slot, the way, how many parts it waits for. */
  readonly #slotOf: number[] = [];
  readonly #ways: Bound[] = [];
  readonly #parts: number[] = [];
  readonly #free: number[] = [];
  /** Ways that wait for each slot, once a part; loops that each slot closes. */
  readonly #waiting: (number[] | undefined)[];
  readonly #closing: (number[] | undefined)[];

  constructor(slots: readonly Slot[]) {
    this.#slots = slots.length;
    this.#waiting = slots.map(() => undefined);
    this.#closing = slots.map(() => undefined);
    for (let i = 0; i < slots.length; i++) {
      const { ways } = slots[i] as Slot;
      for (let k = 0; k < ways.length; k++) this.#add(i, ways[k] as Bound);
    }
  }

  #add(slot: number, b: Bound): void {
    const way = this.#ways.push(b) - 1;
    this.#slotOf.push(slot);
    const parts = b.needs.length + b.when.length;
    this.#parts.push(parts);
    if (parts === 0) this.#free.push(way);
    for (let k = 0; k < b.needs.length; k++) (this.#waiting[b.needs[k] as number] ??= []).push(way);
    for (let k = 0; k < b.when.length; k++) (this.#waiting[(b.when[k] as Bound['when'][number]).slot] ??= []).push(way);
    if (b.closes >= 0) (this.#closing[b.closes] ??= []).push(way);
  }

  /**
   * What can be known at all, whatever the numbers: a fixpoint, so that loops hide nothing and nothing is asked in vain.
   *
   * @param can   1 for each slot known from the start; filled up in place
   * @param open  whether a way counts; all unless given
   * @returns     what is known then
   */
  known(can: Uint8Array, open?: (way: Bound) => boolean): Known {
    const lacks = Int32Array.from(this.#parts);
    const found: number[] = [];
    for (let i = 0; i < can.length; i++) if (can[i] === 1) found.push(i);
    const taken = (way: number): void => {
      const slot = this.#slotOf[way] as number;
      if (can[slot] === 1 || (open !== undefined && !open(this.#ways[way] as Bound))) return;
      can[slot] = 1;
      found.push(slot);
    };
    for (let k = 0; k < this.#free.length; k++) taken(this.#free[k] as number);
    // The last part to come makes the slot of its way known.
    for (let at = 0; at < found.length; at++) {
      const waiting = this.#waiting[found[at] as number];
      if (waiting === undefined) continue;
      for (let k = 0; k < waiting.length; k++) {
        const way = waiting[k] as number;
        if (--(lacks[way] as number) === 0) taken(way);
      }
    }
    return { can, lacks, followers: new Map(), moving: new Map() };
  }

  /**
   * Slots reached from one in any number of steps, itself included.
   *
   * @param known    what can be known
   * @param from     where it starts
   * @param through  1 for each slot that is not gone through
   * @returns        the slots, in the order they are met
   */
  reached(known: Known, from: number, through?: Uint8Array): Int32Array {
    const seen = new Uint8Array(this.#slots);
    const found: number[] = [from];
    seen[from] = 1;
    for (let at = 0; at < found.length; at++) {
      for (let list = this.#waiting[found[at] as number], pass = 0; pass < 2; list = this.#closing[found[at] as number], pass++) {
        if (list === undefined) continue;
        for (let k = 0; k < list.length; k++) {
          const way = list[k] as number;
          const slot = this.#slotOf[way] as number;
          if (seen[slot] === 1 || known.lacks[way] !== 0 || through?.[slot] === 1) continue;
          seen[slot] = 1;
          found.push(slot);
        }
      }
    }
    return Int32Array.from(found);
  }
}
