import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { nearestName, Problem } from '../problems/index.ts';
import { plainName } from './names.ts';

/** What a table says of one surface. */
export interface SurfaceValue {
  readonly low: number;
  readonly value: number;
  readonly high: number;
  /** [K] between which it was measured. */
  readonly temperature?: readonly [number, number];
  readonly source: string;
}

/** A surface by name: its equivalent sand grain [m], its emissivity, or both. */
export interface Surface {
  readonly name: string;
  readonly aliases: readonly string[];
  readonly sandGrain?: SurfaceValue;
  readonly emissivity?: SurfaceValue;
}

/** Fields of one line; a quoted one may hold commas. */
const fields = (line: string): string[] => [...line.matchAll(/("([^"]*)"|[^,]*)(?:,|$)/g)].map((m) => m[2] ?? m[1] ?? '').slice(0, line.endsWith(',') ? undefined : -1);

/**
 * The tables of surfaces joined by name.
 *
 * @param roughness   CSV: surface, aliases, low, value, high [um], source
 * @param emissivity  CSV: surface, aliases, from, to [K], low, value, high, source
 * @returns           surfaces in alphabetical order
 */
export function readSurfaces(roughness: string, emissivity: string): Surface[] {
  const found = new Map<string, Surface>();
  const put = (name: string, aliases: string, value: Pick<Surface, 'sandGrain'> | Pick<Surface, 'emissivity'>): void => {
    const before = found.get(name) ?? { name, aliases: [] };
    found.set(name, { ...before, aliases: [...new Set([...before.aliases, ...aliases.split('|').filter((one) => one !== '')])], ...value });
  };
  const rows = (text: string): string[][] => text.trim().split('\n').slice(1).map(fields);
  for (const [name = '', aliases = '', low, value, high, source = ''] of rows(roughness)) put(name, aliases, { sandGrain: { low: Number(low) / 1e6, value: Number(value) / 1e6, high: Number(high) / 1e6, source } });
  for (const [name = '', aliases = '', from, to, low, value, high, source = ''] of rows(emissivity)) put(name, aliases, { emissivity: { low: Number(low), value: Number(value), high: Number(high), temperature: [Number(from), Number(to)], source } });
  return [...found.values()].sort((a, b) => (a.name < b.name ? -1 : 1));
}

let kept: readonly Surface[] | undefined;

/**
 * All surfaces that come with the program, read when first asked for.
 *
 * @returns  surfaces in alphabetical order
 */
export function allSurfaces(): readonly Surface[] {
  if (kept !== undefined) return kept;
  const here = fileURLToPath(new URL('.', import.meta.url));
  const stored = join(here, 'materials', 'surfaces.json');
  const table = (name: string): string => readFileSync(join(here, '../../surfaces', name), 'utf8');
  kept = existsSync(stored) ? (JSON.parse(readFileSync(stored, 'utf8')) as Surface[]) : readSurfaces(table('roughness.csv'), table('emissivity.csv'));
  return kept;
}

/**
 * A surface by name or alias. Where one name has a sand grain and another of its aliases an emissivity, both belong to it.
 *
 * @param name  such as `drawn tubing`, `oxidised steel`; case, spaces and hyphens do not matter
 * @returns     the surface
 * @throws      {Problem} unknown-surface with the nearest name or those that hold the word
 */
export function loadSurface(name: string): Surface {
  const key = plainName(name);
  const named = allSurfaces().filter((one) => [one.name, ...one.aliases].some((other) => plainName(other) === key));
  const exact = named.find((one) => plainName(one.name) === key) ?? named[0];
  if (exact !== undefined) return named.reduce((joined, one) => ({ ...one, ...joined }), exact);
  const all = allSurfaces().flatMap((one) => [one.name, ...one.aliases]);
  const holding = key.length < 3 ? [] : allSurfaces().filter((one) => plainName(one.name).split(' ').includes(key)).map((one) => one.name);
  const nearest = nearestName(key, all.map(plainName));
  throw new Problem({ code: 'unknown-surface', message: `"${name.slice(0, 60)}" is not a surface of the tables`, expected: holding.length > 0 ? `one of ${holding.join(', ')}` : 'a surface by name, or its numbers', ...(nearest === undefined ? {} : { nearest: all.find((one) => plainName(one) === nearest) as string }) });
}
