import { Problem } from '../../problems/index.ts';
import type { Engine, Sample } from '../sample.ts';
import { mixedTransport, type MoistGas } from './gas-mixture.ts';
import { iceSublimation, iceVolume, lowestFrostPoint } from './ice.ts';
import type { Point } from './point.ts';

const R = 8.31446261815324;

/** Of water [K]: below it frost forms. */
const triple = 273.16;

/** Second virial coefficients [m^3/mol] at one temperature: air, water, and between the two. */
interface Virials {
  readonly air: number;
  readonly water: number;
  readonly cross: number;
}

/** Cross virial coefficient of air and water [m^3/mol]. Source: Harvey and Huang, Int. J. Thermophys. 28 (2007) 556, eq. (8). */
const crossVirial = (rows: readonly (readonly number[])[], T: number): number => {
  let sum = 0;
  for (const [c, d] of rows as readonly [number, number][]) sum += c * (T / 100) ** d;
  return 1e-6 * sum;
};

/** Moist air at one state, by mole. */
export interface MoistAir {
  /** Mole fraction of water. */
  readonly water: number;
  /** Water per dry air by mass. */
  readonly humidityRatio: number;
  /** [kg/mol] */
  readonly molarMass: number;
  /** Enhancement of the saturation pressure by the air. */
  readonly enhancement: number;
}

/** Equation of state of humid air, with what belongs to the mixture alone. */
export interface HumidAir extends MoistGas {
  moist(T: number, p: number, humidity: number): MoistAir;
}

/**
 * Humid air: real dry air and real water vapour, joined by second virial coefficients; the water content from the relative
 * humidity over liquid water and the enhancement factor that follows from the same coefficients and the compressed liquid.
 *
 * @param c         rows of the cross virial coefficient
 * @param partners  dry air and water
 * @param humidity  relative humidity of the state being asked for, 0 to 1
 * @returns         the equation of state; enthalpy counts from dry air and liquid water at 0 degC
 * @throws          {Problem} impossible-humidity where the water alone would exceed the pressure
 * @source          Herrmann, Kretzschmar and Gatley, HVAC&R Research 15 (2009) 961, cut after the second virial coefficients; Hyland and Wexler, ASHRAE Trans. 89 (1983) 500 for the enhancement factor; Wilke, J. Chem. Phys. 18 (1950) 517 and Mason and Saxena, Phys. Fluids 1 (1958) 361 for transport
 */
export function humidAir(c: { cross: readonly (readonly number[])[] }, partners: readonly Engine[], humidity: () => number): HumidAir {
  const [air, water] = partners as [Engine, Engine];
  const [Ma, Mw] = [air.molarMass, water.molarMass];
  const zero = air.point({ T: 273.15, p: 101325, side: 'vapour', x: 0 }).enthalpy;
  let keptT = Number.NaN;
  let kept: Virials = { air: 0, water: 0, cross: 0 };

  const virials = (T: number): Virials => {
    if (T === keptT) return kept;
    const thin = air.equation.of(T, 0.01);
    const steam = water.equation.at(T, 200, 'vapour');
    keptT = T;
    kept = {
      air: (thin.pressure / (thin.density * air.equation.gasConstant * T) - 1) / (thin.density / Ma),
      water: ((200 / (steam.density * water.equation.gasConstant * T) - 1) * R * T) / 200,
      cross: crossVirial(c.cross, T),
    };
    return kept;
  };
  const enhancement = (T: number, p: number, over: 'liquid' | 'ice' = 'liquid'): number => {
    const ps = over === 'ice' ? iceSublimation(T) : water.saturation(T);
    if (p <= ps) return 1;
    const B = virials(T);
    const dense = over === 'ice' ? iceVolume : Mw / water.equation.at(T, p, 'liquid').density;
    let f = 1;
    for (let i = 0; i < 4; i++) {
      const xa = Math.max(0, 1 - (f * ps) / p);
      f = Math.exp(((p - ps) * dense + xa * xa * p * B.air - 2 * xa * xa * p * B.cross - (p - ps - xa * xa * p) * B.water) / (R * T));
    }
    return f;
  };
  const moist = (T: number, p: number, phi: number): MoistAir => {
    const f = enhancement(T, p);
    const x = (phi * f * water.saturation(Math.min(T, 647.096))) / p;
    if (!(x < 1)) throw new Problem({ code: 'impossible-humidity', message: `air of ${Number((phi * 100).toPrecision(3))} % relative humidity cannot exist at ${Number(T.toPrecision(5))} K and ${Number((p / 1e5).toPrecision(4))} bar: the water alone would exceed the pressure`, expected: 'a lower humidity or temperature' });
    return { water: x, humidityRatio: (x * Mw) / ((1 - x) * Ma), molarMass: (1 - x) * Ma + x * Mw, enhancement: f };
  };
  const volume = (T: number, p: number, x: number): number => {
    const B = virials(T);
    return (R * T) / p + (1 - x) * (1 - x) * B.air + 2 * x * (1 - x) * B.cross + x * x * B.water;
  };
  let last: MoistAir = { water: 0, humidityRatio: 0, molarMass: Ma, enhancement: 1 };

  const at = (T: number, p: number): Point => {
    const m = moist(T, p, humidity());
    last = m;
    const x = m.water;
    const w = (x * Mw) / m.molarMass;
    const dry = { ...air.point({ T, p, side: 'vapour', x: 0 }) };
    const steam = x > 0 ? water.equation.at(T, Math.max(x * p, 1), 'vapour') : undefined;
    const v = volume(T, p, x);
    const step = 0.05;
    const vT = (volume(T + step, p, x) - volume(T - step, p, x)) / (2 * step);
    const vp = -(R * T) / (p * p);
    const cp = (1 - w) * dry.specificHeatCapacity + w * (steam?.specificHeatCapacity ?? 0);
    const cv = cp + (T * vT * vT) / (vp * m.molarMass);
    return {
      temperature: T,
      pressure: p,
      density: m.molarMass / v,
      specificHeatCapacity: cp,
      isochoricHeatCapacity: cv,
      speedOfSound: (v / Math.sqrt(m.molarMass)) * Math.sqrt(-cp / (cv * vp)),
      thermalExpansion: vT / v,
      compressibility: -vp / v,
      enthalpy: (1 - w) * (dry.enthalpy - zero) + w * (steam?.enthalpy ?? 0),
    };
  };
  const parts = (T: number, p: number): { x: number; a: Sample; w: Sample } => {
    const x = moist(T, p, humidity()).water;
    return { x, a: { T, p, side: 'vapour', x: 0 }, w: { T, p: Math.max(x * p, 1), side: 'vapour', x: 0 } };
  };
  const mix = (x: number, ya: number, yw: number, mua: number, muw: number): number => mixedTransport([{ share: 1 - x, molarMass: Ma, viscosity: mua, value: ya }, { share: x, molarMass: Mw, viscosity: muw, value: yw }]);
  return {
    get gasConstant() {
      return R / last.molarMass;
    },
    at,
    of: () => {
      throw new Error('humid air is asked by temperature and pressure');
    },
    moist,
    carried: (phi, from, to) => (phi * enhancement(from.T, from.p) * water.saturation(Math.min(from.T, 647.096)) * to.p) / (from.p * enhancement(to.T, to.p) * water.saturation(Math.min(to.T, 647.096))),
    viscosity(T, p) {
      const { x, a, w } = parts(T, p);
      const mua = air.value('viscosity', a);
      if (x === 0) return mua;
      const muw = water.value('viscosity', w);
      return mix(x, mua, muw, mua, muw);
    },
    conductivity(T, p) {
      const { x, a, w } = parts(T, p);
      const ka = air.value('thermalConductivity', a);
      if (x === 0) return ka;
      return mix(x, ka, water.value('thermalConductivity', w), air.value('viscosity', a), water.value('viscosity', w));
    },
    dewPoint(T, p) {
      const x = moist(T, p, humidity()).water;
      const over = x < (enhancement(triple, p) * water.saturation(triple)) / p ? 'ice' : 'liquid';
      const full = (at: number): number => (enhancement(at, p, over) * (over === 'ice' ? iceSublimation(at) : water.saturation(at))) / p;
      let [low, high] = over === 'ice' ? [lowestFrostPoint, triple] : [triple, T];
      if (full(low) > x) return Number.NaN;
      for (let i = 0; i < 60; i++) {
        const middle = 0.5 * (low + high);
        if (full(middle) < x) low = middle;
        else high = middle;
      }
      return 0.5 * (low + high);
    },
  };
}
