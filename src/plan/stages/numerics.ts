import { lines, table, type Ground, type StageResult } from '../ground.ts';
import type { Cell, Check, Line, Table } from '../types.ts';
import { meshRegions, numberTable } from './number-table.ts';
import { orderTable } from './numerics-order.ts';

/** Order of the terms, numerical diffusion, stopping rule, tolerances, digits, start-up. */
export function numerics(on: Ground): StageResult {
  return {
    lines: [...schemeLines(on), ...diffusionLines(on), ...stopLines(on), ...boundLines(on), ...digitLines(on), ...startLines(on), ...solveLines(on)],
    tables: [
      orderTable(on),
      ...pecletTable(on),
      ...numberTable(on, 'Diffusion that mesh and scheme add', ['numericalDiffusionFirst', 'diffusionShare', 'numericalDiffusion', 'actingDiffusivity', 'numericalShare', 'numericalShareFirst', 'effectiveReynolds', 'effectivePeclet', 'effectiveSchmidt']),
      ...numberTable(on, 'Chain of tolerances', ['targetTolerance', 'meshTolerance', 'stepTolerance', 'statisticsTolerance', 'balanceTolerance', 'massTolerance', 'iterationTolerance', 'residualTarget', 'linearFloor']),
      ...numberTable(on, 'Digits', ['pressureCondition', 'digitsLost', 'digitsNeeded', 'digitsSpareSingle', 'digitsSpareDouble']),
    ],
    checklist: checks(on),
  };
}

function schemeLines(on: Ground): Line[] {
  const scheme = on.choice('convection-scheme');
  if (scheme.applies === false) return lines(`No convection scheme matters: ${scheme.because}.`);
  return lines(`Convection in the final run: ${scheme.chosen}, for ${scheme.because}. First-order upwind serves the start only${on.has('numericalShareFirst') ? ': it would add {numericalShareFirst} times the diffusion that acts in the core' : ''}.`);
}

function diffusionLines(on: Ground): Line[] {
  if (!on.has('numericalShare') || on.word('flowClass') === 'continuum') return [];
  if (!['none', 'rans'].includes(on.choice('turbulence-treatment').chosen)) return lines('Mesh and scheme add {numericalDiffusion} in the core, {numericalShare} of the molecular diffusion there; it must stay below what the unresolved eddies are given.');
  const share = on.number('numericalShare') ?? 0;
  const solved = on.has('effectiveSchmidt') ? 'you will be solving Sc {effectiveSchmidt}, not {schmidt}' : on.has('effectivePeclet') ? 'you will be solving Pe {effectivePeclet}, not {peclet}' : 'you will be solving Re {effectiveReynolds}, not {reynolds}';
  const verdict = share <= 0.1 ? 'a tenth or less, it may stand' : share <= 1 ? 'more than a tenth, so refine or raise the scheme where the target is made' : 'more than the flow itself: the mesh sets the answer there';
  return lines(`With {frontCells} cells across the layers of the core, mesh and scheme add {numericalShare} of the acting diffusion: ${verdict}. Against molecular diffusion alone ${solved}, away from walls and at 10 degrees to the mesh lines.`);
}

function pecletTable(on: Ground): Table[] {
  const rows = meshRegions(on).filter((r) => on.has(`regionPeclet@${r}`)).map((r): Cell[] => [r, { id: `regionSizeAlong@${r}` }, { id: `regionPeclet@${r}` }, (on.number(`regionPeclet@${r}`) ?? 0) <= 2 ? 'central is free of wiggles' : 'no central scheme at a front thinner than 14 cells']);
  return rows.length === 0 ? [] : [table('Cell Peclet numbers', ['region', 'cell along', 'cell Peclet', 'what the scheme does'], rows)];
}

function stopLines(on: Ground): Line[] {
  const closed = on.word('flowClass') === 'enclosure';
  const scale = closed ? 'the heat that crosses the cavity by conduction times Nu' : on.word('energySolved') === 'yes' ? 'the throughput of mass, of momentum and of the heat taken up' : 'the throughput of mass and of momentum';
  return lines(
    `Stop when all three hold. Residuals, summed by magnitude and scaled by ${scale}, have fallen by {residualDecades} decades, to {residualTarget}.`,
    on.has('monitorBand') && 'Every target stays within {monitorBand} of itself over {monitorWindow} passes, three such windows running; a slower run than {sweepIterations} passes a decade needs a tighter band.',
    `Balances close: mass to {massTolerance} of the throughput${on.word('energySolved') === 'yes' ? ', heat to {balanceTolerance} of the heat of the target' : ''}${on.word('targetMomentum') === 'yes' ? ', forces on the whole region to {balanceTolerance} of the target' : ''}.`,
    'Each linear solve falls by a tenth a pass, the pressure to a twentieth, never below {linearFloor}; the iteration may leave {iterationTolerance}, a tenth of what the mesh may.',
  );
}

function boundLines(on: Ground): Line[] {
  const turbulent = on.choice('turbulence-treatment').chosen === 'rans' || on.choice('turbulence-treatment').chosen === 'hybrid';
  return lines(
    turbulent && `Turbulence quantities stay positive: limited convection, sinks taken implicitly, ${on.has('turbulentKineticEnergy') ? 'started from k = {turbulentKineticEnergy}' : 'never started from zero'}.`,
    on.word('has.species') === 'yes' && 'Shares stay between their inlet and wall values: limited scheme, mass that clipping makes below {iterationTolerance} of the throughput.',
    on.word('energySolved') === 'yes' && on.has('highestTemperature') && 'Temperatures must stay between {lowestTemperature} and {highestTemperature}; count the cells outside.',
    on.kept('buoyancy') || on.kept('buoyancy-driven') ? 'Weight enters the face fluxes with the stencil of the pressure gradient; at rest under a stable layer no speed may rise above a ten-thousandth of the buoyant one.' : false,
  );
}

function digitLines(on: Ground): Line[] {
  const precision = on.choice('precision');
  return lines(`Arithmetic: ${precision.chosen}, for ${precision.because}.${on.has('digitsSpareDouble') && (on.number('digitsSpareDouble') ?? 1) < 0 ? ' Even double precision runs short: split the long direction or shorten the cells.' : ''}`);
}

function startLines(on: Ground): Line[] {
  const treated = on.choice('turbulence-treatment').chosen;
  const steps = [
    'constant properties and first-order convection until residuals have fallen by 1.5 decades',
    'second order for momentum',
    on.word('energySolved') === 'yes' && (on.word('has.species') === 'yes' ? 'energy and species' : 'energy'),
    on.word('energySolved') !== 'yes' && on.word('has.species') === 'yes' && 'the species',
    (treated === 'rans' || treated === 'hybrid') && 'second order for turbulence and scalars',
    (on.kept('buoyancy') || on.kept('variable-viscosity') || on.kept('variable-density')) && 'coupled effects as under coupling',
    'final relaxation and the full stopping rule',
  ].filter((s): s is string => typeof s === 'string');
  const coupled = on.choice('solution-order').chosen === 'block';
  return lines(
    `Start: ${on.word('imposedFlow') === 'yes' ? 'the hand estimate of the profile' : 'rest, with temperatures between those of the walls'}; then ${steps.join('; ')}.`,
    coupled ? 'Relaxation: pseudo-steps of 5 to 10 cell transits at the start, 50 to 200 in the run.' : `Relaxation: momentum 0.5 and pressure 0.2 at the start, 0.7 and 0.3 in the run${(on.number('loopRelaxation') ?? 1) < 1 ? ', the coupled loop {loopRelaxation}' : ''}; a tenth more after 50 falling passes, a third less if a residual grows tenfold.`,
  );
}

function solveLines(on: Ground): Line[] {
  if (!on.has('cellCount')) return [];
  const cells = on.number('cellCount') ?? 0;
  const aspect = on.number('wallAspectRatio') ?? 1;
  return lines(`The pressure solve has {cellCount} unknowns${on.has('pressureCondition') ? ' at a condition number of {pressureCondition}' : ''}: ${cells > 5e4 ? 'multigrid' : cells > 1e3 ? 'conjugate gradients with an incomplete factor, or a direct solve in two directions' : 'a direct solve'}${aspect > 3 && cells > 5e4 ? `, coarsened across the layers first, for points stall at an aspect of {wallAspectRatio}` : ''}.`);
}

function checks(on: Ground): Check[] {
  return [
    { id: 'numerics-residuals', stage: 'numerics', text: 'residuals fallen as the stopping rule says, scaling named', limit: `${Math.round(10 * (on.number('residualDecades') ?? 4)) / 10} decades`, where: 'every equation' },
    { id: 'numerics-monitors', stage: 'numerics', text: 'targets flat within the band over three windows', limit: 'band of the stopping rule', where: 'every target' },
    { id: 'numerics-balances', stage: 'numerics', text: 'balances closed', limit: 'balances of the tolerance chain', where: 'whole region' },
    { id: 'numerics-order', stage: 'numerics', text: 'no first-order scheme left in the final run', where: 'every equation of the table of orders' },
  ];
}
