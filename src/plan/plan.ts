import type * as Crypto from 'node:crypto';
import { createRequire } from 'node:module';
import { basename } from 'node:path';
import { assemble, type Assembled } from '../assemble/index.ts';
import type { Case } from '../case/index.ts';
import { decide, definitionsOfVerdicts, isKept, settle, type CompiledRules, type DecideOptions, type Decisions, type FlipInput, type State, type Target } from '../decide/index.ts';
import { ladderOf } from '../ladder/index.ts';
import type { Collection } from '../properties/index.ts';
import { flagsIn, spreads, type Settle, type Spread, type Workings } from '../workings/index.ts';
import { overBudget } from './budget.ts';
import { contradictionsOf } from './contradictions.ts';
import { phaseLeft } from './contradictions-phase.ts';
import { idsIn, type Ground, type StageResult } from './ground.ts';
import { closure, planQuantity, rangesOf } from './numbers.ts';
import { shippedRules } from './rules.ts';
import { setExponents } from './target-exponents.ts';
import { targetSpreads } from './target-spread.ts';
import { stages } from './stages/index.ts';
import { sectionNames, type Check, type Plan, type PlanChoice, type PlanEffect, type PlanQuantity, type PlanTarget, type Section, type SectionName } from './types.ts';

export interface PlanOptions {
  readonly version: string;
  readonly rules?: CompiledRules;
  readonly materials?: Collection;
  /** The case as `settleCase` left it, where it is settled already. */
  readonly settled?: Settled;
  /** Seek the values at which each input flips a verdict: costs a scan per input. */
  readonly flips?: boolean;
  /** The synchronous reading of the rules alone, without the rules engine beside it: for a screen that is wanted at once. */
  readonly quick?: boolean;
  /** Sections to write; the others stay empty. All unless given: a screen needs few of them. */
  readonly sections?: readonly SectionName[];
}

/** The graph of a case with its decisions settled: what `plan`, `trace`, `vary` and the interview stand on. */
export interface Settled {
  readonly assembled: Assembled;
  readonly rules: CompiledRules;
  readonly targets: readonly Target[];
  readonly state: State;
  readonly decideOptions: DecideOptions;
  /** Settles verdicts and choices at the point where the graph stands, spread and range left aside. */
  readonly settle: Settle;
}

/**
 * Assembles a case and settles its decisions by the synchronous reading of the rules, spread and operating range counted.
 *
 * @param on       the case
 * @param options  rules and materials
 * @returns        the graph at its nominal point
 * @throws         {Problem} what `assemble` finds
 */
export function settleCase(on: Case, options: Pick<PlanOptions, 'rules' | 'materials'> = {}): Settled {
  const rules = options.rules ?? shippedRules();
  const assembled = assemble(on, { words: definitionsOfVerdicts(rules), ...(options.materials === undefined ? {} : { materials: options.materials }) });
  const { workings, askable, chosen } = assembled;
  const targets: Target[] = assembled.targets.map((t) => ({ id: t.id, quantity: t.quantity, within: t.within, computed: t.computed }));
  const again: Settle = (at) => void settle(at, rules, targets, { askable, chosen });
  // The numbers that decide rest on no verdict and no choice: they can be had before anything is settled.
  const deciding = decidingIds(rules, workings);
  const spread = spreads(workings, deciding);
  const range = rangesOf(workings, assembled.ranges, deciding, () => undefined);
  const decideOptions: DecideOptions = {
    askable,
    chosen,
    spreadOf: (id) => spread.get(id),
    rangeOf: (id) => { const r = range.get(id); return r === undefined ? undefined : { low: r.from, high: r.to }; },
  };
  let state = settle(workings, rules, targets, decideOptions);
  if (overBudget(workings, 'medium').length > 0) {
    // Once: what follows from a cheaper choice is not asked again.
    workings.set('budget', 'over');
    state = settle(workings, rules, targets, decideOptions);
  }
  return { assembled, rules, targets, decideOptions, state, settle: again };
}

/**
 * Plans a case: every number, decision, section and check.
 *
 * @param on       the case
 * @param options  program version, rules, materials, whether flip values are sought
 * @returns        the Plan
 * @throws         {Problem} what cannot be planned, at the place of the value
 */
export async function plan(on: Case, options: PlanOptions): Promise<Plan> {
  const { assembled, rules, targets, state, decideOptions, settle: again } = options.settled ?? settleCase(on, options);
  const { workings, ranges } = assembled;
  const decisions = await decide(workings, rules, targets, { ...decideOptions, settled: state, quick: options.quick, ...(options.flips === true ? { inputs: flipInputs(assembled) } : {}) });
  const wanted = options.sections ?? sectionNames;
  targetSpreads(assembled);
  if (wanted.includes('properties')) setExponents(assembled); // no other section reads them
  const ladder = ladderOf(assembled);
  const ground = groundOf(assembled, decisions, ladder);
  const built = Object.fromEntries(sectionNames.map((name) => [name, wanted.includes(name) ? stages[name](ground) : { lines: [], tables: [] }])) as Record<SectionName, StageResult>;
  const contradictions = contradictionsOf(ground);
  const refused = phaseLeft(ground);
  const ids = closure(workings, namedIds(built, decisions, assembled, ladder));
  const spread = spreads(workings, ids);
  const range = rangesOf(workings, ranges, ids, again);
  if (ranges.length > 0) settle(workings, rules, targets, decideOptions);
  let sha256: string | undefined;
  return {
    program: `runbrief ${options.version}`,
    format: 1,
    case: { file: basename(on.file), title: on.title ?? '', get sha256() { return (sha256 ??= digest(on.text)); } },
    targets: assembled.targets.map((t) => planTarget(t, refused)),
    quantities: quantitiesOf(workings, ids, spread, range),
    effects: decisions.effects,
    choices: decisions.choices,
    ladder,
    sections: Object.fromEntries(sectionNames.map((name) => [name, { lines: built[name].lines, tables: built[name].tables }])) as Record<SectionName, Section>,
    checklist: sectionNames.flatMap((name) => built[name].checklist ?? []) as readonly Check[],
    contradictions,
  };
}

/** Digest of the case file; the library behind it is loaded here, since few commands need it. */
function digest(text: string): string {
  const { createHash } = createRequire(import.meta.url)('node:crypto') as typeof Crypto;
  return createHash('sha256').update(text).digest('hex');
}

function planTarget({ id, quantity, place, mean, within, computed, nearest = [] }: Assembled['targets'][number], refused: string | undefined): PlanTarget {
  return { id, quantity, ...(place === undefined ? {} : { place }), ...(mean === undefined ? {} : { mean }), ...(within === undefined ? {} : { within: within.written }), computed, ...(computed && refused !== undefined ? { refused } : {}), ...(nearest.length === 0 ? {} : { near: nearest }) };
}

/** Numbers the rules decide on, at their places. */
function decidingIds(rules: CompiledRules, workings: Workings): string[] {
  const plain = new Set(Object.values(rules.effects).flatMap((r) => r.branches.flatMap((b) => (b.band === undefined ? [] : [b.band.deciding]))));
  return [...workings.index.keys()].filter((id) => plain.has(id.split('@')[0] as string));
}

/** Inputs with a number, from a tenth to ten times it; temperatures within 60 K. */
function flipInputs(assembled: Assembled): FlipInput[] {
  return assembled.leaves.flatMap(({ path, unit }) => {
    const given = assembled.case.get(path);
    const value = given?.value;
    if (typeof value !== 'number' || !Number.isFinite(value) || path.startsWith('computing.')) return [];
    if (unit === 'K') return [{ path, lo: Math.max(1, value - 60), hi: value + 60 }];
    return value > 0 ? [{ path, lo: value / 10, hi: value * 10 }] : [];
  });
}

/** What every stage stands on. */
function groundOf(assembled: Assembled, decisions: Decisions, ladder: Plan['ladder']): Ground {
  const { workings } = assembled;
  const effect = (id: string): PlanEffect => decisions.effects.find((e) => e.id === id) as PlanEffect;
  const choice = (id: string): PlanChoice => decisions.choices.find((c) => c.id === id) as PlanChoice;
  return {
    assembled, decisions, ladder, effect, choice,
    has: (id) => workings.get(id) !== undefined,
    number: (id) => workings.get(id),
    word: (id) => workings.word(id),
    kept: (id) => isKept(effect(id)),
  };
}

/** Every id that stands in the plan. */
function namedIds(built: Readonly<Record<SectionName, StageResult>>, decisions: Decisions, assembled: Assembled, ladder: Plan['ladder']): Set<string> {
  const ids = new Set<string>();
  for (const { lines, tables, checklist } of Object.values(built)) {
    for (const l of lines) for (const id of l.quantities) ids.add(id);
    for (const c of checklist ?? []) for (const id of idsIn(`${c.text} ${c.limit ?? ''} ${c.where ?? ''}`)) ids.add(id);
    for (const t of tables) for (const row of t.rows) for (const cell of row) for (const id of typeof cell === 'string' ? idsIn(cell) : [cell.id]) ids.add(id);
  }
  for (const e of decisions.effects) {
    if (e.deciding !== undefined) ids.add(e.deciding.quantity);
    for (const p of e.prices ?? []) ids.add(p.of);
  }
  for (const t of assembled.targets) ids.add(t.quantity);
  for (const r of ladder) { ids.add(r.quantity); ids.add(r.limit.quantity); }
  for (const id of reliedOn) ids.add(id);
  return ids;
}

/** Numbers that other programs rely on, wherever they can be had. */
const reliedOn = 'density viscosity kinematicViscosity thermalConductivity specificHeatCapacity thermalExpansion thermalDiffusivity electricalConductivity speedOfSound speed length hydraulicDiameter temperatureDifference filmTemperature reynolds prandtl peclet grashof rayleigh richardson mach knudsen brinkman eckert biot fourier schmidt lewis pecletMass sherwood damkohler damkohlerDiffusive thiele weber froude capillary ohnesorge eotvos morton stokes womersley strouhal rossby ekman taylorCylinders dean graetz hartmann binghamNumber deborah radiationShare frictionFactorDarcy skinFrictionCoefficient wallShear frictionVelocity nusselt heatTransferCoefficient pressureDrop outletTemperature heatRate dragCoefficient sheddingFrequency boundaryLayerThickness thermalLayerThickness entranceLength entranceLengthThermal kolmogorovLength kolmogorovTime batchelorLength turbulenceIntensity turbulentKineticEnergy dissipationRate specificDissipationRate yPlusTarget firstCellHeight firstNodeDistance growthRatio layerCount layerStackHeight coreCellSize cellCount cellCountCoarse cellCountMedium cellCountFine cellPeclet timeStep timeStepLimit timeStepConvective timeStepDiffusive timeStepAcoustic timeStepCapillary timeStepReaction timeStepPeriod flowThroughTime runTime stepCount coreHours wallTime memory coreHoursFine wallTimeFine coreHoursAll'.split(' ');

function quantitiesOf(workings: Workings, ids: readonly string[], spread: ReadonlyMap<string, Spread>, range: ReadonlyMap<string, { from: number; to: number }>): Record<string, PlanQuantity> {
  const flags = flagsIn(workings);
  const out: Record<string, PlanQuantity> = {};
  for (const id of ids) {
    const q = planQuantity(workings, id, spread.get(id), range.get(id), flags(id));
    if (q !== undefined) out[id] = q;
  }
  return out;
}
