import type { Case, Entry } from './entry.ts';
import { own, type Vocabulary } from './vocabulary.ts';

/**
 * What the case says of each wall: `wall` speaks of all of them, a group (`sides`) of its members, `walls` of one, key by
 * key. Where the more particular one states one of several alternatives (a temperature, a heat flux, adiabatic), the
 * others of the general one do not count; a list (`layers`) is replaced as a whole.
 *
 * @param caseDoc     the case
 * @param names       walls of the flow; empty for a lone wall, which is called `wall`
 * @param vocabulary  brings the alternatives and the groups
 * @returns           per wall, by key (`temperature`, `layers.0.thickness`), the entry that counts
 */
export function wallEntries(caseDoc: Case, names: readonly string[], vocabulary: Vocabulary): ReadonlyMap<string, ReadonlyMap<string, Entry>> {
  const field = own(vocabulary.keys, 'wall');
  const alternatives = field?.kind === 'map' ? (field.alternatives ?? []) : [];
  return new Map(
    (names.length === 0 ? ['wall'] : names).map((name) => {
      const groups = Object.keys(vocabulary.wallGroups).filter((group) => group !== name && vocabulary.wallGroups[group]?.includes(name));
      const prefixes = ['wall', ...groups.map((group) => `walls.${group}`), `walls.${name}`];
      return [name, prefixes.map((prefix) => under(caseDoc, prefix)).reduce((general, particular) => over(general, particular, alternatives))];
    }),
  );
}

function under(caseDoc: Case, prefix: string): Map<string, Entry> {
  const found = new Map<string, Entry>();
  for (const [path, entry] of caseDoc.entries) if (path.startsWith(`${prefix}.`)) found.set(path.slice(prefix.length + 1), entry);
  return found;
}

function over(general: ReadonlyMap<string, Entry>, particular: ReadonlyMap<string, Entry>, alternatives: readonly (readonly string[])[]): Map<string, Entry> {
  const stated = new Set([...particular].filter(([, entry]) => entry.value !== false).map(([key]) => head(key)));
  const replaced = new Set([...stated, ...alternatives.filter((group) => group.some((key) => stated.has(key))).flat()]);
  return new Map([...[...general].filter(([key]) => !replaced.has(head(key))), ...particular]);
}

const head = (key: string): string => key.split('.')[0] as string;
