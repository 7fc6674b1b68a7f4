import { generalDefinitions, massAnalogy } from '../../src/quantities/index.ts';
import { leavesOf } from '../../src/assemble/leaves.ts';
import { vocabulary } from '../../src/assemble/vocabulary.ts';
import { meshDefinitions } from '../../src/mesh/index.ts';
import { timeDefinitions } from '../../src/time/index.ts';
import { numericsDefinitions } from '../../src/numerics/index.ts';
import { costDefinitions } from '../../src/cost/index.ts';
import { definitionsOfVerdicts } from '../../src/decide/index.ts';
import type { Flow } from '../../src/flows/index.ts';
import { joinDefinitions, quantity, way, Workings, type Definition, type Given, type Laws, type Places } from '../../src/workings/index.ts';

/** Units of the paths of a case file for a flow. */
export function pathUnits(flow: Flow): ReadonlyMap<string, string> {
  return new Map(leavesOf(vocabulary, flow.id, flow.walls, () => []).map((leaf) => [leaf.path, leaf.unit]));
}

const general = [...generalDefinitions, ...meshDefinitions, ...timeDefinitions, ...numericsDefinitions, ...costDefinitions, ...definitionsOfVerdicts()];

/** General definitions, those of the flow, and as plain leaves whatever a way needs that none of them defines: the paths of a case above all. A factor nobody defines is 1. */
export function definitionsOf(flow: Flow): Definition[] {
  const own = [...general, ...flow.definitions, ...massAnalogy(flow.definitions), ...(flow.carried ?? [])];
  const paths = pathUnits(flow);
  const known = new Set(own.flatMap((d) => ('more' in d ? [] : [d.id])));
  const leaves = new Map<string, string>(flow.sizes.map((s) => [`sizes.${s.key}`, s.unit]));
  const named = (d: Definition): string[] => ('more' in d ? d.more : d.ways).flatMap((w) => [...w.needs, ...(w.closes === undefined ? [] : [w.closes])]);
  for (const d of own) {
    for (const id of [...named(d), ...('more' in d ? [d.id] : [])]) {
      const plain = id.split('@')[0] as string;
      if (!known.has(plain) && !leaves.has(plain)) leaves.set(plain, paths.get(plain) ?? meshUnits[plain] ?? '1');
    }
  }
  return [...own, ...[...leaves].map(([id, unit]) => quantity(id, { symbol: id, name: id, unit, ...(id.startsWith('region') ? { per: ['region' as const] } : {}) }, /Factor[A-Z]/.test(id) ? [one] : []))];
}
const one = way({ needs: [], value: () => 1, formula: 'F = 1', source: 'stand-in' });

/** Stand-ins while no mesh definition gives them. */
const meshUnits: Readonly<Record<string, string>> = { regionAlong: 'm', regionAcross: 'm', regionSpan: 'm' };

export function placesOf(flow: Flow): Places {
  const walls = flow.walls.length === 0 ? ['wall'] : flow.walls.map((w) => `walls.${w}`);
  return { of: { wall: walls, station: flow.stations, region: flow.regions }, target: { wall: flow.targetWall === undefined ? (walls[0] as string) : `walls.${flow.targetWall}`, station: 'target' } };
}

/** A graph of the flow with its words and the given numbers and words; properties given hold at every state. */
export function workingsOf(flow: Flow, given: Readonly<Record<string, number | string>>, laws: Laws = {}): Workings {
  const states = ['', 'Wall', 'Bulk', 'Film', 'Hot', 'Cold'];
  const properties = ['density', 'viscosity', 'thermalConductivity', 'specificHeatCapacity', 'thermalExpansion'];
  const numbers: Record<string, Given> = {};
  for (const [id, value] of Object.entries({ ...flow.words, inletProfile: 'developed', ...given })) {
    if (properties.includes(id)) for (const s of states) numbers[`${id}${s}`] = { value };
    else numbers[id] = { value };
  }
  return new Workings(joinDefinitions(definitionsOf(flow), placesOf(flow)), numbers, laws);
}
