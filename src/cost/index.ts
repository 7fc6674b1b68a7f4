export { costDefinitions } from './definitions.ts';
