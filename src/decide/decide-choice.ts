import type { ChoiceState } from './choose.ts';
import { titleOf } from './ids.ts';
import { fillIn } from './fill-in.ts';
import type { State } from './settle.ts';

/** One choice as the plan states it. */
export interface ChoiceDecision {
  readonly id: string;
  readonly title: string;
  readonly applies: boolean | 'unknown';
  /** False: a choice not built yet. */
  readonly judged?: false;
  readonly chosen: string;
  readonly given?: true;
  readonly advised?: string;
  readonly because: string;
  readonly rejected: readonly { readonly option: string; readonly because: string }[];
  readonly check?: string;
  readonly sources?: readonly string[];
}

/** A settled choice in words. */
export function choiceOutput(id: string, state: State): ChoiceDecision {
  const c = state.choices.get(id) as ChoiceState;
  const head = { id, title: c.rule?.title ?? titleOf(id), applies: c.applies, ...(c.rule === undefined ? { judged: false as const } : {}), chosen: c.chosen, ...(c.given ? { given: true as const } : {}) };
  if (c.rule === undefined) return { ...head, because: c.given ? 'stated in the case' : 'not judged: no rule decides it yet', rejected: [] };
  const sources = [...(c.entry?.source === undefined ? [] : [c.entry.source]), ...c.rule.sources];
  const rejected = c.applies === false ? [] : Object.entries(c.rule.options).filter(([option]) => option !== c.chosen).map(([option, because]) => ({ option, because }));
  return {
    ...head,
    ...(c.given && c.advised !== undefined && c.advised !== c.chosen ? { advised: c.advised } : {}),
    because: reason(c, state),
    rejected,
    ...(c.entry?.check === undefined ? {} : { check: c.entry.check }),
    ...(sources.length === 0 ? {} : { sources }),
  };
}

function reason(c: ChoiceState, state: State): string {
  const parts: string[] = [];
  if (c.given) parts.push(c.advised === undefined || c.advised === c.chosen ? 'stated in the case' : `stated in the case; advised is ${c.advised}`);
  if (c.applies === false) parts.push(`not called for: ${c.whyNot.join('; ')}`);
  if (c.entry !== undefined) parts.push(fillIn(c.entry.because, state.point.workings, undefined));
  else if (c.applies !== false && !c.given) parts.push('no option fits what is known');
  if (c.assumed.length > 0) parts.push(`taken as if ${c.assumed.join(', ')} counted, which ${c.assumed.length === 1 ? 'is' : 'are'} undecided`);
  if (c.lacking.length > 0 && c.entry === undefined) parts.push(`not known: ${c.lacking.join(', ')}`);
  return parts.join('; ');
}
