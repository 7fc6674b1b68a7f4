import type { Definition } from '../workings/index.ts';
import { coupling } from './coupling.ts';
import { diffusion } from './diffusion.ts';
import { digits } from './digits.ts';
import { order } from './order.ts';
import { tolerances } from './tolerances.ts';

/** Tolerances, numerical diffusion, digits and the strength of couplings. */
export const numericsDefinitions: Definition[] = [...tolerances, ...diffusion, ...digits, ...coupling, ...order];
