// Collects the licence texts of the packages whose code a bundle holds.
import { readdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';

/**
 * @param {string[]} modules  paths of the bundled modules
 * @param {string} file       where to write the texts
 */
export function writeLicences(modules, file) {
  const folders = new Set(modules.flatMap((path) => path.match(/^.*node_modules[\\/](?:@[^\\/]+[\\/])?[^\\/]+/)?.[0] ?? []));
  const texts = [...folders].map((folder) => {
    const { name, version, license } = JSON.parse(readFileSync(join(folder, 'package.json'), 'utf8'));
    const text = readdirSync(folder).filter((entry) => /^licen[cs]e/i.test(entry)).map((entry) => readFileSync(join(folder, entry), 'utf8').trim());
    return `${name} ${version} (${license})\n\n${text.join('\n\n')}`.trim();
  });
  writeFileSync(file, `Packages inside the bundled files, with their licences.\n\n${texts.sort().join(`\n\n${'-'.repeat(80)}\n\n`)}\n`);
}
