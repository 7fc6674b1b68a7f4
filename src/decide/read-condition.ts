import { operators, type Condition, type Leaf, type Limit } from './form.ts';
import type { Node } from './json-text.ts';
import type { Fields, Reader } from './reader.ts';

const deepest = 20;
const refused: Readonly<Record<string, string>> = {
  not: 'a number that is not known would pass it; use the opposite operator',
  priority: 'it skips conditions and leaves the reason without numbers',
  path: 'a misspelt one is silently false',
  condition: 'conditions are written out where they are used',
  params: 'facts take no parameters',
};

/** Reads a condition; undefined where it is missing or wrong. */
export function readCondition(reader: Reader, node: Node | undefined, what: string, depth = 0): Condition | undefined {
  if (node === undefined) return undefined;
  if (!(node.value instanceof Map)) return reader.complain(node, 'wrong-form', `${what} is not an object`, { expected: '{ "all": [..] }, { "any": [..] } or { "fact", "operator", "value" }' });
  const map = node.value as Fields;
  for (const [key, why] of Object.entries(refused)) {
    const found = map.get(key);
    if (found !== undefined) return reader.complain(found.key, 'refused-key', `"${key}" is refused in a condition: ${why}`);
  }
  const groups = (['all', 'any'] as const).filter((g) => map.has(g));
  const group = groups[0];
  if (group === undefined) return readLeaf(reader, node, what);
  if (groups.length === 2 || map.size > 1) return reader.complain(node, 'mixed-condition', `${what} has other keys beside "${group}"; only one of all and any can stand in an object`);
  if (depth >= deepest) return reader.complain(node, 'too-deep', `${what} is nested deeper than ${deepest} levels`);
  const inner = map.get(group)?.value as Node;
  const parts = reader.list(inner, `"${group}" of ${what}`);
  if (parts.length === 0) return reader.complain(inner, 'empty-condition', `"${group}" of ${what} is empty: it would always hold`);
  const read = parts.flatMap((part) => readCondition(reader, part, what, depth + 1) ?? []);
  return group === 'all' ? { all: read } : { any: read };
}

function readLeaf(reader: Reader, node: Node, what: string): Leaf | undefined {
  const map = reader.fields(node, what, ['fact', 'operator', 'value', 'else'], ['fact', 'operator', 'value']);
  const fact = reader.fact(map?.get('fact')?.value, what);
  const operator = reader.oneOf(map?.get('operator')?.value, `the operator of ${what}`, operators);
  const valueNode = map?.get('value')?.value;
  const otherwise = reader.words(map?.get('else')?.value, `"else" of ${what}`);
  if (fact === undefined || operator === undefined || valueNode === undefined) return undefined;
  const value = readValue(reader, valueNode, fact, operator, what);
  return value === undefined ? undefined : { fact, operator, value, ...(otherwise === undefined ? {} : { else: otherwise }) };
}

function readValue(reader: Reader, node: Node, fact: string, operator: string, what: string): Leaf['value'] | undefined {
  const list = reader.closedList(fact);
  const oneWord = (n: Node): string | undefined => {
    if (typeof n.value !== 'string') return reader.complain(n, 'wrong-kind', `${fact} is a word and is compared with something else`);
    if (list !== undefined && list !== 'any' && !list.includes(n.value)) return reader.complain(n, 'unknown-word', `${fact} is never "${n.value}"`, { name: n.value, valid: list });
    return n.value;
  };
  if (operator === 'in' || operator === 'notIn') {
    const parts = reader.list(node, `the value of ${what}`);
    if (parts.length === 0) return reader.complain(node, 'empty-condition', `the list of ${what} is empty`);
    if (list === undefined && reader.knows) return reader.complain(node, 'wrong-kind', `${fact} is a number; "${operator}" compares words`);
    return parts.flatMap((part) => oneWord(part) ?? []);
  }
  const word = typeof node.value === 'string';
  if (word || list !== undefined) {
    if (operator !== 'equal' && operator !== 'notEqual') return reader.complain(node, 'wrong-kind', `"${operator}" compares numbers${word ? ', and the value is a word' : `, and ${fact} is a word`}`);
    if (list === undefined && reader.knows) return reader.complain(node, 'wrong-kind', `${fact} is a number and is compared with a word`);
    return oneWord(node);
  }
  return readLimit(reader, node, `the value of ${what}`);
}

/** Reads a number or a share of a quantity. */
export function readLimit(reader: Reader, node: Node | undefined, what: string): Limit | undefined {
  if (node === undefined) return undefined;
  if (typeof node.value === 'number') return node.value;
  const map = reader.fields(node, what, ['quantity', 'times'], ['quantity']);
  const quantity = reader.quantity(map?.get('quantity')?.value, what);
  const times = map?.has('times') === true ? reader.number(map.get('times')?.value, `"times" of ${what}`) : 1;
  return quantity === undefined || times === undefined ? undefined : { quantity, times };
}
