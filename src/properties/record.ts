import type { Side } from './models/point.ts';

/** Properties that a record may hold or that follow from it; ids as in the plan. */
export const propertyUnits = {
  density: 'kg/m^3',
  viscosity: 'Pa s',
  thermalConductivity: 'W/(m K)',
  specificHeatCapacity: 'J/(kg K)',
  thermalExpansion: '1/K',
  speedOfSound: 'm/s',
  kinematicViscosity: 'm^2/s',
  thermalDiffusivity: 'm^2/s',
  prandtl: '1',
  compressibilityFactor: '1',
  isentropicExponent: '1',
  enthalpy: 'J/kg',
  vapourPressure: 'Pa',
  saturationTemperature: 'K',
  boilingFloor: 'K',
  vapourPressureCeiling: 'Pa',
  latentHeat: 'J/kg',
  surfaceTension: 'N/m',
  meltingTemperature: 'K',
  freezingCeiling: 'K',
  glassTransitionTemperature: 'K',
  fusionHeat: 'J/kg',
  molarMass: 'kg/mol',
  electricalConductivity: 'S/m',
  emissivity: '1',
  voidFraction: '1',
  permeability: 'm^2',
  henryOxygen: 'Pa',
  henryCarbonDioxide: 'Pa',
  diffusivityOxygen: 'm^2/s',
  diffusivityCarbonDioxide: 'm^2/s',
} as const;

export type PropertyId = keyof typeof propertyUnits;

/** Phase of a state. Vapour is the gas below the critical temperature. */
export type Phase = 'liquid' | 'gas' | 'vapour' | 'supercritical' | 'solid' | 'two-phase';

/** Temperatures [K] and pressures [Pa] between which an entry holds. */
export interface Box {
  readonly temperature?: readonly [number, number];
  readonly pressure?: readonly [number, number];
  /** Share by mass, for mixtures. */
  readonly composition?: readonly [number, number];
}

/** Relative uncertainty, 95 %, in one part of the range; `absolute` is its floor in the unit of the property. */
export interface Band extends Box {
  readonly phase?: Side;
  /** Departure from the ideal gas, of a mixture of gases: up to this one. */
  readonly departure?: number;
  readonly value: number;
  readonly absolute?: number;
}

export type Constant = number | string | readonly Constant[] | { readonly [name: string]: Constant };

/** A value from another work that the entry is tested against. */
export interface RecordCheck {
  readonly property: string;
  readonly at: { readonly temperature?: number; readonly pressure?: number; readonly humidity?: number; readonly composition?: number };
  readonly expect: number;
  readonly within: number;
  readonly source: string;
}

/** One correlation of one property. */
export interface Entry {
  readonly model: string;
  readonly constants: { readonly [name: string]: Constant };
  readonly phase?: Side | 'solid';
  readonly ranges: readonly Box[];
  readonly uncertainty: readonly Band[];
  readonly source: string;
  readonly notes?: string;
  /** Emissivity: the surface it was measured on. */
  readonly surface?: string;
  readonly checks: readonly RecordCheck[];
}

/** An equation of state: one source, an uncertainty per property that follows from it. */
export interface ThermodynamicsEntry extends Omit<Entry, 'uncertainty'> {
  readonly uncertainty: { readonly [property: string]: readonly Band[] };
}

/** How a fluid can hurt, whatever the case: `inert` displaces air, `oxygen` feeds a fire. */
export const dangerMarks = ['flammable', 'toxic', 'corrosive', 'inert', 'oxygen', 'hydrogen', 'carbonDioxide', 'cryogen', 'oil', 'dust', 'liquidMetal', 'moltenSalt', 'medical', 'hygiene'] as const;

/** A material as the build stores it: numbers in SI. */
export interface MaterialRecord {
  readonly id: string;
  readonly name: string;
  readonly formula?: string;
  readonly aliases: readonly string[];
  /** Names that ask for one phase, such as steam. */
  /** Names that other records claim as well: the answer to one of them names all. */
  readonly sharedNames?: readonly string[];
  readonly phaseNames: { readonly [name: string]: Side };
  readonly kind: 'fluid' | 'solid';
  /** Phases that the record covers. */
  readonly phases: readonly (Side | 'solid')[];
  /** Name of the record of the same substance on the other side of its melting point. */
  readonly acrossMelting?: string;
  readonly takes: readonly ('humidity' | 'composition' | 'components')[];
  readonly marks?: readonly (typeof dangerMarks)[number][];
  /** The share most often met, for the message where none is given. */
  readonly typical?: number;
  /** Solubility: temperatures [K] and the share of a saturated solution by mass. */
  readonly saturated?: readonly (readonly [number, number])[];
  readonly molarMass?: number;
  /** Closed cup, at the atmosphere [K]. */
  readonly flashPoint?: number;
  readonly critical?: { readonly temperature: number; readonly pressure: number; readonly density: number };
  readonly triplePoint?: { readonly temperature: number; readonly pressure: number };
  /** What the record stands for where the name alone leaves it open, such as a class of oils. */
  readonly about?: string;
  /** What holds of it at every state, such as components that react with each other. */
  readonly flags?: readonly string[];
  readonly thermodynamics?: ThermodynamicsEntry;
  readonly properties: { readonly [property: string]: readonly Entry[] };
}

/** What a name stands for. */
export interface NamedMaterial {
  readonly id: string;
  /** The record's name. */
  readonly name: string;
  /** The phase the name asks for, such as that of steam. */
  readonly asked?: Side;
  /** Several materials share this formula or name: their names. */
  readonly among?: readonly string[];
}

/** Records, each read when it is asked for. */
export interface Collection {
  /** Names, aliases and formulas in lower case with single spaces; formulas that differ in case alone as they are written, too. */
  readonly names: { readonly [plainName: string]: NamedMaterial };
  /** What one plain name stands for; the same as in `names`, without all the others. */
  find(plainName: string): NamedMaterial | undefined;
  record(id: string): MaterialRecord | undefined;
}
