import { places, reference } from './define.ts';
import { ductFriction, ductSpeed } from './duct-series.ts';
import { length, reynolds, run, speed, viscosity } from './inputs.ts';

export const poiseuilleDuct = reference('poiseuille-duct', {
  title: 'Developed laminar flow in a rectangular duct',
  kind: 'exact',
  assumes: ['steady', 'laminar', 'fully developed', 'constant density and viscosity', 'no slip'],
  verifies: ['momentum diffusion in two directions', 'wall shear', 'pressure gradient'],
  source: 'Fourier series of the momentum balance; Shah and London, Laminar Flow Forced Convection in Ducts (1978), chapter VII',
  uncertainty: 0,
  order: 2,
  passLimit: 0.005,
  ifMissed: 'hydraulic diameter 2 W H/(W + H); cells across the short side; the whole perimeter in the mean shear',
  flows: ['duct'],
  needs: [
    { id: 'aspectRatio', unit: '1', name: 'short side over long side', range: [1e-6, 1] },
    { ...reynolds, name: 'Reynolds number on the hydraulic diameter', range: [1e-12, 2300] },
    { ...speed, name: 'mean speed' },
    { ...length, name: 'hydraulic diameter' },
    viscosity,
    run,
  ],
  values: [
    { id: 'frictionTimesReynolds', name: 'Darcy friction factor times Reynolds number', unit: '1', formula: 'f Re = 96/{(1+a)^2 [1 - (192 a/pi^5) sum tanh(n pi/2a)/n^5]}, n odd', value: (g) => ductFriction(g.aspectRatio) },
    { id: 'peakOverMean', name: 'speed in the middle over the mean', unit: '1', formula: 'series', value: (g) => ductSpeed(g.aspectRatio, 0, 0) },
    { id: 'frictionFactorDarcy', name: 'Darcy friction factor', unit: '1', formula: 'f = (f Re)/Re', value: (g) => ductFriction(g.aspectRatio) / g.reynolds },
    { id: 'skinFrictionCoefficient', name: 'skin friction coefficient (Fanning), mean round the wall', unit: '1', formula: 'c_f = (f Re)/(4 Re)', value: (g) => ductFriction(g.aspectRatio) / (4 * g.reynolds) },
    { id: 'wallShear', name: 'wall shear stress, mean round the wall', unit: 'Pa', formula: 'tau_w = (f Re) mu U/(8 D_h)', value: (g) => (ductFriction(g.aspectRatio) * g.viscosity * g.speed) / (8 * g.length) },
    { id: 'pressureGradient', name: 'pressure fall per length', unit: 'Pa/m', formula: '-dp/dx = (f Re) mu U/(2 D_h^2)', value: (g) => (ductFriction(g.aspectRatio) * g.viscosity * g.speed) / (2 * g.length ** 2) },
    { id: 'pressureDrop', name: 'pressure drop of developed flow', unit: 'Pa', formula: 'dp = (f Re) mu U l/(2 D_h^2)', value: (g) => (ductFriction(g.aspectRatio) * g.viscosity * g.speed * g.flowLength) / (2 * g.length ** 2) },
  ],
  tables: [
    {
      id: 'velocityShort',
      title: 'Speed over the mean across the short side, through the middle',
      columns: [{ id: 'height', name: 'distance from the middle over half the short side', unit: '1' }, { id: 'velocity', name: 'u/U', unit: '1' }],
      rows: (g) => places(0, 1, 20).map((y) => [y, y === 1 ? 0 : ductSpeed(g.aspectRatio, y, 0)]),
    },
    {
      id: 'velocityLong',
      title: 'Speed over the mean across the long side, through the middle',
      columns: [{ id: 'width', name: 'distance from the middle over half the long side', unit: '1' }, { id: 'velocity', name: 'u/U', unit: '1' }],
      rows: (g) => places(0, 1, 20).map((z) => [z, ductSpeed(g.aspectRatio, 0, z)]),
    },
  ],
});
