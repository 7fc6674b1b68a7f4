import { describe, expect, it } from 'vitest';
import { flows, type Flow } from '../../src/flows/index.ts';
import { references } from '../../src/references/index.ts';
import { flagsIn, stepOf, type Workings } from '../../src/workings/index.ts';
import { definitionsOf, workingsOf } from './harness.ts';

const flow = (id: string): Flow => { const f = flows[id]; if (f === undefined) throw new Error(id); return f; };
const own = (id: string): string => id.replace(/-(\w)/g, (_, c: string) => c.toUpperCase());
const water = { density: 998.2, viscosity: 1.0016e-3, thermalConductivity: 0.598, specificHeatCapacity: 4184.8, thermalExpansion: 2.07e-4 };
const isothermal = { ...water, inletTemperature: 293.15, pressure: 1e5, energySolved: 'no' };
const base = { ...isothermal, wallKind: 'temperature' };
const pipe = (reynolds: number, more: Record<string, number | string> = {}): Workings => workingsOf(flow('pipe'), { ...base, 'sizes.diameter': 0.025, 'sizes.length': 5, 'inlet.speed': (reynolds * 1.0016e-3) / (998.2 * 0.025), ...more });
const channel = (gapReynolds: number, more: Record<string, number | string> = {}): Workings => workingsOf(flow('channel'), { ...isothermal, 'sizes.gap': 0.01, 'sizes.length': 1, 'sizes.width': 0.2, 'inlet.speed': (gapReynolds * 1.0016e-3) / (998.2 * 0.01), 'wallKind@walls.bottom': 'temperature', 'wallKind@walls.top': 'temperature', ...more });
const duct = (width: number, height: number, reynolds: number): Workings => workingsOf(flow('duct'), { ...base, 'sizes.width': width, 'sizes.height': height, 'sizes.length': 2, 'inlet.speed': (reynolds * 1.0016e-3 * (width + height)) / (998.2 * 2 * width * height) });

describe('water in a smooth pipe at Re 24915', () => {
  // Worked by hand with the constants of the sources: Colebrook for friction, Gnielinski with Petukhov's friction for heat.
  const w = pipe(1, { 'inlet.speed': 1 });
  it.each([['reynolds', 24915], ['prandtl', 7.0092], ['frictionPlain', 0.024541], ['wallShearPlain', 3.0621], ['frictionVelocityPlain', 0.055386], ['frictionReynolds', 690.0], ['nusseltPlain', 179.98], ['heatTransferCoefficientPlain', 4305.2], ['entranceLength', 0.427]] as const)('%s = %f', (id, value) => {
    expect(Math.abs((w.get(id) as number) / value - 1)).toBeLessThan(1e-3);
  });
});

describe('regimes', () => {
  it.each([[2299, 'laminar'], [2301, 'transitional'], [3999, 'transitional'], [4001, 'turbulent']] as const)('pipe at %f is %s', (re, word) => expect(pipe(re).word('regime')).toBe(word));
  it.each([[1299, 'laminar'], [1301, 'transitional'], [3001, 'turbulent']] as const)('channel at %f on its gap is %s', (re, word) => expect(channel(re).word('regime')).toBe(word));
  it('limits of a duct go from the square to the channel on twice its gap', () => {
    expect([duct(0.1, 0.1, 100).get('regimeLow'), duct(0.1, 0.1, 100).get('regimeHigh')]).toEqual([2000, 4000]);
    expect(duct(1, 1e-6, 100).get('regimeLow')).toBeCloseTo(2 * (channel(100).get('regimeLow') as number), 2);
    expect(duct(1, 1e-6, 100).get('regimeHigh')).toBeCloseTo(2 * (channel(100).get('regimeHigh') as number), 1);
  });
  it('a channel is linearly unstable from 5772 on the speed in the middle and half the gap', () => {
    const w = channel(5772.22 / 0.75);
    expect((w.get('unsteadyGroup') as number) / (w.get('unsteadyFrom') as number)).toBeCloseTo(1, 10);
  });
  it.each(['frictionPlain', 'nusseltPlain'])('%s of a pipe has no step at either end of the transition', (id) => {
    for (const re of [2300, 4000]) expect((pipe(re * (1 + 1e-9)).get(id) as number) / (pipe(re * (1 - 1e-9)).get(id) as number)).toBeCloseTo(1, 6);
  });
  // Gnielinski 2013: both ends of the transition with their own entrance, so that neither end has a step. Gz = Re Pr D/L = 403 at Re 2300.
  it.each([['temperature', 'nusselt'], ['flux', 'nusselt'], ['temperature', 'nusseltOutlet'], ['flux', 'nusseltOutlet']])('a short pipe with a given %s has no step of its %s', (wallKind, id) => {
    const short = (re: number): number => pipe(re, { 'sizes.length': 1, wallKind, energySolved: 'yes', wallTemperature: 293.15, bulkTemperature: 293.15 }).get(id) as number;
    for (const re of [2300, 4000]) expect(short(re * (1 + 1e-9)) / short(re * (1 - 1e-9))).toBeCloseTo(1, 4);
    expect(short(2300 * (1 + 1e-9))).toBeGreaterThan(7);
  });
  it('between the regimes laminar and turbulent bracket the value, and its scatter says so', () => {
    const w = pipe(3000);
    const [f, low, high] = ['frictionPlain', 'frictionLaminar', 'frictionTurbulent'].map((id) => w.get(id) as number) as [number, number, number];
    expect(f).toBeGreaterThan(low);
    expect(f).toBeLessThan(high);
  });
});

describe('laws', () => {
  it('heat of liquid metals has its own law, by wall', () => {
    const at = (wallKind: string): number => pipe(1e5, { wallKind, thermalConductivity: 4184.8 * 1.0016e-3 / 0.01 }).get('nusseltPlain') as number;
    expect(at('flux')).toBeCloseTo(6.3 + 0.0167 * 1e5 ** 0.85 * 0.01 ** 0.93, 3);
    expect(at('temperature')).toBeCloseTo(4.8 + 0.0156 * 1e5 ** 0.85 * 0.01 ** 0.93, 3);
  });
  it('between liquid metals and gases no law holds, and the number says so', () => expect(flagsIn(pipe(1e5, { prandtlBulk: 0.2 }))('nusseltPlain')).not.toEqual([]));
  it('one heated wall of a channel halves the story', () => {
    expect(channel(100).get('nusseltPlain')).toBeCloseTo(7.5407, 4);
    expect(channel(100, { 'wallKind@walls.top': 'adiabatic' }).get('nusseltPlain')).toBeCloseTo(4.8608, 4);
    expect(channel(100, { 'wallKind@walls.bottom': 'flux', 'wallKind@walls.top': 'flux' }).get('nusseltPlain')).toBeCloseTo(140 / 17, 10);
    expect(channel(100, { 'wallKind@walls.bottom': 'flux', 'wallKind@walls.top': 'adiabatic' }).get('nusseltPlain')).toBeCloseTo(70 / 13, 10);
  });
  it('Dean holds in his range and stays near the simulations', () => {
    // Direct simulations: bulk Reynolds number on the gap and 2/U_b+^2 (Lee and Moser, J. Fluid Mech. 774 (2015) 395), c_f = f/4 within 5.5 %.
    for (const [re, ub] of [[2e4, 18.4], [4e4, 19.99], [8.7e4, 21.8], [2.5e5, 24.1]] as const) expect(Math.abs((channel(re).get('frictionPlain') as number) / 4 / (2 / ub ** 2) - 1)).toBeLessThan(0.055);
  });
  it('a flat duct is a channel', () => {
    const [d, c] = [duct(10, 0.001, 200), channel(100)];
    expect((d.get('frictionPlain') as number) / (c.get('frictionPlain') as number)).toBeCloseTo(1, 3);
    expect((d.get('nusseltPlain') as number) / (c.get('nusseltPlain') as number)).toBeCloseTo(1, 3);
  });
  it('streams of a channel without end are per metre of width', () => {
    const w = workingsOf(flow('channel'), { ...base, infiniteDepth: 'yes', 'sizes.gap': 0.01, 'sizes.length': 1, 'inlet.speed': 0.3 });
    expect(w.get('volumeFlow')).toBeCloseTo(0.003, 12);
  });
  it('small passages are named as such from 10 um to 1 mm', () => {
    expect([9e-6, 1.1e-5, 9e-4, 1.1e-3].map((d) => pipe(100, { 'sizes.diameter': d }).word('passageScale'))).toEqual(['tiny', 'small', 'small', 'ordinary']);
  });
  it('a bed takes the wall into its drag below 20 particles across', () => {
    const bed = (bedDiameter: number): Workings => workingsOf(flow('packed-bed'), { ...base, 'sizes.particleDiameter': 0.004, 'sizes.bedDiameter': bedDiameter, 'sizes.length': 1, 'inlet.speed': 0.01 });
    expect(stepOf(bed(0.1), 'packedBedGradient')?.source).toContain('Ergun');
    expect(stepOf(bed(0.025), 'packedBedGradient')?.source).toContain('Eisfeld');
    expect(stepOf(bed(0.1), 'packedBedVoidFraction')?.kind).toBe('assumed');
    const w = bed(0.1);
    const [k, cf, u] = [w.get('packedBedPermeability') as number, w.get('packedBedForchheimer') as number, 0.01];
    expect((1.0016e-3 * u) / k + (998.2 * cf * u ** 2) / Math.sqrt(k)).toBeCloseTo(w.get('packedBedGradient') as number, 6);
  });
  it('the general flow takes its limits from where the fluid is', () => {
    const at = (generalConfinement: string, imposedFlow = 'yes'): (number | undefined)[] => { const w = workingsOf(flow('general'), { ...base, generalConfinement, imposedFlow, 'sizes.length': 0.1, 'inlet.speed': 0.2, temperatureDifference: 5 }); return [w.get('regimeLow'), w.get('regimeHigh')]; };
    expect([at('inside'), at('outside'), at('free'), at('outside', 'no')]).toEqual([[2300, 4000], [190, 1000], [300, 3000], [1e9, 1e10]]);
  });
});

describe.each(Object.entries(flows))('%s', (id, f) => {
  it('names its own quantities after itself and needs nothing of another flow', () => {
    const defined = f.definitions.filter((d) => !('more' in d)).map((d) => d.id);
    expect(defined.filter((d) => !d.startsWith(own(id)))).toEqual([]);
    const others = Object.keys(flows).filter((o) => o !== id).map(own);
    const needs = f.definitions.flatMap((d) => ('more' in d ? d.more : d.ways)).flatMap((way) => way.needs);
    expect(needs.filter((need) => others.some((o) => new RegExp(`^${o}[A-Z]`).test(need)))).toEqual([]);
  });
  it('uses sizes that it lists, gives a length and a domain, and holds to its regions', () => {
    const ways = f.definitions.flatMap((d) => ('more' in d ? d.more : d.ways));
    const sizes = new Set(ways.flatMap((way) => way.needs).filter((need) => need.startsWith('sizes.')).map((need) => need.slice(6)));
    expect([...sizes].filter((key) => !f.sizes.some((s) => s.key === key))).toEqual([]);
    const given = new Set(f.definitions.map((d) => d.id.split('@')[0]));
    expect(['length', 'regimeGroup', 'regimeLow', 'regimeHigh'].filter((need) => !given.has(need))).toEqual([]);
    expect(f.domain.filter((e) => !given.has(e.id))).toEqual([]);
    const along = f.definitions.map((d) => d.id).filter((d) => d.startsWith('regionAlong@'));
    expect(along.filter((d) => !f.regions.includes(d.split('@')[1] as string))).toEqual([]);
  });
  it('states for every rung what changes, how close it must come and what to do when missed', () => {
    expect(f.ladder.length).toBeGreaterThan(2);
    for (const rung of f.ladder) {
      expect(rung.limit).toBeGreaterThan(0);
      expect(rung.changes.length).toBeGreaterThan(7);
      expect(rung.ifMissed.length).toBeGreaterThan(7);
    }
    const ids = new Set(definitionsOf(f).flatMap((d) => ('more' in d ? [] : [d.id])));
    expect(f.ladder.flatMap((rung) => Object.values(rung.with)).filter((need) => !ids.has(need) && need !== 'grashofFluxOverReynolds')).toEqual([]);
  });
  it('compares in its rungs only numbers that the reference has, filled from needs that it has', () => {
    const wrong = f.ladder.flatMap((rung) => {
      const ref = references.find((r) => r.id === rung.reference);
      if (ref === undefined) return [];
      return [...(ref.values.some((v) => v.id === rung.compares) ? [] : [`${rung.reference} has no ${rung.compares}`]), ...Object.keys(rung.with).filter((need) => !ref.needs.some((q) => q.id === need)).map((need) => `${rung.reference} does not need ${need}`)];
    });
    expect(wrong).toEqual([]);
  });
  it('says of every correlation with a band where it comes from', () => {
    const ways = f.definitions.flatMap((d) => ('more' in d ? d.more : d.ways));
    expect(ways.filter((way) => way.formula === '' || way.source === '')).toEqual([]);
  });
});
