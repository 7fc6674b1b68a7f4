import { quantity, way, type Definition } from '../workings/index.ts';

const conditioning = 'error at most the condition number times the unit round-off; Higham, Accuracy and Stability of Numerical Algorithms (2002)';

/** Digits that the arithmetic must hold. */
export const digits: Definition[] = [
  quantity('pressureCondition', { symbol: 'kappa', name: 'condition number of the pressure solve', unit: '1' }, [
    way({ needs: ['domainUpstream', 'flowLength', 'domainDownstream', 'firstCellHeight'], when: { flowClass: ['internal', 'continuum'] }, value: (of) => (16 / Math.PI ** 2) * ((of.domainUpstream + of.flowLength + of.domainDownstream) / of.firstCellHeight) ** 2, formula: 'kappa = (16/pi^2)(L_domain/h_1)^2', source: 'pressure given at one end' }),
    way({ needs: ['domainUpstream', 'length', 'domainDownstream', 'firstCellHeight'], when: { flowClass: ['body', 'jet'] }, value: (of) => (16 / Math.PI ** 2) * ((of.domainUpstream + of.length + of.domainDownstream) / of.firstCellHeight) ** 2, formula: 'kappa = (16/pi^2)(L_domain/h_1)^2', source: 'pressure given at one end' }),
    way({ needs: ['length', 'firstCellHeight'], value: ({ length, firstCellHeight }) => (4 / Math.PI ** 2) * (length / firstCellHeight) ** 2, formula: 'kappa = (4/pi^2)(L/h_1)^2', source: 'closed region' }),
    way({ needs: ['flowLength', 'coreCellSize'], value: ({ flowLength, coreCellSize }) => (16 / Math.PI ** 2) * (flowLength / coreCellSize) ** 2, formula: 'kappa = (16/pi^2)(L_x/h_c)^2', source: 'no layers at walls' }),
    way({ needs: ['length', 'coreCellSize'], value: ({ length, coreCellSize }) => (16 / Math.PI ** 2) * (length / coreCellSize) ** 2, formula: 'kappa = (16/pi^2)(L/h_c)^2', source: 'no layers at walls' }),
  ]),
  quantity('digitsLost', { symbol: 'd_l', name: 'digits that the pressure solve and the level of temperature cost', unit: '1' }, [
    way({ needs: ['pressureCondition', 'temperatureDifference', 'referenceTemperature'], when: { energySolved: 'yes' }, value: (of) => Math.max(0, Math.log10(of.pressureCondition) - 1, Math.log10(of.referenceTemperature / of.temperatureDifference)), formula: 'd_l = max(log10 kappa - 1, log10(T/dT))', source: conditioning }),
    way({ needs: ['pressureCondition'], value: ({ pressureCondition }) => Math.max(0, Math.log10(pressureCondition) - 1), formula: 'd_l = log10 kappa - 1', source: conditioning }),
  ]),
  quantity('digitsNeeded', { symbol: 'd_n', name: 'digits that must be left', unit: '1' }, [
    way({ needs: ['iterationTolerance'], value: ({ iterationTolerance }) => Math.log10(1 / iterationTolerance) + 1, formula: 'd_n = log10(30/W) + 1', source: 'ten times below the iteration error' }),
  ]),
  quantity('digitsSpareSingle', { symbol: 'd_s', name: 'digits to spare in single precision', unit: '1', signed: true }, [
    way({ needs: ['digitsLost', 'digitsNeeded'], value: ({ digitsLost, digitsNeeded }) => 7.2 - digitsLost - digitsNeeded, formula: 'd_s = 7.2 - d_l - d_n', source: 'round-off 2^-24' }),
  ]),
  quantity('digitsSpareDouble', { symbol: 'd_d', name: 'digits to spare in double precision', unit: '1', signed: true }, [
    way({ needs: ['digitsLost', 'digitsNeeded'], value: ({ digitsLost, digitsNeeded }) => 15.95 - digitsLost - digitsNeeded, formula: 'd_d = 15.95 - d_l - d_n', source: 'round-off 2^-53' }),
  ]),
  quantity('temperatureShare', { symbol: 'dT/T', name: 'temperature difference over the level', unit: '1' }, [
    way({ needs: ['temperatureDifference', 'referenceTemperature'], when: { energySolved: 'yes' }, value: (of) => of.temperatureDifference / of.referenceTemperature, formula: 'dT/T', source: 'definition' }),
    way({ needs: [], when: { energySolved: 'no' }, value: () => 1, formula: '1', source: 'no temperature is solved' }),
  ]),
];
