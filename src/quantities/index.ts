import type { Definition } from '../workings/index.ts';
import { properties } from './property-states.ts';
import { results } from './results.ts';
import { scales } from './scales.ts';
import { temperatures } from './temperatures.ts';
import { wallTemperatures } from './walls.ts';
import { words } from './words.ts';

export { features } from './words.ts';
export { givenPropertyWays, lawProperties, materialWays, propertyStates, singleProperties, type PropertyAbout } from './property-states.ts';

/** Every definition that all cases share, one file a topic. */
export const generalDefinitions: Definition[] = [
  ...words,
  ...scales,
  ...temperatures,
  ...wallTemperatures,
  ...properties,
  ...results,
];
