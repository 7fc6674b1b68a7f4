import { ladderDetails, skippedRungs, type RungDetail, type SkippedRung } from '../../ladder/index.ts';
import { lines, table, type Ground, type StageResult } from '../ground.ts';
import { listed, nameOf, plain } from '../say.ts';
import type { Cell, Check, Line, PlanRung, Table } from '../types.ts';

import { distances } from './ladder-distance.ts';
import { experimentLines, forecastTable } from './ladder-experiment.ts';

/** The ladder from a known answer to this case: one change a rung, numbers known beforehand, limits fixed beforehand. */
export function ladder(on: Ground): StageResult {
  const details = ladderDetails(on.assembled);
  return {
    lines: [
      ...lines(
        'Same program, schemes, kind of mesh and wall spacing on every rung as in the last run; a rung that is missed stops the climb until it is mended. A limit is never widened by the errors of a run, and a rung run on one mesh alone is not met.',
        details.some((d) => d.reference.kind === 'exact') && `Order as well as number: ${listed(details.filter((d) => d.order !== undefined || d.reference.id === 'manufactured-solution').map((d) => d.rung.id))} must show {schemeOrder} within 0.4 between the two finest meshes.`,
      ),
      ...skippedLines(on),
      ...effectSteps(on),
      ...distances(on, details).lines,
      ...experimentLines(on),
      ...lines('Kept apart: a number that was tuned to data (turbulent Prandtl number, sand grain, contact resistance) is listed as tuned, and the data it was tuned to prove nothing afterwards. Hold a third of the points back, the farthest ones.'),
    ],
    tables: [rungTable(on, details), ...referenceTable(details), ...distances(on, details).tables, ...forecastTable(on)],
    checklist: on.ladder.map((r): Check => ({ id: `rung-${r.id}`, stage: 'ladder', text: `${r.changes}: {${r.quantity}}`, limit: limitText(r), where: `look first, if missed: ${r.ifMissed}` })),
  };
}

function limitText({ limit }: PlanRung): string {
  const unit = limit.unit === '1' ? '' : ` ${limit.unit}`;
  if (limit.atLeast !== undefined && limit.atMost !== undefined) return `${plain(limit.atLeast)} to ${plain(limit.atMost)}${unit}`;
  if (limit.atLeast !== undefined) return `at least ${plain(limit.atLeast)}${unit}`;
  return limit.atMost === undefined ? 'no number for these inputs' : `at most ${plain(limit.atMost)}${unit}`;
}

function rungTable(on: Ground, details: readonly RungDetail[]): Table {
  const rows = on.ladder.map((r, i): Cell[] => {
    const d = details.find((one) => one.rung.id === r.id);
    return [String(i), r.id, r.changes, on.has(r.quantity) ? { id: r.quantity } : 'no number for these inputs', d !== undefined && r.id !== 'manufactured-solution' && on.has(d.tolerance) ? { id: d.tolerance } : '', limitText(r), r.ifMissed];
  });
  const target = on.assembled.targets.find((t) => t.computed);
  const share = target === undefined ? '' : `${target.id}.accuracyShare`;
  const last: Cell[] = [
    String(on.ladder.length), 'this case', 'the whole case: three meshes, the ends of the region, steps and closure as planned',
    target === undefined ? 'no estimate' : { id: target.quantity }, on.has(share) ? { id: share } : '',
    target !== undefined && on.has(`${target.id}.accuracy`) ? `within {${target.id}.accuracy} as band of all parts` : 'no number to pass: three meshes that close in',
    target === undefined ? 'the rung before it' : 'the difference to the hand estimate beyond both spreads',
  ];
  return table('Rungs', ['no', 'rung', 'what changes', 'predicted', 'tolerance', 'passes', 'if missed, look first at'], [...rows, last]);
}

function referenceTable(details: readonly RungDetail[]): Table[] {
  const seen = new Set<string>();
  const rows = details.filter((d) => !seen.has(d.reference.id) && seen.add(d.reference.id)).map(({ reference: r }) => [r.id, r.kind, r.title, listed([...r.verifies]), r.source]);
  return rows.length === 0 ? [] : [table('What the rungs stand on', ['answer', 'kind', 'flow', 'verifies', 'source'], rows)];
}

function skippedLines(on: Ground): Line[] {
  const skipped = skippedRungs(on.assembled).filter((s) => 'effect' in s.because || ['regime', 'axis'].includes(s.because.word));
  const why = (s: SkippedRung): string => ('effect' in s.because ? `${s.because.effect} is left out` : `the ${nameOf(on, s.because.word)} is ${s.because.is ?? 'not known'}`);
  return lines(skipped.length > 0 && `Not climbed: ${listed(skipped.map((s) => `${s.id} (${why(s)})`))}.`);
}

/** Effects that act on the target, switched on one by one: sign and size that each step must show. */
function effectSteps(on: Ground): Line[] {
  const steps = on.decisions.effects.flatMap((e) => {
    const p = on.effect(e.id);
    const size = p?.price?.relative;
    return p !== undefined && p.applies !== false && on.kept(e.id) && size !== undefined && size !== 0 ? [{ id: e.id, size }] : [];
  }).sort((a, b) => Math.abs(b.size) - Math.abs(a.size));
  const target = on.assembled.targets.find((t) => t.computed);
  if (steps.length === 0 || target === undefined) return [];
  const moved = (size: number): string => { const on1 = -size / (1 + size); return Number.isFinite(on1) ? `${on1 > 0 ? '+' : ''}${plain(on1 * 100)} %` : 'by more than itself'; };
  return lines(`After the last rung the effects go on one at a time, the largest first, each with the move of the target that it must show: ${listed(steps.map((s) => `${s.id} ${moved(s.size)}`))}. A wrong sign stops the work; a move outside a third to three times of it is explained before the next goes on.`);
}

