import { existsSync } from 'node:fs';
import type { ChalkInstance } from 'chalk';
import { back, type Interview, type State } from '../interview/index.ts';
import type { Typed } from './ask-prompt.ts';
import { opening, problemLines, questionLines } from './ask-screen.ts';

/** How an interview ended, and whether the user agreed to keep it. */
export interface Ended {
  readonly state: State;
  readonly end: 'settled' | 'enough' | 'stopped';
  readonly save: boolean;
  /** The file that the user named. */
  readonly as?: string;
}

/** The terminal, as the talk sees it. */
export interface Desk {
  readonly line: Typed;
  readonly draw: (lines: readonly string[]) => void;
  readonly paint: ChalkInstance;
  /** What is decided at a state, in lines. */
  readonly decided: (state: State) => Promise<readonly string[]>;
}

/**
 * Holds the interview at a terminal: question, answer, until nothing is left or the user goes.
 *
 * @param talk   the interview
 * @param start  where it begins
 * @param into   the file that the case goes to, for what is said when the user goes
 * @param desk   the terminal
 * @returns      the last state, and whether it is to be kept
 */
export async function held(talk: Interview, start: State, into: string | undefined, desk: Desk): Promise<Ended> {
  const { draw, paint } = desk;
  draw(start.given.size > 0 ? [...opening, '', `${start.given.size} values are there already.`] : opening);
  let state = start;
  let number = 1;
  for (;;) {
    const question = talk.next(state);
    if ('done' in question) {
      draw(['', question.done === 'settled' ? 'No other answer would settle a decision that is open.' : 'No more questions.', ...(await desk.decided(state)), '']);
      return { state, end: question.done, save: true };
    }
    draw(questionLines(question, number, paint));
    for (let answered = false; !answered; ) {
      const typed = (await desk.line())?.trim();
      if (typed === undefined || typed === 'stop') return leaving(state, start, into, desk, typed === 'stop');
      answered = true;
      if (typed === 'back') {
        if (state === back(state)) draw(['     this is the first question']);
        number = Math.max(1, number - 1);
        state = back(state);
      } else if (typed === 'list') draw(['', ...(state.given.has('flow') ? await desk.decided(state) : ['nothing is decided before the flow is known'])]);
      else if (typed === 'enough') state = talk.enough(state);
      else {
        const outcome = talk.answer(state, typed);
        if ('problem' in outcome) {
          draw(problemLines(outcome.problem, paint));
          answered = false;
        } else {
          if (outcome.remark !== undefined) draw([`     ${outcome.remark}`]);
          state = outcome.state;
          number++;
        }
      }
    }
  }
}

/** The user goes: what is there is kept only where the user says so. */
async function leaving(state: State, start: State, into: string | undefined, desk: Desk, stop: boolean): Promise<Ended> {
  const gone = { state, end: 'stopped' as const, save: false };
  if (state === start) {
    desk.draw(['', 'Nothing was answered, so nothing is saved.']);
    return gone;
  }
  if (stop && into !== undefined) return { ...gone, save: true };
  desk.draw(['', into === undefined ? 'Save what is there? The name of a new file, or nothing to drop it.' : `Save what is there to ${into}? yes or no`]);
  for (;;) {
    const typed = (await desk.line())?.trim() ?? '';
    if (into !== undefined && /^y(es)?$/i.test(typed)) return { ...gone, save: true };
    const drop = into === undefined ? typed === '' : typed === '' || /^no?$/i.test(typed);
    if (drop) {
      desk.draw([`Nothing is saved. Begin again with runbrief ask${into === undefined ? '' : ` --into ${into}`}.`]);
      return gone;
    }
    if (into === undefined && !existsSync(typed)) return { ...gone, save: true, as: typed };
    desk.draw([into === undefined ? `${typed} exists: another name, or nothing` : 'yes or no']);
  }
}
