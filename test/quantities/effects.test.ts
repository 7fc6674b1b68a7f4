import { describe, expect, it } from 'vitest';
import { findReference } from '../../src/references/index.ts';
import { jacksonFactor, uprightLaminar } from '../../src/quantities/index.ts';
import { loadMaterial, laws as lawsOf } from '../../src/properties/index.ts';
import { flows } from '../../src/flows/index.ts';
import { workingsOf } from '../flows/harness.ts';
import { given, numberOf } from './effects.harness.ts';

type Values = Readonly<Record<string, number | string>>;
interface Row { readonly id: string; readonly of: Values; readonly value: number; readonly rtol: number; readonly source: string }

const pipe = { flowClass: 'internal', imposedFlow: 'yes', energySolved: 'yes', ductSection: 'round', fluidGiven: 'material' } as const;
const laminarUp = { ...pipe, regime: 'laminar', axis: 'upright' } as const;
const turbulentUp = { ...pipe, regime: 'turbulent', axis: 'upright' } as const;
const airPlate = { flowClass: 'body', flow: 'plate', imposedFlow: 'yes', energySolved: 'yes', axis: 'upright', prandtlFilm: 0.72 } as const;
const liquid = { ...pipe, medium: 'liquid' } as const;
const gas = { ...pipe, medium: 'gas' } as const;

/** Numbers of an air plate at a Richardson number, Re = 1e4, Pr = 0.72; the forced part 0.664 Re^(1/2) Pr^(1/3). */
const plateAt = (richardson: number, sense: 1 | -1): Values => ({ ...airPlate, rayleighFilm: richardson * 1e8 * 0.72, nusseltPlain: 0.664 * 100 * Math.cbrt(0.72), buoyancySense: sense });

const spectral = 'linear balance of momentum and heat, solved by Chebyshev collocation with numpy';
const exact = 'developed profile with viscosity exponential in temperature, uniform flux, integrated with numpy';
const brent = 'the relation itself, roots by scipy brentq';
const hand = 'worked by hand from the definition';
const rows: readonly Row[] = [
  // Onset.
  { id: 'turbulenceFactorFriction', of: { frictionTurbulent: 0.04354, frictionLaminar: 64 / 3000 }, value: 2.04, rtol: 2e-3, source: 'Colebrook, smooth, at Re 3000 by scipy: 0.04354, over 64/3000' },
  { id: 'transitionReynolds', of: { flowClass: 'body', imposedFlow: 'yes', 'inlet.turbulence.intensity': 0.01 }, value: 641220.2, rtol: 1e-6, source: 'numpy evaluation of the law of Abu-Ghannam and Shaw 1980 at Tu 1 %' },
  { id: 'transitionReynolds', of: { flowClass: 'body', imposedFlow: 'yes', 'inlet.turbulence.intensity': 0.03 }, value: 102804.2, rtol: 1e-6, source: 'numpy evaluation of the law of Abu-Ghannam and Shaw 1980 at Tu 3 %' },
  { id: 'laminarShare', of: { flowClass: 'body', imposedFlow: 'no', rayleigh: 8e9 }, value: 0.5, rtol: 1e-12, source: hand },
  ...([[1e6, 0.639], [3e6, 0.8534], [1e7, 0.94627]] as const).map(([reynolds, value]) => ({ id: 'transitionFactorFriction', of: { flowClass: 'body', imposedFlow: 'yes', reynolds }, value, rtol: 2e-4, source: 'mixed plate with Re_tr 5e5: laminar 1.328/sqrt(Re), turbulent 0.455/log10(Re)^2.58, numpy' })),
  // Buoyancy in upright passages, laminar.
  ...([[-400, 0.73965, 0.05127], [-100, 0.93809, 0.79602], [-20, 0.9878, 0.96061], [100, 1.0596, 1.18754], [400, 1.22441, 1.67336], [1000, 1.49618, 2.41919]] as const).flatMap(([ratio, heat, shear]) => [
    { id: 'buoyancyFactorNusselt', of: { ...laminarUp, grashofFluxOverReynolds: ratio }, value: heat, rtol: 1e-5, source: spectral },
    { id: 'buoyancyFactorShear', of: { ...laminarUp, grashofFluxOverReynolds: ratio }, value: shear, rtol: 1e-5, source: spectral },
  ]),
  // Turbulent, upright: opposing, helping near one, helping beyond the fold.
  ...([[-6e-7, 1.020927], [-3e-6, 1.088545], [6e-7, 0.976522], [3.5e-6, 0.482098], [5e-6, 0.558588], [1e-5, 0.729413], [3e-5, 1.060149]] as const).map(([jacksonBuoyancy, value]) => ({ id: 'buoyancyFactorNusselt', of: { ...turbulentUp, jacksonBuoyancy }, value, rtol: 1e-6, source: brent })),
  // Level passages.
  { id: 'buoyancyHorizontalLaminar', of: { ...pipe, rayleighAcross: 270, graetz: 1 }, value: 0.06, rtol: 0.01, source: 'long tube: s_h = 0.06 at Ra_D = (0.06 9.15/0.0083)^(4/3) = 269' },
  { id: 'buoyancyHorizontalLaminar', of: { ...pipe, rayleighAcross: 2300, graetz: 1 }, value: 0.3, rtol: 0.01, source: 'long tube: s_h = 0.3 at Ra_D = 2301' },
  { id: 'buoyancyHorizontalLaminar', of: { ...pipe, rayleighAcross: 1e5, graetz: 100 }, value: (0.0083 * 5623.4133) / 78.5398, rtol: 1e-6, source: 'short tube, worked by hand' },
  { id: 'grashofFluxLimit', of: { ...pipe, reynoldsBulk: 22650.176, prandtlBulk: 2.7634138 }, value: 7.8610293e7, rtol: 1e-6, source: 'numpy evaluation; water of 65 degC from the package iapws, 25 mm, 0.4 m/s' },
  { id: 'grashofFluxOverLimit', of: { ...pipe, grashofFlux: -2.1948295e9, inclination: 0, grashofFluxLimit: 7.8610293e7 }, value: 27.92, rtol: 1e-3, source: 'the same water against a wall of 20 degC: level with a Richardson number of 0.04' },
  // Bodies: sums of Churchill for air on an upright plate.
  ...([[0.1, 1, 1.0291731], [0.1, -1, 0.9690175], [0.3, 1, 1.0642436], [0.3, -1, 0.926233], [1, 1, 1.1464046], [1, -1, 0.7901634]] as const).map(([ri, sense, value]) => ({ id: 'buoyancyFactorNusselt', of: plateAt(ri, sense), value, rtol: 1e-6, source: 'Churchill 1977 with n = 3, numpy; by (1 +- 0.507 Ri^(3/4))^(1/3) within 0.1 %' })),
  { id: 'conductionRayleigh', of: { flowClass: 'enclosure', passageHeight: 0.4, gap: 0.02 }, value: 8e7, rtol: 1e-12, source: `${hand}: Ra_W = 500 H/W = 1e4 and Ra_H = Ra_W (H/W)^3` },
  { id: 'stratificationFactorViscosity', of: { gradientRichardson: 0.1 / 0.85 }, value: 1 / Math.SQRT2, rtol: 1e-9, source: 'Munk and Anderson 1948 at Ri_g = 0.1' },
  // Density.
  { id: 'densityChange', of: { energySolved: 'yes', fluidGiven: 'material', densityHot: 0.9, densityCold: 1.1 }, value: 0.2, rtol: 1e-12, source: hand },
  { id: 'densityChange', of: { energySolved: 'yes', fluidGiven: 'constants', thermalExpansion: -2e-4, highestTemperature: 310, lowestTemperature: 300 }, value: 2e-3, rtol: 1e-12, source: hand },
  // Viscosity: the short laws against the exact profile, mu_w/mu_b 0.5, 0.8, 1.25, 2; the law states 3 %.
  ...([[0.5, 1.1029, 0.6789], [0.8, 1.0332, 0.8847], [1.25, 0.9669, 1.1286], [2, 0.8987, 1.4506]] as const).flatMap(([wallOverBulk, heat, friction]) => [
    { id: 'viscosityFactorNusselt', of: { ...liquid, regime: 'laminar', viscosityBulkOverWall: 1 / wallOverBulk }, value: heat, rtol: 0.02, source: exact },
    { id: 'viscosityFactorFriction', of: { ...liquid, regime: 'laminar', viscosityBulkOverWall: 1 / wallOverBulk }, value: friction, rtol: 0.02, source: exact },
  ]),
  { id: 'viscosityFactorNusselt', of: { ...liquid, regime: 'turbulent', viscosityBulkOverWall: 2 }, value: 1.0792, rtol: 1e-4, source: 'Petukhov 1970, 2^0.11' },
  { id: 'viscosityFactorNusselt', of: { ...liquid, regime: 'turbulent', viscosityBulkOverWall: 0.5 }, value: 0.8409, rtol: 1e-4, source: 'Petukhov 1970, 0.5^0.25' },
  { id: 'viscosityFactorFriction', of: { ...liquid, regime: 'turbulent', viscosityBulkOverWall: 2 }, value: 5 / 6, rtol: 1e-12, source: 'Petukhov 1970, (7 - 2)/6' },
  { id: 'viscosityFactorFriction', of: { ...liquid, regime: 'turbulent', viscosityBulkOverWall: 0.5 }, value: 1.181, rtol: 1e-3, source: 'Petukhov 1970, 2^0.24' },
  { id: 'viscosityFactorFriction', of: { ...gas, regime: 'laminar', temperatureBulkOverWall: 1 / 1.3 }, value: 1.3, rtol: 1e-12, source: 'Kays and Crawford, exponent 1, from memory' },
  { id: 'viscosityFactorNusselt', of: { ...gas, regime: 'turbulent', temperatureBulkOverWall: 0.7 }, value: 0.8517, rtol: 1e-4, source: 'Gnielinski 1976, 0.7^0.45' },
  { id: 'viscosityFactorNusselt', of: { ...gas, regime: 'turbulent', temperatureBulkOverWall: 1.3 }, value: 1, rtol: 0, source: 'cooled gas' },
  // Heat of friction: tube with uniform flux, bulk temperature by quadrature of the profile.
  ...([[0.01, 0.9581882], [0.1, 0.6962025], [-0.05, 1.2790698]] as const).map(([brinkmanFlux, value]) => ({ id: 'viscousHeatingFactorNusselt', of: { ...pipe, regime: 'laminar', brinkmanFlux }, value, rtol: 1e-6, source: 'energy balance of the developed tube with dissipation, scipy quadrature' })),
  { id: 'mixedRise', of: { flowClass: 'internal', pressureDropPlain: 1e5, density: 1000, specificHeatCapacity: 4186 }, value: 0.02389, rtol: 1e-3, source: 'water: 1 bar of friction warms it by 0.024 K, worked by hand' },
  { id: 'pressureWorkRise', of: { thermalExpansion: 1 / 300, referenceTemperature: 300, mixedRise: -7 }, value: -7, rtol: 1e-12, source: 'ideal gas: beta T = 1, so that both rises cancel in a throttle' },
  // Radiation: plate of 60 degC in surroundings of 20 degC with emissivity 0.9 and h = 3.962.
  { id: 'radiationShare', of: { flowClass: 'body', transparency: 'transparent', energySolved: 'yes', emissivity: 0.9, wallTemperature: 333.15, farTemperature: 293.15, surroundingsTemperature: 293.15, heatTransferCoefficientPlain: 3.962 }, value: 0.6136964, rtol: 1e-6, source: 'numpy; h_r = 6.294' },
  { id: 'radiativeFlux', of: { flowClass: 'enclosure', transparency: 'transparent', energySolved: 'yes', hottestWall: 350, coldestWall: 300, exchangeEmissivity: 1 / (1 / 0.8 + 1 / 0.6 - 1) }, value: 204.31838, rtol: 1e-7, source: 'two gray plates, numpy' },
  { id: 'outerRadiationCoefficient', of: { wallKind: 'coefficient', emissivity: 0.9, wallTemperature: 420, surroundingsTemperature: 288, wallResistance: 0.02, outerCoefficient: 9, outerAreaRatio: 1.3 }, value: 7.7485869, rtol: 1e-7, source: 'outer face by scipy brentq: 379.956 K' },
  { id: 'gasRadiationShare', of: { flowClass: 'internal', opticalThickness: 0.0225, bulkTemperature: 1500, wallTemperature: 800, convectiveFluxPlain: -8400 }, value: 0.4113543, rtol: 1e-6, source: 'burner tube, numpy' },
  { id: 'gasRadiationShare', of: { flowClass: 'internal', opticalThickness: 6.49963e-4, bulkTemperature: 1500, wallTemperature: 800, convectiveFluxPlain: -8400 }, value: 0.02, rtol: 1e-5, source: 'the thickness at which the share is 2 %, scipy brentq' },
  { id: 'emissionFluctuationFactor', of: { temperatureFluctuation: 0.2 }, value: 1.24, rtol: 1e-12, source: 'T^4 to second order' },
];

describe('effects against numbers worked out elsewhere', () => {
  it.each(rows)('$id = $value ($source)', ({ id, of, value, rtol }) => {
    const got = numberOf(of, id);
    expect(Math.abs(got - value), `${got}`).toBeLessThanOrEqual(rtol * Math.abs(value));
  });
});

describe('the table of the upright tube', () => {
  const reference = findReference('mixed-convection-pipe');
  it('stays within 0.0005 of the power series of the reference between its rows', () => {
    const of = (id: string, ratio: number): number => reference.values.find((v) => v.id === id)?.value({ grashofFluxOverReynolds: ratio }) as number;
    for (let ratio = -400; ratio <= 1000; ratio += 12.5) {
      const { nusselt, shear } = uprightLaminar({ ratio });
      expect(Math.abs(nusselt - of('nusseltFactor', ratio)), `Nu at ${ratio}`).toBeLessThan(5e-4);
      expect(Math.abs(shear - of('wallShearFactor', ratio)), `tau at ${ratio}`).toBeLessThan(5e-4);
    }
  });
  it('is flagged outside its rows', () => {
    const w = given({ ...laminarUp, grashofFluxOverReynolds: 5000 });
    expect(w.get('buoyancyFactorNusselt')).toBeCloseTo(1.49618, 9);
    expect(w.outside(w.index.get('buoyancyFactorNusseltLaw') as number)).toHaveLength(1);
  });
});

describe('turbulent flow that buoyancy helps', () => {
  it.each([[2e-6, 0.377871, 0.904811], [3e-6, 0.451467, 0.812137]])('has two states at %d (roots by scipy brentq)', (buoyancy, low, high) => {
    const found = jacksonFactor({ buoyancy });
    expect(found.low).toBeCloseTo(low, 6);
    expect(found.high).toBeCloseTo(high, 6);
    expect(found.value).toBeCloseTo(Math.sqrt(low * high), 6);
  });
  it('keeps both states until the fold at 3.3087e-6 and one beyond', () => {
    const [before, beyond] = [jacksonFactor({ buoyancy: 3.3086e-6 }), jacksonFactor({ buoyancy: 3.3088e-6 })];
    expect(before.high).toBeGreaterThan(before.low);
    expect(before.high).toBeCloseTo(0.7129, 2);
    expect(beyond.high).toBe(beyond.low);
  });
  it('fulfils its relation in every state', () => {
    for (const buoyancy of [-1e-4, -1e-6, 1e-9, 1e-6, 2.5e-6, 4e-6, 1e-4]) for (const f of Object.values(jacksonFactor({ buoyancy })).slice(1)) expect(Math.abs(1 - (8e4 * buoyancy) / f ** 2) ** 0.46 / f).toBeCloseTo(1, 9);
  });
});

describe('factors where their cause fades', () => {
  const fading: readonly (readonly [string, Values])[] = [
    ['buoyancyFactorNusselt', { ...laminarUp, grashofFluxOverReynolds: 0 }],
    ['buoyancyFactorShear', { ...laminarUp, grashofFluxOverReynolds: 0 }],
    ['buoyancyFactorNusselt', { ...turbulentUp, jacksonBuoyancy: 0 }],
    ['buoyancyFactorNusselt', { ...pipe, regime: 'laminar', axis: 'level', buoyancyHorizontalLaminar: 0 }],
    ['buoyancyFactorNusselt', plateAt(1e-9, 1)],
    ...(['laminar', 'transitional', 'turbulent'] as const).flatMap((regime) => (['viscosityFactorNusselt', 'viscosityFactorFriction'] as const).flatMap((id) => [[id, { ...liquid, regime, viscosityBulkOverWall: 1 }], [id, { ...gas, regime, temperatureBulkOverWall: 1 }]] as const)),
    ['viscousHeatingFactorNusselt', { ...pipe, regime: 'laminar', brinkmanFlux: 0 }],
    ['densityFactorFlow', { densityChange: 0 }],
    ['nonlinearDensityFactorNusselt', { imposedFlow: 'no', regime: 'laminar', expansionChange: 0 }],
    ['conductivityFactorHeat', { thermalConductivityHot: 0.6, thermalConductivityCold: 0.6 }],
    ['radiationFactorHeat', { transparency: 'transparent', energySolved: 'yes', radiationShare: 0 }],
    ['gasRadiationFactorHeat', { gasRadiationShare: 0 }],
  ];
  it.each(fading)('%s goes to 1', (id, of) => expect(numberOf(of, id)).toBeCloseTo(1, 6));
  it.each(['viscosityFactorFriction', 'viscosityFactorNusselt', 'buoyancyFactorNusselt', 'buoyancyFactorShear', 'viscousHeatingFactorNusselt', 'radiationFactorHeat', 'densityFactorFlow'])('%s is 1 where nothing is known', (id) => expect(numberOf({}, id)).toBe(1));
});

describe('signs of buoyancy', () => {
  const q = { ...pipe, wallKind: 'flux', gravity: 9.81, length: 0.02, thermalConductivityBulk: 0.6, kinematicViscosityBulk: 1e-6, reynoldsBulk: 1000, prandtlBulk: 5 };
  it.each([
    ['heating, upward', 1000, 2e-4, Math.PI / 2, 1],
    ['heating, downward', 1000, 2e-4, -Math.PI / 2, -1],
    ['cooling, downward', -1000, 2e-4, -Math.PI / 2, 1],
    ['heating, upward, below the density maximum', 1000, -2e-4, Math.PI / 2, -1],
  ])('%s', (_, wallHeatFlux, thermalExpansionBulk, inclination, sign) => {
    const of = { ...q, wallHeatFlux, thermalExpansionBulk, inclination };
    expect(numberOf(of, 'grashofFluxOverReynolds') / sign).toBeCloseTo((9.81 * 2e-4 * 1000 * 0.02 ** 4) / (0.6 * 1e-12 * 1000), 9);
    expect(Math.sign(numberOf(of, 'jacksonBuoyancy'))).toBe(sign);
  });
  it('the flux of a wall with given temperature is that of the plain Nusselt number', () => {
    const of = { ...q, wallKind: 'temperature', wallTemperature: 310, bulkTemperature: 300, thermalExpansionBulk: 3e-4, nusseltPlain: 4, inclination: Math.PI / 2 };
    expect(numberOf(of, 'grashofFlux')).toBeCloseTo((9.81 * 3e-4 * 10 * 4 * 0.02 ** 3) / 1e-12, 3);
  });
});

describe('limits of the linear density law, Gray and Giorgini 1976', () => {
  const water = lawsOf(loadMaterial('water'), { temperature: 288.15, pressure: 101325 }).law('thermalExpansion') as (t: number, p: number) => number;
  const law = Object.assign(water, { uncertainty: () => 0 });
  const at = (temperatureDifference: number, t = 288.15): number => given({ energySolved: 'yes', fluidGiven: 'material', referenceTemperature: t, temperatureDifference, pressure: 101325 }, { thermalExpansion: law }).get('expansionChange') as number;
  it('water of 15 degC reaches 0.1 at 1.279 K (d ln beta/dT = 0.0782 1/K by the package iapws; the paper prints 1.25 K)', () => expect(at(1.2788)).toBeCloseTo(0.1, 3));
  it('an ideal gas has dT/T', () => {
    const ideal = Object.assign((t: number) => 1 / t, { uncertainty: () => 0 });
    expect(given({ energySolved: 'yes', fluidGiven: 'material', referenceTemperature: 300, temperatureDifference: 30, pressure: 1e5 }, { thermalExpansion: ideal }).get('expansionChange')).toBeCloseTo(0.1, 6);
  });
  it('the sign of the slope tells a maximum between', () => {
    expect(numberOf({ thermalExpansionCold: water(274.15, 101325), thermalExpansionHot: water(283.15, 101325) }, 'expansionSign')).toBeLessThan(0);
    expect(numberOf({ thermalExpansionCold: water(283.15, 101325), thermalExpansionHot: water(293.15, 101325) }, 'expansionSign')).toBeGreaterThan(0);
  });
});

describe('two walls with emissivities of their own', () => {
  it.each([['side-heated-cavity', 'walls.left', 'walls.right'], ['channel', 'walls.bottom', 'walls.top']])('%s: exchange by 1/(1/0.8 + 1/0.6 - 1) = 0.52174 (worked by hand)', (flow, one, other) => {
    const at = workingsOf(flows[flow] as NonNullable<(typeof flows)[string]>, { [`emissivity@${one}`]: 0.8, [`emissivity@${other}`]: 0.6 });
    expect(at.get('exchangeEmissivity')).toBeCloseTo(0.52174, 5);
  });
});
