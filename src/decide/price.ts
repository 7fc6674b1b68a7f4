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

/**
 * The prices of one line for every target: the factor is set to 1 and the targets are read again.
 *
 * @param workings  the graph; it stands as before afterwards
 * @param line      factor F = with / without, or a number that is the price itself
 * @param place     where the rule was read
 * @param targets   targets of the case
 * @param acts      false where the effect or the line is exempt
 * @returns         one entry for each target that follows; where none does, one under the quantity's own name that does not act
 */
export function pricesOf(workings: Workings, line: PriceLine, place: string | undefined, targets: readonly Target[], acts: boolean): Weighed[] {
  const known = targets.filter((t) => t.computed && workings.get(targetNode(workings, t)) !== undefined);
  return line.factor === undefined ? valuePrices(workings, line, place, known, acts) : factorPrices(workings, line.factor, line.of, place, known, acts);
}

function factorPrices(workings: Workings, named: string, of: string, place: string | undefined, targets: readonly Target[], acts: boolean): Weighed[] {
  const factor = placedId(workings, named, place);
  const f = workings.get(factor);
  if (f === undefined) return [];
  const formula = f > 0 ? `1/F - 1, F = ${named} = ${short(f)}` : `F = ${named} = ${short(f)} is not positive`;
  const routes: [string, number][] = [[factor, 1]];
  const ofId = placedId(workings, of, place);
  const ofValue = workings.get(ofId);
  if (f > 0 && ofValue !== undefined) routes.push([ofId, ofValue / f]);
  const out: Weighed[] = [];
  let rest = targets;
  for (const [pin, to] of routes) {
    const follow = rest.filter((t) => follows(workings, pin, targetNode(workings, t)));
    const before = follow.map((t) => workings.get(targetNode(workings, t)) as number);
    if (follow.length === 0 || f <= 0) {
      out.push(...follow.map((t) => ({ price: { target: t.id, of, signChange: true as const, acts, formula }, share: acts ? Number.POSITIVE_INFINITY : 0 })));
      rest = rest.filter((t) => !follow.includes(t));
      continue;
    }
    const without = withPin(workings, pin, to, () => follow.map((t) => workings.get(targetNode(workings, t))));
    rest = rest.filter((t) => !follow.includes(t) || (f !== 1 && without[follow.indexOf(t)] === before[follow.indexOf(t)]));
    follow.forEach((t, k) => {
      const then = without[k];
      if (then !== undefined && !rest.includes(t)) out.push(weigh(workings, t, of, before[k] as number, then, acts, formula));
    });
  }
  if (out.length > 0) return out;
  return [{ price: { of, acts: false, formula, ...(f > 0 ? { relative: 1 / f - 1 } : { signChange: true as const }) }, share: 0 }];
}

function weigh(workings: Workings, target: Target, of: string, before: number, without: number, acts: boolean, formula: string): Weighed {
  const share = acts ? Math.abs(without - before) / tolerance(workings, target, before) : 0;
  const head = { target: target.id, of };
  const unit = unitOf(workings, target.quantity);
  const weighed = Number.isNaN(share) ? 0 : share;
  if (unit === 'K') return { price: { ...head, value: without - before, unit, acts, formula }, share: weighed };
  if (before === 0 || before * without < 0) return { price: { ...head, signChange: true, acts, formula }, share: acts ? Number.POSITIVE_INFINITY : 0 };
  return { price: { ...head, relative: without / before - 1, acts, formula }, share: weighed };
}

function valuePrices(workings: Workings, line: PriceLine, place: string | undefined, targets: readonly Target[], acts: boolean): Weighed[] {
  const id = placedId(workings, line.value as string, place);
  const value = workings.get(id);
  if (value === undefined) return [];
  const unit = unitOf(workings, id);
  const formula = `${line.value as string} = ${short(value)} ${unit === '1' ? '' : unit}`.trim();
  const out = targets.flatMap((t): Weighed[] => {
    const node = targetNode(workings, t);
    if (t.quantity !== line.of && !(unitOf(workings, node) === unit && follows(workings, placedId(workings, line.of, place), node))) return [];
    const share = Math.abs(value) / tolerance(workings, t, workings.get(node) as number);
    return [{ price: { target: t.id, of: line.of, value, unit, acts, formula }, share: acts && !Number.isNaN(share) ? share : 0 }];
  });
  return out.length > 0 ? out : [{ price: { of: line.of, value, unit, acts: false, formula }, share: 0 }];
}

function follows(workings: Workings, from: string, to: string): boolean {
  const a = workings.index.get(from);
  const b = workings.index.get(to);
  return a !== undefined && b !== undefined && workings.followers(a).includes(b);
}

/** Reads with one quantity pinned, and sets it free again. */
function withPin<T>(workings: Workings, id: string, value: number, read: () => T): T {
  const i = workings.index.get(id) as number;
  const kept = workings.isPinned(i) ? workings.get(id) : undefined;
  workings.set(id, value);
  const out = read();
  workings.set(id, kept);
  return out;
}

const short = (x: number): string => String(Number(x.toPrecision(4)));
