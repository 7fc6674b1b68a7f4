import { laws as lawsOf, propertyIfHad, propertyIn, takeState, type Material, type PropertyId, type State } from '../properties/index.ts';
import { lawProperties, singleProperties, type PropertyAbout } from '../quantities/index.ts';
import { Problem } from '../problems/index.ts';
import type { Law } from '../workings/index.ts';

/** A material as laws the workings can call, and what its record says of each. */
export interface MaterialLaws {
  readonly laws: Readonly<Record<string, Law>>;
  readonly about: Readonly<Record<string, PropertyAbout>>;
  readonly phase: string;
  readonly flags: readonly string[];
}

/**
 * Laws of a fluid in the phase it has at a state.
 *
 * @param material  the fluid
 * @param state     the state that settles phase, humidity and composition
 * @returns         laws by property id, with source and range
 * @throws          {Problem} impossible-state, missing-humidity and the like, from the record
 */
export function fluidLaws(material: Material, state: State): MaterialLaws {
  const taken = takeState(material, state);
  const source = lawsOf(material, state);
  const laws: Record<string, Law> = {};
  const about: Record<string, PropertyAbout> = {};
  const left: string[] = [];
  const add = (id: string, symbol: string, property: PropertyId, at: (law: (T: number, p: number) => number) => (T: number, p: number) => number = (law) => law): void => {
    const law = source.law(property);
    if (law === undefined) return;
    const here = propertyIfHad(material, property, taken, (reason) => left.push(reason));
    if (here === undefined) return;
    // One uncertainty for all states of a material and property, that of the state which settles its phase.
    laws[id] = Object.assign(at(remembered(law)), { uncertainty: () => here.uncertainty });
    const { temperature, pressure } = here.range;
    about[id] = { formula: `${symbol}(T, p) of ${material.name}, ${here.phase}`, source: here.source, ...(temperature === undefined ? {} : { temperature }), ...(pressure === undefined ? {} : { pressure }) };
  };
  for (const p of [...lawProperties, ...singleProperties]) if ((material.properties as readonly string[]).includes(p.id)) add(p.id, p.symbol, p.id as PropertyId);
  if (material.critical !== undefined) {
    for (const [id, value] of [['criticalTemperature', material.critical.temperature], ['criticalPressure', material.critical.pressure]] as const) {
      laws[id] = Object.assign(() => value, { uncertainty: () => 0 });
      about[id] = { formula: `constant of ${material.name}`, source: 'material record' };
    }
  }
  const vapour = saturatedVapour(material, state);
  if (vapour !== undefined && 'saturationTemperature' in laws) {
    laws['vapourDensity'] = Object.assign((T: number, p: number) => vapour(T, p)?.value ?? Number.NaN, { uncertainty: (T: number, p: number) => vapour(T, p)?.uncertainty ?? 0 });
    about['vapourDensity'] = { formula: `rho_v(p) of ${material.name}, saturated`, source: about['saturationTemperature']?.source ?? 'material record' };
  }
  return { laws, about, phase: taken.phase, flags: [...taken.flags, ...left] };
}

/** The same law, which remembers what it gave at its last pressure: loops and derivatives come back to the same states. */
function remembered(law: (T: number, p: number) => number): (T: number, p: number) => number {
  const most = 256;
  const given = new Map<number, number>();
  let at = Number.NaN;
  return (T, p) => {
    if (p !== at || given.size >= most) given.clear();
    at = p;
    let value = given.get(T);
    if (value === undefined) given.set(T, (value = law(T, p)));
    return value;
  };
}

/** Density of saturated vapour by pressure, where the record covers the vapour. */
function saturatedVapour(material: Material, state: State): ((T: number, p: number) => ReturnType<typeof propertyIn>) | undefined {
  if (!material.phases.includes('vapour') || !material.properties.includes('saturationTemperature')) return undefined;
  return (_, p) => {
    const boiling = lawsOf(material, state).law('saturationTemperature')?.(state.temperature, p);
    if (boiling === undefined) return undefined;
    try {
      return propertyIn(material, 'density', takeState(material, { ...state, temperature: boiling, pressure: p, phase: 'vapour' }));
    } catch (problem) {
      if (problem instanceof Problem) return undefined; // below the triple point no liquid boils
      throw problem;
    }
  };
}

/** One property of a solid as a law of temperature, its uncertainty that of a room or, of ice, below its melting point. */
export function solidLaw(material: Material, property: PropertyId): { law: Law; about: PropertyAbout } | undefined {
  const cold: State = { temperature: Math.min(300, (material.meltingTemperature ?? 300) - 1), pressure: 101325, phase: 'solid' };
  const here = propertyIn(material, property, takeState(material, cold));
  if (here === undefined) return undefined;
  const law = lawsOf(material, cold).law(property);
  if (law === undefined) return undefined;
  const { temperature } = here.range;
  return {
    law: Object.assign((T: number) => law(T, 101325), { uncertainty: () => here.uncertainty }),
    about: { formula: `of ${material.name}`, source: here.source, ...(temperature === undefined ? {} : { temperature }) },
  };
}
