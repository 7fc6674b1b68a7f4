import { contradiction } from './contradiction.ts';
import type { Ground } from './ground.ts';
import { inWords } from './say.ts';
import type { Contradiction } from './types.ts';

/** Where a stream leaves its phase on the way to the outlet, and in which words. */
interface Left {
  readonly code: string;
  readonly does: string;
  readonly says: string;
  readonly cure: string;
}

/** The stream of a through-flow that its own heat balance carries out of its phase. */
function left(on: Ground): Left | undefined {
  if (on.word('energySolved') !== 'yes' || !['internal', 'continuum'].includes(on.word('flowClass') ?? '')) return undefined;
  const [inlet, outlet, boils, melts] = (['inletTemperature', 'outletTemperature', 'saturationTemperature', 'meltingTemperature'] as const).map((id) => on.number(id));
  if (inlet === undefined || outlet === undefined) return undefined;
  const reached = `by single-phase laws the stream leaves at ${inWords(on, 'outletTemperature')}`;
  // Of a mixture with other gases a part alone condenses: that is told as condensation.
  const mixed = on.assembled.fluid?.takes.some((what) => what === 'humidity' || what === 'components') === true;
  if (on.word('medium') === 'gas' && !mixed && boils !== undefined && outlet < boils && inlet >= boils) {
    return { code: 'condenses-on-the-way', does: 'the vapour condenses', says: `${reached}, below its saturation at ${inWords(on, 'saturationTemperature')}: it condenses on the way`, cure: 'plan it as a condenser: film or flow condensation with the latent heat; or a warmer wall, a shorter length, a higher flow' };
  }
  if (on.word('medium') !== 'liquid') return undefined;
  if (boils !== undefined && outlet > boils && inlet <= boils) {
    return { code: 'boils-on-the-way', does: 'the liquid boils', says: `${reached}, above its saturation at ${inWords(on, 'saturationTemperature')}: it boils on the way`, cure: 'plan it as an evaporator: flow boiling with the latent heat; or a higher pressure, less heat, a higher flow' };
  }
  if (melts !== undefined && outlet < melts && inlet >= melts) {
    return { code: 'freezes-on-the-way', does: 'the liquid freezes', says: `${reached}, below its melting point at ${inWords(on, 'meltingTemperature')}: it freezes on the way`, cure: 'warm the wall, raise the flow, name an antifreeze, or plan the freezing as a problem of its own' };
  }
  return undefined;
}

/** What a single-phase estimate is spoilt by, in a few words; undefined where it holds. */
export function phaseLeft(on: Ground): string | undefined {
  return left(on)?.does;
}

/** A stream that changes phase before the outlet: no single-phase number of it holds. */
export function* phaseContradictions(on: Ground): Generator<Contradiction> {
  const found = left(on);
  if (found === undefined) return;
  yield contradiction(on, found.code, on.assembled.case.has('wall') ? 'wall.temperature' : 'inlet.temperature', { says: found.says, effect: 'single-phase laws do not hold: not covered, and no estimate is given; wall, mesh and cost below are for the flow that would be single-phase', cure: found.cure });
}
