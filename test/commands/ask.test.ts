import { spawnSync } from 'node:child_process';
import { existsSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { stripVTControlCharacters } from 'node:util';
import { spawn } from '@lydell/node-pty';
import { afterAll, describe, expect, it } from 'vitest';
import { vocabulary } from '../../src/assemble/index.ts';
import { readCase } from '../../src/case/index.ts';
import { plan } from '../../src/plan/index.ts';
import { runbrief } from './harness.ts';

const root = fileURLToPath(new URL('../..', import.meta.url));
const bin = join(root, 'bin', 'runbrief.cjs');
const folder = mkdtempSync(join(tmpdir(), 'ask-'));
afterAll(() => rmSync(folder, { recursive: true }));
const at = (name: string): string => join(folder, name);

/** The built program at a terminal of its own. */
class Terminal {
  seen = '';
  #from = 0;
  readonly #pty;
  readonly ended: Promise<number>;

  constructor(argv: readonly string[], env: Readonly<Record<string, string>> = {}) {
    this.#pty = spawn(process.execPath, [bin, ...argv], { cols: 80, rows: 40, cwd: folder, env: { ...process.env, ...env } });
    this.#pty.onData((text) => { this.seen += text; });
    this.ended = new Promise((done) => this.#pty.onExit(({ exitCode }) => done(exitCode)));
  }

  /** Types once a text and then the place for input have appeared since the last time. */
  async answer(after: string, keys: string): Promise<void> {
    const until = Date.now() + 25_000;
    for (;;) {
      const shown = this.seen.indexOf(after, this.#from);
      const place = shown < 0 ? -1 : this.seen.indexOf('  > ', shown);
      if (place >= 0) {
        this.#from = this.seen.length;
        this.#pty.write(keys);
        return;
      }
      if (Date.now() > until) throw new Error(`"${after}" did not appear in:\n${stripVTControlCharacters(this.seen.slice(this.#from))}`);
      await new Promise((done) => setTimeout(done, 20));
    }
  }
}

describe('at a terminal', () => {
  it('asks, refuses, goes back, tells what is decided, stops, is gone on with, and saves nothing unasked', { timeout: 120_000 }, async () => {
    const first = new Terminal(['ask', '--into', 'line.case.yaml'], { NO_COLOR: '1' });
    await first.answer('flow: what flows where', 'pip\r');
    await first.answer('nearest', 'pipe\r');
    await first.answer('fluid.material', 'air\r');
    await first.answer('sizes.diameter', 'back\r');
    await first.answer('fluid.material', 'water\r');
    await first.answer('sizes.diameter', '25 mm\r');
    await first.answer('inlet.speed', '0.2 kg/s\r');
    await first.answer('inlet.temperature', 'list\r');
    await first.answer('include', 'stop\r');
    expect(await first.ended).toBe(0);
    expect(first.seen).toContain('runbrief ask --into line.case.yaml goes on from it');
    const text = readFileSync(at('line.case.yaml'), 'utf8');
    expect(text).toMatch(/^fluid:\n {2}material: water +# /m);
    expect(text).toMatch(/^ {2}massFlow: 0.2 kg\/s +# .*turbulence/m);
    // eslint-disable-next-line no-control-regex
    expect(/\u001b\[(?:\d+;)*(?:[34]\d|9[0-7]|10[0-7])m/.test(first.seen)).toBe(false);
    expect(Math.max(...stripVTControlCharacters(first.seen.replaceAll('\u001b[2K', '\n')).split(/\r?\n|\r/).map((line) => line.trimEnd().length))).toBeLessThanOrEqual(80);

    const second = new Terminal(['ask', '--into', 'line.case.yaml']);
    await second.answer('inlet.temperature', '65 degC\r');
    await second.answer('purpose', '\u0003');
    await second.answer('yes or no', 'no\r');
    expect(await second.ended).toBe(0);
    expect(second.seen).toContain('4 values are there already');
    expect(second.seen).toContain('Nothing is saved');
    expect(readFileSync(at('line.case.yaml'), 'utf8')).toBe(text);

    const third = new Terminal(['ask', '--into', 'line.case.yaml']);
    await third.answer('inlet.temperature', '65 degC\r');
    await third.answer('purpose', 'enough\r');
    expect(await third.ended).toBe(0);
    expect(readFileSync(at('line.case.yaml'), 'utf8')).toContain('temperature: 65 degC');
  });

  it('escape at the first question leaves nothing behind', { timeout: 60_000 }, async () => {
    const one = new Terminal(['ask', '--into', 'none.case.yaml']);
    await one.answer('flow: what flows where', '\u001b');
    expect(await one.ended).toBe(0);
    expect(one.seen).toContain('nothing is saved');
    expect(existsSync(at('none.case.yaml'))).toBe(false);
  });

  it('without a file, escape asks for the name of one', { timeout: 60_000 }, async () => {
    const one = new Terminal(['ask', '--flow', 'plate']);
    await one.answer('fluid.material', 'air\r');
    await one.answer('sizes.length', '\u001b');
    await one.answer('The name of a new file', 'named.case.yaml\r');
    expect(await one.ended).toBe(0);
    expect(readFileSync(at('named.case.yaml'), 'utf8')).toMatch(/^ {2}material: air/m);
  });
});

describe('without a terminal', () => {
  it('refuses to prompt in a pipe, naming what to use instead', () => {
    const { status, stdout, stderr } = spawnSync(process.execPath, [bin, 'ask'], { input: 'pipe\n', encoding: 'utf8', timeout: 30_000 });
    expect([status, stdout]).toEqual([2, '']);
    expect(stderr).toContain('--answers FILE');
    expect(stderr).toContain('runbrief template');
  });

  const known = 'flow: pipe\nfluid.material: water\nsizes.diameter: 25 mm\nsizes.length: 8 m\ninlet.speed: 0.4 m/s\ninlet.temperature: 65 degC\ntargets.0.quantity: outletTemperature\ntargets.0.within: 1 K\nwall.temperature: 20 degC\nchoices.yPlus: 1\n';

  it('takes answers from a file: the same case every time, which plans', async () => {
    writeFileSync(at('known.txt'), known);
    const { code, stdout, stderr } = await runbrief(['ask', '--answers', at('known.txt')]);
    expect(code).toBe(0);
    expect(stderr).toContain('choices.yPlus');
    expect((await runbrief(['ask', '--answers', at('known.txt')])).stdout).toBe(stdout);
    expect(stdout).toMatch(/^# unknown wall\.sandGrain +# /m);
    const made = await plan(readCase(stdout, 'case.yaml', vocabulary), { version: 'test' });
    expect(made.targets).toMatchObject([{ quantity: 'outletTemperature', computed: true }]);
  });

  it('writes to a file, goes on with its own and refuses that of a person', async () => {
    writeFileSync(at('known.txt'), known);
    const into = at('made.case.yaml');
    expect(await runbrief(['ask', '--answers', at('known.txt'), '--into', into])).toMatchObject({ code: 0, stdout: '' });
    const text = readFileSync(into, 'utf8');
    expect(await runbrief(['ask', '--answers', at('known.txt'), '--into', into])).toMatchObject({ code: 0 });
    expect(readFileSync(into, 'utf8')).toBe(text);
    writeFileSync(into, `# by hand\nflow: pipe\nsizes: { diameter: 30 mm }\n`);
    expect(await runbrief(['ask', '--answers', at('known.txt'), '--into', into])).toMatchObject({ code: 2, stderr: expect.stringContaining('--force') as string });
    expect((await runbrief(['ask', '--answers', at('known.txt'), '--into', into, '--force'])).code).toBe(0);
    expect(readFileSync(into, 'utf8')).toContain('diameter: 30 mm');
  });

  it('tells what is wrong with flow, file and answers', async () => {
    writeFileSync(at('bare.txt'), 'fluid.material: water\n');
    writeFileSync(at('wrong.txt'), 'flow: pipe\nsizes.diameter: 3 K\n');
    expect((await runbrief(['ask', '--answers', at('bare.txt')])).code).toBe(2);
    expect((await runbrief(['ask', '--answers', at('bare.txt'), '--flow', 'pipe'])).code).toBe(0);
    expect(await runbrief(['ask', '--answers', at('bare.txt'), '--flow', 'pip'])).toMatchObject({ code: 1, stderr: expect.stringContaining('nearest   pipe') as string });
    expect(await runbrief(['ask', '--answers', at('wrong.txt')])).toMatchObject({ code: 1, stderr: expect.stringContaining('sizes.diameter') as string });
    expect(await runbrief(['ask', '--answers', at('not-there.txt')])).toMatchObject({ code: 1 });
    expect(await runbrief(['ask', '--answers', folder])).toMatchObject({ code: 1 });
  });

  it('prints the case where its file cannot be written', async () => {
    writeFileSync(at('known.txt'), known);
    const { code, stdout } = await runbrief(['ask', '--answers', at('known.txt'), '--into', join(at('known.txt'), 'x.yaml')]);
    expect([code, stdout.includes('flow: pipe')]).toEqual([1, true]);
  });

  it('gives one document with --json', async () => {
    writeFileSync(at('known.txt'), known);
    const { stdout } = await runbrief(['ask', '--answers', at('known.txt'), '--json']);
    expect(JSON.parse(stdout)).toMatchObject({ end: 'settled', unknown: expect.arrayContaining(['wall.sandGrain']) as string[], text: expect.stringContaining('flow: pipe') as string });
  });
});
