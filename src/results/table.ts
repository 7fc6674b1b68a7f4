import { Problem, type ProblemData } from '../problems/index.ts';
import { csvRows, delimiterOf, type Cell, type Delimiter } from './csv.ts';
import { doubled, headOf, inSi, type Head } from './header.ts';
import { readNumber } from './number.ts';

/** A column of numbers in SI units. */
export interface Column extends Head {
  readonly values: readonly number[];
  /** One unit of the last digit that any cell of the column shows [SI]. */
  readonly lastDigit: number;
}

export interface Table {
  readonly file: string;
  readonly columns: readonly Column[];
  readonly rowCount: number;
  /** Place of a number in the file, for problems. */
  place(row: number, column: number): { readonly file: string; readonly line: number; readonly column: number };
}

const mostColumns = 1000;
const mostProblems = 10;

/**
 * A table of results: a header line of `name [unit]`, then rows of numbers, separated by commas, semicolons or tabs.
 *
 * @param text  the file, decoded
 * @param file  its name, for problems
 * @returns     columns in SI units with the places of their numbers
 * @throws      {Problem} every fault of the file in one go (the first ten): not-a-number, not-finite, decimal-comma, missing-cell,
 *              extra-cell, duplicate-column, no-rows, too-many-columns, and those of reader and header
 */
export function readTable(text: string, file: string): Table {
  const delimiter = delimiterOf(text);
  const rows = csvRows(text, file, delimiter);
  const first = rows.next();
  if (first.done === true) throw new Problem({ code: 'empty-file', message: 'the file holds no table', file, expected: 'a header line and rows of numbers' });
  const cells = withoutLastEmpty(first.value);
  if (cells.length > mostColumns) throw new Problem({ code: 'too-many-columns', message: `the file has ${cells.length} columns`, file, line: cells[0]?.line ?? 1, expected: `at most ${mostColumns}` });

  const problems: ProblemData[] = [];
  const gathered = gather(problems);
  const heads = cells.flatMap((cell) => gathered(() => headOf(cell, file)) ?? []);
  problems.push(...doubled(heads, file));
  if (problems.length > 0) throw new Problem(problems);

  const values: number[][] = heads.map(() => []);
  const starts: number[][] = heads.map(() => []);
  const lines: number[][] = heads.map(() => []);
  const lastDigits = heads.map(() => Infinity);
  let found = 0;
  let count = 0;
  for (const row of rows) {
    count += 1;
    const wrong = wrongLength(row, heads.length, delimiter, file);
    if (wrong !== undefined) {
      found += 1;
      if (problems.length < mostProblems) problems.push(wrong);
      continue;
    }
    heads.forEach((head, k) => {
      const cell = row[k] as Cell;
      const read = readNumber(cell, head.name, file);
      if ('code' in read) {
        found += 1;
        if (problems.length < mostProblems) problems.push(read);
        return;
      }
      (values[k] as number[]).push(inSi(head, read.value));
      (starts[k] as number[]).push(cell.column);
      (lines[k] as number[]).push(cell.line);
      if (read.lastDigit < (lastDigits[k] as number)) lastDigits[k] = read.lastDigit;
    });
  }
  if (found > problems.length) problems.push({ code: 'more-problems', message: `${found - problems.length} more cells or rows like these`, file });
  if (count === 0) problems.push({ code: 'no-rows', message: 'the file has a header and no rows', file, expected: 'one row of numbers or more' });
  if (problems.length > 0) throw new Problem(problems);
  const columns = heads.map((head, k) => ({ ...head, values: values[k] as number[], lastDigit: (lastDigits[k] as number) * head.unit.factor }));
  return { file, columns, rowCount: count, place: (row, k) => ({ file, line: lines[k]?.[row] ?? 1, column: starts[k]?.[row] ?? 1 }) };
}

function gather(problems: ProblemData[]): <T>(work: () => T) => T | undefined {
  return (work) => {
    try {
      return work();
    } catch (error) {
      if (!(error instanceof Problem)) throw error;
      problems.push(...error.list.slice(0, Math.max(0, mostProblems - problems.length)));
      return undefined;
    }
  };
}

/** A separator at the end of a line adds no column. */
function withoutLastEmpty(row: readonly Cell[]): readonly Cell[] {
  return row.length > 1 && row.at(-1)?.text === '' ? row.slice(0, -1) : row;
}

function wrongLength(row: readonly Cell[], wanted: number, delimiter: Delimiter, file: string): ProblemData | undefined {
  const have = row.length === wanted + 1 ? withoutLastEmpty(row).length : row.length;
  if (have === wanted) return undefined;
  const [first] = row as [Cell, ...Cell[]];
  const place = { file, line: first.line, column: first.column };
  const width = `the row has ${have} ${have === 1 ? 'cell' : 'cells'} and the header ${wanted}`;
  if (have < wanted) return { code: 'missing-cell', message: width, ...place, expected: 'one number for every column' };
  const whole = delimiter === ',' && row.every((cell) => /^[+-]?\d+$/.test(cell.text));
  const expected = whole ? 'a point for decimals (6.063, not 6,063), or semicolons between the cells and points in them' : 'one number for every column';
  return { code: whole ? 'decimal-comma' : 'extra-cell', message: width, ...place, expected };
}
