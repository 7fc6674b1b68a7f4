/** The Plan as other programs read it: numbers in SI, absent keys left out, the same for the same input. */
export interface Plan {
  readonly program: string;
  readonly format: 1;
  readonly case: { readonly file: string; readonly title: string; readonly sha256: string };
  readonly targets: readonly PlanTarget[];
  readonly quantities: Readonly<Record<string, PlanQuantity>>;
  readonly effects: readonly PlanEffect[];
  readonly choices: readonly PlanChoice[];
  readonly ladder: readonly PlanRung[];
  readonly sections: Readonly<Record<SectionName, Section>>;
  readonly checklist: readonly Check[];
  readonly contradictions: readonly Contradiction[];
}

export interface PlanTarget {
  readonly id: string;
  readonly quantity: string;
  readonly place?: string;
  readonly mean?: string;
  readonly within?: string;
  readonly computed: boolean;
  /** Why the number that the laws give is no estimate. */
  readonly refused?: string;
  /** Quantities that may be meant where the words name none. */
  readonly near?: readonly string[];
}

export interface PlanQuantity {
  readonly symbol: string;
  readonly name: string;
  readonly value: number | string;
  readonly unit: string;
  readonly kind: 'given' | 'assumed' | 'computed' | 'decided';
  readonly at?: string;
  readonly low?: number;
  readonly high?: number;
  readonly coverage?: number;
  readonly range?: { readonly from: number; readonly to: number };
  readonly formula: string;
  readonly needs: readonly string[];
  readonly source: string;
  readonly withinRange: boolean;
  readonly outside?: readonly string[];
  readonly note?: string;
}

export type Verdict = 'include' | 'leave-out' | 'borderline' | 'undecided';
export interface Price {
  readonly target?: string;
  readonly of: string;
  readonly relative?: number;
  readonly value?: number;
  readonly unit?: string;
  readonly signChange?: true;
  readonly acts: boolean;
  readonly formula: string;
}
export interface PlanEffect {
  readonly id: string;
  readonly title: string;
  readonly applies: boolean | 'unknown';
  readonly judged: boolean;
  readonly verdict: Verdict;
  readonly base?: Verdict;
  readonly movedBy?: 'range' | 'spread' | 'price' | 'passes';
  readonly deciding?: { readonly quantity: string; readonly value: number; readonly leaveOutAt: number; readonly includeAt: number; readonly margin?: number; readonly marginKind?: 'factor' | 'difference'; readonly branch: string };
  readonly because: string;
  readonly flipsAt?: readonly { readonly path: string; readonly value: number; readonly unit: string; readonly verdict: Verdict }[];
  readonly price?: Price;
  readonly prices?: readonly Price[];
  readonly check?: string;
  readonly firstRun?: 'keep' | 'leave-out';
  readonly then?: readonly string[];
  readonly missing?: readonly string[];
  readonly sources?: readonly string[];
}
export interface PlanChoice {
  readonly id: string;
  readonly title: string;
  readonly applies: boolean | 'unknown';
  readonly judged?: boolean;
  readonly chosen: string;
  readonly given?: true;
  readonly advised?: string;
  readonly because: string;
  readonly rejected: readonly { readonly option: string; readonly because: string }[];
  readonly check?: string;
  readonly sources?: readonly string[];
}
export interface PlanRung {
  readonly id: string;
  readonly changes: string;
  readonly quantity: string;
  readonly value?: number;
  readonly low?: number;
  readonly high?: number;
  readonly limit: { readonly quantity: string; readonly atLeast?: number; readonly atMost?: number; readonly unit: string };
  readonly ifMissed: string;
}

/** A table cell is text or a quantity. In a line, `{id}` stands for the number of that quantity with unit and spread; the report fills it in. */
export type Cell = string | { readonly id: string };
export interface Line {
  readonly text: string;
  readonly quantities: readonly string[];
}
export interface Table {
  readonly title: string;
  readonly columns: readonly string[];
  readonly rows: readonly (readonly Cell[])[];
}
export interface Section {
  readonly lines: readonly Line[];
  readonly tables: readonly Table[];
}
export const sectionNames = ['question', 'physics', 'properties', 'domain', 'boundaries', 'turbulence', 'mesh', 'time', 'numerics', 'coupling', 'cost', 'verification', 'ladder', 'watch', 'afterRun', 'documentation', 'cautions'] as const;
export type SectionName = (typeof sectionNames)[number];

export interface Check {
  readonly id: string;
  readonly stage: string;
  readonly text: string;
  readonly limit?: string;
  readonly where?: string;
}
export interface Contradiction {
  readonly code: string;
  readonly path: string;
  readonly line?: number;
  readonly says: string;
  readonly effect: string;
  readonly cure: string;
}
