import { Problem } from '../problems/index.ts';
import { fromEquation, inside, insideAny, type Material } from './material.ts';
import type { Side } from './models/point.ts';
import { mixtureFlags } from './gas-flags.ts';
import { exampleShare, isRefused, shareFlags } from './composition-range.ts';
import { isEmptyMixture } from './mixture.ts';
import { takenPhase } from './phase.ts';
import type { Band, Box, Entry, Phase, PropertyId } from './record.ts';
import type { Sample } from './sample.ts';
import type { State } from './state.ts';

/** One property at one state. */
export interface PropertyValue {
  /** SI. */
  readonly value: number;
  /** Relative, 95 %. */
  readonly uncertainty: number;
  readonly source: string;
  readonly withinRange: boolean;
  readonly range: Box;
  readonly phase: Phase;
  readonly flags: readonly string[];
  readonly notes?: string;
  /** The properties it is formed from, for a derived one. */
  readonly of?: readonly PropertyId[];
}

/** A state taken in one phase: asked once, it serves all properties. */
export interface TakenState {
  readonly sample: Sample;
  readonly phase: Phase;
  readonly solid: boolean;
  readonly flags: readonly string[];
}

/** Properties that may be zero, as at the critical point, or negative. */
const eitherSign: readonly string[] = ['thermalExpansion', 'enthalpy', 'electricalConductivity', 'emissivity', 'surfaceTension', 'latentHeat'];
/** Properties of saturation and of the substance: they hold at any phase, and end where their line ends. */
const ofSubstance: readonly string[] = ['vapourPressure', 'vapourPressureCeiling', 'saturationTemperature', 'boilingFloor', 'freezingCeiling', 'latentHeat', 'surfaceTension', 'meltingTemperature', 'glassTransitionTemperature', 'fusionHeat', 'emissivity'];

/**
 * Takes a state of a material: checks it, settles its phase.
 *
 * @param material  the material
 * @param state     temperature, pressure, humidity or composition, phase asked for
 * @returns         the state ready for `propertyIn`
 * @throws          {Problem} impossible-state, no-such-phase, between-phases, not-covered, condenses, missing-composition, wrong-composition, beyond-saturation, beyond-composition
 */
export function takeState(material: Material, state: State): TakenState {
  const x = shareOf(material, state);
  const beyond = material.takes.includes('composition') ? shareFlags(material, x, state.temperature) : [];
  const taken = takenPhase(material, state);
  const sample: Sample = { T: state.temperature, p: state.pressure, side: taken.side === 'solid' ? 'liquid' : taken.side, x };
  return { sample, phase: taken.phase, solid: taken.side === 'solid', flags: [...taken.flags, ...beyond, ...mixtureFlags(material, sample)] };
}

function shareOf(material: Material, state: State): number {
  if (isEmptyMixture(material)) throw new Problem({ code: 'missing-composition', message: `${material.name} needs its components`, expected: 'their shares, for example nitrogen 79 % mol, oxygen 21 % mol' });
  const needs = material.takes.find((what) => what !== 'components');
  if (needs === undefined) return 0;
  const given = needs === 'humidity' ? state.humidity : state.composition;
  if (given === undefined) throw new Problem({ code: `missing-${needs}`, message: `${material.name} needs its ${needs}`, expected: needs === 'humidity' ? 'humidity 60 %' : `composition ${Number((exampleShare(material.record) * 100).toPrecision(4))} % mass${material.about === undefined ? '' : ` (${material.about})`}` });
  if (!(given >= 0 && given <= 1)) throw new Problem({ code: `wrong-${needs}`, message: `${needs} is ${Number((given * 100).toPrecision(4))} %`, expected: 'a share from 0 % to 100 %' });
  return given;
}

/** The state last asked for, by material: properties are asked for one after the other. */
const taken = new WeakMap<Material, State & { readonly taken: TakenState }>();

/**
 * A property of a material at a state.
 *
 * @param material  the material
 * @param property  its id
 * @param state     temperature [K], pressure [Pa], humidity or composition, phase
 * @returns         value in SI, relative uncertainty (95 %, doubled outside the range), source, range, phase, flags; undefined where the material does not have it there
 * @throws          {Problem} see takeState; not-a-number where the correlation fails
 */
export function propertyAt(material: Material, property: PropertyId, state: State): PropertyValue | undefined {
  const { temperature, pressure, humidity, composition, phase } = state;
  const last = taken.get(material);
  if (last !== undefined && last.temperature === temperature && last.pressure === pressure && last.humidity === humidity && last.composition === composition && last.phase === phase) return propertyIn(material, property, last.taken);
  const now = takeState(material, state);
  taken.set(material, { ...state, taken: now });
  return propertyIn(material, property, now);
}

/**
 * Emissivities of a solid, one for each surface that its record knows.
 *
 * @param material  the solid
 * @param T         temperature [K]
 * @returns         values with their surface in `notes`; empty where the record has none
 */
export function emissivities(material: Material, T: number): PropertyValue[] {
  const taken: TakenState = { sample: { T, p: 101325, side: 'liquid', x: 0 }, phase: 'solid', solid: true, flags: [] };
  return (material.record.properties['emissivity'] ?? []).map((entry) => finished(material, 'emissivity', material.engine.evaluate(entry, taken.sample), entry, taken, entry.uncertainty));
}

/** As `propertyAt`, for a state already taken. */
export function propertyIn(material: Material, property: PropertyId, taken: TakenState): PropertyValue | undefined {
  const { sample, phase, solid } = taken;
  const { record, engine } = material;
  if (property === 'molarMass' && material.molarMass !== undefined) return plain(material.molarMass, phase, 'atomic weights, IUPAC');
  if (property === 'kinematicViscosity') return combine(material, taken, [['viscosity', 1], ['density', -1]]);
  if (property === 'thermalDiffusivity') return combine(material, taken, [['thermalConductivity', 1], ['density', -1], ['specificHeatCapacity', -1]]);
  if (property === 'prandtl') return combine(material, taken, [['viscosity', 1], ['specificHeatCapacity', 1], ['thermalConductivity', -1]]);
  if (isRefused(record, property, sample.x)) return undefined;
  const gaseous = sample.side === 'vapour' && !solid;
  if ((property === 'compressibilityFactor' || property === 'isentropicExponent') && !gaseous) return undefined;
  const equation = record.thermodynamics;
  if (equation !== undefined && property in fromEquation) {
    const value = fromEquation[property as keyof typeof fromEquation](engine.point(sample), engine.equation.gasConstant);
    const bands = equation.uncertainty[property] ?? equation.uncertainty['density'] ?? [];
    return finished(material, property, value, equation, taken, bands);
  }
  const entry = engine.entry(property, sample, solid ? 'solid' : undefined);
  if (entry !== undefined) {
    if (ofSubstance.includes(property) && property !== 'emissivity' && !insideAny(entry.ranges, sample)) return undefined;
    const value = engine.evaluate(entry, sample);
    // Carried far beyond its range a law may cross zero: then there is no value.
    if (value <= 0 && !eitherSign.includes(property)) return undefined;
    const frost = entry.model === 'dew-point' && value < 273.16;
    return finished(material, property, value, frost ? { ...entry, notes: 'a frost point: below 0 degC the water becomes ice' } : entry, taken, entry.uncertainty);
  }
  if (property === 'thermalExpansion') return expansionFromDensity(material, taken);
  return undefined;
}

/**
 * As `propertyIn`, for many properties at once: one that cannot be had is left out, and the others stay.
 *
 * @param material  the material
 * @param property  its id
 * @param taken     the state, taken
 * @param left      is told the reason where the property has to be left out
 * @returns         the value, or undefined
 */
export function propertyIfHad(material: Material, property: PropertyId, taken: TakenState, left: (reason: string) => void): PropertyValue | undefined {
  try {
    return propertyIn(material, property, taken);
  } catch (error) {
    const [problem] = error instanceof Problem ? error.list : [];
    if (problem?.code !== 'not-a-number') throw error;
    left(problem.message);
    return undefined;
  }
}

const noteOf = (entry: Omit<Entry, 'uncertainty'>): string | undefined => (entry.surface === undefined ? entry.notes : `surface: ${entry.surface}`);

const plain = (value: number, phase: Phase, source: string): PropertyValue => ({ value, uncertainty: 1e-5, source, withinRange: true, range: {}, phase, flags: [] });

function finished(material: Material, property: string, value: number, entry: Omit<Entry, 'uncertainty'>, taken: TakenState, bands: readonly Band[]): PropertyValue {
  if (!Number.isFinite(value)) throw new Problem({ code: 'not-a-number', message: `${entry.model === 'dew-point' ? `${material.name} has no dew point` : `${property} of ${material.name} cannot be computed`} at ${Number(taken.sample.T.toPrecision(6))} K and ${Number(taken.sample.p.toPrecision(6))} Pa${entry.model === 'dew-point' ? ': it holds no water, or next to none' : ''}`, expected: `a state within ${entry.ranges.map(boxText).join(' or ')}` });
  const box = entry.ranges.find((one) => inside(one, taken.sample));
  const within = box !== undefined || entry.ranges.length === 0;
  const shown = box ?? entry.ranges[0] ?? {};
  const uncertainty = bandOf(bands, taken.sample, value, () => material.engine.point(taken.sample).departure ?? 0) * (within ? 1 : 2);
  return {
    value,
    uncertainty,
    source: entry.source,
    withinRange: within,
    range: shown,
    phase: taken.phase,
    flags: within ? taken.flags : [...taken.flags, `${property} of ${material.name} is carried beyond its range ${entry.ranges.map(boxText).join(' or ')}`],
    ...(noteOf(entry) === undefined ? {} : { notes: noteOf(entry) as string }),
  };
}

/** A range as text: `273.15 K to 623.15 K, up to 1000 bar`. */
export function boxText(box: Box): string {
  const n = (x: number): string => String(Number(x.toPrecision(6)));
  const parts = [
    ...(box.temperature === undefined ? [] : [`${n(box.temperature[0])} K to ${n(box.temperature[1])} K`]),
    ...(box.pressure === undefined ? [] : [box.pressure[0] === 0 ? `up to ${n(box.pressure[1] / 1e5)} bar` : `${n(box.pressure[0] / 1e5)} bar to ${n(box.pressure[1] / 1e5)} bar`]),
    ...(box.composition === undefined ? [] : [`${n(box.composition[0] * 100)} % to ${n(box.composition[1] * 100)} %`]),
  ];
  return parts.length === 0 ? 'any state' : parts.join(', ');
}

function bandOf(bands: readonly Band[], sample: Sample, value: number, departure: () => number): number {
  const band = bands.find((one) => (one.phase === undefined || one.phase === sample.side) && inside(one, sample) && (one.departure === undefined || departure() <= one.departure)) ?? bands.at(-1);
  if (band === undefined) return Number.NaN;
  return Math.max(band.value, band.absolute === undefined || value === 0 ? 0 : Math.abs(band.absolute / value));
}

/** Products of powers of other properties: uncertainties add by squares. */
function combine(material: Material, taken: TakenState, factors: readonly (readonly [PropertyId, 1 | -1])[]): PropertyValue | undefined {
  let value = 1;
  let square = 0;
  const sources = new Set<string>();
  const flags = new Set<string>();
  let range: Box = {};
  let within = true;
  for (const [id, power] of factors) {
    const one = propertyIn(material, id, taken);
    if (one === undefined) return undefined;
    value *= power === 1 ? one.value : 1 / one.value;
    square += one.uncertainty ** 2;
    sources.add(one.source);
    for (const flag of one.flags) flags.add(flag);
    range = narrower(range, one.range);
    within &&= one.withinRange;
  }
  return { value, uncertainty: Math.sqrt(square), source: [...sources].join('; '), withinRange: within, range, phase: taken.phase, flags: [...flags], of: factors.map(([id]) => id) };
}

function narrower(a: Box, b: Box): Box {
  const both = (x?: readonly [number, number], y?: readonly [number, number]): readonly [number, number] | undefined => (x === undefined ? y : y === undefined ? x : [Math.max(x[0], y[0]), Math.min(x[1], y[1])]);
  const temperature = both(a.temperature, b.temperature);
  const pressure = both(a.pressure, b.pressure);
  const composition = both(a.composition, b.composition);
  return { ...(temperature && { temperature }), ...(pressure && { pressure }), ...(composition && { composition }) };
}

/** Expansion where the record gives the density only: the slope of its correlation. */
function expansionFromDensity(material: Material, taken: TakenState): PropertyValue | undefined {
  const entry = material.engine.entry('density', taken.sample, taken.solid ? 'solid' : undefined);
  if (entry === undefined || entry.model === 'constant') return undefined;
  const step = 0.5;
  const at = (T: number): number => material.engine.evaluate(entry, { ...taken.sample, T });
  const value = -(at(taken.sample.T + step) - at(taken.sample.T - step)) / (2 * step * at(taken.sample.T));
  // The slope of a law of solutions is known the less the stronger they are: for lyes of 20 % it misses by half.
  const share = entry.model === 'aqueous-density' ? (taken.sample.x || 0) : 0;
  return finished(material, 'thermalExpansion', value, { ...entry, source: `slope of the density: ${entry.source}` }, taken, [{ value: 0.1 + 2 * share }]);
}

export type { Side };
