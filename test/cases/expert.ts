import { readFileSync } from 'node:fs';
import { vocabulary } from '../../src/assemble/index.ts';
import { readCase } from '../../src/case/index.ts';
import { plan, settleCase, type Plan } from '../../src/plan/index.ts';

/** The file of published problems: what an expert computed, decided, meshed and knew. */
export interface Expected {
  readonly cases: readonly ExpertCase[];
}
export interface ExpertCase {
  readonly id: string;
  readonly groups: readonly { readonly symbol: string; readonly score: boolean; readonly score_value: number; readonly tolerance_pct: number }[];
  readonly decisions: Readonly<Record<string, { readonly expected: 'include' | 'leave-out' | 'grey'; readonly ground: string }>>;
  readonly mesh: readonly Fact[];
  readonly time: readonly Fact[];
  readonly known_answers: readonly { readonly quantity: string; readonly value: number; readonly unit: string; readonly uncertainty: string }[];
}
export interface Fact {
  readonly quantity: string;
  readonly value: number;
  readonly tolerance_factor: number;
  readonly score: boolean;
}

export const expected = JSON.parse(readFileSync(new URL('../checks/values/expert-cases-open.json', import.meta.url), 'utf8')) as Expected;

/** A planned case: its plan, and any number of its graph. */
export interface Planned {
  readonly plan: Plan;
  readonly n: (id: string) => number;
  readonly word: (id: string) => string | undefined;
  readonly regions: readonly string[];
}

/** Plans a case file of this folder, with pieces of its text replaced. */
export async function planned(name: string, changes: readonly (readonly [string, string])[] = [], folder = '.'): Promise<Planned> {
  const file = new URL(`./${folder}/${name}.case.yaml`, import.meta.url);
  let text = readFileSync(file, 'utf8');
  for (const [from, to] of changes) {
    if (!text.includes(from)) throw new Error(`${name} does not hold ${from}`);
    text = text.replace(from, to);
  }
  const on = readCase(Buffer.from(text), `${name}.case.yaml`, vocabulary);
  const made = await plan(on, { version: '0' });
  const { workings, flow } = settleCase(on).assembled;
  return {
    plan: made,
    word: (id) => workings.word(id),
    regions: flow.regions.filter((r) => made.quantities[`cellsAcross@${r}`] !== undefined),
    n: (id) => {
      const inPlan = made.quantities[id]?.value;
      const value = typeof inPlan === 'number' ? inPlan : workings.get(id);
      if (value === undefined) throw new Error(`${name}: ${id} cannot be had`);
      return value;
    },
  };
}
