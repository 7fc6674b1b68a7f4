import { reference } from './define.ts';
import { conductivity, density, kinematicViscosity, length, prandtl, viscosity } from './inputs.ts';
import { at, pchip } from './kernels/index.ts';
import { uprightPlateTable } from './upright-plate-table.ts';

type Column = 1 | 2 | 3 | 4 | 5 | 6;
const curves = new Map<Column, (x: number) => number>();

/** One column of the table at a Prandtl number, interpolated in the logarithms. */
function similar(column: Column, prandtl: number): number {
  let curve = curves.get(column);
  if (!curve) {
    curve = pchip(uprightPlateTable.map((row) => Math.log(row[0])), uprightPlateTable.map((row) => Math.log(at(row, column))));
    curves.set(column, curve);
  }
  return Math.exp(curve(Math.log(prandtl)));
}

const fourth = (grashof: number): number => (grashof / 4) ** 0.25;

export const uprightPlateSimilarity = reference('upright-plate-similarity', {
  title: 'Laminar layer on an upright heated plate in still fluid',
  kind: 'exact',
  assumes: ['steady', 'laminar', 'density linear in temperature and only in the weight', 'other properties constant', 'wall temperature uniform', 'far fluid at rest, at one temperature', 'boundary-layer equations'],
  verifies: ['buoyancy', 'wall heat flux', 'wall shear', 'coupling of temperature and momentum'],
  source: "Ostrach, NACA Report 1111 (1953); f''' + 3 f f'' - 2 f'^2 + theta = 0, theta'' + 3 Pr f theta' = 0 solved anew as a boundary-value problem",
  uncertainty: 1e-4,
  order: 2,
  passLimit: 0.01,
  ifMissed: 'domain ten layers wide; fluid free to enter from the side and below; cells inside the thermal layer; leave out the first 5 % of the height',
  notes: ['The full equations differ from the boundary-layer solution at low Grashof numbers, by the order of Gr^(-1/4): compare above Gr 1e5.', 'Ostrach printed 0.0812 for -theta\'(0) at Pr 0.01; the converged value is 0.0806.'],
  flows: ['plate', 'cylinder'],
  needs: [
    { id: 'grashof', unit: '1', name: 'Grashof number g beta dT x^3/nu^2 on the height', range: [1e4, 4e9] },
    { ...prandtl, range: [0.01, 1000] },
    { ...length, name: 'height above the lower edge' },
    kinematicViscosity,
    viscosity,
    density,
    conductivity,
  ],
  values: [
    { id: 'heatSimilar', name: 'wall gradient of temperature', unit: '1', formula: "-theta'(0), table over Pr", value: (g) => similar(1, g.prandtl) },
    { id: 'wallShearSimilar', name: 'wall shear of the similar solution', unit: '1', formula: "f''(0), table over Pr", value: (g) => similar(2, g.prandtl) },
    { id: 'nusseltLocal', name: 'Nusselt number at the height', unit: '1', formula: "Nu_x = -theta'(0) (Gr_x/4)^(1/4)", value: (g) => similar(1, g.prandtl) * fourth(g.grashof) },
    { id: 'nusselt', name: 'Nusselt number, mean over the height', unit: '1', formula: 'Nu = (4/3) Nu_x', value: (g) => (4 / 3) * similar(1, g.prandtl) * fourth(g.grashof) },
    { id: 'heatTransferCoefficient', name: 'heat transfer coefficient, mean over the height', unit: 'W/(m^2 K)', formula: 'h = Nu k/x', value: (g) => ((4 / 3) * similar(1, g.prandtl) * fourth(g.grashof) * g.thermalConductivity) / g.length },
    { id: 'wallShear', name: 'wall shear stress at the height', unit: 'Pa', formula: "tau_w = 2 mu nu/x^2 Gr_x^(1/2) f''(0) (Gr_x/4)^(1/4)", value: (g) => ((2 * g.viscosity * g.kinematicViscosity) / g.length ** 2) * Math.sqrt(g.grashof) * similar(2, g.prandtl) * fourth(g.grashof) },
    { id: 'peakSpeed', name: 'largest speed in the layer at the height', unit: 'm/s', formula: "u_max = 2 nu/x Gr_x^(1/2) f'_max", value: (g) => ((2 * g.kinematicViscosity) / g.length) * Math.sqrt(g.grashof) * similar(3, g.prandtl) },
    { id: 'peakSpeedDistance', name: 'distance of the largest speed from the wall', unit: 'm', formula: 'y = eta x (4/Gr_x)^(1/4)', value: (g) => (similar(4, g.prandtl) * g.length) / fourth(g.grashof) },
    { id: 'thermalLayerThickness', name: 'thickness where 1 % of the temperature difference is left', unit: 'm', formula: 'delta_T = eta_T x (4/Gr_x)^(1/4)', value: (g) => (similar(5, g.prandtl) * g.length) / fourth(g.grashof) },
    { id: 'boundaryLayerThickness', name: 'thickness where 1 % of the largest speed is left', unit: 'm', formula: 'delta_v = eta_v x (4/Gr_x)^(1/4)', value: (g) => (similar(6, g.prandtl) * g.length) / fourth(g.grashof) },
  ],
});
