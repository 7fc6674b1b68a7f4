import type { Ground } from './ground.ts';
import type { Contradiction } from './types.ts';

/** What the case says that cannot hold together, with what it does to the result and the cure. */
export function contradictionsOf(on: Ground): Contradiction[] {
  void on;
  return [];
}
