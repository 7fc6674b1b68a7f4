import type { Engine, Sample } from '../sample.ts';
import type { EquationOfState, Point } from './point.ts';

const R = 8.31446261815324;

/** Equation of state of mixed gases, with the transport that belongs to the mixture alone. */
export interface GasMixture extends EquationOfState {
  viscosity(T: number, p: number): number;
  conductivity(T: number, p: number): number;
  /** Temperature [K] at which the water of the mixture starts to condense; NaN where it holds none, or below 0 degC. */
  dewPoint(T: number, p: number): number;
}

/** One gas of a mixture. */
export interface MixedGas {
  /** Mole fraction. */
  readonly share: number;
  /** [kg/mol], or any unit shared by all. */
  readonly molarMass: number;
  readonly viscosity: number;
  /** What is mixed: the viscosity itself, or the conductivity. */
  readonly value: number;
}

/**
 * Mixing rule of gas transport: each part is weakened by collisions with the others.
 *
 * @param gases  mole fractions, molar masses, viscosities and the values to be mixed
 * @returns      viscosity or conductivity of the mixture, in the unit of `value`
 * @source       Wilke, J. Chem. Phys. 18 (1950) 517 for the viscosity; Wassiljewa's form with the same factors after Mason and Saxena, Phys. Fluids 1 (1958) 361 for the conductivity
 */
export function mixedTransport(gases: readonly MixedGas[]): number {
  let sum = 0;
  for (const one of gases) {
    let below = 0;
    for (const other of gases) {
      const root = 1 + Math.sqrt(one.viscosity / other.viscosity) * (other.molarMass / one.molarMass) ** 0.25;
      below += other.share * ((root * root) / Math.sqrt(8 * (1 + one.molarMass / other.molarMass)));
    }
    sum += (one.share * one.value) / below;
  }
  return sum;
}

/** So thin that a real gas is ideal and water is a vapour down to 250 K [Pa]. */
const thin = 50;

/**
 * Ideal gases by composition: every component keeps the heat capacity and transport of its thin gas.
 *
 * @param c         mole fractions by material, their sum 1
 * @param partners  the components in the order of the mole fractions
 * @returns         the equation of state
 */
export function gasMixture(c: { shares: { readonly [id: string]: number } }, partners: readonly Engine[]): GasMixture {
  const shares = Object.values(c.shares);
  const water = Object.keys(c.shares).indexOf('water');
  const masses = partners.map((one) => one.molarMass);
  const molarMass = shares.reduce((sum, x, i) => sum + x * (masses[i] as number), 0);
  const gasConstant = R / molarMass;
  const sample = (T: number): Sample => ({ T, p: thin, side: 'vapour', x: 0 });
  const mixed = (T: number, property: 'viscosity' | 'thermalConductivity'): number =>
    mixedTransport(partners.map((one, i) => ({ share: shares[i] as number, molarMass: masses[i] as number, viscosity: one.value('viscosity', sample(T)), value: one.value(property, sample(T)) })));
  const at = (T: number, pressure: number): Point => {
    let cp = 0;
    let enthalpy = 0;
    partners.forEach((one, i) => {
      const w = ((shares[i] as number) * (masses[i] as number)) / molarMass;
      const point = one.point(sample(T));
      cp += w * point.specificHeatCapacity;
      enthalpy += w * point.enthalpy;
    });
    const cv = cp - gasConstant;
    return { temperature: T, pressure, density: pressure / (gasConstant * T), specificHeatCapacity: cp, isochoricHeatCapacity: cv, speedOfSound: Math.sqrt((cp / cv) * gasConstant * T), thermalExpansion: 1 / T, compressibility: 1 / pressure, enthalpy };
  };
  return {
    gasConstant,
    at,
    of: (T, rho) => at(T, rho * gasConstant * T),
    viscosity: (T) => mixed(T, 'viscosity'),
    conductivity: (T) => mixed(T, 'thermalConductivity'),
    dewPoint(_T, p) {
      const steam = partners[water];
      if (steam === undefined) return Number.NaN;
      const partial = (shares[water] as number) * p;
      let [low, high] = [273.16, 640];
      if (steam.saturation(low) > partial || steam.saturation(high) < partial) return Number.NaN;
      for (let i = 0; i < 60; i++) {
        const middle = 0.5 * (low + high);
        if (steam.saturation(middle) < partial) low = middle;
        else high = middle;
      }
      return 0.5 * (low + high);
    },
  };
}
