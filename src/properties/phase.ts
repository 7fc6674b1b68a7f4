import { Problem } from '../problems/index.ts';
import type { Material } from './material.ts';
import type { SaturationLine, Side } from './models/point.ts';
import { boilingTemperature } from './registry.ts';
import type { Phase } from './record.ts';
import type { State } from './state.ts';

/** Saturation of one material: pressures [Pa] by temperature [K], and back. */
export interface Saturation {
  readonly from: number;
  readonly to: number;
  bubble(T: number): number;
  dew(T: number): number;
  boiling(p: number, side?: Side): number;
}

/**
 * The saturation line of a material, from its equation of state or its vapour-pressure correlation.
 *
 * @param material  the material
 * @param x         composition or humidity
 * @returns         the line, or undefined where the record has none
 */
export function saturationOf(material: Material, x = 0): Saturation | undefined {
  const line = material.record.thermodynamics === undefined ? undefined : material.engine.equation.line;
  if (line !== undefined) {
    let ready = lines.get(line);
    if (ready === undefined) {
      const ends = { low: line.bubble(line.from), high: line.bubble(line.to) };
      const boiling = (p: number, side: Side = 'liquid'): number => {
        if (p < ends.low * (1 - 1e-9) || p > ends.high * (1 + 1e-9)) return Number.NaN;
        return line.boiling?.(p) ?? boilingTemperature(side === 'liquid' ? (T) => line.bubble(T) : (T) => line.dew(T), p, line.from, line.to);
      };
      ready = { from: line.from, to: line.to, bubble: (T) => line.bubble(T), dew: (T) => line.dew(T), boiling };
      lines.set(line, ready);
    }
    return ready;
  }
  const entry = material.record.properties['vapourPressure']?.[0];
  const range = entry?.ranges[0]?.temperature;
  if (entry === undefined || range === undefined) return undefined;
  const pressure = (T: number): number => material.engine.evaluate(entry, { T, p: Number.NaN, side: 'liquid', x });
  const boiling = (p: number): number => (p < pressure(range[0]) * (1 - 1e-9) || p > pressure(range[1]) * (1 + 1e-9) ? Number.NaN : boilingTemperature(pressure, p, range[0], range[1]));
  return { from: range[0], to: range[1], bubble: pressure, dew: pressure, boiling };
}

const lines = new WeakMap<SaturationLine, Saturation>();

/** What is known about the phase at a state. */
export interface PhaseAt {
  readonly phase: Phase;
  /** Saturation at this temperature [Pa] and this pressure [K], where they exist. */
  readonly saturation?: { readonly pressure: number | undefined; readonly temperature: number | undefined };
  readonly flags: readonly string[];
}

/** Saturation at a state, computed when it is read: most states never ask. */
class SaturationAt {
  readonly #line: Saturation;
  readonly #T: number;
  readonly #p: number;

  constructor(line: Saturation, T: number, p: number) {
    this.#line = line;
    this.#T = T;
    this.#p = p;
  }

  get pressure(): number | undefined {
    return this.#T >= this.#line.from && this.#T <= this.#line.to ? this.#line.bubble(this.#T) : undefined;
  }

  get temperature(): number | undefined {
    const boiling = this.#line.boiling(this.#p);
    return Number.isFinite(boiling) ? boiling : undefined;
  }
}

const K = (T: number): string => `${Number(T.toPrecision(5))} K (${Number((T - 273.15).toFixed(2))} degC)`;

/**
 * The stable phase of a material at temperature and pressure.
 *
 * @param material  the material
 * @param T         temperature [K], > 0
 * @param p         pressure [Pa], > 0
 * @param x         composition or humidity
 * @returns         phase, saturation, flags (near the critical point, close to saturation, above the melting point within what it is known to: farther above a solid is a liquid)
 * @throws          {Problem} impossible-state
 */
export function phaseAt(material: Material, T: number, p: number, x = 0): PhaseAt {
  if (!(T > 0 && Number.isFinite(T))) throw new Problem({ code: 'impossible-state', message: `a temperature of ${T} K does not exist`, expected: 'a temperature above 0 K' });
  if (!(p > 0 && Number.isFinite(p))) throw new Problem({ code: 'impossible-state', message: `an absolute pressure of ${p} Pa does not exist`, expected: 'an absolute pressure above 0 Pa' });
  const flags: string[] = [];
  if (material.kind === 'solid') {
    const { meltingTemperature: melting, glassTransitionTemperature: softening } = material;
    if (melting !== undefined && T > melting) {
      flags.push(`above the melting temperature of ${K(melting)}`);
      const known = material.record.properties['meltingTemperature']?.[0]?.uncertainty[0]?.value ?? 0;
      if (T > melting * (1 + known)) return { phase: 'liquid', flags };
    }
    if (softening !== undefined && T > softening) flags.push(`above the glass transition temperature of ${K(softening)}, where it softens`);
    return { phase: 'solid', flags };
  }
  const frozen = meltingAt(material, T, p, x);
  if (frozen !== undefined && T < frozen * (1 - 1e-6)) return { phase: 'solid', flags: [`below the melting temperature of ${K(frozen)}`] };
  const critical = material.critical;
  if (critical !== undefined && T > 0.97 * critical.temperature && T < 1.08 * critical.temperature && p > 0.75 * critical.pressure && p < 1.5 * critical.pressure) {
    flags.push(`near the critical point (${K(critical.temperature)}, ${Number((critical.pressure / 1e5).toPrecision(4))} bar): properties change steeply`);
  }
  const line = saturationOf(material, x);
  if (line === undefined) {
    const only: Phase = material.phases.includes('liquid') ? 'liquid' : 'gas';
    return { phase: only, flags };
  }
  const saturation = new SaturationAt(line, T, p);
  if (T >= line.to) return { phase: critical !== undefined && p >= critical.pressure ? 'supercritical' : 'gas', saturation, flags };
  const edge = Math.max(T, line.from);
  const phase: Phase = p > line.bubble(edge) * (1 + 1e-7) ? 'liquid' : p < line.dew(edge) * (1 - 1e-7) ? 'vapour' : 'two-phase';
  return { phase, saturation, flags };
}

function meltingAt(material: Material, T: number, p: number, x: number): number | undefined {
  const entry = material.record.properties['meltingTemperature']?.[0];
  if (entry === undefined) return undefined;
  const range = entry.ranges[0]?.pressure;
  const melting = (at: number): number => material.engine.evaluate(entry, { T: Number.NaN, p: range === undefined ? at : Math.min(range[1], Math.max(range[0], at)), side: 'liquid', x });
  let highest = highestMelting.get(material);
  if (highest === undefined) {
    // A melting line is monotone: its highest temperature stands at one of its ends. What is dissolved lowers it.
    highest = 1.002 * Math.max(material.meltingTemperature ?? 0, ...(material.takes.length > 0 ? [] : (range ?? []).map(melting)));
    highestMelting.set(material, highest);
  }
  return T > highest ? undefined : melting(p);
}

/** Above this temperature [K] nothing of a material is solid in its range, so that its line need not be asked. */
const highestMelting = new WeakMap<Material, number>();

const side = (phase: Phase): Side | 'solid' => (phase === 'solid' ? 'solid' : phase === 'liquid' ? 'liquid' : 'vapour');

/**
 * The phase a state is taken in: the one asked for if it can exist there, else the stable one.
 *
 * @param material  the material
 * @param state     temperature, pressure, phase asked for
 * @returns         phase, its side for the correlations, flags
 * @throws          {Problem} no-such-phase where the phase asked for is not there, between-phases on the saturation line without a phase, not-covered where the record has no such phase
 */
export function takenPhase(material: Material, state: State): PhaseAt & { readonly side: Side | 'solid' } {
  const x = state.composition ?? state.humidity ?? 0;
  const found = phaseAt(material, state.temperature, state.pressure, x);
  const asked = state.phase === undefined || state.phase === 'two-phase' ? material.asked : side(state.phase);
  const where = (): string => `at ${K(state.temperature)} and ${Number((state.pressure / 1e5).toPrecision(5))} bar`;
  if (found.phase === 'two-phase') {
    if (asked === undefined || asked === 'solid') throw new Problem({ code: 'between-phases', message: `${material.name} is on its saturation line ${where()}`, expected: 'the phase as well: saturated liquid or saturated vapour' });
    return { ...found, phase: asked, side: asked };
  }
  const stable = side(found.phase);
  const either = found.phase === 'supercritical' || (found.phase === 'liquid' && material.critical !== undefined && state.pressure >= material.critical.pressure);
  const across = material.record.acrossMelting;
  const elsewhere = across === undefined || (stable === 'solid') === (material.kind === 'solid') ? {} : { nearest: across };
  const uncovered = (): Problem => new Problem({ code: 'not-covered', message: `${material.name} is ${words[found.phase]} ${where()}, and its record covers ${material.phases.join(' and ')} only`, expected: (stable === 'solid' || material.kind === 'solid') && found.flags[0] !== undefined ? `a temperature that is not ${found.flags[0]}` : 'another state, or the properties themselves', ...elsewhere });
  if (material.kind === 'solid' && stable !== 'solid') throw uncovered();
  if (asked !== undefined && asked !== stable && !either) {
    const boils = found.saturation?.temperature;
    throw new Problem({ code: 'no-such-phase', message: `${material.name} is ${words[found.phase]} ${where()}, not ${asked === 'vapour' ? 'a vapour' : `a ${asked}`}`, expected: boils === undefined ? `a state where it is ${asked}` : `a temperature ${asked === 'vapour' ? 'above' : 'below'} ${K(boils)} at this pressure` });
  }
  if (!material.phases.includes(stable) && !(stable === 'vapour' && found.phase === 'supercritical')) throw uncovered();
  return { ...found, side: stable };
}

const words: Record<Phase, string> = { liquid: 'a liquid', gas: 'a gas', vapour: 'a vapour', supercritical: 'supercritical', solid: 'solid', 'two-phase': 'between phases' };
