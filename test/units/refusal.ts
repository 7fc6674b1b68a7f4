import { expect } from 'vitest';
import { Problem, type ProblemData } from '../../src/problems/index.ts';

/** The one problem that a call throws. */
export function refusal(call: () => unknown): ProblemData {
  try {
    call();
  } catch (error) {
    expect(error).toBeInstanceOf(Problem);
    const { list } = error as Problem;
    expect(list).toHaveLength(1);
    return list[0] as ProblemData;
  }
  throw new Error('nothing was refused');
}
