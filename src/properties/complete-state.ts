import { Problem } from '../problems/index.ts';
import type { Material } from './material.ts';
import { saturationOf } from './phase.ts';
import type { State, StateText } from './state.ts';

/**
 * The full state of a material from what was said: a saturated state gets its missing temperature or pressure.
 *
 * @param material  the material
 * @param said      temperature and pressure, or one of them with `saturated`
 * @returns         the state, with its phase where saturated
 * @throws          {Problem} incomplete-state, no-saturation
 */
export function stateOf(material: Material, said: StateText): State {
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
