import { nearestName, Problem, type ProblemData } from '../problems/index.ts';
import { type Quantity, readQuantity, type Wanted } from '../units/index.ts';
import type { Value } from './entry.ts';
import { type LeafField, own, type QuantityField } from './vocabulary.ts';
import { readTolerance } from './tolerance.ts';

/** What reading a value needs to know of the values beside it. */
export interface Beside {
  /** Text of another key of the same map. */
  text(key: string): string | undefined;
}

/** What an unfilled template holds in place of a value. */
export const blank = '___';

/**
 * A single value from its text.
 *
 * @param text    as written
 * @param field   what the key holds
 * @param beside  the other keys of the same map
 * @returns       the value in SI, or the word
 * @throws        {Problem} with `at` and `length` within the text
 */
export function readLeaf(text: string, field: LeafField, beside: Beside): Value {
  if (text.trim() === blank) throw new Problem({ code: 'not-filled-in', message: 'still to be filled in', expected: `${field.doc}, for example ${field.example}` });
  switch (field.kind) {
    case 'quantity':
      return quantityOf(text, field, beside);
    case 'tolerance':
      return readTolerance(text, beside.text(field.of) ?? '', field.temperatures);
    case 'flag':
      if (text !== 'true' && text !== 'false') throw new Problem({ code: 'wrong-word', message: `"${shown(text)}" is neither true nor false`, expected: 'true or false', ...(/^(yes|on|y)$/i.test(text) ? { nearest: 'true' } : /^(no|off|n)$/i.test(text) ? { nearest: 'false' } : {}) });
      return { kind: 'flag', value: text === 'true', assumed: [] };
    case 'text':
      return { kind: 'text', value: textOf(text, field.example), assumed: [] };
    default:
      if (!Object.hasOwn(field.words, text)) throw wrongWord(text, Object.keys(field.words));
      return { kind: field.kind, value: field.kind === 'word' ? text : [text], assumed: [] };
  }
}

function wrongWord(text: string, words: readonly string[], or = ''): Problem {
  const nearest = nearestName(text, words);
  return new Problem({ code: 'wrong-word', message: `"${shown(text)}" is no word that fits here`, expected: `${words.join(', ')}${or}`, ...(nearest === undefined ? {} : { nearest }) });
}

function textOf(text: string, example: string): string {
  if (text.length > 1000) throw new Problem({ code: 'too-long', message: `a text of ${text.length} characters`, expected: 'at most 1000 characters' });
  const control = text.search(/[\u0000-\u0008\u000b-\u001f\u007f-\u009f\u202a-\u202e\u2066-\u2069]/);
  if (control >= 0) throw new Problem({ code: 'control-character', message: 'a control character within a text', expected: 'printable text' });
  if (text.trim() === '') throw new Problem({ code: 'empty-value', message: 'a text without letters', expected: `for example ${example}` });
  return text.trim().replace(/\s+/g, ' ');
}

function quantityOf(text: string, field: QuantityField, beside: Beside): Value {
  const meaning = field.words === undefined ? undefined : own(field.words, text);
  if (meaning !== undefined) return meaning.value === undefined ? { kind: 'word', value: text, word: text, assumed: [] } : { kind: 'quantity', value: meaning.value, unit: field.unit, word: text, assumed: [] };
  if (field.words !== undefined && /^[A-Za-z-]+$/.test(text)) throw wrongWord(text, Object.keys(field.words), ` or a quantity such as ${field.example}`);
  const units = [field.unit, ...(field.orUnits ?? [])];
  const read = firstThatFits(text, units, field, beside);
  limits(read.quantity, text, field);
  const { value, spread, range, basis, reference, assumed, unit } = read.quantity;
  return {
    kind: 'quantity',
    value,
    unit: withExponent(read.unit, field, beside),
    writtenUnit: withExponent(unit, field, beside),
    ...(spread === undefined ? {} : { spread }),
    ...(range === undefined ? {} : { range }),
    ...(basis === undefined ? {} : { basis }),
    ...(reference === undefined ? {} : { reference }),
    assumed,
  };
}

/** Reads the text in the first unit whose dimension it has; the complaint is that of the first unit. */
function firstThatFits(text: string, units: readonly string[], field: QuantityField, beside: Beside): { quantity: Quantity; unit: string } {
  let first: unknown;
  for (const unit of units) {
    try {
      return { quantity: readQuantity(text, wanted(unit, field, beside)), unit };
    } catch (error) {
      if (!(error instanceof Problem)) throw error;
      first ??= units.length === 1 ? error : new Problem(error.list.map((one): ProblemData => ({ ...one, expected: `a quantity in ${units.join(', ')}, for example ${field.example}` })));
    }
  }
  throw first;
}

/** The exponent n of a field, where a key beside it gives one. */
function exponentOf(field: QuantityField, beside: Beside): number | undefined {
  const n = field.exponentFrom === undefined ? undefined : Number(beside.text(field.exponentFrom)?.split(/ |\.\.|\+/)[0]);
  return n === undefined || !Number.isFinite(n) ? undefined : n;
}

/** A unit with its n as a number, so that it can be read without the key beside it. */
function withExponent(unit: string, field: QuantityField, beside: Beside): string {
  const n = exponentOf(field, beside);
  return n === undefined ? unit : unit.replaceAll(/\^n\b/g, `^${n}`);
}

function wanted(unit: string, field: QuantityField, beside: Beside): Wanted {
  const n = exponentOf(field, beside);
  return {
    unit: unit === '1' ? '' : unit,
    ...(field.is === undefined ? {} : { kind: field.is }),
    ...(field.name === undefined ? {} : { name: field.name }),
    ...(n === undefined ? {} : { exponentN: n }),
  };
}

/** In SI units; beyond them products of a few numbers leave what a computer can hold. */
const [smallest, largest] = [1e-40, 1e40];

function limits(quantity: Quantity, text: string, field: QuantityField): void {
  const { above, atLeast, atMost, whole, example } = field;
  const refuse = (says: string, code = 'out-of-bounds'): Problem => new Problem({ code, message: `"${shown(text)}" ${says}`, expected: `${field.doc}, for example ${example}`, at: 0, length: text.length });
  for (const value of quantity.range === undefined ? [quantity.value] : [quantity.range.from, quantity.range.to]) {
    if (above !== undefined && value <= above) throw refuse(above === 0 ? 'is not above zero' : `is not above ${above} ${field.unit}`, above === 0 ? 'not-positive' : undefined);
    if (atLeast !== undefined && value < atLeast) throw refuse(atLeast === 0 ? 'is below zero' : `is below ${atLeast} ${field.unit}`, atLeast === 0 ? 'negative' : undefined);
    if (atMost !== undefined && value > atMost * (1 + 1e-12)) throw refuse(`is above ${atMost} ${field.unit}`);
    if (value !== 0 && !(Math.abs(value) > smallest && Math.abs(value) < largest)) throw refuse('is the size of no quantity');
    if (whole === true && !Number.isInteger(value)) throw refuse('is no whole number', 'not-whole');
  }
}

/** A text of the file in a message, cut where it is long. */
export function shown(text: string): string {
  return text.length > 80 ? `${text.slice(0, 77)}...` : text;
}
