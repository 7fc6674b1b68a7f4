import { isTemperature } from '../quantities/index.ts';
import { fromSI, printNumber } from '../units/index.ts';
import type { Ground } from './ground.ts';
import type { PlanEffect, Price } from './types.ts';

/** A share as text: `62 %`. */
export const percent = (share: number): string => printNumber({ value: share, unit: '1', toUnit: '%', digits: 2 });

/** A plain number as text, three digits. */
export const plain = (value: number): string => printNumber({ value, unit: '1', digits: 3 });

/** A number of the graph as text in its unit; in the unit of the case where it is an entry. For words that cannot hold quantities. */
export function inWords(on: Ground, id: string, value: number | undefined = on.number(id)): string {
  if (value === undefined) return 'not known';
  const { workings, case: given } = on.assembled;
  const about = workings.slots[workings.index.get(id) ?? -1]?.node.about;
  const unit = about?.unit ?? '1';
  const temperature = unit === 'K' && isTemperature(id);
  const written = given.get(id)?.writtenUnit;
  if (temperature && written === undefined) return `${Number(fromSI(value, 'degC').toFixed(1)) + 0} degC`;
  const counted = given.get(id)?.reference;
  return `${printNumber({ value, unit, digits: 4, ...(written === undefined ? {} : { toUnit: written }) })}${counted === undefined ? '' : ` ${counted}`}`;
}

/** `a`, `a and b`, `a, b and c`. */
export function listed(words: readonly string[], last = 'and'): string {
  return words.length < 2 ? (words[0] ?? '') : `${words.slice(0, -1).join(', ')} ${last} ${words.at(-1)}`;
}

/** The name of a quantity as the definitions have it. */
export function nameOf(on: Ground, id: string): string {
  const { workings } = on.assembled;
  return workings.slots[workings.index.get(id) ?? -1]?.node.about.name ?? id;
}

/** What the case describes, with its article: `a round pipe`, `a flow known by one length and one speed`. */
export function aFlow(on: Ground): string {
  const title = on.assembled.flow.title.toLowerCase();
  return title.startsWith('a ') ? title : `a ${title}`;
}

/** A reason as a sentence of its own: capital letter and full stop. */
export const sentence = (text: string | undefined): string => (text === undefined || text === '' ? '' : `${text.charAt(0).toUpperCase()}${text.slice(1).replace(/\.$/, '')}.`);

/** Authors of a source: what stands before its title. */
export const authors = (source: string): string => source.split(/,| \(|:/)[0] as string;

/** What leaving an effect out costs, as text: `-8.4 %`, `1.6 K`, `the sign changes`. */
export function priceText(price: Price | undefined): string {
  if (price === undefined) return 'no price';
  if (price.signChange === true) return 'the sign changes';
  if (price.relative !== undefined) {
    // Beyond ten times a percentage says nothing any more.
    return Math.abs(price.relative) > 10 ? `${plain(1 + price.relative)} times` : printNumber({ value: price.relative, unit: '1', toUnit: '%', digits: 2 });
  }
  return price.value === undefined ? 'no price' : printNumber({ value: price.value, unit: price.unit ?? '1', digits: 3, ...(price.unit === 'K' ? { difference: true, toUnit: 'K' } : {}) });
}

/** Whether a price is as large as the accuracy asked of its target. */
export const beyondAccuracy = (on: Ground, price: Price | undefined): boolean => beyond(on, price, 'accuracy', 'accuracyShare');

/** Whether a price is larger than what unfinished iteration may leave in: smaller ones are not told apart from nothing. */
export const noticeable = (on: Ground, price: Price | undefined): boolean => beyond(on, price, 'iteration', 'iterationShare');

function beyond(on: Ground, price: Price | undefined, absolute: string, relative: string): boolean {
  if (price?.target === undefined || !price.acts) return false;
  if (price.signChange === true) return true;
  const [size, limit] = price.relative === undefined ? [price.value, `${price.target}.${absolute}`] : [price.relative, `${price.target}.${relative}`];
  return size !== undefined && Math.abs(size) >= (on.number(limit) ?? Number.POSITIVE_INFINITY);
}

/** All effects as the plan states them. */
export const effectsOf = (on: Ground): readonly PlanEffect[] => on.decisions.effects.map((e) => on.effect(e.id));

/** An effect in a sentence: `variable viscosity`. */
export const called = (e: PlanEffect): string => e.id.replaceAll('-', ' ');

export const capital = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1);
