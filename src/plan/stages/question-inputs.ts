import { lines, type Ground } from '../ground.ts';
import { listed, percent } from '../say.ts';
import { targetSpreads } from '../target-spread.ts';
import type { Line, Table } from '../types.ts';

/** Inputs that decisions wait for, with the decisions, those that settle most first. */
export function missingInputs(on: Ground): { readonly path: string; readonly effects: readonly string[] }[] {
  const waiting = new Map<string, string[]>();
  for (const e of on.decisions.effects) if (e.judged && e.verdict === 'undecided') for (const path of e.missing ?? []) waiting.set(path, [...(waiting.get(path) ?? []), e.id]);
  return [...waiting].map(([path, effects]) => ({ path, effects })).sort((a, b) => b.effects.length - a.effects.length || (a.path < b.path ? -1 : 1));
}

/** Paths as words: alternatives joined by `|` become `a or b`. */
const either = (path: string): string => listed(path.split('|'), 'or');

export function inputLines(on: Ground): Line[] {
  const missing = missingInputs(on);
  const { case: given, ranges } = on.assembled;
  const exact = [...given.entries.values()].filter((e) => e.kind === 'quantity' && e.spread === undefined && e.range === undefined && on.has(e.path) && !/^(computing|choices|targets|format)\b/.test(e.path) && moves(on, e.path));
  const first = missing[0];
  return lines(
    first !== undefined && `Worth asking first: ${either(first.path)}; ${first.effects.length === 1 ? `the decision on ${first.effects[0]} hangs on it` : `the decisions on ${listed(first.effects)} hang on it`}.`,
    exact.length > 0 && ranges.length === 0 && `Given without a spread, and so taken as exact: ${listed(exact.map((e) => e.path))}. The spread of every estimate is too narrow by what they have.`,
  );
}

/** A target follows from the input. */
function moves(on: Ground, path: string): boolean {
  const { workings, targets } = on.assembled;
  const from = workings.index.get(path);
  if (from === undefined) return false;
  const reach = workings.followers(from);
  return targets.some((t) => t.computed && reach.includes(workings.index.get(t.quantity) ?? -1));
}

export function inputTables(on: Ground): Table[] {
  const { case: given } = on.assembled;
  const missing = missingInputs(on);
  const shares = targetSpreads(on.assembled)[0]?.from ?? [];
  const rows = [...given.entries.values()].filter((e) => e.kind === 'quantity' && on.has(e.path) && !/^(targets|format)\b/.test(e.path)).map((e) => {
    const share = shares.find((s) => s.kind === 'input' && s.label === e.path)?.share;
    return [e.path, { id: e.path }, e.range !== undefined && !e.range.bounds ? 'operating range' : e.spread !== undefined || e.range !== undefined ? 'with spread' : 'no spread', share === undefined ? '' : percent(share)];
  });
  return [
    ...(rows.length === 0 ? [] : [{ title: 'Inputs given', columns: ['path', 'value', 'how well', 'share of the spread of the first target'], rows }]),
    ...(missing.length === 0 ? [] : [{ title: 'Inputs missing, and what waits for them', columns: ['path', 'decisions open', 'which'], rows: missing.map((m) => [either(m.path), String(m.effects.length), listed(m.effects)]) }]),
  ];
}
