import { isRefused } from './composition-range.ts';
import { fromEquation, insideAny, type Material } from './material.ts';
import type { Point } from './models/point.ts';
import { takeState, type TakenState } from './property.ts';
import type { Box, PropertyId } from './record.ts';
import { phaseAt } from './phase.ts';
import type { State } from './state.ts';

/** Properties as functions of temperature [K] and pressure [Pa], SI. */
export type Law = (T: number, p?: number) => number;

/** What a formed property is formed from. */
const parts: { readonly [property: string]: readonly PropertyId[] } = { kinematicViscosity: ['viscosity', 'density'], thermalDiffusivity: ['thermalConductivity', 'density', 'specificHeatCapacity'], prandtl: ['viscosity', 'specificHeatCapacity', 'thermalConductivity'] };

/** What a law remembers while it is used. */
export interface Laws {
  law(property: PropertyId): Law | undefined;
  /** Flags raised since the last call: states beyond a range or beyond the phase. */
  flags(): string[];
}

/**
 * Laws of a material in the phase of a state, for ways that iterate. A law stays in its phase: beyond the saturation line it
 * goes on along the metastable branch and raises a flag, so that an iteration is not thrown off by a jump. Humid air keeps its water, not its relative humidity.
 *
 * @param material  the material
 * @param state     the state whose pressure, composition and phase the laws keep
 * @param factors   factor per property from its uncertainty, 1 where not given
 * @returns         the laws; `law` gives undefined for a property the material does not have, or not at this share
 * @throws          {Problem} see takeState
 */
export function laws(material: Material, state: State, factors: { readonly [property: string]: number } = {}): Laws {
  const taken: TakenState = takeState(material, state);
  const { engine, record } = material;
  const raised = new Set<string>();
  const sample = { ...taken.sample };
  const from = { T: taken.sample.T, p: taken.sample.p };
  const share = taken.sample.x;
  const equation = record.thermodynamics === undefined ? undefined : engine.equation;
  /** Moves the sample; the matter stays the same, so that a share counted against saturation moves with it. */
  const move = (T: number, p: number): void => {
    if (T === sample.T && p === sample.p) return;
    sample.T = T;
    sample.p = p;
    if (equation?.carried !== undefined) sample.x = equation.carried(share, from, sample);
  };
  const settled = new Map<string, Law | undefined>();

  const rangesOf = (property: PropertyId): readonly Box[] | undefined => {
    const equation = record.thermodynamics;
    if (equation !== undefined && property in fromEquation) return equation.ranges;
    return engine.entry(property, sample, taken.solid ? 'solid' : undefined)?.ranges;
  };
  /** The bare property at the sample, its correlation looked up once. */
  const bare = (property: PropertyId): (() => number) => {
    if (record.thermodynamics !== undefined && property in fromEquation) {
      const f: (at: Point, gasConstant: number) => number = fromEquation[property as keyof typeof fromEquation];
      return () => f(engine.point(sample), engine.equation.gasConstant);
    }
    const list = record.properties[property];
    if (list === undefined) return property === 'thermalExpansion' ? slopeOfDensity : () => engine.value(property, sample);
    const [only, second] = list;
    if (only !== undefined && second === undefined) {
      const f = engine.build(only);
      return () => f(sample);
    }
    return () => {
      const entry = engine.entry(property, sample, taken.solid ? 'solid' : undefined);
      return entry === undefined ? Number.NaN : engine.evaluate(entry, sample);
    };
  };
  const slopeOfDensity = (): number => {
    const T = sample.T;
    sample.T = T + 0.5;
    const above = engine.value('density', sample);
    sample.T = T - 0.5;
    const below = engine.value('density', sample);
    sample.T = T;
    return (below - above) / engine.value('density', sample);
  };
  const scaled = (property: PropertyId): (() => number) => {
    const factor = factors[property];
    const f = bare(property);
    return factor === undefined ? f : () => f() * factor;
  };
  const call = (property: PropertyId): (() => number) | undefined => {
    const from = parts[property] ?? [property];
    if (!material.properties.includes(property) || from.some((id) => isRefused(record, id, share))) return undefined;
    if (property === 'molarMass' && material.molarMass !== undefined) return () => material.molarMass as number;
    if (property === 'kinematicViscosity' || property === 'thermalDiffusivity' || property === 'prandtl') {
      const [mu, k, rho, cp] = (['viscosity', 'thermalConductivity', 'density', 'specificHeatCapacity'] as const).map(scaled) as [() => number, () => number, () => number, () => number];
      if (property === 'kinematicViscosity') return () => mu() / rho();
      return property === 'prandtl' ? () => (mu() * cp()) / k() : () => k() / (rho() * cp());
    }
    return scaled(property);
  };
  return {
    law(property) {
      if (settled.has(property)) return settled.get(property);
      const f = call(property);
      const boxes = rangesOf(property) ?? [];
      const law: Law | undefined = f && ((T, p = state.pressure) => {
        move(T, p);
        if (boxes.length > 0 && !insideAny(boxes, sample)) raised.add(`${property} of ${material.name} is carried beyond its range`);
        return f();
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
