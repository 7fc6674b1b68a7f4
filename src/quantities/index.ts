export { generalDefinitions } from './general.ts';
export * from './correlations/index.ts';
export { layersBelow, layersToCover, layersToMatch, stackHeight } from './layer-stack.ts';
export { facingWalls } from './radiation.ts';
export { layerDefinitions, type Layer } from './layers.ts';
export { termIds } from './terms.ts';
export { features } from './words.ts';
export { givenPropertyWays, isProperty, lawProperties, materialWays, propertyStates, singleProperties, type PropertyAbout } from './property-states.ts';
export { mostQuantities, piGroups, type Dimensioned, type PiGroup, type PiGroups } from './pi-groups.ts';
