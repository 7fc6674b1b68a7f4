import { lackingOf } from '../decide/index.ts';
import type { View } from './view.ts';

/** An input on which open decisions hang. */
export interface Hanging {
  /** The path, and its alternatives behind it. */
  readonly paths: readonly string[];
  readonly decisions: readonly string[];
  readonly targets: readonly string[];
  /** What an answer settles: for each decision one over the inputs that it lacks, for each target twice that. */
  readonly weight: number;
}

/**
 * Inputs for want of which a decision is undecided or a target has no estimate.
 *
 * @param view  the answers so far
 * @returns     the input that settles most first; of equal ones the earlier decision's
 */
export function hanging(view: View): Hanging[] {
  const { decided, settled } = view;
  const found = new Map<string, { paths: Set<string>; decisions: Set<string>; targets: Set<string>; weight: number }>();
  const count = (groups: readonly string[], of: 'decisions' | 'targets', name: string): void => {
    for (const group of groups) {
      const paths = group.split('|');
      const key = paths[0] as string;
      const at = found.get(key) ?? { paths: new Set<string>(), decisions: new Set<string>(), targets: new Set<string>(), weight: 0 };
      found.set(key, at);
      for (const path of paths) at.paths.add(path);
      at[of].add(name);
      at.weight += (of === 'targets' ? 2 : 1) / groups.length;
    }
  };
  for (const [id, effect] of decided.effects) {
    const facts = decided.point.facts.at(effect.place);
    count([...new Set(lackingOf(effect, decided.point).flatMap((fact) => view.inputs(facts.idOf(fact)) ?? []))], 'decisions', id);
  }
  for (const [id, choice] of decided.choices) if (choice.chosen === 'none') count([...new Set(choice.lacking.flatMap((fact) => view.inputs(fact) ?? []))], 'decisions', id);
  for (const target of settled.assembled.targets) if (!target.computed) count(view.inputs(target.quantity) ?? [], 'targets', target.quantity);
  return [...found.values()].map((h) => ({ paths: [...h.paths], decisions: [...h.decisions], targets: [...h.targets], weight: h.weight })).sort((a, b) => b.weight - a.weight);
}
