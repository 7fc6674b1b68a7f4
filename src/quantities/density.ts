import { quantity, way, type Definition } from '../workings/index.ts';
import { factor } from './factor.ts';

const definition = 'definition';
const constants = { fluidGiven: 'constants' } as const;
const still = { imposedFlow: 'no' } as const;
const grayGiorgini = 'Gray and Giorgini, Int. J. Heat Mass Transfer 19 (1976) 545';

/** How far density and its slope change over the temperatures of the case. */
export const density: Definition[] = [
  quantity('densityChange', { symbol: 'eps_rho', name: 'density change over the temperatures of the case', unit: '1' }, [
    way({ needs: [], when: { energySolved: 'no' }, value: () => 0, formula: 'eps_rho = 0', source: 'one temperature throughout' }),
    way({ needs: ['thermalExpansion', 'highestTemperature', 'lowestTemperature'], when: constants, value: ({ thermalExpansion, highestTemperature, lowestTemperature }) => Math.abs(thermalExpansion) * (highestTemperature - lowestTemperature), formula: 'eps_rho = |beta| (T_max - T_min)', source: definition }),
    way({ needs: [], when: constants, value: () => 0, formula: 'eps_rho = 0', source: 'the fluid is given by constants without an expansion coefficient' }),
    way({ needs: ['densityHot', 'densityCold'], value: ({ densityHot, densityCold }) => (2 * Math.abs(densityCold - densityHot)) / (densityCold + densityHot), formula: 'eps_rho = |rho_c - rho_h|/mean', source: definition }),
  ]),
  ...factor('densityFactorFlow', { symbol: 'F_rho', name: 'volume flow at the hot end over that at the mean density' }, [
    way({ needs: ['densityChange'], value: ({ densityChange }) => 1 + densityChange / 2, formula: 'F = 1 + eps_rho/2', source: 'conservation of mass' }),
  ]),
  quantity('expansionChange', { symbol: 'eps_beta', name: 'change of the expansion coefficient over the temperature difference', unit: '1' }, [
    way({ needs: [], when: { energySolved: 'no' }, value: () => 0, formula: 'eps_beta = 0', source: 'one temperature throughout' }),
    way({ needs: [], when: constants, value: () => 0, formula: 'eps_beta = 0', source: 'expansion coefficient given as a constant' }),
    way({
      needs: ['referenceTemperature', 'temperatureDifference', 'pressure'], laws: ['thermalExpansion'],
      value: (of, laws) => {
        const [t, step] = [of.referenceTemperature, 1e-3 * of.referenceTemperature];
        const [below, above] = [laws.thermalExpansion(t - step, of.pressure), laws.thermalExpansion(t + step, of.pressure)];
        return (Math.abs((above - below) / ((above + below) / 2)) * of.temperatureDifference) / (2 * step);
      },
      formula: 'eps_beta = |d ln beta/dT| dT', source: grayGiorgini,
    }),
    way({ needs: ['thermalExpansionHot', 'thermalExpansionCold'], value: ({ thermalExpansionHot: h, thermalExpansionCold: c }) => Math.abs((2 * (h - c)) / (h + c)), formula: 'eps_beta = |beta_h - beta_c|/mean', source: definition }),
  ]),
  quantity('expansionSign', { symbol: 'beta_c/beta_h', name: 'expansion coefficient at the lowest over that at the highest temperature; negative where the density has an extremum between', unit: '1', signed: true }, [
    way({ needs: ['thermalExpansionCold', 'thermalExpansionHot'], value: (of) => of.thermalExpansionCold / of.thermalExpansionHot, formula: 'beta_c/beta_h', source: definition }),
  ]),
  quantity('buoyancyForceFactor', { symbol: 'F_g', name: 'buoyancy force with the full density law over that with the slope at one end', unit: '1' }, [
    way({ needs: ['expansionChange'], value: ({ expansionChange }) => 1 + expansionChange / 2, formula: 'F = 1 + eps_beta/2', source: 'density to second order in temperature' }),
  ]),
  ...factor('nonlinearDensityFactorNusselt', { symbol: 'F_g,Nu', name: 'natural heat transfer with the full density law over that with the slope at one end' }, [
    way({ needs: ['buoyancyForceFactor'], when: { ...still, regime: 'laminar' }, value: ({ buoyancyForceFactor }) => buoyancyForceFactor ** 0.25, formula: 'F = F_g^(1/4)', source: 'Nu grows as Ra^(1/4) in laminar layers' }),
    way({ needs: ['buoyancyForceFactor'], when: { ...still, regime: ['transitional', 'turbulent'] }, value: ({ buoyancyForceFactor }) => Math.cbrt(buoyancyForceFactor), formula: 'F = F_g^(1/3)', source: 'Nu grows as Ra^(1/3) in turbulent layers' }),
  ]),
];
