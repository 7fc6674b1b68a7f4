import { readdirSync, readFileSync } from 'node:fs';
import { beforeAll, describe, expect, it } from 'vitest';
import { vocabulary } from '../../src/assemble/index.ts';
import { readCase } from '../../src/case/index.ts';
import { flows } from '../../src/flows/index.ts';
import { plan } from '../../src/plan/index.ts';
import { planned, type Planned } from './expert.ts';

interface Row {
  readonly case: string;
  /** An id, or a difference or ratio of two. */
  readonly quantity: string;
  readonly value: number;
  readonly formula: string;
  readonly source: string;
  readonly rel: number;
  readonly why: string;
}

// Made by hand.py beside this file: formulas and property values of others; each row holds its source and the reason of its tolerance.
const rows = JSON.parse(readFileSync(new URL('./hand.json', import.meta.url), 'utf8')) as readonly Row[];
const names = readdirSync(new URL('../../examples', import.meta.url)).filter((f) => f.endsWith('.case.yaml')).map((f) => f.replace('.case.yaml', ''));

/** Reads `a`, `a - b` or `a / b`, each an id or a number. */
function read(on: Planned, expression: string): number {
  const [left = '', sign, right = ''] = expression.split(' ');
  const of = (term: string): number => (/^\d/.test(term) ? Number(term) : on.n(term));
  if (sign === undefined) return of(left);
  return sign === '-' ? of(left) - of(right) : of(left) / of(right);
}

it.each(Object.values(flows))('each answer that $id offers is estimated in an example of it', async ({ id, answers }) => {
  const mine = names.filter((name) => readFileSync(new URL(`../../examples/${name}.case.yaml`, import.meta.url), 'utf8').includes(`\nflow: ${id}\n`));
  const made = await Promise.all(mine.map((name) => planned(name, [], '../../examples')));
  expect(answers.filter((answer) => made.every((one) => !Number.isFinite(one.n(answer))))).toEqual([]);
});

it('the opening caution of a plan names the spread of its target, whatever sections are asked for', async () => {
  const name = new URL('../../examples/rinse-line.case.yaml', import.meta.url);
  const made = await plan(readCase(readFileSync(name), 'rinse-line.case.yaml', vocabulary), { version: '0', sections: ['cautions'] });
  const opening = made.sections.cautions.lines[0]?.text;
  expect(opening).toContain('is put at {outletTemperature}.'); // printed with its spread
  const { value, low, high } = made.quantities['outletTemperature'] ?? {};
  expect(low).toBeLessThan(value as number);
  expect(high).toBeGreaterThan(value as number);
});

it('flip values of a heated slot are sought down to pressures at which no liquid boils', async () => {
  const name = new URL('./heated-slot.case.yaml', import.meta.url);
  const made = await plan(readCase(readFileSync(name), 'heated-slot.case.yaml', vocabulary), { version: '0', flips: true });
  // Saturation at 130 degC is 2.70 bar (IAPWS-IF97): the wall stops boiling a little below, within the superheat of the onset.
  const flip = made.effects.find((e) => e.id === 'boiling')?.flipsAt?.find((f) => f.path === 'fluid.pressure');
  expect(flip?.value).toBeGreaterThan(1.9e5);
  expect(flip?.value).toBeLessThan(3.9e5);
});

it('every example has numbers worked out by hand', () => expect([...new Set(rows.map((r) => r.case))].sort()).toEqual([...names].sort()));

describe.each(names)('%s', (name) => {
  let on: Planned;
  beforeAll(async () => { on = await planned(name, [], '../../examples'); });

  it.each(rows.filter((r) => r.case === name))('$quantity: $formula', ({ quantity, value, rel, why }) => {
    const ours = read(on, quantity);
    expect(Math.abs(ours / value - 1), `ours ${ours}, by hand ${value}; ${why}`).toBeLessThanOrEqual(rel);
  });
  it('contradicts itself nowhere', () => expect(on.plan.contradictions).toEqual([]));
  it('gives a verdict or the missing inputs on every effect', () => {
    expect(on.plan.effects.filter((e) => e.verdict === 'undecided' && e.judged && (e.missing ?? []).length === 0).map((e) => e.id)).toEqual([]);
    expect(on.plan.effects.filter((e) => e.deciding !== undefined && !Number.isFinite(e.deciding.value)).map((e) => e.id)).toEqual([]);
  });
  it('keeps every number within its spread, and the spread below a factor of 30', () => {
    const spread = Object.entries(on.plan.quantities).flatMap(([id, { value, low, high }]) => (typeof value === 'number' && low !== undefined && high !== undefined ? [{ id, value, low, high }] : []));
    expect(spread.filter(({ value, low, high }) => !(low <= value && value <= high))).toEqual([]);
    expect(spread.filter(({ low, high }) => low > 0 && high / low > 900)).toEqual([]);
  });
});

// What an engineer would decide on the examples, with the reason.
describe('decisions on the examples', () => {
  it.each([
    ['rinse-line', 'turbulence', 'include', 'Re 22 650'],
    ['rinse-line', 'variable-viscosity', 'include', 'water at 46 and 20 degC: a ratio of 1.7'],
    ['rinse-line', 'conjugate', 'leave-out', '1.5 mm of copper against a film of 2300 W/(m2 K)'],
    ['supply-duct', 'conjugate', 'include', 'the wool holds most of the resistance'],
    ['supply-duct', 'compressibility', 'leave-out', 'Mach 0.014'],
    ['oil-gap', 'turbulence', 'leave-out', 'Re 500 on twice the gap'],
    ['oil-gap', 'entrance-effects', 'include', 'Gz 284'],
    ['battery-cover', 'radiation', 'include', 'a third of the heat'],
    ['glazed-door', 'radiation', 'include', 'two thirds of the heat'],
    ['warm-radiator', 'radiation', 'include', 'two thirds of the heat'],
    ['sampling-rod', 'unsteadiness', 'include', 'vortices from Re 47 on'],
    ['sampling-rod', 'turbulence', 'leave-out', 'laminar wake below Re 190'],
    ['lamp-step', 'unsteadiness', 'leave-out', 'steady laminar eddy'],
    ['bead-dryer', 'porous-inertia', 'include', 'the square term of Ergun is the larger one'],
    ['wet-panel', 'species', 'include', 'the evaporation is the question'],
    ['wet-panel', 'stefan-flow', 'borderline', 'B 0.087 between 0.02 and 0.1'],
    ['wet-panel', 'turbulence', 'leave-out', 'Re 37 000 on a plate'],
    ['wet-panel', 'soret', 'leave-out', '12 K between molecules of like weight'],
    ['lined-tube', 'species', 'include', 'what dissolves is the question'],
    ['lined-tube', 'stefan-flow', 'leave-out', 'B 0.003'],
    ['lined-tube', 'entrance-effects', 'include', 'Gz 23 500: the layer of the acid stays thin'],
    ['lined-tube', 'dispersion', 'leave-out', 'the tube is resolved across its section'],
    ['lined-tube', 'reaction', 'leave-out', 'none is named'],
  ] as const)('%s: %s %s (%s)', async (name, effect, verdict, _why) => {
    const on = await planned(name, [], '../../examples');
    expect(on.plan.effects.find((e) => e.id === effect)?.verdict).toBe(verdict);
  });
});
