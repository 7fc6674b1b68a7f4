import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, describe, expect, it } from 'vitest';
import { compileMaterial, compileMaterials, loadMaterial, materialRecords, propertyAt, storedMaterials, withMaterialsFrom } from '../../src/properties/index.ts';
import { openSource } from '../../src/properties/compile.ts';
import { openStored } from '../../src/properties/stored.ts';
import { Problem } from '../../src/problems/index.ts';

const folder = mkdtempSync(join(tmpdir(), 'materials-'));
afterAll(() => rmSync(folder, { recursive: true }));

const problemsOf = (task: () => unknown): readonly Problem['list'][number][] => {
  try {
    task();
  } catch (error) {
    if (error instanceof Problem) return error.list;
    throw error;
  }
  return [];
};

const brine = `name: test brine
aliases: [plant brine]
kind: fluid
phases: [liquid]
density:
  model: constant
  constants: { value: 1.2 g/cm^3 }
  range: { T: [0 degC, 50 degC] }
  uncertainty: 1 %
  source: own measurement, invented for this test
`;

describe('a record across its melting point', () => {
  it.each(materialRecords().flatMap(({ name, acrossMelting }) => (acrossMelting === undefined ? [] : [[name, acrossMelting] as const])))('of %s is %s', (name, across) => {
    const [here, there] = [loadMaterial(name), loadMaterial(across)];
    expect(there.name).toBe(across);
    expect(there.phases.some((phase) => phase === 'solid')).not.toBe(here.kind === 'solid');
  });
});

describe('names', () => {
  it.each([
    ['water', 'water'], ['H2O', 'water'], ['Steam', 'water'], ['dry-air', 'air'], ['N2', 'nitrogen'], ['CO2', 'carbon dioxide'], ['aluminum', 'aluminium'], ['diesel-like oil', 'light oil'], ['moist air', 'humid air'],
    ['C3H6O', 'acetone'], ['propanone', 'acetone'], ['67-64-1', 'acetone'], ['R134a', 'R-134a'], ['r-717', 'ammonia'], ['R744', 'carbon dioxide'], ['R-290', 'propane'], ['R600a', 'isobutane'], ['isopropanol', '2-propanol'], ['LH2', 'parahydrogen'], ['LOX', 'oxygen'], ['D2O', 'heavy water'], ['NO', 'nitric oxide'], ['He', 'helium'], ['H2S', 'hydrogen sulphide'],
    ['CO', 'carbon monoxide'], ['Co', 'cobalt'], ['CO₂', 'carbon dioxide'], ['H₂O', 'water'], ['r 134 a', 'R-134a'], ['Pb-Bi', 'lead-bismuth eutectic'], ['nitrogen gas', 'nitrogen'], ['gaseous benzene', 'benzene'], ['compressed air', 'air'], ['tap water', 'water'],
    ['7732-18-5', 'water'], ['7439-97-6', 'mercury'], ['7440-50-8', 'copper'], ['7440-23-5', 'sodium'], ['7664-93-9', 'sulphuric acid'],
  ])('%s is %s', (name, expected) => expect(loadMaterial(name).name).toBe(expected));

  it('names the nearest, or the candidates', () => {
    expect(problemsOf(() => loadMaterial('watr'))[0]).toMatchObject({ code: 'unknown-material', nearest: 'water' });
    const oils = problemsOf(() => loadMaterial('oil'))[0];
    expect(oils?.code).toBe('ambiguous-material');
    for (const name of ['engine oil', 'heat-transfer oil', 'light oil', 'lubricating oil ISO VG 46']) expect(oils?.expected).toContain(name);
    expect(problemsOf(() => loadMaterial('propylene glycol 40 %'))[0]).toMatchObject({ code: 'unknown-material', nearest: 'propylene glycol' });
    expect(problemsOf(() => loadMaterial('silicone oil'))[0]).toMatchObject({ code: 'ambiguous-material', expected: expect.stringContaining('silicone oil 100') as string });
    expect(problemsOf(() => loadMaterial('aceton'))[0]).toMatchObject({ code: 'unknown-material', nearest: 'acetone' });
    expect(problemsOf(() => loadMaterial('C8H10'))[0]).toMatchObject({ code: 'ambiguous-material', expected: 'one of ethylbenzene, m-xylene, o-xylene, p-xylene' });
    expect(problemsOf(() => loadMaterial('unobtainium'))[0]?.expected).toMatch(/^one of the \d{3} materials that `runbrief material` lists/); // all the names would fill pages
    for (const [name, among] of [
      ['NaCl', ['rock salt', 'sodium chloride brine']], ['CaCl2', ['calcium chloride brine', 'calcium chloride hexahydrate']], ['xylenes', ['m-xylene', 'o-xylene', 'p-xylene']], ['heavy oil', ['heavy crude oil', 'heavy fuel oil']],
      ['light lubricating oil', ['lubricating oil ISO VG 10', 'lubricating oil ISO VG 15', 'lubricating oil ISO VG 22', 'lubricating oil ISO VG 32']], ['heavy lubricating oil', ['lubricating oil ISO VG 220', 'lubricating oil ISO VG 320', 'lubricating oil ISO VG 460', 'lubricating oil ISO VG 680']],
      ['co', ['carbon monoxide', 'cobalt']],
    ] as const) expect(problemsOf(() => loadMaterial(name))[0]).toMatchObject({ code: 'ambiguous-material', expected: `one of ${among.join(', ')}` });
    for (const [name, wanted, unwanted] of [['wood', 'spruce', 'methanol'], ['steel', 'carbon steel', 'Pall rings'], ['lubricating oil', 'engine oil', 'light oil'], ['lubricating oil', 'lubricating oil ISO VG 46', 'diesel']] as const) {
      const { expected } = problemsOf(() => loadMaterial(name))[0] ?? {};
      expect(expected).toContain(wanted);
      expect(expected).not.toContain(unwanted);
    }
    for (const name of ['ozone', 'ceramic']) expect(JSON.stringify(problemsOf(() => loadMaterial(name)))).not.toMatch(/bone|Raschig/);
    expect(problemsOf(() => loadMaterial('ozone'))[0]?.nearest).toBeUndefined();
    for (const name of ['__proto__', 'constructor', 'toString', '']) expect(problemsOf(() => loadMaterial(name))[0]?.code).toBe('unknown-material');
  });
});

describe('records of the user', () => {
  it('add to ours and take their place', () => {
    writeFileSync(join(folder, 'brine.yaml'), brine);
    writeFileSync(join(folder, 'copper.yaml'), brine.replace('test brine', 'copper').replace('plant brine', 'our copper').replace('1.2 g/cm^3', '9 g/cm^3').replace('kind: fluid', 'kind: solid').replace('phases: [liquid]', 'phases: [solid]'));
    const collection = withMaterialsFrom(folder);
    const of = (name: string): number | undefined => propertyAt(loadMaterial(name, collection), 'density', { temperature: 300, pressure: 1e5 })?.value;
    expect([of('plant brine'), of('copper'), loadMaterial('water', collection).name]).toEqual([1200, 9000, 'water']);
    expect(of('copper')).not.toBe(propertyAt(loadMaterial('copper'), 'density', { temperature: 300, pressure: 1e5 })?.value);
  });

  it.each([
    [brine.replace('constant\n', 'constnt\n'), 'unknown-model', 6, 10],
    [brine.replace('1.2 g/cm^3', '1.2 g/furlong'), 'wrong-quantity', 7, 23],
    [brine.replace('[0 degC, 50 degC]', '[0 bar, 50 degC]'), 'wrong-dimension', 8, 16],
    [brine.replace('source', 'sorce'), 'unknown-key', 10, 10],
    [brine.replace('  uncertainty: 1 %\n', ''), 'missing-uncertainty', 6, 3],
    [brine.replace('kind: fluid', 'kind: fluid\nkind: solid'), 'unreadable-yaml', 4, 1],
    [brine.replace('value: 1.2', 'valu: 1.2'), 'unknown-key', 7, 22],
    [brine.replace('kind: fluid', 'kind: fluid\nmarks: [flamable]'), 'wrong-mark', 4, 8],
    [brine.replace('[0 degC, 50 degC]', '[50 degC, 0 degC]'), 'wrong-range', 8, 15],
    ['name: &a x\nkind: *a\n', 'unreadable-yaml', undefined, undefined],
    ['just text', 'wrong-record', undefined, undefined],
  ])('a fault has a code and a place: %#', (text, code, line, column) => {
    const found = problemsOf(() => compileMaterial(text, 'brine.yaml')).find((one) => one.code === code);
    expect(found).toMatchObject({ code, file: 'brine.yaml', ...(line === undefined ? {} : { line, column }) });
  });

  it('two records of one name are told', () => {
    const twice = join(folder, 'twice');
    mkdirSync(twice);
    writeFileSync(join(twice, 'a.yaml'), brine);
    writeFileSync(join(twice, 'b.yaml'), brine.replace('test brine', 'other'));
    expect(problemsOf(() => compileMaterials(twice))[0]).toMatchObject({ code: 'two-names', file: 'b.yaml' });
  });
});

it('the heads of the source files bear all names', () => {
  expect(openSource('materials').names).toEqual(compileMaterials('materials').names);
});

it('what is stored gives the same numbers', () => {
  for (const { file, text } of storedMaterials(compileMaterials('materials'))) writeFileSync(join(folder, file), text);
  const stored = openStored(folder) ?? { names: {}, find: () => undefined, record: () => undefined };
  for (const record of materialRecords()) expect(stored.record(record.id)).toEqual(record);
  expect(stored.record('../secret')).toBeUndefined();
  expect(propertyAt(loadMaterial('steam', stored), 'density', { temperature: 500, pressure: 1e5 })?.value).toBe(propertyAt(loadMaterial('steam'), 'density', { temperature: 500, pressure: 1e5 })?.value);
});
