import type { Definition, When } from '../workings/index.ts';

/** A size the user gives for a flow, path `sizes.<key>`. */
export interface Size {
  readonly key: string;
  readonly name: string;
  readonly unit: 'm' | 'm^3' | '1';
  readonly optional?: boolean;
  /** It may be `infinite`. */
  readonly infinite?: boolean;
}

/** A smaller region than the whole that may be computed, and what must hold for it. */
export interface Cut {
  readonly option: 'two-dimensional' | 'axisymmetric' | 'mirror-left-right' | 'mirror-top-bottom' | 'periodic-along-flow' | 'periodic-along-span';
  readonly holdsIf: string;
}

export interface Extent {
  readonly side: 'upstream' | 'downstream' | 'sides' | 'above';
  /** Quantity that holds the length. */
  readonly id: string;
  readonly source: string;
}

/** What is given for one variable at a boundary; numbers are quantities in braces. */
export interface Condition {
  readonly says: string;
  readonly when?: When;
  /** Effect that the model must carry for it. */
  readonly kept?: string;
}

/** One sentence, or several of which the first counts whose words and effects hold and whose numbers are known. */
export type Conditions = string | readonly Condition[];

/** A row of the table of boundaries: what each variable has there. Variables that are not solved are left out. */
export interface Boundary {
  readonly name: string;
  readonly is: 'wall' | 'inlet' | 'outlet' | 'open' | 'mirror' | 'joined' | 'point';
  /** Place of its quantities, such as `walls.left`. */
  readonly place?: string;
  readonly when?: When;
  readonly velocity: Conditions;
  readonly pressure: Conditions;
  readonly temperature: Conditions;
  readonly turbulence: Conditions;
  readonly species?: Conditions;
}

/** One step of the ladder: a reference, the one thing that changes, what is compared and how close it must come. */
export interface Rung {
  readonly reference: string;
  readonly changes: string;
  /** Number of the reference that is compared, by the id it has there. */
  readonly compares: string;
  /** Need of the reference: quantity or path of the case it is filled from. Needs not named keep their own id. */
  readonly with: Readonly<Record<string, string>>;
  readonly when?: When;
  /** Largest relative deviation from the reference. */
  readonly limit: number;
  readonly ifMissed: string;
  /** Order of accuracy that refinement must show. */
  readonly order?: number;
}

/** A configuration: its sizes and walls, its scales and correlations as definitions, and what it advises. */
export interface Flow {
  readonly id: string;
  readonly title: string;
  readonly lengthIs: string;
  readonly speedIs: string;
  readonly sizes: readonly Size[];
  /** Names of the walls, empty for a lone wall. */
  readonly walls: readonly string[];
  readonly targetWall?: string;
  /** What targets usually ask for and is estimated here; the examples are tested to give each. */
  readonly answers: readonly string[];
  readonly stations: readonly string[];
  readonly regions: readonly string[];
  /** Words this flow fixes, by the id of the word. */
  readonly words: Readonly<Record<string, string>>;
  readonly definitions: readonly Definition[];
  /** What it adds where a species is carried, beside its laws of heat read by analogy. */
  readonly carried?: readonly Definition[];
  readonly leastRegion: string;
  readonly cuts: readonly Cut[];
  readonly domain: readonly Extent[];
  /** Every boundary with the condition of each variable. */
  readonly boundaries: readonly Boundary[];
  /** When common simplifications hold and when they fail. */
  readonly simplifications: readonly string[];
  /** What a right picture must show, and what the usual wrong ones look like. */
  readonly look: { readonly mustShow: readonly string[]; readonly probes: readonly string[]; readonly wrong: readonly string[] };
  readonly ladder: readonly Rung[];
}
