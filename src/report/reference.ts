import type { EvaluatedTable, Evaluation, Need, Reference } from '../references/index.ts';
import { printNumber } from '../units/index.ts';
import { wrapped } from './wrap.ts';

/**
 * The screen of `reference` without a name: every known answer on one line.
 *
 * @param references  the known answers
 * @returns           text without a last newline
 */
export function referenceList(references: readonly Reference[]): string {
  const widest = Math.max(...references.map((ref) => ref.id.length));
  return references.map((ref) => wrapped(ref.title, ' '.repeat(widest + 2), `${ref.id.padEnd(widest)}  `)).join('\n');
}

/**
 * The screen of `reference ID`: what it holds for, its inputs, its numbers.
 *
 * @param ref    the reference
 * @param found  its evaluation
 * @returns      text without a last newline, at most 80 columns wide
 */
export function referenceText(ref: Reference, found: Evaluation): string {
  const head = [
    wrapped(`${ref.id}: ${ref.title} (${ref.kind})`, '  ', ''),
    labelled('assumes', ref.assumes.join(', ')),
    labelled('verifies', ref.verifies.join(', ')),
    labelled('source', ref.source),
  ];
  const widest = Math.max(0, ...ref.needs.map((need) => need.id.length));
  const inputs = ref.needs.map((need) => wrapped(given(need, found), ' '.repeat(widest + 4), `  ${need.id.padEnd(widest)}  `));
  const numbers = found.values.map((v) => {
    const number = v.low === v.high ? printNumber({ value: v.value, unit: v.unit, digits: 7, prefixes: false }) : printNumber({ value: v.value, unit: v.unit, low: v.low, high: v.high, prefixes: false });
    return `${wrapped(`${v.id} = ${number}`, '      ', '  ')}\n${wrapped(`${v.name}; ${v.formula}`, '      ')}`;
  });
  const lacking = [...new Set(found.missing.map((one) => one.needs))].map((need) => `  with ${need} also: ${found.missing.filter((one) => one.needs === need).map((one) => one.id).join(', ')}`);
  const lines = [
    ...section('Inputs', inputs),
    ...section('Numbers', numbers),
    ...section('Not computed', lacking.map((line) => wrapped(line.trim(), '      ', '  '))),
    ...section('Tables (--table)', found.tables.map((table) => wrapped(`${table.id}: ${table.title}${table.note === undefined ? '' : `; ${table.note}`}`, '      ', '  '))),
    ...section('To know', [...found.flags, ...(ref.notes ?? []), `If a run misses it: ${ref.ifMissed}.`].map((note) => wrapped(note, '    ', '  '))),
  ];
  return [...head, ...lines].join('\n');
}

/**
 * A table of a reference as CSV, header cells `name [unit]`, in SI.
 *
 * @param table  the table
 * @returns      text without a last newline
 */
export function referenceCsv(table: EvaluatedTable): string {
  return [table.columns.map((column) => `${column.id} [${column.unit}]`).join(','), ...table.rows.map((row) => row.map((value) => String(Number(value.toPrecision(10)))).join(','))].join('\n');
}

/**
 * The document of `reference ID --json`.
 *
 * @param ref    the reference
 * @param found  its evaluation
 * @returns      numbers in SI by quantity id, tables, what is missing
 */
export function referenceDocument(ref: Reference, found: Evaluation): object {
  const { title, kind, assumes, verifies, source } = ref;
  return {
    id: ref.id, title, kind, assumes, verifies, source,
    inputs: found.inputs,
    values: Object.fromEntries(found.values.map(({ id, ...rest }) => [id, rest])),
    tables: found.tables,
    missing: found.missing,
    flags: found.flags,
    needs: ref.needs.map(({ id, unit, name, default: taken, range, anchors }) => ({ id, unit, name, ...(taken === undefined ? {} : { default: taken }), ...(range === undefined ? {} : { range }), ...(anchors === undefined ? {} : { at: anchors }) })),
    notes: ref.notes ?? [],
    ifMissed: ref.ifMissed,
    flows: ref.flows,
  };
}

const labelled = (label: string, text: string): string => wrapped(text, ' '.repeat(12), `  ${label.padEnd(10)}`);
const section = (title: string, lines: readonly string[]): string[] => (lines.length === 0 ? [] : ['', title, ...lines]);

function given(need: Need, found: Evaluation): string {
  const value = found.inputs[need.id];
  const number = (x: number): string => printNumber({ value: x, unit: '1', digits: 6 });
  const holds = need.anchors ? `, known at ${need.anchors.map(number).join(', ')}` : need.range ? `, holds ${number(need.range[0])} .. ${number(need.range[1])}` : '';
  return `${value === undefined ? '' : `= ${printNumber({ value, unit: need.unit, digits: 6, prefixes: false })}, `}${need.name}${need.unit === '1' || value !== undefined ? '' : ` [${need.unit}]`}${holds}`;
}
