import type { Workings } from './resolve.ts';

/**
 * The fewest inputs that would make a quantity known. Alternatives that serve alike are joined by `|`.
 *
 * @param workings  the graph
 * @param id        quantity
 * @param askable   whether an input can be given by the user at all; what cannot be given closes its way
 * @returns         inputs, each a path or alternatives joined by `|`; empty where the quantity is known; undefined where no input would help
 */
export function missing(workings: Workings, id: string, askable: (id: string) => boolean): string[] | undefined {
  const memo = new Map<number, string[] | undefined>();
  const asking = new Set<number>();
  const look = (i: number): string[] | undefined => {
    if (workings.known(i)) return [];
    if (memo.has(i)) return memo.get(i);
    if (asking.has(i)) return undefined;
    const slot = workings.slots[i] as Workings['slots'][number];
    if (slot.ways.length === 0) {
      const leaf = askable(slot.id) ? [slot.id] : undefined;
      memo.set(i, leaf);
      return leaf;
    }
    asking.add(i);
    const lists: string[][] = [];
    for (const b of slot.ways) {
      if (b.when.some((w) => workings.known(w.slot) && !w.words.includes(workings.wordAt(w.slot) as string))) continue;
      const parts = [...b.when.map((w) => look(w.slot)), ...Array.from(b.needs, look)];
      if (!parts.includes(undefined)) lists.push([...new Set((parts as string[][]).flat())]);
    }
    asking.delete(i);
    const found = choose(lists);
    if (asking.size === 0 || found !== undefined) memo.set(i, found);
    return found;
  };
  const i = workings.index.get(id);
  return i === undefined ? undefined : look(i);
}

/** The shortest list; where several lists have one input each, these are alternatives. */
function choose(lists: readonly string[][]): string[] | undefined {
  const open = lists.filter((l) => l.length > 0);
  const least = Math.min(...open.map((l) => l.length));
  const shortest = open.filter((l) => l.length === least);
  if (shortest.length === 0) return undefined;
  if (least === 1) return [[...new Set(shortest.flatMap((l) => (l[0] as string).split('|')))].join('|')];
  return shortest[0];
}
