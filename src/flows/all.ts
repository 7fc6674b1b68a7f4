// One line a flow.
export { channel } from './channel.ts';
export { duct } from './duct.ts';
export { general } from './general.ts';
export { packedBed } from './packed-bed.ts';
export { pipe } from './pipe.ts';
