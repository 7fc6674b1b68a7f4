import { quantity, way, type Definition, type Way } from '../workings/index.ts';
import { layerCaps } from './layer-caps.ts';
import { layersBelow, layersToMatch, stackHeight } from './layer-stack.ts';

const practice = 'common practice';
const definition = 'definition';
const treatment = 'choice.turbulence-treatment';
const wallWord = 'choice.near-wall-treatment';
const places = { per: ['wall', 'station'] as const, plain: 'smallest' as const };
const laws = ['law-of-the-wall', 'rough-law'];
const noTaller = `${practice}: no cell at a wall is taller than those of the core`;
const modelled = { [wallWord]: ['resolved', 'blended'] };

const aim = (more: Omit<Way, 'needs' | 'as'> & { readonly needs?: readonly string[] }): Way => ({ needs: [], as: 'decided', ...more });
const least = (...ids: string[]) => (of: Readonly<Record<string, number>>): number => Math.min(1, ...ids.map((id) => (of[id] as number) ** (-1 / 3)));
const sublayers = 'Kader, Int. J. Heat Mass Transfer 24 (1981) 1541: the profile at the wall is straight to 3 Pr^(-1/3)';

/** The first node: how far from the wall in viscous lengths, by what the model does there. */
const target: Definition = quantity('yPlusTarget', { symbol: 'y+', name: 'wall distance of the first node aimed at, in viscous lengths', unit: '1' }, [
  aim({ needs: ['frictionReynolds'], when: { [treatment]: 'wall-modelled-les' }, value: ({ frictionReynolds }) => (frictionReynolds as number) / 50, formula: 'y+ = delta+/50: the exchange height delta/10 in the third cell', source: 'Choi and Moin, Phys. Fluids 24 (2012) 011702; Kawai and Larsson, Phys. Fluids 24 (2012) 015105' }),
  aim({ when: { [treatment]: 'dns' }, value: () => 0.2, formula: 'y+ = 0.2', source: 'Moser, Kim and Mansour, Phys. Fluids 11 (1999) 943: 0.1 to 0.5' }),
  aim({ needs: ['roughnessReynolds'], when: { [wallWord]: 'rough-law' }, value: ({ roughnessReynolds }) => Math.max(50, 1.2 * (roughnessReynolds as number)), formula: 'y+ = max(50, 1.2 k_s+)', source: `${practice}: the first node above the grains and in the logarithmic layer` }),
  aim({ needs: ['frictionReynolds'], when: { [wallWord]: 'law-of-the-wall' }, value: ({ frictionReynolds }) => Math.min(50, 0.2 * (frictionReynolds as number)), formula: 'y+ = min(50, 0.2 delta+)', source: `${practice}: 50 at the highest shear leaves 30 where the shear is 0.36 of it` }),
  aim({ when: { [wallWord]: 'law-of-the-wall' }, value: () => 50, formula: 'y+ = 50', source: `${practice}: 50 at the highest shear leaves 30 where the shear is 0.36 of it` }),
  aim({ needs: ['prandtlWall', 'schmidt'], when: { ...modelled, targetHeat: 'yes', 'has.speciesWall': 'yes' }, value: least('prandtlWall', 'schmidt'), formula: 'y+ = min(1, Pr^(-1/3), Sc^(-1/3))', source: sublayers }),
  aim({ needs: ['schmidt'], when: { ...modelled, targetHeat: 'yes', 'has.speciesWall': 'yes' }, value: least('schmidt'), formula: 'y+ = min(1, Sc^(-1/3))', source: sublayers }),
  aim({ needs: ['prandtlWall'], when: { ...modelled, targetHeat: 'yes' }, value: least('prandtlWall'), formula: 'y+ = min(1, Pr^(-1/3))', source: sublayers }),
  aim({ needs: ['prandtl'], when: { ...modelled, targetHeat: 'yes' }, value: least('prandtl'), formula: 'y+ = min(1, Pr^(-1/3))', source: sublayers }),
  aim({ when: modelled, value: () => 1, formula: 'y+ = 1', source: `${practice}: u+ = y+ within 0.5 % to y+ = 3` }),
]);

const first: Definition[] = [
  quantity('viscousLength', { symbol: 'nu/u_tau', name: 'viscous length at the wall', unit: 'm', ...places }, [
    way({ needs: ['kinematicViscosityWall', 'frictionVelocity'], value: ({ kinematicViscosityWall, frictionVelocity }) => kinematicViscosityWall / frictionVelocity, formula: 'nu_w/u_tau', source: definition }),
    way({ needs: ['kinematicViscosity', 'frictionVelocity'], value: ({ kinematicViscosity, frictionVelocity }) => kinematicViscosity / frictionVelocity, formula: 'nu/u_tau', source: definition }),
    way({ needs: ['kinematicViscosity', 'speed'], when: { regime: ['transitional', 'turbulent'], imposedFlow: 'yes', wallBounded: 'yes', flowClass: ['internal', 'body', 'enclosure', 'jet'] }, as: 'assumed', scatter: 1, value: ({ kinematicViscosity, speed }) => kinematicViscosity / (speed * Math.sqrt(0.0025)), formula: 'nu/(U sqrt(c_f/2)), c_f = 0.005', source: `${practice}; no friction law of this flow is known` }),
  ]),
  quantity('coreNodeDistance', { symbol: 'y_c', name: 'distance of the node of a core cell that stands on the wall', unit: 'm' }, [
    way({ needs: ['coreCellSize'], when: { storage: 'cell-centred' }, value: ({ coreCellSize }) => coreCellSize / 2, formula: 'y_c = h_c/2', source: 'cell-centred storage' }),
    way({ needs: ['coreCellSize'], when: { storage: 'node-centred' }, value: ({ coreCellSize }) => coreCellSize, formula: 'y_c = h_c', source: 'unknowns in the nodes' }),
  ]),
  quantity('firstNodeDistance', { symbol: 'y_P', name: 'distance of the first node from the wall', unit: 'm', ...places }, [
    way({ needs: ['choices.firstCell'], when: { storage: 'cell-centred' }, value: (of) => of['choices.firstCell'] / 2, formula: 'y_P = h_1/2, first cell as given', source: 'cell-centred storage' }),
    way({ needs: ['choices.firstCell'], when: { storage: 'node-centred' }, value: (of) => of['choices.firstCell'], formula: 'y_P = h_1, first cell as given', source: 'unknowns in the nodes' }),
    way({ needs: ['yPlusTarget', 'viscousLength', 'sandGrain'], when: { [wallWord]: 'rough-law' }, value: ({ yPlusTarget, viscousLength, sandGrain }) => Math.max(yPlusTarget * viscousLength, 1.2 * sandGrain), formula: 'y_P = max(y+ nu_w/u_tau, 1.2 k_s)', source: `${practice}: the first node above the grains` }),
    way({ needs: ['yPlusTarget', 'viscousLength'], when: { [wallWord]: laws }, value: ({ yPlusTarget, viscousLength }) => yPlusTarget * viscousLength, formula: 'y_P = y+ nu_w/u_tau', source: `${definition}; the law of the wall, not the core, says where its node stands` }),
    way({ needs: ['yPlusTarget', 'viscousLength', 'imposedLayerCap', 'coreNodeDistance'], when: { 'has.period': 'yes' }, value: (of) => Math.min(of.yPlusTarget * of.viscousLength, of.imposedLayerCap / 2, of.coreNodeDistance), formula: 'y_P = min(y+ nu_w/u_tau, h_s/2, y_c)', source: noTaller }),
    way({ needs: ['yPlusTarget', 'viscousLength', 'coreNodeDistance'], value: (of) => Math.min(of.yPlusTarget * of.viscousLength, of.coreNodeDistance), formula: 'y_P = min(y+ nu_w/u_tau, y_c)', source: noTaller }),
    way({ needs: ['yPlusTarget', 'viscousLength'], value: ({ yPlusTarget, viscousLength }) => yPlusTarget * viscousLength, formula: 'y_P = y+ nu_w/u_tau', source: definition }),
    way({ needs: ['laminarCellCap', 'coreNodeDistance'], when: { storage: 'cell-centred' }, as: 'decided', value: ({ laminarCellCap, coreNodeDistance }) => Math.min(laminarCellCap / 2, coreNodeDistance), formula: 'y_P = min(h_cap/2, y_c), no y+ in laminar flow', source: noTaller }),
    way({ needs: ['laminarCellCap', 'coreNodeDistance'], when: { storage: 'node-centred' }, as: 'decided', value: ({ laminarCellCap, coreNodeDistance }) => Math.min(laminarCellCap, coreNodeDistance), formula: 'y_P = min(h_cap, y_c), no y+ in laminar flow', source: noTaller }),
    way({ needs: ['laminarCellCap'], when: { storage: 'cell-centred' }, as: 'decided', value: ({ laminarCellCap }) => laminarCellCap / 2, formula: 'y_P = h_cap/2, no y+ in laminar flow', source: 'cell-centred storage' }),
    way({ needs: ['laminarCellCap'], when: { storage: 'node-centred' }, as: 'decided', value: ({ laminarCellCap }) => laminarCellCap, formula: 'y_P = h_cap, no y+ in laminar flow', source: 'unknowns in the nodes' }),
  ]),
  quantity('firstCellHeight', { symbol: 'h_1', name: 'full height of the cell at the wall', unit: 'm', ...places }, [
    way({ needs: ['firstNodeDistance'], when: { storage: 'cell-centred' }, value: ({ firstNodeDistance }) => 2 * firstNodeDistance, formula: 'h_1 = 2 y_P', source: 'cell-centred storage: the node lies in the middle of the cell' }),
    way({ needs: ['firstNodeDistance'], when: { storage: 'node-centred' }, value: ({ firstNodeDistance }) => firstNodeDistance, formula: 'h_1 = y_P', source: 'unknowns in the nodes' }),
  ]),
  quantity('firstNodeYPlus', { symbol: 'y_P+', name: 'first node in viscous lengths', unit: '1', per: ['wall', 'station'], plain: 'largest' }, [
    way({ needs: ['firstNodeDistance', 'viscousLength'], value: ({ firstNodeDistance, viscousLength }) => firstNodeDistance / viscousLength, formula: 'y_P+ = y_P u_tau/nu_w', source: definition }),
  ]),
];

const growths: readonly (readonly [string | readonly string[], number, string])[] = [
  ['dns', 1.03, 'Moser, Kim and Mansour, Phys. Fluids 11 (1999) 943; 1.03 to 1.05'],
  ['wall-modelled-les', 1.05, 'common practice: 1 to 1.05'],
  ['les', 1.08, 'Piomelli and Balaras, Annu. Rev. Fluid Mech. 34 (2002) 349; 1.05 to 1.1'],
  [['rans', 'hybrid'], 1.2, 'common practice: 1.1 to 1.2, at most 1.3'],
];

const grown = `${practice}: growth stops at the core size, core cells cover what is left of the layer; the stacks of two walls meet in the middle at most`;
const stack: Definition[] = [
  quantity('growthRatio', { symbol: 'g', name: 'height of a layer over that of the one below', unit: '1' }, [
    ...growths.map(([word, g, source]) => aim({ when: { [treatment]: word }, value: () => g, formula: `g = ${g}`, source })),
    way({ needs: [], as: 'assumed', value: () => 1.1, formula: 'g = 1.1', source: `${practice}, laminar layers` }),
  ]),
  quantity('stackCover', { symbol: 'delta_c', name: 'height that the layers at the wall must cover', unit: 'm' }, [
    way({ needs: ['boundaryLayerThickness', 'thermalLayerThickness'], when: { energySolved: 'yes', flowClass: ['body', 'enclosure', 'jet', 'solid'] }, value: ({ boundaryLayerThickness, thermalLayerThickness }) => Math.max(boundaryLayerThickness, thermalLayerThickness), formula: 'delta_c = max(delta, delta_T)', source: practice }),
    way({ needs: ['boundaryLayerThickness'], when: { flowClass: ['body', 'enclosure', 'jet', 'solid'] }, value: ({ boundaryLayerThickness }) => boundaryLayerThickness, formula: 'delta_c = delta', source: practice }),
    way({ needs: ['thermalLayerThickness'], when: { flowClass: ['body', 'enclosure', 'jet', 'solid'] }, value: ({ thermalLayerThickness }) => thermalLayerThickness, formula: 'delta_c = delta_T', source: practice }),
    way({ needs: ['gap'], when: { flowClass: 'internal' }, value: ({ gap }) => 0.1 * gap, formula: 'delta_c = 0.2 (gap/2)', source: `${practice}: the layers meet in the middle, the steep part is their inner fifth` }),
  ]),
  quantity('layersForMatch', { symbol: 'N_m', name: 'layers that grow to the core size', unit: '1' }, [
    way({ needs: ['firstCellHeight', 'growthRatio', 'coreCellSize'], value: ({ firstCellHeight, growthRatio, coreCellSize }) => layersToMatch(firstCellHeight, growthRatio, coreCellSize), formula: 'N_m = 1 + ln(h_c/h_1)/ln g, rounded up', source: 'geometric series' }),
  ]),
  quantity('layersForGap', { symbol: 'N_g', name: 'layers that fit to the middle of the gap', unit: '1' }, [
    way({ needs: ['firstCellHeight', 'growthRatio', 'gap'], when: { flowClass: ['internal', 'enclosure'] }, value: ({ firstCellHeight, growthRatio, gap }) => Math.max(1, layersBelow(firstCellHeight, growthRatio, gap / 2)), formula: 'N_g = ln(1 + gap (g - 1)/(2 h_1))/ln g, rounded down', source: 'geometric series' }),
  ]),
  quantity('layerCount', { symbol: 'N_l', name: 'layers of cells at the wall', unit: '1' }, [
    way({ as: 'decided', needs: ['layersForMatch', 'layersForGap'], value: ({ layersForMatch, layersForGap }) => Math.min(layersForMatch, layersForGap), formula: 'N_l = min(N_m, N_g)', source: grown }),
    way({ as: 'decided', needs: ['layersForMatch'], value: ({ layersForMatch }) => layersForMatch, formula: 'N_l = N_m', source: grown }),
  ]),
  quantity('layerStackHeight', { symbol: 'S', name: 'height of the layers at the wall together', unit: 'm' }, [
    way({ needs: ['firstCellHeight', 'growthRatio', 'layerCount'], value: ({ firstCellHeight, growthRatio, layerCount }) => stackHeight(firstCellHeight, growthRatio, layerCount), formula: 'S = h_1 (g^N - 1)/(g - 1)', source: 'geometric series' }),
  ]),
  quantity('lastLayerHeight', { symbol: 'h_N', name: 'height of the last layer', unit: 'm' }, [
    way({ needs: ['firstCellHeight', 'growthRatio', 'layerCount'], value: ({ firstCellHeight, growthRatio, layerCount }) => firstCellHeight * growthRatio ** (layerCount - 1), formula: 'h_N = h_1 g^(N - 1)', source: 'geometric series' }),
  ]),
  quantity('handOver', { symbol: 'h_c/h_N', name: 'core cell over the last layer', unit: '1' }, [
    way({ needs: ['coreCellSize', 'lastLayerHeight'], value: ({ coreCellSize, lastLayerHeight }) => coreCellSize / lastLayerHeight, formula: 'h_c/h_N', source: definition }),
  ]),
  quantity('cellsInLayer', { symbol: 'n_l', name: 'whole cells within the layer at the wall', unit: '1' }, [
    way({ needs: ['firstCellHeight', 'growthRatio', 'stackCover', 'layerStackHeight', 'layerCount', 'coreCellSize'], value: (of) => (of.stackCover <= of.layerStackHeight ? layersBelow(of.firstCellHeight, of.growthRatio, of.stackCover) : of.layerCount + Math.floor((of.stackCover - of.layerStackHeight) / of.coreCellSize + 1e-9)), formula: 'n_l = ln(1 + delta_c (g - 1)/h_1)/ln g, at most N_l, and (delta_c - S)/h_c above the stack, rounded down', source: 'geometric series, core cells above it' }),
  ]),
  ...[5, 30].map((top) => quantity(`cellsBelow${top}`, { symbol: `n_${top}`, name: `whole cells below y+ = ${top}`, unit: '1' }, [
    way({ needs: ['firstCellHeight', 'growthRatio', 'viscousLength'], when: { regime: ['transitional', 'turbulent'] }, value: ({ firstCellHeight, growthRatio, viscousLength }) => layersBelow(firstCellHeight / viscousLength, growthRatio, top), formula: `n = ln(1 + ${top} (g - 1) nu/(u_tau h_1))/ln g, rounded down`, source: 'geometric series' }),
  ])),
];

/** The mesh at the wall: first node, growth, number and height of layers. */
export const nearWall: Definition[] = [target, ...first, ...layerCaps, ...stack];
