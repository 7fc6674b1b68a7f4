/**
 * Shear rate at the wall of a round pipe in laminar flow. The mean speed follows from the law by 8U/D = (4/3)(g_w - int_0^g_w tau^3 dg/tau_w^3).
 *
 * @param nominal  8U/D [1/s], > 0
 * @param stress   shear stress [Pa] of a shear rate [1/s], rising
 * @returns        g_w [1/s]; NaN where the law does not reach the rate
 * @source         Rabinowitsch, Z. Phys. Chem. A 145 (1929) 1; Mooney, J. Rheol. 2 (1931) 210, here integrated by parts
 */
export function pipeWallShearRate({ nominal, stress }: { nominal: number; stress: (rate: number) => number }): number {
  const reached = (wall: number): number => {
    const at = stress(wall) ** 3;
    // int_0^w tau^3 dg with g = w s^4: smooth at the wall and at the axis, where tau may start like a root; Simpson's rule.
    const n = 200;
    let sum = 0;
    for (let i = 1; i <= n; i++) {
      const s = i / n;
      sum += (i === n ? 1 : i % 2 === 1 ? 4 : 2) * stress(wall * s ** 4) ** 3 * 4 * s ** 3;
    }
    return (4 / 3) * wall * (1 - sum / (3 * n) / at);
  };
  let [low, high] = [nominal * 1e-3, nominal * 1e3];
  if (!(reached(low) <= nominal && reached(high) >= nominal)) return Number.NaN;
  for (let i = 0; i < 80; i++) {
    const middle = Math.sqrt(low * high);
    if (reached(middle) < nominal) low = middle;
    else high = middle;
  }
  return Math.sqrt(low * high);
}
