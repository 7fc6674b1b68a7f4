import { randomBytes } from 'node:crypto';
import { lstatSync, mkdirSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { Problem } from '../problems/index.ts';

/**
 * Writes files into a folder, all or none: what exists is refused first, then every file is written under a passing name and moved to its own.
 * Nothing is written outside the folder: a link inside it is replaced, never followed.
 *
 * @param folder  as the user wrote it; made where it is missing
 * @param files   names below it, with `/` between their parts, and texts
 * @param force   overwrite what exists
 * @returns       paths of the files
 * @throws        {Problem} would-overwrite with all that exists; not-written
 */
export function writeInto(folder: string, files: readonly { readonly name: string; readonly text: string }[], force: boolean): string[] {
  const paths = files.map(({ name }) => join(folder, ...name.split('/')));
  const existing = paths.filter((path) => kindOf(path) !== undefined);
  const blocked = existing.filter((path) => kindOf(path) === 'folder');
  if (blocked.length > 0) throw new Problem(blocked.map((path) => ({ code: 'not-written', message: `${path} is a folder`, expected: 'another folder for the files' })));
  if (existing.length > 0 && !force) throw new Problem(existing.map((path) => ({ code: 'would-overwrite', message: `${path} exists`, expected: 'another folder, or --force to overwrite' })));
  const below = new Set(files.filter(({ name }) => name.includes('/')).map(({ name }) => join(folder, dirname(name))));
  for (const path of below) if (kindOf(path) === 'other') throw new Problem({ code: 'not-written', message: `${path} is not a folder of its own`, expected: 'a folder, no link and no file' });
  const passing = paths.map((path) => join(dirname(path), `.${randomBytes(6).toString('hex')}.part`));
  try {
    mkdirSync(folder, { recursive: true });
    for (const path of below) mkdirSync(path, { recursive: true });
    files.forEach(({ text }, i) => writeFileSync(passing[i] as string, text, { flag: 'wx' }));
    paths.forEach((path, i) => renameSync(passing[i] as string, path));
  } catch (error) {
    for (const path of passing) rmSync(path, { force: true });
    const code = (error as NodeJS.ErrnoException).code;
    throw new Problem({ code: 'not-written', message: `${folder} cannot be written: ${code === 'EEXIST' || code === 'ENOTDIR' ? 'it is a file' : code === 'EACCES' || code === 'EPERM' || code === 'EROFS' ? 'that is not allowed' : code === 'ENOSPC' ? 'the disk is full' : (code ?? 'unknown reason')}`, expected: 'a folder that can be written to' });
  }
  return paths;
}

function kindOf(path: string): 'folder' | 'other' | undefined {
  const about = lstatSync(path, { throwIfNoEntry: false });
  if (about === undefined) return undefined;
  return about.isDirectory() ? 'folder' : 'other';
}
