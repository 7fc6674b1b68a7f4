export { materialNames, loadMaterial, shippedMaterials, withMaterialsFrom } from './collection.ts';
export { compileMaterial, compileMaterials } from './compile.ts';
export { type Law, laws, type Laws } from './laws.ts';
export type { Material } from './material.ts';
export { phaseAt, type PhaseAt, type Saturation, saturationOf } from './phase.ts';
export { boxText, propertyAt, propertyIn, type PropertyValue, takeState, type TakenState } from './property.ts';
export { type Box, type Collection, type MaterialRecord, type Phase, type PropertyId, propertyUnits } from './record.ts';
export { type State, stateOf, type StateText } from './state.ts';
