// Heat transfer of a flat plate along a stream, properties at the film temperature.

/**
 * Mean Nusselt number of a laminar plate, Nu = 0.664 Re^(1/2) Pr^(1/3).
 *
 * @param reynolds  on the length
 * @param prandtl   at the film temperature
 * @returns         mean Nusselt number, wall temperature uniform
 * @example         pohlhausenMean({ reynolds: 9597, prandtl: 0.687 }) // 57.40
 * @range           prandtl above 0.6
 * @scatter         2 %
 * @source          Pohlhausen, Z. angew. Math. Mech. 1 (1921) 115
 */
export function pohlhausenMean({ reynolds, prandtl }: { reynolds: number; prandtl: number }): number {
  return 0.664 * Math.sqrt(reynolds) * prandtl ** (1 / 3);
}

/**
 * Laminar plate at any Prandtl number: local a Re^(1/2) Pr^(1/3)/(1 + (b/Pr)^(2/3))^(1/4); a, b = 0.3387, 0.0468 at a uniform temperature, 0.4637, 0.0207 at a uniform flux.
 *
 * @param reynolds  on the length
 * @param prandtl   at the film temperature
 * @param wall      kind of wall condition
 * @returns         local at the end; mean: of the coefficient (temperature), or flux over the mean temperature difference (flux)
 * @example         churchillOzoe({ reynolds: 1e5, prandtl: 0.7, wall: 'temperature' }).mean // 183.086
 * @range           prandtl 0.001 to 1e4
 * @scatter         1.3 %
 * @source          Churchill and Ozoe, J. Heat Transfer 95 (1973) 78 and 416
 */
export function churchillOzoe({ reynolds, prandtl, wall }: { reynolds: number; prandtl: number; wall: 'temperature' | 'flux' }): { local: number; mean: number } {
  const [a, b, join] = wall === 'temperature' ? [0.3387, 0.0468, 2] : [0.4637, 0.0207, 1.5];
  const local = (a * Math.sqrt(reynolds) * prandtl ** (1 / 3)) / (1 + (b / prandtl) ** (2 / 3)) ** 0.25;
  return { local, mean: join * local };
}

/**
 * Mean Nusselt number of a plate laminar to the transition and turbulent behind it, Nu = (0.037 Re^0.8 - B) Pr^(1/3), B = 0.037 Re_tr^0.8 - 0.664 Re_tr^(1/2).
 *
 * @param reynolds    on the length
 * @param prandtl     at the film temperature
 * @param transition  Reynolds number of transition; 0 for a layer turbulent from the edge
 * @returns           mean Nusselt number; the laminar one where the length ends ahead of transition
 * @example           mixedPlateNusselt({ reynolds: 1.884e6, prandtl: 0.7154, transition: 5e5 }) // 2686.35
 * @range             prandtl 0.6 to 60, reynolds up to 1e8
 * @scatter           15 %
 * @source            Incropera and DeWitt, Fundamentals of Heat and Mass Transfer, ch. 7
 */
export function mixedPlateNusselt({ reynolds, prandtl, transition }: { reynolds: number; prandtl: number; transition: number }): number {
  if (reynolds < transition) return pohlhausenMean({ reynolds, prandtl });
  return (0.037 * (reynolds ** 0.8 - transition ** 0.8) + 0.664 * Math.sqrt(transition)) * prandtl ** (1 / 3);
}

/**
 * What an unheated start makes of the mean transfer over the heated part: (1 - s^m)^n/(1 - s), m, n = 3/4, 2/3 laminar and 9/10, 8/9 turbulent.
 *
 * @param share  length of the unheated start over the whole length
 * @param layer  laminar or turbulent
 * @returns      factor on the mean Nusselt number that the whole length would have
 * @example      unheatedStart({ share: 0.5, layer: 'laminar' }) // 1.09551
 * @range        share 0 to below 1
 * @source       Ameel, Int. Commun. Heat Mass Transfer 24 (1997) 1113
 */
export function unheatedStart({ share, layer }: { share: number; layer: 'laminar' | 'turbulent' }): number {
  const [m, n] = layer === 'laminar' ? [0.75, 2 / 3] : [0.9, 8 / 9];
  return (1 - share ** m) ** n / (1 - share);
}
