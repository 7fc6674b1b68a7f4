// Laws of generalised Newtonian fluids: shear stress and apparent viscosity of a shear rate.

/**
 * Apparent viscosity of a power-law fluid, mu = K g^(n - 1).
 *
 * @param rate         shear rate [1/s], > 0
 * @param consistency  K [Pa s^n]
 * @param index        n
 * @returns            viscosity [Pa s]
 * @example            powerLawViscosity({ rate: 100, consistency: 2.5, index: 0.4 }) // 0.157739
 * @source             Ostwald, Kolloid-Z. 36 (1925) 99; de Waele 1923
 */
export function powerLawViscosity({ rate, consistency, index }: { rate: number; consistency: number; index: number }): number {
  return consistency * rate ** (index - 1);
}

/**
 * Viscosity between two plateaus, mu = mu_inf + (mu_0 - mu_inf)(1 + (l g)^a)^((n - 1)/a).
 *
 * @param rate        shear rate [1/s]
 * @param zero        viscosity at rest [Pa s]
 * @param infinite    viscosity at large shear [Pa s]
 * @param time        time constant l [s]
 * @param index       n
 * @param transition  a; 2 is the law of Carreau
 * @returns           viscosity [Pa s]
 * @example           carreauViscosity({ rate: 1, zero: 0.056, infinite: 0.00345, time: 3.313, index: 0.3568, transition: 2 }) // 0.0270977
 * @source            Carreau, Trans. Soc. Rheol. 16 (1972) 99; Yasuda 1979 for a other than 2
 */
export function carreauViscosity({ rate, zero, infinite, time, index, transition }: { rate: number; zero: number; infinite: number; time: number; index: number; transition: number }): number {
  return infinite + (zero - infinite) * (1 + (time * rate) ** transition) ** ((index - 1) / transition);
}

/**
 * Viscosity between two plateaus, mu = mu_inf + (mu_0 - mu_inf)/(1 + (l g)^(1 - n)).
 *
 * @param rate      shear rate [1/s]
 * @param zero      viscosity at rest [Pa s]
 * @param infinite  viscosity at large shear [Pa s]
 * @param time      time constant l [s]
 * @param index     n of the power law between the plateaus; Cross writes m = 1 - n
 * @returns         viscosity [Pa s]
 * @example         crossViscosity({ rate: 100, zero: 1, infinite: 0.01, time: 1, index: 0 }) // 0.019802
 * @source          Cross, J. Colloid Sci. 20 (1965) 417
 */
export function crossViscosity({ rate, zero, infinite, time, index }: { rate: number; zero: number; infinite: number; time: number; index: number }): number {
  return infinite + (zero - infinite) / (1 + (time * rate) ** (1 - index));
}

/**
 * Apparent viscosity beyond a yield stress, mu = (tau_y + K g^n)/g; n = 1 is the law of Bingham.
 *
 * @param rate         shear rate [1/s], > 0
 * @param yieldStress  tau_y [Pa]
 * @param consistency  K [Pa s^n]
 * @param index        n
 * @returns            viscosity [Pa s]
 * @example            herschelBulkleyViscosity({ rate: 20, yieldStress: 10, consistency: 4, index: 0.5 }) // 1.39443
 * @source             Herschel and Bulkley, Kolloid-Z. 39 (1926) 291; Bingham 1922
 */
export function herschelBulkleyViscosity({ rate, yieldStress, consistency, index }: { rate: number; yieldStress: number; consistency: number; index: number }): number {
  return (yieldStress + consistency * rate ** index) / rate;
}

/**
 * Apparent viscosity by sqrt(tau) = sqrt(tau_y) + sqrt(mu_c g).
 *
 * @param rate         shear rate [1/s], > 0
 * @param yieldStress  tau_y [Pa]
 * @param plastic      Casson's viscosity mu_c [Pa s]
 * @returns            viscosity [Pa s]
 * @example            cassonViscosity({ rate: 10, yieldStress: 0.005, plastic: 0.0035 }) // 0.00664575
 * @source             Casson, in Rheology of Disperse Systems, Pergamon (1959) 84
 */
export function cassonViscosity({ rate, yieldStress, plastic }: { rate: number; yieldStress: number; plastic: number }): number {
  return (Math.sqrt(yieldStress) + Math.sqrt(plastic * rate)) ** 2 / rate;
}

/**
 * Reynolds number of a power-law fluid in a pipe, so that its laminar friction is 64/Re.
 *
 * @param density      [kg/m^3]
 * @param speed        mean [m/s]
 * @param diameter     [m]
 * @param consistency  K [Pa s^n]
 * @param index        n
 * @returns            Re_MR
 * @example            metznerReedReynolds({ density: 1000, speed: 1, diameter: 0.05, consistency: 1, index: 0.6 }) // 347.096
 * @source             Metzner and Reed, AIChE J. 1 (1955) 434
 */
export function metznerReedReynolds({ density, speed, diameter, consistency, index }: { density: number; speed: number; diameter: number; consistency: number; index: number }): number {
  return (density * speed ** (2 - index) * diameter ** index) / (8 ** (index - 1) * consistency * ((3 * index + 1) / (4 * index)) ** index);
}

/**
 * Reynolds number rho U D/mu_p at which a Bingham fluid in a pipe leaves laminar flow: Re_c = He (1 - 4 x/3 + x^4/3)/(8 x), x/(1 - x)^3 = He/16800.
 *
 * @param hedstrom  He = rho tau_y D^2/mu_p^2, >= 0
 * @returns         critical Reynolds number
 * @example         hanksReynolds({ hedstrom: 1e4 }) // 3329
 * @source          Hanks, AIChE J. 9 (1963) 306
 */
export function hanksReynolds({ hedstrom }: { hedstrom: number }): number {
  if (hedstrom < 1e-6) return 2100;
  let [low, high] = [0, 1];
  for (let i = 0; i < 60; i++) {
    const x = 0.5 * (low + high);
    if (x / (1 - x) ** 3 < hedstrom / 16800) low = x;
    else high = x;
  }
  const x = 0.5 * (low + high);
  return (hedstrom * (1 - (4 * x) / 3 + x ** 4 / 3)) / (8 * x);
}
