import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, describe, expect, it } from 'vitest';
import { runbrief } from './harness.ts';

const folder = mkdtempSync(join(tmpdir(), 'template-'));
afterAll(() => rmSync(folder, { recursive: true }));

describe('template', () => {
  it('prints a case to fill in', async () => {
    const { code, stdout, stderr } = await runbrief(['template', 'pipe']);
    expect([code, stderr]).toEqual([0, '']);
    expect(stdout).toContain('flow: pipe');
    expect(stdout).toContain('diameter: ___');
  });

  it('writes a file once, and again only with --force', async () => {
    const file = join(folder, 'line.case.yaml');
    expect((await runbrief(['template', 'pipe', '--into', file])).code).toBe(0);
    const first = readFileSync(file, 'utf8');
    const refused = await runbrief(['template', 'duct', '--into', file]);
    expect(refused.code).toBe(2);
    expect(refused.stderr).toContain('--force');
    expect(readFileSync(file, 'utf8')).toBe(first);
    expect((await runbrief(['template', 'duct', '--into', file, '--force'])).code).toBe(0);
    expect(readFileSync(file, 'utf8')).toContain('flow: duct');
  });

  it('an unknown flow and a folder that does not exist are problems', async () => {
    const unknown = await runbrief(['template', 'pip']);
    expect([unknown.code, unknown.stderr.includes('nearest   pipe')]).toEqual([1, true]);
    expect((await runbrief(['template', 'pipe', '--into', join(folder, 'no', 'x.yaml')])).code).toBe(1);
  });

  it('gives the text as JSON', async () => {
    const { stdout } = await runbrief(['template', 'pipe', '--json']);
    expect(JSON.parse(stdout)).toMatchObject({ flow: 'pipe', text: expect.stringContaining('flow: pipe') as string });
  });
});
