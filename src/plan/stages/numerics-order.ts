import { table, type Ground } from '../ground.ts';
import type { Cell, Table } from '../types.ts';

/** Formal order of the convection schemes. */
const formal: Readonly<Record<string, string>> = { 'upwind-1': '1', 'upwind-2': '2', 'upwind-3': '3', 'central-2': '2', 'central-4': '4', blended: '1 until shown', limited: '2, 1 at extremes', 'shock-capturing': '1 behind shocks' };
const times: Readonly<Record<string, string>> = { 'implicit-1': '1', 'crank-nicolson': '2', 'backward-2': '2', 'implicit-runge-kutta-2': '2', 'explicit-runge-kutta-3': '3', 'explicit-runge-kutta-4': '4', 'adams-bashforth-2': '2' };

/** The order of every term that this case solves, formal and to plan with. */
export function orderTable(on: Ground): Table {
  const scheme = on.choice('convection-scheme').chosen;
  const clock = on.choice('time-scheme').chosen;
  const treated = on.choice('turbulence-treatment').chosen;
  const law = ['law-of-the-wall', 'rough-law'].includes(on.choice('near-wall-treatment').chosen);
  const scalars = on.word('has.species') === 'yes' ? 'limited' : scheme;
  const moves = on.choice('convection-scheme').applies !== false;
  const row = (term: string, how: string, order: string, plan: Cell): Cell[] => [term, how, order, plan];
  const planned: Cell = on.has('plannedOrder') ? { id: 'plannedOrder' } : '2';
  return table('Order of each term', ['term', 'scheme', 'formal order', 'to plan with'], [
    moves && row('convection of momentum', scheme, formal[scheme] ?? '2', planned),
    on.word('energySolved') === 'yes' && moves && row('convection of heat', scalars, formal[scalars] ?? '2', planned),
    on.word('has.species') === 'yes' && row('convection of species', 'limited', formal['limited'] as string, planned),
    (treated === 'rans' || treated === 'hybrid') && row('convection of turbulence', 'upwind-2', '2', planned),
    row('diffusion', 'central, with the non-orthogonal part', '2', planned),
    on.has('firstCellHeight') && row('gradient at the wall', law ? 'law of the wall' : 'one-sided over two cells', law ? 'a model' : '2', law ? 'a model' : planned),
    (on.kept('buoyancy') || on.kept('buoyancy-driven')) && row('weight', 'with the stencil of the pressure gradient', '2', planned),
    on.word('has.reactions') === 'yes' && row('reaction', 'cell value', '2 where it varies by less than 30 % in a cell', planned),
    clock !== 'none' && row('time', clock, times[clock] ?? '2', times[clock] ?? '2'),
  ]);
}
