import type { ProblemData } from '../problems/index.ts';
import { bind } from './bind.ts';
import type { Node } from './build.ts';
import type { Laws } from './define.ts';
import { fixedPoint } from './fixed-point.ts';
import { Reach, type Known } from './reach.ts';
import { ownScatter, unfilled, type Bound, type Given, type Slot, type Source } from './slot.ts';
import { farOutside, needsOutside, type OutOfRange } from './way-range.ts';

/** How a loop was closed. */
export interface Closed {
  readonly passes: number;
  readonly change: number;
}

/**
 * All quantities of a case, resolved on demand. Replace given numbers by `set` and ask again: the same graph serves every point of a sweep.
 *
 * One file, since stamps, pins, shifts and loops are one state. Its inner loops count indices: most of them run a few times in a short program.
 */
export class Workings {
  readonly slots: readonly Slot[];
  readonly sources: readonly Source[];
  readonly closed = new Map<number, Closed>();
  readonly failures = new Map<number, ProblemData>();
  readonly index: ReadonlyMap<string, number>;
  readonly used: (Bound | undefined)[] = [];
  readonly given: readonly (Given | undefined)[];
  readonly #value: Float64Array;
  readonly #word: (string | undefined)[] = [];
  readonly #stamp: Int32Array;
  /** Deviation of each source in units of its 95 % half-width; all zero at the nominal point. */
  readonly #shift: Float64Array;
  readonly #inputSource: Int32Array;
  readonly #pinned: Uint8Array;
  /** Loop variables on trial, the outermost first; and 1 for each of them. */
  readonly #around: number[] = [];
  readonly #trying: Uint8Array;
  /** What a pinned quantity is set to, before any shift. */
  readonly #base: Float64Array;
  readonly #acts: readonly (readonly number[])[];
  readonly #round = 2;
  readonly #reach: Reach;
  /** How many sources stand off their nominal point, and readings aside of it. */
  #shifted = 0;
  #known: Known | undefined;
  readonly #lawSource: ReadonlyMap<string, number>;
  readonly #lawHalf: ReadonlyMap<number, number>;
  /** Slope of closes(x) - x where each loop was last closed. */
  readonly #slopes = new Map<number, number>();
  /** For a quantity pinned since: what could be known without the pin. */
  readonly #knewWithout = new Map<number, Known>();

  constructor(nodes: ReadonlyMap<string, Node>, given: Readonly<Record<string, Given>>, laws: Laws = {}) {
    const bound = bind(nodes, given, laws, (source) => this.#shift[source] as number);
    this.slots = bound.slots;
    this.index = bound.index;
    this.given = bound.given;
    this.sources = bound.sources;
    this.#acts = bound.acts;
    this.#inputSource = bound.inputSource;
    this.#lawSource = bound.lawSource;
    this.#lawHalf = bound.lawHalf;
    const n = this.slots.length;
    this.#value = new Float64Array(n);
    this.#stamp = new Int32Array(n);
    this.#pinned = new Uint8Array(n);
    this.#trying = new Uint8Array(n);
    this.#base = new Float64Array(n);
    this.#shift = new Float64Array(this.sources.length);
    this.#reach = new Reach(this.slots);
    for (let i = 0; i < n; i++) {
      const value = this.given[i]?.value;
      if (value === undefined) continue;
      this.#pinned[i] = 1;
      if (typeof value === 'string') this.#word[i] = value;
      else this.#base[i] = value;
    }
  }

  has(id: string): boolean { return this.index.has(id); }

  /** Number of a quantity, or undefined where it cannot be had. */
  get(id: string): number | undefined {
    const i = this.index.get(id);
    return i === undefined || !this.#of(i) ? undefined : this.#value[i];
  }

  /** Word of a word quantity, or undefined. */
  word(id: string): string | undefined {
    const i = this.index.get(id);
    return i === undefined || !this.#of(i) ? undefined : this.#word[i];
  }

  known(i: number): boolean { return this.#of(i); }
  value(i: number): number { return this.#value[i] as number; }
  wordAt(i: number): string | undefined { return this.#word[i]; }

  /** Pins a quantity to a number or word, whatever its ways say; `undefined` frees it again. */
  set(id: string, value: number | string | undefined): void { this.setAll([[id, value]]); }

  /** The same for many at once: what can be known is looked at once, not once for each. */
  setAll(pins: readonly (readonly [string, number | string | undefined])[]): void {
    const slots = pins.flatMap(([id, value]) => { const i = this.index.get(id); return i === undefined ? [] : [{ i, value, pin: value === undefined ? 0 : 1 }]; });
    for (const { i, pin } of slots) if (this.#pinned[i] !== pin) this.#forget(i); // by the ways that held so far
    for (const { i, value, pin } of slots) {
      if (typeof value === 'string') this.#word[i] = value;
      else if (value !== undefined) this.#base[i] = value;
      if (this.#pinned[i] !== pin) this.#keepKnowable(i, pin);
      this.#pinned[i] = pin;
    }
    for (const { i } of slots) this.#forget(i);
  }

  /** What can be known does not change by pinning a quantity that could be known, nor by setting it free again. */
  #keepKnowable(i: number, pin: number): void {
    if (pin === 1 && this.#known?.can[i] === 1) {
      this.#knewWithout.set(i, this.#known);
      return;
    }
    if (pin === 0 && this.#known !== undefined && this.#knewWithout.get(i) === this.#known) return;
    this.#known = undefined;
  }

  /**
   * What would be read with quantities pinned; the graph stands as before afterwards, every number where it was.
   *
   * @param pins  ids and the values they are pinned to
   * @param read  reads what is wanted
   */
  aside<T>(pins: readonly (readonly [string, number | string])[], read: () => T): T {
    const slots = this.#followersOf(pins.map(([id]) => this.index.get(id) ?? -1));
    const n = slots.length;
    const value = new Float64Array(n);
    const base = new Float64Array(n);
    const stamp = new Int32Array(n);
    const pinned = new Uint8Array(n);
    const words: (string | undefined)[] = [];
    const used: (Bound | undefined)[] = [];
    const closed: (Closed | undefined)[] = [];
    for (let k = 0; k < n; k++) {
      const i = slots[k] as number;
      value[k] = this.#value[i] as number;
      base[k] = this.#base[i] as number;
      stamp[k] = this.#stamp[i] as number;
      pinned[k] = this.#pinned[i] as number;
      words.push(this.#word[i]);
      used.push(this.used[i]);
      closed.push(this.closed.get(i));
    }
    const { version } = this;
    const known = this.#known;
    const failures = [...this.failures];
    this.#shifted++; // loops need close no more than a difference shows
    this.setAll(pins);
    try {
      return read();
    } finally {
      this.#shifted--;
      for (let k = 0; k < n; k++) {
        const i = slots[k] as number;
        this.#value[i] = value[k] as number;
        this.#base[i] = base[k] as number;
        this.#stamp[i] = stamp[k] as number;
        this.#pinned[i] = pinned[k] as number;
        this.#word[i] = words[k];
        this.used[i] = used[k];
        const was = closed[k];
        if (was === undefined) this.closed.delete(i);
        else this.closed.set(i, was);
      }
      this.#known = known;
      this.failures.clear();
      for (const [i, f] of failures) this.failures.set(i, f);
      this.version = version;
    }
  }

  /** All slots that follow from any of some. */
  #followersOf(from: readonly number[]): readonly number[] {
    const seen = new Uint8Array(this.slots.length);
    const found: number[] = [];
    for (let p = 0; p < from.length; p++) {
      const one = this.followers(from[p] as number);
      for (let k = 0; k < one.length; k++) {
        const i = one[k] as number;
        if (seen[i] === 1) continue;
        seen[i] = 1;
        found.push(i);
      }
    }
    return found;
  }

  isPinned(i: number): boolean { return this.#pinned[i] === 1; }

  /** Moves one source of spread by so many 95 % half-widths. */
  shift(source: number, by: number): void {
    const was = this.#shift[source] as number;
    if (was === by) return;
    this.#shifted += (by === 0 ? 0 : 1) - (was === 0 ? 0 : 1);
    this.#shift[source] = by;
    for (const i of this.#acts[source] ?? []) this.#forget(i);
  }

  /** Counts changes of the point: what was read off an earlier one no longer holds. */
  version = 0;

  /** Source of spread of an input, or -1. */
  inputSource(i: number): number { return this.#inputSource[i] as number; }

  /** Relative half-width of a source that is a law, as it was last read; undefined for others. */
  lawHalf(source: number): number | undefined { return this.#lawHalf.get(source); }

  /** The way a quantity was got by, tried with one need at another value; nothing else moves. */
  tryWay(i: number, need: number, value: number): number {
    const b = this.used[i] as Bound;
    this.#fill(b);
    b.of[b.way.needs[need] as string] = value;
    return b.way.value?.(b.of, b.laws) ?? Number.NaN;
  }

  /** The same with each property law moved by its half-width: source and value. */
  tryLaws(i: number): (readonly [number, number])[] {
    const b = this.used[i] as Bound;
    return (b.way.laws ?? []).map((law) => {
      const source = this.#lawSource.get(law) as number;
      this.#fill(b);
      this.#shift[source] = 1;
      const value = b.way.value?.(b.of, b.laws) ?? Number.NaN;
      this.#shift[source] = 0;
      return [source, value] as const;
    });
  }

  /** Half-width of the logarithm that the scatter of a quantity's way gives it; doubled outside its range. */
  scatterOf(i: number): number {
    const b = this.used[i];
    if (b === undefined || b.source < 0) return 0;
    this.#fill(b);
    return (ownScatter(b) ?? 0) * (farOutside(b, this.#value) > 0 ? 2 : 1);
  }

  #fill(b: Bound): void {
    if (b.of === unfilled) b.of = Object.create(null) as Record<string, number>; // looked up by name: no shape of its own for every way
    for (let k = 0; k < b.needs.length; k++) b.of[b.way.needs[k] as string] = this.#value[b.needs[k] as number] as number;
  }

  /** A quantity and all that follows from it are asked again. */
  #forget(i: number): void {
    this.version++;
    const follow = this.followers(i);
    for (let k = 0; k < follow.length; k++) this.#stamp[follow[k] as number] = 0;
    if (this.failures.size > 0) for (let k = 0; k < follow.length; k++) this.failures.delete(follow[k] as number);
  }

  /** Slots whose ways reach the slot, in any number of steps. */
  followers(i: number): Int32Array {
    const known = (this.#known ??= this.#knowAll());
    let found = known.followers.get(i);
    if (found === undefined) known.followers.set(i, (found = this.#reach.reached(known, i)));
    return found;
  }

  #knowAll(): Known { return this.#reach.known(Uint8Array.from(this.#pinned)); }

  /**
   * What can be known at all, whatever the numbers.
   *
   * @param more  further quantities taken as known, such as inputs that could be asked for
   * @param open  whether a way counts; all unless given
   * @returns     1 for each slot that some chain of ways reaches
   */
  reachable(more: (slot: Slot, i: number) => boolean = () => false, open?: (way: Bound) => boolean): Uint8Array {
    const known = Uint8Array.from(this.#pinned);
    for (let i = 0; i < known.length; i++) if (known[i] === 0 && more(this.slots[i] as Slot, i)) known[i] = 1;
    return this.#reach.known(known, open).can;
  }

  // Stamps: the round means known, the round + 1 being asked (meeting it again is a loop: that way is not taken here), the negative round cannot be had.
  #of(i: number): boolean {
    const stamp = this.#stamp[i] as number;
    if (stamp === this.#round) return true;
    if (stamp === -this.#round || stamp === this.#round + 1) return false;
    const slot = this.slots[i] as Slot;
    if (this.#pinned[i] === 1) return this.#takeGiven(i, slot);
    this.#known ??= this.#knowAll();
    if (this.#known.can[i] === 0) return false;
    this.#stamp[i] = this.#round + 1;
    let nearest: Bound | undefined;
    let least = Number.POSITIVE_INFINITY;
    let looped = false;
    for (let k = 0; k < slot.ways.length; k++) {
      const b = slot.ways[k] as Bound;
      const ready = this.#ready(b);
      if (ready === 'loop') looped = true;
      if (ready !== true) continue;
      const far = farOutside(b, this.#value);
      if (far === 0 && this.#take(i, slot, b, 1)) return true;
      if (far > 0 && far < least) { least = far; nearest = b; }
    }
    if (nearest !== undefined && this.#take(i, slot, nearest, 2)) return true;
    this.used[i] = undefined;
    // What failed only because a quantity above is being asked may still be had by another route.
    this.#stamp[i] = looped ? 0 : -this.#round;
    return false;
  }

  #takeGiven(i: number, slot: Slot): boolean {
    const g = this.given[i];
    const s = this.#inputSource[i] as number;
    if (!slot.isWord) {
      const by = s < 0 ? 0 : (this.#shift[s] as number);
      const base = this.#base[i] as number;
      const half = g?.half ?? 0;
      this.#value[i] = by === 0 ? base : g?.relative === true ? base * (1 + half) ** by : base + half * by;
    }
    this.#stamp[i] = this.#round;
    this.used[i] = undefined;
    return true;
  }

  #ready(b: Bound): boolean | 'loop' {
    for (let k = 0; k < b.when.length; k++) {
      const w = b.when[k] as Bound['when'][number];
      if (!this.#of(w.slot)) return this.#busy(w.slot) ? 'loop' : false;
      if (!w.words.includes(this.#word[w.slot] as string)) return false;
    }
    // Twice, since closing a loop inside one need may have emptied another.
    for (let pass = 0; pass < 3; pass++) {
      let all = true;
      for (let k = 0; k < b.needs.length; k++) {
        const n = b.needs[k] as number;
        if (this.#stamp[n] === this.#round) continue;
        all = false;
        if (!this.#of(n)) return this.#busy(n) ? 'loop' : false;
      }
      if (all) return true;
    }
    return true;
  }
  /** Being asked, or left open because something above it is. */
  #busy(i: number): boolean { return this.#stamp[i] === this.#round + 1 || this.#stamp[i] === 0; }

  #take(i: number, slot: Slot, b: Bound, widen: number): boolean {
    this.#fill(b);
    if (slot.isWord) {
      // The plain id of a word that exists once a place repeats the word of its place.
      this.#word[i] = b.way.word === undefined && b.needs.length === 1 ? this.#word[b.needs[0] as number] : b.way.word?.(b.of);
      if (this.#word[i] === undefined) return false;
    } else {
      let v = b.way.value?.(b.of, b.laws) ?? Number.NaN;
      if (b.closes >= 0 && Number.isFinite(v)) {
        const closed = this.#close(i, b, v);
        if (closed === undefined) return false;
        v = closed;
      }
      const shift = b.source < 0 ? 0 : (this.#shift[b.source] as number);
      if (shift !== 0) {
        v *= (1 + (ownScatter(b) ?? 0) * widen) ** shift;
      }
      if (!Number.isFinite(v)) {
        if (!this.failures.has(i)) this.failures.set(i, failure(slot, b, v));
        return false;
      }
      this.#value[i] = v;
    }
    this.#stamp[i] = this.#round;
    this.used[i] = b;
    return true;
  }

  /**
   * Closes a loop x = closes(x); undefined where `closes` cannot be had. What the last trial computed stays:
   * it belongs to x, so loops within loops are not opened again.
   */
  #close(i: number, b: Bound, start: number): number | undefined {
    const open = this.#moving(i);
    const before = new Int32Array(open.length);
    for (let k = 0; k < open.length; k++) before[k] = this.#stamp[open[k] as number] as number;
    // Quantities on trial in a loop around this one keep their trial value.
    this.#trying[i] = 1;
    this.#around.push(i);
    const kept = this.closed.has(i) && Number.isFinite(this.#value[i]) ? (this.#value[i] as number) : start;
    const x = this.#search(i, b, kept, open) ?? (kept === start ? undefined : this.#search(i, b, start, open));
    this.#around.pop();
    this.#trying[i] = 0;
    for (let k = 0; k < open.length; k++) {
      const f = open[k] as number;
      if (this.#trying[f] === 1) continue;
      // A quantity that is being asked further out is so still, unless the loop has computed it on its way. What was known stays so where the
      // loop rests at its old value: else loops that follow from each other would open one another for ever.
      if (this.#stamp[f] !== this.#round || x === undefined) this.#stamp[f] = x === kept || before[k] === this.#round + 1 ? (before[k] as number) : 0;
    }
    return x;
  }

  /** What moves with a loop variable while those of the loops around it stand: what is reached only through them need not be asked again. */
  #moving(i: number): Int32Array {
    if (this.#around.length === 0) return this.followers(i);
    const known = (this.#known ??= this.#knowAll());
    const key = `${i} ${this.#around.join(' ')}`;
    let found = known.moving.get(key);
    if (found === undefined) known.moving.set(key, (found = this.#reach.reached(known, i, this.#trying)));
    return found;
  }

  #search(i: number, b: Bound, start: number, open: Int32Array): number | undefined {
    // A difference against the nominal point needs no more.
    const within = this.#shifted > 0 ? 1e-7 : (b.way.within ?? 1e-10);
    const end = fixedPoint((x) => {
      for (let k = 0; k < open.length; k++) if (this.#trying[open[k] as number] === 0) this.#stamp[open[k] as number] = 0;
      this.#value[i] = x;
      this.#stamp[i] = this.#round;
      return this.#of(b.closes) ? (this.#value[b.closes] as number) : Number.NaN;
    }, start, within, this.#slopes.get(i));
    if (end.slope !== undefined) this.#slopes.set(i, end.slope);
    if (end.found) return this.#closedAt(i, end.x, end.passes, end.residual);
    if (end.why === 'open') this.failures.set(i, { code: 'loop-open', message: `${this.slots[i]?.id ?? ''}: the loop ${b.way.formula} did not close in ${end.passes} passes (last residual ${end.residual.toExponential(1)})` });
    return undefined;
  }

  #closedAt(i: number, x: number, passes: number, residual: number): number {
    this.closed.set(i, { passes, change: Math.abs(residual) / Math.max(Math.abs(x), 1e-300) });
    return x;
  }

  /** The needs of the way a quantity was got by that lie outside the way's range. */
  outside(i: number): readonly OutOfRange[] {
    const b = this.used[i];
    return b === undefined ? [] : needsOutside(b, this.#value);
  }
}

function failure(slot: Slot, b: Bound, v: number): ProblemData {
  const put = b.way.needs.map((n) => `${n} = ${b.of[n] as number}`).join(', ');
  return { code: 'not-finite', message: `${slot.id}: ${b.way.formula} gives ${v}${put === '' ? '' : ` at ${put}`}` };
}
