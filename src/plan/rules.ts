import { existsSync, readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { allDefinitions } from '../assemble/index.ts';
import { compileRules, definitionsOfVerdicts, knownFacts, readRuleFolder, type CompiledRules, type RuleFile } from '../decide/index.ts';

let shipped: CompiledRules | undefined;

/**
 * The rules that come with the program: compiled by the build, or read from the folder in a source tree.
 *
 * @returns  compiled rules, read once
 * @throws   {Problem} every fault of a rule file
 */
export function shippedRules(): CompiledRules {
  if (shipped !== undefined) return shipped;
  const compiled = fileURLToPath(new URL('./rules.json', import.meta.url));
  return (shipped = existsSync(compiled) ? revived(readFileSync(compiled, 'utf8')) : compileFiles(readRuleFolder(fileURLToPath(new URL('../../rules', import.meta.url)))));
}

/** Rules as the build wrote them; the examples of a rule are read when they are asked for. */
function revived(text: string): CompiledRules {
  const rules = JSON.parse(text) as CompiledRules;
  for (const rule of [...Object.values(rules.effects), ...Object.values(rules.choices)]) {
    const written = rule.examples as unknown as string;
    Object.defineProperty(rule, 'examples', { enumerable: true, get: (): unknown => JSON.parse(written) });
  }
  return rules;
}

/** Compiles rule files against all ids that the program defines. */
export function compileFiles(files: readonly RuleFile[]): CompiledRules {
  return compileRules(files, knownFacts([...allDefinitions(), ...definitionsOfVerdicts()]));
}
