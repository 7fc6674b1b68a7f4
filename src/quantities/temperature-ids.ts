/**
 * Whether an id names a temperature, which has the zero of its scale, and no difference of temperature, which has none; both are measured in K.
 *
 * @param id  quantity or path
 * @returns   true for temperatures, limits and ends of temperature targets
 */
export function isTemperature(id: string): boolean {
  return /(?:temperature(?:Peak|Least|Inlet|Outlet|Mean|Max|Min)?|(?:hottest|coldest)Wall|saturation|limit|ifLaminar|ifTurbulent)$/i.test(id.split('@')[0] as string);
}
