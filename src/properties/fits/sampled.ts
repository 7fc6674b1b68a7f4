import { Problem } from '../../problems/index.ts';
import { stateOf } from '../complete-state.ts';
import type { Material } from '../material.ts';
import type { StateRange } from '../parse-state.ts';
import { propertyIn, takeState } from '../property.ts';
import type { PropertyId } from '../record.ts';

/** One property along a range, closely sampled. */
export interface Sampled {
  readonly property: PropertyId;
  readonly variable: 'temperature' | 'pressure' | 'humidity' | 'composition';
  readonly x: readonly number[];
  readonly y: readonly number[];
  /** Of the record, the largest along the range. */
  readonly uncertainty: number;
  readonly phase: string;
  readonly flags: readonly string[];
}

/** Phases between which a property does not jump. */
const side = (phase: string): string => (phase === 'vapour' || phase === 'gas' ? 'gas' : phase);

/**
 * Properties along a range of one number of the state.
 *
 * @param material    the material
 * @param range       state with its range, from `parseRange`
 * @param properties  which; those that the material does not have along the whole range are left out
 * @param count       samples, both ends included
 * @returns           one list per property, SI
 * @throws            {Problem} no-range; across-a-phase-line; whatever makes a state impossible
 */
export function sampledOver(material: Material, range: StateRange, properties: readonly PropertyId[], count = 161): Sampled[] {
  const { over } = range;
  if (over === undefined) throw new Problem({ code: 'no-range', message: 'the state has no range', expected: 'for example "20 degC .. 90 degC, 2 bar"' });
  const x: number[] = [];
  const found = new Map<PropertyId, { y: number[]; uncertainty: number; flags: Set<string> }>(properties.map((id) => [id, { y: [], uncertainty: 0, flags: new Set() }]));
  let phase = '';
  for (let i = 0; i < count; i++) {
    const at = over.from + ((over.to - over.from) * i) / (count - 1);
    const taken = takeState(material, stateOf(material, { ...range, [over.of]: at }));
    if (phase !== '' && side(phase) !== side(taken.phase) && phase !== 'supercritical' && taken.phase !== 'supercritical') {
      throw new Problem({ code: 'across-a-phase-line', message: `${material.name} turns from ${phase} to ${taken.phase} near ${Number(at.toPrecision(5))} within the range: no one function holds on both sides`, expected: 'a range within one phase' });
    }
    phase = taken.phase;
    x.push(at);
    for (const [id, list] of found) {
      const value = propertyIn(material, id, taken);
      if (value === undefined) found.delete(id);
      else {
        list.y.push(value.value);
        list.uncertainty = Math.max(list.uncertainty, value.uncertainty);
        for (const flag of value.flags) list.flags.add(flag);
      }
    }
  }
  return [...found].map(([property, { y, uncertainty, flags }]) => ({ property, variable: over.of, x, y, uncertainty, phase, flags: [...flags] }));
}
