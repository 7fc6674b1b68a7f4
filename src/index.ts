export { Problem, printProblem, type ProblemData } from './problems/index.ts';
