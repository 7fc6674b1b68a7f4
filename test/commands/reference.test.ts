import { describe, expect, it } from 'vitest';
import { runbrief } from './harness.ts';

const json = async (argv: string[]): Promise<Record<string, unknown>> => JSON.parse((await runbrief([...argv, '--json'])).stdout) as Record<string, unknown>;

describe('runbrief reference', () => {
  it('lists every known solution', async () => {
    const { code, stdout, stderr } = await runbrief(['reference']);
    expect({ code, stderr }).toEqual({ code: 0, stderr: '' });
    expect(stdout).toMatch(/^graetz-pipe +Thermal entry of developed laminar flow in/m);
    expect(stdout.split('\n').every((line) => line.length <= 80)).toBe(true);
  });

  it('shows one without inputs, with what it needs', async () => {
    const { code, stdout } = await runbrief(['reference', 'graetz-pipe']);
    expect(code).toBe(0);
    expect(stdout).toMatch(/^ {2}graetz +Graetz number Re Pr D_h\/L, holds 0.001 .. 1e8$/m);
    expect(stdout).toContain('with graetz also: nusselt,');
    expect(stdout.split('\n').every((line) => line.length <= 80)).toBe(true);
  });

  it('gives numbers by quantity id as JSON', async () => {
    const { id, values } = (await json(['reference', 'graetz-pipe', '--with', 'peclet = 1000, graetz = 20'])) as { id: string; values: Record<string, { value: number; unit: string }> };
    expect(id).toBe('graetz-pipe');
    // x* = 0.05: mean 4.6406 by an own collocation with 400 points; +27 % over 3.657, as the trade's table of the entry says for Gz 20.
    expect(values['nusselt']?.value).toBeCloseTo(4.64, 1);
    expect((values['nusselt']?.value as number) / 3.65679).toBeCloseTo(1.27, 2);
    expect(values['nusselt']?.unit).toBe('1');
  });

  it('reads inputs with units', async () => {
    // dp = 32 mu U L/D^2 = 32 x 1e-3 x 0.1 x 2/1e-4 = 64 Pa.
    const { values } = (await json(['reference', 'poiseuille-pipe', '--with', 'speed = 10 cm/s, length = 10 mm, viscosity = 1 mPa s, flowLength = 2 m'])) as { values: Record<string, { value: number; unit: string }> };
    expect(values['pressureDrop']?.value).toBeCloseTo(64, 10);
    expect(values['pressureDrop']?.unit).toBe('Pa');
  });

  it('prints a table as CSV and names the others on stderr', async () => {
    const { code, stdout, stderr } = await runbrief(['reference', 'poiseuille-channel', '--table', '--with', 'speed = 2 m/s, length = 0.02 m']);
    expect(code).toBe(0);
    expect(stdout.split('\n')[0]).toBe('height [1],velocity [1]');
    expect(stdout).toContain('0,1.5\n');
    expect(stderr).toBe('table velocityShape; with --name also velocity\n');
    const named = await runbrief(['reference', 'poiseuille-channel', '--name', 'velocity', '--with', 'speed = 2 m/s, length = 0.02 m']);
    expect(named.stdout.split('\n').slice(0, 2)).toEqual(['height [m],velocity [m/s]', '0,3']);
  });

  it.each([
    [['reference', 'graetz-pip'], 'nearest   graetz-pipe'],
    [['reference', 'graetz-pipe', '--with', 'graets = 20'], 'nearest   graetz'],
    [['reference', 'graetz-pipe', '--with', 'graetz 20'], '"graetz 20" is not a name with a quantity'],
    [['reference', 'graetz-pipe', '--with', 'graetz = 20, , peclet = 3'], 'an input is missing between the commas'],
    [['reference', 'graetz-pipe', '--with', 'graetz = 20, graetz = 30'], 'graetz is given twice'],
    [['reference', 'graetz-pipe', '--with', 'graetz = 20 .. 30'], '"20 .. 30" is not one number'],
    [['reference', 'graetz-pipe', '--with', 'length = 20 kg'], 'length: '],
    [['reference', 'graetz-pipe', '--with', 'graetz = -1'], 'graetz = -1 must be more than zero'],
    [['reference', 'graetz-pipe', '--with', ''], 'is not a name with a quantity'],
    [['reference', 'ergun-bed', '--with', 'speed = 1 m/s'], 'ergun-bed needs '],
    [['reference', 'lid-driven-square', '--with', 'reynolds = 300'], 'nearest   400'],
    [['reference', 'ergun-bed', '--table', '--with', 'speed = 1 m/s, length = 3 mm, voidFraction = 0.4, viscosity = 1 mPa s'], 'ergun-bed has no table'],
    [['reference', 'poiseuille-pipe', '--name', 'velocity'], 'the table velocity of poiseuille-pipe needs '],
    [['reference', 'poiseuille-pipe', '--name', 'velocityShap'], 'nearest   velocityShape'],
  ])('%j is a problem with exit code 1', async (argv, says) => {
    const { code, stdout, stderr } = await runbrief(argv);
    expect({ code, stdout }).toEqual({ code: 1, stdout: '' });
    expect(stderr).toContain(says);
  });

  it('without a name but with inputs is a wrong use', async () => expect((await runbrief(['reference', '--with', 'graetz = 20'])).code).toBe(2));
});
