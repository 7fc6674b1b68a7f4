import { existsSync, mkdirSync, mkdtempSync, readdirSync, readFileSync, symlinkSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { writeInto } from '../../src/commands/written.ts';
import { Problem } from '../../src/problems/index.ts';

const folder = (): string => mkdtempSync(join(tmpdir(), 'runbrief-written-'));
const files = [{ name: 'a.md', text: 'a\n' }, { name: 'ladder/b.csv', text: 'b\n' }];
const codesOf = (task: () => unknown): string[] => {
  try {
    task();
  } catch (error) {
    if (error instanceof Problem) return error.list.map((p) => p.code);
    throw error;
  }
  return [];
};

describe('files written into a folder', () => {
  it('stand there, folders made', () => {
    const into = join(folder(), 'deep', 'plan');
    expect(writeInto(into, files, false)).toEqual([join(into, 'a.md'), join(into, 'ladder', 'b.csv')]);
    expect(readFileSync(join(into, 'ladder/b.csv'), 'utf8')).toBe('b\n');
    expect(readdirSync(into)).toEqual(['a.md', 'ladder']);
  });

  it('are all refused where one exists, and replaced with force', () => {
    const into = folder();
    writeFileSync(join(into, 'a.md'), 'mine');
    expect(codesOf(() => writeInto(into, files, false))).toEqual(['would-overwrite']);
    expect(readFileSync(join(into, 'a.md'), 'utf8')).toBe('mine');
    expect(existsSync(join(into, 'ladder'))).toBe(false);
    writeInto(into, files, true);
    expect(readFileSync(join(into, 'a.md'), 'utf8')).toBe('a\n');
  });

  it.skipIf(process.platform !== 'linux')('are refused, and not tried for ever, where the system makes no folders', () => {
    expect(codesOf(() => writeInto('/proc/runbrief-plan', files, false))).toEqual(['not-written']);
  });

  it('never follow a link out of the folder', () => {
    const into = folder(), outside = folder();
    writeFileSync(join(outside, 'target'), 'kept');
    symlinkSync(join(outside, 'target'), join(into, 'a.md'));
    writeInto(into, files, true);
    expect(readFileSync(join(outside, 'target'), 'utf8')).toBe('kept');
    expect(readFileSync(join(into, 'a.md'), 'utf8')).toBe('a\n');
    const other = folder();
    symlinkSync(outside, join(other, 'ladder'));
    expect(codesOf(() => writeInto(other, files, true))).toEqual(['not-written']);
    expect(readdirSync(outside)).toEqual(['target']);
    expect(readdirSync(other)).toEqual(['ladder']);
  });

  it('are none where the folder is a file, or a file a folder', () => {
    const at = join(folder(), 'file');
    writeFileSync(at, '');
    expect(codesOf(() => writeInto(at, files, true))).toEqual(['not-written']);
    expect(codesOf(() => writeInto(join(at, 'below'), files, true))).toEqual(['not-written']);
    expect(codesOf(() => writeInto('x'.repeat(300), files, true))).toEqual(['not-written']);
    const into = folder();
    mkdirSync(join(into, 'a.md'));
    expect(codesOf(() => writeInto(into, files, true))).toEqual(['not-written']);
    expect(readdirSync(into)).toEqual(['a.md']);
  });
});
