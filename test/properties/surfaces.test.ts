import { describe, expect, it } from 'vitest';
import type { Problem } from '../../src/problems/index.ts';
import { allSurfaces, loadMaterial, loadSurface } from '../../src/properties/index.ts';
import { plainName } from '../../src/properties/names.ts';

describe('tables of surfaces', () => {
  it('every row has its value between its ends, a source, and a name that no other row takes for the same property', () => {
    const names = new Map<string, string>();
    for (const one of allSurfaces()) {
      for (const [property, known] of [['sandGrain', one.sandGrain], ['emissivity', one.emissivity]] as const) {
        if (known === undefined) continue;
        expect(known.low, one.name).toBeGreaterThan(0);
        expect(known.value, one.name).toBeGreaterThanOrEqual(known.low);
        expect(known.high, one.name).toBeGreaterThanOrEqual(known.value);
        expect(known.source.length, one.name).toBeGreaterThan(14);
        for (const name of [one.name]) {
          expect(names.get(`${property} ${plainName(name)}`), name).toBeUndefined();
          names.set(`${property} ${plainName(name)}`, one.name);
        }
      }
      if (one.emissivity !== undefined) expect(one.emissivity.high).toBeLessThanOrEqual(1);
    }
    expect(allSurfaces().length).toBeGreaterThan(110);
  });

  it.each([
    // Moody, Trans. ASME 66 (1944) 671, in feet: 0.000005, 0.00015, 0.0005, 0.00085, 0.0004
    ['drawn tubing', 0.000005], ['commercial steel', 0.00015], ['galvanised iron', 0.0005], ['cast iron', 0.00085], ['asphalted cast iron', 0.0004],
  ])('%s has the grain of the chart, %d ft', (name, feet) => expect((loadSurface(name).sandGrain?.value ?? 0) / (feet * 0.3048)).toBeCloseTo(1, 1));

  it.each([
    // Siegel and Howell and the like: values that two tables share within their scatter
    ['black paint', 0.97], ['polished aluminium', 0.04], ['oxidised steel', 0.79], ['red brick', 0.93], ['window glass', 0.84], ['water surface', 0.96],
  ])('the emissivity of %s holds %d between its ends', (name, value) => {
    const known = loadSurface(name).emissivity;
    expect(value).toBeGreaterThanOrEqual(known?.low ?? 1);
    expect(value).toBeLessThanOrEqual(known?.high ?? 0);
  });

  it.each([['copper', 'polished', 'polished copper'], ['aluminium', 'anodised', 'anodised aluminium'], ['gold', 'polished', 'polished gold'], ['iron', 'oxidised', 'oxidised steel']])('the record of %s, %s, lies between the ends of the table', (material, state, surface) => {
    const record = loadMaterial(material).record.properties['emissivity']?.find((one) => one.surface === state)?.constants['value'] as number;
    const known = loadSurface(surface).emissivity;
    expect(record).toBeGreaterThanOrEqual((known?.low ?? 1) * 0.8);
    expect(record).toBeLessThanOrEqual((known?.high ?? 0) * 1.2);
  });

  it('joins what one surface has under two names, and names the nearest', () => {
    expect(loadSurface('Stainless-steel pipe')).toMatchObject({ sandGrain: { value: 1.5e-5 }, emissivity: { value: 0.25 } });
    expect(() => loadSurface('drawn tubng')).toThrow(expect.objectContaining({ list: [expect.objectContaining({ code: 'unknown-surface', nearest: 'drawn tubing' })] }) as Problem);
  });
});
