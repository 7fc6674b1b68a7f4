// Bundles an entry with everything it uses into one file.
import { isBuiltin } from 'node:module';
import { fileURLToPath } from 'node:url';
import { rolldown } from 'rolldown';

const root = fileURLToPath(new URL('..', import.meta.url));

// The command-line framework requires all its parts at the top of every file. Each part is fetched where it is used
// instead, so that a start pays only for the parser: `const x_1 = require("y")` becomes the require at each use of x_1.
const lazyFramework = {
  name: 'lazy-framework',
  transform: {
    filter: { id: /@oclif[\\/]core[\\/]lib[\\/].*\.js$/ },
    handler(code) {
      const found = [...code.matchAll(/^const (\w+_\d+) = ((?:__import(?:Default|Star)\()?require\("[^"]+"\)\)?);$/gm)];
      // It also listens on the stream of stdout, and thereby loads all of the runtime's streams. Our output writes without them.
      return found.reduce((text, [line, name, value]) => text.replace(line, '').replaceAll(new RegExp(`\\b${name}\\b`, 'g'), `(${value})`), code.replace(/^process\.stdout\.on\('error', .*?^\}\);$/ms, ''));
    },
  },
};

// The bundler fetches every part of the runtime that any package imports at the top of the file. Behind a module of its
// own each part is fetched when the first module that imports it runs.
const marker = '\0runtime:';
const lazyRuntime = {
  name: 'lazy-runtime',
  resolveId(source, importer, { kind }) {
    if (kind !== 'import-statement' || !isBuiltin(source) || importer?.startsWith(marker)) return null;
    return `${marker}${source.replace(/^(?!node:)/, 'node:')}`;
  },
  load(id) {
    return id.startsWith(marker) ? { code: `module.exports = require(${JSON.stringify(id.slice(marker.length))});`, moduleType: 'js' } : null;
  },
};

/**
 * @param {string | Record<string, string>} input  entry
 * @param {import('rolldown').OutputOptions} output  where to, and the module format
 * @returns {Promise<string[]>} paths of the modules that are in the file
 */
export async function bundle(input, output) {
  const made = await rolldown({ input, cwd: root, platform: 'node', logLevel: 'warn', plugins: output.format === 'cjs' ? [lazyFramework, lazyRuntime] : [] });
  const { output: chunks } = await made.write({ codeSplitting: false, ...output });
  await made.close();
  return chunks.flatMap((chunk) => (chunk.type === 'chunk' ? chunk.moduleIds : []));
}
