import { Problem } from '../problems/index.ts';
import { shippedMaterials } from './collection.ts';
import type { Material } from './material.ts';
import { mixtureOf, type Component } from './mixture.ts';
import { plainName } from './names.ts';
import type { Collection } from './record.ts';
import type { StateText } from './state.ts';

const isWater = (name: string): boolean => ['water', 'h2o'].includes(plainName(name));
const percent = (share: number): string => `${Number((share * 100).toPrecision(4))} %`;

/**
 * Solutions of a collection that carry a substance in their name.
 *
 * @param substance   name of what is dissolved, such as `propylene glycol`
 * @param collection  where to look
 * @returns           names of materials that take a composition, none for water itself
 */
export function solutionsNamed(substance: string, collection: Collection): string[] {
  const plain = plainName(substance);
  if (plain.length < 3 || isWater(substance)) return [];
  const named = Object.entries(collection.names).filter(([key]) => ` ${key} `.includes(` ${plain} `)).map(([, { id }]) => id);
  return [...new Set(named)].flatMap((id) => {
    const record = collection.record(id);
    return record?.takes.includes('composition') === true ? [record.name] : [];
  }).sort();
}

/**
 * The share that a solution takes, from its components by name.
 *
 * @param material    a material that takes a composition
 * @param components  the solute, or water, or both that add up to 1
 * @param collection  where the solution is looked for that was meant
 * @returns           share of the solute by mass
 * @throws            {Problem} wrong-composition, wrong-basis
 */
export function solutionShare(material: Material, components: readonly Component[], collection: Collection = shippedMaterials()): number {
  const [solute, second] = components.filter(({ name }) => !isWater(name));
  const water = components.find(({ name }) => isWater(name));
  const says = `expected in ${material.name}: ${material.about ?? 'the share of its solute by mass'}`;
  if (components.some(({ basis }) => basis !== undefined && basis !== 'mass')) throw new Problem({ code: 'wrong-basis', message: `the composition of ${material.name} is a share by mass here`, expected: 'for example "composition 30 % mass"' });
  if (second !== undefined) throw new Problem({ code: 'wrong-composition', message: `${material.name} takes one solute, not ${components.map(({ name }) => name).join(' and ')}`, expected: says });
  if (solute !== undefined && !known(material, solute.name)) {
    const meant = solutionsNamed(solute.name, collection);
    throw new Problem({ code: 'wrong-composition', message: `${solute.name} is no part of ${material.name}`, expected: says, ...(meant[0] === undefined ? {} : { nearest: meant[0] }) });
  }
  if (solute !== undefined && water !== undefined && Math.abs(solute.share + water.share - 1) > 0.02) throw new Problem({ code: 'wrong-composition', message: `the shares add up to ${percent(solute.share + water.share)}`, expected: 'components that add up to 100 %' });
  return solute?.share ?? 1 - (water?.share ?? 1);
}

/** Whether a record names a substance, in its names or in what it says of its composition. */
function known({ record }: Material, substance: string): boolean {
  const words = ` ${[record.name, record.formula ?? '', ...record.aliases, record.about ?? ''].map(plainName).join(' ').replaceAll(/[^a-z0-9]+/g, ' ')} `;
  return plainName(substance).split(' ').every((word) => words.includes(` ${word} `));
}

/**
 * What components may mean that a material does not take: a solution under its own name.
 *
 * @param material    what was named, if anything
 * @param components  the components beside it
 * @param collection  where to look
 * @returns           what to write instead, and its name where it is one; undefined where no solution fits
 */
export function componentsMean(material: string, components: readonly Component[], collection: Collection): { readonly expected: string; readonly nearest?: string } | undefined {
  const solute = components.find(({ name }) => !isWater(name));
  const water = components.find(({ name }) => isWater(name));
  const share = solute?.share ?? 1 - (water?.share ?? 0);
  const meant = solutionsNamed(solute?.name ?? material, collection);
  if (meant.length === 0 || (solute !== undefined && components.length > (water === undefined ? 1 : 2))) return undefined;
  return { expected: `${meant.join(' or ')} with "composition ${percent(share)} mass"`, ...(meant.length === 1 ? { nearest: meant[0] as string } : {}) };
}

/**
 * A material with the components that a state names: a mixture of gases of them, or a solution of their share.
 *
 * @param material    the material
 * @param said        the state, with or without components
 * @param collection  where components are found
 * @returns           the material that was meant and the state without components
 * @throws            {Problem} no-mixture, wrong-composition, wrong-basis, said-twice, unknown-material
 */
export function withComponents<T extends StateText>(material: Material, said: T, collection: Collection = shippedMaterials()): { material: Material; said: T } {
  const { components } = said;
  if (components === undefined) return { material, said };
  if (material.takes.includes('composition')) {
    if (said.composition !== undefined) throw new Problem({ code: 'said-twice', message: 'the state names its composition twice', expected: 'one composition' });
    return { material, said: { ...said, composition: solutionShare(material, components, collection) } };
  }
  if (material.takes.includes('components')) return { material: mixtureOf(material, components, collection), said };
  const meant = componentsMean(material.name, components, collection);
  if (meant === undefined) return { material: mixtureOf(material, components, collection), said };
  throw new Problem({ code: 'no-mixture', message: `${material.name} takes no components`, ...meant });
}
