import { table, type Ground } from '../ground.ts';
import type { Cell, Table } from '../types.ts';
import { chosen, keeps } from '../when.ts';

const cell = (on: Ground, id: string, otherwise: string): Cell => (on.has(id) ? { id } : otherwise);

/** Maps over the region, each with its limit and what to do beyond it. */
export function healthMaps(on: Ground): Table {
  const modelled = chosen(on, 'turbulence-treatment') !== 'none';
  const inTime = ['transient', 'march'].includes(chosen(on, 'run-character'));
  const rows: (Cell[] | false)[] = [
    modelled && chosen(on, 'near-wall-treatment') !== 'none' && ['y+ of the first node', cell(on, 'yPlusTarget', 'not known'), cell(on, 'yPlusAccepted', 'not known'), 'first cell times aim over the value that 95 % of the area stays below'],
    inTime && ['Courant number', cell(on, 'courantNumber', 'not known'), cell(on, 'courantTarget', 'not known'), 'find the cell; smaller step or coarser cell there'],
    ['cell Peclet number', cell(on, 'cellPeclet', 'not known'), 'above 2 no central scheme without limit', 'refine or align where numerical diffusion exceeds a tenth of the acting one'],
    on.has('numericalShare') && ['numerical over acting diffusion', { id: 'numericalShare' }, '0.1', 'refine across the layer, higher order'],
    modelled && on.has('eddyViscosityCore') && ['eddy over molecular viscosity', { id: 'eddyViscosityCore' }, 'a tenth to ten times', 'inlet values; limiter of production'],
    ['residual by cell', 'even', 'the worst 0.1 % of cells hold less than half', 'mend these cells'],
    on.word('imposedFlow') === 'yes' && ['flow back through the outlet', '0 kg/s', cell(on, 'returningFlow', 'none near the target'), 'outlet farther away'],
    on.word('energySolved') === 'yes' && ['temperature below the lowest', cell(on, 'lowestTemperature', 'not known'), 'no cell at the target, one in 10 000 elsewhere', 'bounded scheme; skew cells'],
    on.word('energySolved') === 'yes' && ['temperature above the highest', cell(on, 'highestTemperature', 'not known'), 'no cell at the target, one in 10 000 elsewhere', 'bounded scheme; sign of a source'],
    keeps(on, 'cavitation') && ['absolute pressure', cell(on, 'lowestPressure', 'not known'), cell(on, 'vapourPressure', 'vapour pressure'), 'vapour forms: the case changes'],
    on.has('cellsInLayer') && ['cells in the layer', { id: 'cellsInLayer' }, '8 at the target', 'more layers at the wall'],
    ['error indicator, h^2 times second derivative', 'even', 'three times its median', 'refine there and nowhere else'],
  ];
  return table('Maps of health', ['map', 'expected', 'limit', 'beyond it'], rows.filter((r): r is Cell[] => r !== false));
}

/** How each number is formed out of the fields, declared once. */
export function derived(on: Ground): Table {
  const internal = on.word('flowClass') === 'internal';
  const rows: (Cell[] | false)[] = [
    internal && on.word('energySolved') === 'yes' && ['bulk temperature', 'integral of rho u c_p T over that of rho u c_p, over the section', cell(on, 'outletTemperature', 'at the outlet')],
    on.word('energySolved') === 'yes' && ['heat-transfer coefficient', internal ? 'wall flux over wall less bulk temperature at the same place; as mean: flux over the logarithmic mean difference' : on.word('flowClass') === 'enclosure' ? 'mean flux over hot less cold wall' : 'wall flux over wall less undisturbed temperature; radiation apart', cell(on, 'heatTransferCoefficient', 'not known')],
    on.word('energySolved') === 'yes' && ['wall heat flux', 'the flux that the scheme itself passes through the face, not a difference of plotted temperatures', cell(on, 'wallHeatFlux', 'not known')],
    (internal || on.word('flowClass') === 'continuum') && on.has('pressureDrop') && ['pressure drop', 'difference of area means of pressure between equal sections; total pressure weighted by flow where sections differ', cell(on, 'pressureDrop', 'not known')],
    internal && ['friction factor', 'from the pressure fall and from the wall shear: equal within 1 % where the flow is developed', cell(on, 'frictionFactorDarcy', 'not known')],
    on.has('dragCoefficient') && ['drag coefficient', 'pressure and friction parts apart, summed over the closed surface, on the frontal area', { id: 'dragCoefficient' }],
    on.word('separated') === 'yes' && on.has('reattachmentLength') && on.word('flow') === 'backward-step' && ['reattachment', 'zero of the mean wall shear, interpolated', { id: 'reattachmentLength' }],
    on.has('sheddingFrequency') && on.word('separated') === 'yes' && ['shedding frequency', 'peak of the spectrum of the lift over whole periods, start thrown away', { id: 'sheddingFrequency' }],
    ['mean in time', 'equal steps, whole periods, window and band stated', cell(on, 'averagingTime', 'steady run')],
  ];
  return table('How derived values are formed', ['value', 'formed as', 'expected'], rows.filter((r): r is Cell[] => r !== false));
}
