import { stripVTControlCharacters } from 'node:util';
import { nearestName, type ProblemData } from '../problems/index.ts';

/** Codes of a wrong use of the command line, or a refusal: exit code 2. All other problems are in what was given: exit code 1. */
export const usageCodes: ReadonlySet<string> = new Set(['unknown-command', 'unknown-flag', 'unexpected-argument', 'missing-argument', 'wrong-flag', 'would-prompt', 'would-overwrite']);

/**
 * What the parser of the command line complains about, as problems.
 *
 * @param error  what the parser threw
 * @param flags  names of the command's flags, without dashes
 * @returns      problems with codes of `usageCodes`
 */
export function usageProblems(error: unknown, flags: readonly string[]): ProblemData[] {
  if (!(error instanceof Error)) return [{ code: 'wrong-flag', message: String(error) }];
  if ('flags' in error && Array.isArray(error.flags)) return (error.flags as string[]).map((flag) => unknownFlag(flag, flags));
  if ('args' in error && Array.isArray(error.args) && error.args.length > 0) return (error.args as (string | Missing)[]).map(unfitArgument);
  const said = stripVTControlCharacters(error.message).replace('See more help with --help', '').replace(/^The following errors? occurred:/, '');
  return [{ code: 'wrong-flag', message: said.replace(/^Parsing (--\S+)\s+/, '$1: ').replaceAll(/\s+/g, ' ').trim() }];
}

interface Missing {
  readonly name: string;
  readonly description?: string;
}

function unfitArgument(arg: string | Missing): ProblemData {
  if (typeof arg === 'string') return { code: 'unexpected-argument', message: `"${arg}" is one argument too many` };
  return { code: 'missing-argument', message: `${arg.name.toUpperCase()} is missing`, ...(arg.description === undefined ? {} : { expected: arg.description }) };
}

function unknownFlag(flag: string, flags: readonly string[]): ProblemData {
  const nearest = nearestName(flag.replace(/^-+/, ''), flags);
  const near = nearest === undefined ? {} : { nearest: `--${nearest}` };
  return { code: 'unknown-flag', message: `${flag} is not a flag of this command`, expected: flags.map((name) => `--${name}`).join(', '), ...near };
}
