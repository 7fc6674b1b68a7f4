import { Problem } from '../problems/index.ts';
import { phrases, qualifiers } from './phrases.ts';

/** A piece of a unit's text. `value` is the number of a factor or exponent. */
export interface UnitToken {
  readonly kind: 'name' | 'number' | 'power' | 'times' | 'slash' | 'open' | 'close';
  readonly text: string;
  readonly at: number;
  readonly length: number;
  readonly value?: number;
}

const names = /[mc]?mH2O|inH2O|ftH2O|Nm3|Sm3|[A-Za-z%°ºΩÅ‰Δ][A-Za-z_°ºΩÅΔ]*%?/y;
const bracketed = / {0,3}\(([A-Za-z]{1,16})\)/y;
const plainPower = /(?:\^|\*\*) {0,3}([+-]?) {0,3}(?:(\d{1,3}(?:\.\d{1,6})?)|n)/y;
const bracketPower = /(?:\^|\*\*) {0,3}\( {0,3}([+-]?) {0,3}(?:(\d{1,3}(?:\.\d{1,6})?)(?: {0,3}\/ {0,3}(\d{1,3}))?|n(?: {0,3}([+-]) {0,3}(\d{1,3}(?:\.\d{1,6})?))?) {0,3}\)/y;
const attached = /[+-]?\d{1,2}(?![\d.])/y;
const raised = /[⁺⁻]?[⁰¹²³⁴-⁹]{1,2}|[⁻]?ⁿ/y;
const tens = /10(?=\^|\*\*|[⁺⁻⁰¹²³⁴-⁹])|1(?![\d.])/y;
const signs = new Map<string, UnitToken['kind']>([['*', 'times'], ['·', 'times'], ['×', 'times'], ['⋅', 'times'], ['.', 'times'], ['/', 'slash'], ['÷', 'slash'], ['(', 'open'], [')', 'close']]);
const superscripts = '⁰¹²³⁴⁵⁶⁷⁸⁹';

function match(pattern: RegExp, text: string, at: number): RegExpExecArray | undefined {
  pattern.lastIndex = at;
  return pattern.exec(text) ?? undefined;
}

/** Signs that look alike, each replaced by one character, so that positions stay. Spaces between digits stay what they are. */
export function plainSigns(text: string): string {
  return text.replace(/[µμ]/g, 'u').replace(/\u2126/g, 'Ω').replace(/\u212b/g, 'Å').replace(/[\u2212\u2010-\u2013](?=[\s\d.])/g, '-').replace(/(?<!\d)[\t\u00a0\u2000-\u200a\u202f]|[\t\u00a0\u2000-\u200a\u202f](?!\d)/g, ' ');
}

function fail(text: string, at: number, length: number, says: string): Problem {
  return new Problem({ code: 'unreadable-unit', message: `"${text}" is not a unit: ${says}`, expected: 'for example kg/m^3, W/(m2 K), m2/s, Pa s', at, length });
}

function exponent(text: string, at: number, afterName: boolean, n: number | undefined): { value: number; length: number } | undefined {
  const needsN = (sign: number, add: number, length: number): { value: number; length: number } => {
    if (n === undefined || !Number.isFinite(n)) throw new Problem({ code: 'exponent-missing', message: `"${text}" needs the exponent n, and none is given`, expected: 'the flow index beside it, for example index: 0.6', at, length });
    return { value: sign * n + add, length };
  };
  const hat = match(bracketPower, text, at) ?? match(plainPower, text, at);
  if (hat !== undefined) {
    const sign = hat[1] === '-' ? -1 : 1;
    if (hat[2] === undefined) return needsN(sign, hat[5] === undefined ? 0 : Number(`${hat[4]}${hat[5]}`), hat[0].length);
    return { value: (sign * Number(hat[2])) / Number(hat[3] ?? 1), length: hat[0].length };
  }
  const high = match(raised, text, at);
  if (high !== undefined) {
    const sign = high[0].startsWith('⁻') ? -1 : 1;
    if (high[0].endsWith('ⁿ')) return needsN(sign, 0, high[0].length);
    return { value: sign * Number(high[0].replace(/[⁺⁻]/g, '').replace(/./g, (c) => String(superscripts.indexOf(c)))), length: high[0].length };
  }
  const low = afterName ? match(attached, text, at) : undefined;
  return low === undefined ? undefined : { value: Number(low[0]), length: low[0].length };
}

/** The name at a place: a phrase of words, else one word, with a qualifier in brackets behind it. */
function nameAt(text: string, at: number): { name: string; length: number } | undefined {
  const phrase = phrases.find(([words]) => text.startsWith(words, at) && !/[A-Za-z]/.test(text[at + words.length] ?? ' '));
  const word = match(names, text, at)?.[0];
  if (phrase === undefined && word === undefined) return undefined;
  const name = phrase?.[1] ?? word ?? '';
  const length = (phrase?.[0] ?? word ?? '').length;
  const behind = match(bracketed, text, at + length);
  const qualifier = qualifiers.get(behind?.[1] ?? '');
  return behind === undefined || qualifier === undefined || name.includes('(') ? { name, length } : { name: `${name}(${qualifier})`, length: length + behind[0].length };
}

/**
 * The pieces of a unit's text.
 *
 * @param written    the text, at most 200 characters
 * @param exponentN  what n stands for in an exponent
 * @returns          names, powers, signs and brackets with their places
 * @throws           {Problem} unreadable-unit, exponent-missing
 */
export function unitTokens(written: string, exponentN?: number): readonly UnitToken[] {
  if (written.length > 200) throw fail(`${written.slice(0, 40)}...`, 0, written.length, 'it is longer than 200 characters');
  const text = plainSigns(written);
  const out: UnitToken[] = [];
  let at = 0;
  const push = (kind: UnitToken['kind'], length: number, value?: number, name = text.slice(at, at + length)): void => {
    out.push({ kind, text: name, at, length, ...(value === undefined ? {} : { value }) });
    at += length;
  };
  while (at < text.length) {
    const c = text[at] as string;
    const last = out.at(-1)?.kind;
    if (c === ' ') {
      at++;
      continue;
    }
    if (last === 'name' || last === 'close' || last === 'number') {
      const power = exponent(text, at, last === 'name' && text[at - 1] !== ' ', exponentN);
      if (power !== undefined) {
        if (Math.abs(power.value) > 30 || !Number.isFinite(power.value)) throw fail(written, at, power.length, 'an exponent beyond 30');
        push('power', power.length, power.value);
        continue;
      }
    }
    const found = nameAt(text, at);
    const number = match(tens, text, at)?.[0];
    if (found?.name === 'per' || found?.name === 'x') push(found.name === 'per' ? 'slash' : 'times', found.length);
    else if (found !== undefined) push('name', found.length, undefined, found.name);
    else if (number !== undefined) push('number', number.length, Number(number));
    else if (signs.has(c)) push(signs.get(c) as UnitToken['kind'], 1);
    else if (c === '-' && last === 'name' && /[A-Za-z]/.test(text[at + 1] ?? '')) push('times', 1);
    else throw fail(written, at, 1, `"${c}" does not belong in it`);
  }
  return out;
}
