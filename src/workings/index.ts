export { loop, quantity, way, ways, wordWay } from './define.ts';
export type { Definition, Kind, Law, Laws, MoreWays, Numbers, PlaceKind, Quantity, QuantityAbout, Way, When } from './define.ts';
export { joinDefinitions, type Node, type Places } from './build.ts';
export { Workings, type Closed } from './resolve.ts';
export type { Bound, Given, Slot, Source } from './slot.ts';
export { flagsIn, stepOf, trace, type Step } from './trace.ts';
export { missing } from './missing.ts';
export { followsLaws, spreads, type Settle, type Spread } from './spread.ts';
export { flip, sweep } from './sweep.ts';
