import { spawnSync } from 'node:child_process';
import { mkdirSync, mkdtempSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { describe, expect, it } from 'vitest';

const tool = fileURLToPath(new URL('../../scripts/check-rooms.mjs', import.meta.url));

function breachesOf(files: Record<string, string>): string[] {
  const folder = mkdtempSync(join(tmpdir(), 'runbrief-rooms-'));
  for (const [path, text] of Object.entries(files)) {
    mkdirSync(dirname(join(folder, path)), { recursive: true });
    writeFileSync(join(folder, path), text);
  }
  const { stdout } = spawnSync(process.execPath, [tool, folder], { encoding: 'utf8' });
  return stdout.split('\n').filter((line) => line !== '');
}

const sound = {
  'src/units/index.ts': `export { convert } from './convert.ts';\n`,
  'src/units/convert.ts': `/* import { x } from '../mesh/index.ts' */\nexport function convert(): void {}\n`,
  'src/mesh/index.ts': `export { mesh, type Mesh } from './mesh.ts';\n`,
  'src/mesh/mesh.ts': `import { convert } from '../units/index.ts';\nexport interface Mesh { n: number }\nexport const mesh = (): Mesh => { convert(); return { n: 1 } };\n`,
  'test/mesh.test.ts': `import { mesh } from '../src/mesh/index.ts';\nmesh();\n`,
};

describe('the check of the rooms', () => {
  const rows = [
    { name: 'a sound tree', change: {}, breach: [] },
    { name: 'an import from below', change: { 'src/units/convert.ts': `import { mesh } from '../mesh/index.ts';\nexport const convert = mesh;\n` }, breach: ['src/units/convert.ts: units stands above mesh and may not import it'] },
    { name: 'a lazy import from below', change: { 'src/units/convert.ts': `export const convert = async () => { const { mesh } = await import('../mesh/index.ts'); return mesh; };\n` }, breach: ['src/units/convert.ts: units stands above mesh and may not import it'] },
    { name: 'a way past the index', change: { 'src/mesh/mesh.ts': `import { convert } from '../units/convert.ts';\nexport const mesh = convert;\n` }, breach: ['src/mesh/mesh.ts: reaches past units/index.ts to units/convert.ts', 'src/units/index.ts: exported and used nowhere: convert'] },
    { name: 'a circle', change: { 'src/units/convert.ts': `import { b } from './b.ts';\nexport const convert = b;\n`, 'src/units/b.ts': `import { convert } from './convert.ts';\nexport const b = () => convert;\n` }, breach: ['circle: src/units/b.ts -> src/units/convert.ts -> src/units/b.ts'] },
    { name: 'an index that computes', change: { 'src/units/index.ts': `export { convert } from './convert.ts';\nexport const one = 1;\n` }, breach: ['src/units/index.ts: an index.ts only exports, this one holds: export const one = 1;', 'src/units/index.ts: exported and used nowhere: one'] },
    { name: 'an export nobody uses', change: { 'src/mesh/mesh.ts': `import { convert } from '../units/index.ts';\nexport const mesh = convert;\nexport const spare = 2;\n` }, breach: ['src/mesh/mesh.ts: exported and used nowhere: spare'] },
    { name: 'a folder that is no room', change: { 'src/utils/a.ts': `const a = 1;\nvoid a;\n` }, breach: ['src/utils/a.ts: utils is not a room'] },
  ];
  it.each(rows)('on $name', ({ change, breach }) => {
    expect(breachesOf({ ...sound, ...change })).toEqual(breach);
  });
});
