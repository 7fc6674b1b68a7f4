import { describe, expect, it } from 'vitest';
import { fitOf, fitKinds, loadMaterial, parseRange, propertyAt, sampledOver, type Sampled } from '../../src/properties/index.ts';
import { polynomialThrough } from '../../src/properties/fits/polynomial.ts';
import { codeOf } from './harness.ts';

const x = Array.from({ length: 161 }, (_, i) => 250 + (450 * i) / 160);
const made = (y: (T: number) => number, more: Partial<Sampled> = {}): Sampled => ({ property: 'viscosity', variable: 'temperature', x, y: x.map(y), uncertainty: 0.01, phase: 'gas', flags: [], ...more });
const number = (fit: ReturnType<typeof fitOf>, name: string): number => fit.coefficients.find((one) => one.name === name)?.value ?? Number.NaN;

describe('fits recover what was put in', () => {
  it('a cubic', () => {
    const c = [3, -0.02, 5e-5, -3e-8];
    polynomialThrough(x, x.map((T) => c.reduce((sum, ci, i) => sum + ci * T ** i, 0)), 3).forEach((found, i) => expect(found / (c[i] as number)).toBeCloseTo(1, 8));
  });

  it("Sutherland's law of air: 1.716e-5 Pa s at 273 K, S = 111 K (White, Viscous Fluid Flow)", () => {
    const law = (T: number): number => (1.716e-5 * (T / 273) ** 1.5 * (273 + 111)) / (T + 111);
    const fit = fitOf(made(law), 'sutherland', 1e-4);
    expect(number(fit, 'S')).toBeCloseTo(111, 1);
    expect(number(fit, 'y0') / law(250)).toBeCloseTo(1, 4);
    expect(fit.outcome).toBe('met');
  });

  it("Vogel's law, Andrade's with C = 0 among them", () => {
    for (const C of [0, 137.546]) {
      const fit = fitOf(made((T) => 1e-3 * Math.exp(-3.7188 + 578.919 / (T - C)), { phase: 'liquid' }), 'vogel', 1e-4);
      expect(number(fit, 'C') - C).toBeLessThan(0.1);
      expect(number(fit, 'B') / 578.919).toBeCloseTo(1, 2);
      expect(fit.outcome).toBe('met');
    }
  });

  it('a power law', () => {
    const fit = fitOf(made((T) => 2e-5 * (T / 300) ** 0.7), 'power', 1e-4);
    expect(number(fit, 'n')).toBeCloseTo(0.7, 5);
    expect(fit).toMatchObject({ course: 'rises', positive: true, wiggles: false });
  });
});

describe.each(fitKinds.filter((kind) => kind !== 'sutherland' && kind !== 'power' && kind !== 'vogel'))('%s', (kind) => {
  it.each(['water', 'engine oil', 'copper', 'lubricating oil ISO VG 46'])('holds its error between the samples for %s', (name) => {
    const material = loadMaterial(name);
    for (const sampled of sampledOver(material, parseRange('20 degC .. 90 degC, 2 bar'), material.properties.filter((id) => ['density', 'viscosity', 'thermalConductivity', 'specificHeatCapacity'].includes(id)))) {
      const fit = fitOf(sampled, kind, 0.01);
      expect(fit.outcome, `${name} ${fit.property}`).toBe('met');
      // The function as a user types it, from the printed numbers alone, at temperatures that were no samples.
      const typed = (T: number): number => {
        if (fit.rows === undefined) return fit.coefficients.reduce((sum, { value }, i) => sum + value * T ** i, 0);
        const k = Math.max(1, fit.rows.findIndex(([at]) => at >= T));
        const [[x0, y0], [x1, y1]] = [fit.rows[k - 1] as readonly [number, number], fit.rows[k] as readonly [number, number]];
        return y0 + ((y1 - y0) * (T - x0)) / (x1 - x0);
      };
      for (let T = 293.4; T < 363; T += 3.7) {
        const value = propertyAt(material, fit.property, { temperature: T, pressure: 2e5 })?.value ?? Number.NaN;
        expect(Math.abs(typed(T) / value - 1), `${name} ${fit.property} ${T}`).toBeLessThan(0.0103);
      }
    }
  });
});

describe('limits and refusals', () => {
  it('a form that is too poor is missed, and says by how much', () => {
    const fit = fitOf(made((T) => 1e-3 * Math.exp(-(T - 250) / 20), { phase: 'liquid' }), 'power', 0.005);
    expect(fit.outcome).toBe('missed');
    expect(fit.largestError).toBeGreaterThan(0.1);
  });

  it('says what happens beyond the range', () => {
    const water = loadMaterial('water');
    const [viscosity] = sampledOver(water, parseRange('20 degC .. 90 degC, 2 bar'), ['viscosity']);
    expect(fitOf(viscosity as Sampled, 'polynomial', 0.02).safe.beyond).toMatch(/turns at|falls below zero at/);
  });

  it.each([
    ['across-a-phase-line', () => sampledOver(loadMaterial('water'), parseRange('20 degC .. 150 degC, 2 bar'), ['density'])],
    ['not-covered', () => sampledOver(loadMaterial('water'), parseRange('-20 degC .. 20 degC, 2 bar'), ['density'])],
    ['no-range', () => sampledOver(loadMaterial('water'), parseRange('20 degC, 2 bar'), ['density'])],
    ['no-such-fit', () => fitOf(made(() => 1, { property: 'density' }), 'sutherland', 0.01)],
    ['no-such-fit', () => fitOf(made(() => 1), 'vogel', 0.01)],
    ['no-such-fit', () => fitOf(made((T) => T - 300), 'polynomial', 0.01)],
    ['wrong-within', () => fitOf(made(() => 1), 'polynomial', 0)],
  ] as const)('%s', (code, task) => expect(codeOf(task)).toBe(code));
});
