import { describe, expect, it } from 'vitest';
import { vocabulary } from '../../src/assemble/index.ts';
import { readCase } from '../../src/case/index.ts';
import { propertyFits, settleCase } from '../../src/plan/index.ts';

const line = (inlet: string, wall: string): string => `format: 1
title: fits
flow: pipe
targets: [{ quantity: outletTemperature }]
sizes: { diameter: 25 mm, length: 8 m }
fluid: { material: water, pressure: 1 bar abs }
inlet: { speed: 0.4 m/s, temperature: ${inlet} }
wall: { temperature: ${wall} }
`;
const fitsOf = (text: string): NonNullable<ReturnType<typeof propertyFits>> => {
  const found = propertyFits(settleCase(readCase(text, 'test.case.yaml', vocabulary)).assembled);
  if (found === undefined) throw new Error('no fits');
  return found;
};
const at = (found: ReturnType<typeof fitsOf>, property: string, T: number): number => {
  const fit = found.fits.find((f) => f.property === property);
  return (fit?.coefficients ?? []).reduce((sum, { value }, k) => sum + value * T ** k, 0);
};

describe('properties as functions to type in', () => {
  it('water from 20 to 65 degC: a tenth of the span beyond each end, within a third of what is known, near the published values', () => {
    const found = fitsOf(line('65 degC', '20 degC'));
    expect([found.from, found.to]).toEqual([expect.closeTo(288.65, 6), expect.closeTo(342.65, 6)]);
    expect(found.fits.map((f) => f.property)).toEqual(['density', 'viscosity', 'thermalConductivity', 'specificHeatCapacity']);
    for (const fit of found.fits) {
      expect(fit.largestError).toBeLessThanOrEqual(fit.uncertainty / 3);
      expect(fit.positive).toBe(true);
    }
    // IAPWS SR6-08 tables at 0.1 MPa: 997.047 kg/m^3 at 25 degC; R12-08: 890.1 uPa s at 25 degC; R15-11: 0.6065 W/(m K) at 25 degC.
    expect(at(found, 'density', 298.15)).toBeCloseTo(997.047, 1);
    expect(at(found, 'viscosity', 298.15) / 890.1e-6).toBeCloseTo(1, 2);
    expect(at(found, 'thermalConductivity', 298.15)).toBeCloseTo(0.6065, 3);
  });
  it('where no polynomial holds, the first form that does', () => {
    const found = fitsOf(line('90 degC', '10 degC').replace('material: water', 'material: engine oil'));
    const viscosity = found.fits.find((f) => f.property === 'viscosity');
    expect(viscosity?.outcome).toBe('met');
    expect(['vogel', 'piecewise']).toContain(viscosity?.kind);
  });
  it('near freezing the function ends where the liquid does', () => {
    const found = fitsOf(line('65 degC', '1 degC'));
    expect(found.from).toBeCloseTo(274.15, 6);
  });
});
