import { adds, Linear } from './linear.ts';
import type { Workings } from './resolve.ts';
import type { Bound, Slot } from './slot.ts';

/** Spread of one number: 95 % bounds, and what share each source has of its square, largest first. */
export interface Spread {
  readonly low: number;
  readonly high: number;
  readonly shares: readonly { readonly key: string; readonly label: string; readonly share: number }[];
  readonly how: 'derivatives' | 'sampled';
}
/** Words that follow from the numbers (verdicts, choices), settled again at a point of a sweep. */
export type Settle = (workings: Workings) => void;

const samples = 96;

/**
 * Spreads of quantities from inputs, property uncertainty and scatter, by first derivatives over the half-widths; sampled where a word on the way changes.
 *
 * @param workings  the graph at its nominal point
 * @param ids       quantities asked for
 * @returns         spreads by id; a quantity without any source of spread is left out
 */
export function spreads(workings: Workings, ids: readonly string[]): Map<string, Spread> {
  const rows = ids.flatMap((id) => {
    const i = workings.index.get(id);
    return i === undefined || !workings.known(i) || (workings.slots[i] as Slot).isWord ? [] : [{ id, i }];
  });
  const linear = linearOf(workings);
  const jumps = jumpedWords(workings, linear, rows.map((r) => r.i));
  const sampled = rows.filter((r) => jumps.has(r.i));
  const percentiles = sampled.length === 0 ? new Map<number, [number, number]>() : sample(workings, sampled.map((r) => r.i), activeSources(linear, sampled.map((r) => r.i)));
  const out = new Map<string, Spread>();
  for (const { id, i } of rows) {
    const { at, by } = linear.row(i);
    const square = by.reduce((sum, d) => sum + d * d, 0);
    const jump = percentiles.get(i);
    if (square === 0 && jump === undefined) continue;
    const w = Math.sqrt(square);
    const value = workings.value(i);
    const [low, high] = jump ?? (adds(workings, i) ? [value - w, value + w] : [value * Math.exp(-w), value * Math.exp(w)]);
    out.set(id, {
      low, high, how: jump === undefined ? 'derivatives' : 'sampled',
      get shares() { return sharesOf(workings, at, by, square); }, // asked for a few quantities only
    });
  }
  return out;
}

/**
 * How a quantity follows each law of the fluid, all places of the law moved together: its exponent d ln x/d ln law, or, where the quantity adds
 * (a temperature, a number of either sign), its change dx/d ln law.
 *
 * @param workings  the graph at its nominal point
 * @param id        the quantity
 * @returns         by name of the law; laws that do not move it, or whose uncertainty is nothing, are left out
 */
export function followsLaws(workings: Workings, id: string): Map<string, number> {
  const i = workings.index.get(id);
  if (i === undefined || !workings.known(i) || (workings.slots[i] as Slot).isWord) return new Map();
  const { at, by } = linearOf(workings).row(i);
  return new Map(at.flatMap((source, k) => {
    const half = workings.lawHalf(source);
    const d = by[k] as number;
    return half === undefined || half === 0 || d === 0 ? [] : [[workings.sources[source]?.key ?? '', d / Math.log(1 + half)] as const];
  }));
}

function sharesOf(workings: Workings, at: readonly number[], by: readonly number[], square: number): Spread['shares'] {
  const all = at.flatMap((source, k) => {
    const { key = '', label = '' } = workings.sources[source] ?? {};
    const d = by[k] as number;
    return d === 0 ? [] : [{ source, key, label, share: square === 0 ? 0 : (d * d) / square }];
  });
  return all.sort((x, y) => y.share - x.share || x.source - y.source).map(({ key, label, share }) => ({ key, label, share }));
}

const kept = new WeakMap<Workings, { version: number; linear: Linear }>();

/** The derivatives at the point where the graph stands, kept until it moves. */
function linearOf(workings: Workings): Linear {
  const had = kept.get(workings);
  if (had !== undefined && had.version === workings.version) return had.linear;
  const linear = new Linear(workings);
  kept.set(workings, { version: workings.version, linear });
  return linear;
}

/** Sources that move any of the quantities. */
function activeSources(linear: Linear, slots: readonly number[]): number[] {
  const found = new Set<number>();
  for (const i of slots) {
    const { at, by } = linear.row(i);
    at.forEach((s, k) => { if (by[k] !== 0) found.add(s); });
  }
  return [...found].sort((a, b) => a - b);
}

/** Quantities on whose way a word changes within the half-width of one source. */
function jumpedWords(workings: Workings, linear: Linear, wanted: readonly number[]): Set<number> {
  const seen = new Set<number>();
  const words: number[] = [];
  const visit = (i: number): void => {
    if (seen.has(i) || !workings.known(i)) return;
    seen.add(i);
    const b = workings.isPinned(i) ? undefined : workings.used[i];
    if (b === undefined) return;
    if ((workings.slots[i] as Slot).isWord) words.push(i);
    for (const w of b.when) visit(w.slot);
    for (const n of b.needs) visit(n);
    if (b.closes >= 0) visit(b.closes);
  };
  for (const i of wanted) visit(i);
  const out = new Set<number>();
  for (const i of words) {
    const b = workings.used[i] as Bound;
    const numbers = [...b.needs].filter((n) => !(workings.slots[n] as Slot).isWord);
    const changes = activeSources(linear, numbers).some((s) => [1, -1].some((by) => {
      const of = Object.fromEntries(b.way.needs.map((name, k) => [name, linear.moved(b.needs[k] as number, s, by)]));
      return b.way.word?.(of) !== workings.wordAt(i);
    }));
    if (changes) for (const f of workings.followers(i)) out.add(f);
  }
  return out;
}

/** 2.5 and 97.5 % points over all sources at once, half-width = 1.96 sigma. A source moves in its own order whoever asks, so a number has one spread. */
function sample(workings: Workings, slots: readonly number[], active: readonly number[]): Map<number, [number, number]> {
  const values = slots.map(() => [] as number[]);
  for (let k = 0; k < samples; k++) {
    for (const s of active) workings.shift(s, drawsOf(s)[k] as number);
    slots.forEach((i, j) => { if (workings.known(i)) values[j]?.push(workings.value(i)); });
  }
  for (const s of active) workings.shift(s, 0);
  return new Map(slots.map((i, j) => {
    const sorted = (values[j] as number[]).sort((a, b) => a - b);
    const nominal = workings.known(i) ? workings.value(i) : Number.NaN;
    const at = (q: number): number => sorted[Math.min(sorted.length - 1, Math.max(0, Math.round(q * (sorted.length - 1))))] ?? nominal;
    return [i, [Math.min(at(0.025), nominal), Math.max(at(0.975), nominal)]];
  }));
}

const drawn: (readonly number[])[] = [];
/** Shifts of one source in half-widths: the middles of equal shares of the normal distribution, in an order of the source's own (Latin hypercube, McKay, Beckman and Conover 1979). */
function drawsOf(source: number): readonly number[] {
  return (drawn[source] ??= shuffled(Array.from({ length: samples }, (_, k) => normalQuantile((k + 0.5) / samples) / 1.959964), source + 1));
}

/** An order that depends on the seed alone: Fisher and Yates with a linear congruence (Park and Miller 1988). */
function shuffled(values: number[], seed: number): number[] {
  let state = (seed * 7919) % 2147483647;
  for (let k = values.length - 1; k > 0; k--) {
    state = (state * 48271) % 2147483647;
    const j = Math.floor((state / 2147483647) * (k + 1));
    [values[k], values[j]] = [values[j] as number, values[k] as number];
  }
  return values;
}

/**
 * Quantile of the standard normal distribution.
 *
 * @param p  probability, 0 < p < 1
 * @returns  z with P(Z < z) = p, absolute error below 4.5e-4
 * @source   Abramowitz and Stegun, Handbook of Mathematical Functions (1964), 26.2.23
 */
function normalQuantile(p: number): number {
  const q = p < 0.5 ? p : 1 - p;
  const t = Math.sqrt(-2 * Math.log(Math.max(q, 1e-12)));
  const z = t - (2.515517 + 0.802853 * t + 0.010328 * t * t) / (1 + 1.432788 * t + 0.189269 * t * t + 0.001308 * t ** 3);
  return p < 0.5 ? -z : z;
}
