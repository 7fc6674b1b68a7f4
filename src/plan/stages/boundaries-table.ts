import type { Boundary } from '../../flows/index.ts';
import { table, type Ground } from '../ground.ts';
import type { Table } from '../types.ts';
import { chosen, conditionOf, holds, keeps, known } from '../when.ts';

/** Variables that the run solves, in the order of the table. */
export function solvedVariables(on: Ground): readonly Variable[] {
  return [
    'velocity', 'pressure',
    ...(on.word('energySolved') === 'yes' ? ['temperature' as const] : []),
    ...(on.word('has.species') === 'yes' ? ['species' as const] : []),
    ...(['none', 'dns', 'les'].includes(chosen(on, 'turbulence-treatment')) ? [] : ['turbulence' as const]),
    ...(keeps(on, 'radiation') ? ['radiation' as const] : []),
  ];
}
type Variable = 'velocity' | 'pressure' | 'temperature' | 'species' | 'turbulence' | 'radiation';

/** Boundaries of this case: those of the flow, without what a cut replaces, with what it adds. */
export function boundariesOf(on: Ground): readonly Boundary[] {
  const cuts = chosen(on, 'dimension-and-cuts').split('+');
  const repeats = cuts.includes('periodic-along-flow');
  const own = on.assembled.flow.boundaries.filter((b) => holds(on, b.when) && !(repeats && (b.is === 'inlet' || b.is === 'outlet')));
  return [...own, ...(repeats ? [repeating] : []), ...cuts.flatMap((c) => mirrors[c] ?? []), ...ends(on, cuts)];
}

const plane = (name: string): Boundary => ({ name, is: 'mirror', velocity: 'mirror', pressure: 'mirror', temperature: 'mirror', turbulence: 'mirror', species: 'mirror' });
const mirrors: Readonly<Record<string, Boundary>> = { axisymmetric: plane('axis'), 'mirror-left-right': plane('plane between left and right'), 'mirror-top-bottom': plane('plane between top and bottom') };
const repeating: Boundary = {
  name: 'both ends along the flow', is: 'joined',
  velocity: [{ says: 'repeats, driven to {massFlow}' }, { says: 'repeats, driven to the given mean' }],
  pressure: 'repeats without the mean fall', temperature: 'scaled by its bulk value, repeats', turbulence: 'repeats', species: 'scaled by its bulk value, repeats',
};

/** What bounds the third direction. */
function ends(on: Ground, cuts: readonly string[]): Boundary[] {
  const third = on.assembled.flow.sizes.some((s) => s.infinite === true);
  if (!third || cuts.includes('axisymmetric')) return [];
  if (cuts.includes('two-dimensional')) return [{ name: 'front and back', is: 'joined', velocity: 'none: one cell deep', pressure: 'none', temperature: 'none', turbulence: 'none', species: 'none' }];
  if (on.word('infiniteDepth') === 'yes' || cuts.includes('periodic-along-span')) return [{ name: 'front and back', is: 'joined', velocity: 'repeats', pressure: 'repeats', temperature: 'repeats', turbulence: 'repeats', species: 'repeats' }];
  if (on.word('flowClass') === 'body') return [{ ...plane('both side edges'), velocity: 'slips', pressure: 'no slope', temperature: 'no slope', turbulence: 'no slope', species: 'no slope' }];
  return [{ name: 'front and back walls', is: 'wall', velocity: 'sticks', pressure: 'no slope', temperature: 'adiabatic', turbulence: 'as at the other walls', species: 'tight' }];
}

function radiationAt(on: Ground, b: Boundary): string {
  if (b.is === 'mirror') return 'mirror';
  if (b.is === 'joined' || b.is === 'point') return 'as its neighbour';
  const options = b.is === 'wall'
    ? [`leaves with emissivity {emissivity@${b.place ?? 'wall'}} and the temperature of the wall`, 'to be stated: emissivity of this wall']
    : b.is === 'inlet' || b.is === 'outlet'
      ? [`black, at ${b.is === 'inlet' ? '{inletTemperature}' : '{outletTemperature}'}`, 'black, at {inletTemperature}', 'black, at the temperature of what it looks at']
      : ['black, at {surroundingsTemperature}', 'black, at {farTemperature}', 'black, at the temperature of what it looks at'];
  return options.find((text) => known(on, text)) as string;
}

/** Every boundary with every solved variable. */
export function boundaryTable(on: Ground): Table {
  const variables = solvedVariables(on);
  const cell = (b: Boundary, v: Variable): string => (v === 'radiation' ? radiationAt(on, b) : conditionOf(on, v === 'species' ? (b.species ?? 'to be stated') : b[v]));
  return table('What each variable has at each boundary', ['boundary', ...variables], boundariesOf(on).map((b) => [b.name, ...variables.map((v) => cell(b, v))]));
}

/** Boundaries and variables that the case leaves open. */
export function openCells(on: Ground): { readonly boundary: string; readonly variable: string }[] {
  const { columns, rows } = boundaryTable(on);
  return rows.flatMap((row) => row.flatMap((cell, i) => (typeof cell === 'string' && cell.startsWith('to be stated') ? [{ boundary: row[0] as string, variable: columns[i] as string }] : [])));
}
