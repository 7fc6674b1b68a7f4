import { ladderDetails } from '../../ladder/index.ts';
import { lines, table, type Ground, type StageResult } from '../ground.ts';
import { listed, nameOf } from '../say.ts';
import type { Cell, Check, Line, Table } from '../types.ts';
import { chosen, firstSaid, keeps, known, said } from '../when.ts';

type Target = Ground['assembled']['targets'][number];
const targets = (on: Ground): readonly Target[] => on.assembled.targets.filter((t) => t.computed);
const inTime = (on: Ground): boolean => ['transient', 'march'].includes(chosen(on, 'run-character'));

/** How it will be shown that the equations are solved rightly, written out before the run. */
export function verification(on: Ground): StageResult {
  return {
    lines: [...codeLines(on), ...meshLines(on), ...targets(on).flatMap((t) => targetLines(on, t)), ...stepLines(on), ...iterationLines(on), ...errorPlace(on), ...consistency(on)],
    tables: [...family(on), ...budgets(on), kinds(on), ...balances(on)],
    checklist: checks(on),
  };
}

/** The known answer that shares most with this case and is exact: its inputs come from the case itself. */
function sister(on: Ground): ReturnType<typeof ladderDetails>[number] | undefined {
  const exact = ladderDetails(on.assembled).filter((d) => d.reference.kind === 'exact' && d.reference.id !== 'manufactured-solution' && on.has(d.rung.quantity));
  return exact.reduce<(typeof exact)[number] | undefined>((best, d) => (best === undefined || d.from.length >= best.from.length ? d : best), undefined);
}

function codeLines(on: Ground): Line[] {
  const near = sister(on);
  const terms = ['convection and diffusion of momentum', on.word('energySolved') === 'yes' && 'convection and diffusion of heat', (keeps(on, 'buoyancy') || keeps(on, 'buoyancy-driven')) && `weight by ${on.number('temperatureDifference') === 0 && on.has('solutalDensityBound') ? 'composition' : 'temperature'}`, keeps(on, 'variable-viscosity') && 'viscosity by temperature', keeps(on, 'radiation') && 'radiation between walls', on.word('has.species') === 'yes' && 'a species', keeps(on, 'reaction') && 'the source of a reaction', inTime(on) && 'change in time'].filter((t) => typeof t === 'string');
  return lines(
    `Evidence that the program solves these equations: smooth chosen fields with the terms of this case, ${listed(terms)}, sources worked out for them, three meshes with ratio {refinementRatio}; on paper the order is {schemeOrder}, and between the two finest it must not fall more than 0.4 below.`,
    near === undefined ? 'No rung of this ladder is solved exactly: the chosen fields alone show the order, the benchmarks only the number.' : said(on, `The nearest flow that is solved exactly is ${near.reference.title.toLowerCase()}${near.from.length > 0 ? `, taken at the ${listed(near.from.map((id) => nameOf(on, id)))} of this case` : ''}: ${near.reference.values.find((v) => v.id === near.compares)?.name ?? near.compares} {${near.rung.quantity}}${near.order === undefined ? '' : ', observed order as on paper within 0.4'}.`),
  );
}

function meshLines(on: Ground): Line[] {
  return lines(
    firstSaid(on, 'Measure of size: h = (volume/cells)^(1/d) with d {meshDimension}; three meshes alike in every spacing, ratio {refinementRatio} in all directions and in the layers at the wall.', 'Measure of size: h = (volume/cells)^(1/d); three meshes alike in every spacing.'),
    'For each target phi_1 (finest), phi_2, phi_3: p = |ln|(phi_3 - phi_2)/(phi_2 - phi_1)||/ln r; extrapolated phi_0 = (r^p phi_1 - phi_2)/(r^p - 1); band U = F |phi_1 - phi_2|/(r^p - 1). F = 1.25 with three meshes and an observed order between half of that on paper and half a step above it, F = 3 with two meshes or any other order. `runbrief grids` works it out.',
    chosen(on, 'near-wall-treatment') === 'law-of-the-wall' && said(on, 'With the law of the wall the first node stays at {firstNodeDistance} in all three meshes: refining it changes the model; the order speaks of the rest, and one run with twice that distance tells what the law does.'),
  );
}

function targetLines(on: Ground, t: Target): Line[] {
  const name = nameOf(on, t.quantity);
  return lines(known(on, `{${t.id}.mesh} {meshChangeAllowed} {meshError}`)
    ? `For the ${name}: the band of the finest mesh must stay within {${t.id}.mesh}. That holds if the two finest differ by no more than {meshChangeAllowed} of what is carried (two meshes alone: {meshChangeAllowedTwo}); forecast are {meshChange}, order {plannedOrder}. Three times that change, or a third of it, says that the lengths of the flow were misjudged.`
    : said(on, `For the ${name}: the band of the finest mesh must stay within {${t.id}.mesh}.`));
}

function stepLines(on: Ground): Line[] {
  if (!inTime(on)) return [];
  const first = targets(on)[0];
  return lines(firstSaid(on, `Step study on the medium mesh: {timeStep}, {timeStepDouble}, {timeStepQuadruple}, same instants compared, order 2 expected of a second-order scheme${first !== undefined && on.has(`${first.id}.step`) ? `; the ${nameOf(on, first.quantity)} may move by {${first.id}.step}` : ''}. The bands of mesh, step and iteration add by squares.`));
}

function iterationLines(on: Ground): Line[] {
  const first = targets(on)[0];
  return lines(firstSaid(on,
    `Iteration apart from the mesh: run to a residual of {residualTarget} and on to a tenth of it; the target may move by {iterationTolerance} of itself${first !== undefined && on.has(`${first.id}.iteration`) ? `, the ${nameOf(on, first.quantity)} by {${first.id}.iteration}` : ''}. More than that, and the order of the meshes means nothing.`,
    'Iteration apart from the mesh: two tolerances ten apart; the change stays ten times below that between the meshes.',
  ));
}

function errorPlace(on: Ground): Line[] {
  const rows = on.assembled.flow.regions;
  return lines(firstSaid(on, `Where the error sits: refine the ${listed([...rows], 'or')} alone by {refinementRatio} and see which moves the target; forecast are {wallError} at the wall and {coreError} away from it.`, rows.length > 1 && `Where the error sits: refine the ${listed([...rows], 'or')} alone and see which moves the target.` || 'Where the error sits: map h^2 times the second derivative of what is carried; refine where it exceeds three times its median.'));
}

function consistency(on: Ground): Line[] {
  const mirror = on.assembled.flow.cuts.some((c) => c.option.startsWith('mirror'));
  const back = ['{reynolds}', on.word('energySolved') === 'yes' && on.has('heatRate') && '{heatRate}', on.has('massFlow') && '{massFlow}'].filter((t) => typeof t === 'string' && known(on, t)) as string[];
  return lines(
    mirror && 'Mirrored input must give the mirrored field to the last digits that iteration leaves; a one-sided answer is believed only if the mirrored start gives the other side.',
    said(on, 'The same case once more with all lengths in another unit, the viscosity adapted so that the group stays {reynolds}: the same numbers in dimensionless form.'),
    back.length > 0 && `Inputs checked by the run itself: from its fields work out ${listed(back)} and hold them against these numbers before anything else is read.`,
  );
}

function family(on: Ground): Table[] {
  if (!on.has('cellCountMedium')) return [];
  const rows: (Cell[] | false)[] = [
    ['coarse', { id: 'cellCountCoarse' }, { id: 'coreCellSizeCoarse' }, on.has('meshErrorCoarse') ? { id: 'meshErrorCoarse' } : 'not known'],
    ['medium', { id: 'cellCountMedium' }, { id: 'coreCellSize' }, on.has('meshError') ? { id: 'meshError' } : 'not known'],
    ['fine', { id: 'cellCountFine' }, { id: 'coreCellSizeFine' }, on.has('meshErrorFine') ? { id: 'meshErrorFine' } : 'not known'],
  ];
  return [table('Three meshes', ['mesh', 'cells', 'core cell', 'error forecast'], rows)];
}

function budgets(on: Ground): Table[] {
  const rows = targets(on).flatMap((t) => (['mesh', 'step', 'iteration'] as const).filter((k) => on.has(`${t.id}.${k}`) && (k !== 'step' || inTime(on))).map((k): Cell[] => [nameOf(on, t.quantity), k, { id: `${t.id}.${k}` }, k === 'mesh' ? { id: 'plannedOrder' } : k === 'step' ? '2 in time' : 'none', k === 'mesh' ? 'coarse, medium, fine' : k === 'step' ? 'dt, 2 dt, 4 dt' : 'two residuals ten apart']));
  return rows.length === 0 ? [] : [table('What each study must show', ['target', 'study', 'band within', 'order expected', 'runs'], rows)];
}

function kinds(on: Ground): Table {
  const eddies = ['les', 'dns', 'hybrid', 'wall-modelled-les'].includes(chosen(on, 'turbulence-treatment'));
  return table('How three numbers behave, and what to state', ['kind', 'seen as', 'then'], [
    ['steady approach', 'changes of one sign, the finer one smaller', 'observed order, F = 1.25 if it is believable, else the order held to that on paper and F = 3'],
    ['swinging, closing in', 'changes of opposite sign, the finer one smaller', 'no order: band is half of the spread of the three, or the index if larger; a fourth mesh'],
    ['diverging', 'the finer change is the larger', 'no order and no band: three times the largest change; look at wall spacing, cells, steadiness'],
    ['already there', 'changes within the error of iteration', 'no order: the band is that of iteration with the order on paper'],
    eddies && ['model moves with the mesh', 'the share of resolved k changes between meshes', 'no order: state both and the share'],
  ]);
}

function balances(on: Ground): Table[] {
  const rows: (Cell[] | false)[] = [
    on.has('massTolerance') && ['mass', { id: 'massTolerance' }, on.has('massClosure') ? { id: 'massClosure' } : 'of the throughput'],
    on.word('energySolved') === 'yes' && on.has('balanceTolerance') && ['energy', { id: 'balanceTolerance' }, on.has('heatClosure') ? { id: 'heatClosure' } : 'of the heat through the target wall'],
    on.has('pressureDrop') && on.word('flowClass') === 'internal' && ['momentum', '1 % of the pressure force', { id: 'pressureDrop' }],
    on.has('dragForce') && ['momentum', '1 % of the drag', { id: 'dragForce' }],
    on.word('has.species') === 'yes' && ['species', '0.5 % of the throughput', 'each'],
  ];
  const kept = rows.filter((r): r is Cell[] => r !== false);
  return kept.length === 0 ? [] : [table('Balances to close', ['balance', 'share that may stay open', 'in numbers'], kept)];
}

function checks(on: Ground): Check[] {
  return [
    ...targets(on).flatMap((t): Check[] => [
      { id: `grids-${t.id}`, stage: 'verification', text: `three meshes for the ${nameOf(on, t.quantity)}: order, extrapolated value and band are written down`, ...(on.has(`${t.id}.mesh`) ? { limit: `band within {${t.id}.mesh}` } : {}), where: t.place ?? 'where the target stands' },
      ...(inTime(on) && on.has(`${t.id}.step`) ? [{ id: `steps-${t.id}`, stage: 'verification', text: `three steps for the ${nameOf(on, t.quantity)}`, limit: `band within {${t.id}.step}`, where: 'medium mesh' }] : []),
    ]),
    { id: 'iteration', stage: 'verification', text: 'two tolerances ten apart give the same target', ...(on.has('iterationTolerance') ? { limit: '{iterationTolerance} of it' } : {}), where: 'medium mesh' },
    { id: 'inputs-read-back', stage: 'verification', text: 'flow, heat, areas and the deciding group worked out from the solved fields agree with the plan', ...(on.has('regimeGroup') ? { limit: '{regimeGroup}' } : {}) },
  ];
}

