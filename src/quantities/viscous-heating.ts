import { quantity, way, type Definition } from '../workings/index.ts';
import { factor } from './factor.ts';

const definition = 'definition';
const through = ['internal', 'continuum'];

/** Heat of friction and work of pressure: the numbers that decide, and what they cost. */
export const viscousHeating: Definition[] = [
  quantity('temperatureTolerance', { symbol: 'T_tol', name: 'temperature that matters: the tolerance of a temperature target', unit: 'K' }, [
    way({ needs: [], as: 'assumed', value: () => 1, formula: 'T_tol = 1 K', source: 'taken where no target states kelvins', dimensional: 'a temperature difference from practice' }),
  ]),
  quantity('recoveryRatio', { symbol: 'R_q', name: 'rise of a layer by its own friction over the temperature difference', unit: '1' }, [
    way({ needs: ['prandtl', 'speed', 'specificHeatCapacity', 'temperatureDifference'], value: ({ prandtl, speed, specificHeatCapacity, temperatureDifference }) => (Math.cbrt(prandtl) * speed ** 2) / (2 * specificHeatCapacity * temperatureDifference), formula: 'Pr^(1/3) U^2/(2 cp dT)', source: 'Schlichting and Gersten, Boundary-Layer Theory, recovery factor of turbulent layers' }),
  ]),
  quantity('mixedRise', { symbol: 'dT_dp', name: 'rise of the mean temperature by friction', unit: 'K', signed: true }, [
    way({ needs: ['pressureDropPlain', 'density', 'specificHeatCapacity'], when: { flowClass: through }, value: ({ pressureDropPlain, density, specificHeatCapacity }) => pressureDropPlain / (density * specificHeatCapacity), formula: 'dT = dp/(rho cp)', source: 'energy balance without heat through the wall' }),
  ]),
  quantity('mixedRiseOverTolerance', { symbol: 'dT_dp/T_tol', name: 'rise by friction over the temperature that matters', unit: '1' }, [
    way({ needs: ['mixedRise', 'temperatureTolerance'], value: ({ mixedRise, temperatureTolerance }) => Math.abs(mixedRise) / temperatureTolerance, formula: 'dp/(rho cp T_tol)', source: definition }),
  ]),
  quantity('brinkmanFlux', { symbol: 'Br_q', name: 'Brinkman number on the wall heat flux, negative where the wall cools', unit: '1', signed: true }, [
    way({ needs: ['viscosityBulk', 'speedBulk', 'wallHeatFlux', 'length'], when: { flowClass: 'internal', wallKind: 'flux' }, value: (of) => (of.viscosityBulk * of.speedBulk ** 2) / (of.wallHeatFlux * of.length), formula: 'Br_q = mu_b U_b^2/(q D_h)', source: definition }),
    way({ needs: ['viscosityBulk', 'speedBulk', 'nusseltPlain', 'thermalConductivityBulk', 'wallTemperature', 'bulkTemperature'], when: { flowClass: 'internal', wallKind: ['temperature', 'coefficient'] }, value: (of) => (of.viscosityBulk * of.speedBulk ** 2) / (of.nusseltPlain * of.thermalConductivityBulk * (of.wallTemperature - of.bulkTemperature)), formula: 'Br_q = mu_b U_b^2/(Nu_0 k_b (T_w - T_b))', source: 'q = h (T_w - T_b)' }),
  ]),
  ...factor('viscousHeatingFactorNusselt', { symbol: 'F_Br', name: 'Nusselt number with heat of friction over that without' }, [
    way({ needs: [], when: { energySolved: 'no' }, value: () => 1, formula: 'F = 1', source: 'one temperature throughout' }),
    way({ needs: ['brinkmanFlux'], when: { flowClass: 'internal', regime: 'laminar' }, range: { brinkmanFlux: [-0.1, 1] }, scatter: ({ brinkmanFlux }) => Math.min(1, 0.02 + Math.abs(4 * brinkmanFlux)), value: ({ brinkmanFlux }) => 11 / (11 + 48 * Math.min(1, Math.max(-0.1, brinkmanFlux))), formula: 'F = 11/(11 + 48 Br_q)', source: 'developed laminar tube with uniform flux; Tao 1961, Cheng and Wu 1976', note: 'uniform flux in a round tube; other walls and sections alike to its spread' }),
  ]),
  quantity('couetteRise', { symbol: 'dT_C', name: 'rise in the middle of a sheared layer by friction', unit: 'K' }, [
    way({ needs: ['viscosity', 'speed', 'thermalConductivity'], value: ({ viscosity, speed, thermalConductivity }) => (viscosity * speed ** 2) / (8 * thermalConductivity), formula: 'dT = mu U^2/(8 k)', source: 'plane Couette flow between walls of one temperature' }),
  ]),
  quantity('pressureWorkRise', { symbol: 'dT_p', name: 'change of temperature by the work of pressure', unit: 'K', signed: true }, [
    way({ needs: ['thermalExpansion', 'referenceTemperature', 'mixedRise'], value: ({ thermalExpansion, referenceTemperature, mixedRise }) => thermalExpansion * referenceTemperature * mixedRise, formula: 'dT = beta T dp/(rho cp)', source: 'enthalpy balance' }),
  ]),
  quantity('pressureWorkRatio', { symbol: 'dT_p/dT', name: 'change by the work of pressure over the temperature difference', unit: '1' }, [
    way({ needs: ['pressureWorkRise', 'temperatureDifference'], value: ({ pressureWorkRise, temperatureDifference }) => Math.abs(pressureWorkRise) / temperatureDifference, formula: '|beta| T dp/(rho cp dT)', source: definition }),
  ]),
  quantity('pressureWorkOverTolerance', { symbol: 'dT_p/T_tol', name: 'change by the work of pressure over the temperature that matters', unit: '1' }, [
    way({ needs: ['pressureWorkRise', 'temperatureTolerance'], value: ({ pressureWorkRise, temperatureTolerance }) => Math.abs(pressureWorkRise) / temperatureTolerance, formula: '|beta| T dp/(rho cp T_tol)', source: definition }),
  ]),
];
