export { meshDefinitions } from './definitions.ts';
export { plane } from './cuts.ts';
export { geometricBetween, geometricRatio, inverseSinhc, tanhStretching } from './grading.ts';
export { wallModelledCells, wallResolvedCells } from './eddies.ts';
