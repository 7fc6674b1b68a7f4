import { readFileSync, statSync } from 'node:fs';
import { harmless, Problem, printProblem, type ProblemData } from '../problems/index.ts';
import { stderr, stdout, write } from './output.ts';
import { usageCodes } from './usage.ts';

const largestShown = 1 << 20;

/**
 * Reports anything thrown and tells the exit code: problems on stderr, or on stdout as one document.
 *
 * @param error  what was thrown
 * @param json   whether `--json` was given
 * @returns      1 a problem in what was given, 2 wrong use of the command line, 3 our defect
 */
export function fail(error: unknown, json: boolean): 1 | 2 | 3 {
  const problems = error instanceof Problem ? error.list : undefined;
  if (json) write(stdout, `${JSON.stringify({ problems: problems ?? [defect(error)] }, undefined, 2)}\n`);
  else write(stderr, `${(problems ?? [defect(error)]).map((p) => printProblem(p, sourceOf(p.file))).join('\n')}\n`);
  if (problems !== undefined) return problems.every((p) => usageCodes.has(p.code)) ? 2 : 1;
  if ((process.env['RUNBRIEF_DEBUG'] ?? '') !== '' && error instanceof Error) write(stderr, `${error.stack ?? error.message}\n`);
  return 3;
}

function defect(error: unknown): ProblemData {
  const said = error instanceof Error ? error.message : String(error);
  const message = `This is a defect in runbrief, not in what you gave: ${harmless(said)}\n  Please report it with the command and its files; RUNBRIEF_DEBUG=1 shows where it happened.`;
  return { code: 'defect', message };
}

/** Text of the file a problem stands in, read again for the line with the caret. Never a pipe or a device. */
function sourceOf(file: string | undefined): string | undefined {
  if (file === undefined) return undefined;
  try {
    const about = statSync(file);
    return about.isFile() && about.size <= largestShown ? readFileSync(file, 'utf8') : undefined;
  } catch {
    return undefined;
  }
}
