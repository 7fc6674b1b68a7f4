import { quantity, way, ways, wordWay, type Definition } from '../workings/index.ts';
import { noFactor } from './factor.ts';

/** Stefan-Boltzmann constant [W/(m^2 K^4)], CODATA 2022. */
const sigma = 5.670374419e-8;
const constant = 'the Stefan-Boltzmann constant has a unit';
const stefan = 'Stefan-Boltzmann law, gray diffuse surfaces; constant of CODATA 2022';
const definition = 'definition';
const clear = { transparency: 'transparent', energySolved: 'yes' } as const;
const black = (hot: number, cold: number): number => sigma * (hot ** 4 - cold ** 4);

/**
 * Exchange between two named walls of a flow, each with its own emissivity.
 *
 * @param one    place of a wall, such as `walls.left`
 * @param other  place of the wall opposite
 * @returns      ways that a flow adds
 */
export function facingWalls(one: string, other: string): Definition[] {
  return [ways('exchangeEmissivity', [{ needs: [`emissivity@${one}`, `emissivity@${other}`], value: (of) => 1 / (1 / (of[`emissivity@${one}`] as number) + 1 / (of[`emissivity@${other}`] as number) - 1), formula: 'eps_12 = 1/(1/eps_1 + 1/eps_2 - 1)', source: 'two large parallel gray surfaces' }])];
}

/** Radiation: between surfaces, from the outer face, by the gas itself, in turbulent flames. */
export const radiation: Definition[] = [...surfaces(), ...outerFace(), ...gas()];

function surfaces(): Definition[] {
  return [
    quantity('emissivity', { symbol: 'eps', name: 'emissivity of a wall', unit: '1', per: ['wall'], plain: 'target' }),
    quantity('exchangeEmissivity', { symbol: 'eps_12', name: 'emissivity of the exchange between the hottest and the coldest wall', unit: '1' }, [
      way({ needs: ['emissivity'], as: 'assumed', value: ({ emissivity }) => emissivity / (2 - emissivity), formula: 'eps_12 = 1/(2/eps - 1)', source: 'both walls are taken as alike' }),
    ]),
    ...(['hottest', 'coldest'] as const).map((which) => quantity(`${which}Wall`, { symbol: which === 'hottest' ? 'T_1' : 'T_2', name: `mean temperature of the ${which} wall`, unit: 'K', signed: true, per: ['wall'], plain: which === 'hottest' ? 'largest' : 'smallest' }, [
      way({ needs: ['wallTemperature'], value: ({ wallTemperature }) => wallTemperature, formula: 'T_w', source: definition }),
    ])),
    quantity('wallTemperatureSpan', { symbol: 'dT_w', name: 'hottest against coldest wall', unit: 'K' }, [
      way({ needs: ['hottestWall', 'coldestWall'], value: ({ hottestWall, coldestWall }) => hottestWall - coldestWall, formula: 'T_1 - T_2', source: definition }),
    ]),
    quantity('radiativeFlux', { symbol: 'q_r', name: 'net radiation from the target wall', unit: 'W/m^2', signed: true }, [
      way({ needs: ['wallTemperature', 'surroundingsTemperature', 'emissivity'], when: { ...clear, flowClass: 'body' }, value: (of) => of.emissivity * black(of.wallTemperature, of.surroundingsTemperature), formula: 'q_r = eps sigma (T_w^4 - T_sur^4), large surroundings', source: stefan, dimensional: constant }),
      way({ needs: ['hottestWall', 'coldestWall', 'exchangeEmissivity'], when: { ...clear, flowClass: ['enclosure', 'internal'] }, value: (of) => of.exchangeEmissivity * black(of.hottestWall, of.coldestWall), formula: 'q_r = eps_12 sigma (T_1^4 - T_2^4), hottest and coldest wall as large parallel surfaces', source: stefan, dimensional: constant }),
    ]),
    quantity('convectiveFluxPlain', { symbol: 'q_c', name: 'convective flux from the target wall with the plain Nusselt number', unit: 'W/m^2', signed: true }, [
      way({ needs: ['heatTransferCoefficientPlain', 'wallTemperature', 'farTemperature'], when: { flowClass: 'body' }, value: (of) => of.heatTransferCoefficientPlain * (of.wallTemperature - of.farTemperature), formula: 'q_c = h_0 (T_w - T_far)', source: definition }),
      way({ needs: ['heatTransferCoefficientPlain', 'hotTemperature', 'coldTemperature'], when: { flowClass: 'enclosure' }, value: (of) => of.heatTransferCoefficientPlain * (of.hotTemperature - of.coldTemperature), formula: 'q_c = h_0 (T_h - T_c)', source: definition }),
      way({ needs: ['heatTransferCoefficientPlain', 'wallTemperature', 'bulkTemperature'], when: { flowClass: ['internal', 'continuum'] }, value: (of) => of.heatTransferCoefficientPlain * (of.wallTemperature - of.bulkTemperature), formula: 'q_c = h_0 (T_w - T_b)', source: definition }),
    ]),
    quantity('radiationShare', { symbol: 's_r', name: 'radiation over all heat that leaves the target wall', unit: '1' }, [
      way({ needs: ['radiativeFlux', 'convectiveFluxPlain'], when: clear, value: ({ radiativeFlux, convectiveFluxPlain }) => Math.abs(radiativeFlux) / (Math.abs(convectiveFluxPlain) + Math.abs(radiativeFlux)), formula: 's_r = |q_r|/(|q_c| + |q_r|)', source: definition }),
    ]),
    quantity('radiationSense', { symbol: 'q_r/q_c', name: 'radiation over convection; negative where they run against each other', unit: '1', signed: true }, [
      way({ needs: ['radiativeFlux', 'convectiveFluxPlain'], when: clear, value: ({ radiativeFlux, convectiveFluxPlain }) => radiativeFlux / convectiveFluxPlain, formula: 'q_r/q_c', source: definition }),
    ]),
    quantity('radiationFactorHeat', { symbol: 'F_r', name: 'heat from the wall with radiation over that without', unit: '1' }, [
      way({ needs: ['radiationShare'], when: clear, value: ({ radiationShare }) => 1 / (1 - radiationShare), formula: 'F = 1/(1 - s_r)', source: 'sum of the fluxes, where both have one sign' }),
      noFactor,
    ]),
  ];
}

/**
 * Temperature of the outer face between a resistance behind it and convection with radiation in front, by bisection.
 *
 * @returns  [K]; the wetted face where the wall has no resistance
 */
function faceTemperature(inside: number, around: number, resistance: number, convection: number, emissivity: number, area: number): number {
  if (resistance <= 0 || inside === around) return inside;
  let [low, high] = inside < around ? [inside, around] : [around, inside];
  for (let k = 0; k < 100; k++) {
    const t = (low + high) / 2;
    if ((inside - t) / resistance > area * (convection * (t - around) + emissivity * black(t, around))) low = t;
    else high = t;
  }
  return (low + high) / 2;
}

function outerFace(): Definition[] {
  const needs = ['emissivity', 'wallTemperature', 'surroundingsTemperature', 'wallResistance', 'outerCoefficient', 'outerAreaRatio'] as const;
  return [
    ways('outerRadiationCoefficient', [
      way({
        needs, when: { wallKind: 'coefficient' }, value: (of) => {
          const outer = faceTemperature(of.wallTemperature, of.surroundingsTemperature, of.wallResistance, of.outerCoefficient, of.emissivity, of.outerAreaRatio);
          return of.emissivity * sigma * (outer ** 2 + of.surroundingsTemperature ** 2) * (outer + of.surroundingsTemperature);
        },
        formula: 'h_r = eps sigma (T_o^2 + T_sur^2)(T_o + T_sur), T_o from (T_w - T_o)/R_w = (h_o + h_r)(T_o - T_sur) A_o/A_i', source: stefan, dimensional: constant, note: 'the emissivity given for the wall is taken as that of its outer face',
      }),
    ]),
  ];
}

function gas(): Definition[] {
  const closed = ['internal', 'enclosure'];
  /** Magnus form, pressure of saturated vapour over water [Pa] at T [K]. */
  const saturated = (t: number): number => 610.94 * Math.exp((17.625 * (t - 273.15)) / (t - 273.15 + 243.04));
  return [
    quantity('absorbingShare', { symbol: 'x_a', name: 'share of water vapour and carbon dioxide in the gas, by mole', unit: '1' }),
    quantity('absorber', { symbol: '', name: 'what absorbs heat radiation in the gas', unit: 'word', words: ['none', 'water-vapour', 'carbon-dioxide', 'given', 'combustion'] }, [
      wordWay({ needs: [], when: { transparency: 'opaque' }, word: () => 'none', formula: 'an opaque fluid', source: definition }),
      wordWay({ needs: ['fluid.absorptionCoefficient'], word: (of) => (of['fluid.absorptionCoefficient'] > 0 ? 'given' : 'none'), formula: 'absorption coefficient as given', source: 'the case' }),
      wordWay({ needs: [], when: { 'has.burning': 'yes' }, word: () => 'combustion', formula: 'burnt gas', source: definition }),
      wordWay({ needs: [], when: { 'has.humidity': 'yes' }, word: () => 'water-vapour', formula: 'humid gas', source: definition }),
      wordWay({ needs: ['absorbingShare'], word: ({ absorbingShare }) => (absorbingShare > 0 ? 'combustion' : 'none'), formula: 'water vapour and carbon dioxide in the mixture', source: definition }),
      wordWay({ needs: ['molarMass'], word: ({ molarMass }) => (Math.abs(molarMass - 0.04401) < 5e-5 ? 'carbon-dioxide' : Math.abs(molarMass - 0.018015) < 5e-5 ? 'water-vapour' : 'none'), formula: 'a pure gas told by its molar mass', source: 'air, nitrogen, oxygen and noble gases do not absorb', dimensional: 'molar masses have a unit' }),
      wordWay({ needs: [], word: () => 'none', formula: 'no absorber named', source: definition }),
    ]),
    quantity('absorbingPressure', { symbol: 'p_a', name: 'partial pressure of the absorbing gas', unit: 'Pa' }, [
      way({ needs: ['fluid.humidity', 'referenceTemperature'], when: { absorber: 'water-vapour', 'has.humidity': 'yes' }, range: { referenceTemperature: [233.15, 373.15] }, value: (of) => of['fluid.humidity'] * saturated(of.referenceTemperature), formula: 'p_a = phi p_sat(T)', source: 'Alduchov and Eskridge, J. Appl. Meteor. 35 (1996) 601', dimensional: 'constants in degrees Celsius' }),
      way({ needs: ['absorbingShare', 'pressure'], when: { absorber: 'combustion' }, value: ({ absorbingShare, pressure }) => absorbingShare * pressure, formula: 'p_a = (x_w + x_c) p', source: 'Dalton' }),
      way({ needs: ['pressure'], when: { absorber: ['carbon-dioxide', 'water-vapour'], 'has.humidity': 'no' }, value: ({ pressure }) => pressure, formula: 'p_a = p', source: 'a pure gas' }),
    ]),
    quantity('meanBeamLength', { symbol: 'L_m', name: 'mean beam length of the gas', unit: 'm' }, [
      way({ needs: ['hydraulicDiameter'], when: { flowClass: 'internal' }, scatter: 0.05, value: ({ hydraulicDiameter }) => 0.9 * hydraulicDiameter, formula: 'L_m = 3.6 V/A = 0.9 D_h', source: 'Hottel and Sarofim, Radiative Transfer (1967)' }),
      way({ needs: ['gap', 'passageHeight'], when: { flowClass: 'enclosure' }, scatter: 0.05, value: ({ gap, passageHeight }) => (1.8 * gap * passageHeight) / (gap + passageHeight), formula: 'L_m = 3.6 V/A = 1.8 W H/(W + H), endless in depth', source: 'Hottel and Sarofim, Radiative Transfer (1967)' }),
    ]),
    quantity('opticalThickness', { symbol: 'tau_o', name: 'absorption over the mean beam length', unit: '1' }, [
      way({ needs: ['fluid.absorptionCoefficient', 'meanBeamLength'], value: (of) => of['fluid.absorptionCoefficient'] * of.meanBeamLength, formula: 'tau_o = kappa L_m', source: definition }),
      way({ needs: ['referenceTemperature', 'absorbingPressure', 'meanBeamLength'], scatter: (of) => (of.referenceTemperature < 500 ? 1 : 0.5), range: { referenceTemperature: [250, 1600] }, value: (of) => 0.66 * (of.referenceTemperature / 1000) ** -0.55 * ((of.absorbingPressure / 1e5) * of.meanBeamLength) ** 0.54, formula: 'tau_o = 0.66 (T/1000 K)^-0.55 (p_a L_m/(bar m))^0.54', source: 'fit to the total emissivities of Leckner, Combust. Flame 19 (1972) 33, mixture of 2 H2O to 1 CO2; his coefficients from memory', dimensional: 'constants in bar, metre, kelvin', note: 'a factor of 2 below 500 K' }),
    ]),
    quantity('gasEmissivity', { symbol: 'eps_g', name: 'emissivity of the gas', unit: '1' }, [
      way({ needs: ['opticalThickness'], value: ({ opticalThickness }) => -Math.expm1(-opticalThickness), formula: 'eps_g = 1 - exp(-tau_o)', source: 'gray gas' }),
    ]),
    quantity('gasRadiativeFlux', { symbol: 'q_g', name: 'radiation of the gas to the target wall, magnitude', unit: 'W/m^2' }, [
      way({ needs: ['gasEmissivity', 'bulkTemperature', 'wallTemperature'], when: { flowClass: closed }, value: (of) => of.gasEmissivity * Math.abs(black(of.bulkTemperature, of.wallTemperature)), formula: 'q_g = eps_g sigma |T_g^4 - T_w^4|', source: 'black wall; constant of CODATA 2022', dimensional: constant }),
    ]),
    quantity('gasRadiationShare', { symbol: 's_g', name: 'radiation of the gas over all heat at the target wall', unit: '1' }, [
      way({ needs: ['gasRadiativeFlux', 'convectiveFluxPlain', 'wallTemperatureSpan', 'radiativeFlux'], when: { flowClass: 'enclosure' }, value: (of) => of.gasRadiativeFlux / (Math.abs(of.convectiveFluxPlain) + Math.abs(of.radiativeFlux) + of.gasRadiativeFlux), formula: 's_g = q_g/(q_c + q_r + q_g)', source: definition }),
      way({ needs: ['gasRadiativeFlux', 'convectiveFluxPlain'], when: { flowClass: 'internal' }, value: ({ gasRadiativeFlux, convectiveFluxPlain }) => gasRadiativeFlux / (Math.abs(convectiveFluxPlain) + gasRadiativeFlux), formula: 's_g = q_g/(q_c + q_g)', source: 'walls of one temperature exchange nothing' }),
    ]),
    quantity('gasRadiationFactorHeat', { symbol: 'F_g', name: 'heat at the wall with the radiation of the gas over that without', unit: '1' }, [
      way({ needs: ['gasRadiationShare'], value: ({ gasRadiationShare }) => 1 / (1 - gasRadiationShare), formula: 'F = 1/(1 - s_g)', source: 'sum of the fluxes' }),
      noFactor,
    ]),
    quantity('temperatureFluctuation', { symbol: "T'/T", name: 'temperature fluctuation over the temperature', unit: '1' }, [
      way({ needs: [], when: { 'has.burning': 'yes' }, as: 'assumed', scatter: 0.5, value: () => 0.2, formula: "T'/T = 0.2", source: 'turbulent flames, common practice' }),
      way({ needs: ['bulkTemperature', 'wallTemperature'], as: 'assumed', scatter: 0.5, value: ({ bulkTemperature, wallTemperature }) => (0.1 * Math.abs(bulkTemperature - wallTemperature)) / bulkTemperature, formula: "T' = 0.1 |T_g - T_w|", source: 'turbulent flow without reaction, common practice' }),
    ]),
    quantity('emissionFluctuation', { symbol: "6 (T'/T)^2", name: 'what temperature fluctuations add to emission', unit: '1' }, [
      way({ needs: ['temperatureFluctuation'], value: ({ temperatureFluctuation }) => 6 * temperatureFluctuation ** 2, formula: "6 (T'/T)^2", source: 'mean of T^4 to second order' }),
    ]),
    quantity('emissionFluctuationFactor', { symbol: 'F_TRI', name: 'mean emission over emission at the mean temperature', unit: '1' }, [
      way({ needs: ['emissionFluctuation'], value: ({ emissionFluctuation }) => 1 + emissionFluctuation, formula: "F = 1 + 6 (T'/T)^2", source: 'mean of T^4 to second order' }),
      noFactor,
    ]),
  ];
}
