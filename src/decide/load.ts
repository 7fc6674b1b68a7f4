import { readdirSync, readFileSync, statSync } from 'node:fs';
import { join } from 'node:path';
import { Problem } from '../problems/index.ts';
import { compileRules, noRules, type RuleFile } from './compile.ts';
import { exampleOutcomes } from './examples.ts';
import type { CompiledRules } from './form.ts';
import type { KnownFacts } from './known.ts';

const most = 500;
const largest = 262144;

/**
 * The rule files of a folder and the folders in it, in the order of their paths.
 *
 * @param folder  as the user wrote it
 * @returns       name and text of every file that ends in .json
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
    const file = join(folder, name);
    const about = statSync(file, { throwIfNoEntry: false });
    if (about === undefined || !about.isFile()) throw new Problem({ code: 'no-file', message: `${file} is no file that can be read`, file });
    if (about.size > largest) throw new Problem({ code: 'file-too-large', message: `${file} is larger than ${largest / 1024} kB`, file });
    return { file, text: readFileSync(file, 'utf8') };
  });
}

/**
 * A company's rule pack over rules that stand already.
 *
 * @param folder  as the user wrote it
 * @param over    the rules that stand; one of the same id is replaced
 * @param known   the facts that rules may name
 * @returns       all rules
 * @throws        {Problem} everything that is wrong in the pack, its examples included
 */
export function withPack(folder: string, over: CompiledRules, known: KnownFacts): CompiledRules {
  const files = readRuleFolder(folder);
  const rules = compileRules(files, known, over, true);
  const own = compileRules(files, known, noRules, true);
  const wrong = exampleOutcomes(own).filter((o) => o.got !== o.expected);
  if (wrong.length > 0) throw new Problem(wrong.map((o) => ({ code: 'wrong-example', message: `example ${o.example} of ${o.rule} gives "${o.got}" and says "${o.expected}"`, ...fileOf(files, o.rule) })));
  return rules;
}

function fileOf(files: readonly RuleFile[], id: string): { file?: string } {
  const found = files.find(({ text }) => {
    const rule = JSON.parse(text) as { effect?: unknown; choice?: unknown };
    return (rule.effect ?? rule.choice) === id;
  });
  return found === undefined ? {} : { file: found.file };
}
