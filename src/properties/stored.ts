import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import type { Collection, MaterialRecord } from './record.ts';

/** A file of the compiled collection. */
export interface StoredFile {
  readonly file: string;
  readonly text: string;
}

const index = 'index.json';

/**
 * A collection as files: `index.json` with all names, and one file per material, so that a start reads two or three small files.
 *
 * @param collection  the records
 * @returns           file names and contents, in alphabetical order
 */
export function storedMaterials(collection: Collection): StoredFile[] {
  const ids = [...new Set(Object.values(collection.names).map(({ id }) => id))].sort();
  return [{ file: index, text: JSON.stringify(collection.names) }, ...ids.map((id) => ({ file: `${id}.json`, text: JSON.stringify(collection.record(id)) }))];
}

/**
 * Opens a stored collection.
 *
 * @param dir  folder with the files of `storedMaterials`
 * @returns    the collection, its records read when asked for; undefined where the folder has no index
 */
export function openStored(dir: string): Collection | undefined {
  if (!existsSync(join(dir, index))) return undefined;
  const names = JSON.parse(readFileSync(join(dir, index), 'utf8')) as Collection['names'];
  const ids = new Set(Object.values(names).map(({ id }) => id));
  const read = new Map<string, MaterialRecord>();
  return {
    names,
    record(id) {
      if (!ids.has(id)) return undefined;
      const before = read.get(id);
      if (before !== undefined) return before;
      const record = JSON.parse(readFileSync(join(dir, `${id}.json`), 'utf8')) as MaterialRecord;
      read.set(id, record);
      return record;
    },
  };
}
