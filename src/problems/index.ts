export { Problem, type ProblemData } from './problem.ts';
export { editDistance, nearestName } from './nearest.ts';
export { harmless, printProblem } from './print.ts';
