import { referenceNumber, references, type Reference } from '../references/index.ts';
import { quantity, type Definition, type Way } from '../workings/index.ts';
import type { Flow, Rung } from './define.ts';
import { distanceDefinition } from './rung-distance.ts';

/** A rung with its id in the plan and the quantities that hold its predicted number, its tolerance and its distance from the case. */
export interface NamedRung {
  readonly id: string;
  readonly quantity: string;
  readonly tolerance: string;
  readonly distance: string;
  readonly rung: Rung;
}

/** The first rung of every flow: the terms of the case in smooth fields that are chosen. */
const chosenFields: Rung = {
  reference: 'manufactured-solution',
  changes: 'smooth chosen fields with the terms of the case: the code, before any flow',
  compares: 'order',
  with: { formalOrder: 'schemeOrder' },
  limit: 0.2,
  ifMissed: 'switch terms off one by one until the order is there; then boundary values, then sources at cell centres against averages',
};

/** Rungs of a flow by id, after the one all flows share: a rung is named after its reference, a second one of the same reference by what it compares as well, a third by its place. */
export function rungsOf(flow: Flow): NamedRung[] {
  const seen = new Set<string>();
  return [chosenFields, ...flow.ladder.filter((rung) => rung.reference !== chosenFields.reference)].map((rung) => {
    const tries = [rung.reference, `${rung.reference}:${rung.compares}`];
    const id = tries.find((one) => !seen.has(one)) ?? `${rung.reference}:${rung.compares}-${seen.size}`;
    seen.add(id);
    return { id, quantity: `rung.${id}`, tolerance: `rungTolerance.${id}`, distance: `rungDistance.${id}`, rung };
  });
}

/**
 * The inputs of a rung's reference: ids of the case that fill a need, and numbers that the rung fixes.
 *
 * @param rung  the rung
 * @returns     pairs of need and id, and fixed numbers by need
 */
export function rungInputs(rung: Rung): { readonly from: readonly (readonly [string, string])[]; readonly fixed: Readonly<Record<string, number>> } {
  const pairs = Object.entries(rung.with);
  return { from: pairs.filter(([, id]) => !isNumber(id)), fixed: Object.fromEntries(pairs.filter(([, id]) => isNumber(id)).map(([need, text]) => [need, Number(text)])) };
}

/**
 * The predicted numbers of a flow's rungs as quantities, each with its tolerance: references evaluated for this case, traced like any other number.
 *
 * @param flow  the flow
 * @returns     three definitions a rung
 */
export function rungDefinitions(flow: Flow): Definition[] {
  return rungsOf(flow).flatMap(({ quantity: id, tolerance, distance, rung }) => {
    const ref = references.find((r) => r.id === rung.reference);
    const answer = ref?.values.find((v) => v.id === rung.compares);
    if (ref === undefined || answer === undefined) return [];
    // Only what is mapped is filled in; the rest keeps the default of the reference.
    const { from, fixed } = rungInputs(rung);
    const own = answer.uncertainty ?? ref.uncertainty;
    const at = (of: Readonly<Record<string, number>>): ReturnType<typeof referenceNumber> => referenceNumber(ref, rung.compares, { ...fixed, ...Object.fromEntries(from.map(([need, one]) => [need, of[one]])) });
    const scatter = typeof own === 'function' ? (of: Readonly<Record<string, number>>): number => at(of)?.uncertainty ?? ref.uncertainty : own;
    const needs = from.map(([, one]) => one);
    const when = rung.when === undefined ? {} : { when: rung.when };
    const number: Way = {
      needs,
      value: (of) => at(of)?.value ?? Number.NaN,
      formula: answer.formula,
      source: `reference ${ref.id}: ${ref.source}`,
      range: Object.fromEntries(from.flatMap(([need, one]) => { const range = ref.needs.find((n) => n.id === need)?.range; return range === undefined ? [] : [[one, range]]; })),
      ...(scatter === 0 ? {} : { scatter }),
      ...when,
      dimensional: 'a reference may hold constants with units',
    };
    const allowed: Way = { needs: typeof scatter === 'function' ? needs : [], value: (of) => Math.max(rung.limit, tolerated(ref, typeof scatter === 'function' ? scatter(of) : scatter)), ...about(ref, rung.limit), ...when, as: 'decided', dimensional: 'a reference may hold constants with units' };
    return [
      quantity(id, { symbol: answer.id, name: `${answer.name} of the rung`, unit: answer.unit, signed: answer.unit === 'K' }, [number]),
      distanceDefinition(distance, ref, from, fixed),
      quantity(tolerance, { symbol: 'W', name: 'relative tolerance of the rung', unit: '1' }, [allowed]),
    ];
  });
}

/** Errors of mesh, step and iteration that are planned for a rung: a quarter of a per cent where the answer is sharp, one per cent against data. */
const planned = (ref: Reference): number => (ref.kind === 'measured' ? 0.01 : 0.0025);
const tolerated = (ref: Reference, scatter: number): number => Math.max(0.005, 2 * Math.hypot(scatter / 2, planned(ref)));
const about = (ref: Reference, limit: number): Pick<Way, 'formula' | 'source'> => ({
  formula: `W = max(${limit}, 0.005, 2 sqrt(u_ref^2 + ${planned(ref)}^2)), u_ref half of the scatter of the answer`,
  source: 'common practice: fixed before the run and never widened by the errors of a run',
});

/** A rung may fix a need by a number, where the reference is known there only. */
const isNumber = (text: string): boolean => text.trim() !== '' && Number.isFinite(Number(text));
