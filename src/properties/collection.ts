import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { nearestName, Problem } from '../problems/index.ts';
import { compileMaterials, openSource } from './compile.ts';
import { materialOf, type Material } from './material.ts';
import { collectionOf, plainName } from './names.ts';
import { openStored } from './stored.ts';
import type { Side } from './models/point.ts';
import type { Collection, MaterialRecord, NamedMaterial } from './record.ts';

let shipped: Collection | undefined;

/**
 * The records that come with the program: the compiled ones in `materials` beside it, or the folder of records in a source tree.
 *
 * @returns  the collection, opened once
 * @throws   {Problem} missing-folder
 */
export function shippedMaterials(): Collection {
  if (shipped !== undefined) return shipped;
  const here = fileURLToPath(new URL('.', import.meta.url));
  shipped = openStored(join(here, 'materials')) ?? openSource(join(here, '../../materials'));
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
  return collectionOf(materialRecords(compileMaterials(dir)), shippedMaterials());
}

/**
 * All records of a collection.
 *
 * @param collection  the shipped one unless given
 * @returns           records in the order of their names
 */
export function materialRecords(collection: Collection = shippedMaterials()): MaterialRecord[] {
  const ids = new Set(Object.values(collection.names).map(({ id }) => id));
  return [...ids].flatMap((id) => collection.record(id) ?? []).sort((a, b) => (a.name < b.name ? -1 : 1));
}

const ready = new WeakMap<Collection, Map<string, Material>>();

/**
 * A material by name, alias or formula; case, spaces and hyphens do not matter, but for formulas that differ in case alone.
 *
 * @param name        what was written, such as `water`, `H2O`, `steam`
 * @param collection  where to look; the shipped records unless given
 * @returns           the material, the same one for the same name
 * @throws            {Problem} unknown-material with the nearest name, ambiguous-material with the candidates
 */
export function loadMaterial(name: string, collection: Collection = shippedMaterials()): Material {
  const known = ready.get(collection) ?? new Map<string, Material>();
  ready.set(collection, known);
  const exact = name.normalize('NFKC').trim();
  const key = collection.find(exact) === undefined ? plainName(name) : exact;
  const before = known.get(key);
  if (before !== undefined) return before;
  const found = collection.find(key) ?? collection.find(key.replaceAll(' ', '')) ?? withPhaseWord(key, collection);
  if (found?.among !== undefined) throw ambiguous(name, found.among);
  const record = found && collection.record(found.id);
  if (found === undefined || record === undefined) throw unknown(name, key, collection);
  const material = materialOf(record, collection, found.asked);
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
  return [...new Set(Object.values(collection.names).map(({ name }) => name))].sort((a, b) => (a.toLowerCase() < b.toLowerCase() ? -1 : 1));
}

function ambiguous(name: string, candidates: Iterable<string>): Problem {
  return new Problem({ code: 'ambiguous-material', message: `"${name.slice(0, 60)}" does not say which material is meant`, expected: `one of ${[...candidates].sort().join(', ')}` });
}

/** A name with the phase in a word of its own: nitrogen gas, liquid benzene. */
function withPhaseWord(key: string, collection: Collection): NamedMaterial | undefined {
  const [, before, bare = '', after] = /^(gaseous |liquid )?(.+?)( gas| vapou?r)?$/.exec(key) ?? [];
  if (before === undefined && after === undefined) return undefined;
  const asked: Side = before === 'liquid ' ? 'liquid' : 'vapour';
  const found = collection.find(bare);
  return found === undefined || found.among !== undefined || collection.record(found.id)?.phases.includes(asked) !== true ? undefined : { ...found, asked };
}

/** A grade behind a name: its last word holds a digit. */
const grade = /^(| .*\d\S*)$/;

/** Names of the materials that a word may mean: what ends with it (carbon steel), or else the records that have it in their own name. */
function candidatesOf(key: string, collection: Collection): Set<string> {
  const entries = key.length < 3 ? [] : Object.entries(collection.names);
  const ending = entries.filter(([other]) => {
    const at = ` ${other}`.lastIndexOf(` ${key}`);
    return at >= 0 && grade.test(other.slice(at + key.length));
  });
  const having = ending.length > 0 ? ending : entries.filter(([, { name }]) => ` ${plainName(name)} `.includes(` ${key} `));
  return new Set(having.map(([, { name }]) => name));
}

function unknown(name: string, key: string, collection: Collection): Problem {
  const shown = name.slice(0, 60);
  const candidates = candidatesOf(key, collection);
  if (candidates.size > 1) return ambiguous(name, candidates);
  const bare = key.replace(/[ ,]*\d[\d.,]*( %| percent)?( \w+)?$/, ''); // a name with its share or grade behind it
  const nearest = nearestName(key, Object.keys(collection.names)) ?? [...candidates].map(plainName)[0] ?? (collection.find(bare) === undefined ? undefined : bare);
  const named = nearest === undefined ? undefined : collection.names[nearest];
  const names = named === undefined ? materialNames(collection) : [];
  return new Problem({
    code: 'unknown-material',
    message: `"${shown}" is not a material of the collection`,
    expected: named === undefined && names.length <= 24 ? `one of ${names.join(', ')}; or the properties themselves` : named === undefined ? `one of the ${names.length} materials that \`runbrief material\` lists, by name, alias or formula; or the properties themselves` : 'a material by name, alias or formula; or the properties themselves',
    ...(named === undefined ? {} : { nearest: named.asked === undefined ? named.name : (nearest as string) }),
  });
}
