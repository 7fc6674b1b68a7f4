import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { runbrief } from './harness.ts';

let folder = '';
const file = (name: string): string => join(folder, name);
beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), 'grids-'));
  writeFileSync(file('drop.csv'), 'cells,pressure drop [kPa]\n64000,1.01\n8000,1.04\n1000,1.16\n');
  writeFileSync(file('two.csv'), 'cells,pressure drop [kPa],force [N]\n64000,1.01,5.0\n8000,1.04,5.3\n');
  writeFileSync(file('bad.csv'), 'cells,pressure drop [kPa]\n64000,nan\n8000,1.04\n');
});
afterAll(() => rmSync(folder, { recursive: true }));

describe('runbrief grids', () => {
  it('0 without a limit and no outcome; numbers in SI', async () => {
    const { code, stdout } = await runbrief(['grids', file('drop.csv'), '--json']);
    const document = JSON.parse(stdout) as Record<string, unknown>;
    expect(code).toBe(0);
    expect(document).toMatchObject({ kind: 'monotone', order: expect.closeTo(2, 6), extrapolated: expect.closeTo(1000, 6), safetyFactor: 1.25, band: expect.closeTo(12.5 / 1010, 8) });
    expect(Object.hasOwn(document, 'outcome')).toBe(false);
    expect(String(document['says'])).toContain('apparent order 2');
  });
  it('0 where the limit is met, 4 where it is missed or cannot be told', async () => {
    expect((await runbrief(['grids', file('drop.csv'), '--within', '2 %'])).code).toBe(0);
    const missed = await runbrief(['grids', file('drop.csv'), '--within', '1 %']);
    expect([missed.code, missed.stderr]).toEqual([4, '']);
    expect(missed.stdout).toContain('pressure drop: missed (monotone)');
    const thin = await runbrief(['grids', file('two.csv'), '--within', '2 %', '--json']);
    expect(thin.code).toBe(4);
    const document = JSON.parse(thin.stdout) as { outcome: string; kind: string; targets: { name: string; outcome: string }[] };
    expect(document).toMatchObject({ kind: 'two-grids', outcome: 'missed' });
    expect(document.targets.map((t) => [t.name, t.outcome])).toEqual([['pressure drop', 'cannot tell'], ['force', 'missed']]);
  });
  it('the screen keeps to 80 columns', async () => {
    const { stdout } = await runbrief(['grids', file('drop.csv'), '--within', '2 %']);
    expect(Math.max(...stdout.split('\n').map((line) => line.length))).toBeLessThanOrEqual(80);
    expect(stdout).toContain('band of +/- 0.0125 kPa (1.24 %)');
  });
  it('1 with file, line and column for what is wrong in the file or a limit', async () => {
    const bad = await runbrief(['grids', file('bad.csv')]);
    expect([bad.code, bad.stdout]).toEqual([1, '']);
    expect(bad.stderr).toContain(`${file('bad.csv')}:2:7  pressure drop: "nan" is not a finite number`);
    const json = await runbrief(['grids', file('none.csv'), '--json']);
    expect([json.code, (JSON.parse(json.stdout) as { problems: { code: string }[] }).problems[0]?.code]).toEqual([1, 'missing-file']);
    expect((await runbrief(['grids', file('drop.csv'), '--within', '2 kg'])).code).toBe(1);
    expect((await runbrief(['grids', file('drop.csv'), '--order', 'two'])).code).toBe(1);
  });
  it('2 for a wrong use of the command line', async () => {
    expect((await runbrief(['grids'])).code).toBe(2);
    expect((await runbrief(['grids', file('drop.csv'), '--dimension', '4'])).code).toBe(2);
    expect((await runbrief(['grids', file('drop.csv'), '--with', '2 %'])).code).toBe(2);
  });
});
