import { describe, expect, it } from 'vitest';
import { vocabulary } from '../../src/assemble/vocabulary.ts';
import { caseTemplate, readCase } from '../../src/case/index.ts';
import { Problem } from '../../src/problems/index.ts';

const flows = Object.keys(vocabulary.flows);

/** The open places filled with the example that stands behind them. */
const filled = (text: string): string => text.replace(/___( +# .*, for example (.*))$/gm, '$2$1');
/** Every line that is commented out taken in. */
const uncommented = (text: string): string => text.replace(/^( *)# /gm, '$1');

function problems(text: string): readonly string[] {
  try {
    readCase(text, 'case.yaml', vocabulary);
  } catch (error) {
    if (error instanceof Problem) return error.list.map((one) => `${one.line}: ${one.code} ${one.message}`);
    throw error;
  }
  return [];
}

describe.each(flows)('template of %s', (flow) => {
  const text = caseTemplate(vocabulary, flow);

  it('reads once it is filled in', () => {
    expect(problems(filled(text))).toEqual([]);
    expect(readCase(filled(text), 'case.yaml', vocabulary).flow).toBe(flow);
  });

  it('reads with every optional line taken in as well', () => expect(problems(uncommented(filled(text)))).toEqual([]));

  it('as it is, complains of the open places and of nothing else', () => {
    const open = text.match(/: ___/g) ?? [];
    const found = problems(text);
    expect(open.length).toBeGreaterThan(3);
    expect(found).toHaveLength(open.length);
    for (const one of found) expect(one).toMatch(/not-filled-in/);
  });

  it('shows every size of the flow', () => {
    for (const key of Object.keys(vocabulary.flows[flow]?.sizes ?? {})) expect(text).toMatch(new RegExp(`^ +(# )?${key}: `, 'm'));
  });
});

it('all flows of the format are there', () => {
  // the flows of the case format
  expect(flows).toEqual(expect.arrayContaining('pipe duct annulus channel coil fitting backward-step nozzle mixing-tee packed-bed porous-layer tube-bank plate cylinder sphere building bluff-body aerofoil storage-tank general side-heated-cavity bottom-heated-cavity open-cavity lid-driven-cavity room free-jet impinging-jet plume rotating-cylinders rotating-disk stirred-tank open-channel sloshing-tank column-collapse drop bubble pellet flame shock-tube solid'.split(' ')));
  expect(flows).toHaveLength(40);
});

it('an unknown flow gets the nearest', () => {
  let thrown: unknown;
  try {
    caseTemplate(vocabulary, 'ducts');
  } catch (error) {
    thrown = error;
  }
  expect((thrown as Problem).list[0]).toMatchObject({ code: 'unknown-flow', nearest: 'duct' });
});
