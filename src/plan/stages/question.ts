import { stepOf } from '../../workings/index.ts';
import { lines, type Ground, type StageResult } from '../ground.ts';
import { aFlow, authors, listed, nameOf, percent } from '../say.ts';
import { targetSpreads } from '../target-spread.ts';
import type { Check, Line, Table } from '../types.ts';
import { inputLines, inputTables } from './question-inputs.ts';
import { rangeLines, rangeTables } from './question-range.ts';
import { rigour } from './question-rigour.ts';

/** What is asked, how exactly, what is known already, and whether a field simulation is needed for it. */
export function question(on: Ground): StageResult {
  const { case: given, targets } = on.assembled;
  return {
    lines: [
      ...lines(given.purpose === undefined
        ? 'No purpose is stated: without the decision that the run serves, nothing tells when it is good enough. Write it under purpose.'
        : `The decision to serve: ${given.purpose}`),
      ...lines(targets.length === 0 && 'No target is named: every price below stands for nothing. Name at least one quantity with place, mean and within.'),
      ...targets.flatMap((t) => aboutTarget(on, t)),
      ...rigour(on),
      ...inputLines(on),
      ...rangeLines(on),
    ],
    tables: [...targetTable(on), ...budgetTable(on), ...inputTables(on), ...rangeTables(on)],
    checklist: targets.filter((t) => t.computed).map((t): Check => ({ id: `estimate-${t.id}`, stage: 'question', text: `hold the ${nameOf(on, t.quantity)} against the hand estimate; a difference beyond both spreads is explained before the result is used`, where: t.place ?? 'where the target stands' })),
  };
}

type Target = Ground['assembled']['targets'][number];

function aboutTarget(on: Ground, t: Target): Line[] {
  if (!t.computed) return lines(`${t.quantity} is not computed and has no price: ${lackOf(on, t)}. The run alone answers it.`);
  const spread = targetSpreads(on.assembled).find((s) => s.id === t.id);
  const name = nameOf(on, t.quantity);
  if (stepOf(on.assembled.workings, t.quantity)?.source === 'the case') return lines(`The ${name} is stated by the case, {${t.quantity}}: ${t.mean === 'peak' || t.mean === 'rms' ? `its ${t.mean} has no estimate here, and the run alone answers it` : 'nothing is left to compute'}.`);
  const missing = [...(t.place === undefined ? ['place'] : []), ...(t.mean === undefined ? ['mean'] : [])];
  const from = (spread?.from ?? []).slice(0, 3).filter((f) => f.share >= 0.02).map((f) => `${percent(f.share)} from ${f.kind === 'scatter' ? `the scatter of the law (${authors(f.label)})` : f.kind === 'property' ? `the ${nameOf(on, f.label)} of the fluid` : f.label}`);
  return [
    ...lines(
      `Hand estimate of the ${name}: {${t.quantity}}, asked to {${t.id}.accuracy}${t.within === undefined ? ' (nothing is asked; the default is taken)' : ''}.${from.length === 0 ? ' No input, property or law of it carries a spread: give the spreads of the inputs, else the estimate looks better than it is.' : ` Of the square of its spread ${listed(from)}.`}`,
      missing.length > 0 && `The ${name} is asked without ${listed(missing, 'or')}: two readers would take two numbers out of one field.`,
      t.mean === 'peak' && `A peak of the ${name} needs a mesh at the peak and a rate of sampling for it; a mean forgives what a peak does not.`,
    ),
    ...need(on, t, name),
  ];
}

function lackOf(on: Ground, t: Target): string {
  if (t.nearest !== undefined) return t.nearest.length === 0 ? 'no quantity has that name' : `no quantity has that name; near to it ${t.nearest.length === 1 ? 'is' : 'are'} ${listed(t.nearest)}`;
  return `its inputs are not complete in ${aFlow(on)} as the case stands`;
}

/** Whether a run is needed for one target, by number. */
function need(on: Ground, t: Target, name: string): Line[] {
  const at = (key: string): number | undefined => on.number(`${t.id}.${key}`);
  const id = (key: string): string => `{${t.id}.${key}}`;
  const above = (a: string, b: string): boolean => (at(a) ?? Number.NaN) >= (at(b) ?? Number.NaN);
  if (t.mean === 'peak' || t.mean === 'rms' || on.word('flow') === 'general') return lines(`A field simulation is called for: ${on.word('flow') === 'general' ? 'the flow has no laws of its own here' : `a ${t.mean} has no closed form`}; the estimate serves as a check.`);
  if (at('standOff') !== undefined && above('standOff', 'standOffNeeded')) {
    return lines(`For this decision no field simulation is needed: {${t.quantity}} stands ${id('margin')} ${(on.number(t.quantity) ?? 0) > (at('limit') ?? 0) ? 'above' : 'below'} the limit ${id('limit')}, ${id('standOff')} times its own half-width where ${id('standOffNeeded')} would do. A run only tells where, not whether.`);
  }
  const close = at('standOff') === undefined ? '' : `The estimate stands only ${id('standOff')} half-widths off the limit ${id('limit')} where ${id('standOffNeeded')} are needed: it does not decide. `;
  if (at('halfWidth') === undefined) return lines(close !== '' && close);
  if (above('enough', 'halfWidth')) return lines(`${close}The hand estimate knows the ${name} to ${id('halfWidth')}, and ${id('enough')} is as good as a run: balances and laws answer, a field simulation is not needed for this number.`);
  if (at('reach') === undefined) return lines(`${close}Whether a run would do better than the estimate cannot be told before the regime is known; the estimate is ${id('widthRatio')} times as wide as the accuracy asked.`);
  const parts = `inputs and properties move the ${name} by ${id('inputWidth')}${(at('model') ?? 0) > 0 ? `, a closure by about ${id('model')}` : ''}`;
  if (above('reach', 'accuracy')) return lines(`${close}As asked it cannot be had: ${parts}, so that the best run reaches ${id('reach')} against ${id('accuracy')} asked. ${cheapest(on, t)}`);
  if (above('reach', 'worthwhile')) return lines(`${close}A run adds little: ${parts}, so that at best it knows it to ${id('reach')}, and the estimate to ${id('halfWidth')}. ${cheapest(on, t)}`);
  return lines(`${close}A field simulation is called for: the estimate is ${id('widthRatio')} times as wide as the accuracy asked; ${parts}, and a run reaches ${id('reach')} at best, ${id('gain')} times narrower than the estimate.`);
}

function cheapest(on: Ground, t: Target): string {
  const first = targetSpreads(on.assembled).find((s) => s.id === t.id)?.from.find((f) => f.kind === 'input');
  return first === undefined ? 'Ask for a difference or a ratio, whose shared errors cancel, or widen within.' : `Measure ${first.label} first, ask for a difference or a ratio, or widen within.`;
}

function targetTable(on: Ground): Table[] {
  const { targets } = on.assembled;
  if (targets.length === 0) return [];
  return [{
    title: 'Targets',
    columns: ['target', 'place', 'mean', 'asked within', 'hand estimate', 'accuracy asked'],
    rows: targets.map((t) => [t.computed ? nameOf(on, t.quantity) : t.quantity, t.place ?? 'not stated', t.mean ?? 'not stated', t.within?.written ?? 'not stated', t.computed ? { id: t.quantity } : 'not computed', on.has(`${t.id}.accuracy`) ? { id: `${t.id}.accuracy` } : 'none']),
  }];
}

/** The accuracy asked, pushed backwards to what each part may use of it. */
function budgetTable(on: Ground): Table[] {
  const run = on.choice('run-character')?.chosen ?? 'none';
  const inTime = run === 'transient' || run === 'march';
  const keys = ['mesh', 'iteration', 'domain', ...(inTime ? ['step', 'averaging'] : []), 'rest'];
  const rows = on.assembled.targets.filter((t) => on.has(`${t.id}.accuracy`)).flatMap((t) => keys.map((key) => [nameOf(on, t.quantity), nameOf(on, `${t.id}.${key}`), { id: `${t.id}.${key}` }, limitOf[key] as string]));
  return rows.length === 0 ? [] : [{ title: 'What each part may use of the accuracy asked', columns: ['target', 'part', 'may leave', 'is met when'], rows }];
}
const limitOf: Readonly<Record<string, string>> = {
  mesh: '1.25 times the extrapolated error of the finest mesh is below it',
  iteration: 'two tolerances, ten apart, differ by less',
  domain: 'far ends moved out by half move the target by less',
  step: 'half the step moves the target by less',
  averaging: 'the 95 % band of the mean is narrower',
  rest: 'spreads of inputs, properties and closure, added by squares, stay below it',
};
