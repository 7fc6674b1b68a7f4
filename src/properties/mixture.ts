import { Problem } from '../problems/index.ts';
import { loadMaterial, shippedMaterials } from './collection.ts';
import { materialOf, type Material } from './material.ts';
import type { Collection, MaterialRecord } from './record.ts';

/** One component of a mixture as it was written. */
export interface Component {
  /** Material by name, alias or formula. */
  readonly name: string;
  readonly share: number;
  /** What the share counts; moles unless said. Of ideal gases volume and moles are one. */
  readonly basis?: 'mass' | 'mol' | 'vol';
}

type Shares = { readonly [id: string]: number };

const sharesOf = (record: MaterialRecord): Shares | undefined => (record.thermodynamics?.model === 'gas-mixture' ? (record.thermodynamics.constants['shares'] as Shares) : undefined);

/** Whether a material is a mixture whose components have not been given yet. */
export function isEmptyMixture({ record }: Material): boolean {
  const shares = sharesOf(record);
  return shares !== undefined && Object.keys(shares).length === 0;
}

/**
 * A mixture of gases with the composition of the case in place of the one of its record.
 *
 * @param material    a material that takes components, such as flue gas
 * @param components  shares by mole (or volume), or all by mass; their sum is 1 within 2 %, and is made 1
 * @param collection  where the components are found; the shipped records unless given
 * @returns           the mixture
 * @throws            {Problem} no-mixture, wrong-composition, unknown-material
 */
export function mixtureOf(material: Material, components: readonly Component[], collection: Collection = shippedMaterials()): Material {
  const { record } = material;
  const { thermodynamics } = record;
  if (thermodynamics === undefined || sharesOf(record) === undefined) throw new Problem({ code: 'no-mixture', message: `${material.name} is no mixture of gases`, expected: 'components for flue gas, natural gas, biogas or gas mixture alone' });
  const bases = new Set(components.map(({ basis }) => (basis === 'mass' ? 'mass' : 'mol')));
  if (bases.size > 1) throw new Problem({ code: 'wrong-composition', message: 'some shares are by mass and some by mole', expected: 'one of the two for all components' });
  const total = components.reduce((sum, { share }) => sum + share, 0);
  if (!(Math.abs(total - 1) <= 0.02)) throw new Problem({ code: 'wrong-composition', message: `the shares add up to ${Number((total * 100).toPrecision(4))} %`, expected: 'components that add up to 100 %' });
  const found = components.map(({ name, share }) => ({ one: loadMaterial(name, collection), share }));
  for (const { one } of found) {
    if (one.molarMass === undefined || !one.phases.includes('vapour') || !one.properties.includes('viscosity')) throw new Problem({ code: 'wrong-composition', message: `${one.name} has no record as a gas`, expected: 'gases that the collection knows, such as nitrogen, oxygen, carbon dioxide, water' });
  }
  const amounts = found.map(({ one, share }) => [one.id, bases.has('mass') ? share / (one.molarMass as number) : share, one.molarMass as number] as const);
  const sum = amounts.reduce((all, [, n]) => all + n, 0);
  const shares: Record<string, number> = {};
  for (const [id, n] of amounts) shares[id] = (shares[id] ?? 0) + n / sum;
  const { saturationTemperature, ...properties } = record.properties;
  const condensing = (shares['water'] ?? 0) > 0 && saturationTemperature !== undefined;
  return materialOf({
    ...record,
    molarMass: amounts.reduce((all, [, n, M]) => all + (n / sum) * M, 0),
    about: `of ${components.map(({ name, share }) => `${name} ${Number((share * 100).toPrecision(4))} %`).join(', ')} by ${bases.has('mass') ? 'mass' : 'mole'}`,
    thermodynamics: { ...thermodynamics, constants: { shares } },
    properties: condensing ? { ...properties, saturationTemperature } : properties,
  }, collection);
}
