import { Problem } from '../problems/index.ts';
import { shippedMaterials } from './collection.ts';
import type { Material } from './material.ts';
import { saturationOf } from './phase.ts';
import type { Collection } from './record.ts';
import { solutionsNamed } from './solution.ts';
import type { State, StateText } from './state.ts';

/**
 * The full state of a material from what was said: a saturated state gets its missing temperature or pressure.
 *
 * @param material    the material
 * @param said        temperature and pressure, or one of them with `saturated`
 * @param collection  where the material is looked for that was meant; the shipped records unless given
 * @returns           the state, with its phase where saturated
 * @throws            {Problem} incomplete-state, no-saturation, no-humidity, no-composition
 */
export function stateOf(material: Material, said: StateText, collection: Collection = shippedMaterials()): State {
  refuseUntaken(material, said, collection);
  const { saturated, temperature, pressure } = said;
  const rest = { ...(said.humidity === undefined ? {} : { humidity: said.humidity }), ...(said.composition === undefined ? {} : { composition: said.composition }) };
  const phase = said.phase ?? saturated;
  if (saturated === undefined) {
    if (temperature === undefined || (pressure === undefined && material.kind === 'fluid')) {
      const missing = temperature === undefined ? 'temperature' : 'pressure';
      throw new Problem({ code: 'incomplete-state', message: `the state has no ${missing}`, expected: 'for example "60 degC, 2 bar" or "60 degC, saturated liquid"' });
    }
    return { ...rest, temperature, pressure: pressure ?? 101325, ...(phase === undefined ? {} : { phase }) };
  }
  if ((temperature === undefined) === (pressure === undefined)) throw new Problem({ code: 'incomplete-state', message: 'a saturated state takes a temperature or a pressure, not both', expected: '"60 degC, saturated liquid" or "2 bar, saturated vapour"' });
  const line = saturationOf(material, rest.composition ?? rest.humidity ?? 0);
  if (line === undefined) throw new Problem({ code: 'no-saturation', message: `${material.name} has no saturation line in its record` });
  const T = temperature ?? line.boiling(pressure as number, saturated);
  const p = pressure ?? (saturated === 'liquid' ? line.bubble(T) : line.dew(T));
  if (!(T >= line.from && T <= line.to) || !Number.isFinite(p)) {
    throw new Problem({ code: 'no-saturation', message: `${material.name} is not saturated at ${temperature === undefined ? `${Number((pressure as number).toPrecision(6))} Pa` : `${Number(T.toPrecision(6))} K`}`, expected: `a temperature from ${line.from} K to ${line.to} K` });
  }
  return { ...rest, temperature: T, pressure: p, phase: saturated };
}

/** A share that the record does not take would be lost in silence. */
function refuseUntaken(material: Material, said: StateText, collection: Collection): void {
  const { takes, name } = material;
  if (said.humidity !== undefined && !takes.includes('humidity')) {
    const gases = takes.includes('components');
    throw new Problem({ code: 'no-humidity', message: `${name} takes no humidity`, expected: gases ? 'water as one of its components, for example "water 2 % mol"' : 'humid air, or the state without humidity', ...(gases ? {} : { nearest: 'humid air' }) });
  }
  if (said.composition !== undefined && !takes.includes('composition')) {
    const meant = solutionsNamed(name, collection);
    throw new Problem({ code: 'no-composition', message: `${name} takes no composition`, expected: takes.includes('components') ? 'its components by name, for example "nitrogen 79 % mol, oxygen 21 % mol"' : meant.length > 0 ? meant.join(' or ') : 'a solution such as propylene glycol-water, or the state without a composition', ...(meant[0] === undefined ? {} : { nearest: meant[0] }) });
  }
}
