import { spawnSync } from 'node:child_process';
import { mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';

const root = fileURLToPath(new URL('../..', import.meta.url));
const folder = mkdtempSync(join(tmpdir(), 'runbrief-package-'));
const about = JSON.parse(readFileSync(join(root, 'package.json'), 'utf8')) as { version: string };

/** Environment without what npm hands on to its scripts, which would steer the inner npm. */
const env = Object.fromEntries(Object.entries(process.env).filter(([name]) => !/^npm_|^NODE_ENV$|^INIT_CWD$/i.test(name)));
const run = (command: string, ...args: string[]) => spawnSync(command, args, { cwd: folder, env, encoding: 'utf8' });
const installed = (...args: string[]) => run(process.execPath, join(folder, 'node_modules/runbrief/bin/runbrief.cjs'), ...args);

beforeAll(() => {
  const packed = run('npm', 'pack', root, '--ignore-scripts', '--silent', '--pack-destination', folder); // built by npm test
  writeFileSync(join(folder, 'package.json'), '{ "private": true }\n');
  const put = run('npm', 'install', '--offline', '--no-audit', '--no-fund', join(folder, packed.stdout.trim()));
  if (put.status !== 0) throw new Error(`npm install of the package: ${packed.stderr}${put.stderr}`);
});
afterAll(() => rmSync(folder, { recursive: true, force: true }));

describe('the package in an empty folder, without a network', () => {
  it('brings everything itself', () => {
    expect(readdirSync(join(folder, 'node_modules')).filter((name) => !name.startsWith('.'))).toEqual(['runbrief']);
  });
  it('has a command that starts', () => {
    const started = run(join(folder, 'node_modules/.bin', process.platform === 'win32' ? 'runbrief.cmd' : 'runbrief'), '--version');
    expect([started.status, started.stdout]).toEqual([0, `runbrief ${about.version}\n`]);
  });
  it('shows help and refuses a wrong command', () => {
    expect(installed('--help').stdout).toContain('Begin with');
    expect(installed('no-such-command').status).toBe(2);
  });
  it('is a library too', () => {
    const used = run(process.execPath, '--input-type=module', '-e', `import { Problem } from 'runbrief'; console.log(new Problem({ code: 'a', message: 'b' }).list.length)`);
    expect([used.stderr, used.stdout]).toEqual(['', '1\n']);
  });
  it('has types that a strict program compiles against', () => {
    writeFileSync(join(folder, 'use.mts'), `import { plan, readCaseFile, vocabulary, type Plan } from 'runbrief';
export const made: Promise<Plan> = plan(readCaseFile('line.case.yaml', vocabulary), { version: '1' });
// @ts-expect-error a number is no file name
readCaseFile(3, vocabulary);
`);
    const checked = run(process.execPath, join(root, 'node_modules/typescript/bin/tsc'), '--noEmit', '--strict', '--module', 'nodenext', '--target', 'es2023', '--types', 'node', '--typeRoots', join(root, 'node_modules/@types'), 'use.mts');
    expect(checked.stdout).toBe('');
  });
  it('carries no tests, sources or compiled code of this machine', () => {
    const held = readdirSync(join(folder, 'node_modules/runbrief'), { recursive: true, encoding: 'utf8' });
    expect(held.filter((name) => /^(src|test|scripts|node_modules)\b/.test(name))).toEqual([]);
    expect(held).toContain(join('dist', 'licences.txt'));
  });
});
