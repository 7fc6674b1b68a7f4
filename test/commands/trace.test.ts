import { writeFileSync, mkdtempSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { runbrief } from './harness.ts';

const example = 'examples/rinse-line.case.yaml';

describe('runbrief trace', () => {
  it('shows the way from the inputs to a number, inputs first, in the units of the case', async () => {
    const { code, stdout, stderr } = await runbrief(['trace', example, 'reynolds']);
    expect({ code, stderr }).toEqual({ code: 0, stderr: '' });
    const steps = [...stdout.matchAll(/^ +(\d+)\. {2}([\w.@/]+)/gm)].map(([, place, id]) => [Number(place), id] as const);
    expect(steps.map(([place]) => place)).toEqual(steps.map((_, i) => i + 1));
    expect(steps.at(-1)?.[1]).toBe('reynolds');
    expect(stdout).toMatch(/inlet\.speed.* = 0\.400 m\/s \+\/- 5 % \(given\)|inlet\.speed.* = 0\.4 m\/s \(given\)/);
    expect(stdout).toContain('sizes.diameter');
    expect(stdout).toMatch(/source: ISO 80000-11/);
    expect(stdout).toMatch(/^ {2}spread from \d+ % inlet\.speed/m);
    for (const [, places] of stdout.matchAll(/with ((?:\[\d+\][^\n]*\n?)+)/g)) for (const [, place] of (places as string).matchAll(/\[(\d+)\]/g)) expect(Number(place)).toBeLessThanOrEqual(steps.length);
    expect(stdout.split('\n').every((line) => line.length <= 80)).toBe(true);
  });

  it('gives the steps as JSON in SI', async () => {
    const { stdout } = await runbrief(['trace', example, 'reynolds', '--json']);
    const found = JSON.parse(stdout) as { id: string; value: number; steps: { id: string; value: number; needs: string[] }[] };
    const at = Object.fromEntries(found.steps.map((step) => [step.id, step.value]));
    expect(found.id).toBe('reynolds');
    // Re = rho U D/mu from the numbers of its own steps.
    expect(found.value).toBeCloseTo(((at['density'] as number) * (at['speed'] as number) * (at['length'] as number)) / (at['viscosity'] as number), 6);
    const seen = new Set<string>();
    for (const step of found.steps) {
      for (const need of step.needs) expect(seen.has(need), `${need} before ${step.id}`).toBe(true);
      seen.add(step.id);
    }
  });

  it.each([
    [['trace', example, 'reynold'], 'nearest   reynolds'],
    [['trace', example, '\u001b[31m'], String.raw`\u001b[31m is no quantity of this case`],
  ])('%j', async (argv, message) => {
    const { code, stderr } = await runbrief(argv);
    expect(code).toBe(1);
    expect(stderr).toContain(message);
    expect(stderr).not.toContain('\u001b');
  });

  it('follows what belongs to a target: the spread of its estimate', async () => {
    const { code, stdout } = await runbrief(['trace', example, 'targets.0.halfWidth']);
    expect(code).toBe(0);
    expect(stdout).toMatch(/targets\.0\.halfWidth.* = 1\.\d+ K/);
  });

  it('says which input is missing', async () => {
    const file = join(mkdtempSync(join(tmpdir(), 'runbrief-trace-')), 'a.case.yaml');
    writeFileSync(file, 'format: 1\nflow: pipe\nsizes: { diameter: 25 mm }\nfluid: { material: water, temperature: 20 degC }\ninlet: { speed: 1 m/s }\ntargets: [{ quantity: wallShear }]\n');
    const { code, stderr } = await runbrief(['trace', file, 'pressureDrop']);
    expect(code).toBe(1);
    expect(stderr).toContain('pressureDrop cannot be computed yet: the case does not give sizes.length');
  });
});
