import { lstatSync, mkdirSync, renameSync, rmSync, statSync, writeFileSync } from 'node:fs';
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
  const below = [...new Set(files.filter(({ name }) => name.includes('/')).map(({ name }) => join(folder, dirname(name))))];
  const passing = paths.map((path) => join(dirname(path), `.${Math.random().toString(36).slice(2, 10)}.part`));
  const begun: string[] = [];
  try {
    refuse(folder, paths, below, force);
    for (const path of [folder, ...below]) makeFolder(path);
    files.forEach(({ text }, i) => {
      begun.push(passing[i] as string);
      writeFileSync(passing[i] as string, text, { flag: 'wx' });
    });
    paths.forEach((path, i) => renameSync(passing[i] as string, path));
  } catch (error) {
    if (error instanceof Problem) throw error;
    for (const path of begun) rmSync(path, { force: true });
    const code = (error as NodeJS.ErrnoException).code ?? 'unknown reason';
    throw new Problem({ code: 'not-written', message: `${folder} cannot be written: ${reasons[code] ?? code}`, expected: 'a folder that can be written to' });
  }
  return paths;
}

const reasons: Readonly<Record<string, string>> = { ENOENT: 'no folder can be made there', EEXIST: 'a file stands in its path', ENOTDIR: 'a file stands in its path', EACCES: 'that is not allowed', EPERM: 'that is not allowed', EROFS: 'that is not allowed', ENOSPC: 'the disk is full', ENAMETOOLONG: 'the name is too long' };

/** Makes a folder and those above it, one by one: where the system refuses one, that is an error and no endless trying. */
function makeFolder(path: string): void {
  if (statSync(path, { throwIfNoEntry: false })?.isDirectory() === true) return;
  const above = dirname(path);
  if (above !== path) makeFolder(above);
  mkdirSync(path);
}

function refuse(folder: string, paths: readonly string[], below: readonly string[], force: boolean): void {
  const expected = 'a folder, or a name that does not exist yet';
  if (statSync(folder, { throwIfNoEntry: false })?.isDirectory() === false) throw new Problem({ code: 'not-written', message: `${folder} is a file`, expected });
  for (const path of below) if (kindOf(path) === 'other') throw new Problem({ code: 'not-written', message: `${path} is no folder but a file or a link`, expected });
  const existing = paths.filter((path) => kindOf(path) !== undefined);
  for (const path of existing) if (kindOf(path) === 'folder') throw new Problem({ code: 'not-written', message: `${path} is a folder`, expected: 'another folder for the files' });
  if (existing.length > 0 && !force) throw new Problem(existing.map((path) => ({ code: 'would-overwrite', message: `${path} exists`, expected: 'another folder, or --force to overwrite' })));
}

/** What stands at a path itself, links not followed. */
function kindOf(path: string): 'folder' | 'other' | undefined {
  const about = lstatSync(path, { throwIfNoEntry: false });
  return about === undefined ? undefined : about.isDirectory() ? 'folder' : 'other';
}
