import { expect, it } from 'vitest';
import { Problem } from '../../src/problems/index.ts';
import { gridsDocument, gridsText } from '../../src/report/index.ts';
import { grids, textOf } from '../../src/results/index.ts';

const seeds = ['cells,length [m],u\n18000,6.063,1.0\n8000,5.972,1.2\n4500,5.863,1.3\n', 'size [mm];temperature rise [degC]\n1;20.5\n2;21.5\n4;25.5\n8;30\n', 'step [s]\t"a ""b"""\n1e-3\t0\n2e-3\t-0\n4e-3\t1e300\n'];
const pieces = ['0', '-1', '1e308', '-1e308', '1e-320', 'nan', '"', '\n', ';', ',', '\t', '[', ']', '[m]', '%', '\u001b[31m', '#', 'e', '.', '\u0000', '\ufeff', 'cells', '9'.repeat(400), '__proto__'];

/** Minimal standard generator of Park and Miller, 1988. */
function dice(seed: number): (sides: number) => number {
  let state = seed;
  return (sides) => {
    state = (16807 * state) % 2147483647;
    return state % sides;
  };
}

const endless = (value: unknown): boolean => (typeof value === 'number' ? !Number.isFinite(value) : typeof value === 'object' && value !== null && Object.values(value).some(endless));

it('whatever stands in the file, there is a verdict of finite numbers or a problem, and no escape sequence', () => {
  const roll = dice(20260);
  let verdicts = 0;
  for (let k = 0; k < 6000; k++) {
    let text = seeds[roll(seeds.length)] as string;
    for (let m = roll(2); m >= 0; m--) {
      const at = roll(text.length + 1);
      text = text.slice(0, at) + (pieces[roll(pieces.length)] as string) + text.slice(at + roll(4));
    }
    try {
      const result = grids(textOf(new TextEncoder().encode(text), 'a.csv'), 'a.csv', k % 2 === 0 ? {} : { within: '10 %' });
      verdicts += 1;
      expect(endless(gridsDocument(result))).toBe(false);
      expect(/\u001b|NaN|undefined|Infinity|infinite/.test(gridsText(result))).toBe(false);
    } catch (error) {
      if (!(error instanceof Problem)) throw new Error(`${JSON.stringify(text)} ended in ${String(error)}`, { cause: error });
    }
  }
  expect(verdicts).toBeGreaterThan(200);
});
