import { quantity, way, wordWay, type Definition } from '../workings/index.ts';

/** How near the fluid comes to another phase: cavitation, boiling, condensation, freezing. */
export const phase: Definition[] = [
  ...([
    ['volatile', 'vapourPressure', 'cavitationMarginLeast', (margin: number) => margin > 1, 'a vapour pressure'],
    ['boils', 'saturationTemperature', 'boilingMarginMost', (margin: number) => margin < 0, 'a saturation line'],
    ['melts', 'meltingTemperature', 'freezingMarginLeast', (margin: number) => margin > 0, 'a melting point'],
  ] as const).map(([id, need, bound, within, what]) =>
    quantity(id, { symbol: '', name: `the fluid has ${what}`, unit: 'word', words: ['yes', 'bounded', 'no', 'unknown'] }, [
      wordWay({ needs: [need], word: () => 'yes', formula: `${what} is known`, source: 'material record' }),
      // What is sure of the solution decides as long as the case stays on the sure side of it.
      wordWay({ needs: [bound], when: { medium: 'liquid' }, word: (of) => (within(of[bound]) ? 'bounded' : 'unknown'), formula: `${what} is known to lie beyond a bound`, source: 'material record' }),
      // Water boils off and freezes out of a solution whether or not its record says where.
      ...(id === 'volatile' ? [] : [wordWay({ needs: [], when: { medium: 'liquid', 'has.solution': 'yes' }, word: () => 'unknown', formula: `${what} of the solution is not known`, source: 'material record' })]),
      wordWay({ needs: [], word: () => 'no', formula: `${what} is not known`, source: 'material record' }),
    ])),
  quantity('pressureCoefficientMin', { symbol: '|C_p,min|', name: 'magnitude of the lowest pressure coefficient on the speed scale', unit: '1' }, [
    way({ needs: [], as: 'assumed', value: () => 1, formula: '|C_p,min| = 1', source: 'common practice for straight passages, steps, cavities and tanks, on the safe side' }),
  ]),
  quantity('cavitationNumber', { symbol: 'sigma_c', name: 'cavitation number', unit: '1' }, [
    way({ needs: ['lowestPressure', 'vapourPressure', 'density', 'speed'], when: { medium: 'liquid' }, value: ({ lowestPressure, vapourPressure, density, speed }) => (lowestPressure - vapourPressure) / (0.5 * density * speed ** 2), formula: 'sigma_c = (p_min - p_v)/(rho U^2/2)', source: 'definition' }),
  ]),
  quantity('cavitationMargin', { symbol: 'sigma_c/|C_p,min|', name: 'cavitation number over the lowest pressure coefficient', unit: '1' }, [
    way({ needs: ['cavitationNumber', 'pressureCoefficientMin'], value: ({ cavitationNumber, pressureCoefficientMin }) => cavitationNumber / pressureCoefficientMin, formula: 'sigma_c/|C_p,min|', source: 'definition' }),
  ]),
  quantity('cavitationMarginLeast', { symbol: 'sigma_min/|C_p,min|', name: 'cavitation number with the highest vapour pressure the solution can have, over the lowest pressure coefficient', unit: '1' }, [
    way({ needs: ['lowestPressure', 'vapourPressureCeiling', 'density', 'speed', 'pressureCoefficientMin'], when: { medium: 'liquid' }, value: ({ lowestPressure, vapourPressureCeiling, density, speed, pressureCoefficientMin }) => (lowestPressure - vapourPressureCeiling) / (0.5 * density * speed ** 2 * pressureCoefficientMin), formula: '(p_min - p_v,max)/(|C_p,min| rho U^2/2)', source: 'the solution has a lower vapour pressure than what evaporates first' }),
  ]),
  quantity('cavitationDeficit', { symbol: 'dp_v', name: 'how far a single-phase field falls below the vapour pressure', unit: 'Pa' }, [
    way({ needs: ['cavitationNumber', 'pressureCoefficientMin', 'density', 'speed'], value: ({ cavitationNumber, pressureCoefficientMin, density, speed }) => Math.max(0, pressureCoefficientMin - cavitationNumber) * 0.5 * density * speed ** 2, formula: 'dp_v = (|C_p,min| - sigma_c) rho U^2/2', source: 'definition' }),
  ]),
  quantity('boilingMargin', { symbol: 'T_w - T_sat', name: 'wall above saturation at the lowest pressure', unit: 'K', signed: true, per: ['wall'], plain: 'largest' }, [
    way({ needs: ['wallTemperatureMax', 'saturationTemperature'], when: { medium: 'liquid' }, value: ({ wallTemperatureMax, saturationTemperature }) => wallTemperatureMax - saturationTemperature, formula: 'T_w,max - T_sat(p_min)', source: 'definition' }),
  ]),
  quantity('boilingMarginMost', { symbol: 'T_w - T_b,min', name: 'wall above the temperature below which the solution does not boil, at the lowest pressure', unit: 'K', signed: true, per: ['wall'], plain: 'largest' }, [
    way({ needs: ['wallTemperature', 'boilingFloor'], when: { medium: 'liquid' }, value: ({ wallTemperature, boilingFloor }) => wallTemperature - boilingFloor, formula: 'T_w - T_b,min(p_min)', source: 'the solution boils no lower than what evaporates first' }),
  ]),
  quantity('boilingOnset', { symbol: 'dT_ONB', name: 'wall superheat at which boiling begins', unit: 'K', signed: true, per: ['wall'], plain: 'target' }, [
    way({ needs: ['surfaceTension', 'saturationTemperature', 'wallHeatFlux', 'vapourDensity', 'latentHeat', 'thermalConductivityWall'], scatter: 0.5, value: ({ surfaceTension, saturationTemperature, wallHeatFlux, vapourDensity, latentHeat, thermalConductivityWall }) => Math.sqrt((8 * surfaceTension * saturationTemperature * Math.max(0, wallHeatFlux)) / (vapourDensity * latentHeat * thermalConductivityWall)), formula: 'dT_ONB = sqrt(8 sigma T_sat q/(rho_v h_fg k_l))', source: 'Davis and Anderson, AIChE J. 12 (1966) 774' }),
    way({ needs: [], as: 'assumed', value: () => 5, formula: 'dT_ONB = 5 K', source: 'common practice where the heat flux is not known', dimensional: 'a temperature difference from practice' }),
  ]),
  quantity('dewTemperature', { symbol: 'T_dew', name: 'dew point of the fluid that arrives', unit: 'K', signed: true }, [
    way({ needs: ['fluid.humidity', 'farTemperature'], when: { medium: 'gas' }, range: { farTemperature: [233.15, 373.15] }, value: (of) => {
      const t = of.farTemperature - 273.15;
      const x = Math.log(Math.max(of['fluid.humidity'], 1e-6)) + (17.625 * t) / (t + 243.04);
      return 273.15 + (243.04 * x) / (17.625 - x);
    }, formula: 'T_dew from phi exp(17.625 t/(t + 243.04 degC)) = exp(17.625 t_dew/(t_dew + 243.04 degC))', source: 'Alduchov and Eskridge, J. Appl. Meteor. 35 (1996) 601, within 0.1 K', dimensional: 'constants in degrees Celsius' }),
    way({ needs: ['saturationTemperature'], when: { medium: 'gas', 'has.humidity': 'no' }, value: ({ saturationTemperature }) => saturationTemperature, formula: 'T_dew = T_sat(p)', source: 'a pure vapour condenses at its saturation temperature' }),
  ]),
  quantity('moisture', { symbol: '', name: 'what of the gas can condense', unit: 'word', words: ['humid', 'vapour', 'possible', 'no'] }, [
    wordWay({ needs: ['fluid.humidity'], when: { medium: 'gas' }, word: () => 'humid', formula: 'humidity is given', source: 'the case' }),
    wordWay({ needs: ['saturationTemperature'], when: { medium: 'gas' }, word: () => 'vapour', formula: 'the record has a saturation line', source: 'material record' }),
    wordWay({ needs: ['lowestTemperature', 'farTemperature'], when: { medium: 'gas' }, word: ({ lowestTemperature, farTemperature }) => (lowestTemperature < 288.15 && lowestTemperature < farTemperature - 0.01 ? 'possible' : 'no'), formula: 'a wall below 15 degC and colder than the gas', source: 'common practice: real air is moist', dimensional: 'a temperature from practice' }),
    wordWay({ needs: [], word: () => 'no', formula: 'a liquid, or no temperatures', source: 'definition' }),
  ]),
  quantity('condensationMargin', { symbol: 'T_w - T_dew', name: 'coldest wall above the dew point', unit: 'K', signed: true }, [
    way({ needs: ['lowestTemperature', 'dewTemperature'], when: { medium: 'gas' }, value: ({ lowestTemperature, dewTemperature }) => lowestTemperature - dewTemperature, formula: 'T_min - T_dew', source: 'definition' }),
  ]),
  quantity('freezingMargin', { symbol: 'T_min - T_m', name: 'lowest temperature above the melting point', unit: 'K', signed: true }, [
    way({ needs: ['lowestTemperature', 'meltingTemperature'], value: ({ lowestTemperature, meltingTemperature }) => lowestTemperature - meltingTemperature, formula: 'T_min - T_m', source: 'definition' }),
  ]),
  quantity('freezingMarginLeast', { symbol: 'T_min - T_m,max', name: 'lowest temperature above that which no freezing of the solution passes', unit: 'K', signed: true }, [
    way({ needs: ['lowestTemperature', 'freezingCeiling'], when: { medium: 'liquid' }, value: ({ lowestTemperature, freezingCeiling }) => lowestTemperature - freezingCeiling, formula: 'T_min - T_m,max', source: 'a weak solution freezes below water' }),
  ]),
];
