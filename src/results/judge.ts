import { searchedOrders } from './fits.ts';
import { leastSquares, type LeastSquares } from './leastSquares.ts';
import { apparentOrder, extrapolate, indexHalfWidth, tripletKind, type Triplet } from './order.ts';

export type GridKind = 'monotone' | 'oscillatory' | 'divergent' | 'converged' | 'two-grids';

/** Why the band was not formed with the order that was seen. */
export type Held = 'no' | 'down' | 'up' | 'none-seen';

/** One target on a family of meshes, in its own unit. */
export interface GridNumbers {
  readonly kind: GridKind;
  /** Apparent order, bare; absent where the data give none. */
  readonly order?: number;
  /** Value for a mesh of size zero by the bare order (by the formal order where none is seen). */
  readonly extrapolated?: number;
  /** Half-width of the band around the value on the finest mesh. */
  readonly halfWidth: number;
  readonly safetyFactor: number;
  /** Half-width by the bare order and a factor of 1.25, where that exists. */
  readonly index?: number;
  /** What the half-width is at least, read kindly: a limit below it is missed for certain. */
  readonly atLeast: number;
  readonly held: Held;
  /** Coarse index over r^p times the fine one: near 1 where the meshes follow the order. */
  readonly asymptoticRatio?: number;
  /** Standard deviation of the least-squares fit over the mean step of the data, from four meshes on. */
  readonly scatter?: number;
  /** Orders of neighbouring triplets, finest first, from four meshes on. */
  readonly tripletOrders?: readonly number[];
}

interface Family {
  /** Mesh sizes or steps over the finest, which is 1; rising. */
  readonly sizes: readonly number[];
  readonly values: readonly number[];
  readonly formalOrder: number;
  /** Differences up to here are noise [unit of the values]. */
  readonly iterationError: number;
}

const lowestBelieved = 0.5;
const overFormal = 0.5;

/**
 * Order, extrapolated value and band of a target on two meshes or more.
 *
 * Two: factor 3 on the formal order. Three: grid convergence index, its order believed from 0.5 to half above the formal one.
 * Four and more: least squares.
 *
 * @param family  sizes, values (finest first), formal order, iteration error
 * @returns       the numbers, in the unit of the values
 * @source        Celik et al. 2008; Eca and Hoekstra 2014; Roache 1997 for the factor 3; the limits 0.5 and formal order + 0.5: common practice
 */
export function judgeFamily(family: Family): GridNumbers {
  const { sizes, values, formalOrder } = family;
  const [fine, medium] = values as [number, number];
  if (values.length === 2) {
    const pair = { fine, medium, ratio: sizes[1] as number, order: formalOrder };
    const halfWidth = Math.max(indexHalfWidth({ ...pair, safetyFactor: 3 }), family.iterationError);
    return { kind: 'two-grids', extrapolated: extrapolate(pair), halfWidth, safetyFactor: 3, atLeast: halfWidth * kindly(3), held: 'none-seen' };
  }
  const triplet = tripletAt(family, 0);
  if (values.length === 3) return judgeThree(triplet, family);
  const steps = values.slice(1).map((v, i) => v - (values[i] as number));
  const fit = steps.slice(0, 2).every((step) => Math.abs(step) <= family.iterationError) ? undefined : leastSquares(sizes, values);
  return fit === undefined ? judgeThree(triplet, family) : judgeMany(fit, steps, family);
}

/** A factor of 3 stands for missing evidence, 1.25 for evidence: the kind reading of a half-width formed with either. */
const kindly = (safetyFactor: number): number => 1.25 / safetyFactor;

function tripletAt({ sizes, values }: Family, from: number): Triplet {
  const [h1, h2, h3] = sizes.slice(from, from + 3) as [number, number, number];
  const [fine, medium, coarse] = values.slice(from, from + 3) as [number, number, number];
  return { fine, medium, coarse, ratioFine: h2 / h1, ratioCoarse: h3 / h2 };
}

function judgeThree(triplet: Triplet, { formalOrder, iterationError }: Family): GridNumbers {
  const kind = tripletKind(triplet, iterationError);
  const { fine, medium, coarse, ratioFine: ratio } = triplet;
  const index = (order: number, safetyFactor: number): number => indexHalfWidth({ fine, medium, ratio, order, safetyFactor });
  if (kind === 'converged') {
    const fromCoarse = indexHalfWidth({ fine: medium, medium: coarse, ratio: triplet.ratioCoarse, order: formalOrder, safetyFactor: 3 }) / ratio ** formalOrder;
    const halfWidth = Math.max(index(formalOrder, 3), fromCoarse, iterationError);
    return { kind, extrapolated: extrapolate({ fine, medium, ratio, order: formalOrder }), halfWidth, safetyFactor: 3, atLeast: halfWidth * kindly(3), held: 'none-seen' };
  }
  if (kind === 'divergent') {
    const halfWidth = 3 * Math.max(Math.abs(fine - medium), Math.abs(medium - coarse));
    return { kind, halfWidth, safetyFactor: 3, atLeast: 0, held: 'none-seen' };
  }
  const order = apparentOrder(triplet);
  const most = kind === 'monotone' ? formalOrder + overFormal : formalOrder;
  const held: Held = order > most ? 'down' : order < lowestBelieved ? 'up' : 'no';
  const used = held === 'down' ? formalOrder : held === 'up' ? lowestBelieved : order;
  const safetyFactor = held === 'up' || (held === 'down' && kind === 'oscillatory') ? 3 : 1.25;
  const swing = kind === 'oscillatory' ? (Math.max(fine, medium, coarse) - Math.min(fine, medium, coarse)) / 2 : 0;
  const halfWidth = Math.max(index(used, safetyFactor), swing, iterationError);
  const bare = order > 0 ? { extrapolated: extrapolate({ fine, medium, ratio, order }), index: index(order, 1.25) } : {};
  return {
    kind,
    order,
    ...bare,
    halfWidth,
    safetyFactor,
    held,
    atLeast: Math.min(bare.index ?? Infinity, halfWidth * kindly(safetyFactor)),
    ...(kind === 'monotone' && fine !== 0 && medium !== 0 ? { asymptoticRatio: asymptoticRatio(triplet, order) } : {}),
  };
}

/**
 * How well three meshes follow one order: the coarse index over r^p times the fine one, both relative.
 *
 * @param triplet  values and ratios
 * @param order    apparent order [1], > 0
 * @returns        1 where the fine and medium values agree and the order holds [1]
 * @example        asymptoticRatio({ fine: 0.9705, medium: 0.96854, coarse: 0.96178, ratioFine: 2, ratioCoarse: 2 }, 1.7862) // 1.002
 * @source         Roache, Verification and Validation in Computational Science and Engineering (1998), chapter 5
 */
function asymptoticRatio(triplet: Triplet, order: number): number {
  const { fine, medium, coarse, ratioFine, ratioCoarse } = triplet;
  const fineIndex = indexHalfWidth({ fine, medium, ratio: ratioFine, order, safetyFactor: 1.25 }) / Math.abs(fine);
  const coarseIndex = indexHalfWidth({ fine: medium, medium: coarse, ratio: ratioCoarse, order, safetyFactor: 1.25 }) / Math.abs(medium);
  return coarseIndex / (ratioFine ** order * fineIndex);
}

function judgeMany(found: LeastSquares, steps: readonly number[], family: Family): GridNumbers {
  const { values, iterationError } = family;
  const sizesOfSteps = steps.map(Math.abs);
  const marked = steps.filter((step) => Math.abs(step) > iterationError);
  const oneWay = marked.every((step) => step > 0) || marked.every((step) => step < 0);
  const largest = Math.max(...sizesOfSteps);
  const grows = oneWay ? found.order <= 0 : (sizesOfSteps[0] as number) >= largest;
  const kind = grows ? 'divergent' : oneWay ? 'monotone' : 'oscillatory';
  const swing = kind === 'oscillatory' ? (Math.max(...values.slice(0, 3)) - Math.min(...values.slice(0, 3))) / 2 : 0;
  const halfWidth = Math.max(found.halfWidth, kind === 'divergent' ? 3 * largest : swing, iterationError);
  const scatter = found.fit.deviation / found.range;
  if (kind === 'divergent') return { kind, halfWidth, safetyFactor: 3, atLeast: 0, held: 'none-seen', scatter };
  const seen = found.order > 0 && found.order < searchedOrders[1] - 0.01;
  const triplets = values.slice(2).map((_, i) => tripletAt(family, i)).filter((one) => ['monotone', 'oscillatory'].includes(tripletKind(one, iterationError)));
  return {
    kind,
    ...(seen ? { order: found.order } : {}),
    extrapolated: found.fit.atZero,
    halfWidth,
    safetyFactor: found.safetyFactor,
    atLeast: halfWidth * kindly(found.safetyFactor),
    held: !seen ? 'none-seen' : found.order >= 2.1 ? 'down' : found.order < lowestBelieved ? 'up' : 'no',
    scatter,
    ...(triplets.length > 0 ? { tripletOrders: triplets.map(apparentOrder) } : {}),
  };
}
