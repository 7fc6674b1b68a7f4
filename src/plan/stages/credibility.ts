import { ladderDetails } from '../../ladder/index.ts';
import { table, type Ground } from '../ground.ts';
import { targetSpreads } from '../target-spread.ts';
import type { Cell, Table } from '../types.ts';

/** Level that the harm of a wrong answer asks for on every factor. */
const asked: Readonly<Record<string, number>> = { low: 1, medium: 2, high: 3 };

/** Credibility factor by factor: now, before any run, and once the ladder has been climbed as planned. */
export function credibility(on: Ground): Table {
  const details = ladderDetails(on.assembled);
  const near = Math.min(...details.flatMap((d) => { const at = on.number(d.distance); return at === undefined ? [] : [at]; }), Infinity);
  const spreads = targetSpreads(on.assembled);
  const inputs = [...on.assembled.case.entries.values()].filter((e) => e.kind === 'quantity' && on.has(e.path) && !/^(computing|choices|targets|format)\b/.test(e.path));
  const withSpread = inputs.filter((e) => e.spread !== undefined || e.range !== undefined).length;
  const need = asked[on.assembled.case.ifWrong ?? 'medium'] ?? 2;
  const row = (factor: string, now: number, then: number, by: string): Cell[] => [factor, String(now), String(then), String(need), by];
  return table('Credibility by factor, 0 to 4; the lowest counts, never the mean', ['factor', 'now', 'after the ladder', 'asked', 'rests on'], [
    row('code checks', 0, details.some((d) => d.reference.id === 'manufactured-solution') ? (details.some((d) => d.reference.kind === 'exact' && d.order !== undefined) ? 4 : 3) : 2, 'chosen fields and exact rungs with their order'),
    row('solution checks', on.has('meshError') ? 1 : 0, 3, 'forecast now; three meshes, iteration apart, steps'),
    row('validation', 0, near < 0.5 ? 3 : near < 2 ? 2 : 1, Number.isFinite(near) ? 'distance of the nearest answer in the table of the ladder' : 'no answer with a group in common'),
    row('input pedigree', withSpread === 0 ? 1 : withSpread * 2 >= inputs.length ? 2 : 1, withSpread * 2 >= inputs.length ? 3 : 2, `${withSpread} of ${inputs.length} inputs carry a spread`),
    row('uncertainty of the result', spreads.length > 0 ? 2 : 0, 3, 'slopes of the estimate now; runs at the ends of the inputs then'),
    row('robustness', on.decisions.effects.some((e) => (e.flipsAt ?? []).length > 0) ? 2 : 1, 3, 'larger region, second start, second closure'),
    row('management', 2, 2, 'inputs, versions and hash kept in this plan'),
    ['history of use', 'ask', 'ask', String(need), 'has this set-up met reality before'],
    ['people', 'ask', 'ask', String(need), 'who has run or validated this flow'],
  ]);
}
