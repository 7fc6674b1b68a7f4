import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';

/** A file's path from the project folder, and its text. */
export interface Text {
  readonly file: string;
  readonly text: string;
}

/** Every file with an ending in a folder and the folders in it, in the order of their paths. */
export function textsUnder(folder: string, ending: string): Text[] {
  const paths = readdirSync(folder, { recursive: true, encoding: 'utf8' }).filter((path) => path.endsWith(ending));
  return paths.sort().map((path) => ({ file: join(folder, path), text: readFileSync(join(folder, path), 'utf8') }));
}
