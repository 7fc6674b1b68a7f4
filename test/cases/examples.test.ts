import { readdirSync, readFileSync } from 'node:fs';
import { beforeAll, describe, expect, it } from 'vitest';
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
    for (const e of on.plan.effects) {
      if (e.verdict === 'undecided' && e.judged) expect(e.missing, e.id).not.toEqual([]);
      if (e.deciding !== undefined) expect(Number.isFinite(e.deciding.value), e.id).toBe(true);
    }
  });
  it('keeps every number within its spread, and the spread below a factor of 30', () => {
    for (const [id, q] of Object.entries(on.plan.quantities)) {
      if (typeof q.value !== 'number' || q.low === undefined || q.high === undefined) continue;
      expect(q.low <= q.value && q.value <= q.high, id).toBe(true);
      if (q.low > 0) expect(q.high / q.low, id).toBeLessThan(900);
    }
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
  ] as const)('%s: %s %s (%s)', async (name, effect, verdict, _why) => {
    const on = await planned(name, [], '../../examples');
    expect(on.plan.effects.find((e) => e.id === effect)?.verdict).toBe(verdict);
  });
});
