import { quantity, type Definition, type Way } from '../workings/index.ts';
import type { TargetNode } from './target-definitions.ts';

const source = 'ASME V&V 20 (2009); all parts as standard uncertainties';
const practice = 'common practice: what a good measurement of this kind reaches, one standard uncertainty';

/** Standard uncertainty of a careful measurement, as a share of the value or in its unit. */
const measured: Readonly<Record<string, { readonly share: number } | { readonly size: number; readonly what: string }>> = {
  K: { size: 0.15, what: '0.15 K, fluid temperature' },
  Pa: { share: 0.01 },
  W: { share: 0.04 },
  'W/m^2': { share: 0.04 },
  'W/(m^2 K)': { share: 0.04 },
  N: { share: 0.01 },
  'kg/s': { share: 0.005 },
  'm^3/s': { share: 0.005 },
  'm/s': { share: 0.01 },
  '1/s': { share: 0.01 },
  m: { share: 0.02 },
};

/**
 * What a comparison of each target with a measurement could show, worked out before either is paid for.
 *
 * @param nodes  targets that a quantity estimates
 * @returns      definitions `targets.0.numericalPart` and so on
 */
export function validationDefinitions(nodes: readonly TargetNode[]): Definition[] {
  return nodes.flatMap(({ target, id, unit, name }) => {
    const at = target.path;
    const kind = measured[/wallTemperature/.test(id) ? 'wall' : unit] ?? (/wallTemperature/.test(id) ? { size: 0.5, what: '0.5 K, wall temperature' } : { share: 0.02 });
    const one = (key: string, symbol: string, what: string, way: Way): Definition => quantity(`${at}.${key}`, { symbol, name: what, unit }, [way]);
    const of = (keys: readonly string[], value: (x: readonly number[]) => number, formula: string): Way => ({ needs: keys.map((k) => `${at}.${k}`), value: (numbers) => value(keys.map((k) => numbers[`${at}.${k}`] as number)), formula, source });
    const data: Way = 'size' in kind
      ? { needs: [], as: 'assumed', value: () => kind.size, formula: `u_D = ${kind.what}`, source: practice, dimensional: 'an instrument has a size of error' }
      : { needs: [id], as: 'assumed', value: (numbers) => kind.share * Math.abs(numbers[id] as number), formula: `u_D = ${kind.share} |x|`, source: practice };
    return [
      one('numericalPart', 'u_num', `numerical part that the ${name} is planned with`, of(['mesh', 'iteration', 'domain'], (x) => Math.hypot(...x) / 2, 'u_num = sqrt(w_mesh^2 + w_it^2 + w_dom^2)/2')),
      one('inputPart', 'u_input', `part that inputs and properties give the ${name}`, of(['inputWidth'], ([w]) => (w as number) / 2, 'u_input = w_in/2')),
      one('dataPart', 'u_D', `part that a measurement of the ${name} has itself`, data),
      one('validation', 'u_val', `uncertainty of a comparison of the ${name} with data`, of(['numericalPart', 'inputPart', 'dataPart'], (x) => Math.hypot(...x), 'u_val = sqrt(u_num^2 + u_input^2 + u_D^2)')),
      one('visible', 'delta_min', `smallest model error of the ${name} that the comparison shows four times in five`, of(['validation'], ([u]) => 2.84 * (u as number), 'delta_min = 2.84 u_val')),
    ];
  });
}
