import { nearestName, Problem } from '../problems/index.ts';
import { blank } from './leaf.ts';
import { type Field, type Fields, type ListField, own, type Vocabulary } from './vocabulary.ts';

const remarkColumn = 44;
const head = ['format', 'title', 'purpose', 'targets.0.quantity', 'targets.0.within', 'flow', 'fluid.material', 'fluid.pressure'];

interface Line {
  readonly text: string;
  /** Stands without a `#` before it. */
  readonly wanted: boolean;
}

/**
 * A case file to fill in: what the flow needs stands open as `___`, everything else that may matter is commented out with
 * an example; each line says what it is for.
 *
 * @param vocabulary  the keys there are
 * @param flow        the flow
 * @param answers     targets that are estimated for it; false where the flow has no laws yet
 * @returns           the text of the file
 * @throws            {Problem} unknown-flow
 */
export function caseTemplate(vocabulary: Vocabulary, flow: string, answers: readonly string[] | false = []): string {
  const words = own(vocabulary.flows, flow);
  if (words === undefined) {
    const valid = Object.keys(vocabulary.flows);
    const nearest = nearestName(flow, valid);
    throw new Problem({ code: 'unknown-flow', message: `"${flow.slice(0, 80)}" is not a flow known here`, expected: valid.join(', '), ...(nearest === undefined ? {} : { nearest }) });
  }
  const open = [...head, ...words.needs, ...Object.entries(words.sizes).filter(([, size]) => size.required).map(([key]) => `sizes.${key}`)];
  const form = new Form(vocabulary, flow, open);
  const intro = [
    `## ${words.title}: a case for runbrief.`,
    `## Fill in what stands as ${blank}. Take the "# " off a line that matters; leave out what does not.`,
    '## A quantity is a number with a unit, also with a spread (0.40 m/s +/- 5 %) or as a range (0.2 .. 0.6 m/s).',
    ...(answers === false ? ['## No laws are built for this flow yet: plan refuses it. The flow general, with a length and a speed, judges by analogy.'] : []),
    ...broken(answers === false ? [] : answers).map((text, at) => `## ${at === 0 ? 'Targets estimated here: ' : '  '}${text}`),
    '',
  ];
  return `${[...intro, ...form.lines(vocabulary.keys, '', 0).map((line) => line.text)].join('\n')}\n`;
}

/** Ids in lines of a width that stands in an editor. */
function broken(ids: readonly string[]): string[] {
  const out: string[] = [];
  for (const [at, id] of ids.entries()) {
    const text = at === ids.length - 1 ? id : `${id},`;
    const last = out.at(-1);
    if (last === undefined || last.length + text.length > 84) out.push(text);
    else out[out.length - 1] = `${last} ${text}`;
  }
  return out;
}

class Form {
  readonly #vocabulary: Vocabulary;
  readonly #flow: string;
  readonly #open: readonly string[];

  constructor(vocabulary: Vocabulary, flow: string, open: readonly string[]) {
    this.#vocabulary = vocabulary;
    this.#flow = flow;
    this.#open = open;
  }

  lines(fields: Fields, before: string, indent: number): Line[] {
    const shown = Object.entries(fields).filter(([key, field]) => this.#matters(field, `${before}${key}`));
    return shown.flatMap(([key, field], at) => {
      const afterBlock = indent === 0 && isBlock(shown[at - 1]?.[1]) && !isBlock(field);
      return [...(afterBlock ? [{ text: '', wanted: false }] : []), ...this.#field(key, field, `${before}${key}`, indent)];
    });
  }

  #wants(path: string): boolean {
    return this.#open.some((one) => one === path || one.startsWith(`${path}.`));
  }

  #matters(field: Field, path: string): boolean {
    if (this.#wants(path)) return true;
    const several = this.#open.some((one) => one.startsWith('inlets.'));
    if (path === 'inlet' || path === 'inlets') return several === (path === 'inlets');
    if (path === 'walls' && (own(this.#vocabulary.flows, this.#flow)?.walls.length ?? 0) === 0) return false;
    return field.flows === undefined || field.flows.includes(this.#flow);
  }

  #field(key: string, field: Field, path: string, indent: number): Line[] {
    if (field.kind === 'paths') return [{ text: `${' '.repeat(indent)}## ${key}: ${field.example}   ${field.doc}`, wanted: false }];
    if (field.kind === 'map') return this.#block(key, field, this.lines(field.keys, `${path}.`, indent + 2), indent);
    if (field.kind === 'sizes') return this.#block(key, field, this.lines(own(this.#vocabulary.flows, this.#flow)?.sizes ?? {}, `${path}.`, indent + 2), indent);
    if (field.kind === 'list') return this.#block(key, field, this.#items(field, path, indent + 2), indent);
    const wanted = this.#wants(path);
    if (path === 'flow') return [line(`flow: ${this.#flow}`, field.doc, indent, true)];
    const value = path === 'format' || !wanted ? field.example : blank;
    return [line(`${key}: ${value}`, `${about(field)}${value === blank ? `, for example ${field.example}` : ''}`, indent, wanted)];
  }

  #block(key: string, field: Field, inner: readonly Line[], indent: number): Line[] {
    const lines = [line(`${key}:`, field.doc, indent, inner.some((one) => one.wanted)), ...inner];
    return indent === 0 ? [{ text: '', wanted: false }, ...lines] : lines;
  }

  /** The items that the flow needs, or one as an example. */
  #items(field: ListField, path: string, indent: number): Line[] {
    const names = [...new Set(this.#open.filter((one) => one.startsWith(`${path}.`)).map((one) => one.slice(path.length + 1).split('.')[0] as string))];
    const keys = Object.entries(field.item.keys).filter(([key]) => key !== 'name' || field.names === undefined);
    if (names.length === 0) return this.#item(field.names === undefined ? undefined : this.#exampleName(field), keys, `${path}.*`, indent, false);
    return names.flatMap((name, at) => {
      const shown = at === 0 && path !== 'walls' ? keys : keys.filter(([key]) => this.#wants(`${path}.${name}.${key}`));
      return this.#item(/^\d+$/.test(name) ? undefined : name, shown, `${path}.${name}`, indent, true);
    });
  }

  #exampleName(field: ListField): string {
    const walls = own(this.#vocabulary.flows, this.#flow)?.walls ?? [];
    return field.names === 'walls' ? (walls[0] ?? 'wall') : (own(field.item.keys, 'name')?.example ?? 'first');
  }

  /** One item, its dash before the first key that stands open, so that the file reads as it is. */
  #item(name: string | undefined, keys: readonly (readonly [string, Field])[], path: string, indent: number, wanted: boolean): Line[] {
    const inner = keys.flatMap(([key, field]) => this.#field(key, field, `${path}.${key}`, indent + 2));
    const sorted = wanted ? [...inner.filter((one) => one.wanted), ...inner.filter((one) => !one.wanted)] : inner;
    const lines = name === undefined ? sorted : [line(`name: ${name}`, 'name, which becomes part of the path', indent + 2, wanted), ...sorted];
    const [first, ...rest] = lines;
    if (first === undefined) return [];
    const at = ' '.repeat(indent);
    return [{ ...first, text: first.wanted ? `${at}- ${first.text.trimStart()}` : `${at}# - ${first.text.trimStart().replace(/^# /, '')}` }, ...rest];
  }
}

function isBlock(field: Field | undefined): boolean {
  return field !== undefined && ['map', 'list', 'sizes'].includes(field.kind);
}

/** A line with its remark; commented out where it is not wanted. */
function line(text: string, remark: string, indent: number, wanted: boolean): Line {
  const left = `${' '.repeat(indent)}${wanted ? '' : '# '}${text}`;
  return { text: `${left.padEnd(remarkColumn)} # ${remark}`, wanted };
}

function about(field: Field): string {
  return field.kind === 'word' || field.kind === 'words' || (field.kind === 'quantity' && field.words !== undefined) ? `${field.doc} (${Object.keys(field.words ?? {}).join(', ')}${field.kind === 'quantity' ? ', or a quantity' : ''})` : field.doc;
}
