import { quantity, way, type Definition } from '../workings/index.ts';
import { between, type Table } from './correlations/index.ts';

const practice = 'common practice';
const definition = 'definition';
const smooth = { regime: ['laminar', 'transitional'] };

/** First-point distance x (4/Gr)^(1/4) d for 2 % in the wall shear of an upright layer in still fluid, over log10 Pr. */
const shearDistance: Table = [
  [Math.log10(0.72), 0.027],
  [Math.log10(7), 0.018],
  [2, 0.01],
  [3, 0.006],
];

/** What the layers of laminar flow, of heat, of species and of imposed oscillation allow the cell at the wall. */
export const layerCaps: Definition[] = [
  quantity('thinnestLayer', { symbol: 'delta_min', name: 'thinnest layer at the wall', unit: 'm' }, [
    way({ needs: ['boundaryLayerThickness', 'thermalLayerThickness', 'concentrationLayerThickness'], when: { 'has.speciesWall': 'yes', energySolved: 'yes' }, value: ({ boundaryLayerThickness, thermalLayerThickness, concentrationLayerThickness }) => Math.min(boundaryLayerThickness, thermalLayerThickness, concentrationLayerThickness), formula: 'delta_min = min(delta, delta_T, delta_c)', source: definition }),
    way({ needs: ['boundaryLayerThickness', 'concentrationLayerThickness'], when: { 'has.speciesWall': 'yes' }, value: ({ boundaryLayerThickness, concentrationLayerThickness }) => Math.min(boundaryLayerThickness, concentrationLayerThickness), formula: 'delta_min = min(delta, delta_c)', source: definition }),
    way({ needs: ['boundaryLayerThickness', 'thermalLayerThickness'], when: { energySolved: 'yes' }, value: ({ boundaryLayerThickness, thermalLayerThickness }) => Math.min(boundaryLayerThickness, thermalLayerThickness), formula: 'delta_min = min(delta, delta_T)', source: definition }),
    way({ needs: ['boundaryLayerThickness'], value: ({ boundaryLayerThickness }) => boundaryLayerThickness, formula: 'delta_min = delta', source: definition }),
    way({ needs: ['thermalLayerThickness'], value: ({ thermalLayerThickness }) => thermalLayerThickness, formula: 'delta_min = delta_T', source: definition }),
    way({ needs: ['gap'], when: { flowClass: ['internal', 'enclosure'] }, value: ({ gap }) => gap / 2, formula: 'delta_min = gap/2', source: 'the layers meet in the middle' }),
  ]),
  quantity('cellsAcrossLayer', { symbol: 'n_delta', name: 'cells across the thinnest laminar layer', unit: '1' }, [
    way({ needs: [], when: { targetHeat: 'yes' }, as: 'decided', value: () => 20, formula: 'n = 20, a target at the wall', source: `${practice}: a linear gradient in the first cell errs by 1/(4 n)` }),
    way({ needs: [], when: { targetMomentum: 'yes' }, as: 'decided', value: () => 20, formula: 'n = 20, a target at the wall', source: `${practice}: a linear gradient in the first cell errs by 1/(4 n)` }),
    way({ needs: [], as: 'decided', value: () => 10, formula: 'n = 10', source: practice }),
  ]),
  quantity('buoyantShearCap', { symbol: 'y_nc', name: 'first-point distance that the shear of an upright layer in still fluid allows', unit: 'm' }, [
    way({ needs: ['rayleighHeight', 'prandtl', 'passageHeight'], when: { ...smooth, imposedFlow: 'no', targetMomentum: 'yes' }, range: { prandtl: [0.7, 1000] }, value: ({ rayleighHeight, prandtl, passageHeight }) => between(Math.log10(prandtl), shearDistance) * passageHeight * ((4 * prandtl) / rayleighHeight) ** 0.25, formula: 'y_nc = d(Pr) H (4/Gr_H)^(1/4), d = 0.04 f"(0)', source: 'similarity equations of Ostrach, NACA Report 1111 (1953), f\'\'\'(0) = -1; 2 % in the shear' }),
  ]),
  quantity('imposedLayerCap', { symbol: 'h_s', name: 'cell that the layer of an imposed oscillation allows', unit: 'm' }, [
    way({ needs: ['kinematicViscosity', 'angularFrequency', 'thermalDiffusivity'], when: { energySolved: 'yes' }, value: ({ kinematicViscosity, angularFrequency, thermalDiffusivity }) => Math.sqrt((2 * Math.min(kinematicViscosity, thermalDiffusivity)) / angularFrequency) / 10, formula: 'h_s = sqrt(2 min(nu, alpha)/omega)/10', source: 'Stokes 1851; ten cells' }),
    way({ needs: ['kinematicViscosity', 'angularFrequency'], value: ({ kinematicViscosity, angularFrequency }) => Math.sqrt((2 * kinematicViscosity) / angularFrequency) / 10, formula: 'h_s = sqrt(2 nu/omega)/10', source: 'Stokes 1851; ten cells' }),
  ]),
  quantity('laminarCellCap', { symbol: 'h_cap', name: 'height that the laminar layers allow the cell at the wall', unit: 'm' }, [
    way({ needs: ['thinnestLayer', 'cellsAcrossLayer', 'imposedLayerCap'], when: { ...smooth, 'has.period': 'yes' }, value: ({ thinnestLayer, cellsAcrossLayer, imposedLayerCap }) => Math.min(thinnestLayer / cellsAcrossLayer, imposedLayerCap), formula: 'h_cap = min(delta_min/n, h_s)', source: practice }),
    way({ needs: ['thinnestLayer', 'cellsAcrossLayer', 'buoyantShearCap'], when: smooth, value: ({ thinnestLayer, cellsAcrossLayer, buoyantShearCap }) => Math.min(thinnestLayer / cellsAcrossLayer, 2 * buoyantShearCap), formula: 'h_cap = min(delta_min/n, 2 y_nc)', source: practice }),
    way({ needs: ['thinnestLayer', 'cellsAcrossLayer'], when: smooth, value: ({ thinnestLayer, cellsAcrossLayer }) => thinnestLayer / cellsAcrossLayer, formula: 'h_cap = delta_min/n', source: practice }),
  ]),
  quantity('thermalSublayer', { symbol: 'y_T', name: 'thickness of the thermal sublayer', unit: 'm' }, [
    way({ needs: ['prandtlWall', 'viscousLength'], when: { regime: ['transitional', 'turbulent'], energySolved: 'yes' }, range: { prandtlWall: [0.7, 1000] }, scatter: 0.1, value: ({ prandtlWall, viscousLength }) => 12.8 * prandtlWall ** (-1 / 3) * viscousLength, formula: 'y_T = 12.8 Pr^(-1/3) nu/u_tau', source: 'crossing of the two parts of Kader, Int. J. Heat Mass Transfer 24 (1981) 1541' }),
  ]),
  quantity('speciesSublayer', { symbol: 'y_c', name: 'thickness of the concentration sublayer', unit: 'm' }, [
    way({ needs: ['schmidt', 'viscousLength'], when: { regime: ['transitional', 'turbulent'], 'has.speciesWall': 'yes' }, scatter: 0.1, value: ({ schmidt, viscousLength }) => 12 * schmidt ** (-1 / 3) * viscousLength, formula: 'y_c = 12 Sc^(-1/3) nu/u_tau', source: 'by the same law as for heat, Kader 1981' }),
  ]),
];
