import { quantity, way, type Definition } from '../workings/index.ts';

const per = { per: ['species' as const], plain: 'largest' as const };
const usual = 'usual magnitude';

/** What a temperature difference does to a species, and a concentration difference to heat: the coefficients are of the usual size, no case gives them. */
export const thermalDiffusion: Definition[] = [
  quantity('thermalDiffusionFactor', { symbol: 'alpha_T', name: 'thermal diffusion factor', unit: '1' }, [
    way({ needs: [], when: { medium: 'gas', lightGas: 'yes' }, as: 'assumed', scatter: 1, value: () => 0.2, formula: 'alpha_T = 0.2, between 0.1 and 0.4', source: `${usual} with hydrogen or helium; Chapman and Cowling, The Mathematical Theory of Non-Uniform Gases, from memory` }),
    way({ needs: [], when: { medium: 'gas' }, as: 'assumed', scatter: 1, value: () => 0.05, formula: 'alpha_T = 0.05, at most 0.1', source: `${usual} between molecules of like mass, common practice` }),
  ]),
  quantity('soretCoefficient', { symbol: 'S_T', name: 'Soret coefficient', unit: '1/K' }, [
    way({ needs: ['thermalDiffusionFactor', 'referenceTemperature'], when: { medium: 'gas' }, value: ({ thermalDiffusionFactor, referenceTemperature }) => thermalDiffusionFactor / referenceTemperature, formula: 'S_T = alpha_T/T', source: 'definition' }),
    way({ needs: [], when: { medium: 'liquid' }, as: 'assumed', scatter: 2, value: () => 3e-3, formula: 'S_T = 3e-3 1/K, between 1e-3 and 1e-2', source: `${usual} in liquids, common practice`, dimensional: 'a coefficient with a unit' }),
  ]),
  quantity('thermalSeparation', { symbol: 'dY_T', name: 'separation that the temperature difference would make in a mixture at rest', unit: '1', ...per }, [
    way({ needs: ['soretCoefficient', 'temperatureDifference', 'massFractionMax'], value: ({ soretCoefficient, temperatureDifference, massFractionMax: y }) => soretCoefficient * temperatureDifference * y * (1 - y), formula: 'dY_T = S_T dT Y (1 - Y)', source: 'definition, rest state' }),
  ]),
  quantity('soretRatio', { symbol: 'S_T dT Y (1 - Y)/dY', name: 'thermal over ordinary diffusion', unit: '1', ...per }, [
    way({ needs: ['thermalSeparation', 'massFractionDifference'], value: ({ thermalSeparation, massFractionDifference }) => thermalSeparation / massFractionDifference, formula: 'S_T dT Y (1 - Y)/dY', source: 'definition' }),
  ]),
  quantity('soretFactorFlux', { symbol: 'F_S', name: 'flux of a species with thermal diffusion over that without', unit: '1', ...per }, [
    way({ needs: ['soretRatio'], value: ({ soretRatio }) => 1 + soretRatio, formula: 'F = 1 + S_T dT Y (1 - Y)/dY', source: 'definition' }),
  ]),
  quantity('dufourRatio', { symbol: 'N_Du', name: 'heat that diffusion carries over heat that is conducted', unit: '1', ...per }, [
    way({ needs: ['gasConstant', 'referenceTemperature', 'thermalDiffusionFactor', 'density', 'diffusivity', 'massFractionDifference', 'thermalConductivity', 'temperatureDifference'], when: { medium: 'gas' }, value: (of) => (of.gasConstant * of.referenceTemperature * of.thermalDiffusionFactor * of.density * of.diffusivity * of.massFractionDifference) / (of.thermalConductivity * of.temperatureDifference), formula: 'R T alpha_T rho D_m dY/(M k dT)', source: 'irreversible thermodynamics; reciprocal to thermal diffusion' }),
  ]),
  quantity('dufourFactorHeat', { symbol: 'F_Du', name: 'heat flux with what diffusion carries over that without', unit: '1', ...per }, [
    way({ needs: ['dufourRatio'], value: ({ dufourRatio }) => 1 + dufourRatio, formula: 'F = 1 + R T alpha_T rho D_m dY/(M k dT)', source: 'definition' }),
  ]),
];
