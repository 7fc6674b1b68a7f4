import { nearestName, type ProblemData } from '../problems/index.ts';
import { shown } from './leaf.ts';
import { own, type Field, type Vocabulary } from './vocabulary.ts';

const pattern = /^(?!\d+$)[\p{L}\p{N}](?:[\p{L}\p{N} _()+-]{0,58}[\p{L}\p{N}()+-])?$/u;
const forbidden = new Set(['constructor', 'prototype']);

/** What is wrong with a name that becomes part of a path; undefined where nothing is. */
export function nameProblem(name: string, taken: readonly string[]): ProblemData | undefined {
  if (!pattern.test(name) || forbidden.has(name)) return { code: 'wrong-name', message: `"${shown(name)}" cannot be a name`, expected: 'letters, digits, hyphens and spaces, at most 60, not digits alone' };
  return taken.includes(name) ? { code: 'duplicate-name', message: `"${name}" is given twice`, expected: 'each name once' } : undefined;
}

/** The example of a key; walls bear the names of the flow's own, as many as it has. */
export function exampleFor(field: Field, vocabulary: Vocabulary, flow: string | undefined): string {
  if (field.kind !== 'list' || field.names !== 'walls' || flow === undefined || own(vocabulary.flows, flow) === undefined) return field.example;
  const walls = wallNames(vocabulary, flow);
  const items = (field.example.match(/\{[^{}]*\}/g) ?? []).slice(0, walls.length);
  return `[${items.map((item, k) => item.replace(/name: [^,}]+/, `name: ${walls[k] ?? ''}`)).join(', ')}]`;
}

/** Names that an item of `walls` may have with this flow: its walls and the groups that stand for several of them. */
export function wallNames(vocabulary: Vocabulary, flow: string): readonly string[] {
  const known = own(vocabulary.flows, flow)?.walls ?? [];
  const walls = known.length === 0 ? ['wall'] : known;
  const groups = Object.keys(vocabulary.wallGroups).filter((group) => vocabulary.wallGroups[group]?.some((member) => walls.includes(member)));
  return [...new Set([...walls, ...groups])];
}

/** The problem of a wall that the flow does not have. */
export function wallProblem(vocabulary: Vocabulary, flow: string, name: string): ProblemData | undefined {
  const valid = wallNames(vocabulary, flow);
  if (valid.includes(name)) return undefined;
  const nearest = nearestName(name, valid);
  return { code: 'unknown-wall', message: `"${shown(name)}" is not a wall of ${flow}`, expected: valid.join(', '), ...(nearest === undefined ? {} : { nearest }) };
}
