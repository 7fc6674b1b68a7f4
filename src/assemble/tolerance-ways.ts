import type { Case } from '../case/index.ts';
import { ways, type Definition, type Way } from '../workings/index.ts';

/**
 * The accuracy of the strictest target, as a share: of the target, or of the driving difference where it is a temperature;
 * and the temperature that matters, the accuracy of the first target that states it in kelvins.
 *
 * @param on    the case
 * @param unit  SI unit of a quantity id, undefined where no definition has it
 * @returns     ways to `targetTolerance` and `temperatureTolerance`; none where no target asks for an accuracy
 */
export function toleranceWays(on: Case, unit: (id: string) => string | undefined): Definition[] {
  return [...strictest(on, unit), ...inKelvins(on)];
}

function inKelvins(on: Case): Definition[] {
  const within = on.targets.find((t) => t.within?.absolute !== undefined && t.within.unit === 'K')?.within;
  if (within === undefined) return [];
  return [ways('temperatureTolerance', [{ needs: [], value: () => within.absolute as number, formula: `T_tol = ${within.written}`, source: 'the case', dimensional: 'kelvins that the case states' }])];
}

function strictest(on: Case, unit: (id: string) => string | undefined): Definition[] {
  const asked = on.targets.flatMap((t): Way[] => {
    const { relative, ofChange, absolute, written } = t.within ?? {};
    const share = relative ?? ofChange;
    const about = { formula: `W = ${written ?? ''} of ${t.quantity}`, source: 'the case' };
    if (share !== undefined) return [{ needs: [], value: () => share, ...about }];
    if (absolute === undefined || unit(t.quantity) === undefined) return [];
    const over = unit(t.quantity) === 'K' ? 'temperatureDifference' : t.quantity;
    return [{ needs: [over], value: (of) => absolute / Math.abs(of[over] as number), ...about }];
  });
  if (asked.length === 0) return [];
  if (asked.length === 1) return [ways('targetTolerance', asked)];
  const needs = [...new Set(asked.flatMap((w) => w.needs))];
  return [ways('targetTolerance', [...asked, { needs, value: (of: Readonly<Record<string, number>>) => Math.min(...asked.map((w) => w.value?.(of, {}) ?? Number.POSITIVE_INFINITY)), formula: `W = min(${asked.map((w) => w.formula.slice(4)).join(', ')})`, source: 'the case' }].toReversed())];
}
