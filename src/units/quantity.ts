import { Problem, type ProblemData } from '../problems/index.ts';
import { dimensionless, sameDimension } from './dimension.ts';
import { clean } from './number-text.ts';
import { checked, physical, refuse, share } from './quantity-checks.ts';
import { quantityText, type Side, type Words } from './quantity-text.ts';
import { type Spread, spreadOf } from './spread-text.ts';
import { turns } from './turns.ts';
import { type Unit, unit } from './unit-text.ts';
import { type Wanted, wantedUnit } from './wanted.ts';

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
  if (asShare !== undefined) return { ...asShare, unit: '%', assumed: [] };
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
  if (words.bounds && end === undefined && spread === undefined) throw refuse('unreadable-quantity', text, wanted, 'bounds are said of a range or a spread');
  const bounds = words.bounds === true;
  const half =
    spread === undefined
      ? bounds && end !== undefined && { half: clean((end - from) / 2), bounds }
      : spreadOf({
          text,
          spread,
          value: words.gauge ? value - atmosphere : value,
          nominalUnit: lent,
          ofWhat: words.of,
          bounds,
          temperature: wanted.kind === 'temperature' || wanted.kind === 'temperatureDifference',
          unitOf: (side) => unitOf(side, want, words),
          scale: (found) => found.factor * turns(found, wanted),
          fits: (found) => sameDimension(found.dimension, wanted.dimension) && found.byte === wanted.byte,
        });
  return {
    value,
    unit: lent.unit,
    ...(half ? { spread: half } : {}),
    ...(end === undefined ? {} : { range: { from, to: end, bounds: bounds && spread === undefined } }),
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
