/** Shares by mass of what food is made of. */
export interface FoodParts {
  readonly water?: number;
  readonly protein?: number;
  readonly fat?: number;
  readonly carbohydrate?: number;
  readonly fibre?: number;
  readonly ash?: number;
}

type Kind = keyof FoodParts;
type Cubic = readonly [number, number, number];

/** Density [kg/m^3], conductivity [W/(m K)] and heat capacity [J/(kg K)] of each part as polynomials in degC. */
const parts: { readonly [kind in Kind]: { readonly density: Cubic; readonly conductivity: Cubic; readonly heat: Cubic } } = {
  water: { density: [997.18, 3.1439e-3, -3.7574e-3], conductivity: [0.57109, 1.7625e-3, -6.7036e-6], heat: [4128.9, -0.090864, 5.4731e-3] },
  protein: { density: [1329.9, -0.5184, 0], conductivity: [0.17881, 1.1958e-3, -2.7178e-6], heat: [2008.2, 1.2089, -1.3129e-3] },
  fat: { density: [925.59, -0.41757, 0], conductivity: [0.18071, -2.7604e-4, -1.7749e-7], heat: [1984.2, 1.4733, -4.8008e-3] },
  carbohydrate: { density: [1599.1, -0.31046, 0], conductivity: [0.20141, 1.3874e-3, -4.3312e-6], heat: [1548.8, 1.9625, -5.9399e-3] },
  fibre: { density: [1311.5, -0.36589, 0], conductivity: [0.18331, 1.2497e-3, -3.1683e-6], heat: [1845.9, 1.8306, -4.6509e-3] },
  ash: { density: [2423.8, -0.28063, 0], conductivity: [0.32962, 1.4011e-3, -2.9069e-6], heat: [1092.6, 1.8896, -3.6817e-3] },
};

const at = ([a, b, c]: Cubic, t: number): number => a + t * (b + t * c);

/** What a food is made of where the share of its dry matter is given: the parts are then those of the dry matter. */
function mass(given: FoodParts, solids: number): readonly (readonly [Kind, number])[] {
  const listed = Object.entries(given) as [Kind, number][];
  return 'water' in given ? listed : [['water', 1 - solids], ...listed.map(([kind, x]) => [kind, x * solids] as const)];
}

/**
 * Unfrozen food from its composition: volumes add for the density, volumes weigh the conductivity, masses the heat capacity.
 *
 * @param given  shares by mass; without water they are those of the dry matter, whose share is the composition of the state
 * @returns      the three properties of T [K] and the share of dry matter
 * @source       Choi and Okos, in Food Engineering and Process Applications, vol. 1 (1986), as tabulated in the ASHRAE Handbook, Refrigeration (2006), chapter 9
 */
export function food(given: FoodParts): { readonly [what in 'density' | 'conductivity' | 'heat']: (T: number, solids: number) => number } {
  const volume = (t: number, solids: number): number => mass(given, solids).reduce((sum, [kind, x]) => sum + x / at(parts[kind].density, t), 0);
  return {
    density: (T, solids) => 1 / volume(T - 273.15, solids),
    conductivity: (T, solids) => {
      const t = T - 273.15;
      return mass(given, solids).reduce((sum, [kind, x]) => sum + (x / at(parts[kind].density, t)) * at(parts[kind].conductivity, t), 0) / volume(t, solids);
    },
    heat: (T, solids) => mass(given, solids).reduce((sum, [kind, x]) => sum + x * at(parts[kind].heat, T - 273.15), 0),
  };
}
