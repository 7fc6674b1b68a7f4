export { Problem, type ProblemData } from './problem.ts';
export { inputsInWords } from './inputs.ts';
export { nearestName } from './nearest.ts';
export { harmless, printProblem } from './print.ts';
