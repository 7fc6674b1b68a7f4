import type { Assembled } from '../assemble/index.ts';
import type { Decisions } from '../decide/index.ts';
import type { Cell, Check, Line, PlanChoice, PlanEffect, PlanRung, Section, Table } from './types.ts';

/** What every stage of the plan stands on. A stage reads it and writes words; numbers are quantities named in braces. */
export interface Ground {
  readonly assembled: Assembled;
  readonly decisions: Decisions;
  readonly ladder: readonly PlanRung[];
  /** Whether a quantity can be had. */
  has(id: string): boolean;
  number(id: string): number | undefined;
  word(id: string): string | undefined;
  effect(id: string): PlanEffect;
  choice(id: string): PlanChoice;
  /** The model carries the effect: include, borderline kept in the first run, undecided. */
  kept(id: string): boolean;
}
/** One stage: a section of the plan and the lines it puts on the checklist. */
export interface StageResult extends Section {
  readonly checklist?: readonly Check[];
}
export type Stage = (on: Ground) => StageResult;

/** Ids that a text names in braces. */
export const idsIn = (text: string): string[] => [...text.matchAll(/\{([^{}]+)\}/g)].map((m) => m[1] as string);

/** A line of text; `{id}` names the quantities in it. */
function line(text: string): Line {
  return { text, quantities: idsIn(text) };
}

/** Lines of which those without text are left out. */
export function lines(...texts: readonly (string | false | undefined)[]): Line[] {
  return texts.filter((t): t is string => typeof t === 'string' && t !== '').map(line);
}

/** A table; rows that are false are left out. */
export function table(title: string, columns: readonly string[], rows: readonly (readonly Cell[] | false | undefined)[]): Table {
  return { title, columns, rows: rows.filter((r): r is readonly Cell[] => Array.isArray(r)) };
}
