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
  const offset = given || wanted ? 0 : to.offset;
  return {
    value: clean((quantity.value - (words.gauge ? atmosphere : 0) - offset) / to.factor),
    unit: toUnit,
    ...(quantity.spread === undefined ? {} : { half: clean(quantity.spread.half / to.factor) }),
    assumed: [...new Set([...quantity.assumed, ...to.assumed])],
  };
}
