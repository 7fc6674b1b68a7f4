import { lines, table, type Ground, type StageResult } from '../ground.ts';
import { listed, nameOf } from '../say.ts';
import type { Cell, Check, Line, Table } from '../types.ts';
import { chosen, firstSaid, keeps, known, said, weightGroup } from '../when.ts';
import { boundariesOf } from './boundaries-table.ts';
import { derived, healthMaps } from './watch-maps.ts';

/** What is recorded while it runs, what is plotted afterwards and why, and what a right picture shows. */
export function watch(on: Ground): StageResult {
  const { look } = on.assembled.flow;
  return {
    lines: [
      ...monitorLines(on),
      ...lines(...expectedLines(on), ...look.mustShow.filter((m) => concerns(on, m)).map((m) => `Must show: ${m}.`), ...look.wrong.filter((w) => concerns(on, w)).map((w) => `Wrong picture: ${w}.`)),
      ...honest(on),
    ],
    tables: [cutsTable(on), probes(on), healthMaps(on), derived(on)],
    checklist: checks(on),
  };
}

/** Words at the head of a feature that say for which case it holds. */
const heads: readonly (readonly [RegExp, (on: Ground) => boolean])[] = [
  [/^laminar\b|^[^:]*\blaminar\b[^:]*:/, (on) => on.word('regime') !== 'turbulent'],
  [/^turbulent\b|^[^:]*\bturbulent\b[^:]*:/, (on) => on.word('regime') !== 'laminar'],
  [/^[^:]*\bstill fluid\b/, (on) => on.word('imposedFlow') === 'no'],
  [/^level\b[^:]*:/, (on) => on.word('axis') === undefined || on.word('axis') === 'level'],
  [/^upright\b[^:]*:/, (on) => on.word('axis') === undefined || on.word('axis') === 'upright'],
  [/^[^:]*\bheated\b[^:]*:/, (on) => on.word('energySolved') === 'yes'],
  [/Re_x|displacement|skin friction|transition at the inlet|pushes the stream|U constant/, (on) => on.word('imposedFlow') === 'yes'],
  [/temperature|\bheat\b|^front /, (on) => on.word('energySolved') === 'yes'],
  [/^shedding\b/, (on) => on.has('sheddingFrequency')],
];

/** Whether a feature of the flow can be seen in this case. */
const concerns = (on: Ground, text: string): boolean => known(on, text) && heads.every(([head, holds]) => !head.test(text) || holds(on));

const internal = (on: Ground): boolean => on.word('flowClass') === 'internal';
const heat = (on: Ground): boolean => on.word('energySolved') === 'yes';

function monitorLines(on: Ground): Line[] {
  const targets = on.assembled.targets.filter((t) => t.computed).map((t) => nameOf(on, t.quantity));
  const unsteady = ['transient', 'march'].includes(chosen(on, 'run-character'));
  return lines(
    `Recorded every ${unsteady ? 'step' : 'iteration'} with seven digits: residual of each equation, ${listed(['imbalance of mass', ...(heat(on) ? ['imbalance of heat'] : []), ...targets])}, extremes of ${listed(['speed', 'pressure', ...(heat(on) ? ['temperature'] : [])])}, hits of limiters.`,
    unsteady
      ? firstSaid(on, 'Probes sampled every {samplingInterval}: twenty and more in the fastest period expected, for a shedding frequency of {sheddingFrequency} and forces at twice that.', 'Probes sampled every {samplingInterval}.', 'Probes sampled every step.')
      : firstSaid(on, 'A target counts as flat when it moves by less than {monitorBand} of itself over {monitorWindow} iterations; the last such window is kept.', 'The last tenth of the iterations is kept.'),
  );
}

function expectedLines(on: Ground): (string | false)[] {
  return [
    said(on, `Expected${on.word('attached') === 'no' ? ' where it is attached' : ''}: a layer of {boundaryLayerThickness} at the wall${heat(on) && on.has('thermalLayerThickness') ? ', {thermalLayerThickness} for the temperature' : ''}${on.word('has.speciesWall') === 'yes' && on.has('concentrationLayerThickness') ? ', {concentrationLayerThickness} for the species' : ''}.`),
    internal(on) && on.word('separated') !== 'yes' && firstSaid(on, 'Expected: the profile settles over {entranceLength}, then the pressure falls straight, {pressureDrop} over all; largest speed {peakSpeed}.'),
    on.word('separated') === 'yes' && on.word('imposedFlow') === 'yes' && firstSaid(on, 'Expected: the separated eddy closes {reattachmentLength} behind its edge.', 'Expected: a wake of {wakeLength}.'),
    said(on, on.word('separated') === 'yes' && on.has('sheddingFrequency') && chosen(on, 'run-character') === 'transient' ? 'Expected: lift swings with {sheddingFrequency}, drag with twice that.' : ''),
    on.word('has.species') === 'yes' && firstSaid(on, 'Expected: the species leaves with a mass share of {outletMassFraction} on the mean; no share outside those of inlet and wall.'),
    heat(on) && firstSaid(on, 'Expected: all temperatures between {lowestTemperature} and {highestTemperature}; a cell outside is an error.'),
  ];
}

/** Planes, lines and surfaces, each with the question that it answers. */
function cutsTable(on: Ground): Table {
  const target = on.assembled.targets[0];
  const rows: (Cell[] | false)[] = [
    target !== undefined && [['internal', 'continuum'].includes(on.word('flowClass') ?? '') ? 'line along the wall and on the axis' : on.word('flowClass') === 'enclosure' ? 'level and upright line through the middle' : 'line along the surface', `the ${target.computed ? nameOf(on, target.quantity) : target.quantity}: where is it made`, known(on, `{${target.quantity}}`) && target.computed ? { id: target.quantity } : 'no estimate'],
    internal(on) && ['axis, speed along it', 'is the profile developed where it should be', on.has('entranceLength') ? { id: 'entranceLength' } : 'not known'],
    on.has('boundaryLayerThickness') && ['plane through the main direction, speed with mesh', 'does the layer grow as thick as expected, in cells enough', { id: 'boundaryLayerThickness' }],
    heat(on) && ['surface of the target wall, heat flux', 'is the flux smooth, without marks of the mesh', on.has('wallHeatFlux') ? { id: 'wallHeatFlux' } : on.has('heatRate') ? { id: 'heatRate' } : 'not known'],
    on.word('separated') === 'yes' && on.has('reattachmentLength') && [on.word('flowClass') === 'body' ? 'line through the wake, speed along it' : 'wall shear along the wall behind the edge', 'where does the eddy close: the zero, not the speed in the first cell', { id: 'reattachmentLength' }],
    on.word('flowClass') === 'continuum' && ['pressure along the bed', 'is the fall straight and as steep as the drag law has it', on.has('pressureDrop') ? { id: 'pressureDrop' } : 'not known'],
    (keeps(on, 'buoyancy') || keeps(on, 'buoyancy-driven')) && ['sections across the flow with vectors in the plane', 'does gravity turn the flow as it should', on.has(weightGroup(on)) ? { id: weightGroup(on) } : on.has('rayleigh') ? { id: 'rayleigh' } : 'not known'],
    chosen(on, 'dimension-and-cuts').includes('mirror') && ['pair of points either side of the mirror, in the run of the whole', 'is the cut allowed', 'equal means'],
    boundariesOf(on).some((b) => b.is === 'outlet' || b.is === 'open') && ['outlet and open sides, normal speed', 'does fluid come back', on.has('returningFlow') ? { id: 'returningFlow' } : 'none near the target'],
  ];
  return table('Where to look, and for which question', ['cut', 'question', 'number expected'], rows.filter((r): r is Cell[] => r !== false));
}

/** Points to record, with coordinates from predicted features. */
function probes(on: Ground): Table {
  const rows: (Cell[] | false)[] = [
    ...on.assembled.flow.look.probes.filter((p) => concerns(on, p)).map((p): Cell[] => [p, 'feature of this flow', '']),
    on.has('probeDepth') && ['in the layer at the place of the target', 'a third of the layer off the wall', { id: 'probeDepth' }],
    on.has('probeOutside') && on.word('flowClass') === 'body' && ['outside the layer, same place', 'one and a half layers off the wall: undisturbed there', { id: 'probeOutside' }],
    on.has('reattachmentLength') && on.word('separated') === 'yes' && ['behind the edge, near the end of the eddy', 'distance along the wall', { id: 'reattachmentLength' }],
    on.has('entranceLength') && internal(on) && on.word('inletProfile') !== 'developed' && ['axis at the end of the entrance', 'distance from the inlet', { id: 'entranceLength' }],
  ];
  return table('Probes', ['place', 'why there', 'distance'], rows.filter((r): r is Cell[] => r !== false));
}

function honest(on: Ground): Line[] {
  const target = on.assembled.targets.find((t) => t.computed);
  return lines(
    `Plotted honestly: one scale and range for all meshes and closures, cell values as cells at least once with the mesh beside it${heat(on) ? firstSaid(on, ', temperatures from {lowestTemperature} to {highestTemperature} with the cut printed') || '' : ''}, axes named with their scale${known(on, '{speed} {length}') ? ' (u over {speed}, lengths over {length})' : ''}; the worst place shown and not the nicest${target === undefined ? '' : `, the ${nameOf(on, target.quantity)} with its band`}.`,
  );
}

function checks(on: Ground): Check[] {
  return [
    { id: 'watch-monitors', stage: 'watch', text: 'monitors flat before anything is read', ...(on.has('monitorBand') && on.has('monitorWindow') ? { limit: '{monitorBand} of the target over {monitorWindow} iterations' } : {}) },
    ...on.assembled.flow.look.mustShow.filter((m) => concerns(on, m)).slice(0, 3).map((m, i): Check => ({ id: `watch-picture-${i}`, stage: 'watch', text: `the field shows: ${m}` })),
  ];
}
