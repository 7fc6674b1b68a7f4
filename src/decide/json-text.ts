import type { ProblemData } from '../problems/index.ts';

/** A value of a JSON text with its position in the text. */
export interface Node {
  readonly at: number;
  readonly length: number;
  readonly value: string | number | boolean | null | readonly Node[] | ReadonlyMap<string, Entry>;
}
interface Entry {
  readonly key: Node;
  readonly value: Node;
}

const deepest = 60;
const largest = 262144;

class Stop extends Error {
  readonly at: number;
  constructor(at: number, message: string) {
    super(message);
    this.at = at;
  }
}

/** Line and column of a place in a text, counted from 1. */
export function place(text: string, at: number): { line: number; column: number } {
  const before = text.slice(0, at);
  const start = before.lastIndexOf('\n') + 1;
  return { line: before.split('\n').length, column: at - start + 1 };
}

/**
 * Reads strict JSON and keeps the position of every value; a key that stands twice is a problem.
 *
 * @param text  the file's text
 * @param file  its name, for the problem
 * @returns     the root, or the one problem that stopped the reading
 */
export function readJson(text: string, file: string): Node | ProblemData {
  const fail = (at: number, message: string): ProblemData => ({ code: 'not-json', message, file, ...place(text, at), expected: 'strict JSON: quoted keys, no comments, no comma at the end of a list' });
  if (text.length > largest) return fail(0, `the file is longer than ${largest / 1024} kB`);
  try {
    const scan = new Scanner(text);
    const root = scan.value(0);
    scan.space();
    return scan.at < text.length ? fail(scan.at, 'something follows the end of the document') : root;
  } catch (error) {
    if (error instanceof Stop) return fail(error.at, error.message);
    throw error;
  }
}

class Scanner {
  readonly #text: string;
  at: number;
  constructor(text: string) {
    this.#text = text;
    this.at = text.startsWith('\ufeff') ? 1 : 0;
  }

  space(): void {
    while (' \t\r\n'.includes(this.#text[this.at] ?? 'x')) this.at++;
  }

  value(depth: number): Node {
    if (depth > deepest) throw new Stop(this.at, `nested deeper than ${deepest} levels`);
    this.space();
    const at = this.at;
    const value = this.#read(this.#text[at] ?? '', depth);
    return { at, length: this.at - at, value };
  }

  #read(first: string, depth: number): Node['value'] {
    if (first === '{') return this.#object(depth);
    if (first === '[') return this.#list(depth);
    if (first === '"') return this.#string();
    for (const [word, value] of [['true', true], ['false', false], ['null', null]] as const) {
      if (this.#text.startsWith(word, this.at)) {
        this.at += word.length;
        return value;
      }
    }
    const number = /-?(?:0|[1-9]\d*)(?:\.\d+)?(?:[eE][+-]?\d+)?/y;
    number.lastIndex = this.at;
    const found = number.exec(this.#text)?.[0];
    if (found === undefined || !Number.isFinite(Number(found))) throw new Stop(this.at, first === '' ? 'the text ends too early' : 'not a JSON value');
    this.at += found.length;
    return Number(found);
  }

  #string(): string {
    const string = /"(?:[^"\\\u0000-\u001f]|\\(?:["\\/bfnrt]|u[0-9a-fA-F]{4}))*"/y;
    string.lastIndex = this.at;
    const found = string.exec(this.#text)?.[0];
    if (found === undefined) throw new Stop(this.at, 'a string that does not end, or holds a character that JSON does not allow');
    this.at += found.length;
    return JSON.parse(found) as string;
  }

  #list(depth: number): Node[] {
    const items: Node[] = [];
    this.#items(']', () => items.push(this.value(depth + 1)));
    return items;
  }

  #object(depth: number): Map<string, Entry> {
    const entries = new Map<string, Entry>();
    this.#items('}', () => {
      const at = this.at;
      if (this.#text[at] !== '"') throw new Stop(at, 'a key in double quotes is missing here');
      const name = this.#string();
      const key = { at, length: this.at - at, value: name };
      if (entries.has(name)) throw new Stop(at, `the key "${name}" stands twice`);
      this.space();
      if (this.#text[this.at] !== ':') throw new Stop(this.at, `a colon is missing after "${name}"`);
      this.at++;
      entries.set(name, { key, value: this.value(depth + 1) });
    });
    return entries;
  }

  #items(end: string, read: () => void): void {
    this.at++;
    this.space();
    if (this.#text[this.at] === end) {
      this.at++;
      return;
    }
    for (;;) {
      this.space();
      read();
      this.space();
      const next = this.#text[this.at];
      if (next !== ',' && next !== end) throw new Stop(this.at, `a comma or ${end} is missing here`);
      this.at++;
      if (next === end) return;
    }
  }
}
