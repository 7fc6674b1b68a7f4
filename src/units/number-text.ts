import { Problem } from '../problems/index.ts';

/** A number found in a text. */
export interface NumberText {
  readonly value: number;
  readonly at: number;
  readonly length: number;
}

const number = /[+-]?(?:\d{1,3}(?:[\u00a0\u2000-\u200a\u202f]\d{3}){1,6}(?!\d)|\d{1,40})(?:\.(?!\.)\d{0,40})?(?:[eE][+-]?\d{1,4}(?![\d.A-Za-z]))?|[+-]?\.\d{1,40}(?:[eE][+-]?\d{1,4}(?![\d.A-Za-z]))?/y;
const commas = /[+-]?\d+(?:,\d+)+(?:\.\d+)?/y;

function at(pattern: RegExp, text: string, from: number): string | undefined {
  pattern.lastIndex = from;
  return pattern.exec(text)?.[0];
}

function refuse(text: string, from: number, length: number, message: string, nearest?: string): Problem {
  return new Problem({ code: 'not-a-number', message, expected: 'a number such as 25, 0.4, 1.5e-3', ...(nearest === undefined ? {} : { nearest }), at: from, length: Math.max(1, Math.min(length, text.length - from)) });
}

/**
 * The number that begins at a place of a text: sign, digits, decimal point, exponent of ten. Thin and non-breaking spaces
 * may group the digits by three. Commas, hexadecimal digits, infinities and what overflows are refused.
 *
 * @param text  the text, with plain signs
 * @param from  where the number should begin
 * @returns     value, place and length
 * @throws      {Problem} not-a-number, with the number that was probably meant
 */
export function numberAt(text: string, from: number): NumberText {
  let start = from;
  while (text[start] === ' ') start++;
  const comma = at(commas, text, start);
  if (comma !== undefined) {
    const thousands = /^[+-]?\d{1,3}(?:,\d{3})+(?:\.\d+)?$/.test(comma);
    const nearest = thousands ? comma.replaceAll(',', '') : comma.split(',').length === 2 ? comma.replace(',', '.') : undefined;
    throw refuse(text, start, comma.length, `"${comma}" is not a number here: the decimal sign is the point, and digits are not grouped by commas`, thousands && comma.split(',').length === 2 ? `${comma.replace(',', '.')} or ${nearest}` : nearest);
  }
  const found = at(number, text, start);
  if (found === undefined) {
    const word = /^\S{1,40}/.exec(text.slice(start))?.[0] ?? '';
    throw refuse(text, start, word.length, word === '' ? 'a number is missing' : `"${word}" is not a number`);
  }
  const after = text.slice(start + found.length);
  const hex = /^[xXbBoO][0-9A-Fa-f]+/.exec(after)?.[0];
  if (/^[+-]?0$/.test(found) && hex !== undefined) throw refuse(text, start, found.length + hex.length, `"${found}${hex}" is not a decimal number`);
  if (/^[\d.](?!\.)/.test(after) && !after.startsWith('..')) throw refuse(text, start, found.length + 1, `"${(found + after).slice(0, 30)}" is not a number`);
  const grouped = /^ \d{3}(?!\d)/.exec(after)?.[0];
  if (grouped !== undefined) throw refuse(text, start, found.length + grouped.length, `"${found}${grouped}" is two numbers`, `${found}${grouped.slice(1)}`);
  const below = /^ {0,3}\/ {0,3}(\d{1,6})(?![\d.^])/.exec(after);
  if (below !== null && Number(below[1]) > 0) throw refuse(text, start, found.length + below[0].length, `"${found}${below[0]}" is a fraction: write it as a decimal number`, String(Number((Number(found) / Number(below[1])).toPrecision(6))));
  const value = Number(found.replace(/[\u00a0\u2000-\u200a\u202f]/g, ''));
  if (!Number.isFinite(value)) throw refuse(text, start, found.length, `"${found}" is beyond the range of numbers`);
  if (value === 0 && /[1-9]/.test(found.split(/[eE]/)[0] as string)) throw refuse(text, start, found.length, `"${found}" is too small to be told from zero`);
  return { value, at: start, length: found.length };
}

/**
 * A number without the last digit's noise of binary arithmetic: 0.0011000000000000001 is 0.0011.
 *
 * @param value  any number
 * @returns      the decimal of at most 13 digits where it differs by rounding alone, else the number itself
 */
export function clean(value: number): number {
  const short = Number(value.toPrecision(13));
  return Math.abs(short - value) <= 4.5e-16 * Math.abs(value) ? short : value;
}
