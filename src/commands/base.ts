import { Command } from '@oclif/core/command';
import type { Config, Input, ParserOutput } from '@oclif/core/interfaces';
import type { ChalkInstance } from 'chalk';
import { Problem } from '../problems/index.ts';
import { isTerminal, stderr, stdout, write } from './output.ts';
import { usageProblems } from './usage.ts';

export * as Args from '@oclif/core/args';
export * as Flags from '@oclif/core/flags';

/** The little of the framework's configuration a known command needs; loading the full one costs more than a plan. */
const config = {
  bin: 'runbrief',
  userAgent: 'runbrief',
  runHook: () => Promise.resolve({ successes: [], failures: [] }),
  scopedEnvVar: () => undefined,
  scopedEnvVarKeys: () => [],
} as unknown as Config;

type Named = Record<string, unknown>;

/** The class of a command, as the registry hands it over. */
export interface CommandClass {
  readonly examples: readonly Example[];
  readonly judges: boolean;
  readonly args: typeof Command.args;
  readonly flags: typeof Command.flags;
  start(argv: readonly string[]): Promise<number>;
}

/** One line of a command's help: what to type, and what it gives. */
export interface Example {
  readonly command: string;
  readonly description: string;
}

/**
 * What every command shares: `--json`, text on stdout, exit codes, colour.
 *
 * A command reads its flags, calls one function, prints with `say` and returns the document of `--json`.
 * It throws what it meets; `main` turns that into a message and an exit code.
 */
export abstract class Base extends Command {
  static override enableJsonFlag = true;
  static override examples: Example[] = [];
  /** The framework leaves both out where a command has none. */
  static override args: typeof Command.args = {};
  static override flags: typeof Command.flags = {};
  /** Whether the command holds something against a limit, so that exit code 4 exists. */
  static judges = false;

  #missed = false;

  /**
   * Runs the command.
   *
   * @param argv  what follows the command's name
   * @returns     exit code, 0 or 4
   * @throws      {Problem} whatever is wrong in what was given or in the use of the command line
   */
  static async start(this: new (argv: string[], config: Config) => Base, argv: readonly string[]): Promise<number> {
    for (const arg of Object.values((this as unknown as typeof Base).args)) arg.ignoreStdin = true; // a missing argument is never read from a pipe
    const command = new this([...argv], config);
    await command._run();
    return command.#missed ? 4 : 0;
  }

  /** The work; what it returns is printed with `--json`. */
  abstract override run(): Promise<object>;

  /** Prints a line of the result on stdout; nothing with `--json`. */
  protected say(text: string): void {
    if (!this.jsonEnabled()) write(stdout, `${text}\n`);
  }

  /** Prints a remark on stderr, such as which files were written; with `--json` too, since stdout stays one document. */
  protected remark(text: string): void {
    write(stderr, `${text}\n`);
  }

  /** A limit was missed or cannot be told: exit code 4. */
  protected limitMissed(): void {
    this.#missed = true;
  }

  /** Colours for a terminal; without effect in a pipe, with NO_COLOR and with `--json`. */
  protected async colours(): Promise<ChalkInstance> {
    const { Chalk, default: chalk } = await import('chalk');
    return this.colourless ? new Chalk({ level: 0 }) : chalk;
  }

  /** Whether no colour can show, so that the library of colours need not be loaded. */
  protected get colourless(): boolean {
    return this.jsonEnabled() || (process.env['NO_COLOR'] ?? '') !== '' || (!isTerminal() && process.env['FORCE_COLOR'] === undefined);
  }

  override logJson(document: unknown): void {
    write(stdout, `${JSON.stringify(document, finite, 2)}\n`);
  }

  protected override async parse<F extends Named, B extends Named, A extends Named>(options?: Input<F, B, A>, argv?: string[]): Promise<ParserOutput<F, B, A>> {
    try {
      return await super.parse(options, argv);
    } catch (error) {
      throw error instanceof Problem ? error : new Problem(usageProblems(error, [...Object.keys(this.ctor.flags), 'json', 'help']));
    }
  }

  override init(): Promise<void> {
    return Promise.resolve();
  }

  override catch(error: Error): Promise<never> {
    return Promise.reject(error);
  }
}

/** NaN and infinity would turn into null without a word. */
function finite(key: string, value: unknown): unknown {
  if (typeof value === 'number' && !Number.isFinite(value)) throw new RangeError(`${key} is ${value} in the document`);
  return value;
}
