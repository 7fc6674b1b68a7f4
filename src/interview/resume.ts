import { vocabulary } from '../assemble/index.ts';
import { readCase, type Position } from '../case/index.ts';
import { empty, type Noted, type State } from './state.ts';
import { mark, unknownMark } from './writing.ts';

/** Whether an interview wrote a text, so that nothing of a person's hand is lost by writing it again. */
export const isOwn = (text: string): boolean => text.replace(/^\ufeff/, '').startsWith(mark);

/**
 * An interview from a case file, however little it holds.
 *
 * @param text  the file
 * @param file  its name, as the user gave it
 * @returns     the state: what is given, with the remark of its line in a file of ours, and what was noted as unknown
 * @throws      {Problem} those of the case reader
 */
export function resumed(text: string, file: string): State {
  const on = readCase(text, file, vocabulary, { partial: true });
  const lines = on.text.split(/\r?\n/);
  const remark = ({ line, column, length }: Position): string => (isOwn(text) ? (/^.*?\s# (.*)$/.exec((lines[line - 1] ?? '').slice(column - 1 + length))?.[1] ?? '') : 'as the file had it');
  const given = new Map<string, Noted>();
  for (const [path, entry] of on.entries) if (path !== 'format') given.set(path, { text: entry.written, why: remark(entry.position) });
  const noted = isOwn(text) ? lines.filter((line) => line.startsWith(unknownMark)).map((line) => line.slice(unknownMark.length).split(/\s+# /)) : [];
  const unknown = new Map(noted.map(([paths = '', why = '']) => [paths.trim(), why] as const));
  return { ...empty, given, unknown, together: on.together };
}
