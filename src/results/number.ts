import type { ProblemData } from '../problems/index.ts';
import type { Cell } from './csv.ts';
import { inSi, type Head } from './header.ts';

const decimal = /^[+-]?(?:\d+\.?(\d*)|\.(\d+))(?:[eEdD]([+-]?\d{1,4}))?$/;

/** Beyond these the squares and ratios of numbers overflow. */
const [least, most] = [1e-100, 1e60];

/**
 * The number of a cell: digits with a decimal point and an exponent of ten, nothing else.
 *
 * @param cell  the cell
 * @param head  name and unit of its column
 * @param file  name of the file, for problems
 * @returns     the number and one unit of its last digit, both in SI; or what is wrong with it
 */
export function readNumber(cell: Cell, head: Head, file: string): { value: number; lastDigit: number } | ProblemData {
  const match = decimal.exec(cell.text);
  const written = match === null ? NaN : Number(cell.text.replace(/[dD]/, 'e'));
  const place = { file, line: cell.line, column: cell.column, length: Math.max(1, Math.min(60, cell.text.length)) };
  if (match !== null && Number.isFinite(written)) {
    const value = inSi(head, written);
    const digits = (match[1] ?? match[2] ?? '').length;
    if (value === 0 || (Math.abs(value) > least && Math.abs(value) < most)) return { value, lastDigit: 10 ** (Number(match[3] ?? 0) - digits) * head.unit.factor };
    return { code: 'out-of-range', message: `${head.name}: "${cell.text.slice(0, 60)}" is the size of no quantity`, ...place, expected: `0, or a size between ${least} and ${most} in SI units` };
  }
  const shown = `${head.name}: "${cell.text.slice(0, 60)}"`;
  if (cell.text === '') return { code: 'missing-cell', message: `${head.name}: the cell is empty`, ...place, expected: 'a number; leave out rows that have none' };
  if (match !== null || /^[+-]?(nan|inf|infinity|nan\(.*\)|1\.#\w+)$/i.test(cell.text)) return { code: 'not-finite', message: `${shown} is not a finite number: the run that wrote it failed there`, ...place, expected: 'a number' };
  if (/^[+-]?[\d.]*\d,\d/.test(cell.text)) return { code: 'decimal-comma', message: `${shown} has a comma in it`, ...place, expected: `a decimal point, ${cell.text.replaceAll('.', '').replace(',', '.').slice(0, 60)}` };
  if (/^[+-]?\d[\d\s_']*\d$/.test(cell.text)) return { code: 'not-a-number', message: `${shown} has marks between its digits`, ...place, expected: cell.text.replaceAll(/[\s_']/g, '') };
  return { code: 'not-a-number', message: `${shown} is not a number`, ...place, expected: 'a number such as 6.063 or 1.2e-3; the unit stands in the header' };
}
