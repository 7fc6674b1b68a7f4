import type { Workings } from './resolve.ts';
import type { Slot } from './slot.ts';

/** Wide enough to pass the last digit of a rounded count, narrow enough for a slope good to six digits. */
const small = 1e-3;
const mostLoops = 24;
/** Above this slope in logarithms a small step has crossed a stair (a count rounded up to a multiple), not followed a law. */
const steepest = 5;

/** Whether a slot spreads by plus and minus: temperatures, what can change sign, zero and below. */
export function adds(workings: Workings, i: number): boolean {
  const { about } = (workings.slots[i] as Slot).node;
  return about.signed === true || about.unit === 'K' || !(workings.value(i) > 0);
}

/** Change of one quantity for each source that moves it, in the quantity's own coordinate (logarithm or value); loops still open stand after the sources. */
export interface Slopes {
  readonly at: readonly number[];
  readonly by: readonly number[];
}
const none: Slopes = { at: [], by: [] };

/**
 * First derivatives of quantities with respect to every source of spread, each source in units of its 95 % half-width. A quantity that multiplies
 * is followed in its logarithm, one that adds in its value; loops are closed by solving their linear system. Where a small step sees a stair, the
 * secant over the half-width of the need counts.
 */
export class Linear {
  readonly #workings: Workings;
  readonly #columns: number;
  readonly #rows = new Map<number, Slopes>();
  readonly #whole = new Map<number, Slopes>();
  readonly #loops: number[] = [];
  #closed: Float64Array[] | undefined;
  /** Sum in the making, and which of its places are in use. */
  readonly #sum: Float64Array;
  readonly #inUse: Uint8Array;
  #places: number[] = [];

  constructor(workings: Workings) {
    this.#workings = workings;
    this.#columns = workings.sources.length;
    this.#sum = new Float64Array(this.#columns + mostLoops);
    this.#inUse = new Uint8Array(this.#columns + mostLoops);
  }

  /** Slopes of a quantity, all loops closed. */
  row(i: number): Slopes {
    let found = this.#whole.get(i);
    if (found === undefined) this.#whole.set(i, (found = this.#close(i)));
    return found;
  }

  #close(i: number): Slopes {
    this.#visit(i);
    for (let k = 0; k < this.#loops.length; k++) this.#visit(this.#closes(this.#loops[k] as number));
    this.#closed ??= this.#solve();
    const open = this.#rows.get(i) as Slopes;
    if (!open.at.some((c) => c >= this.#columns)) return open;
    for (let k = 0; k < open.at.length; k++) {
      const c = open.at[k] as number;
      const by = open.by[k] as number;
      if (c < this.#columns) this.#add(c, by);
      else {
        const x = this.#closed[c - this.#columns] as Float64Array;
        for (let s = 0; s < x.length; s++) if (x[s] !== 0) this.#add(s, by * (x[s] as number));
      }
    }
    return this.#taken();
  }

  #add(place: number, by: number): void {
    if (this.#inUse[place] === 0) {
      this.#inUse[place] = 1;
      this.#places.push(place);
    }
    (this.#sum[place] as number) += by;
  }

  /** The sum made, and room for the next one. */
  #taken(): Slopes {
    const at = this.#places;
    const by: number[] = [];
    for (let k = 0; k < at.length; k++) {
      const c = at[k] as number;
      by.push(this.#sum[c] as number);
      this.#sum[c] = 0;
      this.#inUse[c] = 0;
    }
    this.#places = [];
    return { at, by };
  }

  /** A need of a quantity, moved along one source: its value there. */
  moved(i: number, source: number, by: number): number {
    const { at, by: slopes } = this.row(i);
    const d = slopes[at.indexOf(source)] ?? 0;
    const v = this.#workings.value(i);
    return adds(this.#workings, i) ? v + d * by : v * Math.exp(d * by);
  }

  #closes(i: number): number { return this.#workings.used[i]?.closes ?? -1; }

  #visit(i: number): void {
    if (this.#rows.has(i)) return;
    this.#rows.set(i, none);
    const w = this.#workings;
    if (!w.known(i) || (w.slots[i] as Slot).isWord) return;
    const bound = w.isPinned(i) ? undefined : w.used[i];
    if (bound === undefined) {
      this.#rows.set(i, this.#input(i));
      return;
    }
    if (bound.closes >= 0) {
      if (this.#loops.length >= mostLoops) return;
      this.#rows.set(i, { at: [this.#columns + this.#loops.push(i) - 1], by: [1] });
      this.#closed = undefined;
      this.#whole.clear();
      return;
    }
    // A whole number that the plan decides is what it is.
    if (bound.way.as === 'decided' && Number.isInteger(w.value(i))) return;
    for (let k = 0; k < bound.needs.length; k++) this.#visit(bound.needs[k] as number);
    const mine = adds(w, i);
    const x = w.value(i);
    const slope = (up: number, down: number, step: number): number => {
      const d = mine || !(up > 0 && down > 0) ? (up - down) / (mine ? 1 : x) : Math.log(up / down);
      return Number.isFinite(d) ? d / step : 0;
    };
    for (let k = 0; k < bound.needs.length; k++) {
      const n = bound.needs[k] as number;
      const { at, by } = this.#rows.get(n) as Slopes;
      if (at.length === 0) continue;
      const v = w.value(n);
      const plus = adds(w, n);
      const over = (h: number): number => slope(w.tryWay(i, k, plus ? v + h : v * Math.exp(h)), w.tryWay(i, k, plus ? v - h : v * Math.exp(-h)), 2 * h);
      const h = plus ? small * Math.max(Math.abs(v), 1e-3) : small;
      let times = over(h);
      if (times === 0 || (!mine && !plus && Math.abs(times) > steepest)) { // a stair
        let square = 0;
        for (let m = 0; m < at.length; m++) if ((at[m] as number) < this.#columns) square += (by[m] as number) ** 2;
        const wide = Math.sqrt(square);
        if (wide > h) times = over(wide);
      }
      if (times !== 0) for (let m = 0; m < at.length; m++) this.#add(at[m] as number, times * (by[m] as number));
    }
    const half = w.scatterOf(i);
    if (half !== 0) this.#add(bound.source, mine ? x * half : Math.log(1 + half));
    if (bound.way.laws !== undefined) for (const [source, up] of w.tryLaws(i)) this.#add(source, slope(up, x, 1));
    this.#rows.set(i, this.#taken());
  }

  #input(i: number): Slopes {
    const source = this.#workings.inputSource(i);
    if (source < 0) return none;
    const { half = 0, relative } = this.#workings.given[i] ?? {};
    const v = this.#workings.value(i);
    const change = adds(this.#workings, i) ? (relative === true ? v * half : half) : relative === true ? Math.log(1 + half) : half < v ? Math.log((v + half) / (v - half)) / 2 : half / v;
    return { at: [source], by: [change] };
  }

  /** Every loop variable x with x = closes(x): the linear system of all loops at once, by Gauss elimination with pivots. */
  #solve(): Float64Array[] {
    const n = this.#loops.length;
    const rows: Float64Array[] = this.#loops.map((i, k) => {
      const c = this.#closes(i);
      const from = this.#rows.get(c) as Slopes;
      // The loop variable and what closes it may be followed in different coordinates.
      const ratio = adds(this.#workings, i) === adds(this.#workings, c) ? 1 : adds(this.#workings, c) ? 1 / this.#workings.value(i) : this.#workings.value(i);
      const a = new Float64Array(n + this.#columns);
      a[k] = 1;
      for (let m = 0; m < from.at.length; m++) {
        const column = from.at[m] as number;
        if (column >= this.#columns) (a[column - this.#columns] as number) -= ratio * (from.by[m] as number);
        else (a[n + column] as number) += ratio * (from.by[m] as number);
      }
      return a;
    });
    for (let c = 0; c < n; c++) {
      let p = c;
      for (let r = c + 1; r < n; r++) if (Math.abs((rows[r] as Float64Array)[c] as number) > Math.abs((rows[p] as Float64Array)[c] as number)) p = r;
      [rows[c], rows[p]] = [rows[p] as Float64Array, rows[c] as Float64Array];
      const row = rows[c] as Float64Array;
      const pivot = row[c] as number;
      if (pivot === 0) continue;
      for (let k = 0; k < row.length; k++) if (row[k] !== 0) (row[k] as number) /= pivot;
      rows.forEach((other, r) => { if (r !== c) add(other, -(other[c] as number), row); });
    }
    return rows.map((row) => row.slice(n));
  }
}

function add(to: Float64Array, times: number, from: Float64Array): void {
  if (times === 0) return;
  for (let k = 0; k < to.length; k++) if (from[k] !== 0) (to[k] as number) += times * (from[k] as number);
}
