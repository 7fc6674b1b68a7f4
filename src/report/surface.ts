import type { Surface } from '../properties/index.ts';
import { wrapped } from './wrap.ts';

const micrometres = (x: number): string => String(Number((x * 1e6).toPrecision(3)));
const grain = ({ sandGrain: s }: Surface): string => (s === undefined ? '' : `${micrometres(s.value)} (${micrometres(s.low)} to ${micrometres(s.high)})`);
const emissivity = ({ emissivity: e }: Surface): string => (e === undefined ? '' : `${e.value} (${e.low} to ${e.high})`);

/**
 * One surface with what the tables say of it.
 *
 * @param surface  from the tables
 * @returns        text without a last newline, at most 80 columns wide
 */
export function surfaceText(surface: Surface): string {
  const { sandGrain, emissivity: e } = surface;
  return [
    wrapped(`${surface.name}${surface.aliases.length === 0 ? '' : `, also ${surface.aliases.join(', ')}`}`, '  ', ''),
    '',
    ...(sandGrain === undefined ? [] : [`  equivalent sand grain [um]   ${grain(surface)}`, wrapped(sandGrain.source, '    ', '    ')]),
    ...(e === undefined ? [] : [`  emissivity                   ${emissivity(surface)}${e.temperature === undefined ? '' : `, ${e.temperature[0]} K to ${e.temperature[1]} K`}`, wrapped(e.source, '    ', '    ')]),
    '',
    '  In brackets the ends between which published values lie.',
  ].join('\n');
}

/**
 * All surfaces as a table.
 *
 * @param surfaces  from the tables
 * @returns         text without a last newline, at most 80 columns wide
 */
export function surfacesText(surfaces: readonly Surface[]): string {
  return [`${'surface'.padEnd(32)} ${'sand grain [um]'.padEnd(24)} emissivity`, ...surfaces.map((one) => `${one.name.slice(0, 32).padEnd(32)} ${grain(one).padEnd(24)} ${emissivity(one)}`.trimEnd())].join('\n');
}
