// Writes src/units/atoms.ts: the simple units of convert-units whose factors are exact, in SI. Run it by hand after an
// upgrade of that package (node scripts/units-from-convert-units.mjs); loading the package itself would cost every start
// some 20 ms. Compound units (m3/h, in2) are built from atoms by our own reader. What is left out stands below.
import { writeFileSync } from 'node:fs';
import convert from 'convert-units';

/** The SI unit of each measure, its product of base units, and what it counts. */
const measures = {
  length: ['m', 'm'],
  area: ['m2', 'm2'],
  volume: ['m3', 'm3'],
  mass: ['kg', 'kg'],
  time: ['s', 's'],
  pressure: ['Pa', 'kg m-1 s-2'],
  current: ['A', 'A'],
  voltage: ['V', 'kg m2 s-3 A-1'],
  power: ['W', 'kg m2 s-3'],
  apparentPower: ['VA', 'kg m2 s-3'],
  energy: ['J', 'kg m2 s-2'],
  illuminance: ['lx', 'cd m-2'],
  frequency: ['Hz', 's-1', 'cycle'],
  angle: ['rad', '', 'angle'],
  partsPer: ['ppm', ''],
};

/** Factors that are off by more than 1e-12: src/units/definitions.ts has them with year and source. */
const inexact = 'in yd ft ft-us mi oz lb ac tsp Tbs fl-oz cup pnt qt gal psi ksi ft-cd'.split(' ');
/** Names that mean something else in the trade, or an angle rate that counts turns as radians. */
const traps = ['t', 'mu', 'rpm', 'deg/s', 'rad/s'];

const rows = [];
for (const { abbr, measure, singular, plural } of convert().list()) {
  const known = measures[measure];
  if (known === undefined || inexact.includes(abbr) || traps.includes(abbr) || /[\d/-]/.test(abbr)) continue;
  const [si, product, counts] = known;
  const inSi = convert(1).from(abbr).to(si) * (measure === 'partsPer' ? 1e-6 : 1);
  const short = Number(inSi.toPrecision(13)); // 100000.00000000001 is 1e5
  const factor = Math.abs(short - inSi) <= 4e-16 * inSi ? short : inSi;
  const words = [singular, plural].map((name) => name.toLowerCase()).filter((name) => /^\p{L}+$/u.test(name) && name !== 'matsked' && name !== 'matskedar');
  const names = [...new Set([abbr, ...words])].join(' ');
  rows.push(`  [${[`'${names}'`, factor, `'${product}'`, ...(counts ? [`'${counts}'`] : [])].join(', ')}],`);
}

writeFileSync(
  new URL('../src/units/atoms.ts', import.meta.url),
  `// Made by scripts/units-from-convert-units.mjs from convert-units; change the script, not this file.

/** Names, factor to SI, product of SI base units, what it counts. */
export type AtomRow = readonly [names: string, factor: number, product: string, counts?: 'angle' | 'cycle'];

export const atoms: readonly AtomRow[] = [
${rows.join('\n')}
];
`,
);
