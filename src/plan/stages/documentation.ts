import { stepOf } from '../../workings/index.ts';
import { lines, type Ground, type StageResult } from '../ground.ts';
import { closure } from '../numbers.ts';
import { effectsOf, listed, nameOf, percent } from '../say.ts';
import { targetSpreads } from '../target-spread.ts';
import type { Cell, Check, Line, Table } from '../types.ts';
import { gapLines } from './documentation-gaps.ts';
import { reviewChecks, reviewTables, skillLine } from './documentation-review.ts';

/** What a colleague needs to review the plan: assumptions, inputs without use, sources, steps of review, and what is not covered. */
export function documentation(on: Ground): StageResult {
  const ids = used(on);
  const assumed = register(on, ids);
  return {
    lines: [...gapLines(on), ...registerLines(on, assumed), ...skillLine(on)],
    tables: [...registerTable(assumed), ...departures(on), sources(on, ids), ...reviewTables(on)],
    checklist: [
      ...assumed.filter((a) => a.weighs).map((a): Check => ({ id: `assumption-${a.id}`, stage: 'documentation', text: `confirm the ${a.name}, which is assumed: ${a.says}` })),
      ...reviewChecks(on),
    ],
  };
}

interface Assumed { readonly id: string; readonly name: string; readonly says: string; readonly value: Cell; readonly share: string; readonly weighs: boolean }

/** Ids that targets and decisions rest on. */
function used(on: Ground): string[] {
  const { workings, targets } = on.assembled;
  return closure(workings, [...targets.filter((t) => t.computed).map((t) => t.quantity), ...effectsOf(on).flatMap((e) => (e.deciding === undefined || e.applies === false ? [] : [e.deciding.quantity]))]);
}

function register(on: Ground, ids: readonly string[]): Assumed[] {
  const { workings, assumptions } = on.assembled;
  const from = targetSpreads(on.assembled)[0]?.from ?? [];
  const share = (id: string): number => from.filter((f) => f.key === id || f.key.startsWith(`${id}: `)).reduce((s, f) => Math.max(s, f.share), 0);
  const stated = assumptions.map(({ id, says }): Assumed => ({ id, name: nameOf(on, id), says, value: on.has(id) ? { id } : '', share: share(id) > 0 ? percent(share(id)) : '', weighs: share(id) >= 0.1 }));
  const had = new Set(stated.map((a) => a.id));
  const defaults = ids.flatMap((id): Assumed[] => {
    const step = stepOf(workings, id);
    if (step === undefined || step.kind !== 'assumed' || had.has(id)) return [];
    return [{ id, name: step.name, says: step.formula === 'assumed' ? 'not given' : `${step.formula} (${step.source})`, value: typeof step.value === 'number' ? { id } : step.value, share: share(id) > 0 ? percent(share(id)) : '', weighs: share(id) >= 0.1 }];
  });
  return [...stated, ...defaults];
}

function registerLines(on: Ground, assumed: readonly Assumed[]): Line[] {
  const { unused, workings } = on.assembled;
  const absent = [...workings.index.keys()].filter((id) => id.startsWith('has.') && on.word(id) === 'no').map((id) => id.slice(4));
  const heavy = assumed.filter((a) => a.weighs);
  const firstTarget = on.assembled.targets.find((t) => t.computed);
  return lines(
    heavy.length > 0 && firstTarget !== undefined && `Of what is assumed, ${listed(heavy.map((a) => `the ${a.name}`))} ${heavy.length === 1 ? 'makes' : 'make'} a tenth or more of the squared spread of the ${nameOf(on, firstTarget.quantity)}: to be confirmed before the run.`,
    unused.length > 0 && `Given, and no number of the plan follows from it: ${listed(unused)}.`,
    absent.length > 0 && `Named nowhere in the case and so absent: ${listed(absent)}.`,
  );
}

function registerTable(assumed: readonly Assumed[]): Table[] {
  if (assumed.length === 0) return [];
  return [{ title: 'Register of assumptions', columns: ['id', 'what is taken', 'value', 'status', 'share of the spread of the first target', 'who confirms'], rows: assumed.map((a) => [a.id, a.says, a.value, 'assumed', a.share, a.weighs ? 'the owner of the case, before the run' : 'the reviewer']) }];
}

/** Choices of the case that differ from the advice. */
function departures(on: Ground): Table[] {
  const rows = on.decisions.choices.filter((c) => c.advised !== undefined && c.advised !== c.chosen).map((c) => [c.title, c.advised as string, c.chosen, c.because]);
  return rows.length === 0 ? [] : [{ title: 'Departures from the advice', columns: ['choice', 'advised', 'stated in the case', 'because'], rows }];
}

function sources(on: Ground, ids: readonly string[]): Table {
  const by = new Map<string, string[]>();
  const add = (source: string, what: string): void => { by.set(source, [...(by.get(source) ?? []), what]); };
  const plain = new Set(['the case', 'definition', 'geometry', 'decided', 'material record']);
  for (const id of ids) {
    const step = stepOf(on.assembled.workings, id);
    if (step !== undefined && !plain.has(step.source)) add(step.source, step.name);
  }
  for (const e of effectsOf(on)) if (e.applies !== false) for (const s of e.sources ?? []) if (!plain.has(s)) add(s, `decision on ${e.id}`);
  // Conventions and definitions need no library; they are told apart by the year that a publication has.
  const published = [...by].filter(([source]) => /\b1[89]\d\d\b|\b20\d\d\b|ISO|IAPWS/.test(source)).sort(([a], [b]) => (a < b ? -1 : 1));
  const practice = [...new Set([...by].filter(([source]) => source.includes('common practice') && !published.some(([p]) => p === source)).flatMap(([, what]) => what))];
  const short = (what: readonly string[]): string => [...new Set(what)].slice(0, 3).join(', ') + (new Set(what).size > 3 ? ' and others' : '');
  return { title: 'Sources', columns: ['source', 'used for'], rows: [...published.map(([source, what]) => [source, short(what)]), ...(practice.length === 0 ? [] : [['common practice alone', practice.join(', ')]])] };
}
