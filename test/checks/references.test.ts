import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { map, type Covered, type Entry } from './references.map.ts';

/** Units of the inputs, to SI. */
const factors: Readonly<Record<string, number>> = { mm: 1e-3, cm: 1e-2, 'mPa s': 1e-3, 'uPa s': 1e-6 };
const si = new Set(['1', 'm', 'm/s', 's', 'Hz', 'kg/m3', 'Pa s', 'Pa', 'Pa/m', 'm2', 'm2/s', 'W/(m K)', 'W/(m2 K)', 'K', '1/K', 'dK', 'W/m3', 'J/(kg K)']);

function input(entry: Entry, name: string): number {
  const given = entry.inputs[name];
  if (given === undefined || typeof given === 'string') throw new Error(`${entry.id} has no number ${name}`);
  const factor = si.has(given.unit) ? 1 : factors[given.unit];
  if (factor === undefined) throw new Error(`${entry.id}: unit ${given.unit} is not in the table`);
  return given.value * factor;
}

const topics = Object.entries(map).map(([topic, rules]) => {
  const { entries } = JSON.parse(readFileSync(new URL(`values/${topic}.json`, import.meta.url), 'utf8')) as { entries: Entry[] };
  return { topic, pairs: entries.map((entry) => ({ entry, rule: rules.find((rule) => ('covers' in rule ? rule.covers : rule.leaves).test(entry.id)) })) };
});
const covered = topics.flatMap(({ pairs }) => pairs.filter((pair): pair is { entry: Entry; rule: Covered } => pair.rule !== undefined && 'covers' in pair.rule)).map(({ entry, rule }) => ({ id: entry.id, entry, rule }));

describe('published reference solutions', () => {
  it.each(covered)('$id', ({ entry, rule }) => {
    const got = rule.by((name) => input(entry, name), entry);
    const expected = entry.known_disagreement?.recomputed ?? entry.expected;
    expect(Math.abs(got - expected), `${got} against ${expected}`).toBeLessThanOrEqual(Math.max((entry.tolerance.rel ?? 0) * Math.abs(expected), entry.tolerance.abs ?? 0));
  });

  it.each(topics)('every entry of $topic is held or left out with its reason', ({ pairs }) => {
    expect(pairs.filter(({ rule }) => rule === undefined).map(({ entry }) => entry.id)).toEqual([]);
    expect(pairs.filter(({ rule }) => rule && 'leaves' in rule && rule.because.length < 10)).toEqual([]);
  });

  it('every rule of the map meets an entry', () => {
    const used = new Set(topics.flatMap(({ pairs }) => pairs.map(({ rule }) => rule)));
    expect(Object.values(map).flat().filter((rule) => !used.has(rule))).toEqual([]);
  });

  it('holds most of them', () => expect(covered.length).toBeGreaterThan(200));
});
