import { quantity, way, type Definition } from '../workings/index.ts';

const iso = 'ISO 80000-11';

/** Groups of features that a case names: fields, turning frames, other rheology, walls of finite conductivity. */
export const namedFields: Definition[] = [
  quantity('hartmann', { symbol: 'Ha', name: 'Hartmann number, on half the gap', unit: '1' }, [
    way({ needs: ['magneticField.fluxDensity', 'gap', 'electricalConductivity', 'viscosity'], value: (of) => of['magneticField.fluxDensity'] * (of.gap / 2) * Math.sqrt(of.electricalConductivity / of.viscosity), formula: 'Ha = B (H/2) sqrt(sigma_e/mu)', source: iso }),
  ]),
  quantity('rossby', { symbol: 'Ro', name: 'Rossby number', unit: '1' }, [
    way({ needs: ['speed', 'frame.rotation', 'length'], value: (of) => of.speed / (2 * Math.abs(of['frame.rotation']) * of.length), formula: 'Ro = U/(2 Omega L)', source: iso }),
  ]),
  quantity('ekman', { symbol: 'Ek', name: 'Ekman number', unit: '1' }, [
    way({ needs: ['kinematicViscosity', 'frame.rotation', 'length'], value: (of) => of.kinematicViscosity / (Math.abs(of['frame.rotation']) * of.length ** 2), formula: 'Ek = nu/(Omega L^2)', source: iso }),
  ]),
  quantity('binghamNumber', { symbol: 'Bm', name: 'Bingham number', unit: '1' }, [
    way({ needs: ['rheology.yieldStress', 'length', 'rheology.plasticViscosity', 'speed'], value: (of) => (of['rheology.yieldStress'] * of.length) / (of['rheology.plasticViscosity'] * of.speed), formula: 'Bm = tau_y L/(mu_p U)', source: iso }),
  ]),
  quantity('deborah', { symbol: 'De_b', name: 'Deborah number', unit: '1' }, [
    way({ needs: ['rheology.timeConstant', 'speed', 'length'], value: (of) => (of['rheology.timeConstant'] * of.speed) / of.length, formula: 'De_b = lambda U/L', source: iso }),
  ]),
  quantity('biot', { symbol: 'Bi', name: 'Biot number of the wall', unit: '1' }, [
    way({ needs: ['wallResistance', 'heatTransferCoefficient'], when: { 'has.layers': 'yes' }, value: ({ wallResistance, heatTransferCoefficient }) => wallResistance * heatTransferCoefficient, formula: 'Bi = h R_w', source: iso }),
  ]),
];
