import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { nearestName, Problem } from '../problems/index.ts';
import { compileMaterials } from './compile.ts';
import { materialOf, type Material } from './material.ts';
import type { Side } from './models/point.ts';
import type { Collection, MaterialRecord } from './record.ts';

let shipped: Collection | undefined;

/**
 * The records that come with the program: the compiled file beside it, or the folder of records in a source tree.
 *
 * @returns  the collection, read once
 * @throws   {Problem} missing-folder
 */
export function shippedMaterials(): Collection {
  if (shipped !== undefined) return shipped;
  const here = fileURLToPath(new URL('.', import.meta.url));
  const compiled = join(here, 'materials.json');
  shipped = existsSync(compiled) ? (JSON.parse(readFileSync(compiled, 'utf8')) as Collection) : compileMaterials(join(here, '../../materials'));
  return shipped;
}

/**
 * The shipped records with those of a folder of the user's added; a record of the same name takes the place of ours.
 *
 * @param dir  folder with one YAML file per material
 * @returns    the joined collection
 * @throws     {Problem} every fault in the user's files, with file, line and column
 */
export function withMaterialsFrom(dir: string): Collection {
  return { materials: { ...shippedMaterials().materials, ...compileMaterials(dir).materials } };
}

interface Named {
  readonly record: MaterialRecord;
  readonly asked?: Side;
}

const plain = (name: string): string => name.trim().toLowerCase().replaceAll(/[\s_-]+/g, ' ');

function namesOf(collection: Collection): Map<string, Named> {
  const names = new Map<string, Named>();
  for (const record of Object.values(collection.materials)) {
    for (const name of [record.id, record.name, ...record.aliases, ...(record.formula === undefined ? [] : [record.formula])]) names.set(plain(name), { record });
    for (const [name, asked] of Object.entries(record.phaseNames)) names.set(plain(name), { record, asked });
  }
  return names;
}

const ready = new WeakMap<Collection, Map<string, Material>>();

/**
 * A material by name, alias or formula; case, spaces and hyphens do not matter.
 *
 * @param name        what was written, such as `water`, `H2O`, `steam`
 * @param collection  where to look; the shipped records unless given
 * @returns           the material, the same one for the same name
 * @throws            {Problem} unknown-material with the nearest name, ambiguous-material with the candidates
 */
export function loadMaterial(name: string, collection: Collection = shippedMaterials()): Material {
  const known = ready.get(collection) ?? new Map<string, Material>();
  ready.set(collection, known);
  const key = plain(name);
  const before = known.get(key);
  if (before !== undefined) return before;
  const names = namesOf(collection);
  const found = names.get(key);
  if (found === undefined) throw unknown(name, key, names);
  const material = materialOf(found.record, collection, found.asked);
  known.set(key, material);
  return material;
}

/**
 * Names of all materials of a collection.
 *
 * @param collection  the shipped records unless given
 * @returns           names in alphabetical order
 */
export function materialNames(collection: Collection = shippedMaterials()): string[] {
  return Object.values(collection.materials).map((record) => record.name).sort();
}

function unknown(name: string, key: string, names: Map<string, Named>): Problem {
  const candidates = new Set<string>();
  if (key.length >= 3) for (const [other, { record }] of names) if (other.split(' ').some((word) => word === key) || other.startsWith(`${key} `)) candidates.add(record.name);
  if (candidates.size > 0) {
    const list = [...candidates].sort().join(', ');
    return new Problem({ code: 'ambiguous-material', message: `"${name}" does not say which material is meant`, expected: `one of ${list}` });
  }
  const nearest = nearestName(key, [...names.keys()]);
  const all = [...new Set([...names.values()].map(({ record }) => record.name))].sort();
  return new Problem({ code: 'unknown-material', message: `"${name}" is not a material of the collection`, expected: `one of ${all.join(', ')}; or give the fluid's properties instead of a material`, ...(nearest === undefined ? {} : { nearest: names.get(nearest)!.asked === undefined ? names.get(nearest)!.record.name : nearest }) });
}
