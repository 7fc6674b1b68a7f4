/** Where something stands in a file, counted from 1, with its length in characters. */
export interface Position {
  readonly line: number;
  readonly column: number;
  readonly length: number;
}

/** Line and column of an offset. */
export function placeAt(text: string, offset: number): { line: number; column: number } {
  const before = text.slice(0, offset);
  return { line: before.split('\n').length, column: offset - before.lastIndexOf('\n') };
}

/** Finds positions of one text; the beginnings of its lines are looked up once. */
export class Places {
  readonly #starts: number[] = [0];
  readonly #text: string;

  constructor(text: string) {
    this.#text = text;
    for (let at = text.indexOf('\n'); at >= 0; at = text.indexOf('\n', at + 1)) this.#starts.push(at + 1);
  }

  /** Position of the characters from `from` up to `to`, cut at the end of their first line. */
  position(from: number, to: number): Position {
    let low = 0;
    let high = this.#starts.length - 1;
    while (low < high) {
      const middle = (low + high + 1) >> 1;
      if ((this.#starts[middle] as number) <= from) low = middle;
      else high = middle - 1;
    }
    const start = this.#starts[low] as number;
    const next = this.#starts[low + 1];
    const end = next === undefined ? this.#text.length : next - (this.#text[next - 2] === '\r' ? 2 : 1);
    return { line: low + 1, column: from - start + 1, length: Math.max(1, Math.min(to, end) - from) };
  }
}
