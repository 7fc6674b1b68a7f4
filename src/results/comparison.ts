import type { DeviationVerdict, Uncertainties } from './deviation.ts';
import type { Outcome } from './limit.ts';
import type { KnownColumn, Matched } from './match.ts';
import type { Norms } from './norms.ts';
import type { Interpolation } from './profile.ts';

/** A table of known numbers in SI; its first column is the coordinate. */
export interface KnownTable {
  readonly title: string;
  readonly columns: readonly KnownColumn[];
  readonly rows: readonly (readonly number[])[];
  /** 95 % half-width of the entries in their unit; 0 where exact. */
  readonly band: number;
}

/** What is allowed, and what is known of the errors of the result. Shares are of the range of the known numbers, or of a single one. */
export interface Allowances {
  /** Largest deviation allowed, as a share [1]. */
  readonly limit: number;
  /** A limit that replaces it, as text: `1 %`, `0.5 K`. */
  readonly within?: string;
  /** Half-widths at 95 %, as text: `1 %`, `0.02 m/s`. */
  readonly numerical?: string;
  readonly input?: string;
  readonly statistical?: string;
}

export interface CompareOptions extends Allowances {
  /** Relative 95 % half-width of the known numbers, for tables without a band of their own [1]. */
  readonly uncertainty?: number;
  /** What is held against the limit; the largest deviation unless said. */
  readonly measure?: 'largest' | 'rms';
  /** Monotone cubic unless said. */
  readonly interpolation?: Interpolation;
}

/** A result held against one column of known numbers. Deviations E = S - D in SI. */
export interface Comparison extends DeviationVerdict {
  readonly name: string;
  readonly unit: string;
  /** Name of the file's column, and how it was found. */
  readonly column: string;
  readonly by: Matched['by'];
  readonly norms: Norms;
  /** What was held against the limit: the largest deviation or the root mean square, with its sign where it has one. */
  readonly deviation: number;
  readonly measure: 'largest' | 'rms';
  readonly limit: number;
  /** Where the largest deviation stands, result and known number there. */
  readonly place: { readonly at: number; readonly result: number; readonly known: number };
  readonly parts: Uncertainties;
  readonly points: number;
  /** Known points that the result does not reach. */
  readonly outside: readonly number[];
  /** Share of the points whose deviation lies within the band of the known numbers; absent for exact ones. */
  readonly withinBand?: number;
  readonly says: string;
  readonly cautions: readonly string[];
}

export interface TableComparison {
  readonly title: string;
  readonly coordinate: { readonly name: string; readonly unit: string; readonly column: string };
  readonly columns: readonly [Comparison, ...Comparison[]];
  /** Known columns that the file does not have. */
  readonly missing: readonly string[];
  readonly outcome: Outcome;
}

/** A single known number. */
export interface KnownValue extends KnownColumn {
  readonly value: number;
  /** Relative 95 % half-width [1]. */
  readonly uncertainty: number;
}

/** A single number of a result held against a known one, in SI. */
export interface ValueComparison extends DeviationVerdict {
  readonly name: string;
  readonly unit: string;
  readonly column: string;
  readonly result: number;
  readonly known: number;
  readonly deviation: number;
  readonly limit: number;
  readonly parts: Uncertainties;
  readonly says: string;
}
