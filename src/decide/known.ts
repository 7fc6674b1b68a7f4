import type { Definition } from '../workings/index.ts';
import { choiceIds, effectIds, optionsOf } from './ids.ts';
import { verdicts } from './form.ts';

/** The facts that rules may name: every quantity, and the closed list of each word. */
export interface KnownFacts {
  readonly ids: ReadonlySet<string>;
  readonly words: ReadonlyMap<string, readonly string[]>;
}

/**
 * The facts that definitions give to rules.
 *
 * @param definitions  all definitions, with those of every flow
 * @returns            their ids and the closed lists of the words among them
 */
export function knownFacts(definitions: readonly Definition[]): KnownFacts {
  const words = new Map<string, readonly string[]>();
  const ids = new Set<string>();
  for (const d of definitions) {
    if ('more' in d) continue;
    ids.add(d.id);
    if (d.words !== undefined) words.set(d.id, d.words);
  }
  return { ids, words };
}

/** The closed list of a word of the decisions themselves (`verdict.`, `kept.`, `branch.`, `choice.`); 'any' where the list is open; undefined for other facts. */
export function decisionWords(fact: string, own: readonly string[]): readonly string[] | 'any' | 'unknown' | undefined {
  const [head, ...rest] = fact.split('.');
  const id = rest.join('.');
  if (head === 'choice') return optionsOf(id) ?? (own.includes(id) ? 'any' : 'unknown');
  if (head !== 'verdict' && head !== 'kept' && head !== 'branch') return undefined;
  if (!effectIds.includes(id) && !own.includes(id)) return 'unknown';
  return head === 'verdict' ? verdicts : head === 'kept' ? ['yes', 'no'] : 'any';
}

/** The names a misspelt fact may have meant. */
export const decisionFacts = (own: readonly string[]): string[] => [...[...effectIds, ...own].flatMap((id) => [`verdict.${id}`, `branch.${id}`, `kept.${id}`]), ...choiceIds.map((id) => `choice.${id}`)];
