import { performance } from 'node:perf_hooks';
import { describe, expect, it } from 'vitest';
import { vocabulary } from '../../src/assemble/vocabulary.ts';
import { readCase, readCaseFile } from '../../src/case/index.ts';
import { Problem } from '../../src/problems/index.ts';

const full = (piece: string): string => piece.repeat(Math.floor(262_144 / piece.length));
const bytes = (...values: number[]): Uint8Array => Uint8Array.from(values);

const rows: { what: string; input: string | Uint8Array }[] = [
  { what: '10 MB of one letter', input: 'a'.repeat(1e7) },
  { what: '10 MB of brackets', input: '['.repeat(1e7) },
  { what: 'nothing', input: '' },
  { what: 'spaces', input: ' \n\n ' },
  { what: 'a lone word', input: 'pipe' },
  { what: 'a list', input: '- 1\n- 2' },
  { what: 'invalid UTF-8', input: bytes(0x66, 0x3a, 0xff, 0xfe, 0x80) },
  { what: 'UTF-16', input: bytes(0xff, 0xfe, 0x66, 0) },
  { what: 'zeros', input: new Uint8Array(1000) },
  { what: 'an escape sequence', input: 'title: a\u001b[31mb' },
  { what: 'a right-to-left mark', input: 'title: a\u202eb' },
  { what: 'carriage returns alone', input: 'flow: pipe\rsizes: {}' },
  { what: 'lone surrogate', input: 'title: \ud800' },
  { what: 'alias bomb', input: `a: &a [x, x]\n${Array.from({ length: 9 }, (_, i) => `${'bcdefghij'[i]}: &${'bcdefghij'[i]} [${Array(9).fill(`*${'abcdefghi'[i]}`).join(', ')}]`).join('\n')}` },
  { what: 'nested brackets', input: `a: ${'['.repeat(5000)}${']'.repeat(5000)}` },
  { what: 'nested braces', input: full('{a: ') },
  { what: 'nested items', input: full('- ') },
  { what: 'nested keys by indentation', input: Array.from({ length: 700 }, (_, i) => `${' '.repeat(i)}a:`).join('\n') },
  { what: 'thirty levels', input: Array.from({ length: 30 }, (_, i) => `${' '.repeat(i)}wall:`).join('\n') },
  { what: 'many unknown keys', input: Array.from({ length: 4900 }, (_, i) => `key${i}: 1`).join('\n') },
  { what: 'one key again and again', input: 'gravity: 1 m/s^2\n'.repeat(4900) },
  { what: 'many keys in braces', input: `{${Array.from({ length: 4900 }, (_, i) => `k${i}: 1`).join(',')}}` },
  { what: 'quotes', input: full('"') },
  { what: 'colons', input: full(': ') },
  { what: 'anchors', input: full('&a ') },
  { what: 'stars', input: full('*a ') },
  { what: 'directives', input: full('%TAG ! !\n') },
  { what: 'documents', input: full('---\n') },
  { what: 'question marks', input: full('? ') },
  { what: 'comments alone', input: full('# \n').slice(0, 50_000) },
  { what: 'a long line', input: `title: ${'x'.repeat(262_000)}` },
  { what: 'a long number', input: `flow: pipe\nsizes: { length: ${'9'.repeat(200_000)} m }\nfluid: {}` },
  { what: 'empty lines within a text', input: `title: a${'\n'.repeat(262_000)}b` },
  { what: 'a target a thousand times', input: `flow: pipe\ntargets:\n${'  - { quantity: 1 }\n'.repeat(3000)}` },
];

describe('any bytes give a clear problem', () => {
  it.each(rows)('$what', { timeout: 5000 }, ({ what, input }) => {
    const start = performance.now();
    let thrown: unknown;
    try {
      readCase(input, 'case.yaml', vocabulary);
    } catch (error) {
      thrown = error;
    }
    console.log(`${what}: ${(performance.now() - start).toFixed(0)} ms`);
    expect(thrown).toBeInstanceOf(Problem);
    const { list } = thrown as Problem;
    expect(list.length).toBeGreaterThan(0);
    expect(list.length).toBeLessThan(210);
    for (const one of list) {
      expect(one.message.length).toBeLessThan(400);
      expect(one.file).toBe('case.yaml');
    }
  });

  it('a random sprinkle of bytes over a good case never ends in anything but a problem', { timeout: 20_000 }, () => {
    const good = new TextEncoder().encode('flow: pipe\nsizes: { diameter: 25 mm, length: 8 m }\nfluid: { material: water, pressure: 2 bar abs }\ninlet: { speed: 0.4 m/s }\nwalls: [{ name: wall, temperature: 20 degC }]\n');
    let seed = 7;
    const random = (below: number): number => (seed = (seed * 48271) % 2147483647) % below;
    const odd = [...new TextEncoder().encode('{}[]:,-&*!|>%@`"\'#?\t\n 0e.'), 0, 0xff, 0xc3, 0x1b];
    const other: unknown[] = [];
    for (let i = 0; i < 600; i++) {
      const broken = good.slice();
      for (let n = 0; n <= i % 4; n++) broken[random(broken.length)] = odd[random(odd.length)] as number;
      try {
        readCase(broken, 'case.yaml', vocabulary);
      } catch (error) {
        if (!(error instanceof Problem)) other.push(error);
      }
    }
    expect(other).toEqual([]);
  });

  it('nothing reaches the prototype of objects', () => {
    expect(() => readCase('__proto__: { polluted: true }\nsizes: { __proto__: { polluted: true } }\n', 'case.yaml', vocabulary)).toThrow(Problem);
    expect(({} as Record<string, unknown>)['polluted']).toBeUndefined();
  });

  it.each([
    { path: '/dev/zero', code: 'no-file' },
    { path: '/', code: 'no-file' },
    { path: '/no/such/file.yaml', code: 'missing-file' },
  ])('$path is no case file', ({ path, code }) => {
    let thrown: unknown;
    try {
      readCaseFile(path, vocabulary);
    } catch (error) {
      thrown = error;
    }
    expect((thrown as Problem).list.map((one) => one.code)).toEqual([code]);
  });
});
