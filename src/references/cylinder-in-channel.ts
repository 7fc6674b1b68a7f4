import { reference } from './define.ts';

export const cylinderInChannel = reference('cylinder-in-channel', {
  title: 'Laminar flow round a cylinder in a channel',
  kind: 'benchmark',
  assumes: [
    'two-dimensional', 'channel 2.2 m by 0.41 m, cylinder of 0.1 m centred at (0.2 m, 0.2 m)', 'density 1 kg/m^3, kinematic viscosity 1e-3 m^2/s',
    'inflow 4 U_m y (0.41 - y)/0.41^2 with U_m 0.3 m/s (Re 20) or 1.5 m/s (Re 100)', 'Re and coefficients on the mean inlet speed 2 U_m/3 and the diameter',
  ],
  verifies: ['drag and lift of a body', 'pressure-velocity coupling', 'time accuracy of shedding'],
  source: 'Schafer and Turek, Notes Numer. Fluid Mech. 52 (1996) 547-566, cases 2D-1, 2D-2, 2D-3; digits at Re 20: Nabh 1998; later fine-grid values at Re 100',
  uncertainty: 1e-6,
  order: 2,
  passLimit: 0.01,
  ifMissed: 'cylinder 5 mm off the middle of the channel; coefficients with the mean inlet speed; cells round the cylinder; at Re 100 a step of at most a hundredth of the period',
  flows: ['cylinder'],
  needs: [{ id: 'reynolds', unit: '1', name: 'Reynolds number on mean inlet speed and diameter', anchors: [20, 100] }],
  values: [
    { id: 'dragCoefficient', name: 'drag coefficient, steady at Re 20, largest at Re 100', unit: '1', formula: 'benchmark', value: ({ reynolds }) => (reynolds < 50 ? 5.57953523384 : 3.23), uncertainty: ({ reynolds }) => (reynolds < 50 ? 1e-8 : 0.0031) },
    { id: 'liftCoefficient', name: 'lift coefficient, steady at Re 20, largest at Re 100', unit: '1', formula: 'benchmark', value: ({ reynolds }) => (reynolds < 50 ? 0.010618948146 : 1), uncertainty: ({ reynolds }) => (reynolds < 50 ? 1e-6 : 0.01) },
    { id: 'pressureDifference', name: 'pressure in front minus pressure behind the cylinder, steady', unit: 'Pa', formula: 'benchmark', value: ({ reynolds }) => (reynolds < 50 ? 0.11752016697 : undefined), uncertainty: 1e-8 },
    { id: 'strouhal', name: 'Strouhal number f D/U', unit: '1', formula: 'benchmark', value: ({ reynolds }) => (reynolds < 50 ? undefined : 0.30184), uncertainty: 0.005 },
    { id: 'liftCoefficientSwung', name: 'largest lift coefficient with the inflow times sin(pi t/8 s), 8 s from rest', unit: '1', formula: 'benchmark', value: ({ reynolds }) => (reynolds < 50 ? undefined : 0.47795), uncertainty: 0.001 },
  ],
});
