import { describe, expect, it } from 'vitest';
import { carreauViscosity, cassonViscosity, hanksReynolds, herschelBulkleyViscosity, metznerReedReynolds, powerLawViscosity } from '../../src/quantities/correlations/index.ts';
import { pipeWallShearRate } from '../../src/quantities/pipe-shear.ts';
import { entriesOf, given, wanted, type CheckEntry } from './properties-entries.ts';

/** What computes an entry of the published values; a consistency is printed without its unit, Pa s^n. */
const calls: readonly (readonly [RegExp, (of: (name: string) => number) => number])[] = [
  [/^A13-carreau-/, (of) => carreauViscosity({ rate: of('rate'), zero: of('mu0'), infinite: of('muinf'), time: of('lam'), index: of('n'), transition: 2 })],
  [/^A13-carreauyasuda-/, (of) => carreauViscosity({ rate: of('rate'), zero: of('mu0'), infinite: of('muinf'), time: of('lam'), index: of('n'), transition: of('a') })],
  [/^A13-casson-/, (of) => cassonViscosity({ rate: of('rate'), yieldStress: of('tauy'), plastic: of('muc') })],
  [/^A13-pl-/, (of) => powerLawViscosity({ rate: of('rate'), consistency: of('K'), index: of('n') })],
  [/^A13-hb-/, (of) => herschelBulkleyViscosity({ rate: of('rate'), yieldStress: of('tauy'), consistency: of('K'), index: of('n') })],
  [/^A13-remr-/, (of) => metznerReedReynolds({ density: of('rho'), speed: of('V'), diameter: of('D'), consistency: of('K'), index: of('n') })],
];

describe('published values of A13_rheology', () => {
  it.each(entriesOf('A13_rheology'))('$id: $source', (entry: CheckEntry) => {
    const value = calls.find(([pattern]) => pattern.test(entry.id))?.[1]((name) => given(entry, name)) ?? Number.NaN;
    const { value: expected, tolerance } = wanted(entry);
    expect(Math.abs(value - expected)).toBeLessThanOrEqual(tolerance);
  });
});

describe('shear at the wall of a pipe, against closed forms', () => {
  it.each([1, 0.75, 0.5, 0.25])('power law of index %d: (3n + 1)/(4n) 8U/D (Rabinowitsch 1929)', (n) => expect(pipeWallShearRate({ nominal: 80, stress: (rate) => 2.5 * rate ** n }) / (((3 * n + 1) / (4 * n)) * 80)).toBeCloseTo(1, 6));

  it.each([0.05, 0.3, 0.6])('Bingham with the plug at %d of the radius: U = tau_w R (1 - 4 phi/3 + phi^4/3)/(4 mu_p) (Buckingham 1921, Reiner 1926)', (phi) => {
    // tau_w = 10 Pa, mu_p = 0.1 Pa s, so that 8U/D = tau_w (1 - ...)/mu_p and g_w = (tau_w - tau_y)/mu_p
    const nominal = (10 / 0.1) * (1 - (4 * phi) / 3 + phi ** 4 / 3);
    expect(pipeWallShearRate({ nominal, stress: (rate) => 10 * phi + 0.1 * rate }) / ((10 - 10 * phi) / 0.1)).toBeCloseTo(1, 6);
  });

  // Hanks 1963 evaluated at He = 1e3, 1e4, 1e5, 1e6
  it.each([[1e3, 2290], [1e4, 3329], [1e5, 6816], [1e6, 15289]])('Bingham at He = %d leaves laminar flow at %d', (hedstrom, reynolds) => expect(hanksReynolds({ hedstrom }) / reynolds).toBeCloseTo(1, 3));
});
