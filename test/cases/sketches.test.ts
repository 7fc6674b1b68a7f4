import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, describe, expect, it } from 'vitest';
import { vocabulary } from '../../src/assemble/index.ts';
import { readCase } from '../../src/case/index.ts';
import { flows } from '../../src/flows/index.ts';
import { plan } from '../../src/plan/index.ts';
import { runbrief } from '../commands/harness.ts';

const sketches = readFileSync(new URL('../case/sketches.yaml', import.meta.url), 'utf8').split(/^---$/m).slice(1).map((text) => ({
  text,
  title: /^title: (.*)$/m.exec(text)?.[1] ?? '',
  flow: /^flow: (.*)$/m.exec(text)?.[1] ?? '',
}));
const planOf = (text: string) => plan(readCase(text, 'sketch.case.yaml', vocabulary), { version: 'test' });
const folder = mkdtempSync(join(tmpdir(), 'runbrief-sketches-'));
afterAll(() => rmSync(folder, { recursive: true, force: true }));

describe('sketches of every kind', () => {
  it.each(sketches.filter(({ flow }) => flow in flows))('$title: is planned, $flow', async ({ text }) => {
    const made = await planOf(text);
    const numbers = Object.entries(made.quantities).flatMap(([id, { value, low, high }]) => [value, low ?? 0, high ?? 0].some((x) => typeof x === 'number' && !Number.isFinite(x)) ? [id] : []);
    expect(numbers).toEqual([]);
    const named = Object.values(made.sections).flatMap(({ lines, tables }) => [...lines.flatMap((l) => l.quantities ?? []), ...tables.flatMap((t) => t.rows.flat().flatMap((cell) => (typeof cell === 'string' ? [] : [cell.id])))]);
    expect(named.filter((id) => made.quantities[id] === undefined)).toEqual([]);
    expect(made.effects.filter((e) => e.judged && e.verdict === 'undecided' && (e.missing ?? []).length === 0).map((e) => e.id)).toEqual([]);
  });

  it.each(sketches.filter(({ flow }) => !(flow in flows)))('$title: $flow is refused by name', async ({ text }) => {
    await expect(planOf(text)).rejects.toMatchObject({ list: [{ code: 'flow-not-built' }] });
  });

  it.each(sketches)('$title: the command ends with 0 or with the one problem', async ({ text, flow }) => {
    const file = join(folder, 'sketch.case.yaml');
    writeFileSync(file, text);
    const { code, stdout, stderr } = await runbrief(['plan', file]);
    if (flow in flows) expect({ code, stderr, odd: /NaN|Infinity|undefined|\[object/.exec(stdout)?.[0] }).toEqual({ code: 0, stderr: '', odd: undefined });
    else expect({ code, stdout, says: stderr.includes(`the flow ${flow} is known but not built yet`) }).toEqual({ code: 1, stdout: '', says: true });
  });
});
