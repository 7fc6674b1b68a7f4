import { pchip } from '../../references/index.ts';

// Buoyancy in an imposed flow: what it makes of heat transfer and wall shear.

/** Gr_q/Re on the diameter, Nusselt number and wall shear over those without buoyancy. */
const upright: readonly (readonly [number, number, number])[] = [
  [-400, 0.73965, 0.05127], [-350, 0.7739, 0.19249], [-300, 0.80773, 0.32598], [-250, 0.84109, 0.45248], [-200, 0.87395, 0.57261], [-150, 0.90629, 0.68696], [-100, 0.93809, 0.79602],
  [-50, 0.96933, 0.90024], [-20, 0.9878, 0.96061], [0, 1, 1], [20, 1.01211, 1.03874], [50, 1.03009, 1.09566], [100, 1.0596, 1.18754], [200, 1.11686, 1.36104], [300, 1.17178, 1.52245],
  [400, 1.22441, 1.67336], [550, 1.29919, 1.88287], [700, 1.36921, 2.07526], [850, 1.43476, 2.2533], [1000, 1.49618, 2.41919],
];
const column = (k: 1 | 2): ((x: number) => number) => pchip(upright.map((row) => row[0]), upright.map((row) => row[k]));
const [nusseltOf, shearOf] = [column(1), column(2)];

/**
 * Developed laminar flow in an upright tube with uniform flux: table of the linear balance of momentum and heat, between its rows by a monotone cubic.
 *
 * @param ratio  Gr_q/Re on the diameter, positive where buoyancy helps the flow
 * @returns      `nusselt` and `shear`, each over that without buoyancy
 * @example      uprightLaminar({ ratio: 100 }).nusselt // 1.0596
 * @range        -400 to 1000; the ends are held. The flow turns at the wall at -417.5
 * @source       linear balance of momentum and heat; Hallman, Trans. ASME 78 (1956) 1831; rows by a spectral solution of that balance
 */
export function uprightLaminar({ ratio }: { ratio: number }): { nusselt: number; shear: number } {
  return { nusselt: nusseltOf(ratio), shear: shearOf(ratio) };
}

/** Buoyancy up to which the root near one is the state of the flow. */
const single = 2e-6;
const power = 1 / 0.46;
/** Largest buoyancy at which an aiding flow has that root: there it meets another, F^(1/0.46) = 2/(2 + 1/0.46). */
const fold = ((2 / (power + 2)) ** (2 / power) * power) / ((power + 2) * 8e4);

/**
 * Turbulent flow in an upright tube: heat transfer by F = |1 - 8e4 Bo F^-2|^0.46, Bo positive where buoyancy helps the flow.
 * Between 2e-6 and the fold two states answer; the value is then the mean of their logarithms.
 *
 * @param buoyancy  Bo* = Gr_q/(Re^3.425 Pr^0.8), signed
 * @returns         `value`, with `low` and `high` of the states that can stand
 * @example         jacksonFactor({ buoyancy: -3e-6 }).value // 1.089
 * @range           -1e-4 to 1e-4, Prandtl number above 0.7
 * @scatter         25 % beyond the fold (common practice)
 * @source          Jackson, Cotton and Axcell, Int. J. Heat Fluid Flow 10 (1989) 2
 */
export function jacksonFactor({ buoyancy }: { buoyancy: number }): { value: number; low: number; high: number } {
  const a = 8e4 * buoyancy;
  if (a <= 0) return alike(bisect((f) => f ** power - 1 + a / f ** 2, 1, 1 + Math.abs(a) + Math.sqrt(Math.abs(a))));
  // Laminarized state: F^2 below a.
  const turned = (): number => bisect((f) => f ** power + 1 - a / f ** 2, Math.sqrt(a) * 1e-3, Math.sqrt(a));
  if (buoyancy >= fold) return alike(turned());
  const least = ((2 * a) / power) ** (1 / (power + 2));
  const near = bisect((f) => f ** power - 1 + a / f ** 2, least, 1);
  if (buoyancy < single) return alike(near);
  const low = turned();
  return { value: Math.sqrt(low * near), low, high: near };
}

const alike = (f: number): { value: number; low: number; high: number } => ({ value: f, low: f, high: f });

/** Root of a rising function between two ends. */
function bisect(f: (x: number) => number, from: number, to: number): number {
  let [low, high] = [from, to];
  for (let k = 0; k < 200 && high - low > 1e-15 * high; k++) {
    const middle = (low + high) / 2;
    if (f(middle) < 0) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}

/**
 * Forced and natural convection round a body: Nu^n = |Nu_F^n + Nu_N^n|, minus where they oppose.
 *
 * @param ratio     natural over forced Nusselt number
 * @param exponent  n: 3 upright plate, 3.5 level plate, 4 cylinder and sphere
 * @param sense     1 where buoyancy helps or acts across, -1 where it opposes
 * @returns         Nusselt number over that of the forced flow alone
 * @example         mixedSum({ ratio: 0.5, exponent: 3, sense: 1 }) // 1.04004
 * @scatter         10 % of the whole; opposing flow near equal parts is not covered
 * @source          Churchill, AIChE J. 23 (1977) 10
 */
export function mixedSum({ ratio, exponent, sense }: { ratio: number; exponent: number; sense: number }): number {
  return Math.abs(1 + sense * ratio ** exponent) ** (1 / exponent);
}
