import { digitsBorne, inDigits, share } from './digits.ts';
import { displayUnit, prettyUnit } from './display-unit.ts';
import { turns } from './turns.ts';
import { unit } from './unit-text.ts';

/** A number to print. Low and high are its spread; a spread given as `half` stands for value - half and value + half. */
export interface Printing {
  /** [SI] */
  readonly value: number;
  /** SI unit of the value; `1` for a plain number. */
  readonly unit: string;
  readonly low?: number;
  readonly high?: number;
  readonly half?: number;
  /** Unit to show; otherwise the SI unit, with a prefix that suits. */
  readonly toUnit?: string;
  /** The value in K is a difference: no zero of a scale is taken off. */
  readonly difference?: boolean;
  /** Significant digits where no spread limits them; 4 unless given. With a spread the most that are shown, 6 unless given. */
  readonly digits?: number;
  /** False keeps the SI unit without prefix. */
  readonly prefixes?: boolean;
  /** Signs beyond ASCII: µ, ², °C, ±, ×10⁻⁵. */
  readonly unicode?: boolean;
}

/** The pieces of a printed number, for tables. */
export interface NumberParts {
  readonly number: string;
  /** Empty for a plain number. */
  readonly unit: string;
  /** `+/- 5 %`, `+/- 0.5 K`, `+/- factor 2`; empty where there is none. */
  readonly spread: string;
}

/**
 * A value in SI as a number in another unit.
 *
 * @param value       [SI]
 * @param unitText    the unit wanted
 * @param difference  a temperature difference: degC and degF without their zero
 * @returns           the number in that unit
 * @throws            {Problem} unknown-unit
 * @example           fromSI(338.15, 'degC') // 65
 */
export function fromSI(value: number, unitText: string, difference = false): number {
  const to = unit(unitText);
  return (value - (difference ? 0 : to.offset)) / to.factor;
}

/**
 * The pieces of a number with its unit and spread, with no more digits than the spread bears.
 *
 * @param printing  value, unit, spread and how to show them
 * @returns         number, unit and spread as text
 * @throws          {Problem} unknown-unit
 */
export function numberParts(printing: Printing): NumberParts {
  const { value, unicode = false, difference = false } = printing;
  if (Number.isNaN(value)) return { number: 'not a number', unit: '', spread: '' };
  const from = unit(printing.unit);
  const shownUnit = printing.toUnit ?? (printing.prefixes === false ? printing.unit : displayUnit(value, printing.unit));
  const to = unit(shownUnit);
  const name = prettyUnit(shownUnit, unicode);
  if (!Number.isFinite(value)) return { number: value > 0 ? 'infinite' : '-infinite', unit: '', spread: '' };
  const factor = (from.factor * turns(from, to)) / to.factor;
  const offset = difference ? 0 : to.offset / to.factor;
  const shown = value * factor - offset;
  const low = printing.low ?? (printing.half === undefined ? undefined : value - printing.half);
  const high = printing.high ?? (printing.half === undefined ? undefined : value + printing.half);
  if (low === undefined || high === undefined || !(high > low)) return { number: inDigits(shown, printing.digits ?? 4, undefined, unicode), unit: name, spread: '' };
  const half = Math.abs((high - low) * factor) / 2;
  const place = digitsBorne(shown, half, printing.digits ?? 6);
  const number = inDigits(shown, printing.digits ?? 6, place, unicode);
  const scale = from.dimension[3] === 1 && from.dimension.every((exponent, i) => i === 3 || exponent === 0);
  if (scale || !(low > 0 && value > 0)) {
    const halfUnit = to.offset === 0 || difference ? name : unicode ? 'K' : shownUnit === 'degC' ? 'K' : `${name} difference`;
    const text = inDigits(half, 2, Math.min(place, Math.floor(Math.log10(half))), unicode);
    return { number, unit: name, spread: `${unicode ? '±' : '+/-'} ${text}${halfUnit === name || halfUnit === '' ? '' : ` ${halfUnit}`}` };
  }
  const apart = Math.sqrt(high / low);
  if (high / value > 1.5) return { number, unit: name, spread: `${unicode ? '×/÷' : '+/- factor'} ${inDigits(apart, 2, undefined, unicode)}` };
  return { number, unit: name, spread: `${unicode ? '±' : '+/-'} ${share(half / Math.abs(shown))} %` };
}

/**
 * The one function that prints a number with unit and spread: `23 um`, `26.4 kW +/- 2 %`, `65.0 +/- 0.5 degC`, `2300 W +/- factor 2`.
 *
 * @param printing  value in SI, its SI unit, spread, the unit to show
 * @returns         one line of text
 * @throws          {Problem} unknown-unit
 * @example         printNumber({ value: 2.3e-5, unit: 'm' }) // '23 um'
 */
export function printNumber(printing: Printing): string {
  const { number, unit: name, spread } = numberParts(printing);
  const withUnit = (text: string): string => (name === '' ? text : name === '%' ? `${text} %` : `${text} ${name}`);
  if (spread === '') return withUnit(number);
  const absolute = /^(?:\+\/-|±) [^ ]+$/.test(spread);
  return absolute ? withUnit(`${number} ${spread}`) : `${withUnit(number)} ${spread}`;
}
