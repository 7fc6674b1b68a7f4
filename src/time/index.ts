export { timeDefinitions } from './definitions.ts';
