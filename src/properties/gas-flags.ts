import { Problem } from '../problems/index.ts';
import type { Material } from './material.ts';
import type { GasMixture } from './models/gas-mixture.ts';
import type { Sample } from './sample.ts';

const K = (T: number): string => `${Number(T.toPrecision(5))} K (${Number((T - 273.15).toFixed(1))} degC)`;

/** Share of the moles up to which what condenses is a trace beside the gas. */
const trace = 0.1;

/**
 * What has to be said of a mixture of gases at a state: that water or another component condenses from it, that its components react.
 *
 * @param material  the material
 * @param sample    the state
 * @returns         flags; none for a material that is no mixture by components. The gas is carried as a gas below its dew point
 * @throws          {Problem} condenses, where more than a tenth of it, beside its water, would be liquid
 */
export function mixtureFlags(material: Material, sample: Sample): string[] {
  if (!material.takes.includes('components')) return [];
  const flags = [...(material.record.flags ?? [])];
  const [entry] = material.record.properties['saturationTemperature'] ?? [];
  const dew = entry === undefined ? Number.NaN : material.engine.evaluate(entry, sample);
  if (sample.T < dew) flags.push(`${material.name} is below its ${dew < 273.16 ? 'frost' : 'dew'} point of ${Number(dew.toPrecision(5))} K: water ${dew < 273.16 ? 'freezes' : 'condenses'} from it`);
  const equation = material.engine.equation as GasMixture;
  const liquid = equation.condensing(sample.T, sample.p);
  if (liquid === undefined) return flags;
  const above = gasAbove(equation, sample);
  const what = `${liquid.of.replaceAll('-', ' ')} condenses`;
  if (liquid.share > trace) {
    throw new Problem({ code: 'condenses', message: `${material.name} is no gas at ${K(sample.T)} and ${Number((sample.p / 1e5).toPrecision(5))} bar: ${what}, ${Number((100 * liquid.share).toPrecision(2))} % of all moles would be liquid`, expected: `a temperature above ${K(above)} at this pressure, or a lower pressure` });
  }
  return [...flags, `${material.name} is below the dew point of ${K(above)} of its ${liquid.of.replaceAll('-', ' ')}: ${Number((100 * liquid.share).toPrecision(1))} % of its moles condense (cubic equation, within about 5 K)`];
}

/** Temperature [K] above which the mixture is a gas at the pressure of a state; 1300 K is above the critical point of every record. */
function gasAbove(equation: GasMixture, { T, p }: Sample): number {
  let [low, high] = [T, 1300];
  for (let i = 0; i < 30; i++) {
    const middle = 0.5 * (low + high);
    if (equation.condensing(middle, p) === undefined) high = middle;
    else low = middle;
  }
  return high;
}
