import type { Assembled } from '../assemble/index.ts';
import { rungInputs, rungsOf } from '../flows/index.ts';
import { nearestName, Problem } from '../problems/index.ts';
import { references, type Reference } from '../references/index.ts';

/** A known answer with its inputs, filled from a case. */
export interface FilledReference {
  readonly reference: Reference;
  /** SI numbers by the id of the need. */
  readonly inputs: Readonly<Record<string, number>>;
  /** Where each comes from: an id of the case, or the number that the rung fixes. */
  readonly from: Readonly<Record<string, string>>;
  /** Relative tolerance of the rung; absent where the answer is no rung of this ladder. */
  readonly tolerance?: number;
  readonly ifMissed?: string;
  /** The number of the answer that the rung compares. */
  readonly compares?: string;
}

/**
 * A known answer for a case, by the name of a rung or of a reference: needs are filled as the rung says, the rest by the ids they carry.
 *
 * @param assembled  the settled case
 * @param name       `turbulent-pipe`, `turbulent-pipe:nusselt`, or any reference
 * @returns          the reference with its inputs
 * @throws           {Problem} unknown-reference, with the nearest name
 */
export function fillReference(assembled: Assembled, name: string): FilledReference {
  const { flow, workings } = assembled;
  const named = rungsOf(flow).find((r) => r.id === name);
  const reference = references.find((r) => r.id === (named?.rung.reference ?? name));
  if (reference === undefined) {
    const known = [...rungsOf(flow).map((r) => r.id), ...references.map((r) => r.id)];
    const nearest = nearestName(name, known);
    throw new Problem({ code: 'unknown-reference', message: `"${name}" is neither a rung of this ladder nor a known answer`, expected: 'a name of the ladder of `runbrief plan`, or of `runbrief reference`', ...(nearest === undefined ? {} : { nearest }) });
  }
  const { from, fixed } = named === undefined ? { from: [], fixed: {} } : rungInputs(named.rung);
  const mapped = new Map(from);
  const inputs: Record<string, number> = { ...fixed };
  const sources: Record<string, string> = Object.fromEntries(Object.entries(fixed).map(([need, value]) => [need, String(value)]));
  for (const need of reference.needs) {
    const id = mapped.get(need.id) ?? need.id;
    const value = need.id in fixed ? undefined : workings.get(id);
    if (value === undefined) continue;
    inputs[need.id] = value;
    sources[need.id] = id;
  }
  const tolerance = named === undefined ? undefined : workings.get(named.tolerance);
  return { reference, inputs, from: sources, ...(tolerance === undefined ? {} : { tolerance }), ...(named === undefined ? {} : { ifMissed: named.rung.ifMissed, compares: named.rung.compares }) };
}
