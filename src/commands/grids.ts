import { Problem } from '../problems/index.ts';
import { gridsDocument, gridsText } from '../report/index.ts';
import { grids, readResultText } from '../results/index.ts';
import { Args, Base, Flags } from './base.ts';

/** `runbrief grids`: grid or step convergence of a table of results. */
export default class Grids extends Base {
  static override examples = [
    { command: 'runbrief grids pressure-drop.csv', description: 'order, extrapolated value and band of every target in the table' },
    { command: 'runbrief grids pressure-drop.csv --within "2 %"', description: 'whether the band on the finest mesh fits into 2 %' },
    { command: 'runbrief grids outlet.csv --within "0.5 K" --iteration "0.02 K"', description: 'with an iteration error that was measured' },
    { command: 'runbrief grids plane.csv --dimension 2', description: 'cells of a plane mesh: size goes with their square root' },
  ];
  static override args = {
    file: Args.string({ required: true, description: 'CSV with a header: cells, size [m] or step [s], then targets as name [unit]; one row a mesh' }),
  };
  static override flags = {
    within: Flags.string({ helpValue: 'LIMIT', description: 'half-width that the band must not exceed, "2 %" of the value or in its unit' }),
    dimension: Flags.option({ options: ['2', '3'] as const, default: '3' })({ helpValue: 'N', description: 'dimension of a mesh given by its cells' }),
    order: Flags.string({ default: '2', helpValue: 'P', description: 'order that the schemes have on paper' }),
    iteration: Flags.string({ helpValue: 'ERROR', description: 'iteration error of the values, "0.01 %" or in their unit; half the last digit unless said' }),
  };
  static override judges = true;

  async run(): Promise<object> {
    const { args, flags } = await this.parse(Grids);
    const formalOrder = Number(flags.order);
    if (Number.isNaN(formalOrder)) throw new Problem({ code: 'not-a-number', message: `--order: "${flags.order}" is not a number`, expected: '1, 2, or what the schemes have on paper' });
    const result = grids(readResultText(args.file), args.file, {
      dimension: flags.dimension === '2' ? 2 : 3,
      formalOrder,
      ...(flags.within === undefined ? {} : { within: flags.within }),
      ...(flags.iteration === undefined ? {} : { iteration: flags.iteration }),
    });
    this.say(gridsText(result));
    if (result.outcome !== undefined && result.outcome !== 'met') this.limitMissed();
    return gridsDocument(result);
  }
}
