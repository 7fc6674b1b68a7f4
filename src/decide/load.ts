import { readdirSync, readFileSync, statSync } from 'node:fs';
import { join } from 'node:path';
import { Problem } from '../problems/index.ts';
import type { RuleFile } from './compile.ts';

const most = 500;
const largest = 262144;

/**
 * The rule files of a folder and the folders in it, in the order of their paths.
 *
 * @param folder  as the user wrote it
 * @returns       path and text of every file that ends in .json
 * @throws        {Problem} no-folder, no-rules, too-many-files, file-too-large
 */
export function readRuleFolder(folder: string): RuleFile[] {
  let names: string[];
  try {
    names = readdirSync(folder, { recursive: true, encoding: 'utf8' }).filter((name) => name.endsWith('.json')).sort();
  } catch {
    throw new Problem({ code: 'no-folder', message: `the folder ${folder} cannot be read`, expected: 'a folder with rule files (.json)' });
  }
  if (names.length === 0) throw new Problem({ code: 'no-rules', message: `no rule file stands in ${folder}`, expected: 'files that end in .json, one effect or choice in each' });
  if (names.length > most) throw new Problem({ code: 'too-many-files', message: `${folder} holds ${names.length} files`, expected: `at most ${most}` });
  return names.map((name) => {
    const path = join(folder, name);
    const about = statSync(path, { throwIfNoEntry: false });
    if (about === undefined || !about.isFile()) throw new Problem({ code: 'no-file', message: `${path} is no file that can be read`, file: path });
    if (about.size > largest) throw new Problem({ code: 'file-too-large', message: `${path} is larger than ${largest / 1024} kB`, file: path });
    return { path, text: readFileSync(path, 'utf8') };
  });
}
