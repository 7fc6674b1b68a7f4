import type { Case, Target } from '../case/index.ts';
import { ways, type Definition, type Way } from '../workings/index.ts';

/** Whether a case carries a species or lets one react: without either, none of their quantities exist in its graph. */
export const carries = (on: Case): boolean => on.has('species') || on.has('reactions');

/** What a reaction knows of its reactant, by the quantity of the species that gives it. */
const fromSpecies: readonly (readonly [own: string, species: string])[] = [['reactantMassFraction', 'massFractionInlet'], ['reactantMolarMass', 'speciesMolarMass'], ['reactantDiffusivity', 'diffusivity'], ['reactantCoefficient', 'massTransferCoefficient'], ['reactantFourier', 'fourierMass']];

const as = (need: string, formula: string): Way => ({ needs: [need], value: (of) => of[need] as number, formula, source: 'the case' });

/**
 * Ties reactions to the species they consume, and species to the reactions that consume them.
 *
 * @param on  the case
 * @returns   ways between `reactions.0` and `species.feed`
 */
export function reactionDefinitions(on: Case): Definition[] {
  const species = on.list('species');
  return on.list('reactions').flatMap((name): Definition[] => {
    const at = `reactions.${name}`;
    const own: Definition[] = [ways(`reactionEnthalpy@${at}`, on.has(`${at}.enthalpy`) ? [{ ...as(`${at}.enthalpy`, `as given: ${at}.enthalpy`), dimensional: 'the enthalpy counts on mole or mass as given' }] : [])];
    const of = on.word(`${at}.of`) ?? (species.length === 1 ? species[0] : undefined);
    if (of === undefined || !species.includes(of)) return own;
    const place = `species.${of}`;
    return [
      ...own,
      ...fromSpecies.map(([id, from]) => ways(`${id}@${at}`, [as(`${from}@${place}`, `that of ${of}`)])),
      ...((on.word(`${at}.where`) ?? 'fluid') === 'fluid' ? [ways(`damkohlerOf@${place}`, [as(`damkohler@${at}`, `that of ${at}`)])] : []),
      ways(`reactionFactorOf@${place}`, [as(`reactionFactorOutlet@${at}`, `that of ${at}`)]),
    ];
  });
}

/** Words of the species and reactions of a case, with those that were taken without being said. */
export function carriedWords(on: Case, medium: 'gas' | 'liquid' | 'solid' | undefined, take: (id: string, value: string, says: string) => void): Record<string, string> {
  const words: Record<string, string> = {};
  for (const name of on.list('species')) {
    const at = `species.${name}`;
    words[`wallShareGiven@${at}`] = on.has(`${at}.wall`) ? 'yes' : 'no';
    for (const key of ['inlet', 'wall'] as const) {
      const basis = on.get(`${at}.${key}`)?.basis;
      const id = `${key}ShareBasis@${at}`;
      if (basis !== undefined) words[id] = basis === 'mass' ? 'mass' : 'mole';
      else if (on.has(`${at}.${key}`)) take(id, medium === 'gas' ? 'mole' : 'mass', `${at}.${key} counts ${medium === 'gas' ? 'moles, as is usual in gases' : 'mass, as is usual in liquids'}: mass or mol is not said`);
    }
  }
  for (const name of on.list('reactions')) {
    const at = `reactions.${name}`;
    const where = on.word(`${at}.where`);
    if (where !== undefined) words[`reactionWhere@${at}`] = where;
    else take(`reactionWhere@${at}`, 'fluid', `${at} goes on in the fluid: its place is not given`);
    const unit = on.get(`${at}.rateConstant`)?.unit ?? '1/s';
    words[`rateKind@${at}`] = /kg/.test(unit) ? 'mass' : unit === 'm/s' || /m\^2/.test(unit) ? 'surface' : 'volume';
    words[`enthalpyPer@${at}`] = /kg/.test(on.get(`${at}.enthalpy`)?.unit ?? '') ? 'mass' : 'mole';
  }
  return words;
}

/** Whether a reaction of the case goes on at a place. */
export const reacts = (on: Case, where: string): boolean => on.list('reactions').some((name) => (on.word(`reactions.${name}.where`) ?? 'fluid') === where);

/** Names by which hydrogen and helium are known. */
const light = /^(hydrogen|helium|h2|he|deuterium)$/i;
export const hasLightGas = (on: Case): boolean => [...on.list('species'), on.word('fluid.material') ?? '', ...on.list('fluid.composition')].some((name) => light.test(name));

/** Words of a target that ask for a concentration, a transfer of mass or what a reaction makes. */
const asked = /sherwood|concentration|mass ?fraction|mass ?share|mass ?transfer|wallMassFlux|conversion|selectivity|\byield|humidity|moisture|evaporat|condens|dilution|purity|tracer|salinity|stanton number for mass/i;
export const asksForSpecies = (on: Case): boolean => on.targets.some((t) => asked.test(t.quantity) || on.list('species').some((name) => t.quantity.toLowerCase().split(/[\s,]+/).includes(name.toLowerCase())));

/** The species that one of some targets names. */
export const speciesNamed = (on: Case, targets: readonly Target[]): string | undefined => on.list('species').find((name) => targets.some((t) => [t.quantity, t.place ?? ''].some((text) => text.toLowerCase().split(/[\s,]+/).includes(name.toLowerCase()))));

/** The place whose values plain ids of species stand for: what a target names, else the first. */
export function targetSpecies(on: Case): { readonly species?: string } {
  const name = speciesNamed(on, on.targets) ?? on.list('species')[0];
  return name === undefined ? {} : { species: `species.${name}` };
}
