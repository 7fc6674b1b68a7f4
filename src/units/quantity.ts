import { Problem, type ProblemData } from '../problems/index.ts';
import { dimensionless, dimensionText, sameDimension } from './dimension.ts';
import { clean } from './number-text.ts';
import { type QuantityText, quantityText, type Side, type Words } from './quantity-text.ts';
import { type Spread, spreadOf } from './spread-text.ts';
import { turns } from './turns.ts';
import { type Unit, unit } from './unit-text.ts';
import { type Wanted, type WantedUnit, wantedUnit } from './wanted.ts';

/** Standard atmosphere [Pa] that gauge pressures count from (CGPM 1954). */
export const atmosphere = 101325;

/** A quantity read from text, in SI. */
export interface Quantity {
  /** Nominal value [SI]; the middle of a range; the share itself where `share` is set. */
  readonly value: number;
  /** The unit as written, without the words behind it. */
  readonly unit: string;
  readonly spread?: Spread;
  /** Operating range, or with `bounds` the limits of ignorance [SI]. */
  readonly range?: { readonly from: number; readonly to: number; readonly bounds: boolean };
  /** The text said gauge; `value` is absolute. */
  readonly gauge?: true;
  /** A temperature difference, not a temperature. */
  readonly difference?: true;
  readonly basis?: 'mol' | 'mass' | 'vol';
  /** A volume flow counted at normal or standard conditions. */
  readonly reference?: 'normal' | 'standard';
  /** The text is a share of the value or of its change. */
  readonly share?: 'value' | 'change';
  /** What the text left open and how it was read. */
  readonly assumed: readonly string[];
}

/** Places a unit's problem, found within its own text, in the text of the whole quantity. */
function unitOf(side: Side, want: Wanted, words: Words): Unit {
  const degree = words.difference === true && (side.unit === 'C' || side.unit === 'F');
  try {
    return unit(degree ? `deg${side.unit}` : side.unit, want.exponentN);
  } catch (error) {
    if (!(error instanceof Problem)) throw error;
    throw new Problem(error.list.map((one): ProblemData => ({ ...one, at: side.unitAt + (one.at ?? 0) })));
  }
}

function refuse(code: string, text: string, wanted: WantedUnit, says: string, side?: Side, nearest?: string): Problem {
  const length = side === undefined ? text.length : side.unit === '' ? side.length : side.unit.length;
  const at = side === undefined ? 0 : side.unit === '' ? side.at : side.unitAt;
  return new Problem({ code, message: `"${text}" is not a ${wanted.name}: ${says}`, expected: `a ${wanted.name}, for example ${wanted.examples}`, ...(nearest === undefined ? {} : { nearest }), at, length: Math.max(1, length) });
}

function checked(parts: QuantityText, side: Side, found: Unit, text: string, wanted: WantedUnit): void {
  if (side.unit === '' && !sameDimension(wanted.dimension, dimensionless)) throw refuse('unit-missing', text, wanted, 'the unit is missing', side);
  if (side.unit === '' && wanted.byte !== 0) throw refuse('unit-missing', text, wanted, 'the unit is missing', side);
  if (!sameDimension(found.dimension, wanted.dimension) || found.byte !== wanted.byte) {
    const is = (one: Pick<Unit, 'dimension' | 'byte'>): string => (one.byte !== 0 ? 'of bytes' : sameDimension(one.dimension, dimensionless) ? 'of a plain number' : dimensionText(one.dimension));
    throw refuse('wrong-dimension', text, wanted, `${side.unit === '' ? 'it' : `"${side.unit}"`} has the dimension ${is(found)}, wanted is ${is(wanted)}`, side);
  }
  const isDifference = parts.words.difference === true || found.difference;
  if (wanted.kind === 'temperature' && isDifference) throw refuse('difference-for-temperature', text, wanted, 'it is a temperature difference', side, `${side.value} K`);
  if (parts.words.difference && wanted.kind === 'plain' && !sameDimension(found.dimension, [0, 0, 0, 1, 0, 0, 0])) throw refuse('unreadable-quantity', text, wanted, 'the word difference belongs to temperatures');
  const pressureWords = parts.words.gauge ?? parts.words.absolute;
  if (pressureWords && !sameDimension(found.dimension, [1, -1, -2, 0, 0, 0, 0])) throw refuse('unreadable-quantity', text, wanted, 'gauge and absolute belong to pressures');
  if (pressureWords && wanted.kind === 'pressureDifference') throw refuse('pressure-for-difference', text, wanted, 'a pressure difference is neither gauge nor absolute');
  if (parts.words.reference && !sameDimension(found.dimension, [0, 3, -1, 0, 0, 0, 0])) throw refuse('unreadable-quantity', text, wanted, 'normal and standard belong to volume flows');
}

/** A share in place of the quantity: `5 %`, `5 % of change`. */
function share(parts: QuantityText, text: string, want: Wanted, wanted: WantedUnit): Quantity | undefined {
  const { from, to, spread, words } = parts;
  const temperature = wanted.kind === 'temperature' || wanted.kind === 'temperatureDifference';
  const isShare = from.unit === '%' || words.of !== undefined;
  if (!isShare || (sameDimension(wanted.dimension, dimensionless) && words.of === undefined)) return undefined;
  if (spread !== undefined && words.of !== undefined) return undefined;
  if (words.of === 'value' && temperature) throw threeReadings(text, from, want);
  if (want.orShare && (words.of !== undefined || !temperature) && to === undefined && spread === undefined && from.unit === '%') {
    if (from.value < 0) throw refuse('unreadable-quantity', text, wanted, 'a share below zero', from);
    return { value: clean(from.value / 100), unit: '%', share: words.of ?? 'value', assumed: [] };
  }
  if (temperature && words.of === undefined) throw threeReadings(text, from, want);
  return undefined;
}

/** A bare % of a temperature is refused: of the kelvin value, of the number in degC, or of a difference. */
export function threeReadings(text: string, side: Side, want: Wanted): Problem {
  return new Problem({
    code: 'percent-of-temperature',
    message: `"${text}" has three readings: a share of the kelvin value, of the number in degC, or of a temperature difference`,
    expected: want.orShare ? 'a difference such as 1 K, or "5 % of change"' : 'a difference such as +/- 1 K',
    at: side.at,
    length: Math.max(side.length, side.unitAt + side.unit.length - side.at),
  });
}

function physical(value: number, text: string, wanted: WantedUnit, side: Side): void {
  const whole: Side = { ...side, unit: '' };
  if (!Number.isFinite(value)) throw refuse('not-a-number', text, wanted, 'beyond the range of numbers', whole);
  if (wanted.kind === 'temperature' && value < 0) throw refuse('below-absolute-zero', text, wanted, 'below absolute zero', whole);
  if (wanted.kind === 'pressure' && value < 0) throw refuse('below-vacuum', text, wanted, 'below vacuum', whole);
  if (wanted.kind === 'fraction' && !(value >= 0 && value <= 1)) throw refuse('not-a-share', text, wanted, 'a share lies between 0 and 1', whole, side.unit === '' && value <= 100 && value > 1 ? `${side.value} %` : undefined);
}

/**
 * A quantity from its text, in SI: `25 mm`, `0.40 m/s +/- 5 %`, `20 +/- 0.5 degC`, `0.2 .. 0.6 m/s`, `5 .. 12 W/(m^2 K) (bounds)`,
 * `4 bar gauge`, `0.9 % mol`, `50 K difference`, `30 m^3/h normal`.
 *
 * @param text  as written, at most 200 characters
 * @param want  what the place expects: unit or dimension, kind, a name for messages, n of `Pa s^n`, whether a share may stand there
 * @returns     value, spread and range in SI, the words that came with it, what was assumed
 * @throws      {Problem} unknown-unit, ambiguous-unit, unreadable-unit, unreadable-quantity, not-a-number, unit-missing,
 *              wrong-dimension, percent-of-temperature, ambiguous-spread, range-reversed and others, with `at` and `length` in the text
 * @example     readQuantity('25 mm', { unit: 'm' }).value // 0.025
 */
export function readQuantity(text: string, want: Wanted): Quantity {
  const wanted = wantedUnit(want);
  const parts = quantityText(text);
  const asShare = share(parts, text, want, wanted);
  if (asShare !== undefined) return asShare;
  const { words, to, spread } = parts;
  if (words.of !== undefined && spread === undefined) throw refuse('unreadable-quantity', text, wanted, 'a share does not fit here');
  const last = to ?? parts.from;
  const lent = last.unit !== '' || spread === undefined || (spread.unit === '%' && !sameDimension(wanted.dimension, dimensionless)) ? last : spread;
  const first = parts.from.unit === '' ? lent : parts.from;
  const assumed = new Set<string>();
  const isDifference = wanted.kind === 'temperatureDifference' || words.difference === true;
  const read = (side: Side, withUnit: Side): number => {
    const found = unitOf(withUnit, want, words);
    checked(parts, withUnit.unit === '' ? side : withUnit, found, text, wanted);
    for (const one of found.assumed) assumed.add(one);
    const factor = found.factor * turns(found, wanted);
    if (factor !== found.factor) assumed.add('one turn is 2 pi radians');
    else if (found.angle !== 0 && wanted.angle === 0 && sameDimension(found.dimension, [0, 0, -1, 0, 0, 0, 0])) assumed.add(`${withUnit.unit} is counted in radians per second; turns per second are Hz`);
    const offset = isDifference || found.difference ? 0 : found.offset;
    if (isDifference && !words.difference && found.offset !== 0) assumed.add(`${withUnit.unit} is read as a difference`);
    const value = clean(offset === 0 ? scaled(side.value, factor) : side.value * factor + offset) + (words.gauge ? atmosphere : 0);
    physical(value, text, wanted, side);
    return value;
  };
  const from = read(parts.from, first);
  const end = to === undefined ? undefined : read(to, lent);
  if (end !== undefined && end < from) throw refuse('range-reversed', text, wanted, 'the range ends below its beginning', undefined, to === undefined ? undefined : `${to.value} .. ${parts.from.value} ${lent.unit}`.trim());
  const value = end === undefined ? from : clean((from + end) / 2);
  if (words.gauge) assumed.add(`gauge counts from ${atmosphere} Pa: ${Number((value / 1e5).toPrecision(7))} bar absolute`);
  else if (wanted.kind === 'pressure' && !words.absolute && lent.unit !== 'atm') assumed.add('the pressure is read as absolute, as gauge is not said');
  const half = spread === undefined ? undefined : spreadOf({ text, spread, value, nominalUnit: lent, ofWhat: words.of, bounds: words.bounds === true, temperature: wanted.kind === 'temperature' || wanted.kind === 'temperatureDifference', unitOf: (side) => unitOf(side, want, words), scale: (found) => found.factor * turns(found, wanted), fits: (found) => sameDimension(found.dimension, wanted.dimension) && found.byte === wanted.byte });
  const bounds = words.bounds === true && end !== undefined;
  return {
    value,
    unit: lent.unit,
    ...(half !== undefined ? { spread: half } : bounds ? { spread: { half: clean(((end as number) - from) / 2), bounds: true } } : {}),
    ...(end === undefined ? {} : { range: { from, to: end, bounds } }),
    ...(words.gauge ? { gauge: true as const } : {}),
    ...(isDifference || unitOf(lent, want, words).difference ? { difference: true as const } : {}),
    ...(words.basis === undefined ? {} : { basis: words.basis }),
    ...(words.reference === undefined ? {} : { reference: words.reference }),
    assumed: [...assumed],
  };
}

/** A product that stays a short decimal where the factor is a power of ten below one. */
function scaled(value: number, factor: number): number {
  const inverse = 1 / factor;
  return factor < 1 && Number.isInteger(inverse) ? value / inverse : value * factor;
}
