import { spawnSync } from 'node:child_process';
import { cpSync, mkdtempSync, readdirSync, readFileSync, rmSync, truncateSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { beforeAll, describe, expect, it } from 'vitest';

const root = fileURLToPath(new URL('../..', import.meta.url));
const folder = mkdtempSync(join(tmpdir(), 'runbrief-start-'));
const dist = join(folder, 'dist');
const start = (...argv: string[]) => spawnSync(process.execPath, [join(folder, 'bin/runbrief.cjs'), ...argv], { encoding: 'utf8' });
const keptCode = () => readdirSync(dist).filter((name) => name.endsWith('.cache'));

beforeAll(() => {
  for (const path of ['bin', 'dist']) cpSync(join(root, path), join(folder, path), { recursive: true }); // dist/ is built by npm test
});

// Newer runtimes keep compiled code themselves; then there is no file of ours to break.
describe.skipIf('enableCompileCache' in process.getBuiltinModule('node:module'))('compiled code kept beside the program', () => {
  const expected = start.bind(undefined, '--help');
  it('is made again where it is missing', () => {
    for (const name of keptCode()) rmSync(join(dist, name));
    expect(expected().status).toBe(0);
    expect(keptCode()).toHaveLength(1);
  });
  it.each([
    ['cut off', (file: string) => truncateSync(file, 1000)],
    ['garbage', (file: string) => writeFileSync(file, 'no code')],
    ['empty', (file: string) => writeFileSync(file, '')],
  ])('is made again where it is %s', (_, spoil) => {
    const file = join(dist, keptCode()[0] as string);
    spoil(file);
    const spoilt = readFileSync(file).length;
    expect(expected()).toMatchObject({ status: 0, stderr: '' });
    expect(readFileSync(file).length).toBeGreaterThan(spoilt);
  });
});

describe('a result that cannot be written', () => {
  it.runIf(process.platform === 'linux')('is told, and is no defect', () => {
    const { status, stderr } = spawnSync('sh', ['-c', `"$0" "$1" --help > /dev/full`, process.execPath, join(folder, 'bin/runbrief.cjs')], { encoding: 'utf8' });
    expect(status).toBe(1);
    expect(stderr).toMatch(/^the result could not be written: ENOSPC/);
  });
  it.skipIf(process.platform === 'win32')('because the reader has gone is no failure', () => {
    const { stderr } = spawnSync('sh', ['-c', `"$0" "$1" --help | true`, process.execPath, join(folder, 'bin/runbrief.cjs')], { encoding: 'utf8' });
    expect(stderr).toBe('');
  });
});
