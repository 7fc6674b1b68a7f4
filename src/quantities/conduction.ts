import { quantity, way, type Definition } from '../workings/index.ts';
import { between } from './correlations/index.ts';

const none = way({ needs: [], value: () => 1, formula: 'F = 1', source: 'the effect does not act here' });

/** Nusselt number of a developed pipe with wall temperature against the Peclet number: ln Pe, Nu/3.6568. */
const axialTable = [0.1, 1, 2, 5, 10, 50, 200].map((pe, i) => [Math.log(pe), (([4.163, 4.027, 3.922, 3.767, 3.695, 3.6586, 3.6569][i] as number) / 3.6568)] as const);

/** Conduction in walls and along the flow. */
export const conduction: Definition[] = [
  quantity('biotWall', { symbol: 'Bi_w', name: 'resistance of the wall over those of the fluids', unit: '1', per: ['wall'], plain: 'target' }, [
    way({ needs: ['wallResistance', 'innerResistance', 'outerResistance'], when: { wallKind: ['temperature', 'coefficient'] }, value: ({ wallResistance, innerResistance, outerResistance }) => wallResistance / (innerResistance + outerResistance), formula: 'Bi_w = R_w/(R_i + R_o)', source: 'resistances in series' }),
    way({ needs: ['wallResistance', 'innerResistance'], when: { wallKind: 'flux' }, value: ({ wallResistance, innerResistance }) => wallResistance / innerResistance, formula: 'Bi_w = R_w/R_i', source: 'resistances in series' }),
    way({ needs: [], when: { wallKind: 'adiabatic' }, value: () => 0, formula: 'Bi_w = 0', source: 'no heat passes an adiabatic wall' }),
  ]),
  quantity('conjugateFactorHeat', { symbol: 'F_w', name: 'heat with the wall over heat without its resistance', unit: '1', per: ['wall'], plain: 'target' }, [
    way({ needs: [], when: { wallKind: ['flux', 'adiabatic'] }, value: () => 1, formula: 'F = 1', source: 'the heat of the wall is given' }),
    way({ needs: [], when: { wallFace: 'wetted' }, value: () => 1, formula: 'F = 1', source: 'the temperature of the wetted face is given' }),
    way({ needs: ['biotWall'], value: ({ biotWall }) => 1 / (1 + biotWall), formula: 'F = 1/(1 + Bi_w)', source: 'resistances in series' }),
    none,
  ]),
  quantity('wallSpreadRatio', { symbol: 'l_f/(P/2)', name: 'how far heat spreads round the passage in the wall over half the wetted perimeter', unit: '1', per: ['wall'], plain: 'largest' }, [
    way({ needs: ['wallAxialConductance', 'heatTransferCoefficientPlain', 'wettedPerimeter'], when: { flowClass: 'internal' }, value: ({ wallAxialConductance, heatTransferCoefficientPlain, wettedPerimeter }) => Math.sqrt(wallAxialConductance / (wettedPerimeter * heatTransferCoefficientPlain)) / (wettedPerimeter / 2), formula: 'l_f/(P/2), l_f = sqrt(k_s delta_s/h)', source: 'length of a fin that the fluid cools on one side' }),
  ]),
  quantity('wallAxialRatio', { symbol: 'M_w', name: 'conduction along the wall over heat carried by the flow', unit: '1', per: ['wall'], plain: 'largest' }, [
    way({ needs: ['wallAxialConductance', 'flowLength', 'massFlow', 'specificHeatCapacityBulk', 'parallelPassages'], when: { flowClass: ['internal', 'continuum'] }, value: ({ wallAxialConductance, flowLength, massFlow, specificHeatCapacityBulk, parallelPassages }) => (wallAxialConductance * parallelPassages) / (flowLength * massFlow * specificHeatCapacityBulk), formula: 'M_w = (k_s A_s/L)/(m cp)', source: 'Maranzana, Perry and Maillet, Int. J. Heat Mass Transfer 47 (2004) 3993' }),
  ]),
  quantity('axialConductionFactorNusselt', { symbol: 'F_Pe', name: 'Nusselt number with conduction along the flow over that without', unit: '1' }, [
    way({ needs: ['peclet'], when: { flowClass: 'internal', regime: 'laminar', wallKind: ['temperature', 'coefficient'], energySolved: 'yes' }, range: { peclet: [0.1, Number.MAX_VALUE] }, value: ({ peclet }) => between(Math.log(peclet), axialTable), formula: 'F = Nu(Pe)/3.6568', source: 'developed pipe with wall temperature and conduction along the axis, eigenvalue solution as Ash and Heinbockel 1970' }),
    none,
  ]),
];
