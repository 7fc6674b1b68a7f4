import { readFileSync, statSync } from 'node:fs';
import { Problem } from '../problems/index.ts';
import type { Case } from './entry.ts';
import { readCase, type ReadOptions } from './read.ts';
import { largestCase, tooLarge } from './text.ts';
import type { Vocabulary } from './vocabulary.ts';

/**
 * Reads a case from disk. Folders, pipes and devices are refused, large files before they are opened.
 *
 * @param path        path of the file, as the user gave it
 * @param vocabulary  the keys there are
 * @param options     as for readCase
 * @returns           the case
 * @throws            {Problem} missing-file, no-file, too-large, and those of readCase
 */
export function readCaseFile(path: string, vocabulary: Vocabulary, options: ReadOptions = {}): Case {
  return readCase(bytesOf(path), path, vocabulary, options);
}

function bytesOf(path: string): Uint8Array {
  const expected = 'the path of a case file; `runbrief template pipe` writes one to fill in';
  try {
    const about = statSync(path); // before opening: a pipe would block, a folder has no text
    if (!about.isFile()) throw new Problem({ code: 'no-file', message: `${path} is not a file`, expected });
    if (about.size > largestCase) throw tooLarge(path, about.size);
    return readFileSync(path);
  } catch (error) {
    if (error instanceof Problem) throw error;
    const code = (error as NodeJS.ErrnoException).code;
    const why = code === 'ENOENT' || code === 'ENOTDIR' ? 'does not exist' : code === 'EACCES' ? 'may not be read' : 'cannot be read';
    throw new Problem({ code: 'missing-file', message: `${path} ${why}`, expected });
  }
}
