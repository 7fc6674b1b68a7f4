export { COMMANDS, type Entry } from './registry.ts';
export { dispatch } from './dispatch.ts';
export { fail } from './failure.ts';
export { stdout, write } from './output.ts';
