import type { Workings } from '../workings/index.ts';

/** Effects that a known answer is about. Where the case leaves the effect out, its rung has nothing to show. */
const aboutEffect: Readonly<Record<string, readonly string[]>> = {
  'mixed-convection-pipe': ['buoyancy'],
  'mixed-convection-channel': ['buoyancy'],
  'two-plates-radiation': ['radiation'],
  'slip-pipe': ['rarefaction'],
  'slip-channel': ['rarefaction'],
  'womersley-pipe': ['imposed-unsteadiness'],
  'oscillating-wall': ['imposed-unsteadiness'],
  'stefan-tube': ['stefan-flow'],
  'plug-flow-reactor': ['reaction'],
  'segregated-laminar-reactor': ['reaction'],
  'dispersed-reactor': ['dispersion'],
  'turbulent-pipe': ['turbulence'],
  'turbulent-channel-dns': ['turbulence'],
  'turbulent-plate': ['turbulence', 'transition'],
  'turbulent-step': ['turbulence'],
};

/**
 * The effect for whose sake a reference would be met, where the case leaves it out.
 *
 * @param workings   the settled graph
 * @param reference  id of the reference
 * @returns          the effect; undefined where the rung stays
 */
export function leftOutEffect(workings: Workings, reference: string): string | undefined {
  const effects = aboutEffect[reference] ?? [];
  return effects.length > 0 && effects.every((e) => workings.word(`verdict.${e}`) === 'leave-out') ? effects[0] : undefined;
}
