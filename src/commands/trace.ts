import { vocabulary, type Assembled } from '../assemble/index.ts';
import { readCaseFile } from '../case/index.ts';
import { setExponents, settleCase, targetSpreads } from '../plan/index.ts';
import { inputsInWords, nearestName, Problem, type ProblemData } from '../problems/index.ts';
import { traceDocument, traceText } from '../report/index.ts';
import { missing, spreads, trace } from '../workings/index.ts';
import { Args, Base } from './base.ts';
import { ownData, ownDataFlags } from './own-data.ts';

/** `runbrief trace`: where a number comes from, down to inputs and sources. */
export default class Trace extends Base {
  static override examples = [
    { command: 'runbrief trace line.case.yaml firstCellHeight', description: 'every step from the inputs to the height of the first cell' },
    { command: 'runbrief trace line.case.yaml outletTemperature', description: 'the way to a target, with what its spread comes from' },
    { command: 'runbrief trace line.case.yaml reynolds --json', description: 'the same for other programs, numbers in SI' },
  ];
  static override args = {
    file: Args.string({ required: true, description: 'the case file' }),
    id: Args.string({ required: true, description: 'a quantity of the plan, such as reynolds, timeStep, wallShear@wall/worst' }),
  };
  static override flags = ownDataFlags;

  async run(): Promise<object> {
    const { args, flags } = await this.parse(Trace);
    const on = readCaseFile(args.file, vocabulary);
    const { assembled } = settleCase(on, ownData(flags));
    if (args.id.startsWith('targets.')) {
      targetSpreads(assembled); // what belongs to a target may rest on its spread
      setExponents(assembled);
    }
    const steps = trace(assembled.workings, args.id);
    if (steps.length === 0) throw new Problem(why(assembled, args.id));
    const traced = { id: args.id, steps, spreads: spreads(assembled.workings, steps.map((step) => step.id)) };
    this.say(traceText(traced, on));
    return traceDocument(traced);
  }
}

/** Why there is no number: the id is not known, or inputs are missing, or a formula failed. */
function why(assembled: Assembled, id: string): ProblemData {
  const { workings } = assembled;
  const i = workings.index.get(id);
  if (i === undefined) {
    const nearest = nearestName(id, [...workings.index.keys()]);
    return { code: 'unknown-quantity', message: `${id} is no quantity of this case`, ...(nearest === undefined ? { expected: 'an id of `runbrief plan FILE --json`, under quantities' } : { nearest }) };
  }
  const failure = workings.failures.get(i);
  if (failure !== undefined) return { ...failure, message: `${id} cannot be computed: ${failure.message}` };
  const paths = missing(workings, id, (path) => assembled.askable(path));
  if (paths === undefined || paths.length === 0) return { code: 'not-computable', message: `${id} is known but has no formula for this case`, expected: 'another flow or regime: no missing input would give it' };
  return { code: 'missing-input', message: `${id} cannot be computed yet: the case does not give ${inputsInWords(paths)}`, expected: 'these in the case file' };
}
