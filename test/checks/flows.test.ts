import { describe, expect, it } from 'vitest';
import { flows, type Flow } from '../../src/flows/index.ts';
import { blasiusFriction, churchill, colebrook, dittusBoelter, ductFrictionSeries, ductNusseltTemperature, fullyRoughFriction, haaland, hausen, apparentFrictionReynolds, levequePipe, logMean, mckeonFriction, siederTateLaminar, siederTateTurbulent, swameeJain, wenYu } from '../../src/quantities/index.ts';
import type { Law, Workings } from '../../src/workings/index.ts';
import { workingsOf } from '../flows/harness.ts';
import { entriesOf, expectedOf, inputsOf, type Entry } from './published.ts';

type In = Readonly<Record<string, number>>;
type Bind = (of: In, entry: Entry) => number;
const n = (of: In, key: string): number => { const v = of[key]; if (v === undefined) throw new Error(`the entry has no input ${key}`); return v; };
const flow = (id: string): Flow => { const f = flows[id]; if (f === undefined) throw new Error(`no flow ${id}`); return f; };
const got = (w: Workings, id: string): number => { const v = w.get(id); if (v === undefined) throw new Error(`${id} cannot be had`); return v; };

/** A quantity of a pipe in which everything named is given. */
const pipe = (given: Readonly<Record<string, number | string>>, id: string): number => got(workingsOf(flow('pipe'), { energySolved: 'no', inletTemperature: 300, pressure: 1e5, ...given }), id);
/** The value of one given number at which a quantity takes a wanted value. */
function find(given: Readonly<Record<string, number | string>>, free: string, id: string, wanted: number, [low, high]: readonly [number, number]): number {
  const w = workingsOf(flow('pipe'), { energySolved: 'no', inletTemperature: 300, pressure: 1e5, [free]: low, ...given });
  const off = (x: number): number => { for (const s of free === 'viscosity' ? ['', 'Bulk', 'Wall'] : ['']) w.set(`${free}${s}`, x); return Math.log(got(w, id) / wanted); };
  let [a, b] = [Math.log(low), Math.log(high)];
  const rising = off(Math.exp(a)) < 0;
  for (let k = 0; k < 80; k++) { const m = (a + b) / 2; if (off(Math.exp(m)) < 0 === rising) a = m; else b = m; }
  return Math.exp((a + b) / 2);
}
const ofNu = (nu: number): { density: number; viscosity: number } => ({ density: 1000, viscosity: 1000 * nu });
const turbulent = (of: In): Record<string, number | string> => ({ reynolds: n(of, 'Re'), reynoldsBulk: n(of, 'Re'), ...(of['Pr'] === undefined ? {} : { prandtlBulk: of['Pr'] }), wallKind: 'temperature', heatDirection: 'heating' });
const rough = (of: In): { reynolds: number; relativeRoughness: number } => ({ reynolds: n(of, 'Re'), relativeRoughness: n(of, 'rr') });
const viscosityFalling = (mu: number, slope: number): Law => Object.assign((t: number) => mu * Math.exp(-slope * (t - 300)), { uncertainty: () => 0 });
const any = { density: 1000, viscosity: 1e-3, 'sizes.diameter': 0.1, 'inlet.speed': 1 };

/** Left-hand sides are ids of published numbers; right-hand sides the graph or a correlation of the project. */
const bound: Readonly<Record<string, Readonly<Record<string, Bind>>>> = {
  C01_groups: {
    'C01-Re-pipe': (of) => pipe({ density: n(of, 'rho'), viscosity: n(of, 'mu'), 'inlet.speed': n(of, 'V'), 'sizes.diameter': n(of, 'D') }, 'reynolds'),
    'C01-Re-cm': (of) => pipe({ density: n(of, 'rho'), viscosity: n(of, 'mu'), 'inlet.speed': n(of, 'V'), 'sizes.diameter': n(of, 'D') }, 'reynolds'),
    'C01-Pr-water': (of) => pipe({ viscosity: n(of, 'mu'), specificHeatCapacity: n(of, 'cp'), thermalConductivity: n(of, 'k') }, 'prandtl'),
    'C01-Ra-water': (of) => pipe({ thermalExpansion: n(of, 'beta'), temperatureDifference: n(of, 'dT'), length: n(of, 'L'), kinematicViscosity: n(of, 'nu'), thermalDiffusivity: n(of, 'alpha') }, 'rayleigh'),
    'C01-Ri': (of) => pipe({ thermalExpansion: n(of, 'beta'), temperatureDifference: n(of, 'dT'), length: n(of, 'L'), speed: n(of, 'V') }, 'richardson'),
    'C01-Bi': (of) => pipe({ 'wallResistance@wall': n(of, 'L') / n(of, 'k'), 'innerResistance@wall': 1 / n(of, 'h'), 'outerResistance@wall': 0, heatTransferCoefficientPlain: n(of, 'h'), wallKind: 'temperature', 'wallKind@wall': 'temperature' }, 'biotWall'),
    'C01-Fo': (of) => pipe({ thermalDiffusivity: n(of, 'alpha'), 'time.duration': n(of, 't'), length: n(of, 'L') }, 'fourier'),
    'C01-We': (of) => pipe({ density: n(of, 'rho'), speed: n(of, 'V'), length: n(of, 'D'), surfaceTension: n(of, 's') }, 'weber'),
    'C01-Ca': (of) => pipe({ viscosity: n(of, 'mu'), speed: n(of, 'V'), surfaceTension: n(of, 's') }, 'capillary'),
    'C01-Bo': (of) => pipe({ density: n(of, 'drho'), length: n(of, 'L'), surfaceTension: n(of, 's') }, 'eotvos'),
    'C01-Mo': (of) => pipe({ viscosity: n(of, 'mu'), density: n(of, 'rho'), vapourDensity: n(of, 'rho') - n(of, 'drho'), surfaceTension: n(of, 's') }, 'morton'),
    'C01-Ec': (of) => pipe({ speed: n(of, 'V'), specificHeatCapacity: n(of, 'cp'), temperatureDifference: n(of, 'dT') }, 'eckert'),
    'C01-Na': (of) => got(workingsOf(flow('pipe'), { viscosity: n(of, 'mu'), speed: n(of, 'V'), thermalConductivity: n(of, 'k'), referenceTemperature: 300, pressure: 1e5 }, { viscosity: viscosityFalling(n(of, 'mu'), n(of, 'b')) }), 'nahme'),
    'C01-Sc': (of) => pipe({ kinematicViscosity: n(of, 'nu'), diffusivity: n(of, 'D') }, 'schmidt'),
    // A vessel: its volume over the flow is the time in it.
    'C01-Da1': (of) => pipe({ rateConstant: n(of, 'k'), flowLength: n(of, 'V') / n(of, 'Q'), speed: 1, reactionWhere: 'fluid' }, 'damkohler'),
    // The book counts on the radius, three times volume over surface.
    'C01-Thiele': (of) => 3 * pipe({ catalystLength: n(of, 'R') / 3, rateConstant: n(of, 'k'), catalystDiffusivity: n(of, 'D'), reactionOrder: 1, reactionWhere: 'catalyst' }, 'thiele'),
    'C01-St-shed': (of) => pipe({ strouhal: n(of, 'St'), speed: n(of, 'V'), length: n(of, 'D') }, 'sheddingFrequency'),
  },
  C02_internal_flow: {
    'C02-bsl2.3-1': (of) => find({ density: 1260, 'sizes.diameter': n(of, 'D'), 'sizes.length': n(of, 'L'), 'inlet.volumeFlow': n(of, 'Q'), volumeFlowState: 'inlet' }, 'viscosity', 'pressureDropPlain', n(of, 'dp'), [0.05, 5]),
    'C02-bsl6.2-1-Re': (of) => pipe({ density: 935, viscosity: n(of, 'mu'), 'sizes.diameter': n(of, 'D'), 'inlet.massFlow': n(of, 'w') }, 'reynolds'),
    'C02-bsl6.2-1-dp': (of) => pipe({ density: n(of, 'rho'), 'sizes.diameter': n(of, 'D'), 'sizes.length': 1, 'inlet.massFlow': n(of, 'w'), frictionPlain: 4 * n(of, 'f') }, 'pressureDropPlain'),
    'C02-wh-oil-Q': (of) => { const given = { density: n(of, 'rho'), viscosity: n(of, 'mu'), 'sizes.diameter': n(of, 'd'), 'sizes.length': n(of, 'L') }; return pipe({ ...given, 'inlet.speed': find(given, 'inlet.speed', 'pressureDropPlain', n(of, 'rho') * 9.80665 * n(of, 'hf'), [0.1, 5]) }, 'volumeFlow'); },
    'C02-wh-6.6-f': (of) => colebrook(rough(of)),
    'C02-wh-6.6-hf': (of) => pipe({ density: 1000, 'sizes.diameter': n(of, 'd'), 'sizes.length': n(of, 'L'), 'inlet.speed': n(of, 'V'), frictionPlain: n(of, 'f') }, 'pressureDropPlain') / (1000 * 9.80665),
    'C02-wh-6.7-f': (of) => colebrook({ reynolds: pipe({ ...ofNu(n(of, 'nu')), 'sizes.diameter': n(of, 'd'), 'inlet.volumeFlow': n(of, 'Q'), volumeFlowState: 'inlet' }, 'reynolds'), relativeRoughness: n(of, 'e') / n(of, 'd') }),
    'C02-ce-8-1-0': (of) => { const given = { density: n(of, 'rho'), viscosity: n(of, 'mu'), 'sizes.diameter': n(of, 'D'), 'sizes.length': n(of, 'L') }; return pipe({ ...given, 'inlet.speed': find(given, 'inlet.speed', 'pressureDropPlain', n(of, 'dp'), [0.1, 10]) }, 'volumeFlow'); },
    'C02-ce-8-2-Re': (of) => pipe({ density: n(of, 'rho'), viscosity: n(of, 'mu'), 'inlet.speed': n(of, 'V'), 'sizes.diameter': n(of, 'D') }, 'reynolds'),
    'C02-ce-8-2-dp': (of) => pipe({ density: n(of, 'rho'), viscosity: n(of, 'mu'), 'inlet.speed': n(of, 'V'), 'sizes.diameter': n(of, 'D'), 'sizes.length': n(of, 'L') }, 'pressureDropPlain'),
    'C02-ce-8-3-f': (of) => colebrook(rough(of)),
    'C02-ce-8-3-dp': (of) => pipe({ density: n(of, 'rho'), 'inlet.speed': n(of, 'V'), 'sizes.diameter': n(of, 'D'), 'sizes.length': n(of, 'L'), frictionPlain: n(of, 'f') }, 'pressureDropPlain'),
    'C02-ce-8-4-D': (of) => find({ density: 1.2, viscosity: 1.2 * n(of, 'nu'), 'sizes.length': n(of, 'L'), 'inlet.volumeFlow': n(of, 'Q'), volumeFlowState: 'inlet' }, 'sizes.diameter', 'pressureDropPlain', 1.2 * 9.80665 * n(of, 'hf'), [0.1, 1]),
    'C02-colebrook-10000-0': (of) => pipe(turbulent(of), 'frictionPlain'),
    'C02-colebrook-100000-0': (of) => pipe(turbulent(of), 'frictionPlain'),
    'C02-colebrook-100000-0.01': (of) => colebrook(rough(of)),
    'C02-colebrook-1e+08-1e-05': (of) => colebrook(rough(of)),
    'C02-moody-smooth-10000': (of) => pipe(turbulent(of), 'frictionPlain'),
    'C02-moody-smooth-100000': (of) => pipe(turbulent(of), 'frictionPlain'),
  },
  C03_internal_convection: {
    'C03-inc8.3-lm': (of) => logMean({ first: n(of, 'a'), second: n(of, 'b') }),
    'C03-inc8.4-Ts': (of) => n(of, 'To') + n(of, 'q') / pipe({ ...any, 'sizes.diameter': n(of, 'D'), 'inlet.speed': 0.01, thermalConductivity: n(of, 'k'), wallKind: 'flux' }, 'heatTransferCoefficientPlain'),
    'C03-ch-8-oil-Re': (of) => pipe({ ...ofNu(n(of, 'nu')), 'inlet.speed': n(of, 'V'), 'sizes.diameter': n(of, 'D') }, 'reynolds'),
    'C03-ch-8-oil-Nu': (of) => hausen({ graetz: pipe({ ...turbulent(of), 'sizes.diameter': n(of, 'D'), 'sizes.length': n(of, 'L') }, 'graetz'), constant: 0.065 }),
    'C03-ch-8-oil-f': (of) => pipe(turbulent(of), 'frictionPlain'),
    'C03-ch-8-5-Re': (of) => pipe({ ...ofNu(n(of, 'nu')), 'inlet.volumeFlow': n(of, 'Q'), volumeFlowState: 'inlet', 'sizes.diameter': n(of, 'D') }, 'reynolds'),
    'C03-ch-8-5-Nu': (of) => pipe(turbulent(of), 'nusseltSecond'),
    'C03-ch-8-6-Re': (of) => got(workingsOf(flow('duct'), { ...ofNu(n(of, 'nu')), 'sizes.width': n(of, 'a'), 'sizes.height': n(of, 'a'), 'inlet.volumeFlow': n(of, 'Q'), volumeFlowState: 'inlet', inletTemperature: 300, energySolved: 'no' }), 'reynolds'),
    'C03-ch-8-6-Te': (of) => {
      const walls = ['left', 'right', 'top', 'bottom'].flatMap((w) => [[`wallKind@walls.${w}`, 'temperature'], [`wettedTemperature@walls.${w}`, n(of, 'Ts')]] as const);
      return got(workingsOf(flow('duct'), { ...Object.fromEntries(walls), density: 1, viscosity: 2e-5, 'sizes.width': 0.2, 'sizes.height': 0.2, 'sizes.length': n(of, 'A') / 0.8, 'inlet.massFlow': n(of, 'm'), specificHeatCapacity: n(of, 'cp'), thermalConductivity: 0.03, heatTransferCoefficient: n(of, 'h'), inletTemperature: n(of, 'Ti'), pressure: 1e5, energySolved: 'yes', 'has.layers': 'no' }), 'outletTemperature');
    },
    'C03-inc11.1-lm': (of) => logMean({ first: n(of, 'a'), second: n(of, 'b') }),
    'C03-gniel-50000-7': (of) => pipe(turbulent(of), 'nusseltPlain'),
    'C03-gniel-200000-3': (of) => pipe(turbulent(of), 'nusseltPlain'),
    'C03-gniel-4000-5': (of) => pipe(turbulent(of), 'nusseltPlain'),
    'C03-db-20000-0.7': (of) => dittusBoelter({ reynolds: n(of, 'Re'), prandtl: n(of, 'Pr'), exponent: 0.4 }),
    'C03-db-100000-5': (of) => dittusBoelter({ reynolds: n(of, 'Re'), prandtl: n(of, 'Pr'), exponent: 0.4 }),
    'C03-st-15000-30': (of) => siederTateTurbulent({ reynolds: n(of, 'Re'), prandtl: n(of, 'Pr'), viscosityRatio: n(of, 'm') }),
    'C03-st-lam': (of) => siederTateLaminar({ graetz: (n(of, 'Re') * n(of, 'Pr') * n(of, 'D')) / n(of, 'L'), viscosityRatio: n(of, 'm') }),
  },
  D03_pipe_friction: {
    'D03-mck-5e+06': (of) => mckeonFriction({ reynolds: n(of, 'Re') }),
    'D03-mck-3e+07': (of) => pipe(turbulent(of), 'frictionSecond'),
    'D03-bl-5000': (of) => blasiusFriction({ reynolds: n(of, 'Re') }),
    'D03-bl-20000': (of) => blasiusFriction({ reynolds: n(of, 'Re') }),
    'D03-haa-100000-0.001': (of) => haaland(rough(of)),
    'D03-haa-30000-0.005': (of) => haaland(rough(of)),
    'D03-sj-100000-0.001': (of) => swameeJain(rough(of)),
    'D03-sj-1e+06-1e-05': (of) => swameeJain(rough(of)),
    'D03-sj-30000-0.005': (of) => swameeJain(rough(of)),
    'D03-chu-1000': (of) => churchill(rough(of)),
    'D03-chu-3000': (of) => churchill(rough(of)),
    'D03-rough-0.01': (of) => fullyRoughFriction({ relativeRoughness: n(of, 'rr') }),
  },
};

/** Numbers of these topics that are not worked out here, with the reason. */
const elsewhere: Readonly<Record<string, string>> = {
  'C01-Kn': 'mean free path from a molecule diameter is not built; from viscosity it is',
  'C01-Stk': 'particles are not built', 'C01-Ste': 'no latent heat of fusion among the properties',
  'C01-De-dean': 'coil is not built', 'C01-Bm': 'rheology is not built', 'C01-CFL-dt': 'a step limit of the time room', 'C01-Fo-dt': 'a step limit of the time room',
  'C02-wh-oil-hf': 'a head balance by hand: the project asks for pressures, not heads',
  'D03-e-commercial-steel': 'a property of a surface, not of a flow', 'D03-e-drawn-tubing': 'a property of a surface, not of a flow', 'D03-e-riveted-steel': 'a property of a surface, not of a flow', 'D03-e-concrete': 'a property of a surface, not of a flow',
};

/** Numbers of topics that other tests walk, as far as these flows give them. */
const alsoBound: Readonly<Record<string, Readonly<Record<string, Bind>>>> = {
  E01_laminar_exact: {
    'E01-pois-dp': (of) => pipe({ density: 1000, viscosity: n(of, 'mu'), 'sizes.length': n(of, 'L'), 'inlet.speed': n(of, 'V'), 'sizes.diameter': n(of, 'D') }, 'pressureDropPlain'),
    'E01-pois-umax': () => pipe({ reynolds: 100, reynoldsBulk: 100 }, 'peakOverMean'),
    'E01-plane-umax': () => got(workingsOf(flow('channel'), { reynolds: 100, reynoldsBulk: 100 }), 'peakOverMean'),
    'E01-plane-dp': (of) => got(workingsOf(flow('channel'), { density: 1000, viscosity: n(of, 'mu'), 'sizes.gap': n(of, 'H'), 'sizes.length': 1, 'inlet.speed': n(of, 'V') }), 'pressureDropPlain'),
    ...Object.fromEntries(['1.0', '0.25', '0.3'].map((a): [string, Bind] => [`E01-rect-fRe-${a}`, (of) => ductFrictionSeries({ aspect: n(of, 'al') }) / 4])),
    ...Object.fromEntries(['1.0', '0.5', '0.25', '0.125'].map((a): [string, Bind] => [`E01-rect-T-${a}`, (of) => ductNusseltTemperature({ aspect: n(of, 'al') })])),
  },
  E02_graetz: {
    ...Object.fromEntries(['800', '1500', '200'].map((re): [string, Bind] => [`E02-hausen-${re}`, (of) => hausen({ graetz: (n(of, 'Re') * n(of, 'Pr') * n(of, 'D')) / n(of, 'L'), constant: 0.0668 })])),
    'E02-Nu-H-pipe': () => pipe({ reynolds: 100, reynoldsBulk: 100, wallKind: 'flux' }, 'nusseltPlain'),
    'E02-leveque': (of) => levequePipe({ graetz: n(of, 'Gz') }).mean,
    'E02-Lh-durst': (of) => pipe({ reynolds: n(of, 'Re'), reynoldsBulk: n(of, 'Re'), 'sizes.diameter': 1 }, 'entranceLength'),
    'E02-shah-app': (of) => apparentFrictionReynolds({ position: n(of, 'xp') }),
  },
  E10_transport_gas_free_surface: {
    'E10-ergun': (of) => got(workingsOf(flow('packed-bed'), { 'packing.voidFraction': n(of, 'e'), 'sizes.particleDiameter': n(of, 'd'), 'sizes.bedDiameter': 1, viscosity: n(of, 'mu'), density: n(of, 'rho'), 'inlet.speed': n(of, 'U') }), 'packedBedGradient'),
    'E10-wen-yu': (of) => wenYu({ archimedes: n(of, 'Ar') }),
  },
  G01_thresholds: {
    'G01-pipe-lam': () => pipe({}, 'regimeLow'),
    'G01-pipe-turb': () => pipe({}, 'regimeHigh'),
    'G01-lt-T': () => pipe({ reynolds: 1000, reynoldsBulk: 1000, prandtlBulk: 5, wallKind: 'temperature', 'sizes.diameter': 0.02 }, 'entranceLengthThermal') / (1000 * 5 * 0.02),
    'G01-lt-H': () => pipe({ reynolds: 1000, reynoldsBulk: 1000, prandtlBulk: 5, wallKind: 'flux', 'sizes.diameter': 0.02 }, 'entranceLengthThermal') / (1000 * 5 * 0.02),
  },
};

describe.each(Object.entries(bound))('published numbers of %s', (topic, binds) => {
  const entries = entriesOf(topic);
  it('are all either worked out or named with the reason', () => {
    expect(entries.map((e) => e.id).filter((id) => (binds[id] === undefined) === (elsewhere[id] === undefined))).toEqual([]);
    expect(Object.keys(binds).filter((id) => !entries.some((e) => e.id === id))).toEqual([]);
  });
  it.each(entries.filter((e) => binds[e.id] !== undefined))('$id $quantity', (entry) => expect(departure(entry, binds[entry.id] as Bind)).toBeLessThanOrEqual(1));
});

describe.each(Object.entries(alsoBound))('published numbers of %s that flows give', (topic, binds) => {
  const entries = entriesOf(topic).filter((e) => binds[e.id] !== undefined);
  it('exist', () => expect(entries.length).toBe(Object.keys(binds).length));
  it.each(entries)('$id $quantity', (entry) => expect(departure(entry, binds[entry.id] as Bind)).toBeLessThanOrEqual(1));
});

/** Distance from the published number over what its row allows. */
function departure(entry: Entry, bind: Bind): number {
  const { value, allowed } = expectedOf(entry);
  return Math.abs(bind(inputsOf(entry), entry) - value) / allowed;
}
