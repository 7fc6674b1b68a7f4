import type { ProblemData } from '../problems/index.ts';
import type { Cell } from './csv.ts';

const decimal = /^[+-]?(?:\d+\.?(\d*)|\.(\d+))(?:[eEdD]([+-]?\d{1,4}))?$/;

/**
 * The number of a cell: digits with a decimal point and an exponent of ten, nothing else.
 *
 * @param cell  the cell
 * @param name  name of its column, for problems
 * @param file  name of the file, for problems
 * @returns     the number and one unit of its last digit, both as written; or what is wrong with it
 */
export function readNumber(cell: Cell, name: string, file: string): { value: number; lastDigit: number } | ProblemData {
  const match = decimal.exec(cell.text);
  const value = match === null ? NaN : Number(cell.text.replace(/[dD]/, 'e'));
  if (match !== null && Number.isFinite(value)) {
    const digits = (match[1] ?? match[2] ?? '').length;
    return { value, lastDigit: 10 ** (Number(match[3] ?? 0) - digits) };
  }
  const place = { file, line: cell.line, column: cell.column, length: Math.max(1, Math.min(60, cell.text.length)) };
  const shown = `${name}: "${cell.text.slice(0, 60)}"`;
  if (cell.text === '') return { code: 'missing-cell', message: `${name}: the cell is empty`, ...place, expected: 'a number; leave out rows that have none' };
  if (match !== null || /^[+-]?(nan|inf|infinity|nan\(.*\)|1\.#\w+)$/i.test(cell.text)) return { code: 'not-finite', message: `${shown} is not a finite number: the run that wrote it failed there`, ...place, expected: 'a number' };
  if (/^[+-]?[\d.]*\d,\d/.test(cell.text)) return { code: 'decimal-comma', message: `${shown} has a comma in it`, ...place, expected: `a decimal point, ${cell.text.replaceAll('.', '').replace(',', '.').slice(0, 60)}` };
  if (/^[+-]?\d[\d\s_']*\d$/.test(cell.text)) return { code: 'not-a-number', message: `${shown} has marks between its digits`, ...place, expected: cell.text.replaceAll(/[\s_']/g, '') };
  return { code: 'not-a-number', message: `${shown} is not a number`, ...place, expected: 'a number such as 6.063 or 1.2e-3; the unit stands in the header' };
}
