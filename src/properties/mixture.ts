import { Problem } from '../problems/index.ts';
import { loadMaterial, shippedMaterials } from './collection.ts';
import { materialOf, type Material } from './material.ts';
import { reactionFlags } from './reacting.ts';
import type { Band, Box, Collection, MaterialRecord } from './record.ts';

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
  const found = components.flatMap(({ name, share }) => expanded(loadMaterial(name, collection), share, bases.has('mass'), collection));
  for (const { one } of found) {
    const gas = one.molarMass !== undefined && one.phases.includes('vapour') && one.properties.includes('viscosity') && one.properties.includes('thermalConductivity');
    if (!gas || one.critical === undefined || one.record.thermodynamics === undefined) throw new Problem({ code: 'wrong-composition', message: `${one.name} has no record as a gas${gas ? ' with an equation of state' : ''}`, expected: 'gases that the collection knows, such as nitrogen, oxygen, carbon dioxide, water' });
  }
  const amounts = found.map(({ one, share }) => [one.id, bases.has('mass') ? share / (one.molarMass as number) : share, one.molarMass as number] as const);
  const sum = amounts.reduce((all, [, n]) => all + n, 0);
  const shares: Record<string, number> = {};
  for (const [id, n] of amounts) shares[id] = (shares[id] ?? 0) + n / sum;
  const { saturationTemperature, ...properties } = record.properties;
  const flags = reactionFlags(found.map(({ one }, i) => ({ one, share: (amounts[i]?.[1] ?? 0) / sum })));
  const condensing = (shares['water'] ?? 0) > 0 && saturationTemperature !== undefined;
  return materialOf({
    ...record,
    molarMass: amounts.reduce((all, [, n, M]) => all + (n / sum) * M, 0),
    about: `of ${components.map(({ name, share }) => `${name} ${Number((share * 100).toPrecision(4))} %`).join(', ')} by ${bases.has('mass') ? 'mass' : 'mole'}`,
    ...(flags.length === 0 ? {} : { flags }),
    thermodynamics: { ...thermodynamics, constants: { shares } },
    properties: { ...transportOf(properties, found.map(({ one }, i) => ({ one, share: (amounts[i]?.[1] ?? 0) / sum }))), ...(condensing ? { saturationTemperature } : {}) },
  }, collection);
}

/** Share from which a component counts for the range of the transport, and from which a light gas weakens the rule of mixing. */
const counts = 0.005;
const light = 0.02;

/**
 * Transport of the mixture: no hotter than a tenth beyond the records of its components that end below 800 K, and for hydrogen or helium among heavier
 * gases a conductivity within 18 %, for the multicomponent kinetic theory reads up to 16 % less than the rule of mixing.
 */
function transportOf(properties: MaterialRecord['properties'], parts: readonly { readonly one: Material; readonly share: number }[]): MaterialRecord['properties'] {
  const top = Math.min(...parts.filter(({ share }) => share > counts).map(({ one }) => one.record.thermodynamics?.ranges[0]?.temperature?.[1] ?? Infinity).map((end) => (end < 800 ? 1.1 * end : Infinity)));
  const lightShare = parts.reduce((sum, { one, share }) => sum + ((one.molarMass ?? 1) < 0.005 ? share : 0), 0);
  const capped = ({ temperature, ...box }: Box): Box => ({ ...box, ...(temperature === undefined ? {} : { temperature: [temperature[0], Math.min(temperature[1], top)] as const }) });
  const widened = (id: string, bands: readonly Band[]): readonly Band[] => (id === 'thermalConductivity' && lightShare > light && lightShare < 1 - light ? bands.map((band) => ({ ...band, value: Math.max(band.value, 0.18) })) : bands);
  return Object.fromEntries(Object.entries(properties).map(([id, entries]) => [id, id === 'viscosity' || id === 'thermalConductivity' ? entries.map((entry) => ({ ...entry, ranges: entry.ranges.map(capped), uncertainty: widened(id, entry.uncertainty) })) : entries]));
}

/** A component that is itself a mixture of gases, such as biogas, as its components with their part of its share. */
function expanded(one: Material, share: number, byMass: boolean, collection: Collection): { one: Material; share: number }[] {
  const inner = Object.entries(sharesOf(one.record) ?? {});
  if (inner.length === 0) return [{ one, share }];
  return inner.map(([id, x]) => {
    const part = loadMaterial(id, collection);
    return { one: part, share: share * x * (byMass ? (part.molarMass as number) / (one.molarMass as number) : 1) };
  });
}
