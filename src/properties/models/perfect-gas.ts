const molarGasConstant = 8.31446261815324;

/** Density [kg/m^3] of a perfect gas at T [K] and p [Pa]; molar mass in kg/mol. @source ideal-gas law */
export const perfectGasDensity = (molarMass: number) => (T: number, p: number): number => (p * molarMass) / (molarGasConstant * T);

/** Speed of sound [m/s] of a perfect gas at T [K] with its heat capacity [J/(kg K)]; molar mass in kg/mol. @source Laplace's law */
export const perfectGasSound = (molarMass: number) => (T: number, specificHeatCapacity: number): number => {
  const R = molarGasConstant / molarMass;
  return Math.sqrt((specificHeatCapacity / (specificHeatCapacity - R)) * R * T);
};
