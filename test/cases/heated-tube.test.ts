import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { vocabulary } from '../../src/assemble/index.ts';
import { readCase } from '../../src/case/index.ts';
import { settleCase } from '../../src/plan/index.ts';
import { trace } from '../../src/workings/index.ts';
import { planned } from './expert.ts';

const celsius = (t: number): number => t + 273.15;

describe('a tube heated by a given flux', () => {
  it('is hottest at its outlet, by hand 25.6 K above the fluid', async () => {
    const { plan, n } = await planned('heated-tube');
    // 120 kW/m^2 on pi 10 mm 3 m is 11 310 W; 0.5 m/s of 998.2 kg/m^3 at 4180 J/(kg K) takes it with 69 K.
    expect(n('outletTemperature')).toBeCloseTo(celsius(89), 0);
    // Water at 89 degC (IAPWS): 966 kg/m^3, 0.319 mPa s, 0.674 W/(m K), Pr 1.98; Re 15 400, Gnielinski (1976) Nu 69.6, h 4690 W/(m^2 K).
    expect(Math.abs(n('wallTemperatureOutlet') - celsius(114.6))).toBeLessThan(2.5);
    expect(n('wallTemperatureMax')).toBe(n('wallTemperatureOutlet'));
    expect(n('wallTemperatureMin')).toBe(celsius(20)); // the layer of heat begins without thickness
    // It boils at 104.5 degC under 1.19 bar: 10 K of superheat.
    expect(plan.effects.find(({ id }) => id === 'boiling')?.verdict).toBe('include');
    expect(plan.targets[0]).toMatchObject({ quantity: 'wallTemperatureOutlet', computed: true });
  });

  it('is hottest where the fluid enters if heat is taken from it', async () => {
    const { n } = await planned('heated-tube', [['120 kW/m^2', '-40 kW/m^2'], ['temperature: 20 degC', 'temperature: 80 degC']]);
    expect(n('wallTemperatureMax')).toBe(celsius(80));
    expect(n('wallTemperatureMin')).toBe(n('wallTemperatureOutlet'));
    expect(n('wallTemperatureOutlet')).toBeLessThan(n('outletTemperature'));
  });

  it('has a trace that goes through the film to the inputs', () => {
    const name = new URL('./heated-tube.case.yaml', import.meta.url);
    const ids = trace(settleCase(readCase(readFileSync(name), 'heated-tube.case.yaml', vocabulary)).assembled.workings, 'wallTemperature').map(({ id }) => id);
    for (const id of ['heatTransferCoefficient', 'nusselt', 'bulkTemperature', 'wallHeatFlux@wall', 'thermalConductivityBulk']) expect(ids).toContain(id);
  });
});

it('a wall that exchanges heat with its surroundings runs from one end to the other', async () => {
  const { n } = await planned('heated-tube', [['{ heatFlux: 120 kW/m^2 }', '{ heatTransferCoefficient: 900 W/(m^2 K) }'], ['fluid:', 'surroundings: { temperature: 150 degC }\nfluid:']]);
  // h_i and 900 W/(m^2 K) in series: the face lies nearer to the fluid, and follows it.
  const U = 1 / (1 / n('heatTransferCoefficient') + 1 / 900);
  expect(n('wallTemperatureOutlet')).toBeCloseTo(n('outletTemperature') + (U / n('heatTransferCoefficient')) * (celsius(150) - n('outletTemperature')), 3);
  expect(n('wallTemperatureMax')).toBe(n('wallTemperatureOutlet'));
  expect(n('wallTemperatureMin')).toBeLessThan(n('wallTemperatureOutlet'));
});
