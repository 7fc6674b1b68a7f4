import { lines, type Ground } from '../ground.ts';
import { aFlow, called, effectsOf, listed } from '../say.ts';
import type { Line } from '../types.ts';

/** What the plan does not cover, said first and loudly. */
export function gapLines(on: Ground): Line[] {
  const { targets, flow } = on.assembled;
  const unjudged = effectsOf(on).filter((e) => !e.judged && e.applies !== false);
  const certain = unjudged.filter((e) => e.applies === true);
  const perhaps = unjudged.filter((e) => e.applies !== true);
  const choices = on.decisions.choices.filter((c) => c.judged === false && c.applies !== false);
  const open = targets.filter((t) => !t.computed);
  const scaleless = ['length', 'speed', 'regimeGroup'].filter((id) => !on.has(id));
  return lines(
    certain.length > 0 && `NOT COVERED: ${listed(certain.map(called))} ${certain.length === 1 ? 'acts' : 'act'} in this case and ${certain.length === 1 ? 'is' : 'are'} not judged yet (${listed(certain.map((e) => e.because))}). Until someone does, this plan does not hold for it.`,
    perhaps.length > 0 && `Not judged, and it cannot be told whether they act: ${listed(perhaps.map((e) => e.id))}.`,
    choices.length > 0 && `Choices that the plan does not make yet: ${listed(choices.map((c) => c.title.toLowerCase()))}.`,
    open.length > 0 && `No estimate, no price and no budget for ${listed(open.map((t) => t.quantity))}: decisions above do not look at ${open.length === 1 ? 'it' : 'them'}.`,
    scaleless.length > 0 && `Without ${listed(scaleless.map((id) => (id === 'regimeGroup' ? 'the group of its regime' : `a ${id} scale`)))} most numbers of ${aFlow(on)} are missing.`,
    on.ladder.length === 0 && `No known answer is on record for this ${flow.title.toLowerCase()} as it stands: the ladder is empty.`,
  );
}
