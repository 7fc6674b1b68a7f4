import { besselJ, brent } from './kernels/index.ts';

export type Shape = 'slab' | 'cylinder' | 'sphere';

/** The condition at the surface, -f'(lambda) lambda = Bi f(lambda), free of poles. */
function condition(shape: Shape, biot: number): (x: number) => number {
  if (shape === 'slab') return (x) => x * Math.sin(x) - biot * Math.cos(x);
  if (shape === 'cylinder') return (x) => x * besselJ(1, x) - biot * besselJ(0, x);
  return (x) => (1 - biot) * Math.sin(x) - x * Math.cos(x);
}

/** Root n = 0, 1, ... of the condition. */
function root(shape: Shape, biot: number, n: number): number {
  const f = condition(shape, biot);
  if (shape === 'slab') return brent(f, n * Math.PI, (n + 0.5) * Math.PI);
  if (shape === 'sphere') return brent(f, n === 0 ? 1e-9 : (n + 0.5) * Math.PI - Math.PI / 2, (n + 1) * Math.PI);
  // The roots lie between a zero of J1 (adiabatic) and the next zero of J0 (fixed temperature).
  return brent(f, n === 0 ? 0 : besselZero(1, n), besselZero(0, n + 1));
}

/** Zero number n = 1, 2, ... of J0 or J1. */
function besselZero(order: 0 | 1, n: number): number {
  const near = (n + (order === 0 ? -0.25 : 0.25)) * Math.PI;
  return brent((x) => besselJ(order, x), near - 0.5, near + 0.5);
}

function coefficient(shape: Shape, x: number): number {
  if (shape === 'slab') return (4 * Math.sin(x)) / (2 * x + Math.sin(2 * x));
  if (shape === 'cylinder') return ((2 / x) * besselJ(1, x)) / (besselJ(0, x) ** 2 + besselJ(1, x) ** 2);
  return (4 * (Math.sin(x) - x * Math.cos(x))) / (2 * x - Math.sin(2 * x));
}

function mode(shape: Shape, x: number): number {
  if (shape === 'slab') return Math.cos(x);
  if (shape === 'cylinder') return besselJ(0, x);
  return x === 0 ? 1 : Math.sin(x) / x;
}

function average(shape: Shape, x: number): number {
  if (shape === 'slab') return Math.sin(x) / x;
  if (shape === 'cylinder') return (2 * besselJ(1, x)) / x;
  return (3 * (Math.sin(x) - x * Math.cos(x))) / x ** 3;
}

/**
 * First eigenvalue and coefficient of a body cooled or heated through its surface.
 *
 * @param shape  slab (half thickness), cylinder or sphere (radius)
 * @param biot   h L/k, > 0
 * @returns      lambda_1 and C_1
 * @source       Carslaw and Jaeger, Conduction of Heat in Solids, 2nd ed. (1959)
 */
export function firstMode(shape: Shape, biot: number): { lambda: number; coefficient: number } {
  const lambda = root(shape, biot, 0);
  return { lambda, coefficient: coefficient(shape, lambda) };
}

/**
 * Temperature left in a body cooled or heated through its surface, over the start difference.
 *
 * @param shape    slab (half thickness), cylinder or sphere (radius)
 * @param biot     h L/k, > 0
 * @param fourier  alpha t/L^2, >= 1e-4
 * @param place    0 in the middle, 1 at the surface, or the mean
 * @returns        (T - T_fluid)/(T_start - T_fluid)
 * @source         Carslaw and Jaeger, Conduction of Heat in Solids, 2nd ed. (1959)
 */
export function bodyTemperature(shape: Shape, biot: number, fourier: number, place: number | 'mean'): number {
  return modesOf(shape, biot, fourier).reduce((sum, { root, weight }) => sum + weight * (place === 'mean' ? average(shape, root) : mode(shape, root * place)), 0);
}

interface Mode { readonly root: number; readonly weight: number }
let kept: { readonly key: string; readonly modes: readonly Mode[] } | undefined;

/** Roots with coefficients that still count at that time; the last set is kept, since a profile asks for it at every place. */
function modesOf(shape: Shape, biot: number, fourier: number): readonly Mode[] {
  const key = `${shape} ${biot} ${fourier}`;
  if (kept?.key === key) return kept.modes;
  const modes: Mode[] = [];
  for (let n = 0; n < 400; n++) {
    const x = root(shape, biot, n), decay = x * x * fourier;
    modes.push({ root: x, weight: coefficient(shape, x) * Math.exp(-decay) });
    if (decay > 38) break;
  }
  kept = { key, modes };
  return modes;
}
