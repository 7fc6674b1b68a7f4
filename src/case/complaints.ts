import { Problem, type ProblemData } from '../problems/index.ts';
import { Places, type Position } from './place.ts';

/** A stretch of the file, as offsets. */
export interface Span {
  readonly from: number;
  readonly to: number;
}

const most = 200;

/** Gathers all that is wrong with a file, each with its place, to be thrown at once. */
export class Complaints {
  readonly #file: string;
  readonly #places: Places;
  readonly #list: ProblemData[] = [];
  #more = 0;

  constructor(text: string, file: string) {
    this.#file = file;
    this.#places = new Places(text);
  }

  position(span: Span): Position {
    return this.#places.position(span.from, span.to);
  }

  /** Whether further complaints are only counted. */
  get full(): boolean {
    return this.#list.length >= most;
  }

  /** Takes a complaint; returns undefined, so that a reader can leave with it. */
  add(span: Span, problem: ProblemData): undefined {
    return this.at(this.position(span), problem);
  }

  /** The same where the position is known. */
  at(position: Position, problem: ProblemData): undefined {
    if (this.full) this.#more++;
    else this.#list.push({ ...problem, file: this.#file, ...position });
    return undefined;
  }

  /** Throws if anything was wrong, in the order of the file. */
  settle(): void {
    if (this.#list.length === 0) return;
    const sorted = this.#list.toSorted((a, b) => (a.line ?? 0) - (b.line ?? 0) || (a.column ?? 0) - (b.column ?? 0));
    if (this.#more > 0) sorted.push({ code: 'more-problems', message: `${this.#more} more problems in this file`, file: this.#file });
    throw new Problem(sorted);
  }
}
