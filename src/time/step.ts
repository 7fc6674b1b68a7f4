import { quantity, way, wordWay, type Definition } from '../workings/index.ts';

const practice = 'common practice';
const run = 'choice.run-character';

/** Limits that may bind the step, by the word that names them; `rate` ids are 1/step, zero where a limit does not apply, so that the largest rate binds. */
const binding = ['convective', 'diffusive', 'acoustic', 'capillary', 'reaction', 'period', 'buoyancy', 'turbulence'] as const;
type Binding = (typeof binding)[number];
const capital = (word: string): string => word.charAt(0).toUpperCase() + word.slice(1);
const explicit = { 'choice.time-scheme': ['explicit-runge-kutta-3', 'explicit-runge-kutta-4', 'adams-bashforth-2'] };

/** When a limit enters the step: accuracy limits always, stability limits where the scheme is explicit. */
const enters: Readonly<Record<Binding, Readonly<Record<string, string | readonly string[]>> | undefined>> = {
  convective: undefined,
  diffusive: explicit,
  acoustic: { ...explicit, 'choice.density-law': 'temperature-and-pressure' },
  capillary: undefined,
  reaction: undefined,
  period: undefined,
  buoyancy: undefined,
  turbulence: undefined,
};

const rates: Definition[] = binding.map((word) => {
  const id = `timeStep${capital(word)}`;
  const when = enters[word];
  const cfl = word === 'convective' ? ['courantTarget'] : [];
  return quantity(`stepRate${capital(word)}`, { symbol: '1/dt', name: `rate that the ${word} limit asks of the step`, unit: '1/s' }, [
    way({ needs: [id, ...cfl], ...(when === undefined ? {} : { when }), value: (of) => 1 / ((of[id] as number) * (cfl.length > 0 ? (of['courantTarget'] as number) : 1)), formula: cfl.length > 0 ? '1/(CFL dt_u)' : '1/dt', source: 'definition' }),
    way({ needs: [], value: () => 0, formula: '0: this limit does not bind', source: 'the limit does not apply, or its numbers are not known' }),
  ]);
});
const rateIds = binding.map((word) => `stepRate${capital(word)}`);
const largest = (of: Readonly<Record<string, number>>): number => Math.max(...rateIds.map((id) => of[id] as number));

const courant = (value: number, when: Readonly<Record<string, string | readonly string[]>>, source: string): ReturnType<typeof way> => way({ needs: [], when, as: 'decided', value: () => value, formula: `CFL = ${value}`, source });

/** The step that the plan recommends, and which limit binds it. */
export const step: Definition[] = [
  quantity('courantTarget', { symbol: 'CFL', name: 'cells that the fastest fluid may cross in one step', unit: '1' }, [
    courant(10, { [run]: ['steady', 'march'] }, `${practice}: pseudo-steps of 5 to 50 cells`),
    courant(0.5, { 'choice.turbulence-treatment': ['les', 'dns', 'wall-modelled-les', 'hybrid'] }, `${practice}: at most 0.5 where eddies are resolved`),
    courant(0.5, { 'has.otherFluid': 'yes' }, `${practice}: at most 0.5 where an interface is captured`),
    courant(1, explicit, `${practice}: below the limit of the explicit scheme`),
    courant(2, {}, `${practice}: 1 to 5 with an implicit scheme`),
  ]),
  ...rates,
  quantity('timeStep', { symbol: 'dt', name: 'time step', unit: 's' }, [
    way({ needs: rateIds, value: (of) => 1 / largest(of), formula: 'dt = the least of the limits that act', source: 'the binding limit stands in timeStepLimit' }),
  ]),
  quantity('timeStepLimit', { symbol: '', name: 'limit that binds the step', unit: 'word', words: [...binding, 'given'] }, [
    wordWay({ needs: ['choices.timeStep'], word: () => 'given', formula: 'as given', source: 'the case' }),
    wordWay({ needs: rateIds, word: (of) => binding[rateIds.findIndex((id) => of[id] === largest(of))] as string, formula: 'the largest rate', source: 'definition' }),
  ]),
  quantity('courantNumber', { symbol: 'C', name: 'cells that the fastest fluid crosses in the step', unit: '1' }, [
    way({ needs: ['timeStep', 'timeStepConvective'], value: ({ timeStep, timeStepConvective }) => timeStep / timeStepConvective, formula: 'C = dt/dt_u', source: 'definition' }),
  ]),
  quantity('diffusionNumber', { symbol: 'Fo_c', name: 'step over the limit of explicit diffusion', unit: '1' }, [
    way({ needs: ['timeStep', 'timeStepDiffusive'], value: ({ timeStep, timeStepDiffusive }) => timeStep / timeStepDiffusive, formula: 'dt/dt_nu', source: 'definition' }),
  ]),
  quantity('timeStepDouble', { symbol: '2 dt', name: 'middle step of the three-step study', unit: 's' }, [way({ needs: ['timeStep'], value: ({ timeStep }) => 2 * timeStep, formula: '2 dt', source: 'ratio 2' })]),
  quantity('timeStepQuadruple', { symbol: '4 dt', name: 'largest step of the three-step study', unit: 's' }, [way({ needs: ['timeStep'], value: ({ timeStep }) => 4 * timeStep, formula: '4 dt', source: 'ratio 2' })]),
  quantity('stepsPerPeriod', { symbol: 'n_T', name: 'steps in one period', unit: '1' }, [
    way({ needs: ['time.period', 'timeStep'], value: (of) => of['time.period'] / of.timeStep, formula: 'n_T = T/dt', source: 'definition' }),
    way({ needs: ['sheddingFrequency', 'timeStep'], value: ({ sheddingFrequency, timeStep }) => 1 / (sheddingFrequency * timeStep), formula: 'n_T = 1/(f_s dt)', source: 'definition' }),
  ]),
];
