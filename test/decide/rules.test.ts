import { describe, expect, it } from 'vitest';
import { choiceIds, compileRules, effectIds, everyFact, exampleOutcomes, readRuleFolder, type ExampleOutcome, type RuleFile } from '../../src/decide/index.ts';
import { Problem, printProblem } from '../../src/problems/index.ts';

const files = readRuleFolder('rules');
const known = everyFact();

/** What the examples of a file give; a file that is wrong is told as a user would read it. */
function outcomesOf(file: RuleFile): ExampleOutcome[] {
  try {
    return exampleOutcomes(compileRules([file], known));
  } catch (error) {
    throw error instanceof Problem ? new Error(error.list.map((p) => printProblem(p, file.text)).join('\n')) : error;
  }
}

describe('every rule file', () => {
  it.each(files)('$file stands in the form, and its examples give what they say', (file) => {
    const outcomes = outcomesOf(file);
    const say = (o: ExampleOutcome, which: 'expected' | 'got'): string => `example ${o.example}: ${o[which]}`;
    expect(outcomes.map((o) => say(o, 'got'))).toEqual(outcomes.map((o) => say(o, 'expected')));
  });
  it('is called after what it decides', () => {
    for (const { file, text } of files) {
      const rule = JSON.parse(text) as { effect?: string; choice?: string };
      expect(file.split('/').at(-1)).toBe(`${rule.effect ?? rule.choice}.json`);
      expect(rule.effect === undefined ? choiceIds : effectIds).toContain(rule.effect ?? rule.choice);
    }
  });
});
