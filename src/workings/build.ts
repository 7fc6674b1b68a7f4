import { Problem, nearestName, type ProblemData } from '../problems/index.ts';
import type { Definition, MoreWays, PlaceKind, Quantity, Way, When } from './define.ts';

/** The places of a case, by kind; `target` names the place of each kind that a plain id stands for. */
export interface Places {
  readonly of: Readonly<Partial<Record<PlaceKind, readonly string[]>>>;
  readonly target: Readonly<Partial<Record<PlaceKind, string>>>;
}
const noPlaces: Places = { of: {}, target: {} };

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

function placesOf(quantity: Quantity, places: Places): string[][] {
  let rows: string[][] = [[]];
  for (const kind of quantity.per ?? []) rows = rows.flatMap((row) => (places.of[kind] ?? []).map((place) => [...row, place]));
  return rows.filter((row) => row.length > 0);
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
      const plain = d.id.split('@')[0] as string;
      const had = added.get(plain);
      if (had === undefined) added.set(plain, [d]);
      else had.unshift(d);
    } else if (quantities.has(d.id)) problems.push({ code: 'duplicate-definition', message: `the quantity ${d.id} is defined twice` });
    else quantities.set(d.id, d);
  }
  const ids = new Set<string>(quantities.keys());
  for (const q of quantities.values()) for (const row of placesOf(q, places)) ids.add(`${q.id}@${row.join('/')}`);
  const known = [...quantities.keys()];
  const unknown = (where: string, id: string): void => {
    problems.push({ code: 'unknown-quantity', message: `${where} names ${id}, which no definition gives`, ...near(id, known) });
  };
  for (const plain of added.keys()) if (!quantities.has(plain)) unknown('an added way', plain);

  const local = (need: string, row: readonly string[]): string => {
    if (row.length === 0 || need.includes('@')) return need;
    const tries = [row.join('/'), ...row];
    return tries.map((t) => `${need}@${t}`).find((id) => ids.has(id)) ?? need;
  };
  const nodes = new Map<string, Node>();
  const make = (q: Quantity, row: readonly string[]): void => {
    const id = row.length === 0 ? q.id : `${q.id}@${row.join('/')}`;
    const fits = (m: MoreWays): boolean => {
      const at = m.id.split('@')[1];
      return at === undefined ? true : row.length > 0 && at.split('/').every((part) => row.includes(part));
    };
    const own = [...(added.get(q.id) ?? []).filter(fits).flatMap((m) => m.more), ...q.ways];
    const copies = row.length > 0 ? [] : placesOf(q, places);
    let at: string | undefined;
    const lead: Way[] = [];
    if (copies.length > 0) {
      const target = (q.per ?? []).map((kind) => places.target[kind] ?? places.of[kind]?.[0]).join('/');
      if (q.plain === 'target' && ids.has(`${q.id}@${target}`)) {
        at = target;
        lead.push(identity(`${q.id}@${target}`));
      } else if (q.plain !== undefined && q.plain !== 'target') lead.push(overPlaces(q.id, copies.map((c) => `${q.id}@${c.join('/')}`), q.plain));
    }
    const holds = ([word, value]: [string, string | readonly string[]]): boolean => fixed[word] === undefined || (typeof value === 'string' ? value === fixed[word] : value.includes(fixed[word]));
    const bound = [...lead, ...own].filter((way) => way.when === undefined || Object.entries(way.when).every(holds)).map((way) => {
      const needs = way.needs.map((n) => local(n, row));
      needs.forEach((n, k) => ids.has(n) || unknown(`a way to ${q.id} (${way.formula})`, way.needs[k] as string));
      const closes = way.closes === undefined ? undefined : local(way.closes, row);
      if (closes !== undefined && !ids.has(closes)) unknown(`the loop of ${q.id}`, closes);
      return { way, needs, closes, when: way.when === undefined ? undefined : checkWhen(q.id, way.when, row) };
    });
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
  for (const q of quantities.values()) {
    make(q, []);
    for (const row of placesOf(q, places)) make(q, row);
  }
  if (problems.length > 0) throw new Problem(problems);
  return nodes;
}

function near(id: string, known: readonly string[]): { nearest?: string } {
  const nearest = nearestName(id, known);
  return nearest === undefined ? {} : { nearest };
}
