import type { Ground } from './ground.ts';
import { hazardClasses } from './hazard-classes.ts';
import type { HazardView } from './hazard-view.ts';
import { wordOf } from './hazard-words.ts';

/** A class of danger that the case touches, with the number that set it off. */
export interface Hazard {
  readonly id: string;
  readonly title: string;
  /** With quantities in braces. */
  readonly text: string;
}

const kept = new WeakMap<Ground, readonly Hazard[]>();

/**
 * The hazards of a case, the worst first. A class whose test is false stays away.
 *
 * @param on  the ground of the plan
 * @returns   each class once, with what set it off
 */
export function hazardsOf(on: Ground): readonly Hazard[] {
  const had = kept.get(on);
  if (had !== undefined) return had;
  const view = viewOf(on);
  const found = hazardClasses.flatMap(({ id, title, why, means }): Hazard[] => {
    const because = why(view);
    return because === undefined ? [] : [{ id, title, text: `${title}: ${because}. ${means}` }];
  });
  kept.set(on, found);
  return found;
}

function viewOf(on: Ground): HazardView {
  return {
    ...on,
    atLeast: (a, b) => (on.number(a) ?? Number.NaN) >= (on.number(b) ?? Number.NaN),
    below: (a, b) => (on.number(a) ?? Number.NaN) < (on.number(b) ?? Number.NaN),
    open: (id) => { const e = on.effect(id); return e !== undefined && e.applies !== false && e.verdict !== 'leave-out'; },
    mark: (mark, ...where) => wordOf(on.assembled, mark, where),
    given: (path) => { const v = on.assembled.case.number(path); return v !== undefined && v !== 0; },
  };
}
