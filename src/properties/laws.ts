import type { Material } from './material.ts';
import type { PropertyId } from './record.ts';
import { takeState, type TakenState } from './property.ts';
import { inside } from './material.ts';
import { phaseAt } from './phase.ts';
import type { State } from './state.ts';

/** Properties as functions of temperature [K] and pressure [Pa], SI. */
export type Law = (T: number, p?: number) => number;

/** What a law remembers while it is used. */
export interface Laws {
  law(property: PropertyId): Law | undefined;
  /** Flags raised since the last call: states beyond a range or beyond the phase. */
  flags(): string[];
}

/**
 * Laws of a material in the phase of a state, for ways that iterate. A law stays in its phase: beyond the saturation line it
 * goes on along the metastable branch and raises a flag, so that an iteration is not thrown off by a jump.
 *
 * @param material  the material
 * @param state     the state whose pressure, composition and phase the laws keep
 * @param factors   factor per property from its uncertainty, 1 where not given
 * @returns         the laws; `law` gives undefined for a property the material does not have
 * @throws          {Problem} see takeState
 */
export function laws(material: Material, state: State, factors: { readonly [property: string]: number } = {}): Laws {
  const taken: TakenState = takeState(material, state);
  const { engine, record } = material;
  const raised = new Set<string>();
  const sample = { ...taken.sample };
  const settled = new Map<string, Law | undefined>();

  const watch = (property: PropertyId): void => {
    const ranges = record.thermodynamics !== undefined && record.thermodynamics.uncertainty[property] !== undefined ? record.thermodynamics.ranges : (engine.entry(property, sample, taken.solid ? 'solid' : undefined)?.ranges ?? []);
    if (ranges.length > 0 && !ranges.some((box) => inside(box, sample))) raised.add(`${property} of ${material.name} is carried beyond its range`);
  };
  const raw = (property: PropertyId): ((T: number, p: number) => number) | undefined => {
    if (!material.properties.includes(property)) return undefined;
    const at = (id: PropertyId): number => {
      const value = engine.value(id, sample);
      return factors[id] === undefined ? value : value * factors[id];
    };
    const calls: { readonly [id: string]: () => number } = {
      kinematicViscosity: () => at('viscosity') / at('density'),
      thermalDiffusivity: () => at('thermalConductivity') / (at('density') * at('specificHeatCapacity')),
      prandtl: () => (at('viscosity') * at('specificHeatCapacity')) / at('thermalConductivity'),
      molarMass: () => material.molarMass ?? Number.NaN,
    };
    const slope = property === 'thermalExpansion' && record.thermodynamics === undefined && record.properties['thermalExpansion'] === undefined;
    const call = slope
      ? () => {
          const T = sample.T;
          sample.T = T + 0.5;
          const above = engine.value('density', sample);
          sample.T = T - 0.5;
          const below = engine.value('density', sample);
          sample.T = T;
          return ((below - above) / engine.value('density', sample)) * (factors['thermalExpansion'] ?? 1);
        }
      : (calls[property] ?? (() => at(property)));
    return (T, p) => {
      sample.T = T;
      sample.p = p;
      return call();
    };
  };
  return {
    law(property) {
      if (settled.has(property)) return settled.get(property);
      const f = raw(property);
      const law: Law | undefined = f && ((T, p = state.pressure) => {
        const value = f(T, p);
        watch(property);
        return value;
      });
      settled.set(property, law);
      return law;
    },
    flags() {
      if (material.kind === 'fluid' && sample.T > 0) {
        const now = phaseAt(material, sample.T, sample.p, sample.x).phase;
        const liquidNow = now === 'liquid';
        if (now !== 'supercritical' && now !== 'two-phase' && taken.phase !== 'supercritical' && liquidNow !== (taken.sample.side === 'liquid')) raised.add(`${material.name} is carried as ${taken.phase} beyond its saturation`);
      }
      const out = [...raised];
      raised.clear();
      return out;
    },
  };
}
