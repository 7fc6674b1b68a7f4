import type { Case, Target } from '../case/index.ts';
import { moleculeOf } from '../quantities/index.ts';
import { ways, type Definition, type Way } from '../workings/index.ts';

/** Whether a case carries a species or lets one react: without either, none of their quantities exist in its graph. */
export const carries = (on: Case): boolean => on.has('species') || on.has('reactions');

const known = (value: number, formula: string, source: string, dimensional?: string): Way => ({ needs: [], value: () => value, formula, source, ...(dimensional === undefined ? {} : { dimensional }) });
const volumes = "Poling, Prausnitz and O'Connell, The Properties of Gases and Liquids, 5th ed. (2001), table 11-1";

/**
 * What is known of the molecules that a case names: molar mass, and the volumes that estimates of diffusivity take.
 *
 * @param on     the case
 * @param fluid  name of its fluid
 * @returns      ways below what the case gives
 */
export function moleculeDefinitions(on: Case, fluid: string | undefined): Definition[] {
  const other = fluid === undefined ? undefined : moleculeOf(fluid);
  const water = fluid !== undefined && /^water$/i.test(fluid);
  return [
    ...(other === undefined ? [] : [ways('fluidDiffusionVolume', [known(other.diffusionVolume, `v_B of ${fluid}`, volumes)])]),
    ...(other === undefined || !water ? [] : [ways('solventMass', [known(other.molarMass, 'M_B of water', 'IUPAC 2021', 'a constant with unit')])]),
    ...on.list('species').flatMap((name): Definition[] => {
      const one = moleculeOf(name);
      if (one === undefined) return [];
      const at = `species.${name}`;
      return [
        ways(`speciesMolarMass@${at}`, [known(one.molarMass, `M of ${name}, by its atoms`, 'IUPAC 2021, abridged atomic weights', 'a constant with unit')]),
        ways(`diffusionVolume@${at}`, [known(one.diffusionVolume, `v_A of ${name}`, volumes)]),
        ...(one.boilingVolume === undefined ? [] : [ways(`boilingVolume@${at}`, [known(one.boilingVolume, `V of ${name} at its boiling point`, 'Wilke and Chang, AIChE J. 1 (1955) 264; from memory', 'a constant with unit')])]),
      ];
    }),
  ];
}

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
      words[id] = basis === undefined ? (medium === 'gas' ? 'mole' : 'mass') : basis === 'mass' ? 'mass' : 'mole';
      if (basis === undefined && on.has(`${at}.${key}`)) take(id, medium === 'gas' ? 'mole' : 'mass', `${at}.${key} counts ${medium === 'gas' ? 'moles, as is usual in gases' : 'mass, as is usual in liquids'}: mass or mol is not said`);
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
