import type { Case, Target, Tolerance } from '../case/index.ts';
import { speciesNamed, targetSpecies } from './carried.ts';
import { nearestName } from '../problems/index.ts';
import type { Quantity, Workings } from '../workings/index.ts';
import type { TargetNode } from './target-definitions.ts';

/** A target of the case bound to a quantity, or words that name none. */
export interface BoundTarget {
  /** `targets.0`, as the path in the case. */
  readonly id: string;
  /** Quantity id, or the words of the case. */
  readonly quantity: string;
  readonly place?: string;
  readonly mean?: string;
  readonly within?: Tolerance;
  /** The tool estimates it. */
  readonly computed: boolean;
  /** Ids near to words that name none. */
  readonly nearest?: readonly string[];
}

/**
 * The case with the words of its targets replaced by the id they spell: `pressure drop`, `Strouhal number`, or the full name.
 *
 * @param on     the case
 * @param known  quantities by id
 * @returns      the same case where nothing is replaced
 */
export function spelt(on: Case, known: ReadonlyMap<string, Quantity>): Case {
  const plain = (text: string): string => text.toLowerCase().replace(/[ ,-]/g, '').replace(/number$/, '');
  const idOf = (quantity: string): string => {
    const wanted = plain(quantity);
    for (const [id, { name, unit }] of known) if (unit !== 'word' && (id.toLowerCase() === wanted || plain(name) === wanted)) return id;
    return quantity;
  };
  const isNumber = (q: Quantity | undefined): boolean => q !== undefined && q.unit !== 'word';
  const targets = on.targets.map((t): Target => (isNumber(known.get(t.quantity.split('@')[0] as string)) ? t : { ...t, quantity: idOf(t.quantity) }));
  return targets.some((t, k) => t.quantity !== on.targets[k]?.quantity) ? { ...on, targets } : on;
}

/** What kind of answer the targets ask for. */
export interface TargetKinds {
  /** Heat or mass transfer. */
  readonly heat: boolean;
  readonly thermal: boolean;
  readonly momentum: boolean;
  readonly peak: boolean;
  readonly mean: boolean;
}

const heatUnits = ['K', 'W', 'W/m^2', 'W/(m^2 K)', 'm^2 K/W'];
const heatWords = /temperature|heat|nusselt|evaporat|condens|melt/i;
const massUnits = ['kg/(m^2 s)'];
const massWords = /sherwood|concentration|mass ?transfer|conversion|massFraction/i;
const momentumUnits = ['Pa', 'N', 'N m', 'Pa/m'];
const momentumWords = /pressure|drag|lift|force|torque|shear|friction|skin|loss/i;
const overWalls = ['pressureDrop', 'heatRate', 'outletTemperature', 'outletMassFraction', 'massTransferRate', 'frictionFactorDarcy', 'nusselt', 'heatTransferCoefficient', 'massFlow', 'volumeFlow'];

/**
 * What the targets ask for, before there is a graph.
 *
 * @param on    the case
 * @param unit  SI unit of a quantity id, undefined where no definition has it
 */
export function kindsOf(on: Case, unit: (id: string) => string | undefined): TargetKinds {
  const is = (units: readonly string[], wording: RegExp): boolean => on.targets.some((t) => { const u = unit(t.quantity); return (u !== undefined && units.includes(u)) || wording.test(t.quantity); });
  return {
    heat: is(heatUnits, heatWords) || is(massUnits, massWords),
    thermal: is(heatUnits, heatWords),
    momentum: is(momentumUnits, momentumWords),
    // The peak of a temperature is a hot spot; other peaks, and all rms, are peaks in time.
    peak: on.targets.some((t) => t.mean === 'rms' || (t.mean === 'peak' && !/temperature/i.test(t.quantity)) || /spectrum|fluctuation|swing|rms/i.test(t.quantity)),
    mean: on.targets.some((t) => overWalls.includes(t.quantity)),
  };
}

/** Binds targets to quantities: a peak to the peak, a place to its wall, else the plain id. */
export function bindTargets(on: Case, workings: Workings, walls: readonly string[]): BoundTarget[] {
  const ids = [...workings.index].filter(([id, i]) => !/[.@]/.test(id) && workings.slots[i]?.isWord === false).map(([id]) => id);
  return on.targets.map((t) => {
    const id = triesOf(on, t, walls).find((one) => workings.has(one));
    return {
      id: t.path,
      quantity: id ?? t.quantity,
      ...(t.place === undefined ? {} : { place: t.place }),
      ...(t.mean === undefined ? {} : { mean: t.mean }),
      ...(t.within === undefined ? {} : { within: t.within }),
      computed: id !== undefined && workings.get(id) !== undefined,
      ...(id === undefined ? { nearest: nearIds(t.quantity, ids) } : {}),
    };
  });
}

/** Ids a target may stand for, the most particular first. */
function triesOf(on: Case, t: Target, walls: readonly string[]): string[] {
  // Plain ids stand for one species; another is named by its place.
  const named = speciesNamed(on, [t]);
  const species = targetSpecies(on).species === `species.${named}` ? undefined : named;
  const wall = walls.find((w) => t.place !== undefined && t.place.toLowerCase().split(/[\s,]+/).includes(w));
  const outlet = t.place !== undefined && /\boutlet\b/i.test(t.place);
  const plain = [...(t.mean === 'peak' ? [`${t.quantity}Peak`] : []), ...(outlet ? [`${t.quantity}Outlet`] : [])];
  return [...(wall === undefined ? [] : plain.map((id) => `${id}@walls.${wall}`)), ...plain, ...(wall === undefined ? [] : [`${t.quantity}@walls.${wall}`]), ...(species === undefined ? [] : [`${t.quantity}@species.${species}`]), t.quantity];
}

/**
 * Targets that some definition estimates, before there is a graph.
 *
 * @param on     the case
 * @param known  quantities by id, all but those of the case itself
 * @param walls  names of the walls of the flow
 */
export function estimated(on: Case, known: ReadonlyMap<string, Quantity>, walls: readonly string[]): TargetNode[] {
  return on.targets.flatMap((target) => {
    for (const id of triesOf(on, target, walls)) {
      const [plain, place] = id.split('@') as [string, string?];
      const about = known.get(plain);
      if (about === undefined || about.unit === 'word' || (place !== undefined && (about.per ?? []).join() !== (place.startsWith('species.') ? 'species' : 'wall'))) continue;
      return [{ target, id, unit: about.unit, name: about.name }];
    }
    return [];
  });
}

/** The id that was misspelt, else those alike. */
function nearIds(text: string, ids: readonly string[]): readonly string[] {
  const near = nearestName(text, ids);
  return near === undefined ? alike(text, ids) : [near];
}

/** Ids that share a word with what was written, two where it has several; those with most of them first, then the shortest. */
function alike(text: string, ids: readonly string[]): string[] {
  const parts = text.replace(/([a-z])([A-Z])/g, '$1 $2').toLowerCase().split(/[^a-z]+/).filter((w) => w.length > 3);
  const shared = (id: string): number => parts.filter((w) => id.toLowerCase().includes(w)).length;
  return ids.filter((id) => shared(id) >= Math.max(1, Math.min(2, parts.length))).sort((a, b) => shared(b) - shared(a) || a.length - b.length).slice(0, 3);
}
