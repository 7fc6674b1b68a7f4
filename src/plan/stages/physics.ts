import { spreads, stepOf } from '../../workings/index.ts';
import { lines, type Ground, type StageResult } from '../ground.ts';
import { called, capital, effectsOf, listed, nameOf, noticeable, plain, priceText } from '../say.ts';
import type { Cell, Check, Line, PlanEffect, Table } from '../types.ts';
import { groupRows } from './physics-groups.ts';
import { phenomena, rankedPhenomena } from './physics-ranking.ts';
import { budgetLines, budgetTables } from './physics-terms.ts';

/** Which physics the model carries, by number, with what each omission costs and what is not sure. */
export function physics(on: Ground): StageResult {
  const effects = effectsOf(on);
  const judged = effects.filter((e) => e.judged && e.applies !== false);
  const absent = effects.filter((e) => e.applies === false);
  return {
    lines: [
      ...regimeLine(on),
      ...keptLines(on, judged),
      ...lawLines(on),
      ...phenomena(on),
      ...budgetLines(on),
      ...lines(absent.length > 0 && `Cannot occur here, and so takes no part: ${listed(absent.map((e) => e.id))}.`),
    ],
    tables: [
      { title: 'Groups and the decisions they make', columns: ['symbol', 'name', 'value', 'leave out from', 'include from', 'decision'], rows: groupRows(on) },
      effectTable(judged),
      ...rankedPhenomena(on),
      ...budgetTables(on),
    ],
    checklist: judged.filter((e) => e.check !== undefined).map((e): Check => ({ id: `effect-${e.id}`, stage: 'physics', text: `${e.title}: ${e.check as string}` })),
  };
}

function regimeLine(on: Ground): Line[] {
  const { flow } = on.assembled;
  const regime = on.word('regime');
  if (regime === undefined) return lines(`Whether the flow is laminar or turbulent cannot be told: {speed} and the fluid are needed on the length scale (${flow.lengthIs}).`.replace('{speed}', 'the speed'));
  if (!on.has('regimeGroup')) return lines(`The flow is taken as ${regime}.`);
  const by = stepOf(on.assembled.workings, 'regimeGroup')?.formula ?? '';
  const scales = on.has('speed') && on.has('length') ? ` The other groups stand on {length}, the length scale (${flow.lengthIs}), and {speed}, the speed scale (${flow.speedIs})${on.has('referenceTemperature') ? '; plain ones hold at {referenceTemperature}' : ''}.` : '';
  return lines(`The flow is ${regime}: its group (${by}) is {regimeGroup}, laminar below {regimeLow}, turbulent from {regimeHigh}.${scales}`);
}

function keptLines(on: Ground, judged: readonly PlanEffect[]): Line[] {
  const of = (verdict: string): PlanEffect[] => judged.filter((e) => e.verdict === verdict);
  const names = (list: readonly PlanEffect[]): string => listed(list.map(called));
  const lost = of('leave-out').filter((e) => noticeable(on, e.price));
  const waiting = of('undecided');
  const between = of('borderline');
  return lines(
    of('include').length > 0 ? `The model carries ${names(of('include'))}.` : 'The model needs nothing beyond the bare flow: no effect passes its limits.',
    ...between.map((e) => `${capital(called(e))}, borderline: ${e.because}. ${e.firstRun === 'leave-out' ? 'The first run leaves it out' : 'The first run keeps it'}${e.check === undefined ? '' : `; what settles it: ${e.check}`}.`),
    lost.length > 0 && `Left out at a price: ${listed(lost.map((e) => `${called(e)} (${priceText(e.price)} of the ${nameOf(on, on.assembled.targets.find((t) => t.id === e.price?.target)?.quantity ?? (e.price?.of as string))})`))}.`,
    ...waiting.map((e) => `${capital(called(e))}, undecided: ${e.because}.`),
  );
}

const twice = [
  ['frictionDisagreement', 'frictionPlain', 'frictionSecond', 'friction'],
  ['nusseltDisagreement', 'nusseltPlain', 'nusseltSecond', 'heat transfer'],
  ['plateFrictionDisagreement', 'plateFrictionEnd', 'plateFrictionSecond', 'skin friction'],
  ['dragDisagreement', 'dragCoefficientPlain', 'dragCoefficientSecond', 'drag'],
] as const;

/** Two published laws for the same number, where they differ: both with their sources, and whether the spread of the first holds the second. */
function lawLines(on: Ground): Line[] {
  const { workings } = on.assembled;
  const sourceOf = (id: string): string => workings.used[workings.index.get(id) ?? -1]?.way.source ?? '';
  return lines(...twice.map(([ratio, first, second, what]) => {
    const [a, b] = [on.number(first), on.number(second)];
    if (!on.has(ratio) || a === undefined || b === undefined || a === b) return false;
    const spread = spreads(workings, [first]).get(first);
    const held = spread !== undefined && b >= spread.low && b <= spread.high;
    return `Two laws of ${what} apply: {${first}} (${sourceOf(first)}) and {${second}} (${sourceOf(second)}), their ratio {${ratio}}; the spread of the first ${held ? 'holds the second' : 'does not hold the second: read what follows from it with that gap'}.`;
  }));
}

function effectTable(judged: readonly PlanEffect[]): Table {
  const rows = judged.map((e): Cell[] => [
    e.title,
    e.verdict + (e.movedBy === undefined ? '' : `, moved by ${e.movedBy}`),
    e.deciding === undefined ? '' : { id: e.deciding.quantity },
    marginText(e),
    priceText(e.price),
    e.because,
    (e.sources ?? []).join('; '),
  ]);
  return { title: 'Effects that can occur', columns: ['effect', 'verdict', 'decided on', 'margin to the nearer limit', 'leaving it out', 'because', 'source'], rows };
}

function marginText(e: PlanEffect): string {
  if (e.deciding?.margin === undefined) return '';
  const near = e.deciding.marginKind === 'factor' && e.deciding.margin < 3 ? ', near' : '';
  return e.deciding.marginKind === 'difference' ? `${plain(e.deciding.margin)} apart` : `${plain(e.deciding.margin)} times${near}`;
}
