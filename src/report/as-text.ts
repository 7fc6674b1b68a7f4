import { rendered, type Block, type Forms } from './blocks.ts';
import { broken, columnLines } from './columns.ts';

const width = 80;

/**
 * Blocks as plain text of 80 columns.
 *
 * @param blocks  the report
 * @returns       text without a last newline
 */
export function asText(blocks: readonly Block[]): string {
  return blocks.map((block) => rendered(block, forms)).join('\n\n').replaceAll(/[ ]+$/gm, '');
}

const forms: Forms = {
  heading: ({ level, text }) => {
    const lines = broken(level === 2 ? text.toUpperCase() : text, width);
    return level === 3 ? lines.join('\n') : [...lines, (level === 1 ? '=' : '-').repeat(Math.max(...lines.map((line) => line.length)))].join('\n');
  },
  paragraph: ({ text }) => broken(text, width).join('\n'),
  list: ({ items, boxes }) => items.map((item) => hanging(item, boxes === true ? '[ ] ' : '- ')).join('\n'),
  table: ({ title, columns, rows }) => [...(title === '' ? [] : [...broken(title, width), '']), ...columnLines(columns, rows, width)].join('\n'),
};

/** Text behind a mark, its further lines standing under its first word. */
function hanging(text: string, mark: string): string {
  return broken(text, width - mark.length).map((line, i) => `${i === 0 ? mark : ' '.repeat(mark.length)}${line}`).join('\n');
}
