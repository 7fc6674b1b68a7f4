export type { Case, Entry, Target, Tolerance, Value } from './entry.ts';
export { allPaths, type FieldAt, fieldAt, readEntry } from './field-at.ts';
export { readCaseFile } from './file.ts';
export type { Position } from './place.ts';
export { readCase, type ReadOptions } from './read.ts';
export { jsonSchema } from './schema.ts';
export { caseTemplate } from './template.ts';
export * from './vocabulary.ts';
export { wallEntries } from './walls.ts';
