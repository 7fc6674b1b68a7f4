import type { Side } from './models/point.ts';
import type { Component } from './mixture.ts';
import type { Phase } from './record.ts';

/** A state as it is asked for. */
export interface State {
  /** [K] */
  readonly temperature: number;
  /** [Pa] */
  readonly pressure: number;
  /** Relative humidity, 0 to 1. */
  readonly humidity?: number;
  /** Share of the named component by mass, 0 to 1. */
  readonly composition?: number;
  /** The phase that is meant; a problem where it cannot exist. */
  readonly phase?: Phase;
}

/** A state as text names it: what is missing follows from saturation. */
export interface StateText extends Omit<State, 'temperature' | 'pressure' | 'phase'> {
  readonly temperature?: number;
  readonly pressure?: number;
  readonly phase?: Phase;
  readonly saturated?: Side;
  /** Components of a mixture of gases, for `mixtureOf`. */
  readonly components?: readonly Component[];
}
