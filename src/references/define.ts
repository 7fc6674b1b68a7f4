/** An input of a known answer. The id is a quantity id, a path of the case (`sizes.length`), or a plain name of this answer alone. */
export interface Need {
  readonly id: string;
  readonly unit: string;
  readonly name: string;
  /** Taken where nothing is given; the evaluation says so. */
  readonly default?: number;
  /** Where the answer holds. Outside, it is computed and flagged. */
  readonly range?: readonly [number, number];
  /** The answer is known at these inputs only, within half a per cent; elsewhere there is none. */
  readonly anchors?: readonly number[];
  /** What the number may be: more than zero unless said. */
  readonly sign?: 'positive' | 'not-negative' | 'any';
}

/** SI numbers by the ids of the needs. Reading one that was not given leaves the answer out. */
export type Inputs<N extends readonly Need[]> = { readonly [K in N[number]['id']]: number };

interface Answer<G> {
  /** Quantity id where the number is a quantity, else a plain name. */
  readonly id: string;
  readonly name: string;
  readonly unit: string;
  readonly formula: string;
  /** Undefined where these inputs have no such answer: it is left out. */
  readonly value: (g: G) => number | undefined;
  /** Relative 95 % half-width where it differs from that of the reference. */
  readonly uncertainty?: number | ((g: G) => number);
}

export interface Column {
  readonly id: string;
  readonly name: string;
  readonly unit: string;
}

interface Table<G> {
  readonly id: string;
  readonly title: string;
  /** The first column is the coordinate. */
  readonly columns: readonly Column[];
  /** Empty where these inputs have no such table: it is left out. */
  readonly rows: (g: G) => readonly (readonly number[])[];
  readonly note?: string;
  /** 95 % half-width of the entries, in their own unit; zero where exact. */
  readonly band?: number;
}

interface About {
  readonly title: string;
  /** Exact: follows from the equations. Benchmark: agreed computed numbers. Measured: data or a correlation of data. */
  readonly kind: 'exact' | 'benchmark' | 'measured';
  readonly assumes: readonly string[];
  readonly verifies: readonly string[];
  readonly source: string;
  /** Relative 95 % half-width of the numbers, 0 for exact ones. */
  readonly uncertainty: number;
  /** Formal order that refinement should show between the two finest meshes, where the reference asks for it. */
  readonly order?: number;
  /** Relative tolerance of the rung, fixed before the run. */
  readonly passLimit?: number;
  /** What to look for first when a run misses it. */
  readonly ifMissed: string;
  readonly notes?: readonly string[];
  /** Flows whose ladder uses it. */
  readonly flows: readonly string[];
}

interface Body<N extends readonly Need[]> extends About {
  readonly needs: N;
  readonly values: readonly Answer<Inputs<N>>[];
  readonly tables?: readonly Table<Inputs<N>>[];
}

type Anything = Readonly<Record<string, number>>;

/** A known answer, evaluated for given inputs by `evaluateReference`. */
export interface Reference extends About {
  readonly id: string;
  readonly needs: readonly Need[];
  readonly values: readonly Answer<Anything>[];
  readonly tables: readonly Table<Anything>[];
}

/**
 * A known answer. The names that `values` and `tables` may read are inferred from `needs`, so that a misspelt one does not compile.
 *
 * @param id    name of the reference and of the rung
 * @param body  what it assumes and verifies, its inputs, its numbers and profiles
 * @returns     the reference
 */
export function reference<const N extends readonly Need[]>(id: string, body: Body<N>): Reference {
  const { needs, values, tables, ...about } = body;
  return { id, ...about, needs, values: values as unknown as readonly Answer<Anything>[], tables: (tables ?? []) as unknown as readonly Table<Anything>[] };
}

/**
 * Places at equal distances, ends included.
 *
 * @param from   first place
 * @param to     last place
 * @param count  number of intervals
 * @returns      count + 1 numbers
 */
export function places(from: number, to: number, count: number): number[] {
  return Array.from({ length: count + 1 }, (_, i) => (i === count ? to : from + ((to - from) * i) / count));
}
