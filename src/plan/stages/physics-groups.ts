import type { Ground } from '../ground.ts';
import { plain } from '../say.ts';
import type { Cell } from '../types.ts';

/** Groups of the flow in the order a reader looks for them; those that decide nothing are told as such. */
const groups = ['reynolds', 'reynoldsBulk', 'prandtl', 'peclet', 'graetz', 'grashof', 'rayleigh', 'rayleighHeight', 'richardson', 'mach', 'knudsen', 'eckert', 'brinkman', 'biotWall', 'strouhal', 'schmidt', 'lewis', 'pecletMass', 'graetzMass', 'fourierMass', 'sherwood', 'grashofMass', 'damkohler', 'damkohlerDiffusive', 'thiele', 'womersley', 'froude', 'weber', 'capillary', 'cavitationNumber', 'frictionReynolds', 'stanton'];

/**
 * Rows of the table of groups: each number that decides with its limits and the decision, then the groups that only describe.
 *
 * @param on  the ground of the plan
 * @returns   symbol, name, value, limits, decision
 */
export function groupRows(on: Ground): Cell[][] {
  const { workings } = on.assembled;
  const about = (id: string): { symbol: string; name: string } => workings.slots[workings.index.get(id) ?? -1]?.node.about ?? { symbol: id, name: id };
  const deciding = on.decisions.effects.flatMap((e): Cell[][] => {
    if (e.deciding === undefined || e.applies === false) return [];
    const { quantity, leaveOutAt, includeAt } = e.deciding;
    return [[about(quantity).symbol, about(quantity).name, { id: quantity }, `${leaveOutAt <= includeAt ? 'below' : 'above'} ${plain(leaveOutAt)}`, `${leaveOutAt <= includeAt ? 'from' : 'at most'} ${plain(includeAt)}`, `${e.title}: ${e.verdict}`]];
  });
  const used = new Set(on.decisions.effects.flatMap((e) => (e.deciding === undefined ? [] : [e.deciding.quantity])));
  const rest = groups.filter((id) => on.has(id) && !used.has(id)).map((id): Cell[] => [about(id).symbol, about(id).name, { id }, '', '', 'describes the flow']);
  return [...rest, ...deciding];
}
