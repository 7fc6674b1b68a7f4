export { fillReference, type FilledReference } from './compare-inputs.ts';
export { ladderDetails, ladderOf, ladderTables, skippedRungs, type CaseRung, type RungDetail, type SkippedRung } from './ladder.ts';
