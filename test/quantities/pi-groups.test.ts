import { describe, expect, it } from 'vitest';
import { mostQuantities, piGroups, type Dimensioned, type PiGroups } from '../../src/quantities/index.ts';
import { dimensionOf, readQuantity } from '../../src/units/index.ts';
import published from '../checks/values/C01_groups.json' with { type: 'json' };

const of = (units: Readonly<Record<string, string>>): Dimensioned[] => Object.entries(units).map(([name, unit]) => ({ name, dimension: dimensionOf(unit) }));
const find = (units: Readonly<Record<string, string>>): Promise<PiGroups> => piGroups(of(units));

/** Rank by elimination in floating point with full pivoting: another way than the exact one under test. */
function rankOf(rows: readonly (readonly number[])[]): number {
  const m = rows.map((row) => [...row]);
  let rank = 0;
  const used = new Set<number>();
  for (;;) {
    let [best, at, column] = [1e-9, -1, -1];
    m.forEach((row, i) => { if (!used.has(i)) row.forEach((v, k) => { if (Math.abs(v) > best) [best, at, column] = [Math.abs(v), i, k]; }); });
    if (at < 0) return rank;
    used.add(at);
    rank++;
    const pivot = m[at] as number[];
    m.forEach((row, i) => { if (!used.has(i)) { const f = (row[column] as number) / (pivot[column] as number); m[i] = row.map((v, k) => v - f * (pivot[k] as number)); } });
  }
}

const problems: Record<string, Record<string, string>> = {
  'a body in a stream': { drag: 'N', speed: 'm/s', size: 'm', density: 'kg/m^3', viscosity: 'Pa s' },
  'heat in a pipe': { h: 'W/(m^2 K)', D: 'm', k: 'W/(m K)', mu: 'Pa s', cp: 'J/(kg K)', U: 'm/s', rho: 'kg/m^3', L: 'm' },
  'a heated cavity': { g: 'm/s^2', beta: '1/K', dT: 'K', H: 'm', nu: 'm^2/s', a: 'm^2/s' },
  'a stirred tank': { P: 'W', N: '1/s', D: 'm', rho: 'kg/m^3', mu: 'Pa s', g: 'm/s^2', T: 'm' },
  'a drop': { rho: 'kg/m^3', rhoOut: 'kg/m^3', U: 'm/s', d: 'm', mu: 'Pa s', sigma: 'N/m', g: 'm/s^2' },
  'a gas stream': { U: 'm/s', soundSpeed: 'm/s', L: 'm', nu: 'm^2/s' },
  'broken exponents': { tau: 'Pa', K: 'Pa s^0.6', shearRate: '1/s' },
  'numbers alone': { angle: 'rad', share: '%' },
};

describe('groups without dimension', () => {
  it.each(Object.entries(problems))('%s: as many as quantities less the rank, independent, each without dimension', async (_, units) => {
    const quantities = of(units);
    const { groups, rank } = await piGroups(quantities);
    expect(rank).toBe(rankOf(Array.from({ length: 7 }, (__, base) => quantities.map((q) => q.dimension[base] as number))));
    expect(groups).toHaveLength(quantities.length - rank);
    expect(rankOf(groups.map((g) => quantities.map((q) => g.exponents[q.name] ?? 0)))).toBe(groups.length);
    for (const { exponents } of groups) {
      expect(Object.values(exponents).every((e) => Number.isInteger(e) && e !== 0)).toBe(true);
      for (let base = 0; base < 7; base++) expect(quantities.reduce((sum, q) => sum + (exponents[q.name] ?? 0) * (q.dimension[base] as number), 0)).toBeCloseTo(0, 9);
    }
  });

  it('are those the trade has names for', async () => {
    const named = async (problem: string): Promise<(string | undefined)[]> => (await find(problems[problem] as Record<string, string>)).groups.map((g) => g.known?.replace(/ \(.*/, ''));
    expect(await named('a body in a stream')).toEqual(['Reynolds number', 'force coefficient']);
    expect(await named('heat in a pipe')).toEqual(['Reynolds number', 'Prandtl number', 'Nusselt number', 'ratio of lengths']);
    expect(await named('a heated cavity')).toEqual(['Grashof number', 'relative change by temperature', 'ratio of diffusivities']);
    expect(await named('a stirred tank')).toEqual(['rotating Reynolds number', 'power number', 'Froude number of a rotor', 'ratio of lengths']);
    expect(await named('a drop')).toEqual(['Reynolds number', 'Froude number squared', 'Weber number', 'density ratio']);
    expect(await named('a gas stream')).toEqual(['Reynolds number', 'ratio of speeds']);
  });

  it('read as products', async () => {
    expect((await find({ speed: 'm/s', size: 'm', density: 'kg/m^3', viscosity: 'Pa s', drag: 'N' })).groups.map((g) => g.text)).toEqual(['speed * size * density / viscosity', 'drag / (speed^2 * size^2 * density)']);
    expect((await find({ viscosity: 'Pa s', speed: 'm/s', size: 'm', density: 'kg/m^3' })).groups[0]?.exponents).toEqual({ viscosity: -1, speed: 1, size: 1, density: 1 });
  });

  it('name what stands in none', async () => {
    expect(await find({ mass: 'kg', speed: 'm/s', other: 'm/s' })).toMatchObject({ alone: ['mass'], rank: 2, groups: [{ exponents: { speed: 1, other: -1 } }] });
    expect(await find({ mass: 'kg' })).toEqual({ groups: [], rank: 1, alone: ['mass'] });
  });

  it('come in reasonable time for the largest problem', async () => {
    const units = ['N', 'm/s', 'm', 'kg/m^3', 'Pa s', 'm/s^2', 'K', 'W/(m K)', 'J/(kg K)', 'N/m', '1/K', 'A', 'mol/m^3', 'W/(m^2 K)'];
    expect(units).toHaveLength(mostQuantities);
    const started = performance.now();
    const { groups, rank } = await find(Object.fromEntries(units.map((unit, i) => [`q${i}`, unit])));
    expect(groups).toHaveLength(units.length - rank);
    expect(performance.now() - started).toBeLessThan(10_000);
  });
});

// Published groups of one null vector: our group of the same quantities must be that number, or a whole power of it.
const single = published.entries.filter((e) => ['C01-Re-pipe', 'C01-Re-cm', 'C01-Pr-water', 'C01-Bi', 'C01-Fo', 'C01-Sc', 'C01-We', 'C01-Ca', 'C01-Ec', 'C01-Na', 'C01-Da1', 'C01-Ste', 'C01-Bm', 'C01-Thiele'].includes(e.id));
describe('published groups', () => {
  it.each(single)('$id $quantity', async (entry) => {
    const inputs = Object.entries(entry.inputs as Record<string, { value: number; unit: string }>).map(([name, { value, unit }]) => ({ name, ...readSI(value, unit) }));
    const { groups } = await piGroups(inputs);
    expect(groups).toHaveLength(1);
    const value = Object.entries(groups[0]?.exponents ?? {}).reduce((product, [name, power]) => product * (inputs.find((i) => i.name === name)?.si ?? Number.NaN) ** power, 1);
    const power = Math.log(value) / Math.log(entry.expected);
    if (entry.expected === 1) expect(value).toBeCloseTo(1, 9);
    else {
      expect(Math.abs(power - Math.round(power))).toBeLessThan(2e-5); // the digits printed in the table, as a logarithm
      expect([1, -1, 2]).toContain(Math.round(power));
    }
  });
  it('are all tried', () => expect(single).toHaveLength(14));
});

function readSI(value: number, unit: string): { si: number; dimension: Dimensioned['dimension'] } {
  const si = unit === 'dK' ? value : readQuantity(`${value} ${unit}`, { unit, name: 'input' }).value;
  return { si, dimension: dimensionOf(unit) };
}
