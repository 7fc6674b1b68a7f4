import type { CommandClass } from './base.ts';

/** A command's line in the overview, and its file, which is loaded only when the command runs. */
export interface Entry {
  readonly summary: string;
  readonly load: () => Promise<{ default: CommandClass }>;
}

/** The commands in the order of a day's work, which is the order of the overview. */
export const COMMANDS: Readonly<Record<string, Entry>> = {};
