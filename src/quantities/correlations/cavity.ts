import { between, type Table } from './table.ts';

// Closed box or slot heated from the side. All numbers on the distance W of hot and cold wall; aspect = height over W. Never below 1: conduction.

/**
 * Boxes up to ten times as high as wide: 0.18 (Pr Ra/(0.2 + Pr))^0.29, from aspect 2 on 0.22 (Pr Ra/(0.2 + Pr))^0.28 aspect^(-1/4).
 *
 * @param rayleigh  on W
 * @param prandtl   at the mean temperature
 * @param aspect    height over W
 * @returns         mean Nusselt number, at least 1
 * @example         berkovskyPolevikov({ rayleigh: 1e6, prandtl: 0.71, aspect: 1 }) // 9.2048
 * @range           aspect 1 to 10, prandtl 1e-3 to 1e5, rayleigh up to 1e10
 * @scatter         12 %; on the square of air 4 to 11 % high up to rayleigh 1e6, 16 % at 1e8
 * @source          Berkovsky and Polevikov, in Heat Transfer and Turbulent Buoyant Convection (1977), vol. 2, 443; as in Catton, 6th Int. Heat Transfer Conf. (1978)
 */
export function berkovskyPolevikov({ rayleigh, prandtl, aspect }: { rayleigh: number; prandtl: number; aspect: number }): number {
  const x = (prandtl * rayleigh) / (0.2 + prandtl);
  return Math.max(1, aspect < 2 ? 0.18 * x ** 0.29 : 0.22 * x ** 0.28 * aspect ** -0.25);
}

// ln Ra, ln Nu of the square of air, Pr 0.71, by decades of Ra from 1e3 to 1e8.
const squareRows: Table = [1.118, 2.243, 4.519, 8.825, 16.523, 30.225].map((nusselt, k) => [(k + 3) * Math.LN10, Math.log(nusselt)] as const);

/**
 * Square box of air: the benchmark numbers, straight between decades in logarithms.
 *
 * @param rayleigh  on W
 * @returns         mean Nusselt number
 * @example         squareOfAir({ rayleigh: 1e6 }) // 8.825
 * @range           rayleigh 1e3 to 1e8, prandtl 0.71 (0.6 to 0.8), aspect 1, level walls adiabatic
 * @scatter         3 %: benchmark below 1 %, the straight line between decades 0.5 %, prandtl 0.6 to 0.8 another 1 %
 * @source          de Vahl Davis, Int. J. Numer. Methods Fluids 3 (1983) 249 to 1e5; Le Quere, Comput. Fluids 20 (1991) 29 from 1e6
 */
export function squareOfAir({ rayleigh }: { rayleigh: number }): number {
  return Math.exp(between(Math.log(rayleigh), squareRows));
}

/**
 * Tall slots of liquid: layer 0.42 Ra^(1/4) Pr^0.012 aspect^(-0.3), turbulent 0.046 Ra^(1/3).
 *
 * @param rayleigh  on W
 * @param prandtl   at the mean temperature
 * @param aspect    height over W
 * @returns         the two laws, each at least 1
 * @example         macgregorEmery({ rayleigh: 1e6, prandtl: 7, aspect: 20 }).layer // 5.53454
 * @range           layer: aspect 10 to 40, prandtl 1 to 2e4, rayleigh 1e4 to 1e7; turbulent: aspect 1 to 40, prandtl 1 to 20, rayleigh 1e6 to 1e9
 * @scatter         15 %
 * @source          MacGregor and Emery, J. Heat Transfer 91 (1969) 391
 */
export function macgregorEmery({ rayleigh, prandtl, aspect }: { rayleigh: number; prandtl: number; aspect: number }): { layer: number; turbulent: number } {
  return { layer: Math.max(1, 0.42 * rayleigh ** 0.25 * prandtl ** 0.012 * aspect ** -0.3), turbulent: Math.max(1, 0.046 * rayleigh ** (1 / 3)) };
}

/**
 * Tall slots of air: the largest of 0.0605 Ra^(1/3), (1 + (0.104 Ra^0.293/(1 + (6310/Ra)^1.36))^3)^(1/3) and 0.242 (Ra/aspect)^0.272.
 *
 * @param rayleigh  on W
 * @param aspect    height over W
 * @returns         mean Nusselt number, at least 1
 * @example         elSherbiny({ rayleigh: 1e5, aspect: 40 }) // 3.00238
 * @range           aspect 5 to 110, rayleigh 1e2 to 2e7, air; the upper end of the data falls with the aspect, 2e5 at 40
 * @scatter         10 %
 * @source          ElSherbiny, Raithby and Hollands, J. Heat Transfer 104 (1982) 96
 */
export function elSherbiny({ rayleigh, aspect }: { rayleigh: number; aspect: number }): number {
  const slot = (1 + ((0.104 * rayleigh ** 0.293) / (1 + (6310 / rayleigh) ** 1.36)) ** 3) ** (1 / 3);
  return Math.max(1, 0.0605 * rayleigh ** (1 / 3), slot, 0.242 * (rayleigh / aspect) ** 0.272);
}

/**
 * Shallow boxes, Nu = 1 + (H/W)^2 Ra_H^2/362880.
 *
 * @param rayleighHeight  on the height
 * @param aspect          height over W, below 1
 * @returns               mean Nusselt number
 * @example               shallowCavity({ rayleighHeight: 1000, aspect: 0.2 }) // 1.1102
 * @range                 core regime: the excess over 1 below 0.5
 * @scatter               10 %
 * @source                Cormack, Leal and Imberger, J. Fluid Mech. 65 (1974) 209; from memory of this work
 */
export function shallowCavity({ rayleighHeight, aspect }: { rayleighHeight: number; aspect: number }): number {
  return 1 + (aspect * rayleighHeight) ** 2 / 362880;
}
