import { Problem } from '../../src/problems/index.ts';

/** Code of the first problem that a task meets, or `none`. */
export const codeOf = (task: () => unknown): string => {
  try {
    task();
  } catch (error) {
    if (error instanceof Problem) return error.list[0]?.code ?? '';
    throw error;
  }
  return 'none';
};
