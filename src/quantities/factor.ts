import { quantity, way, type Definition, type Way } from '../workings/index.ts';

/** Last way of a price factor. */
export const noFactor = way({ needs: [], value: () => 1, formula: 'F = 1', source: 'the effect does not act here', note: 'also where a number for it is not known' });

/**
 * A price factor with its laws apart: outside the range of its laws the nearest is kept and flagged, where none can be had the factor is 1.
 *
 * @param id      of the factor; its laws stand under `<id>Law`
 * @param about   symbol and name
 * @param laws    ways of the law
 * @returns       two definitions
 */
export function factor(id: string, about: { readonly symbol: string; readonly name: string }, laws: readonly Way[]): Definition[] {
  return [
    quantity(`${id}Law`, { symbol: `${about.symbol}*`, name: `${about.name}, by its law`, unit: '1' }, laws),
    quantity(id, { ...about, unit: '1' }, [way({ needs: [`${id}Law`], value: (of) => of[`${id}Law`] as number, formula: `${about.symbol} by its law`, source: 'law of the effect' }), noFactor]),
  ];
}
