import { beforeAll, describe, expect, it } from 'vitest';
import { vocabulary } from '../../src/assemble/index.ts';
import { readCase } from '../../src/case/index.ts';
import { plan } from '../../src/plan/index.ts';
import { expected, planned, type Planned } from './expert.ts';
import { effectOf, mapped, notBuilt, type Read } from './expert.map.ts';

type Outcome = 'same' | 'near' | 'wrong';
const opposite: Readonly<Record<string, string>> = { include: 'leave-out', 'leave-out': 'include', grey: 'grey' };

/** An include against a borderline is near, include against leave-out is wrong. */
const verdictOutcome = (ours: string, theirs: string): Outcome => {
  const asked = theirs === 'grey' ? 'borderline' : theirs;
  if (ours === asked) return 'same';
  return ours === 'borderline' || asked === 'borderline' ? 'near' : 'wrong';
};

async function valueOf(id: string, read: Exclude<Read, string>, nominal: Planned): Promise<number> {
  if (typeof read === 'function') return read(nominal);
  return read.read(await planned(`expert-${id}`, read.changes));
}

describe.each(expected.cases.filter((c) => notBuilt[c.id] === undefined))('$id', (one) => {
  const map = mapped[one.id];
  if (map === undefined) throw new Error(`${one.id} is neither mapped nor listed as not built`);
  let on: Planned;
  beforeAll(async () => { on = await planned(`expert-${one.id}`); });
  /** Nothing where ours is close, or stands as an exception with the value it names. */
  const fault = (key: string, close: boolean, ours: number | string): string | undefined => {
    const exception = map.exceptions?.[key];
    if (exception === undefined) return close ? undefined : `ours ${ours}`;
    if (close) return 'agrees now: take the exception away';
    const same = typeof exception.ours === 'number' ? Math.abs((ours as number) / exception.ours - 1) < 0.005 : ours === exception.ours;
    return same ? undefined : `ours ${ours}, the exception says ${exception.ours}`;
  };

  it.each(one.groups.filter((g) => g.score))('group $symbol within $tolerance_pct %', async ({ symbol, score_value: value, tolerance_pct: percent }) => {
    const read = map.groups[symbol];
    expect(read, 'mapped, or said why not').toBeDefined();
    if (read === undefined || typeof read === 'string') return;
    const ours = await valueOf(one.id, read, on);
    expect(fault(`group: ${symbol}`, Math.abs(ours / value - 1) <= percent / 100, ours)).toBeUndefined();
  });

  it.each(Object.entries(one.decisions))('decision on %s', (topic, { expected: theirs }) => {
    const effect = on.plan.effects.find((e) => e.id === (effectOf[topic] ?? topic));
    if (effect === undefined) throw new Error(`no effect for ${topic}`);
    const asked = topic === 'boussinesq-valid' ? (opposite[theirs] as string) : theirs;
    expect(fault(`decision: ${topic}`, verdictOutcome(effect.verdict, asked) !== 'wrong', effect.verdict)).toBeUndefined();
  });

  it.each([...one.mesh, ...one.time].filter((f) => f.score))('$quantity within a factor of $tolerance_factor', async ({ quantity, value, tolerance_factor: factor }) => {
    const read = map.facts[quantity];
    expect(read, 'mapped, or said why not').toBeDefined();
    if (read === undefined || typeof read === 'string') return;
    const ours = await valueOf(one.id, read, on);
    expect(fault(`fact: ${quantity}`, Math.abs(Math.log(ours / value)) <= Math.log(factor), ours)).toBeUndefined();
  });

  it.each(one.known_answers)('known answer: $quantity', async ({ quantity, value }) => {
    const read = map.answers[quantity];
    expect(read, 'mapped, or said why not').toBeDefined();
    if (read === undefined || typeof read === 'string') return;
    const within = map.within?.[quantity];
    if (within === undefined) throw new Error(`no tolerance for ${quantity}`);
    const ours = await valueOf(one.id, read, on);
    expect(fault(`answer: ${quantity}`, 'rel' in within ? Math.abs(ours / value - 1) <= within.rel : ours >= within.from && ours <= within.to, ours)).toBeUndefined();
  });

  it('has no exception that no row uses', () => {
    const keys = new Set([...one.groups.map((g) => `group: ${g.symbol}`), ...Object.keys(one.decisions).map((d) => `decision: ${d}`), ...[...one.mesh, ...one.time].map((f) => `fact: ${f.quantity}`), ...one.known_answers.map((a) => `answer: ${a.quantity}`)]);
    expect(Object.keys(map.exceptions ?? {}).filter((k) => !keys.has(k))).toEqual([]);
  });
});

// Inline as they cannot stand among planned cases.
const refused: Readonly<Record<string, string>> = {
  'shock-tube': 'flow: shock-tube\nsizes: { length: 1 m }\nfluid: { isentropicExponent: 1.4, gasConstant: 287.05 J/(kg K), medium: gas }\ninitial: { left: { pressure: 100 kPa abs, temperature: 348.37 K }, right: { pressure: 10 kPa abs, temperature: 278.7 K } }\n',
  'column-collapse': 'flow: column-collapse\nsizes: { width: 57.15 mm, height: 57.15 mm, depth: infinite }\nfluid: { material: water, pressure: 1 atm, temperature: 20 degC }\notherFluid: { material: air, meets: free-surface, surfaceTension: 0.0728 N/m }\ntime: { character: transient, duration: 0.25 s }\n',
};
describe('problems of flows that are not built', () => {
  it.each(expected.cases.filter((c) => notBuilt[c.id] !== undefined))('$id is refused, with what can be planned instead', async ({ id }) => {
    const on = readCase(Buffer.from(`format: 1\ntitle: ${id}\n${refused[id] ?? ''}`), `${id}.case.yaml`, vocabulary);
    await expect(plan(on, { version: '0' })).rejects.toMatchObject({ list: [{ code: 'flow-not-built' }] });
  });
});

// Armaly et al. 1983 and Biswas, Breuer and Durst 2004 in the file of the experts: two-dimensional below a Reynolds number of about 400.
describe('the third direction behind a step', () => {
  it.each([[389, 'leave-out'], [480, 'include']] as const)('Re_D %d: %s', async (re, verdict) => {
    const { plan: made } = await planned('expert-backstep-small', [['0.563303 m/s', `${(0.563303 * re) / 389} m/s`]]);
    expect(made.effects.find((e) => e.id === 'three-dimensionality')?.verdict).toBe(verdict);
  });
});
