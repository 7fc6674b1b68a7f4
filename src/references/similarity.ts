import { at, brent, integrate, march } from './kernels/index.ts';

/** Shear at the wall of the layer on a plate, f''(0) of f''' + f f''/2 = 0 (Boyd, Exp. Math. 8 (1999) 381-394). */
export const blasiusShear = 0.332057336215196;
/** Displacement and momentum thickness over x Re_x^(-1/2), from the same solution. */
export const blasiusDisplacement = 1.7207876575205;
export const blasiusMomentum = 2 * blasiusShear;
/** Where u reaches 99 % of the stream, over x Re_x^(-1/2). */
export const blasiusEdge = 4.909989513295;

interface Place { readonly eta: number; readonly f: number; readonly speed: number; readonly shear: number }

/**
 * Marches the layer on a plate from the wall with the classical Runge-Kutta method, together with the integral of [f''/f''(0)]^Pr.
 * Written in plain numbers: a plan evaluates it cold.
 */
function walk(end: number, steps: number, prandtl: number, note: (eta: number, f: number, speed: number, shear: number) => void): number {
  const h = end / steps;
  const weight = (shear: number): number => (Math.max(shear, 0) / blasiusShear) ** prandtl;
  let f = 0, p = 0, s = blasiusShear, integral = 0;
  note(0, f, p, s);
  for (let i = 1; i <= steps; i++) {
    const s1 = (-f * s) / 2;
    const f2 = f + (h / 2) * p, p2 = p + (h / 2) * s, sh2 = s + (h / 2) * s1, s2 = (-f2 * sh2) / 2;
    const f3 = f + (h / 2) * p2, p3 = p + (h / 2) * sh2, sh3 = s + (h / 2) * s2, s3 = (-f3 * sh3) / 2;
    const f4 = f + h * p3, p4 = p + h * sh3, sh4 = s + h * s3, s4 = (-f4 * sh4) / 2;
    integral += (h / 6) * (weight(s) + 2 * weight(sh2) + 2 * weight(sh3) + weight(sh4));
    f += (h / 6) * (p + 2 * p2 + 2 * p3 + p4);
    p += (h / 6) * (s + 2 * sh2 + 2 * sh3 + sh4);
    s += (h / 6) * (s1 + 2 * s2 + 2 * s3 + s4);
    note(i * h, f, p, s);
  }
  return integral;
}

/** Rows eta, f, f', f'' of the layer on a plate, eta 0 .. 10 in steps of 0.01. */
export function blasiusLayer(): Place[] {
  const rows: Place[] = [];
  walk(10, 1000, 1, (eta, f, speed, shear) => rows.push({ eta, f, speed, shear }));
  return rows;
}

/**
 * Heat transfer of the laminar layer on a plate at one temperature: 1 over the integral of [f''/f''(0)]^Pr.
 *
 * @param prandtl  Prandtl number, > 0
 * @returns        Nu_x/Re_x^(1/2)
 * @source         Pohlhausen 1921; f of Blasius integrated together with the integral, whose tail is a Gauss integral
 */
export function plateHeat(prandtl: number): number {
  // Beyond eta = 10 the stream function is eta minus the displacement, to ten digits.
  const end = 10, layer = Math.min(end, 16 / prandtl ** (1 / 3));
  let last = 0;
  const inner = walk(layer, 700, prandtl, (_eta, _f, _speed, shear) => (last = shear));
  return 1 / (inner + (layer < end ? 0 : gaussTail(prandtl, end, (last / blasiusShear) ** prandtl)));
}

function gaussTail(prandtl: number, end: number, value: number): number {
  // Integral from the end of value exp(-Pr [(s - c)^2 - (end - c)^2]/4), c the displacement.
  const a = Math.sqrt(prandtl) / 2, z = a * (end - blasiusDisplacement);
  return (value / a) * integrate((t) => Math.exp(-t * (2 * z + t)), 0, 8 / Math.max(1, z) + 4, 20);
}

/**
 * Wall shear of the wedge flows f''' + f f'' + beta (1 - f'^2) = 0, f(0) = f'(0) = 0, f'(infinity) = 1, attached branch.
 *
 * @param beta  wedge parameter, -0.198 .. 2
 * @returns     f''(0)
 * @source      Falkner and Skan 1931, Hartree 1937
 */
export function wedgeShear(beta: number): number {
  const end = beta < -0.15 ? 10 : 8;
  const miss = (shear: number): number => {
    const states = march((_, y) => [at(y, 1), at(y, 2), -at(y, 0) * at(y, 2) - beta * (1 - at(y, 1) ** 2)], [0, 0, shear], 0, end, 800);
    const last = states.find((y) => !(at(y, 1) > -0.2 && at(y, 1) < 1.2)) ?? at(states, states.length - 1);
    return at(last, 1) - 1;
  };
  const near = Math.sqrt(Math.max(0, 0.2205 + 1.3 * beta));
  return beta < -0.1 ? brent(miss, 0, 0.33, 1e-12) : brent(miss, 0.9 * near, 1.1 * near, 1e-12);
}
