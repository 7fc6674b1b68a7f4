import { rendered, type Block, type Forms } from './blocks.ts';

/**
 * Blocks as Markdown. Nothing in the text can become markup: what Markdown or a page would act on is escaped here.
 *
 * @param blocks  the report
 * @returns       text with a last newline
 */
export function asMarkdown(blocks: readonly Block[]): string {
  return `${blocks.map((block) => rendered(block, forms)).join('\n\n')}\n`;
}

const row = (cells: readonly string[]): string => `| ${cells.map((cell) => marked(cell)).join(' | ')} |`;

const forms: Forms = {
  heading: ({ level, text }) => `${'#'.repeat(level)} ${marked(text)}`,
  paragraph: ({ text }) => marked(text),
  list: ({ items, boxes }) => items.map((item) => `- ${boxes === true ? '[ ] ' : ''}${marked(item)}`).join('\n'),
  table: ({ title, columns, rows }) => [...(title === '' ? [] : [`**${marked(title)}**`, '']), row(columns), `|${columns.map(() => ' --- ').join('|')}|`, ...rows.map(row)].join('\n'),
};

/** Text with every sign escaped that would mark something up: emphasis, code, links, table edges, strokes, tags, entities, and at its beginning titles and lists. */
function marked(text: string): string {
  return text
    .replaceAll(/[\\`*_[\]|]|~~/g, (sign) => `\\${sign}`)
    .replaceAll('&', '&amp;')
    .replaceAll('<', '&lt;')
    .replaceAll('>', '&gt;')
    .replace(/^[-+=#]/, (sign) => `\\${sign}`)
    .replace(/^(\d+)([.)])(?=\s|$)/, String.raw`$1\$2`);
}
