/**
 * Error function.
 *
 * @param x  argument
 * @returns  erf(x), to 1e-15
 * @source   power series below 2.5, continued fraction above (Abramowitz and Stegun 7.1.6 and 7.1.14)
 */
export function erf(x: number): number {
  if (x < 0) return -erf(-x);
  return x < 2.5 ? series(x) : 1 - erfc(x);
}

/**
 * Complement of the error function, 1 - erf(x), with full relative accuracy for large arguments.
 *
 * @param x  argument
 * @returns  erfc(x)
 */
export function erfc(x: number): number {
  return x < 2.5 ? 1 - erf(x) : Math.exp(-x * x) * erfcScaled(x);
}

/**
 * Scaled complement exp(x^2) erfc(x), which does not overflow.
 *
 * @param x  argument, not far below zero
 * @returns  exp(x^2) erfc(x)
 */
export function erfcScaled(x: number): number {
  if (x < 2.5) return Math.exp(x * x) * erfc(x);
  let tail = x;
  for (let k = 100; k >= 1; k--) tail = x + k / 2 / tail;
  return 1 / (Math.sqrt(Math.PI) * tail);
}

function series(x: number): number {
  let term = x, sum = x;
  for (let n = 1; Math.abs(term) > 1e-18 * sum && n < 200; n++) {
    term *= (2 * x * x) / (2 * n + 1);
    sum += term;
  }
  return (2 / Math.sqrt(Math.PI)) * Math.exp(-x * x) * sum;
}

/**
 * Bessel function of the first kind and whole order, by the midpoint rule on its integral.
 *
 * @param order  0, 1, 2, ...
 * @param x      argument, up to a few hundred
 * @returns      J_n(x), absolute error about 1e-15
 * @source       Bessel's integral, Abramowitz and Stegun 9.1.21; the midpoint rule converges faster than any power
 */
export function besselJ(order: number, x: number): number {
  const points = 40 + Math.ceil(Math.abs(x)) + order;
  let sum = 0;
  for (let i = 0; i < points; i++) {
    const t = (Math.PI * (i + 0.5)) / points;
    sum += Math.cos(order * t - x * Math.sin(t));
  }
  return sum / points;
}
