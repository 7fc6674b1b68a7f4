import { isAlias, isMap, isScalar, isSeq, parseDocument, type ParsedNode } from 'yaml';
import { type Complaints, type Span } from './complaints.ts';
import { syntaxComplaints } from './syntax.ts';

/** A YAML value with its place; scalars are kept as text, since the vocabulary and not the spelling decides what they are. */
export type Tree = MapTree | ListTree | ScalarTree;

export interface MapTree extends Span {
  readonly kind: 'map';
  readonly pairs: readonly Pair[];
}

export interface Pair {
  readonly key: string;
  readonly keyAt: Span;
  readonly value: Tree;
}

export interface ListTree extends Span {
  readonly kind: 'list';
  readonly items: readonly Tree[];
}

export interface ScalarTree extends Span {
  readonly kind: 'scalar';
  readonly text: string;
  /** Characters before the text begins: 1 in quotes. */
  readonly lead: number;
  /** Nothing, `~` or `null` stands there. */
  readonly empty: boolean;
}

const deepest = 12;

/**
 * Parses YAML 1.2 into a tree. Aliases, anchors, tags, directives, a second document, keys that are no text and repeated
 * keys are complained about.
 *
 * @param text        the file
 * @param complaints  takes what is wrong
 * @returns           the tree, or undefined where the text is no YAML or no map
 */
export function parseTree(text: string, complaints: Complaints): MapTree | undefined {
  const directive = /^%[^\n]*/m.exec(text);
  if (directive !== null) {
    complaints.add({ from: directive.index, to: directive.index + directive[0].length }, { code: 'no-directive', message: 'a line beginning with % is a directive, which a case does not take', expected: 'keys such as flow, sizes, fluid' });
    return undefined;
  }
  const document = parseDocument(text, { version: '1.2', schema: 'core', merge: false, prettyErrors: false, uniqueKeys: false, logLevel: 'error' });
  const broken = [...document.errors, ...document.warnings];
  if (broken.length > 0) {
    syntaxComplaints(broken, text, complaints);
    return undefined;
  }
  const root = document.contents;
  if (root === null || !isMap(root)) {
    complaints.add(root === null ? { from: 0, to: 1 } : { from: root.range[0], to: root.range[1] }, { code: 'wrong-shape', message: 'the case file holds no keys', expected: 'keys such as flow, sizes, fluid, each with a value behind a colon' });
    return undefined;
  }
  return treeOf(root, complaints, 0) as MapTree | undefined;
}

function treeOf(node: ParsedNode, complaints: Complaints, depth: number): Tree | undefined {
  const span = { from: node.range[0], to: node.range[1] };
  if (isAlias(node)) return complaints.add(span, { code: 'no-alias', message: `"*${node.source}" points to another place of the file, which a case does not take`, expected: 'the value itself' });
  if (node.anchor !== undefined) return complaints.add(span, { code: 'no-anchor', message: `"&${node.anchor}" names a value for use elsewhere, which a case does not take`, expected: 'the value without it' });
  if (node.tag !== undefined) return complaints.add(span, { code: 'no-tag', message: 'a word beginning with ! sets the type of a value, which a case does not take', expected: 'the value without it' });
  if (depth > deepest) return complaints.add(span, { code: 'too-deep', message: `more than ${deepest} levels within each other`, expected: 'a case has at most five levels' });
  if (isScalar(node)) {
    const source = node.source ?? '';
    const plain = node.type === 'PLAIN';
    const quoted = node.type === 'QUOTE_DOUBLE' || node.type === 'QUOTE_SINGLE';
    return { kind: 'scalar', ...span, text: source, lead: quoted ? 1 : 0, empty: plain && (source === '' || source === '~' || source === 'null') };
  }
  if (isSeq(node)) {
    const items = node.items.map((item) => treeOf(item, complaints, depth + 1)).filter((item) => item !== undefined);
    return { kind: 'list', ...span, items };
  }
  if (!isMap(node)) return undefined;
  const pairs = new Map<string, Pair>();
  for (const { key: keyNode, value: valueNode } of node.items as readonly { key: ParsedNode | null; value: ParsedNode | null }[]) {
    if (keyNode === null) continue;
    const key = treeOf(keyNode, complaints, depth + 1);
    if (key === undefined) continue;
    if (key.kind !== 'scalar' || key.text === '') {
      complaints.add(key, { code: 'wrong-key', message: 'a key is a single word', expected: 'key: value' });
      continue;
    }
    if (key.text === '<<') {
      complaints.add(key, { code: 'no-merge', message: '"<<" merges another map, which a case does not take', expected: 'the keys themselves' });
      continue;
    }
    const first = pairs.get(key.text);
    if (first !== undefined) {
      const line = complaints.position(first.keyAt).line;
      complaints.add(key, { code: 'duplicate-key', message: `"${key.text}" is given twice, first in line ${line}`, expected: 'each key once' });
      continue;
    }
    const value = valueNode === null ? ({ kind: 'scalar', from: key.to, to: key.to, text: '', lead: 0, empty: true } as const) : treeOf(valueNode, complaints, depth + 1);
    if (value !== undefined) pairs.set(key.text, { key: key.text, keyAt: key, value });
  }
  return { kind: 'map', ...span, pairs: [...pairs.values()] };
}
