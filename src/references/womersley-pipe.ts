import { reference } from './define.ts';

/** J1(z)/J0(z) for z = i^(3/2) w, by the continued fraction of the ratio (real and imaginary part). */
function ratio(w: number): readonly [number, number] {
  // z = w (-1 + i)/sqrt 2; J1/J0 = z/(2 - z^2/(4 - z^2/(6 - ...))), z^2 = -i w^2.
  let [re, im] = [2 * Math.ceil(60 + w), 0];
  for (let k = Math.ceil(60 + w) - 1; k >= 1; k--) {
    // next = 2k - z^2/current = 2k + i w^2/current
    const size = re * re + im * im;
    [re, im] = [2 * k + (w * w * im) / size, (w * w * re) / size];
  }
  const size = re * re + im * im, a = -w / Math.SQRT2, b = w / Math.SQRT2;
  return [(a * re + b * im) / size, (b * re - a * im) / size];
}

/** Flow over the quasi-steady one as a complex number: (8/(i Wo^2)) [1 - 2 J1/(z J0)]. */
function response(w: number): readonly [number, number] {
  const [re, im] = ratio(w);
  // 2 J1/(z J0), with 1/z = (-1 - i)/(sqrt 2 w).
  const c = 2 / (Math.SQRT2 * w);
  const share = [1 - c * (-re + im), -c * (-im - re)] as const;
  return [(8 / w ** 2) * share[1], (-8 / w ** 2) * share[0]];
}

export const womersleyPipe = reference('womersley-pipe', {
  title: 'Pipe flow under a swinging pressure gradient',
  kind: 'exact',
  assumes: ['laminar', 'developed', 'constant properties', 'stiff wall', 'periodic state'],
  verifies: ['time accuracy', 'momentum diffusion', 'wall shear'],
  source: 'Womersley, J. Physiol. 127 (1955) 553-563',
  uncertainty: 0,
  order: 2,
  passLimit: 0.01,
  ifMissed: 'several periods until the state repeats; cells inside the layer R/Wo; steps a period; the gradient and not the flow is imposed',
  flows: ['pipe'],
  needs: [{ id: 'womersley', unit: '1', name: 'Womersley number R sqrt(omega/nu)', range: [0.01, 200] }],
  values: [
    { id: 'flowRatio', name: 'amplitude of the flow over that of slow swings', unit: '1', formula: '|(8/(i Wo^2)) [1 - 2 J1(z)/(z J0(z))]|, z = i^(3/2) Wo', value: (g) => Math.hypot(...response(g.womersley)) },
    { id: 'phaseLag', name: 'angle by which the flow lags the pressure gradient', unit: 'rad', formula: '-arg{(1/i) [1 - 2 J1(z)/(z J0(z))]}', value: (g) => -Math.atan2(response(g.womersley)[1], response(g.womersley)[0]) },
  ],
});
