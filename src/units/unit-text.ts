import { Problem } from '../problems/index.ts';
import { addDimension, dimensionless, type Dimension } from './dimension.ts';
import { type Atom, findAtom } from './lookup.ts';
import { ambiguous } from './phrases.ts';
import { unitTokens, type UnitToken } from './unit-tokens.ts';
import { unknownUnit } from './unknown-unit.ts';

/** A unit: SI value = number * factor + offset. */
export interface Unit {
  readonly factor: number;
  /** [K], not zero for degC and degF alone. */
  readonly offset: number;
  readonly dimension: Dimension;
  /** Readings that the text leaves open, as sentences without a full stop. */
  readonly assumed: readonly string[];
  /** Power of the angle in it (rad, deg, rev, rpm: 1). The factor counts radians. */
  readonly angle: number;
  /** Power of the cycle in it (Hz: 1). */
  readonly cycle: number;
  /** Power of the byte in it (GB: 1). */
  readonly byte: number;
  /** A temperature difference by name: dK, delta_degF. */
  readonly difference: boolean;
}

interface Reading {
  readonly text: string;
  readonly tokens: readonly UnitToken[];
  next: number;
  depth: number;
  readonly assumed: Set<string>;
  /** A unit of one name only may be a temperature with its own zero. */
  readonly alone: boolean;
}

const one: Unit = { factor: 1, offset: 0, dimension: dimensionless, assumed: [], angle: 0, cycle: 0, byte: 0, difference: false };

function times(a: Unit, b: Unit, power: number): Unit {
  return {
    factor: power === 1 ? a.factor * b.factor : power === -1 ? a.factor / b.factor : a.factor * b.factor ** power,
    offset: 0,
    dimension: addDimension(a.dimension, b.dimension, power),
    assumed: [],
    angle: a.angle + power * b.angle,
    cycle: a.cycle + power * b.cycle,
    byte: a.byte + power * b.byte,
    difference: false,
  };
}

function fromAtom(atom: Atom): Unit {
  return {
    ...one,
    factor: atom.factor,
    offset: atom.offset,
    dimension: atom.dimension,
    angle: atom.counts === 'angle' ? 1 : 0,
    cycle: atom.counts === 'cycle' ? 1 : 0,
    byte: atom.counts === 'byte' ? 1 : 0,
    difference: atom.counts === 'difference',
  };
}

function broken(reading: Reading, token: UnitToken | undefined, says: string): Problem {
  const at = token?.at ?? reading.text.length;
  return new Problem({ code: 'unreadable-unit', message: `"${reading.text}" is not a unit: ${says}`, expected: 'for example kg/m^3, W/(m2 K), m2/s, Pa s', at, length: Math.max(1, token?.length ?? 1) });
}

function name(reading: Reading, token: UnitToken): Unit {
  const word = token.text;
  const inCompound = !reading.alone && (word === 'C' || word === 'F');
  if (inCompound) reading.assumed.add(`${word} in "${reading.text}" is a temperature difference in deg${word}`);
  const atom = findAtom(inCompound ? `deg${word}` : word);
  if (atom === undefined || (ambiguous.has(word) && !inCompound)) throw unknownUnit(reading.text, token);
  if (atom.assumed !== undefined) reading.assumed.add(atom.assumed);
  const found = fromAtom(atom);
  return reading.alone ? found : { ...found, offset: 0 };
}

/** One name, bracket or power of ten, with its exponent. */
function factor(reading: Reading): Unit {
  const token = reading.tokens[reading.next++];
  if (token === undefined) throw broken(reading, undefined, 'something is missing at its end');
  let found: Unit;
  if (token.kind === 'open') {
    if (++reading.depth > 8) throw broken(reading, token, 'too many brackets');
    found = product(reading);
    reading.depth--;
    if (reading.tokens[reading.next++]?.kind !== 'close') throw broken(reading, token, 'this bracket is not closed');
  } else if (token.kind === 'number') {
    found = { ...one, factor: token.value as number };
  } else if (token.kind === 'name') {
    found = name(reading, token);
  } else throw broken(reading, token, `"${token.text}" stands in the wrong place`);
  const power = reading.tokens[reading.next];
  if (power?.kind !== 'power') return found;
  reading.next++;
  return times(one, found, power.value as number);
}

/** Factors up to a closing bracket or the end. All that follows a slash is divided by. */
function product(reading: Reading): Unit {
  let found = factor(reading);
  let below = 0;
  let after = 0;
  for (;;) {
    const token = reading.tokens[reading.next];
    if (token === undefined || token.kind === 'close') break;
    if (token.kind === 'times' || token.kind === 'slash') reading.next++;
    if (token.kind === 'slash') below++;
    else if (below > 0) after++;
    found = times(found, factor(reading), below > 0 ? -1 : 1);
  }
  if (below > 1 || after > 0) reading.assumed.add(`in "${reading.text}" all that follows the slash is below it: a/b c and a/b/c are read as a/(b c)`);
  return found;
}

const remembered = new Map<string, Unit>();

/**
 * A unit from its text: names with prefixes, products by a space, `.`, `*` or `·`, one slash, brackets, exponents as
 * `m2`, `m^2`, `m**2`, `m²`, `m^-1`, `s^0.6`, `s^n`. All after the first slash is divided by (`W/m2 K` is W/(m2 K)), and
 * `assumed` says so. In compound units degC and degF are differences. A C or F alone is refused.
 *
 * @param text       the unit, at most 200 characters; empty and `1` are the plain number
 * @param exponentN  the number that stands for n in an exponent (`Pa s^n`)
 * @returns          factor, offset, dimension, what was assumed
 * @throws           {Problem} unknown-unit, unreadable-unit, exponent-missing, with `at` and `length` within the text
 * @example          unit('kJ/(kg K)').factor // 1000
 */
export function unit(text: string, exponentN?: number): Unit {
  const key = `${exponentN ?? ''}|${text}`;
  const known = remembered.get(key);
  if (known !== undefined) return known;
  const tokens = unitTokens(text, exponentN);
  const reading: Reading = { text, tokens, next: 0, depth: 0, assumed: new Set(), alone: tokens.length === 1 };
  const found = tokens.length === 0 ? one : product(reading);
  if (reading.next < tokens.length) throw broken(reading, tokens[reading.next], 'a bracket closes that was not opened');
  if (!(found.factor > 0 && found.factor < Infinity)) throw broken(reading, tokens[0], 'its factor is out of the range of numbers');
  const out = { ...found, assumed: [...reading.assumed] };
  if (remembered.size > 500) remembered.clear();
  remembered.set(key, out);
  return out;
}

/** The dimension of a unit given as text. */
export function dimensionOf(text: string, exponentN?: number): Dimension {
  return unit(text, exponentN).dimension;
}
