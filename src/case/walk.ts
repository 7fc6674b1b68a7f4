import { nearestName, Problem, type ProblemData } from '../problems/index.ts';
import type { Complaints, Span } from './complaints.ts';
import type { Entry } from './entry.ts';
import { type Beside, readLeaf, shown } from './leaf.ts';
import type { ListTree, MapTree, Pair, ScalarTree, Tree } from './tree.ts';
import { type Field, type Fields, type LeafField, type ListField, own, type Vocabulary } from './vocabulary.ts';
import { elsewhere } from './elsewhere.ts';
import { givenBy } from './field-at.ts';
import { exampleFor, nameProblem, wallProblem } from './names.ts';

/** What a walk through the file brought. */
export interface Found {
  readonly entries: Map<string, Entry>;
  readonly lists: Map<string, readonly string[]>;
  readonly maps: Set<string>;
  readonly together: readonly (readonly (Span & { readonly path: string })[])[];
}

/** The single values of a map, by key. */
function besideIn(tree: MapTree): Beside {
  return {
    text(key) {
      const value = tree.pairs.find((pair) => pair.key === key)?.value;
      return value?.kind === 'scalar' ? value.text : undefined;
    },
  };
}

/** Goes through the tree of a case file beside the tree of the vocabulary. */
export class Walk {
  readonly #vocabulary: Vocabulary;
  readonly #complaints: Complaints;
  readonly #partial: boolean;
  readonly #entries = new Map<string, Entry>();
  readonly #lists = new Map<string, readonly string[]>();
  readonly #maps = new Set<string>();
  readonly #together: (Span & { path: string })[][] = [];
  #flow: string | undefined;

  constructor(vocabulary: Vocabulary, complaints: Complaints, partial: boolean) {
    this.#vocabulary = vocabulary;
    this.#complaints = complaints;
    this.#partial = partial;
  }

  /** The whole document; the flow is read first, since sizes and walls depend on it. */
  document(tree: MapTree): Found {
    const flow = tree.pairs.find((pair) => pair.key === 'flow')?.value;
    if (flow?.kind === 'scalar' && Object.hasOwn(this.#vocabulary.flows, flow.text)) this.#flow = flow.text;
    this.#keys(tree, this.#vocabulary.keys, '');
    for (const [one, many] of [['inlet', 'inlets']] as const) {
      const both = tree.pairs.filter((pair) => pair.key === one || pair.key === many);
      if (both[1] !== undefined) this.#complain(both[1].keyAt, '', { code: 'both-given', message: `${one} and ${many} are both given`, expected: `${one} for a single one, ${many} for several` });
    }
    return { entries: this.#entries, lists: this.#lists, maps: this.#maps, together: this.#together };
  }

  #complain(span: Span, path: string, problem: ProblemData): undefined {
    return this.#complaints.add(span, path === '' ? problem : { ...problem, message: `${path}: ${problem.message}` });
  }

  #keys(tree: MapTree, fields: Fields, path: string, skip?: string): void {
    const beside = besideIn(tree);
    for (const pair of tree.pairs) {
      const field = own(fields, pair.key);
      if (pair.key === skip) continue;
      if (field === undefined) this.#unknownKey(pair, fields, path);
      else this.#value(pair.value, field, path === '' ? pair.key : `${path}.${pair.key}`, beside, pair);
    }
    if (this.#partial) return;
    for (const [key, field] of Object.entries(fields)) {
      if (field.required !== true || tree.pairs.some((pair) => pair.key === key)) continue;
      const whole = path === '' ? { from: tree.from, to: tree.from + (tree.pairs[0]?.key.length ?? 1) } : { from: tree.from, to: tree.to };
      this.#complain(whole, path, { code: 'missing-key', message: `${key} is missing`, expected: `${key}: ${field.example}` });
    }
  }

  #unknownKey(pair: Pair, fields: Fields, path: string): void {
    if (this.#complaints.full) return this.#complaints.add(pair.keyAt, { code: 'unknown-key', message: '' });
    const { key } = pair;
    const valid = Object.keys(fields);
    const glued = /^([A-Za-z]+):(.+)$/.exec(key);
    const nearest = glued !== null && Object.hasOwn(fields, glued[1] as string) ? `${glued[1]}: ${glued[2]}` : nearestName(key, valid);
    const where = path === '' ? 'a case' : path === 'sizes' ? `the sizes of ${this.#flow}` : path;
    const others = elsewhere(this.#vocabulary, this.#flow, key);
    const expected = `${valid.join(', ')}${others.length === 0 ? '' : `; ${key} stands in ${others.join(', ')}`}`;
    this.#complaints.add(pair.keyAt, { code: 'unknown-key', message: `"${shown(key)}" is not a key of ${where}`, expected, ...(nearest === undefined ? {} : { nearest: nearest }) });
  }

  #value(tree: Tree, field: Field, path: string, beside: Beside, pair?: Pair): void {
    if (tree.kind === 'scalar' && tree.empty) {
      this.#complain(pair?.keyAt ?? tree, path, { code: 'empty-value', message: 'nothing is given', expected: `${field.doc}, for example ${field.example}` });
      return;
    }
    switch (field.kind) {
      case 'map':
        return this.#map(tree, field.keys, field, path);
      case 'sizes': {
        const sizes = this.#flow === undefined ? undefined : own(this.#vocabulary.flows, this.#flow)?.sizes;
        if (sizes !== undefined) this.#map(tree, sizes, field, path);
        return;
      }
      case 'open-map':
        return tree.kind === 'scalar' && field.alone !== undefined ? this.#leaf(tree, field.alone, path, beside) : this.#openMap(tree, field.item, field, path);
      case 'list':
        return this.#list(tree, field, path);
      case 'paths':
        return this.#paths(tree, field, path);
      case 'words':
        return this.#words(tree, field, path, beside);
      default:
        if (tree.kind === 'scalar') this.#leaf(tree, field, path, beside);
        else this.#shape(tree, field, path, 'a single value');
    }
  }

  #shape(tree: Tree, field: Field, path: string, wanted: string): void {
    const got = tree.kind === 'map' ? 'keys and values' : tree.kind === 'list' ? 'a list' : `"${shown(tree.text)}"`;
    this.#complain(tree, path, { code: 'wrong-shape', message: `${got} in place of ${wanted}`, expected: `${path.split('.').at(-1)}: ${exampleFor(field, this.#vocabulary, this.#flow)}` });
  }

  #map(tree: Tree, fields: Fields, field: Field, path: string): void {
    if (tree.kind !== 'map') return this.#shape(tree, field, path, 'keys with values');
    this.#maps.add(path);
    this.#keys(tree, fields, path);
  }

  #openMap(tree: Tree, item: Field, field: Field, path: string): void {
    if (tree.kind !== 'map') return this.#shape(tree, field, path, 'names with values');
    const names: string[] = [];
    for (const pair of tree.pairs) {
      if (!this.#goodName(pair.key, pair.keyAt, path, names)) continue;
      names.push(pair.key);
      this.#value(pair.value, item, `${path}.${pair.key}`, { text: () => undefined }, pair);
    }
    this.#lists.set(path, names);
  }

  #list(tree: Tree, field: ListField, path: string): void {
    if (tree.kind !== 'list') return this.#shape(tree, field, path, 'a list, each item begun by "- " or within [ ]');
    const names: string[] = [];
    for (const [index, item] of tree.items.entries()) {
      if (item.kind !== 'map') {
        this.#shape(item, field, `${path}.${index}`, 'keys with values');
        continue;
      }
      const name = this.#nameOf(item, field, path, index, names);
      if (name === undefined) continue;
      names.push(name);
      this.#maps.add(`${path}.${name}`);
      this.#keys(item, field.item.keys, `${path}.${name}`, field.names === undefined ? undefined : 'name');
    }
    this.#lists.set(path, names);
  }

  /** The name of an item, which is its part of the path; its place in the list where it has none. */
  #nameOf(item: MapTree, field: ListField, path: string, index: number, taken: readonly string[]): string | undefined {
    const pair = field.names === undefined ? undefined : item.pairs.find((one) => one.key === 'name');
    if (pair === undefined) {
      if (field.names === undefined || field.names === 'optional') return String(index);
      if (this.#partial && field.names === 'required') return String(index);
      return this.#complain(item, `${path}.${index}`, { code: 'missing-key', message: 'name is missing', expected: `${path}: ${exampleFor(field, this.#vocabulary, this.#flow)}` });
    }
    if (pair.value.kind !== 'scalar') return this.#complain(pair.value, `${path}.${index}`, { code: 'wrong-shape', message: 'a name is a single word', expected: `${path}: ${field.example}` });
    const name = pair.value.text;
    if (!this.#goodName(name, pair.value, path, taken)) return undefined;
    const wrong = field.names === 'walls' && this.#flow !== undefined ? wallProblem(this.#vocabulary, this.#flow, name) : undefined;
    return wrong === undefined ? name : this.#complain(pair.value, path, wrong);
  }

  #goodName(name: string, span: Span, path: string, taken: readonly string[]): boolean {
    const problem = nameProblem(name, taken);
    if (problem !== undefined) this.#complain(span, path, problem);
    return problem === undefined;
  }

  #words(tree: Tree, field: LeafField, path: string, beside: Beside): void {
    const items = tree.kind === 'list' ? tree.items : [tree];
    const read = items.flatMap((item) => {
      if (item.kind !== 'scalar') this.#shape(item, field, path, 'a word');
      return item.kind === 'scalar' ? (this.#read(item, field, path, beside)?.value as readonly string[] | undefined) ?? [] : [];
    });
    this.#entries.set(path, { path, kind: 'words', value: [...new Set(read)], written: read.join(', '), position: this.#complaints.position(tree), gives: [], assumed: [] });
  }

  #paths(tree: Tree, field: Field, path: string): void {
    const groups = tree.kind === 'list' ? tree.items : undefined;
    if (groups === undefined || !groups.every((group): group is ListTree => group.kind === 'list')) return this.#shape(tree, field, path, 'a list of lists of paths');
    for (const group of groups) {
      const scalars = group.items.filter((item): item is ScalarTree => item.kind === 'scalar');
      if (scalars.length < group.items.length) this.#shape(group, field, path, 'a list of paths');
      this.#together.push(scalars.map(({ from, to, text }) => ({ from, to, path: text })));
    }
  }

  #leaf(tree: ScalarTree, field: LeafField, path: string, beside: Beside): void {
    const value = this.#read(tree, field, path, beside);
    if (value === undefined) return;
    const container = path.slice(0, Math.max(0, path.lastIndexOf('.')));
    const gives = givenBy(field, container);
    this.#entries.set(path, { path, ...value, written: tree.text, position: this.#complaints.position(tree), gives });
  }

  #read(tree: ScalarTree, field: LeafField, path: string, beside: Beside): ReturnType<typeof readLeaf> | undefined {
    try {
      return readLeaf(tree.text, field, beside);
    } catch (error) {
      if (!(error instanceof Problem)) throw error;
      for (const { at, length, ...problem } of error.list) {
        const from = at === undefined ? tree.from : Math.min(tree.from + tree.lead + at, Math.max(tree.from, tree.to - 1));
        this.#complain({ from, to: at === undefined ? tree.to : Math.min(tree.to, from + (length ?? 1)) }, path, problem);
      }
      return undefined;
    }
  }
}
