import { printNumber } from '../units/index.ts';
import { spreads } from '../workings/index.ts';
import type { Asked } from './question.ts';
import type { State } from './state.ts';
import type { View } from './view.ts';

/** Share of the square of a target's spread from which on an input is worth a second question. */
const large = 0.25;

/**
 * The input whose spread makes most of a target's, where the target is wider than it was asked to be.
 *
 * @param state  the answers so far
 * @param view   what they come to
 * @returns      what to ask again, with the value that stands
 */
export function widestInput(state: State, view: View): Asked | undefined {
  const { workings, targets } = view.settled.assembled;
  const kinds = new Map(workings.sources.map((source) => [source.key, source.kind]));
  let found: { path: string; share: number; quantity: string } | undefined;
  const spread = spreads(workings, targets.filter((target) => target.computed).map((target) => target.quantity));
  for (const { id, quantity, within } of targets) {
    const one = spread.get(quantity);
    const accuracy = workings.get(`${id}.accuracy`);
    if (one === undefined || within === undefined || accuracy === undefined || (one.high - one.low) / 2 <= accuracy) continue;
    for (const { key, share } of one.shares) {
      if (kinds.get(key) !== 'input' || share < large || !state.given.has(key) || state.later.has(key)) continue;
      if (found === undefined || share > found.share) found = { path: key, share, quantity };
    }
  }
  if (found === undefined) return undefined;
  const percent = printNumber({ value: found.share, unit: '1', toUnit: '%', digits: 2 });
  return { paths: [found.path], why: `it makes ${percent} of the spread of ${found.quantity}: known more narrowly?`, settles: [found.quantity], now: state.given.get(found.path)?.text ?? '' };
}
