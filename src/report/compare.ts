import type { ReferenceComparison, TableComparison } from '../results/index.ts';
import { wrapped } from './wrap.ts';

/**
 * The screen of `compare`: the known answer, then each column or number with what it says and what speaks against it.
 *
 * @param result  the comparisons
 * @returns       text without a last newline, at most 80 columns wide
 */
export function compareText(result: ReferenceComparison): string {
  const head = [wrapped(`${result.reference}: ${result.outcome}`, ''), wrapped(result.source, '  '), ...result.flags.map((flag) => wrapped(flag, '    ', '  - '))].join('\n');
  const values = result.values.map((one) => `${one.name}: ${one.outcome}\n${wrapped(one.says, '  ')}`);
  const last = result.ifMissed === undefined ? [] : [wrapped(`Look first at: ${result.ifMissed}.`, '')];
  return [head, ...values, ...result.tables.flatMap(tableText), ...last].join('\n\n');
}

function tableText(table: TableComparison): string[] {
  const missing = table.missing.length === 0 ? [] : [wrapped(`not in the file: ${table.missing.join(', ')}`, '  ')];
  const columns = table.columns.map((column) => [`${column.name}: ${column.outcome}`, wrapped(column.says, '  '), ...column.cautions.map((caution) => wrapped(caution, '    ', '  - '))].join('\n'));
  return [[wrapped(table.title, ''), ...missing].join('\n'), ...columns];
}
