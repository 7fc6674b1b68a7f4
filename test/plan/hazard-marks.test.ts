import { expect, it } from 'vitest';
import { vocabulary } from '../../src/assemble/index.ts';
import { readCase } from '../../src/case/index.ts';
import { settleCase } from '../../src/plan/index.ts';
import { wordOf } from '../../src/plan/hazard-words.ts';

const marked = (material: string, mark: Parameters<typeof wordOf>[1]) => wordOf(settleCase(readCase(`format: 1\ntitle: t\nflow: pipe\nsizes: { diameter: 20 mm, length: 1 m }\nfluid: { material: ${material}, pressure: 2 bar abs }\ninlet: { speed: 1 m/s, temperature: ${material === 'FLiNaK' ? 600 : material.startsWith('molten') ? 700 : 90} degC }\n`, 't.case.yaml', vocabulary)).assembled, mark, ['fluid']);

it.each([
  ['sodium-potassium 22-78', 'liquidMetal'], ['molten aluminium', 'liquidMetal'], ['FLiNaK', 'moltenSalt'], ['lubricating oil ISO VG 46', 'oil'], ['heavy fuel oil', 'flammable'], ['milk', 'hygiene'],
] as const)('the record of %s marks it: %s', (material, mark) => expect(marked(material, mark)).toBe(material));

it('what has no mark sets nothing off', () => expect(marked('water', 'liquidMetal')).toBeUndefined());
