import { vocabulary } from '../assemble/index.ts';
import { readCaseFile } from '../case/index.ts';
import { fillReference, type FilledReference } from '../ladder/index.ts';
import { settleCase } from '../plan/index.ts';
import { evaluateReference } from '../references/index.ts';
import { compareText } from '../report/index.ts';
import { compareReference, readResultText, readTable } from '../results/index.ts';
import { printNumber } from '../units/index.ts';
import { Args, Base, Flags } from './base.ts';
import { ownData, ownDataFlags } from './own-data.ts';

/** `runbrief compare`: a result held against a known answer for the numbers of a case. */
export default class Compare extends Base {
  static override examples = [
    { command: 'runbrief compare line.case.yaml poiseuille-pipe profile.csv --numerical "0.2 %"', description: 'a profile against the rung of that name, with the band of its meshes' },
    { command: 'runbrief compare line.case.yaml turbulent-pipe:nusselt result.csv --numerical "1 %" --input "0.5 %"', description: 'single numbers: a file of one row' },
    { command: 'runbrief compare line.case.yaml graetz-pipe run.csv --numerical "1 %" --within "3 %"', description: 'with a limit of your own' },
  ];
  static override args = {
    case: Args.string({ required: true, description: 'the case file that fills the inputs of the known answer' }),
    reference: Args.string({ required: true, description: 'a rung of its ladder, or any name that `runbrief reference` lists' }),
    file: Args.string({ required: true, description: 'CSV of the result with name [unit] in its header: a profile, or one row of numbers' }),
  };
  static override flags = {
    numerical: Flags.string({ helpValue: 'BAND', description: 'half-width of mesh, step and iteration, "1 %" or in the unit; without it nothing is met' }),
    input: Flags.string({ helpValue: 'BAND', description: 'half-width that uncertain inputs of the run give the result' }),
    statistical: Flags.string({ helpValue: 'BAND', description: 'half-width of the averaging in time' }),
    within: Flags.string({ helpValue: 'LIMIT', description: 'limit in place of the tolerance of the rung' }),
    ...ownDataFlags,
  };
  static override judges = true;

  async run(): Promise<object> {
    const { args, flags } = await this.parse(Compare);
    const { assembled } = settleCase(readCaseFile(args.case, vocabulary), ownData(flags));
    const filled = fillReference(assembled, args.reference);
    const result = compareReference(filled.reference, evaluateReference(filled.reference, filled.inputs), readTable(readResultText(args.file), args.file), {
      ...(filled.tolerance === undefined ? {} : { limit: filled.tolerance }),
      ...(filled.compares === undefined ? {} : { compares: filled.compares }),
      ...(flags.numerical === undefined ? {} : { numerical: flags.numerical }),
      ...(flags.input === undefined ? {} : { input: flags.input }),
      ...(flags.statistical === undefined ? {} : { statistical: flags.statistical }),
      ...(flags.within === undefined ? {} : { within: flags.within }),
    });
    const first = result.outcome === 'missed' && filled.ifMissed !== undefined ? { ...result, ifMissed: filled.ifMissed } : result;
    this.say(compareText(first));
    if (Object.keys(filled.inputs).length > 0) this.remark(`inputs of ${filled.reference.id}: ${inputsText(filled)}`);
    if (first.outcome !== 'met') this.limitMissed();
    return { ...first, rung: args.reference, inputs: filled.inputs, inputsFrom: filled.from };
  }
}

/** `speed 0.4 m/s (speed), peclet 62970 (peclet)`. */
function inputsText({ reference, inputs, from }: FilledReference): string {
  return Object.entries(inputs).map(([id, value]) => `${id} = ${printNumber({ value, unit: reference.needs.find((n) => n.id === id)?.unit ?? '1', digits: 5 })}${from[id] === id || Number.isFinite(Number(from[id])) ? '' : ` (${from[id]} of the case)`}`).join(', ');
}
