import { quantity, way, type Definition } from '../workings/index.ts';

const referenced = { volumeFlowState: ['normal', 'standard'] } as const;
const din = 'DIN 1343 (1990): normal conditions of a gas, 0 degC and 101 325 Pa';
const iso = 'ISO 13443 (1996) and ISO 2533 (1975): standard conditions of a gas, 15 degC and 101 325 Pa';
const constant = 'a constant with unit';

/** A volume flow that counts gas at normal or standard conditions: which state that is, and what the gas weighs there. */
export const referenceFlow: Definition[] = [
  quantity('flowStateTemperature', { symbol: 'T_n', name: 'temperature at which the volume flow counts', unit: 'K' }, [
    way({ needs: [], as: 'assumed', when: { volumeFlowState: 'normal' }, value: () => 273.15, formula: 'T_n = 0 degC, as normal says', source: din, dimensional: constant }),
    way({ needs: [], as: 'assumed', when: { volumeFlowState: 'standard' }, value: () => 288.15, formula: 'T_n = 15 degC, as standard says', source: iso, dimensional: constant }),
  ]),
  quantity('flowStatePressure', { symbol: 'p_n', name: 'pressure at which the volume flow counts', unit: 'Pa' }, [
    way({ needs: [], as: 'assumed', when: { volumeFlowState: 'normal' }, value: () => 101325, formula: 'p_n = 101 325 Pa, as normal says', source: din, dimensional: constant }),
    way({ needs: [], as: 'assumed', when: { volumeFlowState: 'standard' }, value: () => 101325, formula: 'p_n = 101 325 Pa, as standard says', source: iso, dimensional: constant }),
  ]),
  quantity('flowStateDensity', { symbol: 'rho_n', name: 'density at which the volume flow counts', unit: 'kg/m^3' }, [
    way({ needs: ['density', 'flowStatePressure', 'pressure', 'flowStateTemperature', 'inletTemperature'], when: { ...referenced, fluidGiven: 'constants' }, value: (of) => (of.density * of.flowStatePressure * of.inletTemperature) / (of.pressure * of.flowStateTemperature), formula: 'rho_n = rho p_n T_in/(p T_n)', source: 'law of ideal gases' }),
  ]),
  quantity('volumeFlow', { symbol: 'Q', name: 'volume flow in all passages', unit: 'm^3/s' }, [
    way({ needs: ['inlet.volumeFlow'], when: { volumeFlowState: 'inlet' }, value: (of) => of['inlet.volumeFlow'], formula: 'Q as given at the inlet', source: 'the case' }),
    way({ needs: ['inlet.volumeFlow', 'flowStateDensity', 'density'], when: referenced, value: (of) => (of['inlet.volumeFlow'] * of.flowStateDensity) / of.density, formula: 'Q = Q_n rho_n/rho', source: 'conservation of mass; Q_n as given, at T_n and p_n' }),
    way({ needs: ['speed', 'flowArea', 'parallelPassages'], value: ({ speed, flowArea, parallelPassages }) => speed * flowArea * parallelPassages, formula: 'Q = n U A', source: 'conservation of mass' }),
  ]),
  quantity('massFlow', { symbol: 'm', name: 'mass flow in all passages', unit: 'kg/s' }, [
    way({ needs: ['inlet.massFlow'], value: (of) => of['inlet.massFlow'], formula: 'm as given at the inlet', source: 'the case' }),
    way({ needs: ['inlet.volumeFlow', 'flowStateDensity'], when: referenced, value: (of) => of['inlet.volumeFlow'] * of.flowStateDensity, formula: 'm = rho_n Q_n', source: 'Q_n as given, at T_n and p_n' }),
    way({ needs: ['density', 'speed', 'flowArea', 'parallelPassages'], value: ({ density, speed, flowArea, parallelPassages }) => density * speed * flowArea * parallelPassages, formula: 'm = n rho U A', source: 'conservation of mass' }),
  ]),
];
