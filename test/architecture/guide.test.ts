import { readFileSync } from 'node:fs';
import { expect, it } from 'vitest';
import { everyFact, readRuleFolder } from '../../src/decide/index.ts';

const guide = readFileSync('DEVELOPERS.md', 'utf8');
const paragraph = /## Words that rules may use\n\n([^]*?)A new word is/.exec(guide)?.[1] ?? '';
const listed = paragraph.replaceAll(/\([^)]*\)/g, '').split(/[,.]\s/).flatMap((part) => part.trim().replaceAll('`', '').split(/\s/).slice(0, 1)).filter((word) => word !== '');
const { words } = everyFact();

/** Facts of a rule file, wherever they stand. */
const factsIn = (value: unknown): string[] =>
  typeof value !== 'object' || value === null ? [] : Object.entries(value).flatMap(([key, of]) => (key === 'fact' ? [String(of)] : factsIn(of)));

it('the guide lists every word that a rule reads', () => {
  const used = new Set(readRuleFolder('rules').flatMap((file) => factsIn(JSON.parse(file.text))));
  expect([...used].filter((fact) => words.has(fact) && !/^(has|verdict|choice|kept)\./.test(fact) && !listed.includes(fact))).toEqual([]);
});

it('the guide lists no word that is not there', () => {
  expect(listed.length).toBeGreaterThan(30);
  expect(listed.filter((word) => !/^(has|verdict|choice|kept)\.</.test(word) && !words.has(word))).toEqual([]);
});
