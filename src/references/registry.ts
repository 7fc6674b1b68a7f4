import { nearestName, Problem } from '../problems/index.ts';
import * as all from './all.ts';
import type { Reference } from './define.ts';

/** Every known answer, one export line of all.ts each, by name. */
export const references: readonly Reference[] = Object.values(all).toSorted((a, b) => (a.id < b.id ? -1 : 1));

/**
 * A known answer by its name.
 *
 * @param id  name of the reference
 * @returns   the reference
 * @throws    {Problem} unknown-reference, with the nearest name
 */
export function findReference(id: string): Reference {
  const found = references.find((ref) => ref.id === id);
  if (found) return found;
  const names = references.map((ref) => ref.id);
  const nearest = nearestName(id, names);
  throw new Problem({ code: 'unknown-reference', message: `"${id}" is no known reference`, expected: `one of ${names.join(', ')}`, ...(nearest === undefined ? {} : { nearest }) });
}
