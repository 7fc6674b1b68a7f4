import { generalDefinitions } from '../../src/quantities/index.ts';
import { joinDefinitions, quantity, Workings, type Law } from '../../src/workings/index.ts';

const every = generalDefinitions.flatMap((d) => ('more' in d ? d.more : d.ways));
const known = new Set(generalDefinitions.flatMap((d) => ('more' in d ? [] : [d.id])));
const plain = (id: string): string => id.split('@')[0] as string;
/** Numbers that a case, a flow or a mesh would give, and the words of decisions. */
const numbers = new Set([...every.flatMap((w) => [...w.needs, ...(w.closes === undefined ? [] : [w.closes])]), ...generalDefinitions.map((d) => d.id)].map(plain).filter((id) => !known.has(id)));
const words = new Map<string, Set<string>>();
for (const { when } of every) for (const [id, at] of Object.entries(when ?? {})) if (!known.has(id)) words.set(id, new Set([...(words.get(id) ?? []), ...(typeof at === 'string' ? [at] : at)]));
const nodes = joinDefinitions([
  ...generalDefinitions,
  ...[...numbers].map((id) => quantity(id, { symbol: id, name: id, unit: '1', signed: true })),
  ...[...words].map(([id, list]) => quantity(id, { symbol: '', name: id, unit: 'word', words: [...list] })),
]);

/** The general definitions without any flow, with numbers and words pinned: one formula or a chain of them at a time. */
export function given(values: Readonly<Record<string, number | string>>, laws: Readonly<Record<string, Law>> = {}): Workings {
  const inputs = Object.fromEntries(Object.entries(values).map(([id, value]) => [id, { value }]));
  const workings = new Workings(nodes, inputs, laws);
  for (const id of Object.keys(values)) if (!workings.has(id)) throw new Error(`no quantity ${id}`);
  return workings;
}

/** A number that must be there. */
export function numberOf(values: Readonly<Record<string, number | string>>, id: string): number {
  const value = given(values).get(id);
  if (value === undefined) throw new Error(`${id} cannot be had`);
  return value;
}
