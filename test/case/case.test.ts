import { describe, expect, it } from 'vitest';
import { vocabulary } from '../../src/assemble/vocabulary.ts';
import { allPaths, type Case, fieldAt, readCase, readEntry, wallEntries } from '../../src/case/index.ts';

const read = (text: string): Case => readCase(`format: 1\nfluid: { material: water }\n${text}\n`, 'case.yaml', vocabulary);
const pipe = (text: string): Case => read(`flow: pipe\nsizes: { diameter: 1 m }\n${text}`);
const within = (quantity: string, text: string) => pipe(`targets: [{ quantity: ${quantity}, within: ${text} }]`).targets[0]?.within;

describe('quantities', () => {
  it.each([
    { text: '0.40 m/s +/- 5 %', value: 0.4, half: 0.02 },
    { text: '0.2 .. 0.6 m/s', value: 0.4, half: undefined },
    { text: '0.2 .. 0.6 m/s (bounds)', value: 0.4, half: 0.2 },
  ])('$text', ({ text, value, half }) => {
    const entry = pipe(`inlet: { speed: ${text} }`).get('inlet.speed');
    expect(entry?.value).toBeCloseTo(value, 12);
    expect(entry?.spread?.half).toBe(half);
    expect(entry?.written).toBe(text);
  });

  it('gauge becomes absolute and says so', () => {
    const entry = pipe('outlet: { pressure: 4 bar gauge }').get('outlet.pressure');
    expect(entry?.value).toBe(501_325);
    expect(entry?.assumed.join()).toContain('101325 Pa');
  });

  it('keeps the reference of a normal volume flow', () => expect(pipe('inlet: { volumeFlow: 30 m^3/h normal }').get('inlet.volumeFlow')?.reference).toBe('normal'));

  it('a rate constant takes the unit of its order', () => {
    const units = ['2 1/s', '3 mm/s', '1 L/(mol s)'].map((text) => pipe(`reactions: [{ of: a, rateConstant: ${text} }]`).get('reactions.0.rateConstant'));
    expect(units.map((one) => [one?.value, one?.unit])).toEqual([[2, '1/s'], [0.003, 'm/s'], [0.001, 'm^3/(mol s)']]);
  });

  it('quoted, plain and folded values are the same', () => {
    for (const text of ['"0.4 m/s"', "'0.4 m/s'", '0.4\n    m/s']) expect(pipe(`inlet:\n  speed: ${text}`).number('inlet.speed')).toBe(0.4);
  });

  it('knows where a value stands', () => {
    expect(pipe('inlet:\n  speed: 0.4 m/s').get('inlet.speed')?.position).toEqual({ line: 6, column: 10, length: 7 });
  });
});

describe('tolerances', () => {
  it.each([
    { quantity: 'outletTemperature', text: '1 K', is: { absolute: 1, unit: 'K' } },
    { quantity: 'outletTemperature', text: '1.8 degF', is: { absolute: expect.closeTo(1, 12), unit: 'K' } },
    { quantity: 'outletTemperature', text: '5 % of change', is: { ofChange: 0.05 } },
    { quantity: 'pressureDrop', text: '5 %', is: { relative: 0.05 } },
    { quantity: 'pressureDrop', text: '2 kPa', is: { absolute: 2000, unit: 'kg m^-1 s^-2' } },
    { quantity: 'dragCoefficient', text: '0.02', is: { absolute: 0.02, unit: '1' } },
    { quantity: 'temperatureDifference', text: '5 %', is: { relative: 0.05 } },
  ])('$quantity within $text', ({ quantity, text, is }) => expect(within(quantity, text)).toEqual({ ...is, written: text }));

  it.each([
    ['-1 K', 'is not above zero'],
    ['0 K', 'is not above zero'],
    ['0 % of change', 'is not above zero'],
    ['1 .. 2 K', 'is a range'],
    ['some', 'no tolerance'],
    ['1 K K K', 'temperature difference'],
    ['5', 'temperature difference'],
    ['5 bra', 'not a unit'],
  ])('refuses %s of a temperature', (text, says) => expect(() => within('outletTemperature', text)).toThrow(says));
});

describe('walls', () => {
  const cavity = (text: string): Case => read(`flow: side-heated-cavity\nsizes: { height: 1 m, width: 1 m }\n${text}`);
  const all = ['left', 'right', 'top', 'bottom'];
  const got = (text: string, name: string) => Object.fromEntries([...(wallEntries(cavity(text), all, vocabulary).get(name) ?? [])].map(([key, entry]) => [key, entry.written]));

  it('`walls` overrides `wall` key by key', () => {
    const text = 'wall: { emissivity: 0.9, speed: 1 m/s }\nwalls: [{ name: left, emissivity: 0.5 }]';
    expect(got(text, 'left')).toEqual({ emissivity: '0.5', speed: '1 m/s' });
    expect(got(text, 'right')).toEqual({ emissivity: '0.9', speed: '1 m/s' });
  });

  it('a particular heat condition replaces the general one', () => {
    const text = 'wall: { temperature: 20 degC, Ra: 1 um }\nwalls: [{ name: top, adiabatic: true }, { name: left, heat: 5 W, sandGrain: 2 um }, { name: right, adiabatic: false }]';
    expect(got(text, 'top')).toEqual({ adiabatic: 'true', Ra: '1 um' });
    expect(got(text, 'left')).toEqual({ heat: '5 W', sandGrain: '2 um' });
    expect(got(text, 'right')).toEqual({ temperature: '20 degC', adiabatic: 'false', Ra: '1 um' });
  });

  it('layers are replaced as a whole; `sides` speaks of left and right', () => {
    const text = 'wall: { layers: [{ material: steel, thickness: 1 mm }, { material: wool, thickness: 9 mm }] }\nwalls: [{ name: sides, layers: [{ material: glass, thickness: 4 mm }] }, { name: right, emissivity: 0.1 }]';
    expect(got(text, 'left')).toEqual({ 'layers.0.material': 'glass', 'layers.0.thickness': '4 mm' });
    expect(got(text, 'right')).toEqual({ 'layers.0.material': 'glass', 'layers.0.thickness': '4 mm', emissivity: '0.1' });
    expect(got(text, 'top')).toMatchObject({ 'layers.1.material': 'wool' });
  });

  it('a lone wall takes both spellings', () => {
    expect([...(wallEntries(pipe('wall: { temperature: 20 degC }\nwalls: [{ name: wall, emissivity: 0.9 }]'), [], vocabulary).get('wall')?.keys() ?? [])]).toEqual(['temperature', 'emissivity']);
  });
});

describe('paths', () => {
  it.each([
    { path: 'inlet.speed', example: '0.4 m/s' },
    { path: 'sizes.diameter', example: '25 mm' },
    { path: 'walls.left.temperature', example: '20 degC' },
    { path: 'wall.layers.0.thickness', example: '1.5 mm' },
    { path: 'fluid.composition.oxygen', example: '21 % mol' },
  ])('$path leads to its field', ({ path, example }) => expect(fieldAt(vocabulary, 'pipe', path)?.field.example).toBe(example));

  it.each(['inlet', 'inlet.speed.x', 'sizes.stepHeight', '__proto__', 'constructor.name', '', '.', 'walls.left', 'together'])('"%s" leads to none', (path) => expect(fieldAt(vocabulary, 'pipe', path)).toBeUndefined());

  it('reads a value for a path', () => {
    const entry = readEntry(vocabulary, pipe('wall: { temperature: 20 degC }'), 'wall.temperature', '10 .. 30 degC');
    expect(entry).toMatchObject({ path: 'wall.temperature', value: 293.15, range: { from: 283.15, to: 303.15 }, gives: ['wallTemperature@wall', 'outerTemperature@wall'] });
    expect(() => readEntry(vocabulary, pipe(''), 'inlet.sped', '1 m/s')).toThrow('"inlet.sped" is not a path');
  });

  it('lists all paths of a flow', () => {
    expect(allPaths(vocabulary, 'pipe')).toEqual(expect.arrayContaining(['sizes.diameter', 'inlet.turbulence.intensity', 'walls.*.layers.*.thickness']));
  });
});

describe('together', () => {
  it('names inputs of this case', () => {
    expect(pipe('inlet: { speed: 1 m/s +/- 5 %, temperature: 20 +/- 1 degC }\ntogether: [[inlet.speed, inlet.temperature]]').together).toEqual([['inlet.speed', 'inlet.temperature']]);
  });
});

describe('forms of the file', () => {
  const lines = ['format: 1', 'flow: pipe # a comment', 'sizes:', '  diameter: 25 mm', 'fluid: { material: water }', 'purpose: >', '  does it', '  leak?', ''];

  it.each([
    { what: 'line feeds', text: lines.join('\n') },
    { what: 'carriage returns and line feeds', text: lines.join('\r\n') },
    { what: 'a byte order mark', text: `\ufeff${lines.join('\n')}` },
    { what: 'bytes', text: new TextEncoder().encode(`\ufeff${lines.join('\n')}`) },
  ])('$what', ({ text }) => {
    const one = readCase(text, 'case.yaml', vocabulary);
    expect(one.number('sizes.diameter')).toBe(0.025);
    expect(one.get('sizes.diameter')?.position).toEqual({ line: 4, column: 13, length: 5 });
    expect(one.purpose).toBe('does it leak?');
  });

  it('another format is refused; none at all is taken as 1, and said', () => {
    expect(() => readCase('format: 2\nflow: sphere\nsizes: { diameter: 1 m }\nfluid: { material: water }', 'case.yaml', vocabulary)).toThrow('format: 2');
    expect(readCase('flow: sphere\nsizes: { diameter: 1 m }\nfluid: { material: water }', 'case.yaml', vocabulary).warnings).toEqual(['format is not stated; format 1 is taken']);
  });
});
