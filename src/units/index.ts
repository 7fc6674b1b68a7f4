export { convert, type Converted } from './convert.ts';
export { type Dimension, dimensionless, dimensionText, sameDimension } from './dimension.ts';
export { fromSI, type NumberParts, numberParts, type Printing, printNumber } from './print.ts';
export { type Quantity, readQuantity } from './quantity.ts';
export type { Spread } from './spread-text.ts';
export { dimensionOf, type Unit, unit } from './unit-text.ts';
export type { QuantityKind, Wanted } from './wanted.ts';
