import { nearestName, Problem } from '../problems/index.ts';
import { knownNames } from './lookup.ts';
import { ambiguous, written } from './phrases.ts';
import type { UnitToken } from './unit-tokens.ts';

/** The problem of a name that is no unit of ours, with what to write instead. */
export function unknownUnit(text: string, token: UnitToken): Problem {
  const name = token.text;
  const place = { at: token.at, length: token.length };
  const within = text === name ? '' : ` in "${text}"`;
  const clear = ambiguous.get(name);
  if (clear !== undefined) return new Problem({ code: 'ambiguous-unit', message: `"${name}"${within} is read in more than one way`, expected: clear, ...place });
  const instead = written.get(name);
  const nearest = instead ?? nearestName(name, knownNames());
  return new Problem({
    code: 'unknown-unit',
    message: `"${name}"${within} is not a unit known here`,
    expected: instead ?? 'a unit such as m, kg/m^3, Pa s, W/(m2 K), degC, gal/min, lb/ft3',
    ...(nearest === undefined ? {} : { nearest }),
    ...place,
  });
}
