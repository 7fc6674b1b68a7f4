export { gridsDocument, gridsText } from './grids.ts';
export { wrapped } from './wrap.ts';
