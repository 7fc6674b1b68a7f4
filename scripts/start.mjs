// `npm start`: sets up what is missing, then plans the example; `npm start -- ARGS` passes its words on to runbrief.
import { createRequire } from 'node:module';
import { fileURLToPath } from 'node:url';
import { ensure } from './ensure.mjs';

ensure();
if (process.argv.length === 2) process.argv.push('plan', fileURLToPath(new URL('../examples/rinse-line.case.yaml', import.meta.url)));
if (process.env.INIT_CWD !== undefined) process.chdir(process.env.INIT_CWD); // npm moved here; file names are the caller's
createRequire(import.meta.url)('../bin/runbrief.cjs');
