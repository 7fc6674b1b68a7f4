import type { Spread } from '../units/index.ts';
import type { Position } from './place.ts';

/** One value of the case, checked, with its place in the file. */
export interface Entry {
  /** `inlet.speed`, `walls.left.temperature`, `wall.layers.0.thickness`. */
  readonly path: string;
  readonly kind: 'quantity' | 'word' | 'words' | 'text' | 'flag';
  /** SI number, word, list of words, text, true or false. */
  readonly value: number | string | boolean | readonly string[];
  /** As the user wrote it. */
  readonly written: string;
  readonly position: Position;
  /** Ids of the quantities that it gives. */
  readonly gives: readonly string[];
  /** What the text left open and how it was read. */
  readonly assumed: readonly string[];
  /** SI unit of the value. */
  readonly unit?: string;
  /** Unit as the user wrote it. */
  readonly writtenUnit?: string;
  readonly spread?: Spread;
  /** Operating range, or with `bounds` the limits of ignorance [SI]. */
  readonly range?: { readonly from: number; readonly to: number; readonly bounds: boolean };
  readonly basis?: 'mol' | 'mass' | 'vol';
  readonly reference?: 'normal' | 'standard';
  /** The word that was written for a number: `horizontal`. */
  readonly word?: string;
  /** The number is a share of the quantity that it belongs to, or of the change of it. */
  readonly share?: 'value' | 'change';
}

/** A value read, before its path and its place in the file are added. */
export type Value = Omit<Entry, 'path' | 'written' | 'position' | 'gives'>;

/** What is asked of the simulation. */
export interface Target {
  /** `targets.0`. */
  readonly path: string;
  /** A quantity id, or words. */
  readonly quantity: string;
  readonly place?: string;
  readonly mean?: string;
  readonly within?: Tolerance;
  readonly position: Position;
}

/** How near the answer must come: one of the three. */
export interface Tolerance {
  /** Share of the value. */
  readonly relative?: number;
  /** Share of the change of it. */
  readonly ofChange?: number;
  /** Difference [SI], with its SI unit. */
  readonly absolute?: number;
  readonly unit?: string;
  readonly written: string;
}

/** A case file, read and checked against a vocabulary. */
export interface Case {
  readonly file: string;
  /** The file itself, for messages and for its digest. */
  readonly text: string;
  readonly flow: string;
  readonly title?: string;
  readonly purpose?: string;
  readonly ifWrong?: string;
  readonly entries: ReadonlyMap<string, Entry>;
  readonly targets: readonly Target[];
  /** Groups of paths whose spreads move together. */
  readonly together: readonly (readonly string[])[];
  /** What was taken without being said. */
  readonly warnings: readonly string[];
  get(path: string): Entry | undefined;
  /** The SI number at a path; undefined where there is none, or a word in its place. */
  number(path: string): number | undefined;
  /** The word or text at a path, also the word written for a number. */
  word(path: string): string | undefined;
  /** Items of a list or keys of an open map, in their order: `list('walls')` is `['left', 'right']`. */
  list(path: string): readonly string[];
  /** Whether the case names this key, with or without values in it. */
  has(path: string): boolean;
}
