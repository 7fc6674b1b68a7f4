import { readFileSync } from 'node:fs';
import { Problem } from '../../src/problems/index.ts';
import { loadMaterial, propertyAt, type PropertyId, type PropertyValue } from '../../src/properties/index.ts';

/** Relative uncertainty of the second works, 95 %: what such handbook correlations are good for, from memory of their introductions. */
const ofHandbooks: { readonly [property: string]: number } = { density: 0.01, specificHeatCapacity: 0.03, speedOfSound: 0.015, viscosity: 0.1, thermalConductivity: 0.08, vapourPressure: 0.03, latentHeat: 0.04, surfaceTension: 0.06 };

/** One value held against another program or work. */
export interface Held {
  readonly material: string;
  readonly property: PropertyId;
  readonly reference: string;
  readonly T: number;
  readonly p: number;
  readonly value: number;
  readonly expected: number;
  /** Relative difference, and what is allowed: our uncertainty, and that of the second work beside it. */
  readonly off: number;
  readonly allowed: number;
  readonly declared: number;
  readonly phase: string;
}

/** Where works differ by more than both uncertainties, and which we follow. Material, property, reference, and why. */
export const literatureDiffers: readonly (readonly [string, string, string, string])[] = [
  ['helium', 'specificHeatCapacity', 'Perry', 'the polynomial does not follow the rise towards the lambda point'],
  ['helium', 'viscosity', 'VDI', 'the polynomial of the gas has an offset that shows below 10 K'],
  ['helium', 'thermalConductivity', 'VDI', 'the polynomial of the gas has an offset that shows below 10 K'],
  ['hydrogen', 'thermalConductivity', 'Perry', 'the straight line of the handbook leaves the rise below 16 K'],
  ['hydrogen', 'vapourPressure', 'VDI', 'that correlation departs near the triple point; Perry is within 5 %'],
  ['hydrogen', 'viscosity', 'VDI', 'the polynomial of the gas has an offset that shows below 30 K'],
  ['propylene', 'viscosity', 'Perry', 'both handbooks fall faster above 300 K than the method of corresponding states'],
  ['n-hexane', 'vapourPressure', 'Perry', 'below 1 kPa; VDI is within 5 %'],
  ['n-hexane', 'viscosity', 'VDI', 'the correlation flattens above 420 K; Perry is within 15 %'],
  ['n-hexane', 'thermalConductivity', 'VDI', 'the polynomial falls off above 420 K; Perry is within 13 %'],
  ['n-nonane', 'viscosity', 'VDI', 'at both ends of its range; Perry is within 15 %'],
  ['n-dodecane', 'viscosity', 'VDI', 'the correlation flattens above 540 K; Perry is within 15 %'],
  ['n-dodecane', 'surfaceTension', 'VDI', 'above 540 K, where the tension is 5 mN/m'],
  ['m-xylene', 'viscosity', 'VDI', 'the correlation flattens above 510 K; Perry is within 15 %'],
  ['p-xylene', 'viscosity', 'VDI', 'the correlation flattens above 510 K; Perry is within 15 %'],
  ['methanol', 'vapourPressure', 'Perry', 'below 1 kPa; VDI is within 5 %'],
  ['ammonia', 'thermalConductivity', 'Perry', 'the straight line of the handbook leaves the rise towards the triple point'],
  ['ammonia', 'thermalConductivity', 'VDI', 'lower than Perry as well towards the triple point'],
  ['hydrogen sulphide', 'viscosity', 'Perry', 'near the triple point'],
  ['hydrogen sulphide', 'viscosity', 'VDI', 'higher than Perry as well'],
  ['hydrogen sulphide', 'surfaceTension', 'VDI', 'the critical compilation of Mulero and others lies 14 % to 26 % higher along the whole line'],
  ['nitrous oxide', 'vapourPressure', 'Perry', 'VDI is within 4 %'],
  ['sulphur hexafluoride', 'viscosity', 'Perry', 'both handbooks give the liquid the same higher value; the reference correlation is the later work and fitted to measurements by its authors'],
  ['sulphur hexafluoride', 'viscosity', 'VDI', 'both handbooks give the liquid the same higher value; the reference correlation is the later work and fitted to measurements by its authors'],
  ['sulphur hexafluoride', 'thermalConductivity', 'Perry', 'both handbooks give the liquid the same higher value; the reference correlation is the later work and fitted to measurements by its authors'],
  ['sulphur hexafluoride', 'thermalConductivity', 'VDI', 'both handbooks give the liquid the same higher value; the reference correlation is the later work and fitted to measurements by its authors'],
  ['sulphur hexafluoride', 'surfaceTension', 'VDI', 'the critical compilation of Mulero and others lies lower'],
  ['propylene glycol', 'density', 'Perry', 'at 490 K, above the range of most measurements'],
  ['propylene glycol', 'vapourPressure', 'Perry', 'at 490 K, above the range of most measurements'],
  ['R-32', 'thermalConductivity', 'Perry', 'the handbooks bend down above 380 K, while the heat capacity of the gas rises'],
  ['R-32', 'thermalConductivity', 'VDI', 'the handbooks bend down above 380 K, while the heat capacity of the gas rises'],
  ['R-32', 'viscosity', 'VDI', 'the liquid is 20 % to 30 % above Perry and ours'],
  ['R-22', 'viscosity', 'CoolProp', 'it takes the residual-entropy model, which lies 20 % below the tables for the liquid; ours is the method of corresponding states, within 10 % of VDI at room temperature'],
  ['R-22', 'viscosity', 'VDI', 'below 200 K'],
  ['R-143a', 'viscosity', 'VDI', 'below 200 K'],
  ['R-143a', 'thermalConductivity', 'VDI', 'the polynomial of the gas bends down above 450 K, while the heat capacity rises'],
  ['R-143a', 'surfaceTension', 'VDI', 'the critical compilation of Mulero and others lies 17 % lower near 294 K'],
  ['1-butene', 'vapourPressure', 'Perry', 'below 10 kPa; VDI is within 3.6 %'],
  ['cyclopentane', 'density', 'Perry', 'above 400 K both handbooks lie higher than the later equation of state'],
  ['cyclopentane', 'density', 'VDI', 'above 400 K both handbooks lie higher than the later equation of state'],
  ['diethyl ether', 'specificHeatCapacity', 'Perry', 'the polynomial rises faster above 340 K; at room temperature both agree within 1.5 %'],
  ['dimethyl ether', 'viscosity', 'VDI', 'that correlation fails above 290 K; Perry is within 15 %'],
];

/**
 * Why a value may differ from its reference by more than both uncertainties.
 *
 * @param one  the value
 * @returns    the reason, undefined where none is known
 */
export function differs(one: Held): string | undefined {
  return literatureDiffers.find(([material, property, reference]) => material === one.material && property === one.property && reference === one.reference)?.[3];
}

/** All values of independent-fluids.csv (made by the script of the same name) that lie in the declared ranges. */
export function heldValues(): Held[] {
  const [head = '', ...lines] = readFileSync(new URL('./independent-fluids.csv', import.meta.url), 'utf8').trim().split('\n');
  const properties = head.split(',').slice(4) as PropertyId[];
  return lines.flatMap((line) => {
    // Only names with a comma would be quoted, and no record has one.
    const [material = '', reference = '', T = '', p = '', ...cells] = line.split(',');
    return properties.flatMap((property, i): Held[] => {
      const expected = Number(cells[i] === '' ? Number.NaN : cells[i]);
      if (Number.isNaN(expected)) return [];
      const found = valueAt(material, property, Number(T), Number(p));
      if (found === undefined || !found.withinRange) return [];
      const own = reference === 'CoolProp' ? 1e-5 : (ofHandbooks[property] ?? 0);
      return [{ material, property, reference, T: Number(T), p: Number(p), value: found.value, expected, off: Math.abs(found.value / expected - 1), allowed: found.uncertainty + own, declared: found.uncertainty, phase: found.phase }];
    });
  });
}

function valueAt(material: string, property: PropertyId, temperature: number, pressure: number): PropertyValue | undefined {
  try {
    return propertyAt(loadMaterial(material), property, { temperature, pressure });
  } catch (error) {
    if (error instanceof Problem) return undefined;
    throw error;
  }
}
