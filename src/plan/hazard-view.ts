import type { Ground } from './ground.ts';
import type { Mark, Where } from './hazard-words.ts';

/** What a class asks of a case. */
export interface HazardView extends Ground {
  /** Quantity a is known and at least quantity b. */
  atLeast(a: string, b: string): boolean;
  below(a: string, b: string): boolean;
  /** The effect can occur and was not left out; not yet judged ones that can occur count. */
  open(effect: string): boolean;
  mark(mark: Mark, ...where: Where[]): string | undefined;
  /** The number at a path of the case, where it is not zero. */
  given(path: string): boolean;
}

/** One class: what it is, and what set it off; undefined where its test is false. */
export interface HazardClass {
  readonly id: string;
  readonly title: string;
  /** Why it is said here, with numbers in braces. */
  readonly why: (on: HazardView) => string | undefined;
  /** What it means. */
  readonly means: string;
}
