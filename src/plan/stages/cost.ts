import { lines, table, type Ground, type StageResult } from '../ground.ts';
import type { Cell, Check, Line, Table } from '../types.ts';
import { numberTable } from './number-table.ts';

const shares = [
  ['three meshes', 'runsFamily'],
  ['larger steps', 'runsSteps'],
  ['larger region', 'runsDomain'],
  ['second closure', 'runsModel'],
  ['uncertain inputs at both ends', 'runsInputs'],
  ['rungs of the ladder', 'runsRungs'],
] as const;

/** Memory, hours and the programme, what drives them, and what to drop first. */
export function cost(on: Ground): StageResult {
  if (!on.has('coreHours')) return { lines: lines(`No cost follows: ${on.has('cellCount') ? 'the number of passes is not known' : 'the cells cannot be counted'}.`), tables: [] };
  return {
    lines: [...runLines(on), ...limitLines(on), ...programmeLines(on), ...coreLines(on)],
    tables: [...numberTable(on, 'One run on the medium mesh', ['cellCount', 'stepCount', 'innerPasses', 'totalPasses', 'cellUpdateRate', 'parallelEfficiency', 'coreHours', 'wallTime', 'memory', 'fieldSize']), programmeTable(on), meshTable(on)],
    checklist: checks(),
  };
}

const calibrated = (on: Ground): boolean => on.assembled.case.has('computing.cellUpdateRate');

function runLines(on: Ground): Line[] {
  return lines(
    `One run on the medium mesh takes {coreHours} core hours and {memory} of memory, done in {wallTime} (cores: {cores}); the fine mesh {coreHoursFine} core hours and {memoryFine}, done in {wallTimeFine}.`,
    calibrated(on) ? 'The rate {cellUpdateRate} is that of your machine.' : 'The rate {cellUpdateRate} is an order of magnitude: run 20 steps on two meshes, then give computing.cellUpdateRate, and every estimate follows.',
  );
}

function limitLines(on: Ground): Line[] {
  const given = on.assembled.case;
  const [memory, deadline, wall] = [given.number('computing.memory'), given.number('computing.deadline'), on.number('wallTime') ?? 0];
  const fine = wall * (on.number('runsFine') ?? 1);
  return lines(
    memory !== undefined && ((on.number('memoryFine') ?? 0) > memory ? `The fine mesh needs more than the {computing.memory} there are: coarsen all three meshes alike, the layers at the wall last.` : 'The fine mesh fits into the {computing.memory} there are.'),
    deadline !== undefined && (fine > deadline ? `The fine mesh alone outlasts the {computing.deadline} there are${wall > deadline ? ', and so does the medium: take a coarser treatment, a smaller region or more cores' : '; the medium and coarse meshes fit, which leaves a two-mesh study with a safety factor of 3'}.` : wall * (on.number('runsAll') ?? 1) > deadline ? 'One run fits into the {computing.deadline} there are, the programme does not: order it by the table below and stop where the time ends.' : 'The whole programme fits into the {computing.deadline} there are.'),
  );
}

function programmeLines(on: Ground): Line[] {
  const parts = shares.map(([what, id]) => ({ what, id, size: on.number(id) ?? 0 })).sort((a, b) => b.size - a.size);
  const [first] = parts;
  const exponent = on.number('costExponent') ?? 0;
  const transient = on.choice('run-character').chosen !== 'steady';
  const least = [...parts].reverse().find((p) => p.size > 0);
  return lines(
    `The programme takes {runsAll} times one medium run, {coreHoursAll} core hours; most goes into ${first?.what} ({${first?.id}} runs).`,
    `Cost grows with the linear fineness to the power {costExponent}: halving every cell costs ${Math.round(2 ** exponent)} times. ${transient ? `Steps ({stepCount}) drive it as much as cells; the ${on.word('timeStepLimit') ?? ''} limit sets them.` : 'Cells drive it; passes grow slowly with them.'}`,
    `With half the budget: first leave the fine mesh out (its error stays unseen, the band is three times as wide), then ${least?.what}; never the coarse mesh or the balances.`,
    on.has('meshErrorFine') && `Halving the mesh error takes 2 to the power d/p times the cells: from {meshError} on the medium mesh to {meshErrorFine} on the fine at {coreHoursFine} core hours.`,
  );
}

function programmeTable(on: Ground): Table {
  return table('Programme, in runs of the medium mesh', ['part', 'runs'], [...shares.filter(([, id]) => (on.number(id) ?? 0) > 0).map(([what, id]): Cell[] => [what, { id }]), ['all', { id: 'runsAll' }], ['core hours', { id: 'coreHoursAll' }]]);
}

function meshTable(on: Ground): Table {
  const cell = (id: string): Cell => (on.has(id) ? { id } : '');
  return table('Error against cost', ['mesh', 'cost in medium runs', 'expected error'], [['coarse', cell('runsCoarse'), cell('meshErrorCoarse')], ['medium', '1', cell('meshError')], ['fine', cell('runsFine'), cell('meshErrorFine')]]);
}

function coreLines(on: Ground): Line[] {
  const cores = on.assembled.case.number('computing.cores');
  const most = on.number('coresMost') ?? 1;
  return lines(cores !== undefined && cores > most ? 'Of the {computing.cores} cores only {coresMost} have work enough: run meshes side by side.' : 'Cores with work enough on the medium mesh: up to {coresMost}; with {cores} a share of {parallelEfficiency} does work.');
}

const checks = (): Check[] => [{ id: 'cost-pilot', stage: 'cost', text: 'pilot of 20 steps on the coarse and medium mesh: rate, memory per cell and passes against the plan', limit: 'within a factor of 2, the rate within 3' }];
