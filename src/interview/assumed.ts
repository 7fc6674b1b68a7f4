import { vocabulary, type Assumption } from '../assemble/index.ts';
import { fieldAt } from '../case/index.ts';
import { settle, type State as Decided } from '../decide/index.ts';
import { heatKeys } from './alternatives.ts';
import { fitted } from './question.ts';
import type { Asked } from './question.ts';
import type { Desk, Settled } from './state.ts';
import type { View } from './view.ts';

/** Something taken without being given: where it could be given, and what else it might be. */
interface Taken {
  readonly paths: readonly string[];
  readonly says: string;
  readonly fact: string;
  readonly others: readonly (string | number)[];
}

/**
 * The assumption of which another answer changes most, found by trying the others.
 *
 * @param desk  how a case becomes a graph
 * @param view  the answers so far
 * @returns     what to ask, with the decisions and targets that may change; undefined where none would
 */
export function weightiestAssumption(desk: Desk, view: View): Asked | undefined {
  const open = taken(view).filter((one) => one.paths.every(view.can));
  if (open.length === 0) return undefined;
  const trial = new Trial(desk.settle(view.on));
  const tried = open.map((one) => ({ ...one, changes: trial.changes(one) })).filter((one) => one.changes.length > 0).sort((a, b) => b.changes.length - a.changes.length);
  const first = tried[0];
  if (first === undefined) return undefined;
  return { paths: first.paths, why: fitted(`${first.says}, which bears on: `, first.changes), settles: first.changes };
}

function taken(view: View): Taken[] {
  const { assumptions, workings, flow } = view.settled.assembled;
  const heat = (place: string): string[] => heatKeys().map((key) => `${place}.${key}`);
  const heatless: Taken[] = workings.word('energySolved') === 'no' ? [{ paths: heat('wall'), says: 'no heat is assumed', fact: 'energySolved', others: ['yes'] }] : [];
  return [...heatless, ...assumptions.flatMap((one) => named(one, view, flow.sizes.find((size) => size.infinite === true)?.key, heat))];
}

/** Where an assumption could be answered. */
function named({ id }: Assumption, view: View, endless: string | undefined, heat: (place: string) => string[]): Taken[] {
  const { workings } = view.settled.assembled;
  const [fact, place] = id.split('@') as [string, string?];
  const now = workings.word(id);
  const words = (workings.slots[workings.index.get(id) ?? -1]?.node.about.words ?? []).filter((word) => word !== now && word !== 'none');
  if (fact === 'wallKind' && place !== undefined) return [{ paths: heat(place), says: `${place} is taken as adiabatic`, fact: id, others: words }];
  if (fact === 'inletProfile') return [{ paths: ['inlet.profile'], says: `${now} is assumed`, fact: id, others: words }];
  if (fact === 'infiniteDepth' && endless !== undefined) return [{ paths: [`sizes.${endless}`], says: 'infinite is assumed', fact: id, others: words }];
  const field = fieldAt(vocabulary, view.on.flow, id)?.field;
  const value = workings.get(id);
  if (field?.kind !== 'quantity' || value === undefined || view.on.has(id)) return [];
  // A pressure may well be half or twice what is taken, a temperature 20 K off.
  return [{ paths: [id], says: `${field.unit === 'K' ? '20 degC' : '1 atm'} is assumed`, fact: id, others: field.unit === 'K' ? [value - 20, value + 20] : [value / 2, value * 2] }];
}

/** A graph of its own in which assumptions are tried. */
class Trial {
  readonly #on: Settled;
  readonly #before: Decided;
  readonly #targets: ReadonlyMap<string, number>;

  constructor(on: Settled) {
    this.#on = on;
    this.#before = this.#settle();
    this.#targets = this.#numbers();
  }

  /** Ids of effects whose verdict and of targets whose value changes with some other answer. */
  changes({ fact, others }: Taken): string[] {
    const { workings } = this.#on.assembled;
    const was = workings.word(fact) ?? workings.get(fact);
    const changed = new Set<string>();
    for (const other of others) {
      workings.set(fact, other);
      const now = this.#settle();
      for (const [id, effect] of now.effects) {
        const before = this.#before.effects.get(id);
        if (before?.verdict !== effect.verdict || before.applies !== effect.applies) changed.add(id);
      }
      for (const [id, value] of this.#numbers()) if (Math.abs(value - (this.#targets.get(id) ?? Number.NaN)) > this.#accuracy(id)) changed.add(this.#name(id));
    }
    workings.set(fact, was);
    this.#settle();
    return [...changed];
  }

  #settle(): Decided {
    const { assembled, rules, targets } = this.#on;
    return settle(assembled.workings, rules, targets, { askable: (id) => assembled.askable(id), chosen: assembled.chosen });
  }

  #numbers(): Map<string, number> {
    const { workings, targets } = this.#on.assembled;
    return new Map(targets.flatMap((target) => { const value = workings.get(target.quantity); return value === undefined ? [] : [[target.id, value] as const]; }));
  }

  #accuracy(id: string): number {
    return this.#on.assembled.workings.get(`${id}.accuracy`) ?? Number.POSITIVE_INFINITY;
  }

  #name(id: string): string {
    return this.#on.assembled.targets.find((target) => target.id === id)?.quantity ?? id;
  }
}
