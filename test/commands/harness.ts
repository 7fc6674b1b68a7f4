import { captureOutput } from '@oclif/test';
import { main } from '../../src/main.ts';

/** What a command line left behind. */
export interface Ended {
  readonly code: number;
  readonly stdout: string;
  readonly stderr: string;
}

/** Runs a task in this process and keeps what it wrote. */
export async function captured(task: () => Promise<number>): Promise<Ended> {
  const { result, stdout, stderr, error } = await captureOutput<number>(task, { stripAnsi: false });
  if (error !== undefined) throw error;
  return { code: result ?? Number.NaN, stdout, stderr };
}

/** Runs one command line as `runbrief` would. */
export const runbrief = (argv: readonly string[]): Promise<Ended> => captured(() => main(argv));
