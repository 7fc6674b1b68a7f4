/** What is wrong, where, what was expected, the nearest valid name: one record for every complaint the program makes. */
export interface ProblemData {
  /** Stable word for programs, such as `unknown-key` or `wrong-dimension`. */
  readonly code: string;
  /** One sentence without position, such as `"1.0 Pa.s/m" is not a dynamic viscosity`. */
  readonly message: string;
  readonly file?: string;
  /** Counted from 1. */
  readonly line?: number;
  readonly column?: number;
  /** How many characters the caret line marks. */
  readonly length?: number;
  /** Where the offending part begins within one value's text, counted from 0; a reader of files turns it into a column. */
  readonly at?: number;
  readonly expected?: string;
  readonly nearest?: string;
}

/** The one error type: a list of problems in what was given. Anything else that is thrown is our defect. */
export class Problem extends Error {
  readonly list: readonly ProblemData[];

  constructor(problems: ProblemData | readonly ProblemData[]) {
    const list = Array.isArray(problems) ? (problems as readonly ProblemData[]) : [problems as ProblemData];
    super(list.map((p) => p.message).join('\n'));
    this.name = 'Problem';
    this.list = list;
  }
}
