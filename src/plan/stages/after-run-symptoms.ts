import { table, type Ground } from '../ground.ts';
import type { Cell, Table } from '../types.ts';
import { chosen, keeps } from '../when.ts';

/** Symptoms that can occur in this case, with the likely cause and the number that tells, and the first action. */
export function symptoms(on: Ground): Table {
  const through = on.word('imposedFlow') === 'yes';
  const steady = chosen(on, 'run-character') === 'steady';
  const modelled = chosen(on, 'turbulence-treatment') !== 'none';
  const heat = on.word('energySolved') === 'yes';
  const has = (id: string): boolean => on.has(id);
  const rows: (Cell[] | false)[] = [
    ['diverges in the first 50 iterations', 'starting field; cells with an angle above 75 degrees; sign of a source', 'start slower and first order; map of the residual'],
    through && ['diverges late', `flow back through the outlet${has('returningFlow') ? ', more than {returningFlow}' : ''}; ${steady && has('unsteadyGroup') ? 'steady run of a flow that moves: {unsteadyGroup} against {unsteadyFrom}' : 'a property at its limit'}`, 'outlet farther away; then in time'],
    steady && ['residuals on a plateau, monitors swing', has('sheddingFrequency') && has('unsteadyGroup') ? 'physical if the frequency is near {sheddingFrequency}; numerical if its period goes with the relaxation' : 'physical if the period stays when the relaxation is doubled, numerical if it moves', 'double the relaxation; then in time'],
    steady && ['residuals on a plateau, monitors flat', 'a limiter that flips; a few bad cells that hold half of the residual', 'accept with a note; mend the cells'],
    heat && ['mass closes, heat does not', `too few iterations of the energy; heat capacity and enthalpy do not fit${keeps(on, 'conjugate') ? '; flux at the coupled wall' : ''}${has('heatClosure') ? '; allowed are {heatClosure}' : ''}`, 'tighten the energy; integrate the heat capacity against the enthalpy'],
    (keeps(on, 'buoyancy') || keeps(on, 'buoyancy-driven')) && ['balance drifts on and on', has('crossDiffusionTime') ? 'a slow mode: {crossDiffusionTime} to diffuse across; a leak of heat' : 'a slow mode; a leak of heat', 'march three of these times; check the closed walls'],
    heat && has('lowestTemperature') && ['temperature below {lowestTemperature} or above {highestTemperature}', has('cellPeclet') ? 'scheme without limit at a cell Peclet number of {cellPeclet}; skew cells; sign of a source' : 'scheme without limit; skew cells; sign of a source', 'bounded scheme; mesh'],
    modelled && has('firstNodeYPlus') && ['y+ twice {firstNodeYPlus} everywhere', 'node taken for height of the cell; viscosity at another temperature than that of the wall', 'compare {firstNodeDistance} with {firstCellHeight} in the mesh'],
    modelled && has('eddyViscosityCore') && ['eddy viscosity far from {eddyViscosityCore} times the molecular one', 'inlet values; laminar where it should not be', 'inlet turbulence; trip or longer run'],
    has('plannedOrder') && ['order far from {plannedOrder}', 'coarsest mesh too coarse; wall layer not refined with the rest; average too short', 'a finer third mesh alike in all spacings'],
    on.assembled.flow.domain.length > 0 && has('targets.0.domain') && ['target moves by more than {targets.0.domain} with the larger region', has('reattachmentLength') && on.word('separated') === 'yes' ? 'outlet or sides reach into the eddy of {reattachmentLength}' : 'an end acts on the target', 'the larger region for all runs'],
    on.assembled.flow.cuts.some((c) => c.option.startsWith('mirror')) && ['one-sided field in an even set-up', 'physical if the mirrored start gives the other side; numerical if it gives the same', 'mirrored start'],
    ['target does not follow an input that moves the hand estimate', 'the input is not connected, or a limiter caps it', 'the input times 1.5 on the coarse mesh'],
    has('dragCoefficient') && ['pressure right, force wrong', 'reference area {frontalArea}; sign of the normal; reference pressure', 'force of an even pressure over the closed surface: zero'],
  ].map((r) => (r === false || (Array.isArray(r) && r.some((c) => typeof c === 'string' && [...c.matchAll(/\{([^{}]+)\}/g)].some(([, id]) => !on.has(id as string)))) ? false : r));
  return table('Symptom, likely cause, first action', ['seen', 'likely cause, and the number that tells', 'first action'], rows.filter((r): r is Cell[] => r !== false));
}
