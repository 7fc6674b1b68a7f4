import type { EquationOfState, Point, Side } from './models/point.ts';
import type { PropertyId } from './record.ts';

/** The state at which a correlation is evaluated. */
export interface Sample {
  /** [K] */
  T: number;
  /** [Pa] */
  p: number;
  side: Side;
  /** Share of the second component by mass, or relative humidity; 0 where the material takes none. */
  x: number;
  /** [kg/m^3]; where given, the state is temperature and density and `p` is not read. */
  readonly density?: number;
}

/** What a correlation may ask its material for. */
export interface Engine {
  /** Throws where the record has none: the caller knows that it has. */
  readonly equation: EquationOfState;
  /** Thermodynamic properties at the sample; kept for the last state. */
  point(sample: Sample): Point;
  /** The equation of state set to the composition of the sample. */
  at(sample: Sample): EquationOfState;
  /** Another property of the same material at the same sample. */
  value(property: PropertyId, sample: Sample): number;
  /** Saturation pressure [Pa] at T. */
  saturation(T: number): number;
  readonly molarMass: number;
  /** [K], [Pa], [kg/m^3] */
  readonly critical?: { readonly temperature: number; readonly pressure: number; readonly density: number };
  /** Another material of the collection that a correlation refers to, by id. */
  partner(id: string): Engine;
  /** Constants of the first entry of a property; undefined where there is none. */
  constants(property: PropertyId): unknown;
}

/** One named correlation: the constants it takes, and how it is built from them. A `?` at the end marks one that may be missing. */
export interface PropertyModel {
  readonly constants: readonly string[];
  make(constants: never, engine: Engine): (sample: Sample) => number;
}

/** One named equation of state. `partners` are other materials it is made of, by id. */
export interface EquationModel {
  readonly constants: readonly string[];
  readonly partners?: readonly string[] | ((constants: never) => readonly string[]);
  make(constants: never, partners: readonly Engine[], x: () => number): EquationOfState;
}
