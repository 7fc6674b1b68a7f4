import { describe, expect, it } from 'vitest';
import { flows } from '../../src/flows/index.ts';
import { references } from '../../src/references/index.ts';

const rungs = Object.values(flows).flatMap((flow) => flow.ladder.map((rung) => ({ ...rung, flow: flow.id })));
const found = (id: string) => references.find((ref) => ref.id === id);

describe('the ladders of the flows', () => {
  it('name references that exist', () => expect(rungs.filter((rung) => !found(rung.reference)).map((rung) => rung.reference)).toEqual([]));
  it('compare numbers that their references hold', () => expect(rungs.filter((rung) => !found(rung.reference)?.values.some((v) => v.id === rung.compares)).map((rung) => `${rung.flow} ${rung.reference} ${rung.compares}`)).toEqual([]));
  it('fill inputs that their references have', () => {
    const odd = rungs.flatMap((rung) => Object.keys(rung.with).filter((need) => !found(rung.reference)?.needs.some((one) => one.id === need)).map((need) => `${rung.flow} ${rung.reference} ${need}`));
    expect(odd).toEqual([]);
  });
});
