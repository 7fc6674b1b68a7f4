// Darcy friction factors of developed flow in round pipes. Roughness is the equivalent sand grain over the diameter.

/**
 * Laminar friction factor of a round pipe, f = 64/Re.
 *
 * @param reynolds  on the diameter and the mean speed
 * @returns         Darcy friction factor
 * @example         laminarFriction({ reynolds: 1000 }) // 0.064
 * @range           reynolds below 2300
 * @source          axial momentum balance (Hagen 1839, Poiseuille 1840)
 */
export function laminarFriction({ reynolds }: { reynolds: number }): number {
  return 64 / reynolds;
}

/**
 * Turbulent friction factor by 1/sqrt(f) = -2 log10(e/(3.7 D) + 2.51/(Re sqrt(f))), solved to rounding by Newton steps in 1/sqrt(f).
 *
 * @param reynolds           on the diameter and the mean speed
 * @param relativeRoughness  equivalent sand grain over diameter, 0 for a smooth wall
 * @returns                  Darcy friction factor
 * @example                  colebrook({ reynolds: 1e5, relativeRoughness: 0.01 }) // 0.0385035
 * @range                    reynolds 4e3 to 1e8, roughness to 0.05
 * @scatter                  10 to 15 % in real pipes (Moody 1944)
 * @source                   Colebrook, J. Inst. Civ. Eng. 11 (1939) 133
 */
export function colebrook({ reynolds, relativeRoughness }: { reynolds: number; relativeRoughness: number }): number {
  const rough = relativeRoughness / 3.7;
  const slope = 2.51 / reynolds;
  let x = 1 / Math.sqrt(haaland({ reynolds, relativeRoughness }));
  for (let pass = 0; pass < 30; pass++) {
    const inside = rough + slope * x;
    const step = (x + 2 * Math.log10(inside)) / (1 + (2 * slope) / (Math.LN10 * inside));
    x -= step;
    if (Math.abs(step) < 1e-14 * Math.abs(x)) break;
  }
  return x ** -2;
}

/**
 * Explicit turbulent friction factor, 1/sqrt(f) = -1.8 log10((e/(3.7 D))^1.11 + 6.9/Re).
 *
 * @param reynolds           on the diameter and the mean speed
 * @param relativeRoughness  equivalent sand grain over diameter
 * @returns                  Darcy friction factor
 * @example                  haaland({ reynolds: 1e5, relativeRoughness: 0.001 }) // 0.0219662
 * @range                    reynolds 4e3 to 1e8, within 1.4 % of Colebrook there
 * @source                   Haaland, J. Fluids Eng. 105 (1983) 89
 */
export function haaland({ reynolds, relativeRoughness }: { reynolds: number; relativeRoughness: number }): number {
  return (-1.8 * Math.log10((relativeRoughness / 3.7) ** 1.11 + 6.9 / reynolds)) ** -2;
}

/**
 * Explicit turbulent friction factor, f = 0.25/log10(e/(3.7 D) + 5.74/Re^0.9)^2.
 *
 * @param reynolds           on the diameter and the mean speed
 * @param relativeRoughness  equivalent sand grain over diameter
 * @returns                  Darcy friction factor
 * @example                  swameeJain({ reynolds: 1e5, relativeRoughness: 0.001 }) // 0.0223424
 * @range                    reynolds 5e3 to 1e8, within 3.1 % of Colebrook from 4e3 on
 * @source                   Swamee and Jain, J. Hydraul. Div. ASCE 102 (1976) 657
 */
export function swameeJain({ reynolds, relativeRoughness }: { reynolds: number; relativeRoughness: number }): number {
  return 0.25 / Math.log10(relativeRoughness / 3.7 + 5.74 / reynolds ** 0.9) ** 2;
}

/**
 * One formula from laminar to fully rough flow, smooth through the transition.
 *
 * @param reynolds           on the diameter and the mean speed
 * @param relativeRoughness  equivalent sand grain over diameter
 * @returns                  Darcy friction factor
 * @example                  churchill({ reynolds: 3000, relativeRoughness: 1e-4 }) // 0.043049
 * @range                    any reynolds; within 3.1 % of Colebrook above 4e3; an interpolation between 2100 and 4000
 * @source                   Churchill, Chem. Eng. 84 (1977) 91
 */
export function churchill({ reynolds, relativeRoughness }: { reynolds: number; relativeRoughness: number }): number {
  const a = (2.457 * Math.log(1 / ((7 / reynolds) ** 0.9 + 0.27 * relativeRoughness))) ** 16;
  const b = (37530 / reynolds) ** 16;
  return 8 * ((8 / reynolds) ** 12 + (a + b) ** -1.5) ** (1 / 12);
}

/**
 * Smooth-pipe friction factor f = (0.790 ln Re - 1.64)^-2, the form that goes with Gnielinski's heat transfer.
 *
 * @param reynolds  on the diameter and the mean speed
 * @returns         Darcy friction factor
 * @example         petukhovFriction({ reynolds: 24915 }) // 0.024743
 * @range           reynolds 3e3 to 5e6, within 3.8 % of smooth Colebrook
 * @source          Petukhov, Adv. Heat Transfer 6 (1970) 503
 */
export function petukhovFriction({ reynolds }: { reynolds: number }): number {
  return (0.79 * Math.log(reynolds) - 1.64) ** -2;
}

/**
 * Smooth-pipe friction factor f = 0.3164 Re^(-1/4).
 *
 * @param reynolds  on the diameter and the mean speed
 * @returns         Darcy friction factor
 * @example         blasiusFriction({ reynolds: 5000 }) // 0.0376265
 * @range           reynolds 4e3 to 1e5, within 2.7 % of smooth Colebrook
 * @source          Blasius, Forsch. Ing.-Wes. 131 (1913)
 */
export function blasiusFriction({ reynolds }: { reynolds: number }): number {
  return 0.3164 * reynolds ** -0.25;
}

/**
 * Smooth-pipe friction factor at high Reynolds numbers, 1/sqrt(f) = 1.930 log10(Re sqrt(f)) - 0.537.
 *
 * @param reynolds  on the diameter and the mean speed
 * @returns         Darcy friction factor
 * @example         mckeonFriction({ reynolds: 5e6 }) // 0.0091978
 * @range           reynolds 3e5 to 3.5e7
 * @scatter         1.4 % of the data behind it
 * @source          McKeon, Zagarola and Smits, J. Fluid Mech. 538 (2005) 429
 */
export function mckeonFriction({ reynolds }: { reynolds: number }): number {
  let x = 1 / Math.sqrt(petukhovFriction({ reynolds }));
  for (let pass = 0; pass < 40; pass++) {
    const step = (x - 1.93 * Math.log10(reynolds / x) + 0.537) / (1 + 1.93 / (Math.LN10 * x));
    x -= step;
    if (Math.abs(step) < 1e-14 * Math.abs(x)) break;
  }
  return x ** -2;
}

/**
 * Friction factor where viscosity no longer counts, 1/sqrt(f) = -2 log10(e/(3.7 D)).
 *
 * @param relativeRoughness  equivalent sand grain over diameter
 * @returns                  Darcy friction factor
 * @example                  fullyRoughFriction({ relativeRoughness: 0.01 }) // 0.0379037
 * @range                    sand grain above 70 viscous lengths
 * @source                   von Karman 1930; Nikuradse, VDI-Forschungsheft 361 (1933)
 */
export function fullyRoughFriction({ relativeRoughness }: { relativeRoughness: number }): number {
  return (-2 * Math.log10(relativeRoughness / 3.7)) ** -2;
}

/**
 * Value between two regimes, straight in the Reynolds number from the laminar end to the turbulent end; held outside.
 *
 * @param reynolds   where it is wanted
 * @param low        end of the laminar law
 * @param high       start of the turbulent law
 * @param laminar    laminar value at `low`
 * @param turbulent  turbulent value at `high`
 * @returns          value between the two
 * @example          blendRegimes({ reynolds: 3150, low: 2300, high: 4000, laminar: 4, turbulent: 30 }) // 17
 * @scatter          30 % for heat, and more for friction: flow in this range is intermittent
 * @source           Gnielinski, Int. J. Heat Mass Transfer 63 (2013) 134
 */
export function blendRegimes({ reynolds, low, high, laminar, turbulent }: { reynolds: number; low: number; high: number; laminar: number; turbulent: number }): number {
  const share = Math.min(1, Math.max(0, (reynolds - low) / (high - low)));
  return (1 - share) * laminar + share * turbulent;
}
