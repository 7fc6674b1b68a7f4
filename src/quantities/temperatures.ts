import { loop, quantity, way, type Definition } from '../workings/index.ts';

const balance = 'energy balance of the through-flow';
const kelvin = { unit: 'K', signed: true };
const through = ['internal', 'continuum'];

/** Temperatures of the case. Two loops close here: the mean bulk temperature and the wetted face of a wall with resistance. */
export const temperatures: Definition[] = [
  quantity('inletTemperature', { symbol: 'T_in', name: 'temperature of the fluid that arrives', ...kelvin }),
  quantity('surroundingsTemperature', { symbol: 'T_sur', name: 'temperature of the surroundings', ...kelvin }),
  quantity('farTemperature', { symbol: 'T_far', name: 'temperature of the undisturbed fluid', ...kelvin }, [
    way({ needs: ['inletTemperature'], value: ({ inletTemperature }) => inletTemperature, formula: 'T_far = T_in', source: 'definition' }),
    way({ needs: ['surroundingsTemperature'], value: ({ surroundingsTemperature }) => surroundingsTemperature, formula: 'T_far = T_sur', source: 'definition' }),
  ]),
  quantity('hotTemperature', { symbol: 'T_h', name: 'hot wall', ...kelvin }),
  quantity('coldTemperature', { symbol: 'T_c', name: 'cold wall', ...kelvin }),
  quantity('referenceTemperature', { symbol: 'T_ref', name: 'temperature of the state of the plain numbers', ...kelvin }, [
    way({ needs: ['hotTemperature', 'coldTemperature'], when: { flowClass: 'enclosure' }, value: ({ hotTemperature, coldTemperature }) => (hotTemperature + coldTemperature) / 2, formula: 'T_ref = (T_h + T_c)/2', source: 'convention: closed cavities at the mean of their walls' }),
    way({ needs: ['filmTemperature'], when: { flowClass: 'body', imposedFlow: 'no' }, value: ({ filmTemperature }) => filmTemperature, formula: 'T_ref = T_f', source: 'convention: a body in still fluid at the film temperature' }),
    way({ needs: ['farTemperature'], value: ({ farTemperature }) => farTemperature, formula: 'T_ref = T_far', source: 'convention: through-flow and external flow at the state that arrives' }),
  ]),
  quantity('filmTemperature', { symbol: 'T_f', name: 'film temperature', ...kelvin }, [
    way({ needs: ['wallTemperature', 'bulkTemperature'], when: { flowClass: through }, value: ({ wallTemperature, bulkTemperature }) => (wallTemperature + bulkTemperature) / 2, formula: 'T_f = (T_w + T_b)/2', source: 'definition' }),
    way({ needs: ['hotTemperature', 'coldTemperature'], when: { flowClass: 'enclosure' }, value: ({ hotTemperature, coldTemperature }) => (hotTemperature + coldTemperature) / 2, formula: 'T_f = (T_h + T_c)/2', source: 'definition' }),
    way({ needs: ['wallTemperature', 'farTemperature'], when: { flowClass: ['body', 'jet', 'solid'] }, value: ({ wallTemperature, farTemperature }) => (wallTemperature + farTemperature) / 2, formula: 'T_f = (T_w + T_far)/2', source: 'definition' }),
  ]),
  quantity('bulkTemperature', { symbol: 'T_b', name: 'mean bulk temperature', ...kelvin }, [
    way({ needs: ['inletTemperature'], when: { flowClass: through, energySolved: 'no' }, value: ({ inletTemperature }) => inletTemperature, formula: 'T_b = T_in', source: 'one temperature throughout' }),
    loop({ needs: ['inletTemperature'], when: { flowClass: through }, start: ({ inletTemperature }) => inletTemperature, closes: 'bulkTemperatureNext', formula: 'T_b = (T_in + T_out)/2', source: 'convention: internal flow at the mean of inlet and outlet' }),
    way({ needs: ['inletTemperature'], when: { flowClass: through }, as: 'assumed', value: ({ inletTemperature }) => inletTemperature, formula: 'T_b = T_in', source: 'outlet temperature not known: the inlet is taken' }),
    way({ needs: ['farTemperature'], when: { flowClass: ['body', 'jet', 'solid'] }, value: ({ farTemperature }) => farTemperature, formula: 'T_b = T_far', source: 'convention: no bulk in an open flow; heat passes between wall and far fluid' }),
    way({ needs: ['referenceTemperature'], when: { flowClass: 'enclosure' }, value: ({ referenceTemperature }) => referenceTemperature, formula: 'T_b = T_ref', source: 'convention: a closed box at the mean of its walls' }),
  ]),
  quantity('bulkTemperatureNext', { symbol: 'T_b', name: 'mean bulk temperature that the heat balance gives', ...kelvin }, [
    way({ needs: ['inletTemperature', 'outletTemperature'], value: ({ inletTemperature, outletTemperature }) => (inletTemperature + outletTemperature) / 2, formula: '(T_in + T_out)/2', source: 'definition' }),
  ]),
  quantity('streamTemperatureMax', { symbol: 'T_s,max', name: 'warmest of the arriving fluid and the bulk', ...kelvin }, [
    way({ needs: ['farTemperature', 'bulkTemperature'], value: ({ farTemperature, bulkTemperature }) => Math.max(farTemperature, bulkTemperature), formula: 'max(T_far, T_b)', source: 'definition; what boils at a wall is judged apart' }),
    way({ needs: ['referenceTemperature'], value: ({ referenceTemperature }) => referenceTemperature, formula: 'T_ref', source: 'no bulk in a closed flow' }),
  ]),
  quantity('outletTemperature', { symbol: 'T_out', name: 'mass-mean outlet temperature', ...kelvin }, [
    way({ needs: ['inletTemperature'], when: { flowClass: through, energySolved: 'no' }, value: ({ inletTemperature }) => inletTemperature, formula: 'T_out = T_in', source: 'one temperature throughout' }),
    way({
      needs: ['inletTemperature', 'wallConductance', 'wallConductanceDrive', 'wallHeatGiven', 'massFlow', 'specificHeatCapacityBulk'],
      when: { flowClass: through },
      value: ({ inletTemperature, wallConductance, wallConductanceDrive, wallHeatGiven, massFlow, specificHeatCapacityBulk }) => {
        const capacity = massFlow * specificHeatCapacityBulk;
        const units = wallConductance / capacity;
        const share = units < 1e-8 ? 1 - units / 2 : -Math.expm1(-units) / units;
        return inletTemperature * Math.exp(-units) + ((wallConductanceDrive + wallHeatGiven) / capacity) * share;
      },
      formula: 'T_out = T_in e^-N + [(sum U A T_d + Q)/(m cp)] (1 - e^-N)/N, N = sum U A/(m cp)',
      source: balance,
    }),
  ]),
  quantity('logMeanTemperatureDifference', { symbol: 'dT_lm', name: 'logarithmic mean temperature difference', ...kelvin }, [
    way({ needs: ['drivingTemperature', 'inletTemperature', 'outletTemperature'], value: ({ drivingTemperature, inletTemperature, outletTemperature }) => {
      const [a, b] = [drivingTemperature - inletTemperature, drivingTemperature - outletTemperature];
      return Math.abs(a - b) < 1e-9 * Math.abs(a) || a === 0 ? a : (a - b) / Math.log(a / b);
    }, formula: 'dT_lm = (dT_in - dT_out)/ln(dT_in/dT_out)', source: 'definition' }),
  ]),
  quantity('temperatureDifference', { symbol: 'dT', name: 'temperature difference of the problem', unit: 'K' }, [
    way({ needs: ['hotTemperature', 'coldTemperature'], when: { flowClass: 'enclosure' }, value: ({ hotTemperature, coldTemperature }) => hotTemperature - coldTemperature, formula: 'dT = T_h - T_c', source: 'definition' }),
    way({ needs: [], when: { energySolved: 'no' }, value: () => 0, formula: 'dT = 0', source: 'one temperature throughout' }),
    way({ needs: ['wallHeatFlux', 'heatTransferCoefficient'], when: { wallKind: 'flux' }, value: ({ wallHeatFlux, heatTransferCoefficient }) => Math.abs(wallHeatFlux) / heatTransferCoefficient, formula: 'dT = |q|/h', source: 'definition' }),
    way({ needs: ['wallTemperature', 'farTemperature'], value: ({ wallTemperature, farTemperature }) => Math.abs(wallTemperature - farTemperature), formula: 'dT = |T_w - T_far|', source: 'definition' }),
  ]),
  quantity('wallTemperatureMax', { symbol: 'T_w,max', name: 'hottest wall', ...kelvin, per: ['wall'], plain: 'largest' }, [
    way({ needs: ['wallTemperaturePeak'], value: ({ wallTemperaturePeak }) => wallTemperaturePeak, formula: 'T_w at its hottest place', source: 'definition' }),
    way({ needs: ['wallTemperature'], value: ({ wallTemperature }) => wallTemperature, formula: 'T_w', source: 'its mean: how it runs along the wall is not known' }),
  ]),
  quantity('wallTemperatureMin', { symbol: 'T_w,min', name: 'coldest wall', ...kelvin, per: ['wall'], plain: 'smallest' }, [
    way({ needs: ['wallTemperatureLeast'], value: ({ wallTemperatureLeast }) => wallTemperatureLeast, formula: 'T_w at its coldest place', source: 'definition' }),
    way({ needs: ['wallTemperature'], value: ({ wallTemperature }) => wallTemperature, formula: 'T_w', source: 'its mean: how it runs along the wall is not known' }),
  ]),
  ...(['highest', 'lowest'] as const).map((which) => {
    const [wall, enclosed, join] = which === 'highest' ? (['wallTemperatureMax', 'hotTemperature', Math.max] as const) : (['wallTemperatureMin', 'coldTemperature', Math.min] as const);
    return quantity(`${which}Temperature`, { symbol: which === 'highest' ? 'T_max' : 'T_min', name: `${which} temperature of the case`, ...kelvin }, [
      way({ needs: [enclosed], when: { flowClass: 'enclosure' }, value: (of) => of[enclosed], formula: `T of the ${which === 'highest' ? 'hot' : 'cold'} wall`, source: 'definition' }),
      way({ needs: [wall, 'farTemperature'], value: (of) => join(of[wall], of.farTemperature), formula: `${which} of walls and arriving fluid`, source: 'definition' }),
      way({ needs: ['farTemperature'], value: ({ farTemperature }) => farTemperature, formula: 'T_far', source: 'no wall temperature known' }),
    ]);
  }),
];
