/** A report before it has a form: text, Markdown and the page are made from the same blocks. All text in it is on one line and harmless. */
export type Block =
  | { readonly kind: 'heading'; readonly level: 1 | 2 | 3; readonly text: string }
  | { readonly kind: 'paragraph'; readonly text: string }
  | { readonly kind: 'list'; readonly items: readonly string[]; readonly boxes?: true }
  | { readonly kind: 'table'; readonly title: string; readonly columns: readonly string[]; readonly rows: readonly (readonly string[])[] };

type Of<K extends Block['kind']> = Extract<Block, { readonly kind: K }>;

/** How each kind of block is written in one form of the report. */
export type Forms = { readonly [K in Block['kind']]: (block: Of<K>) => string };

/** A block in one form of the report. */
export function rendered(block: Block, forms: Forms): string {
  if (block.kind === 'heading') return forms.heading(block);
  if (block.kind === 'paragraph') return forms.paragraph(block);
  return block.kind === 'list' ? forms.list(block) : forms.table(block);
}

export const heading = (level: 1 | 2 | 3, text: string): Block => ({ kind: 'heading', level, text });
export const paragraph = (text: string): Block => ({ kind: 'paragraph', text });

/** A list; nothing where there is no item. */
export const list = (items: readonly string[]): Block[] => (items.length === 0 ? [] : [{ kind: 'list', items }]);

/** A table; nothing where there is no row. Columns that are empty in every row are left out. */
export function tableOf(title: string, columns: readonly string[], rows: readonly (readonly string[])[]): Block[] {
  if (rows.length === 0) return [];
  const used = columns.map((_, k) => k).filter((k) => rows.some((row) => (row[k] ?? '') !== ''));
  return [{ kind: 'table', title, columns: used.map((k) => columns[k] as string), rows: rows.map((row) => used.map((k) => row[k] ?? '')) }];
}
