import type { YAMLError } from 'yaml';
import type { Complaints } from './complaints.ts';

/** What the parser's codes mean to the writer of a case: what is wrong, what is expected. */
const meanings: Readonly<Record<string, readonly [message: string, expected: string]>> = {
  BAD_INDENT: ['the indentation fits no key above', 'keys of one map begin in the same column'],
  TAB_AS_INDENT: ['a tab is no indentation', 'spaces'],
  MULTIPLE_DOCS: ['a second document begins here', 'one case in a file'],
  BLOCK_AS_IMPLICIT_KEY: ['a second colon stands in this value', 'quotes around a text that holds ": "'],
  BLOCK_IN_FLOW: ['an indented list or map stands within brackets', 'one form or the other'],
  MISSING_CHAR: ['a bracket, quote, comma or colon is missing', 'pairs of { }, [ ], quotes; "key: value" with a space behind the colon'],
  MULTILINE_IMPLICIT_KEY: ['a colon is missing, or a key goes over two lines', 'key: value on one line'],
  KEY_OVER_1024_CHARS: ['a key is longer than 1024 characters', 'the keys of a case'],
  UNEXPECTED_TOKEN: ['this stands where nothing is expected', 'key: value, or "- item" for a list'],
  BAD_SCALAR_START: ['a value cannot begin with this character', 'quotes around it'],
  BAD_DQ_ESCAPE: ['an escape in double quotes that does not exist', 'single quotes, or \\\\ for a backslash'],
  BAD_ALIAS: ['"*" points to another place of the file, which a case does not take', 'the value itself'],
  MULTIPLE_ANCHORS: ['"&" names a value for use elsewhere, which a case does not take', 'the value without it'],
  MULTIPLE_TAGS: ['"!" sets the type of a value, which a case does not take', 'the value without it'],
  TAG_RESOLVE_FAILED: ['"!" sets the type of a value, which a case does not take', 'the value without it'],
  RESOURCE_EXHAUSTION: ['too many levels within each other', 'a case has at most five levels'],
};

const mostShown = 10;

/** Complaints of the YAML parser in our words, one a line of the file, since one slip makes many of them. */
export function syntaxComplaints(errors: readonly YAMLError[], text: string, complaints: Complaints): void {
  const lines = new Set<number>();
  for (const error of errors.slice(0, 1000)) {
    if (lines.size >= mostShown) return;
    const from = Math.min(error.pos[0], Math.max(0, text.length - 1));
    const span = { from, to: Math.max(from + 1, Math.min(error.pos[1], text.length)) };
    const { line } = complaints.position(span);
    if (lines.has(line)) continue;
    lines.add(line);
    const [message, expected] = meanings[error.code] ?? ['this is no YAML', 'key: value, with spaces for indentation'];
    complaints.add(span, { code: 'unreadable-yaml', message, expected });
  }
}
