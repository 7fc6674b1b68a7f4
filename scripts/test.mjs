// `npm test`: sets up what is missing, then rooms, types, lint and all tests. Arguments go on to vitest.
import { spawnSync } from 'node:child_process';
import { fileURLToPath } from 'node:url';
import { ensure } from './ensure.mjs';

const root = fileURLToPath(new URL('..', import.meta.url));
ensure();

const { NODE_ENV: _production, NODE_EXTRA_CA_CERTS: _certificates, ...env } = process.env;
const steps = [
  ['rooms', 'scripts/check-rooms.mjs'],
  ['types', 'node_modules/typescript/bin/tsc', '-p', '.'],
  ['lint', 'node_modules/oxlint/bin/oxlint', '--type-aware', '--deny-warnings'],
  ['tests', 'node_modules/vitest/vitest.mjs', 'run', ...process.argv.slice(2)],
];
const failed = steps.filter(([name, ...args]) => {
  process.stdout.write(`\n${name}\n`);
  return spawnSync(process.execPath, args, { cwd: root, env, stdio: 'inherit' }).status !== 0;
});
if (failed.length > 0) process.stdout.write(`\nnot passed: ${failed.map(([name]) => name).join(', ')}\n`);
process.exitCode = failed.length > 0 ? 1 : 0;
