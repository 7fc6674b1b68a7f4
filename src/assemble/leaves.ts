import type { Field, Fields, MapField, Vocabulary } from '../case/index.ts';
import { quantity, ways, type Definition, type Way } from '../workings/index.ts';

/** Names under which lists of the case stand, by the path of the list: what exists decides which leaves there are. */
export type Items = (path: string) => readonly string[];

/** A path of the case that can hold a number, and the quantities it gives. */
export interface Leaf {
  readonly path: string;
  readonly unit: string;
  readonly name: string;
  readonly gives: readonly string[];
}

/**
 * Every path of the case file at which a number may stand, for a flow and the lists a case has.
 *
 * @param vocabulary  keys of the case file
 * @param flow        id of the flow
 * @param walls       names of the flow's walls; empty for a lone wall
 * @param items       names or places of the items of a list
 * @returns           leaves; the ids they give are complete (`wallTemperature@walls.left`)
 */
export function leavesOf(vocabulary: Vocabulary, flow: string, walls: readonly string[], items: Items): Leaf[] {
  const out: Leaf[] = [];
  const visit = (fields: Fields, path: string, places: readonly string[]): void => {
    for (const [key, field] of Object.entries(fields)) one(field, path === '' ? key : `${path}.${key}`, places);
  };
  const one = (field: Field, path: string, places: readonly string[]): void => {
    switch (field.kind) {
      case 'quantity': {
        // Which face a wall temperature belongs to is told by its walls, not by the key alone.
        const gives = (field.gives ?? []).filter((id) => id !== 'wallTemperature@' && id !== 'outerTemperature@').flatMap((id) => (id.endsWith('@') ? places.map((p) => `${id}${p}`) : [id]));
        out.push({ path, unit: field.unit, name: field.name ?? field.doc, gives });
        break;
      }
      case 'map':
        visit(field.keys, path, path === 'wall' ? (walls.length === 0 ? ['wall'] : []) : places.length > 0 ? places : [path]);
        break;
      case 'sizes':
        visit(vocabulary.flows[flow]?.sizes ?? {}, 'sizes', []);
        break;
      case 'list':
        list(field.item, field.names === 'walls', path, places);
        break;
      default:
    }
  };
  const list = (item: MapField, ofWalls: boolean, path: string, places: readonly string[]): void => {
    const own = (name: string): readonly string[] => (places.length === 0 ? [`${path}.${name}`] : places);
    if (!ofWalls) for (const name of items(path)) visit(item.keys, `${path}.${name}`, own(name));
    else {
      // A group such as `sides` speaks for its members; it stands first, so that a wall's own value counts before it.
      for (const group of items(path).filter((name) => !walls.includes(name))) visit(item.keys, `${path}.${group}`, walls.filter((w) => vocabulary.wallGroups[group]?.includes(w)).map((w) => `${path}.${w}`));
      for (const name of walls) visit(item.keys, `${path}.${name}`, [`${path}.${name}`]);
    }
  };
  visit(vocabulary.keys, '', []);
  return out;
}

/** Places of the walls of a flow: `wall` where it is alone. */
export function wallPlaces(walls: readonly string[]): string[] {
  return walls.length === 0 ? ['wall'] : walls.map((w) => `walls.${w}`);
}

/**
 * Leaves as quantities, and the ways from them to what they give.
 *
 * @param leaves  from `leavesOf`
 * @param exists  whether a quantity is defined (without its place)
 */
export function leafDefinitions(leaves: readonly Leaf[], exists: (id: string) => boolean): Definition[] {
  const own = leaves.filter((l) => !exists(l.path)).map((l) => quantity(l.path, { symbol: l.path.slice(l.path.lastIndexOf('.') + 1), name: l.name, unit: l.unit, signed: true }));
  const given = leaves.flatMap((l) => l.gives.filter((id) => id !== l.path && exists(id.split('@')[0] as string)).map((id): Definition => {
      const identity: Way = { needs: [l.path], value: (of) => of[l.path] as number, formula: `as given: ${l.path}`, source: 'the case' };
      return ways(id, [identity]);
    }));
  return [...own, ...given];
}
