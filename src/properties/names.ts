import type { Collection, MaterialRecord, NamedMaterial } from './record.ts';

/**
 * A name as it is compared: lower case, single spaces for spaces, hyphens and underscores, plain digits for raised and lowered ones.
 *
 * @param name  as written
 * @returns     the plain form
 */
export const plainName = (name: string): string => name.normalize('NFKC').trim().toLowerCase().replaceAll(/[\s_-]+/g, ' ');

/** What of a record bears names. */
export type Named = Pick<MaterialRecord, 'id' | 'name' | 'formula' | 'aliases' | 'sharedNames' | 'phaseNames'>;

/**
 * Names of one record.
 *
 * @param record  the record
 * @returns       plain name to what it stands for
 */
function namesOfOne(record: Named): { [plain: string]: NamedMaterial } {
  const { id, name } = record;
  const names: { [plain: string]: NamedMaterial } = {};
  for (const one of [id, name, ...record.aliases]) names[plainName(one)] = { id, name };
  for (const [one, asked] of Object.entries(record.phaseNames)) names[plainName(one)] = { id, name, asked };
  return names;
}

/** Formulas and shared names: of one record, or of several that are told apart by name. A name of one record goes before. */
function sharedBy(records: readonly Named[]): { [plain: string]: NamedMaterial } {
  const found: { [plain: string]: NamedMaterial } = {};
  const add = (key: string, { id, name }: Named): void => {
    const before = found[key];
    if (before === undefined) found[key] = { id, name };
    else if (!(before.among ?? [before.name]).includes(name)) found[key] = { ...before, among: [...(before.among ?? [before.name]), name] };
  };
  const written = new Map<string, Set<string>>();
  for (const one of records) {
    for (const shared of one.sharedNames ?? []) add(plainName(shared), one);
    if (one.formula === undefined) continue;
    const plain = plainName(one.formula);
    add(plain, one);
    written.set(plain, (written.get(plain) ?? new Set()).add(one.formula));
  }
  // Formulas that differ in case alone stand as they are written as well: CO and Co.
  for (const one of records) if (one.formula !== undefined && (written.get(plainName(one.formula))?.size ?? 0) > 1) add(one.formula, one);
  return found;
}

/**
 * Names, aliases and formulas of records.
 *
 * @param records  what bears names; of two that claim one name the later holds it
 * @returns        plain name to what it stands for
 */
export const namesOf = (records: readonly Named[]): Collection['names'] => Object.assign(sharedBy(records), ...records.map(namesOfOne)) as Collection['names'];

/** What a plain name stands for; words of the language such as `constructor` stand for nothing. */
export const findIn = (names: Collection['names'], name: string): NamedMaterial | undefined => (Object.hasOwn(names, name) ? names[name] : undefined);

/**
 * A collection of records in memory, on top of another one.
 *
 * @param records  the records
 * @param under    the collection whose records these add to or replace
 * @returns        the collection
 */
export function collectionOf(records: readonly MaterialRecord[], under?: Collection): Collection {
  const byId = new Map(records.map((record) => [record.id, record]));
  const below = Object.entries(under?.names ?? {}).filter(([, { id }]) => !byId.has(id));
  const names = { ...Object.fromEntries(below), ...namesOf(records) };
  return { names, find: (name) => findIn(names, name), record: (id) => byId.get(id) ?? under?.record(id) };
}
