export { Interview } from './interview.ts';
export type { Done, Question } from './question.ts';
export { replied, repliesIn } from './replies.ts';
export { isOwn, resumed } from './resume.ts';
export { back, empty, type State } from './state.ts';
export { summaryOf } from './summary.ts';
export { writeCase } from './writing.ts';
