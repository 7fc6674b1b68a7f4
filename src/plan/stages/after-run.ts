import { lines, table, type Ground, type StageResult } from '../ground.ts';
import { effectsOf, listed, nameOf } from '../say.ts';
import { targetSpreads } from '../target-spread.ts';
import type { Cell, Check, Line, Table } from '../types.ts';
import { chosen, firstSaid, keeps, said } from '../when.ts';
import { symptoms } from './after-run-symptoms.ts';
import { credibility } from './credibility.ts';

type Target = Ground['assembled']['targets'][number];

/** What is judged once it has run: limits, groups again, the statement, symptoms, the decision to accept. */
export function afterRun(on: Ground): StageResult {
  const targets = on.assembled.targets.filter((t) => t.computed);
  targetSpreads(on.assembled);
  return {
    lines: [
      ...targets.flatMap((t) => [...statement(on, t), ...handEstimate(on, t), ...acceptance(on, t)]),
      ...lines('Stop of meshing: where the band of the mesh is a third of inputs and model together or less, the finest mesh gained at most 5 % of the whole: look elsewhere.', said(on, 'y+ off its band: new first cell = {firstCellHeight} times {yPlusTarget} over the value below which 95 % of the area stays.')),
    ],
    tables: [limits(on), ...groupsAgain(on), symptoms(on), credibility(on)],
    checklist: checks(on),
  };
}

function statement(on: Ground, t: Target): Line[] {
  const name = nameOf(on, t.quantity);
  return lines(firstSaid(on,
    `State the ${name} as value, +/- mesh and iteration, +/- inputs, +/- model, each as 95 %, and their root of squares beside; planned are {${t.id}.numericalPart} (one standard uncertainty) for the first, {${t.id}.inputWidth} for the second. Last digit no finer than half of the whole; a known omission is named with its sign.`,
    `State the ${name} as value, +/- mesh and iteration, +/- inputs, +/- model, each as 95 %, and their root of squares beside.`,
  ));
}

function handEstimate(on: Ground, t: Target): Line[] {
  const name = nameOf(on, t.quantity);
  return lines(said(on, `Against the hand estimate {${t.quantity}}: a difference within its half-width {${t.id}.halfWidth} and the band of the run together needs no word, one and a half times that needs a reason, twice that no acceptance before the reason is found: a length or area in a definition, a regime, a mistake in either. The ${name} of the last rung is held against it in the same way.`));
}

function acceptance(on: Ground, t: Target): Line[] {
  const limit = on.has(`${t.id}.limit`) ? `, or the whole band lies on one side of {${t.id}.limit}` : '';
  return lines(on.has(`${t.id}.accuracy`) && `Accept the ${nameOf(on, t.quantity)} when the root of all parts is within {${t.id}.accuracy}${limit}, and no decision has changed. Refine when the mesh has more than half of the square of it${on.has('cellCountNeeded') ? ' (forecast: {cellCountNeeded} cells)' : ''}; measure when the inputs have; take another model or a nearer rung when the model has; stop and say so when ${on.has(`${t.id}.reach`) ? `nothing reaches it: the best expected is {${t.id}.reach}` : 'nothing reaches it'}.`);
}

function limits(on: Ground): Table {
  const through = on.word('imposedFlow') === 'yes';
  const modelled = chosen(on, 'near-wall-treatment') !== 'none';
  const first = on.assembled.targets.find((t) => t.computed);
  const id = (one: string, otherwise: string): Cell => (on.has(one) ? { id: one } : otherwise);
  const rows: (Cell[] | false)[] = [
    ['residuals, over their start or the throughput', id('residualTarget', 'four decades'), 'all equations'],
    ['monitors: change of the target over the window', id('monitorBand', 'a thirtieth of the accuracy'), 'last window'],
    through && ['imbalance of mass', id('massClosure', '0.01 % of the throughput'), 'whole region'],
    on.word('energySolved') === 'yes' && ['imbalance of heat', id('heatClosure', '0.5 % of the largest flux'), 'whole region'],
    first !== undefined && on.has(`${first.id}.iteration`) && ['two tolerances ten apart', { id: `${first.id}.iteration` }, nameOf(on, first.quantity)],
    first !== undefined && on.has(`${first.id}.mesh`) && ['band of three meshes', { id: `${first.id}.mesh` }, nameOf(on, first.quantity)],
    first !== undefined && on.has(`${first.id}.domain`) && on.assembled.flow.domain.length > 0 && ['larger region', { id: `${first.id}.domain` }, nameOf(on, first.quantity)],
    modelled && on.has('yPlusAccepted') && [chosen(on, 'near-wall-treatment') === 'law-of-the-wall' ? 'y+ between 30 and' : 'y+ at most', { id: 'yPlusAccepted' }, '90 % of the area of the target wall'],
    on.has('courantNumber') && chosen(on, 'run-character') === 'transient' && ['Courant number', id('courantTarget', '1'), '99.9 % of the cells'],
    through && ['flow back through the outlet', id('returningFlow', 'none near the target'), 'outlet'],
    on.word('energySolved') === 'yes' && on.has('highestTemperature') && ['hottest cell', { id: 'highestTemperature' }, 'whole region'],
    on.word('energySolved') === 'yes' && on.has('lowestTemperature') && ['coldest cell', { id: 'lowestTemperature' }, 'whole region'],
    on.has('averagingError') && chosen(on, 'run-character') === 'transient' && ['band of the mean in time', { id: 'averagingError' }, 'monitor of the target'],
  ];
  return table('Limits to pass', ['what', 'limit', 'where'], rows.filter((r): r is Cell[] => r !== false));
}

/** Deciding groups, to be worked out again from the fields. */
function groupsAgain(on: Ground): Table[] {
  const rows = effectsOf(on).flatMap((e): Cell[][] => {
    const d = e.deciding;
    if (d === undefined || e.applies === false || !on.has(d.quantity) || e.verdict === 'undecided') return [];
    return [[nameOf(on, d.quantity), { id: d.quantity }, e.id, e.verdict, e.verdict === 'include' ? `leave-out from ${text(d.leaveOutAt)}` : `include from ${text(d.includeAt)}`]];
  });
  return rows.length === 0 ? [] : [table('Groups to work out again from the fields, mean and worst hundredth', ['group', 'planned', 'decides', 'verdict', 'changes at'], rows)];
}
const text = (value: number | undefined): string => (value === undefined ? 'not known' : String(Number(value.toPrecision(3))));

function checks(on: Ground): Check[] {
  const near = effectsOf(on).filter((e) => e.verdict === 'borderline' && e.applies !== false).map((e) => e.id);
  return [
    { id: 'after-balances', stage: 'afterRun', text: 'balances closed as stated', ...(on.has('massClosure') ? { limit: '{massClosure}' } : {}), where: 'whole region' },
    ...(on.has('yPlusAccepted') && chosen(on, 'near-wall-treatment') !== 'none' ? [{ id: 'after-y-plus', stage: 'afterRun', text: 'y+ with the solved shear', limit: '{yPlusAccepted} on 90 % of the area', where: 'target wall' }] : []),
    { id: 'after-groups', stage: 'afterRun', text: `decisions taken again with the groups of the fields${near.length === 0 ? '' : `, first ${listed(near)}`}: a verdict that changes and moves the target by more than a third of its accuracy reopens the plan` },
    { id: 'after-statement', stage: 'afterRun', text: 'the result is stated as value with its three parts and the groups for which it holds' },
    ...(keeps(on, 'unsteadiness') ? [{ id: 'after-periods', stage: 'afterRun', text: 'means over whole periods; first half less second half within twice the band' }] : []),
  ];
}
