import { readFileSync } from 'node:fs';
import { unit } from '../../src/units/index.ts';

/** One published number, as the value files hold it. */
export interface Entry {
  readonly id: string;
  readonly quantity: string;
  readonly inputs: Readonly<Record<string, string | { readonly value: number; readonly unit: string }>>;
  readonly expected: number;
  readonly unit: string;
  readonly tolerance: { readonly rel?: number; readonly abs?: number };
  readonly source: string;
}

export function entriesOf(topic: string): Entry[] {
  return (JSON.parse(readFileSync(new URL(`values/${topic}.json`, import.meta.url), 'utf8')) as { entries: Entry[] }).entries;
}

/** A unit of the value files to SI: factor and offset. The files write `dK` for a temperature difference. */
function si(value: number, text: string): number {
  if (text === 'cells') return value;
  const u = unit(text);
  return value * u.factor + u.offset;
}

export function inputsOf(entry: Entry): Record<string, number> {
  return Object.fromEntries(Object.entries(entry.inputs).flatMap(([name, v]) => (typeof v === 'string' ? [] : [[name, si(v.value, v.unit)]])));
}

/** Expected value and allowed departure in SI. */
export function expectedOf(entry: Entry): { value: number; allowed: number } {
  const u = entry.unit === 'cells' ? { factor: 1 } : unit(entry.unit);
  return { value: si(entry.expected, entry.unit), allowed: Math.max((entry.tolerance.rel ?? 0) * Math.abs(entry.expected), entry.tolerance.abs ?? 0) * u.factor };
}
