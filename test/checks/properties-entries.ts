import { readFileSync } from 'node:fs';
import { unit } from '../../src/units/index.ts';

/** A published value of test/checks/values. */
export interface CheckEntry {
  readonly id: string;
  readonly quantity: string;
  readonly inputs: Readonly<Record<string, { readonly value: number; readonly unit: string } | string>>;
  readonly expected: number;
  readonly unit: string;
  readonly tolerance: { readonly rel?: number; readonly abs?: number };
  readonly source: string;
}

/** Entries of one topic. */
export const entriesOf = (topic: string): CheckEntry[] => (JSON.parse(readFileSync(new URL(`./values/${topic}.json`, import.meta.url), 'utf8')) as { entries: CheckEntry[] }).entries;

/** An input in SI; NaN where it is not a number. */
export function given(entry: CheckEntry, name: string): number {
  const one = entry.inputs[name];
  if (one === undefined || typeof one === 'string') return Number.NaN;
  const { factor, offset } = unit(one.unit);
  return one.value * factor + offset;
}

/** The expected value and the larger of the tolerances, in SI. */
export function wanted(entry: CheckEntry): { readonly value: number; readonly tolerance: number } {
  const { factor, offset } = unit(entry.unit);
  const value = entry.expected * factor + offset;
  return { value, tolerance: Math.max((entry.tolerance.rel ?? 0) * Math.abs(value), (entry.tolerance.abs ?? 0) * factor) };
}
