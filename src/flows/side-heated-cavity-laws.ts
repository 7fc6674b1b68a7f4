import { berkovskyPolevikov, eckertJackson, elSherbiny, facingWalls, macgregorEmery, shallowCavity, squareOfAir, uprightSimilar } from '../quantities/index.ts';
import { quantity, way, ways, type Definition } from '../workings/index.ts';

const definition = 'definition';
const practice = 'common practice';
const aspect = 'sideHeatedCavityAspect';
const needs = ['rayleigh', 'prandtl', aspect] as const;
const source = 'Berkovsky and Polevikov 1977, as in Catton, 6th Int. Heat Transfer Conf. (1978)';
const elsherbinySource = 'ElSherbiny, Raithby and Hollands, J. Heat Transfer 104 (1982) 96';
const macgregor = 'MacGregor and Emery, J. Heat Transfer 91 (1969) 391';
const square = [0.9, 1.1] as const;

const cells = 'Korpela, Gozum and Baxi, Int. J. Heat Mass Transfer 16 (1973) 1683';
const batchelor = 'Batchelor, Q. Appl. Math. 12 (1954) 209';
/** Tall slots of a gas or a metal: the height alone says nothing, since the layers of the two walls meet. */
const slotNeeds = ['grashof', 'prandtl', aspect] as const;
const slot: Readonly<Record<string, readonly [number, number]>> = { [aspect]: [12, 1e3], prandtl: [0, 1] };
/** Rayleigh number on the height from which layers stand on the walls, Ra_W = 500 H/W. */
const layersFrom = (of: number): number => 500 * of ** 4;

const regime: Definition[] = [
  ways('regimeGroup', [
    way({ needs: slotNeeds, range: slot, value: ({ grashof }) => grashof, symbol: 'Gr', formula: 'Gr on W, tall slot', source: definition }),
    way({ needs: ['rayleighHeight'], value: ({ rayleighHeight }) => rayleighHeight, symbol: 'Ra', formula: 'Ra on the height', source: definition }),
  ]),
  ways('regimeLow', [
    way({ needs: slotNeeds, range: slot, scatter: 0.2, value: () => 8000, formula: 'Gr_lo = 8000: cells one above another; below it the flow is parallel', source: cells }),
    way({ needs: [aspect], scatter: 0.5, value: (of) => Math.max(1e8, layersFrom(of[aspect])), formula: 'Ra_lo = 1e8, not below 500 (H/W)^4, where conduction rules and no layer stands free', source: `${practice}; ${batchelor}` }),
  ]),
  ways('regimeHigh', [
    way({ needs: slotNeeds, range: slot, scatter: 0.5, value: (of) => Math.max(8000, 1e10 / (of.prandtl * of[aspect] ** 3)), formula: 'Gr_hi = 1e10/(Pr (H/W)^3): after the cells the walls stand as upright plates, Ra 1e10 on the height', source: practice }),
    way({ needs: [aspect], scatter: 0.5, value: (of) => Math.max(1e10, layersFrom(of[aspect])), formula: 'Ra_hi = 1e10, not below 500 (H/W)^4', source: `${practice}; ${batchelor}` }),
  ]),
  ways('unsteadyGroup', [
    way({ needs: ['grashof', aspect], range: { [aspect]: [12, 1e3] }, value: ({ grashof }) => grashof, symbol: 'Gr', formula: 'Gr on W, tall slot', source: definition }),
    way({ needs: ['rayleighHeight', 'prandtl'], range: { prandtl: [1e-4, 0.1] }, value: ({ rayleighHeight, prandtl }) => rayleighHeight / prandtl, symbol: 'Gr', formula: 'Gr on the height, Pr below 0.1', source: definition }),
    way({ needs: ['rayleighHeight'], value: ({ rayleighHeight }) => rayleighHeight, symbol: 'Ra', formula: 'Ra on the height', source: definition }),
  ]),
  ways('unsteadyFrom', [
    way({ needs: [aspect, 'prandtl'], range: { [aspect]: [12, 1e3], prandtl: [0.5, 12.45] }, scatter: 1, value: () => 2e4, formula: 'Gr_on = 2e4, between 1e4 and 4e4: cells one above another come first, from 8000 on, and stand still', source: `${cells}: below Pr 12.45 the first cells are stationary; Lee and Korpela, J. Fluid Mech. 126 (1983) 91, steady cells beyond; Wright et al., Int. J. Heat Mass Transfer 49 (2006) 889, air at H/W 40 irregular from Ra of about 1e4; from memory of these works`, note: 'where the cells of a tall slot begin to move is not settled: a steady run with cells is the first answer, one run in time the test' }),
    way({ needs: [aspect, 'prandtl'], range: { [aspect]: [12, 1e3], prandtl: [12.45, 1e4] }, scatter: 0.5, value: ({ prandtl }) => 7900 / Math.sqrt(prandtl), formula: 'Gr_on = 7900 Pr^(-1/2)', source: `${cells}; stability equations solved anew: above Pr 12.45 the first cells travel`, note: 'parallel flow that conducts; where the core is stratified they come later' }),
    way({ needs: [aspect, 'prandtl'], range: { [aspect]: [12, 1e3], prandtl: [0, 0.5] }, scatter: 0.5, value: () => 8000, formula: 'Gr_on = 8000: cells one above another, which soon move in a liquid metal', source: `${cells}; how soon from memory` }),
    way({ needs: ['prandtl'], range: { prandtl: [1e-4, 0.1] }, scatter: 1, value: () => 3e6, formula: 'Gr_on = 3e6', source: 'Gelfgat, Bar-Yoseph and Yarin, J. Fluid Mech. 388 (1999) 315; from memory of this work' }),
    way({ needs: [], scatter: 0.2, value: () => 1.8e8, formula: 'Ra_on = 1.8e8', source: 'Le Quere and Behnia, J. Fluid Mech. 359 (1998) 81: square of air, plane; lower in three dimensions' }),
  ]),
  quantity('sideHeatedCavityConduction', { symbol: 'Ra/Ra_cond', name: 'Rayleigh number over its conduction limit', unit: '1' }, [way({ needs: ['rayleighHeight', 'conductionRayleigh'], value: ({ rayleighHeight, conductionRayleigh }) => rayleighHeight / conductionRayleigh, formula: 'Ra_H/Ra_cond; below 1 conduction rules, above it layers stand on the walls', source: definition })]),
];

const heat: Definition[] = [
  quantity('sideHeatedCavityCoreExcess', { symbol: 'Nu - 1', name: 'what the core flow of a shallow box adds to conduction', unit: '1' }, [way({ needs: ['rayleighHeight', aspect], value: (of) => shallowCavity({ rayleighHeight: of.rayleighHeight, aspect: of[aspect] }) - 1, formula: '(H/W)^2 Ra_H^2/362880', source: 'Cormack, Leal and Imberger, J. Fluid Mech. 65 (1974) 209' })]),
  ways('nusseltPlain', [
    way({ needs, range: { [aspect]: [0.97, 1.03], prandtl: [0.6, 0.8], rayleigh: [1e3, 1e8] }, scatter: 0.03, value: ({ rayleigh }) => squareOfAir({ rayleigh }), formula: 'Nu by the benchmark: 1.118, 2.243, 4.519, 8.825, 16.52, 30.23 at Ra 1e3 to 1e8, straight in logarithms', source: 'de Vahl Davis, Int. J. Numer. Methods Fluids 3 (1983) 249; Le Quere, Comput. Fluids 20 (1991) 29' }),
    way({ needs, range: { [aspect]: [1, 2], prandtl: [1e-3, 1e5], rayleigh: [1, 1e10] }, scatter: 0.12, value: (of) => berkovskyPolevikov({ rayleigh: of.rayleigh, prandtl: of.prandtl, aspect: Math.min(of[aspect], 1.999) }), formula: 'Nu = 0.18 (Pr Ra/(0.2 + Pr))^0.29, at least 1', source }),
    way({ needs: ['sideHeatedCavityCoreExcess', aspect], range: { [aspect]: [0.001, 1], sideHeatedCavityCoreExcess: [0, 0.5] }, scatter: 0.15, value: ({ sideHeatedCavityCoreExcess }) => 1 + sideHeatedCavityCoreExcess, formula: 'Nu = 1 + (H/W)^2 Ra_H^2/362880, shallow box', source: 'Cormack, Leal and Imberger, J. Fluid Mech. 65 (1974) 209; from memory of this work' }),
    way({ needs, range: { [aspect]: [2, 10], prandtl: [1e-3, 1e5], rayleigh: [1, 1e10] }, scatter: 0.15, value: (of) => berkovskyPolevikov({ rayleigh: of.rayleigh, prandtl: of.prandtl, aspect: Math.max(2, of[aspect]) }), formula: 'Nu = 0.22 (Pr Ra/(0.2 + Pr))^0.28 (H/W)^(-1/4), at least 1', source }),
    way({ needs, range: { [aspect]: [10, 110], prandtl: [0.5, 1], rayleigh: [1, 2e7] }, scatter: 0.12, value: (of) => elSherbiny({ rayleigh: of.rayleigh, aspect: of[aspect] }), formula: 'Nu = max(0.0605 Ra^(1/3), (1 + (0.104 Ra^0.293/(1 + (6310/Ra)^1.36))^3)^(1/3), 0.242 (Ra W/H)^0.272)', source: elsherbinySource, note: 'the data end near Ra 2e5 at H/W 40' }),
    way({ needs, range: { [aspect]: [10, 40], prandtl: [1, 2e4], rayleigh: [1, 1e7] }, scatter: 0.15, value: (of) => macgregorEmery({ rayleigh: of.rayleigh, prandtl: of.prandtl, aspect: of[aspect] }).layer, formula: 'Nu = 0.42 Ra^(1/4) Pr^0.012 (H/W)^(-0.3), at least 1', source: macgregor }),
  ]),
  ways('nusseltSecond', [
    way({ needs, range: { [aspect]: [0.97, 1.03], prandtl: [0.6, 0.8], rayleigh: [1e3, 1e8] }, scatter: 0.12, value: (of) => berkovskyPolevikov({ rayleigh: of.rayleigh, prandtl: of.prandtl, aspect: 1 }), formula: 'Nu = 0.18 (Pr Ra/(0.2 + Pr))^0.29', source }),
    way({ needs, range: { [aspect]: [5, 110], prandtl: [0.5, 1], rayleigh: [1e2, 2e7] }, scatter: 0.12, value: (of) => elSherbiny({ rayleigh: of.rayleigh, aspect: of[aspect] }), formula: 'as for tall slots of air', source: elsherbinySource }),
    way({ needs, range: { [aspect]: [1, 40], prandtl: [1, 20], rayleigh: [1e6, 1e9] }, scatter: 0.2, value: (of) => macgregorEmery({ rayleigh: of.rayleigh, prandtl: of.prandtl, aspect: of[aspect] }).turbulent, formula: 'Nu = 0.046 Ra^(1/3)', source: macgregor }),
  ]),
  ways('heatRate', [way({ needs: ['heatTransferCoefficient', 'wallArea@walls.left', 'hotTemperature', 'coldTemperature', 'radiationFactorHeat'], value: (of) => of.radiationFactorHeat * of.heatTransferCoefficient * of['wallArea@walls.left'] * (of.hotTemperature - of.coldTemperature), formula: 'Q = h H depth (T_h - T_c), times F_r', source: definition })]),
  ways('biotWall', [way({ needs: ['wallResistance', 'heatTransferCoefficientPlain'], value: ({ wallResistance, heatTransferCoefficientPlain }) => 2 * wallResistance * heatTransferCoefficientPlain, formula: 'Bi_w = R_w 2 h_0: wall against its own layer', source: definition })]),
  ways('innerResistance', [way({ needs: ['heatTransferCoefficient'], value: ({ heatTransferCoefficient }) => 1 / (2 * heatTransferCoefficient), formula: 'R_i = 1/(2 h), from a wall to the mean of hot and cold', source: 'half of the resistance between hot and cold wall: the field is point symmetric' })]),
];

const layerNeeds = ['sideHeatedCavityLayerGrashof', 'prandtl', 'passageHeight', 'sizes.width'] as const;
const prandtls = [0.01, 1000] as const;
const laminar = { regime: ['laminar', 'transitional'] };
const turbulent = { regime: 'turbulent' };
const thickness = (which: 'velocity' | 'thermal'): Definition => ways(which === 'velocity' ? 'boundaryLayerThickness' : 'thermalLayerThickness', [
  way({ needs: layerNeeds, when: laminar, range: { prandtl: prandtls }, scatter: 0.3, value: (of) => Math.min(of['sizes.width'] / 2, (uprightSimilar({ prandtl: of.prandtl, which }) * of.passageHeight) / (of.sideHeatedCavityLayerGrashof / 4) ** 0.25), formula: 'delta = eta H (4/Gr)^(1/4), Gr on H and half the difference, at most W/2', source: 'layer on an upright plate, Ostrach, NACA Report 1111 (1953), solved anew' }),
  way({ needs: layerNeeds, when: turbulent, scatter: 0.4, value: (of) => Math.min(of['sizes.width'] / 2, eckertJackson({ grashof: of.sideHeatedCavityLayerGrashof, prandtl: of.prandtl }).thickness * of.passageHeight), formula: 'delta = 0.565 H Gr^(-1/10) Pr^(-8/15) (1 + 0.494 Pr^(2/3))^(1/10), at most W/2', source: 'Eckert and Jackson, NACA Report 1015 (1951)' }),
]);
const shearNeeds = ['sideHeatedCavityLayerGrashof', 'prandtl', 'passageHeight', 'viscosity', 'kinematicViscosity'] as const;

const field: Definition[] = [
  quantity('sideHeatedCavityLayerGrashof', { symbol: 'Gr_1/2', name: 'Grashof number of a wall layer: height and half the difference', unit: '1' }, [way({ needs: ['rayleighHeight', 'prandtl'], value: ({ rayleighHeight, prandtl }) => rayleighHeight / (2 * prandtl), formula: 'Gr = Ra_H/(2 Pr)', source: definition })]),
  thickness('velocity'),
  thickness('thermal'),
  quantity('sideHeatedCavityPeakSpeed', { symbol: 'v_max', name: 'largest upward speed', unit: 'm/s' }, [
    way({ needs: ['rayleigh', 'thermalDiffusivity', 'length', aspect, 'prandtl'], when: laminar, range: { rayleigh: [1e4, 1e8], [aspect]: square, prandtl: [0.5, 1] }, scatter: 0.05, value: ({ rayleigh, thermalDiffusivity, length }) => (0.218 * thermalDiffusivity * Math.sqrt(rayleigh)) / length, formula: 'v_max = 0.218 (alpha/W) Ra^(1/2), at mid-height', source: 'square of air, from the benchmark of de Vahl Davis, Int. J. Numer. Methods Fluids 3 (1983) 249' }),
    way({ needs: ['sideHeatedCavityLayerGrashof', 'prandtl', 'passageHeight', 'kinematicViscosity'], range: { prandtl: prandtls }, scatter: 0.5, value: (of) => ((2 * of.kinematicViscosity) / of.passageHeight) * Math.sqrt(of.sideHeatedCavityLayerGrashof) * uprightSimilar({ prandtl: of.prandtl, which: 'peak' }), formula: "v_max = (2 nu/H) Gr^(1/2) f'_max, Gr on H and half the difference", source: 'layer on an upright plate; the stratified core lowers it' }),
  ]),
  quantity('sideHeatedCavityPeakPlace', { symbol: 'x_v', name: 'distance of the largest upward speed from the wall', unit: 'm' }, [
    way({ needs: ['rayleigh', 'length', aspect, 'prandtl'], when: laminar, range: { rayleigh: [1e4, 1e8], [aspect]: square, prandtl: [0.5, 1] }, scatter: 0.05, value: ({ rayleigh, length }) => 1.19 * length * rayleigh ** -0.25, formula: 'x_v = 1.19 W Ra^(-1/4)', source: 'square of air, from the benchmark of de Vahl Davis, Int. J. Numer. Methods Fluids 3 (1983) 249' }),
    way({ needs: layerNeeds, range: { prandtl: prandtls }, scatter: 0.5, value: (of) => (uprightSimilar({ prandtl: of.prandtl, which: 'peakPlace' }) * of.passageHeight) / (of.sideHeatedCavityLayerGrashof / 4) ** 0.25, formula: 'x_v = eta_m H (4/Gr)^(1/4)', source: 'layer on an upright plate' }),
  ]),
  ways('peakOverMean', [way({ needs: ['sideHeatedCavityPeakSpeed', 'speed'], value: ({ sideHeatedCavityPeakSpeed, speed }) => sideHeatedCavityPeakSpeed / speed, formula: 'v_max/U', source: definition })]),
  quantity('sideHeatedCavityStratification', { symbol: 'dT/dz', name: 'rise of temperature in the core', unit: 'K/m' }, [way({ needs: ['temperatureDifference', 'passageHeight'], scatter: 0.4, value: ({ temperatureDifference, passageHeight }) => (0.75 * temperatureDifference) / passageHeight, formula: 'dT/dz = 0.75 dT/H, between 0.5 and 1', source: 'de Vahl Davis, Int. J. Numer. Methods Fluids 3 (1983) 249 and later work; layers on the walls' })]),
  quantity('sideHeatedCavityWaveFrequency', { symbol: 'N/(2 pi)', name: 'frequency of internal waves in the core', unit: 'Hz' }, [way({ needs: ['gravity', 'thermalExpansion', 'sideHeatedCavityStratification'], value: (of) => Math.sqrt(of.gravity * Math.abs(of.thermalExpansion) * of.sideHeatedCavityStratification) / (2 * Math.PI), formula: 'f = sqrt(g |beta| dT/dz)/(2 pi)', source: 'Brunt 1927, Vaisala 1925' })]),
  ways('wallShearPlain', [
    way({ needs: shearNeeds, when: laminar, range: { prandtl: prandtls }, scatter: 0.5, value: (of) => ((2 * of.viscosity * of.kinematicViscosity) / of.passageHeight ** 2) * Math.sqrt(of.sideHeatedCavityLayerGrashof) * uprightSimilar({ prandtl: of.prandtl, which: 'shear' }) * (of.sideHeatedCavityLayerGrashof / 4) ** 0.25, formula: "tau_w = 2 mu nu/H^2 Gr^(1/2) f''(0) (Gr/4)^(1/4), half the difference", source: 'layer on an upright plate, Ostrach, NACA Report 1111 (1953), solved anew' }),
    way({ needs: shearNeeds, when: turbulent, scatter: 0.5, value: (of) => ((of.viscosity * of.kinematicViscosity) / of.passageHeight ** 2) * eckertJackson({ grashof: of.sideHeatedCavityLayerGrashof, prandtl: of.prandtl }).shear, formula: 'tau_w = 0.0225 rho U_1^2 (nu/(U_1 delta))^(1/4), half the difference', source: 'Eckert and Jackson, NACA Report 1015 (1951)' }),
  ]),
  ways('wallShear', [way({ needs: ['wallShearPlain', 'viscosityFactorFriction'], value: ({ wallShearPlain, viscosityFactorFriction }) => wallShearPlain * viscosityFactorFriction, formula: 'tau_w = tau_0 F_visc, largest on hot and cold wall', source: 'factors of the effects that act' })]),
  ways('frictionReynolds', [way({ needs: ['frictionVelocityPlain', 'boundaryLayerThickness', 'kinematicViscosity'], value: (of) => (of.frictionVelocityPlain * of.boundaryLayerThickness) / of.kinematicViscosity, formula: 'delta+ = u_tau delta/nu', source: definition })]),
  ways('laminarShare', [way({ needs: ['rayleighHeight'], scatter: 0.15, value: ({ rayleighHeight }) => Math.min(1, (1e8 / rayleighHeight) ** (1 / 3)), formula: 's = (1e8/Ra_H)^(1/3), at most 1', source: 'Ra grows with the cube of the height; 1e8 common practice' })]),
];

/** Heat transfer, wall layers and core of a box heated from the side. */
export const sideHeatedCavityLaws: Definition[] = [...regime, ...heat, ...field, ...facingWalls('walls.left', 'walls.right')];
