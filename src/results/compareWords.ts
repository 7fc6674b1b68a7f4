import { printNumber } from '../units/index.ts';
import type { Comparison, ValueComparison } from './comparison.ts';
import type { Head } from './header.ts';
import { showDifference, showShare, showValue } from './show.ts';

type Facts = Omit<Comparison, 'says' | 'cautions'>;

/** What the words need beside the numbers. */
export interface Around {
  readonly head: Head;
  readonly coordinate: { readonly name: string; readonly unit: string };
  readonly interpolationError: number;
  /** The result covers less than half of the known points. */
  readonly thin: boolean;
}

/** What a comparison means, as sentences. */
export function comparisonSays(facts: Facts, around: Around): string {
  return [distanceSentence(facts, around), uncertaintySentence(facts, around.head), outcomeSentence({ ...facts, scale: facts.norms.scale, whole: 'the range' }, around.head, around.thin)].join(' ');
}

function signed(head: Head, value: number): string {
  return `${value > 0 ? '+' : ''}${showDifference(head, value)}`;
}

function distanceSentence({ norms, place, deviation, measure }: Facts, { head, coordinate }: Around): string {
  const share = norms.scale > 0 ? ` (${showShare(Math.abs(norms.largest) / norms.scale)} of the range)` : '';
  const where = printNumber({ value: place.at, unit: coordinate.unit, digits: 4 });
  const rms = measure === 'rms' ? `; what is judged is the root mean square, ${showDifference(head, deviation)}` : `; root mean square ${showDifference(head, norms.l2)}`;
  return `The largest deviation is E = S - D = ${signed(head, norms.largest)}${share} at ${coordinate.name} = ${where}, where the result reads ${showValue(head, place.result)} and the known answer ${showValue(head, place.known)}${rms}.`;
}

/** What the comparison of a single number means, as sentences. */
export function valueSays(facts: Omit<ValueComparison, 'says'>, head: Head): string {
  const share = facts.known === 0 ? '' : ` (${showShare(Math.abs(facts.deviation / facts.known))})`;
  const first = `The result reads ${showValue(head, facts.result)}, the known answer ${showValue(head, facts.known)}: E = S - D = ${signed(head, facts.deviation)}${share}.`;
  return [first, uncertaintySentence(facts, head), outcomeSentence({ ...facts, scale: Math.abs(facts.known), whole: 'the known answer' }, head, false)].join(' ');
}

type Judged = Pick<Comparison, 'uncertainty' | 'validation' | 'telling' | 'parts' | 'deviation' | 'limit' | 'outcome'>;

function uncertaintySentence({ uncertainty, validation, telling, parts, deviation }: Judged, head: Head): string {
  if (uncertainty === undefined || validation === undefined) return 'The numerical uncertainty of the result is not known, so the deviation may be that of the mesh: give it as --numerical, from grids.';
  const named = [['numerical', parts.numerical], ['input', parts.input], ['statistical', parts.statistical], ['data', parts.data]] as const;
  const list = named.flatMap(([name, half]) => (half === undefined || half === 0 ? [] : [`${name} ${showDifference(head, half)}`])).join(', ');
  const root = `U_val = ${showDifference(head, validation)} at 95 %${list === '' ? '' : ` (root of squares of ${list})`}`;
  if (telling === true) return `It exceeds ${root}: the error of the model lies between ${signed(head, deviation - validation)} and ${signed(head, deviation + validation)}.`;
  return `It lies within ${root}: at this level the answers agree, and no finer; that does not make the model right.`;
}

function outcomeSentence({ limit, outcome, scale, whole, uncertainty, deviation }: Judged & { scale: number; whole: string }, head: Head, thin: boolean): string {
  const share = scale > 0 ? ` (${showShare(limit / scale)} of ${whole})` : '';
  const asked = `the limit of ${showDifference(head, limit)}${share}`;
  if (outcome === 'met') return `${capital(asked)} is met, the uncertainty of the result included.`;
  if (outcome === 'missed') return `${capital(asked)} is missed, the uncertainty of the result allowed for: stop here and mend this step before the next.`;
  if (uncertainty === undefined) return `Whether ${asked} is met cannot be told.`;
  if (thin && Math.abs(deviation) + uncertainty <= limit) return `Whether ${asked} is met cannot be told: the result covers less than half of the known points.`;
  return `Whether ${asked} is met cannot be told: with +/- ${showDifference(head, uncertainty)} the deviation may lie on either side; a finer mesh or a longer average decides.`;
}

/** What speaks against the numbers. */
export function comparisonCautions({ by, column, name, outside, points, limit, withinBand }: Facts, { head, coordinate, interpolationError }: Around): string[] {
  const out: string[] = [];
  if (by === 'unit') out.push(`the column "${column}" was taken for ${name} because of its unit alone`);
  if (outside.length > 0) out.push(`${outside.length} of ${points + outside.length} known points lie outside the result and were left out (${coordinate.name} ${ends(outside, coordinate.unit)}); nothing is extrapolated`);
  if (interpolationError > 0.2 * limit) out.push(`between the rows of the result, straight lines and smooth curves differ by up to ${showDifference(head, interpolationError)}: write the result at the known points or closer`);
  if (withinBand !== undefined) out.push(`${showShare(withinBand)} of the points lie within the band of the known answer`);
  return out;
}

const capital = (text: string): string => `${text.charAt(0).toUpperCase()}${text.slice(1)}`;

function ends(list: readonly number[], unit: string): string {
  const shown = (value: number): string => printNumber({ value, unit, digits: 4 });
  const [least, most] = [Math.min(...list), Math.max(...list)];
  return least === most ? shown(least) : `${shown(least)} to ${shown(most)}`;
}
