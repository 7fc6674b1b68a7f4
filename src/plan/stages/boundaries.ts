import { lines, table, type Ground, type StageResult } from '../ground.ts';
import { inWords, listed, percent } from '../say.ts';
import { targetSpreads } from '../target-spread.ts';
import type { Cell, Check, Line, Table } from '../types.ts';
import { firstSaid, keeps, said } from '../when.ts';
import { wellPosed } from './boundaries-checks.ts';
import { boundariesOf, boundaryTable, openCells, solvedVariables } from './boundaries-table.ts';

/** The table of conditions, what must balance before the run starts, how it starts, and which data are uncertain. */
export function boundaries(on: Ground): StageResult {
  return {
    lines: [...openLines(on), ...pressureLines(on), ...turbulenceLines(on), ...balanceLines(on), ...startLines(on), ...uncertainLines(on)],
    tables: [boundaryTable(on), ...balances(on), wellPosed(on), ...decay(on), ...uncertain(on)],
    checklist: checks(on),
  };
}

const through = (on: Ground): boolean => boundariesOf(on).some((b) => b.is === 'inlet') && on.word('imposedFlow') === 'yes';
const buoyant = (on: Ground): boolean => keeps(on, 'buoyancy') || keeps(on, 'buoyancy-driven');

function openLines(on: Ground): Line[] {
  const open = openCells(on);
  return lines(open.length > 0 && `Not given and to be settled before the run: ${listed(open.map((o) => `${o.variable} at ${o.boundary}`))}.`);
}

function pressureLines(on: Ground): Line[] {
  return lines(
    boundariesOf(on).some((b) => b.is === 'point') ? said(on, 'Nothing flows in or out: the level of pressure is set at one point, {pressure} absolute.') : firstSaid(on, 'Level of pressure: {outletPressure} absolute at the outlet; nothing else fixes it.', 'Level of pressure: {pressure} absolute in the undisturbed fluid.'),
    buoyant(on) && said(on, 'The solved pressure is taken without the weight of the fluid at {density}, which alone is {termHydrostatic}: openings then need no profile of it, and fluid that comes back carries the temperature of the table.'),
  );
}

function turbulenceLines(on: Ground): Line[] {
  if (!solvedVariables(on).includes('turbulence') || !through(on)) return [];
  const given = on.assembled.case.has('inlet.turbulence.intensity');
  return lines(
    said(on, `Turbulence at the inlet${given ? '' : ', not given and taken'}: intensity {turbulenceIntensity}, length {turbulenceLength}, so k {turbulentKineticEnergy}, epsilon {dissipationRate}, omega {specificDissipationRate}, viscosity ratio {viscosityRatio}.`),
    said(on, 'Of its k a share of {turbulenceKept} reaches the body, so that {turbulenceIntensityBody} arrives of {turbulenceIntensity}; where another value is meant at the body, choose the length at the inlet by the table.'),
    on.word('flowClass') === 'internal' && firstSaid(on, 'The passage makes its own turbulence within {entranceLength}; behind that the inlet values no longer show.'),
  );
}

function decay(on: Ground): Table[] {
  if (!solvedVariables(on).includes('turbulence') || !on.has('turbulenceKeptRatio1')) return [];
  return [table('Inlet turbulence that reaches the body', ['viscosity ratio at the inlet', 'share of k left'], [['1', { id: 'turbulenceKeptRatio1' }], ['10', { id: 'turbulenceKeptRatio10' }], ['100', { id: 'turbulenceKeptRatio100' }], [{ id: 'viscosityRatio' }, { id: 'turbulenceKept' }]])];
}

function balanceLines(on: Ground): Line[] {
  return lines(
    through(on) && said(on, 'Mass: {massFlow} enters and leaves.'),
    on.word('energySolved') === 'yes' && firstSaid(on,
      'Heat: {heatRate} passes the walls by the laws, so that the stream leaves at {outletTemperature} as mean by flow; a run that closes another balance has another heat.',
      'Heat: {heatRate} passes the walls by the laws.',
    ),
    on.word('has.speciesWall') === 'yes' && firstSaid(on,
      'Species: {massTransferRate} passes the wall into the fluid by the laws, so that the stream leaves with a mass share of {outletMassFraction}.',
      'Species: {massTransferRate} passes the wall into the fluid by the laws.',
    ),
    on.word('has.fluidReaction') === 'yes' && said(on, 'Reaction: {conversion} of the reactant is gone at the outlet.'),
    on.word('flowClass') === 'internal' && said(on, 'Pressure: {pressureDrop} between inlet and outlet, without the weight of the fluid.'),
  );
}

function balances(on: Ground): Table[] {
  const rows: (Cell[] | false)[] = [
    through(on) && on.has('massClosure') && ['mass', { id: 'massFlow' }, { id: 'massClosure' }],
    on.word('energySolved') === 'yes' && on.has('heatClosure') && ['heat through the walls', { id: 'heatRate' }, { id: 'heatClosure' }],
    on.word('energySolved') === 'yes' && on.has('outletTemperature') && through(on) && ['temperature at the outlet', { id: 'outletTemperature' }, 'follows from the heat'],
    on.has('massTransferRate') && on.word('has.speciesWall') === 'yes' && ['species through the walls', { id: 'massTransferRate' }, '0.5 % of the throughput'],
    on.has('outletMassFraction') && through(on) && ['mass share of the species at the outlet', { id: 'outletMassFraction' }, 'follows from wall and reaction'],
    on.word('flowClass') === 'internal' && on.has('pressureDrop') && ['pressure drop', { id: 'pressureDrop' }, 'follows from the shear of the walls'],
  ];
  const kept = rows.filter((r): r is Cell[] => r !== false);
  return kept.length === 0 ? [] : [table('Closing balances, predicted', ['balance', 'predicted', 'may stay open by'], kept)];
}

function startLines(on: Ground): Line[] {
  const still = on.word('imposedFlow') === 'no';
  const several = still && (on.word('flow') === 'bottom-heated-cavity' || on.word('plateSetting') === 'unstable');
  return lines(
    on.word('character') === 'transient'
      ? firstSaid(on, 'The start is part of the problem: {initial.temperature} everywhere as given, at rest unless stated.', 'The start is part of the problem and is not stated: temperature and speed at the first instant are needed (initial).')
      : still
        ? firstSaid(on, 'Start at rest with the temperature in a straight line from {coldTemperature} to {hotTemperature}; in case of trouble climb to the Rayleigh number {rayleigh} by half decades.', 'Start at rest at {farTemperature}.', 'Start at rest.')
        : firstSaid(on, 'Start with {speed} everywhere along the stream at {inletTemperature}, pressure even; what is wrong in it is washed out after {discardTime}.', 'Start with {speed} everywhere along the stream.'),
    (several || keeps(on, 'unsteadiness')) && 'More than one state can settle here: start a second time from a mirrored or disturbed field; the same numbers must come out.',
  );
}

/** Boundary data of the case with a spread or a range. */
function data(on: Ground): { readonly path: string; readonly range: boolean; readonly spread: boolean }[] {
  const { case: given } = on.assembled;
  return [...given.entries.values()].filter((e) => e.kind === 'quantity' && on.has(e.path) && /^(inlet|inlets|outlet|wall|walls|surroundings|drive|initial|time)\b/.test(e.path)).map((e) => ({ path: e.path, range: e.range !== undefined && !e.range.bounds, spread: e.spread !== undefined || e.range?.bounds === true }));
}

function uncertainLines(on: Ground): Line[] {
  const exact = data(on).filter((d) => !d.range && !d.spread);
  const first = targetSpreads(on.assembled)[0];
  const steep = (first?.from ?? []).filter((f) => f.kind === 'input' && f.share >= 0.1).map((f) => `${f.label} (${percent(f.share)})`);
  return lines(
    steep.length > 0 && `Most of what the boundary data do to the target comes from ${listed(steep)}: run both ends of these on the medium mesh.`,
    exact.length > 0 && `Boundary data without a spread count as exact: ${listed(exact.map((d) => `${d.path} ${inWords(on, d.path)}`))}. A meter is seldom better than 1 % in flow and 0.5 K in a wall temperature.`,
  );
}

function uncertain(on: Ground): Table[] {
  const rows = data(on).filter((d) => d.range || d.spread).map((d): Cell[] => [d.path, { id: d.path }, d.range ? 'operating range' : 'spread', d.range ? 'one run at each end, mesh laid out for the end with the thinnest layer' : 'one run at each end of the spread, same mesh']);
  return rows.length === 0 ? [] : [table('Uncertain boundary data, and the runs that bracket them', ['path', 'value', 'kind', 'runs'], rows)];
}

function checks(on: Ground): Check[] {
  const open = openCells(on);
  return [
    { id: 'boundaries-set', stage: 'boundaries', text: `every boundary has one condition for ${listed([...solvedVariables(on)])}${open.length === 0 ? '' : `; open are ${listed(open.map((o) => `${o.variable} at ${o.boundary}`))}`}`, where: listed(boundariesOf(on).map((b) => b.name)) },
    ...(through(on) && on.has('massClosure') ? [{ id: 'boundaries-mass', stage: 'boundaries', text: 'the mass flow that the run reports at the inlet is {massFlow}', limit: '{massClosure}', where: 'inlet, before the first iteration' }] : []),
    ...(buoyant(on) ? [{ id: 'boundaries-at-rest', stage: 'boundaries', text: 'with all temperatures made equal the fluid stays at rest: weight and pressure agree', where: 'one short run' }] : []),
  ];
}
