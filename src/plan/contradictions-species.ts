import { contradiction } from './contradiction.ts';
import type { Ground } from './ground.ts';
import { percent } from './say.ts';
import type { Contradiction } from './types.ts';

/** Units of a rate constant by place and order; a catalyst may count on its volume, surface or mass. */
const unitsOf: Readonly<Record<string, Readonly<Record<string, string>>>> = {
  fluid: { '0': 'mol/(m^3 s)', '1': '1/s', '2': 'm^3/(mol s)', '3': 'm^6/(mol^2 s)' },
  wall: { '0': 'mol/(m^2 s)', '1': 'm/s' },
};

/** Shares, reactants and rate constants of the case against each other. */
export function* speciesContradictions(on: Ground): Generator<Contradiction> {
  const { case: given } = on.assembled;
  const species = given.list('species');
  for (const end of ['Inlet', 'Wall'] as const) {
    const sum = species.reduce((all, name) => all + (on.number(`massFraction${end}@species.${name}`) ?? 0), 0);
    const last = species.findLast((name) => given.has(`species.${name}.${end.toLowerCase()}`));
    if (sum > 1 + 1e-6 && last !== undefined) yield contradiction(on, 'shares-above-one', `species.${last}.${end.toLowerCase()}`, { says: `the mass shares at the ${end.toLowerCase()} sum to ${percent(sum)}`, effect: 'shares sum to 1 with that of the fluid: one of them would be negative', cure: 'mend a share, or say mass or mol where the other is meant' });
  }
  for (const name of given.list('reactions')) {
    const at = `reactions.${name}`;
    const of = given.word(`${at}.of`);
    if (of !== undefined && species.length > 0 && !species.includes(of)) yield contradiction(on, 'unknown-reactant', `${at}.of`, { says: `${at} consumes ${of}, which is no species of the case`, effect: 'the reaction takes nothing from what is carried: shares and conversion at the outlet are those without it', cure: `name one of ${species.join(', ')}, or list ${of} under species` });
    const where = given.word(`${at}.where`) ?? 'fluid';
    const order = String(given.number(`${at}.order`) ?? 1);
    const wanted = unitsOf[where]?.[order];
    const unit = given.get(`${at}.rateConstant`)?.unit;
    if (wanted !== undefined && unit !== undefined && unit !== wanted) yield contradiction(on, 'rate-constant-unit', `${at}.rateConstant`, { says: `the rate constant is given in ${unit}, while order ${order} ${where === 'wall' ? 'at a wall' : 'in the fluid'} has ${wanted}`, effect: 'the Damkohler number and the conversion are those of another rate', cure: `state it in ${wanted}, or mend order or place` });
  }
}
