import { Problem } from '../problems/index.ts';
import { dimensionless, dimensionText, sameDimension } from './dimension.ts';
import { clean } from './number-text.ts';
import type { QuantityText, Side } from './quantity-text.ts';
import type { Unit } from './unit-text.ts';
import type { Wanted, WantedUnit } from './wanted.ts';

/** The problem of a text that is not what is wanted; the mark stands under the unit, or the number where there is none. */
export function refuse(code: string, text: string, wanted: WantedUnit, says: string, side?: Side, nearest?: string): Problem {
  const length = side === undefined ? text.length : side.unit === '' ? side.length : side.unit.length;
  const at = side === undefined ? 0 : side.unit === '' ? side.at : side.unitAt;
  const named = `${/^[aeio]/i.test(wanted.name) ? 'an' : 'a'} ${wanted.name}`;
  return new Problem({ code, message: `"${text}" is not ${named}: ${says}`, expected: `${named}, for example ${wanted.examples()}`, ...(nearest === undefined ? {} : { nearest }), at, length: Math.max(1, length) });
}

/** Refuses a unit or a word that does not fit what is wanted. */
export function checked(parts: QuantityText, side: Side, found: Unit, text: string, wanted: WantedUnit): void {
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
export function share(parts: QuantityText, text: string, want: Wanted, wanted: WantedUnit): { value: number; share: 'value' | 'change' } | undefined {
  const { from, to, spread, words } = parts;
  const temperature = wanted.kind === 'temperature' || wanted.kind === 'temperatureDifference';
  const isShare = from.unit === '%' || words.of !== undefined;
  if (!isShare || (sameDimension(wanted.dimension, dimensionless) && words.of === undefined)) return undefined;
  if (spread !== undefined && words.of !== undefined) return undefined;
  if (words.of === 'value' && temperature) throw threeReadings(text, from, want);
  if (want.orShare && (words.of !== undefined || !temperature) && to === undefined && spread === undefined && from.unit === '%') {
    if (from.value < 0) throw refuse('unreadable-quantity', text, wanted, 'a share below zero', from);
    return { value: clean(from.value / 100), share: words.of ?? 'value' };
  }
  if (temperature && words.of === undefined) throw threeReadings(text, from, want);
  return undefined;
}

/** A bare % of a temperature is refused: of the kelvin value, of the number in degC, or of a difference. */
function threeReadings(text: string, side: Side, want: Wanted): Problem {
  return new Problem({
    code: 'percent-of-temperature',
    message: `"${text}" has three readings: a share of the kelvin value, of the number in degC, or of a temperature difference`,
    expected: want.orShare ? 'a difference such as 1 K, or "5 % of change"' : 'a difference such as +/- 1 K',
    at: side.at,
    length: Math.max(side.length, side.unitAt + side.unit.length - side.at),
  });
}

/** Refuses what cannot be: below absolute zero, below vacuum, a share beyond the whole. */
export function physical(value: number, text: string, wanted: WantedUnit, side: Side): void {
  const whole: Side = { ...side, unit: '' };
  if (!Number.isFinite(value)) throw refuse('not-a-number', text, wanted, 'beyond the range of numbers', whole);
  if (wanted.kind === 'temperature' && value < 0) throw refuse('below-absolute-zero', text, wanted, 'below absolute zero', whole);
  if (wanted.kind === 'pressure' && value < 0) throw refuse('below-vacuum', text, wanted, 'below vacuum', whole);
  if (wanted.kind === 'fraction' && !(value >= 0 && value <= 1)) throw refuse('not-a-share', text, wanted, 'a share lies between 0 and 1', whole, side.unit === '' && value <= 100 && value > 1 ? `${side.value} %` : undefined);
}

