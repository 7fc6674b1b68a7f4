export { compareText } from './compare.ts';
export { gridsDocument, gridsText } from './grids.ts';
