import { overBudget } from './budget.ts';
import { contradiction, without } from './contradiction.ts';
import type { Ground } from './ground.ts';
import { aFlow, inWords, nameOf, percent } from './say.ts';
import type { Contradiction } from './types.ts';

const near = 0.01;

/** Drives, temperatures, pressures, walls and targets of the case against each other. */
export function* inputContradictions(on: Ground): Generator<Contradiction> {
  yield* drives(on);
  yield* budget(on);
  yield* pressures(on);
  yield* walls(on);
  yield* layers(on);
  yield* temperatures(on);
  yield* targets(on);
  yield* features(on);
}

/** Speed, volume flow and mass flow of one inlet: the first counts, the others must agree with it. */
function* drives(on: Ground): Generator<Contradiction> {
  const given = (path: string): number | undefined => on.assembled.case.number(path);
  const list = [['inlet.speed', 'speed'], ['inlet.volumeFlow', 'volumeFlow'], ['inlet.massFlow', 'massFlow']] as const;
  const stated = list.filter(([path]) => given(path) !== undefined);
  const [first] = stated;
  if (first === undefined) return;
  for (const [path, id] of stated.slice(1)) {
    const counted = on.assembled.case.get(path)?.reference !== undefined; // then it is another number at the inlet
    const value = counted ? (on.number(id) ?? Number.NaN) : (given(path) as number);
    const other = without(on, path, id);
    if (other === undefined || !(Math.abs(other / value - 1) > near)) continue;
    yield contradiction(on, 'two-drives', path, {
      says: `${path} is ${counted ? `${inWords(on, path)}, at the inlet ${inWords(on, id, value)}` : inWords(on, path, value)}, while ${first[0]} of ${inWords(on, first[0])} makes the ${nameOf(on, id)} ${inWords(on, id, other)}`,
      effect: `they differ by ${percent(Math.abs(other / value - 1))}; speed, Reynolds number and heat balance follow one of them, the other is lost or mixed in`,
      cure: `state one of them alone, or mend the section: ${inWords(on, 'flowArea')}${(on.number('parallelPassages') ?? 1) > 1 ? ` in each of ${inWords(on, 'parallelPassages')} passages` : ''}`,
    });
  }
  const drop = given('drive.pressureDrop');
  const own = on.number('pressureDrop');
  if (drop !== undefined && own !== undefined && first[0].startsWith('inlet.') && Math.abs(own / drop - 1) > 0.5 && without(on, 'drive.pressureDrop', 'pressureDrop') === own) {
    yield contradiction(on, 'flow-and-pressure-drop', 'drive.pressureDrop', { says: `a pressure drop of ${inWords(on, 'drive.pressureDrop')} is given beside ${first[0]}, which makes ${inWords(on, 'pressureDrop')}`, effect: 'a run cannot hold both: flow or pressure drop will be another than stated', cure: 'give one and let the other follow, or add what resists besides this passage' });
  }
}

/** A deadline or a memory that not even the run on the medium mesh keeps to. */
function* budget(on: Ground): Generator<Contradiction> {
  for (const { path, estimate } of overBudget(on.assembled.workings, 'medium')) {
    const time = path === 'computing.deadline';
    yield contradiction(on, 'over-budget', path, {
      says: `one run on the medium mesh ${time ? 'is done in' : 'takes'} ${inWords(on, estimate)} by the estimate${time ? `, ${inWords(on, 'coreHours')} core hours` : ''}, and the case gives ${inWords(on, path)}`,
      effect: time ? 'no run of the plan ends in time, and no mesh study with it' : 'the run does not fit into the machine',
      cure: `a cheaper treatment, a smaller region or ${time ? 'more cores' : 'more memory'}; 20 steps of a pilot run tell the cost within 20 %`,
    });
  }
}

function* pressures(on: Ground): Generator<Contradiction> {
  const [inlet, outlet] = [on.assembled.case.number('fluid.pressure'), on.assembled.case.number('outlet.pressure')];
  if (inlet !== undefined && outlet !== undefined && outlet > inlet + Math.max(0, -(on.number('columnWeight') ?? 0)) && on.word('imposedFlow') === 'yes' && ['internal', 'continuum'].includes(on.word('flowClass') ?? '')) {
    yield contradiction(on, 'outlet-above-inlet', 'outlet.pressure', { says: `the outlet stands at ${inWords(on, 'outlet.pressure')}, above the inlet at ${inWords(on, 'fluid.pressure')}`, effect: 'the flow would run backwards, or the density of a gas would belong to the wrong end', cure: 'swap the two, or say gauge where gauge is meant' });
  }
  const lowest = on.number('lowestPressure');
  if (lowest !== undefined && lowest <= 0) {
    yield contradiction(on, 'pressure-used-up', 'fluid.pressure', { says: `from ${inWords(on, 'pressure')} at the inlet the friction takes ${inWords(on, 'pressureDropPlain')}${(on.number('columnWeight') ?? 0) > 0 ? ` and the weight of the column ${inWords(on, 'columnWeight')}` : ''}, which leaves ${inWords(on, 'lowestPressure')} absolute`, effect: 'no fluid can be at or below zero pressure: this flow cannot be driven through', cure: 'raise the pressure, lower the flow, or widen the passage' });
  }
}

/** One wall, one thermal condition; a closed heated space needs a way out for its heat. */
function* walls(on: Ground): Generator<Contradiction> {
  const { case: given, flow } = on.assembled;
  const keys = ['temperature', 'heatFlux', 'heat', 'heatTransferCoefficient', 'adiabatic'];
  for (const wall of ['wall', ...given.list('walls').map((w) => `walls.${w}`)]) {
    const held = keys.filter((key) => given.has(`${wall}.${key}`) && given.get(`${wall}.${key}`)?.value !== false);
    const last = held.at(-1);
    if (held.length > 1 && last !== undefined) yield contradiction(on, 'wall-held-twice', `${wall}.${last}`, { says: `${wall} is given ${held.map((key) => `${key} ${given.get(`${wall}.${key}`)?.written ?? ''}`.trim()).join(' and ')}`, effect: `a wall takes one thermal condition; ${held[0]} counts here and the other is lost`, cure: 'state the one that the plant fixes and let the other be the answer' });
    if (given.has(`${wall}.heatTransferCoefficient`) && given.number('surroundings.temperature') === undefined) yield contradiction(on, 'coefficient-without-surroundings', `${wall}.heatTransferCoefficient`, { says: `${wall} exchanges heat by ${inWords(on, `${wall}.heatTransferCoefficient`)} with surroundings whose temperature is not given`, effect: 'heat loss has no end to run to and stays out of the balance', cure: 'give surroundings: { temperature: ... }' });
  }
  const names = flow.walls.length === 0 ? ['wall'] : flow.walls.map((w) => `walls.${w}`);
  const kinds = names.map((w) => on.word(`wallKind@${w}`));
  const heat = names.filter((w, k) => kinds[k] === 'flux' && (on.number(`wallHeatFlux@${w}`) ?? 0) !== 0);
  if (on.word('flowClass') === 'enclosure' && heat.length > 0 && !kinds.includes('temperature') && !kinds.includes('coefficient') && !names.some((w) => (on.number(`wallHeatFlux@${w}`) ?? 0) * (on.number(`wallHeatFlux@${heat[0] as string}`) ?? 0) < 0)) {
    yield contradiction(on, 'heated-box-without-sink', heat[0] as string, { says: `a closed space is given ${inWords(on, `wallHeatFlux@${heat[0] as string}`)} at ${heat[0] as string} and no wall lets heat out`, effect: 'its temperature climbs without end: no steady state exists', cure: 'hold one wall at a temperature, give a coefficient, or plan a transient run with a duration' });
  }
}

/** Solids of the walls against the temperature of the face they make, or of the colder face. */
function* layers(on: Ground): Generator<Contradiction> {
  for (const [place, solids] of Object.entries(on.assembled.wallMaterials)) {
    const [inner, outer] = [`wallTemperature@${place}`, `outerTemperature@${place}`].map((id) => ({ id, T: on.number(id) })) as [Face, Face];
    const colder = outer.T !== undefined && inner.T !== undefined && outer.T < inner.T ? outer : inner;
    for (const { name, path, outermost, melts, melt } of solids) {
      const faces = [colder, ...(path.includes('layers.0.') ? [inner] : []), ...(outermost ? [outer] : [])];
      const hot = faces.find(({ T }) => T !== undefined && melts !== undefined && T > melts);
      if (hot === undefined || melts === undefined) continue;
      yield contradiction(on, 'layer-above-melting', path, { says: `${name} melts at ${Number(melts.toPrecision(5))} K, and the wall of it stands at ${inWords(on, hot.id)}`, effect: 'the layer is no solid there: its conductivity is carried beyond its record', cure: `take a solid that stands the temperature, or cool the wall${melt === undefined ? '' : `; ${melt} is the record of the melt`}` });
    }
  }
}

interface Face {
  readonly id: string;
  readonly T: number | undefined;
}

/** Walls against the freezing and boiling of the liquid. */
function* temperatures(on: Ground): Generator<Contradiction> {
  const { case: given } = on.assembled;
  const extreme = (pick: 'lowestTemperature' | 'highestTemperature'): string => [...given.entries.values()].filter((e) => /temperature$/i.test(e.path) && e.value === on.number(pick)).map((e) => e.path)[0] ?? 'wall.temperature';
  if (on.word('medium') !== 'liquid') return;
  const freezing = on.number('freezingMargin');
  if (freezing !== undefined && freezing < 0) {
    yield contradiction(on, 'below-freezing', extreme('lowestTemperature'), { says: `${inWords(on, 'lowestTemperature')} stands below the melting point ${inWords(on, 'meltingTemperature')} of a liquid`, effect: 'ice or crust narrows the passage and insulates the wall; single-phase numbers do not hold there', cure: 'warm the wall, name an antifreeze, or plan the freezing as a problem of its own' });
  }
  const [hot, boils] = [on.number('highestTemperature'), on.number('saturationTemperature')];
  if (hot !== undefined && boils !== undefined && hot > boils && on.effect('boiling')?.applies === false) {
    yield contradiction(on, 'above-boiling', extreme('highestTemperature'), { says: `${inWords(on, 'highestTemperature')} stands above the boiling point ${inWords(on, 'saturationTemperature')} of the liquid at ${inWords(on, 'lowestPressure')}`, effect: 'part of it is vapour on arrival; density and friction are those of a mixture', cure: 'raise the pressure or lower the temperature, or name the vapour' });
  }
}

/** Targets that the walls forbid. */
function* targets(on: Ground): Generator<Contradiction> {
  const { targets: list, flow } = on.assembled;
  const names = flow.walls.length === 0 ? ['wall'] : flow.walls.map((w) => `walls.${w}`);
  const closed = names.every((w) => on.word(`wallKind@${w}`) === 'adiabatic');
  const thermal = ['heatRate', 'heatTransferCoefficient', 'nusselt', 'wallHeatFlux'];
  for (const t of list) {
    const [id, place] = t.quantity.split('@') as [string, string?];
    const wall = place?.split('/')[0];
    if (thermal.includes(id) && (wall === undefined ? closed : on.word(`wallKind@${wall}`) === 'adiabatic')) {
      yield contradiction(on, 'heat-of-an-adiabatic-wall', t.id, { says: `the ${nameOf(on, id)} is asked of ${wall ?? 'walls'} that pass no heat`, effect: 'the answer is zero by what the case states, whatever the run', cure: 'give the wall a temperature, a flux or a coefficient' });
    }
    if (id === 'outletTemperature' && on.word('energySolved') === 'yes' && on.number('temperatureDifference') === 0 && on.number('outletTemperature') === on.number('inletTemperature')) {
      yield contradiction(on, 'outlet-equals-inlet', t.id, { says: `the outlet temperature is asked where nothing differs from ${inWords(on, 'inletTemperature')}`, effect: 'the answer equals the inlet', cure: 'give a wall temperature, a flux or a coefficient' });
    }
    if (id === 'pressureDrop' && ['body', 'enclosure'].includes(on.word('flowClass') ?? '')) yield contradiction(on, 'pressure-drop-of-an-open-flow', t.id, { says: `a pressure drop is asked of ${aFlow(on)}`, effect: 'an open or closed space has no drop along a passage', cure: 'ask for a drag or a pressure coefficient' });
  }
}

function* features(on: Ground): Generator<Contradiction> {
  const { case: given, fluid } = on.assembled;
  if (given.has('fluid.humidity') && fluid !== undefined && !fluid.takes.includes('humidity')) yield contradiction(on, 'humidity-not-taken', 'fluid.humidity', { says: `a humidity of ${given.get('fluid.humidity')?.written ?? ''} is given for ${fluid.name}, whose record takes none`, effect: 'it is ignored: density, viscosity and dew point are those of the dry fluid', cure: 'name humid air, or leave the humidity out' });
  if (given.has('fluid.composition') && fluid !== undefined && !fluid.takes.includes('composition') && !fluid.takes.includes('components')) yield contradiction(on, 'composition-not-taken', 'fluid.composition', { says: `a composition is given for ${fluid.name}, whose record is of one substance`, effect: 'it is ignored', cure: 'name a mixture that the program knows, or give its properties' });
  const single = ['fluid.viscosity', 'fluid.kinematicViscosity'].find((path) => given.number(path) !== undefined);
  if (single !== undefined && on.has('apparentViscosity')) yield contradiction(on, 'two-viscosities', single, { says: `${single} is ${inWords(on, single)} beside the law of rheology, which makes ${inWords(on, 'apparentViscosity')} at the shear of the case`, effect: 'the law counts; the single number is not used', cure: 'leave one of them out' });
  const gravity = given.number('gravity');
  if (gravity === 0 && given.number('inclination') !== undefined && given.number('inclination') !== 0) yield contradiction(on, 'inclined-in-free-fall', 'inclination', { says: 'an inclination is given and gravity is zero', effect: 'the inclination has nothing to lean on', cure: 'leave one of them out' });
  const density = given.number('fluid.density');
  const medium = given.word('fluid.medium');
  if (density !== undefined && ((medium === 'gas' && density > 500) || (medium === 'liquid' && density < 50))) yield contradiction(on, 'density-against-medium', 'fluid.density', { says: `a ${medium} with a density of ${inWords(on, 'fluid.density')}`, effect: 'laws of the other state of matter are used', cure: 'mend the unit of the density or the medium' });
}
