import type { Assembled } from '../assemble/index.ts';
import { Problem } from '../problems/index.ts';
import { firstFitOf, sampledOver, type Fit, type Material, type StateRange } from '../properties/index.ts';
import { lawProperties } from '../quantities/index.ts';

/** The fluid of a case with the temperatures it takes, at its pressure and composition. */
export interface FluidRange {
  readonly fluid: Material;
  readonly range: StateRange & { readonly over: NonNullable<StateRange['over']> };
}

/** Where the properties of the fluid are needed; undefined without a record, or at one temperature. */
export function fluidRange(assembled: Assembled): FluidRange | undefined {
  const { fluid, fluidState: { humidity, composition }, workings } = assembled;
  const [from, to, pressure] = ['lowestTemperature', 'highestTemperature', 'pressure'].map((id) => workings.get(id));
  if (fluid === undefined || from === undefined || to === undefined || pressure === undefined || !(to > from)) return undefined;
  return { fluid, range: { pressure, ...(humidity === undefined ? {} : { humidity }), ...(composition === undefined ? {} : { composition }), over: { of: 'temperature', from, to }, assumed: [] } };
}

/** Why there is no table of the properties over the temperatures of the case; undefined where there is one. */
export function noPropertyTable(assembled: Assembled): string | undefined {
  if (fluidRange(assembled) !== undefined) return undefined;
  if (assembled.fluid === undefined) return 'the fluid is given by constants';
  return assembled.workings.get('lowestTemperature') === undefined ? 'the temperatures of the case are not known' : 'the case has one temperature';
}

/** Share of its own uncertainty that a fit may add to a property, and the share of the span that it covers beyond each end. */
const share = 1 / 3;
const beyond = 0.1;

/**
 * Functions of temperature ready to type in: the shortest polynomials whose error stays within a third of what the property is known to, or where none does Vogel's law of a liquid's viscosity or straight pieces,
 * over the temperatures of the case and a tenth of their span beyond, or over them alone where a phase ends.
 *
 * @param assembled  the settled case
 * @returns          the functions and the ends of their range [K]; undefined where the fluid has no record or one temperature
 * @source           share and margin: common practice
 */
export function propertyFits(assembled: Assembled): { readonly fluid: string; readonly from: number; readonly to: number; readonly fits: readonly Fit[] } | undefined {
  const at = fluidRange(assembled);
  if (at === undefined) return undefined;
  const { fluid, range } = at;
  const ids = lawProperties.map((p) => p.id).filter((id): id is Exclude<typeof id, 'thermalExpansion'> => id !== 'thermalExpansion' && fluid.properties.includes(id));
  const margin = beyond * (range.over.to - range.over.from);
  for (const wide of [margin, 0]) {
    const [from, to] = [range.over.from - wide, range.over.to + wide];
    try {
      const sampled = sampledOver(fluid, { ...range, over: { of: 'temperature', from, to } }, ids);
      if (wide > 0 && sampled.some((s) => s.flags.length > 0)) continue;
      return { fluid: fluid.name, from, to, fits: sampled.map((s) => firstFitOf(s, ['polynomial', 'vogel', 'piecewise'], Math.min(Math.max(share * s.uncertainty, 1e-5), 0.01))) };
    } catch (error) {
      // Beyond the end of a phase, or of the record.
      if (!(error instanceof Problem)) throw error;
    }
  }
  return undefined;
}
