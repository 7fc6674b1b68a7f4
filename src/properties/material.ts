import { Problem } from '../problems/index.ts';
import { withBoilingPoint, withVapourBound } from './boiling-point.ts';
import type { GasMixture } from './models/gas-mixture.ts';
import { lineOf, type Point, type Side } from './models/point.ts';
import { equationModels, propertyModels } from './registry.ts';
import { propertyUnits, type Box, type Collection, type Entry, type MaterialRecord, type PropertyId } from './record.ts';
import type { Engine, Sample } from './sample.ts';

/** A material ready to be asked. */
export interface Material {
  readonly id: string;
  readonly name: string;
  readonly formula?: string;
  readonly aliases: readonly string[];
  readonly kind: 'fluid' | 'solid';
  /** Phases that the record covers. */
  readonly phases: readonly (Side | 'solid')[];
  /** [kg/mol] */
  readonly molarMass?: number;
  /** Closed cup, at the atmosphere [K]. */
  readonly flashPoint?: number;
  /** Specific gas constant [J/(kg K)]. */
  readonly gasConstant?: number;
  /** [K], [Pa], [kg/m^3]; of a mixture of gases the pseudo-critical point. */
  readonly critical?: { readonly temperature: number; readonly pressure: number; readonly density: number } | undefined;
  /** [K], [Pa] */
  readonly triple?: { readonly temperature: number; readonly pressure: number };
  /** At atmospheric pressure [K]. */
  readonly meltingTemperature?: number;
  /** Of an amorphous solid, at atmospheric pressure [K]. */
  readonly glassTransitionTemperature?: number;
  readonly takes: readonly ('humidity' | 'composition' | 'components')[];
  /** Ids of the properties that it has in some phase. */
  readonly properties: readonly PropertyId[];
  /** The phase that the name it was asked by stands for (steam). */
  readonly asked?: Side;
  readonly about?: string;
  readonly record: MaterialRecord;
  /** Evaluation, for this room. */
  readonly engine: MaterialEngine;
}

/** Engine of one material: the correlations built from its record, each when first used. */
export interface MaterialEngine extends Engine {
  evaluate(entry: Entry, sample: Sample): number;
  /** The correlation of an entry, built once. */
  build(entry: Entry): (sample: Sample) => number;
  /** The entry of a property that serves a side, best in range first. */
  entry(property: string, sample: Sample, asked?: Side | 'solid'): Entry | undefined;
}

const gasConstantMolar = 8.31446261815324;

/** Properties that an equation of state gives; the molar mass where it moves with the composition, as of moist air. */
export const fromEquation = {
  density: (at) => at.density,
  specificHeatCapacity: (at) => at.specificHeatCapacity,
  thermalExpansion: (at) => at.thermalExpansion,
  speedOfSound: (at) => at.speedOfSound,
  enthalpy: (at) => at.enthalpy,
  compressibilityFactor: (at, R) => at.pressure / (at.density * R * at.temperature),
  isentropicExponent: (at) => (at.density * at.speedOfSound * at.speedOfSound) / at.pressure,
  molarMass: (_, R) => gasConstantMolar / R,
} satisfies { [property: string]: (at: Point, gasConstant: number) => number };

const within = (range: readonly [number, number] | undefined, x: number): boolean => range === undefined || (x >= range[0] * (1 - 1e-9) && x <= range[1] * (1 + 1e-9));

/** Whether a sample lies in a box; a small allowance for rounding at its edges. */
export const inside = (box: Box, s: Sample): boolean => within(box.temperature, s.T) && within(box.pressure, s.p) && within(box.composition, s.x);

/** Whether a sample lies in one of several boxes. */
export function insideAny(boxes: readonly Box[], s: Sample): boolean {
  for (const box of boxes) if (inside(box, s)) return true;
  return false;
}

/**
 * Builds the engine of a record.
 *
 * @param record      the record
 * @param collection  where partner materials are found (humid air is made of air and water)
 * @returns           the engine; nothing is computed yet
 */
function engineOf(record: MaterialRecord, collection: Collection): MaterialEngine {
  const built = new Map<Entry, (s: Sample) => number>();
  let composition = 0;
  let equation: Engine['equation'] | null = null;
  let kept: Point | undefined;
  let keptT = Number.NaN, keptP = Number.NaN, keptX = Number.NaN, keptSide: Side = 'liquid';

  const engine: MaterialEngine = {
    molarMass: record.molarMass ?? Number.NaN,
    ...(record.critical === undefined ? {} : { critical: record.critical }),
    get equation() {
      if (equation === null) {
        const entry = record.thermodynamics;
        const model = entry && equationModels[entry.model];
        if (entry === undefined || model === undefined) throw new Error(`${record.id} has no equation of state`);
        const named = typeof model.partners === 'function' ? model.partners(entry.constants as never) : (model.partners ?? []);
        const partners = named.map((id) => engineOf(partner(collection, id), collection));
        equation = model.make(entry.constants as never, partners, () => composition);
      }
      return equation;
    },
    point(s) {
      if (s.density !== undefined) return engine.equation.of(s.T, s.density);
      if (s.T !== keptT || s.p !== keptP || s.x !== keptX || s.side !== keptSide || kept === undefined) {
        composition = s.x;
        kept = engine.equation.at(s.T, s.p, s.side);
        keptT = s.T;
        keptP = s.p;
        keptX = s.x;
        keptSide = s.side;
      }
      return kept;
    },
    at(s) {
      composition = s.x;
      return engine.equation;
    },
    partner: (id) => engineOf(partner(collection, id), collection),
    constants: (property) => record.properties[property]?.[0]?.constants,
    saturation: (T) => lineOf(engine.equation).bubble(T),
    value(property, s) {
      if (record.thermodynamics !== undefined && property in fromEquation) return fromEquation[property as keyof typeof fromEquation](engine.point(s), engine.equation.gasConstant);
      const entry = engine.entry(property, s);
      return entry === undefined ? Number.NaN : engine.evaluate(entry, s);
    },
    evaluate: (entry, s) => engine.build(entry)(s),
    build(entry) {
      let f = built.get(entry);
      if (f === undefined) {
        const model = propertyModels[entry.model];
        if (model === undefined) throw new Error(`${record.id} names the unknown model ${entry.model}`);
        f = model.make(entry.constants as never, engine);
        built.set(entry, f);
      }
      return f;
    },
    entry(property, s, asked) {
      const list = record.properties[property];
      if (list === undefined) return undefined;
      const [only, second] = list;
      if (second === undefined && only?.phase === undefined) return only;
      let first: Entry | undefined;
      for (const entry of list) {
        if (entry.phase !== undefined && entry.phase !== (asked ?? s.side)) continue;
        if (entry.ranges.length === 0 || insideAny(entry.ranges, s)) return entry;
        // None holds: that of the right share is nearer than that of the right temperature.
        if (first === undefined || (!holdsShare(first, s.x) && holdsShare(entry, s.x))) first = entry;
      }
      return first;
    },
  };
  return engine;
}

const holdsShare = ({ ranges }: Entry, x: number): boolean => ranges.some(({ composition }) => within(composition, x));

/** Read when it is asked for: it takes the records of the components. */
function pseudoCritical(record: MaterialRecord, engine: MaterialEngine): Material['critical'] {
  if (record.thermodynamics?.model !== 'gas-mixture' || Object.keys(record.thermodynamics.constants['shares'] as object).length === 0) return undefined;
  const { temperature, pressure, volume, molarMass } = (engine.equation as GasMixture).critical;
  return { temperature, pressure, density: molarMass / volume };
}

function partner(collection: Collection, id: string): MaterialRecord {
  const found = collection.record(id);
  if (found === undefined) throw new Problem({ code: 'missing-partner', message: `the record of ${id} is needed and missing` });
  return found;
}

/**
 * A material from its record.
 *
 * @param given       the record
 * @param collection  the collection it stands in
 * @param asked       the phase that the name stands for
 * @returns           the material
 */
export function materialOf(given: MaterialRecord, collection: Collection, asked?: Side): Material {
  const record = withBoilingPoint(withVapourBound(given), (entry, sample) => engineOf(given, collection).evaluate(entry, sample));
  const engine = engineOf(record, collection);
  const has = new Set<string>(Object.keys(record.properties));
  if (record.thermodynamics !== undefined) for (const id of Object.keys(record.thermodynamics.uncertainty)) has.add(id);
  // Moist air has a molar mass too, though it moves with its composition.
  const molar = record.molarMass !== undefined || record.thermodynamics?.uncertainty['molarMass'] !== undefined;
  if (record.thermodynamics !== undefined && molar) for (const id of ['compressibilityFactor', 'isentropicExponent']) has.add(id);
  if (has.has('density')) has.add('thermalExpansion');
  if (has.has('density') && has.has('viscosity')) has.add('kinematicViscosity');
  if (has.has('density') && has.has('specificHeatCapacity') && has.has('thermalConductivity')) has.add('thermalDiffusivity');
  if (has.has('kinematicViscosity') && has.has('thermalDiffusivity')) has.add('prandtl');
  if (record.molarMass !== undefined) has.add('molarMass');
  const turns = (id: 'meltingTemperature' | 'glassTransitionTemperature'): { [at in typeof id]?: number } => {
    const entry = record.properties[id]?.[0];
    return entry === undefined ? {} : { [id]: engine.evaluate(entry, { T: Number.NaN, p: 101325, side: 'liquid', x: 0 }) };
  };
  return {
    id: record.id,
    name: record.name,
    ...(record.formula === undefined ? {} : { formula: record.formula }),
    aliases: record.aliases,
    kind: record.kind,
    phases: record.phases,
    ...(record.molarMass === undefined ? {} : { molarMass: record.molarMass }),
    ...(record.molarMass === undefined || record.kind === 'solid' ? {} : { gasConstant: gasConstantMolar / record.molarMass }),
    ...(record.flashPoint === undefined ? {} : { flashPoint: record.flashPoint }),
    get critical() {
      return record.critical ?? pseudoCritical(record, engine);
    },
    ...(record.triplePoint === undefined ? {} : { triple: record.triplePoint }),
    ...turns('meltingTemperature'),
    ...turns('glassTransitionTemperature'),
    takes: record.takes,
    properties: (Object.keys(propertyUnits) as PropertyId[]).filter((id) => has.has(id)),
    ...(asked === undefined ? {} : { asked }),
    ...(record.about === undefined ? {} : { about: record.about }),
    record,
    engine,
  };
}
