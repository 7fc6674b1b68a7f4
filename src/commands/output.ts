import fs from 'node:fs';
import { Problem } from '../problems/index.ts';

/** File descriptors of the two outputs. */
export const [stdout, stderr] = [1, 2];

const pause = new Int32Array(new SharedArrayBuffer(4));

/**
 * Writes a text whole, at once: the program then may end without waiting. The streams of the runtime would be loaded for it, which
 * takes a tenth of a plan.
 *
 * @param to    file descriptor
 * @param text  what to write
 * @throws      {Problem} not-written, such as for a full disk; a reader that went away early, such as `head`, is no failure
 */
export function write(to: number, text: string): void {
  const bytes = Buffer.from(text);
  for (let done = 0; done < bytes.length; ) {
    try {
      done += fs.writeSync(to, bytes, done);
    } catch (error) {
      const { code, message } = error as NodeJS.ErrnoException;
      if (code === 'EPIPE' || (code !== 'EAGAIN' && to === stderr)) return;
      if (code !== 'EAGAIN') throw new Problem({ code: 'not-written', message: `the result could not be written: ${message}` });
      Atomics.wait(pause, 0, 0, 5); // a pipe that is full and does not block
    }
  }
}

/** Whether a person may be reading stdout: only then the part of the runtime that knows terminals is loaded. */
export function isTerminal(): boolean {
  const about = fs.fstatSync(stdout);
  const memory = process.platform === 'linux' && about.rdev >> 8 === 1; // /dev/null and its like
  return about.isCharacterDevice() && !memory && process.stdout.isTTY;
}
