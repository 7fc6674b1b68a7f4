import { loop, quantity, way, type Definition, type Law, type Way } from '../workings/index.ts';

const definition = 'definition of the heat-transfer coefficient';
const kelvin = { unit: 'K', signed: true };

/** A wall of one temperature, or one that exchanges heat with its surroundings: where the bulk is at an end of the passage. */
const along = (end: 'inletTemperature' | 'outletTemperature', symbol: string, bulk: string): Way =>
  way({ needs: [end, 'drivingTemperature', 'overallCoefficient', 'innerResistance'], when: { wallKind: ['temperature', 'coefficient'], flowClass: 'internal' }, value: (of) => of[end] + of.overallCoefficient * of.innerResistance * (of.drivingTemperature - of[end]), formula: `${symbol} = ${bulk} + U_w R_i (T_d - ${bulk})`, source: 'resistances in series, mean h' });

/** The outermost of mean, inlet and outlet; a wall in an open flow has its mean alone, unless heat is given on it: then its hottest place is not known. */
const ends = (pick: (...of: number[]) => number, word: string): Way[] => [
  way({ needs: ['wallTemperature', 'wallTemperatureInlet', 'wallTemperatureOutlet'], when: { flowClass: 'internal' }, value: (of) => pick(of.wallTemperature, of.wallTemperatureInlet, of.wallTemperatureOutlet), formula: `${word} of T_w, T_w,in and T_w,out`, source: 'definition' }),
  way({ needs: ['wallTemperature'], when: { wallKind: ['temperature', 'coefficient', 'adiabatic'] }, value: ({ wallTemperature }) => wallTemperature, formula: 'T_w', source: 'a wall of one temperature' }),
];

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
    loop({ needs: ['farTemperature'], when: { wallKind: 'flux' }, start: ({ farTemperature }) => farTemperature, closes: 'wallTemperatureNext', formula: 'T_w = T_b + q/h', source: definition }),
  ]),
  quantity('wallTemperatureNext', { symbol: 'T_w', name: 'wetted face that the wall fluxes give', ...kelvin, per: ['wall'], plain: 'target' }, [
    way({ needs: ['bulkTemperature', 'wallHeatFlux', 'innerResistance'], value: ({ bulkTemperature, wallHeatFlux, innerResistance }) => bulkTemperature + wallHeatFlux * innerResistance, formula: 'T_b + q/h', source: definition }),
  ]),
  quantity('outletFilm', { symbol: 'h_out', name: 'heat-transfer coefficient at the outlet', unit: 'W/(m^2 K)' }, [
    way({ needs: ['nusseltOutlet', 'thermalConductivityBulk', 'length', 'bulkTemperature', 'outletTemperature', 'pressure'], laws: ['thermalConductivity', 'viscosity', 'specificHeatCapacity'], when: { regime: 'turbulent' }, value: (of, laws) => {
      const change = (law: Law): number => law(of.outletTemperature, of.pressure) / law(of.bulkTemperature, of.pressure);
      return ((of.nusseltOutlet * of.thermalConductivityBulk) / of.length) * change(laws.thermalConductivity) ** 0.6 * change(laws.specificHeatCapacity) ** 0.4 * change(laws.viscosity) ** -0.4;
    }, formula: 'h_out = (Nu_out k_b/L) (k_out/k_b)^0.6 (cp_out/cp_b)^0.4 (mu_b/mu_out)^0.4', source: 'Nu as Re^0.8 Pr^0.4, properties at the outlet in place of the mean' }),
    way({ needs: ['nusseltOutlet', 'thermalConductivityBulk', 'length'], value: ({ nusseltOutlet, thermalConductivityBulk, length }) => (nusseltOutlet * thermalConductivityBulk) / length, formula: 'h_out = Nu_out k_b/L', source: definition }),
  ]),
  quantity('wallTemperatureOutlet', { symbol: 'T_w,out', name: 'wetted face of a wall at the outlet', ...kelvin, per: ['wall'], plain: 'target' }, [
    way({ needs: ['wallTemperature'], when: { flowClass: 'internal', energySolved: 'no' }, value: ({ wallTemperature }) => wallTemperature, formula: 'T_w,out = T_w', source: 'one temperature throughout' }),
    way({ needs: ['outletTemperature', 'wallHeatFlux', 'outletFilm'], when: { wallKind: 'flux', flowClass: 'internal' }, value: ({ outletTemperature, wallHeatFlux, outletFilm }) => outletTemperature + wallHeatFlux / outletFilm, formula: 'T_w,out = T_out + q/h_out', source: definition }),
    way({ needs: ['outletTemperature'], when: { wallKind: 'adiabatic', flowClass: 'internal' }, value: ({ outletTemperature }) => outletTemperature, formula: 'T_w,out = T_out', source: 'no heat through an adiabatic wall' }),
    along('outletTemperature', 'T_w,out', 'T_out'),
  ]),
  quantity('wallTemperatureInlet', { symbol: 'T_w,in', name: 'wetted face of a wall where the fluid enters', ...kelvin, per: ['wall'], plain: 'target' }, [
    way({ needs: ['inletTemperature'], when: { wallKind: ['flux', 'adiabatic'], flowClass: 'internal' }, value: ({ inletTemperature }) => inletTemperature, formula: 'T_w,in = T_in', source: 'the layer of heat begins without thickness' }),
    along('inletTemperature', 'T_w,in', 'T_in'),
  ]),
  quantity('wallTemperaturePeak', { symbol: 'T_w,p', name: 'hottest place of the wetted face of a wall', ...kelvin, per: ['wall'], plain: 'largest' }, ends(Math.max, 'largest')),
  quantity('wallTemperatureLeast', { symbol: 'T_w,l', name: 'coldest place of the wetted face of a wall', ...kelvin, per: ['wall'], plain: 'smallest' }, ends(Math.min, 'smallest')),
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
