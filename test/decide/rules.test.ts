import { describe, expect, it } from 'vitest';
import { choiceIds, compileRules, effectIds, everyFact, exampleOutcomes, readRuleFolder } from '../../src/decide/index.ts';
import { Problem, printProblem } from '../../src/problems/index.ts';

const files = readRuleFolder('rules');
const known = everyFact();

describe('every rule file', () => {
  it.each(files)('$file stands in the form, and its examples give what they say', (file) => {
    try {
      const rules = compileRules([file], known);
      for (const { example, expected, got } of exampleOutcomes(rules)) expect(got, `example ${example}`).toBe(expected);
    } catch (error) {
      if (!(error instanceof Problem)) throw error;
      expect.fail(error.list.map((p) => printProblem(p, file.text)).join('\n'));
    }
  });
  it('is called after what it decides', () => {
    for (const { file, text } of files) {
      const rule = JSON.parse(text) as { effect?: string; choice?: string };
      expect(file.split('/').at(-1)).toBe(`${rule.effect ?? rule.choice}.json`);
      expect(rule.effect === undefined ? choiceIds : effectIds).toContain(rule.effect ?? rule.choice);
    }
  });
});
