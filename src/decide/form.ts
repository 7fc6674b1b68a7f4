export type Verdict = 'include' | 'leave-out' | 'borderline' | 'undecided';
export const verdicts: readonly Verdict[] = ['include', 'leave-out', 'borderline', 'undecided'];
export const operators = ['equal', 'notEqual', 'in', 'notIn', 'lessThan', 'lessThanInclusive', 'greaterThan', 'greaterThanInclusive'] as const;
export type Operator = (typeof operators)[number];
export const perKinds = ['wall', 'inlet', 'region', 'species', 'reaction', 'particle'] as const;

/** A number that stands once: as such, or as a share of a quantity. */
export interface Scaled {
  readonly quantity: string;
  readonly times: number;
}
export type Limit = number | Scaled;

export interface Leaf {
  readonly fact: string;
  readonly operator: Operator;
  readonly value: Limit | string | readonly string[];
  /** Why the effect cannot occur where the condition is false. */
  readonly else?: string;
}
export type Condition = { readonly all: readonly Condition[] } | { readonly any: readonly Condition[] } | Leaf;

export interface PriceLine {
  /** F = target with the effect / target without it. */
  readonly factor?: string;
  /** A price that is no ratio, in the unit of the quantity. */
  readonly value?: string;
  readonly of: string;
  readonly when?: Condition;
  readonly exempt?: boolean;
}
/** A verdict that stands without a deciding quantity. */
export interface Fixed {
  readonly verdict: Verdict;
  readonly judged: boolean;
  readonly because: string;
  readonly source?: string;
  readonly check?: string;
}
/** A physical bound of an input that may be missing. */
export interface InputBound {
  readonly input: string;
  readonly from: number;
  readonly to: number;
  readonly why: string;
}
export interface Band {
  readonly deciding: string;
  readonly leaveOutAt: Limit;
  readonly includeAt: Limit;
  readonly magnitude: boolean;
  readonly smallMatters: boolean;
  readonly without?: { readonly verdict: Verdict; readonly because: string };
  readonly bounds: readonly InputBound[];
}
export interface Branch {
  readonly id: string;
  readonly when?: Condition;
  readonly band?: Band;
  /** Where there is no band. */
  readonly verdict?: Verdict;
  readonly judged: boolean;
  readonly includeIf?: Condition;
  readonly leaveOutIf?: Condition;
  readonly atLeastBorderlineIf?: Condition;
  readonly atMostBorderlineIf?: Condition;
  readonly price: readonly PriceLine[];
  readonly because: string;
  readonly source: string;
  readonly check?: string;
}
export interface Said {
  readonly say: string;
  readonly when?: Condition;
}
export type Facts = Readonly<Record<string, number | string>>;
export interface EffectExample {
  readonly facts: Facts;
  readonly verdict: Verdict;
  readonly branch?: string;
  readonly applies?: boolean;
  readonly missing?: readonly string[];
  readonly none?: readonly string[];
  readonly why?: string;
}
export interface EffectRule {
  readonly effect: string;
  readonly title: string;
  readonly applies?: Condition;
  readonly branches: readonly Branch[];
  readonly combine: 'first' | 'worst';
  readonly otherwise?: Fixed;
  readonly per?: (typeof perKinds)[number];
  readonly price: readonly PriceLine[];
  readonly exempt: boolean;
  readonly bothRegimes: boolean;
  readonly then: readonly Said[];
  readonly attributes: readonly Said[];
  readonly check?: string;
  readonly examples: readonly EffectExample[];
}

export type Take = string | { readonly word: string };
export interface Option {
  readonly when?: Condition;
  readonly take: Take;
  readonly because: string;
  readonly source?: string;
  readonly check?: string;
  readonly needs: readonly string[];
}
export interface ChoiceExample {
  readonly facts: Facts;
  readonly take: string;
  readonly applies?: boolean;
  readonly why?: string;
}
export interface ChoiceRule {
  readonly choice: string;
  readonly title: string;
  readonly applies?: Condition;
  readonly options: Readonly<Record<string, string>>;
  /** Read first to last; the last one has no condition. */
  readonly entries: readonly Option[];
  readonly sources: readonly string[];
  readonly examples: readonly ChoiceExample[];
}

/** All rules as plain data: what the build writes and a start reads. */
export interface CompiledRules {
  readonly format: 1;
  readonly effects: Readonly<Record<string, EffectRule>>;
  readonly choices: Readonly<Record<string, ChoiceRule>>;
}
