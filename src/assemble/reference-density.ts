import { Problem } from '../problems/index.ts';
import { propertyAt, propertyIn, takeState, type Material, type PropertyValue, type State } from '../properties/index.ts';
import type { PropertyAbout } from '../quantities/index.ts';
import type { Law } from '../workings/index.ts';

/** The coldest of the states at which the trade counts gases: normal, 0 degC and 1 atm. */
const coldest = { temperature: 273.15, pressure: 101325 };

/**
 * Density of a gas at the state its volume flow counts at. What is a gas there has it by its record; what condenses there, and
 * humid air, which keeps its moisture, has it by its moles, as the trade counts both.
 *
 * @param material  the gas
 * @param state     the state that settles humidity and composition
 * @returns         law of temperature [K] and pressure [Pa], and where it comes from; undefined where the molar mass is not known
 */
export function referenceDensity(material: Material, state: State): { law: Law; about: PropertyAbout } | undefined {
  const { phase: _, ...any } = state;
  const here = state.humidity === undefined ? gasAt(material, { ...any, ...coldest }) : undefined;
  if (here !== undefined) return { law: Object.assign((T: number, p: number) => propertyAt(material, 'density', { ...any, temperature: T, pressure: p })?.value ?? Number.NaN, { uncertainty: () => here.uncertainty }), about: { formula: `rho_n = rho(T_n, p_n) of ${material.name}`, source: here.source } };
  const mass = propertyIn(material, 'molarMass', takeState(material, state));
  if (mass === undefined) return undefined;
  return {
    law: Object.assign((T: number, p: number) => (p * mass.value) / (8.31446261815324 * T), { uncertainty: () => mass.uncertainty }),
    about: { formula: `rho_n = p_n M/(R_u T_n) of ${material.name}, counted by its moles`, source: 'law of ideal gases: vapour that condenses at the reference state counts as if it did not' },
  };
}

/** The density at a state, where the material is a gas at it. */
function gasAt(material: Material, state: State): PropertyValue | undefined {
  try {
    const taken = takeState(material, state);
    return ['gas', 'vapour', 'supercritical'].includes(taken.phase) ? propertyIn(material, 'density', taken) : undefined;
  } catch (error) {
    if (!(error instanceof Problem)) throw error;
    return undefined; // it is solid or has no such phase there
  }
}
