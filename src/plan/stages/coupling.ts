import { lines, table, type Ground, type StageResult } from '../ground.ts';
import type { Cell, Check, Line, Table } from '../types.ts';
import { weightGroup } from '../when.ts';
import { numberTable } from './number-table.ts';

interface Link {
  readonly from: string;
  readonly to: string;
  /** Number that says how strongly; the first that can be had is printed. */
  readonly numbers: readonly string[];
  /** The effect that closes the loop; without one the link always acts. */
  readonly effect?: string;
  readonly back: string;
}

const links: readonly Link[] = [
  { from: 'speed', to: 'temperature', numbers: ['peclet', 'rayleigh'], back: 'below' },
  { from: 'temperature', to: 'speed, by weight', numbers: ['richardson', 'rayleigh'], effect: 'buoyancy', back: 'two-way' },
  { from: 'temperature', to: 'speed, by weight alone', numbers: ['rayleigh'], effect: 'buoyancy-driven', back: 'two-way' },
  { from: 'temperature', to: 'speed, by viscosity', numbers: ['viscosityBulkOverWall'], effect: 'variable-viscosity', back: 'two-way' },
  { from: 'temperature', to: 'speed, by volume', numbers: ['densityChange'], effect: 'variable-density', back: 'two-way' },
  { from: 'pressure', to: 'density', numbers: ['mach', 'pressureShare'], effect: 'compressibility', back: 'two-way' },
  { from: 'speed', to: 'temperature, by friction', numbers: ['brinkman', 'nahme'], effect: 'viscous-heating', back: 'two-way if viscosity follows' },
  { from: 'walls', to: 'temperature, by radiation', numbers: ['radiationShare'], effect: 'radiation', back: 'two-way' },
  { from: 'solid', to: 'temperature', numbers: ['biotWall', 'biot'], effect: 'conjugate', back: 'two-way' },
  { from: 'speed', to: 'species', numbers: ['pecletMass'], effect: 'species', back: 'below' },
  { from: 'species', to: 'speed, by weight and volume', numbers: ['solutalDensityBound'], effect: 'species', back: 'two-way from 0.01, one-way below 0.001' },
  { from: 'reaction', to: 'species', numbers: ['damkohler'], effect: 'reaction', back: 'two-way' },
  { from: 'reaction', to: 'temperature', numbers: ['reactionSensitivity'], effect: 'heat-of-reaction', back: 'two-way' },
  { from: 'turbulence', to: 'speed', numbers: ['frictionReynolds'], effect: 'turbulence', back: 'two-way, always' },
  { from: 'weight', to: 'turbulence', numbers: ['gradientRichardson'], effect: 'turbulence-buoyancy', back: 'two-way' },
];
const gains = [['gainBuoyancy', 'weight'], ['gainViscosity', 'viscosity'], ['gainHeating', 'viscous heating'], ['gainWall', 'the wall']] as const;

/** Equations solved, who drives whom and how strongly, the order, the stages, the times, and where more than one solution may exist. */
export function coupling(on: Ground): StageResult {
  return {
    lines: [...equationLines(on), ...orderLines(on), ...stageLines(on), ...solidLines(on), ...timeLines(on), ...uniqueLines(on)],
    tables: [...matrix(on), ...gainTable(on), ...timeTable(on)],
    checklist: checks(on),
  };
}

function equationLines(on: Ground): Line[] {
  const treated = on.choice('turbulence-treatment').chosen;
  const solid = on.word('flowClass') === 'solid';
  const list = [
    !solid && `mass and momentum in ${on.number('meshDimension') === 2 ? 'two' : 'three'} directions`,
    on.word('energySolved') === 'yes' && 'energy',
    on.word('has.species') === 'yes' && 'species',
    (treated === 'rans' || treated === 'hybrid') && `the closure ${on.choice('closure').chosen}`,
    on.kept('radiation') && 'radiation between walls',
    on.kept('conjugate') && 'conduction in the walls',
  ].filter((s): s is string => typeof s === 'string');
  return lines(`Solved: ${list.join(', ')}; density law ${on.choice('density-law').chosen}.`);
}

function matrix(on: Ground): Table[] {
  const heat = on.word('energySolved') === 'yes';
  const rows = links.flatMap((l): Cell[][] => {
    const id = l.numbers.find((n) => on.has(n));
    if (id === undefined || (!heat && /temperature/.test(l.from + l.to)) || (l.effect === 'species' && on.word('has.species') !== 'yes')) return [];
    const effect = l.effect === undefined ? undefined : on.effect(l.effect);
    if (effect?.applies === false) return [];
    const acts = l.effect === undefined || on.kept(l.effect);
    return [[l.from, l.to, { id }, effect?.verdict ?? 'always', acts ? l.back : 'does not act back']];
  });
  return rows.length === 0 ? [] : [table('Who drives whom', ['driver', 'driven', 'number', 'verdict', 'way'], rows)];
}

function gainTable(on: Ground): Table[] {
  const acting = gains.filter(([id]) => on.has(id) && on.number(id) !== 0);
  return acting.length === 0 ? [] : [table('Loops', ['loop through', 'gain a pass'], acting.map(([id, name]): Cell[] => [name, { id }]))];
}

function orderLines(on: Ground): Line[] {
  const order = on.choice('solution-order');
  const gain = on.number('largestGain') ?? 0;
  const heat = on.word('energySolved') === 'yes';
  const modelled = ['rans', 'hybrid'].includes(on.choice('turbulence-treatment').chosen);
  const first = (on.word('imposedFlow') === 'no' ? ['properties', heat && 'energy', 'momentum', 'pressure'] : [heat && 'properties', 'momentum', 'pressure', heat && 'energy']).concat(on.word('has.species') === 'yes' ? ['species'] : [], modelled ? ['turbulence'] : []).filter(Boolean).join(', ');
  return lines(
    `Order: ${order.chosen}, for ${order.because}${order.applies === false ? '' : `; within a pass: ${first}`}.`,
    gain > 1e-3 && `The strongest loop multiplies its error by {largestGain} a pass: ${gain < 0.3 ? 'plain passes close it' : 'relaxed by {loopRelaxation} it closes'} to a thousandth in {loopPasses}. Read the gain within a factor of 2; the first passes replace it.`,
  );
}

function stageLines(on: Ground): Line[] {
  const stages = [
    'the flow alone',
    on.word('energySolved') === 'yes' && 'energy on the running flow',
    on.word('has.species') === 'yes' && 'species as passengers of the running flow',
    on.kept('reaction') && 'the reaction, its constant in steps of ten from 1e-3 of the value',
    (on.kept('variable-viscosity') || on.kept('variable-density') || on.kept('variable-conductivity')) && 'properties that follow the temperature',
    on.kept('buoyancy-driven') && (on.number('rayleigh') ?? 0) > 1e4 ? 'weight in steps from Ra = 1e4 to {rayleigh}, by ten to 1e6, then by three' : on.kept('buoyancy') && (on.has(weightGroup(on)) ? `weight${(on.number(weightGroup(on)) ?? 0) > 1 ? ` in steps from Ri = 0.1 to {${weightGroup(on)}}, by three to 1, then by two` : ` at once, at Ri = {${weightGroup(on)}}`}` : 'weight'),
    on.kept('radiation') && 'radiation, emissivities halved first where its share is above 0.3',
    on.kept('conjugate') && 'the walls',
  ].filter((s): s is string => typeof s === 'string');
  return lines(stages.length > 1 && `Switch on in stages, each to 1.5 decades: ${stages.join('; ')}. A target that moves against the price of the effect stops the work.`);
}

function solidLines(on: Ground): Line[] {
  if (!on.kept('conjugate') || !on.has('biotWall')) return [];
  const bi = on.number('biotWall') ?? 0;
  return lines(`Fluid and wall: the ratio of conductances is {biotWall}, so the ${bi <= 1 ? 'fluid takes the temperature and the wall the flux' : 'wall takes the temperature and the fluid the flux'}${Math.abs(Math.log10(Math.max(bi, 1e-9))) < 0.5 ? '; near 1 use a mixed condition on both sides' : ''}. Heat must match across the joint to {balanceTolerance}.`);
}

const times = ['flowThroughTime', 'crossDiffusionTime', 'speciesDiffusionTime', 'reactionTime', 'freeFallTime', 'kolmogorovTime', 'soundTime', 'imposedTime', 'timeStep'] as const;
function timeTable(on: Ground): Table[] {
  return numberTable(on, 'Times, slowest first', times.filter((id) => on.has(id)).sort((a, b) => (on.number(b) ?? 0) - (on.number(a) ?? 0)));
}

function timeLines(on: Ground): Line[] {
  if (!on.has('stiffness')) return [];
  const s = on.number('stiffness') ?? 1;
  return lines(`Slowest over fastest solved time: {slowestTime} over {fastestTime}, {stiffness}: ${s < 10 ? 'explicit or alternating passes run freely' : s < 1e3 ? 'take the fast part implicitly' : s < 1e6 ? 'the fast part wants a strongly damped implicit scheme' : 'the fast part is to be eliminated or taken as in balance'}.`);
}

/** Near or beyond the end of the steady state, where a steady answer may still be had. */
const nearOnset = (on: Ground): boolean => { const x = on.number('unsteadyRatio') ?? 0; return x >= 0.8 && (x < 1.5 || on.choice('run-character').chosen !== 'transient'); };

function uniqueLines(on: Ground): Line[] {
  if (!nearOnset(on)) return [];
  return lines('The group stands at {unsteadyRatio} of the value where the steady state ends: more than one state may exist. Start once from rest and once from a state beyond it, with a disturbance of 1 % of the speed, before the answer is called the only one.');
}

function checks(on: Ground): Check[] {
  return [
    ...(nearOnset(on) ? [{ id: 'coupling-two-starts', stage: 'coupling', text: 'two different starts reach the same state', limit: 'iteration error', where: 'every target' }] : []),
    ...(on.kept('conjugate') && on.has('biotWall') ? [{ id: 'coupling-joint', stage: 'coupling', text: 'heat matches across the joint of fluid and wall', limit: 'a tenth of the accuracy', where: 'wetted face of the wall' }] : []),
  ];
}
