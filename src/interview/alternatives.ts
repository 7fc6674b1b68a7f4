import { vocabulary } from '../assemble/index.ts';
import { own } from '../case/index.ts';
import type { Workings } from '../workings/index.ts';
import type { View } from './view.ts';

/** Keys of a wall of which one decides its heat; none outside walls. */
export function heatKeys(): readonly string[] {
  const field = own(vocabulary.keys, 'wall');
  return (field?.kind === 'map' ? field.alternatives : undefined)?.find((group) => group.includes('temperature')) ?? [];
}

const split = (path: string): readonly [string, string] => [path.slice(0, path.lastIndexOf('.')), path.slice(path.lastIndexOf('.') + 1)];
const ofWall = (path: string): boolean => /^walls?(\.|$)/.test(path) && heatKeys().includes(split(path)[1]);

/**
 * Paths that serve as well as one: the other ways to state the heat of a wall, or to what the path alone gives.
 *
 * @param view  the answers so far
 * @param path  a path of the case
 * @returns     the path, then the others
 */
export function alternatives(view: View, path: string): readonly string[] {
  if (ofWall(path)) return [path, ...heatKeys().map((key) => `${split(path)[0]}.${key}`).filter((other) => other !== path)];
  for (const { slot, known } of alone(view.settled.assembled.workings, path)) {
    if (known) continue;
    const groups = view.inputs(slot);
    const group = groups?.length === 1 ? (groups[0] as string).split('|') : [];
    if (group.includes(path)) return [path, ...group.filter((other) => other !== path && akin(path, other))];
  }
  return [path];
}

/** Whether two paths stand in one section, where they state one thing; two sizes never do. */
const akin = (a: string, b: string): boolean => section(a) === section(b) && section(a) !== 'sizes';
const section = (path: string): string => path.split('.')[0] as string;

/** Whether what a path gives is there already, by another path that the user stated. */
export function served(view: View, path: string): boolean {
  const { workings, case: on } = view.settled.assembled;
  if (ofWall(path)) return heatKeys().some((key) => on.has(`${split(path)[0]}.${key}`) || on.has(`wall.${key}`));
  return [...alone(workings, path)].some(({ known, by }) => known && by.length > 0 && by.every((id) => !isLeaf(workings, id) || on.has(id)));
}

/** Quantities that a path alone gives, and what they were got from. */
function* alone(workings: Workings, path: string): Generator<{ slot: string; known: boolean; by: readonly string[] }> {
  const i = workings.index.get(path);
  if (i === undefined) return;
  for (const [k, slot] of workings.slots.entries()) {
    if (!slot.ways.some((b) => b.needs.length === 1 && b.needs[0] === i)) continue;
    const known = workings.known(k);
    yield { slot: slot.id, known, by: known ? (workings.used[k]?.ids ?? []) : [] };
  }
}

const isLeaf = (workings: Workings, id: string): boolean => workings.slots[workings.index.get(id) ?? -1]?.ways.length === 0;
