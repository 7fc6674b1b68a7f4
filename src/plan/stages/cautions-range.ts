import { flagsIn, spreads } from '../../workings/index.ts';
import type { Ground } from '../ground.ts';
import { authors, capital, inWords, listed, nameOf } from '../say.ts';

/** A law used outside its range on the way to a target or a decision. */
export interface Stretched {
  readonly id: string;
  readonly name: string;
  readonly text: string;
}

/** Share of the accuracy asked below which a number does not carry a target: that of the rule on prices. */
const little = 0.2;

/** Whether a stretched number carries another: moved by its own spread, it moves that one by more than the least that counts. */
function moves(on: Ground, from: string, to: string, least: number): boolean {
  const { workings } = on.assembled;
  const [here, value] = [workings.get(to), workings.get(from)];
  if (here === undefined || value === undefined || from === to) return true;
  const spread = spreads(workings, [from]).get(from);
  return [spread?.low ?? value / 1.3, spread?.high ?? value * 1.3].some((moved) => Math.abs((workings.aside([[from, moved]], () => workings.get(to)) ?? Number.POSITIVE_INFINITY) - here) > least);
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
  const use = (id: string, who: string, least: number): void => { for (const f of flags(id)) if (moves(on, f, id, least)) users.set(f, [...(users.get(f) ?? []), who]); };
  for (const t of targets) if (t.computed) use(t.quantity, `the target ${nameOf(on, t.quantity)}`, little * (on.number(`${t.id}.accuracy`) ?? 0));
  for (const e of on.decisions.effects) if (e.deciding !== undefined && e.applies !== false) use(e.deciding.quantity, `the decision on ${e.id}`, 0.01 * Math.abs(e.deciding.value));
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
