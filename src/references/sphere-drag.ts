import { reference } from './define.ts';
import { density, length, reynolds, speed } from './inputs.ts';

/**
 * Drag coefficient of a smooth sphere in a steady unbounded stream, the standard curve.
 *
 * @param reynolds  Reynolds number on the diameter, > 0
 * @returns         drag coefficient
 * @range           Re to 3.38e5; beyond, the last piece is continued
 * @scatter         5 %
 * @source          Clift, Grace and Weber, Bubbles, Drops, and Particles (1978), table 5.2
 */
export function sphereDragStandard(reynolds: number): number {
  const w = Math.log10(reynolds);
  if (reynolds < 0.01) return 3 / 16 + 24 / reynolds;
  if (reynolds <= 20) return (24 / reynolds) * (1 + 0.1315 * reynolds ** (0.82 - 0.05 * w));
  if (reynolds <= 260) return (24 / reynolds) * (1 + 0.1935 * reynolds ** 0.6305);
  if (reynolds <= 1500) return 10 ** (1.6435 - 1.1242 * w + 0.1558 * w ** 2);
  if (reynolds <= 1.2e4) return 10 ** (-2.4571 + 2.5558 * w - 0.9295 * w ** 2 + 0.1049 * w ** 3);
  if (reynolds <= 4.4e4) return 10 ** (-1.9181 + 0.637 * w - 0.0636 * w ** 2);
  return 10 ** (-4.339 + 1.5809 * w - 0.1546 * w ** 2);
}

export const sphereDrag = reference('sphere-drag', {
  title: 'Drag of a sphere',
  kind: 'measured',
  assumes: ['smooth sphere', 'steady uniform stream', 'unbounded', 'constant density'],
  verifies: ['drag of a body', 'wall shear and pressure on a curved wall'],
  source: 'Clift, Grace and Weber, Bubbles, Drops, and Particles (1978), table 5.2; Oseen 1910 below Re 0.5',
  uncertainty: 0.05,
  passLimit: 0.05,
  ifMissed: 'distance of the sides, above all at low Reynolds numbers; cells in the layer at the front; area of the circle in the coefficient',
  flows: ['sphere', 'packed-bed', 'general'],
  needs: [{ ...reynolds, name: 'Reynolds number on the diameter', range: [1e-6, 3.38e5] }, { ...speed, name: 'speed of the stream' }, { ...length, name: 'diameter' }, density],
  values: [
    { id: 'dragCoefficient', name: 'drag coefficient', unit: '1', formula: 'standard drag curve in seven pieces', value: (g) => sphereDragStandard(g.reynolds) },
    { id: 'dragCoefficientOseen', name: 'drag coefficient of slow flow', unit: '1', formula: 'C_D = (24/Re)(1 + 3 Re/16), Re < 0.5', value: (g) => (g.reynolds <= 0.5 ? (24 / g.reynolds) * (1 + (3 * g.reynolds) / 16) : undefined), uncertainty: 0.01 },
    { id: 'dragForce', name: 'drag', unit: 'N', formula: 'F = C_D (pi D^2/4) rho U^2/2', value: (g) => (sphereDragStandard(g.reynolds) * Math.PI * g.length ** 2 * g.density * g.speed ** 2) / 8 },
  ],
});
