import { Problem } from '../problems/index.ts';
import { type NumberText, numberAt } from './number-text.ts';
import { plainSigns } from './unit-tokens.ts';

/** A number with the unit behind it, as written; an empty unit means none. */
export interface Side extends NumberText {
  readonly unit: string;
  readonly unitAt: number;
}

/** The words that may follow a unit. */
export interface Words {
  readonly bounds?: true;
  readonly gauge?: true;
  readonly absolute?: true;
  readonly difference?: true;
  readonly basis?: 'mol' | 'mass' | 'vol';
  readonly reference?: 'normal' | 'standard';
  readonly of?: 'change' | 'value';
}

/** What stands in a quantity's text, before any unit is looked up. */
export interface QuantityText {
  readonly from: Side;
  readonly to?: Side;
  readonly spread?: Side;
  readonly words: Words;
}

const endings: readonly (readonly [pattern: RegExp, words: Words])[] = [
  [/ *\(bounds\)$/, { bounds: true }],
  [/(?: +(?:gauge|gage)| *\((?:g|gauge)\)|(?<=bar|Pa|psi) +g)$/, { gauge: true }],
  [/(?: +(?:abs|absolute)| *\((?:a|abs|absolute)\)|(?<=bar|Pa|psi) +a)$/, { absolute: true }],
  [/ +(?:difference|diff)$/, { difference: true }],
  [/(?: +normal| *\(normal\))$/, { reference: 'normal' }],
  [/(?: +standard| *\(standard\))$/, { reference: 'standard' }],
  [/ +of +(?:the +)?change$/, { of: 'change' }],
  [/ +of +(?:the +)?(?:value|it)$/, { of: 'value' }],
  [/(?<=%|ppm|ppb|ppt|permil) +(?:by +)?(?:mol|mole)$/, { basis: 'mol' }],
  [/(?<=%|ppm|ppb|ppt|permil) +(?:by +)?mass$/, { basis: 'mass' }],
  [/(?<=%|ppm|ppb|ppt|permil) +(?:by +)?(?:vol|volume)$/, { basis: 'vol' }],
];

/** Units with a letter or word grown onto them: the plain unit and what the addition says. */
const additions: readonly (readonly [unit: string, plain: string, words: Words])[] = [
  ...['bar', 'mbar', 'Pa', 'hPa', 'kPa', 'MPa', 'psi'].flatMap((plain): [string, string, Words][] => [
    [`${plain}g`, plain, { gauge: true }],
    [`${plain}a`, plain, { absolute: true }],
  ]),
  ...['mol', 'vol', 'mass', 'wt'].flatMap((word): [string, string, Words][] => {
    const basis = word === 'wt' ? 'mass' : (word as 'mol' | 'vol' | 'mass');
    return [
      [`${word}%`, '%', { basis }],
      [`${word} %`, '%', { basis }],
    ];
  }),
  ['ppmv', 'ppm', { basis: 'vol' }],
  ['ppbv', 'ppb', { basis: 'vol' }],
  ['ppmw', 'ppm', { basis: 'mass' }],
  ['ppbw', 'ppb', { basis: 'mass' }],
];

function twice(text: string, says: string): Problem {
  return new Problem({ code: 'unreadable-quantity', message: `"${text}" says ${says}`, expected: 'a quantity such as 25 mm, 0.4 m/s +/- 5 %, 0.2 .. 0.6 m/s', at: 0, length: text.length });
}

/** The words at the end of a piece of text and what remains of it. */
export function takeWords(piece: string, whole: string, words: Words): { rest: string; words: Words } {
  let rest = piece.trimEnd();
  let out = words;
  for (let again = /[a-z)] *$/.test(rest); again; ) {
    again = false;
    for (const [pattern, says] of endings) {
      const found = pattern.exec(rest);
      if (found === null) continue;
      for (const key of Object.keys(says) as (keyof Words)[]) if (out[key] !== undefined && out[key] !== says[key]) throw twice(whole, `both ${String(out[key])} and ${String(says[key])}`);
      out = { ...out, ...says };
      rest = rest.slice(0, found.index).trimEnd();
      again = true;
    }
  }
  const addition = additions.find(([unit]) => unit === rest.trimStart());
  if (addition !== undefined) {
    out = { ...out, ...addition[2] };
    rest = addition[1].padStart(rest.length - rest.trimStart().length + addition[1].length);
  }
  // A letter grown onto the cubic metre of a flow; alone Nm3 may be newton times cubic metre, and stays refused.
  const flow = /^ *(?:N|S)(?=m(?:\^3|3)\/[a-z])/.exec(rest);
  if (flow !== null) {
    const reference = flow[0].endsWith('N') ? 'normal' : 'standard';
    if (out.reference !== undefined && out.reference !== reference) throw twice(whole, `both ${out.reference} and ${reference}`);
    out = { ...out, reference };
    rest = rest.slice(flow[0].length).padStart(rest.length);
  }
  if (out.gauge && out.absolute) throw twice(whole, 'both gauge and absolute');
  return { rest, words: out };
}

/**
 * A quantity's text taken apart: `a unit`, `a unit +/- b unit`, `a .. b unit`, and the words behind them.
 *
 * @param text  as written, at most 200 characters
 * @returns     numbers, units and words with their places in the text
 * @throws      {Problem} unreadable-quantity, not-a-number
 */
export function quantityText(text: string): QuantityText {
  if (text.length > 200) throw new Problem({ code: 'unreadable-quantity', message: 'a quantity longer than 200 characters', expected: 'a quantity such as 25 mm', at: 0, length: text.length });
  const plain = plainSigns(text);
  let words: Words = {};
  const side = (from: number, to: number): Side => {
    const taken = numberAt(plain.slice(0, to), from);
    const begin = taken.at + taken.length;
    const found = takeWords(plain.slice(begin, to), text, words);
    words = found.words;
    const power = /^ *[x×·*] *(?=10\^|10\*\*|10[⁺⁻⁰¹²³⁴-⁹])/.exec(found.rest)?.[0].length ?? 0; // 5 x 10^-3 m
    const rest = found.rest.slice(power);
    return { ...taken, unit: rest.trim(), unitAt: begin + power + (rest.length - rest.trimStart().length) };
  };
  const spreadAt = plain.search(/\+\/-|±|\+-(?=[ \d.])/);
  const end = spreadAt < 0 ? plain.length : spreadAt;
  const rangeAt = plain.slice(0, end).search(/\.\.|…/);
  const spreadLength = plain[spreadAt] === '±' ? 1 : plain[spreadAt + 1] === '/' ? 3 : 2;
  const rangeLength = plain[rangeAt] === '…' ? 1 : plain.startsWith('...', rangeAt) ? 3 : 2;
  const from = side(0, rangeAt < 0 ? end : rangeAt);
  const to = rangeAt < 0 ? undefined : side(rangeAt + rangeLength, end);
  const spread = spreadAt < 0 ? undefined : side(spreadAt + spreadLength, plain.length);
  return { from, ...(to === undefined ? {} : { to }), ...(spread === undefined ? {} : { spread }), words };
}
