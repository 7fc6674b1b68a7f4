import type { Assembled } from '../assemble/index.ts';
import { spreads, type Spread, type Workings } from '../workings/index.ts';

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
  for (const one of out) setWidths(workings, one);
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
