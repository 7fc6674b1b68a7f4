export { flows } from './registry.ts';
export type { Boundary, Conditions, Cut, Extent, Flow, Rung, Size } from './define.ts';
export { comparedGroups } from './rung-distance.ts';
export { rungDefinitions, rungInputs, rungsOf, type NamedRung } from './rungs.ts';
