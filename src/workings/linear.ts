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

/**
 * First derivatives of quantities with respect to every source of spread, each source in units of its 95 % half-width. A quantity that multiplies
 * is followed in its logarithm, one that adds in its value; loops are closed by solving their linear system. Where a small step sees a stair, the
 * secant over the half-width of the need counts.
 */
export class Linear {
  readonly #workings: Workings;
  readonly #columns: number;
  readonly #rows = new Map<number, Float64Array>();
  readonly #loops: number[] = [];
  #closed: Float64Array[] | undefined;

  constructor(workings: Workings) {
    this.#workings = workings;
    this.#columns = workings.sources.length;
  }

  /** Change of a quantity for each source, in its own coordinate (logarithm or value). */
  row(i: number): Float64Array {
    this.#visit(i);
    for (let k = 0; k < this.#loops.length; k++) this.#visit(this.#closes(this.#loops[k] as number));
    this.#closed ??= this.#solve();
    const open = this.#rows.get(i) as Float64Array;
    const out = open.slice(0, this.#columns);
    this.#closed.forEach((x, m) => add(out, open[this.#columns + m] as number, x));
    return out;
  }

  /** A need of a quantity, moved along one source: its value there. */
  moved(i: number, source: number, by: number): number {
    const d = this.row(i)[source] as number;
    const v = this.#workings.value(i);
    return adds(this.#workings, i) ? v + d * by : v * Math.exp(d * by);
  }

  #closes(i: number): number { return this.#workings.used[i]?.closes ?? -1; }

  #visit(i: number): void {
    if (this.#rows.has(i)) return;
    const w = this.#workings;
    const row = new Float64Array(this.#columns + mostLoops);
    this.#rows.set(i, row);
    if (!w.known(i) || (w.slots[i] as Slot).isWord) return;
    const bound = w.isPinned(i) ? undefined : w.used[i];
    if (bound === undefined) return this.#input(i, row);
    if (bound.closes >= 0) {
      if (this.#loops.length >= mostLoops) return;
      row[this.#columns + this.#loops.push(i) - 1] = 1;
      this.#closed = undefined;
      return;
    }
    // A whole number that the plan decides is what it is.
    if (bound.way.as === 'decided' && Number.isInteger(w.value(i))) return;
    for (const n of bound.needs) this.#visit(n);
    const mine = adds(w, i);
    const x = w.value(i);
    const slope = (up: number, down: number, step: number): number => {
      const d = mine || !(up > 0 && down > 0) ? (up - down) / (mine ? 1 : x) : Math.log(up / down);
      return Number.isFinite(d) ? d / step : 0;
    };
    bound.needs.forEach((n, k) => {
      const from = this.#rows.get(n) as Float64Array;
      if (from.every((d) => d === 0)) return;
      const v = w.value(n);
      const plus = adds(w, n);
      const over = (h: number): number => slope(w.tryWay(i, k, plus ? v + h : v * Math.exp(h)), w.tryWay(i, k, plus ? v - h : v * Math.exp(-h)), 2 * h);
      const h = plus ? small * Math.max(Math.abs(v), 1e-3) : small;
      const near = over(h);
      const wide = Math.hypot(...from.subarray(0, this.#columns));
      const stair = near === 0 || (!mine && !plus && Math.abs(near) > steepest);
      add(row, stair && wide > h ? over(wide) : near, from);
    });
    const half = w.scatterOf(i);
    if (half !== 0) (row[bound.source] as number) += mine ? x * half : Math.log(1 + half);
    for (const [source, up] of w.tryLaws(i)) (row[source] as number) += slope(up, x, 1);
  }

  #input(i: number, row: Float64Array): void {
    const source = this.#workings.inputSource(i);
    if (source < 0) return;
    const { half = 0, relative } = this.#workings.given[i] ?? {};
    const v = this.#workings.value(i);
    if (adds(this.#workings, i)) row[source] = relative === true ? v * half : half;
    else row[source] = relative === true ? Math.log(1 + half) : half < v ? Math.log((v + half) / (v - half)) / 2 : half / v;
  }

  /** Every loop variable x with x = closes(x): the linear system of all loops at once, by Gauss elimination with pivots. */
  #solve(): Float64Array[] {
    const n = this.#loops.length;
    const width = this.#columns;
    const rows: Float64Array[] = this.#loops.map((i, k) => {
      const c = this.#closes(i);
      const from = this.#rows.get(c) as Float64Array;
      // The loop variable and what closes it may be followed in different coordinates.
      const ratio = adds(this.#workings, i) === adds(this.#workings, c) ? 1 : adds(this.#workings, c) ? 1 / this.#workings.value(i) : this.#workings.value(i);
      const a = Float64Array.from({ length: n + width }, (_, j) => (j < n ? (j === k ? 1 : 0) - ratio * (from[width + j] as number) : ratio * (from[j - n] as number)));
      return a;
    });
    for (let c = 0; c < n; c++) {
      let p = c;
      for (let r = c + 1; r < n; r++) if (Math.abs((rows[r] as Float64Array)[c] as number) > Math.abs((rows[p] as Float64Array)[c] as number)) p = r;
      [rows[c], rows[p]] = [rows[p] as Float64Array, rows[c] as Float64Array];
      const pivot = (rows[c] as Float64Array)[c] as number;
      if (pivot === 0) continue;
      scale(rows[c] as Float64Array, 1 / pivot);
      rows.forEach((row, r) => { if (r !== c) add(row, -(row[c] as number), rows[c] as Float64Array); });
    }
    return rows.map((row) => row.slice(n));
  }
}

function add(to: Float64Array, times: number, from: Float64Array): void {
  if (times === 0) return;
  const n = Math.min(to.length, from.length);
  for (let k = 0; k < n; k++) (to[k] as number) += times * (from[k] as number);
}
function scale(row: Float64Array, times: number): void {
  for (let k = 0; k < row.length; k++) (row[k] as number) *= times;
}
