import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { Problem, type ProblemData } from '../../src/problems/index.ts';
import { readResultText, readTable, textOf } from '../../src/results/index.ts';

const problemsOf = (work: () => unknown): readonly ProblemData[] => {
  try {
    work();
  } catch (error) {
    if (error instanceof Problem) return error.list;
    throw error;
  }
  throw new Error('no problem was found');
};
const read = (text: string): ReturnType<typeof readTable> => readTable(text, 'a.csv');

describe('tables that are read', () => {
  it.each([
    ['commas', 'x [mm],u [m/s]\n1,2\n3,4\n'],
    ['semicolons', 'x [mm];u [m/s]\n1;2\n3;4\n'],
    ['tabs', 'x [mm]\tu [m/s]\n1\t2\n3\t4'],
    ['blanks around', ' x [mm] , u [m/s] \r\n 1 , 2 \r\n 3 , 4 \r\n'],
    ['quotes', '"x [mm]","u [m/s]"\n"1","2"\n"3",4\n'],
    ['a mark at the start, comments, empty lines, old line ends', '\ufeff# made by hand\rx [mm],u [m/s]\r\r1,2\r# more\r3,4'],
    ['a separator at every end', 'x [mm],u [m/s],\n1,2,\n3,4,\n'],
    ['exponents', 'x [mm],u [m/s]\n1E0,2.0d0\n+.3e1,4.\n'],
  ])('%s', (_, text) => {
    const table = readTable(textOf(new TextEncoder().encode(text), 'a.csv'), 'a.csv');
    expect(table.columns.map((c) => [c.name, c.unitText])).toEqual([['x', 'mm'], ['u', 'm/s']]);
    expect(table.columns[0]?.values.map((v) => v * 1000)).toEqual([1, 3]);
    expect(table.columns[1]?.values).toEqual([2, 4]);
  });
  it('quoted cells keep separators, line ends and doubled quotes (RFC 4180, rules 6 and 7)', () => {
    const table = read('"speed, ""mean""\nof all [m/s]",x\n1,2\n');
    expect(table.columns[0]?.name).toBe('speed, "mean" of all');
    expect(table.place(0, 1)).toEqual({ file: 'a.csv', line: 3, column: 3 });
  });
  it('units come from the header: a temperature has its zero, a rise has none', () => {
    const table = read('outlet temperature [degC],temperature rise [degC],factor,ratio [-]\n20,20,1,2\n');
    expect(table.columns.map((c) => c.values[0])).toEqual([293.15, 20, 1, 2]);
  });
  it('a name cannot carry an escape sequence to a terminal', () => expect(read('\u001bcx,y\n1,2\n').columns[0]?.name ?? '').not.toContain('\u001b'));
  it('the last digit shown is that of the finest cell', () => {
    const table = read('a [mm],b,c\n1.5,12,1.2e-3\n1.25,3,4e-3\n');
    expect(table.columns.map((c) => c.lastDigit)).toEqual([expect.closeTo(1e-5, 12), 1, expect.closeTo(1e-4, 12)]);
  });
});

describe('tables that are refused, with the place', () => {
  it.each([
    ['NaN', 'x,u\n1,nan\n', { code: 'not-finite', line: 2, column: 3 }],
    ['infinity', 'x,u\n1,2\n-Inf,2\n', { code: 'not-finite', line: 3, column: 1 }],
    ['overflow', 'x\n1e999\n', { code: 'not-finite', line: 2, column: 1 }],
    ['beyond any size', 'x\n-1e61\n', { code: 'out-of-range', line: 2, column: 1 }],
    ['too small to be told from zero', 'x\n1e-320\n', { code: 'out-of-range', line: 2, column: 1 }],
    ['an empty cell', 'x,u\n1,\n2,\n', { code: 'missing-cell', line: 2 }],
    ['a short row', 'x,u\n1\n', { code: 'missing-cell', line: 2, column: 1 }],
    ['a long row', 'x,u\n1,2.5,3\n', { code: 'extra-cell', line: 2 }],
    ['decimal commas between commas', 'x,u\n1,5,2,5\n', { code: 'decimal-comma', line: 2, expected: 'a point for decimals (6.063, not 6,063), or semicolons between the cells and points in them' }],
    ['decimal commas between semicolons', 'x;u\n6,063;1\n', { code: 'decimal-comma', line: 2, column: 1, expected: 'a decimal point, 6.063' }],
    ['a column twice', 'x,u,X [m]\n1,2,3\n', { code: 'duplicate-column', line: 1, column: 5 }],
    ['no header', '1,2\n3,4\n', { code: 'number-for-name', line: 1, column: 1 }],
    ['a nameless column', '[m],u\n1,2\n', { code: 'nameless-column', line: 1, column: 1 }],
    ['an unknown unit', 'x [mmm],u\n1,2\n', { line: 1, column: 4, code: 'unknown-unit' }],
    ['a word', 'x\nabc\n', { code: 'not-a-number', line: 2, column: 1 }],
    ['a unit in a cell', 'x\n25 mm\n', { code: 'not-a-number', expected: 'a number such as 6.063 or 1.2e-3; the unit stands in the header' }],
    ['blanks in a number', 'x\n18 000\n', { code: 'not-a-number', expected: '18000' }],
    ['an open quote', 'x,u\n1,"2\n', { code: 'open-quote', line: 2, column: 3 }],
    ['text behind a quote', 'x\n"1"2\n', { code: 'text-after-quote', line: 2, column: 4 }],
    ['no rows', 'x,u\n', { code: 'no-rows' }],
    ['comments alone', '# nothing\n', { code: 'empty-file' }],
    ['a word that is code', 'constructor\n__proto__\n', { code: 'not-a-number', line: 2, column: 1 }],
  ])('%s', (_, text, expected) => expect(problemsOf(() => read(text))[0]).toMatchObject({ file: 'a.csv', ...expected }));

  it('all faults at once, the many of one file cut short', () => {
    expect(problemsOf(() => read('x,u\nnan,a\n1\n'))).toHaveLength(3);
    const many = problemsOf(() => read(`x\n${'nan\n'.repeat(5000)}`));
    expect(many).toHaveLength(11);
    expect(many.at(-1)?.message).toBe('4990 more cells or rows like these');
  });
  it('a thousand columns are enough', () => expect(problemsOf(() => read('a,'.repeat(2000) + 'b\n'))[0]?.code).toBe('too-many-columns'));
});

describe('bytes that are no table', () => {
  const bytes = (...list: number[]): Uint8Array => Uint8Array.from(list);
  it.each([
    ['UTF-16', bytes(0xff, 0xfe, 0x61, 0), 'not-text'],
    ['binary', bytes(0x61, 0, 0x62), 'not-text'],
    ['half a letter', bytes(0xc3, 0x28), 'not-text'],
    ['nothing', bytes(), 'empty-file'],
    ['blanks', bytes(32, 10), 'empty-file'],
  ])('%s', (_, data, code) => expect(problemsOf(() => textOf(data, 'a.csv'))[0]?.code).toBe(code));
  it('20 MB are the limit', () => expect(problemsOf(() => textOf(new Uint8Array(20_000_001).fill(65), 'a.csv'))[0]?.code).toBe('too-large'));
  it('a million cells are read in seconds, whatever stands in them', () => {
    const start = performance.now();
    expect(read(`x,u\n${'1.25,2.5\n'.repeat(500_000)}`).rowCount).toBe(500_000);
    problemsOf(() => read(`x\n"${'"" '.repeat(2_000_000)}`));
    problemsOf(() => read(`x\n${'['.repeat(1_000_000)}`));
    problemsOf(() => read(`${'['.repeat(1_000_000)}\n1`));
    expect(performance.now() - start).toBeLessThan(15_000);
  });
});

describe('files', () => {
  let folder = '';
  beforeAll(() => void (folder = mkdtempSync(join(tmpdir(), 'results-'))));
  afterAll(() => rmSync(folder, { recursive: true }));
  it('reads a file, refuses a folder and what is missing', () => {
    const path = join(folder, 'a.csv');
    writeFileSync(path, 'x\n1\n');
    expect(readResultText(path)).toBe('x\n1\n');
    expect(problemsOf(() => readResultText(folder))[0]?.code).toBe('no-file');
    expect(problemsOf(() => readResultText(join(folder, 'b.csv')))[0]).toMatchObject({ code: 'missing-file', message: `${join(folder, 'b.csv')} does not exist` });
  });
});
