import type { Workings } from '../workings/index.ts';

/** Which quantities some input of the case would make known, at the words that hold now. */
export type Askable = (id: string) => boolean;

interface Kept { readonly key: string; readonly can: Uint8Array }
const kept = new WeakMap<Workings, Map<Askable, Kept>>();

/**
 * Whether a quantity that is not known could be given by an input; as `missing` of the workings finds it, for all quantities at once.
 *
 * @param workings  the graph
 * @param canAsk    whether the user can give a number at a path
 * @returns         the answer by id; it holds until a word or what is given changes
 */
export function askableNow(workings: Workings, canAsk: Askable): Askable {
  const key = stateOf(workings);
  const mine = kept.get(workings) ?? new Map<Askable, Kept>();
  kept.set(workings, mine);
  let found = mine.get(canAsk);
  if (found?.key !== key) {
    found = { key, can: reachable(workings, canAsk) };
    mine.set(canAsk, found);
  }
  const { can } = found;
  return (id) => can[workings.index.get(id) ?? -1] === 1;
}

/** The words that hold and what is pinned: all that the answer depends on. */
function stateOf(workings: Workings): string {
  let pinned = 0;
  const words: string[] = [];
  workings.slots.forEach((slot, i) => {
    if (workings.isPinned(i)) pinned = (Math.imul(pinned, 31) + i) | 0;
    if (slot.isWord) words.push(workings.known(i) ? (workings.wordAt(i) as string) : '');
  });
  return `${pinned} ${words.join(' ')}`;
}

/** 1 where inputs that can be asked for would make the quantity known, and what is given does not. */
function reachable(workings: Workings, canAsk: Askable): Uint8Array {
  const open = (b: Workings['slots'][number]['ways'][number]): boolean => b.when.every((w) => !workings.known(w.slot) || w.words.includes(workings.wordAt(w.slot) as string));
  const given = workings.reachable(undefined, open);
  const asked = workings.reachable((slot) => slot.ways.length === 0 && canAsk(slot.id), open);
  return asked.map((can, i) => (can === 1 && given[i] === 0 ? 1 : 0));
}
