// One line a flow.
export { backwardStep } from './backward-step.ts';
export { channel } from './channel.ts';
export { cylinder } from './cylinder.ts';
export { duct } from './duct.ts';
export { general } from './general.ts';
export { packedBed } from './packed-bed.ts';
export { pipe } from './pipe.ts';
export { plate } from './plate.ts';
export { sideHeatedCavity } from './side-heated-cavity.ts';
