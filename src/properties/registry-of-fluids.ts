import { conductivityOfDensity, type ConductivityOfDensityConstants } from './models/conductivity-of-density.ts';
import { correspondingConductivity, correspondingViscosity, type CorrespondingConductivityConstants, type CorrespondingViscosityConstants } from './models/corresponding-states.ts';
import { denseConductivity, denseViscosity, type CriticalPoint } from './models/dense-gas.ts';
import { entropyScaledViscosity, type EntropyScalingConstants } from './models/entropy-scaling.ts';
import { heavyWaterConductivity, heavyWaterViscosity, type HeavyWaterConstants } from './models/heavy-water-transport.ts';
import { heliumConductivity, heliumViscosity, type HeliumConductivityConstants, type HeliumViscosityConstants } from './models/helium-transport.ts';
import { meltingLine, type MeltingPiece } from './models/melting-line.ts';
import { methaneConductivity, type MethaneConductivityConstants } from './models/methane-conductivity.ts';
import { methanolViscosity, type MethanolViscosityConstants } from './models/methanol-viscosity.ts';
import { perfectGasDensity, perfectGasSound } from './models/perfect-gas.ts';
import * as ppds from './models/ppds.ts';
import * as saturated from './models/saturated-laws.ts';
import { viscosityOfDensity, type ViscosityOfDensityConstants } from './models/viscosity-of-density.ts';
import type { Engine, PropertyModel, Sample } from './sample.ts';

/** A law of T and density, at the density of the equation of state. */
const ofDensity = (constants: readonly string[], law: (c: never, engine: Engine) => (T: number, rho: number) => number): PropertyModel => ({
  constants,
  make(c, engine) {
    const f = law(c, engine);
    return (s) => f(s.T, engine.point(s).density);
  },
});

const ofTemperature = (constants: readonly string[], law: (c: never) => (T: number) => number): PropertyModel => ({
  constants,
  make(c) {
    const f = law(c);
    return (s) => f(s.T);
  },
});

/** What the density of a gas adds to the law of the thin one, which another entry of the record holds. */
const pressed = (property: 'viscosity' | 'thermalConductivity', added: (c: CriticalPoint, density: number) => number): PropertyModel => ({
  constants: [],
  make(_c, engine) {
    const { critical, molarMass } = engine;
    if (critical === undefined) throw new Error('a dense gas needs a critical point');
    const at = { ...critical, volume: molarMass / critical.density, molarMass };
    return (s) => engine.value(property, { T: s.T, p: thin, side: 'vapour', x: s.x }) + added(at, engine.point(s).density / critical.density);
  },
});

/** So low that every law of a thin gas holds [Pa]. */
const thin = 1000;

const shape = ['molarMass', 'critical', 'referenceCritical', 'referenceMolarMass', 'density', 'factor', 'dilute'];

/** Transport correlations and saturated-liquid laws of pure fluids, by the name that records use. */
export const fluidModels: { readonly [name: string]: PropertyModel } = {
  'viscosity-of-density': {
    constants: ['dilute', 'initial?', 'dense?'],
    make(c: ViscosityOfDensityConstants, engine) {
      const viscosity = viscosityOfDensity(c);
      return (s) => viscosity(engine.point(s), engine.equation.gasConstant);
    },
  },
  'conductivity-of-density': {
    constants: ['dilute', 'dense', 'critical?', 'criticalOf?'],
    make(c: ConductivityOfDensityConstants, engine) {
      let sample: Sample;
      const conductivity = conductivityOfDensity(c, { viscosity: () => engine.value('viscosity', sample), equation: engine.equation });
      return (s) => {
        sample = s;
        return conductivity(engine.point(s));
      };
    },
  },
  'corresponding-viscosity': ofDensity(['reference', ...shape], (c: CorrespondingViscosityConstants, engine) => {
    const reference = engine.partner(c.reference);
    return correspondingViscosity(c, { own: engine.equation, reference: reference.equation, constants: reference.constants('viscosity') as ViscosityOfDensityConstants });
  }),
  'corresponding-conductivity': {
    constants: ['reference', ...shape, 'inner', 'enhancement'],
    make(c: CorrespondingConductivityConstants, engine) {
      let sample: Sample;
      const reference = engine.partner(c.reference);
      const conductivity = correspondingConductivity(c, { own: engine.equation, reference: reference.equation, constants: reference.constants('thermalConductivity') as ConductivityOfDensityConstants, viscosity: () => engine.value('viscosity', sample) });
      return (s) => {
        sample = s;
        return conductivity(engine.point(s));
      };
    },
  },
  'entropy-scaling': ofDensity(['dilute', 'scale', 'factor', 'vapour', 'liquid', 'crossover'], (c: EntropyScalingConstants, engine) => {
    const { equation } = engine;
    if (equation.residual === undefined) throw new Error('entropy scaling needs an equation of state that gives the residual energy');
    const entropy = (T: number, rho: number): number => {
      const found = equation.residual?.(T, rho);
      return found === undefined ? Number.NaN : found.tau * found.t - found.a;
    };
    return entropyScaledViscosity(c, entropy, equation.gasConstant);
  }),
  'dense-gas-viscosity': pressed('viscosity', denseViscosity),
  'dense-gas-conductivity': pressed('thermalConductivity', denseConductivity),
  'helium-viscosity': ofDensity(['dilute', 'dense', 'warm', 'warmTerms'], (c: HeliumViscosityConstants) => heliumViscosity(c)),
  'helium-conductivity': {
    constants: ['dilute', 'diluteTerms', 'linear', 'cubic', 'logarithmic', 'density'],
    make(c: HeliumConductivityConstants, engine) {
      let sample: Sample;
      const conductivity = heliumConductivity(c, () => engine.value('viscosity', sample));
      return (s) => {
        sample = s;
        return conductivity(engine.point(s));
      };
    },
  },
  'methanol-viscosity': ofDensity(['molarMass', 'temperature', 'density', 'epsilon', 'sigma', 'sigmaDense', 'polar', 'omega', 'second', 'third', 'ofTemperature', 'ofDensity'], (c: MethanolViscosityConstants) => methanolViscosity(c)),
  'methane-conductivity': {
    constants: ['temperature', 'density', 'viscosity', 'eucken', 'dense', 'saturated', 'factor', 'vapour'],
    make(c: MethaneConductivityConstants, engine) {
      const conductivity = methaneConductivity(c, engine);
      return (s) => conductivity(engine.point(s));
    },
  },
  'heavy-water-viscosity': ofDensity(['temperature', 'density', 'dilute', 'dense', 'unit'], (c: HeavyWaterConstants) => heavyWaterViscosity(c)),
  'heavy-water-conductivity': ofDensity(['temperature', 'density', 'dilute', 'dense', 'unit'], (c: HeavyWaterConstants) => heavyWaterConductivity(c)),
  'melting-line': {
    constants: ['pieces'],
    make(c: { pieces: readonly MeltingPiece[] }) {
      const melting = meltingLine(c);
      return (s) => melting(s.p);
    },
  },
  'perfect-gas-density': {
    constants: ['molarMass'],
    make(c: { molarMass: number }) {
      const density = perfectGasDensity(c.molarMass);
      return (s) => density(s.T, s.p);
    },
  },
  'perfect-gas-sound': {
    constants: ['molarMass'],
    make(c: { molarMass: number }, engine) {
      const sound = perfectGasSound(c.molarMass);
      return (s) => sound(s.T, engine.value('specificHeatCapacity', s));
    },
  },
  rackett: ofTemperature(['A', 'B', 'C', 'D', 'gives?'], saturated.rackett),
  'reduced-power': ofTemperature(['critical', 'A', 'terms', 'gives?'], saturated.reducedPower),
  'gas-powers': ofTemperature(['A', 'B', 'C', 'D', 'gives?'], saturated.gasPowers),
  'ppds-2': ofTemperature(['low', 'high', 'scale', 'terms', 'gives?'], ppds.ppdsGasHeat),
  'ppds-3': ofTemperature(['critical', 'terms', 'gives?'], ppds.ppdsGasConductivity),
  'ppds-5': ofTemperature(['critical', 'A', 'B', 'C', 'gives?'], ppds.ppdsGasViscosity),
  'ppds-17': ofTemperature(['critical', 'A', 'B', 'C', 'gives?'], ppds.ppdsLiquidDensity),
  'liquid-viscosity': ofTemperature(['A', 'B', 'C', 'D', 'E', 'gives?'], saturated.liquidViscosity),
};
