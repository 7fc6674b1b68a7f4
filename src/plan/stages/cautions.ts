import { lines, type Ground, type StageResult } from '../ground.ts';
import { overBudget } from '../budget.ts';
import { phaseLeft } from '../contradictions-phase.ts';
import { hazardsOf } from '../hazards.ts';
import { listed, nameOf } from '../say.ts';
import { keeps, said } from '../when.ts';
import { outsideOf } from './cautions-range.ts';
import { trapsOf } from './cautions-traps.ts';
import type { Check, Line, Table } from '../types.ts';
import { targetSpreads } from '../target-spread.ts';

/** Cautions of this case alone, the worst first: what can hurt people, what can spoil the target, which laws are stretched. */
export function cautions(on: Ground): StageResult {
  const hazards = hazardsOf(on);
  const traps = trapsOf(on);
  const outside = outsideOf(on);
  const unjudged = on.decisions.effects.filter((e) => !e.judged && e.applies !== false).map((e) => e.id);
  const open = ends(on);
  const first = [...hazards.map((h) => h.title), ...(open.length === 0 ? [] : ['Laminar or turbulent is open']), ...outside.map((o) => `stretched law for the ${o.name}`), ...traps.map((t) => t.title)].slice(0, 3);
  return {
    lines: [
      opening(on),
      ...lines(
        first.length > 0 && `First of all: ${first.join('; ')}.`,
        unjudged.length > 0 && `Not in these numbers: ${listed(unjudged)}. The case names what they depend on, and no rule judges them yet: the spreads do not hold their effect.`,
        ...idle(on),
        ...notCounted(on),
        hazards.length > 0 && 'What follows on dangers supports and never replaces qualified judgement, tests and the codes of the place; relief, structure and safety of life are decided by licensed practitioners.',
        ...hazards.map((h) => h.text),
        ...open,
        ...fineOver(on),
        ...outside.map((o) => o.text),
        ...traps.map((t) => `${t.title}: ${t.text} Unmasked by: ${t.test}.`),
      ),
    ],
    tables: trapTable(on),
    checklist: [
      ...hazards.map((h): Check => ({ id: `hazard-${h.id}`, stage: 'cautions', text: `${h.title.toLowerCase()}: a competent person has looked at it by the code of the place` })),
      ...traps.map((t): Check => ({ id: `trap-${t.id}`, stage: 'cautions', text: t.test })),
    ],
  };
}

/** Numbers of the case that nothing follows from: most often one under a key that this flow does not read. */
function idle(on: Ground): string[] {
  const { unused } = on.assembled;
  return unused.length === 0 ? [] : [`Given and without effect: ${listed(unused)}. No number of the plan follows from ${unused.length === 1 ? 'it' : 'them'}: does this flow read another key?`];
}

/** Effects that the model carries and the estimates do not hold. */
function notCounted(on: Ground): (string | false)[] {
  return [
    keeps(on, 'condensation') && !on.has('latentShare') && said(on, 'Condensation is in none of these numbers: the dew point is {dewTemperature}, the coldest place {lowestTemperature}. Its heat comes on top of the heat printed here; a film of pure vapour passes ten to a hundred times as much as dry vapour (common practice).'),
    keeps(on, 'condensation') && (on.number('latentShare') ?? 0) > 0 && said(on, 'Condensation brings {latentShare} of the convective heat on top of it. It is in the heat from the walls, not in the heat-transfer coefficient or the Nusselt number.'),
    on.word('has.rheology') === 'yes' && 'Elasticity is unknown: the law of the case is inelastic and its relaxation time counts as zero. Polymer solutions and melts with a relaxation time near the time of the flow, L/U, need another model.',
    keeps(on, 'heat-of-reaction') && said(on, 'The heat of the reaction is in none of the temperatures here: up to {adiabaticReactionRise} where all of it stays in the fluid.'),
    on.word('has.speciesWall') === 'yes' && on.word('imposedFlow') === 'yes' && (keeps(on, 'buoyancy') || keeps(on, 'buoyancy-driven')) && said(on, 'The Sherwood number {sherwood} is that of the stream alone: what weight does to it is not counted.'),
  ];
}

/** What the whole plan is worth, in the spread of its first target. */
function opening(on: Ground): Line {
  const main = on.assembled.targets.find((t) => t.computed);
  const estimate = main === undefined ? 'none of the targets has an estimate to hold it against' : `the ${nameOf(on, main.quantity)} is put at {${main.quantity}}${targetSpreads(on.assembled).some((s) => s.id === main.id) ? '' : ', without any spread because no input carries one'}`;
  const phase = phaseLeft(on);
  if (phase !== undefined) return lines(`No estimate is given: ${phase} on its way, and single-phase laws do not hold. Not covered.`)[0] as Line;
  const rungs = on.ladder.length;
  const known = rungs === 0 ? 'no known answer lies on the way to it' : rungs === 1 ? `the known answer ${on.ladder[0]?.id} is met` : `the ${rungs} known answers of its ladder are met, from ${on.ladder[0]?.id} on`;
  return lines(`This is an estimate made before a run: ${estimate}. ${rungs === 0 ? `A simulation of it is no evidence by itself: ${known}.` : `A simulation is no evidence until ${known}.`}`)[0] as Line;
}

/** Laminar or turbulent is open, and a target differs by more than its spread: both ends, loudly. */
function ends(on: Ground): string[] {
  return on.assembled.targets.filter((t) => on.has(`${t.id}.ifTurbulent`)).map((t) => `Laminar or turbulent is open: the ${nameOf(on, t.quantity)} is {${t.id}.ifLaminar} if laminar, {${t.id}.ifTurbulent} if turbulent at once, as behind a trip or a blunt edge; the spread of the estimate does not hold that. The group is {regimeGroup} between {regimeLow} and {regimeHigh}.`);
}

/** The run fits the budget and the fine mesh of its study does not. */
function fineOver(on: Ground): string[] {
  const { workings } = on.assembled;
  const medium = overBudget(workings, 'medium').map((one) => one.path);
  return overBudget(workings, 'fine').filter((one) => !medium.includes(one.path)).map(({ path, estimate }) => `Over the budget: the fine mesh alone ${path === 'computing.deadline' ? 'is done in' : 'takes'} {${estimate}} where {${path}} is given; without it the band of the mesh study is three times as wide.`);
}

function trapTable(on: Ground): Table[] {
  const traps = trapsOf(on);
  return traps.length === 0 ? [] : [{ title: 'How this run could look right and be wrong', columns: ['what', 'moves the target by', 'test'], rows: traps.map((t) => [t.title, t.bias === undefined ? 'see text' : typeof t.bias === 'string' ? t.bias : { id: t.bias.id }, t.test]) }];
}
