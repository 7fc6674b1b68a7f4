import { optionsOf } from './ids.ts';
import type { ChoiceExample, ChoiceRule, Option, Take } from './form.ts';
import type { Node } from './json-text.ts';
import { readCondition } from './read-condition.ts';
import { given, readFacts, readId, readTemplate } from './read-effect.ts';
import type { Fields, Reader } from './reader.ts';

const choiceKeys = ['choice', 'title', 'applies', 'options', 'first', 'otherwise', 'examples', 'sources'];
const optionKeys = ['take', 'because', 'source', 'check', 'needs'];

/** Reads a choice; what is wrong goes to the reader's problems. */
export function readChoice(reader: Reader, root: Node): ChoiceRule | undefined {
  const map = reader.fields(root, 'the rule', choiceKeys, ['choice', 'title', 'options', 'otherwise', 'examples']);
  if (map === undefined) return undefined;
  const get = (key: string): Node | undefined => map.get(key)?.value;
  const choice = readId(reader, get('choice'), 'the choice') ?? '';
  const options = readOptions(reader, get('options'), optionsOf(choice));
  const valid = ['none', ...Object.keys(options)];
  const entries = [
    ...reader.list(get('first'), '"first"').flatMap((node) => readOption(reader, node, valid, true) ?? []),
    ...(map.has('otherwise') ? [get('otherwise') as Node] : []).flatMap((node) => readOption(reader, node, valid, false) ?? []),
  ];
  const rule: ChoiceRule = {
    choice,
    title: reader.words(get('title'), 'the title') ?? choice,
    options,
    entries,
    sources: reader.list(get('sources'), '"sources"').flatMap((node) => reader.words(node, 'a source') ?? []),
    examples: reader.list(get('examples'), '"examples"').flatMap((node) => readExample(reader, node, valid) ?? []),
    ...given({ applies: readCondition(reader, get('applies'), '"applies"') }),
  };
  if (reader.problems.length === 0) missingExamples(reader, get('examples') ?? root, rule);
  return rule;
}

function readOptions(reader: Reader, node: Node | undefined, valid: readonly string[] | undefined): Record<string, string> {
  if (node === undefined) return {};
  if (!(node.value instanceof Map)) {
    reader.complain(node, 'wrong-form', '"options" is not an object');
    return {};
  }
  const out: [string, string][] = [];
  for (const [word, { key, value }] of node.value as Fields) {
    if (valid !== undefined && !valid.includes(word)) reader.complain(key, 'unknown-word', `"${word}" is no option of this choice`, { name: word, valid });
    else if (valid === undefined) readId(reader, key, 'an option');
    const why = reader.words(value, `the reason against ${word}`);
    if (why !== undefined) out.push([word, why]);
  }
  return Object.fromEntries(out);
}

function readOption(reader: Reader, node: Node, valid: readonly string[], conditional: boolean): Option | undefined {
  const map = reader.fields(node, conditional ? 'an entry of "first"' : '"otherwise"', conditional ? ['when', ...optionKeys] : optionKeys, conditional ? ['when', 'take', 'because'] : ['take', 'because']);
  const takeNode = map?.get('take')?.value;
  const take = takeNode === undefined ? undefined : readTake(reader, takeNode, valid);
  const because = readTemplate(reader, map?.get('because')?.value, '"because" of an option');
  if (map === undefined || take === undefined || because === undefined) return undefined;
  const when = readCondition(reader, map.get('when')?.value, '"when" of an option');
  return {
    take, because,
    needs: reader.list(map.get('needs')?.value, '"needs"').flatMap((n) => reader.fact(n, '"needs"') ?? []),
    ...given({ when, source: reader.words(map.get('source')?.value, 'the source of an option'), check: reader.words(map.get('check')?.value, '"check" of an option') }),
  };
}

function readTake(reader: Reader, node: Node, valid: readonly string[]): Take | undefined {
  if (!(node.value instanceof Map)) return reader.oneOf(node, 'the option taken', valid);
  const word = reader.fact(reader.fields(node, '"take"', ['word'], ['word'])?.get('word')?.value, '"take"');
  return word === undefined ? undefined : { word };
}

function readExample(reader: Reader, node: Node, valid: readonly string[]): ChoiceExample | undefined {
  const map = reader.fields(node, 'an example', ['facts', 'take', 'applies', 'why'], ['facts', 'take']);
  const facts = readFacts(reader, map?.get('facts')?.value);
  const take = reader.oneOf(map?.get('take')?.value, '"take" of an example', valid);
  if (map === undefined || facts === undefined || take === undefined) return undefined;
  return { facts, take, ...given({ applies: reader.flag(map.get('applies')?.value, '"applies"'), why: reader.words(map.get('why')?.value, '"why"') }) };
}

function missingExamples(reader: Reader, node: Node, rule: ChoiceRule): void {
  for (const take of new Set(rule.entries.map((e) => e.take))) {
    if (typeof take === 'string' && !rule.examples.some((e) => e.take === take && e.applies !== false)) reader.complain(node, 'missing-example', `no example takes ${take}`);
  }
  if (rule.applies !== undefined && !rule.examples.some((e) => e.applies === false)) reader.complain(node, 'missing-example', 'no example shows where the choice does not apply', { expected: 'one with "applies": false and "take": "none"' });
}
