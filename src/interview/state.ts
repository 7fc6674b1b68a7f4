import type { Assembled } from '../assemble/index.ts';
import type { Case } from '../case/index.ts';
import type { CompiledRules, Target } from '../decide/index.ts';

/** The graph of a case with its decisions settled. */
export interface Settled {
  readonly assembled: Assembled;
  readonly rules: CompiledRules;
  readonly targets: readonly Target[];
}

/** What an interview is handed: how a case becomes a graph. */
export interface Desk {
  settle(on: Case): Settled;
}

/** A value as it was given, and why it was asked. */
export interface Noted {
  readonly text: string;
  readonly why: string;
}

/** The path that is asked next, and the values that wait for it. */
export interface Wanted {
  readonly path: string;
  readonly values: ReadonlyMap<string, string>;
  readonly says: string;
}

/** An interview at one moment. It is never changed: an answer makes the next one, which knows the one before. */
export interface State {
  /** By path of the case. */
  readonly given: ReadonlyMap<string, Noted>;
  /** Inputs that are not known, alternatives joined by `|`, and why they were asked. */
  readonly unknown: ReadonlyMap<string, string>;
  /** Inputs that were put off. */
  readonly later: ReadonlySet<string>;
  /** Inputs whose spreads move together. */
  readonly together: readonly (readonly string[])[];
  /** Nothing more is asked. */
  readonly enough: boolean;
  /** What an answer cannot stand without: a humid gas its humidity, a solution its composition. The answer waits for it. */
  readonly wants?: Wanted;
  readonly before?: State;
}

/** Nothing said yet. */
export const empty: State = { given: new Map(), unknown: new Map(), later: new Set(), together: [], enough: false };

/** The state before the last answer; the state itself where nothing was answered. */
export const back = (state: State): State => state.before ?? state;

/** Paths of which nothing more is asked. */
export const closedPaths = (state: State): ReadonlySet<string> => new Set([...state.unknown.keys(), ...state.later].flatMap((group) => group.split('|')));
