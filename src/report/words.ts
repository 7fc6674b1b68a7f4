import type { Plan, PlanEffect, Price } from '../plan/index.ts';
import { printNumber } from '../units/index.ts';
import { oneLine, type Writing } from './writing.ts';

/** The title of a plan; its file where the case has none. */
export const titled = (plan: Plan): string => oneLine(plan.case.title === '' ? plan.case.file : plan.case.title);

const few = (value: number): string => printNumber({ value, unit: '1', digits: 2 });

/** How far a decision is from its nearer limit: `9.3 times`, `12 K`; empty where that is not finite. */
export function factorText(e: PlanEffect): string {
  const d = e.deciding;
  if (d?.margin === undefined) return '';
  if (atLimit(e)) return 'at its limit';
  return d.marginKind === 'difference' ? printNumber({ value: d.margin, unit: 'K', digits: 2 }) : `${printNumber({ value: d.margin, unit: '1', digits: d.margin < 1.05 ? 3 : 2 })} times`;
}

/** So near that a factor would read as 1. */
const atLimit = ({ deciding: d }: PlanEffect): boolean => d?.margin !== undefined && (d.marginKind === 'difference' ? d.margin === 0 : d.margin < 1.005);

/** What may be left off where room is short. */
export interface Shorter {
  /** The number alone, without limit or margin. */
  readonly bare?: true;
  readonly spread?: false;
  readonly limit?: false;
}

/** The number that decides, beside the limit on the side of the verdict: `Re 22600 +/- 5 %, 9.8 times past 2300`. */
export function decidingText(e: PlanEffect, writing: Writing, shorter: Shorter = {}): string {
  const d = e.deciding;
  if (d === undefined) return '';
  const symbol = writing.symbol(d.quantity);
  const known = writing.number(d.quantity);
  const number = known === 'not known' ? few(d.value) : shorter.spread === false ? known.replace(/ \+\/- .*$/, '') : known;
  if (shorter.bare === true) return `${symbol} ${number}`;
  const limit = (value: number): string => writing.like(d.quantity, value);
  // Moved by its spread alone, it lies outside the limits: the spread is what is to be seen.
  if (e.movedBy === 'spread' && shorter.spread !== false) return `${symbol} ${number}, reaching ${limit(e.base === 'include' ? d.includeAt : d.leaveOutAt)}`;
  if (e.verdict === 'borderline' && d.leaveOutAt !== d.includeAt) return `${symbol} ${number}, limits ${limit(d.leaveOutAt)} and ${limit(d.includeAt)}`;
  const nearer = limit(e.verdict === 'leave-out' ? d.leaveOutAt : d.includeAt);
  const margin = factorText(e);
  if (atLimit(e) && e.verdict !== 'borderline') return `${symbol} ${number}, at its limit ${nearer}`;
  if (shorter.limit === false && margin !== '' && e.verdict !== 'borderline') return `${symbol} ${number}, ${margin} past its limit`;
  return `${symbol} ${number}, ${margin === '' || e.verdict === 'borderline' ? `limit ${nearer}` : `${margin} past ${nearer}`}`;
}

/** The quantity that a price is told of: that of its target, and where it moves none the one that its factor multiplies. */
export const pricedOf = (p: Price, plan: Plan): string => plan.targets.find((t) => t.id === p.target)?.quantity ?? p.of;

/** What leaving an effect out costs, of a quantity in words. */
export function priceText(p: Price, what: string): string {
  const of = oneLine(what);
  if (p.signChange === true) return `changes the sign of ${of}`;
  if (p.value !== undefined) return `${printNumber({ value: p.value, unit: p.unit ?? '1', difference: true, digits: 2 })} of ${of}`;
  if (p.relative === undefined) return '';
  return `${percent(p.relative)} of ${of}`;
}

/** A share as `+12 %`, `-0.3 %`, `below 0.01 %`. */
export function percent(share: number): string {
  if (Math.abs(share) < 1e-4) return 'below 0.01 %';
  return `${share > 0 ? '+' : ''}${Number((100 * share).toPrecision(2))} %`;
}

/** Cautions of the plan in its order. */
export function cautionLines(plan: Plan, writing: Writing): string[] {
  return plan.sections.cautions.lines.map((line) => writing.fill(line.text));
}
