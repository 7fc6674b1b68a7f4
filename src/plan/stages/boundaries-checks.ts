import { table, type Ground } from '../ground.ts';
import { listed } from '../say.ts';
import type { Table } from '../types.ts';
import { chosen, firstSaid, keeps } from '../when.ts';
import { boundariesOf, openCells, solvedVariables } from './boundaries-table.ts';

/** One rule of a well-posed set, how it stands here, and what a breach looks like. */
interface Rule { readonly rule: string; readonly here: string; readonly breach: string }

/** Whether the set of conditions is complete, closed and not over-set, rule by rule, as far as the rules concern this case. */
export function wellPosed(on: Ground): Table {
  return table('Well posed', ['rule', 'here', 'a breach shows as'], rules(on).map((r) => [r.rule, r.here, r.breach]));
}

function rules(on: Ground): Rule[] {
  const rows = boundariesOf(on);
  const open = openCells(on);
  const has = (is: string): boolean => rows.some((b) => b.is === is);
  const through = has('inlet') && has('outlet');
  const names = (is: string): string => listed(rows.filter((b) => b.is === is).map((b) => b.name));
  const out: (Rule | false)[] = [
    { rule: 'one condition for each variable at each boundary', here: open.length === 0 ? `${rows.length} boundaries, ${solvedVariables(on).length} variables, none open` : `open: ${listed(open.map((o) => `${o.variable} at ${o.boundary}`))}`, breach: 'a default of the program takes the place' },
    through && { rule: 'mass in equals mass out, pressure level fixed once', here: (firstSaid(on, 'the inlet gives {massFlow}; the outlet alone fixes the pressure, {outletPressure}') || 'the outlet alone fixes the pressure'), breach: 'pressure drifts, or the solve stalls at once' },
    through && on.has('drive.pressureDrop') && on.has('inlet.speed') && { rule: 'not both flow and pressure difference', here: 'both stand in the case: give one, take the other as the result', breach: 'the run meets one and silently drops the other' },
    has('point') && { rule: 'closed region: pressure level', here: 'one reference point; in a closed gas the mass is fixed and the level follows it', breach: 'mass drifts with the heating' },
    has('point') && { rule: 'closed region: a level of temperature', here: hasLevel(on) ? 'a wall with a given temperature or film fixes it' : 'no wall fixes it: fluxes must add up to zero, or the run is a transient', breach: 'temperature climbs without end' },
    has('open') && { rule: 'fluid that enters has a state', here: `${names('open')}: ${on.word('imposedFlow') === 'no' ? 'total pressure on entry, ' : ''}values for what returns`, breach: 'entrainment a few times too weak or too strong' },
    (keeps(on, 'buoyancy') || keeps(on, 'buoyancy-driven')) && { rule: 'the weight of the fluid counts once', here: firstSaid(on, 'solved pressure without {density} g z, reference density {density} at {referenceTemperature}; the same density at every opening', 'solved pressure without the weight at one reference density') || '', breach: 'a circulation that stays when all temperatures are made equal' },
    chosen(on, 'dimension-and-cuts').includes('mirror') && { rule: 'a mirror has nothing across it', here: keeps(on, 'buoyancy') && chosen(on, 'dimension-and-cuts').includes('top-bottom') ? 'gravity has a part across it: the cut does not hold' : 'gravity lies in the plane or does not act; no swirl, no mean flow across', breach: 'one half of a pattern that needs both' },
    keeps(on, 'axial-conduction') && { rule: 'no heat lost by conduction through the inlet', here: 'total flux at the inlet, not the value', breach: 'the heat balance misses what leaks upstream' },
    solvedVariables(on).includes('turbulence') && through && { rule: 'turbulence that arrives is possible', here: turbulenceSane(on), breach: 'laminar core at the inlet, or eddies larger than the opening' },
    { rule: 'absolute where the state is meant', here: firstSaid(on, 'properties at {pressure} absolute; the solved pressure may be relative to it, stated once', 'properties at one absolute pressure, stated once') || '', breach: 'density or boiling point of another state' },
  ];
  return out.filter((r): r is Rule => r !== false);
}

function hasLevel(on: Ground): boolean {
  const places = on.assembled.flow.walls.length === 0 ? ['wall'] : on.assembled.flow.walls.map((w) => `walls.${w}`);
  return places.some((p) => ['temperature', 'coefficient'].includes(on.word(`wallKind@${p}`) ?? ''));
}

function turbulenceSane(on: Ground): string {
  const [i, l, r, width] = ['turbulenceIntensity', 'turbulenceLength', 'viscosityRatio', 'hydraulicDiameter'].map((id) => on.number(id));
  const faults = [
    i !== undefined && (i < 1e-4 || i > 0.3) && 'the intensity {turbulenceIntensity} lies outside 0.01 to 30 %',
    l !== undefined && width !== undefined && l > width / 2 && 'the length {turbulenceLength} is more than half of the opening',
    r !== undefined && (r < 0.1 || r > 1e5) && 'the viscosity ratio {viscosityRatio} lies outside 0.1 to 100000',
  ].filter((f) => typeof f === 'string');
  return faults.length > 0 ? listed(faults) : firstSaid(on, 'intensity {turbulenceIntensity}, length {turbulenceLength}, viscosity ratio {viscosityRatio}: within bounds', 'intensity and length to be stated') as string;
}
