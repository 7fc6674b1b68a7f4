export { numericsDefinitions } from './definitions.ts';
export { crosswindDiffusion, diffusionShare } from './diffusion.ts';
