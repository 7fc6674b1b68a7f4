import { Buffer } from 'node:buffer';
import { Problem } from '../problems/index.ts';
import { placeAt } from './place.ts';

/** Largest case file [bytes]. */
export const largestCase = 256 * 1024;

const largestStructure = 10_000;
const smaller = 'a case file of at most 256 kB; tables belong in files of their own';

/**
 * Text of a case file, refused where it cannot be one: too large, no UTF-8, control characters.
 *
 * @param input  the bytes, or a text that was read elsewhere
 * @param file   its name, for problems
 * @returns      the text without a byte order mark
 * @throws       {Problem} too-large, not-text, control-character, empty-file
 */
export function caseText(input: Uint8Array | string, file: string): string {
  const size = typeof input === 'string' ? Buffer.byteLength(input) : input.length;
  if (size > largestCase) throw tooLarge(file, size);
  const text = (typeof input === 'string' ? input : decoded(input, file)).replace(/^\ufeff/, '');
  if (text.trim() === '') throw new Problem({ code: 'empty-file', message: 'the case file is empty', file, expected: 'keys such as flow, sizes, fluid; `runbrief template pipe` writes a case to fill in' });
  const at = text.search(/[\u0000-\u0008\u000b\u000c\u000e-\u001f\u007f-\u009f\u202a-\u202e\u2066-\u2069\ufeff]|\r(?!\n)|[\ud800-\udbff](?![\udc00-\udfff])|(?<![\ud800-\udbff])[\udc00-\udfff]/);
  if (at >= 0) {
    const code = text.charCodeAt(at).toString(16).toUpperCase().padStart(4, '0');
    throw new Problem({ code: 'control-character', message: `the character U+${code} has no place in a case file`, file, ...placeAt(text, at), length: 1, expected: 'printable text in UTF-8' });
  }
  if (structure(text) > largestStructure) throw new Problem({ code: 'too-large', message: 'the file has more keys, brackets or lines than a case can have', file, expected: smaller });
  return text;
}

/** The problem of a file that is too large, for readers that look at the size before they open it. */
export function tooLarge(file: string, size: number): Problem {
  return new Problem({ code: 'too-large', message: `${file} has ${Math.ceil(size / 1024)} kB`, file, expected: smaller });
}

function decoded(bytes: Uint8Array, file: string): string {
  const notText = (message: string, at?: { line: number; column: number }): Problem => new Problem({ code: 'not-text', message, file, ...at, expected: 'text in UTF-8' });
  if ((bytes[0] === 0xff && bytes[1] === 0xfe) || (bytes[0] === 0xfe && bytes[1] === 0xff)) throw notText('the file is written in UTF-16');
  try {
    return new TextDecoder('utf-8', { fatal: true, ignoreBOM: true }).decode(bytes);
  } catch {
    const lenient = new TextDecoder('utf-8').decode(bytes);
    throw notText('here the file is no valid UTF-8', placeAt(lenient, Math.max(0, lenient.indexOf('\ufffd'))));
  }
}

/** How many characters could begin a line, a key, an item or a bracket: the work a parser has, whatever the bytes say. */
function structure(text: string): number {
  let count = 0;
  for (let i = 0; i < text.length; i++) {
    const c = text.charCodeAt(i);
    if (c === 0x0a || c === 0x3a || c === 0x2c || c === 0x5b || c === 0x7b || c === 0x22 || c === 0x27 || c === 0x26 || c === 0x2a || c === 0x3f || c === 0x21) count++;
    else if (c === 0x2d && text.charCodeAt(i + 1) === 0x20) count++;
  }
  return count;
}
