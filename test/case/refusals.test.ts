import { describe, expect, it } from 'vitest';
import { vocabulary } from '../../src/assemble/vocabulary.ts';
import { readCase } from '../../src/case/index.ts';
import { printProblem, Problem, type ProblemData } from '../../src/problems/index.ts';

const good = `format: 1
flow: pipe
sizes: { diameter: 25 mm, length: 8 m }
fluid: { material: water, pressure: 2 bar abs }
inlet: { speed: 0.4 m/s, temperature: 65 degC }
`;

function problems(text: string): readonly ProblemData[] {
  try {
    readCase(text, 'case.yaml', vocabulary);
  } catch (error) {
    if (error instanceof Problem) return error.list;
    throw error;
  }
  return [];
}

/** The text that a problem points at. */
function marked(text: string, problem: ProblemData | undefined): string {
  const line = text.split('\n')[(problem?.line ?? 0) - 1] ?? '';
  return line.slice((problem?.column ?? 1) - 1, (problem?.column ?? 1) - 1 + (problem?.length ?? 0));
}

describe('refusals', () => {
  it('the case they vary is a good one', () => expect(problems(good)).toEqual([]));

  it.each([
    { why: 'misspelt key', add: 'inclinatoin: horizontal', code: 'unknown-key', at: 'inclinatoin', nearest: 'inclination' },
    { why: 'key of another map', add: 'velocity: 1 m/s', code: 'unknown-key', at: 'velocity', nearest: undefined },
    { why: 'wrong dimension', add: 'outlet: { pressure: 1 m }', code: 'wrong-dimension', at: 'm', nearest: undefined },
    { why: 'unknown unit', add: 'outlet: { pressure: 1 bra }', code: 'unknown-unit', at: 'bra', nearest: 'bar' },
    { why: 'bare number with a dimension wanted', add: 'gravity: 9.81', code: 'unit-missing', at: '9.81', nearest: undefined },
    { why: 'bare C', add: 'surroundings: { temperature: 20 C }', code: 'ambiguous-unit', at: 'C', nearest: undefined },
    { why: 'difference for a temperature', add: 'surroundings: { temperature: 50 K difference }', code: 'difference-for-temperature', at: 'K', nearest: '50 K' },
    { why: 'bare % of a temperature', add: 'surroundings: { temperature: 20 degC +/- 5 % }', code: 'percent-of-temperature', at: '5 %', nearest: undefined },
    { why: 'bare % of a temperature asked for', add: 'targets: [{ quantity: outletTemperature, within: 5 % }]', code: 'percent-of-temperature', at: '5 %', nearest: undefined },
    { why: 'not a number', add: 'gravity: .nan', code: 'not-a-number', at: '.nan', nearest: undefined },
    { why: 'infinity', add: 'gravity: .inf', code: 'not-a-number', at: '.inf', nearest: undefined },
    { why: 'overflow', add: 'gravity: 1e999 m/s^2', code: 'not-a-number', at: '1e999', nearest: undefined },
    { why: 'comma', add: 'gravity: "9,81 m/s^2"', code: 'not-a-number', at: '9,81', nearest: '9.81' },
    { why: 'negative length', add: 'ground: { roughnessLength: -1 m }', code: 'not-positive', at: '-1 m', nearest: undefined },
    { why: 'smaller than anything', add: 'ground: { roughnessLength: 1e-300 m }', code: 'out-of-bounds', at: '1e-300 m', nearest: undefined },
    { why: 'half a passage', add: 'parallel: 2.5', code: 'not-whole', at: '2.5', nearest: undefined },
    { why: 'below absolute zero', add: 'surroundings: { temperature: -300 degC }', code: 'below-absolute-zero', at: '-300', nearest: undefined },
    { why: 'hotter than any fluid', add: 'surroundings: { temperature: 1e9 K }', code: 'out-of-bounds', at: '1e9 K', nearest: undefined },
    { why: 'wrong word', add: 'time: { character: steedy }', code: 'wrong-word', at: 'steedy', nearest: 'steady' },
    { why: 'word for a number', add: 'inclination: horizontl', code: 'wrong-word', at: 'horizontl', nearest: 'horizontal' },
    { why: 'yes for true', add: 'wall: { adiabatic: yes }', code: 'wrong-word', at: 'yes', nearest: 'true' },
    { why: 'duplicate key', add: 'gravity: 9.8 m/s^2\ngravity: 9.9 m/s^2', code: 'duplicate-key', at: 'gravity', nearest: undefined },
    { why: 'value for a map', add: 'wall: 20 degC', code: 'wrong-shape', at: '20 degC', nearest: undefined },
    { why: 'map for a value', add: 'gravity: { value: 9.8 }', code: 'wrong-shape', at: '{ value: 9.8 }', nearest: undefined },
    { why: 'map for a list', add: 'walls: { wall: { temperature: 20 degC } }', code: 'wrong-shape', at: '{ wall: { temperature: 20 degC } }', nearest: undefined },
    { why: 'nothing given', add: 'gravity:', code: 'empty-value', at: 'gravity', nearest: undefined },
    { why: 'not filled in', add: 'gravity: ___', code: 'not-filled-in', at: '___', nearest: undefined },
    { why: 'alias', add: 'title: *a', code: 'no-alias', at: '*a', nearest: undefined },
    { why: 'anchor', add: 'title: &a x', code: 'no-anchor', at: 'x', nearest: undefined },
    { why: 'tag', add: 'title: !!str x', code: 'no-tag', at: 'x', nearest: undefined },
    { why: 'merge', add: 'wall: { <<: { temperature: 20 degC } }', code: 'no-merge', at: '<<', nearest: undefined },
    { why: 'second document', add: '---\nflow: duct', code: 'unreadable-yaml', at: '---', nearest: undefined },
    { why: 'prototype key', add: '__proto__: { polluted: true }', code: 'unknown-key', at: '__proto__', nearest: undefined },
    { why: 'constructor key', add: 'constructor: x', code: 'unknown-key', at: 'constructor', nearest: undefined },
    { why: 'prototype name', add: 'species: [{ name: __proto__ }]', code: 'wrong-name', at: '__proto__', nearest: undefined },
    { why: 'number as a name', add: 'species: [{ name: "0" }]', code: 'wrong-name', at: '"0"', nearest: undefined },
    { why: 'name twice', add: 'species: [{ name: salt }, { name: salt }]', code: 'duplicate-name', at: 'salt', nearest: undefined },
    { why: 'no name', add: 'species: [{ diffusivity: 1e-9 m^2/s }]', code: 'missing-key', at: '{ diffusivity: 1e-9 m^2/s }', nearest: undefined },
    { why: 'wall of another flow', add: 'walls: [{ name: inner, adiabatic: true }]', code: 'unknown-wall', at: 'inner', nearest: undefined },
    { why: 'space missing', add: 'outlet: {pressure:1 bar}', code: 'unknown-key', at: 'pressure:1 bar', nearest: 'pressure: 1 bar' },
    { why: 'control character in quotes', add: 'title: "a\\e[31mb"', code: 'control-character', at: '"a\\e[31mb"', nearest: undefined },
    { why: 'path that is none', add: 'together: [[inlet.spede, inlet.temperature]]', code: 'unknown-path', at: 'inlet.spede', nearest: 'inlet.speed' },
    { why: 'inlet and inlets', add: 'inlets: [{ name: a, speed: 1 m/s }]', code: 'both-given', at: 'inlets', nearest: undefined },
    { why: 'directive', add: '...\n%YAML 1.1\n---', code: 'no-directive', at: '%YAML 1.1', nearest: undefined },
  ])('$why', ({ add, code, at, nearest }) => {
    const text = `${good}${add}\n`;
    const found = problems(text);
    expect(found.map((one) => one.code)).toEqual([code]);
    expect(marked(text, found[0])).toBe(at);
    expect(found[0]?.nearest).toBe(nearest);
    expect(found[0]?.file).toBe('case.yaml');
    expect(found[0]?.expected).toBeTruthy();
  });

  it('a misspelt flow gets the nearest, and its sizes are not judged', () => {
    const found = problems(good.replace('pipe', 'pip'));
    expect(found.map((one) => [one.code, one.nearest])).toEqual([['wrong-word', 'pipe']]);
  });

  it('sizes depend on the flow', () => {
    const found = problems(good.replace('flow: pipe', 'flow: sphere'));
    expect(found.map((one) => one.code)).toEqual(['unknown-key']);
    expect(found[0]?.message).toBe('"length" is not a key of the sizes of sphere');
  });

  it.each([
    ['channel', 'sizes: { gap: 10 mm }', 'walls: [{ name: bottom, temperature: 40 degC }, { name: top, temperature: 20 degC }]'],
    ['side-heated-cavity', 'sizes: { width: 10 mm, height: 20 mm }', 'walls: [{ name: left, temperature: 40 degC }, { name: right, temperature: 20 degC }]'],
    ['pipe', 'sizes: { diameter: 10 mm }', 'walls: [{ name: wall, temperature: 40 degC }]'],
  ])('the walls shown for a %s are its own', (flow, sizes, expected) => {
    const text = `format: 1\ntitle: t\ntargets: [{ quantity: nusselt, within: 5 % }]\nflow: ${flow}\n${sizes}\nfluid: { material: water }\ninlet: { speed: 1 m/s }\n`;
    for (const walls of ['walls: { hot: { temperature: 60 degC } }', 'walls: [{ temperature: 60 degC }]']) {
      const found = problems(`${text}${walls}\n`);
      expect(found.map((one) => one.expected)).toEqual([expected]);
      expect(problems(`${text}${expected}\n`)).toEqual([]);
    }
  });

  it('names where a misplaced key belongs', () => {
    expect(problems(`${good}emissivity: 0.9\n`)[0]?.expected).toContain('emissivity stands in wall, walls');
  });

  it('lists all problems of a file, in the order of the file', () => {
    const found = problems('flow: pipe\nsizes: { diametre: 25 mm, length: 8 bar }\nfluid: { pressure: 2 }\ntime: { character: never }\n');
    expect(found.map((one) => [one.line, one.code])).toEqual([[2, 'missing-key'], [2, 'unknown-key'], [2, 'wrong-dimension'], [3, 'unit-missing'], [4, 'wrong-word']]);
  });

  it('names what a case needs', () => {
    expect(problems('title: nothing yet\n').map((one) => one.message)).toEqual(['flow is missing', 'sizes is missing', 'fluid is missing']);
    expect(() => readCase('title: nothing yet\n', 'case.yaml', vocabulary, { partial: true })).not.toThrow();
  });

  it('prints with a caret under the offending part', () => {
    const text = good.replace('pressure: 2 bar abs', 'viscosity: 1.0 Pa.s/m');
    const lines = printProblem(problems(text)[0] as ProblemData, text).split('\n');
    expect(lines[0]).toMatch(/^case\.yaml:4:42  fluid\.viscosity: "1\.0 Pa\.s\/m" is not a dynamic viscosity/);
    expect((lines[1] as string).slice((lines[2] as string).indexOf('^'))).toMatch(/^Pa\.s\/m/);
    expect(lines[3]).toMatch(/^ {2}expected {2}a dynamic viscosity, for example/);
  });

  it('takes one or more of two ways to drive a flow: the plan holds them against each other', () => {
    const read = readCase(good.replace('speed: 0.4 m/s', 'speed: 0.4 m/s, massFlow: 0.2 kg/s'), 'case.yaml', vocabulary);
    expect([read.number('inlet.speed'), read.number('inlet.massFlow')]).toEqual([0.4, 0.2]);
  });
});
