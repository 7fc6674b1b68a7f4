import type { Case, wallEntries } from '../case/index.ts';
import type { Flow } from '../flows/index.ts';
import { features } from '../quantities/index.ts';
import { Problem } from '../problems/index.ts';
import { loadSurface } from '../properties/index.ts';
import { asksForSpecies, carriedWords, hasLightGas, reacts } from './carried.ts';
import { wallPlaces } from './leaves.ts';
import { outerFace } from './wall-definitions.ts';

/** Words of the case that select ways and that rules may ask for, with those that were taken without being said. */
export interface Facts {
  readonly words: Readonly<Record<string, string>>;
  readonly assumed: readonly { readonly id: string; readonly says: string }[];
}

/** What counts for each wall, by key. */
export type WallKeys = ReturnType<typeof wallEntries>;

const featureKeys: Readonly<Record<(typeof features)[number], (on: Case, walls: WallKeys) => boolean>> = {
  species: (c) => c.has('species'),
  reactions: (c) => c.has('reactions'),
  particles: (c) => c.has('particles') || ['bubbles', 'drops'].includes(c.word('otherFluid.meets') ?? ''),
  otherFluid: (c) => c.has('otherFluid'),
  rheology: (c) => c.has('rheology'),
  magneticField: (c) => c.has('magneticField'),
  frame: (c) => c.has('frame'),
  motion: (c) => c.has('motion'),
  porous: (c) => c.has('porous') || c.has('packing'),
  period: (c) => c.has('time.period'),
  ramp: (c) => c.has('time.ramp'),
  swirl: () => false,
  humidity: (c) => c.has('fluid.humidity'),
  solution: (c) => c.has('fluid.composition'),
  burning: (c) => c.has('burning'),
  roughness: (_, w) => any(w, 'sandGrain') || any(w, 'Ra') || [...w.values()].some((keys) => hasGrain(keys.get('surface')?.value)),
  layers: (c) => c.list('wall.layers').length > 0 || c.list('walls').some((w) => c.list(`walls.${w}.layers`).length > 0),
  gravity: (c) => c.has('gravity'),
  sources: (c) => c.has('sources') || c.has('drive.heatRelease'),
  wallMotion: (_, w) => any(w, 'speed') || any(w, 'rotation'),
  speciesWall: (c) => c.list('species').some((name) => c.has(`species.${name}.wall`)) || reacts(c, 'wall') || reacts(c, 'catalyst'),
  severalSpecies: (c) => c.list('species').length > 1,
  fluidReaction: (c) => reacts(c, 'fluid'),
  surfaceReaction: (c) => reacts(c, 'wall') || reacts(c, 'catalyst'),
  catalystReaction: (c) => reacts(c, 'catalyst'),
  filmReaction: (c) => reacts(c, 'interface'),
  reactionHeat: (c) => c.list('reactions').some((name) => c.has(`reactions.${name}.enthalpy`)),
  partHeated: (_, w) => { const heated = [...w.values()].filter((keys) => heating.some((key) => keys.has(key))).length; return heated > 0 && heated < w.size; },
};

/** Whether the tables know a sand grain of a surface; an unknown name is told where the walls are read. */
const hasGrain = (name: unknown): boolean => {
  if (typeof name !== 'string') return false;
  try {
    return loadSurface(name).sandGrain !== undefined;
  } catch (error) {
    if (!(error instanceof Problem)) throw error;
    return false;
  }
};

/** Keys by which heat passes a wall. */
const heating = ['temperature', 'heatFlux', 'heat', 'heatTransferCoefficient'];

const any = (walls: WallKeys, key: string): boolean => [...walls.values()].some((keys) => keys.has(key));

/**
 * The words of a case.
 *
 * @param on      the case
 * @param flow    its flow
 * @param walls   what counts for each wall
 * @param target  whether a target is thermal, momentum, a peak, a mean over the walls
 * @param medium  state of matter of the fluid where it is known
 * @returns      words by id; the flow's own words win
 */
export function factsOf(on: Case, flow: Flow, walls: WallKeys, target: { readonly heat: boolean; readonly thermal: boolean; readonly momentum: boolean; readonly peak: boolean; readonly mean: boolean }, medium: 'gas' | 'liquid' | 'solid' | undefined): Facts {
  const assumed: { id: string; says: string }[] = [];
  const yes = (b: boolean): string => (b ? 'yes' : 'no');
  const words: Record<string, string> = {};
  const take = (id: string, value: string, says: string): void => {
    words[id] = value;
    assumed.push({ id, says });
  };
  for (const f of features) words[`has.${f}`] = yes(featureKeys[f](on, walls));
  words['imposedFlow'] = yes(['inlet.speed', 'inlet.volumeFlow', 'inlet.massFlow', 'inlet.totalPressure', 'inlets', 'drive', 'motion'].some((k) => on.has(k)) || words['has.wallMotion'] === 'yes');
  words['targetHeat'] = yes(target.heat);
  words['targetMomentum'] = yes(target.momentum);
  words['targetSpecies'] = yes(asksForSpecies(on));
  words['lightGas'] = yes(hasLightGas(on));
  Object.assign(words, carriedWords(on, medium, take));
  words['targetPeak'] = yes(target.peak);
  words['targetMean'] = yes(target.mean);
  words['energySolved'] = yes(target.thermal || heated(on));
  words['character'] = on.word('time.character') ?? 'unknown';
  words['volumeFlowState'] = on.get('inlet.volumeFlow')?.reference ?? 'inlet';
  words['rheologyLaw'] = on.word('rheology.law') ?? 'newtonian';
  words['fluidGiven'] = on.has('fluid.material') ? 'material' : 'constants';
  if (medium !== undefined) {
    words['medium'] = medium;
    words['transparency'] = medium === 'gas' ? 'transparent' : 'opaque';
  }
  for (const [k, name] of (flow.walls.length === 0 ? ['wall'] : flow.walls).entries()) {
    const place = wallPlaces(flow.walls)[k] as string;
    const has = (key: string): boolean => walls.get(name)?.has(key) === true;
    const kind = has('temperature') ? 'temperature' : has('heatFlux') || has('heat') ? 'flux' : has('heatTransferCoefficient') ? 'coefficient' : 'adiabatic';
    words[`wallKind@${place}`] = kind;
    const keys = walls.get(name) ?? new Map<string, never>();
    words[`wallFace@${place}`] = kind === 'temperature' && !outerFace(keys, [...keys.keys()].some((key) => key.startsWith('layers.'))) ? 'wetted' : 'outer';
    if (kind === 'adiabatic' && !has('adiabatic') && words['energySolved'] === 'yes') assumed.push({ id: `wallKind@${place}`, says: `${place} is adiabatic: no temperature, flux or coefficient is given` });
  }
  const profile = on.word('inlet.profile');
  if (profile !== undefined) words['inletProfile'] = profile;
  else if (words['imposedFlow'] === 'no') words['inletProfile'] = 'none';
  else take('inletProfile', 'uniform', 'the inlet profile is uniform: it is not given, and the profile develops inside');
  const third = ['depth', 'width', 'span'].find((key) => flow.sizes.some((s) => s.key === key && s.infinite === true));
  if (third !== undefined && on.word(`sizes.${third}`) === 'infinite') words['infiniteDepth'] = 'yes';
  else if (third !== undefined && !on.has(`sizes.${third}`)) take('infiniteDepth', 'yes', `sizes.${third} is infinite: it is not given`);
  else words['infiniteDepth'] = 'no';
  take('storage', 'cell-centred', 'the solver keeps its unknowns in cell centres');
  words['ductSection'] = 'other';
  const confinement = on.word('confinement');
  if (confinement !== undefined) words['generalConfinement'] = confinement;
  const facing = on.word('facing');
  if (facing !== undefined) words['plateFacing'] = facing;
  return { words: { ...words, ...flow.words }, assumed: assumed.filter((a) => flow.words[a.id] === undefined) };
}

/** Two temperatures of the case differ, or heat enters. */
function heated(on: Case): boolean {
  const seen: number[] = [];
  let heat = false;
  for (const entry of on.entries.values()) {
    const key = entry.path.slice(entry.path.lastIndexOf('.') + 1);
    if (entry.path.startsWith('targets.') || entry.path.startsWith('reactions.') || typeof entry.value !== 'number') continue;
    if (key === 'temperature' || key === 'totalTemperature') {
      seen.push(entry.value);
      if (entry.range !== undefined) seen.push(entry.range.from, entry.range.to);
    } else if ((key === 'heat' || key === 'heatFlux' || key === 'heatRelease') && entry.value !== 0) heat = true;
  }
  return heat || seen.some((t) => Math.abs(t - (seen[0] as number)) > 1e-9) || on.list('reactions').some((name) => (on.number(`reactions.${name}.enthalpy`) ?? 0) !== 0);
}
