import { deanChannelFriction, ductEntryLoss, facingWalls, laminarEntranceLength, laminarNusselt } from '../quantities/index.ts';
import { quantity, way, ways, type Definition } from '../workings/index.ts';
import { inlet, outlet, wall } from './boundaries.ts';
import type { Flow } from './define.ts';
import { channelHeatingDefinitions } from './channel-one-sided.ts';
import { channelLadder } from './channel-ladder.ts';
import { passageDefinitions, turbulentLength } from './passage.ts';
import { straightDefinitions } from './straight.ts';

const geometry = 'geometry';
const simulated = [180, 550, 1000, 2000, 5200];
const gapOf = (formula: string, factor: number): ReturnType<typeof way> => way({ needs: ['sizes.gap'], value: (of) => factor * of['sizes.gap'], formula, source: geometry });

const scales: Definition[] = [
  quantity('channelWidth', { symbol: 'W', name: 'width of the channel', unit: 'm' }, [
    way({ needs: ['sizes.width'], value: (of) => of['sizes.width'], formula: 'W as given', source: 'the case' }),
    way({ needs: [], when: { infiniteDepth: 'yes' }, value: () => 1, formula: 'W = 1 m', source: 'convention: streams and heat per metre of width', dimensional: 'the metre of width is a convention' }),
  ]),
  ways('length', [gapOf('L = 2 H', 2)]),
  ways('hydraulicDiameter', [gapOf('D_h = 2 H', 2)]),
  ways('gap', [gapOf('H as given', 1)]),
  ways('flowArea', [way({ needs: ['sizes.gap', 'channelWidth'], value: (of) => of['sizes.gap'] * of.channelWidth, formula: 'A = H W', source: geometry })]),
  ways('wettedPerimeter', [way({ needs: ['channelWidth'], value: ({ channelWidth }) => 2 * channelWidth, formula: 'P = 2 W', source: geometry })]),
  ways('span', [way({ needs: ['sizes.width'], value: (of) => of['sizes.width'], formula: 'L_z = W', source: geometry })]),
  ways('regionSpan', [way({ needs: ['channelWidth'], value: ({ channelWidth }) => channelWidth, formula: 'W', source: geometry })]),
  ways('wallArea', [way({ needs: ['channelWidth', 'sizes.length'], value: (of) => of.channelWidth * of['sizes.length'], formula: 'A_w = W L', source: geometry })]),
  ways('passageHeight', [
    way({ needs: ['sizes.length'], when: { axis: 'upright' }, value: (of) => of['sizes.length'], formula: 'H_g = L', source: geometry }),
    way({ needs: ['sizes.gap'], when: { axis: 'level' }, value: (of) => of['sizes.gap'], formula: 'H_g = H', source: geometry }),
    way({ needs: ['sizes.gap', 'sizes.length', 'inclination'], value: (of) => of['sizes.length'] * Math.abs(Math.sin(of.inclination)) + of['sizes.gap'] * Math.abs(Math.cos(of.inclination)), formula: 'H_g = L sin(theta) + H cos(theta)', source: geometry }),
  ]),
  quantity('channelFrictionReynoldsData', { symbol: 'delta+_d', name: 'nearest friction Reynolds number with direct simulations', unit: '1' }, [
    way({ needs: ['frictionReynolds'], value: ({ frictionReynolds }) => simulated.reduce((best, x) => (Math.abs(Math.log(x / frictionReynolds)) < Math.abs(Math.log(best / frictionReynolds)) ? x : best)), formula: 'nearest of 180, 550, 1000, 2000, 5200 in the logarithm', source: 'Lee and Moser, J. Fluid Mech. 774 (2015) 395' }),
  ]),
  quantity('channelKnudsenGap', { symbol: 'Kn_H', name: 'Knudsen number on the gap', unit: '1' }, [way({ needs: ['meanFreePath', 'sizes.gap'], value: (of) => of.meanFreePath / of['sizes.gap'], formula: 'Kn_H = lambda/H', source: 'definition' })]),
  ways('womersley', [way({ needs: ['time.period', 'gap', 'kinematicViscosity'], value: (of) => (of.gap / 2) * Math.sqrt((2 * Math.PI) / (of['time.period'] * of.kinematicViscosity)), formula: 'Wo = (H/2) sqrt(2 pi/(T nu))', source: 'Womersley, J. Physiol. 127 (1955) 553, on the half gap' })]),
];

const regime: Definition[] = [
  ways('regimeGroup', [way({ needs: ['reynolds'], value: ({ reynolds }) => reynolds / 2, symbol: 'Re_H', formula: 'Re_H = U H/nu', source: 'definition' })]),
  ways('regimeLow', [way({ needs: [], scatter: 0.1, value: () => 1300, formula: 'Re_lo = 1300', source: 'Patel and Head, J. Fluid Mech. 38 (1969) 181; Carlson, Widnall and Peeters, J. Fluid Mech. 121 (1982) 487' })]),
  ways('regimeHigh', [way({ needs: [], scatter: 0.1, value: () => 3000, formula: 'Re_hi = 3000', source: 'Patel and Head, J. Fluid Mech. 38 (1969) 181' })]),
  ways('unsteadyGroup', [way({ needs: ['reynolds'], value: ({ reynolds }) => (0.75 * reynolds) / 2, symbol: 'Re_c', formula: 'Re on 1.5 U and H/2', source: 'definition' })]),
  ways('unsteadyFrom', [way({ needs: [], value: () => 5772.22, formula: 'Re_c = 5772.22', source: 'Orszag, J. Fluid Mech. 50 (1971) 689' })]),
];

const laminarSource = 'Shah and London, Laminar Flow Forced Convection in Ducts (1978), chapter VI';
/** Mean over developed Nusselt number of the one wall that is heated: the thin layer that forms on it, met with the developed value. */
function oneSidedEntrance(wallKind: string[], thin: number, developed: number, printed: string): ReturnType<typeof way> {
  return way({
    needs: ['graetz'], when: { channelHeating: 'one', energySolved: 'yes', wallKind }, scatter: 0.05, range: { graetz: [0, 1e5] },
    value: ({ graetz }) => Math.cbrt(1 + (thin / developed) ** 3 * graetz),
    formula: `F = (1 + (${thin}/${printed})^3 Gz)^(1/3)`,
    source: `${laminarSource}, thin layer; by cubes with the developed value, within 5 % of a solution by finite volumes`,
  });
}

const laws: Definition[] = [
  ...channelHeatingDefinitions,
  ...passageDefinitions({
    needs: [],
    frictionReynolds: { value: () => 96, formula: 'f = 96/Re on 2 H', source: 'momentum balance between parallel plates' },
    frictionDiameter: { value: () => 2 / 3, formula: 'D_L/D_h = 2/3', source: 'Jones, J. Fluids Eng. 98 (1976) 173' },
    limitScale: 2,
    turbulentScatter: { friction: 0.08, heat: 0.12 },
    nusselt: {
      temperature: () => laminarNusselt.plates.temperature,
      flux: () => laminarNusselt.plates.flux,
      formula: { temperature: 'Nu = 7.541, both walls at one temperature', flux: 'Nu = 140/17, one flux through both walls' },
      source: laminarSource,
    },
    thermalEntrance: { temperature: () => 0.008, flux: () => 0.0117, source: laminarSource, scatter: 0.05 },
  }),
  ways('frictionTurbulent', [
    way({ needs: ['reynoldsBulk'], range: { reynoldsBulk: [1.2e4, 1.2e6] }, scatter: 0.05, value: ({ reynoldsBulk }) => deanChannelFriction({ reynoldsGap: reynoldsBulk / 2 }), formula: 'f = 4 x 0.073 Re_b^(-1/4), Re_b on H', source: 'Dean, J. Fluids Eng. 100 (1978) 215' }),
  ]),
  ways('nusseltLaminar', [
    way({ needs: [], when: { channelHeating: 'one', wallKind: ['temperature', 'coefficient'] }, value: () => laminarNusselt.oneSided.temperature, formula: 'Nu = 4.861, one wall at a temperature, the other adiabatic', source: laminarSource }),
    way({ needs: [], when: { channelHeating: 'one', wallKind: 'flux' }, value: () => laminarNusselt.oneSided.flux, formula: 'Nu = 70/13, flux through one wall, the other adiabatic', source: laminarSource }),
  ]),
  ways('entranceFactorNusseltLaminar', [oneSidedEntrance(['temperature', 'coefficient'], 1.849, laminarNusselt.oneSided.temperature, '4.861'), oneSidedEntrance(['flux'], 2.236, laminarNusselt.oneSided.flux, '70/13')]),
  ways('entranceLengthThermal', [
    way({ needs: ['reynoldsBulk', 'prandtlBulk', 'hydraulicDiameter'], when: { regime: ['laminar', 'transitional'], channelHeating: 'one' }, scatter: 0.5, value: (of) => 0.04 * of.reynoldsBulk * of.prandtlBulk * of.hydraulicDiameter, formula: 'L_t = 0.04 Re Pr D_h', source: 'common practice: four times the length of both walls, the layer crosses the whole gap' }),
  ]),
];

const lengths: Definition[] = [
  ways('entranceLength', [
    way({ needs: ['reynoldsBulk', 'sizes.gap'], when: { regime: ['laminar', 'transitional'] }, scatter: 0.1, value: (of) => laminarEntranceLength({ reynolds: of.reynoldsBulk / 2, passage: 'channel' }) * of['sizes.gap'], formula: 'L_e = (0.631^1.6 + (0.0442 Re_b)^1.6)^(1/1.6) H', source: 'Durst, Ray, Unsal and Bayoumi, J. Fluids Eng. 127 (2005) 1154' }),
    turbulentLength,
  ]),
  ways('entryLoss', [
    way({ needs: [], when: { regime: ['laminar', 'transitional'] }, scatter: 0.1, value: () => ductEntryLoss({ aspect: 0 }), formula: 'K_inf = 0.686', source: 'Lundgren, Sparrow and Starr, J. Basic Eng. 86 (1964) 620' }),
    way({ needs: [], when: { regime: 'turbulent' }, scatter: 1, value: () => 0.1, formula: 'K_inf = 0.1', source: 'common practice' }),
  ]),
  ways('peakOverMean', [
    way({ needs: [], when: { regime: ['laminar', 'transitional'] }, value: () => 1.5, formula: 'u_max/U = 1.5', source: 'momentum balance between parallel plates' }),
    way({ needs: ['frictionPlain'], when: { regime: 'turbulent' }, scatter: 0.03, value: ({ frictionPlain }) => 1 + 0.86 * Math.sqrt(frictionPlain), formula: 'u_max/U = 1 + 0.86 sqrt(f)', source: 'logarithmic law over the gap' }),
  ]),
];

export const channel: Flow = {
  id: 'channel',
  title: 'Channel between parallel plates',
  lengthIs: 'twice the gap',
  speedIs: 'mean speed over the gap',
  sizes: [
    { key: 'gap', name: 'distance between the plates', unit: 'm' },
    { key: 'length', name: 'length that counts', unit: 'm' },
    { key: 'width', name: 'width of the plates', unit: 'm', infinite: true },
  ],
  walls: ['bottom', 'top'],
  targetWall: 'bottom',
  answers: ['pressureDrop', 'outletTemperature', 'heatRate', 'heatTransferCoefficient', 'nusselt', 'wallTemperature', 'frictionFactorDarcy', 'wallShear', 'entranceLength'],
  stations: ['worst', 'target'],
  regions: ['entry', 'run'],
  words: { flow: 'channel', flowClass: 'internal', imposedFlow: 'yes', wallBounded: 'yes', attached: 'yes', separated: 'no', ductSection: 'flat' },
  definitions: [...scales, ...regime, ...laws, ...lengths, ...straightDefinitions, ...facingWalls('walls.bottom', 'walls.top')],
  leastRegion: 'Half the gap where both walls do the same and gravity does not act across. Resolved turbulence: a box of at least 2 pi gaps along and pi gaps across the span, ends and sides repeating.',
  cuts: [
    { option: 'two-dimensional', holdsIf: 'width above ten gaps and averaged or laminar flow' },
    { option: 'mirror-top-bottom', holdsIf: 'both walls alike, no buoyancy across the gap, averaged or laminar flow' },
    { option: 'periodic-along-flow', holdsIf: 'flow and temperature profile developed over the whole length' },
  ],
  domain: [
    { side: 'upstream', id: 'domainUpstream', source: 'entrance length, or none where the profile is given' },
    { side: 'downstream', id: 'domainDownstream', source: 'common practice' },
  ],
  boundaries: [inlet(), wall('bottom wall', 'walls.bottom'), wall('top wall', 'walls.top'), outlet()],
  simplifications: [
    'Two-dimensional flow holds for laminar or averaged flow wider than ten gaps.',
    'A two-dimensional run of resolved turbulence has no meaning at any width.',
    'Upright with two wall temperatures: the flow turns back at the cold wall from Gr_H/Re_H = 72 on.',
    'Walls at two different temperatures that both exchange heat have two Nusselt numbers; the one given is that of equal walls.',
  ],
  look: {
    mustShow: [
      'laminar: 1.5 times the mean in the middle, mean speed at 0.423 of the half gap from the wall',
      'turbulent: mean speed at 0.368 of the half gap from the wall, middle at 1 + 0.86 sqrt(f) times the mean',
      'u+ = y+ below 5; streamwise fluctuation largest, 2.7 to 3.0 u_tau, near y+ = 15; streaks about 100 viscous lengths apart',
      'total shear a straight line to 2 %: the proof that the average has settled',
    ],
    probes: ['y+ = 15', 'a tenth of the half gap', 'the middle'],
    wrong: ['shear line bent: record too short or the drive not in balance', 'streaks 200 apart: span or mesh', 'two sides differ after averaging: record too short'],
  },
  ladder: channelLadder,
};
