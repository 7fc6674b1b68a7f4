import { leavesOf, numberOf, testOf, unknownOf, type Truth } from './conditions.ts';
import type { FactSource } from './facts.ts';
import type { Band, Branch, EffectRule, Fixed, PriceLine, Verdict } from './form.ts';

/** Sets of verdicts as bits, in rising order of weight: the worse counts. */
const bit: Readonly<Record<Verdict, number>> = { 'leave-out': 1, borderline: 2, undecided: 4, include: 8 };
const ofBit: Readonly<Record<number, Verdict>> = { 1: 'leave-out', 2: 'borderline', 4: 'undecided', 8: 'include' };
const weight = (verdict: Verdict): number => bit[verdict];

/** What a branch says: whether it fits, and the set of verdicts it may give; more than one where a fact is not known. */
export interface Outcome {
  readonly fits: Truth;
  readonly can: number;
}
/** A set of verdicts. */
export const setOf = (of: readonly Verdict[]): number => of.reduce((set, v) => set | bit[v], 0);
/** The interval a deciding quantity runs over, by its spread or by the operating range. */
export type Interval = (id: string) => { readonly low: number; readonly high: number } | undefined;

/** The reading of one rule at one place. */
export interface Reading {
  readonly verdict: Verdict;
  readonly judged: boolean;
  /** The branch that counts, or what holds where none fits. */
  readonly branch: Branch | undefined;
  readonly fixed: Fixed | undefined;
  readonly prices: readonly PriceLine[];
}

/** The verdict of a number between two limits; at the limit itself the physics is kept. */
function bandVerdict(band: Pick<Band, 'smallMatters'>, x: number, leaveOutAt: number, includeAt: number): Verdict {
  const sign = band.smallMatters ? -1 : 1;
  if (sign * x >= sign * includeAt) return 'include';
  return sign * x < sign * leaveOutAt ? 'leave-out' : 'borderline';
}

/** The deciding quantity with its limits; undefined where one is missing. */
export function bandNumbers(band: Band, facts: FactSource): { x: number; leaveOutAt: number; includeAt: number } | undefined {
  const x = facts.of(band.deciding);
  const leaveOutAt = numberOf(band.leaveOutAt, facts);
  const includeAt = numberOf(band.includeAt, facts);
  if (typeof x !== 'number' || leaveOutAt === undefined || includeAt === undefined) return undefined;
  return { x: band.magnitude ? Math.abs(x) : x, leaveOutAt, includeAt };
}

function readBand(band: Band, facts: FactSource, interval: Interval | undefined): number {
  const numbers = bandNumbers(band, facts);
  if (numbers === undefined) {
    const closed = band.without !== undefined && !facts.askable(lacking(band, facts));
    return closed && band.without !== undefined ? bit[band.without.verdict] : bit.undecided;
  }
  const { x, leaveOutAt, includeAt } = numbers;
  const nominal = bandVerdict(band, x, leaveOutAt, includeAt);
  const over = interval?.(band.deciding);
  if (over === undefined) return bit[nominal];
  const ends = band.magnitude ? [Math.abs(over.low), Math.abs(over.high), ...(over.low < 0 && over.high > 0 ? [0] : [])] : [over.low, over.high];
  return ends.every((end) => bandVerdict(band, end, leaveOutAt, includeAt) === nominal) ? bit[nominal] : bit.borderline;
}

/** The first fact that a band lacks. */
function lacking(band: Band, facts: FactSource): string {
  const limits = [band.leaveOutAt, band.includeAt].flatMap((l) => (typeof l === 'number' ? [] : [l.quantity]));
  return [band.deciding, ...limits].find((id) => typeof facts.of(id) !== 'number') ?? band.deciding;
}

/**
 * What a branch says.
 *
 * @param branch    the branch
 * @param facts     what is known
 * @param interval  where given, a deciding quantity that crosses a limit over it is borderline
 * @returns         whether it fits, and the verdicts it may give
 */
export function outcome(branch: Branch, facts: FactSource, interval?: Interval): Outcome {
  const fits = testOf(branch.when)(facts, true);
  return { fits, can: fits === 0 ? 0 : branchBits(branch, facts, interval) };
}

function branchBits(branch: Branch, facts: FactSource, interval: Interval | undefined): number {
  const include = branch.includeIf === undefined ? 0 : testOf(branch.includeIf)(facts, true);
  const leaveOut = branch.leaveOutIf === undefined ? 0 : testOf(branch.leaveOutIf)(facts, true);
  let bits = include === 0 ? 0 : bit.include;
  if (include !== 1) {
    if (leaveOut !== 0) bits |= bit['leave-out'];
    if (leaveOut !== 1) bits |= branch.band === undefined ? bit[branch.verdict ?? 'undecided'] : readBand(branch.band, facts, interval);
  }
  bits = capped(bits, bit['leave-out'], branch.atLeastBorderlineIf === undefined ? 0 : testOf(branch.atLeastBorderlineIf)(facts, true));
  return capped(bits, bit.include, branch.atMostBorderlineIf === undefined ? 0 : testOf(branch.atMostBorderlineIf)(facts, true));
}

/** A verdict that a condition turns into borderline; where the condition is not known, either may hold. */
function capped(bits: number, from: number, truth: Truth): number {
  if (truth === 0 || (bits & from) === 0) return bits;
  return (truth === 1 ? bits & ~from : bits) | bit.borderline;
}

const single = (can: number): Verdict => ofBit[can] ?? 'undecided';

/**
 * The verdict of a rule from what its branches say: the first that fits, or the worst of those that fit.
 *
 * @param rule      the rule
 * @param outcomes  one for each branch
 * @returns         the verdict, the branch that counts (its index, -1 where none fits), and all branches that may fit
 */
export function combine(rule: EffectRule, outcomes: readonly Outcome[]): { verdict: Verdict; branch: number; fitting: readonly number[] } {
  return rule.combine === 'worst' ? combineWorst(rule, outcomes) : combineFirst(rule, outcomes);
}

function combineFirst(rule: EffectRule, outcomes: readonly Outcome[]): ReturnType<typeof combine> {
  const fitting: number[] = [];
  let can = 0;
  let sure = false;
  for (let k = 0; k < outcomes.length && !sure; k++) {
    const o = outcomes[k] as Outcome;
    if (o.fits === 0) continue;
    fitting.push(k);
    can |= o.can;
    sure = o.fits === 1;
  }
  if (!sure && rule.otherwise !== undefined) can |= bit[rule.otherwise.verdict];
  return { verdict: single(can), branch: fitting[0] ?? -1, fitting };
}

function combineWorst(rule: EffectRule, outcomes: readonly Outcome[]): ReturnType<typeof combine> {
  let branch = -1;
  const fitting = outcomes.flatMap((o, k) => (o.fits === 0 ? [] : [k]));
  for (const k of fitting) {
    const o = outcomes[k] as Outcome;
    if (o.fits === 1 && (branch < 0 || weight(single(o.can)) > weight(single((outcomes[branch] as Outcome).can)))) branch = k;
  }
  const sure = branch < 0 ? (rule.otherwise?.verdict ?? 'undecided') : single((outcomes[branch] as Outcome).can);
  const open = fitting.find((k) => outcomes[k]?.fits === 2 && (branch < 0 ? single((outcomes[k]).can) !== sure : weight(single((outcomes[k]).can)) > weight(sure)));
  return open === undefined || sure === 'include' ? { verdict: sure, branch, fitting } : { verdict: 'undecided', branch: branch < 0 ? open : branch, fitting };
}

/** Reads a rule against facts of one place. */
export function readRule(rule: EffectRule, facts: FactSource, interval?: Interval): Reading {
  const { verdict, branch, fitting } = combine(rule, rule.branches.map((b) => outcome(b, facts, interval)));
  const chosen = rule.branches[branch];
  const fixed = chosen === undefined ? rule.otherwise : undefined;
  const prices = rule.price.length === 0 && fitting.length === 1 ? (chosen?.price ?? []) : [...fitting.flatMap((k) => rule.branches[k]?.price ?? []), ...rule.price];
  return { verdict, branch: chosen, fixed, judged: verdict !== 'undecided' || (chosen ?? fixed)?.judged !== false, prices };
}

/** The facts for want of which a rule is undecided. */
export function lackingFacts(rule: EffectRule, facts: FactSource): string[] {
  const out = new Set<string>();
  for (const b of rule.branches) {
    const { fits, can } = outcome(b, facts);
    if (fits === 0) continue;
    for (const id of unknownOf(b.when, facts, true)) out.add(id);
    if (ofBit[can] === undefined) for (const c of [b.includeIf, b.leaveOutIf, b.atLeastBorderlineIf, b.atMostBorderlineIf]) for (const id of unknownOf(c, facts, true)) out.add(id);
    if ((can & bit.undecided) !== 0 && b.band !== undefined) {
      for (const id of [b.band.deciding, ...[b.band.leaveOutAt, b.band.includeAt].flatMap((l) => (typeof l === 'number' ? [] : [l.quantity]))]) if (facts.of(id) === undefined) out.add(id);
    }
    if (fits === 1 && rule.combine === 'first') break;
  }
  return [...out];
}

const regimeRead = new WeakMap<EffectRule, boolean>();
/** Whether the branches read the regime, so that a borderline regime calls for both readings. */
export function readsRegime(rule: EffectRule): boolean {
  let found = regimeRead.get(rule);
  if (found === undefined) {
    found = rule.bothRegimes && rule.branches.some((b) => [b.when, b.includeIf, b.leaveOutIf, b.atLeastBorderlineIf, b.atMostBorderlineIf].some((c) => leavesOf(c).some((l) => l.fact === 'verdict.turbulence' || l.fact === 'regime')));
    regimeRead.set(rule, found);
  }
  return found;
}

/** The worse of two verdicts: include, undecided, borderline, leave-out. */
export const worse = (a: Verdict, b: Verdict): boolean => weight(a) > weight(b);
