import { Problem, type ProblemData } from '../problems/index.ts';
import { csvRows, delimiterOf, type Cell, type Delimiter } from './csv.ts';
import { doubled, headOf, type Head } from './header.ts';
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
 * @throws      {Problem} every fault of the file in one go (the first ten): not-a-number, not-finite, out-of-range, decimal-comma, missing-cell,
 *              extra-cell, duplicate-column, no-rows, too-many-columns, and those of reader and header
 */
export function readTable(text: string, file: string): Table {
  const delimiter = delimiterOf(text);
  const rows = csvRows(text, file, delimiter);
  const first = rows.next();
  if (first.done === true) throw new Problem({ code: 'empty-file', message: 'the file holds no table', file, expected: 'a header line and rows of numbers' });
  const cells = withoutLastEmpty(first.value);
  if (cells.length > mostColumns) throw new Problem({ code: 'too-many-columns', message: `the file has ${cells.length} columns`, file, line: cells[0]?.line ?? 1, expected: `at most ${mostColumns}` });

  const faults = new Faults(file);
  const heads = cells.flatMap((cell) => faults.of(() => headOf(cell, file)) ?? []);
  doubled(heads, file).forEach((one) => faults.add(one));
  faults.settle();

  const read = heads.map((): Readings => ({ values: [], lines: [], starts: [], lastDigit: Infinity }));
  let count = 0;
  for (const row of rows) {
    count += 1;
    const wrong = wrongLength(row, heads.length, delimiter, file);
    if (wrong !== undefined) faults.add(wrong);
    else heads.forEach((head, k) => take(row[k] as Cell, head, read[k] as Readings, faults));
  }
  if (count === 0) faults.add({ code: 'no-rows', message: 'the file has a header and no rows', file, expected: 'one row of numbers or more' });
  faults.settle();
  const columns = heads.map((head, k) => ({ ...head, values: (read[k] as Readings).values, lastDigit: (read[k] as Readings).lastDigit }));
  return { file, columns, rowCount: count, place: (row, k) => ({ file, line: read[k]?.lines[row] ?? 1, column: read[k]?.starts[row] ?? 1 }) };
}

/** What has been read of one column [SI], with the places of the numbers. */
interface Readings {
  readonly values: number[];
  readonly lines: number[];
  readonly starts: number[];
  lastDigit: number;
}

function take(cell: Cell, head: Head, readings: Readings, faults: Faults): void {
  const found = readNumber(cell, head, faults.file);
  if ('code' in found) return faults.add(found);
  readings.values.push(found.value);
  readings.lines.push(cell.line);
  readings.starts.push(cell.column);
  if (found.lastDigit < readings.lastDigit) readings.lastDigit = found.lastDigit;
}

/** Problems of one file: the first are kept, the others counted. */
class Faults {
  readonly file: string;
  readonly #kept: ProblemData[] = [];
  #more = 0;

  constructor(file: string) {
    this.file = file;
  }

  add(problem: ProblemData): void {
    if (this.#kept.length < mostProblems) this.#kept.push(problem);
    else this.#more += 1;
  }

  of<T>(work: () => T): T | undefined {
    try {
      return work();
    } catch (error) {
      if (!(error instanceof Problem)) throw error;
      error.list.forEach((one) => this.add(one));
      return undefined;
    }
  }

  settle(): void {
    if (this.#kept.length === 0) return;
    const more: ProblemData[] = this.#more === 0 ? [] : [{ code: 'more-problems', message: `${this.#more} more cells or rows like these`, file: this.file }];
    throw new Problem([...this.#kept, ...more]);
  }
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
