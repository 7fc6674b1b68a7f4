import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { convert, sameDimension, unit } from '../../src/units/index.ts';

const table = JSON.parse(readFileSync(new URL('gnu-units.json', import.meta.url), 'utf8')) as { source: string; rows: [string, string, number][] };
const within = 1e-12; // rounding of a few multiplications on either side

describe(`factors against ${table.source}`, () => {
  it('holds several hundred pairs', () => expect(table.rows.length).toBeGreaterThan(900));

  it.each(table.rows)('%s to %s', (from, to, factor) => {
    const [a, b] = [unit(from), unit(to)];
    expect(sameDimension(a.dimension, b.dimension)).toBe(true);
    expect(Math.abs(a.factor / b.factor / factor - 1)).toBeLessThan(within);
  });

  const withoutZero = table.rows.filter(([from, to]) => from !== 'dK' && to !== 'dK');
  it('is the same through convert, there and back', () => {
    for (const [from, to, factor] of withoutZero) {
      expect(Math.abs(convert(`7 ${from}`, to).value / (7 * factor) - 1), `${from} to ${to}`).toBeLessThan(within);
      const back = convert(`${convert(`7 ${from}`, to).value} ${to}`, from).value;
      expect(Math.abs(back / 7 - 1), `${from} to ${to} and back`).toBeLessThan(within);
    }
  });
});
