import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { besselJ, erf, erfc, erfcScaled, pchip } from '../../src/references/kernels/index.ts';
import { evaluateReference, findReference } from '../../src/references/index.ts';

interface Row { reference: string; given: Record<string, number>; value: string; expected: number; tolerance: number }
interface Kernel { kernel: string; args: number[]; expected: number; tolerance: number }
// Made by independent.py beside it: other methods (collocation, boundary-value solver, library functions), numpy and scipy.
const { rows, kernels } = JSON.parse(readFileSync(new URL('independent.json', import.meta.url), 'utf8')) as { rows: Row[]; kernels: Kernel[] };

const curve = pchip([0, 1, 2.5, 3, 5], [1, 2, 2.1, 0.3, 0.4]);
const functions: Readonly<Record<string, (...x: number[]) => number>> = { erf, erfc, erfcScaled, besselJ, pchip: curve };

describe('kernels against a library', () => {
  it.each(kernels)('$kernel $args', ({ kernel, args, expected, tolerance }) => {
    const got = (functions[kernel] as (...x: number[]) => number)(...args);
    expect(Math.abs(got - expected)).toBeLessThanOrEqual(tolerance * Math.abs(expected) + (kernel === 'besselJ' ? 3e-15 : 0));
  });
});

describe('known answers against an independent computation', () => {
  it.each(rows)('$reference $given $value', ({ reference, given, value, expected, tolerance }) => {
    const found = evaluateReference(findReference(reference), given).values.find((v) => v.id === value);
    // 1e-8 where exact; 1e-4 where the reference itself is a table with that spread. Amounts that have all but died out: absolute.
    expect(Math.abs((found?.value ?? NaN) - expected)).toBeLessThanOrEqual(tolerance * Math.max(Math.abs(expected), 1e-4));
  });
});
