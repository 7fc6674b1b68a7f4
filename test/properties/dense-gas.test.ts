import { describe, expect, it } from 'vitest';
import { loadMaterial, propertyAt } from '../../src/properties/index.ts';
import { denseConductivity, denseViscosity } from '../../src/properties/models/dense-gas.ts';

// The method against the reference correlations of fluids that have one, each held to another library in independent-fluids.csv: the same boxes and
// differences that scripts/materials/handbook.py states for fluids that have none.
const fluids = ['methane', 'nitrogen', 'argon', 'oxygen', 'carbon dioxide', 'ethane', 'propane', 'n-butane', 'isobutane', 'n-hexane', 'n-octane', 'benzene', 'toluene', 'R-134a', 'R-125', 'R-32', 'ammonia', 'dimethyl ether'];
const limits = { viscosity: { cold: 0.15, warm: 0.2, hot: 0.09 }, thermalConductivity: { cold: 0.12, warm: 0.22, hot: 0.12 } };

describe('what pressure adds to the transport of a gas', () => {
  it.each(fluids)('%s', (name) => {
    const material = loadMaterial(name);
    const { temperature: Tc, pressure: pc, density } = material.critical ?? { temperature: 0, pressure: 0, density: 0 };
    const molarMass = material.molarMass ?? 0;
    const point = { temperature: Tc, pressure: pc, volume: molarMass / density, molarMass };
    const top = material.record.thermodynamics?.ranges[0]?.temperature?.[1] ?? 0;
    const cold = [0.75, 0.85, 0.95, 1.05, 1.15].flatMap((t) => [0.1, 0.25, 0.5].map((p) => ({ T: t * Tc, p: p * pc, part: 'cold' as const })));
    const warm = [1.15, 1.25, 1.4, 1.6, 2, 2.5, 3].flatMap((t) => [1e6, 4e6, 1e7].map((p) => ({ T: t * Tc, p, part: t < 2 ? ('warm' as const) : ('hot' as const) })));
    const states = [...cold, ...warm]
      .filter(({ T, p }) => T <= top && T > (material.triple?.temperature ?? 0) && (T >= Tc || p < 0.98 * material.engine.saturation(T)));
    let held = 0;
    for (const [property, added] of [['viscosity', denseViscosity], ['thermalConductivity', denseConductivity]] as const) {
      for (const { T, p, part } of states) {
        const reference = propertyAt(material, property, { temperature: T, pressure: p });
        const dilute = propertyAt(material, property, { temperature: T, pressure: 1000 });
        if (reference === undefined || dilute === undefined || !reference.withinRange || !dilute.withinRange) continue;
        const rho = propertyAt(material, 'density', { temperature: T, pressure: p })?.value ?? Number.NaN;
        held++;
        expect(Math.abs((dilute.value + added(point, rho / density)) / reference.value - 1), `${property} at ${T} K, ${p} Pa`).toBeLessThan(limits[property][part]);
      }
    }
    expect(held).toBeGreaterThan(12);
  });
});
