import type { Fields, FlagField, ListField, MapField, Meaning, QuantityField, TextField, WordField } from '../case/index.ts';

type More<F> = Partial<Omit<F, 'kind' | 'doc' | 'example' | 'unit'>>;

/** A number with a unit. */
export const quantity = (doc: string, unit: string, example: string, more: More<QuantityField> = {}): QuantityField => ({ kind: 'quantity', doc, unit, example, ...more });

/** Above zero unless the field says from where on. */
const positive = (more: More<QuantityField>): More<QuantityField> => (more.atLeast === undefined ? { above: 0, ...more } : more);

/** A length, above zero unless `atLeast` is given. */
export const length = (doc: string, example: string, more: More<QuantityField> = {}): QuantityField => quantity(doc, 'm', example, { name: 'length', ...positive(more) });

/** A number without unit, above zero unless `atLeast` is given. */
export const number = (doc: string, example: string, more: More<QuantityField> = {}): QuantityField => quantity(doc, '1', example, { name: 'plain number', ...positive(more) });

/** A whole number from 1. */
export const count = (doc: string, example: string, more: More<QuantityField> = {}): QuantityField => quantity(doc, '1', example, { name: 'whole number', atLeast: 1, whole: true, ...more });

/** A share between 0 and 1, or in % or ppm. */
export const share = (doc: string, example: string, more: More<QuantityField> = {}): QuantityField => quantity(doc, '1', example, { is: 'fraction', ...more });

/** Above it matter is plasma, and no law of the collection comes near [K]. */
const hottest = 2e4;

export const temperature = (doc: string, example: string, more: More<QuantityField> = {}): QuantityField => quantity(doc, 'K', example, { is: 'temperature', above: 0, atMost: hottest, ...more });

/** An absolute pressure; gauge becomes absolute. */
export const pressure = (doc: string, example: string, more: More<QuantityField> = {}): QuantityField => quantity(doc, 'Pa', example, { is: 'pressure', above: 0, ...more });

export const speed = (doc: string, example: string, more: More<QuantityField> = {}): QuantityField => quantity(doc, 'm/s', example, { name: 'speed', ...more });

export const turning = (doc: string, example: string, more: More<QuantityField> = {}): QuantityField => quantity(doc, 'rad/s', example, { name: 'speed of rotation', ...more });

export const angle = (doc: string, example: string, more: More<QuantityField> = {}): QuantityField => quantity(doc, 'rad', example, { name: 'angle', ...more });

export const word = (doc: string, example: string, words: Readonly<Record<string, string | Meaning>>, more: More<WordField> = {}): WordField => ({ kind: 'word', doc, example, ...more, words: meanings(words) });

export const meanings = (words: Readonly<Record<string, string | Meaning>>): Readonly<Record<string, Meaning>> => Object.fromEntries(Object.entries(words).map(([one, meaning]) => [one, typeof meaning === 'string' ? { doc: meaning } : meaning]));

export const text = (doc: string, example: string, more: More<TextField> = {}): TextField => ({ kind: 'text', doc, example, ...more });

export const flag = (doc: string, example: string, more: More<FlagField> = {}): FlagField => ({ kind: 'flag', doc, example, ...more });

export const map = (doc: string, example: string, keys: Fields, more: More<MapField> = {}): MapField => ({ kind: 'map', doc, example, ...more, keys });

export const list = (doc: string, example: string, keys: Fields, more: More<ListField> = {}): ListField => ({ kind: 'list', doc, example, ...more, item: map(doc, example, keys) });
