// Heat transfer of a circular cylinder across a stream.

/**
 * Cylinder across a stream, Nu = 0.3 + 0.62 Re^(1/2) Pr^(1/3)/(1 + (0.4/Pr)^(2/3))^(1/4) (1 + (Re/282000)^(5/8))^(4/5).
 *
 * @param reynolds  on the diameter, film temperature
 * @param prandtl   film temperature
 * @returns         mean Nusselt number
 * @example         churchillBernstein({ reynolds: 1e4, prandtl: 0.7 }) // 53.3278
 * @range           reynolds times prandtl above 0.2, reynolds up to 1e7
 * @scatter         20 %
 * @source          Churchill and Bernstein, J. Heat Transfer 99 (1977) 300
 */
export function churchillBernstein({ reynolds, prandtl }: { reynolds: number; prandtl: number }): number {
  const layer = (0.62 * Math.sqrt(reynolds) * prandtl ** (1 / 3)) / (1 + (0.4 / prandtl) ** (2 / 3)) ** 0.25;
  return 0.3 + layer * (1 + (reynolds / 282000) ** (5 / 8)) ** 0.8;
}

/**
 * Cylinder across a stream, Nu = C Re^m Pr^n (Pr/Pr_w)^(1/4), (C, m) = (0.75, 0.4) to 40, (0.51, 0.5) to 1e3, (0.26, 0.6) to 2e5, (0.076, 0.7) beyond; n = 0.37, above Pr 10 0.36.
 *
 * @param reynolds     on the diameter, undisturbed stream
 * @param prandtl      undisturbed stream
 * @param prandtlWall  wall temperature
 * @returns            mean Nusselt number
 * @example            zukauskas({ reynolds: 7992, prandtl: 0.707, prandtlWall: 0.69 }) // 50.5
 * @range              reynolds 1 to 1e6, prandtl 0.7 to 500
 * @scatter            20 %
 * @source             Zukauskas, Adv. Heat Transfer 8 (1972) 93
 */
export function zukauskas({ reynolds, prandtl, prandtlWall }: { reynolds: number; prandtl: number; prandtlWall: number }): number {
  const [c, m] = reynolds < 40 ? [0.75, 0.4] : reynolds < 1e3 ? [0.51, 0.5] : reynolds < 2e5 ? [0.26, 0.6] : [0.076, 0.7];
  return c * reynolds ** m * prandtl ** (prandtl <= 10 ? 0.37 : 0.36) * (prandtl / prandtlWall) ** 0.25;
}

/**
 * Cylinder across a stream of gas, Nu = C Re^m Pr^(1/3), (C, m) = (0.989, 0.330) to 4, (0.911, 0.385) to 40, (0.683, 0.466) to 4e3, (0.193, 0.618) to 4e4, (0.027, 0.805) beyond.
 *
 * @param reynolds  on the diameter, film temperature
 * @param prandtl   film temperature
 * @returns         mean Nusselt number
 * @example         hilpert({ reynolds: 6071, prandtl: 0.7 }) // 37.3
 * @range           reynolds 0.4 to 4e5, gases
 * @scatter         15 %; 31 % above the law of Churchill and Bernstein at reynolds 3e5
 * @source          Hilpert, Forsch. Ingenieurwes. 4 (1933) 215, with the later factor Pr^(1/3)
 */
export function hilpert({ reynolds, prandtl }: { reynolds: number; prandtl: number }): number {
  const [c, m] = reynolds < 4 ? [0.989, 0.33] : reynolds < 40 ? [0.911, 0.385] : reynolds < 4e3 ? [0.683, 0.466] : reynolds < 4e4 ? [0.193, 0.618] : [0.027, 0.805];
  return c * reynolds ** m * prandtl ** (1 / 3);
}
