import type { Case, Entry } from '../case/index.ts';
import { Problem, type ProblemData } from '../problems/index.ts';
import { componentsMean, loadMaterial, mixtureOf, shippedMaterials, solutionShare, type Collection, type Component, type Material, type State } from '../properties/index.ts';
import { fluidLaws, type MaterialLaws } from './material-laws.ts';
import { referenceDensity } from './reference-density.ts';

const assumedPressure = 101325;
const assumedTemperature = 293.15;

/** The fluid of a case: its material with the state that settles its phase, or constants alone. */
export interface Fluid {
  readonly material?: Material;
  readonly laws?: MaterialLaws;
  readonly medium?: 'gas' | 'liquid' | 'solid';
  readonly state: State;
  /** Paths taken without being given, with the SI value. */
  readonly assumed: Readonly<Record<string, number>>;
}

/** A problem that came from a value of the case, with the place of that value. */
export function placed<T>(entry: Entry | undefined, file: string, make: () => T): T {
  try {
    return make();
  } catch (error) {
    if (!(error instanceof Problem) || entry === undefined) throw error;
    // What a state takes as words, a case takes as keys.
    throw new Problem(error.list.map((p): ProblemData => ({ file, ...entry.position, ...p, ...(p.expected === undefined ? {} : { expected: p.expected.replace(/^(humidity|composition) (?=\d)/, '$1: ') }) })));
  }
}

const placedAt = (entry: Entry | undefined, file: string, one: ProblemData): Problem => new Problem({ file, ...entry?.position, ...one });

/**
 * Loads the fluid of a case.
 *
 * @param on         the case
 * @param materials  the collection
 * @returns          material, laws, state of matter; where pressure or temperature is not given, standard pressure and 20 degC are taken and listed
 * @throws           {Problem} unknown-material, impossible-state, at the place of the value
 */
export function fluidOf(on: Case, materials: Collection | undefined): Fluid {
  const assumed: Record<string, number> = {};
  const pressure = on.number('fluid.pressure') ?? on.number('inlet.totalPressure');
  const humidity = on.number('fluid.humidity');
  // Relative humidity is that of the air at rest around a body, not of the film at its wall.
  const around = humidity === undefined ? undefined : on.number('surroundings.temperature');
  const temperature = on.number('inlet.temperature') ?? on.number('fluid.temperature') ?? on.number('inlet.totalTemperature') ?? on.number('initial.temperature') ?? around ?? middle(on);
  const entry = on.get('fluid.material');
  const parts = componentsOf(on);
  const alone = on.get('fluid.composition');
  const firstPart = alone ?? on.get(`fluid.composition.${parts[0]?.name ?? ''}`);
  if (typeof entry?.value !== 'string') {
    if (firstPart !== undefined) throw placedAt(firstPart, on.file, { code: 'composition-without-material', message: 'a composition is given without a material', ...(componentsMean('', parts, materials ?? shippedMaterials()) ?? { expected: 'fluid: { material: gas mixture, composition: ... } for gases, or a solution such as propylene glycol-water', nearest: 'material: gas mixture' }) });
    const density = on.number('fluid.density');
    const said = on.word('fluid.medium') as Fluid['medium'];
    // A fluid of constants need not say its state of matter: the density tells.
    const medium = said ?? (density === undefined ? undefined : density > 50 ? 'liquid' : 'gas');
    if (medium === 'liquid' || medium === 'solid') gasFlowOnly(on, medium);
    return { state: { temperature: temperature ?? assumedTemperature, pressure: pressure ?? assumedPressure }, ...(medium === undefined ? {} : { medium }), assumed };
  }
  if (pressure === undefined) assumed['fluid.pressure'] = assumedPressure;
  if (temperature === undefined) assumed['fluid.temperature'] = assumedTemperature;
  const name = entry.value;
  const known = placed(entry, on.file, () => loadMaterial(name, materials));
  if (alone !== undefined && known.takes.includes('components')) throw placedAt(alone, on.file, { code: 'wrong-composition', message: `${known.name} has several components, and one share is given`, expected: 'composition: { oxygen: 21 % mol, nitrogen: 79 % mol }' });
  const byComponents = known.takes.includes('components') && parts.length > 0;
  const material = byComponents ? placed(firstPart ?? entry, on.file, () => mixtureOf(known, parts, materials)) : known;
  const composition = parts.length > 0 && material.takes.includes('composition') ? placed(firstPart, on.file, () => solutionShare(material, parts, materials)) : alone !== undefined && material.takes.includes('composition') ? placed(alone, on.file, () => solutionShare(material, [{ name: material.name, share: alone.value as number, ...(alone.basis === undefined ? {} : { basis: alone.basis }) }], materials)) : undefined;
  const state: State = {
    temperature: meltOf(on, material) ?? temperature ?? assumedTemperature,
    pressure: pressure ?? assumedPressure,
    ...(humidity === undefined ? {} : { humidity }),
    ...(composition === undefined ? {} : { composition }),
    ...(material.asked === undefined ? {} : { phase: material.asked }),
  };
  const laws = placed(on.get('fluid.pressure') ?? entry, on.file, () => fluidLaws(material, state));
  const medium = laws.phase === 'liquid' ? 'liquid' : laws.phase === 'solid' ? 'solid' : 'gas';
  if (medium !== 'gas') gasFlowOnly(on, medium);
  const counted = on.get('inlet.volumeFlow')?.reference === undefined ? undefined : referenceDensity(material, state);
  return { material, laws: counted === undefined ? laws : { ...laws, laws: { ...laws.laws, flowStateDensity: counted.law }, about: { ...laws.about, flowStateDensity: counted.about } }, medium, state, assumed };
}

/** Normal and standard conditions count gases: said of anything else they are a slip. */
function gasFlowOnly(on: Case, medium: 'liquid' | 'solid'): void {
  const entry = on.get('inlet.volumeFlow');
  if (entry?.reference !== undefined) throw placedAt(entry, on.file, { code: 'no-reference-state', message: `a ${entry.reference} volume flow counts a gas, and the fluid is a ${medium} here`, expected: 'the volume flow at the state of the inlet, or massFlow' });
}

/** Share by mole of what absorbs heat radiation in a mixture of gases; undefined for any other fluid. */
export function absorbingShare({ material }: Fluid): number | undefined {
  const thermodynamics = material?.record.thermodynamics;
  if (thermodynamics?.model !== 'gas-mixture') return undefined;
  const shares = thermodynamics.constants['shares'] as Readonly<Record<string, number>>;
  return (shares['water'] ?? 0) + (shares['carbon-dioxide'] ?? 0);
}

/** Shares of the components that the case gives, in its order. */
function componentsOf(on: Case): Component[] {
  return on.list('fluid.composition').flatMap((name) => {
    const found = on.get(`fluid.composition.${name}`);
    return typeof found?.value === 'number' ? [{ name, share: found.value, ...(found.basis === undefined ? {} : { basis: found.basis }) }] : [];
  });
}

/** What flows where a solid melts is the melt: its state lies between the melting point and the hottest wall. */
function meltOf(on: Case, { meltingTemperature: melting }: Material): number | undefined {
  if (on.word('initial.state') !== 'solid' || melting === undefined) return undefined;
  const hottest = Math.max(...wallTemperatures(on));
  return hottest > melting ? (melting + hottest) / 2 : undefined;
}

/** Middle of the wall and surroundings temperatures, where nothing else tells the state. */
function middle(on: Case): number | undefined {
  const found = wallTemperatures(on);
  return found.length === 0 ? undefined : (Math.min(...found) + Math.max(...found)) / 2;
}

function wallTemperatures(on: Case): number[] {
  return [...on.entries.values()].filter((e) => /^(walls?\..*temperature|surroundings\.temperature)$/.test(e.path) && typeof e.value === 'number').map((e) => e.value as number);
}
