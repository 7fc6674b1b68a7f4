import { quantity, way, type Definition } from '../workings/index.ts';

/** A value from which on a caution is due. */
const limit = (id: string, symbol: string, name: string, unit: string, value: number, formula: string, source: string): Definition =>
  quantity(id, { symbol, name, unit, ...(unit === 'K' ? { signed: true } : {}) }, [way({ needs: [], value: () => value, formula, source, dimensional: 'a limit with a unit' })]);
const practice = 'common practice; the code of the site decides';

/** What the cautions ask: how far the case is from states that hurt people, and the limits from which on it is said. */
export const hazards: Definition[] = [
  quantity('ambientPressure', { symbol: 'p_amb', name: 'pressure around the equipment', unit: 'Pa' }, [
    way({ needs: [], as: 'assumed', value: () => 101325, formula: 'p_amb = 101 325 Pa', source: 'CGPM 1954, standard atmosphere', dimensional: 'a constant with unit' }),
  ]),
  quantity('gaugePressure', { symbol: 'p_g', name: 'pressure above that around', unit: 'Pa', signed: true }, [
    way({ needs: ['pressure', 'ambientPressure'], value: ({ pressure, ambientPressure }) => pressure - ambientPressure, formula: 'p_g = p - p_amb', source: 'definition' }),
  ]),
  quantity('fluidVolume', { symbol: 'V', name: 'volume of fluid in the passages', unit: 'm^3' }, [
    way({ needs: ['flowArea', 'flowLength', 'parallelPassages'], when: { flowClass: ['internal', 'continuum'] }, value: ({ flowArea, flowLength, parallelPassages }) => flowArea * flowLength * parallelPassages, formula: 'V = n A L_x', source: 'geometry' }),
  ]),
  quantity('pressureEnergy', { symbol: 'p_g V', name: 'pressure above ambient times volume', unit: 'J', signed: true }, [
    way({ needs: ['gaugePressure', 'fluidVolume'], value: ({ gaugePressure, fluidVolume }) => gaugePressure * fluidVolume, formula: 'p_g V', source: 'definition' }),
  ]),
  quantity('ambientSaturation', { symbol: 'T_sat,amb', name: 'saturation temperature at ambient pressure', unit: 'K', signed: true }),
  quantity('flashMargin', { symbol: 'T_max - T_sat,amb', name: 'hottest liquid above its saturation at ambient pressure', unit: 'K', signed: true }, [
    way({ needs: ['highestTemperature', 'ambientSaturation'], when: { medium: 'liquid' }, value: ({ highestTemperature, ambientSaturation }) => highestTemperature - ambientSaturation, formula: 'T_max - T_sat(p_amb)', source: 'definition' }),
  ]),
  quantity('ambientBoilingFloor', { symbol: 'T_b,amb', name: 'temperature below which the solution does not boil at ambient pressure', unit: 'K', signed: true }),
  quantity('flashMarginMost', { symbol: 'T_max - T_b,amb', name: 'hottest part of the solution above the temperature below which it does not boil at ambient pressure', unit: 'K', signed: true }, [
    way({ needs: ['highestTemperature', 'ambientBoilingFloor'], when: { medium: 'liquid', boils: ['bounded', 'unknown'] }, value: ({ highestTemperature, ambientBoilingFloor }) => highestTemperature - ambientBoilingFloor, formula: 'T_max - T_b(p_amb)', source: 'definition' }),
  ]),
  limit('gaugePressureLimit', 'p_g,lim', 'gauge pressure of gas, vapour or flashing liquid from which on a burst hurts', 'Pa', 5e4, '0.5 bar', practice),
  limit('gaugePressureLimitLiquid', 'p_g,lim', 'gauge pressure of a cold liquid from which on a burst hurts', 'Pa', 1e6, '10 bar', practice),
  limit('pressureEnergyLimit', 'p_g V lim', 'pressure times volume of a gas from which on vessel codes look closer', 'J', 2500, '25 bar L', practice),
  limit('vacuumLimit', 'p_lim', 'absolute pressure below which collapse is to be checked', 'Pa', 5e4, '0.5 bar', practice),
  limit('touchLimit', 'T_touch', 'temperature from which on contact burns', 'K', 321.15, '48 degC', `metal held for minutes, ${practice}`),
  limit('oilFlashLimit', 'T_flash', 'temperature from which on common oils give off vapour that lights', 'K', 418.15, '145 degC', 'flash points of lubricating and heat-transfer oils, 150 to 220 degC, less 5 K; from memory'),
  limit('coldLimit', 'T_cold', 'temperature below which steels turn brittle and skin freezes', 'K', 223.15, '-50 degC', practice),
  limit('magneticLimit', 'B_lim', 'flux density from which on implants are disturbed', 'T', 5e-4, '0.5 mT', `${practice}; from memory`),
  limit('plumeLimit', 'Q_lim', 'heat release from which on a plume counts as a fire', 'W', 1e4, '10 kW', practice),
  limit('stagnationTimeLimit', 't_lim', 'residence from which on warm water is a question of hygiene', 's', 86400, '24 h', practice),
];
