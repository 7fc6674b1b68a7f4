/** Numbers by quantity id, filled in before a way is called. */
export type Numbers<N extends string = string> = Readonly<Record<N, number>>;

/** Property of a material at a state: temperature [K] and absolute pressure [Pa] to an SI number, with its uncertainty. */
export interface Law {
  (temperature: number, pressure: number): number;
  /** Relative 95 % half-width at that state. */
  readonly uncertainty: (temperature: number, pressure: number) => number;
}
export type Laws<L extends string = string> = Readonly<Record<L, Law>>;

/** Words that select a way: every named word quantity must hold one of the words. */
export type When = Readonly<Record<string, string | readonly string[]>>;

export type Kind = 'given' | 'assumed' | 'computed' | 'decided';

interface About {
  /** The formula as text, in the symbols of the symbol table. */
  readonly formula: string;
  /** Author, title, edition, place; or `definition`, `common practice`. */
  readonly source: string;
  readonly when?: When;
  /** An assumed default or a decided value is listed as such in the plan. */
  readonly as?: 'assumed' | 'decided';
  readonly note?: string;
  /** Symbol of the quantity where it is got this way, such as Re for a group that is Re here and Ra there. */
  readonly symbol?: string;
}

/** One formula for a quantity. */
export interface Way extends About {
  readonly needs: readonly string[];
  readonly laws?: readonly string[];
  readonly value?: (of: Numbers, laws: Laws) => number;
  readonly word?: (of: Numbers) => string;
  /** Valid range of a need, in SI. Outside all ranges the nearest way is kept and flagged. */
  readonly range?: Readonly<Record<string, readonly [number, number]>>;
  /** 95 % half-width of the logarithm: value / (1 + w) to value (1 + w). A function where it depends on the numbers. */
  readonly scatter?: number | ((of: Numbers) => number);
  /** Ways of one key vary together. */
  readonly together?: string;
  /** Why the formula holds constants with dimensions: such a way is exempt from the change of base units. */
  readonly dimensional?: string;
  /** A loop: the value x is sought for which the quantity `closes`, computed with x, gives x again. */
  readonly closes?: string;
  readonly within?: number;
}

type Formula<N extends string, L extends string> = About & {
  readonly needs: readonly N[];
  readonly laws?: readonly L[];
  readonly range?: { readonly [K in N]?: readonly [number, number] };
  readonly scatter?: number | ((of: Numbers<N>) => number);
  readonly together?: string;
  readonly dimensional?: string;
};

/**
 * A way to a number. The keys of its argument are inferred from `needs`, so that a misspelt need does not compile.
 *
 * @param w  needs, formula as function of SI numbers and as text, range, scatter, source
 * @returns  the way
 */
export function way<const N extends string, const L extends string = never>(w: Formula<N, L> & { readonly value: (of: Numbers<N>, laws: Laws<L>) => number }): Way {
  return w as unknown as Way;
}

/** A way to a word of a closed list, such as the regime. */
export function wordWay<const N extends string>(w: Formula<N, never> & { readonly word: (of: Numbers<N>) => string }): Way {
  return w as unknown as Way;
}

/**
 * A way that closes a loop physics makes: `closes` names the quantity that, computed with the trial value, must give that value again.
 *
 * @param w  `start` is the first trial; `within` the relative change at which the loop counts as closed (1e-10 unless given)
 * @returns  the way; a loop that does not close is a problem `loop-open` and the way gives no value
 */
export function loop<const N extends string>(w: About & { readonly needs: readonly N[]; readonly start: (of: Numbers<N>) => number; readonly closes: string; readonly within?: number }): Way {
  const { start, ...rest } = w;
  return { ...rest, value: start };
}

export type PlaceKind = 'wall' | 'station' | 'inlet' | 'region' | 'species' | 'reaction' | 'particle';

export interface QuantityAbout {
  readonly symbol: string;
  readonly name: string;
  /** SI unit text, `1` for dimensionless, `word` for a word. */
  readonly unit: string;
  /** The closed list of a word quantity. */
  readonly words?: readonly string[];
  /** What the quantity exists once for; copies are `id@place`. */
  readonly per?: readonly PlaceKind[];
  /** Which copy the plain id is. */
  readonly plain?: 'smallest' | 'largest' | 'target' | 'sum';
  /** The plain id is known only where every copy is: none may be passed over. */
  readonly whole?: true;
  /** It may change sign, or is a temperature: its spread adds instead of multiplying. */
  readonly signed?: boolean;
  /** Where the program sets the number and no way gives it: how it is got. */
  readonly set?: { readonly formula: string; readonly source: string };
}
export interface Quantity extends QuantityAbout {
  readonly id: string;
  readonly ways: readonly Way[];
}
/** Ways added to a quantity that is defined elsewhere. `id` may name places: `wallShear@worst`. */
export interface MoreWays {
  readonly id: string;
  readonly more: readonly Way[];
}
export type Definition = Quantity | MoreWays;

/** Defines a quantity once; several definers add to it by `ways`. */
export function quantity(id: string, about: QuantityAbout, ways: readonly Way[] = []): Quantity {
  return { id, ...about, ways };
}

/** Adds ways to a quantity defined elsewhere; they are tried before those of the definition. */
export function ways(id: string, more: readonly Way[]): MoreWays {
  return { id, more };
}
