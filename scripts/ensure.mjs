// Brings a fresh or stale checkout into a runnable state: packages where the lock asks for more than is there, a build
// where its inputs changed. Node's own modules only, since this runs before any package exists.
import { spawnSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import { existsSync, readdirSync, readFileSync, statSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';

const root = fileURLToPath(new URL('..', import.meta.url));
const inputs = ['src', 'rules', 'materials', 'bin', 'scripts', 'tsconfig.json', 'package.json', 'package-lock.json'];
const settingsOfTheCaller = /^npm_(lifecycle_|package_|command$|config_(omit|include|only|production|dry_run|ignore_scripts|global|location|workspaces?|loglevel|json|package_lock_only|prefix|local_prefix)$)/i;

/** Runs one step with the caller's npm settings taken out; its output is shown only where it fails. */
function step(what, command, args) {
  const env = Object.fromEntries(Object.entries(process.env).filter(([name]) => !settingsOfTheCaller.test(name) && name !== 'NODE_ENV'));
  const started = Date.now();
  process.stderr.write(`${what} ...\n`);
  const done = spawnSync(command, args, { cwd: root, env, encoding: 'utf8', maxBuffer: 1 << 26, shell: command === 'npm' && process.platform === 'win32' });
  if (done.status !== 0) {
    process.stderr.write(`${what} failed:\n${done.stdout ?? ''}${done.stderr ?? ''}${done.error ?? ''}\n`);
    process.exit(done.status || 1);
  }
  process.stderr.write(`${what}: ${((Date.now() - started) / 1000).toFixed(1)} s\n`);
}

function packagesAreThere() {
  try {
    const have = JSON.parse(readFileSync(join(root, 'node_modules/.package-lock.json'), 'utf8')).packages;
    const want = JSON.parse(readFileSync(join(root, 'package-lock.json'), 'utf8')).packages;
    return Object.entries(want).every(([path, { version, optional, devOptional, peer }]) => path === '' || optional || devOptional || peer || have[path]?.version === version);
  } catch {
    return false;
  }
}

function filesUnder(path) {
  if (!existsSync(join(root, path))) return [];
  if (statSync(join(root, path)).isFile()) return [path];
  return readdirSync(join(root, path)).sort().flatMap((name) => filesUnder(`${path}/${name}`));
}

function fingerprint() {
  const hash = createHash('sha256');
  for (const path of inputs.flatMap(filesUnder)) hash.update(`${path}\n`).update(readFileSync(join(root, path)));
  return hash.digest('hex');
}

/** Installs and builds what is missing; says so on stderr. */
export function ensure() {
  const [major = 0, minor = 0] = process.versions.node.split('.').map(Number);
  if (major < 20 || (major === 20 && minor < 19)) {
    process.stderr.write(`runbrief needs Node 20.19 or newer; this is ${process.version}\n`);
    process.exit(1);
  }
  if (!packagesAreThere()) {
    const args = ['ci', '--include=dev', '--no-audit', '--no-fund', '--loglevel=error'];
    const npm = process.env.npm_execpath;
    if (npm !== undefined && /npm-cli\.[cm]?js$/.test(npm)) step('Installing packages', process.execPath, [npm, ...args]);
    else step('Installing packages', 'npm', args);
  }
  const stamp = join(root, 'dist/.stamp');
  const now = fingerprint();
  if (existsSync(stamp) && readFileSync(stamp, 'utf8') === now) return;
  step('Building', process.execPath, [join(root, 'scripts/build.mjs')]);
  writeFileSync(stamp, now);
}

if (process.argv[1] === fileURLToPath(import.meta.url)) ensure();
