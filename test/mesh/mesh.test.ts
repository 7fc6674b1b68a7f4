import { describe, expect, it } from 'vitest';
import { flows, type Flow } from '../../src/flows/index.ts';
import { geometricBetween, geometricRatio, inverseSinhc, tanhStretching, wallModelledCells } from '../../src/mesh/index.ts';
import { layersBelow, layersToMatch, stackHeight } from '../../src/quantities/index.ts';
import { workingsOf } from '../flows/harness.ts';

const near = (value: number, expected: number, relative: number): void => expect(Math.abs(value / expected - 1)).toBeLessThanOrEqual(relative);
const pipe = flows['pipe'] as Flow;
/** Water at 1.5 m/s in a pipe of 50 mm, turbulent, heat asked for. */
const water = { density: 998.2, viscosity: 1.002e-3, thermalConductivity: 0.598, specificHeatCapacity: 4184, inletTemperature: 293.15, pressure: 3e5, 'sizes.diameter': 0.05, 'sizes.length': 3, 'inlet.speed': 1.5, 'has.period': 'no', 'has.species': 'no', storage: 'cell-centred', energySolved: 'no', targetHeat: 'no', targetMomentum: 'yes', 'choice.turbulence-treatment': 'rans', 'choice.dimension-and-cuts': 'axisymmetric', 'choice.mesh-topology': 'structured' };

describe('layers at a wall', () => {
  it('29 whole layers fit below 10 mm from 10 um at a growth of 1.2: ln(1 + 200)/ln 1.2 = 29.09', () => expect(layersBelow(1e-5, 1.2, 1e-2)).toBe(29));
  it('grow from 1 to 10 in 14 layers at 1.2: 1 + ln 10/ln 1.2 = 13.63', () => expect(layersToMatch(1, 1.2, 10)).toBe(14));
  // First node at y+ = 1 and 0.3, cell twice that: whole cells below 5 and 30, counted by adding heights 2, 2.4, 2.88 ...
  it.each([[1, 1.2, 5, 2], [1, 1.2, 30, 7], [1, 1.1, 5, 2], [1, 1.1, 30, 9], [0.3, 1.2, 5, 5], [0.3, 1.2, 30, 13]])('first node y+ %d, growth %d, below %d: %d cells', (node, growth, top, cells) => {
    expect(layersBelow(2 * node, growth, top)).toBe(cells);
    let [height, cell, count] = [0, 2 * node, 0];
    for (; height + cell <= top; cell *= growth) { height += cell; count++; }
    expect(count).toBe(cells);
  });
  it('a growth of 1 gives equal layers', () => {
    expect(stackHeight(2, 1, 5)).toBe(10);
    expect(layersBelow(2, 1, 9)).toBe(4);
  });
});

describe('grading of an edge', () => {
  // S/h1 = 1000: g^N - 1 = 1000 (g - 1); N = 60 and 40 give 1.075 and 1.130 to three digits.
  it.each([[60, 1.075], [40, 1.13]])('geometric, S/h1 = 1000, %d cells: %d', (cells, ratio) => {
    const g = geometricRatio({ first: 1, length: 1000, cells });
    near(g, ratio, 1e-3);
    near(stackHeight(1, g, cells), 1000, 1e-9);
  });
  it('shrinks where equal cells would not fill the edge', () => {
    const g = geometricRatio({ first: 1, length: 5, cells: 10 });
    expect(g).toBeLessThan(1);
    near(stackHeight(1, g, 10), 5, 1e-9);
  });
  it('is 1 for equal cells, and nothing for one cell', () => {
    expect(geometricRatio({ first: 1, length: 10, cells: 10 })).toBe(1);
    expect(geometricRatio({ first: 1, length: 10, cells: 1 })).toBeNaN();
  });
  it('between two ends fills the edge exactly', () => {
    const { ratio, cells } = geometricBetween({ first: 1, last: 20, length: 300 });
    near(stackHeight(1, ratio, cells), 300, 1e-9);
    near(ratio ** (cells - 1), 20, 1e-9);
  });
  // Slope form sinh(2 d)/(2 d) = S/(N h1) gives 2.60 at S/h1 = 1000, N = 60; the exact first cell shifts it by some per cent.
  it('hyperbolic tangent: the first cell is that asked for', () => {
    const d = tanhStretching({ first: 1, length: 1000, cells: 60 });
    near(1000 * (1 + Math.tanh(d * (1 / 60 - 1)) / Math.tanh(d)), 1, 1e-9);
    near(d, 2.6, 0.05);
  });
  it.each([1.001, 1.5, 2.5, 3, 10, 100, 1000])('inverse of sinh(d)/d at %d within 0.05 %%', (b) => { const d = inverseSinhc(b); near(d, bisect((x) => Math.sinh(x) / x, b), 5e-4); });
});
const bisect = (f: (x: number) => number, wanted: number): number => { let [a, b] = [1e-6, 20]; for (let k = 0; k < 200; k++) { const m = (a + b) / 2; if (f(m) < wanted) a = m; else b = m; } return a; };

describe('cells', () => {
  it('of a modelled layer, Re_L 1e7 from 5e5, square plate, 2500 per cube: 1.025e8 (Choi and Moin 2012, by hand)', () => near(wallModelledCells({ reynolds: 1e7, from: 5e5, aspect: 1, perCube: 2500 }), 1.025e8, 1e-3));
  it('in a slice of a pipe are the product of their directions over half the section', () => {
    const w = workingsOf(pipe, { ...water, yPlusTarget: 1 });
    const of = (id: string): number => w.get(id) as number;
    for (const r of ['entry', 'run']) {
      expect(of(`regionCells@${r}`)).toBe((of(`cellsAlong@${r}`) * of(`cellsAcross@${r}`)) / 2);
      expect(of(`cellsSpan@${r}`)).toBe(1);
      expect(of(`cellsAlong@${r}`) % of('countMultiple')).toBe(0);
      expect(of(`cellsAcross@${r}`) * of('coreCellSize')).toBeGreaterThan(0.05);
      near(2 * stackHeight(of('firstCellHeight'), of(`edgeRatio@${r}`), of(`cellsAcross@${r}`) / 2), 0.05, 1e-6);
    }
    near(of('cellCount'), of('regionCells@entry') + of('regionCells@run'), 1e-3);
    near(of('cellCountFine') / of('cellCount'), of('refinementRatio') ** 2, 1e-3);
  });
  it('a whole pipe has the layers of its whole girth: at least pi D N_l/h', () => {
    const w = workingsOf(pipe, { ...water, yPlusTarget: 1, 'choice.dimension-and-cuts': 'three-dimensional' });
    const section = (w.get('cellsAcross@run') as number) * (w.get('cellsSpan@run') as number);
    const girth = (Math.PI * 0.05) / (w.get('coreCellSize') as number);
    expect(section).toBeGreaterThan(0.95 * girth * (w.get('layerCount') as number));
  });
});

describe('first cell', () => {
  it('is twice the distance of the node in cell-centred storage, once in node-centred', () => {
    const at = (storage: string): number => workingsOf(pipe, { ...water, storage, yPlusTarget: 1 }).get('firstCellHeight') as number;
    near(at('cell-centred'), 2 * at('node-centred'), 1e-12);
  });
  it('halves with the Prandtl number eight times, where heat is asked for', () => {
    const at = (prandtlWall: number): number => workingsOf(pipe, { ...water, targetHeat: 'yes', prandtlWall, 'choice.near-wall-treatment': 'resolved' }).get('firstNodeDistance') as number;
    near(at(56) / at(7), 0.5, 1e-9);
    near(workingsOf(pipe, { ...water, targetHeat: 'yes', prandtlWall: 0.7, 'choice.near-wall-treatment': 'resolved' }).get('yPlusTarget') as number, 1, 1e-12);
  });
  it('follows a cell that is given', () => near(workingsOf(pipe, { ...water, 'choices.firstCell': 4e-5 }).get('firstNodeDistance') as number, 2e-5, 1e-12));
  it('stands on the layers in laminar flow, and on no y+', () => {
    const w = workingsOf(pipe, { ...water, 'inlet.speed': 0.02, 'choice.turbulence-treatment': 'none', 'choice.near-wall-treatment': 'none' });
    expect(w.get('yPlusTarget')).toBeUndefined();
    near(w.get('firstCellHeight') as number, 0.025 / 20, 1e-9);
  });
});
