import type { Definition } from '../workings/index.ts';
import { programme } from './programme.ts';
import { work } from './work.ts';

/** Memory, time and the cost of the whole programme. */
export const costDefinitions: Definition[] = [...work, ...programme];
