// Diffusivities from the molecules. A measured value wins over all of them.

/**
 * Diffusivity of two gases at low pressure, D = 1.43e-7 T^1.75/(p M_AB^(1/2) (v_A^(1/3) + v_B^(1/3))^2) in m^2/s, bar and g/mol, M_AB = 2/(1/M_A + 1/M_B).
 *
 * @param temperature  [K]
 * @param pressure     [Pa]
 * @param molarMass    of the species [kg/mol]
 * @param otherMass    of the gas it is in [kg/mol]
 * @param volume       diffusion volume of the species
 * @param otherVolume  diffusion volume of the gas
 * @returns            [m^2/s]
 * @example            fullerDiffusivity({ temperature: 350, pressure: 101325, molarMass: 0.018015, otherMass: 0.02897, volume: 13.1, otherVolume: 19.7 }) // 0.0000331
 * @range              pressure below 10 bar
 * @scatter            5 to 10 %, seldom 20 %
 * @source             Fuller, Schettler and Giddings, Ind. Eng. Chem. 58 (1966) 18; volumes of Poling, Prausnitz and O'Connell, The Properties of Gases and Liquids, 5th ed. (2001), table 11-1
 */
export function fullerDiffusivity({ temperature, pressure, molarMass, otherMass, volume, otherVolume }: { temperature: number; pressure: number; molarMass: number; otherMass: number; volume: number; otherVolume: number }): number {
  const mass = 2000 / (1 / molarMass + 1 / otherMass);
  return (1.43e-7 * temperature ** 1.75) / ((pressure / 1e5) * Math.sqrt(mass) * (Math.cbrt(volume) + Math.cbrt(otherVolume)) ** 2);
}

/**
 * Diffusivity of a dissolved species at great dilution, D = 7.4e-8 (phi M_B)^(1/2) T/(mu V^0.6) in cm^2/s, cP, cm^3/mol and g/mol.
 *
 * @param temperature     [K]
 * @param viscosity       of the solvent [Pa s]
 * @param solventMass     molar mass of the solvent [kg/mol]
 * @param association     2.6 for water, 1.9 methanol, 1.5 ethanol, 1 for liquids that do not associate
 * @param boilingVolume   molar volume of the species at its boiling point [m^3/mol]
 * @returns               [m^2/s]
 * @example               wilkeChangDiffusivity({ temperature: 288, viscosity: 0.000705, solventMass: 0.07811, association: 1, boilingVolume: 0.00014 }) // 1.3776e-9
 * @scatter               20 %
 * @source                Wilke and Chang, AIChE J. 1 (1955) 264
 */
export function wilkeChangDiffusivity({ temperature, viscosity, solventMass, association, boilingVolume }: { temperature: number; viscosity: number; solventMass: number; association: number; boilingVolume: number }): number {
  return (7.4e-12 * Math.sqrt(association * solventMass * 1e3) * temperature) / (viscosity * 1e3 * (boilingVolume * 1e6) ** 0.6);
}
