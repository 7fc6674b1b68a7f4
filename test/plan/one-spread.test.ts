import { readdirSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { vocabulary } from '../../src/assemble/index.ts';
import { readCaseFile } from '../../src/case/index.ts';
import { plan, settleCase } from '../../src/plan/index.ts';
import { spreads } from '../../src/workings/index.ts';

const folder = new URL('../../examples/', import.meta.url);
const files = readdirSync(folder).filter((f) => f.endsWith('.case.yaml'));

/** The same number to seven digits: loops close to eight, and the graph has stood elsewhere in between. */
const near = (a: number | undefined, b: number | undefined): boolean => a === b || (a !== undefined && b !== undefined && Math.abs(a - b) <= 1e-7 * Math.max(Math.abs(a), Math.abs(b)));

describe('one spread for one number', () => {
  it.each(files)('%s: the screen, the full plan and the trace give each number the same spread', async (file) => {
    const on = readCaseFile(new URL(file, folder).pathname, vocabulary);
    const short = await plan(on, { version: 'test', sections: ['cautions'] });
    const full = await plan(on, { version: 'test', flips: true });
    const both = Object.keys(short.quantities).filter((id) => full.quantities[id] !== undefined);
    expect(both.length).toBeGreaterThan(50);
    const apart = both.filter((id) => !near(short.quantities[id]?.low, full.quantities[id]?.low) || !near(short.quantities[id]?.high, full.quantities[id]?.high));
    expect(apart).toEqual([]);
    const { workings } = settleCase(on).assembled;
    const alone = short.targets.filter((t) => t.computed && full.quantities[t.quantity]?.low !== undefined).filter(({ quantity }) => {
      const spread = spreads(workings, [quantity]).get(quantity);
      return !near(spread?.low, full.quantities[quantity]?.low) || !near(spread?.high, full.quantities[quantity]?.high);
    });
    expect(alone).toEqual([]);
  });
});
