import { Problem } from '../problems/index.ts';
import { fromEquation, type Material } from './material.ts';
import type { Box, MaterialRecord } from './record.ts';

/** How far beyond its data a property of a solution is carried, absolute: farther on its law means nothing. */
const little = 0.03;
/** Solubilities are printed to a few tenths of a per cent. */
const ofSolubility = 0.004;

type Ends = readonly [number, number];

const percent = (share: number): string => `${Number((share * 100).toPrecision(4))} %`;

function endsOf(boxes: readonly Box[]): Ends | undefined {
  const shares = boxes.flatMap(({ composition }) => (composition === undefined ? [] : [composition]));
  return shares.length === 0 || shares.length < boxes.length ? undefined : [Math.min(...shares.map(([low]) => low)), Math.max(...shares.map(([, high]) => high))];
}

/** Shares between which each property of a record has data; once per record. */
const known = new WeakMap<MaterialRecord, ReadonlyMap<string, Ends>>();

function endsByProperty(record: MaterialRecord): ReadonlyMap<string, Ends> {
  const before = known.get(record);
  if (before !== undefined) return before;
  const found = new Map<string, Ends>();
  const take = (property: string, boxes: readonly Box[]): void => {
    const ends = endsOf(boxes);
    if (ends !== undefined) found.set(property, ends);
  };
  for (const property of record.thermodynamics === undefined ? [] : Object.keys(fromEquation)) take(property, record.thermodynamics?.ranges ?? []);
  for (const [property, entries] of Object.entries(record.properties)) take(property, entries.flatMap(({ ranges }) => ranges));
  const density = found.get('density');
  if (density !== undefined && !found.has('thermalExpansion')) found.set('thermalExpansion', density);
  known.set(record, found);
  return found;
}

const isBeyond = ([low, high]: Ends, share: number): boolean => share < low - little || share > high + little;

/**
 * Whether a property of a solution has no value because its data end well before the share asked for.
 *
 * @param record    the record
 * @param property  its id
 * @param share     by mass
 * @returns         true more than 3 % (absolute) beyond the data
 */
export function isRefused(record: MaterialRecord, property: string, share: number): boolean {
  if (!record.takes.includes('composition')) return false;
  const ends = endsByProperty(record).get(property);
  return ends !== undefined && isBeyond(ends, share);
}

/**
 * Holds a share against the solubility and the data of a solution.
 *
 * @param material  a material that takes a composition
 * @param share     by mass
 * @param T         temperature [K]
 * @returns         what is refused at that share, as flags; none where every property has data
 * @throws          {Problem} beyond-saturation above the solubility; beyond-composition where no property has data
 */
export function shareFlags(material: Material, share: number, T: number): string[] {
  const { record } = material;
  const limit = saturatedShare(record, T);
  if (limit !== undefined && share > limit + ofSolubility) throw new Problem({ code: 'beyond-saturation', message: `${material.name} at ${percent(share)} does not exist at ${Number(T.toPrecision(5))} K: water is saturated with it at ${percent(limit)}, the rest stays solid`, expected: `composition ${percent(Math.floor(limit * 100) / 100)} mass or less` });
  const all = endsByProperty(record);
  const refused = [...all].filter(([property, ends]) => property !== 'thermalExpansion' && isBeyond(ends, share));
  const bulk = [...all].filter(([property]) => property !== 'meltingTemperature' && property !== 'vapourPressure');
  if (bulk.length > 0 && bulk.every(([, ends]) => isBeyond(ends, share))) {
    const ends = [Math.min(...bulk.map(([, [low]]) => low)), Math.max(...bulk.map(([, [, high]]) => high))] as const;
    throw new Problem({ code: 'beyond-composition', message: `the data of ${material.name} go from ${percent(ends[0])} to ${percent(ends[1])}, not to ${percent(share)}`, expected: `a composition from ${percent(ends[0])} to ${percent(ends[1])} mass, or the properties themselves` });
  }
  return refused.map(([property, ends]) => `${property} of ${material.name} is refused: its data go from ${percent(ends[0])} to ${percent(ends[1])}, not to ${percent(share)}`);
}

/** Solubility as a share by mass at T [K], straight between the rows and held beyond them. */
function saturatedShare(record: MaterialRecord, T: number): number | undefined {
  const rows = record.saturated;
  const [first] = rows ?? [];
  const last = rows?.at(-1);
  if (rows === undefined || first === undefined || last === undefined) return undefined;
  if (T <= first[0]) return first[1];
  const i = rows.findIndex(([at]) => at > T);
  const [below, above] = [rows[i - 1], rows[i]];
  return below === undefined || above === undefined ? last[1] : below[1] + ((above[1] - below[1]) * (T - below[0])) / (above[0] - below[0]);
}

/**
 * A share that a record holds for, for the message where none is given.
 *
 * @param record  of a solution
 * @returns       the share most often met, else a round one that every property has data for, 30 % at most
 */
export function exampleShare(record: MaterialRecord): number {
  if (record.typical !== undefined) return record.typical;
  const all = [...endsByProperty(record)].filter(([property]) => property !== 'meltingTemperature').map(([, ends]) => ends);
  const low = Math.max(0, ...all.map(([from]) => from));
  const most = Math.min(0.3, ...all.map(([, to]) => to));
  const round = [0.05, 0.1, 0.01].map((step) => Math.floor((most + 1e-9) / step) * step).find((share) => share > 0 && share >= low);
  return round ?? most;
}
