import { describe, expect, it } from 'vitest';
import { flows, type Flow } from '../../src/flows/index.ts';
import { referenceNumber, references, type Reference } from '../../src/references/index.ts';
import { workingsOf } from '../flows/harness.ts';
import { numberOf } from './effects.harness.ts';

const flow = (id: string): Flow => flows[id] as Flow;
const pipe = (given: Readonly<Record<string, number | string>>, id: string): number => workingsOf(flow('pipe'), { energySolved: 'no', regime: 'laminar', ...given }).get(id) ?? Number.NaN;
const graetz = (number: number): number => referenceNumber(references.find((r) => r.id === 'graetz-pipe') as Reference, 'nusselt', { graetz: number, peclet: 1e9 })?.value ?? Number.NaN;

describe('a thin layer in a laminar pipe', () => {
  // Before, the factor of the entrance was 1 above Gz = 1e4: Nu 3.66 in place of 42.8 at 2e4.
  it.each([2e4, 1e6])('heat at Gz = %d', (gz) => {
    const ours = pipe({ energySolved: 'yes', wallKind: 'temperature', graetz: gz, prandtlBulk: 100 }, 'nusseltPlain') * pipe({ energySolved: 'yes', wallKind: 'temperature', graetz: gz, prandtlBulk: 100 }, 'entranceFactorNusselt');
    expect(Math.abs(ours / graetz(gz) - 1)).toBeLessThan(0.01);
  });
  it.each([20, 5e3, 2e4, 1e6])('a species at Gz_m = %d', (gz) => {
    const ours = pipe({ graetzMass: gz, schmidtBulk: 1000, wallKind: 'adiabatic' }, 'sherwood');
    expect(Math.abs(ours / graetz(gz) - 1)).toBeLessThan(0.03);
  });
});

describe('heat and mass by one law', () => {
  const given = { density: 1, viscosity: 2e-5, specificHeatCapacity: 1000, thermalConductivity: 0.025, energySolved: 'yes', wallKind: 'temperature', heatDirection: 'heating' };
  // Pr = 0.8: a species of the same Schmidt number has the same number, on every flow in a stream.
  it.each([
    ['pipe', { 'sizes.diameter': 0.05, 'sizes.length': 2, 'inlet.speed': 0.3, regime: 'laminar' }],
    ['pipe', { 'sizes.diameter': 0.05, 'sizes.length': 2, 'inlet.speed': 20, regime: 'turbulent' }],
    ['duct', { 'sizes.width': 0.1, 'sizes.height': 0.05, 'sizes.length': 2, 'inlet.speed': 20, regime: 'turbulent' }],
    ['plate', { 'sizes.length': 0.5, 'sizes.width': 0.2, 'inlet.speed': 3, plateSetting: 'stream', regime: 'laminar' }],
    ['cylinder', { 'sizes.diameter': 0.02, 'inlet.speed': 5, regime: 'laminar' }],
    ['packed-bed', { 'sizes.particleDiameter': 0.004, 'sizes.bedDiameter': 0.1, 'sizes.length': 0.5, 'packing.voidFraction': 0.4, 'inlet.speed': 0.5 }],
  ] as const)('%s', (id, of) => {
    const { regime, ...rest } = of as Readonly<Record<string, number | string>>;
    const w = workingsOf(flow(id), { ...given, ...(regime === undefined ? {} : { regime }), imposedFlow: 'yes', inletTemperature: 300, wallTemperature: 300, bulkTemperature: 300, filmTemperature: 300, pressure: 1e5, diffusivity: 2.5e-5, ...rest });
    const heat = w.get('nusseltPlain');
    expect(heat).toBeGreaterThan(1);
    expect(w.get('sherwoodPlain')).toBeCloseTo(heat as number, 8);
  });
});

describe('what passes a wall', () => {
  // Film theory, F = ln(1 + B)/dY: Spalding 1963; -1.0, -4.6, -8.6, -17.8, -27.9 % without it.
  it.each([[0.02, -0.01], [0.1, -0.046], [0.2, -0.086], [0.5, -0.178], [1, -0.279]])('B = %d', (b, price) => {
    const share = b / (1 + b);
    const of = { massFractionWall: share, massFractionInlet: 0, wallShareGiven: 'yes' };
    expect(numberOf(of, 'spaldingNumber')).toBeCloseTo(b, 12);
    expect(1 / numberOf(of, 'stefanFactorFlux') - 1).toBeCloseTo(price, 3);
  });
  it('without a share at the wall nothing passes', () => {
    expect(numberOf({ wallShareGiven: 'no' }, 'wallMassFlux')).toBe(0);
    expect(numberOf({ wallShareGiven: 'no', massFractionInlet: 0.3, reactionFactorOf: 0.25, flowClass: 'internal' }, 'outletMassFraction')).toBeCloseTo(0.075, 12);
  });
  it('a passage long enough leaves with the share of its wall, a reaction takes from both', () => {
    const of = { wallShareGiven: 'yes', massFractionInlet: 0.01, massFractionWall: 0.05, flowClass: 'internal' };
    expect(numberOf({ ...of, massTransferUnits: 60, damkohlerOf: 0 }, 'outletMassFraction')).toBeCloseTo(0.05, 12);
    expect(numberOf({ ...of, massTransferUnits: 0, damkohlerOf: 2 }, 'outletMassFraction')).toBeCloseTo(0.01 * Math.exp(-2), 12);
    expect(numberOf({ ...of, massTransferUnits: 30, damkohlerOf: 30 }, 'outletMassFraction')).toBeCloseTo(0.025, 10);
  });
});

describe('weight by composition', () => {
  it('a vapour lighter than air rises, a heavier one sinks', () => {
    const of = { medium: 'gas', massFractionInlet: 0, massFractionWall: 0.01, molarMass: 0.02897 };
    // d ln(rho)/dY = M (1/M_B - 1/M_A) for little of A.
    expect(numberOf({ ...of, speciesMolarMass: 0.018015 }, 'solutalDensityShift')).toBeCloseTo(-0.01 * (0.02897 / 0.018015 - 1), 4);
    expect(numberOf({ ...of, speciesMolarMass: 0.0461 }, 'solutalDensityShift')).toBeCloseTo(0.01 * (1 - 0.02897 / 0.0461), 4);
  });
  it('acts against heat where a warm wall gives off a heavy species', () => {
    const of = { solutalDensityShift: 0.01, thermalExpansion: 1 / 300, farTemperature: 300 };
    expect(numberOf({ ...of, wallTemperature: 310 }, 'buoyancyRatio')).toBeCloseTo(-0.3, 12);
    expect(numberOf({ ...of, wallTemperature: 290 }, 'buoyancyRatio')).toBeCloseTo(0.3, 12);
  });
});

describe('reactions', () => {
  it('a rate constant follows Arrhenius: 50 kJ/mol doubles from 298 to 308 K', () => expect(numberOf({ activationEnergy: 50e3, rateTemperature: 298.15, bulkTemperature: 308.15 }, 'arrheniusFactor')).toBeCloseTo(1.92, 2));
  it('second order counts on the concentration at the inlet', () => expect(numberOf({ rateConstantGiven: 2e-3, arrheniusFactor: 1, reactantConcentration: 50, reactionOrder: 2, rateKind: 'volume' }, 'rateConstant')).toBeCloseTo(0.1, 12));
  it('resistances of a surface stand in series', () => expect(numberOf({ damkohlerWall: 0.2 }, 'wallReactionFactor')).toBeCloseTo(1 / 1.2, 12));
  // Levenspiel's landmarks: enhancement 1.030, 1.313, 3.015 at Ha 0.3, 1, 3.
  it.each([[0.3, 1.03], [1, 1.313], [3, 3.015]])('Ha = %d enhances absorption %d times', (hatta, enhancement) => expect(numberOf({ hatta }, 'enhancement')).toBeCloseTo(enhancement, 3));
  it('stands at the brink where Psi = 1/e', () => {
    // q = k c (-dH), loss h S/V = 4 h/D: chosen so that Psi = q E/(R T^2 4 h/D) = 1/e.
    const [t, e, h, d] = [400, 8e4, 100, 0.02];
    const heat = (8.31446261815324 * t ** 2 * 4 * h) / (d * e * Math.E);
    expect(numberOf({ rateConstantHot: 1e-3, reactantConcentration: 1000, reactionEnthalpy: -heat, activationEnergy: e, highestTemperature: t, heatTransferCoefficientPlain: h, hydraulicDiameter: d, reactionWhere: 'fluid', enthalpyPer: 'mole', flowClass: 'internal', wallKind: 'temperature' }, 'semenovOverCritical')).toBeCloseTo(1, 10);
  });
});
