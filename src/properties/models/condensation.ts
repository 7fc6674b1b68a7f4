import type { Cubic, CubicGas } from './cubic.ts';

/** What of a gas would be liquid. */
export interface Condensate {
  /** Place of the component that the liquid is richest in beside its share in the gas. */
  readonly of: number;
  /** Share of the moles that condenses. */
  readonly share: number;
}

/**
 * Whether a gas holds together as one phase: a drop of liquid is tried, and where it would grow, the two phases are split.
 *
 * @param equation  the cubic equation of the mixture
 * @param gases     its components
 * @param z         mole fractions
 * @param T         [K]
 * @param p         [Pa]
 * @returns         what condenses; undefined where the gas stays a gas
 * @source          Michelsen, Fluid Phase Equilib. 9 (1982) 1 (tangent plane, successive substitution); start after Wilson 1969; split after Rachford and Rice, Trans. AIME 195 (1952) 327
 */
export function condensate(equation: Cubic, gases: readonly CubicGas[], z: readonly number[], T: number, p: number): Condensate | undefined {
  // Above the highest critical temperature of its parts no gas condenses.
  if (!gases.some((gas, i) => (z[i] as number) > 0 && T < gas.temperature)) return undefined;
  const feed = equation.fugacities(T, p, z, 'gas');
  let K = gases.map((gas) => (gas.pressure / p) * Math.exp(5.373 * (1 + gas.acentric) * (1 - gas.temperature / T)));
  let sum = 0;
  let trial: number[] = [];
  for (let i = 0; i < 60; i++) {
    const amounts = z.map((zi, j) => zi / (K[j] as number));
    sum = amounts.reduce((all, one) => all + one, 0);
    trial = amounts.map((one) => one / sum);
    const drop = equation.fugacities(T, p, trial, 'dense');
    const next = drop.map((phi, j) => Math.exp(phi - (feed[j] as number)));
    const moved = next.reduce((most, one, j) => Math.max(most, Math.abs(one / (K[j] as number) - 1)), 0);
    K = next;
    if (moved < 1e-8) break;
  }
  const apart = trial.some((one, j) => Math.abs(one - (z[j] as number)) > 1e-3);
  if (z.length > 1 ? !(sum > 1 + 1e-6 && apart) : !(sum > 1 + 1e-6)) return undefined;
  const richest = K.reduce((best, one, j) => ((z[j] as number) > 0 && one < (K[best] as number) ? j : best), 0);
  if (z.length === 1) return { of: 0, share: 1 };
  let share = 0;
  for (let i = 0; i < 30; i++) {
    share = split(K, z);
    const liquid = z.map((zi, j) => zi / (share + (1 - share) * (K[j] as number)));
    const vapour = liquid.map((x, j) => x * (K[j] as number));
    const unit = (list: number[]): number[] => { const all = list.reduce((a, b) => a + b, 0); return list.map((one) => one / all); };
    const [l, v] = [equation.fugacities(T, p, unit(liquid), 'dense'), equation.fugacities(T, p, unit(vapour), 'gas')];
    K = l.map((phi, j) => Math.exp(phi - (v[j] as number)));
  }
  return { of: richest, share };
}

/** Share of the liquid where K = y/x: the root of the balance of moles, by halving; 0 or 1 where one phase takes all. */
function split(K: readonly number[], z: readonly number[]): number {
  const off = (share: number): number => z.reduce((sum, zi, j) => sum + (zi * ((K[j] as number) - 1)) / (share + (1 - share) * (K[j] as number)), 0);
  let [low, high] = [0, 1];
  if (off(0) < 0 === off(1) < 0) return off(0) > 0 ? 0 : 1;
  for (let i = 0; i < 50; i++) {
    const middle = 0.5 * (low + high);
    if (off(middle) < 0 === off(0) < 0) low = middle;
    else high = middle;
  }
  return 0.5 * (low + high);
}
