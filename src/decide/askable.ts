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
  return (id) => {
    const i = workings.index.get(id) ?? -1;
    return can[i] === 1 && !workings.known(i);
  };
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

/** 1 where what is given and inputs that can be asked for would together make the quantity known. */
function reachable(workings: Workings, canAsk: Askable): Uint8Array {
  const open = (b: Workings['slots'][number]['ways'][number]): boolean => b.when.every((w) => !workings.known(w.slot) || w.words.includes(workings.wordAt(w.slot) as string));
  return workings.reachable((slot) => slot.ways.length === 0 && canAsk(slot.id), open);
}
