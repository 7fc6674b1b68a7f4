import { wallEntries, type Case } from '../case/index.ts';
import { costDefinitions } from '../cost/index.ts';
import { flows, rungDefinitions, type Flow } from '../flows/index.ts';
import { meshDefinitions } from '../mesh/index.ts';
import { numericsDefinitions } from '../numerics/index.ts';
import { Problem } from '../problems/index.ts';
import { type Collection, type Material, type State } from '../properties/index.ts';
import { carriedDefinitions, commonDefinitions, givenPropertyWays, isProperty, massAnalogy, materialWays, rheologyWays } from '../quantities/index.ts';
import { timeDefinitions } from '../time/index.ts';
import { joinDefinitions, ways, Workings, type Definition, type Given, type Quantity } from '../workings/index.ts';
import { carries, moleculeDefinitions, reactionDefinitions, targetSpecies } from './carried.ts';
import { chosenOf } from './chosen.ts';
import { factsOf } from './facts.ts';
import { absorbingShare, fluidOf } from './fluid.ts';
import { givenOf, type Range } from './given.ts';
import { leafDefinitions, leavesOf, wallPlaces, type Leaf } from './leaves.ts';
import { targetDefinitions } from './target-definitions.ts';
import { toleranceWays } from './tolerance-ways.ts';
import { bindTargets, estimated, kindsOf, spelt, type BoundTarget } from './targets.ts';
import { validationDefinitions } from './validation-definitions.ts';
import { vocabulary } from './vocabulary.ts';
import { wallDefinitions, type WallPart } from './wall-definitions.ts';

export interface AssembleOptions {
  /** Definitions of the words that rules fill. */
  readonly words?: readonly Definition[];
  /** Materials to look in; the shipped ones unless given. */
  readonly materials?: Collection;
}

/** Something taken without being given. */
export interface Assumption {
  readonly id: string;
  readonly says: string;
}

/** Case, material, flow and definitions in one graph. */
export interface Assembled {
  readonly case: Case;
  readonly flow: Flow;
  readonly workings: Workings;
  readonly targets: readonly BoundTarget[];
  readonly ranges: readonly Range[];
  readonly fluid?: Material;
  /** The state that settles the phase of the fluid, with its humidity or composition. */
  readonly fluidState: State;
  readonly wallMaterials: WallPart['materials'];
  readonly phaseFlags: readonly string[];
  readonly assumptions: readonly Assumption[];
  /** Paths that no number follows from. */
  readonly unused: readonly string[];
  /** Choices the case states, by choice id. */
  readonly chosen: Readonly<Record<string, string>>;
  readonly leaves: readonly Leaf[];
  /** Whether the user can give a number at a path. */
  readonly askable: (id: string) => boolean;
}

/** Everything that is defined whatever the case, and what each flow adds: for the build of rules and for tests. */
export function allDefinitions(): Definition[] {
  return [...general(true), ...Object.values(flows).flatMap((f) => ownOf(f, true))];
}

const general = (carried: boolean): Definition[] => [...commonDefinitions, ...(carried ? carriedDefinitions : []), ...meshDefinitions, ...timeDefinitions, ...numericsDefinitions, ...costDefinitions];

/** What a flow brings; for a species its laws of heat serve by analogy. */
const ownOf = (flow: Flow, carried: boolean): Definition[] => [...flow.definitions, ...(carried ? [...massAnalogy(flow.definitions), ...(flow.carried ?? [])] : [])];

/**
 * Joins a case with its flow, fluid, walls and all definitions into one graph.
 *
 * @param read     the case
 * @param options  rule words, materials
 * @returns        the graph and what belongs to it
 * @throws         {Problem} flow-not-built, unknown-material, impossible-state and the like, at the place of the value
 */
export function assemble(read: Case, options: AssembleOptions = {}): Assembled {
  const flow = flowOf(read);
  const carried = carries(read);
  const base: Definition[] = [...general(carried), ...(options.words ?? []), ...ownOf(flow, carried), ...rungDefinitions(flow)];
  const known = new Map<string, Quantity>();
  for (const d of base) if (!('more' in d)) known.set(d.id, d);
  const exists = (id: string): boolean => known.has(id);
  const unitOf = (id: string): string | undefined => known.get(id)?.unit;
  const on = spelt(read, known);
  const walls = wallEntries(on, flow.walls, vocabulary);
  const fluid = fluidOf(on, options.materials);
  const absorbing = absorbingShare(fluid);
  const facts = factsOf(on, flow, walls, kindsOf(on, unitOf), fluid.medium);
  const wall = wallDefinitions(on, flow, walls, options.materials, exists);
  const leaves = leavesOf(vocabulary, on.flow, flow.walls, (path) => on.list(path)).map((leaf) => (leaf.unit.includes('^n') ? { ...leaf, unit: leaf.unit.replace('^n', `^${on.number('rheology.index') ?? 1}`) } : leaf));
  const { given, ranges } = givenOf(on);
  const assumed: Record<string, Given> = Object.fromEntries(Object.entries(fluid.assumed).map(([path, value]) => [path, { value, kind: 'assumed' as const }]));
  const ownLeaves = extraLeaves(on, leaves, exists);
  const asked = estimated(on, known, flow.walls);
  const definitions: Definition[] = [
    ...base,
    ...(carried ? moleculeDefinitions(on, fluid.material?.name ?? on.word('fluid.material')) : []),
    ...leafDefinitions([...leaves, ...ownLeaves], exists),
    ways('inletTemperature', ['inlet.temperature', 'fluid.temperature', 'inlet.totalTemperature', 'initial.temperature'].map((path) => ({ needs: [path], value: (of: Readonly<Record<string, number>>) => of[path] as number, formula: `T_in as given: ${path}`, source: 'the case' }))),
    ...wall.definitions,
    ...(carried ? reactionDefinitions(on) : []),
    ...(fluid.laws === undefined ? [] : materialWays(fluid.laws.about)),
    ...(absorbing === undefined ? [] : [ways('absorbingShare', [{ needs: [], value: () => absorbing, formula: 'x_a = x_w + x_c', source: 'composition of the mixture' }])]),
    ...targetDefinitions(on, asked),
    ...validationDefinitions(asked),
    ...toleranceWays(on, unitOf),
    ...[...on.entries.keys()].flatMap((path) => (path.startsWith('fluid.') && isProperty(path.slice(6)) ? givenPropertyWays(path.slice(6), path) : [])),
    ...(on.has('rheology') ? rheologyWays() : []), // tried before a viscosity that is given beside the law: one number is no law
  ];
  const places = {
    of: { wall: wallPlaces(flow.walls), station: flow.stations, region: flow.regions, inlet: on.list('inlets').map((n) => `inlets.${n}`), species: on.list('species').map((n) => `species.${n}`), reaction: on.list('reactions').map((n) => `reactions.${n}`), particle: on.list('particles').map((n) => `particles.${n}`) },
    target: { wall: targetWall(on, flow, walls), station: 'target', ...targetSpecies(on) },
  };
  const nodes = joinDefinitions(definitions, places, fixedWords(facts.words, flow));
  const words = Object.fromEntries(Object.entries(facts.words).map(([id, value]) => [id, { value, kind: facts.assumed.some((a) => a.id === id) ? ('assumed' as const) : ('given' as const) }]));
  const workings = new Workings(nodes, { ...words, ...assumed, ...given }, { ...fluid.laws?.laws, ...wall.laws });
  const paths = new Set(leaves.map((l) => l.path));
  return {
    case: on,
    flow,
    workings,
    targets: bindTargets(on, workings, flow.walls),
    ranges,
    ...(fluid.material === undefined ? {} : { fluid: fluid.material }),
    fluidState: fluid.state,
    wallMaterials: wall.materials,
    phaseFlags: fluid.laws?.flags ?? [],
    assumptions: [
      ...Object.keys(fluid.assumed).map((id) => ({ id, says: id === 'fluid.pressure' ? 'the pressure is 1 atm: it is not given' : 'the temperature is 20 degC: it is not given' })),
      ...facts.assumed,
      ...[...on.entries.values()].flatMap((e) => e.assumed.map((says) => ({ id: e.path, says }))),
      ...on.warnings.map((says) => ({ id: 'case', says })),
    ],
    // Looked for only where it is read: it walks the whole graph.
    get unused() {
      return [...on.entries.values()].filter((e) => e.kind === 'quantity' && !e.path.startsWith('targets.') && e.path !== 'format' && !e.path.startsWith('computing.') && !(fluid.material !== undefined && e.path.startsWith('fluid.composition')) && isUnused(workings, e.path)).map((e) => e.path);
    },
    chosen: chosenOf(on),
    leaves,
    askable: (id) => paths.has(id),
  };
}

/** Words that hold for good in this case: what the flow fixes, what the fluid is, which features are named. */
function fixedWords(words: Readonly<Record<string, string>>, flow: Flow): Record<string, string> {
  const fluid = ['medium', 'transparency', 'fluidGiven', 'rheologyLaw', 'volumeFlowState'];
  return Object.fromEntries(Object.entries(words).filter(([id]) => id in flow.words || fluid.includes(id) || id.startsWith('has.')));
}

function flowOf(on: Case): Flow {
  const flow = flows[on.flow];
  if (flow !== undefined) return flow;
  throw new Problem({ code: 'flow-not-built', message: `the flow ${on.flow} is known but not built yet`, file: on.file, ...on.get('flow')?.position, expected: `one of ${Object.keys(flows).join(', ')}; general takes a length and a speed and judges by analogy` });
}

/** The wall the target speaks of, else the flow's, else the first that is not adiabatic. */
function targetWall(on: Case, flow: Flow, walls: ReturnType<typeof wallEntries>): string {
  if (flow.walls.length === 0) return 'wall';
  const named = flow.walls.find((w) => on.targets.some((t) => t.place?.split(/[\s,]+/).includes(w)));
  const active = flow.walls.find((w) => ['temperature', 'heatFlux', 'heat', 'heatTransferCoefficient'].some((key) => walls.get(w)?.has(key)));
  return `walls.${named ?? active ?? flow.targetWall ?? flow.walls[0]}`;
}

/** Numbers of the case at paths that the flow does not list, so that nothing the user wrote is lost. */
function extraLeaves(on: Case, leaves: readonly Leaf[], exists: (id: string) => boolean): Leaf[] {
  const known = new Set(leaves.map((l) => l.path));
  return [...on.entries.values()].filter((e) => e.kind === 'quantity' && !known.has(e.path) && !exists(e.path) && !e.path.startsWith('targets.')).map((e) => ({ path: e.path, unit: e.unit ?? '1', name: e.path, gives: [] }));
}

function isUnused(workings: Workings, path: string): boolean {
  const i = workings.index.get(path);
  return i === undefined || workings.followers(i).length <= 1;
}
