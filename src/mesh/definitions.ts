import type { Definition } from '../workings/index.ts';
import { cuts } from './cuts.ts';
import { eddyCounts } from './eddies.ts';
import { meshErrors } from './error.ts';
import { regions } from './regions.ts';
import { sizes } from './sizes.ts';

/** What the mesh consists of, and the error it is expected to leave. */
export const meshDefinitions: Definition[] = [...cuts, ...sizes, ...regions, ...meshErrors, ...eddyCounts];
