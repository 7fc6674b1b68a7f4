import { readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { beforeAll, describe, expect, it } from 'vitest';
import type * as Library from '../../src/index.ts';

const at = (path: string): string => fileURLToPath(new URL(`../../${path}`, import.meta.url));
const example = at('examples/rinse-line.case.yaml');
let lib: typeof Library;
beforeAll(async () => {
  lib = (await import(new URL('../../dist/index.js', import.meta.url).href)) as typeof Library; // built by npm test
});
/** A number that must be there. */
const had = (value: number | undefined): number => value ?? Number.NaN;

describe('the built library', () => {
  it('plans a case, the same twice, with verdicts and numbers', async () => {
    const on = lib.readCase(readFileSync(example), 'rinse-line.case.yaml', lib.vocabulary);
    const made = await lib.plan(on, { version: 'test' });
    expect(JSON.stringify(await lib.plan(on, { version: 'test' }))).toBe(JSON.stringify(made));
    expect(made.contradictions).toEqual([]);
    expect(made.effects.find(({ id }) => id === 'turbulence')?.verdict).toBe('include');
    const { reynolds, density, speed, length, viscosity } = made.quantities;
    expect(Number(reynolds?.value)).toBeCloseTo((Number(density?.value) * Number(speed?.value) * Number(length?.value)) / Number(viscosity?.value), 6);
    const text = lib.screen(lib.planDocument(made, lib.writingOf(made.quantities, on)), lib.writingOf(made.quantities, on), { file: example });
    expect(text.split('\n').length).toBeLessThanOrEqual(48);
  });

  it('settles a case alone: numbers, where they come from, what they do over a range, where a verdict turns', () => {
    const { assembled, rules, targets, settle } = lib.settleCase(lib.readCaseFile(example, lib.vocabulary));
    const { workings } = assembled;
    const drop = had(workings.get('pressureDrop'));
    expect(lib.trace(workings, 'pressureDrop').map((step) => step.id)).toContain('inlet.speed');
    const spread = lib.spreads(workings, ['pressureDrop']).get('pressureDrop');
    expect(had(spread?.low)).toBeLessThan(drop);
    expect(had(spread?.high)).toBeGreaterThan(drop);
    const drops = lib.sweep(workings, 'inlet.speed', [0.3, 0.4, 0.5], (w) => had(w.get('pressureDrop')), settle);
    expect(drops).toEqual(drops.toSorted((a, b) => a - b));
    expect(had(workings.get('pressureDrop')) / drop).toBeCloseTo(1, 9); // loops close to 1e-10
    const turns = lib.flips(workings, rules, targets, [{ path: 'inlet.speed', lo: 0.01, hi: 1 }]).get('turbulence') ?? [];
    // Transitional below Re 4000: at 25 mm and 65 degC, nu = 4.4e-7 m^2/s, between 0.03 and 0.08 m/s.
    expect(turns.some(({ value }) => value > 0.02 && value < 0.08)).toBe(true);
  });

  it('has materials, units, known answers, groups, results', async () => {
    const water = lib.loadMaterial('water');
    // IAPWS R6-95 at 60 degC and 2 bar: 983.24 kg/m^3.
    expect(lib.propertyAt(water, 'density', lib.stateOf(water, lib.parseState('60 degC, 2 bar')))?.value).toBeCloseTo(983.24, 1);
    expect(lib.materialNames()).toContain('water');
    expect(lib.convert('12 gal/min', 'L/s').value).toBeCloseTo(0.757082, 6);
    expect(lib.readQuantity('25 mm', { unit: 'm' }).value).toBe(0.025);
    expect(lib.references.map(({ id }) => id)).toContain('poiseuille-pipe');
    const graetz = lib.findReference('graetz-pipe');
    expect(lib.evaluateReference(graetz, lib.readGiven(graetz, 'peclet = 1000, graetz = 20').given).problems).toEqual([]);
    const { groups } = await lib.piGroups([{ name: 'rho', dimension: lib.dimensionOf('kg/m^3') }, { name: 'U', dimension: lib.dimensionOf('m/s') }, { name: 'L', dimension: lib.dimensionOf('m') }, { name: 'mu', dimension: lib.dimensionOf('Pa s') }]);
    expect(groups).toHaveLength(1);
    // Second order made exactly: 1 + h^2 at h = 1, 2, 4.
    expect(lib.grids('size [m],drop [Pa]\n1,2\n2,5\n4,17\n', 'made.csv').targets[0].extrapolated).toBeCloseTo(1, 9);
    expect(Object.keys(lib.shippedRules().effects)).toContain('buoyancy');
    expect(() => lib.compileRules([{ file: 'own.json', text: '{ "effect": "buoyancy" }' }])).toThrow(lib.Problem);
    expect(JSON.stringify(lib.jsonSchema(lib.vocabulary))).toContain('inlet');
    expect(lib.caseTemplate(lib.vocabulary, 'pipe')).toContain('flow: pipe');
  });

  it('complains with data: where, what is expected, the nearest name', () => {
    try {
      lib.readCase('format: 1\nflow: pipe\nsizes: { diametre: 25 mm }\nfluid: { material: water }\n', 'x.yaml', lib.vocabulary);
      expect.unreachable();
    } catch (error) {
      expect(error).toBeInstanceOf(lib.Problem);
      expect((error as Library.Problem).list).toContainEqual(expect.objectContaining({ code: 'unknown-key', file: 'x.yaml', line: 3, nearest: 'diameter' }));
    }
  });
});
