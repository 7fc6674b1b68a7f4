export { ladderDetails, ladderOf, type CaseRung, type RungDetail } from './ladder.ts';
