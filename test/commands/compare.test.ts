import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { runbrief } from './harness.ts';

let folder = '';
const file = (name: string): string => join(folder, name);

// Oil in a pipe: D = 10 mm, U = 0.1 m/s, Re = 900 x 0.1 x 0.01/0.05 = 18.
const oil = `format: 1
targets: [{ quantity: pressureDrop, within: 5 % }]
flow: pipe
sizes: { diameter: 10 mm, length: 0.5 m }
fluid: { density: 900 kg/m^3, viscosity: 0.05 Pa s }
inlet: { speed: 0.1 m/s, profile: developed }
`;

/** The parabola by hand, u = 2 U (1 - (r/R)^2), with a known error in share of itself, at 28 places that are none of ours. */
function parabola(error: number): string {
  const rows = Array.from({ length: 28 }, (_, i) => { const r = (5 * i) / 27; return `${r},${0.2 * (1 - (r / 5) ** 2) * (1 + error)}`; });
  return ['radius [mm],velocity [m/s]', ...rows].join('\n');
}

beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), 'compare-'));
  writeFileSync(file('oil.case.yaml'), oil);
  for (const [name, error] of [['exact', 0], ['near', 0.003], ['edge', 0.0045], ['far', 0.02]] as const) writeFileSync(file(`${name}.csv`), parabola(error));
  // Largest speed 2 U; shear 8 mu U/D = 4 Pa, given 2 % too high.
  writeFileSync(file('numbers.csv'), 'peakSpeed [m/s],wallShear [Pa]\n0.2,4.08\n');
  writeFileSync(file('other.csv'), 'height [K],force [N]\n1,2\n2,3\n');
});
afterAll(() => rmSync(folder, { recursive: true }));

const compare = (name: string, ...more: string[]): ReturnType<typeof runbrief> => runbrief(['compare', file('oil.case.yaml'), 'poiseuille-pipe', file(name), ...more]);

describe('runbrief compare', () => {
  it('finds the error that was put in, at the axis, where a parabola is largest', async () => {
    const { code, stdout } = await compare('far.csv', '--numerical', '0.1 %', '--json');
    const document = JSON.parse(stdout) as { outcome: string; limit: number; inputs: Record<string, number>; tables: { columns: { deviation: number; place: { at: number } }[] }[] };
    expect(code).toBe(4);
    expect(document).toMatchObject({ outcome: 'missed', limit: 0.005, rung: 'poiseuille-pipe' });
    expect(document.inputs).toMatchObject({ speed: 0.1, length: 0.01 });
    // 2 % of 0.2 m/s. Straight lines between places 0.185 mm apart err by u'' h^2/8 = 0.07 mm/s; the monotone cubic by less than a fifth of that.
    expect(Math.abs((document.tables[0]?.columns[0]?.deviation ?? 0) - 0.004)).toBeLessThan(1.4e-5);
    expect(document.tables[0]?.columns[0]?.place.at).toBeLessThanOrEqual(2.5e-4);
  });
  it('met, missed and cannot tell by error and band: |E| + U against 0.5 % of the range', async () => {
    expect((await compare('exact.csv', '--numerical', '0.1 %')).code).toBe(0);
    expect((await compare('near.csv', '--numerical', '0.1 %')).code).toBe(0);
    const edge = await compare('edge.csv', '--numerical', '0.2 %', '--json');
    expect([edge.code, (JSON.parse(edge.stdout) as { outcome: string }).outcome]).toEqual([4, 'cannot tell']);
    const far = await compare('far.csv', '--numerical', '0.2 %');
    expect(far.code).toBe(4);
    expect(far.stdout).toContain('poiseuille-pipe: missed');
    expect(far.stdout).toContain('Look first at: compare behind the entrance');
  });
  it('never met while the numerical band is unknown', async () => {
    const { code, stdout } = await compare('exact.csv');
    expect([code, stdout.includes('cannot tell')]).toEqual([4, true]);
  });
  it('a limit of the user replaces the tolerance of the rung', async () => {
    expect((await compare('far.csv', '--numerical', '0.2 %', '--within', '5 %')).code).toBe(0);
  });
  it('one row is held against single numbers', async () => {
    const { code, stdout } = await compare('numbers.csv', '--numerical', '0.1 %', '--json');
    const { values } = JSON.parse(stdout) as { values: { column: string; known: number; outcome: string; deviation: number }[] };
    expect(code).toBe(4);
    expect(values.map((v) => [v.column, v.outcome])).toEqual([['peakSpeed', 'met'], ['wallShear', 'missed']]);
    expect(values[1]?.known).toBeCloseTo(4, 9);
    expect(values[1]?.deviation).toBeCloseTo(0.08, 9);
  });
  it('a plain header is held against the number that the rung compares', async () => {
    // Between plates with one flux through both walls Nu = 140/17 = 8.2353, with one temperature 7.5407 (Shah and London 1978).
    writeFileSync(file('plates.case.yaml'), 'format: 1\ntargets: [{ quantity: nusselt, within: 5 % }]\nflow: channel\nsizes: { gap: 3 mm, length: 0.4 m, width: 60 mm }\nfluid: { material: water, pressure: 1.2 bar abs }\ninlet: { speed: 0.05 m/s, temperature: 20 degC }\nwall: { heatFlux: 1 kW/m^2 }\n');
    writeFileSync(file('plain.csv'), 'nusselt [1]\n8.2\n');
    writeFileSync(file('both.csv'), 'nusselt [1],nusseltUniformFlux [1]\n7.5,8.2\n');
    const known = async (rung: string, name: string): Promise<[string, number][]> => (JSON.parse((await runbrief(['compare', file('plates.case.yaml'), rung, file(name), '--json'])).stdout) as { values: { column: string; known: number }[] }).values.map((v) => [v.column, Number(v.known.toFixed(4))]);
    expect(await known('developed-heat-channel:nusseltUniformFlux', 'plain.csv')).toEqual([['nusselt', 8.2353]]);
    expect(await known('developed-heat-channel', 'plain.csv')).toEqual([['nusselt', 7.5407]]);
    expect(await known('developed-heat-channel:nusseltUniformFlux', 'both.csv')).toEqual([['nusselt', 7.5407], ['nusseltUniformFlux', 8.2353]]);
  });
  it('a wrong name has the nearest one, a file without known columns says which it could have', async () => {
    const wrong = await runbrief(['compare', file('oil.case.yaml'), 'poiseuile-pipe', file('exact.csv')]);
    expect([wrong.code, wrong.stderr.includes('poiseuille-pipe')]).toEqual([1, true]);
    const other = await compare('other.csv', '--numerical', '1 %');
    expect([other.code, other.stderr.includes('radius')]).toEqual([1, true]);
  });
});
