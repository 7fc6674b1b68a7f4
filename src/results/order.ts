/** Three values of one target, finest mesh first, with the ratios of the mesh sizes. */
export interface Triplet {
  readonly fine: number;
  readonly medium: number;
  readonly coarse: number;
  /** Medium over fine size, > 1. */
  readonly ratioFine: number;
  /** Coarse over medium size, > 1. */
  readonly ratioCoarse: number;
}

export type TripletKind = 'converged' | 'monotone' | 'oscillatory' | 'divergent';

const largestOrder = 20;
const leastOrder = 1e-3;

/**
 * What three meshes show, sorted before any order is formed: the equation for the order has an answer for diverging data too.
 *
 * Equal values on the two finest meshes count as converged; equal values on the two coarsest with a change on the finest count
 * as divergent, since the change appears where it should have faded.
 *
 * @param triplet         values and ratios
 * @param iterationError  what a difference must exceed to be more than noise [unit of the values], >= 0
 * @returns               the kind of convergence
 * @source                limits: the equation of Celik et al. 2008 for an order of zero, ln r32 / ln r21 for a steady approach, -1 for an oscillation
 */
export function tripletKind(triplet: Triplet, iterationError: number): TripletKind {
  const fine = triplet.medium - triplet.fine;
  const coarse = triplet.coarse - triplet.medium;
  if (Math.abs(fine) <= iterationError) return 'converged';
  if (Math.abs(coarse) <= iterationError) return 'divergent';
  const growth = coarse / fine;
  if (growth < 0) return growth <= -1 ? 'oscillatory' : 'divergent';
  const limit = Math.log(triplet.ratioCoarse) / Math.log(triplet.ratioFine);
  if (growth <= limit * (1 + 1e-9)) return 'divergent';
  return growth > growthAt(largestOrder, triplet, 1) ? 'converged' : 'monotone';
}

/** Ratio of the coarse to the fine difference that an error h^p gives, for a steady (1) or an oscillating (-1) approach. */
function growthAt(p: number, { ratioFine, ratioCoarse }: Triplet, sign: 1 | -1): number {
  return (ratioFine ** p * (ratioCoarse ** p - sign)) / (ratioFine ** p - sign);
}

/**
 * Apparent order of three meshes: the p of p ln r21 = |ln|e32/e21| + q(p)|, q = ln[(r21^p - s)/(r32^p - s)], s = sgn(e32/e21).
 *
 * For sorted data (see tripletKind) the equation has one root, found by halving; a fixed point reaches the same root slower.
 *
 * @param triplet  values and ratios, of kind monotone or oscillatory
 * @returns        order [1], 0 .. 20
 * @example        apparentOrder({ fine: 6.063, medium: 5.972, coarse: 5.863, ratioFine: 1.5, ratioCoarse: 4 / 3 }) // 1.534
 * @source         Celik, Ghia, Roache, Freitas, Coleman and Raad, J. Fluids Eng. 130 (2008) 078001, eq. (3)
 */
export function apparentOrder(triplet: Triplet): number {
  const growth = (triplet.coarse - triplet.medium) / (triplet.medium - triplet.fine);
  const sign = growth < 0 ? -1 : 1;
  let low = leastOrder;
  let high = largestOrder;
  if (growthAt(low, triplet, sign) >= Math.abs(growth)) return 0;
  if (growthAt(high, triplet, sign) <= Math.abs(growth)) return largestOrder;
  for (let i = 0; i < 80; i++) {
    const middle = (low + high) / 2;
    if (growthAt(middle, triplet, sign) < Math.abs(growth)) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}

/**
 * Value for a mesh of size zero (Richardson), phi = (r^p f1 - f2)/(r^p - 1).
 *
 * @param fine    value on the finer mesh
 * @param medium  value on the coarser mesh
 * @param ratio   coarser over finer size [1], > 1
 * @param order   order [1], > 0
 * @returns       extrapolated value, unit of the values
 * @example       extrapolate({ fine: 6.063, medium: 5.972, ratio: 1.5, order: 1.5342 }) // 6.1685
 * @source        Celik et al. 2008, eq. (4)
 */
export function extrapolate({ fine, medium, ratio, order }: { fine: number; medium: number; ratio: number; order: number }): number {
  return fine + (fine - medium) / (ratio ** order - 1);
}

/**
 * Half-width of the grid convergence index on the finer of two meshes, Fs |f1 - f2| / (r^p - 1), in the unit of the values.
 *
 * @param fine          value on the finer mesh
 * @param medium        value on the coarser mesh
 * @param ratio         coarser over finer size [1], > 1
 * @param order         order [1], > 0
 * @param safetyFactor  1.25 with three meshes and a believable order, else 3
 * @returns             half-width of the band, unit of the values
 * @example             indexHalfWidth({ fine: 6.063, medium: 5.972, ratio: 1.5, order: 1.5342, safetyFactor: 1.25 }) // 0.1318
 * @source              Roache, Annu. Rev. Fluid Mech. 29 (1997), 123-160; Celik et al. 2008, eq. (6) times the fine value
 */
export function indexHalfWidth({ fine, medium, ratio, order, safetyFactor }: { fine: number; medium: number; ratio: number; order: number; safetyFactor: number }): number {
  return (safetyFactor * Math.abs(fine - medium)) / (ratio ** order - 1);
}
