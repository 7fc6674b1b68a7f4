import { dimensionOf, sameDimension, type Dimension } from '../units/index.ts';
import { namedGroups, ratios, type NamedGroup } from './named-groups.ts';
import { nullSpace } from './null-space.ts';

/** A quantity by name and dimension. */
export interface Dimensioned {
  readonly name: string;
  readonly dimension: Dimension;
}

/** A product of powers without dimension. */
export interface PiGroup {
  /** Whole exponents by name; names that do not stand in it are left out. */
  readonly exponents: Readonly<Record<string, number>>;
  /** `density * speed * size / viscosity` */
  readonly text: string;
  /** What the trade calls it. */
  readonly known?: string;
}

export interface PiGroups {
  readonly groups: readonly PiGroup[];
  /** Rank of the matrix of dimensions: so many fewer groups than quantities. */
  readonly rank: number;
  /** Names that stand in no group: nothing else carries their dimension. */
  readonly alone: readonly string[];
}

/** More names than this give more subsets than are worth trying. */
export const mostQuantities = 14;

/**
 * A full set of independent dimensionless groups: those the trade has names for first, then those of the fewest quantities.
 *
 * @param quantities  names, each once, with dimensions; at most `mostQuantities`
 * @returns           groups, as many as quantities less the rank; rank; names that stand in none
 * @source            Buckingham, Phys. Rev. 4 (1914) 345: the theorem of the number of groups
 */
export async function piGroups(quantities: readonly Dimensioned[]): Promise<PiGroups> {
  const { default: Fraction } = await import('fraction.js'); // loaded for this command alone
  const solve = (rows: readonly (readonly number[])[]): ReturnType<typeof nullSpace> => nullSpace(rows, (value) => new Fraction(value));
  const columns = (of: readonly Dimensioned[]): number[][] => Array.from({ length: 7 }, (_, base) => of.map((q) => q.dimension[base] as number));
  const { rank } = solve(columns(quantities));
  const wanted = quantities.length - rank;
  const chosen: number[][] = [];
  const add = (vector: number[]): void => {
    if (chosen.length < wanted && solve([...chosen, vector]).rank > chosen.length) chosen.push(vector);
  };
  const circuits = subsets(quantities.length, rank + 1).flatMap((subset) => {
    const { vectors } = solve(columns(subset.map((i) => quantities[i] as Dimensioned)));
    const [only] = vectors;
    if (vectors.length !== 1 || only === undefined || only.includes(0)) return [];
    return [upright(quantities.map((_, i) => only[subset.indexOf(i)] ?? 0))];
  });
  circuits.sort((a, b) => weight(a) - weight(b));
  for (const group of namedGroups) if (group.minor !== true) assignments(group, quantities).slice(0, 1).forEach(add);
  for (const vector of circuits) if (size(vector) <= 2) add(vector);
  for (const group of namedGroups) assignments(group, quantities).slice(0, 1).forEach(add);
  for (const vector of circuits) add(vector);
  const groups = chosen.map((vector) => described(vector, quantities));
  return { groups, rank, alone: quantities.filter((_, i) => circuits.every((vector) => vector[i] === 0)).map((q) => q.name) };
}

/** Index sets of at most so many members, small ones first. */
function subsets(count: number, most: number): number[][] {
  let rows: number[][] = [[]];
  const out: number[][] = [];
  for (let k = 1; k <= most; k++) {
    rows = rows.flatMap((row) => Array.from({ length: count - (row.at(-1) ?? -1) - 1 }, (_, i) => [...row, (row.at(-1) ?? -1) + 1 + i]));
    out.push(...rows);
  }
  return out;
}

const size = (vector: readonly number[]): number => vector.filter((e) => e !== 0).length;
const weight = (vector: readonly number[]): number => 100 * size(vector) + vector.reduce((sum, e) => sum + Math.abs(e), 0);

/** The first quantity stands above the line. */
function upright(vector: number[]): number[] {
  const first = vector.find((e) => e !== 0) ?? 1;
  return first < 0 ? vector.map((e) => (e === 0 ? 0 : -e)) : vector;
}

/** The ways in which quantities can take the parts of a named group, the first quantity of a dimension before others; a speed of sound comes last. */
function assignments(group: NamedGroup, quantities: readonly Dimensioned[]): number[][] {
  let rows: number[][] = [quantities.map(() => 0)];
  for (const [unit, exponent] of Object.entries(group.of)) {
    const dimension = dimensionOf(unit);
    const fits = quantities.map((_, i) => i).filter((i) => sameDimension((quantities[i] as Dimensioned).dimension, dimension));
    fits.sort((a, b) => Number(isSound(quantities[a])) - Number(isSound(quantities[b])));
    rows = rows.flatMap((row) => fits.map((i) => row.map((e, k) => (k === i ? e + exponent : e))));
  }
  return rows;
}

const isSound = (q: Dimensioned | undefined): boolean => /sound/i.test(q?.name ?? '');

function described(vector: readonly number[], quantities: readonly Dimensioned[]): PiGroup {
  const used = quantities.flatMap((q, i) => (vector[i] === 0 ? [] : [{ ...q, power: vector[i] as number }]));
  const product = (sign: 1 | -1): string[] => used.filter((q) => q.power * sign > 0).map((q) => (Math.abs(q.power) === 1 ? q.name : `${q.name}^${Math.abs(q.power)}`));
  const [above, below] = [product(1), product(-1)];
  const known = nameOf(used);
  return {
    exponents: Object.fromEntries(used.map((q) => [q.name, q.power])),
    text: `${above.length === 0 ? '1' : above.join(' * ')}${below.length === 0 ? '' : ` / ${below.length === 1 ? below[0] : `(${below.join(' * ')})`}`}`,
    ...(known === undefined ? {} : { known }),
  };
}

function nameOf(used: readonly (Dimensioned & { readonly power: number })[]): string | undefined {
  const parts = (of: Readonly<Record<string, number>>): [Dimension, number][] => Object.entries(of).map(([unit, power]) => [dimensionOf(unit), power]);
  const found = namedGroups.find(({ of }) => {
    const open = parts(of);
    return open.length === used.length && used.every((q) => {
      const at = open.findIndex(([dimension, power]) => power === q.power && sameDimension(dimension, q.dimension));
      if (at >= 0) open.splice(at, 1);
      return at >= 0;
    });
  });
  if (found !== undefined) return found.name;
  const [a, b] = used;
  if (used.length !== 2 || a === undefined || b === undefined || !sameDimension(a.dimension, b.dimension) || a.power !== -b.power) return undefined;
  return Object.entries(ratios).find(([unit]) => sameDimension(dimensionOf(unit), a.dimension))?.[1];
}
