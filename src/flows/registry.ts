import * as all from './all.ts';
import type { Flow } from './define.ts';

/** Every configuration by its name in the case file, such as `packed-bed`. */
export const flows: Readonly<Record<string, Flow>> = Object.fromEntries(Object.values(all).map((flow) => [flow.id, flow]));
