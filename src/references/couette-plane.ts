import { places, reference } from './define.ts';
import { conductivity, viscosity } from './inputs.ts';

/** Speed over that of the moving wall, started at once; the series of the transient dies with nu t/H^2. */
function start(height: number, age: number): number {
  let sum = height;
  for (let n = 1; n < 2000; n++) {
    const decay = (n * Math.PI) ** 2 * age;
    if (decay > 40) break;
    sum += ((2 / Math.PI) * (n % 2 === 0 ? 1 : -1) * Math.exp(-decay) * Math.sin(n * Math.PI * height)) / n;
  }
  return sum;
}

export const couettePlane = reference('couette-plane', {
  title: 'Flow between a wall at rest and a sliding wall',
  kind: 'exact',
  assumes: ['laminar', 'constant properties', 'no pressure gradient', 'endless along the walls'],
  verifies: ['momentum diffusion', 'wall shear', 'heat from friction', 'time accuracy of the start'],
  source: 'Couette 1890; series of the start from rest: Schlichting and Gersten, Boundary-Layer Theory, 8th ed., chapter 5',
  uncertainty: 0,
  order: 2,
  passLimit: 0.005,
  ifMissed: 'no pressure gradient left; periodic ends; shear by a one-sided gradient',
  notes: ['A second-order scheme on any mesh gives the straight line without error: it checks the set-up, not the order.'],
  flows: ['channel', 'lid-driven-cavity', 'rotating-cylinders'],
  needs: [
    { id: 'speed', unit: 'm/s', name: 'speed of the moving wall', sign: 'any' }, { id: 'gap', unit: 'm', name: 'gap' }, viscosity, conductivity,
    { id: 'age', unit: '1', name: 'time since the start times kinematic viscosity over the gap squared', range: [1e-4, 1e6] },
  ],
  values: [
    { id: 'wallShear', name: 'wall shear stress', unit: 'Pa', formula: 'tau_w = mu U/H', value: (g) => (g.viscosity * g.speed) / g.gap },
    { id: 'middleRise', name: 'rise of temperature in mid-gap from friction', unit: 'K', formula: 'mu U^2/(8 k)', value: (g) => (g.viscosity * g.speed ** 2) / (8 * g.thermalConductivity) },
    { id: 'middleSpeedRatio', name: 'speed in mid-gap over the wall speed, at the age', unit: '1', formula: 'u/U = y/H + (2/pi) sum (-1)^n/n exp(-n^2 pi^2 nu t/H^2) sin(n pi y/H)', value: (g) => start(0.5, g.age) },
  ],
  tables: [
    {
      id: 'velocityShape',
      title: 'Speed over that of the moving wall across the gap, steady',
      columns: [{ id: 'height', name: 'y/H', unit: '1' }, { id: 'velocity', name: 'u/U', unit: '1' }],
      rows: () => places(0, 1, 10).map((y) => [y, y]),
    },
    {
      id: 'velocityStart',
      title: 'Speed over that of the moving wall across the gap, at the age',
      columns: [{ id: 'height', name: 'y/H', unit: '1' }, { id: 'velocity', name: 'u/U', unit: '1' }],
      rows: (g) => places(0, 1, 10).map((y) => [y, start(y, g.age)]),
    },
    {
      id: 'temperatureRise',
      title: 'Rise of temperature from friction across the gap, both walls at one temperature',
      columns: [{ id: 'height', name: 'y/H', unit: '1' }, { id: 'temperature', name: 'T - T_w', unit: 'K' }],
      rows: (g) => places(0, 1, 10).map((y) => [y, ((g.viscosity * g.speed ** 2) / (2 * g.thermalConductivity)) * y * (1 - y)]),
    },
  ],
});
