import { describe, expect, it } from 'vitest';
import { vocabulary } from '../../src/assemble/index.ts';
import { readCase, type Case } from '../../src/case/index.ts';
import { back, empty, Interview, replied, repliesIn, resumed, summaryOf, writeCase, type Question, type State } from '../../src/interview/index.ts';
import { plan, settleCase, type Plan } from '../../src/plan/index.ts';
import { Problem } from '../../src/problems/index.ts';
import { missing } from '../../src/workings/index.ts';

const talk = new Interview({ settle: (on) => settleCase(on) });

/** Answers to the start of three flows; what is not here is still open. */
const starts: Readonly<Record<string, Readonly<Record<string, string>>>> = {
  pipe: { 'fluid.material': 'water', 'sizes.diameter': '25 mm', 'inlet.speed': '0.4 m/s', 'inlet.temperature': '65 degC', purpose: 'Does the water leave below 50 degC?', 'targets.0.quantity': 'outletTemperature', 'targets.0.within': '1 K', ifWrong: 'low', 'wall.temperature': '20 degC' },
  plate: { 'fluid.material': 'air', 'sizes.length': '0.5 m', 'inlet.speed': '5 m/s', 'inlet.temperature': '20 degC', purpose: 'What does the plate lose?', 'targets.0.quantity': 'heatRate', 'targets.0.within': '5 %', 'wall.temperature': '60 degC' },
  'side-heated-cavity': { 'fluid.material': 'air', 'sizes.height': '300 mm', 'sizes.width': '100 mm', 'walls.left.temperature': '40 degC', 'walls.right.temperature': '20 degC', purpose: 'What does the box lose?', 'targets.0.quantity': 'nusselt', 'targets.0.within': '5 %' },
};

function asked(state: State): Question {
  const question = talk.next(state);
  if ('done' in question) throw new Error(`nothing is asked: ${question.done}`);
  return question;
}

function said(state: State, text: string): State {
  const outcome = talk.answer(state, text);
  if ('problem' in outcome) throw outcome.problem;
  return outcome.state;
}

/** Answers by path until a question is not among them. */
function begun(flow: string, answers: Readonly<Record<string, string>> = starts[flow] ?? {}): State {
  const key = JSON.stringify([flow, answers]);
  const state = kept.get(key) ?? begin(flow, answers);
  kept.set(key, state);
  return state;
}
const kept = new Map<string, State>();

function begin(flow: string, answers: Readonly<Record<string, string>>): State {
  let state = said(empty, flow);
  for (let question = talk.next(state); !('done' in question); question = talk.next(state)) {
    const path = question.now === undefined ? question.paths.find((one) => answers[one] !== undefined) : undefined;
    if (path === undefined) return state;
    state = said(state, answers[path] as string);
  }
  return state;
}

const planned = (on: Case): Promise<Plan> => plan(on, { version: 'test' });
/** A plan without what tells one text from another. */
const apart = ({ case: _case, ...rest }: Plan): unknown => JSON.parse(JSON.stringify(rest));

describe('the start', () => {
  it('asks the flow first and then what the vocabulary says the flow needs', () => {
    const question = asked(empty);
    expect(question.paths).toEqual(['flow']);
    expect(question.offers.map((offer) => offer.word)).toContain('side-heated-cavity');
    for (const [flow, answers] of Object.entries(starts)) {
      let state = said(empty, flow);
      const paths: string[] = [];
      for (let k = 0; k < Object.keys(answers).length; k++) {
        const next = asked(state);
        const path = next.paths[0] as string;
        paths.push(path);
        state = said(state, answers[path] as string);
      }
      const sizes = Object.entries(vocabulary.flows[flow]?.sizes ?? {}).filter(([, size]) => size.required).map(([key]) => `sizes.${key}`);
      expect(paths.slice(0, 1 + sizes.length + (vocabulary.flows[flow]?.needs.length ?? 0))).toEqual(['fluid.material', ...sizes, ...(vocabulary.flows[flow]?.needs ?? [])]);
    }
  });

  it('takes another way to state the drive by its unit, and does not ask for the first one again', () => {
    const { 'inlet.speed': _, ...answers } = starts['pipe'] as Record<string, string>;
    const before = begun('pipe', answers);
    expect(asked(before).paths).toEqual(['inlet.speed', 'inlet.volumeFlow', 'inlet.massFlow']);
    const after = said(before, '12 L/min');
    expect(after.given.get('inlet.volumeFlow')?.text).toBe('12 L/min');
    expect(asked(after).paths).not.toContain('inlet.speed');
  });

  it('asks for the heat of a wall once a target is one of heat and no wall has any', () => {
    const { 'wall.temperature': _, ...answers } = starts['pipe'] as Record<string, string>;
    const question = asked(begun('pipe', answers));
    expect(question.paths).toEqual(['wall.temperature', 'wall.heatFlux', 'wall.heat', 'wall.heatTransferCoefficient', 'wall.adiabatic']);
    expect(said(begun('pipe', answers), 'adiabatic').given.get('wall.adiabatic')?.text).toBe('true');
    expect(said(begun('pipe', answers), '5 kW/m^2').given.get('wall.heatFlux')?.text).toBe('5 kW/m^2');
  });
});

describe('after the start', () => {
  it.each(['pipe', 'plate', 'side-heated-cavity'])('%s: asks for the input on which most open decisions hang', async (flow) => {
    const state = begun(flow);
    const question = asked(state);
    // Counted again from the plan, by the missing paths that it lists: a decision is shared out over what it lacks, a target counts twice.
    const made = await planned(talk.caseOf(state));
    const counted = new Map<string, number>();
    for (const effect of made.effects) for (const path of effect.missing ?? []) counted.set(path, (counted.get(path) ?? 0) + 1 / (effect.missing ?? []).length);
    const { assembled } = settleCase(talk.caseOf(state));
    for (const target of made.targets.filter((one) => !one.computed)) {
      const lacks = missing(assembled.workings, target.quantity, (path) => assembled.askable(path)) ?? [];
      for (const path of lacks) counted.set(path, (counted.get(path) ?? 0) + 2 / lacks.length);
    }
    const most = Math.max(...counted.values());
    expect(counted.size).toBeGreaterThan(0);
    const first = talk.open(state)[0];
    expect(first?.paths[0]).toBe(question.paths[0]);
    expect(counted.get(question.paths[0] as string)).toBeCloseTo(most, 12);
    expect(first?.weight).toBeCloseTo(most, 12);
    expect(question.settles.length).toBeGreaterThan(0);
    expect(question.why.length).toBeLessThanOrEqual(80);
  });

  it('an answer settles what the question said it would', () => {
    let state = begun('pipe');
    while (asked(state).paths[0] !== 'inclination') state = said(state, asked(state).paths[0] === 'sizes.length' ? '8 m' : 'unknown');
    const { settles } = asked(state);
    expect(settles).toContain('buoyancy');
    const after = said(state, 'horizontal');
    const still = talk.open(after).flatMap((one) => [...one.decisions, ...one.targets]);
    expect(settles.filter((id) => still.includes(id))).toEqual([]);
  });

  it('what is unknown is asked once, stays undecided and stands as a remark in the file', async () => {
    let state = begun('pipe');
    const paths: string[] = [];
    for (let question = talk.next(state); !('done' in question); question = talk.next(state)) {
      expect(paths).not.toContain(question.paths.join('|'));
      paths.push(question.paths.join('|'));
      state = said(state, 'unknown');
    }
    expect(talk.next(state)).toEqual({ done: 'settled' });
    expect(paths).toContain('wall.sandGrain');
    expect(writeCase(state)).toMatch(/^# unknown wall\.sandGrain +# .*roughness/m);
    const made = await planned(talk.caseOf(state));
    expect(made.effects.find((effect) => effect.id === 'roughness')).toMatchObject({ verdict: 'undecided', missing: ['wall.sandGrain'] });
  });

  it('an assumption is asked for only where another answer would change a decision', async () => {
    let state = begun('plate');
    while (asked(state).paths[0] !== 'sizes.width') state = said(state, 'unknown');
    expect(asked(state).settles).toContain('three-dimensionality');
    const wide = await planned(talk.caseOf(said(state, 'infinite')));
    const narrow = await planned(talk.caseOf(said(state, '50 mm')));
    const verdict = (of: Plan): unknown => of.effects.find((effect) => effect.id === 'three-dimensionality')?.verdict;
    expect(verdict(narrow)).not.toBe(verdict(wide));
  });

  it('an input whose spread makes a target wider than asked is asked again, once, and skip keeps it', () => {
    let state = begun('plate', { ...starts['plate'], 'inlet.speed': '5 m/s +/- 20 %', 'targets.0.within': '1 %' });
    while (asked(state).now === undefined) state = said(state, 'unknown');
    const question = asked(state);
    expect([question.paths, question.now]).toEqual([['inlet.speed'], '5 m/s +/- 20 %']);
    expect(question.why).toMatch(/\d+ % of the spread of heatRate/);
    const kept = said(state, 'skip');
    expect(kept.given.get('inlet.speed')?.text).toBe('5 m/s +/- 20 %');
    expect(talk.next(kept)).toEqual({ done: 'settled' });
    expect(said(state, '5 m/s +/- 1 %').given.get('inlet.speed')?.text).toBe('5 m/s +/- 1 %');
  });
});

describe('answers', () => {
  it('going back restores the state and its question', () => {
    const state = begun('pipe');
    const question = asked(state);
    expect(back(said(state, 'unknown'))).toBe(state);
    expect(asked(back(said(state, 'skip')))).toEqual(question);
    expect(writeCase(back(said(state, question.example)))).toBe(writeCase(state));
    expect(back(empty)).toBe(empty);
  });

  it.each([
    { text: '0.4 kg', says: 'speed' },
    { text: '-3 apples', says: 'apples' },
    { text: '', says: 'nothing is answered' },
    { text: 'sizes.diameter: 3 K', says: 'sizes.diameter' },
    { text: 'fluid.material: unobtainium', says: 'unobtainium' },
    { text: '\u001b[2J', says: '' },
  ])('"$text" is refused in the words of the reader, and nothing changes', ({ text, says }) => {
    const { 'inlet.speed': _, ...answers } = starts['pipe'] as Record<string, string>;
    const state = begun('pipe', answers);
    const outcome = talk.answer(state, text);
    if (!('problem' in outcome)) throw new Error('the answer was taken');
    expect(outcome.problem).toBeInstanceOf(Problem);
    expect(outcome.problem.message).toContain(says);
    expect(outcome.problem.list.every((one) => one.file === undefined)).toBe(true);
    expect(asked(state).paths[0]).toBe('inlet.speed');
  });

  it('any path of the case can be stated, spreads and ranges as well', () => {
    const state = said(said(begun('pipe'), 'wall.sandGrain: 1.5 um'), 'inlet.speed: 0.2 .. 0.6 m/s');
    expect(talk.caseOf(state).get('inlet.speed')?.range).toEqual({ from: 0.2, to: 0.6, bounds: false });
    expect(talk.caseOf(state).number('wall.sandGrain')).toBeCloseTo(1.5e-6, 15);
  });

  it('a target in words is kept, with a remark', () => {
    const { 'targets.0.quantity': _, ...answers } = starts['pipe'] as Record<string, string>;
    const outcome = talk.answer(begun('pipe', answers), 'how well it mixes');
    expect(outcome).toMatchObject({ remark: expect.stringContaining('kept as words') as string });
  });

  it('enough ends it', () => expect(talk.next(talk.enough(begun('pipe')))).toEqual({ done: 'enough' }));
});

describe('the file', () => {
  it.each(Object.keys(starts))('%s: plans to the same result as the answers in memory', async (flow) => {
    let state = begun(flow);
    for (let question = talk.next(state); !('done' in question); question = talk.next(state)) state = said(state, 'unknown');
    const text = writeCase(state);
    const written = await planned(readCase(text, 'written.case.yaml', vocabulary));
    const { effects, ...rest } = apart(await planned(talk.caseOf(state))) as Record<string, unknown>;
    expect(apart(written)).toEqual({ effects, ...rest });
    expect(text.split('\n').filter((line) => /^ *-? *[a-z]\w*: \S/i.test(line) && !/^format:|^ *- name:/.test(line)).every((line) => / # \S/.test(line))).toBe(true);
  });

  it('is gone on with: the same values, unknowns and next question', () => {
    const state = said(said(begun('pipe'), 'unknown'), 'title: Line: "A" # 1');
    const again = resumed(writeCase(state), 'line.case.yaml');
    expect(writeCase(again)).toBe(writeCase(state));
    expect(talk.next(again)).toEqual(talk.next(state));
    expect(again.given.get('title')?.text).toBe('Line: "A" # 1');
  });

  it('keeps lists, layers, mixtures, cuts and what moves together', () => {
    const text = `format: 1
flow: duct
sizes: { width: 60 mm, height: 30 mm, length: 2 m }
fluid: { material: air }
inlet: { speed: 5 m/s +/- 3 %, temperature: 20 degC +/- 1 K }
wall: { layers: [{ material: copper, thickness: 1.5 mm }, { thermalConductivity: 0.04 W/(m K), thickness: 20 mm }] }
walls: [{ name: left, temperature: 40 degC }, { name: top, adiabatic: true }]
targets: [{ quantity: pressureDrop, within: 5 % }, { quantity: outletTemperature, place: outlet, mean: mass-flow, within: 1 K }]
choices: { cuts: [mirror-left-right, mirror-top-bottom] }
together: [[inlet.speed, inlet.temperature]]
`;
    const from = readCase(text, 'a.yaml', vocabulary);
    const to = talk.caseOf(resumed(text, 'a.yaml'));
    const values = (on: Case): unknown => Object.fromEntries([...on.entries].map(([path, entry]) => [path, [entry.value, entry.spread]]));
    expect(values(to)).toEqual(values(from));
    expect(to.together).toEqual(from.together);
    expect(to.list('wall.layers')).toEqual(['0', '1']);
  });
});

describe('answers from a file', () => {
  const list = `# what is known
flow: pipe
fluid.material: water
sizes.diameter: 25 mm   # inside
inlet.massFlow: 0.2 kg/s
inlet.temperature: 65 degC
sizes.length: 8 m
targets.0.quantity: outletTemperature
targets.0.within: 1 K
wall.temperature: 20 degC
choices.yPlus: 1
`;

  it('answers what is asked; what is not there is unknown; the same file gives the same case', () => {
    const once = replied(talk, empty, repliesIn(list, 'known.txt'), 'known.txt');
    expect(once.state.given.get('inlet.massFlow')?.text).toBe('0.2 kg/s');
    expect([...once.state.unknown.keys()]).toContain('wall.sandGrain');
    expect(once.unasked).toEqual(['choices.yPlus']);
    expect(writeCase(replied(talk, empty, repliesIn(list, 'known.txt'), 'known.txt').state)).toBe(writeCase(once.state));
  });

  const held = (text: string): State => replied(talk, empty, repliesIn(text, 'k.txt'), 'k.txt').state;
  const humid = ['fluid.material: humid air', 'fluid.humidity: 60 %', 'fluid.pressure: 1 atm', 'fluid.temperature: 26 degC'];
  it.each([[0, 1, 2, 3], [1, 0, 2, 3], [3, 2, 1, 0]].map((order) => order.map((k) => humid[k]).join('\n')))('takes humid air with its humidity in any order: %j', (lines) => {
    const { given } = held(`flow: plate\ntitle: Panel\n${lines}\nsizes.length: 1.5 m\nwall.temperature: 14 degC\n`);
    for (const [path, text] of humid.map((line) => line.split(': ') as [string, string])) expect(given.get(path)?.text).toBe(text);
  });

  it('takes humid air and a solution from YAML and from lines, the share of a solution in one form or by name', () => {
    expect(held('flow: plate\nfluid: { material: humid air, humidity: 60 %, pressure: 1 atm, temperature: 26 degC }\nsizes: { length: 1.5 m }\nwall: { temperature: 14 degC }\n').given.get('fluid.humidity')?.text).toBe('60 %');
    const alone = held('flow: pipe\nsizes.diameter: 25 mm\nfluid.material: propylene glycol-water\nfluid.composition: 40 % mass\n');
    expect(writeCase(alone)).toMatch(/^ {2}composition: 40 % mass +#/m);
    expect(held(writeCase(alone, false)).given.get('fluid.composition')?.text).toBe('40 % mass');
    expect(held('flow: pipe\nfluid.material: propylene glycol-water\nfluid.composition.propylene glycol: 40 % mass\n').given.get('fluid.composition.propylene glycol')?.text).toBe('40 % mass');
    expect(() => held('flow: pipe\nfluid.material: propylene glycol-water\n')).toThrow('propylene glycol-water needs its composition');
  });

  it('keeps what no question asks for', () => {
    const { given } = held('flow: pipe\nsizes.diameter: 25 mm\nfluid.material: water\nfluid.pressure: 2 bar\ninlet.speed: 1 m/s\nchoices.yPlus: 1\ncomputing.cores: 8\n');
    expect(['fluid.pressure', 'choices.yPlus', 'computing.cores'].map((path) => given.get(path)?.text)).toEqual(['2 bar', '1', '8']);
    expect(() => held('flow: pipe\nchoices.yPlus: 1 m\n')).toThrow('choices.yPlus');
  });

  it('asks for the humidity of humid air, the composition of a solution, and takes the two together', () => {
    let state = said(said(empty, 'flow: pipe'), 'humid air');
    expect(talk.next(state)).toMatchObject({ paths: ['fluid.humidity'], why: 'humid air needs its humidity' });
    expect(talk.answer(state, '60 degC')).toMatchObject({ problem: {} });
    state = said(state, '60 %');
    expect([...state.given].map(([path, { text }]) => [path, text])).toEqual([['flow', 'pipe'], ['fluid.material', 'humid air'], ['fluid.humidity', '60 %']]);
    expect(talk.next(state)).not.toMatchObject({ paths: ['fluid.material'] });
    const salt = said(said(empty, 'flow: pipe'), 'propylene glycol-water');
    expect(talk.next(salt)).toMatchObject({ paths: ['fluid.composition'] });
    expect(said(salt, '40 %').given.get('fluid.composition')?.text).toBe('40 %');
    expect(talk.next(said(salt, 'unknown'))).toMatchObject({ paths: ['fluid.material'] });
  });

  it('reads YAML alike', () => {
    const yaml = 'flow: pipe\nfluid: { material: water }\nsizes: { diameter: 25 mm, length: 8 m }\ninlet: { massFlow: 0.2 kg/s, temperature: 65 degC }\n';
    expect(repliesIn(yaml, 'a.yaml').get('inlet.massFlow')).toBe('0.2 kg/s');
  });

  it('complains about lines, paths and values, with their place', () => {
    const problems = (text: string): unknown => {
      try {
        return replied(talk, empty, repliesIn(text, 'k.txt'), 'k.txt');
      } catch (error) {
        return (error as Problem).list;
      }
    };
    expect(problems('flow: pipe\ninlet.sped: 3 m/s\n')).toMatchObject([{ code: 'unknown-path', line: 2, nearest: 'inlet.speed' }]);
    expect(problems('flow: pipe\ninlet.speed 3 m/s\nsizes.length: 1 m\n')).toMatchObject([{ code: 'no-answer', line: 2 }]);
    expect(problems('flow: pipe\nfluid.material: water\nsizes.diameter: 3 K\n')).toMatchObject([{ file: 'k.txt', message: expect.stringContaining('sizes.diameter') as string }]);
  });
});

it('the summary keeps to 80 columns where much is missing', () => {
  const missing = ['packing.voidFraction|porous.voidFraction|sizes.bedDiameter', 'inlet.speed', 'sizes.bedDiameter', 'sizes.length'];
  const lines = summaryOf({ effects: ['compressibility', 'closed-gas-pressure', 'tall-column'].map((id) => ({ id, applies: true, judged: true, verdict: 'undecided', missing: id === 'closed-gas-pressure' ? missing : ['sizes.length'] })), targets: [], quantities: {} });
  expect(Math.max(...lines.map((l) => l.length))).toBeLessThanOrEqual(80);
  expect(lines.join(' ').replace(/ +/g, ' ')).toContain('closed gas pressure (needs (packing.voidFraction or porous.voidFraction or sizes.bedDiameter) and inlet.speed and sizes.bedDiameter and sizes.length), tall column (needs sizes.length)');
});

it('the summary holds verdicts with margins, what is undecided with its inputs, and the target with its spread', async () => {
  const lines = summaryOf(await planned(talk.caseOf(said(begun('pipe'), '8 m'))));
  expect(lines.every((line) => line.length <= 80)).toBe(true);
  const text = lines.join('\n');
  expect(text).toMatch(/^include +turbulence \(x [\d.]+\)/m);
  expect(text).toMatch(/^undecided +.*\(needs /m);
  expect(text).toMatch(/^target +outletTemperature [\d.]+ degC \([\d.]+ degC to [\d.]+ degC\)/m);
});
