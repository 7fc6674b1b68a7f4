import { between, type Table } from './table.ts';

// Plates and cylinders in still fluid, properties at the film temperature.

/**
 * Upright plate in still fluid at any Rayleigh number, Nu = (0.825 + 0.387 Ra^(1/6)/(1 + (b/Pr)^(9/16))^(8/27))^2, b = 0.492, at a uniform flux 0.437.
 *
 * @param rayleigh  on the height; at a uniform flux with the temperature difference at half the height
 * @param prandtl   at the film temperature
 * @param wall      kind of wall condition
 * @returns         mean Nusselt number on the height
 * @example         churchillChuPlate({ rayleigh: 1e10, prandtl: 0.71, wall: 'temperature' }) // 252.278
 * @range           rayleigh 0.1 to 1e12
 * @scatter         15 %
 * @source          Churchill and Chu, Int. J. Heat Mass Transfer 18 (1975) 1323
 */
export function churchillChuPlate({ rayleigh, prandtl, wall }: { rayleigh: number; prandtl: number; wall: 'temperature' | 'flux' }): number {
  const b = wall === 'temperature' ? 0.492 : 0.437;
  return (0.825 + (0.387 * rayleigh ** (1 / 6)) / (1 + (b / prandtl) ** (9 / 16)) ** (8 / 27)) ** 2;
}

/**
 * Laminar layer on an upright plate, Nu = 0.68 + 0.670 Ra^(1/4)/(1 + (b/Pr)^(9/16))^(4/9), b = 0.492, at a uniform flux 0.437.
 *
 * @param rayleigh  on the height; at a uniform flux with the temperature difference at half the height
 * @param prandtl   at the film temperature
 * @param wall      kind of wall condition
 * @returns         mean Nusselt number on the height
 * @example         churchillChuLaminar({ rayleigh: 1e6, prandtl: 0.71, wall: 'temperature' }) // 16.9419
 * @range           rayleigh up to 1e9; prandtl above 0.01
 * @scatter         10 %
 * @source          Churchill and Chu, Int. J. Heat Mass Transfer 18 (1975) 1323
 */
export function churchillChuLaminar({ rayleigh, prandtl, wall }: { rayleigh: number; prandtl: number; wall: 'temperature' | 'flux' }): number {
  const b = wall === 'temperature' ? 0.492 : 0.437;
  return 0.68 + (0.67 * rayleigh ** 0.25) / (1 + (b / prandtl) ** (9 / 16)) ** (4 / 9);
}

/**
 * Level cylinder in still fluid, Nu = (0.60 + 0.387 Ra^(1/6)/(1 + (0.559/Pr)^(9/16))^(8/27))^2.
 *
 * @param rayleigh  on the diameter
 * @param prandtl   at the film temperature
 * @returns         mean Nusselt number on the diameter
 * @example         churchillChuCylinder({ rayleigh: 1e6, prandtl: 6 }) // 17.7341
 * @range           rayleigh 1e-5 to 1e12
 * @scatter         15 %
 * @source          Churchill and Chu, Int. J. Heat Mass Transfer 18 (1975) 1049
 */
export function churchillChuCylinder({ rayleigh, prandtl }: { rayleigh: number; prandtl: number }): number {
  return (0.6 + (0.387 * rayleigh ** (1 / 6)) / (1 + (0.559 / prandtl) ** (9 / 16)) ** (8 / 27)) ** 2;
}

/**
 * Level cylinder in still fluid by power laws, Nu = C Ra^n, (C, n) = (0.675, 0.058), (1.02, 0.148), (0.850, 0.188), (0.480, 0.250), (0.125, 0.333).
 *
 * @param rayleigh  on the diameter
 * @returns         mean Nusselt number on the diameter
 * @example         morgan({ rayleigh: 1e5 }) // 8.53574
 * @range           rayleigh 1e-10 to 1e12; air and water, no Prandtl number in it: far too high for liquid metals
 * @scatter         25 %
 * @source          Morgan, Adv. Heat Transfer 11 (1975) 199
 */
export function morgan({ rayleigh }: { rayleigh: number }): number {
  const [c, n] = rayleigh < 1e-2 ? [0.675, 0.058] : rayleigh < 1e2 ? [1.02, 0.148] : rayleigh < 1e4 ? [0.85, 0.188] : rayleigh < 1e7 ? [0.48, 0.25] : [0.125, 0.333];
  return c * rayleigh ** n;
}

/**
 * Level plate with the hot side up or the cold side down, length = area over perimeter: 0.96 Ra^(1/6), 0.59 Ra^(1/4) from 200, 0.54 Ra^(1/4) from 1e4, 0.15 Ra^(1/3) from 1e7.
 *
 * @param rayleigh  on area over perimeter
 * @returns         mean Nusselt number on area over perimeter
 * @example         levelPlateUnstable({ rayleigh: 1e6 }) // 17.0763
 * @range           rayleigh 1 to 1e11, held below 1; 6 % jump at 1e7
 * @scatter         25 %
 * @source          Goldstein, Sparrow and Jones, Int. J. Heat Mass Transfer 16 (1973) 1025 (below 1e4); Lloyd and Moran, J. Heat Transfer 96 (1974) 443
 */
export function levelPlateUnstable({ rayleigh }: { rayleigh: number }): number {
  if (rayleigh > 1e7) return 0.15 * rayleigh ** (1 / 3);
  if (rayleigh > 1e4) return 0.54 * rayleigh ** 0.25;
  return rayleigh > 200 ? 0.59 * rayleigh ** 0.25 : 0.96 * Math.max(1, rayleigh) ** (1 / 6);
}

/**
 * Level plate with the hot side down or the cold side up: 0.27 Ra^(1/4), or the newer 0.52 Ra^(1/5).
 *
 * @param rayleigh  on area over perimeter
 * @returns         the two published laws
 * @example         levelPlateStable({ rayleigh: 1e6 }).first // 8.53815
 * @range           first: rayleigh 1e5 to 1e10; second: 1e4 to 1e9, prandtl above 0.7; held below 1
 * @scatter         25 %
 * @source          McAdams, Heat Transmission, 3rd ed. (1954); Radziemska and Lewandowski, Appl. Energy 68 (2001) 347
 */
export function levelPlateStable({ rayleigh }: { rayleigh: number }): { first: number; second: number } {
  const ra = Math.max(1, rayleigh);
  return { first: 0.27 * ra ** 0.25, second: 0.52 * ra ** 0.2 };
}

/** By Pr: -theta'(0), f''(0), f'_max, eta of f'_max, eta at 1 % of the temperature, eta at 1 % of the largest speed. */
const similar: readonly (readonly [number, number, number, number, number, number, number])[] = [
  [0.01, 0.0806, 0.9878, 0.5764, 1.492, 35.1, 33.8],
  [0.03, 0.1346, 0.9384, 0.517, 1.351, 20.5, 20.3],
  [0.1, 0.2302, 0.8592, 0.4336, 1.199, 11.4, 11.8],
  [0.3, 0.3624, 0.7634, 0.3463, 1.064, 6.7, 7.5],
  [0.72, 0.5046, 0.676, 0.2762, 0.962, 4.42, 5.7],
  [1, 0.5671, 0.6422, 0.2513, 0.925, 3.8, 5.4],
  [7, 1.0543, 0.4508, 0.1314, 0.728, 1.78, 6.8],
  [10, 1.1693, 0.4192, 0.115, 0.696, 1.58, 7.3],
  [100, 2.1914, 0.2517, 0.0442, 0.502, 0.81, 12.2],
  [1000, 3.9654, 0.1449, 0.0153, 0.345, 0.44, 20.9],
];
const column = (k: 1 | 2 | 3 | 4 | 5 | 6): Table => similar.map((row) => [Math.log(row[0]), Math.log(row[k])]);
const curves = { heat: column(1), shear: column(2), peak: column(3), peakPlace: column(4), thermal: column(5), velocity: column(6) } as const;

/**
 * Numbers of the laminar similar layer on an upright plate, eta = (y/x)(Gr_x/4)^(1/4), u = 2 sqrt(g beta dT x) f'(eta).
 *
 * @param prandtl  at the film temperature
 * @param which    heat: -theta'(0); shear: f''(0); peak: largest f'; peakPlace: its eta; thermal, velocity: eta where 1 % is left
 * @returns        number of the similar solution, between the rows of the table straight in the logarithms
 * @example        uprightSimilar({ prandtl: 0.72, which: 'shear' }) // 0.676
 * @range          prandtl 0.01 to 1000; the ends are held
 * @scatter        2 %
 * @source         Ostrach, NACA Report 1111 (1953), solved anew
 */
export function uprightSimilar({ prandtl, which }: { prandtl: number; which: keyof typeof curves }): number {
  return Math.exp(between(Math.log(prandtl), curves[which]));
}

/**
 * Wall gradient of temperature of the similar layer, -theta'(0) = (3/4) Pr^(1/2)/(0.609 + 1.221 Pr^(1/2) + 1.238 Pr)^(1/4).
 *
 * @param prandtl  at the film temperature
 * @returns        so that Nu_x = -theta'(0)(Gr_x/4)^(1/4), mean 4/3 of it
 * @example        leFevre({ prandtl: 1 }) // 0.566692
 * @range          prandtl above 0.01, within 0.3 %
 * @source         LeFevre, 9th Int. Congr. Appl. Mech., Brussels 4 (1956) 168
 */
export function leFevre({ prandtl }: { prandtl: number }): number {
  const root = Math.sqrt(prandtl);
  return (0.75 * root) / (0.609 + 1.221 * root + 1.238 * prandtl) ** 0.25;
}

/**
 * Turbulent layer on an upright plate: thickness over height, speed scale times height over viscosity, wall shear times height squared over density and viscosity squared.
 *
 * @param grashof  on the height
 * @param prandtl  at the film temperature
 * @returns        thickness delta/x, speed U_1 x/nu, shear tau_w x^2/(rho nu^2)
 * @example        eckertJackson({ grashof: 1e10, prandtl: 0.72 }).thickness // 0.0696069
 * @range          grashof 1e10 to 1e12
 * @scatter        20 %; its heat transfer is off by up to a third, so only shear and thickness are taken
 * @source         Eckert and Jackson, NACA Report 1015 (1951)
 */
export function eckertJackson({ grashof, prandtl }: { grashof: number; prandtl: number }): { thickness: number; speed: number; shear: number } {
  const p = 1 + 0.494 * prandtl ** (2 / 3);
  const thickness = 0.565 * grashof ** -0.1 * prandtl ** (-8 / 15) * p ** 0.1;
  const speed = 1.185 * Math.sqrt(grashof / p);
  return { thickness, speed, shear: 0.0225 * speed ** 2 * (1 / (speed * thickness)) ** 0.25 };
}

/**
 * Heat transfer of a thin upright cylinder over that of a plate of its height.
 *
 * @param grashof             on the height
 * @param prandtl             at the film temperature
 * @param heightOverDiameter  slenderness
 * @returns                   factor of at least 1
 * @example                   thinUprightCylinder({ grashof: 1e8, prandtl: 0.72, heightOverDiameter: 100 / 35 }) // 1.03
 * @range                     laminar
 * @scatter                   5 %
 * @source                    LeFevre and Ede, 9th Int. Congr. Appl. Mech., Brussels 4 (1956) 175, used as a ratio to its own flat limit
 */
export function thinUprightCylinder({ grashof, prandtl, heightOverDiameter }: { grashof: number; prandtl: number; heightOverDiameter: number }): number {
  const flat = (4 / 3) * ((7 * grashof * prandtl ** 2) / (5 * (20 + 21 * prandtl))) ** 0.25;
  return 1 + (4 * (272 + 315 * prandtl) * heightOverDiameter) / (35 * (64 + 63 * prandtl) * flat);
}
