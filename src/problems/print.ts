import type { ProblemData } from './problem.ts';

/** Control characters, escape sequences and directional marks never reach a terminal or a page: they are shown as escapes. */
export function harmless(text: string): string {
  return text.replace(/[\u0000-\u0008\u000b-\u001f\u007f-\u009f\u200b-\u200f\u2028-\u202e\u2066-\u2069\ufeff]/g, (c) => `\\u${c.charCodeAt(0).toString(16).padStart(4, '0')}`);
}

const around = 70;

/**
 * A problem as text: position and message, the line with a caret, what was expected, the nearest valid name.
 *
 * @param problem  the problem
 * @param source   text of the file it stands in, for the line with the caret
 * @returns        lines joined by newlines, without a last newline
 */
export function printProblem(problem: ProblemData, source?: string): string {
  const { file, line, column } = problem;
  const where = [file, line, column].filter((part) => part !== undefined).join(':');
  const out = [where === '' ? harmless(problem.message) : `${harmless(where)}  ${harmless(problem.message)}`];
  const text = line === undefined ? undefined : source?.split(/\r\n|\n|\r/)[line - 1];
  if (line !== undefined && column !== undefined && text !== undefined) {
    const from = Math.max(0, column - 1 - around / 2);
    const shown = text.slice(from, from + around).replaceAll('\t', ' ');
    const gutter = String(line).padStart(5);
    const lead = harmless(shown.slice(0, column - 1 - from));
    const marked = harmless(shown.slice(column - 1 - from, column - 1 - from + Math.max(1, problem.length ?? 1)));
    out.push(`${gutter} | ${harmless(shown)}`, `${' '.repeat(5)} | ${' '.repeat(lead.length)}${'^'.repeat(Math.max(1, marked.length))}`);
  }
  if (problem.expected !== undefined) out.push(`  expected  ${harmless(problem.expected)}`);
  if (problem.nearest !== undefined) out.push(`  nearest   ${harmless(problem.nearest)}`);
  return out.join('\n');
}
