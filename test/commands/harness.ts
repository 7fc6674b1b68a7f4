import fs from 'node:fs';
import { vi } from 'vitest';
import { main } from '../../src/main.ts';

/** What a command line left behind. */
export interface Ended {
  readonly code: number;
  readonly stdout: string;
  readonly stderr: string;
}

/** Runs a task in this process and keeps what it wrote; other files are written as ever. */
export async function captured(task: () => Promise<number>): Promise<Ended> {
  const written = { 1: [] as string[], 2: [] as string[] };
  const { writeSync } = fs;
  const spy = vi.spyOn(fs, 'writeSync').mockImplementation(((to: number, what: Uint8Array | string, ...rest: never[]) => {
    if (to !== 1 && to !== 2) return writeSync(to, what as string, ...rest);
    written[to].push(typeof what === 'string' ? what : Buffer.from(what).toString());
    return Buffer.byteLength(what);
  }) as typeof fs.writeSync);
  try {
    return { code: await task(), stdout: written[1].join(''), stderr: written[2].join('') };
  } finally {
    spy.mockRestore();
  }
}

/** Runs one command line as `runbrief` would. */
export const runbrief = (argv: readonly string[]): Promise<Ended> => captured(() => main(argv));
