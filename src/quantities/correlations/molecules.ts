/** What estimates of diffusivity need of a molecule. */
export interface Molecule {
  /** [kg/mol] */
  readonly molarMass: number;
  /** Diffusion volume, as Fuller, Schettler and Giddings count it. */
  readonly diffusionVolume: number;
  /** Molar volume at the boiling point [m^3/mol], where it is known. */
  readonly boilingVolume?: number;
}

/** Atoms: molar mass [g/mol], IUPAC 2021 abridged, and diffusion volume, Poling, Prausnitz and O'Connell (2001), table 11-1. */
const atoms: Readonly<Record<string, readonly [mass: number, volume: number]>> = { C: [12.011, 15.9], H: [1.008, 2.31], O: [15.999, 6.11], N: [14.007, 4.54], F: [18.998, 14.7], Cl: [35.45, 21.0], Br: [79.904, 21.9], I: [126.904, 29.8], S: [32.06, 22.9] };
/** A ring of carbon takes less room than its atoms. */
const ring = -18.3;

/** Simple molecules, the same table. */
const simple: Readonly<Record<string, number>> = { H2: 6.12, He: 2.67, Ne: 5.98, Ar: 16.2, Kr: 24.5, Xe: 32.7, N2: 18.5, O2: 16.3, CO: 18.0, CO2: 26.9, N2O: 35.9, NH3: 20.7, H2O: 13.1, SF6: 71.3, Cl2: 38.4, Br2: 69.0, SO2: 41.8 };
const rare: Readonly<Record<string, number>> = { He: 4.0026, Ne: 20.18, Ar: 39.95, Kr: 83.798, Xe: 131.29 };
/** Dry air. */
const air: Molecule = { molarMass: 0.028965, diffusionVolume: 19.7 };

/** Molar volumes at the boiling point [cm^3/mol], as Wilke and Chang, AIChE J. 1 (1955) 264, and Le Bas give them; from memory. */
const boiling: Readonly<Record<string, number>> = { H2: 14.3, O2: 25.6, N2: 31.2, CO: 30.7, CO2: 34.0, SO2: 44.8, NH3: 25.8, H2S: 32.9, N2O: 36.4, Cl2: 48.4, CH4: 37.7, CH4O: 42.5, C2H6O: 62.6, C3H6O: 77.5, C6H6: 96.5 };

const rings: Readonly<Record<string, number>> = { C6H6: 1, C7H8: 1, C8H10: 1, C8H8: 1, C6H5Cl: 1 };

const named: Readonly<Record<string, string>> = {
  hydrogen: 'H2', helium: 'He', neon: 'Ne', argon: 'Ar', krypton: 'Kr', xenon: 'Xe', nitrogen: 'N2', oxygen: 'O2', 'carbon monoxide': 'CO', 'carbon dioxide': 'CO2', 'nitrous oxide': 'N2O', ammonia: 'NH3',
  water: 'H2O', 'water vapour': 'H2O', vapour: 'H2O', steam: 'H2O', 'sulphur hexafluoride': 'SF6', chlorine: 'Cl2', bromine: 'Br2', 'sulphur dioxide': 'SO2', 'hydrogen sulphide': 'H2S', methane: 'CH4', ethane: 'C2H6',
  propane: 'C3H8', butane: 'C4H10', ethylene: 'C2H4', methanol: 'CH4O', ethanol: 'C2H6O', propanol: 'C3H8O', 'isopropyl alcohol': 'C3H8O', acetone: 'C3H6O', 'acetic acid': 'C2H4O2', 'ethyl acetate': 'C4H8O2', benzene: 'C6H6', toluene: 'C7H8',
  xylene: 'C8H10', hexane: 'C6H14', heptane: 'C7H16', octane: 'C8H18', chloroform: 'CHCl3', 'carbon tetrachloride': 'CCl4', naphthalene: 'C10H8',
};

/**
 * A molecule by its name or formula.
 *
 * @param name  `ethanol`, `C2H5OH`, `CO2`, `air`
 * @returns     molar mass and volumes; undefined where the name is no molecule that is known
 */
export function moleculeOf(name: string): Molecule | undefined {
  const text = name.trim();
  if (/^(dry |humid )?air$/i.test(text)) return air;
  const formula = named[text.toLowerCase()] ?? text;
  const counts = atomsIn(formula);
  if (counts === undefined) return undefined;
  const sorted = Object.entries(counts).map(([atom, count]) => `${atom}${count === 1 ? '' : count}`).join('');
  const mass = rare[sorted] ?? Object.entries(counts).reduce((sum, [atom, count]) => sum + (atoms[atom]?.[0] ?? Number.NaN) * count, 0);
  const volume = simple[sorted] ?? simple[formula] ?? Object.entries(counts).reduce((sum, [atom, count]) => sum + (atoms[atom]?.[1] ?? Number.NaN) * count, 0) + (rings[sorted] ?? 0) * ring + (sorted === 'C10H8' ? 2 * ring : 0);
  if (!(mass > 0) || !(volume > 0)) return undefined;
  const boilingVolume = boiling[sorted] ?? boiling[formula];
  return { molarMass: mass / 1e3, diffusionVolume: volume, ...(boilingVolume === undefined ? {} : { boilingVolume: boilingVolume / 1e6 }) };
}

/** Atoms of a formula in the order carbon, hydrogen, others; undefined where it is none. */
function atomsIn(formula: string): Record<string, number> | undefined {
  if (!/^([A-Z][a-z]?\d*)+$/.test(formula)) return undefined;
  const counts: Record<string, number> = {};
  for (const [, atom, count] of formula.matchAll(/([A-Z][a-z]?)(\d*)/g)) {
    if (!((atom as string) in atoms) && !((atom as string) in rare)) return undefined;
    counts[atom as string] = (counts[atom as string] ?? 0) + (count === '' ? 1 : Number(count));
  }
  const order = (atom: string): number => (atom === 'C' ? 0 : atom === 'H' ? 1 : 2);
  return Object.fromEntries(Object.entries(counts).sort(([a], [b]) => (counts['C'] === undefined ? 0 : order(a) - order(b))));
}
