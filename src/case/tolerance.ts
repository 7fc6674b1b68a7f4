import { Problem, type ProblemData } from '../problems/index.ts';
import { dimensionOf, dimensionText, readQuantity, sameDimension } from '../units/index.ts';
import type { Tolerance, Value } from './entry.ts';

const kelvin = [0, 0, 0, 1, 0, 0, 0] as const;
const expected = 'a difference such as 1 K or 5 Pa, a share such as 5 %, or "5 % of change"';

/** Whether the quantity asked for is one of the temperatures, of which a bare % says nothing: `outletTemperature`, `outlet temperature`. */
function isTemperature(quantity: string, temperatures: readonly string[]): boolean {
  const plain = quantity.toLowerCase().replace(/[ -]/g, '');
  return temperatures.some((id) => id.toLowerCase() === plain);
}

/**
 * The tolerance of a target: `1 K`, `5 %`, `5 % of change`, `0.02`.
 *
 * @param text          as written
 * @param quantity      what the target asks for; decides whether a bare % can be read
 * @param temperatures  quantities of which it cannot
 * @returns             a share with `share` set, else a difference in its SI unit
 * @throws              {Problem} percent-of-temperature, not-positive and those of readQuantity
 */
export function readTolerance(text: string, quantity: string, temperatures: readonly string[]): Value {
  if (text.length > 200) throw new Problem({ code: 'wrong-tolerance', message: 'a tolerance longer than 200 characters', expected });
  if (/\.\.|±|\+\/?-/.test(text)) throw new Problem({ code: 'wrong-tolerance', message: `"${text.slice(0, 80)}" is a range or has a spread`, expected });
  const plain = /%\s*$|% +of\b/.test(text) ? undefined : unitBehind(text);
  const temperature = isTemperature(quantity, temperatures) || (plain !== undefined && sameDimension(plain, kelvin));
  const read = readQuantity(text, temperature ? { unit: 'K', kind: 'temperatureDifference', orShare: true } : plain === undefined ? { unit: 'm', orShare: true, name: 'tolerance' } : { dimension: plain, name: 'tolerance' });
  if (!(read.value > 0)) throw new Problem({ code: 'not-positive', message: `"${text}" is not above zero`, expected });
  if (read.share !== undefined) return { kind: 'quantity', value: read.value, unit: '1', writtenUnit: read.unit, share: read.share, assumed: read.assumed };
  return { kind: 'quantity', value: read.value, unit: temperature ? 'K' : dimensionText(plain ?? kelvin), writtenUnit: read.unit, assumed: read.assumed };
}

/** Dimension of the unit behind the first number. */
function unitBehind(text: string): ReturnType<typeof dimensionOf> {
  const found = /^\s*[+-]?[\d.]+(?:e[+-]?\d+)?\s*(.*?)\s*(?:difference|diff)?$/is.exec(text);
  if (found === null) throw new Problem({ code: 'wrong-tolerance', message: `"${text.slice(0, 80)}" is no tolerance`, expected });
  try {
    return dimensionOf(found[1] as string);
  } catch (error) {
    if (!(error instanceof Problem)) throw error;
    const before = text.lastIndexOf(found[1] as string);
    throw new Problem(error.list.map((one): ProblemData => ({ ...one, at: before + (one.at ?? 0) })));
  }
}

/** The tolerance in the form of a target. */
export function toleranceOf(value: Pick<Value, 'value' | 'unit' | 'share'>, written: string): Tolerance {
  const number = value.value as number;
  if (value.share === 'change') return { ofChange: number, written };
  return value.share === 'value' ? { relative: number, written } : { absolute: number, ...(value.unit === undefined ? {} : { unit: value.unit }), written };
}
