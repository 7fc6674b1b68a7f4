import { readdirSync, readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import * as laws from '../../src/quantities/correlations/index.ts';

type Call = (of: Record<string, unknown>) => unknown;
const folder = new URL('../../src/quantities/correlations/', import.meta.url);
const files = [...readdirSync(folder).map((f) => new URL(f, folder)), new URL('../../src/flows/general-laws.ts', import.meta.url)];
const modules = (await Promise.all(files.map((file) => import(file.href)))) as Record<string, unknown>[];
const functions = Object.assign({}, ...modules) as Readonly<Record<string, Call>>;
const examples = files.flatMap((file) => [...readFileSync(file, 'utf8').matchAll(/@example\s+(\w+)\((\{.*\})\)(?:\.(\w+))? \/\/ ([\d.eE+-]+)/g)].map((m) => ({ name: m[1] as string, argument: m[2] as string, part: m[3], printed: m[4] as string })));

/** The argument of an example, written as an object literal of numbers, words and objects. */
const read = (text: string): Record<string, unknown> => JSON.parse(text.replaceAll(/(\d+) \/ (\d+)/g, (_, a: string, b: string) => String(Number(a) / Number(b))).replaceAll(/(\w+): /g, '"$1": ').replaceAll("'", '"')) as Record<string, unknown>;
/** Half of the last printed digit. */
const half = (printed: string): number => 0.51 * 10 ** -(printed.split('.')[1]?.length ?? 0);

/** Plain arithmetic that the laws share. */
const helpers = ['between', 'moleculeOf'];

describe('examples in the docstrings', () => {
  it('are there for every correlation', () => {
    const without = Object.entries(functions).filter(([name, f]) => typeof f === 'function' && !helpers.includes(name) && !examples.some((e) => e.name === name)).map(([name]) => name);
    expect(without).toEqual([]);
  });
  it.each(examples)('$name($argument) = $printed', ({ name, argument, part, printed }) => {
    const out = functions[name]?.(read(argument));
    const value = part === undefined ? out : (out as Record<string, unknown>)[part];
    expect(Math.abs((value as number) - Number(printed))).toBeLessThanOrEqual(half(printed));
  });
});

interface Row { readonly fn: string; readonly inputs: Record<string, unknown>; readonly value: number; readonly rtol: number; readonly why: string }
const { source, rows } = JSON.parse(readFileSync(new URL('../flows/independent.json', import.meta.url), 'utf8')) as { source: string; rows: Row[] };

describe(`the same laws by ${source}`, () => {
  it.each(rows)('$fn $inputs', ({ fn, inputs, value, rtol }) => expect(Math.abs((functions[fn]?.(inputs) as number) / value - 1)).toBeLessThanOrEqual(rtol));
});

describe('limits', () => {
  it('Colebrook satisfies its own equation and meets the fully rough limit', () => {
    const [reynolds, relativeRoughness] = [2e5, 3e-3];
    const f = laws.colebrook({ reynolds, relativeRoughness });
    expect(1 / Math.sqrt(f) + 2 * Math.log10(relativeRoughness / 3.7 + 2.51 / (reynolds * Math.sqrt(f)))).toBeCloseTo(0, 12);
    expect(laws.colebrook({ reynolds: 1e12, relativeRoughness }) / laws.fullyRoughFriction({ relativeRoughness })).toBeCloseTo(1, 6);
  });
  it('the explicit laws stay within their stated distance of Colebrook over 4e3 to 1e8 and roughness to 0.05', () => {
    const worst = { haaland: 0, swameeJain: 0, churchill: 0, petukhov: 0 };
    for (let k = 0; k <= 44; k++) for (const relativeRoughness of [0, 1e-6, 1e-5, 1e-4, 1e-3, 0.01, 0.05]) {
      const reynolds = 4e3 * 10 ** (k / 10);
      const at = { reynolds, relativeRoughness };
      const off = (f: number): number => Math.abs(f / laws.colebrook(at) - 1);
      for (const [name, law] of [['haaland', laws.haaland], ['swameeJain', laws.swameeJain], ['churchill', laws.churchill]] as const) worst[name] = Math.max(worst[name], off(law(at)));
      if (relativeRoughness === 0 && reynolds < 5e6) worst.petukhov = Math.max(worst.petukhov, off(laws.petukhovFriction({ reynolds })));
    }
    expect(worst.haaland).toBeLessThan(0.0143);
    expect(worst.swameeJain).toBeLessThan(0.033);
    expect(worst.churchill).toBeLessThan(0.032);
    expect(worst.petukhov).toBeLessThan(0.039);
  });
  it('the duct polynomial stays within 0.07 % of the exact series', () => {
    for (let a = 0.05; a <= 1; a += 0.05) expect(Math.abs(laws.ductFrictionReynolds({ aspect: a }) / laws.ductFrictionSeries({ aspect: a }) - 1)).toBeLessThan(7e-4);
  });
  it('the mean laminar law meets the exact Graetz values for a developed profile', () => {
    // Eigenvalue solution, uniform wall temperature: mean Nu 33.81, 15.384, 7.155, 5.2145 at x* = 1e-4, 1e-3, 1e-2, 0.03; the law states 1.3 %.
    for (const [x, nu] of [[1e-4, 33.81], [1e-3, 15.384], [1e-2, 7.155], [0.03, 5.2145]] as const) expect(Math.abs(laws.laminarMeanNusselt({ graetz: 1 / x, prandtl: 1e12 }) / nu - 1)).toBeLessThan(0.013);
    expect(laws.laminarMeanNusselt({ graetz: 1e-3, prandtl: 5 })).toBeCloseTo(3.657, 3);
  });
  it('a still bed of one conductivity conducts like its fluid, and the wall takes part in the drag of a narrow one', () => {
    expect(laws.zehnerSchluender({ voidFraction: 0.4, conductivityRatio: 0.99999 })).toBeCloseTo(1, 3);
    // Against Ergun: +53, +27, +3 % of the linear and -17, -18, -25 % of the square term at D/d = 5, 10, large (voids 0.4).
    for (const [bedRatio, viscous, inertial] of [[5, 0.53, -0.17], [10, 0.27, -0.18], [1e9, 0.03, -0.25]] as const) {
      const d = laws.eisfeldDrag({ bedRatio, voidFraction: 0.4 });
      expect(d.viscous / 150 - 1).toBeCloseTo(viscous, 2);
      expect(d.inertial / 1.75 - 1).toBeCloseTo(inertial, 2);
    }
  });
});
