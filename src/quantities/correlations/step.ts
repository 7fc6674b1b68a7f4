import { between, type Table } from './table.ts';

// Sudden step on one side of a channel. Reynolds number on twice the inlet height and the mean inlet speed.

const measured: Table = [[0, 1], [100, 3], [200, 5], [389, 8], [800, 14.1]];
const atEdge: Table = [[100, 3.22], [400, 8.65], [800, 12.2]];
const behindChannel: Table = [[100, 2.92], [400, 8.24], [800, 11.83]];
const turbulent: Table = [[1.125, 6.26], [1.2, 6.28], [1.5, 7]];

/**
 * Distance from a laminar step to reattachment over the step height, measured; from about 400 on the flow is three-dimensional.
 *
 * @param reynolds  on twice the inlet height and the mean inlet speed
 * @returns         x_R/h, straight between the data; held at both ends
 * @example         stepReattachment({ reynolds: 389 }) // 8
 * @range           reynolds 100 to 800, expansion ratio 1.94, developed inlet
 * @scatter         12 %
 * @source          Armaly, Durst, Pereira and Schoenung, J. Fluid Mech. 127 (1983) 473
 */
export function stepReattachment({ reynolds }: { reynolds: number }): number {
  return between(reynolds, measured);
}

/**
 * The same from plane computations at expansion ratio 2, which stay short of the measured length above 400.
 *
 * @param reynolds  on twice the inlet height and the mean inlet speed
 * @param inlet     edge: the parabola given at the step; channel: an inlet channel ahead of it
 * @returns         x_R/h, straight between the data; held at both ends
 * @example         planeStepReattachment({ reynolds: 800, inlet: 'edge' }) // 12.2
 * @range           reynolds 100 to 800
 * @scatter         2 %
 * @source          Gartling, Int. J. Numer. Methods Fluids 11 (1990) 953 (edge, 800); computed anew at 100 and 400; Erturk, Comput. Fluids 37 (2008) 633 (channel, from memory)
 */
export function planeStepReattachment({ reynolds, inlet }: { reynolds: number; inlet: 'edge' | 'channel' }): number {
  return between(reynolds, inlet === 'edge' ? atEdge : behindChannel);
}

/**
 * Distance from a turbulent step to reattachment over the step height: 6.26 at expansion ratio 1.125, 6.28 at 1.2, 7 at 1.5.
 *
 * @param expansion  height behind the step over that ahead of it
 * @returns          x_R/h; held at both ends
 * @example          turbulentStepReattachment({ expansion: 1.2 }) // 6.28
 * @range            expansion 1.1 to 1.7
 * @scatter          10 %
 * @source           Driver and Seegmiller, AIAA J. 23 (1985) 163; Le, Moin and Kim, J. Fluid Mech. 330 (1997) 349; Kim, Kline and Johnston, J. Fluids Eng. 102 (1980) 302
 */
export function turbulentStepReattachment({ expansion }: { expansion: number }): number {
  return between(expansion, turbulent);
}

/**
 * Loss of total pressure of a sudden expansion over the dynamic pressure ahead of it, (1 - A_1/A_2)^2.
 *
 * @param areaRatio  section ahead over section behind
 * @returns          loss number, for even profiles
 * @example          bordaCarnot({ areaRatio: 0.5 }) // 0.25
 * @source           Borda 1766, Carnot 1803; momentum balance
 */
export function bordaCarnot({ areaRatio }: { areaRatio: number }): number {
  return (1 - areaRatio) ** 2;
}
