import type { QuantityKind } from '../units/index.ts';

/** A word of a closed list: what it means, and the SI number it stands for where it stands for one. */
export interface Meaning {
  readonly doc: string;
  readonly value?: number;
}

interface About {
  /** One line: what the key holds. */
  readonly doc: string;
  /** A valid value as a user would write it. */
  readonly example: string;
  /** Flows where the key matters; everywhere where left out. */
  readonly flows?: readonly string[];
  /** A case is not read without it. */
  readonly required?: true;
}

/** A number with a unit, or one of a few words that stand for one. */
export interface QuantityField extends About {
  readonly kind: 'quantity';
  /** SI unit of the value inside; `1` for a plain number. */
  readonly unit: string;
  /** Other SI units that may stand there, of other dimension (a rate constant of another order). */
  readonly orUnits?: readonly string[];
  readonly is?: QuantityKind;
  /** The trade's word for it, for messages. */
  readonly name?: string;
  /** Ids of the quantities that it gives; an id ending in `@` takes the path of the map around it (`wallTemperature@walls.left`). */
  readonly gives?: readonly string[];
  /** Limits of the value and of the ends of its range, in `unit`. */
  readonly above?: number;
  readonly atLeast?: number;
  readonly atMost?: number;
  /** A count. */
  readonly whole?: true;
  readonly words?: Readonly<Record<string, Meaning>>;
  /** The key beside it that holds n of a unit such as `Pa s^n`. */
  readonly exponentFrom?: string;
}

/** One word of a closed list. */
export interface WordField extends About {
  readonly kind: 'word';
  readonly words: Readonly<Record<string, Meaning>>;
}

/** Several words of a closed list. */
export interface WordsField extends About {
  readonly kind: 'words';
  readonly words: Readonly<Record<string, Meaning>>;
}

/** Free text on one line, such as a title or the name of a material. */
export interface TextField extends About {
  readonly kind: 'text';
}

/** True or false. */
export interface FlagField extends About {
  readonly kind: 'flag';
}

/** How near an answer must come: a difference with unit, a share, or a share of the change. */
export interface ToleranceField extends About {
  readonly kind: 'tolerance';
  /** The key beside it that names the quantity asked for. */
  readonly of: string;
  /** Quantities of which a bare % has three readings. */
  readonly temperatures: readonly string[];
}

/** Paths into the case that belong together: [[path, path], ...]. */
export interface PathsField extends About {
  readonly kind: 'paths';
}

/** Keys of the writer's own choice, each with the same field: a composition. */
export interface OpenMapField extends About {
  readonly kind: 'open-map';
  readonly item: Field;
  /** What a single value in place of the map is: the one share of a solution. */
  readonly alone?: LeafField;
}

/** Fixed keys. */
export interface MapField extends About {
  readonly kind: 'map';
  readonly keys: Fields;
  /** Keys of which only one decides; a more particular map that states one replaces the others of the general map. */
  readonly alternatives?: readonly (readonly string[])[];
}

/** The sizes of the flow, from `Vocabulary.flows`. */
export interface SizesField extends About {
  readonly kind: 'sizes';
}

/** A list of maps. A named item has its name in the path, another its place: `walls.left.temperature`, `wall.layers.0.thickness`. */
export interface ListField extends About {
  readonly kind: 'list';
  readonly item: MapField;
  /** `walls`: the names come from the flow. */
  readonly names?: 'required' | 'optional' | 'walls';
}

export type LeafField = QuantityField | WordField | WordsField | TextField | FlagField | ToleranceField;
export type Field = LeafField | PathsField | OpenMapField | MapField | SizesField | ListField;
export type Fields = Readonly<Record<string, Field>>;

/** What a flow brings to the words of a case. */
export interface FlowWords {
  readonly title: string;
  readonly sizes: Fields;
  /** Names of its walls; empty where it has one that is called `wall`. */
  readonly walls: readonly string[];
  /** Paths that usually drive it, for a case that is still empty. */
  readonly needs: readonly string[];
}

/** All keys of a case file: one description for the reader, the JSON Schema and the template. */
export interface Vocabulary {
  readonly keys: Fields;
  readonly flows: Readonly<Record<string, FlowWords>>;
  /** Names that stand for several walls: `sides` for left and right. */
  readonly wallGroups: Readonly<Record<string, readonly string[]>>;
}

/** An own property, so that `constructor` and its like are no keys. */
export function own<T>(record: Readonly<Record<string, T>>, key: string): T | undefined {
  return Object.hasOwn(record, key) ? record[key] : undefined;
}
