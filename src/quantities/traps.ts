import { quantity, way, type Definition } from '../workings/index.ts';

const inside = { flowClass: 'internal', energySolved: 'yes' } as const;

/** Sizes of mistakes that look right: means over the wrong weight, wall units with the wrong state. */
export const traps: Definition[] = [
  quantity('areaMeanShare', { symbol: 'e_A', name: 'area mean against mass-flow mean, of the difference to the wall', unit: '1' }, [
    way({ needs: [], when: { ...inside, regime: 'laminar', ductSection: 'flat' }, value: () => 0.176, formula: 'e_A = 0.176', source: 'integrals of the developed profiles at uniform flux, two plates' }),
    way({ needs: [], when: { ...inside, regime: 'laminar' }, value: () => 3 / 11, formula: 'e_A = 1 - 8/11', source: 'integrals of the developed profiles at uniform flux, round tube: (1/3)/(11/24)' }),
    way({ needs: [], when: { ...inside, regime: ['transitional', 'turbulent'] }, value: () => 0.02, formula: 'e_A = 0.02', source: 'integrals of profiles with the power 1/7' }),
  ]),
  quantity('areaMeanBias', { symbol: 'dT_A', name: 'outlet temperature by the area mean less that by the mass-flow mean', unit: 'K' }, [
    way({ needs: ['areaMeanShare', 'wallTemperature', 'outletTemperature'], value: ({ areaMeanShare, wallTemperature, outletTemperature }) => areaMeanShare * Math.abs(wallTemperature - outletTemperature), formula: 'dT_A = e_A |T_w - T_out|', source: 'definition' }),
  ]),
  quantity('wallUnitsShift', { symbol: '|y_w/y_b - 1|', name: 'wall distance for one y+ at wall state against bulk state, less one', unit: '1' }, [
    way({ needs: ['kinematicViscosityWall', 'kinematicViscosityBulk', 'densityWall', 'densityBulk'], value: (of) => Math.abs((of.kinematicViscosityWall / of.kinematicViscosityBulk) * Math.sqrt(of.densityWall / of.densityBulk) - 1), formula: '|(nu_w/nu_b) sqrt(rho_w/rho_b) - 1|', source: 'definition of y+ at one wall shear' }),
  ]),
  quantity('wallUnitsLimit', { symbol: '', name: 'shift of wall units that is still harmless', unit: '1' }, [
    way({ needs: [], value: () => 0.1, formula: '0.1', source: 'common practice' }),
  ]),
];
