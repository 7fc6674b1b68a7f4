import type { Collection, MaterialRecord, NamedMaterial } from './record.ts';

/**
 * A name as it is compared: lower case, single spaces for spaces, hyphens and underscores.
 *
 * @param name  as written
 * @returns     the plain form
 */
export const plainName = (name: string): string => name.trim().toLowerCase().replaceAll(/[\s_-]+/g, ' ');

/**
 * Names of one record.
 *
 * @param record  the record
 * @returns       plain name to what it stands for
 */
function namesOf(record: MaterialRecord): { [plain: string]: NamedMaterial } {
  const { id, name } = record;
  const names: { [plain: string]: NamedMaterial } = {};
  for (const one of [id, name, ...record.aliases]) names[plainName(one)] = { id, name };
  for (const [one, asked] of Object.entries(record.phaseNames)) names[plainName(one)] = { id, name, asked };
  return names;
}

/** Formulas: of one record, or of several that share it and are told apart by name. A name goes before a formula. */
function formulasOf(records: readonly MaterialRecord[]): { [plain: string]: NamedMaterial } {
  const found: { [plain: string]: NamedMaterial } = {};
  for (const { id, name, formula } of records) {
    if (formula === undefined) continue;
    const plain = plainName(formula);
    const before = found[plain];
    found[plain] = before === undefined ? { id, name } : { ...before, among: [...(before.among ?? [before.name]), name] };
  }
  return found;
}

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
  const names = { ...formulasOf(records), ...Object.fromEntries(below), ...Object.assign({}, ...records.map(namesOf)) as Collection['names'] };
  return { names, find: (name) => (Object.hasOwn(names, name) ? names[name] : undefined), record: (id) => byId.get(id) ?? under?.record(id) };
}
