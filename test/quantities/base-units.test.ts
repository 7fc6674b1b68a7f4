import { describe, expect, it } from 'vitest';
import { flows } from '../../src/flows/index.ts';
import { dimensionOf } from '../../src/units/index.ts';
import type { Definition, Law, Laws, Way } from '../../src/workings/index.ts';
import { definitionsOf } from '../flows/harness.ts';

// Physics does not know our units: metres for feet, seconds for hours, and every formula must give the same thing. One test for all formulas.

/** Numbers that repeat from run to run (mulberry32). */
function numbers(seed: number): () => number {
  let a = seed;
  return () => {
    a = (a + 0x6d2b79f5) | 0;
    let t = Math.imul(a ^ (a >>> 15), 1 | a);
    t = (t + Math.imul(t ^ (t >>> 7), 61 | t)) ^ t;
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296;
  };
}

interface Formula {
  readonly id: string;
  readonly unit: string;
  readonly way: Way;
  readonly units: readonly string[];
}

/** Every way once, with the unit of its result and of its needs. */
function formulas(): Formula[] {
  const seen = new Set<Way>();
  return Object.values(flows).flatMap((flow) => {
    const definitions: Definition[] = definitionsOf(flow);
    const unitOf = new Map(definitions.flatMap((d) => ('more' in d ? [] : [[d.id, d.unit] as const])));
    return definitions.flatMap((d) => {
      const id = d.id.split('@')[0] as string;
      return ('more' in d ? d.more : d.ways).filter((way) => !seen.has(way) && seen.add(way)).map((way) => ({ id: d.id, unit: unitOf.get(id) as string, way, units: way.needs.map((n) => unitOf.get(n.split('@')[0] as string) as string) }));
    });
  });
}

type Scales = readonly number[];
const scaleOf = (unit: string, by: Scales): number => (unit === 'word' ? 1 : dimensionOf(unit, 1).reduce((p, exponent, k) => p * (by[k] as number) ** exponent, 1));

/** A number inside the range of the way; temperatures stay apart from one another, lengths and the rest lie about 1. */
function draw(way: Way, need: string, unit: string, random: () => number): number {
  const range = way.range?.[need];
  if (range !== undefined) return Math.exp(Math.log(Math.max(range[0], 1e-12)) + random() * Math.log(range[1] / Math.max(range[0], 1e-12)));
  if (unit === 'K') return 250 + 200 * random();
  return Math.exp(2 * random() - 1);
}

const propertyUnits: Readonly<Record<string, string>> = { density: 'kg/m^3', viscosity: 'Pa s', thermalConductivity: 'W/(m K)', specificHeatCapacity: 'J/(kg K)', thermalExpansion: '1/K', vapourPressure: 'Pa', surfaceTension: 'N/m' };

/** A property law in the changed units: unknown to the way, it takes and gives what the way's units are. */
function lawsIn(by: Scales, names: readonly string[]): Laws {
  const one = (name: string): Law => Object.assign((t: number, p: number) => scaleOf(propertyUnits[name] ?? '1', by) * 1.7 * (t / scaleOf('K', by) / 300) ** -0.8 * (p / scaleOf('Pa', by)) ** 0.05, { uncertainty: () => 0.02 });
  return Object.fromEntries(names.map((n) => [n, one(n)]));
}

/** Largest relative departure from the scaling of the unit over some draws, and how many draws gave a number. */
function departure(f: Formula, seed: number): { worst: number; counted: number; words: boolean } {
  const random = numbers(seed);
  let [worst, counted, words] = [0, 0, false];
  for (let k = 0; k < 60 && counted < 12; k++) {
    const by = Array.from({ length: 7 }, () => 10 ** (2 * random() - 1));
    const si = Object.fromEntries(f.way.needs.map((n, i) => [n, draw(f.way, n, f.units[i] as string, random)]));
    const changed = Object.fromEntries(f.way.needs.map((n, i) => [n, (si[n] as number) * scaleOf(f.units[i] as string, by)]));
    if (f.way.word !== undefined) {
      counted++;
      words ||= f.way.word(si) !== f.way.word(changed);
      continue;
    }
    const laws = f.way.laws ?? [];
    const value = f.way.value?.(si, lawsIn([1, 1, 1, 1, 1, 1, 1], laws)) ?? Number.NaN;
    if (!Number.isFinite(value)) continue;
    counted++;
    const again = (f.way.value?.(changed, lawsIn(by, laws)) ?? Number.NaN) / scaleOf(f.unit, by);
    const size = Math.max(Math.abs(value), Math.abs(again));
    worst = Math.max(worst, size === 0 ? 0 : Math.abs(again - value) / size || (Number.isFinite(again) ? 0 : Number.POSITIVE_INFINITY));
    if (typeof f.way.scatter === 'function') worst = Math.max(worst, Math.abs(f.way.scatter(si) - f.way.scatter(changed)));
  }
  return { worst, counted, words };
}

const all = formulas();
const named = (f: Formula): string => `${f.id}: ${f.way.formula}`;
const rigid = all.filter((f) => f.way.dimensional === undefined);
const exempt = all.filter((f) => f.way.dimensional !== undefined);

describe('a change of base units', () => {
  it('meets every quantity and every need with a unit it can read', () => {
    const bad = all.flatMap((f) => [f.unit, ...f.units].filter((u) => u === undefined || (u !== 'word' && !readable(u))).map((u) => `${named(f)}: ${u}`));
    expect(bad).toEqual([]);
    expect(all.length).toBeGreaterThan(200);
  });

  it('leaves no formula different', () => {
    // Rounding alone: sums of terms of unlike size lose up to eight digits here, a wrong exponent at least a per cent.
    const bad = rigid.flatMap((f) => { const { worst, words } = departure(f, 7); return worst > 1e-7 || words ? [`${named(f)} (${worst.toExponential(1)})`] : []; });
    expect(bad).toEqual([]);
  });

  it('is put to every formula with numbers that it can answer', () => {
    expect(rigid.filter((f) => departure(f, 7).counted === 0).map(named)).toEqual([]);
  });

  it('exempts only formulas that say why, and that do hold a constant with a unit', () => {
    const idle = exempt.filter((f) => f.way.word === undefined && departure(f, 11).worst < 1e-7);
    expect(idle.map(named)).toEqual([]);
    expect(exempt.every((f) => (f.way.dimensional as string).length > 8)).toBe(true);
  });

  it('would find a wrong exponent', () => {
    const wrong: Formula = { id: 'x', unit: '1', units: ['kg/m^3', 'm/s', 'm', 'Pa s'], way: { needs: ['a', 'b', 'c', 'd'], value: (of) => ((of['a'] as number) * (of['b'] as number) ** 2 * (of['c'] as number)) / (of['d'] as number), formula: 'rho U^2 L/mu', source: 'none' } };
    expect(departure(wrong, 3).worst).toBeGreaterThan(0.01);
  });
});

function readable(unit: string): boolean {
  try {
    dimensionOf(unit, 1);
    return true;
  } catch {
    return false;
  }
}
