import { churchillChuLaminar, churchillChuPlate, eckertJackson, leFevre, levelPlateStable, levelPlateUnstable, uprightSimilar } from '../quantities/index.ts';
import { quantity, way, ways, type Definition, type When } from '../workings/index.ts';

const standing: When = { plateSetting: ['upright', 'inclined'] };
const unstable: When = { plateSetting: 'unstable' };
const stable: When = { plateSetting: 'stable' };
const level: When = { plateSetting: ['unstable', 'stable'] };
const churchillChu = 'Churchill and Chu, Int. J. Heat Mass Transfer 18 (1975) 1323';
const ostrach = 'Ostrach, NACA Report 1111 (1953), solved anew';
const practice = 'common practice';
const temperatureKinds = ['temperature', 'coefficient', 'adiabatic'];
const prandtls = [0.01, 1000] as const;

const limit = (n: number, when: When, symbol: string, source: string): ReturnType<typeof way> => way({ needs: [], when, scatter: 0.5, value: () => n, formula: `${symbol} = ${n}`, source });
const bejan = 'Bejan and Lage, J. Heat Transfer 112 (1990) 787';
const regime: Definition[] = [
  ways('regimeGroup', [
    way({ needs: ['plateRayleigh', 'prandtl'], when: standing, range: { prandtl: [0.5, 2] }, value: ({ plateRayleigh }) => plateRayleigh, symbol: 'Ra', formula: 'Ra on the height, where Pr lies within 0.5 and 2', source: bejan }),
    way({ needs: ['plateRayleigh', 'prandtl'], when: standing, value: ({ plateRayleigh, prandtl }) => plateRayleigh / prandtl, symbol: 'Gr', formula: 'Gr on the height', source: bejan }),
    way({ needs: ['rayleigh'], when: level, value: ({ rayleigh }) => rayleigh, symbol: 'Ra', formula: 'Ra on area over perimeter', source: 'definition' }),
  ]),
  ways('regimeLow', [limit(1e9, standing, 'Ra_lo', bejan), limit(8e6, unstable, 'Ra_lo', 'Lloyd and Moran, J. Heat Transfer 96 (1974) 443'), limit(1e10, stable, 'Ra_lo', practice)]),
  ways('regimeHigh', [limit(1e10, standing, 'Ra_hi', bejan), limit(1e8, unstable, 'Ra_hi', practice), limit(1e11, stable, 'Ra_hi', practice)]),
  ways('unsteadyGroup', [way({ needs: ['regimeGroup'], when: { plateSetting: ['upright', 'inclined', 'unstable', 'stable'] }, value: ({ regimeGroup }) => regimeGroup, formula: 'group of the regime', source: 'definition' })]),
  ways('unsteadyFrom', [limit(1e9, standing, 'x_on', practice), limit(1e5, unstable, 'x_on', `${practice}: plumes rise from the hot side`), limit(1e10, stable, 'x_on', practice)]),
  ways('laminarShare', [
    way({ needs: ['regimeGroup', 'regimeLow'], when: standing, value: ({ regimeGroup, regimeLow }) => Math.min(1, (regimeLow / regimeGroup) ** (1 / 3)), formula: 's = (1e9/Ra)^(1/3), at most 1', source: 'Ra grows with the cube of the height' }),
    way({ needs: ['regimeGroup', 'regimeLow'], when: level, value: ({ regimeGroup, regimeLow }) => Math.min(1, regimeLow / regimeGroup), formula: 's = Ra_lo/Ra, at most 1', source: practice }),
  ]),
];

/** Buoyant speed; peak of the laminar layer at the upper edge. */
const speeds: Definition[] = [
  quantity('plateRayleigh', { symbol: 'Ra_p', name: 'Rayleigh number with the gravity along the plate', unit: '1' }, [
    way({ needs: ['rayleigh'], when: { plateSetting: 'upright' }, value: ({ rayleigh }) => rayleigh, formula: 'Ra', source: 'definition' }),
    way({ needs: ['rayleigh', 'inclination'], when: { plateSetting: 'inclined' }, range: { inclination: [Math.PI / 6, Math.PI / 2] }, value: ({ rayleigh, inclination }) => rayleigh * Math.abs(Math.sin(inclination)), formula: 'Ra sin(theta), theta above the level', source: 'Rich, J. Heat Transfer 75 (1953) 489: lower side of a hot plate, laminar' }),
  ]),
  quantity('plateGrashof', { symbol: 'Gr_p', name: 'Grashof number with the gravity along the plate', unit: '1' }, [way({ needs: ['plateRayleigh', 'prandtl'], value: ({ plateRayleigh, prandtl }) => plateRayleigh / prandtl, formula: 'Gr = Ra/Pr', source: 'definition' })]),
  ways('speed', [
    way({ needs: ['gravity', 'thermalExpansion', 'temperatureDifference', 'length', 'prandtl'], when: standing, scatter: 0.2, value: (of) => 0.766 * (0.952 + of.prandtl) ** -0.5 * Math.sqrt(of.gravity * Math.abs(of.thermalExpansion) * of.temperatureDifference * of.length), formula: 'U_N = 0.766 (0.952 + Pr)^(-1/2) sqrt(g |beta| dT L)', source: 'Squire, in Modern Developments in Fluid Dynamics (1938)' }),
    way({ needs: ['gravity', 'thermalExpansion', 'temperatureDifference', 'length'], when: level, scatter: 0.5, value: (of) => Math.sqrt(of.gravity * Math.abs(of.thermalExpansion) * of.temperatureDifference * of.length), formula: 'U_N = sqrt(g |beta| dT L)', source: 'buoyancy against inertia' }),
  ]),
  quantity('platePeakSpeed', { symbol: 'u_max', name: 'largest speed in the layer at the upper edge', unit: 'm/s' }, [
    way({ needs: ['plateGrashof', 'prandtl', 'length', 'kinematicViscosity'], when: { ...standing, regime: 'laminar' }, range: { prandtl: prandtls }, scatter: 0.03, value: ({ plateGrashof, prandtl, length, kinematicViscosity }) => ((2 * kinematicViscosity) / length) * Math.sqrt(plateGrashof) * uprightSimilar({ prandtl, which: 'peak' }), formula: "u_max = (2 nu/L) Gr^(1/2) f'_max", source: ostrach }),
    way({ needs: ['plateGrashof', 'prandtl', 'length', 'kinematicViscosity'], when: { ...standing, regime: ['transitional', 'turbulent'] }, scatter: 0.3, value: ({ plateGrashof, prandtl, length, kinematicViscosity }) => (0.537 * eckertJackson({ grashof: plateGrashof, prandtl }).speed * kinematicViscosity) / length, formula: 'u_max = 0.537 U_1, U_1 = 1.185 (nu/L) Gr^(1/2) (1 + 0.494 Pr^(2/3))^(-1/2)', source: 'Eckert and Jackson, NACA Report 1015 (1951), largest value of their profile' }),
    way({ needs: ['speed'], when: level, scatter: 0.5, value: ({ speed }) => speed, formula: 'u_max = U_N', source: 'order of magnitude' }),
  ]),
  ways('peakOverMean', [way({ needs: ['platePeakSpeed', 'speed'], when: { plateSetting: ['upright', 'inclined', 'unstable', 'stable'] }, value: ({ platePeakSpeed, speed }) => platePeakSpeed / speed, formula: 'u_max/U_N', source: 'definition' })]),
];

const kinds = (wall: 'temperature' | 'flux'): string | string[] => (wall === 'flux' ? 'flux' : temperatureKinds);
const heat: Definition[] = [
  ways('nusseltLaminar', [
    ...(['temperature', 'flux'] as const).map((wall) => way({ needs: ['plateRayleigh', 'prandtl'], when: { ...standing, wallKind: kinds(wall) }, range: { plateRayleigh: [1, 1e9], prandtl: [0.01, 1e4] }, scatter: 0.12, value: ({ plateRayleigh, prandtl }) => churchillChuLaminar({ rayleigh: plateRayleigh, prandtl, wall }), formula: `Nu = 0.68 + 0.670 Ra^(1/4)/(1 + (${wall === 'flux' ? '0.437' : '0.492'}/Pr)^(9/16))^(4/9)${wall === 'flux' ? ', dT at half the height' : ''}, film`, source: churchillChu })),
    way({ needs: ['rayleigh'], when: unstable, range: { rayleigh: [1, 1e7] }, scatter: 0.25, value: ({ rayleigh }) => levelPlateUnstable({ rayleigh: Math.min(rayleigh, 1e7) }), formula: 'Nu = 0.54 Ra^(1/4), below 1e4 0.59 Ra^(1/4), below 200 0.96 Ra^(1/6), film', source: 'Lloyd and Moran, J. Heat Transfer 96 (1974) 443; Goldstein, Sparrow and Jones, Int. J. Heat Mass Transfer 16 (1973) 1025' }),
    way({ needs: ['rayleigh'], when: stable, range: { rayleigh: [1e5, 1e10] }, scatter: 0.3, value: ({ rayleigh }) => levelPlateStable({ rayleigh }).first, formula: 'Nu = 0.27 Ra^(1/4), film', source: 'McAdams, Heat Transmission, 3rd ed. (1954)' }),
  ]),
  ...(['nusseltBetween', 'nusseltTurbulent'] as const).map((id) => ways(id, [
    ...(['temperature', 'flux'] as const).map((wall) => way({ needs: ['plateRayleigh', 'prandtl'], when: { ...standing, wallKind: kinds(wall) }, range: { plateRayleigh: [1e8, 1e12], prandtl: [0.1, 1e4] }, scatter: id === 'nusseltBetween' ? 0.2 : 0.15, value: ({ plateRayleigh, prandtl }) => churchillChuPlate({ rayleigh: plateRayleigh, prandtl, wall }), formula: `Nu = (0.825 + 0.387 Ra^(1/6)/(1 + (${wall === 'flux' ? '0.437' : '0.492'}/Pr)^(9/16))^(8/27))^2${wall === 'flux' ? ', dT at half the height' : ''}, film`, source: churchillChu })),
    id === 'nusseltTurbulent'
      ? way({ needs: ['rayleigh'], when: unstable, range: { rayleigh: [1e7, 1e11] }, scatter: 0.25, value: ({ rayleigh }) => 0.15 * rayleigh ** (1 / 3), formula: 'Nu = 0.15 Ra^(1/3), film', source: 'Lloyd and Moran, J. Heat Transfer 96 (1974) 443' })
      : way({ needs: ['rayleigh'], when: unstable, range: { rayleigh: [1e4, 1e11] }, scatter: 0.25, value: ({ rayleigh }) => levelPlateUnstable({ rayleigh }), formula: 'Nu = 0.54 Ra^(1/4) to 1e7, 0.15 Ra^(1/3) beyond, film', source: 'Lloyd and Moran, J. Heat Transfer 96 (1974) 443', note: '6 % jump at 1e7' }),
    way({ needs: ['rayleigh'], when: stable, range: { rayleigh: [1e5, 1e10] }, scatter: 0.3, value: ({ rayleigh }) => levelPlateStable({ rayleigh }).first, formula: 'Nu = 0.27 Ra^(1/4), film', source: 'McAdams, Heat Transmission, 3rd ed. (1954)' }),
  ])),
  ways('nusseltSecond', [
    way({ needs: ['plateGrashof', 'prandtl'], when: { ...standing, regime: 'laminar', wallKind: temperatureKinds }, range: { plateGrashof: [1e4, 1e10], prandtl: [0.01, 1e4] }, scatter: 0.05, value: ({ plateGrashof, prandtl }) => (4 / 3) * leFevre({ prandtl }) * (plateGrashof / 4) ** 0.25, formula: "Nu = (4/3)(-theta'(0))(Gr/4)^(1/4), film", source: 'LeFevre, 9th Int. Congr. Appl. Mech., Brussels 4 (1956) 168' }),
    way({ needs: ['rayleigh'], when: stable, range: { rayleigh: [1e4, 1e9] }, scatter: 0.25, value: ({ rayleigh }) => levelPlateStable({ rayleigh }).second, formula: 'Nu = 0.52 Ra^(1/5), film', source: 'Radziemska and Lewandowski, Appl. Energy 68 (2001) 347' }),
  ]),
];

const shearNeeds = ['plateGrashof', 'prandtl', 'length', 'viscosity', 'kinematicViscosity'] as const;
const layers: Definition[] = [
  quantity('plateConductionTime', { symbol: 't_c', name: 'time in which conduction alone would fill the thermal layer', unit: 's' }, [
    way({ needs: ['thermalLayerThickness', 'thermalDiffusivity'], value: ({ thermalLayerThickness, thermalDiffusivity }) => (thermalLayerThickness / 3.642773) ** 2 / thermalDiffusivity, formula: 't = (delta_T/3.643)^2/alpha, 1 % of the change has arrived', source: 'half-space with a sudden wall temperature' }),
  ]),
  quantity('plateLayerGrashof', { symbol: 'Gr_s', name: 'Grashof number that the layer of a level plate is judged by', unit: '1' }, [way({ needs: ['grashof'], when: level, value: ({ grashof }) => grashof, formula: 'Gr on area over perimeter', source: practice })]),
  ways('wallShearPlain', [
    way({ needs: shearNeeds, when: { ...standing, regime: 'laminar' }, range: { prandtl: prandtls }, scatter: 0.05, value: (of) => laminarShear(of.plateGrashof, of), formula: "tau_w = 2 mu nu/L^2 Gr^(1/2) f''(0) (Gr/4)^(1/4) at the upper edge", source: ostrach }),
    way({ needs: shearNeeds, when: { ...standing, regime: ['transitional', 'turbulent'] }, scatter: 0.3, value: (of) => ((of.viscosity * of.kinematicViscosity) / of.length ** 2) * eckertJackson({ grashof: of.plateGrashof, prandtl: of.prandtl }).shear, formula: 'tau_w = 0.0225 rho U_1^2 (nu/(U_1 delta))^(1/4)', source: 'Eckert and Jackson, NACA Report 1015 (1951)' }),
    way({ needs: ['plateLayerGrashof', 'prandtl', 'length', 'viscosity', 'kinematicViscosity'], when: level, range: { prandtl: prandtls }, scatter: 0.5, value: (of) => laminarShear(of.plateLayerGrashof, of), formula: 'as an upright plate of height area over perimeter', source: practice }),
  ]),
  ways('wallShear', [way({ needs: ['wallShearPlain', 'viscosityFactorFriction'], when: { plateSetting: ['upright', 'inclined', 'unstable', 'stable'] }, value: ({ wallShearPlain, viscosityFactorFriction }) => wallShearPlain * viscosityFactorFriction, formula: 'tau_w = tau_0 times the factor of viscosity; largest at the upper edge', source: 'factors of the effects that act' })]),
  ways('boundaryLayerThickness', layerWays('velocity', 'delta_v = eta_v L (4/Gr)^(1/4), 1 % of the largest speed left')),
  ways('thermalLayerThickness', layerWays('thermal', 'delta_T = eta_T L (4/Gr)^(1/4), 1 % of the temperature difference left')),
];

function laminarShear(grashof: number, of: Readonly<Record<'prandtl' | 'length' | 'viscosity' | 'kinematicViscosity', number>>): number {
  return ((2 * of.viscosity * of.kinematicViscosity) / of.length ** 2) * Math.sqrt(grashof) * uprightSimilar({ prandtl: of.prandtl, which: 'shear' }) * (grashof / 4) ** 0.25;
}
function layerWays(which: 'velocity' | 'thermal', formula: string): ReturnType<typeof way>[] {
  return [
    way({ needs: ['plateGrashof', 'prandtl', 'length'], when: { ...standing, regime: 'laminar' }, range: { prandtl: prandtls }, scatter: 0.05, value: ({ plateGrashof, prandtl, length }) => (uprightSimilar({ prandtl, which }) * length) / (plateGrashof / 4) ** 0.25, formula, source: ostrach }),
    way({ needs: ['plateGrashof', 'prandtl', 'length'], when: { ...standing, regime: ['transitional', 'turbulent'] }, scatter: 0.3, value: ({ plateGrashof, prandtl, length }) => eckertJackson({ grashof: plateGrashof, prandtl }).thickness * length, formula: 'delta = 0.565 L Gr^(-1/10) Pr^(-8/15) (1 + 0.494 Pr^(2/3))^(1/10)', source: 'Eckert and Jackson, NACA Report 1015 (1951)' }),
    way({ needs: ['rayleigh', 'length'], when: level, scatter: 0.5, value: ({ rayleigh, length }) => 5 * length * rayleigh ** -0.2, formula: 'delta = 5 L Ra^(-1/5) at the edges', source: practice }),
  ];
}

/** A plate in still fluid: upright, inclined, level with the unstable or the stable side. */
export const plateStill: Definition[] = [...regime, ...speeds, ...heat, ...layers];
