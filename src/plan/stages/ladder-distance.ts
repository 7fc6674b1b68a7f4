import { comparedGroups } from '../../flows/index.ts';
import type { RungDetail } from '../../ladder/index.ts';
import { lines, table, type Ground } from '../ground.ts';
import { listed, nameOf } from '../say.ts';
import type { Cell, Line, Table } from '../types.ts';

/** How far the known answers stand from this case in the numbers that matter. */
export function distances(on: Ground, details: readonly RungDetail[]): { readonly lines: Line[]; readonly tables: Table[] } {
  const near = details.filter((d) => on.has(d.distance)).map((d) => ({ d, at: on.number(d.distance) as number })).sort((a, b) => a.at - b.at);
  const first = near[0];
  if (first === undefined) return { lines: lines('None of the rungs has a group in common with this case: its distance from a known answer cannot be given in numbers, and the step from the last rung to the case is an extrapolation.'), tables: [] };
  const groups = comparedGroups(first.d.reference);
  return {
    lines: lines(`Nearest known answer: ${first.d.rung.id}, {${first.d.distance}} away${groups.length === 0 ? '' : ` in ${listed([...new Set(groups.map((g) => nameOf(on, g)))])}`}, which is ${call(first.at)}. ${carried(first.at)}`),
    tables: [table('Distance of the known answers from this case', ['rung', 'distance', 'call it', 'groups compared'], near.slice(0, 5).map(({ d, at }): Cell[] => [d.rung.id, { id: d.distance }, call(at), comparedGroups(d.reference).length === 0 ? 'regime alone' : listed([...new Set(comparedGroups(d.reference))])]))],
  };
}

const call = (distance: number): string => (distance < 0.5 ? 'near' : distance < 1 ? 'fair' : distance <= 2 ? 'far, an extrapolation' : 'no support');

function carried(distance: number): string {
  if (distance < 0.5) return 'What the model misses there counts here as it is.';
  if (distance < 1) return 'What the model misses there counts here one and a half times.';
  return distance <= 2 ? 'What the model misses there counts here twice and more: say that the result is extrapolated, and look for data in between.' : 'It says nothing of the model here: the result is not validated for this case until nearer data are met.';
}
