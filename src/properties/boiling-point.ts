import type { Entry, MaterialRecord } from './record.ts';
import type { Sample } from './sample.ts';

/**
 * A record with the boiling temperature that its vapour pressure tells, where it states the one and not the other.
 *
 * @param record    the record
 * @param evaluate  its vapour pressure [Pa] at a sample
 * @returns         the record, with an entry for the saturation temperature over the pressures that its line reaches at every share
 */
export function withBoilingPoint(record: MaterialRecord, evaluate: (entry: Entry, sample: Sample) => number): MaterialRecord {
  const entry = record.properties['vapourPressure']?.[0];
  const box = entry?.ranges[0];
  if (entry === undefined || box?.temperature === undefined || record.kind !== 'fluid' || 'saturationTemperature' in record.properties) return record;
  const [from, to] = box.temperature;
  const pressures = (T: number): number[] => (box.composition ?? [0]).map((x) => evaluate(entry, { T, p: 101325, side: 'liquid', x }));
  const [low, high] = [Math.max(...pressures(from)), Math.min(...pressures(to))];
  if (!(high > low && low > 0)) return record;
  // d ln T = d ln p/(d ln p/d ln T), the slope taken over the upper half of the line.
  const half = (from + to) / 2;
  const slope = Math.log((pressures(to)[0] as number) / (pressures(half)[0] as number)) / Math.log(to / half);
  const widest = Math.max(...entry.uncertainty.map(({ value }) => value));
  const boiling: Entry = { model: 'boiling-point', constants: { from, to }, ranges: [{ pressure: [low, high], ...(box.composition === undefined ? {} : { composition: box.composition }) }], uncertainty: [{ value: widest / slope }], source: `vapour pressure: ${entry.source}`, checks: [] };
  return { ...record, properties: { ...record.properties, saturationTemperature: [boiling] } };
}

/** Temperatures [K] at which a liquid solution is asked for. Below its triple point the line of water goes on smoothly, within 5 % of that of supercooled water. */
const liquidTemperatures = [233.15, 473.15] as const;

/**
 * A record with the vapour pressure that it stays below, where it names the material whose boiling point it stays above.
 *
 * @param record  the record
 * @returns       the record, with the other side of the same bound
 */
export function withVapourBound(record: MaterialRecord): MaterialRecord {
  const floor = record.properties['boilingFloor']?.[0];
  if (floor === undefined || floor.model !== 'boils-above') return record;
  const [{ composition } = {}] = floor.ranges;
  // Along a saturation line d ln p is about 15 d ln T.
  const ceiling: Entry = { ...floor, model: 'vapour-below', ranges: [{ temperature: liquidTemperatures, ...(composition === undefined ? {} : { composition }) }], uncertainty: floor.uncertainty.map(({ value }) => ({ value: 15 * value })) };
  return { ...record, properties: { ...record.properties, vapourPressureCeiling: [ceiling] } };
}
