import { carbonDioxideConductivity, carbonDioxideViscosity, type CarbonDioxideConductivityConstants, type CarbonDioxideViscosityConstants } from './models/co2-transport.ts';
import { helmholtz, type HelmholtzConstants } from './models/helmholtz.ts';
import * as aqueous from './models/aqueous.ts';
import { food } from './models/food.ts';
import { gasMixture, type MoistGas } from './models/gas-mixture.ts';
import { humidAir } from './models/humid-air.ts';
import { if97, type WaterConstants } from './models/if97.ts';
import { henry, type HenryConstants } from './models/dissolved-gas.ts';
import * as laws from './models/laws.ts';
import { lineOf } from './models/point.ts';
import { seaWater, type SeaWaterConstants } from './models/sea-water.ts';
import { lemmonJacobsenConductivity, lemmonJacobsenViscosity, type GasConductivityConstants, type GasViscosityConstants } from './models/gas-transport.ts';
import { waterConductivity, waterCriticalFactor, waterViscosity, type WaterConductivityConstants, type WaterViscosityConstants } from './models/water-transport.ts';
import { fluidModels } from './registry-of-fluids.ts';
import type { EquationModel, PropertyModel, Sample } from './sample.ts';

type OfTemperature = (c: never) => (T: number) => number;
const ofTemperature = (constants: readonly string[], law: OfTemperature): PropertyModel => ({
  constants,
  make(c) {
    const f = law(c);
    return (s) => f(s.T);
  },
});

/**
 * Temperature at which a rising saturation pressure reaches p: false position in 1/T and ln p, where the line is nearly straight.
 *
 * @param pressure  saturation pressure [Pa] of T [K], rising
 * @param p         [Pa], between the pressures of both ends
 * @param from      lowest temperature [K]
 * @param to        highest temperature [K]
 * @returns         temperature [K] to about 1e-11
 */
export function boilingTemperature(pressure: (T: number) => number, p: number, from: number, to: number): number {
  const aim = Math.log(p);
  let [low, high] = [1 / from, 1 / to];
  let [below, above] = [Math.log(pressure(from)) - aim, Math.log(pressure(to)) - aim];
  let [weightBelow, weightAbove] = [below, above];
  let u = low;
  for (let i = 0; i < 80; i++) {
    u = i % 8 === 7 ? 0.5 * (low + high) : high - (weightAbove * (high - low)) / (weightAbove - weightBelow);
    const off = Math.log(pressure(1 / u)) - aim;
    if (Math.abs(off) < 1e-13 || Math.abs(high - low) < 1e-14 * low) break;
    if (off > 0) {
      high = u;
      weightBelow = Math.sign(off) === Math.sign(above) && i > 0 ? weightBelow * 0.5 : below;
      weightAbove = above = off;
    } else {
      low = u;
      weightAbove = Math.sign(off) === Math.sign(below) && i > 0 ? weightAbove * 0.5 : above;
      weightBelow = below = off;
    }
  }
  return 1 / u;
}

const ofShare = (constants: readonly string[], law: (c: never) => (T: number, share: number) => number): PropertyModel => ({
  constants,
  make(c) {
    const f = law(c);
    return (s) => f(s.T, s.x);
  },
});

const foodParts = ['water?', 'protein?', 'fat?', 'carbohydrate?', 'fibre?', 'ash?'];

/** Correlations by the name that records use. */
export const propertyModels: { readonly [name: string]: PropertyModel } = {
  ...fluidModels,
  constant: { constants: ['value'], make: (c: { value: number }) => () => c.value },
  polynomial: ofTemperature(['terms', 'gives?', 'argument?', 'origin?', 'scale?'], laws.polynomial),
  powers: ofTemperature(['terms', 'gives?', 'argument?'], laws.powers),
  'log-powers': ofTemperature(['terms', 'log?', 'gives?', 'argument?'], laws.logPowers),
  'critical-powers': ofTemperature(['critical', 'terms', 'base?', 'gives?'], laws.criticalPowers),
  sutherland: ofTemperature(['value', 'T0', 'S'], laws.sutherland),
  andrade: ofTemperature(['A', 'B', 'gives?'], laws.andrade),
  vogel: ofTemperature(['A', 'B', 'C', 'gives?'], laws.vogel),
  table: ofTemperature(['rows', 'interpolate?', 'gives?', 'argument?'], laws.table),
  'reciprocal-polynomial': ofTemperature(['value', 'terms', 'origin?', 'gives?', 'argument?'], laws.reciprocalPolynomial),
  'saturation-powers': ofTemperature(['temperature', 'pressure', 'terms'], laws.saturationPowers),
  antoine: ofTemperature(['A', 'B', 'C', 'gives?', 'argument?'], laws.antoine),
  'mixture-polynomial': {
    constants: ['origin', 'share', 'rows', 'of?', 'gives?'],
    make(c: Parameters<typeof laws.mixturePolynomial>[0]) {
      const value = laws.mixturePolynomial(c);
      return (s) => value(Number.isNaN(s.T) ? c.origin : s.T, s.x);
    },
  },
  'aqueous-density': ofShare(['terms'], aqueous.solutionDensity),
  'aqueous-viscosity': ofShare(['terms'], aqueous.solutionViscosity),
  'aqueous-heat-capacity': ofShare(['terms'], aqueous.solutionHeatCapacity),
  'aqueous-conductivity': {
    constants: ['contribution', 'molarMass'],
    make: (c: { contribution: number; molarMass: number }, engine) => {
      const conductivity = aqueous.solutionConductivity(c, (T, x) => engine.value('density', { T, p: 101325, side: 'liquid', x }));
      return (s) => conductivity(s.T, s.x);
    },
  },
  'food-density': ofShare(foodParts, (c) => food(c).density),
  'food-conductivity': ofShare(foodParts, (c) => food(c).conductivity),
  'food-heat-capacity': ofShare(foodParts, (c) => food(c).heat),
  'glycerol-viscosity': ofShare([], () => aqueous.glycerolViscosity),
  'lowered-vapour-pressure': {
    constants: ['factor', 'temperature', 'pressure', 'terms'],
    make(c: { factor: number } & Parameters<typeof laws.saturationPowers>[0]) {
      const pressure = aqueous.loweredVapourPressure(c, laws.saturationPowers(c));
      return (s) => pressure(s.T, s.x);
    },
  },
  'ideal-vapour-pressure': {
    constants: ['molarMass', 'particles'],
    make(c: Parameters<typeof aqueous.idealVapourPressure>[0], engine) {
      const water = engine.partner('water');
      const pressure = aqueous.idealVapourPressure(c, (T) => water.saturation(T));
      return (s) => pressure(s.T, s.x);
    },
  },
  'boils-above': {
    constants: ['of', 'less'],
    make(c: { of: string; less: number }, engine) {
      const lightest = engine.partner(c.of);
      return (s) => lightest.value('saturationTemperature', s) - c.less;
    },
  },
  'vapour-below': {
    constants: ['of', 'less'],
    make(c: { of: string; less: number }, engine) {
      const lightest = engine.partner(c.of);
      return (s) => lightest.saturation(s.T + c.less);
    },
  },
  'boiling-point': {
    constants: ['from', 'to'],
    make(c: { from: number; to: number }, engine) {
      return (s) => {
        const pressure = (T: number): number => engine.value('vapourPressure', { T, p: s.p, side: 'liquid', x: s.x });
        return s.p < pressure(c.from) || s.p > pressure(c.to) ? Number.NaN : boilingTemperature(pressure, s.p, c.from, c.to);
      };
    },
  },
  'wiedemann-franz': { constants: ['lorenz'], make: (c: { lorenz: number }, engine) => (s) => engine.value('thermalConductivity', s) / (c.lorenz * s.T) },
  henry: {
    constants: ['A', 'B', 'C', 'critical'],
    make(c: HenryConstants, engine) {
      const constant = henry(c, (T) => engine.value('vapourPressure', { T, p: 101325, side: 'liquid', x: Number.NaN }));
      return (s) => constant(s.T);
    },
  },
  power: ofTemperature(['value', 'exponent', 'gives?', 'argument?'], laws.power),
  'kinematic-vogel': {
    constants: ['A', 'B', 'C', 'gives?'],
    make(c: Parameters<typeof laws.vogel>[0], engine) {
      const nu = laws.vogel(c);
      return (s) => nu(s.T) * engine.value('density', s);
    },
  },
  walther: {
    constants: ['T1', 'nu1', 'T2', 'nu2'],
    make(c: Parameters<typeof laws.walther>[0], engine) {
      const nu = laws.walther(c);
      return (s) => nu(s.T) * engine.value('density', s);
    },
  },
  'ice-melting-line': {
    constants: ['temperature', 'pressure', 'terms'],
    make(c: Parameters<typeof laws.iceMeltingLine>[0]) {
      const melting = laws.iceMeltingLine(c);
      return (s) => melting(s.p);
    },
  },
  'water-viscosity': {
    constants: ['H0', 'H1', 'A'],
    make(c: WaterViscosityConstants, engine) {
      const viscosity = waterViscosity(c);
      return (s) => {
        const { density, compressibility } = engine.point(s);
        // Farther from the critical point the factor differs from 1 by less than 0.1 %.
        const near = s.T > 620 && s.T < 700 && density > 100 && density < 600;
        return viscosity(s.T, density) * (near ? waterCriticalFactor({ temperature: s.T, density, compressibility, A: c.A }) : 1);
      };
    },
  },
  'water-conductivity': {
    constants: ['L0', 'L1', 'A'],
    make(c: WaterConductivityConstants, engine) {
      let sample: Sample;
      const conductivity = waterConductivity(c, () => engine.value('viscosity', sample));
      return (s) => {
        sample = s;
        return conductivity(engine.point(s), engine.equation.gasConstant);
      };
    },
  },
  'gas-viscosity': {
    constants: ['molarMass', 'epsilon', 'sigma', 'temperature', 'density', 'terms'],
    make(c: GasViscosityConstants, engine) {
      const viscosity = lemmonJacobsenViscosity(c);
      return (s) => viscosity(s.T, engine.point(s).density);
    },
  },
  'gas-conductivity': {
    constants: ['molarMass', 'epsilon', 'sigma', 'temperature', 'density', 'dilute', 'terms', 'critical'],
    make(c: GasConductivityConstants, engine) {
      let sample: Sample;
      const conductivity = lemmonJacobsenConductivity(c, { viscosity: () => engine.value('viscosity', sample), equation: engine.equation });
      return (s) => {
        sample = s;
        return conductivity(engine.point(s));
      };
    },
  },
  'carbon-dioxide-viscosity': {
    constants: ['dilute', 'virial', 'epsilon', 'sigma', 'dense', 'triple', 'molarMass'],
    make(c: CarbonDioxideViscosityConstants, engine) {
      const viscosity = carbonDioxideViscosity(c);
      return (s) => viscosity(s.T, engine.point(s).density);
    },
  },
  'carbon-dioxide-conductivity': {
    constants: ['dilute', 'dense', 'temperature', 'density', 'critical'],
    make(c: CarbonDioxideConductivityConstants, engine) {
      let sample: Sample;
      const conductivity = carbonDioxideConductivity(c, { viscosity: () => engine.value('viscosity', sample), equation: engine.equation });
      return (s) => {
        sample = s;
        return conductivity(engine.point(s));
      };
    },
  },
  'mixture-viscosity': { constants: [], make: (_c, engine) => (s) => (engine.at(s) as MoistGas).viscosity(s.T, s.p) },
  'mixture-conductivity': { constants: [], make: (_c, engine) => (s) => (engine.at(s) as MoistGas).conductivity(s.T, s.p) },
  'dew-point': { constants: [], make: (_c, engine) => (s) => (engine.at(s) as MoistGas).dewPoint(s.T, s.p) },
  'saturation-pressure': { constants: [], make: (_c, engine) => (s) => engine.saturation(s.T) },
  'saturation-temperature': {
    constants: [],
    make(_c, engine) {
      const line = lineOf(engine.equation);
      return (s) => line.boiling?.(s.p) ?? boilingTemperature((T) => line.bubble(T), s.p, line.from, line.to);
    },
  },
  'latent-heat': {
    constants: [],
    make(_c, engine) {
      const equation = engine.equation;
      return (s) => {
        const p = lineOf(equation).bubble(s.T);
        return equation.at(s.T, p, 'vapour').enthalpy - equation.at(s.T, p, 'liquid').enthalpy;
      };
    },
  },
};

/** Equations of state by the name that records use. */
export const equationModels: { readonly [name: string]: EquationModel } = {
  'water-if97': {
    constants: ['gasConstant', 'region1', 'region2', 'region2Ideal', 'region3', 'region3Log', 'region5', 'region5Ideal', 'boundary23', 'saturation', 'liquid', 'vapour', 'atmospheric', 'scientific'],
    make: (c: WaterConstants) => if97(c),
  },
  'humid-air': { constants: ['cross'], partners: ['air', 'water'], make: (c: Parameters<typeof humidAir>[0], partners, x) => humidAir(c, partners, x) },
  'sea-water': { constants: ['water', 'saline', 'density', 'heatCapacity'], partners: ['water'], make: (c: SeaWaterConstants, partners, x) => seaWater(c, partners, x) },
  'gas-mixture': { constants: ['shares'], partners: (c: { shares: object }) => Object.keys(c.shares), make: (c: Parameters<typeof gasMixture>[0], partners) => gasMixture(c, partners) },
  helmholtz: { constants: ['temperature', 'density', 'gasConstant', 'densest', 'ideal', 'residual', 'saturation?'], make: (c: HelmholtzConstants) => helmholtz(c) },
};
