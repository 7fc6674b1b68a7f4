import type { Definition } from '../workings/index.ts';

export const meshDefinitions: Definition[] = [];
