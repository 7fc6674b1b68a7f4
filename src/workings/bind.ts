import type { Node } from './build.ts';
import type { Law, Laws, When } from './define.ts';
import { unfilled, type Bound, type Given, type Slot, type Source } from './slot.ts';

/** A graph made ready: ids as indices, sources of spread with the slots they act on. */
export interface Bindings {
  readonly slots: readonly Slot[];
  readonly index: ReadonlyMap<string, number>;
  readonly given: readonly (Given | undefined)[];
  readonly sources: readonly Source[];
  /** The slots each source of spread acts on directly. */
  readonly acts: readonly (readonly number[])[];
  /** Source of spread of each input, or -1. */
  readonly inputSource: Int32Array;
  readonly lawSource: ReadonlyMap<string, number>;
  /** 95 % half-width of each source that is a law, relative, as it was last read. */
  readonly lawHalf: Map<number, number>;
}

const never: Bound['when'] = [];

/**
 * Binds nodes, what is given and the laws of properties.
 *
 * @param nodes    quantities with their ways
 * @param given    what the case gives, by id; ids that no node has are passed over
 * @param laws     laws by name; a way that asks for another is left out
 * @param shiftOf  how far a source of spread stands off its nominal point, in half-widths
 * @returns        slots, index, sources
 */
export function bind(nodes: ReadonlyMap<string, Node>, given: Readonly<Record<string, Given>>, laws: Laws, shiftOf: (source: number) => number): Bindings {
  const slots: Slot[] = [];
  const index = new Map<string, number>();
  nodes.forEach((node) => index.set(node.id, slots.push({ id: node.id, node, isWord: node.about.unit === 'word', ways: [] }) - 1));
  const sources: Source[] = [];
  const acts: number[][] = [];
  const sourceOf = new Map<unknown, number>();
  const source = (key: unknown, s: () => Source): number => {
    let i = sourceOf.get(key);
    if (i === undefined) {
      sourceOf.set(key, (i = sources.push(s()) - 1));
      acts.push([]);
    }
    return i;
  };
  const inputSource = new Int32Array(slots.length).fill(-1);
  const givenAt: (Given | undefined)[] = slots.map(() => undefined);
  for (const [id, g] of Object.entries(given)) {
    const i = index.get(id);
    if (i === undefined) continue;
    givenAt[i] = g;
    if (g.half === undefined || !(g.half > 0)) continue;
    const s = source(id, () => ({ key: id, label: id, kind: 'input' }));
    inputSource[i] = s;
    acts[s]?.push(i);
  }
  const lawSource = new Map<string, number>();
  const lawHalf = new Map<number, number>();
  const shifted: Record<string, Law> = {};
  for (const [name, law] of Object.entries(laws)) {
    const i = source(`law ${name}`, () => ({ key: name, label: name, kind: 'property' }));
    lawSource.set(name, i);
    const moved = (t: number, p: number): number => {
      const s = shiftOf(i);
      if (s === 0) return law(t, p);
      const half = law.uncertainty(t, p);
      lawHalf.set(i, half);
      return law(t, p) * (1 + half) ** s;
    };
    shifted[name] = Object.assign(moved, { uncertainty: law.uncertainty });
  }
  const at = (id: string): number => index.get(id) as number;
  const conditions = (when: When | undefined): Bound['when'] => (when === undefined ? never : Object.entries(when).map(([id, words]) => ({ slot: at(id), words: typeof words === 'string' ? [words] : words })));
  slots.forEach((slot, i) => {
    for (const { way, needs, when, closes } of slot.node.ways) {
      if (way.laws?.some((l) => laws[l] === undefined) === true) continue;
      const own = way.scatter === undefined ? -1 : source(way.together ?? way, () => ({ key: way.together ?? `${slot.id}: ${way.formula}`, label: way.source, kind: 'scatter' }));
      if (own >= 0) acts[own]?.push(i);
      for (const l of way.laws ?? []) acts[lawSource.get(l) as number]?.push(i);
      slot.ways.push({
        way, ids: needs, needs: needs.map(at), when: conditions(when), closes: closes === undefined ? -1 : at(closes),
        of: unfilled, laws: shifted, source: own,
      });
    }
  });
  return { slots, index, given: givenAt, sources, acts, inputSource, lawSource, lawHalf };
}
