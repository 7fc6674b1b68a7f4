import type { PropertyId } from './record.ts';

/** The trade's word for every property. */
export const propertyNames: { readonly [id in PropertyId]: string } = {
  density: 'density',
  viscosity: 'dynamic viscosity',
  thermalConductivity: 'thermal conductivity',
  specificHeatCapacity: 'isobaric specific heat capacity',
  thermalExpansion: 'thermal expansion (volume)',
  speedOfSound: 'speed of sound',
  kinematicViscosity: 'kinematic viscosity',
  thermalDiffusivity: 'thermal diffusivity',
  prandtl: 'Prandtl number',
  compressibilityFactor: 'compressibility factor Z',
  isentropicExponent: 'isentropic exponent',
  enthalpy: 'enthalpy (differences only)',
  vapourPressure: 'vapour pressure',
  saturationTemperature: 'saturation temperature',
  latentHeat: 'latent heat of vaporisation',
  surfaceTension: 'surface tension',
  meltingTemperature: 'melting temperature',
  fusionHeat: 'latent heat of fusion',
  molarMass: 'molar mass',
  electricalConductivity: 'electrical conductivity',
  emissivity: 'emissivity',
  voidFraction: 'void fraction',
  permeability: 'permeability',
};
