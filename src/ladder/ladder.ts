import type { Assembled } from '../assemble/index.ts';
import { rungInputs, rungsOf, type NamedRung } from '../flows/index.ts';
import { evaluateReference, references, type EvaluatedTable, type Reference } from '../references/index.ts';
import { spreads } from '../workings/index.ts';
import { leftOutEffect } from './effects.ts';

/** One rung of the ladder of this case. */
export interface CaseRung {
  readonly id: string;
  /** The one thing that is new against the rung before. */
  readonly changes: string;
  readonly quantity: string;
  readonly value?: number;
  readonly low?: number;
  readonly high?: number;
  readonly limit: { readonly quantity: string; readonly atLeast?: number; readonly atMost?: number; readonly unit: string };
  readonly ifMissed: string;
}

/** A rung with the reference it stands on, for words and tables. */
export interface RungDetail {
  readonly rung: CaseRung;
  readonly reference: Reference;
  /** Number of the reference that is compared. */
  readonly compares: string;
  /** Quantity that holds the relative tolerance. */
  readonly tolerance: string;
  /** Quantity that holds the distance of the answer from this case. */
  readonly distance: string;
  readonly order?: number;
  /** Needs of the reference by id, SI, as this case fills them. */
  readonly inputs: Readonly<Record<string, number>>;
  /** Ids of the case among them; those that the rung fixes by a number are not. */
  readonly from: readonly string[];
}

/** A rung of the flow that this case does not climb. */
export interface SkippedRung {
  readonly id: string;
  readonly changes: string;
  /** The effect that is left out, or the word of the case that the rung is not for. */
  readonly because: { readonly effect: string } | { readonly word: string; readonly is?: string };
}

/**
 * The ladder of a case: the rungs of its flow whose conditions hold, with predicted number, band and limit.
 *
 * @param assembled  the settled case
 * @returns          rungs with a reference, simplest first
 */
export function ladderDetails(assembled: Assembled): RungDetail[] {
  return rungsOf(assembled.flow).flatMap((named): RungDetail[] => {
    const reference = references.find((r) => r.id === named.rung.reference);
    return reference === undefined || skipped(assembled, named) !== undefined ? [] : [detail(assembled, named, reference)];
  });
}

/** The rungs of the flow that the case does not climb, each with its reason. */
export function skippedRungs(assembled: Assembled): SkippedRung[] {
  return rungsOf(assembled.flow).flatMap((named) => { const because = skipped(assembled, named); return because === undefined ? [] : [{ id: named.id, changes: named.rung.changes, because }]; });
}

function skipped({ workings }: Assembled, { rung }: NamedRung): SkippedRung['because'] | undefined {
  for (const [word, wanted] of Object.entries(rung.when ?? {})) {
    const at = workings.word(word);
    if (at === undefined || !(typeof wanted === 'string' ? [wanted] : wanted).includes(at)) return word.startsWith('verdict.') ? { effect: word.slice(8) } : { word, ...(at === undefined ? {} : { is: at }) };
  }
  const effect = leftOutEffect(workings, rung.reference);
  return effect === undefined ? undefined : { effect };
}

function detail({ workings }: Assembled, { id, quantity, tolerance, distance, rung }: NamedRung, reference: Reference): RungDetail {
  const value = workings.get(quantity);
  const allowed = workings.get(tolerance) ?? rung.limit;
  const spread = spreads(workings, [quantity]).get(quantity);
  const unit = reference.values.find((v) => v.id === rung.compares)?.unit ?? '1';
  const { from, fixed } = rungInputs(rung);
  const filled = Object.fromEntries(from.flatMap(([need, one]) => { const v = workings.get(one); return v === undefined ? [] : [[need, v]]; }));
  return {
    rung: { id, changes: rung.changes, quantity, ...(value === undefined ? {} : { value }), ...(spread === undefined ? {} : { low: spread.low, high: spread.high }), limit: value === undefined ? { quantity: tolerance, atMost: allowed, unit: '1' } : { quantity, ...bounds(rung.reference, value, allowed), unit }, ifMissed: rung.ifMissed },
    reference,
    compares: rung.compares,
    tolerance,
    distance,
    ...(rung.order === undefined ? {} : { order: rung.order }),
    inputs: { ...fixed, ...filled },
    from: from.map(([, one]) => one),
  };
}

/** An order of accuracy may be beaten: it has a lower limit alone, 0.4 under the order on paper. */
function bounds(reference: string, value: number | undefined, allowed: number): { atLeast?: number; atMost?: number } {
  if (value === undefined) return {};
  if (reference === 'manufactured-solution') return { atLeast: value - 0.4 };
  const width = Math.abs(value) * allowed;
  return { atLeast: value - width, atMost: value + width };
}

/** The group that decides the regime, worked out by hand from what the run itself reports: the rung before all others. */
function byHand({ workings }: Assembled): CaseRung[] {
  const quantity = ['regimeGroup', 'reynolds', 'rayleigh'].find((id) => workings.get(id) !== undefined);
  const value = quantity === undefined ? undefined : workings.get(quantity);
  if (quantity === undefined || value === undefined) return [];
  const spread = spreads(workings, [quantity]).get(quantity);
  return [{
    id: 'groups-by-hand',
    changes: 'units, properties and groups worked out by hand from what the run reports as read, before it starts',
    quantity,
    value,
    ...(spread === undefined ? {} : { low: spread.low, high: spread.high }),
    limit: { quantity, atLeast: value * 0.995, atMost: value * 1.005, unit: '1' },
    ifMissed: 'a unit, a length in the definition of the group, or the temperature at which the properties were taken',
  }];
}

/** The rungs alone, as the plan states them: by hand first, then those that stand on a reference. */
export function ladderOf(assembled: Assembled): CaseRung[] {
  return [...byHand(assembled), ...ladderDetails(assembled).map((d) => d.rung)];
}

/**
 * The profiles that a run of each rung is held against.
 *
 * @param assembled  the settled case
 * @returns          tables in SI by the name of the rung, fit for a file; rungs without tables, and those whose tables an earlier rung has, are left out
 */
export function ladderTables(assembled: Assembled): { readonly rung: string; readonly tables: readonly EvaluatedTable[] }[] {
  const seen = new Set<string>();
  return ladderDetails(assembled).flatMap(({ rung, reference, inputs }) => {
    const key = `${reference.id} ${JSON.stringify(inputs)}`;
    const { tables } = evaluateReference(reference, inputs);
    if (tables.length === 0 || seen.has(key)) return [];
    seen.add(key);
    return [{ rung: rung.id.replaceAll(':', '-'), tables }];
  });
}
