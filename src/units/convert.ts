import { Problem } from '../problems/index.ts';
import { sameDimension } from './dimension.ts';
import { clean } from './number-text.ts';
import { atmosphere, readQuantity } from './quantity.ts';
import { quantityText, takeWords } from './quantity-text.ts';
import { unit } from './unit-text.ts';

/** A quantity in another unit. */
export interface Converted {
  readonly value: number;
  /** The unit as asked for. */
  readonly unit: string;
  /** Half-width of the spread in that unit, where the text had one. */
  readonly half?: number;
  /** Readings that were chosen, one sentence each. */
  readonly assumed: readonly string[];
}

/** Whether the text says a temperature difference: by the word, or by a unit such as dK. */
function saysDifference(text: string): boolean {
  const { from, to, spread, words } = quantityText(text);
  const written = (to ?? from).unit === '' ? (spread?.unit ?? '') : (to ?? from).unit;
  return words.difference === true || unit(written).difference;
}

const states = { normal: { temperature: 273.15, says: '0 degC and 101 325 Pa (DIN 1343)' }, standard: { temperature: 288.15, says: '15 degC and 101 325 Pa (ISO 13443)' } } as const;

/** What a flow counted at one reference state is multiplied with to count at another; both have the same pressure, so that only the temperatures differ. */
function countedAt(text: string, from: 'normal' | 'standard' | undefined, to: 'normal' | 'standard' | undefined): { factor: number; assumed: string[] } {
  if (from === to) return { factor: 1, assumed: from === undefined ? [] : [`${from} counts at ${states[from].says}`] };
  if (from === undefined || to === undefined) {
    const said = (from ?? to) as 'normal' | 'standard';
    throw new Problem({ code: 'no-reference-state', message: from === undefined ? `"${text}" does not say at which state it is, and ${said} counts at ${states[said].says}` : `"${text}" counts at ${states[said].says}; at another state it depends on temperature and pressure`, expected: `both normal or standard, such as "30 m^3/h ${said}" in "L/min ${said}"; a case takes inlet.volumeFlow as it is, and runbrief trace CASE volumeFlow shows it at the state of the inlet` });
  }
  return { factor: states[to].temperature / states[from].temperature, assumed: [`normal counts at ${states.normal.says}`, `standard counts at ${states.standard.says}`, 'the gas is ideal between the two'] };
}

/**
 * A quantity in another unit. Temperatures keep their zero (`20 degC` in degF), differences do not (`50 K difference` in
 * `degF difference`, `10 dK`); a gauge pressure becomes absolute unless the target says gauge.
 *
 * @param text    a quantity, such as `12 gal/min`, `2 barg`, `50 K difference`
 * @param toUnit  the unit wanted, with gauge, abs or difference behind it where that matters
 * @returns       the number in that unit, and what was assumed
 * @throws        {Problem} of the readers of quantities and units; wrong-dimension where the two do not fit
 * @example       convert('12 gal/min', 'L/s').value // 0.757082
 */
export function convert(text: string, toUnit: string): Converted {
  const { rest, words } = takeWords(toUnit.slice(0, 201), toUnit, {});
  const bare = rest.trim();
  const name = words.difference === true && (bare === 'C' || bare === 'F') ? `deg${bare}` : bare;
  const to = unit(name);
  const temperature = sameDimension(to.dimension, [0, 0, 0, 1, 0, 0, 0]);
  const given = temperature && saysDifference(text);
  const wanted = temperature && (words.difference === true || to.difference);
  const kind = temperature ? (given || wanted ? 'temperatureDifference' : 'temperature') : words.gauge || words.absolute ? 'pressure' : 'plain';
  const quantity = readQuantity(text, { unit: name, dimension: to.dimension, kind, name: `quantity in ${name === '' ? '1' : name}` });
  if (wanted && !given && unit(quantity.unit).offset !== 0) throw new Problem({ code: 'temperature-for-difference', message: `"${text}" is a temperature, "${toUnit}" a difference`, expected: `a difference, for example "${text.trim()} difference"` });
  const counted = countedAt(text, quantity.reference, words.reference);
  const offset = given || wanted ? 0 : to.offset;
  return {
    value: clean(((quantity.value - (words.gauge ? atmosphere : 0) - offset) * counted.factor) / to.factor),
    unit: toUnit,
    ...(quantity.spread === undefined ? {} : { half: clean((quantity.spread.half * counted.factor) / to.factor) }),
    assumed: [...new Set([...quantity.assumed, ...to.assumed, ...counted.assumed])],
  };
}
