import { describe, expect, it } from 'vitest';
import { screen, writingOf } from '../../src/report/index.ts';
import type { Plan } from '../../src/plan/index.ts';
import { planFixture } from './plan-fixture.ts';

const shown = (plan: Plan, options: { purpose?: string } = {}): string => screen(plan, writingOf(plan.quantities), { file: 'rinse-line.case.yaml', ...options });
const expectFits = (text: string): void => {
  expect(text.split('\n').length).toBeLessThanOrEqual(48);
  for (const line of text.split('\n')) expect(line.length, line).toBeLessThanOrEqual(80);
  expect(text).not.toMatch(/[\u0000-\u0009\u000b-\u001f\u007f-\u009f]/);
};

describe('the screen', () => {
  it('fits, and is the same twice', () => {
    const text = shown(planFixture(), { purpose: 'Does the water leave the line below 50 degC?' });
    if (process.env['SHOW'] !== undefined) process.stdout.write(`${text}\n`);
    expectFits(text);
    expect(shown(planFixture(), { purpose: 'Does the water leave the line below 50 degC?' })).toBe(text);
  });

  it('holds what a reader needs', () => {
    const text = shown(planFixture());
    for (const piece of [
      /^Rinse water cooled in a jacketed line\n/, /Mind first +Hot water at/, /outletTemperature at outlet 326\.5 \+\/- 0\.8 K; asked within 1 K/, /lift of the line; no hand estimate; is liftForce meant\?/,
      /Include +variable-viscosity +Re 22600 \+\/- 5 %, 1\.3 times past 2300/, /Check +buoyancy +Gr\/Re 55, limits 20 and 100; price \+12 % of T_out/, /Open +roughness +needs wall\.sandGrain or wall\.Ra/,
      /first cell 42\.0 um/, /growth 1\.2/, /core cell 1\.02 mm; cells 61000 \/ 206000 \/ 694000/, /Cost +medium mesh \S+ core hours \+\/- .*, done in 7\.5 h;/, /fine mesh 1200 core hours; all runs 1700 core hours\n/, /step 2\.55 ms; bound by convection through a cell/, /poiseuille-pipe +0\.032, passes 0\.03168 \.\. 0\.03232/, /1 assumed, not given: gravity 9\.807 m\/s\^2/,
      /outside the range of their formula.*nusseltPlain/s, /--full/, /--into DIR/, /runbrief trace/,
    ]) expect(text).toMatch(piece);
    expect(text).not.toContain('inlet-turbulence'); // does not apply
  });

  it('cuts the least important and says how many', () => {
    const many = planFixture();
    const crowd = Array.from({ length: 30 }, (_, i) => ({ ...(many.effects[0] as Plan['effects'][number]), id: `effect-${i}`, deciding: { ...(many.effects[0] as Plan['effects'][number]).deciding as NonNullable<Plan['effects'][number]['deciding']>, margin: 100 - i } }));
    const text = shown({ ...many, effects: [...many.effects, ...crowd], contradictions: Array.from({ length: 9 }, (_, i) => ({ code: 'c', path: 'inlet.speed', says: `the case says ${i} and also says not ${i}, at some length so that it has to be broken`, effect: 'the flow rate is off', cure: 'say it once' })) });
    expectFits(text);
    expect(text).toMatch(/and \d+ more \(--full\)/);
    expect(text).toMatch(/Include +variable-viscosity/); // nearest to its limit
    expect(text).toContain('poiseuille-pipe');
    expect(text).toContain('At odds');
  });

  it('passes on nothing that a terminal acts on', () => {
    const evil = 'x\u001b[2J\u001b]0;owned\u0007\u009b31m\u202e\r\nsecond line';
    const base = planFixture();
    const text = shown({
      ...base,
      case: { ...base.case, title: evil, file: evil },
      targets: [{ id: 'targets.0', quantity: evil, place: evil, within: evil, computed: false }],
      contradictions: [{ code: 'c', path: evil, says: evil, effect: evil, cure: evil }],
      effects: [{ ...(base.effects[3] as Plan['effects'][number]), missing: [evil], because: evil }],
      quantities: { ...base.quantities, regime: { ...(base.quantities['regime'] as Plan['quantities'][string]), value: evil } },
    }, { purpose: evil });
    expectFits(text);
  });

  it('stays small where almost nothing is known', () => {
    const base = planFixture();
    const text = shown({ ...base, quantities: {}, effects: [], choices: [], ladder: [], targets: [] });
    expectFits(text);
    expect(text).not.toMatch(/NaN|undefined|not known;/);
  });
});
