/** Aqueous solutions by mass share of the solute: the pure-water part and an apparent part of the solute. */

type OfShare = (T: number, share: number) => number;

/** Density of water [kg/m^3] at T [K], one atmosphere. Source: Kell, J. Chem. Eng. Data 20 (1975) 97, eq. (16). */
const waterDensity = (T: number): number => {
  const t = T - 273.15;
  return ((((((-2.8054253e-10 * t + 1.0556302e-7) * t - 4.6170461e-5) * t - 0.0079870401) * t + 16.945176) * t + 999.83952) / (1 + 0.01687985 * t));
};

/** Viscosity of water [mPa s] at T [K]. Source: Laliberte, J. Chem. Eng. Data 52 (2007) 321, eq. (4). */
const waterViscosity = (T: number): number => {
  const t = T - 273.15;
  return (t + 246) / ((0.05594 * t + 5.2842) * t + 137.37);
};

/**
 * Density of a solution from the apparent density of the solute, 1/rho = (1 - w)/rho_w + w/rho_app.
 *
 * @param c  c0 to c4 as printed (temperatures in degC)
 * @returns  density [kg/m^3] of T [K] and mass share w
 * @source   Laliberte and Cooper, J. Chem. Eng. Data 49 (2004) 1141; constants of Laliberte, J. Chem. Eng. Data 54 (2009) 1725
 */
export const solutionDensity = (c: { terms: readonly number[] }): OfShare => {
  const [c0, c1, c2, c3, c4] = c.terms as [number, number, number, number, number];
  return (T, w) => {
    const t = T - 273.15;
    const apparent = ((c0 * w + c1) * Math.exp(1e-6 * (t + c4) ** 2)) / (w + c2 + c3 * t);
    return 1 / ((1 - w) / waterDensity(T) + w / apparent);
  };
};

/**
 * Viscosity of a solution, ln mu = (1 - w) ln mu_w + w ln mu_i with the solute's part exp((v1 w^v2 + v3)/(v4 t + 1))/(v5 w^v6 + 1).
 *
 * @param c  v1 to v6 as printed (temperatures in degC, mPa s)
 * @returns  viscosity [Pa s] of T [K] and mass share w
 * @source   Laliberte, J. Chem. Eng. Data 52 (2007) 321; constants of Laliberte, J. Chem. Eng. Data 54 (2009) 1725
 */
export const solutionViscosity = (c: { terms: readonly number[] }): OfShare => {
  const [v1, v2, v3, v4, v5, v6] = c.terms as [number, number, number, number, number, number];
  return (T, w) => {
    if (w === 0) return 1e-3 * waterViscosity(T);
    const solute = (v1 * w ** v2 + v3) / (v4 * (T - 273.15) + 1) - Math.log(v5 * w ** v6 + 1);
    return 1e-3 * Math.exp((1 - w) * Math.log(waterViscosity(T)) + w * solute);
  };
};

/** Heat capacity of saturated water [J/(kg K)], a quintic in t/100 degC through IAPWS R6-95 from 0 to 140 degC, within 0.03 %. */
const waterHeatCapacity = (T: number): number => {
  const x = (T - 273.15) / 100;
  return 4218.78 + x * (-295.63 + x * (786.28 + x * (-949.3 + x * (590.54 - 135.32 * x))));
};

/**
 * Heat capacity of a solution, c = (1 - w) c_w + w c_i with the solute's part a1 exp(alpha) + a5 w^a6, alpha = a2 t + a3 exp(0.01 t) + a4 w.
 *
 * @param c  a1 to a6 as printed (temperatures in degC, kJ/(kg K))
 * @returns  specific heat capacity [J/(kg K)] of T [K] and mass share w
 * @source   Laliberte, J. Chem. Eng. Data 54 (2009) 1725
 */
export const solutionHeatCapacity = (c: { terms: readonly number[] }): OfShare => {
  const [a1, a2, a3, a4, a5, a6] = c.terms as [number, number, number, number, number, number];
  return (T, w) => {
    if (w === 0) return waterHeatCapacity(T);
    const t = T - 273.15;
    const solute = a1 * Math.exp(a2 * t + a3 * Math.exp(0.01 * t) + a4 * w) + a5 * w ** a6;
    return (1 - w) * waterHeatCapacity(T) + 1000 * w * solute;
  };
};

/** Conductivity of saturated water [W/(m K)], a quartic in t/100 degC through IAPWS R15-11 from 0 to 140 degC, within 0.1 %. */
const waterConductivity = (T: number): number => {
  const x = (T - 273.15) / 100;
  return 0.5561 + x * (0.24052 + x * (-0.17442 + x * (0.07272 + -0.01776 * x)));
};

/**
 * Conductivity of a solution by contributions of its ions, k = (k_w(20 degC) + sum sigma_i c_i) k_w(T)/k_w(20 degC), c in mol/L.
 *
 * @param c        contribution of the dissolved substance [W L/(m K mol)], its molar mass [kg/mol]
 * @param density  of the solution [kg/m^3] at 20 degC
 * @returns        conductivity [W/(m K)] of T [K] and mass share w
 * @source         Riedel, Chem. Ing. Tech. 23 (1951) 59, as in Poling, Prausnitz and O'Connell, The Properties of Gases and Liquids, 5th ed. (2001), section 10-13
 */
export const solutionConductivity = (c: { contribution: number; molarMass: number }, density: OfShare): OfShare => (T, w) => {
  const base = waterConductivity(293.15);
  const molar = (w * density(293.15, w)) / c.molarMass / 1000;
  return ((base + c.contribution * molar) * waterConductivity(T)) / base;
};

/**
 * Viscosity of glycerol in water over all shares.
 *
 * @param T      [K], 273 to 373
 * @param share  of glycerol by mass
 * @returns      viscosity [Pa s]
 * @source       Cheng, Ind. Eng. Chem. Res. 47 (2008) 3285
 */
export const glycerolViscosity: OfShare = (T, share) => {
  const t = T - 273.15;
  const water = 1.79 * Math.exp(((-1230 - t) * t) / (36100 + 360 * t));
  const glycerol = 12100 * Math.exp(((-1233 + t) * t) / (9900 + 70 * t));
  const a = 0.705 - 0.0017 * t;
  const b = (4.9 + 0.036 * t) * a ** 2.5;
  const alpha = 1 - share + (a * b * share * (1 - share)) / (a * share + b * (1 - share));
  return 1e-3 * water ** alpha * glycerol ** (1 - alpha);
};

/** Salt lowers the vapour pressure: p/p_w = 1/(1 + f w/(1 - w)). Source: Sharqawy, Lienhard and Zubair, Desalin. Water Treat. 16 (2010) 354, eq. (26). */
export const loweredVapourPressure = (c: { factor: number }, ofWater: (T: number) => number): OfShare => (T, w) => ofWater(T) / (1 + (c.factor * w) / (1 - w));

/**
 * Vapour pressure of water above an ideal solution of what does not boil off, p = x_w p_w.
 *
 * @param c        molar mass of the solute [kg/mol], particles that one of its molecules falls into
 * @param ofWater  vapour pressure of water [Pa] of T [K]
 * @returns        [Pa] of T [K] and mass share w
 * @source         Raoult, C. R. Acad. Sci. 104 (1887) 1430
 */
export const idealVapourPressure = (c: { molarMass: number; particles: number }, ofWater: (T: number) => number): OfShare => (T, w) => {
  const water = (1 - w) / 0.018015268;
  return (ofWater(T) * water) / (water + (c.particles * w) / c.molarMass);
};
