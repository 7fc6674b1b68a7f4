import { referenceNumber, references } from '../references/index.ts';
import { quantity, type Definition, type Way } from '../workings/index.ts';
import type { Flow, Rung } from './define.ts';

/** A rung with its id in the plan and the quantity that holds its predicted number. */
export interface NamedRung {
  readonly id: string;
  readonly quantity: string;
  readonly rung: Rung;
}

/** Rungs of a flow by id: a rung is named after its reference, a second one of the same reference by what it compares as well. */
export function rungsOf(flow: Flow): NamedRung[] {
  const seen = new Set<string>();
  return flow.ladder.map((rung) => {
    const id = seen.has(rung.reference) ? `${rung.reference}:${rung.compares}` : rung.reference;
    seen.add(rung.reference);
    return { id, quantity: `rung.${id}`, rung };
  });
}

/**
 * The predicted numbers of a flow's rungs as quantities: references evaluated for this case, traced like any other number.
 *
 * @param flow  the flow
 * @returns     one definition a rung
 */
export function rungDefinitions(flow: Flow): Definition[] {
  return rungsOf(flow).flatMap(({ quantity: id, rung }) => {
    const ref = references.find((r) => r.id === rung.reference);
    const answer = ref?.values.find((v) => v.id === rung.compares);
    if (ref === undefined || answer === undefined) return [];
    // Only what is mapped, or carries the name of a quantity of the case, is filled in; the rest keeps the default of the reference.
    const pairs = Object.entries(rung.with).filter(([, from]) => !isNumber(from));
    const fixed = Object.fromEntries(Object.entries(rung.with).filter(([, from]) => isNumber(from)).map(([need, from]) => [need, Number(from)]));
    const own = answer.uncertainty ?? ref.uncertainty;
    const at = (of: Readonly<Record<string, number>>): ReturnType<typeof referenceNumber> => referenceNumber(ref, rung.compares, { ...fixed, ...Object.fromEntries(pairs.map(([need, from]) => [need, of[from]])) });
    const scatter = typeof own === 'function' ? (of: Readonly<Record<string, number>>): number => at(of)?.uncertainty ?? ref.uncertainty : own;
    const w: Way = {
      needs: pairs.map(([, from]) => from),
      value: (of) => at(of)?.value ?? Number.NaN,
      formula: answer.formula,
      source: `reference ${ref.id}: ${ref.source}`,
      range: Object.fromEntries(pairs.flatMap(([need, from]) => { const range = ref.needs.find((n) => n.id === need)?.range; return range === undefined ? [] : [[from, range]]; })),
      ...(scatter === 0 ? {} : { scatter }),
      ...(rung.when === undefined ? {} : { when: rung.when }),
      dimensional: 'a reference may hold constants with units',
    };
    return [quantity(id, { symbol: answer.id, name: `${answer.name} of the rung`, unit: answer.unit, signed: answer.unit === 'K' }, [w])];
  });
}

/** A rung may fix a need by a number, where the reference is known there only. */
const isNumber = (text: string): boolean => Number.isFinite(Number(text));
