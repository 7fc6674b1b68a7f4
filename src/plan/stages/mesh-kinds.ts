import { lines, table, type Ground } from '../ground.ts';
import type { Line, Table } from '../types.ts';

/** Topologies with what they cost against aligned hexahedra of the same error. */
const topologies = [
  { word: 'structured', cells: '1', wall: 'full control of height and growth', freedom: 'refinement runs through the whole mesh', effort: 'least' },
  { word: 'block-structured', cells: '1 to 1.3', wall: 'full control of height and growth', freedom: 'by block', effort: 'hours to days for each block layout' },
  { word: 'hybrid', cells: '1.5 to 2', wall: 'full control, layers may collapse in corners', freedom: 'anywhere outside the layers', effort: 'little' },
  { word: 'unstructured', cells: '4 to 5', wall: 'gradient of first order', freedom: 'anywhere', effort: 'least' },
  { word: 'cut-cell', cells: '1.5 to 2, away from walls', wall: 'first distance scatters by a decade', freedom: 'in steps of two', effort: 'least' },
] as const;

export function topologyLines(on: Ground): Line[] {
  const choice = on.choice('mesh-topology');
  const separated = on.word('separated') === 'yes';
  return lines(
    `Topology: ${choice.chosen}, for ${choice.because}.`,
    separated ? 'Mesh lines follow the wall to the point of separation and the wake behind it; the free shear layer is crossed at no less than 45 degrees.' : on.word('attached') === 'yes' && on.word('flowClass') !== 'continuum' && 'The flow keeps to its walls: mesh lines run along it within 10 to 15 degrees and leave the wall at 70 degrees or more.',
  );
}

/** What each topology would take here, in cells for the error of the planned mesh. */
export function topologyTable(on: Ground): Table[] {
  if (!on.has('cellCount')) return [];
  const { chosen, rejected } = on.choice('mesh-topology');
  const reason = (word: string): string => (word === chosen ? 'chosen' : (rejected.find((r) => r.option === word)?.because ?? ''));
  return [table('Topologies for this case', ['topology', 'cells for the same error, times', 'at the wall', 'refinement', 'effort', 'verdict'], topologies.map((t) => [t.word, t.cells, t.wall, t.freedom, t.effort, reason(t.word)]))];
}

/** Kinds of cell by place. */
export function kindTable(on: Ground): Table[] {
  const { chosen } = on.choice('mesh-topology');
  const layered = on.has('layerCount');
  const inside = chosen === 'hybrid' ? 'polyhedra or hexahedra, 1.6 to 2 times the cells of aligned hexahedra' : chosen === 'cut-cell' ? 'cubes in steps of two' : on.number('meshDimension') === 2 ? 'quadrilaterals' : 'hexahedra';
  return [table('Kinds of cell', ['place', 'cells'], [
    layered && ['layers at the wall', chosen === 'hybrid' ? 'prisms or hexahedra' : on.number('meshDimension') === 2 ? 'quadrilaterals' : 'hexahedra'],
    layered && ['how many', { id: 'layerCount' }],
    ['inside', inside],
    ['never', layered ? 'tetrahedra on the wall: the gradient there falls to first order' : 'first-order cells where the target is made'],
  ])];
}

/** Limits of quality where this mesh has cells. */
export function qualityTable(on: Ground): Table[] {
  const wall = on.has('layerCount');
  const shear = on.word('separated') === 'yes' || on.word('flowClass') === 'jet';
  const far = on.word('flowClass') === 'body' || on.word('flowClass') === 'jet';
  const eddies = ['les', 'dns', 'wall-modelled-les', 'hybrid'].includes(on.choice('turbulence-treatment').chosen);
  const columns = ['measure', ...(wall ? ['layers at the wall'] : []), ...(shear ? ['shear layers, wake'] : []), 'core', ...(far ? ['far'] : [])];
  const row = (name: string, atWall: string, inShear: string, core: string, away: string): string[] => [name, ...(wall ? [atWall] : []), ...(shear ? [inShear] : []), core, ...(far ? [away] : [])];
  return [table('Quality, worst allowed', columns, [
    row('smallest angle between lines', '60 degrees', '45 degrees', '30 degrees', '20 degrees'),
    row('skewness', '0.4', '0.6', '0.8', '0.9'),
    row('non-orthogonality', '30 degrees', '50 degrees', '65 degrees', '70 degrees'),
    row('volume of neighbours', '1.3 times', '1.5 times', '2 times', '4 times'),
    row('aspect ratio', on.word('ductSection') === 'flat' ? '1000' : '100 to 1000', eddies ? '2 to 4' : '5 to 10', '20', '100'),
    row('warp of a face', '10 degrees', '10 degrees', '20 degrees', '30 degrees'),
  ])];
}
