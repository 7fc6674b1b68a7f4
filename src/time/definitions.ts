import type { Definition } from '../workings/index.ts';
import { limits } from './limits.ts';
import { runLength } from './run.ts';
import { step } from './step.ts';

/** The time step and the length of the run. */
export const timeDefinitions: Definition[] = [...limits, ...step, ...runLength];
