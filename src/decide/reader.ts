import { nearestName, type ProblemData } from '../problems/index.ts';
import { decisionFacts, decisionWords, type KnownFacts } from './known.ts';
import { type Node, place } from './json-text.ts';

export type Fields = ReadonlyMap<string, { readonly key: Node; readonly value: Node }>;
const longest = 2000;

/** Reads the parts of one rule file, and collects everything that is wrong with its position. */
export class Reader {
  readonly problems: ProblemData[] = [];
  readonly #text: string;
  readonly #file: string;
  readonly #known: KnownFacts | undefined;
  readonly #own: readonly string[];

  readonly #choice: boolean;

  /**
   * @param own     ids of decisions that rule packs bring
   * @param choice  whether the file holds a choice: only choices read what the first run keeps, and other choices
   */
  constructor(text: string, file: string, known: KnownFacts | undefined, own: readonly string[], choice: boolean) {
    this.#text = text;
    this.#file = file;
    this.#known = known;
    this.#own = own;
    this.#choice = choice;
  }

  complain(node: Node, code: string, message: string, more: { expected?: string; name?: string; valid?: readonly string[] } = {}): undefined {
    const nearest = more.name === undefined || more.valid === undefined ? undefined : nearestName(more.name, more.valid);
    const listed = more.expected ?? (nearest === undefined && more.valid !== undefined && more.valid.length <= 24 ? more.valid.join(', ') : undefined);
    this.problems.push({
      code, message, file: this.#file, ...place(this.#text, node.at), length: Math.min(node.length, 60),
      ...(listed === undefined ? {} : { expected: listed }),
      ...(nearest === undefined ? {} : { nearest }),
    });
    return undefined;
  }

  /** The keys of an object; unknown and missing ones are problems. */
  fields(node: Node, what: string, allowed: readonly string[], required: readonly string[] = []): Fields | undefined {
    if (!(node.value instanceof Map)) return this.complain(node, 'wrong-form', `${what} is not an object`);
    const map = node.value as Fields;
    for (const [name, { key }] of map) {
      if (!allowed.includes(name)) this.complain(key, 'unknown-key', `"${name}" is no key of ${what}`, { name, valid: allowed });
    }
    for (const name of required) if (!map.has(name)) this.complain(node, 'missing-key', `${what} has no "${name}"`);
    return map;
  }

  list(node: Node | undefined, what: string): readonly Node[] {
    if (node === undefined) return [];
    if (Array.isArray(node.value)) return node.value as readonly Node[];
    this.complain(node, 'wrong-form', `${what} is not a list`);
    return [];
  }

  words(node: Node | undefined, what: string): string | undefined {
    if (node === undefined) return undefined;
    if (typeof node.value !== 'string' || node.value.trim() === '') return this.complain(node, 'wrong-form', `${what} is not text`);
    if (node.value.length > longest) return this.complain(node, 'too-long', `${what} is longer than ${longest} characters`);
    return node.value;
  }

  number(node: Node | undefined, what: string): number | undefined {
    if (node === undefined) return undefined;
    return typeof node.value === 'number' ? node.value : this.complain(node, 'wrong-form', `${what} is not a number`);
  }

  flag(node: Node | undefined, what: string): boolean | undefined {
    if (node === undefined) return undefined;
    return typeof node.value === 'boolean' ? node.value : this.complain(node, 'wrong-form', `${what} is neither true nor false`);
  }

  oneOf<T extends string>(node: Node | undefined, what: string, valid: readonly T[]): T | undefined {
    if (node === undefined) return undefined;
    const name = typeof node.value === 'string' ? node.value : JSON.stringify(node.value);
    return valid.includes(name as T) ? (name as T) : this.complain(node, 'unknown-word', `${what} is "${name.slice(0, 60)}"`, { name, valid });
  }

  /** Id of a number: a quantity that some definition gives. */
  quantity(node: Node | undefined, what: string): string | undefined {
    const id = this.words(node, what);
    if (id === undefined || node === undefined) return undefined;
    if (this.closedList(id) !== undefined) return this.complain(node, 'wrong-kind', `${what} ${id} is a word, not a number`);
    return this.fact(node, what);
  }

  /** Id of a number or word. */
  fact(node: Node | undefined, what: string): string | undefined {
    const id = this.words(node, what);
    if (id === undefined || node === undefined) return undefined;
    const words = decisionWords(id, this.#own);
    if (!this.#choice && /^(kept|choice)\./.test(id)) return this.complain(node, 'unknown-fact', `${what} names ${id}: effects are judged before choices, and only choices may read it`);
    if (words === 'unknown') return this.complain(node, 'unknown-fact', `${what} names ${id}, and no such decision exists`, { name: id, valid: decisionFacts(this.#own) });
    if (words !== undefined || this.#known === undefined || this.#known.ids.has(id.split('@')[0] as string)) return id;
    return this.complain(node, 'unknown-fact', `${what} names ${id}, which no definition gives`, { name: id, valid: [...this.#known.ids, ...decisionFacts(this.#own)] });
  }

  /** The closed list of a word; 'any' where it is open or not known here; undefined for a number. */
  closedList(fact: string): readonly string[] | 'any' | undefined {
    const words = decisionWords(fact, this.#own);
    if (words === 'unknown') return 'any';
    return words ?? this.#known?.words.get(fact.split('@')[0] as string);
  }

  /** Whether the ids of numbers are known at all, so that a fact without a list is a number. */
  get knows(): boolean {
    return this.#known !== undefined;
  }
}
