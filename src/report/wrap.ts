const width = 80;

/**
 * Text broken into lines of at most 80 columns.
 *
 * @param text    sentences with single blanks
 * @param indent  what begins every line
 * @param first   what begins the first line; the indent unless said
 * @returns       lines joined by newlines
 */
export function wrapped(text: string, indent: string, first = indent): string {
  const lines: string[] = [];
  let line = first;
  let empty = true;
  for (const word of text.split(/\s+/)) {
    if (!empty && line.length + 1 + word.length > width) {
      lines.push(line);
      line = `${indent}${word}`;
    } else line = empty ? `${line}${word}` : `${line} ${word}`;
    empty = false;
  }
  return [...lines, line].join('\n');
}
