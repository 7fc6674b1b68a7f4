import { describe, expect, it } from 'vitest';
import { decide, flips } from '../../src/decide/index.ts';
import { quantity, way, type Definition } from '../../src/workings/index.ts';
import { band, graph, number, pack, target } from './harness.ts';

const product = (id: string, needs: string[], value: (...of: number[]) => number): Definition => quantity(id, { symbol: id, name: id, unit: '1' }, [way({ needs, value: (of) => value(...needs.map((n) => of[n] as number)), formula: id, source: 'test' })]);
const definitions = [number('speed', 'm/s'), number('size', 'm'), product('reynolds', ['speed', 'size'], (u, d) => (u * d) / 1e-6), product('square', ['speed'], (u) => u * u)];
const rules = pack({ effect: 'turbulence', branches: [band('a', 'reynolds', 2000, 4000)] }, { effect: 'compressibility', branches: [band('a', 'square', 0.09, 0.09)] });
const inputs = [{ path: 'speed', lo: 0.01, hi: 1 }, { path: 'size', lo: 0.001, hi: 1 }];

describe('flip values', () => {
  // Re = U D/nu with nu = 1e-6, D = 0.02: Re = 2000 at U = 0.1, 4000 at 0.2; U^2 = 0.09 at U = 0.3 (by hand).
  const w = graph(definitions, { speed: 0.15, size: 0.02 }, rules);
  const found = flips(w, rules, [], inputs);
  it('are where the deciding quantity meets a limit, nearest first, for all effects at once', () => {
    expect(found.get('turbulence')).toEqual([
      { path: 'speed', value: expect.closeTo(0.2, 4), unit: 'm/s', verdict: 'include' },
      { path: 'size', value: expect.closeTo(4e-3 / 0.15, 4), unit: 'm', verdict: 'include' },
      { path: 'speed', value: expect.closeTo(0.1, 4), unit: 'm/s', verdict: 'leave-out' },
      { path: 'size', value: expect.closeTo(2e-3 / 0.15, 4), unit: 'm', verdict: 'leave-out' },
    ]);
    expect(found.get('compressibility')).toEqual([{ path: 'speed', value: expect.closeTo(0.3, 4), unit: 'm/s', verdict: 'include' }]);
  });
  it('hold the verdict on either side', async () => {
    for (const [id, list] of found) for (const { path, value, verdict } of list) {
      const outward = value > (path === 'speed' ? 0.15 : 0.02) ? 1.001 : 0.999;
      const at = async (x: number) => (await decide(graph(definitions, { speed: 0.15, size: 0.02, [path]: x }, rules), rules, [])).effects.find((e) => e.id === id)?.verdict;
      expect(await at(value * outward)).toBe(verdict);
      expect(await at(value / outward)).not.toBe(verdict);
    }
  });
  it('leave the graph at its nominal point', () => {
    expect([w.get('speed'), w.get('size'), w.word('verdict.turbulence')]).toEqual([0.15, 0.02, 'borderline']);
  });
  it('stand in the decisions where inputs are named', async () => {
    const { effects } = await decide(w, rules, [target('reynolds')], { inputs });
    expect(effects.find((e) => e.id === 'turbulence')?.flipsAt).toEqual(found.get('turbulence'));
  });
  it('are none where nothing changes, and where an input has no number', () => {
    expect(flips(w, rules, [], [{ path: 'speed', lo: 0.14, hi: 0.16 }]).size).toBe(0);
    expect(flips(w, rules, [], [{ path: 'nothing', lo: 1, hi: 2 }]).size).toBe(0);
  });
});
