import type { Residual } from './helmholtz-rare-terms.ts';

/**
 * Saturation pressure from equal pressure and equal Gibbs energy of both phases.
 *
 * @param given  reducing temperature [K] and density [kg/m^3], gas constant [J/(kg K)], start values along the line, derivatives of the residual part, end of the line [K]
 * @returns      saturation pressure [Pa] as a function of the temperature [K]; the start value where the iteration has no two phases (within a few mK of the critical point)
 * @source       Akasaka, J. Therm. Sci. Technol. 3 (2008) 442
 */
export function saturationByMaxwell(given: {
  temperature: number;
  density: number;
  gasConstant: number;
  to: number;
  liquid: (T: number) => number;
  vapour: (T: number) => number;
  pressure: (T: number) => number;
  first: (tau: number, delta: number) => Residual;
}): (T: number) => number {
  let keptT = Number.NaN;
  let keptP = Number.NaN;
  return (T) => {
    if (T === keptT) return keptP;
    keptT = T;
    keptP = solve(given, T);
    return keptP;
  };
}

function solve(given: Parameters<typeof saturationByMaxwell>[0], T: number): number {
  if (T >= given.to) return given.pressure(T);
  const tau = given.temperature / T;
  let x = given.liquid(T) / given.density;
  let y = given.vapour(T) / given.density;
  for (let i = 0; i < 30; i++) {
    const l = { ...given.first(tau, x) };
    const v = given.first(tau, y);
    const jl = x * (1 + x * l.d);
    const jv = y * (1 + y * v.d);
    const kl = x * l.d + l.a + Math.log(x);
    const kv = y * v.d + v.a + Math.log(y);
    if (Math.abs(jl - jv) < 1e-13 * jv && Math.abs(kl - kv) < 1e-13) return pressureOf(given, T, y, v);
    const jld = 1 + 2 * x * l.d + x * x * l.dd;
    const jvd = 1 + 2 * y * v.d + y * y * v.dd;
    const kld = 2 * l.d + x * l.dd + 1 / x;
    const kvd = 2 * v.d + y * v.dd + 1 / y;
    const determinant = jvd * kld - jld * kvd;
    const dx = ((kv - kl) * jvd - (jv - jl) * kvd) / determinant;
    const dy = ((kv - kl) * jld - (jv - jl) * kld) / determinant;
    if (!Number.isFinite(dx) || !Number.isFinite(dy) || x + dx <= y + dy) return given.pressure(T);
    x += dx;
    y = Math.max(y + dy, 0.1 * y);
    if (Math.abs(dx) < 1e-13 * x && Math.abs(dy) < 1e-13 * y) break;
  }
  return pressureOf(given, T, y, given.first(tau, y));
}

const pressureOf = (given: Parameters<typeof saturationByMaxwell>[0], T: number, y: number, v: Residual): number => y * given.density * given.gasConstant * T * (1 + y * v.d);
