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

const lowPrandtl = {
  kays: { temperature: [0.979, 1.093e-3, 1.06, 1.207], flux: [1.132, 6.84e-4, 1.0856, 1.1835] },
  constant: { temperature: [0.9885, 4.016e-3, 0.9684, 1.092], flux: [1.155, 2.884e-3, 0.9856, 1.063] },
} as const;

/**
 * Mean Nusselt number of a plate in a liquid metal, turbulent from the edge: a Pe^(1/2) + b Re^m Pr^n, the molecular share and that of the eddies.
 *
 * @param reynolds   on the length
 * @param prandtl    at the film temperature
 * @param wall       kind of wall condition; at a flux the mean is over the mean temperature difference
 * @param turbulent  turbulent Prandtl number: `kays`, 0.85 + 0.7/Pe_t, or `constant`, 0.85, which lies above
 * @returns          mean Nusselt number
 * @example          lowPrandtlPlate({ reynolds: 1e6, prandtl: 0.02, wall: 'temperature', turbulent: 'kays' }) // 160.734
 * @range            prandtl 0.004 to 0.1, reynolds 3e5 to 1e7
 * @scatter          fit 6 %; the turbulent Prandtl number moves it by 2 to 20 %
 * @source           boundary-layer equations with mixing length and Pr_t = 0.85 + 0.7/Pe_t of Kays, J. Heat Transfer 116 (1994) 284, solved for this; fit to the solution
 */
export function lowPrandtlPlate({ reynolds, prandtl, wall, turbulent }: { reynolds: number; prandtl: number; wall: 'temperature' | 'flux'; turbulent: 'kays' | 'constant' }): number {
  const [a, b, m, n] = lowPrandtl[turbulent][wall];
  return a * Math.sqrt(reynolds * prandtl) + b * reynolds ** m * prandtl ** n;
}

/**
 * The same for a plate in a liquid metal that is laminar to the transition, Nu_lam(Re_tr) + Nu_turb(Re) - Nu_turb(Re_tr).
 *
 * @param reynolds    on the length
 * @param prandtl     at the film temperature
 * @param wall        kind of wall condition
 * @param transition  Reynolds number of transition
 * @returns           mean Nusselt number; the laminar one where the length ends ahead of transition
 * @example           mixedLowPrandtlPlate({ reynolds: 1e6, prandtl: 0.02, wall: 'temperature', transition: 5e5 }) // 152.997
 * @range             prandtl 0.004 to 0.1, reynolds 1e5 to 1e7
 * @scatter           20 %
 * @source            Churchill and Ozoe, J. Heat Transfer 95 (1973) 78; turbulent part as above
 */
export function mixedLowPrandtlPlate({ reynolds, prandtl, wall, transition }: { reynolds: number; prandtl: number; wall: 'temperature' | 'flux'; transition: number }): number {
  const laminar = churchillOzoe({ reynolds: Math.min(reynolds, transition), prandtl, wall }).mean;
  if (reynolds < transition) return laminar;
  const turbulent = (at: number): number => lowPrandtlPlate({ reynolds: at, prandtl, wall, turbulent: 'kays' });
  return laminar + turbulent(reynolds) - turbulent(transition);
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
