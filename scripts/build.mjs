// dist/: the program as one file, the library with its types, rules and materials compiled, the licences of what is inside.
import { spawnSync } from 'node:child_process';
import { existsSync, mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { bundle } from './bundle.mjs';
import { writeLicences } from './licences.mjs';

const root = fileURLToPath(new URL('..', import.meta.url));
const at = (path) => `${root}${path}`;
process.chdir(root);

function run(...args) {
  const env = { ...process.env, NO_COLOR: '1' };
  const done = spawnSync(process.execPath, args, { cwd: root, env, encoding: 'utf8' });
  if (done.status === 0) return;
  process.stderr.write(`node ${args.join(' ')} ended with ${done.status}:\n${done.stdout}${done.stderr}\n`);
  process.exit(1);
}

/** Writes all other characters as escapes, so that a start need not decode the file: bin/ reads it byte by character. */
function asciiOnly(file) {
  const code = readFileSync(file, 'utf8');
  if (/String\.raw`[^`]*[^\0-\x7f]/.test(code)) throw new Error(`${file}: String.raw with a character that is not ASCII would change`);
  writeFileSync(file, code.replaceAll(/[^\0-\x7f]/g, (c) => `\\u${c.charCodeAt(0).toString(16).padStart(4, '0')}`));
}

rmSync(at('dist'), { recursive: true, force: true }); // with the compiled code of an earlier program, which V8 knows by its length only
mkdirSync(at('dist'));
for (const data of ['materials', 'rules']) {
  const script = `scripts/compile-${data}.ts`;
  if (!existsSync(at(script))) continue;
  await bundle(script, { file: `dist/compile-${data}.mjs`, format: 'esm' }); // Node 20 reads no TypeScript
  run(at(`dist/compile-${data}.mjs`));
  rmSync(at(`dist/compile-${data}.mjs`));
}
const inside = [
  ...(await bundle('src/main.ts', { file: 'dist/main.cjs', format: 'cjs', exports: 'named', minify: { compress: false, mangle: false, codegen: { removeWhitespace: true } } })),
  ...(await bundle('src/index.ts', { file: 'dist/index.js', format: 'esm' })),
];
asciiOnly(at('dist/main.cjs'));
writeLicences(inside, at('dist/licences.txt'));

// One run of the usual command, so that the compiled code kept beside the program holds what a plan uses.
const example = 'examples/rinse-line.case.yaml';
run(at('bin/runbrief.cjs'), ...(existsSync(at(example)) && existsSync(at('src/commands/plan.ts')) ? ['plan', example] : ['--version']));

run(at('node_modules/typescript/bin/tsc'), '-p', 'scripts/tsconfig.declarations.json');
