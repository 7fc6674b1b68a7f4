import { quantity, way, ways, type Definition, type Way } from '../workings/index.ts';

/** One layer of a wall, from the wetted face outwards: the ids of its thickness and conductivity. */
export interface Layer {
  readonly thickness: string;
  readonly conductivity: string;
  /** Conductivity from a material: name of its law in the workings, formula and source. */
  readonly law?: { readonly name: string; readonly formula: string; readonly source: string; readonly range?: readonly [number, number] };
}

const series = 'conduction through layers in series, Fourier 1822';
const section = 'conduction along layers side by side, Fourier 1822';

/** What layers add up to; walls without layers keep the zero of the general definitions. */
export const layers: Definition[] = [
  quantity('wallAxialConductance', { symbol: 'k_s A_s', name: 'conductivity times section of the wall along the flow', unit: 'W m/K', per: ['wall'], plain: 'target' }, [
    way({ needs: [], when: { 'has.layers': 'no' }, value: () => 0, formula: 'k_s A_s = 0', source: 'no layers given' }),
  ]),
];

/**
 * Definitions of the layers of one wall: conductivity at the mean of its faces, resistance on the wetted area, section times conductivity.
 *
 * @param wall  place, such as `wall` or `walls.left`
 * @param list  layers from the wetted face outwards
 * @returns       definitions to add for this case
 */
export function layerDefinitions(wall: string, list: readonly Layer[]): Definition[] {
  const needs = list.flatMap((l) => [l.thickness, l.conductivity]);
  const over = (of: Readonly<Record<string, number>>, start: number, term: (inner: number, outer: number, k: number) => number): number => {
    let inner = start;
    let sum = 0;
    for (const l of list) {
      const outer = inner + (of[l.thickness] as number);
      sum += term(inner, outer, of[l.conductivity] as number);
      inner = outer;
    }
    return sum;
  };
  const round = { ductSection: 'round' };
  return [
    ...list.flatMap((l): Definition[] => {
      if (l.law === undefined) return [];
      const { name, formula, source, range } = l.law;
      const at = (ids: string[]): Way => ({ needs: [...ids, 'pressure'], laws: [name], value: (of, laws) => laws[name]?.(ids.reduce((s, id) => s + (of[id] as number), 0) / ids.length, of['pressure'] as number) ?? Number.NaN, formula, source, dimensional: 'a property record holds constants with units', ...(range === undefined || ids.length > 1 ? {} : { range: { [ids[0] as string]: range } }) });
      return [ways(l.conductivity, [at([`wallTemperature@${wall}`, `drivingTemperature@${wall}`]), at([`wallTemperature@${wall}`])])];
    }),
    ways(`layersThickness@${wall}`, [{ needs: list.map((l) => l.thickness), value: (of) => list.reduce((s, l) => s + (of[l.thickness] as number), 0), formula: 'sum of the layers', source: 'geometry' }]),
    ways(`wallResistance@${wall}`, [
      { needs: [...needs, 'hydraulicDiameter'], when: round, value: (of) => { const r = (of['hydraulicDiameter'] as number) / 2; return r * over(of, r, (a, b, k) => Math.log(b / a) / k); }, formula: 'R_w = r sum ln(r_2/r_1)/k_s', source: series },
      { needs, value: (of) => over(of, 0, (a, b, k) => (b - a) / k), formula: 'R_w = sum delta_s/k_s', source: series },
    ]),
    ways(`wallAxialConductance@${wall}`, [
      { needs: [...needs, 'hydraulicDiameter'], when: round, value: (of) => over(of, (of['hydraulicDiameter'] as number) / 2, (a, b, k) => k * Math.PI * (b ** 2 - a ** 2)), formula: 'sum k_s pi (r_2^2 - r_1^2)', source: section },
      { needs: [...needs, 'wettedPerimeter'], value: (of) => (of['wettedPerimeter'] as number) * over(of, 0, (a, b, k) => k * (b - a)), formula: 'P sum k_s delta_s', source: section },
    ]),
  ];
}
