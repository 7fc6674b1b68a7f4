import type { Case } from '../case/index.ts';
import { harmless } from '../problems/index.ts';
import { isTemperature } from '../quantities/index.ts';
import { numberParts, printNumber, type NumberParts, type Printing } from '../units/index.ts';

/** How the numbers of one plan are written: given ones in the user's unit, others in SI with prefixes, temperatures in the scale of the case. */
export interface Writing {
  /** The number of a quantity with unit and spread, its word, or `not known`. */
  number(id: string): string;
  /** Number, unit and spread apart, for tables. */
  parts(id: string): NumberParts;
  /** Its symbol, else its id. */
  symbol(id: string): string;
  /** A number that is no quantity of the plan but has the kind of one: a limit, a flip value, a bound. */
  like(id: string, value: number, unit?: string): string;
  /** Text of the plan with the numbers put in for the ids in braces, on one line, without anything a terminal would act on. */
  fill(text: string): string;
}

/** What has to be known of a quantity to write its number: a quantity of the plan, or a step of a trace. */
export interface Writable {
  readonly symbol: string;
  readonly value: number | string;
  readonly unit: string;
  readonly needs: readonly string[];
  readonly low?: number;
  readonly high?: number;
}
type Writables = Readonly<Record<string, Writable>>;

/** Text from outside on one line, harmless to terminal and page. */
export const oneLine = (text: string): string => harmless(text.replaceAll(/[\s\u2028\u2029]+/g, ' ')).trim();

const scales = ['degC', 'degF'];

/**
 * The way the numbers of a plan are written.
 *
 * @param quantities  quantities by id
 * @param on          the case they belong to, for the units that the user wrote; SI without it
 * @param unicode     signs beyond ASCII, for a page
 * @returns           printers of numbers by quantity id
 */
export function writingOf(quantities: Writables, on?: Case, unicode = false): Writing {
  const scale = scales.find((unit) => [...(on?.entries.values() ?? [])].some((e) => e.unit === 'K' && e.writtenUnit === unit));
  const unitFor = (id: string, q: Writable): Partial<Printing> => {
    const path = writtenAt(quantities, on, id);
    const own = path === undefined ? undefined : on?.get(path)?.writtenUnit;
    const temperature = isTemperature(id);
    const difference = q.unit === 'K' && !temperature;
    const toUnit = own ?? (temperature && q.unit === 'K' ? scale : undefined);
    return { ...(toUnit === undefined || toUnit === '' ? {} : { toUnit }), ...(difference ? { difference } : {}), digits: path === undefined ? 4 : 6 };
  };
  const printing = (id: string, q: Writable): Printing | undefined => {
    if (typeof q.value === 'string') return undefined;
    return { value: q.value, unit: q.unit, ...(q.low === undefined || q.high === undefined ? {} : { low: q.low, high: q.high }), ...unitFor(id, q), unicode };
  };
  const shown = <T>(id: string, show: (p: Printing) => T, word: (text: string) => T): T => {
    const q = quantities[id];
    if (q === undefined) return word('not known');
    const p = printing(id, q);
    return p === undefined ? word(oneLine(String(q.value))) : show(p);
  };
  // The unit of a flow that counts at a state of its own is not complete without that word.
  const counted = (id: string): string => (on?.get(id)?.reference === undefined ? '' : ` ${on.get(id)?.reference}`);
  const number = (id: string): string => shown(id, (p) => printNumber(p) + counted(id), (text) => text);
  return {
    number,
    parts: (id) => shown(id, (p) => { const parts = numberParts(p); return { ...parts, unit: parts.unit + counted(id) }; }, (text) => ({ number: text, unit: '', spread: '' })),
    symbol: (id) => { const symbol = oneLine(quantities[id]?.symbol ?? ''); return symbol === '' ? id : symbol; },
    like: (id, value, unit) => {
      const q = quantities[id];
      return printNumber({ value, unicode, unit: unit ?? q?.unit ?? '1', ...(q === undefined ? unitOfPath(on, id, unit, scale) : unitFor(id, q)) }) + counted(id);
    },
    fill: (text) => oneLine(text.replaceAll(/\{([^{}]+)\}/g, (_, id: string) => number(id))),
  };
}

/** The path at which a quantity was given, where it is the given number itself. */
function writtenAt(quantities: Writables, on: Case | undefined, id: string): string | undefined {
  if (on === undefined) return undefined;
  let at = id;
  for (let steps = 0; steps < 4; steps++) {
    if (on.get(at)?.writtenUnit !== undefined) return at;
    const q = quantities[at];
    const next = q?.needs.length === 1 ? q.needs[0] : undefined;
    const before = next === undefined ? undefined : quantities[next];
    if (q === undefined || next === undefined || before === undefined || before.unit !== q.unit || before.value !== q.value) return undefined;
    at = next;
  }
  return undefined;
}

function unitOfPath(on: Case | undefined, path: string, unit: string | undefined, scale: string | undefined): Partial<Printing> {
  const toUnit = on?.get(path)?.writtenUnit ?? (unit === 'K' && isTemperature(path) ? scale : undefined);
  return toUnit === undefined || toUnit === '' ? {} : { toUnit };
}
