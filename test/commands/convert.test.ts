import { describe, expect, it } from 'vitest';
import { runbrief } from './harness.ts';

describe('runbrief convert', () => {
  it('prints the number and what was assumed', async () => {
    expect(await runbrief(['convert', '12 gal/min', 'L/s'])).toEqual({
      code: 0,
      stdout: '0.757082 L/s\n  assumed: the gallon is the US liquid gallon; write "UK gal" for the imperial one\n',
      stderr: '',
    });
  });

  it('gives value and unit as JSON', async () => {
    const { code, stdout } = await runbrief(['convert', '2 barg', 'Pa', '--json']);
    expect(code).toBe(0);
    expect(JSON.parse(stdout)).toEqual({ value: 301325, unit: 'Pa', assumed: ['gauge counts from 101325 Pa: 3.01325 bar absolute'] });
    expect(JSON.parse((await runbrief(['convert', '1 ft', 'm', '--json'])).stdout)).toEqual({ value: 0.3048, unit: 'm' });
  });

  it.each([
    [['convert', '20 +/- 1 degC', 'degF'], '68 +/- 1.8 degF\n'],
    [['convert', '1 mi', 'km', '--digits', '3'], '1.61 km\n  assumed: the mile is the international mile of 1609.344 m\n'],
    [['convert', '-40 degC', 'degF'], '-40 degF\n'],
    [['convert', '--', '-40 degC', 'degF'], '-40 degF\n'],
  ])('%j', async (argv, stdout) => expect(await runbrief(argv)).toEqual({ code: 0, stdout, stderr: '' }));

  it('says what is wrong, with exit code 1', async () => {
    const { code, stdout, stderr } = await runbrief(['convert', '20 C', 'K']);
    expect(code).toBe(1);
    expect(stdout).toBe('');
    expect(stderr).toContain('"C" is read in more than one way');
    expect(stderr).toContain('degC for the temperature, coulomb for the charge');
  });

  it('lists a problem as JSON', async () => {
    const { code, stdout } = await runbrief(['convert', '5 m', 's', '--json']);
    expect(code).toBe(1);
    expect(JSON.parse(stdout)).toMatchObject({ problems: [{ code: 'wrong-dimension', expected: 'a quantity in s, for example 0.5 s, 20 min' }] });
  });

  it('is used wrongly without a unit', async () => expect((await runbrief(['convert', '5 m'])).code).toBe(2));
});
