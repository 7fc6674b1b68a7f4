import { loadMaterial, loadSurface, type Collection, type SurfaceValue } from '../properties/index.ts';
import type { Case, Entry, wallEntries } from '../case/index.ts';
import type { Flow } from '../flows/index.ts';
import { Problem } from '../problems/index.ts';
import { layerDefinitions, type Layer } from '../quantities/index.ts';
import { ways, type Definition, type Law } from '../workings/index.ts';
import { placed } from './fluid.ts';
import { wallPlaces } from './leaves.ts';
import { solidLaw } from './material-laws.ts';

/** Quantity that a key of a wall gives, without its place. */
const gives: Readonly<Record<string, string>> = { heatFlux: 'wallHeatFlux', heat: 'wallHeat', heatTransferCoefficient: 'outerCoefficient', emissivity: 'emissivity', sandGrain: 'sandGrain', speed: 'wallSpeed', rotation: 'wallRotation' };

/** A solid of a wall. */
export interface WallSolid {
  readonly name: string;
  /** Where the case names it. */
  readonly path: string;
  /** Whether it is the last of all layers. */
  readonly outermost: boolean;
  /** [K] */
  readonly melts?: number;
  /** The record of its melt. */
  readonly melt?: string;
}

export interface WallPart {
  readonly definitions: readonly Definition[];
  readonly laws: Readonly<Record<string, Law>>;
  /** Solids of the walls by place, from the fluid outwards. */
  readonly materials: Readonly<Record<string, readonly WallSolid[]>>;
}

/**
 * What the case says of its walls as definitions: each key to its quantity, layers to a resistance.
 *
 * @param on         the case
 * @param flow       its flow
 * @param walls      what counts for each wall
 * @param materials  the collection
 * @param exists     whether a quantity is defined
 * @throws           {Problem} unknown-material, no-conductivity, at the place of the value
 */
export function wallDefinitions(on: Case, flow: Flow, walls: ReturnType<typeof wallEntries>, materials: Collection | undefined, exists: (id: string) => boolean): WallPart {
  const definitions: Definition[] = [];
  const laws: Record<string, Law> = {};
  const names: Record<string, WallSolid[]> = {};
  (flow.walls.length === 0 ? ['wall'] : flow.walls).forEach((name, k) => {
    const place = wallPlaces(flow.walls)[k] as string;
    const keys = walls.get(name) ?? new Map<string, Entry>();
    const layers = layersOf(on, keys, materials, (law, value) => { laws[law] = value; }, (material) => (names[place] ??= []).push(material));
    for (const [key, entry] of keys) {
      const id = key === 'temperature' ? (outerFace(keys, layers.length > 0) ? 'outerTemperature' : 'wettedTemperature') : gives[key];
      if (key === 'Ra' && !keys.has('sandGrain') && exists('sandGrain')) definitions.push(grainOfStylus(place, entry.path));
      if (id === undefined || !exists(id) || typeof entry.value !== 'number') continue;
      definitions.push(ways(`${id}@${place}`, [{ needs: [entry.path], value: (of) => of[entry.path] as number, formula: `as given: ${entry.path}`, source: 'the case' }]));
    }
    definitions.push(...surfaceDefinitions(on, keys, place, exists));
    if (layers.length > 0) {
      definitions.push(...layerDefinitions(place, layers));
    }
  });
  return { definitions, laws, materials: names };
}

/** What the tables of surfaces say of a wall, where the case does not give it; the ends of a table are the scatter. */
function surfaceDefinitions(on: Case, keys: ReadonlyMap<string, Entry>, place: string, exists: (id: string) => boolean): Definition[] {
  const named = keys.get('surface');
  if (typeof named?.value !== 'string') return [];
  const surface = placed(named, on.file, () => loadSurface(named.value as string));
  const way = (id: 'sandGrain' | 'emissivity', known: SurfaceValue | undefined): Definition[] => {
    if (known === undefined || keys.has(id) || (id === 'sandGrain' && keys.has('Ra')) || !exists(id)) return [];
    return [ways(`${id}@${place}`, [{ needs: [], as: 'assumed', value: () => known.value, scatter: Math.max(known.high / known.value, known.value / known.low) - 1, formula: `table: ${surface.name}`, source: known.source }])];
  };
  return [...way('sandGrain', surface.sandGrain), ...way('emissivity', surface.emissivity)];
}

/** The sand grain of a wall whose roughness is known by a stylus. The middle of the band on a logarithmic scale. */
const grainOfStylus = (place: string, path: string): Definition => ways(`sandGrain@${place}`, [{ needs: [path], as: 'assumed', scatter: 0.41, value: (of) => 4.24 * (of[path] as number), formula: 'k_s = 4.24 Ra', source: 'common practice, k_s from 3 to 6 Ra; 5.863 Ra in Adams, Grant and Watson, Int. J. Mech. Eng. Mechatron. 1 (2012) 66, from memory' }]);

/** Whether a temperature of the wall is that of its outer face: with layers, unless the case says otherwise. */
export const outerFace = (keys: ReadonlyMap<string, Entry>, layered: boolean): boolean => layered && keys.get('at')?.value !== 'wetted-face';

function layersOf(on: Case, keys: ReadonlyMap<string, Entry>, materials: Collection | undefined, add: (name: string, law: Law) => void, named: (material: WallSolid) => void): Layer[] {
  const out: Layer[] = [];
  for (let i = 0; ; i++) {
    const thickness = keys.get(`layers.${i}.thickness`);
    const material = keys.get(`layers.${i}.material`);
    const conductivity = keys.get(`layers.${i}.thermalConductivity`);
    if (thickness === undefined && material === undefined && conductivity === undefined) return out;
    const any = (thickness ?? material ?? conductivity) as Entry;
    if (thickness === undefined) throw new Problem({ code: 'no-thickness', message: 'a layer of the wall has no thickness', file: on.file, ...any.position, expected: 'thickness: 1.5 mm' });
    const path = any.path.slice(0, any.path.lastIndexOf('.'));
    if (conductivity !== undefined) out.push({ thickness: thickness.path, conductivity: conductivity.path });
    else if (typeof material?.value === 'string') {
      const solid = placed(material, on.file, () => loadMaterial(material.value as string, materials));
      const law = placed(material, on.file, () => solidLaw(solid, 'thermalConductivity'));
      if (law === undefined) throw new Problem({ code: 'no-conductivity', message: `the record of ${solid.name} has no thermal conductivity`, file: on.file, ...material.position, expected: 'thermalConductivity beside the thickness' });
      const id = `${path}.thermalConductivity`;
      const melt = solid.record.acrossMelting;
      named({ name: solid.name, path: material.path, outermost: !keys.has(`layers.${i + 1}.thickness`), ...(solid.meltingTemperature === undefined ? {} : { melts: solid.meltingTemperature }), ...(melt === undefined ? {} : { melt }) });
      add(id, law.law);
      out.push({ thickness: thickness.path, conductivity: id, law: { name: id, formula: law.about.formula, source: law.about.source, ...(law.about.temperature === undefined ? {} : { range: law.about.temperature }) } });
    } else throw new Problem({ code: 'no-conductivity', message: 'a layer of the wall has neither a material nor a conductivity', file: on.file, ...thickness.position, expected: 'material: copper, or thermalConductivity: 0.04 W/(m K)' });
  }
}
