import { mkdtempSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { Args, Base, Flags } from '../../src/commands/base.ts';
import { dispatch, fail, type Entry } from '../../src/commands/index.ts';
import { Problem } from '../../src/problems/index.ts';
import { captured, runbrief } from './harness.ts';

class Weigh extends Base {
  static override examples = [{ command: 'runbrief weigh apple --limit 3', description: 'the weight of a thing' }];
  static override args = { thing: Args.string({ required: true, description: 'what to weigh' }) };
  static override flags = { limit: Flags.integer({ default: 5, helpValue: 'N', description: 'most it may weigh' }), scale: Flags.string({ options: ['fine', 'coarse'] }) };
  static override judges = true;

  async run(): Promise<object> {
    const { args, flags } = await this.parse(Weigh);
    if (args.thing === 'nothing') throw new Problem({ code: 'unknown-thing', message: '"nothing" has no weight', expected: 'a thing' });
    if (args.thing === 'file') throw new Problem({ code: 'would-overwrite', message: 'weights.csv exists' });
    if (args.thing === 'hole') throw new TypeError('weight of undefined');
    if (args.thing === 'void') return { weight: Number.NaN };
    const weight = args.thing.length;
    const chalk = await this.colours();
    this.say(chalk.red(`${weight} kg`));
    this.remark('weighed once');
    if (weight > flags.limit) this.limitMissed();
    return { weight };
  }
}

const commands: Record<string, Entry> = { weigh: { summary: 'the weight of a thing', load: () => Promise.resolve({ default: Weigh }) } };
const weigh = (...argv: string[]) =>
  captured(async () => {
    try {
      return await dispatch(argv, commands);
    } catch (error) {
      return fail(error, argv.includes('--json'));
    }
  });

afterEach(() => vi.unstubAllEnvs());

describe('a result', () => {
  it('goes to stdout as text, remarks to stderr', async () => {
    expect(await weigh('weigh', 'fig')).toEqual({ code: 0, stdout: '3 kg\n', stderr: 'weighed once\n' });
  });
  it('is one document on stdout with --json', async () => {
    const { code, stdout } = await weigh('weigh', 'fig', '--json');
    expect([code, JSON.parse(stdout)]).toEqual([0, { weight: 3 }]);
  });
  it('gives exit code 4 where a limit is missed', async () => {
    expect((await weigh('weigh', 'apple', '--limit', '4')).code).toBe(4);
    expect((await weigh('weigh', 'apple', '--limit', '5')).code).toBe(0);
  });
  it('carries no colour with NO_COLOR', async () => {
    vi.stubEnv('NO_COLOR', '1');
    vi.stubEnv('FORCE_COLOR', '1');
    expect((await weigh('weigh', 'fig')).stdout).toBe('3 kg\n');
  });
});

describe('a failure', () => {
  const rows = [
    { argv: ['weigh', 'nothing'], code: 1, says: ['"nothing" has no weight', 'expected  a thing'] },
    { argv: ['weigh', 'file'], code: 2, says: ['weights.csv exists'] },
    { argv: ['weigh'], code: 2, says: ['THING is missing', 'what to weigh'] },
    { argv: ['weigh', 'a', 'b'], code: 2, says: ['"b" is one argument too many'] },
    { argv: ['weigh', 'a', '--limti', '3'], code: 2, says: ['--limti is not a flag', 'nearest   --limit'] },
    { argv: ['weigh', 'a', '--limit', 'x'], code: 2, says: ['--limit: Expected an integer but received: x'] },
    { argv: ['weigh', 'a', '--scale', 'odd'], code: 2, says: ['fine, coarse'] },
    { argv: ['wiegh'], code: 2, says: ['"wiegh" is not a command', 'nearest   weigh'] },
    { argv: ['constructor'], code: 2, says: ['"constructor" is not a command'] },
    { argv: ['--jsn'], code: 2, says: ['--jsn is not a flag of runbrief'] },
    { argv: ['help', 'wiegh'], code: 2, says: ['nearest   weigh'] },
    { argv: ['weigh', 'hole'], code: 3, says: ['defect in runbrief', 'weight of undefined'] },
    { argv: ['weigh', 'void', '--json'], code: 3, says: [] },
  ];
  it.each(rows)('$argv ends with $code', async ({ argv, code, says }) => {
    const ended = await weigh(...argv);
    expect(ended.code).toBe(code);
    for (const text of says) expect(ended.stderr).toContain(text);
    expect(argv.includes('--json') ? '' : ended.stdout).toBe('');
    expect(ended.stderr).not.toMatch(/\n\s+at /);
  });

  it('is a document of problems on stdout with --json', async () => {
    const { code, stdout, stderr } = await weigh('weigh', 'nothing', '--json');
    expect([code, stderr, JSON.parse(stdout)]).toEqual([1, '', { problems: [{ code: 'unknown-thing', message: '"nothing" has no weight', expected: 'a thing' }] }]);
  });

  it('shows a stack only to those who ask for it', async () => {
    vi.stubEnv('RUNBRIEF_DEBUG', '1');
    expect((await weigh('weigh', 'hole')).stderr).toMatch(/\n\s+at /);
  });

  it('shows the line of the file with a caret', async () => {
    const file = join(mkdtempSync(join(tmpdir(), 'runbrief-')), 'a.case.yaml');
    writeFileSync(file, 'flow: pipe\nsizes: { diametr: 1 m }\n');
    const { stderr } = await captured(() => Promise.resolve(fail(new Problem({ code: 'unknown-key', message: '"diametr" is no size', file, line: 2, column: 10, length: 7 }), false)));
    expect(stderr).toContain('    2 | sizes: { diametr: 1 m }\n      |          ^^^^^^^');
  });
});

describe('help', () => {
  it('shows examples first, then arguments, flags and exit codes', async () => {
    const { code, stdout } = await weigh('weigh', '--help');
    const headings = stdout.match(/^[A-Z].*$/gm);
    expect([code, headings]).toEqual([0, ['Examples', 'Arguments', 'Flags', 'Exit codes']]);
    expect(stdout).toContain('--limit N');
    expect(stdout).toContain('most it may weigh; 5 unless said');
    expect(stdout).toContain('4         a limit was missed');
  });
  it.each([[['help', 'weigh']], [['weigh', '-h']], [['weigh', 'fig', '--help']]])('%j is the same page', async (argv) => {
    expect((await weigh(...argv)).stdout).toBe((await weigh('weigh', '--help')).stdout);
  });
  it.each([[[]], [['--help']], [['help']], [['-h']]])('%j is the overview', async (argv) => {
    const { code, stdout } = await weigh(...argv);
    expect(code).toBe(0);
    expect(stdout).toContain('weigh     the weight of a thing');
  });
});

describe('the program', () => {
  it('tells its version', async () => {
    expect(await runbrief(['--version'])).toMatchObject({ code: 0, stdout: expect.stringMatching(/^runbrief \d+\.\d+\.\d+\n$/) });
  });
  it('answers a wrong command with a document, where asked', async () => {
    const { code, stdout } = await runbrief(['no-such-command', '--json']);
    expect(code).toBe(2);
    expect(JSON.parse(stdout)).toMatchObject({ problems: [{ code: 'unknown-command' }] });
  });
});
