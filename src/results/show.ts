import { dimensionText, printNumber } from '../units/index.ts';
import { isTemperature, type Head } from './header.ts';

/** A value of a column in the unit of its header. */
export function showValue(head: Head, value: number, digits = 5): string {
  return printNumber({ value, unit: dimensionText(head.unit.dimension), toUnit: head.unitText, digits, difference: !isTemperature(head) });
}

/** A difference of two values of a column, in the unit of its header; kelvin for degC. */
export function showDifference(head: Head, value: number, digits = 3): string {
  const toUnit = head.unitText === 'degC' ? 'K' : head.unitText;
  return printNumber({ value, unit: dimensionText(head.unit.dimension), toUnit, digits, difference: true });
}

/** A share in per cent. */
export function showShare(value: number, digits = 3): string {
  return printNumber({ value, unit: '1', toUnit: '%', digits });
}

/** A plain number. */
export function showNumber(value: number, digits = 3): string {
  return printNumber({ value, unit: '1', digits });
}

/** A count of cells, to two digits. */
export function showCount(value: number): string {
  const rounded = Number(value.toPrecision(2));
  return rounded < 1e5 ? String(rounded) : showNumber(rounded, 2);
}
