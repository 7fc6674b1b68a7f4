import type { TextPrompt } from '@clack/core';

/** One line typed by the user; undefined where Escape or Ctrl-C was pressed. */
export type Typed = () => Promise<string | undefined>;

/**
 * Input of lines at the terminal. The library reads the keys and moves the cursor; what is shown is ours.
 *
 * @returns  a function that asks for one line behind a `>`, drawn on stderr
 */
export async function terminalLine(): Promise<Typed> {
  const { isCancel, TextPrompt: Text } = await import('@clack/core');
  return async () => {
    const typed = await new Text({ input: process.stdin, output: process.stderr, render: drawn }).prompt();
    return isCancel(typed) ? undefined : (typed ?? '');
  };
}

function drawn(this: Omit<TextPrompt, 'prompt'>): string {
  return this.state === 'submit' || this.state === 'cancel' ? `  > ${this.userInput}` : `  > ${this.userInputWithCursor}`;
}
