import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import type { Collection, MaterialRecord, NamedMaterial } from './record.ts';

/** A file of the compiled collection. */
export interface StoredFile {
  readonly file: string;
  readonly text: string;
}

/** One line of the index: what names stand for, and the names. A start looks for one line and reads no other. */
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
  return [{ file: index, text: `[\n${[...lines.values()].map((line) => JSON.stringify(line)).join(',\n')}\n]` }, ...ids.map((id) => ({ file: `${id}.json`, text: JSON.stringify(collection.record(id)) }))];
}

/**
 * Opens a stored collection.
 *
 * @param dir  folder with the files of `storedMaterials`
 * @returns    the collection, its records read when asked for; undefined where the folder has no index
 */
export function openStored(dir: string): Collection | undefined {
  if (!existsSync(join(dir, index))) return undefined;
  const text = readFileSync(join(dir, index), 'utf8');
  let all: Collection['names'] | undefined;
  const read = new Map<string, MaterialRecord>();
  return {
    get names() { return (all ??= namesIn(text)); },
    find: (name) => lineWith(text, name, (line) => line.slice(1).includes(name))?.[0],
    record(id) {
      const before = read.get(id);
      if (before !== undefined) return before;
      if (lineWith(text, id, ([named]) => named.id === id) === undefined) return undefined;
      const record = JSON.parse(readFileSync(join(dir, `${id}.json`), 'utf8')) as MaterialRecord;
      read.set(id, record);
      return record;
    },
  };
}

function namesIn(text: string): Collection['names'] {
  const names: { [plainName: string]: NamedMaterial } = {};
  for (const [named, ...all] of JSON.parse(text) as StoredNames[]) for (const name of all) names[name] = named;
  return names;
}

/** The first line of the index that holds a word in quotes and passes a test. */
function lineWith(text: string, word: string, passes: (line: StoredNames) => boolean): StoredNames | undefined {
  const quoted = JSON.stringify(word);
  for (let at = text.indexOf(quoted); at >= 0;) {
    const end = text.indexOf('\n', at);
    const line = JSON.parse(text.slice(text.lastIndexOf('\n', at) + 1, end).replace(/,$/, '')) as StoredNames;
    if (passes(line)) return line;
    at = text.indexOf(quoted, end);
  }
  return undefined;
}
