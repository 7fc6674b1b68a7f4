import { harmless, nearestName, Problem, type ProblemData } from '../problems/index.ts';
import { unit, type Unit } from '../units/index.ts';
import type { Cell } from './csv.ts';

/** The head of one column. */
export interface Head {
  readonly name: string;
  /** As written; `1` where there is none. */
  readonly unitText: string;
  readonly unit: Unit;
  readonly line: number;
  readonly column: number;
}

const longestHead = 200;
const differenceWords = /\b(difference|rise|drop|change|excess|deviation|delta)\b/i;

/** Whether a column holds temperatures with a zero of their own, so that a share of the value says nothing. */
export function isTemperature(head: Pick<Head, 'name' | 'unit'>): boolean {
  const { dimension, difference } = head.unit;
  return !difference && dimension.every((exponent, i) => exponent === (i === 3 ? 1 : 0)) && !differenceWords.test(head.name);
}

/** SI value of a number in a column; a column whose name says rise, drop or difference holds differences. */
export function inSi(head: Pick<Head, 'name' | 'unit'>, number: number): number {
  return number * head.unit.factor + (isTemperature(head) ? head.unit.offset : 0);
}

/**
 * A header cell `name [unit]`.
 *
 * @param cell  the cell
 * @param file  name of the file, for problems
 * @returns     name and unit; `1` where there is no unit, `[]` and `[-]` likewise
 * @throws      {Problem} number-for-name, nameless-column, and those of the unit reader with their place in the file
 */
export function headOf(cell: Cell, file: string): Head {
  const { line, column } = cell;
  const place = { file, line, column };
  if (cell.text.length > longestHead) throw new Problem({ code: 'nameless-column', message: `a header of ${cell.text.length} characters`, ...place, expected: `at most ${longestHead} characters` });
  const match = /^([^[\]]*?)\s*(?:\[([^[\]]*)\])?$/.exec(cell.text);
  const name = harmless((match?.[1] ?? '').replaceAll(/\s+/g, ' ')); // it is shown at terminals and on pages
  if (match === null || name === '') throw new Problem({ code: 'nameless-column', message: `"${cell.text.slice(0, 60)}" is no header of a column`, ...place, length: cell.text.length, expected: 'name [unit], for example pressure drop [Pa]' });
  if (Number.isFinite(Number(name))) throw new Problem({ code: 'number-for-name', message: `the first line holds the number ${name} where a name is due`, ...place, length: cell.text.length, expected: 'a first line that names the columns: name [unit], name [unit], ...' });
  const written = (match[2] ?? '').trim();
  const unitText = written === '' || written === '-' ? '1' : written;
  try {
    return { name, unitText, unit: unit(unitText), line, column };
  } catch (error) {
    if (!(error instanceof Problem)) throw error;
    const start = column + cell.text.indexOf('[') + 1 + (match[2] ?? '').indexOf(written);
    throw new Problem(error.list.map((one) => ({ ...one, ...place, column: start + (one.at ?? 0), length: one.length ?? written.length })));
  }
}

/** Problems of names that stand twice; names are told apart by their letters alone, not by case or unit. */
export function doubled(heads: readonly Head[], file: string): ProblemData[] {
  return heads.flatMap((head, i) => {
    const first = heads.findIndex((other) => other.name.toLowerCase() === head.name.toLowerCase());
    if (first === i) return [];
    return [{ code: 'duplicate-column', message: `the column "${head.name}" stands twice, first as column ${first + 1}`, file, line: head.line, column: head.column, length: head.name.length, expected: 'a name of its own for every column' }];
  });
}

/** `nearest` of a problem, absent where no name is near. */
export function near(name: string, valid: readonly string[]): { nearest?: string } {
  const nearest = nearestName(name, valid);
  return nearest === undefined ? {} : { nearest };
}
