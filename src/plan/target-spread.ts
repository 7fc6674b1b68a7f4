import type { Assembled } from '../assemble/index.ts';
import { lawProperties } from '../quantities/index.ts';
import { followsLaws, spreads, type Spread, type Workings } from '../workings/index.ts';

/** Spread of the hand estimate of one target, with what it comes from. */
export interface TargetSpread {
  readonly id: string;
  readonly quantity: string;
  readonly spread: Spread;
  /** Sources of the spread, largest first, each with its kind. */
  readonly from: readonly { readonly key: string; readonly label: string; readonly kind: 'input' | 'property' | 'scatter'; readonly share: number }[];
}

const kept = new WeakMap<Assembled, readonly TargetSpread[]>();

/**
 * Spreads of the targets, and what the graph needs of them: `targets.0.halfWidth` and `targets.0.inputWidth` are set in it; where the verdict on turbulence is open and
 * the two branches lie outside the spread, `targets.0.ifLaminar` and `targets.0.ifTurbulent` as well.
 *
 * @param assembled  the settled case
 * @returns          spreads of the targets that have an estimate; found once for a case
 */
export function targetSpreads(assembled: Assembled): readonly TargetSpread[] {
  const had = kept.get(assembled);
  if (had !== undefined) return had;
  const { workings, targets } = assembled;
  const found = spreads(workings, targets.filter((t) => t.computed).map((t) => t.quantity));
  const kindOf = new Map(workings.sources.map((s) => [s.key, s.kind]));
  const out = targets.flatMap(({ id, quantity, computed }): TargetSpread[] => {
    const spread = computed ? found.get(quantity) : undefined;
    if (spread === undefined) return [];
    const from = spread.shares.map(({ key, label, share }) => ({ key, label, kind: kindOf.get(key) ?? ('scatter' as const), share }));
    return [{ id, quantity, spread, from }];
  });
  const followed = targets.filter((t) => t.computed).map((t) => ({ ...t, by: follows(workings, t.quantity) }));
  for (const one of out) setWidths(workings, one);
  for (const { id, quantity, by } of followed) for (const [property, n] of by) workings.set(`${id}.per.${property}`, inKelvin(workings, quantity) ? 0.01 * n : n);
  setEnds(workings, targets.filter((t) => t.computed));
  kept.set(assembled, out);
  return out;
}

/** Both branches of the regime, where it is open: the scatter of one law does not hold the other. */
function setEnds(workings: Workings, targets: readonly { readonly id: string; readonly quantity: string }[]): void {
  if (!['borderline', 'undecided'].includes(workings.word('verdict.turbulence') ?? '')) return;
  const at = (regime: string): readonly (number | undefined)[] => workings.aside([['regime', regime]], () => targets.map((t) => workings.get(t.quantity)));
  const [laminar, turbulent] = [at('laminar'), at('turbulent')];
  targets.forEach(({ id }, k) => {
    const [low, high] = [laminar[k], turbulent[k]];
    if (low === undefined || high === undefined || Math.abs(high - low) <= (workings.get(`${id}.halfWidth`) ?? 0)) return;
    workings.set(`${id}.ifLaminar`, low);
    workings.set(`${id}.ifTurbulent`, high);
  });
}

/** The half-width, and the part of it that inputs and properties have: shares are of the square. */
function setWidths(workings: Workings, { id, spread, from }: TargetSpread): void {
  const half = (spread.high - spread.low) / 2;
  const given = from.filter((f) => f.kind !== 'scatter').reduce((sum, f) => sum + f.share, 0);
  workings.set(`${id}.halfWidth`, half);
  workings.set(`${id}.inputWidth`, half * Math.sqrt(given));
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
