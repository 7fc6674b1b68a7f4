import { isTemperature } from '../quantities/index.ts';
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
    const { unit } = slot.node.about;
    return printNumber({ value: workings.value(i), unit, ...(unit !== 'K' ? {} : isTemperature(named) ? { toUnit: 'degC' } : { difference: true }) });
  });
}
