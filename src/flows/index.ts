export { flows } from './registry.ts';
export type { Cut, Extent, Flow, Rung, Size } from './define.ts';
export { rungDefinitions, rungsOf, type NamedRung } from './rungs.ts';
