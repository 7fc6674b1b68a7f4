import { bedGradient, eisfeldDrag, ergunDrag, gnielinskiBed, ktaGradient, wakao, wenYu } from '../quantities/index.ts';
import { quantity, way, ways, type Definition } from '../workings/index.ts';
import { inlet, outlet, slipping, wall } from './boundaries.ts';
import type { Flow } from './define.ts';
import { packedBedLadder } from './packed-bed-ladder.ts';

const geometry = 'geometry';
const ergun = 'Ergun, Chem. Eng. Prog. 48 (1952) 89';
const drive = ['packedBedVoidFraction', 'sizes.particleDiameter', 'viscosityBulk', 'densityBulk', 'speedBulk'] as const;
type Drive = Readonly<Record<(typeof drive)[number], number>>;
const flow = (of: Drive): { voidFraction: number; particleDiameter: number; viscosity: number; density: number; speed: number } => ({ voidFraction: of.packedBedVoidFraction, particleDiameter: of['sizes.particleDiameter'], viscosity: of.viscosityBulk, density: of.densityBulk, speed: of.speedBulk });

const scales: Definition[] = [
  quantity('packedBedRatio', { symbol: 'D/d_p', name: 'bed over particle diameter', unit: '1' }, [way({ needs: ['sizes.bedDiameter', 'sizes.particleDiameter'], value: (of) => of['sizes.bedDiameter'] / of['sizes.particleDiameter'], formula: 'D/d_p', source: geometry })]),
  quantity('packedBedVoidFraction', { symbol: 'e', name: 'void fraction of the bed', unit: '1' }, [
    way({ needs: ['packing.voidFraction'], value: (of) => of['packing.voidFraction'], formula: 'e as given', source: 'the case' }),
    way({ needs: ['porous.voidFraction'], value: (of) => of['porous.voidFraction'], formula: 'e as given', source: 'the case' }),
    way({ needs: ['packedBedRatio'], as: 'assumed', range: { packedBedRatio: [2, 1e6] }, scatter: 0.08, value: ({ packedBedRatio }) => 0.4 + 0.05 / packedBedRatio + 0.412 / packedBedRatio ** 2, formula: 'e = 0.4 + 0.05 d_p/D + 0.412 (d_p/D)^2', source: 'Dixon, Can. J. Chem. Eng. 66 (1988) 705, spheres' }),
  ]),
  ways('length', [way({ needs: ['sizes.particleDiameter'], value: (of) => of['sizes.particleDiameter'], formula: 'L = d_p', source: 'definition' })]),
  ways('flowLength', [way({ needs: ['sizes.length'], value: (of) => of['sizes.length'], formula: 'L_x = L', source: geometry })]),
  ways('flowArea', [way({ needs: ['sizes.bedDiameter'], value: (of) => (Math.PI * of['sizes.bedDiameter'] ** 2) / 4, formula: 'A = pi D^2/4, empty', source: geometry })]),
  ways('wettedPerimeter', [way({ needs: ['sizes.bedDiameter'], value: (of) => Math.PI * of['sizes.bedDiameter'], formula: 'P = pi D', source: geometry })]),
  ways('wallArea', [way({ needs: ['sizes.bedDiameter', 'sizes.length'], value: (of) => Math.PI * of['sizes.bedDiameter'] * of['sizes.length'], formula: 'A_w = pi D L', source: geometry })]),
  ways('gap', [way({ needs: ['sizes.bedDiameter'], value: (of) => of['sizes.bedDiameter'], formula: 'H = D', source: geometry })]),
  ways('passageHeight', [way({ needs: ['sizes.length'], value: (of) => of['sizes.length'], formula: 'H_g = L', source: geometry })]),
  quantity('packedBedPoreDiameter', { symbol: 'd_h', name: 'hydraulic diameter of the pores', unit: 'm' }, [way({ needs: ['packedBedVoidFraction', 'sizes.particleDiameter'], value: (of) => ((2 / 3) * of.packedBedVoidFraction * of['sizes.particleDiameter']) / (1 - of.packedBedVoidFraction), formula: 'd_h = (2/3) e d_p/(1 - e)', source: 'four times the voids over the wetted surface of spheres' })]),
  quantity('packedBedPoreSpeed', { symbol: 'U_i', name: 'mean speed in the pores', unit: 'm/s' }, [way({ needs: ['speed', 'packedBedVoidFraction'], value: ({ speed, packedBedVoidFraction }) => speed / packedBedVoidFraction, formula: 'U_i = U/e', source: 'conservation of mass' })]),
  quantity('packedBedChannelling', { symbol: 'd_ch', name: 'layer of fast flow at the wall', unit: 'm' }, [way({ needs: ['sizes.particleDiameter'], scatter: 0.5, value: (of) => of['sizes.particleDiameter'] / 2, formula: 'd_ch = d_p/2', source: 'common practice: voids reach 1 at the wall and are least half a particle from it' })]),
];

const regime: Definition[] = [
  quantity('packedBedReynoldsPore', { symbol: 'Re_p/(1-e)', name: 'Reynolds number of the pores', unit: '1' }, [way({ needs: ['reynoldsBulk', 'packedBedVoidFraction'], value: ({ reynoldsBulk, packedBedVoidFraction }) => reynoldsBulk / (1 - packedBedVoidFraction), formula: 'Re_p/(1 - e)', source: ergun })]),
  ways('regimeGroup', [way({ needs: ['reynolds', 'packedBedVoidFraction'], value: ({ reynolds, packedBedVoidFraction }) => reynolds / (1 - packedBedVoidFraction), symbol: 'Re_p/(1 - e)', formula: 'Re_p/(1 - e)', source: 'definition', note: 'speaks of the flow in the pores; the drag law of a bed taken as a continuum holds all of it' })]),
  ways('regimeLow', [way({ needs: [], scatter: 0.5, value: () => 300, formula: '300', source: 'Dybbs and Edwards, in Fundamentals of Transport Phenomena in Porous Media (1984)' })]),
  ways('regimeHigh', [way({ needs: [], scatter: 0.5, value: () => 1000, formula: '1000', source: 'common practice' })]),
  ways('unsteadyGroup', [way({ needs: ['regimeGroup'], value: ({ regimeGroup }) => regimeGroup, symbol: 'Re_p/(1 - e)', formula: 'Re_p/(1 - e)', source: 'definition' })]),
  ways('unsteadyFrom', [way({ needs: [], scatter: 0.5, value: () => 300, formula: '300', source: 'Dybbs and Edwards, in Fundamentals of Transport Phenomena in Porous Media (1984)' })]),
];

const gradientUnit = { unit: 'Pa/m' };
const drag: Definition[] = [
  quantity('packedBedGradient', { symbol: '-dp/dx', name: 'pressure fall per length', ...gradientUnit }, [
    way({ needs: [...drive, 'packedBedRatio'], range: { packedBedRatio: [20, 1e6] }, scatter: 0.2, value: (of) => bedGradient({ drag: ergunDrag, ...flow(of) }), formula: '150 mu U (1 - e)^2/(d_p^2 e^3) + 1.75 rho U^2 (1 - e)/(d_p e^3)', source: ergun }),
    way({ needs: [...drive, 'packedBedRatio'], range: { packedBedRatio: [1.6, 250] }, scatter: 0.2, value: (of) => bedGradient({ drag: eisfeldDrag({ bedRatio: of.packedBedRatio, voidFraction: of.packedBedVoidFraction }), ...flow(of) }), formula: '154 A_w^2 mu U (1 - e)^2/(d_p^2 e^3) + (A_w/B_w) rho U^2 (1 - e)/(d_p e^3), A_w = 1 + 2/(3 (D/d_p)(1 - e)), B_w = (1.15 (d_p/D)^2 + 0.87)^2', source: 'Eisfeld and Schnitzlein, Chem. Eng. Sci. 56 (2001) 4321, wall counted' }),
  ]),
  quantity('packedBedGradientViscous', { symbol: '(-dp/dx)_v', name: 'viscous part of the pressure fall per length', ...gradientUnit }, [way({ needs: ['viscosityBulk', 'speedBulk', 'packedBedPermeability'], value: ({ viscosityBulk, speedBulk, packedBedPermeability }) => (viscosityBulk * speedBulk) / packedBedPermeability, formula: '(-dp/dx)_v = mu U/K', source: 'Darcy 1856' })]),
  quantity('packedBedGradientSecond', { symbol: '(-dp/dx)_2', name: 'pressure fall per length by a second law', ...gradientUnit }, [
    way({ needs: [...drive, 'packedBedReynoldsPore'], range: { packedBedReynoldsPore: [1, 1e5] }, scatter: 0.15, value: (of) => ktaGradient(flow(of)), formula: 'psi (1 - e) rho U^2/(2 e^3 d_p), psi = 320/X + 6/X^0.1, X = Re_p/(1 - e)', source: 'KTA 3102.3 (1981)' }),
  ]),
  ways('pressureDropPlain', [way({ needs: ['packedBedGradient', 'sizes.length'], value: (of) => of.packedBedGradient * of['sizes.length'], formula: 'dp = (-dp/dx) L', source: 'definition' })]),
  ways('pressureDrop', [way({ needs: ['pressureDropPlain'], value: ({ pressureDropPlain }) => pressureDropPlain, formula: 'dp = dp_0', source: 'the drag law of the bed holds the effects' })]),
  quantity('packedBedPermeability', { symbol: 'K', name: 'permeability', unit: 'm^2' }, [way({ needs: ['packedBedVoidFraction', 'sizes.particleDiameter'], scatter: 0.2, value: (of) => (of['sizes.particleDiameter'] ** 2 * of.packedBedVoidFraction ** 3) / (150 * (1 - of.packedBedVoidFraction) ** 2), formula: 'K = d_p^2 e^3/(150 (1 - e)^2)', source: ergun })]),
  quantity('packedBedForchheimer', { symbol: 'C_F', name: 'inertia coefficient of the drag on sqrt(K)', unit: '1' }, [way({ needs: ['packedBedVoidFraction'], scatter: 0.2, value: ({ packedBedVoidFraction: e }) => 1.75 / Math.sqrt(150 * e ** 3), formula: 'C_F = 1.75/sqrt(150 e^3)', source: ergun })]),
  quantity('packedBedLift', { symbol: 'Re_mf', name: 'particle Reynolds number at which upward flow lifts the bed', unit: '1' }, [way({ needs: ['gravity', 'density', 'packedBedSolidDensity', 'sizes.particleDiameter', 'viscosity'], scatter: 0.3, value: (of) => wenYu({ archimedes: (of.gravity * of.density * (of.packedBedSolidDensity - of.density) * of['sizes.particleDiameter'] ** 3) / of.viscosity ** 2 }), formula: 'Re_mf = sqrt(33.7^2 + 0.0408 Ar) - 33.7', source: 'Wen and Yu, AIChE J. 12 (1966) 610' })]),
  quantity('packedBedSolidDensity', { symbol: 'rho_s', name: 'density of the particles', unit: 'kg/m^3' }),
];

const transfer: Definition[] = [
  ways('nusseltPlain', [way({ needs: ['reynoldsBulk', 'prandtlBulk'], range: { reynoldsBulk: [15, 8500] }, scatter: ({ reynoldsBulk }) => Math.min(0.5, Math.max(0.1, 0.5 - 0.17 * Math.log10(reynoldsBulk / 20))), value: ({ reynoldsBulk, prandtlBulk }) => wakao({ reynolds: reynoldsBulk, prandtl: prandtlBulk }), formula: 'Nu = 2 + 1.1 Re_p^0.6 Pr^(1/3), particle to fluid', source: 'Wakao, Kaguei and Funazkri, Chem. Eng. Sci. 34 (1979) 325' })]),
  ways('nusseltSecond', [way({ needs: ['reynoldsBulk', 'prandtlBulk', 'packedBedVoidFraction'], range: { prandtlBulk: [0.7, 1e4] }, scatter: 0.2, value: ({ reynoldsBulk, prandtlBulk, packedBedVoidFraction }) => gnielinskiBed({ reynolds: reynoldsBulk, prandtl: prandtlBulk, voidFraction: packedBedVoidFraction }), formula: 'Nu = (1 + 1.5 (1 - e))(2 + sqrt(Nu_l^2 + Nu_t^2)) on Re_p/e', source: 'Gnielinski, Heat Exchanger Design Handbook (1982)' })]),
  quantity('packedBedWallCoefficient', { symbol: 'h_w', name: 'coefficient from the wall to the mean of the bed', unit: 'W/(m^2 K)' }, [way({ needs: ['thermalConductivityBulk', 'sizes.bedDiameter', 'reynoldsBulk', 'packedBedRatio'], range: { reynoldsBulk: [20, 7600], packedBedRatio: [3.3, 20] }, scatter: 0.3, value: (of) => (2.03 * of.reynoldsBulk ** 0.8 * Math.exp(-6 / of.packedBedRatio) * of.thermalConductivityBulk) / of['sizes.bedDiameter'], formula: 'h_w D/k = 2.03 Re_p^0.8 exp(-6 d_p/D)', source: 'Li and Finlayson, Chem. Eng. Sci. 32 (1977) 1055, spheres (from memory)' })]),
  ways('innerResistance', [way({ needs: ['packedBedWallCoefficient'], value: ({ packedBedWallCoefficient }) => 1 / packedBedWallCoefficient, formula: 'R_i = 1/h_w', source: 'definition' })]),
  quantity('packedBedPecletAxial', { symbol: 'Pe_ax', name: 'Peclet number of spreading along the flow, on d_p and the pore speed', unit: '1' }, [
    way({ needs: [], when: { medium: 'gas' }, scatter: 0.3, value: () => 2, formula: 'Pe_ax = 2', source: 'common practice, gases' }),
    way({ needs: [], when: { medium: 'liquid' }, scatter: 0.4, value: () => 0.7, formula: 'Pe_ax = 0.7, between 0.5 and 1', source: 'common practice, liquids at low Reynolds number' }),
  ]),
  quantity('packedBedPecletRadial', { symbol: 'Pe_r', name: 'Peclet number of spreading across the flow, on d_p and the pore speed', unit: '1' }, [way({ needs: [], scatter: 0.25, value: () => 10, formula: 'Pe_r = 10, between 8 and 12', source: 'common practice' })]),
  quantity('packedBedDispersionAxial', { symbol: 'D_ax', name: 'spreading along the flow', unit: 'm^2/s' }, [way({ needs: ['packedBedPoreSpeed', 'sizes.particleDiameter', 'packedBedPecletAxial'], value: (of) => (of.packedBedPoreSpeed * of['sizes.particleDiameter']) / of.packedBedPecletAxial, formula: 'D_ax = U_i d_p/Pe_ax', source: 'definition' })]),
  quantity('packedBedDispersionRadial', { symbol: 'D_r', name: 'spreading across the flow', unit: 'm^2/s' }, [way({ needs: ['packedBedPoreSpeed', 'sizes.particleDiameter', 'packedBedPecletRadial'], value: (of) => (of.packedBedPoreSpeed * of['sizes.particleDiameter']) / of.packedBedPecletRadial, formula: 'D_r = U_i d_p/Pe_r', source: 'definition' })]),
];

const extents: Definition[] = [
  ways('domainUpstream', [way({ needs: ['sizes.bedDiameter'], scatter: 1, value: (of) => of['sizes.bedDiameter'], formula: 'L_up = D', source: 'common practice: one to two diameters of free space' })]),
  ways('domainDownstream', [way({ needs: ['sizes.bedDiameter'], scatter: 1, value: (of) => of['sizes.bedDiameter'], formula: 'L_dn = D', source: 'common practice: one to two diameters of free space' })]),
  ways('regionAlong@bed', [way({ needs: ['sizes.length'], value: (of) => of['sizes.length'], formula: 'L', source: geometry })]),
  ways('regionAlong@free', [way({ needs: ['domainUpstream', 'domainDownstream'], value: ({ domainUpstream, domainDownstream }) => domainUpstream + domainDownstream, formula: 'L_up + L_dn', source: geometry })]),
  ways('regionAcross', [way({ needs: ['sizes.bedDiameter'], value: (of) => of['sizes.bedDiameter'], formula: 'D', source: geometry })]),
  ways('regionSpan', [way({ needs: ['sizes.bedDiameter'], value: (of) => (Math.PI * of['sizes.bedDiameter']) / 4, formula: 'pi D/4, so that across times span is the section', source: geometry })]),
  ways('coreLength', [way({ needs: ['sizes.bedDiameter'], value: (of) => of['sizes.bedDiameter'], formula: 'L_c = D', source: 'common practice, bed as a continuum' })]),
  ways('peakOverMean', [way({ needs: [], as: 'assumed', scatter: 0.3, value: () => 1.5, formula: 'u_max/U = 1.5', source: 'common practice: wall layer of a bed as a continuum, superficial' })]),
];

const continuum: Definition[] = [
  ways('permeability', [way({ needs: ['packedBedPermeability'], value: ({ packedBedPermeability }) => packedBedPermeability, formula: 'K of the bed', source: ergun })]),
  ways('forchheimer', [way({ needs: ['packedBedForchheimer'], value: ({ packedBedForchheimer }) => packedBedForchheimer, formula: 'C_F of the bed', source: ergun })]),
  ways('exchangeUnits', [way({ needs: ['nusseltPlain', 'thermalConductivityBulk', 'packedBedVoidFraction', 'sizes.particleDiameter', 'sizes.length', 'densityBulk', 'specificHeatCapacityBulk', 'speedBulk'], value: (of) => (6 * (1 - of.packedBedVoidFraction) * of.nusseltPlain * of.thermalConductivityBulk * of['sizes.length']) / (of['sizes.particleDiameter'] ** 2 * of.densityBulk * of.specificHeatCapacityBulk * of.speedBulk), formula: 'NTU = h_sf a L/(rho cp U), a = 6 (1 - e)/d_p', source: 'definition' })]),
];

const carried: Definition[] = [
  ways('bodenstein', [way({ needs: ['packedBedPecletAxial', 'sizes.length', 'sizes.particleDiameter'], value: (of) => (of.packedBedPecletAxial * of['sizes.length']) / of['sizes.particleDiameter'], formula: 'Bo_d = Pe_ax L/d_p', source: 'definition, on the pore speed' })]),
  ways('catalystLength', [way({ needs: ['sizes.particleDiameter'], value: (of) => of['sizes.particleDiameter'] / 6, formula: 'V/S = d_p/6', source: 'spheres' })]),
  ways('damkohler', [
    way({ needs: ['rateConstant', 'effectivenessFactor', 'wallReactionFactor', 'packedBedVoidFraction', 'sizes.length', 'speed'], when: { reactionWhere: 'catalyst' }, value: (of) => (of.rateConstant * of.effectivenessFactor * of.wallReactionFactor * (1 - of.packedBedVoidFraction) * of['sizes.length']) / of.speed, formula: 'Da = eta F_w k (1 - e) L/U', source: 'definition, the rate constant counts on the volume of the catalyst' }),
    way({ needs: ['surfaceRateConstant', 'wallReactionFactor', 'packedBedVoidFraction', 'sizes.particleDiameter', 'sizes.length', 'speed'], when: { reactionWhere: ['catalyst', 'wall'] }, value: (of) => (6 * of.surfaceRateConstant * of.wallReactionFactor * (1 - of.packedBedVoidFraction) * of['sizes.length']) / (of['sizes.particleDiameter'] * of.speed), formula: 'Da = F_w k" 6 (1 - e) L/(d_p U)', source: 'definition, spheres' }),
    way({ needs: ['rateConstant', 'packedBedVoidFraction', 'sizes.length', 'speed'], when: { reactionWhere: 'fluid' }, value: (of) => (of.rateConstant * of.packedBedVoidFraction * of['sizes.length']) / of.speed, formula: 'Da = k e L/U', source: 'definition, time in the pores' }),
  ]),
  ways('massTransferUnits', [way({ needs: ['massTransferCoefficient', 'stefanFactorFlux', 'packedBedVoidFraction', 'sizes.length', 'sizes.particleDiameter', 'speedBulk'], when: { wallShareGiven: 'yes' }, value: (of) => (6 * (1 - of.packedBedVoidFraction) * of.massTransferCoefficient * of.stefanFactorFlux * of['sizes.length']) / (of['sizes.particleDiameter'] * of.speedBulk), formula: 'N_m = k_c F_B a L/U, a = 6 (1 - e)/d_p', source: 'definition, the wall is that of the particles' })]),
];

export const packedBed: Flow = {
  id: 'packed-bed',
  title: 'Packed bed of particles',
  lengthIs: 'particle diameter',
  speedIs: 'superficial speed',
  sizes: [
    { key: 'particleDiameter', name: 'particle diameter', unit: 'm' },
    { key: 'bedDiameter', name: 'inner diameter of the bed', unit: 'm' },
    { key: 'length', name: 'length of the bed', unit: 'm' },
  ],
  walls: [],
  answers: ['pressureDrop', 'outletTemperature', 'heatRate', 'heatTransferCoefficient', 'nusselt', 'wallTemperature'],
  stations: ['worst', 'target'],
  regions: ['bed', 'free'],
  words: { flow: 'packed-bed', flowClass: 'continuum', imposedFlow: 'yes', wallBounded: 'no', attached: 'yes', separated: 'no', ductSection: 'round', infiniteDepth: 'no' },
  definitions: [...scales, ...regime, ...drag, ...transfer, ...extents, ...continuum],
  carried,
  leastRegion: 'Above ten particles across and 20 to 50 along: one- or two-dimensional continuum. Below: the particles themselves, 20 cells and more over each, contacts bridged or trimmed.',
  cuts: [
    { option: 'axisymmetric', holdsIf: 'more than ten particles across, wall conditions even all round' },
    { option: 'two-dimensional', holdsIf: 'never for resolved particles' },
  ],
  domain: [
    { side: 'upstream', id: 'domainUpstream', source: 'common practice' },
    { side: 'downstream', id: 'domainDownstream', source: 'common practice' },
  ],
  boundaries: [
    inlet('inlet', { velocity: 'value {speed}, even, superficial', turbulence: 'none: the drag law holds the turbulence of the pores' }),
    wall('wall of the bed', 'wall', {
      velocity: [{ says: 'slips where the bed is a continuum; voids rise to 1 within {packedBedChannelling}, where the fluid runs fast' }, { says: 'slips where the bed is a continuum' }],
      turbulence: 'none: the drag law holds it',
    }),
    slipping('both ends of the bed', { is: 'joined', velocity: 'joined: the same superficial speed', pressure: 'continuous', temperature: 'joined; two equations where solid and fluid differ', turbulence: 'none in the bed', species: 'joined' }),
    outlet('outlet, free of particles', { turbulence: 'none' }),
  ],
  simplifications: [
    'No closure of turbulence and no y+ inside a continuum: the drag law holds inertia and turbulence of the pores.',
    'Plug flow fails below ten particles across: the fluid runs past at the wall, within half a particle of it.',
    'One temperature for solid and fluid fails where the bed exchanges fewer than about ten transfer units, with heat released in one phase, and in fast transients.',
    'Wall heat by one coefficient to the mean of the bed lumps what spreads across the bed with the film at the wall.',
  ],
  look: {
    mustShow: [
      'pressure a straight line through the bed with the slope of the drag law, within 20 %',
      'a front of heat moving at U rho cp/(e rho cp + (1 - e) rho_s c_s), widening as the root of the distance',
      'faster flow at the wall than in the middle below 20 particles across',
    ],
    probes: ['pressure at 0.1, 0.5 and 0.9 of the length', 'temperature on the axis and half a particle from the wall'],
    wrong: ['front faster than that speed: heat capacity of the solid is missing', 'front thinner than one particle: spreading is missing', 'pressure uneven at the face of the bed: zones badly joined'],
  },
  ladder: packedBedLadder,
};
