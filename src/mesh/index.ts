import type { Definition } from '../workings/index.ts';
import { cuts } from './cuts.ts';
import { regions } from './regions.ts';
import { sizes } from './sizes.ts';

/** What the mesh consists of. */
export const meshDefinitions: Definition[] = [...cuts, ...sizes, ...regions];
