import { flip, type Workings } from '../workings/index.ts';
import type { CompiledRules, Verdict } from './form.ts';
import type { Target } from './price.ts';
import { settle, type SettleOptions } from './settle.ts';

/** An input of the case, and the interval in which a change of verdict is of interest [SI]. */
export interface FlipInput {
  readonly path: string;
  readonly lo: number;
  readonly hi: number;
}
/** Where one input alone changes a verdict: its value, and the verdict beyond it. */
export interface FlipAt {
  readonly path: string;
  readonly value: number;
  readonly unit: string;
  readonly verdict: Verdict;
}

const points = 9;
const within = 1e-4;

/**
 * Where each input alone changes the verdict of the nominal value (range, spread and price aside): one scan per input for all effects, then bisection between neighbouring points.
 *
 * @param workings  the graph; it stands at its nominal point, settled, afterwards
 * @param rules     compiled rules
 * @param targets   targets of the case
 * @param inputs    inputs that have a number, with the interval to scan
 * @param options   as for `settle`; spreads and ranges are not read
 * @returns         flip values by effect, the nearest to the nominal value first; relative width 1e-4
 */
export function flips(workings: Workings, rules: CompiledRules, targets: readonly Target[], inputs: readonly FlipInput[], options: SettleOptions = {}): Map<string, FlipAt[]> {
  const found = new Map<string, (FlipAt & { far: number })[]>();
  for (const input of inputs) {
    const nominal = workings.get(input.path);
    const i = workings.index.get(input.path);
    if (nominal === undefined || i === undefined || !(input.hi > input.lo)) continue;
    const unit = workings.slots[i]?.node.about.unit ?? '1';
    const pinned = workings.isPinned(i);
    const seen = new Map<number, ReadonlyMap<string, Verdict>>();
    const at = (x: number): ReadonlyMap<string, Verdict> => {
      let read = seen.get(x);
      if (read === undefined) {
        workings.set(input.path, x);
        const state = settle(workings, rules, [], { askable: options.askable, chosen: options.chosen, lean: true, verdictsOnly: true });
        seen.set(x, (read = new Map([...state.effects].map(([id, e]) => [id, e.verdict]))));
      }
      return read;
    };
    // From the nominal value outwards: beyond a flip value lies the verdict that is taken.
    const grid = scan(input, nominal);
    const middle = grid.findIndex((x) => x >= nominal);
    const outward = [grid.slice(middle === -1 ? grid.length - 1 : middle), grid.slice(0, middle === -1 ? grid.length : middle + 1).reverse()];
    for (const side of outward) {
      for (let k = 1; k < side.length; k++) {
        const [a, b] = [side[k - 1] as number, side[k] as number];
        for (const [id, verdict] of at(b)) {
          if (at(a).get(id) === verdict) continue;
          const value = flip((x) => at(x).get(id), a, b, within);
          found.set(id, [...(found.get(id) ?? []), { path: input.path, value, unit, verdict: at(value).get(id) as Verdict, far: distance(value, nominal) }]);
        }
      }
    }
    workings.set(input.path, pinned ? nominal : undefined);
  }
  settle(workings, rules, targets, options);
  return new Map([...found].map(([id, list]) => [id, list.sort((a, b) => (Math.abs(a.far - b.far) <= alike ? 0 : a.far - b.far)).map(({ path, value, unit, verdict }) => ({ path, value, unit, verdict }))]));
}

/** Points over the interval, even in the logarithm where both ends are positive, with the nominal value among them. */
function scan(input: FlipInput, nominal: number): number[] {
  const { lo, hi } = input;
  const log = lo > 0;
  const grid = Array.from({ length: points }, (_, k) => (log ? lo * (hi / lo) ** (k / (points - 1)) : lo + ((hi - lo) * k) / (points - 1)));
  if (nominal > lo && nominal < hi && !grid.includes(nominal)) grid.push(nominal);
  return grid.sort((a, b) => a - b);
}

/** Distances that differ by less than the bisection resolves are equal; inputs then keep their order. */
const alike = 20 * within;

const distance = (a: number, b: number): number => (a > 0 && b > 0 ? Math.abs(Math.log(a / b)) : Math.abs(a - b));
