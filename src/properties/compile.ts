import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { Problem, type ProblemData } from '../problems/index.ts';
import { readBands, readEntry } from './compile-entry.ts';
import type { Side } from './models/point.ts';
import { collectionOf, findIn, namesOf, plainName, type Named } from './names.ts';
import { dangerMarks, propertyUnits, type Band, type Collection, type Entry, type MaterialRecord, type PropertyId } from './record.ts';
import { yamlReader, type YamlReader } from './yaml-reader.ts';

const headKeys = ['name', 'formula', 'aliases', 'sharedNames', 'phaseNames', 'kind', 'phases', 'acrossMelting', 'marks', 'takes', 'typical', 'saturated', 'molarMass', 'flashPoint', 'critical', 'triplePoint', 'about', 'thermodynamics'];
const derived: readonly string[] = ['kinematicViscosity', 'thermalDiffusivity', 'prandtl', 'molarMass'];
const recorded = Object.keys(propertyUnits).filter((id) => !derived.includes(id));

type Raw = { readonly [key: string]: unknown };
const isMap = (value: unknown): value is Raw => typeof value === 'object' && value !== null && !Array.isArray(value);

/**
 * Reads one material record.
 *
 * @param text  YAML in the form of the files in materials/
 * @param file  its name, for messages
 * @returns     the record in SI
 * @throws      {Problem} every fault of the file with line and column: unknown-key, wrong-dimension, missing-source, unknown-model, ...
 */
export function compileMaterial(text: string, file: string): MaterialRecord {
  const reader = yamlReader(text, file);
  const raw = reader.value;
  if (!isMap(raw)) throw new Problem({ code: 'wrong-record', message: 'a material record is a mapping', file, expected: 'name, kind, then one key per property' });
  reader.keys([], raw, [...headKeys, ...recorded]);
  const name = raw['name'];
  if (typeof name !== 'string' || name === '') reader.complain(['name'], { code: 'missing-name', message: 'the record has no name' });
  const kind = raw['kind'];
  if (kind !== 'fluid' && kind !== 'solid') reader.complain(['kind'], { code: 'wrong-kind', message: `kind is "${String(kind)}"`, expected: 'fluid or solid' });
  const texts = (key: string): string[] => (Array.isArray(raw[key]) ? (raw[key] as unknown[]).map(String) : []);
  const group = (key: string, units: Record<string, string>): object => {
    const given = raw[key];
    if (!isMap(given)) return {};
    reader.keys([key], given, Object.keys(units));
    return { [key]: Object.fromEntries(Object.entries(units).map(([part, inUnit]) => [part, reader.quantity([key, part], given[part], inUnit)])) };
  };
  const properties: Record<string, Entry[]> = {};
  for (const id of recorded) {
    const given = raw[id];
    if (given === undefined) continue;
    const list: unknown[] = Array.isArray(given) ? given : [given];
    properties[id] = list.flatMap((one, i) => {
      const path = Array.isArray(given) ? [id, i] : [id];
      const entry = readEntry(reader, path, one, id);
      return entry === undefined ? [] : [{ ...entry, uncertainty: readBands(reader, [...path, 'uncertainty'], (one as Raw)['uncertainty'], propertyUnits[id as PropertyId]) }];
    });
  }
  const phases = texts('phases');
  for (const phase of phases) if (!['liquid', 'vapour', 'solid'].includes(phase)) reader.complain(['phases'], { code: 'wrong-phase', message: `"${phase}" is not a phase`, expected: 'liquid, vapour or solid' });
  const marks = texts('marks');
  for (const mark of marks) if (!(dangerMarks as readonly string[]).includes(mark)) reader.complain(['marks'], { code: 'wrong-mark', message: `"${mark}" is not a mark of danger`, expected: `one of ${dangerMarks.join(', ')}` });
  const record = {
    ...namedOf(raw),
    kind: kind as 'fluid' | 'solid',
    phases: (phases.length > 0 ? phases : kind === 'solid' ? ['solid'] : ['liquid', 'vapour']) as (Side | 'solid')[],
    ...(marks.length > 0 ? { marks: marks as NonNullable<MaterialRecord['marks']> } : {}),
    ...(typeof raw['acrossMelting'] === 'string' ? { acrossMelting: raw['acrossMelting'] } : {}),
    takes: texts('takes') as MaterialRecord['takes'][number][],
    ...(raw['typical'] === undefined ? {} : { typical: reader.quantity(['typical'], raw['typical'], '1') }),
    ...(raw['saturated'] === undefined ? {} : { saturated: solubility(reader, raw['saturated']) }),
    ...(raw['molarMass'] === undefined ? {} : { molarMass: reader.quantity(['molarMass'], raw['molarMass'], 'kg/mol') }),
    ...(raw['flashPoint'] === undefined ? {} : { flashPoint: reader.quantity(['flashPoint'], raw['flashPoint'], 'K') }),
    ...group('critical', { temperature: 'K', pressure: 'Pa', density: 'kg/m^3' }),
    ...group('triplePoint', { temperature: 'K', pressure: 'Pa' }),
    ...(typeof raw['about'] === 'string' ? { about: raw['about'] } : {}),
    ...thermodynamics(reader, raw['thermodynamics']),
    properties,
  };
  reader.finish();
  return record;
}

/** Rows of temperature and share, the temperatures rising. */
function solubility(reader: YamlReader, given: unknown): [number, number][] {
  const rows = Array.isArray(given) ? given.map((row: unknown, i): [number, number] => {
    const [T, share] = Array.isArray(row) ? (row as unknown[]) : [];
    return [reader.quantity(['saturated', i, 0], T, 'K'), reader.quantity(['saturated', i, 1], share, '1')];
  }) : [];
  if (rows.length === 0 || rows.some(([T], i) => i > 0 && !(T > (rows[i - 1]?.[0] ?? 0)))) reader.complain(['saturated'], { code: 'wrong-solubility', message: 'a solubility is rows of temperature and share, the temperatures rising', expected: '[[0 degC, 26.3 %], [100 degC, 28 %]]' });
  return rows;
}

/** The part of a record that bears names. */
function namedOf(raw: Raw): Named {
  return {
    id: String(raw['name']).toLowerCase().replaceAll(' ', '-'),
    name: String(raw['name']),
    ...(typeof raw['formula'] === 'string' ? { formula: raw['formula'] } : {}),
    aliases: Array.isArray(raw['aliases']) ? (raw['aliases'] as unknown[]).map(String) : [],
    ...(Array.isArray(raw['sharedNames']) ? { sharedNames: (raw['sharedNames'] as unknown[]).map(String) } : {}),
    phaseNames: (isMap(raw['phaseNames']) ? raw['phaseNames'] : {}) as { [name: string]: Side },
  };
}

function thermodynamics(reader: YamlReader, given: unknown): object {
  if (given === undefined) return {};
  const entry = readEntry(reader, ['thermodynamics'], given, 'thermodynamics');
  const bands = (given as Raw)['uncertainty'];
  if (entry === undefined) return {};
  if (!isMap(bands)) {
    reader.complain(['thermodynamics', 'uncertainty'], { code: 'wrong-uncertainty', message: 'an equation of state states an uncertainty per property' });
    return {};
  }
  reader.keys(['thermodynamics', 'uncertainty'], bands, [...recorded, 'molarMass']);
  const uncertainty: Record<string, Band[]> = {};
  for (const [id, one] of Object.entries(bands)) uncertainty[id] = readBands(reader, ['thermodynamics', 'uncertainty', id], one, propertyUnits[id as PropertyId] ?? '1');
  return { thermodynamics: { ...entry, uncertainty } };
}

/**
 * Reads and checks all records of a folder.
 *
 * @param dir  folder with one `.yaml` file per material
 * @returns    the collection, numbers in SI
 * @throws     {Problem} the faults of all files together; two-names where two records claim one name
 */
export function compileMaterials(dir: string): Collection {
  const problems: ProblemData[] = [];
  const materials: MaterialRecord[] = [];
  const owner = new Map<string, string>();
  for (const file of filesOf(dir)) {
    try {
      const record = compileMaterial(readFileSync(join(dir, file), 'utf8'), file);
      for (const name of [record.name, ...record.aliases, ...Object.keys(record.phaseNames)]) {
        const other = owner.get(plainName(name));
        if (other !== undefined && other !== file) problems.push({ code: 'two-names', message: `"${name}" names a material of ${other} as well`, file });
        owner.set(plainName(name), file);
      }
      materials.push(record);
    } catch (error) {
      if (!(error instanceof Problem)) throw error;
      problems.push(...error.list);
    }
  }
  if (problems.length > 0) throw new Problem(problems);
  return collectionOf(materials);
}

function filesOf(dir: string): string[] {
  try {
    return readdirSync(dir).filter((file) => /\.ya?ml$/.test(file)).sort();
  } catch {
    throw new Problem({ code: 'missing-folder', message: `the folder of materials ${dir} cannot be read` });
  }
}

/**
 * Opens the records of a source tree: only their heads are read for the names, each record is read and checked when it is asked for.
 * The head of a file ends at its first empty line.
 *
 * @param dir  folder with one `.yaml` file per material, all of which `compileMaterials` has accepted
 * @returns    the collection
 * @throws     {Problem} missing-folder; the faults of a record when it is asked for
 */
export function openSource(dir: string): Collection {
  const file = new Map<string, string>();
  const heads = filesOf(dir).map((one) => {
    const [head = ''] = readFileSync(join(dir, one), 'utf8').split('\n\n', 1);
    const raw = yamlReader(head, one).value;
    const named = namedOf(isMap(raw) ? raw : {});
    file.set(named.id, one);
    return named;
  });
  const read = new Map<string, MaterialRecord>();
  const names = namesOf(heads);
  return {
    names,
    find: (name) => findIn(names, name),
    record(id) {
      const name = file.get(id);
      if (name === undefined) return undefined;
      const record = read.get(id) ?? compileMaterial(readFileSync(join(dir, name), 'utf8'), name);
      read.set(id, record);
      return record;
    },
  };
}
