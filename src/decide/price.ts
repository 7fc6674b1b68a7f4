import type { Workings } from '../workings/index.ts';
import { placedId } from './facts.ts';
import type { PriceLine } from './form.ts';

/** What the user wants to know, and how exactly. */
export interface Target {
  readonly id: string;
  readonly quantity: string;
  readonly place?: string | undefined;
  /** Share of the value, share of its change, or a number in its SI unit. */
  readonly within?: { readonly relative?: number | undefined; readonly ofChange?: number | undefined; readonly absolute?: number | undefined } | undefined;
  readonly computed: boolean;
}
/** What leaving an effect out costs: (without - with)/with, or a difference in the target's unit. */
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
/** A price with its size against the target's tolerance. */
export interface Weighed {
  readonly price: Price;
  readonly share: number;
}

const usual = 0.02;

/** Id of the number that a target asks for. */
const targetNode = (workings: Workings, target: Target): string => (target.place !== undefined && workings.has(`${target.quantity}@${target.place}`) ? `${target.quantity}@${target.place}` : target.quantity);

const unitOf = (workings: Workings, id: string): string => workings.slots[workings.index.get(id) ?? -1]?.node.about.unit ?? '1';

/** The tolerance of a target in its unit: 2 % unless it states one; of its change where it is a temperature. */
function tolerance(workings: Workings, target: Target, value: number): number {
  const within = target.within ?? {};
  if (within.absolute !== undefined) return within.absolute;
  const difference = /difference/i.test(target.quantity);
  if (difference || unitOf(workings, target.quantity) !== 'K') return (within.relative ?? within.ofChange ?? usual) * Math.abs(value);
  const from = workings.get('inletTemperature');
  const change = from !== undefined && from !== value ? Math.abs(value - from) : (workings.get('temperatureDifference') ?? Number.NaN);
  return (within.ofChange ?? within.relative ?? usual) * change;
}

/** A computed target with its node and value as printed, read once a point. */
export interface Read {
  readonly target: Target;
  readonly node: string;
  readonly value: number;
}

/** The targets that have a number. */
export function readTargets(workings: Workings, targets: readonly Target[]): Read[] {
  return targets.flatMap((target) => {
    const node = targetNode(workings, target);
    const value = target.computed ? workings.get(node) : undefined;
    return value === undefined ? [] : [{ target, node, value }];
  });
}

/**
 * The prices of one line for every target: the factor is set to 1 and the targets are read again.
 *
 * @param workings  the graph; it stands as before afterwards
 * @param line      factor F = with / without, or a number that is the price itself
 * @param place     where the rule was read
 * @param targets   targets with their values as printed
 * @param acts      false where the effect or the line is exempt
 * @returns         one entry for each target that follows; where none does, one under the quantity's own name that does not act
 */
export function pricesOf(workings: Workings, line: PriceLine, place: string | undefined, targets: readonly Read[], acts: boolean): Weighed[] {
  return line.factor === undefined ? valuePrices(workings, line, place, targets, acts) : factorPrices(workings, line.factor, line.of, place, targets, acts);
}

function factorPrices(workings: Workings, named: string, of: string, place: string | undefined, targets: readonly Read[], acts: boolean): Weighed[] {
  const factors = copiesOf(workings, placedId(workings, named, place));
  const f = workings.get(factors[0] as string);
  if (f === undefined || (f === 1 && fromNothing(workings, factors[0] as string)) || notPriced(workings, named, place) !== undefined) return [];
  const formula = f > 0 ? `1/F - 1, F = ${named} = ${short(f)}` : `F = ${named} = ${short(f)} is not positive`;
  const out: Weighed[] = [];
  let rest = targets;
  // Where the targets do not hold the factor itself, the quantity that it multiplies is divided by it.
  for (const pins of [factors.map((id): Pin => [id, 1]), f > 0 ? copiesOf(workings, placedId(workings, of, place)).map((id): Pin => [id, (workings.get(id) ?? Number.NaN) / f]) : []]) {
    const follow = rest.filter((t) => pins.some(([id]) => follows(workings, id, t.node)));
    if (follow.length === 0) continue;
    if (f <= 0) out.push(...follow.map((t) => ({ price: { target: t.target.id, of, signChange: true as const, acts, formula }, share: acts ? Number.POSITIVE_INFINITY : 0 })));
    else {
      const idle = factors.every((id) => workings.get(id) === 1);
      const without = idle ? follow.map((t) => t.value) : withPins(workings, pins, () => follow.map((t) => workings.get(t.node)));
      rest = rest.filter((t) => !follow.includes(t) || (!idle && without[follow.indexOf(t)] === t.value));
      follow.forEach((t, k) => {
        const then = without[k];
        if (then !== undefined && !rest.includes(t)) out.push(weigh(workings, t, of, then, acts, formula));
      });
    }
  }
  if (out.length > 0) return out;
  return [{ price: { of, acts: false, formula, ...(f > 0 ? { relative: 1 / f - 1 } : { signChange: true as const }) }, share: 0 }];
}

/**
 * Why a factor has no price: the law behind it does not reach this point, and what it gives there may even change its sign.
 *
 * @param workings  the graph
 * @param named     factor
 * @param place     where the rule was read
 * @returns         the range that was left, in words; undefined where the law holds
 */
export function notPriced(workings: Workings, named: string, place: string | undefined): string | undefined {
  const factor = copiesOf(workings, placedId(workings, named, place))[0] as string;
  for (const id of [factor, ...[workings.index.get(`${named}Law`)].flatMap((i) => (i === undefined ? [] : [`${named}Law`]))]) {
    const i = workings.index.get(id);
    const left = i === undefined || !workings.known(i) || workings.isPinned(i) ? undefined : workings.outside(i)[0];
    if (left !== undefined) return `${left.need} is ${short(left.value)} where the law of ${named} holds from ${short(left.range[0])} to ${short(left.range[1])}`;
  }
  return undefined;
}

/** Whether a factor is 1 for want of a law here: then there is no price, which is not a price of nothing. */
function fromNothing(workings: Workings, id: string): boolean {
  const i = workings.index.get(id) ?? -1;
  const by = workings.isPinned(i) ? undefined : workings.used[i];
  const [first, second] = by?.ids ?? [];
  // The plain id of a factor that walls have repeats that of one of them.
  return by !== undefined && (first === undefined || (second === undefined && first.startsWith(`${id}@`) && fromNothing(workings, first)));
}

function weigh(workings: Workings, { target, value: before }: Read, of: string, without: number, acts: boolean, formula: string): Weighed {
  const share = acts ? Math.abs(without - before) / tolerance(workings, target, before) : 0;
  const head = { target: target.id, of };
  const unit = unitOf(workings, target.quantity);
  const weighed = Number.isNaN(share) ? 0 : share;
  if (unit === 'K') return { price: { ...head, value: without - before, unit, acts, formula }, share: weighed };
  if (before === 0 || before * without < 0) return { price: { ...head, signChange: true, acts, formula }, share: acts ? Number.POSITIVE_INFINITY : 0 };
  return { price: { ...head, relative: without / before - 1, acts, formula }, share: weighed };
}

function valuePrices(workings: Workings, line: PriceLine, place: string | undefined, targets: readonly Read[], acts: boolean): Weighed[] {
  const id = placedId(workings, line.value as string, place);
  const value = workings.get(id);
  if (value === undefined) return [];
  const unit = unitOf(workings, id);
  const formula = `${line.value as string} = ${short(value)} ${unit === '1' ? '' : unit}`.trim();
  const out = targets.flatMap(({ target, node, value: printed }): Weighed[] => {
    if (target.quantity !== line.of && !(unitOf(workings, node) === unit && follows(workings, placedId(workings, line.of, place), node))) return [];
    const share = Math.abs(value) / tolerance(workings, target, printed);
    return [{ price: { target: target.id, of: line.of, value, unit, acts, formula }, share: acts && !Number.isNaN(share) ? share : 0 }];
  });
  return out.length > 0 ? out : [{ price: { of: line.of, value, unit, acts: false, formula }, share: 0 }];
}

const copies = new WeakMap<Workings, Map<string, readonly string[]>>();
/** An id and, where it is a plain one, its copies at all places: left out is left out everywhere. */
function copiesOf(workings: Workings, id: string): readonly string[] {
  const mine = copies.get(workings) ?? new Map<string, readonly string[]>();
  copies.set(workings, mine);
  let found = mine.get(id);
  if (found === undefined) mine.set(id, (found = id.includes('@') ? [id] : [id, ...[...workings.index.keys()].filter((other) => other.startsWith(`${id}@`))]));
  return found;
}

function follows(workings: Workings, from: string, to: string): boolean {
  const a = workings.index.get(from);
  const b = workings.index.get(to);
  return a !== undefined && b !== undefined && workings.followers(a).includes(b);
}

type Pin = readonly [id: string, value: number];
/** Reads with quantities pinned, and sets them free again. */
function withPins<T>(workings: Workings, pins: readonly Pin[], read: () => T): T {
  return workings.aside(pins.filter(([id, value]) => workings.has(id) && !Number.isNaN(value)), read);
}

const short = (x: number): string => String(Number(x.toPrecision(4)));
