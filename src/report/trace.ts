import type { Case } from '../case/index.ts';
import type { Spread, Step } from '../workings/index.ts';
import { wrapped } from './wrap.ts';
import { oneLine, writingOf, type Writing } from './writing.ts';

/** The way back from a number, with what its spread comes from. */
export interface Traced {
  readonly id: string;
  /** Inputs first, the number itself last. */
  readonly steps: readonly Step[];
  /** Spreads of the steps, by id; a step without any source of spread is left out. */
  readonly spreads: ReadonlyMap<string, Spread>;
}

/**
 * The screen of `trace`: the number, what its spread comes from, then every step from the inputs to it.
 *
 * @param traced  the steps and their spreads
 * @param on      the case, for the units that the user wrote
 * @returns       text without a last newline, at most 80 columns wide but for words longer than that
 */
export function traceText({ id, steps, spreads }: Traced, on: Case): string {
  const places = new Map(steps.map((step, i) => [step.id, i + 1]));
  const spread = spreads.get(id);
  const writing = writingOf(Object.fromEntries(steps.map((step) => [step.id, { ...step, ...boundsOf(spreads.get(step.id)) }])), on);
  const strained = steps.filter((step) => step.outside.length > 0).map((step) => step.id);
  return [
    wrapped(`${id} = ${writing.number(id)}, ${oneLine(steps.at(-1)?.name ?? '')}`, '  ', ''),
    ...(spread === undefined ? [] : [wrapped(sharesText(spread), '    ', '  ')]),
    ...(strained.length === 0 ? [] : [wrapped(`! outside the range of a formula on the way: ${strained.join(', ')}`, '    ', '  ')]),
    '',
    ...steps.map((step, i) => stepText(step, i + 1, places, writing)),
  ].join('\n');
}

const boundsOf = (spread: Spread | undefined): { low?: number; high?: number } => (spread === undefined ? {} : { low: spread.low, high: spread.high });

/** Where a spread comes from, the largest shares first. */
function sharesText({ shares, how }: Spread): string {
  const large = shares.filter((s) => s.share >= 0.01).slice(0, 4).map((s) => `${Math.round(100 * s.share)} % ${oneLine(s.label)}`);
  return `spread from ${large.join('; ')}${how === 'sampled' ? ' (sampled, since a word changes within it)' : ''}`;
}

const indent = ' '.repeat(6);

function stepText(step: Step, place: number, places: ReadonlyMap<string, number>, writing: Writing): string {
  const kind = step.kind === 'computed' ? '' : ` (${step.kind})`;
  const symbol = step.symbol === '' || step.symbol === step.id ? '' : `, ${oneLine(step.symbol)}`;
  const title = wrapped(`${step.id}${symbol} = ${writing.number(step.id)}${kind}`, indent, `${String(place).padStart(3)}.  `);
  return [title, ...notesOf(step, places, writing).map((note) => wrapped(note, `${indent}  `, indent))].join('\n');
}

function notesOf(step: Step, places: ReadonlyMap<string, number>, writing: Writing): string[] {
  const decision = /^(?:verdict|choice)\.(.+)$/.exec(step.id)?.[1];
  if (step.formula === 'decided' && decision !== undefined) return [`by its rule: runbrief rules ${decision}`];
  if (step.formula === step.kind) return []; // given or assumed in the case: there is no formula to show
  const put = step.needs.map((id) => `[${places.get(id) ?? '?'}] ${id} = ${writing.number(id)}`);
  return [
    oneLine(step.formula),
    ...(put.length === 0 ? [] : [`with ${put.join(', ')}`]),
    ...(step.when.length === 0 ? [] : [`since ${step.when.map((w) => `${w.id} is ${w.word}`).join(' and ')}`]),
    ...(step.ranges ?? []).map(({ need, range }) => `holds for ${need} ${rangeText(need, range, writing)}`),
    ...step.outside.map(({ need, value }) => `! ${need} = ${writing.like(need, value)} lies outside that range: the nearest formula is kept, its scatter doubled`),
    ...(step.scatter === undefined ? [] : [`scatter +/- ${Number((100 * step.scatter).toPrecision(2))} %`]),
    ...(step.loop === undefined ? [] : [`a loop, closed in ${step.loop.passes} ${step.loop.passes === 1 ? 'pass' : 'passes'} (last change ${step.loop.change.toExponential(0)})`]),
    ...(step.note === undefined ? [] : [`note: ${oneLine(step.note)}`]),
    `source: ${oneLine(step.source)}`,
  ];
}

function rangeText(need: string, [from, to]: readonly [number, number], writing: Writing): string {
  if (!Number.isFinite(to)) return `from ${writing.like(need, from)}`;
  return Number.isFinite(from) ? `${writing.like(need, from)} .. ${writing.like(need, to)}` : `up to ${writing.like(need, to)}`;
}

/**
 * The document of `trace --json`.
 *
 * @param traced  the steps and their spreads
 * @returns       id, value, unit, spread with its shares, steps; numbers in SI
 */
export function traceDocument({ id, steps, spreads }: Traced): object {
  const spread = spreads.get(id);
  const last = steps.at(-1);
  return { id, value: last?.value, unit: last?.unit, ...(spread === undefined ? {} : { low: spread.low, high: spread.high, coverage: 0.95, shares: spread.shares, how: spread.how }), steps: steps.map((step) => ({ ...step, ...boundsOf(spreads.get(step.id)), ...(step.ranges === undefined ? {} : { ranges: step.ranges.map(finiteRange) }) })) };
}

/** An end that is not finite is left out. */
function finiteRange({ need, range: [from, to] }: { readonly need: string; readonly range: readonly [number, number] }): object {
  return { need, ...(Number.isFinite(from) ? { from } : {}), ...(Number.isFinite(to) ? { to } : {}) };
}
