import { nearestName, type ProblemData } from '../problems/index.ts';
import type { Column, Need, Reference } from './define.ts';

export interface EvaluatedValue {
  readonly id: string;
  readonly name: string;
  readonly unit: string;
  readonly formula: string;
  readonly value: number;
  /** Relative 95 % half-width. */
  readonly uncertainty: number;
  readonly low: number;
  readonly high: number;
}

export interface EvaluatedTable {
  readonly id: string;
  readonly title: string;
  readonly columns: readonly Column[];
  readonly rows: readonly (readonly number[])[];
  readonly note?: string;
  readonly band: number;
}

export interface Evaluation {
  readonly id: string;
  /** The numbers used, defaults included. */
  readonly inputs: Readonly<Record<string, number>>;
  readonly values: readonly EvaluatedValue[];
  readonly tables: readonly EvaluatedTable[];
  /** Answers left out, each with the first input that it lacks. */
  readonly missing: readonly { readonly id: string; readonly needs: string }[];
  /** Defaults taken and inputs outside the range of the answer, in words. */
  readonly flags: readonly string[];
  /** Inputs that cannot be, and `missing-input` or `no-answer` where nothing at all could be computed. */
  readonly problems: readonly ProblemData[];
}

class Missing {
  readonly need: string;
  constructor(need: string) {
    this.need = need;
  }
}

/**
 * A known answer for given inputs. What lacks an input is left out and named; the rest is computed.
 *
 * @param ref    the reference
 * @param given  SI numbers by id; ids that the reference does not need are ignored
 * @param what   'values' leaves the tables out, which a plan on the screen does not show
 * @returns      values with their spread, tables, what is missing, flags and problems; it never throws
 */
export function evaluateReference(ref: Reference, given: Readonly<Record<string, number | undefined>>, what: 'all' | 'values' = 'all'): Evaluation {
  const { inputs, flags, problems } = checked(ref, given);
  const reader = guarded(ref.needs, inputs);
  const values: EvaluatedValue[] = [];
  const tables: EvaluatedTable[] = [];
  const missing: { id: string; needs: string }[] = [];
  const attempt = (id: string, compute: () => void): void => {
    try {
      compute();
    } catch (error) {
      if (!(error instanceof Missing)) throw error;
      missing.push({ id, needs: error.need });
    }
  };
  for (const answer of ref.values) {
    attempt(answer.id, () => {
      const value = answer.value(reader);
      if (value === undefined) return;
      const uncertainty = spreadOf(ref, answer.uncertainty, reader);
      if (!Number.isFinite(value)) {
        problems.push({ code: 'not-finite', message: `${ref.id} has no finite ${answer.name} for these inputs` });
        return;
      }
      const ends = [value / (1 + uncertainty), value * (1 + uncertainty)];
      values.push({ id: answer.id, name: answer.name, unit: answer.unit, formula: answer.formula, value, uncertainty, low: Math.min(...ends), high: Math.max(...ends) });
    });
  }
  for (const table of what === 'all' ? ref.tables : []) {
    attempt(table.id, () => {
      const rows = table.rows(reader);
      if (rows.length === 0) return;
      tables.push({ id: table.id, title: table.title, columns: table.columns, rows, band: table.band ?? 0, ...(table.note === undefined ? {} : { note: table.note }) });
    });
  }
  if (values.length === 0 && tables.length === 0 && problems.length === 0) {
    problems.push(missing.length > 0 ? lacking(ref, missing.map((m) => m.needs)) : { code: 'no-answer', message: `${ref.id} holds no number for these inputs`, expected: 'inputs at which it is tabulated, see its formulas' });
  }
  return { id: ref.id, inputs, values, tables, missing, flags, problems };
}

/**
 * One number of a known answer, for those who ask again and again.
 *
 * @param ref    the reference
 * @param id     the number's id in it
 * @param given  SI numbers by id
 * @returns      the number in SI with its relative 95 % half-width; undefined where the reference has none for these inputs
 */
export function referenceNumber(ref: Reference, id: string, given: Readonly<Record<string, number | undefined>>): { readonly value: number; readonly uncertainty: number } | undefined {
  const answer = ref.values.find((one) => one.id === id);
  const reader = guarded(ref.needs, checked(ref, given).inputs);
  try {
    const value = answer?.value(reader);
    return value !== undefined && Number.isFinite(value) ? { value, uncertainty: spreadOf(ref, answer?.uncertainty, reader) } : undefined;
  } catch (error) {
    if (error instanceof Missing) return undefined;
    throw error;
  }
}

const spreadOf = (ref: Reference, own: Reference['values'][number]['uncertainty'], reader: Readonly<Record<string, number>>): number => (typeof own === 'function' ? own(reader) : (own ?? ref.uncertainty));

/**
 * Names among the inputs that the reference does not know.
 *
 * @param ref  the reference
 * @param ids  names that were given
 * @returns    one problem a name, with the nearest input
 */
export function unknownInputs(ref: Reference, ids: readonly string[]): ProblemData[] {
  const known = ref.needs.map((need) => need.id);
  return ids.filter((id) => !known.includes(id)).map((id) => {
    const nearest = nearestName(id, known);
    return { code: 'unknown-input', message: `"${id}" is no input of ${ref.id}`, expected: known.length === 0 ? 'no inputs: its numbers are constants' : `one of ${known.join(', ')}`, ...(nearest === undefined ? {} : { nearest }) };
  });
}

function checked(ref: Reference, given: Readonly<Record<string, number | undefined>>): { inputs: Record<string, number>; flags: string[]; problems: ProblemData[] } {
  const inputs: Record<string, number> = {};
  const flags: string[] = [];
  const problems: ProblemData[] = [];
  for (const need of ref.needs) {
    const value = Object.hasOwn(given, need.id) ? given[need.id] : undefined;
    if (value === undefined && need.default !== undefined) flags.push(`${need.id} taken as ${String(need.default)}${unitText(need.unit)}`);
    const used = value ?? need.default;
    if (used === undefined) continue;
    const wrong = impossible(need, used);
    if (wrong) problems.push(wrong);
    else {
      inputs[need.id] = used;
      if (need.range && (used < need.range[0] || used > need.range[1])) flags.push(`${need.id} = ${short(used)} is outside ${short(need.range[0])} .. ${short(need.range[1])}${unitText(need.unit)}, where ${ref.id} holds`);
    }
  }
  return { inputs, flags, problems };
}

function guarded(needs: readonly Need[], inputs: Readonly<Record<string, number>>): Readonly<Record<string, number>> {
  const reader = {};
  for (const { id } of needs) {
    Object.defineProperty(reader, id, {
      get: () => {
        if (inputs[id] === undefined) throw new Missing(id);
        return inputs[id];
      },
    });
  }
  return reader;
}

function impossible(need: Need, value: number): ProblemData | undefined {
  const said = `${need.id} = ${short(value)}${unitText(need.unit)}`;
  if (!Number.isFinite(value)) return { code: 'not-finite', message: `${said} is not a finite number` };
  const sign = need.sign ?? 'positive';
  if (sign === 'positive' && value <= 0) return { code: 'not-positive', message: `${said} must be more than zero` };
  if (sign === 'not-negative' && value < 0) return { code: 'negative', message: `${said} must not be below zero` };
  const anchors = need.anchors;
  if (anchors && !anchors.some((anchor) => Math.abs(value - anchor) <= 0.005 * Math.abs(anchor))) {
    const distance = (anchor: number): number => Math.abs(Math.log(value / anchor));
    const nearest = anchors.reduce((best, anchor) => (distance(anchor) < distance(best) ? anchor : best));
    return { code: 'not-tabulated', message: `the answer is known only at certain values of ${need.id}, and ${short(value)} is none of them`, expected: `one of ${anchors.map(short).join(', ')}`, nearest: short(nearest) };
  }
  return undefined;
}

function lacking(ref: Reference, ids: readonly string[]): ProblemData {
  const wanted = ref.needs.filter((need) => ids.includes(need.id));
  return { code: 'missing-input', message: `${ref.id} needs ${wanted.map((need) => `${need.id} (${need.name}${need.unit === '1' ? '' : `, ${need.unit}`})`).join(', ')}`, expected: ref.needs.map((need) => `${need.id}${unitText(need.unit, ' in ')}`).join(', ') };
}

const unitText = (unit: string, before = ' '): string => (unit === '1' ? '' : `${before}${unit}`);
const short = (value: number): string => String(Number(value.toPrecision(6)));
