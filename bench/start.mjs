// What a start costs: wall time (least and median) and largest memory of a bare start of the runtime, of the smallest
// command and of a plan, taken in turns so that a busy machine disturbs all alike. `node bench/start.mjs [rounds]`.
import { spawnSync } from 'node:child_process';
import { existsSync } from 'node:fs';
import { fileURLToPath } from 'node:url';

const root = fileURLToPath(new URL('..', import.meta.url));
const program = `${root}bin/runbrief.cjs`;
const example = `${root}examples/rinse-line.case.yaml`;
const rounds = Number(process.argv[2] ?? 15);
const { NODE_EXTRA_CA_CERTS: _readOnEveryStart, ...env } = process.env; // the runtime would read the certificates on every start

const runs = [
  { name: 'bare node', args: ['-e', '0'] },
  { name: 'runbrief --version', args: [program, '--version'] },
  { name: 'runbrief --help', args: [program, '--help'] },
  ...(existsSync(example) ? [{ name: 'runbrief plan', args: [program, 'plan', example] }] : []),
].map((run) => ({ ...run, times: [], memory: 0, code: 0 }));

/** Largest memory of one run [MB], read by a line of code loaded before the program. */
function memoryOf(args) {
  const probe = `data:text/javascript,process.on('exit',()=>process.stderr.write('\\n'+process.resourceUsage().maxRSS))`;
  const { stderr } = spawnSync(process.execPath, ['--import', probe, ...args], { env, encoding: 'utf8' });
  return Number(stderr.trim().split('\n').at(-1)) / 1024;
}

for (let round = 0; round < rounds; round++) {
  for (const run of runs) {
    const started = performance.now();
    run.code = spawnSync(process.execPath, run.args, { env }).status;
    run.times.push(performance.now() - started);
  }
}
for (const run of runs) run.memory = memoryOf(run.args);

const median = (times) => times.toSorted((a, b) => a - b)[Math.floor(times.length / 2)];
process.stdout.write(`${'start of'.padEnd(22)}${'least ms'.padStart(10)}${'median ms'.padStart(11)}${'x bare'.padStart(8)}${'MB'.padStart(7)}  exit\n`);
const plan = runs.at(-1);
for (const { name, times, memory, code } of runs) {
  const shown = [Math.min(...times), median(times)].map((ms) => ms.toFixed(0));
  const bare = median(times) / median(runs[0].times);
  process.stdout.write(`${name.padEnd(22)}${shown[0].padStart(10)}${shown[1].padStart(11)}${bare.toFixed(1).padStart(8)}${memory.toFixed(0).padStart(7)}  ${code}\n`);
}
if (plan.name === 'runbrief plan') {
  const ratio = median(plan.times) / median(runs[0].times);
  process.stdout.write(`a plan takes ${ratio.toFixed(1)} times a bare start (limit 4) and ${plan.memory.toFixed(0)} MB (limit 120): ${ratio <= 4 && plan.memory <= 120 ? 'held' : 'MISSED'}\n`);
}
