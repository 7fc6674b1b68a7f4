import type { Material } from './material.ts';
import { propertyIfHad, takeState, type PropertyValue } from './property.ts';
import type { PropertyId } from './record.ts';
import type { State } from './state.ts';

/** All properties of a material at one state. */
export interface PropertySheet {
  readonly material: Material;
  readonly state: State;
  readonly phase: string;
  readonly properties: readonly { readonly id: PropertyId; readonly value: PropertyValue }[];
  /** What holds for the state as a whole: near the critical point, beyond a range, a property that cannot be had. */
  readonly flags: readonly string[];
}

/**
 * Every property that a material has at a state.
 *
 * @param material  the material
 * @param state     temperature, pressure, humidity or composition, phase
 * @returns         values in SI in the order of the property list
 * @throws          {Problem} see takeState
 */
export function propertySheet(material: Material, state: State): PropertySheet {
  const taken = takeState(material, state);
  const left: string[] = [];
  const properties = material.properties.flatMap((id) => {
    const value = propertyIfHad(material, id, taken, (reason) => left.push(`left out: ${reason}`));
    return value === undefined ? [] : [{ id, value }];
  });
  return { material, state, phase: taken.phase, properties, flags: [...new Set([...taken.flags, ...properties.flatMap(({ value }) => value.flags), ...left])] };
}
