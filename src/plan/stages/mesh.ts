import { lines, table, type Ground, type StageResult } from '../ground.ts';
import type { Check, Line, Table } from '../types.ts';
import { blockLines, blockTable } from './mesh-blocks.ts';
import { kindTable, qualityTable, topologyLines, topologyTable } from './mesh-kinds.ts';
import { meshRegions, numberTable } from './number-table.ts';

/** Cells region by region, topology, blocks, quality, and the family of three meshes with its expected error. */
export function mesh(on: Ground): StageResult {
  return {
    lines: [...countLines(on), ...topologyLines(on), ...blockLines(on), ...layerLines(on), ...familyLines(on), ...pecletLines(on), ...finishedLines(on)],
    tables: [...regionTable(on), ...numberTable(on, 'Layers at the wall', ['firstCellHeight', 'firstNodeDistance', 'growthRatio', 'layersForMatch', 'layersForGap', 'layerCount', 'layerStackHeight', 'lastLayerHeight', 'handOver', 'cellsInLayer', 'wallAspectRatio']), ...topologyTable(on), ...kindTable(on), ...blockTable(on), ...familyTable(on), ...qualityTable(on)],
    checklist: checks(on),
  };
}

function countLines(on: Ground): Line[] {
  const regions = meshRegions(on);
  if (!on.has('cellCount')) return lines(`The cells of this ${on.assembled.flow.title.toLowerCase()} cannot be counted: ${on.has('coreCellSize') ? 'the regions have no extents' : 'the length that the core divides is not known'}.`);
  const largest = [...regions].sort((a, b) => (on.number(`regionCells@${b}`) ?? 0) - (on.number(`regionCells@${a}`) ?? 0))[0] as string;
  const share = (on.number(`regionCells@${largest}`) ?? 0) / (on.number('regionCells') ?? 1);
  return lines(
    `The medium mesh has {cellCount} cells in ${on.number('meshDimension') === 2 ? 'two' : 'three'} directions: cells of {coreCellSize} away from walls${Math.abs((on.number('coreCellSize') ?? 0) * (on.number('coreCellsMedium') ?? 0) / (on.number('coreLength') ?? 1) - 1) < 1e-6 ? ', {coreCellsMedium} of them over the core length {coreLength}' : ''}.`,
    regions.length > 1 && `Most of them, ${Math.round(100 * share)} %, lie in the region ${largest}: coarsening along it is where cells are saved first, the layers at the wall are where none may be.`,
    (on.number('cutShare') ?? 1) < 1 && `The cuts leave {cutShare} of the region to be meshed.`,
    on.has('cellCountLes') && `Resolving the large eddies of the same walls would take about {cellCountLes} cells, resolving all {cellCountDns}.`,
  );
}

function regionTable(on: Ground): Table[] {
  const rows = meshRegions(on).map((r) => [r, ...['regionAlong', 'regionAcross', 'regionSizeAlong', 'regionSizeAcross', 'cellsAlong', 'cellsAcross', 'cellsSpan', 'regionCells', 'regionPeclet'].map((id) => (on.has(`${id}@${r}`) ? { id: `${id}@${r}` } : ''))]);
  return rows.length === 0 ? [] : [table('Cells by region', ['region', 'along', 'across', 'cell along', 'cell across', 'n along', 'n across', 'n span', 'cells', 'cell Peclet'], rows)];
}

function layerLines(on: Ground): Line[] {
  if (!on.has('firstCellHeight') || !on.has('layerCount')) return [];
  const [ratio, aspect, count] = [on.number('handOver') ?? 1, on.number('wallAspectRatio') ?? 1, on.number('layerCount') ?? 1];
  const full = on.number('layersForGap') === count && count < (on.number('layersForMatch') ?? count);
  const reach = on.has('stackCover') ? '; the layer of {stackCover} holds {cellsInLayer} cells' : '';
  return lines(
    count === 1
      ? `Equal cells do at the wall: the cell there may be as tall as those of the core, {firstCellHeight}, and no layers grow from it${reach}.`
      : `The cell at the wall is {firstCellHeight} high and the layers grow by {growthRatio} until they reach the core: {layerCount} layers, {layerStackHeight} together${reach}.`,
    tallCell(on) && 'The cell at the wall, {firstCellHeight}, is taller than the core cells of {coreCellSize}: its node cannot stand where the law of the wall wants it and the core be that fine. Take a coarser core beside the wall, or resolve the wall.',
    count > 1 && `The last layer is {lastLayerHeight} high and hands over to cells {handOver} times as high${full ? ': the layers of both walls meet in the middle of the gap of {gap} before they have grown to the core' : ratio > 1.5 ? ': more than 1.5, so add layers or refine the core beside them' : ', a jump that the growth itself would make'}.`,
    `The longest cell at a wall is {wallAspectRatio} times as long as high${aspect > 1000 ? ', beyond 1000: shorten the cells along the wall, or have the pressure solved along the short sides and in double precision' : aspect > 100 ? ': fit for flat walls (to 1000), too long for curved ones (to 100) and where the flow turns (to 10)' : ', fit for curved walls too'}.`,
  );
}

/** A law of the wall, or a given first cell, puts the node beyond what the core cells allow. */
const tallCell = (on: Ground): boolean => (on.number('firstCellHeight') ?? 0) > 1.001 * (on.number('coreCellSize') ?? Number.POSITIVE_INFINITY);

function familyTable(on: Ground): Table[] {
  if (!on.has('cellCountFine') || !on.has('cellCount')) return [];
  const row = (name: string, cells: string, size: string, error: string) => [name, { id: cells }, { id: size }, on.has(error) ? { id: error } : ''];
  return [table('Three similar meshes', ['mesh', 'cells', 'core cell', 'expected error of the target'], [row('coarse', 'cellCountCoarse', 'coreCellSizeCoarse', 'meshErrorCoarse'), row('medium', 'cellCount', 'coreCellSize', 'meshError'), row('fine', 'cellCountFine', 'coreCellSizeFine', 'meshErrorFine')])];
}

function familyLines(on: Ground): Line[] {
  if (!on.has('cellCountFine')) return [];
  const enough = (on.number('meshError') ?? 1) * 1.25 <= (on.number('meshTolerance') ?? 0);
  const fineEnough = (on.number('meshErrorFine') ?? 1) * 1.25 <= (on.number('meshTolerance') ?? 0);
  const law = ['law-of-the-wall', 'rough-law'].includes(on.choice('near-wall-treatment').chosen);
  return lines(
    `Three meshes at a linear ratio of {refinementRatio} keep blocks, laws and end points; every edge is a multiple of {countMultiple} cells, so that they coarsen exactly.`,
    law ? 'The distance of the first node stays the same in all three, for moving it changes the model; the law of the wall is tested apart, at twice the distance.' : on.has('firstCellHeight') && 'The cell at the wall scales with the mesh: check that the coarsest still meets its height, and let the growth of a layer rise to the power {refinementRatio} there.',
    on.has('meshError') && `Expected error of the medium mesh {meshError} (${on.has('wallError') ? 'wall {wallError}, ' : ''}core {coreError}), to be believed within a factor of 3, at the order {plannedOrder}; ${enough ? 'it fits' : fineEnough ? 'the fine mesh, not the medium, fits' : 'no mesh of the family fits'} the share {meshTolerance} that the accuracy asked leaves to the mesh, which needs about {cellCountNeeded} cells.`,
    on.has('meshChange') && 'From medium to fine the target should move by {meshChange}: three times that, or a third of it, means misjudged layers or no asymptotic range.',
  );
}

function pecletLines(on: Ground): Line[] {
  if (!on.has('cellPeclet')) return [];
  const pe = on.number('cellPeclet') ?? 0;
  return lines(`In the core the cell Peclet number is {cellPeclet} and the cell Reynolds number {cellReynolds}: ${pe <= 2 ? 'central schemes stay free of wiggles' : 'a central scheme can ring there, so the front must span cells enough or the scheme lean upstream (see numerics)'}.`);
}

function finishedLines(on: Ground): Line[] {
  const wall = on.has('wallArea') ? `wall area {wallArea} and ` : '';
  return lines(on.has('cellCount') && `Before the run: no negative volume, ${wall}volume within 0.5 % of the geometry, the cell at the wall sampled at 5, 50 and 95 % of the wall${on.has('firstCellHeight') ? ' against {firstCellHeight}' : ''}.`);
}

function checks(on: Ground): Check[] {
  if (!on.has('cellCount')) return [];
  return [
    { id: 'mesh-finished', stage: 'mesh', text: 'no negative volumes; areas and volume against the geometry', limit: '0.5 %', where: 'all boundaries' },
    ...(on.has('firstCellHeight') ? [{ id: 'mesh-wall-cell', stage: 'mesh', text: 'height of the cell at the wall, sampled', limit: 'planned height within a fifth', where: on.assembled.flow.walls.length === 0 ? 'the wall' : on.assembled.flow.walls.join(', ') }] : []),
    ...(tallCell(on) ? [{ id: 'mesh-wall-against-core', stage: 'mesh', text: 'cell at the wall against the core cells beside it: a coarser core there, or a wall that is resolved', limit: 'no taller than the core', where: 'first cells off the wall' }] : []),
    { id: 'mesh-family', stage: 'mesh', text: 'three meshes similar: ratio of counts by region against the planned ratio', limit: '5 %', where: meshRegions(on).join(', ') },
  ];
}
