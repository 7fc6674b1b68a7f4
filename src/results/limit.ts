import { Problem } from '../problems/index.ts';
import { readQuantity } from '../units/index.ts';
import { isTemperature, type Head } from './header.ts';

/** What a limit says of a result. */
export type Outcome = 'met' | 'missed' | 'cannot tell';

/** A half-width given as text: a share of the value, or a number in the unit of the value. */
export type Limit = { readonly relative: number } | { readonly absolute: number };

/**
 * A half-width such as `2 %`, `0.5 K`, `20 Pa` for the values of a column. A bare % of a temperature is refused.
 *
 * @param text  the limit
 * @param head  name and unit of the column that it is for
 * @param what  what it limits, for problems: `the limit`
 * @param ofRange  a share refers to the range of a profile: of a temperature it is written `5 % of change`
 * @returns     a share [1] or a half-width in SI
 * @throws      {Problem} those of readQuantity, percent-of-temperature among them; negative
 */
export function readLimit(text: string, head: Head, what: string, ofRange = false): Limit {
  const share = /%\s*$/.test(text);
  const kelvin = head.unit.dimension.every((exponent, i) => exponent === (i === 3 ? 1 : 0));
  const temperature = isTemperature(head);
  const kind = temperature || (kelvin && !share) ? 'temperatureDifference' : 'plain';
  const read = readQuantity(text, { dimension: head.unit.dimension, kind, name: `${what} for ${head.name}`, orShare: ofRange || !temperature });
  if (read.share === 'change' && !ofRange) throw new Problem({ code: 'unreadable-quantity', message: `"${text}": there is no change here that ${what} could be a share of`, expected: 'a share of the value, such as 2 %, or a half-width in its unit' });
  if (read.value < 0) throw new Problem({ code: 'negative', message: `"${text}": ${what} is below zero`, expected: 'a half-width of zero or more' });
  return read.share !== undefined || read.unit === '%' ? { relative: read.value } : { absolute: read.value };
}

/** The half-width that a limit allows around a value [unit of the value]. */
export function allowed(limit: Limit, value: number): number {
  return 'relative' in limit ? limit.relative * Math.abs(value) : limit.absolute;
}
