import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { vocabulary } from '../../src/assemble/index.ts';
import { readCase } from '../../src/case/index.ts';
import { plan } from '../../src/plan/index.ts';
import { screen, writingOf } from '../../src/report/index.ts';

async function screenOf(text: string): Promise<string[]> {
  const on = readCase(text, 'test.case.yaml', vocabulary);
  const made = await plan(on, { version: 'test', sections: ['cautions'] });
  return screen(made, writingOf(made.quantities, on), { file: 'test.case.yaml' }).split('\n').map((line) => line.trim());
}

describe('the screen of whole cases', () => {
  it('an operating range of a drive stands with its target: drag by the square of the speed, 1.2 x 0.72 m^2 x 1.247 kg/m^3 U^2/2', async () => {
    const lines = await screenOf('format: 1\ntitle: Wind on a lamp mast\ntargets:\n  - { quantity: dragForce, within: 15 % }\n  - { quantity: sheddingFrequency, within: 10 % }\nflow: cylinder\nsizes: { diameter: 120 mm, span: 6 m }\nfluid: { material: air, pressure: 1 atm }\ninlet: { speed: 5 .. 20 m/s, temperature: 10 degC }\n');
    const drag = lines.find((line) => line.startsWith('over the operating range') && line.endsWith('N')) ?? '';
    const [from, to] = [...drag.matchAll(/([\d.]+) N/g)].map((m) => Number(m[1]));
    expect((from as number) / 13.5).toBeCloseTo(1, 1);
    expect((to as number) / 215.5).toBeCloseTo(1, 1);
    expect(lines.find((line) => line.startsWith('over the operating range') && line.endsWith('Hz'))).toBeDefined();
    expect(lines.join(' ')).toContain('up to 20 m/s, on a mast');
    expect(lines.join(' ')).not.toContain('0.000001 %');
  });
  it('every target stands there with its number, whatever else has to go', async () => {
    const lines = await screenOf(readFileSync('examples/supply-duct.case.yaml', 'utf8'));
    expect(lines).toContainEqual(expect.stringMatching(/^Target +outletTemperature at outlet 36\.\d+ degC/));
    expect(lines).toContainEqual(expect.stringMatching(/^pressureDrop 1\d\.\d Pa/));
  });
  it('a verdict that its spread alone moves shows the spread and the limit it reaches', async () => {
    const lines = await screenOf('format: 1\ntitle: Panel in a still room\ntargets: [{ quantity: heatRate, within: 10 % }]\nflow: plate\nsizes: { length: 600 mm, width: 1 m }\ninclination: upward\nfluid: { material: air, pressure: 1 atm, temperature: 20 degC }\nwall: { temperature: 55 degC, emissivity: 0.9 }\nsurroundings: { temperature: 20 degC }\n');
    expect(lines).toContainEqual(expect.stringMatching(/^unsteadiness .*x_u\/x_on 0\.60 \+\/- factor 1\.5, reaching 0\.8$/));
    // Churchill and Chu at Ra 6.0e8: Nu 81, 77 W; radiation 0.9 sigma (328.15^4 - 293.15^4) 0.6 m^2 = 129 W.
    expect(lines).toContainEqual(expect.stringMatching(/^Target +heatRate 206 W/));
  });
});
