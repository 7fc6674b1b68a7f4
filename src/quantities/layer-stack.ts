/**
 * Height of a stack of layers that grow geometrically.
 *
 * @param first   height of the layer at the wall [m]
 * @param growth  height of a layer over that below it [1]
 * @param count   number of layers [1]
 * @returns       height [m]
 * @source        sum of a geometric series
 */
export function stackHeight(first: number, growth: number, count: number): number {
  return Math.abs(growth - 1) < 1e-9 ? first * count : (first * (growth ** count - 1)) / (growth - 1);
}

/**
 * Layers after which the cell is as high as the cells of the core, a whole number.
 *
 * @param first   height of the layer at the wall [m]
 * @param growth  height of a layer over that below it [1]
 * @param core    cell size of the core [m]
 * @returns       number of layers [1]; 1 where the first is no smaller than the core or nothing grows
 * @source        N = 1 + ln(h_c/h1)/ln g, rounded up
 */
export function layersToMatch(first: number, growth: number, core: number): number {
  return core <= first || growth <= 1 ? 1 : whole(1 + Math.log(core / first) / Math.log(growth));
}

/**
 * Whole layers below a height.
 *
 * @param first   height of the layer at the wall [m]
 * @param growth  height of a layer over that below it [1]
 * @param height  height [m], in the unit of `first`
 * @returns       number of layers [1]
 * @source        n = ln(1 + Y (g - 1)/h1)/ln g, rounded down
 */
export function layersBelow(first: number, growth: number, height: number): number {
  const n = Math.abs(growth - 1) < 1e-9 ? height / first : Math.log(1 + (height * (growth - 1)) / first) / Math.log(growth);
  return Math.floor(n + 1e-9);
}

const whole = (n: number): number => Math.max(1, Math.ceil(n - 1e-9));
