import { vocabulary } from '../assemble/index.ts';
import { own, type Field, type Fields } from '../case/index.ts';
import type { Noted, State } from './state.ts';

/** First line of a file that an interview wrote: it may be gone on with, as no remark of a person is lost by that. */
export const mark = '## A case for runbrief, written by its interview; `runbrief ask --into` goes on from it.';
/** Begins the line of an input that is not known. */
export const unknownMark = '# unknown ';

const remarkColumn = 44;

interface Branch { readonly [key: string]: Branch | Noted }
const isNoted = (node: Branch | Noted): node is Noted => typeof (node as Noted).text === 'string' && typeof (node as Noted).why === 'string';

/**
 * The case file of an interview.
 *
 * @param state    what was said
 * @param remarks  each line says why it was asked, and what is not known is listed
 * @returns        YAML in the order of the vocabulary, with a last newline
 */
export function writeCase(state: State, remarks = true): string {
  const flow = state.given.get('flow')?.text ?? '';
  const tree = treeOf(state.given);
  const lines = ['format: 1', ...new Writer(flow, remarks).keys(vocabulary.keys, tree, '')];
  if (state.together.length > 0) lines.push(`together: [${state.together.map((group) => `[${group.join(', ')}]`).join(', ')}]`);
  if (!remarks) return `${lines.join('\n')}\n`;
  const unknown = [...state.unknown].map(([paths, why]) => `${`${unknownMark}${paths}`.padEnd(remarkColumn)} # ${why}`);
  return `${[mark, ...lines, ...(unknown.length === 0 ? [] : ['', '# Not known when this was written. Take a line out to be asked again.', ...unknown])].join('\n')}\n`;
}

function treeOf(given: ReadonlyMap<string, Noted>): Branch {
  const root: Record<string, Branch | Noted> = {};
  for (const [path, noted] of given) {
    const parts = path.split('.');
    let at = root;
    for (const part of parts.slice(0, -1)) at = (own(at, part) ?? (at[part] = {})) as Record<string, Branch | Noted>;
    at[parts.at(-1) as string] = noted;
  }
  return root;
}

class Writer {
  readonly #flow: string;
  readonly #remarks: boolean;

  constructor(flow: string, remarks: boolean) {
    this.#flow = flow;
    this.#remarks = remarks;
  }

  keys(fields: Fields, tree: Branch, at: string): string[] {
    return Object.entries(fields).flatMap(([key, field]) => {
      const node = own(tree, key);
      return node === undefined || (at === '' && key === 'format') ? [] : this.#one(key, field, node, at);
    });
  }

  #one(key: string, field: Field, node: Branch | Noted, at: string): string[] {
    if (isNoted(node)) return [this.#line(`${at}${key}: ${field.kind === 'words' ? `[${node.text}]` : scalar(node.text)}`, node.why)];
    const inner = `${at}  `;
    switch (field.kind) {
      case 'map':
        return [`${at}${key}:`, ...this.keys(field.keys, node, inner)];
      case 'sizes':
        return [`${at}${key}:`, ...this.keys(own(vocabulary.flows, this.#flow)?.sizes ?? {}, node, inner)];
      case 'open-map':
        return [`${at}${key}:`, ...Object.entries(node).flatMap(([name, value]) => this.#one(name, field.item, value, inner))];
      case 'list':
        return [`${at}${key}:`, ...Object.entries(node).flatMap(([name, item]) => (isNoted(item) ? [] : this.#item(name, field.item.keys, item, inner)))];
      default:
        return [];
    }
  }

  /** An item of a list; what has no name is called by its place. */
  #item(name: string, fields: Fields, item: Branch, at: string): string[] {
    const named = /^\d+$/.test(name) ? [] : [`${at}  name: ${scalar(name)}`];
    const [first, ...rest] = [...named, ...this.keys(fields, item, `${at}  `)];
    return first === undefined ? [] : [`${at}- ${first.slice(at.length + 2)}`, ...rest];
  }

  #line(text: string, why: string): string {
    return this.#remarks && why !== '' ? `${text.padEnd(remarkColumn)} # ${why}` : text;
  }
}

/** A text as YAML: as it is where that reads back the same, else in quotes. */
function scalar(text: string): string {
  const plain = /^(?:[\p{L}\p{N}(+.<~]|-(?=\S))/u.test(text) && !/: |:$| #|^\s|\s$|^(?:~|null)$/.test(text);
  return plain ? text : JSON.stringify(text);
}
