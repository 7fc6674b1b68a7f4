import { nearestName, Problem, type ProblemData } from '../problems/index.ts';
import type { Case, Entry } from './entry.ts';
import { readLeaf } from './leaf.ts';
import { type Field, type Fields, type LeafField, own, type Vocabulary } from './vocabulary.ts';

/** A place where a case may hold a value. */
export interface FieldAt {
  readonly field: LeafField;
  /** Ids of the quantities that a value there gives. */
  readonly gives: readonly string[];
}

/**
 * The field that a path leads to, whether or not the case holds a value there.
 *
 * @param vocabulary  the keys there are
 * @param flow        the flow of the case, for its sizes
 * @param path        `inlet.speed`, `walls.left.temperature`, `wall.layers.0.thickness`
 * @returns           the field, or undefined where there is none of that path
 */
export function fieldAt(vocabulary: Vocabulary, flow: string, path: string): FieldAt | undefined {
  const parts = path.split('.');
  let fields: Fields = vocabulary.keys;
  for (let i = 0; i < parts.length; i++) {
    const field: Field | undefined = own(fields, parts[i] as string);
    if (field === undefined) return undefined;
    if (field.kind === 'map') fields = field.keys;
    else if (field.kind === 'sizes') fields = own(vocabulary.flows, flow)?.sizes ?? {};
    else if (field.kind === 'list') {
      i++;
      fields = field.item.keys;
    } else if (field.kind === 'open-map') {
      if (parts.length === i + 1) return field.alone === undefined ? undefined : { field: field.alone, gives: givenBy(field.alone, parts.slice(0, -1).join('.')) };
      return parts.length === i + 2 && isLeaf(field.item) ? { field: field.item, gives: [] } : undefined;
    } else if (field.kind === 'paths' || i < parts.length - 1) return undefined;
    else return { field, gives: givenBy(field, parts.slice(0, -1).join('.')) };
  }
  return undefined;
}

/** Ids that a value gives, each with its place: the map around it. */
export function givenBy(field: LeafField, container: string): readonly string[] {
  return field.kind === 'quantity' ? (field.gives ?? []).map((id) => (id.endsWith('@') ? `${id}${container}` : id)) : [];
}

function isLeaf(field: Field): field is LeafField {
  return !['map', 'list', 'sizes', 'open-map', 'paths'].includes(field.kind);
}

/** All paths of a vocabulary with this flow, without list places: `walls.*.temperature`. */
export function allPaths(vocabulary: Vocabulary, flow: string): readonly string[] {
  const found: string[] = [];
  const look = (fields: Fields, before: string): void => {
    for (const [key, field] of Object.entries(fields)) {
      const path = `${before}${key}`;
      if (field.kind === 'map') look(field.keys, `${path}.`);
      else if (field.kind === 'list') look(field.item.keys, `${path}.*.`);
      else if (field.kind === 'sizes') look(own(vocabulary.flows, flow)?.sizes ?? {}, `${path}.`);
      else if (field.kind === 'open-map') found.push(...(field.alone === undefined ? [] : [path]), `${path}.*`);
      else if (field.kind !== 'paths') found.push(path);
    }
  };
  look(vocabulary.keys, '');
  return found;
}

/**
 * One value from a text, as if it stood at a path of the case: for a range to vary over, or an answer.
 *
 * @param vocabulary  the keys there are
 * @param caseDoc     the case it belongs to: its flow, and the values beside it
 * @param path        where it would stand
 * @param text        as the user wrote it
 * @returns           the entry; its position counts within the text, in line 1
 * @throws            {Problem} unknown-path; those of the field, with `at` and `length` within the text
 */
export function readEntry(vocabulary: Vocabulary, caseDoc: Pick<Case, 'flow' | 'get'>, path: string, text: string): Entry {
  const at = fieldAt(vocabulary, caseDoc.flow, path);
  if (at === undefined) {
    const paths = allPaths(vocabulary, caseDoc.flow);
    const nearest = nearestName(path, paths);
    throw new Problem({ code: 'unknown-path', message: `"${path.slice(0, 80)}" is not a path into the case`, expected: 'keys joined by points, such as inlet.speed, sizes.length, walls.left.temperature', ...(nearest === undefined ? {} : { nearest }) });
  }
  const around = path.slice(0, path.lastIndexOf('.') + 1);
  try {
    const value = readLeaf(text, at.field, { text: (key) => caseDoc.get(`${around}${key}`)?.written });
    return { path, ...value, written: text, position: { line: 1, column: 1, length: text.length }, gives: at.gives };
  } catch (error) {
    if (!(error instanceof Problem)) throw error;
    throw new Problem(error.list.map((one): ProblemData => ({ ...one, message: `${path}: ${one.message}` })));
  }
}

