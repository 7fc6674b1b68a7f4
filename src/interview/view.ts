import { vocabulary } from '../assemble/index.ts';
import { own, readCase, type Case } from '../case/index.ts';
import { settle, type State as Decided } from '../decide/index.ts';
import { missing } from '../workings/index.ts';
import { closedPaths, type Desk, type Settled, type State } from './state.ts';
import { writeCase } from './writing.ts';

/** Words that a key of the case states, by the fact that rules read. */
const wordPaths: Readonly<Record<string, string>> = { medium: 'fluid.medium', inletProfile: 'inlet.profile', character: 'time.character', generalConfinement: 'confinement', plateFacing: 'facing' };

/** What the answers so far come to. */
export interface View {
  readonly on: Case;
  readonly settled: Settled;
  readonly decided: Decided;
  /** Whether the user may still be asked for a path. */
  readonly can: (path: string) => boolean;
  /** Inputs that would make a quantity or a word known, alternatives joined by `|`; undefined where no answer would. */
  readonly inputs: (id: string) => readonly string[] | undefined;
}

/**
 * The case of the answers so far, read as if from a file.
 *
 * @throws {Problem} what the reader finds
 */
export const caseOf = (state: State, file = 'answers'): Case => readCase(writeCase(state, false), file, vocabulary, { partial: true });

/**
 * Settles what the answers so far come to.
 *
 * @param desk   how a case becomes a graph
 * @param state  the answers; the flow is among them
 * @returns      the view
 * @throws       {Problem} what does not fit together
 */
export function viewOf(desk: Desk, state: State): View {
  const on = caseOf(state);
  const settled = desk.settle(on);
  const { assembled, rules, targets } = settled;
  const { workings, chosen } = assembled;
  const askable = (id: string): boolean => assembled.askable(id);
  const decided = settle(workings, rules, targets, { askable, chosen });
  const closed = closedPaths(state);
  const can = (path: string): boolean => !closed.has(path) && !state.given.has(path);
  const canAsk = (id: string): boolean => { const path = own(wordPaths, id); return path === undefined ? askable(id) && can(id) : can(path); };
  return { on, settled, decided, can, inputs: (id) => missing(workings, id, canAsk)?.map((group) => group.split('|').map((one) => own(wordPaths, one) ?? one).join('|')) };
}
