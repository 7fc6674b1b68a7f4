import { reference } from './define.ts';

export const rayleighBenardOnset = reference('rayleigh-benard-onset', {
  title: 'Onset of convection in a level layer heated from below',
  kind: 'exact',
  assumes: ['layer endless', 'walls at two temperatures', 'density linear in temperature and only in the weight', 'other properties constant'],
  verifies: ['buoyancy', 'growth and decay of disturbances'],
  source: 'Chandrasekhar, Hydrodynamic and Hydromagnetic Stability (1961), chapter II',
  uncertainty: 1e-5,
  passLimit: 0.01,
  ifMissed: 'box a whole number of half waves wide, pi H/3.116 each; run long enough to see a sign',
  flows: ['bottom-heated-cavity', 'plate'],
  needs: [],
  values: [
    { id: 'criticalRayleigh', name: 'critical Rayleigh number on the height, rigid floor and lid', unit: '1', formula: 'eigenvalue', value: () => 1707.762 },
    { id: 'criticalWavenumber', name: 'wavenumber times height, rigid floor and lid', unit: '1', formula: 'eigenvalue', value: () => 3.1163, uncertainty: 1e-4 },
    { id: 'criticalRayleighRigidFree', name: 'critical Rayleigh number, one rigid and one free surface', unit: '1', formula: 'eigenvalue', value: () => 1100.65 },
    { id: 'criticalWavenumberRigidFree', name: 'wavenumber times height, one rigid and one free surface', unit: '1', formula: 'eigenvalue', value: () => 2.682, uncertainty: 3e-4 },
    { id: 'criticalRayleighFreeFree', name: 'critical Rayleigh number, both surfaces free', unit: '1', formula: '27 pi^4/4', value: () => (27 * Math.PI ** 4) / 4, uncertainty: 0 },
    { id: 'criticalWavenumberFreeFree', name: 'wavenumber times height, both surfaces free', unit: '1', formula: 'pi/sqrt(2)', value: () => Math.PI / Math.SQRT2, uncertainty: 0 },
  ],
});
