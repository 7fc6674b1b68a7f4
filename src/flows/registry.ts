import * as all from './all.ts';
import type { Flow } from './define.ts';

/** Every configuration, in the order of their names. */
export const flows: readonly Flow[] = Object.values(all).toSorted((a, b) => (a.id < b.id ? -1 : 1));

/**
 * The flow of a name.
 *
 * @param id  name as in the case file, such as `packed-bed`
 * @returns   the flow, or undefined where there is none of that name
 */
export function flowById(id: string): Flow | undefined {
  return flows.find((flow) => flow.id === id);
}
