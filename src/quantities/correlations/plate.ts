// Flat plate along a stream: transition, skin friction, layers. Reynolds numbers on the distance from the leading edge.

/**
 * Reynolds number at which the layer on a flat plate turns turbulent, from the turbulence of the stream: (Re_theta/0.664)^2, Re_theta = 163 + exp(6.91 - Tu).
 *
 * @param intensity  turbulence intensity of the stream, a share (0.01 is 1 %)
 * @returns          Reynolds number on the distance from the edge
 * @example          plateTransition({ intensity: 0.01 }) // 641220
 * @range            intensity 0.001 to 0.05, no pressure gradient
 * @scatter          a factor of 1.5
 * @source           Abu-Ghannam and Shaw, J. Mech. Eng. Sci. 22 (1980) 213
 */
export function plateTransition({ intensity }: { intensity: number }): number {
  return ((163 + Math.exp(6.91 - 100 * intensity)) / 0.664) ** 2;
}

/**
 * Laminar skin friction of a flat plate: local 0.664115 Re^(-1/2), mean over the length twice that.
 *
 * @param reynolds  on the distance
 * @returns         local and mean coefficient of one side
 * @example         laminarPlateFriction({ reynolds: 1e5 }).local // 0.00210012
 * @range           reynolds 1e4 to transition
 * @source          Blasius, Z. Math. Phys. 56 (1908) 1
 */
export function laminarPlateFriction({ reynolds }: { reynolds: number }): { local: number; mean: number } {
  const local = 0.664115 / Math.sqrt(reynolds);
  return { local, mean: 2 * local };
}

/**
 * Published laws of the local turbulent skin friction of a smooth plate.
 *
 * @param reynolds  on the distance
 * @returns         White 0.455/ln^2(0.06 Re); one-seventh power 0.027 Re^(-1/7); Schultz-Grunow 0.370 (log10 Re)^(-2.584); Schlichting (2 log10 Re - 0.65)^(-2.3)
 * @example         turbulentPlateFriction({ reynolds: 1e6 }).white // 0.00375890
 * @range           reynolds 5e5 to 1e9
 * @scatter         4 % at reynolds 1e6, 8 % at 1e8, between the laws
 * @source          White, Viscous Fluid Flow, 3rd ed. (2006), eq. (6-78); Schultz-Grunow, Luftfahrtforschung 17 (1940) 239; Schlichting, Boundary-Layer Theory, ch. 21
 */
export function turbulentPlateFriction({ reynolds }: { reynolds: number }): { white: number; seventh: number; schultzGrunow: number; schlichting: number } {
  const decades = Math.log10(reynolds);
  return { white: 0.455 / Math.log(0.06 * reynolds) ** 2, seventh: 0.027 * reynolds ** (-1 / 7), schultzGrunow: 0.37 * decades ** -2.584, schlichting: (2 * decades - 0.65) ** -2.3 };
}

const meanLaws = {
  schlichting: (re: number): number => 0.455 / Math.log10(re) ** 2.58,
  white: (re: number): number => 0.523 / Math.log(0.06 * re) ** 2,
  seventh: (re: number): number => 0.031 * re ** (-1 / 7),
} as const;

/**
 * Friction drag of one side of a smooth plate, laminar to the transition and turbulent behind it: the turbulent law less A/Re, A from continuity at the transition.
 *
 * @param reynolds    on the length
 * @param transition  Reynolds number of transition; 0 for a layer turbulent from the edge
 * @param law         turbulent law: schlichting 0.455/(log10 Re)^2.58, white 0.523/ln^2(0.06 Re), seventh 0.031 Re^(-1/7)
 * @returns           mean coefficient; the laminar one where the length ends ahead of transition
 * @example           meanPlateFriction({ reynolds: 4.36e6, transition: 5e5, law: 'seventh' }) // 0.00316
 * @range             reynolds 5e5 to 1e9
 * @scatter           5 %
 * @source            Schlichting, Boundary-Layer Theory, ch. 21; White, Viscous Fluid Flow, 3rd ed. (2006)
 */
export function meanPlateFriction({ reynolds, transition, law }: { reynolds: number; transition: number; law: keyof typeof meanLaws }): number {
  if (reynolds < transition) return laminarPlateFriction({ reynolds }).mean;
  const turbulent = meanLaws[law];
  const ahead = transition === 0 ? 0 : transition * (turbulent(transition) - laminarPlateFriction({ reynolds: transition }).mean);
  return turbulent(reynolds) - ahead / reynolds;
}

/**
 * Friction drag of a smooth plate turbulent from the edge, by the two lines used for ships.
 *
 * @param reynolds  on the length
 * @returns         schoenherr: 0.242/sqrt(C_F) = log10(Re C_F); modelLine: 0.075/(log10 Re - 2)^2
 * @example         shipPlateFriction({ reynolds: 1e6 }).schoenherr // 0.00440943
 * @range           reynolds 1e6 to 1e9
 * @source          Schoenherr, Trans. SNAME 40 (1932) 279; 8th International Towing Tank Conference, Madrid 1957
 */
export function shipPlateFriction({ reynolds }: { reynolds: number }): { schoenherr: number; modelLine: number } {
  let x = 1 / Math.sqrt(meanLaws.schlichting(reynolds));
  for (let pass = 0; pass < 60; pass++) {
    const next = Math.log10(reynolds / x ** 2) / 0.242;
    if (Math.abs(next - x) < 1e-13 * x) break;
    x = next;
  }
  return { schoenherr: x ** -2, modelLine: 0.075 / (Math.log10(reynolds) - 2) ** 2 };
}

/**
 * Skin friction of a fully rough plate: local (2.87 + 1.58 log10(x/k_s))^(-2.5), mean (1.89 + 1.62 log10(L/k_s))^(-2.5).
 *
 * @param lengthOverGrain  distance over the equivalent sand grain
 * @returns                local and mean coefficient
 * @example                roughPlateFriction({ lengthOverGrain: 3000 }).mean // 0.00644
 * @range                  lengthOverGrain 1e3 to 1e6, roughness Reynolds number above 70; at 100 the mean law is 30 % above the integral of the local one
 * @source                 Schlichting, Boundary-Layer Theory, ch. 21
 */
export function roughPlateFriction({ lengthOverGrain }: { lengthOverGrain: number }): { local: number; mean: number } {
  const decades = Math.log10(lengthOverGrain);
  return { local: (2.87 + 1.58 * decades) ** -2.5, mean: (1.89 + 1.62 * decades) ** -2.5 };
}

/**
 * Thickness of the turbulent layer on a flat plate over the distance: 0.37 Re^(-1/5) or 0.16 Re^(-1/7).
 *
 * @param reynolds  on the distance
 * @returns         the two published laws
 * @example         turbulentPlateThickness({ reynolds: 1e6 }).fifth // 0.0233454
 * @range           fifth: reynolds 5e5 to 1e7; seventh: 1e6 to 1e9
 * @scatter         10 %
 * @source          Prandtl 1927, one-seventh power profile; White, Viscous Fluid Flow, 3rd ed. (2006)
 */
export function turbulentPlateThickness({ reynolds }: { reynolds: number }): { fifth: number; seventh: number } {
  return { fifth: 0.37 * reynolds ** -0.2, seventh: 0.16 * reynolds ** (-1 / 7) };
}
