import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import type { Collection, MaterialRecord, NamedMaterial } from './record.ts';

/** A file of the compiled collection. */
export interface StoredFile {
  readonly file: string;
  readonly text: string;
}

/** One line of the index: what names stand for, and the names. Few lines and short ones, as every start reads them all. */
type StoredNames = readonly [named: NamedMaterial, ...names: string[]];

const index = 'index.json';

/**
 * A collection as files: `index.json` with all names, and one file per material, so that a start reads two or three small files.
 *
 * @param collection  the records
 * @returns           file names and contents, in alphabetical order
 */
export function storedMaterials(collection: Collection): StoredFile[] {
  const lines = new Map<string, [NamedMaterial, ...string[]]>();
  for (const [name, named] of Object.entries(collection.names)) {
    const key = JSON.stringify(named);
    const line = lines.get(key);
    if (line === undefined) lines.set(key, [named, name]);
    else line.push(name);
  }
  const ids = [...new Set(Object.values(collection.names).map(({ id }) => id))].sort();
  return [{ file: index, text: JSON.stringify([...lines.values()]) }, ...ids.map((id) => ({ file: `${id}.json`, text: JSON.stringify(collection.record(id)) }))];
}

/**
 * Opens a stored collection.
 *
 * @param dir  folder with the files of `storedMaterials`
 * @returns    the collection, its records read when asked for; undefined where the folder has no index
 */
export function openStored(dir: string): Collection | undefined {
  if (!existsSync(join(dir, index))) return undefined;
  const lines = JSON.parse(readFileSync(join(dir, index), 'utf8')) as StoredNames[];
  const names: { [plainName: string]: NamedMaterial } = {};
  for (const [named, ...all] of lines) for (const name of all) names[name] = named;
  const read = new Map<string, MaterialRecord>();
  return {
    names,
    record(id) {
      const before = read.get(id);
      if (before !== undefined) return before;
      if (!lines.some(([named]) => named.id === id)) return undefined;
      const record = JSON.parse(readFileSync(join(dir, `${id}.json`), 'utf8')) as MaterialRecord;
      read.set(id, record);
      return record;
    },
  };
}
