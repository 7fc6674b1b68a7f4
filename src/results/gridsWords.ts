import { printNumber } from '../units/index.ts';
import type { MeshFamily, Target } from './family.ts';
import { isTemperature } from './header.ts';
import type { GridNumbers } from './judge.ts';
import { allowed, type Limit, type Outcome } from './limit.ts';
import { showCount, showDifference, showNumber, showShare, showValue } from './show.ts';

/** All that the words about one target are made from. */
export interface GridFacts {
  readonly target: Target;
  readonly family: MeshFamily;
  readonly numbers: GridNumbers;
  readonly formalOrder: number;
  readonly iterationError: number;
  /** The iteration error was stated, not taken from the digits. */
  readonly stated: boolean;
  readonly limit?: Limit;
  readonly outcome?: Outcome;
}

/** What the data mean and what to do next, as sentences. */
export function gridSays(facts: GridFacts): string {
  return [kindSentence(facts), bandSentence(facts), outcomeSentence(facts), nextSentence(facts)].filter((sentence) => sentence !== '').join(' ');
}

function kindSentence({ numbers, formalOrder, target, family, iterationError }: GridFacts): string {
  const { kind, order, held } = numbers;
  const mesh = family.by === 'step' ? 'step' : 'mesh';
  const p = order === undefined ? '' : showNumber(order);
  const several = family.marks.length > 3 ? ' by least squares' : '';
  if (kind === 'two-grids') return `Two ${plural(mesh)} show a difference but no order; order ${showNumber(formalOrder)} is taken on trust.`;
  if (kind === 'converged' && value(target, 0) === value(target, 1)) return `The finest ${plural(mesh)} agree in every digit given: no order can be seen, ${showNumber(formalOrder)} is taken on trust.`;
  if (kind === 'converged') return `The finest ${plural(mesh)} differ by no more than ${showDifference(target, Math.max(iterationError, Math.abs(value(target, 0) - value(target, 1))))}, which is noise: no order can be seen, ${showNumber(formalOrder)} is taken on trust.`;
  if (kind === 'divergent') return `The values do not settle: the change toward the smallest ${mesh === 'step' ? 'step' : 'cells'} is no smaller than the change before it, so there is no order and no extrapolated value.`;
  const way = kind === 'oscillatory' ? 'The values swing as the mesh is refined, and the swing fades' : 'Steady approach';
  if (order === undefined) return `${way}, without an order that fits.`;
  const text = `${way} with apparent order ${p}${several}`;
  if (held === 'down') return `${text}, more than ${showNumber(formalOrder)} on paper can give: the band is formed with ${family.marks.length > 3 ? 'fixed orders' : showNumber(formalOrder)}.`;
  if (held === 'up') return `${text}, too low to be believed: the band is formed with ${family.marks.length > 3 ? 'fixed orders' : '0.5'} and a factor of 3.`;
  return `${text}.`;
}

function bandSentence({ target, numbers, family }: GridFacts): string {
  const fine = value(target, 0);
  const digits = digitsFor(numbers.halfWidth, fine);
  const finest = family.by === 'step' ? 'smallest step' : 'finest mesh';
  const share = fine === 0 || isTemperature(target) ? '' : ` (${showShare(numbers.halfWidth / Math.abs(fine))})`;
  const bare = numbers.held === 'no' || numbers.index === undefined || fine === 0 ? '' : `; by the bare order and 1.25 it were ${showDifference(target, numbers.index)}`;
  const zero = numbers.extrapolated === undefined ? '' : `, extrapolated to size zero ${showValue(target, numbers.extrapolated, digits)}`;
  const rule = numbers.kind === 'divergent' ? 'three times the largest change' : numbers.safetyFactor === 3 ? 'safety factor 3' : 'safety factor 1.25, which aims at 95 % and is not calibrated for every flow';
  return `The ${finest} reads ${showValue(target, fine, digits)} with a band of +/- ${showDifference(target, numbers.halfWidth)}${share}, ${rule}${bare}${zero}.`;
}

function outcomeSentence({ target, numbers, limit, outcome }: GridFacts): string {
  if (limit === undefined || outcome === undefined) return '';
  const asked = 'relative' in limit ? showShare(limit.relative) : showDifference(target, limit.absolute);
  if (outcome === 'met') return `The limit of ${asked} is met.`;
  if (outcome === 'missed') return `The limit of ${asked} is missed.`;
  const why = numbers.kind === 'divergent' ? 'data that do not settle tell nothing' : numbers.halfWidth >= Math.abs(value(target, 0)) ? 'the value cannot be told from zero, so a share of it means nothing' : 'the band is beyond it only because the evidence is thin';
  return `Whether the limit of ${asked} is met cannot be told: ${why}.`;
}

function nextSentence(facts: GridFacts): string {
  const { numbers, family, outcome } = facts;
  const step = family.by === 'step';
  if (numbers.kind === 'two-grids') return `Next: a third ${step ? 'step' : 'mesh'} of ${marked(facts, family.sizes.at(-1) as number, family.ratios[0] as number)}, or a finer one; three give the order and, if it can be believed, a factor of 1.25.`;
  if (numbers.kind === 'divergent') return `Next: run the two finest to tighter iterations first; if the change stays, leave out the coarsest and add a finer ${step ? 'step' : 'mesh of the same family, all zones refined alike'}.`;
  if (numbers.kind === 'oscillatory') return `Next: a ${family.marks.length + 1}th ${step ? 'step' : 'mesh'} ${family.marks.length === 3 ? 'is the surest test of a swing' : 'only after the iterations have been tightened'}.`;
  if (outcome === 'missed' || outcome === 'cannot tell') return finerSentence(facts);
  if (numbers.held === 'up') return 'Next: look for what lowers the order (first-order terms, limiters, sharp corners, a wall law) before this band is used.';
  return mediumSentence(facts);
}

/** How fine it must be for the limit, from the error that goes with h^p. */
function finerSentence(facts: GridFacts): string {
  const { numbers, limit, target, formalOrder } = facts;
  if (limit === undefined) return '';
  const order = numbers.held === 'no' && numbers.order !== undefined ? numbers.order : numbers.held === 'up' ? 0.5 : formalOrder;
  const wanted = allowed(limit, value(target, 0));
  if (!(wanted > 0)) return '';
  const finer = (numbers.halfWidth / wanted) ** (1 / order);
  if (finer > 100) return `Next: this family cannot reach the limit at order ${showNumber(order)}; find what holds the order down, or refine where the error sits.`;
  return `Next: the limit asks for about ${marked(facts, 1, 1 / finer)} at order ${showNumber(order)}.`;
}

/** Where the next coarser mesh would do as well. */
function mediumSentence({ numbers, limit, target, family }: GridFacts): string {
  if (limit === undefined || numbers.kind !== 'monotone' || numbers.held !== 'no' || numbers.order === undefined) return '';
  const medium = numbers.halfWidth * (family.ratios[0] as number) ** numbers.order;
  return medium <= allowed(limit, value(target, 1)) ? `The next coarser ${family.by === 'step' ? 'step' : 'mesh'} would do as well: its band is +/- ${showDifference(target, medium)}.` : '';
}

/** A mesh whose size is `times` that of one of the family, in words. */
function marked({ family }: GridFacts, from: number, times: number): string {
  const size = from * times;
  const finest = family.marks[0] as number;
  if (family.by === 'cells') return `${showCount(finest / size ** family.dimension)} cells`;
  return `${family.by} ${printNumber({ value: finest * size, unit: family.by === 'size' ? 'm' : 's', digits: 3 })}`;
}

/** What speaks against the numbers, each with its own figures. */
export function gridCautions(facts: GridFacts): string[] {
  const { target, numbers, iterationError, stated } = facts;
  const out: string[] = [];
  const steps = target.values.slice(1).map((v, i) => Math.abs(v - value(target, i)));
  const smallest = Math.min(...steps);
  if (!stated && numbers.kind !== 'converged' && smallest < 4.5 * target.lastDigit) out.push(`the smallest difference is ${showNumber(smallest / target.lastDigit, 2)} times the last digit printed, so the order is rounded away in part: write more digits`);
  if (stated && numbers.kind !== 'converged' && iterationError > 0.1 * numbers.halfWidth) out.push(`the iteration error of ${showDifference(target, iterationError)} is more than a tenth of the band: the order may be noise`);
  if (!stated && numbers.kind !== 'divergent' && numbers.halfWidth > iterationError) out.push(`the iteration error is not in the band: run the finest to two tolerances, the difference should stay below ${showDifference(target, 0.1 * numbers.halfWidth, 2)}`);
  if (numbers.halfWidth >= Math.abs(value(target, 0))) out.push('the value cannot be told from zero: the share of it means nothing, take the band in its unit');
  if (numbers.asymptoticRatio !== undefined && Math.abs(numbers.asymptoticRatio - 1) > 0.1) out.push(`the coarse band over r^p times the fine one is ${showNumber(numbers.asymptoticRatio)} where 1 is due: the coarsest is outside the range where one order holds`);
  if (numbers.scatter !== undefined && numbers.scatter >= 1) out.push('the values scatter about the fit by more than a mean step: the meshes are not one family, or the iterations are not converged');
  const [least, most] = [Math.min(...(numbers.tripletOrders ?? [])), Math.max(...(numbers.tripletOrders ?? []))];
  if (numbers.tripletOrders !== undefined && most - least > 0.5) out.push(`neighbouring triplets give orders from ${showNumber(least)} to ${showNumber(most)}`);
  return out;
}

const value = (target: Target, i: number): number => target.values[i] as number;
const plural = (word: string): string => (word === 'mesh' ? 'meshes' : `${word}s`);

/** Digits that a value bears when it has this half-width: down to a tenth of it. */
function digitsFor(halfWidth: number, value: number): number {
  if (halfWidth === 0 || value === 0) return 5;
  return Math.min(9, Math.max(4, Math.ceil(-Math.log10(halfWidth / Math.abs(value))) + 2));
}
