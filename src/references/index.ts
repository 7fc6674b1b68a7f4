export type { Column, Need, Reference } from './define.ts';
export { evaluateReference, referenceNumber, type EvaluatedTable, type EvaluatedValue, type Evaluation } from './evaluate.ts';
export { readGiven } from './given.ts';
export { findReference, references } from './registry.ts';
export { dispersedConversion, pchip, segregatedConversion } from './kernels/index.ts';
