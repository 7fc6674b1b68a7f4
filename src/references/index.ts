export type { Column, Need, Reference } from './define.ts';
export { evaluateReference, unknownInputs, type EvaluatedTable, type EvaluatedValue, type Evaluation } from './evaluate.ts';
export { findReference, references } from './registry.ts';
export { brent, integrate, march, pchip } from './kernels/index.ts';
export { besselJ, ellipticE, erf, erfc, erfcScaled } from './kernels/index.ts';
export { sphereDragStandard } from './sphere-drag.ts';
export { bodyTemperature, firstMode } from './body-series.ts';
export { ductFriction, ductNusseltFlux } from './duct-series.ts';
export { plateHeat } from './similarity.ts';
