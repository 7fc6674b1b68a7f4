import { Problem } from '../problems/index.ts';
import type { Material } from './material.ts';
import type { StateRange } from './parse-state.ts';
import { propertyIfHad, takeState, type PropertyValue } from './property.ts';
import type { PropertyId } from './record.ts';
import { stateOf } from './complete-state.ts';
import type { State } from './state.ts';

/** One row of a property table. */
export interface TableRow {
  readonly state: State;
  readonly phase: string;
  readonly values: { readonly [property: string]: PropertyValue };
}

/** Properties over a range. */
export interface PropertyTable {
  readonly properties: readonly PropertyId[];
  readonly rows: readonly TableRow[];
  /** What was left out and why, and flags of the rows. */
  readonly notes: readonly string[];
}

/**
 * Properties of a material over a range of one number of its state; states that cannot exist are left out and named.
 *
 * @param material  the material
 * @param range     state text with its range, from `parseRange`
 * @param points    number of rows, 2 to 2000
 * @returns         rows at even steps, both ends included
 * @throws          {Problem} no-range, wrong-points, and whatever makes every state impossible
 */
export function tableOver(material: Material, range: StateRange, points = 15): PropertyTable {
  const { over } = range;
  if (over === undefined) throw new Problem({ code: 'no-range', message: 'the state has no range', expected: 'for example "20 degC .. 90 degC, 2 bar"' });
  if (!Number.isInteger(points) || points < 2 || points > 2000) throw new Problem({ code: 'wrong-points', message: `${points} rows`, expected: 'a whole number from 2 to 2000' });
  const rows: TableRow[] = [];
  const notes = new Set<string>();
  const present = new Set<PropertyId>();
  let first: Problem | undefined;
  for (let i = 0; i < points; i++) {
    const at = over.from + ((over.to - over.from) * i) / (points - 1);
    try {
      const state = stateOf(material, { ...range, [over.of]: at });
      const taken = takeState(material, state);
      const values: Record<string, PropertyValue> = {};
      for (const id of material.properties) {
        const value = propertyIfHad(material, id, taken, (reason) => notes.add(`left out: ${reason}`));
        if (value === undefined) continue;
        values[id] = value;
        present.add(id);
        for (const flag of value.flags) notes.add(flag);
      }
      rows.push({ state, phase: taken.phase, values });
    } catch (error) {
      if (!(error instanceof Problem)) throw error;
      first ??= error;
      notes.add(`left out: ${error.list[0]?.message ?? ''}`);
    }
  }
  if (rows.length === 0 && first !== undefined) throw first;
  return { properties: material.properties.filter((id) => present.has(id)), rows, notes: [...notes] };
}
