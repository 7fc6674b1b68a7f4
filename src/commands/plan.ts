import about from '../../package.json' with { type: 'json' };
import { vocabulary, type Assembled } from '../assemble/index.ts';
import { readCaseFile } from '../case/index.ts';
import { ladderDetails } from '../ladder/index.ts';
import { fluidRange, noPropertyTable, plan, propertyFits, settleCase } from '../plan/index.ts';
import { tableOver } from '../properties/index.ts';
import { evaluateReference } from '../references/index.ts';
import { asText, fitsText, materialCsv, planBlocks, planDocument, planFiles, screen, writingOf, type PlanTables } from '../report/index.ts';
import { Args, Base, Flags } from './base.ts';
import { ownData, ownDataFlags } from './own-data.ts';
import { writeInto } from './written.ts';

/** `runbrief plan`: the plan of a case on one screen, in full, as JSON or as files. */
export default class Plan extends Base {
  static override examples = [
    { command: 'runbrief plan line.case.yaml', description: 'the plan on one screen' },
    { command: 'runbrief plan line.case.yaml --full', description: 'every section, decision and number as text' },
    { command: 'runbrief plan line.case.yaml --into line', description: 'plan.md, plan.html, plan.json, checklist.md, near-wall.csv and the tables of the ladder; properties.csv and property-fits.txt of a known fluid whose temperature changes' },
    { command: 'runbrief plan line.case.yaml --json', description: 'the plan for other programs, numbers in SI' },
  ];
  static override args = { file: Args.string({ required: true, description: 'the case file; `runbrief template pipe` writes one to fill in' }) };
  static override flags = {
    full: Flags.boolean({ description: 'every section as text' }),
    into: Flags.string({ helpValue: 'DIR', description: 'write the files of the plan into this folder' }),
    force: Flags.boolean({ description: 'overwrite files that exist', dependsOn: ['into'] }),
    ...ownDataFlags,
  };

  async run(): Promise<object> {
    const { args, flags } = await this.parse(Plan);
    const options = ownData(flags);
    const on = readCaseFile(args.file, vocabulary);
    const far = flags.full || flags.into !== undefined || this.jsonEnabled();
    const settled = settleCase(on, options);
    const made = await plan(on, { ...options, settled, version: about.version, ...(far ? { flips: true } : { quick: true, sections: ['cautions'] }) });
    const writing = writingOf(made.quantities, on);
    if (flags.full) this.say(asText(planBlocks(made, writing, false)));
    else {
      const chalk = this.colourless ? undefined : await this.colours();
      this.say(screen(made, writing, { file: args.file, ...(chalk === undefined ? {} : { paint: { strong: chalk.bold, warn: chalk.yellow.bold } }), ...(on.purpose === undefined ? {} : { purpose: on.purpose }) }));
    }
    if (flags.into !== undefined) {
      const files = planFiles(made, on, tablesOf(settled.assembled));
      for (const path of writeInto(flags.into, files, flags.force)) this.remark(`written: ${path}`);
      const why = noPropertyTable(settled.assembled);
      if (why !== undefined) this.remark(`not written: properties.csv, as ${why}`);
    }
    return this.jsonEnabled() ? planDocument(made, writing) : made;
  }
}

/** What the files hold beside the plan: the tables of the ladder, the properties over the temperatures of the case. */
function tablesOf(assembled: Assembled): PlanTables {
  const ladder = ladderDetails(assembled).map(({ rung, reference, inputs }) => ({ rung: rung.id, tables: evaluateReference(reference, inputs).tables }));
  const at = fluidRange(assembled);
  const typed = propertyFits(assembled);
  return {
    ladder,
    ...(at === undefined ? {} : { properties: materialCsv(tableOver(at.fluid, at.range)) }),
    ...(typed === undefined ? {} : { fits: fitsText(`${typed.fluid} from ${Number(typed.from.toFixed(2))} K to ${Number(typed.to.toFixed(2))} K: the temperatures of the case and a little beyond`, typed.fits) }),
  };
}
