import type { Source, Workings } from './resolve.ts';

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
    if (i === undefined || !workings.known(i)) return [];
    const { node, isWord } = workings.slots[i] as Workings['slots'][number];
    return isWord ? [] : [{ id, i, value: workings.value(i), adds: node.about.signed === true || node.about.unit === 'K', parts: [] as { source: number; d: number }[], jumps: false }];
  });
  const words = computedWords(workings);
  const before = words.map((w) => workings.wordAt(w));
  const active = workings.activeSources(rows.map((r) => r.i));
  active.forEach((s) => {
    const source = workings.sources[s] as Source;
    const reach = workings.reach(s);
    const hit = rows.filter((r) => reach.has(r.i));
    if (hit.length === 0) return;
    const changed = new Set<number>();
    const at = (by: number): (number | undefined)[] => {
      workings.shift(s, by);
      const values = hit.map((r) => (workings.known(r.i) ? workings.value(r.i) : undefined));
      words.forEach((w, k) => { if (reach.has(w) && (!workings.known(w) || workings.wordAt(w) !== before[k])) changed.add(w); });
      return values;
    };
    const up = at(1);
    const down = source.kind === 'input' || changed.size > 0 ? at(-1) : undefined;
    workings.shift(s, 0);
    const jumped = new Set<number>();
    for (const w of changed) for (const f of workings.followers(w)) jumped.add(f);
    hit.forEach((r, k) => {
      const u = up[k];
      const l = down === undefined ? undefined : down[k];
      if (jumped.has(r.i)) r.jumps = true;
      if (u === undefined) return;
      const d = r.adds || r.value <= 0 || u <= 0 || (l !== undefined && l <= 0) ? (l === undefined ? u - r.value : (u - l) / 2) : l === undefined ? Math.log(u / r.value) : Math.log(u / l) / 2;
      if (d !== 0) r.parts.push({ source: s, d });
    });
  });
  const out = new Map<string, Spread>();
  const sampled = rows.filter((r) => r.jumps);
  const percentiles = sampled.length === 0 ? new Map<number, [number, number]>() : sample(workings, sampled.map((r) => r.i), active);
  for (const r of rows) {
    const square = r.parts.reduce((s, p) => s + p.d * p.d, 0);
    if (square === 0 && !r.jumps) continue;
    const w = Math.sqrt(square);
    const adds = r.adds || r.value <= 0;
    const [low, high] = percentiles.get(r.i) ?? (adds ? [r.value - w, r.value + w] : [r.value * Math.exp(-w), r.value * Math.exp(w)]);
    const shares = r.parts
      .map((p) => ({ key: workings.sources[p.source]?.key ?? '', label: workings.sources[p.source]?.label ?? '', share: square === 0 ? 0 : (p.d * p.d) / square }))
      .sort((a, b) => b.share - a.share);
    out.set(r.id, { low, high, shares, how: r.jumps ? 'sampled' : 'derivatives' });
  }
  return out;
}

function computedWords(workings: Workings): number[] {
  return workings.slots.flatMap((slot, i) => (slot.isWord && !workings.isPinned(i) && workings.known(i) ? [i] : []));
}

/** 2.5 and 97.5 % points over all sources at once: Halton points through the normal quantile, half-width = 1.96 sigma. */
function sample(workings: Workings, slots: readonly number[], active: readonly number[]): Map<number, [number, number]> {
  const values = slots.map(() => [] as number[]);
  for (let k = 1; k <= samples; k++) {
    active.forEach((s, d) => workings.shift(s, normalQuantile(halton(k, prime(d))) / 1.959964));
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

const primes = [2];
function prime(k: number): number {
  for (let c = (primes.at(-1) as number) + 1; primes.length <= k; c++) if (primes.every((p) => c % p !== 0)) primes.push(c);
  return primes[k] as number;
}
/** Radical inverse of k in a base: the Halton sequence (Halton 1960), started past its first points for large bases. */
function halton(k: number, base: number): number {
  let f = 1;
  let r = 0;
  for (let i = k + 19; i > 0; i = Math.floor(i / base)) {
    f /= base;
    r += f * (i % base);
  }
  return r;
}

/**
 * Quantile of the standard normal distribution.
 *
 * @param p  probability, 0 < p < 1
 * @returns  z with P(Z < z) = p, absolute error below 4.5e-4
 * @source   Abramowitz and Stegun, Handbook of Mathematical Functions (1964), 26.2.23
 */
export function normalQuantile(p: number): number {
  const q = p < 0.5 ? p : 1 - p;
  const t = Math.sqrt(-2 * Math.log(Math.max(q, 1e-12)));
  const z = t - (2.515517 + 0.802853 * t + 0.010328 * t * t) / (1 + 1.432788 * t + 0.189269 * t * t + 0.001308 * t ** 3);
  return p < 0.5 ? -z : z;
}
