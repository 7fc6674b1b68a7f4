import stringWidth from 'fast-string-width';

const gap = 2;

/** Columns that a text takes; plain ASCII, which nearly all of it is, has one for each character. */
const columnsOf = (text: string): number => (/^[ -~]*$/.test(text) ? text.length : stringWidth(text));

/**
 * A table as lines with aligned columns; cells that are too long for their column are wrapped between words.
 *
 * @param head   column titles
 * @param rows   cells
 * @param width  largest width of a line
 * @returns      lines: the titles, a rule under each, the rows
 */
export function columnLines(head: readonly string[], rows: readonly (readonly string[])[], width = 80): string[] {
  const widths = widthsFor([head, ...rows], width);
  const lines = [...cells(head, widths), widths.map((w) => '-'.repeat(w)).join(' '.repeat(gap)), ...rows.flatMap((row) => cells(row, widths))];
  return lines.map((line) => line.trimEnd());
}

/** Widths that fit: the widest columns give way first, none below its longest word as long as that can be. */
function widthsFor(rows: readonly (readonly string[])[], width: number): number[] {
  const count = Math.max(...rows.map((row) => row.length));
  const over = (f: (cell: string) => number): number[] => Array.from({ length: count }, (_, k) => Math.max(1, ...rows.map((row) => f(row[k] ?? ''))));
  const widths = over((cell) => columnsOf(cell));
  const words = over((cell) => Math.max(0, ...cell.split(' ').map((word) => columnsOf(word))));
  const room = width - gap * (count - 1);
  const total = (): number => widths.reduce((sum, w) => sum + w, 0);
  const shrink = (floor: readonly number[]): void => {
    while (total() > room) {
      const k = widths.reduce((best, w, i) => (w > (floor[i] as number) && (best < 0 || w > (widths[best] as number)) ? i : best), -1);
      if (k < 0) return;
      widths[k] = (widths[k] as number) - 1;
    }
  };
  shrink(words);
  shrink(widths.map(() => 6));
  return widths;
}

function cells(row: readonly string[], widths: readonly number[]): string[] {
  const parts = widths.map((w, k) => broken(row[k] ?? '', w));
  const height = Math.max(...parts.map((p) => p.length));
  return Array.from({ length: height }, (_, i) => parts.map((p, k) => padded(p[i] ?? '', widths[k] as number)).join(' '.repeat(gap)));
}

/** Text filled up with blanks to a width. */
export const padded = (text: string, width: number): string => text + ' '.repeat(Math.max(0, width - columnsOf(text)));

/** Text in lines of a width, broken between words; a word longer than a line is broken where it must be. */
export function broken(text: string, width: number): string[] {
  const lines: string[] = [];
  let line = '';
  const put = (word: string): void => {
    if (line !== '' && columnsOf(line) + 1 + columnsOf(word) > width) {
      lines.push(line);
      line = '';
    }
    line = line === '' ? word : `${line} ${word}`;
  };
  for (const word of text.split(' ')) for (const piece of pieces(word, width)) put(piece);
  return [...lines, line];
}

function pieces(word: string, width: number): string[] {
  if (columnsOf(word) <= width) return [word];
  const out: string[] = [];
  let piece = '';
  for (const character of word) {
    if (piece !== '' && columnsOf(piece + character) > width) {
      out.push(piece);
      piece = '';
    }
    piece += character;
  }
  return [...out, piece];
}
