import { sectionNames, type Plan, type PlanEffect, type PlanQuantity, type Section } from '../../src/plan/index.ts';

const quantity = (symbol: string, name: string, value: number | string, unit: string, more: Partial<PlanQuantity> = {}): PlanQuantity => ({ symbol, name, value, unit, kind: 'computed', formula: `${symbol} = ...`, needs: [], source: 'definition', withinRange: true, ...more });
const given = (name: string, value: number, unit: string): PlanQuantity => quantity('', name, value, unit, { kind: 'given', formula: 'given', source: 'the case' });
const spread = (value: number, share: number): Partial<PlanQuantity> => ({ low: value / (1 + share), high: value * (1 + share), coverage: 0.95 });

const include = (id: string, quantityId: string, value: number, at: number, margin: number): PlanEffect => ({
  id, title: id, applies: true, judged: true, verdict: 'include',
  deciding: { quantity: quantityId, value, leaveOutAt: at, includeAt: at, margin, marginKind: 'factor', branch: 'all' },
  because: `${quantityId} is {${quantityId}}`, price: { target: 'targets.0', of: 'outletTemperature', relative: 0.124, acts: true, formula: '1/F - 1' }, sources: ['a handbook, 3rd ed.'],
});
const leftOut = (id: string, margin?: number): PlanEffect => ({
  id, title: id, applies: true, judged: true, verdict: 'leave-out',
  deciding: { quantity: 'mach', value: 2.6e-4, leaveOutAt: 0.1, includeAt: 0.3, ...(margin === undefined ? {} : { margin, marginKind: 'factor' }), branch: 'all' }, because: 'Ma = {mach}',
});
const absent = (id: string): PlanEffect => ({ id, title: id, applies: false, judged: true, verdict: 'leave-out', because: 'the case names no such thing' });

const cautions: Section = { lines: [
  { text: 'Hot water at {inlet.temperature} under {pressure}: a run says nothing about the strength of the line; local codes and licensed practice decide.', quantities: ['inlet.temperature', 'pressure'] },
  { text: 'This is an estimate made before a run.', quantities: [] },
], tables: [] };

/** A plan made by hand: invented numbers in the form that every plan has. */
export function planFixture(change: Partial<Plan> = {}): Plan {
  return {
    program: 'runbrief 0.1.0',
    format: 1,
    case: { file: 'rinse-line.case.yaml', title: 'Rinse water cooled in a jacketed line', sha256: '0'.repeat(64) },
    targets: [{ id: 'targets.0', quantity: 'outletTemperature', place: 'outlet', mean: 'mass-flow', within: '1 K', computed: true }, { id: 'targets.1', quantity: 'lift of the line', computed: false, near: ['liftForce', 'liftCoefficient'] }],
    quantities: {
      'inlet.speed': quantity('', 'mean speed', 0.4, 'm/s', { kind: 'given', formula: 'given', source: 'the case', ...spread(0.4, 0.05) }),
      'sizes.diameter': given('diameter', 0.025, 'm'),
      'inlet.temperature': given('inlet temperature', 338.15, 'K'),
      'fluid.pressure': given('pressure', 2e5, 'Pa'),
      pressure: quantity('p', 'pressure', 2e5, 'Pa', { needs: ['fluid.pressure'] }),
      gravity: quantity('g', 'gravity', 9.80665, 'm/s^2', { kind: 'assumed', formula: 'standard gravity' }),
      regime: quantity('', 'regime', 'turbulent', 'word'),
      reynolds: quantity('Re', 'Reynolds number', 22563, '1', { ...spread(22563, 0.051), needs: ['inlet.speed', 'sizes.diameter'], source: 'ISO 80000-11' }),
      mach: quantity('Ma', 'Mach number', 2.6e-4, '1'),
      grashofFluxOverReynolds: quantity('Gr/Re', 'buoyancy against viscous forces', 55, '1', spread(55, 0.2)),
      outletTemperature: quantity('T_out', 'mean temperature at the outlet', 326.54, 'K', { low: 325.7, high: 327.4, coverage: 0.95, withinRange: false, outside: ['nusseltPlain'], range: { from: 320.1, to: 331.2 } }),
      temperatureDifference: quantity('dT', 'temperature difference', 45, 'K'),
      wallShear: quantity('tau_w', 'wall shear', 0.5123, 'Pa', { ...spread(0.5123, 0.1), at: 'wall/worst' }),
      'wallShear@wall/worst': quantity('tau_w', 'wall shear', 0.5123, 'Pa', spread(0.5123, 0.1)),
      'wallShear@wall/inlet': quantity('tau_w', 'wall shear', 0.61, 'Pa', spread(0.61, 0.1)),
      'frictionVelocity@wall/worst': quantity('u_tau', 'friction velocity', 0.0229, 'm/s', spread(0.0229, 0.05)),
      yPlusTarget: quantity('y+', 'target of y+', 1, '1', { kind: 'decided' }),
      firstCellHeight: quantity('h_1', 'first cell', 4.2e-5, 'm', spread(4.2e-5, 0.05)),
      'firstCellHeight@wall/worst': quantity('h_1', 'first cell', 4.2e-5, 'm', spread(4.2e-5, 0.05)),
      firstNodeDistance: quantity('y_1', 'first node', 2.1e-5, 'm', spread(2.1e-5, 0.05)),
      growthRatio: quantity('r', 'growth', 1.2, '1', { kind: 'decided' }),
      layerCount: quantity('n', 'layers', 18, '1'),
      layerStackHeight: quantity('H', 'stack', 0.0052, 'm'),
      coreCellSize: quantity('h', 'core cell', 0.00102, 'm'),
      cellCountCoarse: quantity('N_3', 'cells', 61000, '1'), cellCountMedium: quantity('N_2', 'cells', 206000, '1'), cellCountFine: quantity('N_1', 'cells', 694000, '1'),
      cellCount: quantity('N', 'cells', 694000, '1'),
      timeStep: quantity('dt', 'time step', 0.00255, 's', { needs: ['timeStepConvective'] }),
      timeStepConvective: quantity('dt_c', 'convection through a cell', 0.00255, 's'),
      runTime: quantity('t', 'run length', 60, 's'),
      stepCount: quantity('n_t', 'steps', 23500, '1'),
      coreHours: quantity('C', 'core hours', 120 * 3600, 's', spread(432000, 1)),
      wallTime: quantity('t_w', 'time until done', 7.5 * 3600, 's'),
      coreHoursFine: quantity('t_1', 'core hours, fine', 1200, '1'),
      coreHoursAll: quantity('t_all', 'core hours, all', 1700, '1'),
      memory: quantity('M', 'memory', 2.1e9, 'B', spread(2.1e9, 0.5)),
      'rung.poiseuille-pipe': quantity('f', 'friction factor', 0.032, '1', { low: 0.032, high: 0.032 }),
    },
    effects: [
      include('turbulence', 'reynolds', 22563, 2300, 9.8), include('variable-viscosity', 'reynolds', 22563, 2300, 1.3),
      { ...include('buoyancy', 'grashofFluxOverReynolds', 55, 20, 1.8), verdict: 'borderline', deciding: { quantity: 'grashofFluxOverReynolds', value: 55, leaveOutAt: 20, includeAt: 100, margin: 1.8, marginKind: 'factor', branch: 'level' }, check: 'one pair of runs with and without gravity', firstRun: 'keep', flipsAt: [{ path: 'inlet.temperature', value: 310, unit: 'K', verdict: 'leave-out' }] },
      { id: 'roughness', title: 'Roughness', applies: true, judged: true, verdict: 'undecided', because: 'the sand grain is not known', missing: ['wall.sandGrain|wall.Ra'] },
      { id: 'soret', title: 'Soret', applies: true, judged: false, verdict: 'undecided', because: 'not built', missing: [] },
      leftOut('compressibility', 380), leftOut('viscous-heating', 24000), leftOut('rarefaction'), leftOut('radiation', 3.2),
      ...Array.from({ length: 43 }, (_, i) => absent(`absent-${i}`)),
    ],
    choices: [
      { id: 'turbulence-treatment', title: 'Turbulence', applies: true, chosen: 'rans', because: 'the mean is asked', rejected: [{ option: 'les', because: 'no fluctuation is asked' }] },
      { id: 'near-wall-treatment', title: 'Walls', applies: true, chosen: 'law-of-the-wall', given: true, advised: 'resolved', because: 'the heat is asked', rejected: [] },
      { id: 'inlet-turbulence', title: 'Inlet', applies: false, chosen: 'none', because: 'none', rejected: [] },
    ],
    ladder: [{ id: 'poiseuille-pipe', changes: 'laminar, no heat', quantity: 'rung.poiseuille-pipe', value: 0.032, low: 0.032, high: 0.032, limit: { quantity: 'rung.poiseuille-pipe', atLeast: 0.03168, atMost: 0.03232, unit: '1' }, ifMissed: 'look at the inlet profile' }],
    sections: {
      ...(Object.fromEntries(sectionNames.map((name) => [name, { lines: [{ text: `${name}: the flow is {regime} at Re {reynolds}.`, quantities: ['regime', 'reynolds'] }], tables: [] }])) as unknown as Plan['sections']),
      cautions,
      mesh: { lines: [{ text: 'The first cell is {firstCellHeight} high; {notThere} is open.', quantities: ['firstCellHeight'] }], tables: [{ title: 'Regions', columns: ['region', 'cell', 'a long explanation'], rows: [['core', { id: 'coreCellSize' }, 'along the flow cells may be longer than across it, as far as the aspect ratio of the wall stack allows, and not a step further than that']] }] },
    },
    checklist: [{ id: 'mesh.yplus', stage: 'after the run', text: 'y+ of the first node', limit: 'at most {yPlusTarget}', where: 'wall' }, { id: 'mesh.count', stage: 'mesh', text: 'cells counted' }],
    contradictions: [],
    ...change,
  };
}
