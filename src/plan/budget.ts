import type { Workings } from '../workings/index.ts';

/** An end of the machine or of the time that an estimate passes. */
export interface Passed {
  /** Path of what is given. */
  readonly path: 'computing.deadline' | 'computing.memory';
  /** Estimate that passes it. */
  readonly estimate: string;
}

const ends = [
  { path: 'computing.deadline', medium: 'wallTime', fine: 'wallTimeFine' },
  { path: 'computing.memory', medium: 'memory', fine: 'memoryFine' },
] as const;

/**
 * What of the stated budget the cost passes by its estimate, spread aside.
 *
 * @param workings  the settled graph
 * @param mesh      medium: not even the run that the plan is made for fits; fine: the last of the three meshes does not
 * @returns         each end that is passed; none where the case states no budget
 */
export function overBudget(workings: Workings, mesh: 'medium' | 'fine'): readonly Passed[] {
  return ends.flatMap(({ path, medium, fine }): Passed[] => {
    const estimate = mesh === 'medium' ? medium : fine;
    const [given, needed] = [workings.get(path), workings.get(estimate)];
    return given !== undefined && needed !== undefined && needed > given ? [{ path, estimate }] : [];
  });
}
