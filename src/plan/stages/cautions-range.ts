import { flagsIn } from '../../workings/index.ts';
import type { Ground } from '../ground.ts';
import { authors, capital, inWords, listed, nameOf } from '../say.ts';

/** A law used outside its range on the way to a target or a decision. */
export interface Stretched {
  readonly id: string;
  readonly name: string;
  readonly text: string;
}

const kept = new WeakMap<Ground, readonly Stretched[]>();

/**
 * Laws carried beyond their range, with range and value, those on the way to a target first.
 *
 * @param on  the ground of the plan
 * @returns   each stretched quantity once
 */
export function outsideOf(on: Ground): readonly Stretched[] {
  const had = kept.get(on);
  if (had !== undefined) return had;
  const { workings, targets } = on.assembled;
  const flags = flagsIn(workings);
  const users = new Map<string, string[]>();
  const use = (id: string, who: string): void => { for (const f of flags(id)) users.set(f, [...(users.get(f) ?? []), who]); };
  for (const t of targets) if (t.computed) use(t.quantity, `the target ${nameOf(on, t.quantity)}`);
  for (const e of on.decisions.effects) if (e.deciding !== undefined && e.applies !== false) use(e.deciding.quantity, `the decision on ${e.id}`);
  const out = [...users].flatMap(([id, who]): Stretched[] => {
    const i = workings.index.get(id) ?? -1;
    const way = workings.used[i]?.way;
    const left = workings.outside(i).map(({ need, value, range }) => `${nameOf(on, need)} is ${inWords(on, need, value)} where it holds from ${inWords(on, need, range[0])} to ${inWords(on, need, range[1])}`);
    if (way === undefined || left.length === 0) return [];
    const name = nameOf(on, id);
    return [{ id, name, text: `The ${name}, {${id}}, comes from a law outside its range (${authors(way.source)}): ${listed(left)}; its scatter is doubled. ${capital(listed([...new Set(who)].slice(0, 4)))}${who.length > 4 ? ' and others' : ''} rest${new Set(who).size === 1 ? 's' : ''} on it.` }];
  });
  kept.set(on, out);
  return out;
}
