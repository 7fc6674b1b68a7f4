import { choiceContradictions } from './contradictions-choices.ts';
import { inputContradictions } from './contradictions-inputs.ts';
import { phaseContradictions } from './contradictions-phase.ts';
import { speciesContradictions } from './contradictions-species.ts';
import type { Ground } from './ground.ts';
import type { Contradiction } from './types.ts';

/**
 * What the case says that cannot hold together, with what it does to the result and the cure.
 *
 * @param on  the ground of the plan
 * @returns   each once, what no number survives first, then in the order of the lines of the case; those without a line last
 */
export function contradictionsOf(on: Ground): Contradiction[] {
  const found = [...inputContradictions(on), ...speciesContradictions(on), ...choiceContradictions(on)];
  const line = (c: Contradiction): number => c.line ?? Number.POSITIVE_INFINITY;
  return [...phaseContradictions(on), ...found.map((c, k) => ({ c, k })).sort((a, b) => (line(a.c) === line(b.c) ? a.k - b.k : line(a.c) - line(b.c))).map(({ c }) => c)];
}
