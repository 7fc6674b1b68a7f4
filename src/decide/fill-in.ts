import { printNumber } from '../units/index.ts';
import type { Workings } from '../workings/index.ts';
import { placedId } from './facts.ts';

/** Text with the numbers put in for the ids in braces. */
export function fillIn(text: string, workings: Workings, place: string | undefined): string {
  return text.replaceAll(/\{([^}]*)\}/g, (_, named: string) => {
    const i = workings.index.get(placedId(workings, named, place));
    if (i === undefined || !workings.known(i)) return 'not known';
    const slot = workings.slots[i];
    if (slot === undefined || slot.isWord) return workings.wordAt(i) ?? 'not known';
    return printNumber({ value: workings.value(i), unit: slot.node.about.unit });
  });
}
