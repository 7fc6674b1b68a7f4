import type { Assembled } from '../assemble/index.ts';
import { rungsOf } from '../flows/index.ts';
import { references, type Reference } from '../references/index.ts';
import { spreads } from '../workings/index.ts';

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
  readonly order?: number;
  /** Needs of the reference by id, SI, as this case fills them. */
  readonly inputs: Readonly<Record<string, number>>;
}

/**
 * The ladder of a case: the rungs of its flow whose conditions hold, with predicted number, band and limit.
 *
 * @param assembled  the settled case
 * @returns          rungs, simplest first
 */
export function ladderDetails(assembled: Assembled): RungDetail[] {
  const { workings, flow } = assembled;
  return rungsOf(flow).flatMap(({ id, quantity, rung }): RungDetail[] => {
    const reference = references.find((r) => r.id === rung.reference);
    if (reference === undefined) return [];
    const holds = Object.entries(rung.when ?? {}).every(([word, wanted]) => {
      const at = workings.word(word);
      return at !== undefined && (typeof wanted === 'string' ? [wanted] : wanted).includes(at);
    });
    if (!holds) return [];
    const value = workings.get(quantity);
    const spread = spreads(workings, [quantity]).get(quantity);
    const unit = reference.values.find((v) => v.id === rung.compares)?.unit ?? '1';
    const limit = value === undefined ? { quantity, unit } : { quantity, atLeast: Math.min(value * (1 - rung.limit), value * (1 + rung.limit)), atMost: Math.max(value * (1 - rung.limit), value * (1 + rung.limit)), unit };
    const inputs = Object.fromEntries(Object.entries(rung.with).flatMap(([need, from]) => { const v = workings.get(from); return v === undefined ? [] : [[need, v]]; }));
    return [{
      rung: { id, changes: rung.changes, quantity, ...(value === undefined ? {} : { value }), ...(spread === undefined ? {} : { low: spread.low, high: spread.high }), limit, ifMissed: rung.ifMissed },
      reference,
      ...(rung.order === undefined ? {} : { order: rung.order }),
      inputs,
    }];
  });
}

/** The rungs alone, as the plan states them. */
export function ladderOf(assembled: Assembled): CaseRung[] {
  return ladderDetails(assembled).map((d) => d.rung);
}
