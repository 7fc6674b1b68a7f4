import { createHash } from 'node:crypto';
import { mkdtempSync, readdirSync, readFileSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import type { Plan } from '../../src/plan/index.ts';
import { departures, planShape } from '../report/plan-shape.ts';
import { runbrief } from './harness.ts';

const example = 'examples/rinse-line.case.yaml';
const folder = (): string => mkdtempSync(join(tmpdir(), 'runbrief-plan-'));
const written = (text: string): string => {
  const file = join(folder(), 'a.case.yaml');
  writeFileSync(file, text);
  return file;
};
const acted = /[\u0000-\u0009\u000b-\u001f\u007f-\u009f\u202e]/;

describe('runbrief plan', () => {
  it('shows one screen, the same twice', async () => {
    const { code, stdout, stderr } = await runbrief(['plan', example]);
    expect({ code, stderr }).toEqual({ code: 0, stderr: '' });
    const lines = stdout.trimEnd().split('\n');
    expect(lines.length).toBeLessThanOrEqual(48);
    for (const line of lines) expect(line.length, line).toBeLessThanOrEqual(80);
    expect(stdout).not.toMatch(acted);
    expect(stdout).not.toMatch(/undefined|NaN|\[object/);
    expect(stdout).toMatch(/^Rinse water cooled in a jacketed line\nDoes the water leave/);
    for (const label of ['Target', 'Include', 'Leave out', 'Wall', 'Mesh', 'Ladder', 'More']) expect(stdout).toMatch(new RegExp(`^${label} `, 'm'));
    expect((await runbrief(['plan', example])).stdout).toBe(stdout);
  });

  it('gives the plan as JSON in the promised form', async () => {
    const { code, stdout, stderr } = await runbrief(['plan', example, '--json']);
    expect({ code, stderr }).toEqual({ code: 0, stderr: '' });
    const plan = JSON.parse(stdout) as Plan;
    expect(departures(plan, planShape)).toEqual([]);
    expect(plan.case).toEqual({ file: 'rinse-line.case.yaml', title: 'Rinse water cooled in a jacketed line', sha256: createHash('sha256').update(readFileSync(example)).digest('hex') });
    expect(plan.quantities['sizes.diameter']).toMatchObject({ value: 0.025, unit: 'm', kind: 'given' });
    for (const [id, { needs }] of Object.entries(plan.quantities)) for (const need of needs) expect(plan.quantities[need], `${need}, needed by ${id}`).toBeDefined();
    for (const { lines } of Object.values(plan.sections)) for (const { text } of lines) expect(text).not.toMatch(/\{[A-Za-z]/);
    expect(new Set(plan.effects.map((e) => e.id)).size).toBe(plan.effects.length);
    expect((await runbrief(['plan', example, '--json'])).stdout).toBe(stdout);
  });

  it('shows everything with --full, within 80 columns', async () => {
    const { code, stdout } = await runbrief(['plan', example, '--full']);
    expect(code).toBe(0);
    for (const line of stdout.split('\n')) expect(line.length, line).toBeLessThanOrEqual(80);
    expect(stdout).toMatch(/^EVERY DECISION$/m);
    expect(stdout).not.toMatch(acted);
  });

  it('writes its files, refuses to overwrite them, and does with --force', async () => {
    const into = join(folder(), 'plan');
    const first = await runbrief(['plan', example, '--into', into]);
    expect(first.code).toBe(0);
    const names = readdirSync(into, { recursive: true, encoding: 'utf8' }).sort();
    for (const name of ['checklist.md', 'near-wall.csv', 'plan.html', 'plan.json', 'plan.md', 'properties.csv']) expect(names).toContain(name);
    for (const name of names.filter((n) => n.includes('.'))) expect(first.stderr).toContain(`written: ${join(into, name)}\n`);
    expect(names.some((name) => /^ladder.[\w-]+\.csv$/.test(name))).toBe(true);
    expect(departures(JSON.parse(readFileSync(join(into, 'plan.json'), 'utf8')), planShape)).toEqual([]);
    const before = readFileSync(join(into, 'plan.html'), 'utf8');
    const again = await runbrief(['plan', example, '--into', into]);
    expect(again.code).toBe(2);
    expect(again.stderr).toContain(`${join(into, 'plan.md')} exists`);
    expect((await runbrief(['plan', example, '--into', into, '--force'])).code).toBe(0);
    expect(readFileSync(join(into, 'plan.html'), 'utf8')).toBe(before);
  });

  it('refuses a case with control characters, and shows none of them', async () => {
    const { code, stdout, stderr } = await runbrief(['plan', written('format: 1\ntitle: "x\\u001b[2J\\u202e"\nflow: pipe\n')]);
    expect({ code, stdout }).toEqual({ code: 1, stdout: '' });
    expect(stderr).toContain('title: a control character within a text');
    expect(stderr).not.toMatch(acted);
  });

  it('passes nothing of a hostile case on to terminal or page', async () => {
    const file = written('format: 1\ntitle: "x</title><script>alert(1)</script>"\npurpose: "Is <b>this</b> so?"\nflow: pipe\nsizes: { diameter: 25 mm, length: 8 m }\nfluid: { material: water }\ninlet: { speed: 0.4 m/s, temperature: 65 degC }\nwall: { temperature: 20 degC }\ntargets: [{ quantity: "<img src=x onerror=y>", place: "</td>" }]\n');
    const into = join(folder(), 'plan');
    const { code, stdout, stderr } = await runbrief(['plan', file, '--into', into]);
    expect(code).toBe(0);
    expect(`${stdout}${stderr}`).not.toMatch(acted);
    expect(readFileSync(join(into, 'plan.html'), 'utf8')).not.toMatch(/<script|<img/i);
    for (const name of ['plan.html', 'plan.md', 'checklist.md']) expect(readFileSync(join(into, name), 'utf8')).not.toMatch(acted);
    expect(readFileSync(join(into, 'plan.md'), 'utf8')).not.toMatch(/<[a-z]/i);
  });

  it.each([
    [['plan'], 2, 'FILE is missing'],
    [['plan', 'nowhere.case.yaml'], 1, 'nowhere.case.yaml does not exist'],
    [['plan', example, '--force'], 2, '--into'],
    [['plan', example, '--rules', 'nowhere'], 1, 'the folder nowhere cannot be read'],
  ])('%j', async (argv, code, message) => {
    const ended = await runbrief(argv);
    expect(ended.code).toBe(code);
    expect(ended.stderr).toContain(message);
  });
});
