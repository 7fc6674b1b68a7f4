import { readdirSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { vocabulary } from '../../src/assemble/index.ts';
import { readCaseFile } from '../../src/case/index.ts';
import { plan } from '../../src/plan/index.ts';

const files = readdirSync('examples').filter((name) => name.endsWith('.case.yaml'));

describe('a plan without the rules engine beside it', () => {
  it.each(files)('%s: verdicts and choices are those of the plan with it', async (name) => {
    const on = readCaseFile(`examples/${name}`, vocabulary);
    const [quick, whole] = [await plan(on, { version: 'test', quick: true, sections: ['cautions'] }), await plan(on, { version: 'test', sections: ['cautions'] })];
    expect(whole.effects.length).toBeGreaterThan(50);
    expect(quick.effects).toEqual(whole.effects);
    expect(quick.choices).toEqual(whole.choices);
  });
});
