import { ways, type Definition, type Numbers, type Way, type When } from '../workings/index.ts';

/** Heat by name: what stands for it where a species is carried. */
const results: Readonly<Record<string, string>> = {
  nusseltPlain: 'sherwoodPlain',
  nusseltLaminar: 'sherwoodLaminar',
  nusseltTurbulent: 'sherwoodTurbulent',
  nusseltBetween: 'sherwoodBetween',
  entranceFactorNusseltLaminar: 'entranceFactorSherwoodLaminar',
  entranceFactorNusseltLaw: 'entranceFactorSherwoodLaw',
};
const needs: Readonly<Record<string, string>> = { ...results, prandtl: 'schmidt', prandtlBulk: 'schmidtBulk', prandtlFilm: 'schmidtFilm', prandtlWall: 'schmidtWall', graetz: 'graetzMass' };
/** Where heat itself drives the flow, or the wall sets a flux, a species follows laws of its own. */
const thermal = /rayleigh|grashof|temperature|^nusselt(?!Plain|Laminar|Turbulent|Between)/i;
/** Turbulent passages have a law made for mass from this Schmidt number on. */
const ownLawFrom = 1000;
const scatterOfAnalogy = 0.1;

/**
 * Laws of mass transfer from laws of heat transfer: Schmidt for Prandtl number, a wall of one share for a wall of one temperature. Adds 10 % of scatter.
 *
 * @param definitions  those of a flow, or the general ones
 * @returns            ways to the Sherwood number and the factor of its entrance
 * @source             Chilton and Colburn, Ind. Eng. Chem. 26 (1934) 1183; the scatter is common practice
 */
export function massAnalogy(definitions: readonly Definition[]): Definition[] {
  return definitions.flatMap((d): Definition[] => {
    const id = results[d.id];
    if (id === undefined) return [];
    const laws = ('more' in d ? d.more : d.ways).flatMap((w) => lawFor(w, d.id));
    return laws.length === 0 ? [] : [ways(id, laws)];
  });
}

function lawFor(law: Way, of: string): Way[] {
  const when = conditionOf(law.when);
  if (when === undefined || law.value === undefined || law.laws !== undefined || law.closes !== undefined || law.needs.some((n) => thermal.test(n))) return [];
  const pairs = law.needs.map((n) => [n, needs[n] ?? n] as const);
  const asHeat = (numbers: Numbers): Numbers => Object.fromEntries(pairs.map(([heat, mass]) => [heat, numbers[mass] as number]));
  const { value, scatter, range } = law;
  // A plain step from one name to the next is no law and adds no scatter.
  const isLaw = law.needs.length !== 1 || !(law.needs[0] as string in results);
  return [{
    needs: pairs.map(([, mass]) => mass),
    value: (numbers) => value(asHeat(numbers), {}),
    formula: inMass(law.formula),
    source: isLaw && law.needs.length > 0 ? `${law.source}; Sc for Pr by the analogy of heat and mass transfer` : law.source,
    ...(Object.keys(when).length === 0 ? {} : { when }),
    ...(isLaw && law.needs.length > 0 ? { scatter: typeof scatter === 'function' ? (numbers: Numbers): number => Math.hypot(scatter(asHeat(numbers)), scatterOfAnalogy) : Math.hypot(scatter ?? 0, scatterOfAnalogy) } : {}),
    ...(range === undefined ? {} : { range: Object.fromEntries(Object.entries(range).map(([n, at]) => [needs[n] ?? n, of === 'nusseltTurbulent' && n === 'prandtlBulk' ? [at[0], Math.min(at[1], ownLawFrom)] as const : at])) }),
    ...(law.note === undefined ? {} : { note: inMass(law.note) }),
    ...(law.dimensional === undefined ? {} : { dimensional: law.dimensional }),
  }];
}

/** Conditions without those of heat; undefined where the law is one of a given flux, of heating or cooling, or of no heat at all. */
function conditionOf(when: When | undefined): When | undefined {
  const kept: Record<string, string | readonly string[]> = {};
  for (const [word, value] of Object.entries(when ?? {})) {
    const list = typeof value === 'string' ? [value] : value;
    if (word === 'wallKind') {
      if (!list.includes('temperature')) return undefined;
    } else if (word === 'energySolved') {
      if (!list.includes('yes')) return undefined;
    } else if (word === 'channelHeating') {
      if (!list.includes('both')) return undefined;
    } else if (word === 'heatDirection') return undefined;
    else kept[word] = value;
  }
  return kept;
}

const inMass = (text: string): string => text.replaceAll(/\bNu\b|\bNu(?=_)/g, 'Sh').replaceAll(/\bPr\b|\bPr(?=_)/g, 'Sc').replaceAll(/\bGz\b/g, 'Gz_m').replaceAll('wall temperature uniform', 'wall share uniform');
