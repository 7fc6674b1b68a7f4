import type { ProblemData } from '../problems/index.ts';
import type { Node } from './build.ts';
import type { Law, Laws, When } from './define.ts';
import { knowable, reached, whoNeeds, type Edges } from './reach.ts';
import type { Bound, Given, Slot, Source } from './slot.ts';

/** How a loop was closed. */
export interface Closed {
  readonly passes: number;
  readonly change: number;
}

const mostPasses = 60;
const never: Bound['when'] = [];

/** All quantities of a case, resolved on demand. Replace given numbers by `set` and ask again: the same graph serves every point of a sweep. */
export class Workings {
  readonly slots: Slot[] = [];
  readonly sources: Source[] = [];
  readonly closed = new Map<number, Closed>();
  readonly failures = new Map<number, ProblemData>();
  readonly index = new Map<string, number>();
  readonly used: (Bound | undefined)[] = [];
  readonly given: (Given | undefined)[] = [];
  readonly #value: Float64Array;
  readonly #word: (string | undefined)[] = [];
  readonly #stamp: Int32Array;
  /** Deviation of each source in units of its 95 % half-width; all zero at the nominal point. */
  readonly #shift: Float64Array;
  readonly #inputSource: Int32Array;
  readonly #pinned: Uint8Array;
  readonly #trying: Uint8Array;
  /** What a pinned quantity is set to, before any shift. */
  readonly #base: Float64Array;
  /** The slots each source of spread acts on directly. */
  readonly #acts: number[][] = [];
  readonly #round = 2;
  /** What follows from what, for each state of what can be known. */
  readonly #edges = new WeakMap<Uint8Array, Edges>();
  /** How many sources stand off their nominal point, and readings aside of it. */
  #shifted = 0;
  #knowable: Uint8Array | undefined;
  readonly #lawSource = new Map<string, number>();
  /** Slope of closes(x) - x where each loop was last closed. */
  readonly #slopes = new Map<number, number>();
  /** For a quantity pinned since: what could be known without the pin. */
  readonly #knewWithout = new Map<number, Uint8Array>();

  constructor(nodes: ReadonlyMap<string, Node>, given: Readonly<Record<string, Given>>, laws: Laws = {}) {
    for (const node of nodes.values()) this.index.set(node.id, this.slots.push({ id: node.id, node, isWord: node.about.unit === 'word', ways: [] }) - 1);
    const n = this.slots.length;
    this.#value = new Float64Array(n);
    this.#stamp = new Int32Array(n);
    this.#pinned = new Uint8Array(n);
    this.#trying = new Uint8Array(n);
    this.#base = new Float64Array(n);
    this.#inputSource = new Int32Array(n).fill(-1);
    const sourceOf = new Map<unknown, number>();
    const source = (key: unknown, s: Source): number => {
      let i = sourceOf.get(key);
      if (i === undefined) {
        sourceOf.set(key, (i = this.sources.push(s) - 1));
        this.#acts.push([]);
      }
      return i;
    };
    for (const [id, g] of Object.entries(given)) {
      const i = this.index.get(id);
      if (i === undefined) continue;
      this.given[i] = g;
      this.#pinned[i] = 1;
      if (typeof g.value === 'string') this.#word[i] = g.value;
      else this.#base[i] = g.value;
      if (g.half !== undefined && g.half > 0) {
        const s = source(id, { key: id, label: id, kind: 'input' });
        this.#inputSource[i] = s;
        this.#acts[s]?.push(i);
      }
    }
    const shifted = this.#shiftedLaws(laws, source);
    for (const slot of this.slots) {
      slot.ways = slot.node.ways
        .filter((w) => (w.way.laws ?? []).every((l) => laws[l] !== undefined))
        .map(({ way, needs, when, closes }): Bound => ({
          way,
          ids: needs,
          needs: needs.map((id) => this.index.get(id) as number),
          when: this.#conditions(when),
          closes: closes === undefined ? -1 : (this.index.get(closes) as number),
          of: {},
          laws: shifted,
          source: way.scatter === undefined ? -1 : source(way.together ?? way, { key: way.together ?? `${slot.id}: ${way.formula}`, label: way.source, kind: 'scatter' }),
        }));
      for (const b of slot.ways) {
        if (b.source >= 0) this.#acts[b.source]?.push(this.index.get(slot.id) as number);
        for (const l of b.way.laws ?? []) this.#acts[sourceOf.get(`law ${l}`) as number]?.push(this.index.get(slot.id) as number);
      }
    }
    this.#shift = new Float64Array(this.sources.length);
  }

  #shiftedLaws(laws: Laws, source: (key: unknown, s: Source) => number): Laws {
    const out: Record<string, Law> = {};
    for (const [name, law] of Object.entries(laws)) {
      const i = source(`law ${name}`, { key: name, label: name, kind: 'property' });
      this.#lawSource.set(name, i);
      out[name] = Object.assign((t: number, p: number) => { const s = this.#shift[i] as number; return s === 0 ? law(t, p) : law(t, p) * (1 + law.uncertainty(t, p)) ** s; }, { uncertainty: law.uncertainty });
    }
    return out;
  }

  #conditions(when: When | undefined): Bound['when'] {
    return when === undefined ? never : Object.entries(when).map(([id, words]) => ({ slot: this.index.get(id) as number, words: typeof words === 'string' ? [words] : words }));
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
    if (pin === 1 && this.#knowable?.[i] === 1) {
      this.#knewWithout.set(i, this.#knowable);
      return;
    }
    if (pin === 0 && this.#knowable !== undefined && this.#knewWithout.get(i) === this.#knowable) return;
    this.#knowable = undefined;
  }

  /**
   * What would be read with quantities pinned; the graph stands as before afterwards, every number where it was.
   *
   * @param pins  ids and the values they are pinned to
   * @param read  reads what is wanted
   */
  aside<T>(pins: readonly (readonly [string, number | string])[], read: () => T): T {
    const touched = new Set<number>();
    for (const [id] of pins) for (const f of this.followers(this.index.get(id) ?? -1)) touched.add(f);
    const slots = [...touched];
    const kept = slots.map((i) => [this.#value[i], this.#base[i], this.#stamp[i], this.#pinned[i], this.#word[i], this.used[i], this.closed.get(i)] as const);
    const { version } = this;
    const knowable = this.#knowable;
    const failures = [...this.failures];
    this.#shifted++; // loops need close no more than a difference shows
    this.setAll(pins);
    try {
      return read();
    } finally {
      this.#shifted--;
      slots.forEach((i, k) => {
        const [value, base, stamp, pinned, word, used, closed] = kept[k] as (typeof kept)[number];
        this.#value[i] = value as number;
        this.#base[i] = base as number;
        this.#stamp[i] = stamp as number;
        this.#pinned[i] = pinned as number;
        this.#word[i] = word;
        this.used[i] = used;
        if (closed === undefined) this.closed.delete(i);
        else this.closed.set(i, closed);
      });
      this.#knowable = knowable;
      this.failures.clear();
      for (const [i, f] of failures) this.failures.set(i, f);
      this.version = version;
    }
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
    return (typeof b.way.scatter === 'function' ? b.way.scatter(b.of) : (b.way.scatter ?? 0)) * (this.#outside(b) > 0 ? 2 : 1);
  }

  #fill(b: Bound): void {
    for (let k = 0; k < b.needs.length; k++) b.of[b.way.needs[k] as string] = this.#value[b.needs[k] as number] as number;
  }

  /** A quantity and all that follows from it are asked again. */
  #forget(i: number): void {
    this.version++;
    for (const f of this.followers(i)) {
      this.#stamp[f] = 0;
      this.failures.delete(f);
    }
  }

  /** Slots whose ways reach the slot, in any number of steps. */
  followers(i: number): Int32Array {
    const edges = this.#edgesNow();
    let found = edges.followers.get(i);
    if (found === undefined) edges.followers.set(i, (found = reached(edges.next, i, () => true)));
    return found;
  }

  #edgesNow(): Edges {
    const can = (this.#knowable ??= this.reachable());
    let edges = this.#edges.get(can);
    if (edges === undefined) this.#edges.set(can, (edges = { next: whoNeeds(this.slots, can), followers: new Map(), moving: new Map() }));
    return edges;
  }

  /**
   * What can be known at all, whatever the numbers.
   *
   * @param more  further quantities taken as known, such as inputs that could be asked for
   * @param open  whether a way counts; all unless given
   * @returns     1 for each slot that some chain of ways reaches
   */
  reachable(more: (slot: Slot, i: number) => boolean = () => false, open: (way: Bound) => boolean = () => true): Uint8Array {
    const known = Uint8Array.from(this.#pinned);
    this.slots.forEach((slot, i) => { if (known[i] === 0 && more(slot, i)) known[i] = 1; });
    return knowable(this.slots, known, open);
  }

  // Stamps: the round means known, the round + 1 being asked (meeting it again is a loop: that way is not taken here), the negative round cannot be had.
  #of(i: number): boolean {
    const stamp = this.#stamp[i] as number;
    if (stamp === this.#round) return true;
    if (stamp === -this.#round || stamp === this.#round + 1) return false;
    const slot = this.slots[i] as Slot;
    if (this.#pinned[i] === 1) return this.#takeGiven(i, slot);
    this.#knowable ??= this.reachable();
    if (this.#knowable[i] === 0) return false;
    this.#stamp[i] = this.#round + 1;
    let nearest: Bound | undefined;
    let least = Number.POSITIVE_INFINITY;
    let looped = false;
    for (const b of slot.ways) {
      const ready = this.#ready(b);
      if (ready === 'loop') looped = true;
      if (ready !== true) continue;
      const far = this.#outside(b);
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
    let looped = false;
    for (const w of b.when) {
      if (!this.#of(w.slot)) { looped ||= this.#busy(w.slot); return looped ? 'loop' : false; }
      if (!w.words.includes(this.#word[w.slot] as string)) return false;
    }
    // Twice, since closing a loop inside one need may have emptied another.
    for (let pass = 0; pass < 3; pass++) {
      let all = true;
      for (const n of b.needs) {
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

  /** How far outside its range a way is, as a logarithm summed over its needs; 0 inside. */
  #outside(b: Bound): number {
    const range = b.way.range;
    let far = 0;
    if (range !== undefined) b.way.needs.forEach((name, k) => {
      const r = range[name];
      const v = this.#value[b.needs[k] as number] as number;
      if (r === undefined) return;
      const [lo, hi] = r;
      if (v > hi) far += distance(v, hi);
      else if (v < lo) far += distance(v, lo);
      else if (Number.isNaN(v)) far += Number.POSITIVE_INFINITY;
    });
    return far;
  }

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
        const w = typeof b.way.scatter === 'function' ? b.way.scatter(b.of) : (b.way.scatter ?? 0);
        v *= (1 + w * widen) ** shift;
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
   * Fixed point x = closes(x), by secant steps on closes(x) - x; undefined where `closes` cannot be had. What the last trial computed stays:
   * it belongs to x, so loops within loops are not opened again.
   */
  #close(i: number, b: Bound, start: number): number | undefined {
    const open = this.#moving(i);
    const before = new Int32Array(open.length);
    for (let k = 0; k < open.length; k++) before[k] = this.#stamp[open[k] as number] as number;
    // Quantities on trial in a loop around this one keep their trial value.
    this.#trying[i] = 1;
    const kept = this.closed.has(i) && Number.isFinite(this.#value[i]) ? (this.#value[i] as number) : start;
    const x = this.#search(i, b, kept, open) ?? (kept === start ? undefined : this.#search(i, b, start, open));
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
    const around: number[] = [];
    for (let k = 0; k < this.#trying.length; k++) if (this.#trying[k] === 1) around.push(k);
    if (around.length === 0) return this.followers(i);
    const { next, moving } = this.#edgesNow();
    const key = `${i} ${around.join(' ')}`;
    let found = moving.get(key);
    if (found === undefined) moving.set(key, (found = reached(next, i, (f) => this.#trying[f] === 0)));
    return found;
  }

  #search(i: number, b: Bound, start: number, open: Int32Array): number | undefined {
    // A difference against the nominal point needs no more.
    const within = this.#shifted > 0 ? 1e-7 : (b.way.within ?? 1e-10);
    const trial = (x: number): number => {
      for (let k = 0; k < open.length; k++) if (this.#trying[open[k] as number] === 0) this.#stamp[open[k] as number] = 0;
      this.#value[i] = x;
      this.#stamp[i] = this.#round;
      return this.#of(b.closes) ? (this.#value[b.closes] as number) : Number.NaN;
    };
    let x0 = start;
    let r0 = trial(x0) - x0;
    if (Number.isNaN(r0)) return undefined;
    if (Math.abs(r0) <= within * Math.abs(x0)) return this.#closedAt(i, x0, 1, r0);
    // The slope of the last time serves until a new one is known. Once the residual has changed its sign, the root stays between the two ends:
    // where a word changes on the way it may jump over zero, and the loop then rests at the jump.
    const known = this.#slopes.get(i);
    let x = x0 + (known === undefined ? r0 : -r0 / known);
    let end: { x: number; r: number } | undefined;
    for (let passes = 2; passes <= mostPasses && Number.isFinite(x); passes++) {
      const r = trial(x) - x;
      if (Number.isNaN(r)) return undefined;
      if (Math.abs(r) <= within * Math.abs(x)) return this.#closedAt(i, x, passes, r);
      if (r * r0 < 0) end = { x: x0, r: r0 };
      if (end !== undefined && Math.abs(end.x - x) <= Math.max(within, 1e-9) * Math.abs(x)) return this.#closedAt(i, x, passes, r);
      const slope = (r - r0) / (x - x0);
      const step = -r / slope;
      const good = Number.isFinite(step) && step !== 0;
      if (good) this.#slopes.set(i, slope);
      const stuck = end !== undefined && Math.abs(r) > 0.5 * Math.abs(r0);
      [x0, r0] = [x, r];
      x += good && Math.abs(step) <= 5 * Math.abs(r) ? step : r;
      if (end !== undefined && (stuck || (x - x0) * (x - end.x) >= 0)) x = (x0 + end.x) / 2;
    }
    this.failures.set(i, { code: 'loop-open', message: `${this.slots[i]?.id ?? ''}: the loop ${b.way.formula} did not close in ${mostPasses} passes (last residual ${r0.toExponential(1)})` });
    return undefined;
  }

  #closedAt(i: number, x: number, passes: number, residual: number): number {
    this.closed.set(i, { passes, change: Math.abs(residual) / Math.max(Math.abs(x), 1e-300) });
    return x;
  }

  /** The needs of the way a quantity was got by that lie outside the way's range. */
  outside(i: number): { need: string; value: number; range: readonly [number, number] }[] {
    const b = this.used[i];
    if (b?.way.range === undefined) return [];
    return b.way.needs.flatMap((name, k) => {
      const range = b.way.range?.[name];
      const value = this.#value[b.needs[k] as number] as number;
      return range !== undefined && (value < range[0] || value > range[1]) ? [{ need: b.ids[k] as string, value, range }] : [];
    });
  }
}

function distance(v: number, end: number): number {
  return v > 0 && end > 0 ? Math.abs(Math.log(v / end)) : Math.abs(v - end) / Math.max(Math.abs(end), Math.abs(v));
}

function failure(slot: Slot, b: Bound, v: number): ProblemData {
  const put = b.way.needs.map((n) => `${n} = ${b.of[n] as number}`).join(', ');
  return { code: 'not-finite', message: `${slot.id}: ${b.way.formula} gives ${v}${put === '' ? '' : ` at ${put}`}` };
}
