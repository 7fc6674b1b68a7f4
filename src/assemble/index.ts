export { allDefinitions, assemble, type Assembled, type AssembleOptions, type Assumption } from './assemble.ts';
export type { Range } from './given.ts';
export type { Leaf } from './leaves.ts';
export type { BoundTarget } from './targets.ts';
export { vocabulary } from './vocabulary.ts';
