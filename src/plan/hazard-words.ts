import type { Assembled } from '../assemble/index.ts';

/** Words that mark a substance, a use or a place as one that can hurt. Whole words, any case. */
const marks = {
  hydrogen: ['hydrogen', 'h2', 'syngas'],
  flammable: ['methane', 'natural gas', 'propane', 'butane', 'isobutane', 'ethane', 'ethylene', 'propylene', 'acetylene', 'ethanol', 'methanol', 'propanol', '1-propanol', '2-propanol', 'isopropanol', 'butanol', 'acetone', 'toluene', 'benzene', 'xylene', 'o-xylene', 'm-xylene', 'p-xylene', 'ethylbenzene', 'styrene', 'pentane', 'hexane', 'heptane', 'octane', 'cyclohexane', 'dimethyl ether', 'hydrogen sulphide', 'hydrogen sulfide', 'h2s', 'petrol', 'gasoline', 'diesel', 'kerosene', 'fuel', 'ammonia', 'carbon monoxide', 'lpg', 'lng'],
  oil: ['light oil', 'engine oil', 'heat-transfer oil', 'thermal oil', 'mineral oil', 'lubricating oil'],
  cryogen: ['liquid nitrogen', 'liquid oxygen', 'liquid argon', 'liquid hydrogen', 'liquid helium', 'ln2', 'lox', 'lh2', 'lng'],
  dust: ['coal dust', 'flour', 'wood dust', 'sugar dust', 'starch', 'aluminium powder', 'metal powder'],
  toxic: ['carbon monoxide', 'co', 'ammonia', 'nh3', 'chlorine', 'hydrogen sulphide', 'hydrogen sulfide', 'h2s', 'sulphur dioxide', 'so2', 'nitrogen dioxide', 'no2', 'phosgene', 'hydrogen fluoride', 'hydrogen chloride', 'nitric oxide', 'formaldehyde', 'benzene', 'toluene', 'styrene', 'chloroform', 'carbon tetrachloride', 'mercury', 'lead', 'lead-bismuth eutectic', 'flibe', 'beryllium', 'methanol'],
  corrosive: ['caustic soda', 'caustic potash', 'lye', 'sodium hydroxide', 'potassium hydroxide', 'naoh', 'koh', 'sulphuric acid', 'sulfuric acid', 'hydrochloric acid', 'nitric acid', 'phosphoric acid', 'acetic acid', 'hydrogen fluoride', 'hydrogen chloride', 'hcl'],
  carbonDioxide: ['carbon dioxide', 'co2'],
  inert: ['nitrogen', 'n2', 'argon', 'helium', 'carbon dioxide', 'co2', 'sulphur hexafluoride', 'sf6', 'xenon', 'krypton', 'neon'],
  oxygen: ['oxygen', 'o2', 'nitrous oxide', 'n2o', 'chlorine'],
  liquidMetal: ['sodium', 'potassium', 'nak', 'lithium', 'lead', 'lead-bismuth eutectic', 'lead-lithium', 'gallium', 'mercury', 'tin'],
  moltenSalt: ['solar salt', 'flibe', 'molten salt', 'nitrate salt', 'chloride salt', 'fluoride salt'],
  medical: ['patient', 'blood', 'drug', 'implant', 'stent', 'lung', 'airway', 'medical', 'dialysis', 'inhaler', 'artery'],
  nuclear: ['reactor core', 'nuclear', 'fuel rod', 'radioactive', 'spent fuel'],
  hygiene: ['food', 'milk', 'drink', 'beverage', 'pasteurise', 'pasteurize', 'sterilise', 'sterilize', 'legionella', 'drinking water'],
  vehicle: ['car', 'truck', 'aircraft', 'ship', 'hull', 'drone'],
  release: ['flue gas', 'stack gas', 'effluent', 'emission', 'emissions', 'exhaust plume'],
  built: ['building', 'chimney', 'mast', 'tower', 'bridge', 'facade', 'cladding', 'roof', 'awning', 'billboard', 'road sign', 'antenna', 'scaffold', 'solar panel', 'pylon', 'power line', 'stay cable', 'crane', 'fence', 'hoarding', 'wind turbine'],
  windTunnel: ['wind tunnel', 'wind-tunnel'],
  wind: ['wind', 'gust', 'gale', 'storm'],
  fire: ['fire', 'smoke', 'flame'],
  closedValve: ['closed valve', 'blocked in', 'shut in'],
} as const satisfies Readonly<Record<string, readonly string[]>>;
export type Mark = keyof typeof marks;

/** Where the words of a case stand. */
export type Where = 'fluid' | 'solute' | 'text';

/**
 * Finds the first word of a mark in a case: in the fluid it flows with (its record's own marks first), in species and second fluids, in title, purpose and targets.
 *
 * @param assembled  the case
 * @param mark       which list
 * @param where      which part of the case is looked at
 * @returns          the word as found, lower case; undefined where none stands there
 */
export function wordOf(assembled: Assembled, mark: Mark, where: readonly Where[]): string | undefined {
  const { fluid } = assembled;
  if (fluid !== undefined && where.includes('fluid') && (fluid.record.marks as readonly string[] | undefined)?.includes(mark) === true) return fluid.name;
  const text = where.flatMap((w) => textOf(assembled, w)).join(' | ').toLowerCase();
  return text === '' ? undefined : marks[mark].find((word) => stands(text, word));
}

const partOfWord = /[a-z0-9]/;
/** A glycol is not the gas in its name. */
const otherSubstance = /^[ -]glycol/;

/** Whether a word stands in a text on its own, neither within a longer one nor as the first part of another name. */
function stands(text: string, word: string): boolean {
  for (let at = text.indexOf(word); at >= 0; at = text.indexOf(word, at + 1)) {
    if (!partOfWord.test(text[at - 1] ?? '') && !partOfWord.test(text[at + word.length] ?? '') && !otherSubstance.test(text.slice(at + word.length, at + word.length + 7))) return true;
  }
  return false;
}

function textOf({ case: given, fluid }: Assembled, where: Where): string[] {
  if (where === 'text') return [given.title ?? '', given.purpose ?? '', ...given.targets.map((t) => `${t.quantity} ${t.place ?? ''}`)];
  if (where === 'fluid') return fluid === undefined ? [] : [fluid.id, fluid.name];
  return [...given.list('species'), given.word('otherFluid.material') ?? '', given.word('burning.fuel') ?? '', ...given.list('fluid.composition'), ...given.list('sources').map((s) => given.word(`sources.${s}.of`) ?? ''), ...given.list('particles').map((p) => given.word(`particles.${p}.material`) ?? '')];
}
