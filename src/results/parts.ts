import { unit } from '../units/index.ts';
import type { Allowances } from './comparison.ts';
import type { Uncertainties } from './deviation.ts';
import type { Head } from './header.ts';
import { allowed, readLimit } from './limit.ts';
import type { KnownColumn } from './match.ts';

/** A known column as the head of a column of results, for reading limits and showing numbers in its unit. */
export function headOfKnown(known: KnownColumn): Head {
  return { name: known.name, unit: unit(known.unit), unitText: known.unit, line: 1, column: 1 };
}

/**
 * Limit and uncertainties as half-widths in the unit of the known numbers.
 *
 * @param head     name and unit of the known numbers
 * @param options  limit and uncertainties as given
 * @param scale    what shares refer to, in that unit
 * @param data     95 % half-width of the known numbers, in that unit
 * @returns        the limit and the parts of the uncertainty
 * @throws         {Problem} those of the limits
 */
export function halfWidths(head: Head, options: Allowances, scale: number, data: number): { limit: number; parts: Uncertainties } {
  const half = (text: string, what: string): number => allowed(readLimit(text, head, what, true), scale);
  const { numerical, input, statistical, within } = options;
  return {
    limit: within === undefined ? options.limit * Math.abs(scale) : half(within, 'the limit'),
    parts: {
      data,
      ...(numerical === undefined ? {} : { numerical: half(numerical, 'the numerical uncertainty') }),
      ...(input === undefined ? {} : { input: half(input, 'the input uncertainty') }),
      ...(statistical === undefined ? {} : { statistical: half(statistical, 'the statistical uncertainty') }),
    },
  };
}
