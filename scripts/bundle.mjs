// Bundles an entry with everything it uses into one file.
import { rolldown } from 'rolldown';
import { fileURLToPath } from 'node:url';

const root = fileURLToPath(new URL('..', import.meta.url));

// The command-line framework requires all its parts at the top of every file. Each part is fetched where it is used
// instead, so that a start pays only for the parser: `const x_1 = require("y")` becomes the require at each use of x_1.
const lazyFramework = {
  name: 'lazy-framework',
  transform: {
    filter: { id: /@oclif[\\/]core[\\/]lib[\\/].*\.js$/ },
    handler(code) {
      const found = [...code.matchAll(/^const (\w+_\d+) = ((?:__import(?:Default|Star)\()?require\("[^"]+"\)\)?);$/gm)];
      return found.reduce((text, [line, name, value]) => text.replace(line, '').replaceAll(new RegExp(`\\b${name}\\b`, 'g'), `(${value})`), code);
    },
  },
};

// Parts of the runtime that some rarely used package wants are fetched at their first use, not at every start.
const lazyRuntime = {
  name: 'lazy-runtime',
  renderChunk(code, _chunk, { format }) {
    if (format !== 'cjs') return null;
    const hoisted = [...code.matchAll(/^let (\w+) = (require\("node:[^"]+"\));\n(?:\1 = (\S+)\(\1(, 1)?\);\n)?/gm)];
    return hoisted.reduce((text, [lines, name, fetched, wrap, mode = '']) => {
      const value = wrap === undefined ? fetched : `${wrap}(${fetched}${mode})`;
      const rest = text.replace(lines, '').replaceAll(new RegExp(`\\b${name}\\b`, 'g'), `${name}()`);
      return `let kept_${name};\nconst ${name} = () => (kept_${name} ??= ${value});\n${rest}`;
    }, code);
  },
};

/**
 * @param {string | Record<string, string>} input  entry
 * @param {import('rolldown').OutputOptions} output  where to, and the module format
 * @returns {Promise<string[]>} paths of the modules that are in the file
 */
export async function bundle(input, output) {
  const made = await rolldown({ input, cwd: root, platform: 'node', logLevel: 'warn', plugins: [lazyFramework, lazyRuntime] });
  const { output: chunks } = await made.write({ codeSplitting: false, ...output });
  await made.close();
  return chunks.flatMap((chunk) => (chunk.type === 'chunk' ? chunk.moduleIds : []));
}
