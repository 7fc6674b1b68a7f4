import type { Ground } from '../ground.ts';
import { beyondAccuracy, nameOf, priceText } from '../say.ts';

/** A way in which a run of this case can look right and be wrong. */
export interface Trap {
  readonly id: string;
  readonly title: string;
  /** With quantities in braces. */
  readonly text: string;
  /** What it moves the target by: a quantity, or a price in words. */
  readonly bias?: { readonly id: string } | string;
  readonly test: string;
  /** How often it is met, 0 to 1, and whether it moves a target by more than is asked. */
  readonly chance: number;
  readonly large: boolean;
}

const most = 5;
const seldom = 0.05;
const met = 0.15;
const often = 0.3;
const kept = new WeakMap<Ground, readonly Trap[]>();

/** Chance by damage: what passes the accuracy asked counts three times what does not. */
const score = (t: Trap): number => t.chance * (t.large ? 3 : 1);

/** The likeliest and worst of them in this case. */
export function trapsOf(on: Ground): readonly Trap[] {
  const had = kept.get(on);
  if (had !== undefined) return had;
  const found = [...evaluation(on), ...physics(on), ...numerics(on)].sort((a, b) => score(b) - score(a)).slice(0, most);
  kept.set(on, found);
  return found;
}

const open = (on: Ground, id: string): boolean => { const e = on.effect(id); return e !== undefined && e.applies !== false && e.judged && e.verdict !== 'leave-out'; };
const over = (on: Ground, a: string, b: string): boolean => (on.number(a) ?? Number.NaN) >= (on.number(b) ?? Number.NaN);
const asked = (on: Ground, ids: readonly string[]): Ground['assembled']['targets'][number] | undefined => on.assembled.targets.find((t) => t.computed && ids.includes(t.quantity.split('@')[0] as string));

/** Right field, wrong number read from it. */
function* evaluation(on: Ground): Generator<Trap> {
  const outlet = asked(on, ['outletTemperature']);
  if (outlet !== undefined && over(on, 'areaMeanBias', `${outlet.id}.domain`)) {
    yield { id: 'mean', title: 'Area mean for mass-flow mean', text: `at the outlet the two differ by {areaMeanBias}, where {${outlet.id}.accuracy} is asked.`, bias: { id: 'areaMeanBias' }, test: 'form both means of the outlet temperature from the same field and report the mass-flow one', chance: met, large: over(on, 'areaMeanBias', `${outlet.id}.accuracy`) };
  }
  if (asked(on, ['frictionFactorDarcy', 'skinFrictionCoefficient']) !== undefined) {
    yield { id: 'fanning', title: 'Darcy for Fanning', text: 'the Darcy factor is {frictionFactorDarcy}, its quarter {skinFrictionCoefficient} is the Fanning factor of many tables.', test: 'recompute the factor from wall shear and mean speed', chance: seldom, large: true };
  }
  const heat = asked(on, ['nusselt', 'heatTransferCoefficient']);
  if (heat !== undefined) yield { id: 'reference', title: 'Another reference temperature or area', text: `the estimate of the ${nameOf(on, heat.quantity)}, {${heat.quantity}}, is formed on the length {length} with the state at {bulkTemperature}.`, test: 'recompute it from the heat rate with the named area and temperature difference', chance: often, large: false };
  if (over(on, 'wallUnitsShift', 'wallUnitsLimit') && on.word('wallBounded') === 'yes') {
    yield { id: 'wall-units', title: 'y+ with the wrong state', text: 'the viscosity is {kinematicViscosityWall} at the wall and {kinematicViscosityBulk} in the bulk: a first cell laid out with the bulk value is off by {wallUnitsShift} of its height.', test: 'form y+ with density and viscosity of the wall cell', chance: met, large: false };
  }
  const pressure = on.assembled.case.get('fluid.pressure');
  if (on.word('medium') === 'gas' && pressure !== undefined && !/abs|atm|gauge/.test(pressure.written)) {
    yield { id: 'gauge', title: 'Gauge for absolute pressure', text: `"${pressure.written}" is read as absolute, which makes a density of {density}.`, test: 'hold the inlet density of the run against the record at the state of the plant', chance: seldom, large: true };
  }
}

/** Physics left out, or put in with the wrong number. */
function* physics(on: Ground): Generator<Trap> {
  const priced = (id: string): { bias: string; large: boolean } => ({ bias: priceText(on.effect(id).price), large: beyondAccuracy(on, on.effect(id).price) });
  if (open(on, 'variable-viscosity')) yield { id: 'properties', title: 'Properties at the wrong temperature', text: 'the viscosity goes from {viscosityHot} in the hottest to {viscosityCold} in the coldest fluid; one typed at the inlet reads {viscosity} where the bulk has {viscosityBulk}.', ...priced('variable-viscosity'), test: 'read the viscosity back in one wall cell and one core cell, and count the cells at the ends of its table', chance: met };
  if (open(on, 'buoyancy') && on.word('imposedFlow') === 'yes') {
    const e = on.effect('buoyancy');
    yield { id: 'gravity-off', title: 'Buoyancy taken as forced flow', text: `gravity is easily left off in a flow that something drives; here ${e.deciding === undefined ? `the decision is ${e.verdict}` : `{${e.deciding.quantity}} says ${e.verdict}`}.`, ...priced('buoyancy'), test: 'one pair of runs with and without gravity on the middle mesh', chance: often };
  }
  if (on.kept('buoyancy-driven') || (open(on, 'buoyancy') && on.word('axis') !== 'level')) yield { id: 'gravity-sign', title: 'Gravity the wrong way', text: `a swapped sign turns aiding into opposing, at ${on.number('temperatureDifference') === 0 && on.has('solutalDensityBound') ? 'a density change of {solutalDensityBound} by composition' : '{temperatureDifference} across the flow'}, and the picture stays smooth.`, test: 'start from rest without drive: hot fluid rises', chance: seldom, large: true };
  if (open(on, 'radiation') && ![...on.assembled.case.entries.keys()].some((path) => path.endsWith('emissivity'))) yield { id: 'radiation', title: 'Radiation left out', text: `no wall of the case has an emissivity, and the verdict on radiation is ${on.effect('radiation').verdict}${on.has('radiationShare') ? ' at a share of {radiationShare}' : ''}.`, ...priced('radiation'), test: 'switch grey surfaces on once and compare heat rates', chance: often };
  if (open(on, 'nonlinear-density') && on.has('thermalExpansionHot') && on.has('thermalExpansionCold')) yield { id: 'expansion', title: 'Expansion at one temperature', text: 'the expansion coefficient is {thermalExpansionCold} in the coldest and {thermalExpansionHot} in the hottest fluid.', ...priced('nonlinear-density'), test: 'run once with the tabled density', chance: seldom };
  if (open(on, 'entrance-effects') && on.word('inletProfile') === 'uniform' && on.has('entranceRatio')) yield { id: 'inlet', title: 'Even inlet where a developed one arrives', text: 'the passage is {entranceRatio} entrance lengths long, and the profile at its inlet is even.', ...priced('entrance-effects'), test: 'the other profile once, on the middle mesh', chance: met };
  if (open(on, 'roughness') && on.has('roughnessReynolds')) yield { id: 'roughness', title: 'Smooth wall for rough', text: 'the sand grain stands {roughnessReynolds} viscous lengths high.', ...priced('roughness'), test: 'the sand grain three times as high, once', chance: met };
  const prandtl = asked(on, ['nusselt', 'heatTransferCoefficient', 'heatRate', 'outletTemperature', 'wallTemperature']);
  if (prandtl !== undefined && on.kept('turbulence') && ((on.number('prandtl') ?? 1) > 10 || (on.number('prandtl') ?? 1) < 0.1)) yield { id: 'turbulent-prandtl', title: 'The turbulent Prandtl number decides, not the flow', text: 'with a Prandtl number of {prandtl} the layer that carries the heat lies where the closure is least sure.', test: 'run at two turbulent Prandtl numbers, 0.7 and 1.0', chance: often, large: true };
}

/** A mesh, step or scheme that smooths the answer into another one. */
function* numerics(on: Ground): Generator<Trap> {
  const chosen = (id: string): string => on.choice(id)?.chosen ?? 'none';
  if (chosen('run-character') === 'steady' && open(on, 'unsteadiness')) yield { id: 'steady', title: 'A steady solver holds an unsteady flow still', text: on.has('unsteadyRatio') ? 'the flow stands at {unsteadyRatio} times the value from which on it swings.' : `the verdict on unsteadiness is ${on.effect('unsteadiness').verdict}.`, test: 'carry on in time from the steady field with a small disturbance', chance: often, large: true };
  if (chosen('near-wall-treatment') === 'law-of-the-wall' && on.word('attached') === 'yes' && asked(on, ['frictionFactorDarcy', 'pressureDrop', 'nusselt', 'heatTransferCoefficient', 'wallShear']) !== undefined) yield { id: 'own-law', title: 'The law of the wall gives back its own law', text: `a result near the estimate {${asked(on, ['frictionFactorDarcy', 'pressureDrop', 'nusselt', 'heatTransferCoefficient', 'wallShear'])?.quantity ?? 'frictionFactorDarcy'}} is then no independent proof of it.`, test: 'one run with the wall layer resolved, on the middle mesh', chance: met, large: false };
  if (chosen('convection-scheme') === 'upwind-1' && on.has('cellPeclet')) yield { id: 'upwind', title: 'Numerical mixing passes for mixing', text: 'the cell Peclet number of the plan is {cellPeclet}; first-order upwind adds half of it times the diffusivity.', test: 'second order on the same mesh', chance: often, large: true };
}
