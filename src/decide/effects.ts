import type { Workings } from '../workings/index.ts';
import { leavesOf, testOf, whyFalse } from './conditions.ts';
import { Overlaid, placedId, type FactSource, type WorkingsFacts } from './facts.ts';
import type { EffectRule, PriceLine, Verdict } from './form.ts';
import { lackingFacts, outcome, readRule, readsRegime, worse, type Interval, type Reading } from './judge.ts';
import { pricesOf, readTargets, type Read, type Target, type Weighed } from './price.ts';

export type MovedBy = 'range' | 'spread' | 'price' | 'passes';

/** What is settled about one effect at one point. */
export interface EffectState {
  readonly rule: EffectRule | undefined;
  readonly applies: boolean | 'unknown';
  /** Why it cannot occur, where it does not apply. */
  readonly whyNot: readonly string[];
  readonly judged: boolean;
  readonly verdict: Verdict;
  /** The verdict of the nominal value, before bounds, range, spread, price and passes. */
  readonly base: Verdict;
  readonly movedBy?: MovedBy;
  readonly reading?: Reading;
  readonly facts?: FactSource;
  readonly place?: string;
  /** Why a missing input does not matter: both ends of its bounds give this verdict. */
  readonly bounded?: readonly string[];
  /** The two states between which it alternates. */
  readonly between?: readonly Verdict[];
  readonly acting?: Weighed;
  readonly firstRun?: 'keep' | 'leave-out';
}

/** One point at which rules are read: facts looked up once, words of the pass laid over them, prices worked out once. */
export interface Point {
  readonly workings: Workings;
  readonly facts: WorkingsFacts;
  /** `verdict.`, `branch.` of the pass. */
  readonly words: Map<string, string>;
  readonly targets: readonly Target[];
  readonly places: (rule: EffectRule) => readonly (string | undefined)[];
  readonly rangeOf: Interval | undefined;
  readonly spreadOf: Interval | undefined;
  readonly prices: Map<string, readonly Weighed[]>;
  /** Base verdicts alone: no price is weighed, no bound tried. */
  readonly lean: boolean;
  /** The targets with their values as printed, read when the first price is asked for. */
  read: readonly Read[] | undefined;
  readonly plain: FactSource;
  readonly views: Map<EffectRule, readonly View[]>;
}
/** One reading of a rule: at a place, in a regime. */
interface View { readonly place: string | undefined; readonly regime: string; readonly facts: FactSource }

const laminar = new Map([['verdict.turbulence', 'leave-out'], ['regime', 'laminar']]);
const turbulent = new Map([['verdict.turbulence', 'include'], ['regime', 'turbulent']]);

/** The readings a rule asks for at a point: each place, and both regimes where the regime is open. */
export function viewsOf(rule: EffectRule, point: Point): readonly View[] {
  const regime = point.words.get('verdict.turbulence');
  const open = (regime === 'borderline' || regime === 'undecided') && readsRegime(rule);
  let closed = point.views.get(rule);
  if (closed === undefined) point.views.set(rule, (closed = point.places(rule).map((place) => ({ place, regime: '', facts: place === undefined ? point.plain : new Overlaid(point.facts.at(place), point.words) }))));
  return open ? closed.flatMap(({ place, facts }) => [{ place, regime: 'laminar', facts: new Overlaid(facts, laminar) }, { place, regime: 'turbulent', facts: new Overlaid(facts, turbulent) }]) : closed;
}

interface Worst { readonly reading: Reading; readonly view: View; readonly bounded?: readonly string[] }

/**
 * Judges one effect: applicability, base verdict, range, spread, price.
 *
 * @param rule   its rule
 * @param point  where it is read
 * @returns      its state; an earlier verdict of its own never enters
 */
export function judge(rule: EffectRule, point: Point): EffectState {
  const { plain } = point;
  const truth = testOf(rule.applies)(plain, false);
  if (truth === 0 && rule.applies !== undefined) return { rule, applies: false, whyNot: [...new Set(whyFalse(rule.applies, plain))], judged: true, verdict: 'leave-out', base: 'leave-out' };
  const views = viewsOf(rule, point);
  const nominal = worst(views, (view) => ({ reading: readRule(rule, view.facts), view }));
  const counted = point.lean || nominal.reading.verdict !== 'undecided' || !nominal.reading.judged || rule.branches.every((b) => b.band === undefined || b.band.bounds.length === 0) ? nominal : worst(views, (view) => bounded(rule, view, point));
  const { reading, view } = counted;
  const head = {
    rule, applies: truth === 1 || ('unknown' as const), whyNot: [], judged: reading.judged, base: reading.verdict, reading, facts: view.facts,
    ...(view.place === undefined ? {} : { place: view.place }), ...(counted.bounded === undefined ? {} : { bounded: counted.bounded }),
  };
  return reading.verdict === 'undecided' ? { ...head, verdict: 'undecided' } : { ...head, ...moved(rule, reading, views, view, point, counted.bounded !== undefined) };
}

/** The facts for want of which an effect is undecided. */
export function lackingOf(e: EffectState, point: Point): string[] {
  if (e.verdict !== 'undecided' || !e.judged || e.rule === undefined || e.facts === undefined) return [];
  const open = e.applies === 'unknown' ? leavesOf(e.rule.applies).map((l) => l.fact).filter((f) => point.plain.of(f) === undefined) : [];
  return [...new Set([...open, ...lackingFacts(e.rule, e.facts)])];
}

function worst(views: readonly View[], read: (view: View) => Worst): Worst {
  let found: Worst | undefined;
  for (const view of views) {
    const next = read(view);
    if (found === undefined || worse(next.reading.verdict, found.reading.verdict)) found = next;
  }
  return found as Worst;
}

function moved(rule: EffectRule, reading: Reading, views: readonly View[], view: View, point: Point, isBounded: boolean): Pick<EffectState, 'verdict' | 'movedBy' | 'acting' | 'firstRun'> {
  const base = reading.verdict;
  const acting = actingPrice(rule, reading.prices, view, point);
  const price = acting === undefined ? {} : { acting };
  const keep = rule.exempt || acting === undefined || acting.share > 1;
  const firstRun = keep ? ('keep' as const) : ('leave-out' as const);
  if (base === 'borderline') return { verdict: base, firstRun, ...price };
  for (const [movedBy, interval] of [['range', point.rangeOf], ['spread', point.spreadOf]] as const) {
    // What holds at both ends of a missing input has no number that a range or spread could move.
    if (interval === undefined || isBounded) continue;
    const over = worst(views, (v) => ({ reading: readRule(rule, v.facts, (id) => interval(placedId(point.workings, id, v.place))), view: v }));
    if (over.reading.verdict !== base) return { verdict: 'borderline', movedBy, firstRun, ...price };
  }
  if (acting !== undefined && ((base === 'leave-out' && acting.share > 1) || (base === 'include' && acting.share < 0.2))) return { verdict: 'borderline', movedBy: 'price', firstRun, ...price };
  return { verdict: base, ...price };
}

/** The price with the largest share of a target's tolerance, of those that may move the verdict. */
function actingPrice(rule: EffectRule, lines: readonly PriceLine[], view: View, point: Point): Weighed | undefined {
  if (rule.exempt || point.lean || lines.length === 0) return undefined;
  const all = lines.filter((l) => l.exempt !== true).flatMap((line) => weighed(line, view.facts, view.place, point, true));
  return all.filter((w) => w.price.acts).reduce<Weighed | undefined>((a, b) => (a === undefined || b.share > a.share ? b : a), undefined);
}

/** The prices of a line at a point, worked out once. */
export function weighed(line: PriceLine, facts: FactSource, place: string | undefined, point: Point, acts: boolean): readonly Weighed[] {
  if (testOf(line.when)(facts, true) !== 1) return [];
  const key = `${line.factor ?? ''}|${line.value ?? ''}|${line.of}|${place ?? ''}|${acts}`;
  let found = point.prices.get(key);
  if (found === undefined) point.prices.set(key, (found = pricesOf(point.workings, line, place, (point.read ??= readTargets(point.workings, point.targets)), acts)));
  return found;
}

/** A missing input with physical bounds is tried at both ends; one verdict at all of them stands. */
function bounded(rule: EffectRule, view: View, point: Point): Worst {
  const before = readRule(rule, view.facts);
  const plain: Worst = { reading: before, view };
  if (before.verdict !== 'undecided') return plain;
  const bounds = rule.branches.filter((b) => outcome(b, view.facts).fits !== 0).flatMap((b) => b.band?.bounds ?? []);
  const open = bounds.map((b) => ({ ...b, id: placedId(point.workings, b.input, view.place) })).filter((b) => point.workings.has(b.id) && point.workings.get(b.id) === undefined).slice(0, 3);
  if (open.length === 0) return plain;
  const readings: Reading[] = [];
  for (let corner = 0; corner < 2 ** open.length; corner++) {
    open.forEach((b, k) => point.workings.set(b.id, (corner & (1 << k)) === 0 ? b.from : b.to));
    const words = new Map(point.words);
    if (view.regime !== '') for (const [k, v] of view.regime === 'laminar' ? laminar : turbulent) words.set(k, v);
    readings.push(readRule(rule, new Overlaid(point.facts.at(view.place).fresh(), words)));
  }
  for (const b of open) point.workings.set(b.id, undefined);
  const first = readings[0] as Reading;
  if (first.verdict === 'undecided' || readings.some((r) => r.verdict !== first.verdict)) return plain;
  return { reading: first, view, bounded: open.map((b) => `${b.input} ${b.from} to ${b.to}: ${b.why}`) };
}
