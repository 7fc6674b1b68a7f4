import { Problem, nearestName, type ProblemData } from '../problems/index.ts';
import type { Definition, MoreWays, PlaceKind, Quantity, Way, When } from './define.ts';

/** The places of a case, by kind; `target` names the place of each kind that a plain id stands for. */
export interface Places {
  readonly of: Readonly<Partial<Record<PlaceKind, readonly string[]>>>;
  readonly target: Readonly<Partial<Record<PlaceKind, string>>>;
}
const noPlaces: Places = { of: {}, target: {} };
const noPlace: readonly string[] = [];

/** A quantity at one place, or the plain one, with its ways in the order they are tried; needs are ids that exist. */
export interface Node {
  readonly id: string;
  readonly about: Quantity;
  readonly ways: readonly { readonly way: Way; readonly needs: readonly string[]; readonly when: When | undefined; readonly closes: string | undefined }[];
  /** The place whose value a plain id is. */
  readonly at?: string;
}

const identity = (need: string): Way => ({ needs: [need], value: (of) => of[need] as number, formula: `as at ${need.slice(need.indexOf('@') + 1)}`, source: 'definition' });

type Join = (a: number, b: number) => number;
const joins: Readonly<Record<'smallest' | 'largest' | 'sum', Join>> = { smallest: (a, b) => Math.min(a, b), largest: (a, b) => Math.max(a, b), sum: (a, b) => a + b };

const overPlaces = (id: string, copies: readonly string[], which: keyof typeof joins): Way => ({
  needs: copies,
  value: (of) => copies.map((c) => of[c] as number).reduce((a, b) => joins[which](a, b)),
  formula: `${which} of ${id} over its places`,
  source: 'definition',
});

type Rows = readonly (readonly string[])[];
const noRows: Rows = [];

/** The places of a quantity: a row of one place of each kind it has; none for a quantity of the whole case. */
function placesOf(quantity: Quantity, places: Places): Rows {
  if (quantity.per === undefined || quantity.per.length === 0) return noRows;
  let rows: string[][] = [[]];
  for (const kind of quantity.per) rows = rows.flatMap((row) => (places.of[kind] ?? []).map((place) => [...row, place]));
  return rows;
}

/**
 * Joins definitions into nodes: every quantity once a place, with needs resolved to its own place, else a part of it, else the plain id.
 *
 * @param definitions  in rising order of precedence: ways added later are tried earlier
 * @param places       the places of the case
 * @param fixed        words that hold for good: ways that ask for another are left out, and those that ask for these ask no longer
 * @returns            nodes by id
 * @throws             {Problem} duplicate-definition, unknown-quantity, unknown-word: defects in definitions, found at build and by the tests
 */
export function joinDefinitions(definitions: readonly Definition[], places: Places = noPlaces, fixed: Readonly<Record<string, string>> = {}): Map<string, Node> {
  const problems: ProblemData[] = [];
  const quantities = new Map<string, Quantity>();
  const added = new Map<string, MoreWays[]>();
  for (const d of definitions) {
    if ('more' in d) {
      const where = d.id.indexOf('@');
      const plain = where < 0 ? d.id : d.id.slice(0, where);
      const had = added.get(plain);
      if (had === undefined) added.set(plain, [d]);
      else had.unshift(d);
    } else if (quantities.has(d.id)) problems.push({ code: 'duplicate-definition', message: `the quantity ${d.id} is defined twice` });
    else quantities.set(d.id, d);
  }
  const ids = new Set<string>(quantities.keys());
  const rowsOf = new Map<string, Rows>();
  quantities.forEach((q) => {
    const rows = placesOf(q, places);
    if (rows.length > 0) rowsOf.set(q.id, rows);
    for (const row of rows) ids.add(`${q.id}@${row.join('/')}`);
  });
  const unknown = (where: string, id: string): void => {
    problems.push({ code: 'unknown-quantity', message: `${where} names ${id}, which no definition gives`, ...near(id, [...quantities.keys()]) });
  };
  added.forEach((_, plain) => { if (!quantities.has(plain)) unknown('an added way', plain); });

  const local = (need: string, row: readonly string[]): string => {
    if (row.length === 0 || need.includes('@')) return need;
    if (row.length > 1 && ids.has(`${need}@${row.join('/')}`)) return `${need}@${row.join('/')}`;
    for (const part of row) if (ids.has(`${need}@${part}`)) return `${need}@${part}`;
    return need;
  };
  const nodes = new Map<string, Node>();
  const holds = (when: When): boolean => Object.entries(when).every(([word, value]) => fixed[word] === undefined || (typeof value === 'string' ? value === fixed[word] : value.includes(fixed[word])));
  const make = (q: Quantity, row: readonly string[]): void => {
    const id = row.length === 0 ? q.id : `${q.id}@${row.join('/')}`;
    const bound: Node['ways'][number][] = [];
    const add = (way: Way): void => {
      if (way.when !== undefined && !holds(way.when)) return;
      const needs = row.length === 0 ? way.needs : way.needs.map((n) => local(n, row));
      for (let k = 0; k < needs.length; k++) if (!ids.has(needs[k] as string)) unknown(`a way to ${q.id} (${way.formula})`, way.needs[k] as string);
      const closes = way.closes === undefined ? undefined : local(way.closes, row);
      if (closes !== undefined && !ids.has(closes)) unknown(`the loop of ${q.id}`, closes);
      bound.push({ way, needs, closes, when: way.when === undefined ? undefined : checkWhen(q.id, way.when, row) });
    };
    const copies = row.length > 0 ? noRows : (rowsOf.get(q.id) ?? noRows);
    let at: string | undefined;
    if (copies.length > 0) {
      const target = (q.per ?? []).map((kind) => places.target[kind] ?? places.of[kind]?.[0]).join('/');
      if (q.plain === 'target' && ids.has(`${q.id}@${target}`)) {
        at = target;
        add(identity(`${q.id}@${target}`));
      } else if (q.plain !== undefined && q.plain !== 'target') add(overPlaces(q.id, copies.map((c) => `${q.id}@${c.join('/')}`), q.plain));
    }
    const own = q.whole !== true || bound.length === 0; // else the number of its places is all it is
    const more = own ? added.get(q.id) : undefined;
    if (more !== undefined) for (const m of more) {
      const where = m.id.indexOf('@');
      if (where < 0 || (row.length > 0 && m.id.slice(where + 1).split('/').every((part) => row.includes(part)))) m.more.forEach(add);
    }
    if (own) for (let k = 0; k < q.ways.length; k++) add(q.ways[k] as Way);
    nodes.set(id, { id, about: q, ways: bound, ...(at === undefined ? {} : { at }) });
  };
  const checkWhen = (id: string, when: When, row: readonly string[]): When => {
    const out: Record<string, string | readonly string[]> = {};
    for (const [word, value] of Object.entries(when)) {
      const q = quantities.get(word.split('@')[0] as string);
      if (q === undefined) unknown(`a way to ${id} (when)`, word);
      else for (const w of typeof value === 'string' ? [value] : value) {
        if (q.words !== undefined && !q.words.includes(w)) problems.push({ code: 'unknown-word', message: `a way to ${id} asks whether ${word} is ${w}, which is not in its list`, expected: q.words.join(', ') });
      }
      if (fixed[word] === undefined) out[local(word, row)] = value;
    }
    return out;
  };
  quantities.forEach((q) => {
    make(q, noPlace);
    const rows = rowsOf.get(q.id);
    if (rows !== undefined) for (const row of rows) make(q, row);
  });
  if (problems.length > 0) throw new Problem(problems);
  return nodes;
}

function near(id: string, known: readonly string[]): { nearest?: string } {
  const nearest = nearestName(id, known);
  return nearest === undefined ? {} : { nearest };
}
