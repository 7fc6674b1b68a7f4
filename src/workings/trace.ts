import type { Kind } from './define.ts';
import type { Workings } from './resolve.ts';
import { ownScatter } from './slot.ts';
import type { OutOfRange } from './way-range.ts';

/** One step of the way back from a number to the inputs. */
export interface Step {
  readonly id: string;
  readonly symbol: string;
  readonly name: string;
  readonly unit: string;
  readonly value: number | string;
  readonly kind: Kind;
  readonly formula: string;
  readonly source: string;
  readonly needs: readonly string[];
  /** Words that selected the way. */
  readonly when: readonly { readonly id: string; readonly word: string }[];
  /** Where the formula holds, by need. */
  readonly ranges?: readonly { readonly need: string; readonly range: readonly [number, number] }[];
  /** 95 % half-width of the logarithm that the formula itself brings. */
  readonly scatter?: number;
  readonly outside: readonly OutOfRange[];
  readonly loop?: { readonly passes: number; readonly change: number };
  readonly note?: string;
  /** The place whose value a plain id is. */
  readonly at?: string;
}

/** The step by which one quantity was got, or undefined where it cannot be had. */
export function stepOf(workings: Workings, id: string): Step | undefined {
  const i = workings.index.get(id);
  if (i === undefined || !workings.known(i)) return undefined;
  const { node, isWord } = workings.slots[i] as Workings['slots'][number];
  const bound = workings.used[i];
  const given = workings.given[i];
  const ranges = bound?.way.needs.flatMap((name, k) => { const range = bound.way.range?.[name]; return range === undefined ? [] : [{ need: bound.ids[k] as string, range }]; }) ?? [];
  const scatter = bound === undefined ? undefined : ownScatter(bound);
  const loop = bound !== undefined && bound.closes >= 0 ? workings.closed.get(i) : undefined;
  return {
    id,
    symbol: bound?.way.symbol ?? node.about.symbol,
    name: node.about.name,
    unit: node.about.unit,
    value: isWord ? (workings.wordAt(i) as string) : workings.value(i),
    kind: bound === undefined ? (given?.kind ?? (given !== undefined ? 'given' : node.about.set === undefined ? 'decided' : 'computed')) : (bound.way.as ?? 'computed'),
    formula: bound?.way.formula ?? (given === undefined ? (node.about.set?.formula ?? 'decided') : given.kind === 'assumed' ? 'assumed' : 'given'),
    source: bound?.way.source ?? (given === undefined ? node.about.set?.source : undefined) ?? 'the case',
    needs: bound === undefined ? [] : bound.closes < 0 ? bound.ids : [...bound.ids, (workings.slots[bound.closes] as Workings['slots'][number]).id], // a loop rests on what closes it
    when: (bound?.when ?? []).map((w) => ({ id: (workings.slots[w.slot] as Workings['slots'][number]).id, word: workings.wordAt(w.slot) ?? '' })),
    ...(ranges.length === 0 ? {} : { ranges }),
    ...(scatter === undefined ? {} : { scatter }),
    outside: workings.outside(i),
    ...(loop === undefined ? {} : { loop }),
    ...(bound?.way.note === undefined ? {} : { note: bound.way.note }),
    ...(node.at === undefined || bound === undefined ? {} : { at: node.at }),
  };
}

/**
 * The way back from a quantity to the inputs, each step once, inputs first.
 *
 * @param workings  the resolved graph
 * @param id        quantity
 * @returns         steps; empty where the quantity cannot be had
 */
export function trace(workings: Workings, id: string): Step[] {
  const seen = new Set<string>();
  const steps: Step[] = [];
  const visit = (at: string): void => {
    if (seen.has(at)) return;
    seen.add(at);
    const step = stepOf(workings, at);
    if (step === undefined) return;
    for (const w of step.when) visit(w.id);
    for (const n of step.needs) visit(n);
    steps.push(step);
  };
  visit(id);
  return steps;
}

/**
 * Ids of the quantities out of range on the way to a quantity: the flag travels with every number that used one.
 *
 * @param workings  the graph at one point
 * @returns         a reader of flags by id, each quantity looked at once
 */
export function flagsIn(workings: Workings): (id: string) => readonly string[] {
  const memo = new Map<number, readonly string[]>();
  const look = (i: number): readonly string[] => {
    const had = memo.get(i);
    if (had !== undefined) return had;
    memo.set(i, []);
    if (!workings.known(i)) return [];
    const bound = workings.used[i];
    const found = new Set<string>();
    for (const w of bound?.when ?? []) for (const id of look(w.slot)) found.add(id);
    for (const n of bound?.needs ?? []) for (const id of look(n)) found.add(id);
    if (workings.outside(i).length > 0) found.add((workings.slots[i] as Workings['slots'][number]).id);
    const out = [...found];
    memo.set(i, out);
    return out;
  };
  return (id) => {
    const i = workings.index.get(id);
    return i === undefined ? [] : look(i);
  };
}
