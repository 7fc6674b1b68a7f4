import { describe, expect, it } from 'vitest';
import { flows, type Flow } from '../../src/flows/index.ts';
import { crosswindDiffusion, diffusionShare } from '../../src/numerics/index.ts';
import { workingsOf } from '../flows/harness.ts';

const near = (value: number | undefined, expected: number, relative: number): void => expect(Math.abs((value ?? Number.NaN) / expected - 1)).toBeLessThanOrEqual(relative);
const pipe = flows['pipe'] as Flow;
const had = (given: Readonly<Record<string, number | string>>, id: string): number | undefined => workingsOf(pipe, { energySolved: 'no', inletTemperature: 300, pressure: 1e5, ...given }).get(id);

describe('diffusion that first-order upwind adds across the flow', () => {
  // Square cells: sin(2a)(sin a + cos a)/4; at 45 degrees sqrt(2)/4 = 0.354, the value of de Vahl Davis and Mallinson 1976.
  it.each([[5, 0.047], [10, 0.099], [20, 0.206], [30, 0.296], [45, Math.SQRT2 / 4]])('%d degrees: %d U h', (degrees, share) => near(crosswindDiffusion({ speed: 1, along: 1, across: 1, angle: (degrees * Math.PI) / 180 }), share, 6e-3));
  it('is none along the lines', () => expect(crosswindDiffusion({ speed: 1, along: 1, across: 1, angle: 0 })).toBe(0));
});

describe('share of a better scheme', () => {
  it('falls with the cells per front and stays below one', () => {
    for (const kind of ['upwind-2', 'upwind-3', 'central-2', 'limited'] as const) for (let cells = 3; cells < 40; cells += 1) {
      expect(diffusionShare(kind, cells + 1)).toBeLessThanOrEqual(diffusionShare(kind, cells));
      expect(diffusionShare(kind, cells)).toBeLessThan(1);
    }
  });
  /** A step front on a line, second-order upwind, small steps: its squared width grows by 2 Gamma t where diffusion acts. */
  it('of second-order upwind agrees with a front carried by its own thickness, 10 cells, within a factor of 2', () => {
    const [cells, n] = [400, 10];
    const erf = (x: number): number => { let s = 0; const h = x / 400; for (let i = 0; i < 400; i++) s += Math.exp(-(((i + 0.5) * h) ** 2)) * h; return (2 / Math.sqrt(Math.PI)) * s; };
    const sigma = n / 2.563; // 10 to 90 % of a Gaussian front
    let u = Array.from({ length: cells }, (_, i) => (1 - erf((i - 150) / (sigma * Math.SQRT2))) / 2);
    const rate = (f: number[]): number[] => f.map((_, i) => (i < 2 ? 0 : -((3 * (f[i] as number) - 4 * (f[i - 1] as number) + (f[i - 2] as number)) / 2)));
    const dt = 0.05;
    for (let t = 0; t < n / dt; t++) {
      const k1 = rate(u);
      const k2 = rate(u.map((v, i) => v + dt * (k1[i] as number)));
      const k3 = rate(u.map((v, i) => v + (dt / 4) * ((k1[i] as number) + (k2[i] as number))));
      u = u.map((v, i) => v + (dt / 6) * ((k1[i] as number) + (k2[i] as number) + 4 * (k3[i] as number)));
    }
    const at = (level: number): number => { const i = u.findIndex((v, k) => k > 120 && v < level); return i - 1 + ((u[i - 1] as number) - level) / ((u[i - 1] as number) - (u[i] as number)); };
    const width = (at(0.1) - at(0.9)) / 2.563;
    const gamma = (width ** 2 - sigma ** 2) / (2 * n);
    const share = gamma / 0.5; // first-order upwind: U h/2
    expect(share / diffusionShare('upwind-2', 10)).toBeGreaterThan(0.5);
    expect(share / diffusionShare('upwind-2', 10)).toBeLessThan(2);
  });
});

describe('chain of tolerances', () => {
  // W = 5 % and 1 %, from rest: log10(30/W) + 1 = 3.78, raised to 4, and 4.48.
  it.each([[0.05, 4], [0.01, 4.477]])('W = %d asks for %d decades', (targetTolerance, decades) => near(had({ targetTolerance }, 'residualDecades'), decades, 1e-3));
  it('iteration takes a tenth of what the mesh may', () => near((had({ targetTolerance: 0.03 }, 'meshTolerance') as number) / (had({ targetTolerance: 0.03 }, 'iterationTolerance') as number), 10, 1e-12));
  // N_dec 1000 and m 100: z = 10^-0.1, B = e_it (1 - z)/z = 0.26 e_it.
  it('a slow run needs a narrow band', () => near((had({ iterationTolerance: 1, sweepIterations: 1000, monitorWindow: 100 }, 'monitorBand') as number), 0.259, 2e-3));
});

describe('digits', () => {
  // 100 cells of aspect 100 along L: L/h_min = 1e4, kappa = 16/pi^2 1e8, 7.2 digits lost.
  it('100 cells of aspect 100 cost 7.2 digits', () => near(had({ domainUpstream: 0, domainDownstream: 0, flowLength: 1e4, firstCellHeight: 1 }, 'digitsLost'), 7.2, 2e-3));
});

describe('loops', () => {
  // |q| = 5, 20 and 45: 21, 73 and 159 relaxed passes to a thousandth, relaxation 0.29, 0.09, 0.04.
  it.each([[5, 21, 0.29], [20, 73, 0.09], [45, 159, 0.0426]])('gain %d takes %d passes', (largestGain, passes, relaxation) => {
    near(had({ largestGain }, 'loopPasses'), passes, 0.01);
    near(had({ largestGain }, 'loopRelaxation'), relaxation, 0.02);
  });
});
