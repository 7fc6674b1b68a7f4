import { Problem, type ProblemData } from '../../src/problems/index.ts';

/** What a call returns, or the one problem that it throws; any other error passes through. */
export function attempt<T>(call: () => T): { value?: T; problem?: ProblemData } {
  try {
    return { value: call() };
  } catch (error) {
    if (!(error instanceof Problem) || error.list.length !== 1) throw error;
    return { problem: error.list[0] as ProblemData };
  }
}

/** The one problem that a call throws. */
export function refusal(call: () => unknown): ProblemData {
  const { problem } = attempt(call);
  if (problem === undefined) throw new Error('nothing was refused');
  return problem;
}
