import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { runbrief } from './harness.ts';

const rule = {
  effect: 'weir-overfall', title: 'Overfall at a weir',
  applies: { all: [{ fact: 'gravity', operator: 'greaterThan', value: 0, else: 'no gravity' }] },
  branches: [{ id: 'broad', deciding: 'reynolds', leaveOutAt: 100, includeAt: 2000, because: 'Re = {reynolds}', source: 'house practice, 2019' }],
  // oxlint-disable-next-line unicorn/no-thenable -- the key of rule files and plans; it holds words
  then: ['a free surface'],
  examples: [
    { facts: { reynolds: 50 }, verdict: 'leave-out' }, { facts: { reynolds: 100 }, verdict: 'borderline', why: 'at the limit' }, { facts: { reynolds: 2000 }, verdict: 'include' },
    { facts: {}, verdict: 'undecided' }, { facts: { gravity: 0 }, applies: false, verdict: 'leave-out' },
  ],
};
let folder = '';
const write = (name: string, content: unknown): void => writeFileSync(join(folder, name), typeof content === 'string' ? content : JSON.stringify(content, null, 2));
beforeAll(() => { folder = mkdtempSync(join(tmpdir(), 'rules-')); });
afterAll(() => rmSync(folder, { recursive: true }));

describe('runbrief rules', () => {
  it('lists every decision within 80 columns', async () => {
    const { code, stdout } = await runbrief(['rules']);
    expect(code).toBe(0);
    for (const id of ['turbulence', 'compressibility', 'porous-two-temperature', 'density-law', 'precision']) expect(stdout).toContain(id);
    expect(Math.max(...stdout.split('\n').map((l) => l.length))).toBeLessThanOrEqual(80);
  });
  it('shows a rule with limits, sources and examples', async () => {
    const { code, stdout } = await runbrief(['rules', 'compressibility']);
    expect(code).toBe(0);
    expect(stdout).toMatch(/left out below 0\.3, included from 0\.3/);
    expect(stdout).toMatch(/source: /);
    expect(Math.max(...stdout.split('\n').map((l) => l.length))).toBeLessThanOrEqual(80);
    expect(JSON.parse((await runbrief(['rules', 'compressibility', '--json'])).stdout)).toMatchObject({ effect: 'compressibility' });
  });
  it('names the nearest of an unknown id', async () => {
    const { code, stderr } = await runbrief(['rules', 'compresibility']);
    expect(code).toBe(1);
    expect(stderr).toContain('nearest   compressibility');
    expect((await runbrief(['rules', 'constructor'])).code).toBe(1);
  });
  it('checks a pack, and lays it over ours', async () => {
    write('weir.json', rule);
    expect(await runbrief(['rules', '--check', folder])).toEqual({ code: 0, stdout: `${folder}: 1 rule in order, 5 examples give what they say\n`, stderr: '' });
    expect((await runbrief(['rules', 'weir-overfall', '--rules', folder])).stdout).toContain('Overfall at a weir');
    expect((await runbrief(['rules', '--rules', folder, '--json'])).stdout).toContain('weir-overfall');
  });
  it('refuses a wrong pack with file, line and column', async () => {
    write('weir.json', { ...rule, branches: [{ ...rule.branches[0], deciding: 'reynold' }] });
    const { code, stdout, stderr } = await runbrief(['rules', '--check', folder]);
    expect([code, stdout]).toEqual([1, '']);
    expect(stderr).toMatch(/weir\.json:17:19 {2}the deciding quantity of branch broad names reynold/);
    expect(stderr).toContain('^^^^');
    expect(stderr).toContain('nearest   reynolds');
    write('weir.json', { ...rule, examples: rule.examples.map((e, k) => (k === 0 ? { ...e, facts: { reynolds: 5000 } } : e)) });
    expect((await runbrief(['rules', '--check', folder])).stderr).toMatch(/weir\.json {2}example 1 of weir-overfall gives "include" and says "leave-out"/);
    write('weir.json', '{ "effect": ');
    expect((await runbrief(['rules', '--check', folder, '--json'])).stdout).toContain('"line": 1');
    expect((await runbrief(['rules', '--check', join(folder, 'none')])).code).toBe(1);
  });
  it('passes no escape sequence on to the terminal', async () => {
    write('weir.json', { ...rule, title: 'Overfall \u001b[31mred' });
    expect((await runbrief(['rules', 'weir-overfall', '--rules', folder])).stdout).not.toContain('\u001b');
  });
});
