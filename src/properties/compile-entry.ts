import { unit } from '../units/index.ts';
import { Problem } from '../problems/index.ts';
import { propertyUnits, type Band, type Box, type Constant, type Entry, type PropertyId, type RecordCheck } from './record.ts';
import { equationModels, propertyModels } from './registry.ts';
import { quantityText, scaled, shown, type YamlReader } from './yaml-reader.ts';

type Path = readonly (string | number)[];
type Raw = { readonly [key: string]: unknown };

const isMap = (value: unknown): value is Raw => typeof value === 'object' && value !== null && !Array.isArray(value);
const startsAsNumber = /^[-+]?[\d.]/;

/** Range boxes: `{ T: [..], p: [..], composition: [..] }`, one or a list. */
function readRanges(reader: YamlReader, path: Path, given: unknown): Box[] {
  const list = given === undefined ? [] : Array.isArray(given) ? given : [given];
  return list.map((raw, i) => {
    const at = Array.isArray(given) ? [...path, i] : path;
    if (!isMap(raw)) {
      reader.complain(at, { code: 'wrong-range', message: 'a range is a mapping', expected: '{ T: [low, high], p: [low, high] }' });
      return {};
    }
    reader.keys(at, raw, ['T', 'p', 'composition']);
    return readBox(reader, at, raw);
  });
}

function readBox(reader: YamlReader, at: Path, raw: Raw): Box {
  const pair = (key: string, inUnit: string): [number, number] | undefined => {
    const given = raw[key];
    if (given === undefined) return undefined;
    if (!Array.isArray(given) || given.length !== 2) {
      reader.complain([...at, key], { code: 'wrong-range', message: `${key} needs two values`, expected: '[low, high]' });
      return undefined;
    }
    const [low, high] = given.map((v, i) => reader.quantity([...at, key, i], v, inUnit)) as [number, number];
    if (low > high) reader.complain([...at, key], { code: 'wrong-range', message: `${key} runs from high to low`, expected: '[low, high]' });
    return [low, high];
  };
  const temperature = pair('T', 'K');
  const pressure = pair('p', 'Pa');
  const composition = pair('composition', '1');
  return { ...(temperature && { temperature }), ...(pressure && { pressure }), ...(composition && { composition }) };
}

/** Uncertainty: one share, or bands read first to last, the last without conditions. */
export function readBands(reader: YamlReader, path: Path, given: unknown, inUnit: string): Band[] {
  if (!Array.isArray(given)) return [{ value: reader.quantity(path, given, '1') }];
  return given.map((raw: unknown, i) => {
    const at = [...path, i];
    if (!isMap(raw)) {
      reader.complain(at, { code: 'wrong-uncertainty', message: 'a band is a mapping', expected: '{ T: [low, high], value: 2 % }' });
      return { value: Number.NaN };
    }
    reader.keys(at, raw, ['T', 'p', 'composition', 'phase', 'departure', 'value', 'absolute']);
    const phase = raw['phase'];
    if (phase !== undefined && phase !== 'liquid' && phase !== 'vapour') reader.complain([...at, 'phase'], { code: 'wrong-phase', message: `"${shown(phase)}" is not a phase`, expected: 'liquid or vapour' });
    return {
      ...readBox(reader, at, raw),
      ...(phase === 'liquid' || phase === 'vapour' ? { phase } : {}),
      ...(raw['departure'] === undefined ? {} : { departure: reader.quantity([...at, 'departure'], raw['departure'], '1') }),
      value: reader.quantity([...at, 'value'], raw['value'], '1'),
      ...(raw['absolute'] === undefined ? {} : { absolute: reader.quantity([...at, 'absolute'], raw['absolute'], inUnit) }),
    };
  });
}

/** Constants: a text that starts as a number is a quantity and becomes SI; `gives` and `argument` are units. */
function readConstant(reader: YamlReader, path: Path, key: string | number, given: unknown): Constant {
  if (typeof given === 'number') {
    if (!Number.isFinite(given)) reader.complain(path, { code: 'wrong-constant', message: 'a constant is a finite number' });
    return given;
  }
  if (Array.isArray(given)) return given.map((v, i) => readConstant(reader, [...path, i], i, v));
  if (isMap(given)) return Object.fromEntries(Object.entries(given).map(([k, v]) => [k, readConstant(reader, [...path, k], k, v)]));
  if (typeof given !== 'string') {
    reader.complain(path, { code: 'wrong-constant', message: `"${String(given)}" is not a constant`, expected: 'a number, a quantity or a list of them' });
    return Number.NaN;
  }
  const asUnit = key === 'gives' || key === 'argument';
  if (!asUnit && !startsAsNumber.test(given)) return given;
  try {
    const match = quantityText.exec(given);
    const { factor, offset } = unit(asUnit ? given : (match?.[2] ?? given));
    return asUnit ? { factor, offset } : scaled(Number(match?.[1]), factor, offset);
  } catch (error) {
    if (!(error instanceof Problem)) throw error;
    reader.complain(path, { code: 'wrong-quantity', message: `"${given}": ${error.list[0]?.message ?? ''}` });
    return Number.NaN;
  }
}

function readChecks(reader: YamlReader, path: Path, given: unknown, property: string): RecordCheck[] {
  if (given === undefined) return [];
  if (!Array.isArray(given)) {
    reader.complain(path, { code: 'wrong-checks', message: 'checks are a list' });
    return [];
  }
  return given.filter(isMap).map((raw, i) => {
    const at = [...path, i];
    reader.keys(at, raw, ['property', 'at', 'expect', 'within', 'source']);
    const of = typeof raw['property'] === 'string' ? raw['property'] : property;
    const where = isMap(raw['at']) ? raw['at'] : {};
    reader.keys([...at, 'at'], where, ['T', 'p', 'humidity', 'composition']);
    const value = (key: string, inUnit: string, name: string): object => (where[key] === undefined ? {} : { [name]: reader.quantity([...at, 'at', key], where[key], inUnit) });
    if (!(of in propertyUnits)) reader.complain([...at, 'property'], { code: 'unknown-property', message: `"${of}" is not a property` });
    if (typeof raw['source'] !== 'string') reader.complain(at, { code: 'missing-source', message: 'a check names the work it comes from' });
    return {
      property: of,
      at: { ...value('T', 'K', 'temperature'), ...value('p', 'Pa', 'pressure'), ...value('humidity', '1', 'humidity'), ...value('composition', '1', 'composition') },
      expect: reader.quantity([...at, 'expect'], raw['expect'], propertyUnits[of as PropertyId] ?? '1'),
      within: reader.quantity([...at, 'within'], raw['within'], '1'),
      source: String(raw['source']),
    };
  });
}

const entryKeys = ['model', 'phase', 'constants', 'range', 'uncertainty', 'source', 'notes', 'checks', 'surface'];

/**
 * Reads one entry of a record.
 *
 * @param reader    the open file
 * @param path      where the entry stands
 * @param raw       what stands there
 * @param property  id of the property, or `thermodynamics` for an equation of state
 * @returns         the entry without its uncertainty, in SI; problems are collected in the reader
 */
export function readEntry(reader: YamlReader, path: Path, raw: unknown, property: string): Omit<Entry, 'uncertainty'> | undefined {
  if (!isMap(raw)) {
    reader.complain(path, { code: 'wrong-entry', message: `${property} is a mapping or a list of mappings`, expected: '{ model, constants, range, uncertainty, source }' });
    return undefined;
  }
  reader.keys(path, raw, entryKeys);
  const models: { readonly [name: string]: { readonly constants: readonly string[] } } = property === 'thermodynamics' ? equationModels : propertyModels;
  const model = String(raw['model']);
  const known = Object.hasOwn(models, model) ? models[model] : undefined;
  if (known === undefined) reader.complain([...path, 'model'], { code: 'unknown-model', message: `"${model}" is not a model`, expected: `one of ${Object.keys(models).join(', ')}` });
  const constants = isMap(raw['constants']) ? raw['constants'] : {};
  if (known !== undefined) {
    reader.keys([...path, 'constants'], constants, known.constants.map((name) => name.replace('?', '')));
    const missing = known.constants.filter((name) => !name.endsWith('?') && constants[name] === undefined);
    if (missing.length > 0) reader.complain([...path, 'constants'], { code: 'missing-constant', message: `${model} needs ${missing.join(', ')}` });
  }
  if (typeof raw['source'] !== 'string') reader.complain(path, { code: 'missing-source', message: `${property} names no source` });
  if (raw['uncertainty'] === undefined) reader.complain(path, { code: 'missing-uncertainty', message: `${property} states no uncertainty` });
  const phase = raw['phase'];
  if (phase !== undefined && phase !== 'liquid' && phase !== 'vapour' && phase !== 'solid') reader.complain([...path, 'phase'], { code: 'wrong-phase', message: `"${shown(phase)}" is not a phase`, expected: 'liquid, vapour or solid' });
  const word = (key: 'notes' | 'surface'): object => (typeof raw[key] === 'string' ? { [key]: raw[key] } : {});
  return {
    model,
    constants: Object.fromEntries(Object.entries(constants).map(([k, v]) => [k, readConstant(reader, [...path, 'constants', k], k, v)])),
    ...(phase === 'liquid' || phase === 'vapour' || phase === 'solid' ? { phase } : {}),
    ranges: readRanges(reader, [...path, 'range'], raw['range']),
    source: String(raw['source']),
    ...word('notes'),
    ...word('surface'),
    checks: readChecks(reader, [...path, 'checks'], raw['checks'], property === 'thermodynamics' ? 'density' : property),
  };
}
