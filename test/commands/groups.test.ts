import { describe, expect, it } from 'vitest';
import { runbrief } from './harness.ts';

const drag = 'drag: N, speed: m/s, size: m, density: kg/m^3, viscosity: Pa s';

describe('runbrief groups', () => {
  it('shows the groups with their names', async () => {
    const { code, stdout, stderr } = await runbrief(['groups', drag]);
    expect({ code, stderr }).toEqual({ code: 0, stderr: '' });
    expect(stdout).toContain('5 quantities less rank 3 of their dimensions: 2 groups\n');
    expect(stdout).toContain('  1.  speed * size * density / viscosity\n      Reynolds number\n');
    expect(stdout.split('\n').every((line) => line.length <= 80)).toBe(true);
  });

  it('gives exponents as JSON', async () => {
    const { stdout } = await runbrief(['groups', drag, '--json']);
    expect(JSON.parse(stdout)).toMatchObject({ rank: 3, alone: [], groups: [{ exponents: { density: 1, speed: 1, size: 1, viscosity: -1 }, known: 'Reynolds number' }, { exponents: { drag: 1, density: -1, speed: -2, size: -2 } }] });
  });

  it('says what stands in no group', async () => {
    expect((await runbrief(['groups', 'mass: kg, a: m/s, b: m/s'])).stdout).toContain('In no group: mass. Nothing else carries that dimension');
  });

  it.each([
    [['groups'], 2, 'QUANTITIES is missing'],
    [['groups', 'speed'], 1, '"speed" is not a name with a unit'],
    [['groups', 'speed: m/s, : m'], 1, '": m" is not a name with a unit'],
    [['groups', 'speed: 3 m/s'], 1, 'speed: "3 m/s" is a number with a unit'],
    [['groups', 'a: m, a: m'], 1, 'a is given twice'],
    [['groups', 'a: metre/sek'], 1, 'a: '],
    [['groups', Array.from({ length: 15 }, (_, i) => `q${i}: m`).join(', ')], 1, '15 quantities'],
    [['groups', '\u001b[31mred: m'], 1, String.raw`"\u001b[31mred: m" is not a name with a unit`],
  ])('%j', async (argv, code, message) => {
    const ended = await runbrief(argv);
    expect(ended.code).toBe(code);
    expect(ended.stderr).toContain(message);
    expect(ended.stderr).not.toContain('\u001b');
  });
});
