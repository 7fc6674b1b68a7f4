import { Problem } from '../problems/index.ts';

/** One cell of a file of results, with the place where it starts (both counted from 1). */
export interface Cell {
  readonly text: string;
  readonly line: number;
  readonly column: number;
}

export type Delimiter = ',' | ';' | '\t';

/**
 * The separator of a file of results: what stands most often in the first line outside quotes and brackets; a semicolon or
 * a tab wins over a comma, which may be a decimal comma.
 *
 * @param text  the file
 * @returns     comma, semicolon or tab; comma where the line has none of them
 */
export function delimiterOf(text: string): Delimiter {
  const counts = { ',': 0, ';': 0, '\t': 0 };
  let quoted = false;
  let depth = 0;
  for (let i = firstLine(text); i < text.length; i++) {
    const c = text.charAt(i);
    if (c === '"') quoted = !quoted;
    else if (quoted) continue;
    else if (c === '\n' || c === '\r') break;
    else if (c === '[') depth += 1;
    else if (c === ']') depth -= 1;
    else if (depth <= 0 && (c === ',' || c === ';' || c === '\t')) counts[c] += 1;
  }
  if (counts[';'] > 0) return ';';
  return counts['\t'] > 0 ? '\t' : ',';
}

/** Index of the first line that is neither empty nor a comment. */
function firstLine(text: string): number {
  const found = /^[ \t]*[^\s#].*$/m.exec(text);
  return found?.index ?? 0;
}

/**
 * Rows of a file of comma-separated values. Quoted cells may hold separators, line ends and doubled quotes. Empty lines and
 * lines that start with # are passed over. Cells lose the blanks around them.
 *
 * @param text       the file, decoded
 * @param file       its name, for problems
 * @param delimiter  the separator
 * @returns          rows of cells with their places, one at a time
 * @throws           {Problem} open-quote, text-after-quote
 * @source           RFC 4180, with the two extensions named above
 */
export function* csvRows(text: string, file: string, delimiter: Delimiter): Generator<readonly Cell[]> {
  let at = 0;
  let line = 1;
  let lineStart = 0;
  const lineEnd = (): void => {
    at += text[at] === '\r' && text[at + 1] === '\n' ? 2 : 1;
    line += 1;
    lineStart = at;
  };
  const isEnd = (c: string | undefined): boolean => c === '\n' || c === '\r';
  const isBlank = (c: string | undefined): boolean => c === ' ' || (c === '\t' && delimiter !== '\t');

  function quotedCell(): string {
    const opened = { line, column: at - lineStart + 1 };
    let out = '';
    at += 1;
    for (;;) {
      const c = text[at];
      if (c === undefined) throw new Problem({ code: 'open-quote', message: 'a quote is opened and never closed', file, ...opened, expected: 'a closing " (a quote inside a quoted cell is doubled)' });
      if (c === '"' && text[at + 1] === '"') {
        out += '"';
        at += 2;
      } else if (c === '"') {
        at += 1;
        return out;
      } else if (isEnd(c)) {
        out += '\n';
        lineEnd();
      } else {
        const from = at;
        while (at < text.length && text[at] !== '"' && !isEnd(text[at])) at += 1;
        out += text.slice(from, at);
      }
    }
  }

  function cell(): Cell {
    while (isBlank(text[at])) at += 1;
    const place = { line, column: at - lineStart + 1 };
    let body: string;
    if (text[at] === '"') {
      body = quotedCell();
      while (isBlank(text[at])) at += 1;
      if (at < text.length && text[at] !== delimiter && !isEnd(text[at])) {
        throw new Problem({ code: 'text-after-quote', message: 'text follows a closed quote', file, line, column: at - lineStart + 1, expected: 'a separator or the end of the line' });
      }
    } else {
      const from = at;
      while (at < text.length && text[at] !== delimiter && !isEnd(text[at])) at += 1;
      body = text.slice(from, at);
    }
    return { text: body.trim(), ...place };
  }

  while (at < text.length) {
    if (text[at] === '#') {
      while (at < text.length && !isEnd(text[at])) at += 1;
    }
    const row: Cell[] = [];
    if (at < text.length && !isEnd(text[at])) {
      row.push(cell());
      while (text[at] === delimiter) {
        at += 1;
        row.push(cell());
      }
    }
    if (row.some((one) => one.text !== '')) yield row;
    if (at < text.length) lineEnd();
  }
}
