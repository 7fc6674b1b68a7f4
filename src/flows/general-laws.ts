/**
 * Drag of a blunt body of unknown shape: the sphere at low Reynolds numbers, 1 at high ones, straight in log Re between 300 and 3000.
 *
 * @param reynolds  on the width across the stream
 * @returns         drag coefficient on the frontal area
 * @example         generalDrag({ reynolds: 100 }) // 1.0917
 * @scatter         a factor of 2
 * @source          Schiller and Naumann, Z. VDI 77 (1933) 318, at the low end; common practice
 */
export function generalDrag({ reynolds }: { reynolds: number }): number {
  const sphere = (re: number): number => (24 / re) * (1 + 0.15 * re ** 0.687);
  if (reynolds <= 300) return sphere(reynolds);
  const share = Math.min(1, Math.log10(reynolds / 300));
  return sphere(300) + share * (1 - sphere(300));
}

/**
 * Heat transfer by analogy with a plate, laminar to 5e5 and with a laminar run ahead of the turbulent one beyond.
 *
 * @param reynolds  on the length
 * @param prandtl   of the fluid
 * @returns         mean Nusselt number
 * @example         generalBody({ reynolds: 1e6, prandtl: 1 }) // 1463.54
 * @scatter         a factor of 2
 * @source          Pohlhausen, Z. angew. Math. Mech. 1 (1921) 115; Incropera and DeWitt for the mixed plate
 */
export function generalBody({ reynolds, prandtl }: { reynolds: number; prandtl: number }): number {
  const p = prandtl ** (1 / 3);
  return reynolds < 5e5 ? 0.664 * Math.sqrt(reynolds) * p : (0.037 * reynolds ** 0.8 - 871) * p;
}
