import { table, type Ground } from '../ground.ts';
import type { Cell, Table } from '../types.ts';

const columns = [['diffusivity', 'diffusivity'], ['schmidt', 'Sc'], ['massFractionInlet', 'mass share at the inlet'], ['massFractionWall', 'at the wall'], ['solutalDensityBound', 'density change'], ['sherwood', 'Sh'], ['massTransferCoefficient', 'k_c']] as const;
const kinetics = [['rateConstant', 'rate constant'], ['surfaceRateConstant', 'at a surface'], ['damkohler', 'Da'], ['damkohlerDiffusive', 'Da_II'], ['thiele', 'Thiele'], ['conversion', 'converted'], ['adiabaticReactionRise', 'rise without loss']] as const;

/**
 * What the fluid carries and how it reacts, one row each.
 *
 * @param on  the ground of the plan
 * @returns   tables with the columns that have a number
 */
export function carriedTables(on: Ground): Table[] {
  const { case: given } = on.assembled;
  return [
    ...rows(on, 'Species carried', 'species', given.list('species').map((name) => ({ name, place: `species.${name}` })), columns),
    ...rows(on, 'Reactions', 'reaction', given.list('reactions').map((name) => ({ name: [given.word(`reactions.${name}.of`), given.word(`reactions.${name}.where`)].filter((w) => w !== undefined).join(', ') || name, place: `reactions.${name}` })), kinetics),
  ];
}

function rows(on: Ground, title: string, what: string, items: readonly { readonly name: string; readonly place: string }[], all: readonly (readonly [id: string, head: string])[]): Table[] {
  const shown = all.filter(([id]) => items.some(({ place }) => on.has(`${id}@${place}`)));
  if (items.length === 0 || shown.length === 0) return [];
  return [table(title, [what, ...shown.map(([, head]) => head)], items.map(({ name, place }): Cell[] => [name, ...shown.map(([id]): Cell => (on.has(`${id}@${place}`) ? { id: `${id}@${place}` } : 'not known'))]))];
}
