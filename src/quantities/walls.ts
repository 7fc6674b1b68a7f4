import { loop, quantity, way, type Definition } from '../workings/index.ts';

const kelvin = { unit: 'K', signed: true };

/** What the walls do: their temperature at the wetted face, what drives them, their conductance to the fluid. */
export const wallTemperatures: Definition[] = [
  quantity('outerTemperature', { symbol: 'T_o', name: 'temperature of the outer face', ...kelvin, per: ['wall'], plain: 'target' }),
  quantity('drivingTemperature', { symbol: 'T_d', name: 'temperature that drives the wall', ...kelvin, per: ['wall'], plain: 'target' }, [
    way({ needs: ['outerTemperature'], when: { wallKind: 'temperature' }, value: ({ outerTemperature }) => outerTemperature, formula: 'T_d = T_o', source: 'temperature given at the outer face' }),
    way({ needs: ['wettedTemperature'], when: { wallKind: 'temperature' }, value: ({ wettedTemperature }) => wettedTemperature, formula: 'T_d = T_w', source: 'temperature given at the wetted face' }),
    way({ needs: ['surroundingsTemperature'], when: { wallKind: 'coefficient' }, value: ({ surroundingsTemperature }) => surroundingsTemperature, formula: 'T_d = T_sur', source: 'exchange with the surroundings' }),
  ]),
  quantity('wettedTemperature', { symbol: 'T_w', name: 'temperature given at the wetted face', ...kelvin, per: ['wall'], plain: 'target' }),
  quantity('wallTemperature', { symbol: 'T_w', name: 'temperature of the wetted face', ...kelvin, per: ['wall'], plain: 'target' }, [
    way({ needs: ['wettedTemperature'], value: ({ wettedTemperature }) => wettedTemperature, formula: 'T_w as given', source: 'the case' }),
    way({ needs: ['farTemperature'], when: { energySolved: 'no' }, value: ({ farTemperature }) => farTemperature, formula: 'T_w = T_far', source: 'one temperature throughout' }),
    way({ needs: ['bulkTemperature'], when: { wallKind: 'adiabatic' }, value: ({ bulkTemperature }) => bulkTemperature, formula: 'T_w = T_b', source: 'no heat through an adiabatic wall' }),
    loop({ needs: ['farTemperature', 'drivingTemperature'], when: { wallKind: ['temperature', 'coefficient'] }, start: ({ farTemperature, drivingTemperature }) => (farTemperature + drivingTemperature) / 2, closes: 'wallTemperatureNext', formula: 'T_w = T_b + q/h', source: 'resistances in series' }),
    loop({ needs: ['farTemperature'], when: { wallKind: 'flux' }, start: ({ farTemperature }) => farTemperature, closes: 'wallTemperatureNext', formula: 'T_w = T_b + q/h', source: 'definition of the heat-transfer coefficient' }),
  ]),
  quantity('wallTemperatureNext', { symbol: 'T_w', name: 'wetted face that the wall fluxes give', ...kelvin, per: ['wall'], plain: 'target' }, [
    way({ needs: ['bulkTemperature', 'wallHeatFlux', 'innerResistance'], value: ({ bulkTemperature, wallHeatFlux, innerResistance }) => bulkTemperature + wallHeatFlux * innerResistance, formula: 'T_b + q/h', source: 'definition of the heat-transfer coefficient' }),
  ]),
  quantity('wallTemperaturePeak', { symbol: 'T_w,p', name: 'hottest place of the wetted face of a wall', ...kelvin, per: ['wall'], plain: 'target' }, [
    way({ needs: ['outletTemperature', 'wallHeatFlux', 'nusseltOutlet', 'thermalConductivityBulk', 'length'], when: { wallKind: 'flux', flowClass: 'internal' }, value: ({ outletTemperature, wallHeatFlux, nusseltOutlet, thermalConductivityBulk, length }) => outletTemperature + (wallHeatFlux * length) / (nusseltOutlet * thermalConductivityBulk), formula: 'T_w,p = T_out + q L/(Nu_out k_b), at the outlet', source: 'definition of the heat-transfer coefficient' }),
    way({ needs: ['wallTemperature'], when: { wallKind: ['temperature', 'coefficient', 'adiabatic'] }, value: ({ wallTemperature }) => wallTemperature, formula: 'T_w,p = T_w', source: 'a wall of one temperature' }),
  ]),
  quantity('wallHeat', { symbol: 'Q_w', name: 'heat given at a wall', unit: 'W', signed: true, per: ['wall'], plain: 'target' }),
  quantity('wallArea', { symbol: 'A_w', name: 'wetted area of a wall, one passage', unit: 'm^2', per: ['wall'], plain: 'target' }),
  quantity('wallHeatFlux', { symbol: 'q', name: 'heat flux from the wall into the fluid', unit: 'W/m^2', signed: true, per: ['wall'], plain: 'target' }, [
    way({ needs: [], when: { wallKind: 'adiabatic' }, value: () => 0, formula: 'q = 0', source: 'adiabatic wall' }),
    way({ needs: ['wallHeat', 'wallArea', 'parallelPassages'], when: { wallKind: 'flux' }, value: ({ wallHeat, wallArea, parallelPassages }) => wallHeat / (wallArea * parallelPassages), formula: 'q = Q_w/(n A_w)', source: 'definition' }),
    way({ needs: ['overallCoefficient', 'drivingTemperature', 'bulkTemperature'], when: { wallKind: ['temperature', 'coefficient'] }, value: ({ overallCoefficient, drivingTemperature, bulkTemperature }) => overallCoefficient * (drivingTemperature - bulkTemperature), formula: 'q = U (T_d - T_b)', source: 'resistances in series' }),
  ]),
  quantity('innerResistance', { symbol: 'R_i', name: 'resistance of the fluid at the wall', unit: 'm^2 K/W', per: ['wall'], plain: 'target' }, [
    way({ needs: ['heatTransferCoefficient'], value: ({ heatTransferCoefficient }) => 1 / heatTransferCoefficient, formula: 'R_i = 1/h', source: 'definition' }),
  ]),
  quantity('outerCoefficient', { symbol: 'h_o', name: 'heat-transfer coefficient outside', unit: 'W/(m^2 K)', per: ['wall'], plain: 'target' }),
  quantity('outerRadiationCoefficient', { symbol: 'h_r', name: 'radiation outside as a coefficient', unit: 'W/(m^2 K)', per: ['wall'], plain: 'target' }, [
    way({ needs: [], value: () => 0, formula: 'h_r = 0', source: 'no emissivity of the outer face given', note: 'radiation of the outer face not counted' }),
  ]),
  quantity('outerAreaRatio', { symbol: 'A_o/A_i', name: 'outer over wetted area', unit: '1', per: ['wall'], plain: 'target' }, [
    way({ needs: ['layersThickness', 'hydraulicDiameter'], when: { ductSection: 'round' }, value: ({ layersThickness, hydraulicDiameter }) => 1 + (2 * layersThickness) / hydraulicDiameter, formula: 'A_o/A_i = (D + 2 delta)/D', source: 'geometry' }),
    way({ needs: [], value: () => 1, formula: 'A_o/A_i = 1', source: 'plane wall' }),
  ]),
  quantity('layersThickness', { symbol: 'delta_s', name: 'thickness of the wall', unit: 'm', per: ['wall'], plain: 'target' }, [
    way({ needs: [], when: { 'has.layers': 'no' }, value: () => 0, formula: 'delta_s = 0', source: 'no layers given' }),
  ]),
  quantity('wallResistance', { symbol: 'R_w', name: 'resistance of the wall on its wetted area', unit: 'm^2 K/W', per: ['wall'], plain: 'target' }, [
    way({ needs: [], value: () => 0, formula: 'R_w = 0', source: 'no layers given' }),
  ]),
  quantity('outerResistance', { symbol: 'R_o', name: 'resistance outside on the wetted area', unit: 'm^2 K/W', per: ['wall'], plain: 'target' }, [
    way({ needs: [], when: { wallKind: 'temperature' }, value: () => 0, formula: 'R_o = 0', source: 'temperature of the outer face given' }),
    way({ needs: ['outerCoefficient', 'outerRadiationCoefficient', 'outerAreaRatio'], when: { wallKind: 'coefficient' }, value: ({ outerCoefficient, outerRadiationCoefficient, outerAreaRatio }) => 1 / ((outerCoefficient + outerRadiationCoefficient) * outerAreaRatio), formula: 'R_o = 1/((h_o + h_r) A_o/A_i)', source: 'resistances in series' }),
  ]),
  quantity('overallCoefficient', { symbol: 'U_w', name: 'overall coefficient on the wetted area', unit: 'W/(m^2 K)', per: ['wall'], plain: 'target' }, [
    way({ needs: ['innerResistance', 'outerResistance', 'conjugateFactorHeat'], when: { wallKind: ['temperature', 'coefficient'] }, value: ({ innerResistance, outerResistance, conjugateFactorHeat }) => conjugateFactorHeat / (innerResistance + outerResistance), formula: 'U_w = F/(R_i + R_o), F = 1/(1 + Bi_w)', source: 'resistances in series' }),
  ]),
  quantity('wallConductance', { symbol: 'U A', name: 'conductance of the walls, all passages', unit: 'W/K', per: ['wall'], plain: 'sum' }, [
    way({ needs: [], when: { wallKind: ['adiabatic', 'flux'] }, value: () => 0, formula: 'U A = 0', source: 'adiabatic or flux given' }),
    way({ needs: ['overallCoefficient', 'wallArea', 'parallelPassages'], value: ({ overallCoefficient, wallArea, parallelPassages }) => overallCoefficient * wallArea * parallelPassages, formula: 'n U_w A_w', source: 'definition' }),
  ]),
  quantity('wallConductanceDrive', { symbol: 'U A T_d', name: 'conductance times driving temperature', unit: 'W', per: ['wall'], plain: 'sum' }, [
    way({ needs: [], when: { wallKind: ['adiabatic', 'flux'] }, value: () => 0, formula: 'U A T_d = 0', source: 'adiabatic or flux given' }),
    way({ needs: ['wallConductance', 'drivingTemperature'], value: ({ wallConductance, drivingTemperature }) => wallConductance * drivingTemperature, formula: 'U A T_d', source: 'definition' }),
  ]),
  quantity('wallHeatGiven', { symbol: 'Q', name: 'heat of the walls with a given flux, all passages', unit: 'W', signed: true, per: ['wall'], plain: 'sum' }, [
    way({ needs: [], when: { wallKind: ['adiabatic', 'temperature', 'coefficient'] }, value: () => 0, formula: 'Q = 0', source: 'no flux given' }),
    way({ needs: ['wallHeatFlux', 'wallArea', 'parallelPassages'], when: { wallKind: 'flux' }, value: ({ wallHeatFlux, wallArea, parallelPassages }) => wallHeatFlux * wallArea * parallelPassages, formula: 'Q = n q A_w', source: 'definition' }),
  ]),
];
