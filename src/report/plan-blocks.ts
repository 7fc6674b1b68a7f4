import { sectionNames, type Cell, type Check, type Plan, type PlanEffect, type SectionName } from '../plan/index.ts';
import { inputsInWords } from '../problems/index.ts';
import { heading, list, paragraph, tableOf, type Block } from './blocks.ts';
import { cautionLines, decidingText, factorText, pricedOf, priceText, titled } from './words.ts';
import { oneLine, type Writing } from './writing.ts';

const titles: Readonly<Record<SectionName, string>> = {
  question: 'The question',
  physics: 'Physics',
  properties: 'Properties',
  domain: 'Geometry and domain',
  boundaries: 'Boundary and initial conditions',
  turbulence: 'Turbulence and walls',
  mesh: 'Mesh',
  time: 'Time',
  numerics: 'Schemes and tolerances',
  coupling: 'Coupling',
  cost: 'Cost',
  verification: 'Verification',
  ladder: 'Ladder of validation',
  watch: 'What to look at',
  afterRun: 'After the run',
  documentation: 'Documentation and review',
  cautions: 'Cautions',
};

/**
 * The whole plan as blocks: cautions and contradictions first, the sections in their order, then every decision and every number.
 *
 * @param plan         the plan
 * @param writing      how its numbers are written
 * @param everyNumber  a table of all quantities stands at the end; without it the command that shows them
 * @returns            blocks for text, Markdown and the page
 */
export function planBlocks(plan: Plan, writing: Writing, everyNumber = true): Block[] {
  const order: readonly SectionName[] = ['cautions', ...sectionNames.filter((name) => name !== 'cautions')];
  return [
    heading(1, titled(plan)),
    paragraph(`${plan.program}; case ${oneLine(plan.case.file)}, SHA-256 ${plan.case.sha256}. An estimate made before a run: no simulation is evidence until the ladder has been climbed.`),
    ...contradictionBlocks(plan),
    ...inShort(plan, writing),
    ...order.flatMap((name) => sectionBlocks(plan, writing, name)),
    ...decisionBlocks(plan, writing),
    ...(everyNumber ? numberBlocks(plan, writing) : [paragraph('Where a number comes from: runbrief trace FILE ID. All numbers with formula and source stand in plan.md and plan.html of --into DIR.')]),
  ];
}

/** What the one who decides has to know. */
function inShort(plan: Plan, writing: Writing): Block[] {
  const number = (name: string, ...ids: readonly string[]): string[][] => (ids.every((id) => plan.quantities[id] === undefined) ? [] : [[name, ids.filter((id) => plan.quantities[id] !== undefined).map((id) => writing.number(id)).join(', '), '']]);
  const targets = plan.targets.map((t) => [`${oneLine(t.quantity)}${t.place === undefined ? '' : ` at ${oneLine(t.place)}`}`, t.refused !== undefined ? `no estimate: ${oneLine(t.refused)} on its way` : t.computed ? writing.number(t.quantity) : 'no hand estimate', t.within === undefined ? '' : `within ${oneLine(t.within)}`]);
  const of = (verdict: string): number => plan.effects.filter((e) => e.applies !== false && e.judged && e.verdict === verdict).length;
  return [
    heading(2, 'In short'),
    ...tableOf('', ['what', 'number', 'asked'], [
      ...targets,
      ...number('first cell at the wall, its node', 'firstCellHeight', 'firstNodeDistance'),
      ...number('core cell', 'coreCellSize'),
      ...number('cells of the three meshes', 'cellCountCoarse', 'cellCountMedium', 'cellCountFine'),
      ...number('time step', 'timeStep'),
      ...number('run length', 'runTime'),
      ...number('core hours', 'coreHours'),
      ...number('time until it is done', 'wallTime'),
      ...number('memory', 'memory'),
    ]),
    paragraph(`Effects: ${of('include')} included, ${of('borderline')} borderline, ${of('undecided')} open, ${of('leave-out')} left out by their numbers; ${plan.effects.filter((e) => e.applies === false).length} cannot occur here.`),
  ];
}

function contradictionBlocks(plan: Plan): Block[] {
  if (plan.contradictions.length === 0) return [];
  const rows = plan.contradictions.map((c) => [`${c.path}${c.line === undefined ? '' : `, line ${c.line}`}`, c.says, c.effect, c.cure].map(oneLine));
  return [heading(2, 'Contradictions'), ...tableOf('', ['where', 'the case says', 'effect', 'cure'], rows)];
}

function sectionBlocks(plan: Plan, writing: Writing, name: SectionName): Block[] {
  const { tables } = plan.sections[name];
  const said = name === 'cautions' ? cautionLines(plan, writing) : plan.sections[name].lines.map((line) => writing.fill(line.text));
  if (said.length === 0 && tables.length === 0) return [];
  const cell = (c: Cell): string => (typeof c === 'string' ? writing.fill(c) : writing.number(c.id));
  return [
    heading(2, titles[name]),
    ...list(said),
    ...tables.flatMap((t) => tableOf(oneLine(t.title), t.columns.map(oneLine), t.rows.map((row) => row.map(cell)))),
  ];
}

function decisionBlocks(plan: Plan, writing: Writing): Block[] {
  const judged = plan.effects.filter((e) => e.applies !== false && e.judged);
  const absent = plan.effects.filter((e) => e.applies === false);
  const notBuilt = plan.effects.filter((e) => !e.judged);
  return [
    heading(2, 'Every decision'),
    ...tableOf('Effects that can occur', ['effect', 'verdict', 'decided by', 'margin', 'price'], judged.map((e) => [e.id, e.verdict, decidingText(e, writing), factorText(e), e.price === undefined ? '' : priceText(e.price, pricedOf(e.price, plan))])),
    ...judged.flatMap((e) => [heading(3, `${oneLine(e.title)} (${e.id}): ${e.verdict}`), ...list(effectNotes(e, plan, writing))]),
    ...tableOf('Effects that cannot occur here', ['effect', 'why not'], absent.map((e) => [e.id, writing.fill(e.because)])),
    ...(notBuilt.length === 0 ? [] : [paragraph(`Not judged by this program, to be judged by hand: ${notBuilt.map((e) => e.id).join(', ')}.`)]),
    ...tableOf('Choices', ['choice', 'taken', 'because'], plan.choices.map((c) => [c.id, `${c.chosen}${c.given === true ? ' (given)' : ''}${c.advised === undefined ? '' : `, advised ${c.advised}`}`, writing.fill(c.because)])),
    ...tableOf('Options not taken', ['choice', 'option', 'why not'], plan.choices.flatMap((c) => c.rejected.map((r) => [c.id, r.option, writing.fill(r.because)]))),
  ];
}

function effectNotes(e: PlanEffect, plan: Plan, writing: Writing): string[] {
  return [
    writing.fill(e.because),
    ...(e.movedBy === undefined ? [] : [`Moved by its ${e.movedBy} from ${e.base ?? 'another verdict'}.`]),
    ...(e.prices ?? []).map((p) => `Price: ${priceText(p, pricedOf(p, plan))} (${oneLine(p.formula)}).`),
    ...(e.flipsAt ?? []).map((f) => `Becomes ${f.verdict} at ${f.path} = ${writing.like(f.path, f.value, f.unit)}.`),
    ...(e.check === undefined ? [] : [`Check: ${writing.fill(e.check)}.`]),
    ...(e.firstRun === undefined ? [] : [e.firstRun === 'keep' ? 'The first run keeps it.' : 'The first run leaves it out.']),
    ...((e.then ?? []).length === 0 ? [] : [`The model then needs: ${(e.then ?? []).map((t) => writing.fill(t)).join('; ')}.`]),
    ...((e.missing ?? []).length === 0 ? [] : [`Settled by giving ${oneLine(inputsInWords(e.missing ?? []))}.`]),
    ...((e.sources ?? []).length === 0 ? [] : [`Source: ${(e.sources ?? []).map(oneLine).join('; ')}.`]),
  ];
}

function numberBlocks(plan: Plan, writing: Writing): Block[] {
  const rows = Object.entries(plan.quantities).map(([id, q]) => {
    const range = q.range === undefined ? '' : ` (${writing.like(id, q.range.from)} to ${writing.like(id, q.range.to)} over the operating range)`;
    const note = [q.kind === 'computed' ? '' : q.kind, q.at === undefined ? '' : `at ${q.at}`, q.note ?? '', q.withinRange ? '' : `outside a range: ${(q.outside ?? []).join(', ')}`].filter((t) => t !== '').join('; ');
    return [id, oneLine(q.symbol), `${writing.number(id)}${range}`, oneLine(q.formula), oneLine(q.source), oneLine(note)];
  });
  return [heading(2, 'Every number'), ...tableOf('', ['quantity', 'symbol', 'value', 'formula', 'source', 'note'], rows)];
}

/**
 * The checklist: tick boxes by stage, each with limit, place and the id that a record names it by.
 *
 * @param plan     the plan
 * @param writing  how its numbers are written
 * @returns        blocks
 */
export function checklistBlocks(plan: Plan, writing: Writing): Block[] {
  const stages = [...new Set(plan.checklist.map((c) => c.stage))];
  const item = (c: Check): string => [writing.fill(c.text), c.limit === undefined ? '' : `limit: ${writing.fill(c.limit)}`, c.where === undefined ? '' : `where: ${writing.fill(c.where)}`, `id: ${c.id}`].filter((t) => t !== '').join('; ');
  return [
    heading(1, `Checklist: ${titled(plan)}`),
    paragraph(`Case ${oneLine(plan.case.file)}, SHA-256 ${plan.case.sha256}. The ids stay the same as long as the plan asks for the same thing.`),
    ...stages.flatMap((stage): Block[] => [heading(2, oneLine(stage)), { kind: 'list', boxes: true, items: plan.checklist.filter((c) => c.stage === stage).map(item) }]),
  ];
}
