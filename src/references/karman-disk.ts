import { reference } from './define.ts';

export const karmanDisk = reference('karman-disk', {
  title: 'Disk turning in still fluid',
  kind: 'exact',
  assumes: ['steady', 'laminar', 'constant properties', 'disk endless, or its rim left out'],
  verifies: ['turning wall', 'wall shear', 'inflow along the axis'],
  source: 'Karman 1921, Cochran 1934; White, Viscous Fluid Flow, 3rd ed. (2006); ordinary differential equations solved anew',
  uncertainty: 1e-5,
  order: 2,
  passLimit: 0.005,
  ifMissed: 'fluid free to flow in along the axis and out at the rim; cells inside sqrt(nu/Omega)',
  flows: ['rotating-disk'],
  needs: [{ id: 'reynolds', unit: '1', name: 'Reynolds number Omega R^2/nu', range: [100, 2e5] }],
  values: [
    { id: 'shearOutward', name: "F'(0), outward shear", unit: '1', formula: "F'(0)", value: () => 0.5102326 },
    { id: 'shearRound', name: "G'(0), shear round the axis", unit: '1', formula: "G'(0)", value: () => -0.6159220 },
    { id: 'inflow', name: 'inflow along the axis, over sqrt(nu Omega)', unit: '1', formula: 'H(infinity)', value: () => -0.8844741 },
    { id: 'torqueCoefficient', name: 'torque of both sides over rho Omega^2 R^5/2', unit: '1', formula: "C_M = -2 pi G'(0) Re^(-1/2)", value: (g) => (2 * Math.PI * 0.615922) / Math.sqrt(g.reynolds) },
  ],
});
