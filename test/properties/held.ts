import { readdirSync, readFileSync } from 'node:fs';
import { Problem } from '../../src/problems/index.ts';
import { loadMaterial, materialRecords, mixtureOf, parseState, propertyAt, type Material, type PropertyId, type PropertyValue, type State } from '../../src/properties/index.ts';

/** One value of a record held against another program or work. */
export interface Held {
  readonly material: string;
  /** Of a mixture of gases: `component share + component share` by mole. */
  readonly components?: string;
  readonly property: PropertyId;
  readonly reference: string;
  /** A program that evaluates the same equation, another work, or a value named by the record itself. */
  readonly by: 'program' | 'work' | 'record';
  readonly T: number;
  readonly p: number;
  /** Share by mass of a mixture. */
  readonly share?: number;
  readonly phase: string;
  readonly value: number;
  readonly expected: number;
  /** Relative difference; our uncertainty; what is allowed: that, and where it says so the uncertainty of the reference beside it. */
  readonly off: number;
  readonly declared: number;
  readonly allowed: number;
}

/** Relative uncertainty of the handbooks held against pure fluids, 95 %: what such correlations are good for, from memory of their introductions. */
export const ofHandbooks: { readonly [property: string]: number } = { density: 0.01, specificHeatCapacity: 0.03, speedOfSound: 0.015, viscosity: 0.1, thermalConductivity: 0.08, vapourPressure: 0.03, latentHeat: 0.04, surfaceTension: 0.06 };

const text = (name: string): string => readFileSync(new URL(name, import.meta.url), 'utf8').trim();

/** The value of a record at a state; undefined where the record does not cover it. */
function valueAt(material: Material, property: PropertyId, state: State): PropertyValue | undefined {
  try {
    const found = propertyAt(material, property, state);
    return found?.withinRange === true ? found : undefined;
  } catch (error) {
    if (error instanceof Problem) return undefined;
    throw error;
  }
}

const mixtures = new Map<string, Material>();
function materialOf(name: string, components: string | undefined): Material {
  if (components === undefined) return loadMaterial(name);
  const key = `${name} of ${components}`;
  const material = mixtures.get(key) ?? mixtureOf(loadMaterial(name), parseState(components.replaceAll(' + ', ', ')).components ?? []);
  mixtures.set(key, material);
  return material;
}

interface Reference {
  readonly material: string;
  readonly components?: string;
  readonly property: PropertyId;
  readonly reference: string;
  readonly by: Held['by'];
  readonly state: State;
  readonly expected: number;
  readonly allow: (declared: number) => number;
}

function held({ material, components, property, reference, by, state, expected, allow }: Reference): Held | undefined {
  const found = valueAt(materialOf(material, components), property, state);
  if (found === undefined) return undefined;
  const share = state.composition ?? state.humidity;
  return { material, ...(components === undefined ? {} : { components }), property, reference, by, T: state.temperature, p: state.pressure, ...(share === undefined ? {} : { share }), phase: found.phase, value: found.value, expected, off: Math.abs(found.value / expected - 1), declared: found.uncertainty, allowed: allow(found.uncertainty) };
}

/** Pure fluids: independent-fluids.csv, made by the script of the same name; states outside the declared ranges are left out. */
export function ofFluids(): Held[] {
  const [head = '', ...lines] = text('./independent-fluids.csv').split('\n');
  const properties = head.split(',').slice(4) as PropertyId[];
  return lines.flatMap((line) => {
    // Only names with a comma would be quoted, and no record has one.
    const [material = '', reference = '', T = '', p = '', ...cells] = line.split(',');
    const program = reference === 'CoolProp';
    return properties.flatMap((property, i): Held[] => {
      if (cells[i] === '') return [];
      const one = held({ material, property, reference: program ? 'CoolProp 8.0.0' : reference, by: program ? 'program' : 'work', state: { temperature: Number(T), pressure: Number(p) }, expected: Number(cells[i]), allow: (declared) => declared + (program ? 1e-5 : (ofHandbooks[property] ?? 0)) });
      return one === undefined ? [] : [one];
    });
  });
}

/** A row of the tables in compared/, each made by the script of its name. */
interface TableRow {
  readonly material: string;
  readonly components?: string;
  readonly property: PropertyId;
  readonly reference: string;
  readonly state: State;
  readonly expected: number;
}

/** The tables in compared/, as they stand. */
export function tableRows(): TableRow[] {
  const folder = new URL('./compared/', import.meta.url);
  const tables = readdirSync(folder).filter((name) => name.endsWith('.csv')).toSorted();
  return tables.flatMap((name) => readFileSync(new URL(name, folder), 'utf8').trim().split('\n').slice(1)).map((line) => {
    const [named = '', property = '', T, p, share, value, ...reference] = line.split(',');
    const [, material = '', components] = /^(.*?)(?: of (.*%))?$/.exec(named) ?? [];
    return { material, ...(components === undefined ? {} : { components }), property: property as PropertyId, reference: reference.join(',').replace(/^"|"$/g, ''), state: { temperature: Number(T), pressure: Number(p), ...(share === '' ? {} : { [material === 'humid air' ? 'humidity' : 'composition']: Number(share) }) }, expected: Number(value) };
  });
}

const ofTables = (): Held[] => tableRows().flatMap((row) => {
  const program = row.reference.startsWith('CoolProp');
  return held({ ...row, by: program ? 'program' : 'work', allow: (declared) => declared + (program ? 1e-5 : 0) }) ?? [];
});

interface LibraryRow {
  readonly library: string;
  readonly material: string;
  readonly T: number;
  readonly p: number;
  readonly humidity?: number;
  readonly composition?: number;
  readonly values: Readonly<Record<string, number>>;
}

/** Water, air and its parts, humid air: independent.json, made by independent.py, which names the equations. */
export const ofIndependent = (): { readonly libraries: Readonly<Record<string, string>>; readonly rows: readonly LibraryRow[] } => JSON.parse(text('./independent.json')) as ReturnType<typeof ofIndependent>;

/** The state of a row. */
export const stateOf = ({ T, p, humidity, composition }: LibraryRow): State => ({ temperature: T, pressure: p, ...(humidity === undefined ? {} : { humidity }), ...(composition === undefined ? {} : { composition }) });

function ofLibraries(): Held[] {
  const { libraries, rows } = ofIndependent();
  return rows.flatMap((row) =>
    Object.entries(row.values).flatMap(([property, expected]) => {
      const { library, material } = row;
      const state = stateOf(row);
      // A rounding of the ninth digit is allowed beside the uncertainty.
      return held({ material, property: property as PropertyId, reference: `${library} ${libraries[library]}`, by: 'program', state, expected, allow: (declared) => declared + 1e-8 }) ?? [];
    }),
  );
}

/** What the authors of transport correlations print, at temperature and density: authors-values.json. */
function ofAuthors(): Held[] {
  const { rows } = JSON.parse(text('./authors-values.json')) as { rows: readonly (readonly [string, PropertyId, number, number, number, number])[] };
  return rows.map(([name, property, T, density, expected, within]): Held => {
    const { engine, critical, record } = loadMaterial(name);
    const side = density > 0.6 * (critical?.density ?? 0) && T < (critical?.temperature ?? 0) ? 'liquid' : 'vapour';
    const value = engine.value(property, { T, p: Number.NaN, side, x: 0, density });
    const declared = Math.min(...(record.properties[property] ?? []).flatMap((entry) => entry.uncertainty.map((band) => band.value)));
    return { material: name, property, reference: 'values printed by the authors', by: 'program', T, p: Number.NaN, phase: side, value, expected, off: Math.abs(value / expected - 1), declared, allowed: within };
  });
}

/** The checks that the records name. */
function ofRecords(): Held[] {
  return materialRecords().flatMap((record) => {
    const entries = [...(record.thermodynamics === undefined ? [] : [record.thermodynamics]), ...Object.values(record.properties).flat()];
    return entries.flatMap((entry) =>
      entry.checks.flatMap(({ property, at, expect, within, source }) =>
        held({ material: record.name, property: property as PropertyId, reference: source, by: 'record', state: { temperature: at.temperature ?? 300, pressure: at.pressure ?? 101325, ...(at.humidity === undefined ? {} : { humidity: at.humidity }), ...(at.composition === undefined ? {} : { composition: at.composition }) }, expected: expect, allow: () => within }) ?? [],
      ),
    );
  });
}

/** Every value of a record that is held against another program or work, whatever file it stands in. */
export const heldValues = (): Held[] => [...ofFluids(), ...ofTables(), ...ofLibraries(), ...ofAuthors(), ...ofRecords()];
