import { dispersedConversion } from '../references/index.ts';
import { quantity, way, ways, wordWay, type Definition } from '../workings/index.ts';
import { effectiveness, laminarConversion, plugFlowConversion } from './correlations/index.ts';

const definition = 'definition';
const per = { per: ['reaction' as const], plain: 'target' as const };
const largest = { per: ['reaction' as const], plain: 'largest' as const };
const first = { orderKind: 'first' } as const;
const other = { orderKind: 'other' } as const;
const inFluid = { reactionWhere: 'fluid' } as const;
const gasConstant = 8.31446261815324;
const withR = 'the molar gas constant has a unit';
const ofOrder = 'the unit of the constant follows from the order';
const levenspiel = 'Levenspiel, Chemical Reaction Engineering, 3rd ed. (1999)';

/** How fast a reaction goes at the state of the case: the constant that is given, brought to the temperature and to first order. */
const rates: Definition[] = [
  quantity('rateConstantGiven', { symbol: 'k_0', name: 'rate constant as given, in the unit of its order and place', unit: '1/s', ...per }),
  quantity('reactionOrder', { symbol: 'n', name: 'order of a reaction', unit: '1', ...per }, [way({ needs: [], as: 'assumed', value: () => 1, formula: 'n = 1', source: 'first order unless the case says otherwise' })]),
  quantity('orderKind', { symbol: '', name: 'whether a reaction is of first order', unit: 'word', words: ['first', 'other'], ...per }, [wordWay({ needs: ['reactionOrder'], word: ({ reactionOrder }) => (Math.abs(reactionOrder - 1) < 1e-9 ? 'first' : 'other'), formula: 'first where n = 1', source: definition })]),
  quantity('rateTemperature', { symbol: 'T_0', name: 'temperature at which a rate constant holds', unit: 'K', signed: true, ...per }),
  quantity('activationEnergy', { symbol: 'E', name: 'activation energy', unit: 'J/mol', ...per }),
  ...(['', 'Hot'] as const).map((at) => {
    const t = at === '' ? 'bulkTemperature' : 'highestTemperature';
    const [symbol, name] = at === '' ? ['k/k_0', 'rate constant at the bulk temperature over the one given'] : ['k_h/k_0', 'rate constant at the highest temperature over the one given'];
    return quantity(`arrhenius${at === '' ? '' : 'Hot'}Factor`, { symbol, name, unit: '1', ...per }, [
      { needs: ['activationEnergy', 'rateTemperature', t], value: (of) => Math.exp(((of['activationEnergy'] as number) / gasConstant) * (1 / (of['rateTemperature'] as number) - 1 / (of[t] as number))), formula: `${symbol} = exp[(E/R)(1/T_0 - 1/${at === '' ? 'T_b' : 'T_max'})]`, source: 'Arrhenius 1889', dimensional: withR },
      { needs: [], as: 'assumed', value: () => 1, formula: `${symbol} = 1`, source: 'activation energy or its temperature not given: the rate constant is taken as it stands' },
    ]);
  }),
  ...([['reactantMassFraction', 'Y_0', 'mass share of the reactant at the inlet', '1'], ['reactantMolarMass', 'M_A', 'molar mass of the reactant', 'kg/mol'], ['reactantDiffusivity', 'D_m', 'diffusivity of the reactant', 'm^2/s'], ['reactantCoefficient', 'k_c', 'mass-transfer coefficient of the reactant', 'm/s'], ['reactantFourier', 'Fo_m', 'time in the passage over the time in which the reactant diffuses across it', '1']] as const).map(([id, symbol, name, unit]) => quantity(id, { symbol, name, unit, ...per })),
  quantity('reactantConcentration', { symbol: 'c_0', name: 'concentration of the reactant at the inlet', unit: 'mol/m^3', ...per }, [
    way({ needs: ['density', 'reactantMassFraction', 'reactantMolarMass'], value: (of) => (of.density * of.reactantMassFraction) / of.reactantMolarMass, formula: 'c_0 = rho Y_0/M_A', source: definition }),
  ]),
  ...(['', 'Hot'] as const).map((at) => {
    const f = at === '' ? 'arrheniusFactor' : 'arrheniusHotFactor';
    return quantity(`rateConstant${at}`, { symbol: at === '' ? 'k' : 'k_h', name: `rate constant as of first order, at the ${at === '' ? 'bulk' : 'highest'} temperature`, unit: '1/s', ...largest }, [
      { needs: ['rateConstantGiven', f], when: { ...first, rateKind: 'volume' }, value: (of) => (of['rateConstantGiven'] as number) * (of[f] as number), formula: 'k = k_0 (k/k_0)', source: definition },
      { needs: ['rateConstantGiven', f, 'reactantConcentration', 'reactionOrder'], when: { ...other, rateKind: 'volume' }, value: (of) => (of['rateConstantGiven'] as number) * (of[f] as number) * (of['reactantConcentration'] as number) ** ((of['reactionOrder'] as number) - 1), formula: 'k = k_0 (k/k_0) c_0^(n - 1)', source: definition, dimensional: ofOrder },
    ]);
  }),
  ways('reactionTime', [way({ needs: ['rateConstant'], value: ({ rateConstant }) => 1 / rateConstant, formula: 't_r = 1/k', source: definition })]),
  quantity('surfaceRateConstant', { symbol: 'k"', name: 'rate constant of a surface as of first order', unit: 'm/s', ...largest }, [
    way({ needs: ['rateConstantGiven', 'arrheniusFactor'], when: { ...first, rateKind: 'surface' }, value: (of) => of.rateConstantGiven * of.arrheniusFactor, formula: 'k" = k_0 (k/k_0)', source: definition, dimensional: 'the constant as given has the unit of a surface' }),
    way({ needs: ['rateConstantGiven', 'arrheniusFactor', 'reactantConcentration', 'reactionOrder'], when: { ...other, rateKind: 'surface' }, value: (of) => of.rateConstantGiven * of.arrheniusFactor * of.reactantConcentration ** (of.reactionOrder - 1), formula: 'k" = k_0 (k/k_0) c_0^(n - 1)', source: definition, dimensional: ofOrder }),
    way({ needs: ['rateConstant', 'catalystLength', 'effectivenessFactor'], when: { reactionWhere: 'catalyst', rateKind: 'volume' }, value: ({ rateConstant, catalystLength, effectivenessFactor }) => effectivenessFactor * rateConstant * catalystLength, formula: 'k" = eta k V/S', source: definition, note: 'the rate constant counts on the volume of the catalyst' }),
  ]),
];

/** Groups of reaction against transport. */
const groups: Definition[] = [
  quantity('damkohler', { symbol: 'Da', name: 'Damkohler number: reaction against convection', unit: '1', ...largest }, [
    way({ needs: ['rateConstant', 'flowLength', 'speed'], when: { ...inFluid, flowClass: ['internal', 'continuum'] }, value: ({ rateConstant, flowLength, speed }) => (rateConstant * flowLength) / speed, formula: 'Da = k L_x/U', source: definition }),
    way({ needs: ['rateConstant', 'length', 'speed'], when: inFluid, value: ({ rateConstant, length, speed }) => (rateConstant * length) / speed, formula: 'Da = k L/U', source: definition }),
    way({ needs: ['surfaceRateConstant', 'wettedPerimeter', 'flowLength', 'flowArea', 'speed'], when: { reactionWhere: 'wall', flowClass: 'internal' }, value: (of) => (of.surfaceRateConstant * of.wettedPerimeter * of.flowLength) / (of.flowArea * of.speed), formula: 'Da = k" P L_x/(A U)', source: definition }),
  ]),
  quantity('damkohlerDiffusive', { symbol: 'Da_II', name: 'Damkohler number: reaction against diffusion', unit: '1', ...largest }, [
    way({ needs: ['rateConstant', 'length', 'reactantDiffusivity'], when: inFluid, value: ({ rateConstant, length, reactantDiffusivity }) => (rateConstant * length ** 2) / reactantDiffusivity, formula: 'Da_II = k L^2/D_m', source: definition }),
    way({ needs: ['surfaceRateConstant', 'length', 'reactantDiffusivity'], when: { reactionWhere: ['wall', 'catalyst'] }, value: ({ surfaceRateConstant, length, reactantDiffusivity }) => (surfaceRateConstant * length) / reactantDiffusivity, formula: 'Da_II = k" L/D_m', source: definition }),
  ]),
  quantity('damkohlerWall', { symbol: 'Da_w', name: 'Damkohler number of a surface: its reaction against the transfer to it', unit: '1', ...largest }, [
    way({ needs: ['surfaceRateConstant', 'reactantCoefficient'], value: ({ surfaceRateConstant, reactantCoefficient }) => surfaceRateConstant / reactantCoefficient, formula: 'Da_w = k"/k_c', source: levenspiel }),
  ]),
  quantity('wallReactionFactor', { symbol: 'F_w', name: 'rate at a surface with the resistance of transfer over that without', unit: '1', ...per }, [
    way({ needs: ['damkohlerWall'], value: ({ damkohlerWall }) => 1 / (1 + damkohlerWall), formula: 'F = 1/(1 + Da_w)', source: 'first order; resistances in series' }),
  ]),
  quantity('catalystLength', { symbol: 'V/S', name: 'volume of a catalyst particle over its surface', unit: 'm' }),
  quantity('catalystDiffusivity', { symbol: 'D_e', name: 'diffusivity of the reactant in the pores of a catalyst', unit: 'm^2/s', ...per }, [
    way({ needs: ['reactantDiffusivity'], when: { reactionWhere: 'catalyst' }, as: 'assumed', scatter: 1, value: ({ reactantDiffusivity }) => 0.1 * reactantDiffusivity, formula: 'D_e = 0.1 D_m', source: 'common practice: void fraction 0.3 to 0.6 over tortuosity 2 to 6, wide pores' }),
  ]),
  quantity('thiele', { symbol: 'phi', name: 'Thiele modulus on volume over surface', unit: '1', ...largest }, [
    way({ needs: ['catalystLength', 'rateConstant', 'catalystDiffusivity', 'reactionOrder'], when: { reactionWhere: 'catalyst' }, value: (of) => of.catalystLength * Math.sqrt(((of.reactionOrder + 1) / 2) * (of.rateConstant / of.catalystDiffusivity)), formula: 'phi = (V/S) sqrt((n + 1) k/(2 D_e))', source: 'Thiele, Ind. Eng. Chem. 31 (1939) 916; order n by Bischoff, AIChE J. 11 (1965) 351' }),
  ]),
  quantity('effectivenessFactor', { symbol: 'eta', name: 'rate in a porous catalyst over that without resistance inside', unit: '1', ...per }, [
    way({ needs: ['thiele'], when: { reactionWhere: 'catalyst' }, value: ({ thiele }) => effectiveness({ thiele, shape: 'sphere' }), formula: 'eta = (coth 3 phi - 1/(3 phi))/phi', source: 'Thiele, Ind. Eng. Chem. 31 (1939) 916, sphere' }),
  ]),
  quantity('hatta', { symbol: 'Ha_tt', name: 'Hatta number: reaction against diffusion in a liquid film', unit: '1', ...largest }, [
    way({ needs: ['rateConstant', 'reactantDiffusivity', 'filmCoefficient'], when: { reactionWhere: 'interface' }, value: ({ rateConstant, reactantDiffusivity, filmCoefficient }) => Math.sqrt(rateConstant * reactantDiffusivity) / filmCoefficient, formula: 'Ha = sqrt(k D_m)/k_L', source: 'Hatta 1932; film theory' }),
  ]),
  quantity('filmCoefficient', { symbol: 'k_L', name: 'mass-transfer coefficient of the liquid at an interface', unit: 'm/s', ...per }, [
    way({ needs: ['reactantDiffusivity', 'otherFluid.speed', 'speed', 'otherFluid.diameter'], scatter: 0.3, value: (of) => 2 * Math.sqrt((of.reactantDiffusivity * Math.abs(of['otherFluid.speed'] - of.speed)) / (Math.PI * of['otherFluid.diameter'])), formula: 'k_L = 2 sqrt(D_m U_s/(pi d))', source: 'Higbie, Trans. AIChE 31 (1935) 365' }),
  ]),
  quantity('enhancement', { symbol: 'F_Ha', name: 'absorption with the reaction in the film over that without', unit: '1', ...per }, [
    way({ needs: ['hatta'], value: ({ hatta }) => (hatta < 1e-6 ? 1 : hatta / Math.tanh(hatta)), formula: 'F = Ha/tanh Ha', source: 'Hatta 1932; without the cap of the second reactant' }),
  ]),
  quantity('turbulentDamkohler', { symbol: 'Da_t', name: 'time in which eddies mix over the time of reaction', unit: '1', ...largest }, [
    way({ needs: ['turbulentKineticEnergy', 'dissipationRate', 'rateConstant'], when: inFluid, scatter: 1, value: ({ turbulentKineticEnergy, dissipationRate, rateConstant }) => (turbulentKineticEnergy / dissipationRate) * rateConstant, formula: 'Da_t = k (k_t/eps)', source: 'definition; eddies of the stream that enters' }),
  ]),
];

/**
 * Relative spread of a conversion whose law is uncertain in the rate, not in what is left: width d ln X/d ln N.
 *
 * @param width  relative 95 % half-width of the rate
 * @param units  Damkohler number N that the rate is counted in
 * @param of     conversion at N
 * @returns      relative half-width of the conversion; N e^-N/(1 - e^-N) of the width in plug flow
 */
function spreadByRate({ width, units, of }: { width: number; units: number; of: (units: number) => number }): number {
  const step = 1e-4;
  const change = of(units * (1 + step)) - of(units * (1 - step));
  return of(units) > 0 ? (width * change) / (2 * step * of(units)) : width;
}

/** How far a reaction gets, and how much heat it sets free. */
const outcomes: Definition[] = [
  quantity('conversion', { symbol: 'X', name: 'conversion at the outlet', unit: '1', ...per }, [
    way({ needs: ['damkohler', 'reactantFourier'], when: { ...inFluid, ...first, flowClass: 'internal', regime: 'laminar', ductSection: 'round' }, range: { damkohler: [0, 5] }, scatter: 0.02, value: ({ damkohler, reactantFourier }) => laminarConversion({ damkohler, fourier: reactantFourier }), formula: 'X = X_s + (1 - e^-Da - X_s) Fo_m/(Fo_m + 0.095 Da^0.9), X_s = 1 - (1 - y) e^-y - y^2 E_1(y), y = Da/2', source: 'Cleland and Wilhelm, AIChE J. 2 (1956) 489, segregated; diffusion across fitted to the equation solved by finite volumes' }),
    way({ needs: ['damkohler', 'reactionOrder'], when: { ...inFluid, flowClass: 'internal', regime: ['laminar', 'transitional'] }, scatter: 0.15, value: ({ damkohler, reactionOrder }) => plugFlowConversion({ damkohler, order: reactionOrder }), formula: 'X = 1 - e^-Da, order n X = 1 - [1 + (n - 1) Da]^(1/(1 - n))', source: `${levenspiel}, plug flow`, note: 'the profile of laminar flow lowers it by up to 13 %' }),
    way({ needs: ['damkohler', 'reactionOrder'], when: { ...inFluid, flowClass: 'internal', regime: 'turbulent' }, scatter: ({ damkohler, reactionOrder: order }) => spreadByRate({ width: 0.02, units: damkohler, of: (n) => plugFlowConversion({ damkohler: n, order }) }), value: ({ damkohler, reactionOrder }) => plugFlowConversion({ damkohler, order: reactionOrder }), formula: 'X = 1 - e^-Da, order n X = 1 - [1 + (n - 1) Da]^(1/(1 - n))', source: `${levenspiel}, plug flow` }),
    way({ needs: ['damkohler', 'wallReactionFactor'], when: { reactionWhere: 'wall', flowClass: 'internal' }, scatter: (of) => spreadByRate({ width: 0.1, units: of.damkohler * of.wallReactionFactor, of: (n) => -Math.expm1(-n) }), value: ({ damkohler, wallReactionFactor }) => -Math.expm1(-damkohler * wallReactionFactor), formula: 'X = 1 - e^(-Da F_w)', source: 'first order; resistances in series' }),
    way({ needs: ['damkohler', 'bodenstein'], when: { ...first, flowClass: 'continuum' }, scatter: ({ damkohler, bodenstein }) => spreadByRate({ width: 0.05, units: damkohler, of: (n) => dispersedConversion({ damkohler: n, bodenstein }) }), value: ({ damkohler, bodenstein }) => dispersedConversion({ damkohler, bodenstein }), formula: 'X by Da and Bo_d between closed ends', source: 'Danckwerts, Chem. Eng. Sci. 2 (1953) 1' }),
    way({ needs: ['damkohler', 'reactionOrder'], when: { flowClass: 'continuum' }, scatter: ({ damkohler, reactionOrder: order }) => spreadByRate({ width: 0.1, units: damkohler, of: (n) => plugFlowConversion({ damkohler: n, order }) }), value: ({ damkohler, reactionOrder }) => plugFlowConversion({ damkohler, order: reactionOrder }), formula: 'X of plug flow', source: levenspiel }),
  ]),
  quantity('conversionPlug', { symbol: 'X_p', name: 'share converted in plug flow, the most that a passage can give', unit: '1', ...per }, [
    way({ needs: ['damkohler', 'reactionOrder'], when: inFluid, value: ({ damkohler, reactionOrder }) => plugFlowConversion({ damkohler, order: reactionOrder }), formula: 'X = 1 - e^-Da, order n X = 1 - [1 + (n - 1) Da]^(1/(1 - n))', source: levenspiel }),
  ]),
  quantity('conversionSegregated', { symbol: 'X_s', name: 'share converted in laminar flow in which nothing diffuses across', unit: '1', ...per }, [
    way({ needs: ['damkohler'], when: { ...inFluid, ...first, flowClass: 'internal', regime: 'laminar', ductSection: 'round' }, value: ({ damkohler }) => laminarConversion({ damkohler, fourier: 0 }), formula: 'X_s = 1 - (1 - y) e^-y - y^2 E_1(y), y = Da/2', source: 'Cleland and Wilhelm, AIChE J. 2 (1956) 489' }),
  ]),
  quantity('reactionFactorOutlet', { symbol: 'F_X', name: 'share of the reactant left at the outlet', unit: '1', ...per }, [
    way({ needs: ['conversion'], value: ({ conversion }) => 1 - conversion, formula: 'F = 1 - X', source: definition }),
  ]),
  quantity('bodenstein', { symbol: 'Bo_d', name: 'Bodenstein number: convection against spreading along the flow', unit: '1' }),
  quantity('dispersionFactorOutlet', { symbol: 'F_D', name: 'share left at the outlet with spreading along the flow over that of plug flow', unit: '1', ...per }, [
    way({ needs: ['damkohler', 'bodenstein'], when: first, value: ({ damkohler, bodenstein }) => (1 - dispersedConversion({ damkohler, bodenstein })) / Math.exp(-damkohler), formula: 'F = (1 - X) e^Da', source: 'Danckwerts, Chem. Eng. Sci. 2 (1953) 1' }),
  ]),
  quantity('reactionEnthalpy', { symbol: 'dH', name: 'enthalpy of a reaction, negative where heat is set free', unit: 'J/mol', signed: true, ...per }),
  quantity('adiabaticReactionRise', { symbol: 'dT_ad', name: 'temperature rise of the whole reaction without loss, negative where it cools', unit: 'K', signed: true, ...per }, [
    way({ needs: ['reactionEnthalpy', 'reactantMassFraction', 'reactantMolarMass', 'specificHeatCapacity'], when: { enthalpyPer: 'mole' }, value: (of) => (-of.reactionEnthalpy * of.reactantMassFraction) / (of.reactantMolarMass * of.specificHeatCapacity), formula: 'dT_ad = -dH Y_0/(M_A cp)', source: 'energy balance' }),
    way({ needs: ['reactionEnthalpy', 'reactantMassFraction', 'specificHeatCapacity'], when: { enthalpyPer: 'mass' }, value: (of) => (-of.reactionEnthalpy * of.reactantMassFraction) / of.specificHeatCapacity, formula: 'dT_ad = -dH Y_0/cp', source: 'energy balance', dimensional: 'the enthalpy as given counts on the mass' }),
  ]),
  quantity('reactionSensitivity', { symbol: 'eps_T', name: 'relative change of the rate over the heat of the reaction', unit: '1', signed: true, ...largest }, [
    way({ needs: ['activationEnergy', 'adiabaticReactionRise', 'bulkTemperature'], value: (of) => (of.activationEnergy * of.adiabaticReactionRise) / (gasConstant * of.bulkTemperature ** 2), formula: 'eps_T = E dT_ad/(R T^2)', source: 'Frank-Kamenetskii, Diffusion and Heat Transfer in Chemical Kinetics (1969)', dimensional: withR }),
  ]),
  quantity('reactionRateFactor', { symbol: 'F_T', name: 'rate with the heat of the reaction over that without', unit: '1', ...per }, [
    way({ needs: ['reactionSensitivity'], value: ({ reactionSensitivity }) => Math.exp(reactionSensitivity), formula: 'F = e^eps_T', source: 'Frank-Kamenetskii 1969; above 1 the rate multiplies' }),
  ]),
  quantity('semenovOverCritical', { symbol: 'Psi e', name: 'Semenov number over its critical value: heat set free against heat that the wall takes', unit: '1', signed: true, ...largest }, [
    way({ needs: ['rateConstantHot', 'reactantConcentration', 'reactionEnthalpy', 'activationEnergy', 'highestTemperature', 'heatTransferCoefficientPlain', 'hydraulicDiameter'], when: { ...inFluid, enthalpyPer: 'mole', flowClass: 'internal', wallKind: ['temperature', 'coefficient'] }, value: (of) => (Math.E * of.rateConstantHot * of.reactantConcentration * -of.reactionEnthalpy * of.activationEnergy * of.hydraulicDiameter) / (4 * gasConstant * of.highestTemperature ** 2 * of.heatTransferCoefficientPlain), formula: 'Psi e = e k_h c_0 (-dH) E D_h/(4 h R T_max^2)', source: 'Semenov 1928, S/V = 4/D_h, at the hottest state', dimensional: withR }),
  ]),
];

/** Reactions, one by one. */
export const reactions: Definition[] = [...rates, ...groups, ...outcomes];

/** What the reactions make of a species: identity with those that take it, nothing where none does. */
export const reacting: Definition[] = [
  quantity('damkohlerOf', { symbol: 'Da', name: 'Damkohler number of the reactions of a species in the fluid', unit: '1', per: ['species'], plain: 'target' }, [way({ needs: [], value: () => 0, formula: 'Da = 0', source: 'no reaction of it is named' })]),
  quantity('reactionFactorOf', { symbol: 'F_X', name: 'share of a species that its reactions leave at the outlet', unit: '1', per: ['species'], plain: 'target' }, [way({ needs: [], value: () => 1, formula: 'F = 1', source: 'no reaction of it is named' })]),
];
