import type { Unit } from './unit-text.ts';

/**
 * The factor beside those of the units when turns are asked for radians or radians for turns: 60 rpm is 1 Hz and 2 pi rad/s.
 * A plain 1/s takes what comes: rad/s and Hz alike with the factor 1.
 *
 * @param from  the unit found
 * @param to    the unit wanted
 * @returns     2 pi to some power, mostly 1
 */
export function turns(from: Pick<Unit, 'angle' | 'cycle'>, to: Pick<Unit, 'angle' | 'cycle'>): number {
  const toCycle = from.angle - to.angle;
  return toCycle !== 0 && to.cycle - from.cycle === toCycle ? (2 * Math.PI) ** -toCycle : 1;
}
