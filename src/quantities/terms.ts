import { quantity, way, type Definition, type Way, type When } from '../workings/index.ts';

const scale = 'scale of the term, formed with the length, the width and the speed of the flow';
const mixed = ['transitional', 'turbulent'];
const none = (formula: string, when: When): Way => way({ needs: [], when, value: () => 0, formula, source: 'definition' });

/** Lengths that the terms of the equations are formed with: along the flow and across it. */
const lengths: Definition[] = [
  quantity('termLength', { symbol: 'L_t', name: 'length over which the flow changes along itself', unit: 'm' }, [
    way({ needs: ['flowLength', 'entranceLength'], value: ({ flowLength, entranceLength }) => Math.min(flowLength, entranceLength), formula: 'L_t = min(L_x, L_e)', source: 'a developed flow changes no more along itself' }),
    way({ needs: ['flowLength'], value: ({ flowLength }) => flowLength, formula: 'L_t = L_x', source: 'definition' }),
    way({ needs: ['length'], value: ({ length }) => length, formula: 'L_t = L', source: 'definition' }),
  ]),
  quantity('termLengthHeat', { symbol: 'L_h', name: 'length over which the temperature changes along the flow', unit: 'm' }, [
    way({ needs: ['flowLength'], value: ({ flowLength }) => flowLength, formula: 'L_h = L_x', source: 'definition' }),
    way({ needs: ['length'], value: ({ length }) => length, formula: 'L_h = L', source: 'definition' }),
  ]),
  quantity('termWidth', { symbol: 'delta_t', name: 'width across the flow that its terms are formed with', unit: 'm' }, [
    way({ needs: ['hydraulicDiameter'], when: { flowClass: 'internal', ductSection: 'round' }, value: ({ hydraulicDiameter }) => hydraulicDiameter / 2, formula: 'delta_t = D_h/2', source: 'definition' }),
    way({ needs: ['gap'], when: { flowClass: ['internal', 'enclosure'] }, value: ({ gap }) => gap / 2, formula: 'delta_t = H/2', source: 'definition' }),
    way({ needs: ['hydraulicDiameter'], when: { flowClass: ['internal', 'continuum'] }, value: ({ hydraulicDiameter }) => hydraulicDiameter / 2, formula: 'delta_t = D_h/2', source: 'definition' }),
    way({ needs: ['boundaryLayerThickness'], when: { flowClass: 'body' }, value: ({ boundaryLayerThickness }) => boundaryLayerThickness, formula: 'delta_t = delta', source: 'definition' }),
    way({ needs: ['length'], value: ({ length }) => length, formula: 'delta_t = L', source: 'no narrower width is known' }),
  ]),
];

/** One term of an equation: id, symbol, name, ways. */
type Term = readonly [id: string, symbol: string, name: string, ways: readonly Way[]];

/** Forces per volume. The pressure gradient takes the size of what it balances, so it is no term of its own. */
const momentum: readonly Term[] = [
  ['termMomentumConvection', 'rho U^2/L', 'convection of momentum', [
    way({ needs: ['density', 'speed', 'termLength'], value: ({ density, speed, termLength }) => (density * speed ** 2) / termLength, formula: 'rho U^2/L_t', source: scale }),
  ]],
  ['termMomentumViscous', 'mu U/delta^2', 'viscous force', [
    way({ needs: ['frictionLaminar', 'densityBulk', 'speedBulk', 'hydraulicDiameter'], when: { flowClass: 'internal', regime: 'laminar' }, value: ({ frictionLaminar, densityBulk, speedBulk, hydraulicDiameter }) => (frictionLaminar * densityBulk * speedBulk ** 2) / (2 * hydraulicDiameter), formula: 'f_lam rho_b U_b^2/(2 D_h)', source: 'momentum balance of a developed passage, exact' }),
    way({ needs: ['pressureDropPlain', 'flowLength'], when: { flowClass: 'continuum' }, value: ({ pressureDropPlain, flowLength }) => pressureDropPlain / flowLength, formula: 'dp_0/L_x, drag of the matrix', source: 'momentum balance of a bed' }),
    way({ needs: ['viscosity', 'speed', 'termWidth'], value: ({ viscosity, speed, termWidth }) => (viscosity * speed) / termWidth ** 2, formula: 'mu U/delta_t^2', source: scale }),
  ]],
  ['termMomentumTurbulent', 'rho u_tau^2/delta', 'turbulent stress', [
    way({ needs: ['density', 'frictionVelocityPlain', 'termWidth'], when: { regime: mixed }, value: ({ density, frictionVelocityPlain, termWidth }) => (density * frictionVelocityPlain ** 2) / termWidth, formula: 'rho u_tau^2/delta_t', source: scale }),
    none('0 in laminar flow', { regime: 'laminar' }),
    none('0: the drag of the matrix holds it', { flowClass: 'continuum' }),
  ]],
  ['termMomentumBuoyancy', 'rho g beta dT', 'buoyancy', [
    none('0: one temperature', { energySolved: 'no' }),
    way({ needs: ['density', 'gravity', 'thermalExpansion', 'temperatureDifference'], value: ({ density, gravity, thermalExpansion, temperatureDifference }) => density * gravity * Math.abs(thermalExpansion) * temperatureDifference, formula: 'rho g |beta| dT', source: scale }),
  ]],
  ['termMomentumUnsteady', 'rho U omega', 'change in time that is imposed', [
    none('0: nothing is imposed in time', { 'has.period': 'no', 'has.ramp': 'no' }),
    way({ needs: ['density', 'speed', 'angularFrequency'], value: ({ density, speed, angularFrequency }) => density * speed * angularFrequency, formula: 'rho U omega, the swing taken as large as the mean', source: scale }),
  ]],
];

const heated = { energySolved: 'yes' };
/** Heat per volume. */
const heat: readonly Term[] = [
  ['termHeatConvection', 'rho cp U dT/L', 'convection of heat', [
    way({ needs: ['density', 'specificHeatCapacity', 'speed', 'temperatureDifference', 'termLengthHeat'], when: heated, value: (of) => (of.density * of.specificHeatCapacity * of.speed * of.temperatureDifference) / of.termLengthHeat, formula: 'rho cp U dT/L_h', source: scale }),
  ]],
  ['termHeatAcross', 'k dT/delta^2', 'conduction across the flow', [
    way({ needs: ['thermalConductivity', 'temperatureDifference', 'termWidth'], when: heated, value: ({ thermalConductivity, temperatureDifference, termWidth }) => (thermalConductivity * temperatureDifference) / termWidth ** 2, formula: 'k dT/delta_t^2', source: scale }),
  ]],
  ['termHeatAlong', 'k dT/L^2', 'conduction along the flow', [
    way({ needs: ['thermalConductivity', 'temperatureDifference', 'termLengthHeat'], when: heated, value: ({ thermalConductivity, temperatureDifference, termLengthHeat }) => (thermalConductivity * temperatureDifference) / termLengthHeat ** 2, formula: 'k dT/L_h^2', source: scale }),
  ]],
  ['termHeatTurbulent', 'h dT/delta', 'turbulent heat flux', [
    way({ needs: ['heatTransferCoefficientPlain', 'temperatureDifference', 'termWidth'], when: { ...heated, regime: mixed }, value: ({ heatTransferCoefficientPlain, temperatureDifference, termWidth }) => (heatTransferCoefficientPlain * temperatureDifference) / termWidth, formula: 'h_0 dT/delta_t', source: scale }),
    none('0 in laminar flow', { ...heated, regime: 'laminar' }),
    none('0: the drag of the matrix holds it', { ...heated, flowClass: 'continuum' }),
  ]],
  ['termHeatDissipation', 'f rho U^3/(2 D_h)', 'heat of friction', [
    way({ needs: ['pressureDropPlain', 'speedBulk', 'flowLength'], when: { ...heated, flowClass: ['internal', 'continuum'] }, value: ({ pressureDropPlain, speedBulk, flowLength }) => (pressureDropPlain * speedBulk) / flowLength, formula: 'U_b dp_0/L_x', source: 'mechanical energy balance of a developed passage, exact' }),
    way({ needs: ['viscosity', 'speed', 'termWidth'], when: heated, value: ({ viscosity, speed, termWidth }) => viscosity * (speed / termWidth) ** 2, formula: 'mu (U/delta_t)^2', source: scale }),
  ]],
  ['termHeatPressureWork', 'beta T U dp/dx', 'pressure work', [
    way({ needs: ['thermalExpansion', 'referenceTemperature', 'speedBulk', 'pressureDropPlain', 'flowLength'], when: { ...heated, flowClass: ['internal', 'continuum'] }, value: (of) => (Math.abs(of.thermalExpansion) * of.referenceTemperature * of.speedBulk * of.pressureDropPlain) / of.flowLength, formula: '|beta| T U_b dp_0/L_x', source: scale }),
    way({ needs: ['thermalExpansion', 'referenceTemperature', 'density', 'speed', 'termLength'], when: heated, value: (of) => (Math.abs(of.thermalExpansion) * of.referenceTemperature * of.density * of.speed ** 3) / of.termLength, formula: '|beta| T rho U^3/L_t', source: scale }),
  ]],
];

/** Terms of one equation, the largest, and each as a share of it. */
function equation(terms: readonly Term[], unit: string, largest: string, name: string): Definition[] {
  const ids = terms.map(([id]) => id);
  return [
    ...terms.map(([id, symbol, term, list]) => quantity(id, { symbol, name: term, unit }, list)),
    quantity(largest, { symbol: 'max', name, unit }, [way({ needs: ids, value: (of: Readonly<Record<string, number>>) => Math.max(...ids.map((id) => of[id] as number)), formula: 'the largest of the terms', source: 'definition' })]),
    ...terms.map(([id, symbol, term]) => quantity(`${id}Share`, { symbol: `${symbol} / max`, name: `${term} over the largest term`, unit: '1' }, [
      way({ needs: [id, largest], value: (of: Readonly<Record<string, number>>) => (of[id] as number) / (of[largest] as number), formula: 'term / largest term', source: 'definition' }),
    ])),
  ];
}

/** Sizes of the terms of each equation before a run: which of them the flow is made of. */
export const terms: Definition[] = [
  ...lengths,
  ...equation(momentum, 'Pa/m', 'termMomentumLargest', 'largest force per volume'),
  ...equation(heat, 'W/m^3', 'termHeatLargest', 'largest term of the heat balance'),
  quantity('termHydrostatic', { symbol: 'rho g', name: 'weight, which the hydrostatic pressure carries', unit: 'Pa/m' }, [
    way({ needs: ['density', 'gravity'], value: ({ density, gravity }) => density * gravity, formula: 'rho g', source: 'definition' }),
  ]),
];

/** Terms by equation, for tables. */
export const termIds: Readonly<Record<'momentum' | 'heat', readonly string[]>> = { momentum: momentum.map(([id]) => id), heat: heat.map(([id]) => id) };
