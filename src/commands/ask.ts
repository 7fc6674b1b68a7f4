import { existsSync, readFileSync, statSync } from 'node:fs';
import { basename, dirname } from 'node:path';
import about from '../../package.json' with { type: 'json' };
import { vocabulary } from '../assemble/index.ts';
import { readCaseFile, type Case } from '../case/index.ts';
import { empty, Interview, isOwn, replied, repliesIn, resumed, summaryOf, writeCase, type State } from '../interview/index.ts';
import { plan, settleCase, type PlanOptions } from '../plan/index.ts';
import { Problem } from '../problems/index.ts';
import { held, type Ended } from './ask-talk.ts';
import { Base, Flags } from './base.ts';
import { ownData, ownDataFlags } from './own-data.ts';
import { writeInto } from './written.ts';

type Settle = (on: Case) => ReturnType<typeof settleCase>;

const largestAnswers = 1 << 18;

/** `runbrief ask`: an interview that asks what still matters and writes a case file. */
export default class Ask extends Base {
  static override examples = [
    { command: 'runbrief ask --into line.case.yaml', description: 'asks at the terminal and writes the case; the same again goes on with a case that was stopped' },
    { command: 'runbrief ask --flow pipe --into line.case.yaml', description: 'the same, with the flow known' },
    { command: 'runbrief ask --answers known.txt', description: 'no questions: answers from lines of `path: value`, the case on stdout' },
  ];
  static override flags = {
    into: Flags.string({ helpValue: 'FILE', description: 'write the case to this file; one that an interview wrote is gone on with' }),
    answers: Flags.string({ helpValue: 'FILE', description: 'answers in place of prompts: lines of `path: value`, or YAML; what is not there is unknown' }),
    flow: Flags.string({ helpValue: 'NAME', description: 'the flow, so that it is not asked' }),
    force: Flags.boolean({ description: 'go on with a file of a person\'s hand too; its remarks are lost', dependsOn: ['into'] }),
    ...ownDataFlags,
  };

  async run(): Promise<object> {
    const { flags } = await this.parse(Ask);
    const terminal = process.stdin.isTTY && process.stdout.isTTY;
    if (flags.answers === undefined && !terminal) {
      throw new Problem({ code: 'would-prompt', message: 'ask puts questions and needs a terminal for input and output', expected: '--answers FILE with lines of `path: value`, or `runbrief template FLOW` for a case to fill in' });
    }
    const options = ownData(flags);
    const settle: Settle = (on) => settleCase(on, options);
    const talk = new Interview({ settle });
    const start = this.#start(talk, settle, flags);
    const ended = flags.answers === undefined ? await this.#talk(talk, start, flags.into, options) : this.#replied(talk, start, flags.answers);
    return this.#kept(ended, flags.into);
  }

  /** Where the interview begins: at the file that it goes on with, with the flow that is known. */
  #start(talk: Interview, settle: Settle, { into, flow, force }: { readonly into?: string | undefined; readonly flow?: string | undefined; readonly force: boolean }): State {
    const state = into === undefined || !existsSync(into) ? empty : goneOn(into, force, settle);
    const stood = state.given.get('flow')?.text;
    if (flow === undefined || stood === flow) return state;
    if (stood !== undefined) throw new Problem({ code: 'wrong-flag', message: `${into ?? ''} is a case of ${stood}, not of ${flow}`, expected: `--flow ${stood}, or another file` });
    const outcome = talk.answer({ ...state, given: new Map() }, flow);
    if ('problem' in outcome) throw outcome.problem;
    const { before: _before, ...first } = outcome.state;
    return { ...first, given: new Map([...first.given, ...state.given]) };
  }

  async #talk(talk: Interview, state: State, into: string | undefined, options: Pick<PlanOptions, 'rules' | 'materials'>): Promise<Ended> {
    const { terminalLine } = await import('./ask-prompt.ts');
    return held(talk, state, into, {
      line: await terminalLine(),
      draw: (lines) => this.remark(lines.join('\n')),
      paint: await this.colours(),
      decided: async (at) => summaryOf(await plan(talk.caseOf(at), { ...options, version: about.version })),
    });
  }

  #replied(talk: Interview, start: State, file: string): Ended {
    const answers = repliesIn(textOf(file), file);
    const flow = answers.get('flow');
    const stood = start.given.get('flow')?.text;
    if (flow !== undefined && stood !== undefined && flow !== stood) throw new Problem({ code: 'wrong-flag', message: `${file} answers flow: ${flow}, where ${stood} is stated`, expected: 'one flow' });
    if (flow === undefined && stood === undefined) throw new Problem({ code: 'missing-argument', message: `${file} does not name the flow`, expected: `flow: ${Object.keys(vocabulary.flows)[0]} in it, or --flow NAME` });
    const { state, unasked } = replied(talk, start, answers, file);
    if (unasked.length > 0) this.remark(`kept without being asked: ${unasked.join(', ')}`);
    return { state, end: 'settled', save: true };
  }

  /** Writes or prints what came out, if the user wants it kept. */
  #kept({ state, end, save, as }: Ended, into: string | undefined): object {
    const file = as ?? into;
    const text = writeCase(state);
    const found = { end, unknown: [...state.unknown.keys()], text };
    if (!save) return found;
    if (file === undefined) this.say(text.trimEnd());
    else this.#write(file, text);
    if (end === 'stopped') this.remark(file === undefined ? 'In a file, this is gone on with by runbrief ask --into FILE.' : `runbrief ask --into ${file} goes on from it.`);
    return file === undefined ? found : { ...found, file };
  }

  /** Writes the file; where that fails, the case is printed, so that no answer is lost. */
  #write(file: string, text: string): void {
    try {
      for (const path of writeInto(dirname(file), [{ name: basename(file), text }], true)) this.remark(`written: ${path}`);
    } catch (error) {
      this.say(text.trimEnd());
      throw error;
    }
  }
}

/** The state of a file; one that an interview did not write is taken with --force only. */
function goneOn(file: string, force: boolean, settle: Settle): State {
  const on = readCaseFile(file, vocabulary, { partial: true });
  const { text } = on;
  if (!force && !isOwn(text)) throw new Problem({ code: 'would-overwrite', message: `${file} exists and was not written by an interview`, expected: 'another name, or --force to go on with its values; its remarks are lost' });
  if (on.flow !== '') settle(on); // what does not fit together is told at its place in this file
  return resumed(text, file);
}

function textOf(file: string): string {
  try {
    const found = statSync(file); // before opening: a pipe would block
    if (!found.isFile()) throw new Problem({ code: 'no-file', message: `${file} is not a file`, expected: 'a file with lines of `path: value`' });
    if (found.size > largestAnswers) throw new Problem({ code: 'too-large', message: `${file} has more than 256 kB`, expected: 'a list of answers' });
    return readFileSync(file, 'utf8');
  } catch (error) {
    if (error instanceof Problem) throw error;
    throw new Problem({ code: 'missing-file', message: `${file} cannot be read`, expected: 'the path of a file with lines of `path: value`' });
  }
}
