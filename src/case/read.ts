import { nearestName } from '../problems/index.ts';
import { Complaints } from './complaints.ts';
import type { Case, Entry, Target } from './entry.ts';
import { toleranceOf } from './tolerance.ts';
import { caseText } from './text.ts';
import { parseTree } from './tree.ts';
import type { Vocabulary } from './vocabulary.ts';
import { type Found, Walk } from './walk.ts';

export interface ReadOptions {
  /** Keys that a case needs may be missing: an interview has not come to them yet. */
  readonly partial?: boolean;
}

/**
 * Reads a case file and checks it against a vocabulary.
 *
 * @param input       the file as bytes, or a text
 * @param file        its name, as the user gave it
 * @param vocabulary  the keys there are
 * @param options     `partial`: required keys may be missing
 * @returns           every value by path, with its place; targets; what was taken without being said
 * @throws            {Problem} all problems of the file at once, each with file, line, column and length
 */
export function readCase(input: Uint8Array | string, file: string, vocabulary: Vocabulary, options: ReadOptions = {}): Case {
  const text = caseText(input, file);
  const complaints = new Complaints(text, file);
  const tree = parseTree(text, complaints);
  complaints.settle();
  if (tree === undefined) throw new Error('a file without tree and without complaint');
  const walk = new Walk(vocabulary, complaints, options.partial === true);
  const found = walk.document(tree);
  checkPaths(found, complaints);
  checkFormat(found.entries.get('format'), complaints);
  complaints.settle();
  const warnings = found.entries.has('format') ? [] : ['format is not stated; format 1 is taken'];
  return caseOf(found, { file, text, warnings, targets: targetsOf(found) });
}

function checkFormat(format: Entry | undefined, complaints: Complaints): void {
  if (format !== undefined && format.value !== 1) complaints.at(format.position, { code: 'unknown-format', message: `format: ${String(format.value)} is not a format of this program`, expected: 'format: 1' });
}

/** Paths under `together` must name numbers of this case. */
function checkPaths(found: Found, complaints: Complaints): void {
  const numbers = [...found.entries.values()].filter((entry) => entry.kind === 'quantity').map((entry) => entry.path);
  for (const group of found.together) {
    if (group.length < 2 && group[0] !== undefined) complaints.add(group[0], { code: 'lone-path', message: `together: "${group[0].path}" stands alone`, expected: 'two or more paths in a list: [[inlet.speed, inlet.temperature]]' });
    for (const one of group) {
      if (numbers.includes(one.path)) continue;
      const nearest = nearestName(one.path, numbers);
      complaints.add(one, { code: 'unknown-path', message: `together: "${one.path.slice(0, 80)}" is not the path of a number of this case`, expected: numbers.slice(0, 30).join(', '), ...(nearest === undefined ? {} : { nearest }) });
    }
  }
}

function targetsOf(found: Found): Target[] {
  return (found.lists.get('targets') ?? []).flatMap((name) => {
    const at = (key: string): Entry | undefined => found.entries.get(`targets.${name}.${key}`);
    const [quantity, place, mean, within] = [at('quantity'), at('place'), at('mean'), at('within')];
    if (quantity === undefined) return [];
    return {
      path: `targets.${name}`,
      quantity: quantity.value as string,
      ...(place === undefined ? {} : { place: place.value as string }),
      ...(mean === undefined ? {} : { mean: mean.value as string }),
      ...(within === undefined ? {} : { within: toleranceOf(within, within.written) }),
      position: quantity.position,
    };
  });
}

function caseOf(found: Found, known: Pick<Case, 'file' | 'text' | 'warnings' | 'targets'>): Case {
  const { entries, lists, maps } = found;
  const text = (path: string): string | undefined => entries.get(path)?.value as string | undefined;
  const heads = Object.fromEntries((['title', 'purpose', 'ifWrong'] as const).flatMap((key) => (text(key) === undefined ? [] : [[key, text(key) as string]])));
  return {
    ...known,
    ...heads,
    flow: text('flow') ?? '',
    entries,
    together: found.together.map((group) => group.map((one) => one.path)),
    get: (path) => entries.get(path),
    number: (path) => (typeof entries.get(path)?.value === 'number' ? (entries.get(path)?.value as number) : undefined),
    word: (path) => entries.get(path)?.word ?? (['word', 'text'].includes(entries.get(path)?.kind ?? '') ? text(path) : undefined),
    list: (path) => lists.get(path) ?? [],
    has: (path) => entries.has(path) || maps.has(path) || lists.has(path),
  };
}
