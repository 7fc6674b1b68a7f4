import { readFileSync, statSync } from 'node:fs';
import { Problem } from '../problems/index.ts';

/** Largest file of results that is read: 20 MB are about two million numbers. */
const largestFile = 20e6;

/**
 * Text of the bytes of a file of results.
 *
 * @param bytes  the file
 * @param file   its name, for problems
 * @returns      the text without a byte order mark
 * @throws       {Problem} empty-file, too-large, not-text
 */
export function textOf(bytes: Uint8Array, file: string): string {
  if (bytes.length > largestFile) throw new Problem({ code: 'too-large', message: `${file} is larger than ${largestFile / 1e6} MB`, file, expected: 'fewer rows or columns, only what is to be judged' });
  const notText = (message: string, expected: string): Problem => new Problem({ code: 'not-text', message, file, expected });
  if ((bytes[0] === 0xff && bytes[1] === 0xfe) || (bytes[0] === 0xfe && bytes[1] === 0xff)) throw notText('the file is written in UTF-16', 'UTF-8 or plain ASCII');
  if (bytes.includes(0)) throw notText('the file holds binary data', 'comma-separated values as text');
  let text: string;
  try {
    text = new TextDecoder('utf-8', { fatal: true }).decode(bytes);
  } catch {
    throw notText('the file is no valid UTF-8 text', 'UTF-8 or plain ASCII');
  }
  if (text.trim() === '') throw new Problem({ code: 'empty-file', message: 'the file is empty', file, expected: 'a header line and rows of numbers' });
  return text;
}

/**
 * Reads a file of results from disk, never more than the largest size.
 *
 * @param path  path of the file
 * @returns     its text
 * @throws      {Problem} missing-file, no-file, and those of textOf
 */
export function readResultText(path: string): string {
  try {
    const about = statSync(path); // before opening: a pipe would block, a folder has no text
    if (!about.isFile()) throw new Problem({ code: 'no-file', message: `${path} is not a file`, expected: 'a file of comma-separated values' });
    if (about.size > largestFile) throw new Problem({ code: 'too-large', message: `${path} is larger than ${largestFile / 1e6} MB`, file: path, expected: 'fewer rows or columns, only what is to be judged' });
    return textOf(readFileSync(path), path);
  } catch (error) {
    if (error instanceof Problem) throw error;
    const code = (error as NodeJS.ErrnoException).code;
    const why = code === 'ENOENT' || code === 'ENOTDIR' ? 'does not exist' : code === 'EACCES' ? 'may not be read' : 'cannot be read';
    throw new Problem({ code: 'missing-file', message: `${path} ${why}`, expected: 'the path of a file of comma-separated values' });
  }
}
