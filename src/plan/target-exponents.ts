import type { Assembled } from '../assemble/index.ts';
import { lawProperties } from '../quantities/index.ts';
import { followsLaws, type Workings } from '../workings/index.ts';

/**
 * How the targets follow the properties of the fluid: `targets.0.per.viscosity` and the like are set in the graph, an exponent, for a temperature
 * the change by 1 %.
 *
 * @param assembled  the settled case
 */
export function setExponents({ workings, targets }: Assembled): void {
  const found = targets.filter((t) => t.computed).map(({ id, quantity }) => ({ id, share: inKelvin(workings, quantity) ? 0.01 : 1, by: follows(workings, quantity) }));
  for (const { id, share, by } of found) for (const [property, n] of by) workings.set(`${id}.per.${property}`, share * n);
}

const inKelvin = (workings: Workings, id: string): boolean => workings.slots[workings.index.get(id) ?? -1]?.node.about.unit === 'K';

/** How a quantity follows the properties of the fluid: by its laws, or by the numbers that the case gives for them. Properties it does not follow are left out. */
function follows(workings: Workings, quantity: string): Map<string, number> {
  const found = followsLaws(workings, quantity);
  const out = new Map<string, number>();
  const step = 0.01;
  for (const { id } of lawProperties) {
    const path = `fluid.${id}`;
    const given = workings.get(path);
    const at = workings.get(quantity);
    const law = found.get(id);
    if (law !== undefined) out.set(id, law);
    else if (given !== undefined && at !== undefined) {
      const [up, down] = [1 + step, 1 - step].map((f) => workings.aside([[path, given * f]], () => workings.get(quantity))) as [number | undefined, number | undefined];
      const over = Math.log((1 + step) / (1 - step));
      const n = up === undefined || down === undefined ? 0 : inKelvin(workings, quantity) || !(at > 0) ? (up - down) / over : Math.log(up / down) / over;
      if (n !== 0) out.set(id, n);
    }
  }
  return out;
}
