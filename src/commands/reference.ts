import { nearestName, Problem } from '../problems/index.ts';
import { evaluateReference, findReference, readGiven, references, type Evaluation } from '../references/index.ts';
import { referenceCsv, referenceDocument, referenceList, referenceText } from '../report/index.ts';
import { Args, Base, Flags } from './base.ts';

/** `runbrief reference`: known solutions, evaluated for given inputs. */
export default class Reference extends Base {
  static override examples = [
    { command: 'runbrief reference', description: 'every known solution, one a line' },
    { command: 'runbrief reference graetz-pipe --with "peclet = 1000, graetz = 20"', description: 'its numbers for these inputs' },
    { command: 'runbrief reference blasius-plate --table > layer.csv', description: 'its first table as CSV, to hold a run against' },
  ];
  static override args = { id: Args.string({ description: 'name of the solution; without it all are listed' }) };
  static override flags = {
    with: Flags.string({ helpValue: 'INPUTS', description: 'inputs as "name = quantity", separated by commas' }),
    table: Flags.boolean({ description: 'a table of the solution as CSV: the first that the inputs give, or the one named' }),
    name: Flags.string({ helpValue: 'TABLE', description: 'name of the table wanted; stands for --table as well' }),
  };

  async run(): Promise<object> {
    const { args, flags } = await this.parse(Reference);
    if (args.id === undefined) {
      if (flags.with !== undefined || flags.table || flags.name !== undefined) throw new Problem({ code: 'missing-argument', message: '--with, --table and --name belong to one solution', expected: 'its name, such as `runbrief reference graetz-pipe`' });
      this.say(referenceList(references));
      return { references: references.map(({ id, title, kind, flows }) => ({ id, title, kind, flows })) };
    }
    const ref = findReference(args.id);
    const { given, assumed } = flags.with === undefined ? { given: {}, assumed: [] } : readGiven(ref, flags.with);
    const found = evaluateReference(ref, given);
    const wantsTable = flags.table || flags.name !== undefined;
    const asked = flags.with !== undefined || wantsTable;
    const wrong = found.problems.filter((one) => asked || one.code !== 'missing-input');
    if (wrong.length > 0) throw new Problem(wrong);
    for (const one of assumed) this.remark(`assumed: ${one}`);
    if (wantsTable) {
      const table = tableOf(found, flags.name);
      const others = found.tables.filter((one) => one !== table).map((one) => one.id);
      this.say(referenceCsv(table));
      if (others.length > 0) this.remark(`table ${table.id}; with --name also ${others.join(', ')}`);
    } else this.say(referenceText(ref, found));
    return referenceDocument(ref, found);
  }
}

function tableOf(found: Evaluation, name = found.tables[0]?.id ?? 'table'): Evaluation['tables'][number] {
  const table = found.tables.find((one) => one.id === name);
  if (table) return table;
  const names = found.tables.map((one) => one.id);
  const lacking = found.missing.find((one) => one.id === name);
  const nearest = nearestName(name, names);
  throw new Problem({
    code: lacking ? 'missing-input' : 'unknown-table',
    message: lacking ? `the table ${name} of ${found.id} needs ${lacking.needs}` : names.length === 0 ? `${found.id} has no table for these inputs` : `"${name}" is no table of ${found.id}`,
    ...(names.length === 0 ? {} : { expected: names.join(', ') }),
    ...(nearest === undefined ? {} : { nearest }),
  });
}
