import { Problem } from '../problems/index.ts';
import { clean } from './number-text.ts';
import type { Side } from './quantity-text.ts';
import type { Unit } from './unit-text.ts';

/** How far a quantity may be off: a 95 % half-width, or half the distance between bounds. */
export interface Spread {
  /** [SI] */
  readonly half: number;
  /** Share of the value as written, where it was written so (of a gauge pressure: of the gauge value). */
  readonly relative?: number;
  readonly bounds: boolean;
}

export interface SpreadText {
  readonly text: string;
  readonly spread: Side;
  /** Nominal value [SI] that a share is taken of. */
  readonly value: number;
  /** The side that brings the unit of the nominal value. */
  readonly nominalUnit: Side;
  readonly ofWhat: 'change' | 'value' | undefined;
  readonly bounds: boolean;
  readonly temperature: boolean;
  readonly unitOf: (side: Side) => Unit;
  readonly scale: (unit: Unit) => number;
  readonly fits: (unit: Unit) => boolean;
}

function refuse(code: string, s: SpreadText, says: string, expected: string): Problem {
  const length = Math.max(s.spread.length, s.spread.unitAt + s.spread.unit.length - s.spread.at);
  return new Problem({ code, message: `the spread in "${s.text}" ${says}`, expected, at: s.spread.at, length });
}

/**
 * The spread behind `+/-`: a number in the unit of the value (`0.02`, `0.02 m/s`), or a share of it (`5 %`).
 *
 * @param s  the parts of the text and how units are looked up
 * @returns  half-width [SI], the share where one was written
 * @throws   {Problem} percent-of-temperature, ambiguous-spread, wrong-dimension, negative-spread
 */
export function spreadOf(s: SpreadText): Spread {
  const { spread, value, nominalUnit } = s;
  if (!(spread.value >= 0)) throw refuse('negative-spread', s, 'is below zero', 'a half-width of zero or more');
  if (s.ofWhat === 'change') throw refuse('ambiguous-spread', s, 'is a share of a change that is not known here', 'a half-width in the unit of the value');
  if (spread.unit === '%' && nominalUnit !== spread) {
    if (s.temperature) throw refuse('percent-of-temperature', s, 'has three readings: a share of the kelvin value, of the number in degC, or of a temperature difference', 'a half-width such as +/- 1 K');
    if (nominalUnit.unit === '%' && s.ofWhat !== 'value') throw refuse('ambiguous-spread', s, 'has two readings: percentage points or a share of the value', 'for example "45 +/- 2 %" for points, "45 % +/- 5 % of value" for a share');
    const relative = clean(spread.value / 100);
    return { half: clean(Math.abs(value) * relative), relative, bounds: s.bounds };
  }
  if (s.ofWhat === 'value') throw refuse('unreadable-quantity', s, 'is not a share', 'for example +/- 5 % of value');
  const found = s.unitOf(spread.unit === '' ? nominalUnit : spread);
  if (!s.fits(found)) throw refuse('wrong-dimension', s, `has another dimension than the value`, `a half-width in ${nominalUnit.unit === '' ? 'plain numbers' : nominalUnit.unit}, or in %`);
  return { half: clean(spread.value * s.scale(found)), bounds: s.bounds };
}
