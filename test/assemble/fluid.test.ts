import { describe, expect, it } from 'vitest';
import { vocabulary } from '../../src/assemble/index.ts';
import { readCase } from '../../src/case/index.ts';
import { settleCase } from '../../src/plan/index.ts';
import { Problem, type ProblemData } from '../../src/problems/index.ts';

const told = (fluid: string): ProblemData | undefined => {
  try {
    settleCase(readCase(`format: 1\ntitle: t\nflow: pipe\nsizes: { diameter: 0.3 m, length: 5 m }\nfluid: ${fluid}\ninlet: { speed: 1 m/s, temperature: 20 degC }\n`, 't.case.yaml', vocabulary));
  } catch (error) {
    if (error instanceof Problem) return error.list[0];
    throw error;
  }
  return undefined;
};

describe('the composition of a case', () => {
  it.each([
    ['{ composition: { nitrogen: 79 % mol, oxygen: 21 % mol }, pressure: 1 bar abs }', 'composition-without-material', 'material: gas mixture'],
    ['{ composition: { propylene glycol: 40 % mass }, pressure: 1 bar abs }', 'composition-without-material', 'propylene glycol-water'],
    ['{ material: ethylene glycol-water, composition: { propylene glycol: 40 % mass }, pressure: 2 bar abs }', 'wrong-composition', 'propylene glycol-water'],
  ])('%s is refused with its remedy', (fluid, code, nearest) => {
    expect(told(fluid)).toMatchObject({ code, nearest, file: 't.case.yaml', line: 5 });
  });

  it('is told where it stands, whatever the order of its parts', () => {
    const share = (fluid: string): number | undefined => settleCase(readCase(`format: 1\ntitle: t\nflow: pipe\nsizes: { diameter: 0.3 m, length: 5 m }\nfluid: ${fluid}\ninlet: { speed: 1 m/s, temperature: 20 degC }\n`, 't.case.yaml', vocabulary)).assembled.fluidState.composition;
    expect(share('{ material: propylene glycol-water, composition: { propylene glycol: 40 % mass, water: 60 % mass } }')).toBe(0.4);
    expect(share('{ material: propylene glycol-water, composition: { water: 60 % mass, propylene glycol: 40 % mass } }')).toBe(0.4);
    expect(told('{ material: propylene glycol-water, composition: { propylene glycol: 40 % mol } }')?.code).toBe('wrong-basis');
  });
});
