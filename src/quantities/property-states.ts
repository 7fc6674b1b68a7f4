import { quantity, way, ways, type Definition, type Way } from '../workings/index.ts';

/** Properties that follow a law of temperature and pressure. */
export const lawProperties = [
  { id: 'density', symbol: 'rho', name: 'density', unit: 'kg/m^3' },
  { id: 'viscosity', symbol: 'mu', name: 'dynamic viscosity', unit: 'Pa s' },
  { id: 'thermalConductivity', symbol: 'k', name: 'thermal conductivity', unit: 'W/(m K)' },
  { id: 'specificHeatCapacity', symbol: 'cp', name: 'specific heat capacity at constant pressure', unit: 'J/(kg K)' },
  { id: 'thermalExpansion', symbol: 'beta', name: 'thermal expansion coefficient', unit: '1/K', signed: true },
] as const;

/** Properties needed at one state only, with the temperature and pressure they hold at. */
export const singleProperties = [
  { id: 'speedOfSound', symbol: 'c', name: 'speed of sound', unit: 'm/s' },
  { id: 'isentropicExponent', symbol: 'gamma', name: 'ratio of heat capacities', unit: '1' },
  { id: 'compressibilityFactor', symbol: 'Z', name: 'compressibility factor', unit: '1' },
  { id: 'electricalConductivity', symbol: 'sigma_e', name: 'electrical conductivity', unit: 'S/m' },
  { id: 'surfaceTension', symbol: 'sigma', name: 'surface tension', unit: 'N/m' },
  { id: 'vapourPressure', symbol: 'p_v', name: 'vapour pressure of the warmest stream', unit: 'Pa', temperature: 'streamTemperatureMax' },
  { id: 'saturationTemperature', symbol: 'T_sat', name: 'saturation temperature at the lowest pressure', unit: 'K', pressure: 'lowestPressure' },
  { id: 'boilingFloor', symbol: 'T_b,min', name: 'temperature below which the solution does not boil at the lowest pressure', unit: 'K', pressure: 'lowestPressure' },
  { id: 'vapourPressureCeiling', symbol: 'p_v,max', name: 'vapour pressure that the warmest stream of the solution stays below', unit: 'Pa', temperature: 'streamTemperatureMax' },
  { id: 'freezingCeiling', symbol: 'T_m,max', name: 'temperature above which the solution does not freeze', unit: 'K' },
  { id: 'latentHeat', symbol: 'h_fg', name: 'latent heat of evaporation at the lowest pressure', unit: 'J/kg', pressure: 'lowestPressure' },
  { id: 'vapourDensity', symbol: 'rho_v', name: 'density of saturated vapour at the lowest pressure', unit: 'kg/m^3', pressure: 'lowestPressure' },
  { id: 'meltingTemperature', symbol: 'T_m', name: 'melting temperature', unit: 'K' },
  { id: 'molarMass', symbol: 'M', name: 'molar mass', unit: 'kg/mol' },
  { id: 'criticalTemperature', symbol: 'T_c', name: 'critical temperature', unit: 'K' },
  { id: 'criticalPressure', symbol: 'p_c', name: 'critical pressure', unit: 'Pa' },
] as const;

/** The states the law properties are wanted at: ending of the id and the temperature. */
export const propertyStates = [
  { suffix: '', temperature: 'referenceTemperature', at: '' },
  { suffix: 'Wall', temperature: 'wallTemperature', at: ' at the wall' },
  { suffix: 'Bulk', temperature: 'bulkTemperature', at: ' at the bulk temperature' },
  { suffix: 'Film', temperature: 'filmTemperature', at: ' at the film temperature' },
  { suffix: 'Hot', temperature: 'highestTemperature', at: ' at the highest temperature' },
  { suffix: 'Cold', temperature: 'lowestTemperature', at: ' at the lowest temperature' },
] as const;

const index: Readonly<Record<string, string>> = { '': '', Wall: '_w', Bulk: '_b', Film: '_f', Hot: '_h', Cold: '_c' };

/** Property quantities at every state, and those that follow from them. */
export const properties: Definition[] = [
  ...propertyStates.flatMap(({ suffix, at }) => {
    const i = index[suffix] as string;
    return [
      ...lawProperties.map(({ id, symbol, name, ...rest }) => quantity(`${id}${suffix}`, { symbol: `${symbol}${i}`, name: `${name}${at}`, ...rest })),
      quantity(`kinematicViscosity${suffix}`, { symbol: `nu${i}`, name: `kinematic viscosity${at}`, unit: 'm^2/s' }, [
        derived([`viscosity${suffix}`, `density${suffix}`], ([mu, rho]) => mu / rho, `nu${i} = mu${i}/rho${i}`),
      ]),
      quantity(`thermalDiffusivity${suffix}`, { symbol: `alpha${i}`, name: `thermal diffusivity${at}`, unit: 'm^2/s' }, [
        derived([`thermalConductivity${suffix}`, `density${suffix}`, `specificHeatCapacity${suffix}`], ([k, rho, cp]) => k / (rho * cp), `alpha${i} = k${i}/(rho${i} cp${i})`),
      ]),
      quantity(`prandtl${suffix}`, { symbol: `Pr${i}`, name: `Prandtl number${at}`, unit: '1' }, [
        derived([`viscosity${suffix}`, `specificHeatCapacity${suffix}`, `thermalConductivity${suffix}`], ([mu, cp, k]) => (mu * cp) / k, `Pr${i} = mu${i} cp${i}/k${i}`),
      ]),
    ];
  }),
  ...singleProperties.map(({ id, symbol, name, unit }) => quantity(id, { symbol, name, unit })),
  quantity('gasConstant', { symbol: 'R_s', name: 'specific gas constant', unit: 'J/(kg K)' }, [
    way({ needs: ['molarMass'], value: ({ molarMass }) => 8.31446261815324 / molarMass, formula: 'R_s = R_u/M', source: 'SI Brochure, 9th ed. (2019), R_u = k_B N_A', dimensional: 'the molar gas constant has a unit' }),
  ]),
  quantity('meanFreePath', { symbol: 'lambda', name: 'mean free path', unit: 'm' }, [
    way({ needs: ['viscosity', 'pressure', 'gasConstant', 'referenceTemperature'], when: { medium: 'gas' }, value: ({ viscosity, pressure, gasConstant, referenceTemperature }) => (viscosity / pressure) * Math.sqrt((Math.PI * gasConstant * referenceTemperature) / 2), formula: 'lambda = (mu/p) sqrt(pi R_s T/2)', source: 'kinetic theory of gases, Maxwell form' }),
  ]),
];

function derived(needs: readonly string[], value: (of: [number, number, number]) => number, formula: string): Way {
  return { needs, value: (of) => value(needs.map((n) => of[n] as number) as [number, number, number]), formula, source: 'definition' };
}

/** What a material record says of one property: where it comes from and where it holds. */
export interface PropertyAbout {
  readonly formula: string;
  readonly source: string;
  readonly temperature?: readonly [number, number];
  readonly pressure?: readonly [number, number];
}

/**
 * Ways from a material's laws to the property quantities at all states. The laws themselves are handed to the workings.
 *
 * @param about  by property id: formula, source, valid range [K], [Pa]; a property without entry gets no way
 * @returns      ways to add to the definitions
 */
export function materialWays(about: Readonly<Record<string, PropertyAbout>>): Definition[] {
  const one = (id: string, property: string, temperature: string, pressure: string): Definition[] => {
    const a = about[property];
    if (a === undefined) return [];
    const range = { ...(a.temperature === undefined ? {} : { [temperature]: a.temperature }), ...(a.pressure === undefined ? {} : { [pressure]: a.pressure }) };
    return [ways(id, [{ needs: [temperature, pressure], laws: [property], value: (of, laws) => laws[property]?.(of[temperature] as number, of[pressure] as number) ?? Number.NaN, formula: a.formula, source: a.source, range, dimensional: 'a property record holds constants with units' }])];
  };
  return [
    ...propertyStates.flatMap(({ suffix, temperature }) => lawProperties.flatMap(({ id }) => one(`${id}${suffix}`, id, temperature, 'pressure'))),
    ...singleProperties.flatMap((p) => one(p.id, p.id, 'temperature' in p ? p.temperature : 'referenceTemperature', 'pressure' in p ? p.pressure : 'pressure')),
    ...one('ambientSaturation', 'saturationTemperature', 'referenceTemperature', 'ambientPressure'),
    ...one('flowStateDensity', 'flowStateDensity', 'flowStateTemperature', 'flowStatePressure'),
    ...one('ambientBoilingFloor', 'boilingFloor', 'referenceTemperature', 'ambientPressure'),
  ];
}

const derivedProperties = ['kinematicViscosity', 'thermalDiffusivity', 'prandtl'];

/** What a given derived property says of the one it is derived from. */
const backwards: Readonly<Record<string, { readonly id: string; readonly with: readonly string[]; readonly value: (given: number, other: readonly number[]) => number; readonly formula: string }>> = {
  kinematicViscosity: { id: 'viscosity', with: ['density'], value: (nu, [rho]) => nu * (rho as number), formula: 'mu = nu rho' },
  thermalDiffusivity: { id: 'thermalConductivity', with: ['density', 'specificHeatCapacity'], value: (a, [rho, cp]) => a * (rho as number) * (cp as number), formula: 'k = alpha rho cp' },
  prandtl: { id: 'thermalConductivity', with: ['viscosity', 'specificHeatCapacity'], value: (pr, [mu, cp]) => ((mu as number) * (cp as number)) / pr, formula: 'k = mu cp/Pr' },
};

/**
 * Ways from a property given in the case to all its states: the given value wins everywhere, and says what it can of the property behind it.
 *
 * @param property  id, such as `viscosity` or `prandtl`
 * @param path      where the case gives it
 * @returns         ways to add to the definitions
 */
export function givenPropertyWays(property: string, path: string): Definition[] {
  const identity: Way = { needs: [path], value: (of) => of[path] as number, formula: 'as given in the case, constant', source: 'the case' };
  const everywhere = lawProperties.some((p) => p.id === property) || derivedProperties.includes(property);
  const back = backwards[property];
  return [
    ...(everywhere ? propertyStates.map(({ suffix }) => ways(`${property}${suffix}`, [identity])) : [ways(property, [identity])]),
    ...(back === undefined ? [] : propertyStates.map(({ suffix }) => {
      const others = back.with.map((id) => `${id}${suffix}`);
      return ways(`${back.id}${suffix}`, [{ needs: [path, ...others], value: (of) => back.value(of[path] as number, others.map((id) => of[id] as number)), formula: back.formula, source: 'definition' }]);
    })),
  ];
}

/** Whether a property id can be given at all states. */
export function isProperty(id: string): boolean {
  return lawProperties.some((p) => p.id === id) || singleProperties.some((p) => p.id === id) || derivedProperties.includes(id) || id === 'gasConstant' || id === 'meanFreePath';
}
