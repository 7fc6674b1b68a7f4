import type { Engine, Sample } from '../sample.ts';
import { condensate } from './condensation.ts';
import { cubic, type CubicGas } from './cubic.ts';
import { denseConductivity, denseViscosity, type CriticalPoint } from './dense-gas.ts';
import { iceSublimation, iceVolume, lowestFrostPoint } from './ice.ts';
import { pairInteraction } from './pair-interactions.ts';
import type { EquationOfState, Point } from './point.ts';

const R = 8.31446261815324;

/** Equation of state of a gas with moisture, with the transport that belongs to the mixture alone. */
export interface MoistGas extends EquationOfState {
  viscosity(T: number, p: number): number;
  conductivity(T: number, p: number): number;
  /** Temperature [K] at which the water of the mixture starts to condense, below 0 degC as frost; NaN where it holds none, or next to none. */
  dewPoint(T: number, p: number): number;
}

/** Gases by composition. */
export interface GasMixture extends MoistGas {
  /** What of the gas, its water left out, would be liquid: material by id, share of the moles; undefined where all of it is a gas. */
  condensing(T: number, p: number): { readonly of: string; readonly share: number } | undefined;
  /** Pseudo-critical point, the means of the components by mole (Kay's rule). */
  readonly critical: CriticalPoint;
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

/** A component as the cubic equation takes it: critical point of its record, acentric factor from its vapour pressure. */
function cubicGas(one: Engine, id: string): CubicGas {
  const { critical } = one;
  const line = one.equation.line;
  if (critical === undefined || line === undefined) throw new Error(`${id} has no critical point or no saturation line`);
  return { temperature: critical.temperature, pressure: critical.pressure, acentric: -1 - Math.log10(line.dew(Math.max(line.from, 0.7 * critical.temperature)) / critical.pressure), molarMass: one.molarMass };
}

/** Pseudo-critical point by the rule of Kay; the pressure after Prausnitz and Gunn, AIChE J. 4 (1958) 430. */
function pseudoCritical(partners: readonly Engine[], shares: readonly number[]): CriticalPoint {
  const mean = (of: (one: Engine) => number): number => partners.reduce((sum, one, i) => sum + (shares[i] as number) * of(one), 0);
  const volumeOf = (one: Engine): number => one.molarMass / (one.critical?.density ?? Number.NaN);
  const temperature = mean((one) => one.critical?.temperature ?? Number.NaN);
  const volume = mean(volumeOf);
  const Z = mean((one) => ((one.critical?.pressure ?? Number.NaN) * volumeOf(one)) / (R * (one.critical?.temperature ?? Number.NaN)));
  return { temperature, pressure: (Z * R * temperature) / volume, volume, molarMass: mean((one) => one.molarMass) };
}

/**
 * Gases by composition: every component brings the heat capacity and transport of its thin gas, a cubic equation the departure of the mixture under pressure.
 *
 * @param c         mole fractions by material, their sum 1
 * @param partners  the components in the order of the mole fractions
 * @returns         the equation of state
 * @source          Soave, Chem. Eng. Sci. 27 (1972) 1197 (departure); dense gas: Dean and Stiel 1965 (viscosity), Stiel and Thodos 1964 (conductivity)
 */
export function gasMixture(c: { shares: { readonly [id: string]: number } }, partners: readonly Engine[]): GasMixture {
  const ids = Object.keys(c.shares);
  const shares = Object.values(c.shares);
  const water = ids.indexOf('water');
  const masses = partners.map((one) => one.molarMass);
  const molarMass = shares.reduce((sum, x, i) => sum + x * (masses[i] as number), 0);
  const gasConstant = R / molarMass;
  const gases = partners.map((one, i) => cubicGas(one, ids[i] as string));
  const equation = cubic(gases, shares, (i, j) => pairInteraction(ids[i] as string, ids[j] as string));
  const critical = pseudoCritical(partners, shares);
  const sample = (T: number): Sample => ({ T, p: thin, side: 'vapour', x: 0 });
  const mixed = (T: number, property: 'viscosity' | 'thermalConductivity'): number =>
    mixedTransport(partners.map((one, i) => ({ share: shares[i] as number, molarMass: masses[i] as number, viscosity: one.value('viscosity', sample(T)), value: one.value(property, sample(T)) })));
  const density = (T: number, p: number): number => critical.volume / equation.gas(T, p).volume;
  let keptT = Number.NaN;
  let kept = { cp: 0, enthalpy: 0 };
  /** Heat capacity and enthalpy of the thin gases, by mass. */
  const ideal = (T: number): typeof kept => {
    if (T === keptT) return kept;
    kept = { cp: 0, enthalpy: 0 };
    partners.forEach((one, i) => {
      const w = ((shares[i] as number) * (masses[i] as number)) / molarMass;
      const point = one.point(sample(T));
      kept.cp += w * point.specificHeatCapacity;
      kept.enthalpy += w * point.enthalpy;
    });
    keptT = T;
    return kept;
  };
  const at = (T: number, pressure: number): Point => {
    const { cp: cp0, enthalpy } = ideal(T);
    const { volume, heat, enthalpy: more, byTemperature, byVolume, departure } = equation.gas(T, pressure);
    const cv = cp0 - gasConstant + heat / molarMass;
    const cp = cv - (T * byTemperature * byTemperature) / (byVolume * molarMass);
    return {
      temperature: T,
      pressure,
      density: molarMass / volume,
      specificHeatCapacity: cp,
      isochoricHeatCapacity: cv,
      speedOfSound: volume * Math.sqrt((-cp * byVolume) / (cv * molarMass)),
      thermalExpansion: -byTemperature / (byVolume * volume),
      compressibility: -1 / (byVolume * volume),
      enthalpy: enthalpy + more / molarMass,
      departure,
    };
  };
  const dry = water < 0 ? undefined : shares.map((x, i) => (i === water ? 0 : x / (1 - (shares[water] as number))));
  return {
    gasConstant,
    critical,
    at,
    of: () => {
      throw new Error('a mixture of gases is asked by temperature and pressure');
    },
    viscosity: (T, p) => mixed(T, 'viscosity') + denseViscosity(critical, density(T, p)),
    conductivity: (T, p) => mixed(T, 'thermalConductivity') + denseConductivity(critical, density(T, p)),
    condensing(T, p) {
      const share = water < 0 ? 0 : (shares[water] as number);
      if (share === 1) return undefined;
      // Colder than its pseudo-critical point and denser, the only root is that of a liquid.
      if (T < critical.temperature && density(T, p) > 1) return { of: ids[shares.indexOf(Math.max(...shares))] as string, share: 1 };
      const found = condensate(equation, gases, dry ?? shares, T, p * (1 - share));
      return found === undefined ? undefined : { of: ids[found.of] as string, share: found.share * (1 - share) };
    },
    dewPoint(_T, p) {
      const steam = partners[water];
      if (steam === undefined) return Number.NaN;
      const share = shares[water] as number;
      // Logarithm of the fugacity of the water in the gas over that of liquid water, or of ice, under the pressure.
      const excess = (T: number): number => {
        const frost = T < 273.16;
        const ps = frost ? iceSublimation(T) : steam.saturation(T);
        const pure = shares.map((_, i) => (i === water ? 1 : 0));
        const [gas, own] = [equation.fugacities(T, p, shares, 'gas')[water], equation.fugacities(T, ps, pure, 'gas')[water]] as [number, number];
        return Math.log((share * p) / ps) + gas - own - ((frost ? iceVolume : liquidVolume) * (p - ps)) / (R * T);
      };
      let [low, high] = excess(273.16) < 0 ? [lowestFrostPoint, 273.16] : [273.16, 640];
      if (excess(low) < 0 || excess(high) > 0) return Number.NaN;
      for (let i = 0; i < 40; i++) {
        const middle = 0.5 * (low + high);
        if (excess(middle) > 0) low = middle;
        else high = middle;
      }
      return 0.5 * (low + high);
    },
  };
}

/** Of liquid water [m^3/mol]: it counts for 0.1 K at 10 MPa. */
const liquidVolume = 1.85e-5;
