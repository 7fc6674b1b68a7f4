import { reference } from './define.ts';
import { length, prandtl, reynolds, speed } from './inputs.ts';
import { brent } from './kernels/index.ts';

/** Darcy friction factor of a smooth pipe: Colebrook to Re 1e6, the superpipe law above. */
function smooth(reynolds: number): number {
  const colebrook = (x: number): number => x + 2 * Math.log10((2.51 * x) / reynolds);
  const superpipe = (x: number): number => x - 1.93 * Math.log10(reynolds / x) + 0.537;
  return 1 / brent(reynolds <= 1e6 ? colebrook : superpipe, 1, 40) ** 2;
}

function gnielinski(reynolds: number, prandtl: number): number {
  const eighth = smooth(reynolds) / 8;
  return (eighth * (reynolds - 1000) * prandtl) / (1 + 12.7 * Math.sqrt(eighth) * (prandtl ** (2 / 3) - 1));
}

export const turbulentPipe = reference('turbulent-pipe', {
  title: 'Developed turbulent flow and heat transfer in a smooth pipe',
  kind: 'measured',
  assumes: ['developed', 'smooth wall', 'constant properties'],
  verifies: ['turbulence closure', 'wall shear', 'wall heat flux'],
  source: 'Colebrook, J. Inst. Civ. Eng. 11 (1939) 133-156; McKeon, Zagarola and Smits, J. Fluid Mech. 538 (2005) 429-443; Gnielinski, Int. Chem. Eng. 16 (1976) 359-368',
  uncertainty: 0.02,
  passLimit: 0.05,
  ifMissed: 'length of the development, or periodic ends; first cell and wall law; turbulent Prandtl number for heat',
  notes: ['The heat law holds for pipes of any wall condition within its scatter at Pr above 0.5; a liquid metal needs another.', 'At Re 1e6 the two friction laws differ by 2 %.'],
  flows: ['pipe', 'duct'],
  needs: [{ ...reynolds, range: [4000, 3.5e7] }, { ...prandtl, range: [0.5, 2000] }, { ...speed, name: 'mean speed' }, { ...length, name: 'diameter' }, { id: 'density', unit: 'kg/m^3', name: 'density' }],
  values: [
    { id: 'frictionFactorDarcy', name: 'Darcy friction factor', unit: '1', formula: '1/sqrt(f) = -2 log10(2.51/(Re sqrt(f))) to Re 1e6; 1/sqrt(f) = 1.930 log10(Re sqrt(f)) - 0.537 above', value: (g) => smooth(g.reynolds) },
    { id: 'skinFrictionCoefficient', name: 'skin friction coefficient (Fanning)', unit: '1', formula: 'c_f = f/4', value: (g) => smooth(g.reynolds) / 4 },
    { id: 'nusselt', name: 'Nusselt number, developed', unit: '1', formula: 'Nu = (f/8)(Re - 1000) Pr/[1 + 12.7 sqrt(f/8)(Pr^(2/3) - 1)]', value: (g) => gnielinski(g.reynolds, g.prandtl), uncertainty: 0.1 },
    { id: 'wallShear', name: 'wall shear stress', unit: 'Pa', formula: 'tau_w = f rho U^2/8', value: (g) => (smooth(g.reynolds) * g.density * g.speed ** 2) / 8 },
    { id: 'pressureGradient', name: 'pressure fall per length', unit: 'Pa/m', formula: '-dp/dx = f rho U^2/(2 D)', value: (g) => (smooth(g.reynolds) * g.density * g.speed ** 2) / (2 * g.length) },
  ],
});
