import type { PiGroups } from '../quantities/index.ts';
import { wrapped } from './wrap.ts';

/**
 * The screen of `groups`: how many groups there are and why, then each with its name.
 *
 * @param found  groups, rank, names that stand in none
 * @returns      text without a last newline, at most 80 columns wide but for longer names
 */
export function groupsText({ groups, rank, alone }: PiGroups): string {
  const quantities = groups.length + rank;
  const count = `${quantities} ${quantities === 1 ? 'quantity' : 'quantities'} less rank ${rank} of their dimensions: ${groups.length === 0 ? 'no group' : groups.length === 1 ? '1 group' : `${groups.length} groups`}`;
  return [
    wrapped(count, ''),
    ...groups.flatMap((group, i) => ['', wrapped(group.text, ' '.repeat(6), `${String(i + 1).padStart(3)}.  `), ...(group.known === undefined ? [] : [wrapped(group.known, ' '.repeat(6))])]),
    ...(alone.length === 0 ? [] : ['', wrapped(`In no group: ${alone.join(', ')}. Nothing else carries that dimension: it does not matter, or a quantity is missing.`, '')]),
  ].join('\n');
}
