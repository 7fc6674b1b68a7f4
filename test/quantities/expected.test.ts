import { describe, expect, it } from 'vitest';
import { readRuleFolder } from '../../src/decide/index.ts';
import { vocabulary } from '../../src/assemble/index.ts';
import { readCase } from '../../src/case/index.ts';
import { compileFiles, settleCase } from '../../src/plan/index.ts';

const rules = compileFiles(readRuleFolder('rules'));
const at = (text: string): ((id: string) => number | undefined) => { const { workings } = settleCase(readCase(new TextEncoder().encode(text), 'x.case.yaml', vocabulary), { rules }).assembled; return (id) => workings.get(id); };
const cylinder = (more: string): string => `format: 1
targets: [{ quantity: dragCoefficient, within: 5 % }]
flow: cylinder
sizes: { diameter: 20 mm, span: infinite }
fluid: { material: air, pressure: 1 atm }
${more}`;

describe('numbers that a run is held against', () => {
  // Decay of k over one length at omega_0 = 1, 5, 10 U/L: 92, 69, 52 % are left (k-omega form with beta*/beta = 0.09/0.0828, Spalart and Rumsey 2007).
  it.each([[1, 0.92], [5, 0.69], [10, 0.52]])('of k decaying from omega = %d U/L a share of %d is left after L', (omega, share) => {
    const [speed, run, intensity] = [10, 1, 0.05];
    const k = 1.5 * (speed * intensity) ** 2;
    const length = Math.sqrt(k) / (0.09 ** 0.25 * ((omega * speed) / run));
    const of = at(cylinder(`inlet: { speed: ${speed} m/s, temperature: 20 degC, turbulence: { intensity: ${intensity}, length: ${length} m } }\nchoices: { domain: { upstream: ${run} m } }`));
    expect(of('specificDissipationRate')).toBeCloseTo(omega * 10, 6);
    expect(of('turbulenceKept')).toBeCloseTo(share, 2);
    expect(of('turbulenceIntensityBody')).toBeCloseTo(intensity * Math.sqrt(of('turbulenceKept') as number), 9);
  });
  it('ends of the region: multiples, the larger run, what the sides add to the drag', () => {
    const of = at(cylinder('inlet: { speed: 1 m/s, temperature: 20 degC }\nchoices: { domain: { upstream: 0.3 m, downstream: 0.6 m, sides: 0.24 m } }'));
    expect(of('domainSidesRatio')).toBeCloseTo(12, 9);
    expect(of('domainDownstreamLarger')).toBeCloseTo(0.9, 12);
    expect(of('domainBlockage')).toBeCloseTo(0.02 / 0.5, 12);
    // Allen and Vincenti by hand: (1 + C_D b/4 + 0.82 b^2)^2 - 1 at b = 0.04.
    const drag = of('dragCoefficient') as number;
    expect(of('domainErrorDrag')).toBeCloseTo((1 + drag * 0.01 + 0.82 * 0.0016) ** 2 - 1, 9);
    expect(of('domainErrorDragLarger')).toBeLessThan(of('domainErrorDrag') as number);
  });
  it('limits of a passage', () => {
    const of = at(`format: 1
targets: [{ quantity: outletTemperature, within: 1 K }]
flow: pipe
sizes: { diameter: 40 mm, length: 2 m }
fluid: { material: water, pressure: 2 bar abs }
inlet: { speed: 1 m/s, temperature: 50 degC, profile: developed }
wall: { temperature: 20 degC }
`);
    expect(of('returningFlow')).toBeCloseTo(0.01 * (of('massFlow') as number), 12);
    expect(of('logLayerTop')).toBeCloseTo(0.2 * (of('frictionReynolds') as number), 9);
    expect(of('eddyViscosityCore')).toBeCloseTo(0.07 * (of('frictionReynolds') as number), 9);
    expect(of('calmLength')).toBeCloseTo(2, 12);
    // 2.25 viscous lengths of the wall, k_s+ below which a wall counts as smooth.
    expect(of('featureLimit')).toBeCloseTo((2.25 * (of('kinematicViscosity') as number)) / (of('frictionVelocity') as number), 12);
    // Forecast of a comparison: u_num = sqrt((1/3)^2 + (1/30)^2 + 0.1^2)/2 K; 0.15 K of a fluid temperature; seen from 2.84 u_val on.
    expect(of('targets.0.numericalPart')).toBeCloseTo(Math.sqrt(1 / 9 + 1 / 900 + 0.01) / 2, 9);
    expect(of('targets.0.dataPart')).toBe(0.15);
  });
});
