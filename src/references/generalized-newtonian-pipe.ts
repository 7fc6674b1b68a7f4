import { places, reference } from './define.ts';
import { length, run, speed } from './inputs.ts';
import { brent, integrate } from './kernels/index.ts';

const powerLaw = 'power law and Newtonian: K, n; Bingham: tau_y and K for the plastic viscosity at n = 1; Herschel-Bulkley: all three';

/** Shear rate [1/s] of a shear stress [Pa] of a Herschel-Bulkley law: none below the yield stress. */
const rate = (stress: number, yieldStress: number, consistency: number, index: number): number => (stress <= yieldStress ? 0 : ((stress - yieldStress) / consistency) ** (1 / index));

/** 8 U/D [1/s] that a wall stress drives: 8U/D = 4 int_0^1 s^2 g(tau_w s) ds, from the edge of the plug on, with s = phi + (1 - phi) x^2. */
function nominal(wall: number, yieldStress: number, consistency: number, index: number): number {
  const plug = Math.min(1, yieldStress / wall);
  return 4 * integrate((x) => (plug + (1 - plug) * x * x) ** 2 * rate(wall * (plug + (1 - plug) * x * x), yieldStress, consistency, index) * 2 * (1 - plug) * x, 0, 1, 16);
}

/** Wall stress [Pa] at a mean speed: between the yield stress and far above what a power law and the yield stress would take together. */
function wallStress(g: { speed: number; length: number; yieldStress: number; consistency: number; index: number }): number {
  const asked = (8 * g.speed) / g.length;
  const plain = g.consistency * (((3 * g.index + 1) / (4 * g.index)) * asked) ** g.index;
  const [low, high] = [0.999 * Math.max(plain, g.yieldStress), 1.001 * plain + 4 * g.yieldStress];
  return brent((wall) => nominal(wall, g.yieldStress, g.consistency, g.index) / asked - 1, low, high, 1e-13 * high);
}

/** Speed over the mean at r/R: the rate integrated from the wall inwards. */
function shape(wall: number, r: number, g: { speed: number; length: number; yieldStress: number; consistency: number; index: number }): number {
  const plug = Math.min(1, g.yieldStress / wall);
  const from = Math.max(r, plug);
  const x = (s: number): number => Math.sqrt(Math.max(0, s - plug));
  return ((g.length / 2) * integrate((y) => rate(wall * (plug + y * y), g.yieldStress, g.consistency, g.index) * 2 * y, x(from), x(1), 16)) / g.speed;
}

export const generalizedNewtonianPipe = reference('generalized-newtonian-pipe', {
  title: 'Developed laminar flow of a fluid of other rheology in a round pipe',
  kind: 'exact',
  assumes: ['steady', 'laminar', 'fully developed', 'inelastic', 'no slip', 'one temperature'],
  verifies: ['law of the viscosity', 'bound of the viscosity at low shear', 'pressure gradient', 'plug'],
  source: 'Rabinowitsch, Z. Phys. Chem. A 145 (1929) 1; Buckingham, Proc. ASTM 21 (1921) 1154 for the plastic fluid',
  uncertainty: 0,
  order: 2,
  passLimit: 0.01,
  ifMissed: 'the shear rate is sqrt(2 D:D); the bound of the viscosity in the plug; cells across the plug edge',
  notes: [powerLaw],
  flows: ['pipe'],
  needs: [{ ...speed, name: 'mean speed', sign: 'positive' }, { ...length, name: 'diameter' }, run, { id: 'consistency', unit: 'Pa s^n', name: 'consistency; the plastic viscosity of a Bingham fluid' }, { id: 'index', unit: '1', name: 'index of the law', default: 1, range: [0.1, 3] }, { id: 'yieldStress', unit: 'Pa', name: 'yield stress', default: 0, sign: 'not-negative' }],
  values: [
    { id: 'wallShear', name: 'wall shear stress', unit: 'Pa', formula: '8U/D = 4 int_0^1 s^2 g(tau_w s) ds, g = ((tau - tau_y)/K)^(1/n)', value: wallStress },
    { id: 'pressureGradient', name: 'pressure fall per length', unit: 'Pa/m', formula: '-dp/dx = 4 tau_w/D', value: (g) => (4 * wallStress(g)) / g.length },
    { id: 'pressureDrop', name: 'pressure drop of developed flow', unit: 'Pa', formula: 'dp = 4 tau_w L/D', value: (g) => (4 * wallStress(g) * g.flowLength) / g.length },
    { id: 'plugShare', name: 'radius of the plug over that of the pipe', unit: '1', formula: 'phi = tau_y/tau_w', value: (g) => g.yieldStress / wallStress(g) },
    { id: 'peakOverMean', name: 'speed on the axis over the mean', unit: '1', formula: 'u_max/U', value: (g) => shape(wallStress(g), 0, g) },
  ],
  tables: [
    {
      id: 'velocityShape',
      title: 'Axial speed over the mean, across the radius',
      columns: [{ id: 'radius', name: 'r/R', unit: '1' }, { id: 'velocity', name: 'u/U', unit: '1' }],
      rows: (g) => {
        const wall = wallStress(g);
        return places(0, 1, 20).map((r) => [r, shape(wall, r, g)]);
      },
    },
  ],
});
