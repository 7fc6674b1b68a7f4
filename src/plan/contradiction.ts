import type { Ground } from './ground.ts';
import type { Contradiction } from './types.ts';

/**
 * A contradiction at the place of its path, or of the nearest entry that the case holds.
 *
 * @param on     the ground of the plan
 * @param code   its name
 * @param path   path of the case it stands at
 * @param words  what is said, what it does to the result, what mends it
 */
export function contradiction(on: Ground, code: string, path: string, words: { readonly says: string; readonly effect: string; readonly cure: string }): Contradiction {
  const { case: given } = on.assembled;
  const target = given.targets.find((t) => t.path === path);
  const at = given.get(path) ?? target ?? [...given.entries.values()].find((e) => e.path.startsWith(`${path}.`));
  return { code, path, ...(at === undefined ? {} : { line: at.position.line }), ...words };
}

/**
 * What a number would be if the case did not state it.
 *
 * @param on    the ground of the plan; its graph stands as before afterwards
 * @param path  path that is taken away
 * @param id    number asked for
 */
export function without(on: Ground, path: string, id: string): number | undefined {
  const { workings } = on.assembled;
  const value = workings.get(path);
  if (value === undefined) return workings.get(id);
  workings.set(path, undefined);
  const out = workings.get(id);
  workings.set(path, value);
  return out;
}
