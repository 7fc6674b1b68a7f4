import type { Node } from './build.ts';
import type { Kind, Laws, Way } from './define.ts';

/** A number of the case as given: SI value, 95 % half-width (relative or absolute), whether it was given or assumed. */
export interface Given {
  readonly value: number | string;
  readonly kind?: Kind;
  readonly half?: number;
  readonly relative?: boolean;
}

/** The argument of a way that was not asked for yet. */
export const unfilled = Object.freeze(Object.create(null)) as Record<string, number>;

/** A way bound to slots: indices in place of names, and its argument, made when it is first asked for and filled again each time. */
export interface Bound {
  readonly way: Way;
  readonly needs: readonly number[];
  readonly ids: readonly string[];
  readonly when: readonly { readonly slot: number; readonly words: readonly string[] }[];
  readonly closes: number;
  of: Record<string, number>;
  readonly laws: Laws;
  /** Index of its own scatter in the list of sources of spread, or -1. */
  readonly source: number;
}

/** The scatter of a way at its argument as last filled; undefined where it has none. */
export const ownScatter = ({ way, of }: Bound): number | undefined => (typeof way.scatter === 'function' ? way.scatter(of) : way.scatter);

/** What a spread comes from: an input, the scatter of a way, the uncertainty of a property. */
export interface Source {
  readonly key: string;
  readonly label: string;
  readonly kind: 'input' | 'scatter' | 'property';
}

/** A quantity at its place in the graph. */
export interface Slot {
  readonly id: string;
  readonly node: Node;
  readonly isWord: boolean;
  ways: Bound[];
}
