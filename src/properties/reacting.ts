import type { Material } from './material.ts';

/** Pairs that form a solid or another substance where they meet cold, by id; a trace of 0.1 % is enough. */
const pairs: readonly (readonly [string, string, string])[] = [
  ['ammonia', 'hydrogen-chloride', 'form solid ammonium chloride'],
  ['ammonia', 'sulphur-dioxide', 'form solid salts, with water at once'],
  ['ammonia', 'carbon-dioxide', 'form solid ammonium carbamate below about 60 degC'],
  ['ammonia', 'chlorine', 'react at once'],
  ['hydrogen-sulphide', 'sulphur-dioxide', 'form sulphur'],
  ['hydrogen-sulphide', 'chlorine', 'react at once'],
];

/**
 * Flags of components that react with each other: the mixture is carried as if they did not.
 *
 * @param parts  components with their mole fractions
 * @returns      flags; a fuel counts from 1 % and what feeds a fire from 4 %, below which hardly any gas burns
 * @source       common practice
 */
export function reactionFlags(parts: readonly { readonly one: Material; readonly share: number }[]): string[] {
  const share = (id: string): number => parts.reduce((sum, part) => sum + (part.one.id === id ? part.share : 0), 0);
  const marked = (mark: 'flammable' | 'oxygen'): readonly string[] => {
    const found = parts.filter(({ one }) => one.record.marks?.includes(mark));
    return found.reduce((sum, part) => sum + part.share, 0) >= { flammable: 0.01, oxygen: 0.04 }[mark] ? found.map(({ one }) => one.name) : [];
  };
  const [fuels, feeds] = [marked('flammable'), marked('oxygen')];
  return [
    ...(fuels.length > 0 && feeds.length > 0 ? [`${fuels.join(', ')} and ${feeds.join(', ')} can burn with each other: the mixture is taken as not reacting`] : []),
    ...pairs.filter(([a, b]) => share(a) >= 1e-3 && share(b) >= 1e-3).map(([a, b, what]) => `${a.replaceAll('-', ' ')} and ${b.replaceAll('-', ' ')} ${what}: the mixture is taken as not reacting`),
  ];
}
