import { missing, type Workings } from '../workings/index.ts';
import { askableNow, type Askable } from './askable.ts';

/** What rules are read against: numbers, words, and whether a number that is not known could be given. */
export interface FactSource {
  /** Finite number or word; undefined where it is not known. */
  of(id: string): number | string | undefined;
  /** Whether some input of the case would make it known. */
  askable(id: string): boolean;
}

/** Facts with words laid over them: the verdicts of a pass, or the laminar and the turbulent reading. */
export class Overlaid implements FactSource {
  readonly #under: FactSource;
  readonly #words: ReadonlyMap<string, string>;
  constructor(under: FactSource, words: ReadonlyMap<string, string>) {
    this.#under = under;
    this.#words = words;
  }
  of(id: string): number | string | undefined {
    return this.#words.get(id) ?? this.#under.of(id);
  }
  askable(id: string): boolean {
    return this.#under.askable(id);
  }
}

/** The facts of one point of the workings, each looked up once; `at` reads those of one place. */
export class WorkingsFacts implements FactSource {
  readonly #workings: Workings;
  readonly #canAsk: Askable;
  readonly #place: string | undefined;
  readonly #seen = new Map<string, number | string | undefined>();
  #askable: Askable | undefined;
  readonly #places = new Map<string, WorkingsFacts>();

  constructor(workings: Workings, canAsk: Askable, place?: string) {
    this.#workings = workings;
    this.#canAsk = canAsk;
    this.#place = place;
  }

  at(place: string | undefined): WorkingsFacts {
    if (place === undefined) return this;
    let found = this.#places.get(place);
    if (found === undefined) this.#places.set(place, (found = new WorkingsFacts(this.#workings, this.#canAsk, place)));
    return found;
  }

  /** The id at the own place where the quantity exists there, else the plain one. */
  idOf(id: string): string {
    return placedId(this.#workings, id, this.#place);
  }

  of(id: string): number | string | undefined {
    if (this.#seen.has(id)) return this.#seen.get(id);
    const i = this.#workings.index.get(this.idOf(id));
    const value = i === undefined || !this.#workings.known(i) ? undefined : (this.#workings.slots[i]?.isWord === true ? this.#workings.wordAt(i) : this.#workings.value(i));
    this.#seen.set(id, value);
    return value;
  }

  askable(id: string): boolean {
    this.#askable ??= askableNow(this.#workings, this.#canAsk);
    return this.#askable(this.idOf(id));
  }

  /** The inputs that would make a fact known; undefined where none would. */
  missing(id: string): readonly string[] | undefined {
    return missing(this.#workings, this.idOf(id), this.#canAsk);
  }

  /** Forgets what was looked up, after a number of the workings was moved. */
  fresh(): WorkingsFacts {
    return new WorkingsFacts(this.#workings, this.#canAsk, this.#place);
  }
}

/** An id at a place: its own copy there, the copy of a station there, else the plain id. */
export function placedId(workings: Workings, id: string, at: string | undefined): string {
  if (at === undefined || id.includes('@')) return id;
  const own = `${id}@${at}`;
  return workings.has(own) ? own : workings.has(`${own}/target`) ? `${own}/target` : workings.has(`${own}/worst`) ? `${own}/worst` : id;
}

/** The facts of an example; a fact that it does not name could be given, unless it stands in `none`. */
export class ExampleFacts implements FactSource {
  readonly #facts: ReadonlyMap<string, number | string>;
  readonly #none: readonly string[];
  constructor(facts: Readonly<Record<string, number | string>>, none: readonly string[] = []) {
    this.#facts = new Map(Object.entries(facts));
    this.#none = none;
  }
  of(id: string): number | string | undefined {
    return this.#facts.get(id);
  }
  askable(id: string): boolean {
    return !this.#none.includes(id);
  }
}
