import { quantity, way, wordWay, type Definition } from '../workings/index.ts';

const none = way({ needs: [], value: () => 1, formula: 'F = 1', source: 'the effect does not act here' });

/** Gas effects: Mach number, pressure level, departure from the ideal gas, slip, height, pressure waves. */
export const compressibility: Definition[] = [
  quantity('machFactorDensity', { symbol: 'F_Ma', name: 'density at the speed over density at rest', unit: '1' }, [
    way({ needs: ['mach', 'isentropicExponent'], when: { medium: 'gas' }, value: ({ mach, isentropicExponent: g }) => (1 + ((g - 1) / 2) * mach ** 2) ** (-1 / (g - 1)), formula: 'F = (1 + (gamma - 1) Ma^2/2)^(-1/(gamma - 1))', source: 'isentropic flow of an ideal gas' }),
    none,
  ]),
  quantity('recoveryRise', { symbol: 'dT_r', name: 'rise of an adiabatic wall over the stream', unit: 'K' }, [
    way({ needs: ['prandtl', 'isentropicExponent', 'mach', 'referenceTemperature'], when: { medium: 'gas', regime: 'laminar' }, value: ({ prandtl, isentropicExponent, mach, referenceTemperature }) => (Math.sqrt(prandtl) * (isentropicExponent - 1) * mach ** 2 * referenceTemperature) / 2, formula: 'dT_r = Pr^(1/2) (gamma - 1) Ma^2 T/2', source: 'Schlichting and Gersten, Boundary-Layer Theory, recovery factor, laminar' }),
    way({ needs: ['prandtl', 'isentropicExponent', 'mach', 'referenceTemperature'], when: { medium: 'gas', regime: ['transitional', 'turbulent'] }, value: ({ prandtl, isentropicExponent, mach, referenceTemperature }) => (Math.cbrt(prandtl) * (isentropicExponent - 1) * mach ** 2 * referenceTemperature) / 2, formula: 'dT_r = Pr^(1/3) (gamma - 1) Ma^2 T/2', source: 'Schlichting and Gersten, Boundary-Layer Theory, recovery factor, turbulent' }),
  ]),
  quantity('pressureShare', { symbol: 'Pi_p', name: 'pressure drop over absolute pressure', unit: '1' }, [
    way({ needs: ['pressureDropPlain', 'pressure'], value: ({ pressureDropPlain, pressure }) => pressureDropPlain / pressure, formula: 'Pi_p = dp/p', source: 'definition' }),
    way({ needs: [], when: { flowClass: ['body', 'jet', 'enclosure'] }, value: () => 0, formula: 'Pi_p = 0', source: 'no pressure drop along an open flow' }),
  ]),
  quantity('expansionFactorMassFlow', { symbol: 'F_p', name: 'mass flow at given end pressures over that of constant inlet density', unit: '1' }, [
    way({ needs: ['pressureShare'], when: { medium: 'gas', flowClass: 'internal' }, range: { pressureShare: [0, 0.4] }, value: ({ pressureShare }) => Math.sqrt(Math.max(0, 1 - pressureShare / 2)), formula: 'F = sqrt(1 - Pi_p/2)', source: 'isothermal gas flow in a duct, long duct' }),
    none,
  ]),
  quantity('realGasDeviation', { symbol: '|Z - 1|', name: 'departure from the ideal gas', unit: '1' }, [
    way({ needs: ['compressibilityFactor'], when: { medium: 'gas' }, value: ({ compressibilityFactor }) => Math.abs(compressibilityFactor - 1), formula: '|Z - 1|', source: 'definition' }),
  ]),
  quantity('realGasFactorDensity', { symbol: 'F_Z', name: 'real over ideal density', unit: '1' }, [
    way({ needs: ['compressibilityFactor'], when: { medium: 'gas' }, value: ({ compressibilityFactor }) => 1 / compressibilityFactor, formula: 'F = 1/Z', source: 'definition' }),
    none,
  ]),
  quantity('reducedTemperature', { symbol: 'T/T_c', name: 'reduced temperature', unit: '1' }, [
    way({ needs: ['referenceTemperature', 'criticalTemperature'], value: ({ referenceTemperature, criticalTemperature }) => referenceTemperature / criticalTemperature, formula: 'T/T_c', source: 'definition' }),
  ]),
  quantity('reducedPressure', { symbol: 'p/p_c', name: 'reduced pressure', unit: '1' }, [
    way({ needs: ['pressure', 'criticalPressure'], value: ({ pressure, criticalPressure }) => pressure / criticalPressure, formula: 'p/p_c', source: 'definition' }),
  ]),
  quantity('nearCritical', { symbol: '', name: 'the gas is near its critical point', unit: 'word', words: ['yes', 'no'] }, [
    wordWay({ needs: ['reducedTemperature', 'reducedPressure'], word: ({ reducedTemperature, reducedPressure }) => (reducedTemperature > 0.9 && reducedTemperature < 1.3 && reducedPressure > 0.6 ? 'yes' : 'no'), formula: '0.9 < T/T_c < 1.3 and p > 0.6 p_c', source: 'common practice' }),
    wordWay({ needs: [], word: () => 'no', formula: 'no critical point in the record', source: 'material record' }),
  ]),
  quantity('columnRatio', { symbol: 'Pi_g', name: 'height over the scale height of the gas', unit: '1' }, [
    way({ needs: ['gravity', 'passageHeight', 'gasConstant', 'referenceTemperature'], when: { medium: 'gas' }, value: ({ gravity, passageHeight, gasConstant, referenceTemperature }) => (gravity * passageHeight) / (gasConstant * referenceTemperature), formula: 'Pi_g = g H/(R_s T)', source: 'hydrostatics of an ideal gas' }),
  ]),
  quantity('surgeRatio', { symbol: 't_c/(2 L/a)', name: 'time of the change over the return time of a pressure wave', unit: '1' }, [
    way({ needs: ['time.ramp', 'flowLength', 'speedOfSound'], when: { flowClass: 'internal' }, value: (of) => (of['time.ramp'] * of.speedOfSound) / (2 * of.flowLength), formula: 't_c a/(2 L), a of the unbounded liquid', source: 'Joukowsky 1898' }),
    way({ needs: ['time.period', 'flowLength', 'speedOfSound'], when: { flowClass: 'internal' }, value: (of) => (of['time.period'] * of.speedOfSound) / (2 * Math.PI * of.flowLength), formula: '(period/pi) a/(2 L)', source: 'Joukowsky 1898' }),
  ]),
  quantity('surgePressure', { symbol: 'dp_J', name: 'pressure rise of a stopped column', unit: 'Pa' }, [
    way({ needs: ['density', 'speedOfSound', 'speed'], when: { medium: 'liquid' }, value: ({ density, speedOfSound, speed }) => density * speedOfSound * speed, formula: 'dp = rho a U', source: 'Joukowsky 1898' }),
  ]),
  quantity('rarefactionFactorFriction', { symbol: 'F_Kn', name: 'friction with slip over friction without', unit: '1' }, [
    way({ needs: ['knudsen'], when: { medium: 'gas', flowClass: 'internal', ductSection: 'round', regime: 'laminar' }, range: { knudsen: [0, 0.1] }, value: ({ knudsen }) => 1 / (1 + 8 * knudsen), formula: 'F = 1/(1 + 8 Kn)', source: 'slip flow in a round tube, Maxwell slip, full accommodation' }),
    way({ needs: ['knudsen'], when: { medium: 'gas', flowClass: 'internal', ductSection: ['flat', 'rectangular'], regime: 'laminar' }, range: { knudsen: [0, 0.05] }, value: ({ knudsen }) => 1 / (1 + 12 * knudsen), formula: 'F = 1/(1 + 6 Kn_H) = 1/(1 + 12 Kn), Kn on 2 H', source: 'slip flow between plates, Maxwell slip, full accommodation' }),
    none,
  ]),
  quantity('rarefactionFactorNusselt', { symbol: 'F_Kn,Nu', name: 'Nusselt number with slip and jump over that without', unit: '1' }, [
    way({ needs: ['knudsen', 'isentropicExponent', 'prandtl'], when: { medium: 'gas', flowClass: 'internal', ductSection: 'round', regime: 'laminar' }, range: { knudsen: [0, 0.1] }, value: ({ knudsen, isentropicExponent: g, prandtl }) => {
      const z = (8 * knudsen) / (1 + 8 * knudsen);
      return 11 / (11 - 6 * z + z ** 2 + (48 * knudsen * 2 * g) / ((g + 1) * prandtl));
    }, formula: 'F = 11/(11 - 6 z + z^2 + 96 gamma Kn/((gamma + 1) Pr)), z = 8 Kn/(1 + 8 Kn)', source: 'slip flow with temperature jump, uniform flux, Sparrow and Lin, J. Heat Transfer 84 (1962) 363, full accommodation' }),
    none,
  ]),
];
