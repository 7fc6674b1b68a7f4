import { readdirSync, readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { loadMaterial, materialRecords, propertyAt, type PropertyId } from '../../src/properties/index.ts';

// Each table in compared/ is made by the script of its name, which names the references and what makes each independent of the record.
const folder = new URL('./compared/', import.meta.url);
const tables = readdirSync(folder).filter((name) => name.endsWith('.csv')).toSorted();
const rows = tables.flatMap((name) => readFileSync(new URL(name, folder), 'utf8').trim().split('\n').slice(1)).map((line) => {
  const [material = '', property = '', T, p, share, value, reference = ''] = line.split(',');
  return { material, property: property as PropertyId, temperature: Number(T), pressure: Number(p), ...(share === '' ? {} : { composition: Number(share) }), value: Number(value), reference };
});
const groups = [...new Set(rows.map((row) => `${row.material}|${row.property}|${row.reference}`))].map((key) => key.split('|'));

describe('states of independent references', () => {
  it.each(groups)('%s, %s against %s', (material, property, reference) => {
    const misses: string[] = [];
    for (const row of rows) {
      if (row.material !== material || row.property !== property || row.reference !== reference) continue;
      const { value, temperature, pressure } = row;
      const found = propertyAt(loadMaterial(row.material), row.property, { temperature, pressure, ...('composition' in row ? { composition: row.composition } : {}) });
      const off = Math.abs((found?.value ?? Number.NaN) / value - 1);
      if (!(off <= (found?.uncertainty ?? 0)) || found?.withinRange !== true) misses.push(`${temperature} K ${pressure} Pa ${row.composition ?? ''}: ${found?.value} against ${value}, off ${(off * 100).toPrecision(3)} %, declared ${((found?.uncertainty ?? 0) * 100).toPrecision(3)} %`);
    }
    expect(misses).toEqual([]);
  });
});

it('the page says what was compared, and the largest difference', async () => {
  const lines = groups.map(([material = '', property = '', reference = '']) => {
    const mine = rows.filter((row) => row.material === material && row.property === property && row.reference === reference);
    let [worst, declared] = [0, 0];
    for (const { value, temperature, pressure, ...row } of mine) {
      const found = propertyAt(loadMaterial(material), property as PropertyId, { temperature, pressure, ...('composition' in row ? { composition: row.composition } : {}) });
      worst = Math.max(worst, Math.abs((found?.value ?? Number.NaN) / value - 1));
      declared = Math.max(declared, found?.uncertainty ?? 0);
    }
    const span = (list: number[]): string => (Math.min(...list) === Math.max(...list) ? String(Math.min(...list)) : `${Math.min(...list)} to ${Math.max(...list)}`);
    const percent = (x: number): string => `${Number((x * 100).toPrecision(2))} %`;
    return `| ${[material, property, reference, mine.length, span(mine.map((row) => row.temperature)), percent(worst), percent(declared)].join(' | ')} |`;
  });
  const told = new Set(rows.map((row) => `${row.material}|${row.property}`));
  const left = materialRecords()
    .filter((record) => record.kind === 'solid')
    .flatMap((record) => {
      const alone = Object.keys(record.properties).filter((property) => property !== 'emissivity' && !told.has(`${record.name}|${property}`));
      return alone.length === 0 ? [] : [`- ${record.name}: ${alone.join(', ')}`];
    });
  const alone = ['', '## Solids: what no second work tells', '', 'Here the declared uncertainty is a judgement from the one source of the record, or of the checks that stand in it. Emissivities have not been compared.', '', ...left];
  const head = ['# Materials against independent references', '', 'Made by compared.test.ts from the tables in compared/; the script of each names its references. Differences are those of the record, the declared uncertainty is the largest of the states.', '', '| material | property | reference | states | T [K] | largest difference | declared |', '|---|---|---|---|---|---|---|'];
  await expect(`${[...head, ...lines, ...alone].join('\n')}\n`).toMatchFileSnapshot('./compared.md');
});
