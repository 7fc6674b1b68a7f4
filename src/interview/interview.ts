import type { Case } from '../case/index.ts';
import { Problem } from '../problems/index.ts';
import { alternatives } from './alternatives.ts';
import { answered, kept, skipWord, unknownWord, type Values } from './answer.ts';
import { weightiestAssumption } from './assumed.ts';
import { flowQuestion, hangs, startQuestion } from './begin.ts';
import { hanging, type Hanging } from './open.ts';
import { questionOf, type Done, type Question } from './question.ts';
import type { Desk, State } from './state.ts';
import { caseOf, viewOf, type View } from './view.ts';
import { widestInput } from './wide.ts';

/** What an answer led to. */
export type Outcome = { readonly state: State; readonly remark?: string } | { readonly problem: Problem };

/**
 * An interview: which question comes next, why, and what an answer makes of it. It holds no state of its own: the same state gives the same question.
 *
 * First what flows where; then the input on which most open decisions and targets hang; then what was assumed, if another
 * answer would change a decision; last a spread that makes a target wider than asked.
 */
export class Interview {
  readonly #desk: Desk;
  readonly #views = new WeakMap<State, View>();
  readonly #next = new WeakMap<State, Question | Done>();

  constructor(desk: Desk) {
    this.#desk = desk;
  }

  /** The question that settles most, or that nothing is left to ask. */
  next(state: State): Question | Done {
    let next = this.#next.get(state);
    if (next === undefined) this.#next.set(state, (next = this.#find(state)));
    return next;
  }

  /**
   * Takes an answer to the question of a state.
   *
   * @param state  the answers so far
   * @param text   a value, `path: value`, `unknown` or `skip`
   * @param beside values by path that belong to it: humidity and composition to their material
   * @returns      the next state, or what is wrong with the answer
   */
  answer(state: State, text: string, beside?: Values): Outcome {
    const question = this.next(state);
    if ('done' in question) return { state };
    const { wants, ...without } = state;
    const rest = wants === undefined ? state : without;
    if (wants !== undefined && [unknownWord, skipWord].includes(text.trim())) return { state: { ...rest, before: state }, remark: `${wants.says}: without it there is nothing to plan` };
    const outcome = this.#tried(state, () => answered(rest, question, text, wants?.values ?? beside));
    const path = 'problem' in outcome ? neededBy(outcome.problem) : undefined;
    if (path === undefined || !('problem' in outcome) || beside?.has(path) === true) return outcome;
    // The answer waits for what it needs: the two stand together.
    const material = /^fluid\.material:\s+(.+)$/su.exec(text.trim())?.[1] ?? (question.paths.includes('fluid.material') ? text.trim() : undefined);
    if (material === undefined || wants !== undefined) return outcome;
    return { state: { ...rest, wants: { path, values: new Map([['fluid.material', material]]), says: outcome.problem.message }, before: state } };
  }

  /** Takes values that no question asked for. */
  keep(state: State, values: Values): Outcome {
    return this.#tried(state, () => kept(state, values));
  }

  #tried(state: State, make: () => State): Outcome {
    try {
      const next = make();
      const remark = next.given.has('flow') ? loose(this.#view(next), state) : undefined;
      return { state: next, ...(remark === undefined ? {} : { remark }) };
    } catch (error) {
      if (!(error instanceof Problem)) throw error;
      return { problem: new Problem(error.list.map(({ file: _file, line: _line, column: _column, ...rest }) => rest)) };
    }
  }

  /** Nothing more is asked from here on. */
  enough(state: State): State {
    return { ...state, enough: true, before: state };
  }

  /** Inputs on which open decisions hang, the one that settles most first; empty before the flow is known. */
  open(state: State): readonly Hanging[] {
    return state.given.has('flow') ? hanging(this.#view(state)) : [];
  }

  /** The case as it stands. */
  caseOf(state: State, file?: string): Case {
    return caseOf(state, file);
  }

  #view(state: State): View {
    let view = this.#views.get(state);
    if (view === undefined) this.#views.set(state, (view = viewOf(this.#desk, state)));
    return view;
  }

  #find(state: State): Question | Done {
    if (state.enough) return { done: 'enough' };
    if (!state.given.has('flow')) return flowQuestion();
    const view = this.#view(state);
    if (state.wants !== undefined) return questionOf(view.on.flow, { paths: [state.wants.path], why: state.wants.says }, view);
    const start = startQuestion(state, view);
    if (start !== undefined) return start;
    const first = hanging(view)[0];
    if (first !== undefined) {
      const paths = first.paths.length > 1 ? first.paths : alternatives(view, first.paths[0] as string).filter((path) => view.can(path));
      return questionOf(view.on.flow, { paths, ...hangs(first) }, view);
    }
    const rest = weightiestAssumption(this.#desk, view) ?? widestInput(state, view);
    return rest === undefined ? { done: 'settled' } : questionOf(view.on.flow, rest, view);
  }
}

/** A remark on a target that names no quantity, once. */
function loose(view: View, before: State): string | undefined {
  const words = view.settled.assembled.targets.find((target) => target.nearest !== undefined && before.given.get(`${target.id}.quantity`)?.text !== target.quantity);
  if (words === undefined) return undefined;
  const near = words.nearest === undefined || words.nearest.length === 0 ? '' : `; near to it: ${words.nearest.join(', ')}`;
  return `"${words.quantity}" names no number of this program: it is kept as words, without estimate${near}`;
}

/** The path of what a fluid lacks: its humidity or composition. */
function neededBy({ list }: Problem): string | undefined {
  const what = /^missing-(humidity|composition)$/.exec(list[0]?.code ?? '')?.[1];
  return what === undefined ? undefined : `fluid.${what}`;
}
