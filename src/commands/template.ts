import { writeFileSync } from 'node:fs';
import { vocabulary } from '../assemble/index.ts';
import { caseTemplate } from '../case/index.ts';
import { flows } from '../flows/index.ts';
import { Problem } from '../problems/index.ts';
import { Args, Base, Flags } from './base.ts';

/** `runbrief template`: a commented case file to fill in. */
export default class Template extends Base {
  static override examples = [
    { command: 'runbrief template pipe > line.case.yaml', description: 'a pipe to fill in' },
    { command: 'runbrief template side-heated-cavity --into box.case.yaml', description: 'the same, written to a file that does not exist yet' },
  ];
  static override args = { flow: Args.string({ required: true, description: `the flow: ${Object.keys(vocabulary.flows).join(', ')}` }) };
  static override flags = {
    into: Flags.string({ helpValue: 'FILE', description: 'write to this file' }),
    force: Flags.boolean({ description: 'overwrite the file if it exists' }),
  };

  async run(): Promise<object> {
    const { args, flags } = await this.parse(Template);
    const text = caseTemplate(vocabulary, args.flow, flows[args.flow]?.answers ?? false);
    if (flags.into === undefined) this.say(text.trimEnd());
    else write(flags.into, text, flags.force);
    if (flows[args.flow] === undefined) this.remark(`plan cannot estimate ${args.flow} yet; it does ${Object.keys(flows).join(', ')}`);
    if (flags.into !== undefined) this.remark(`written: ${flags.into}`);
    return { flow: args.flow, text, ...(flags.into === undefined ? {} : { file: flags.into }) };
  }
}

function write(file: string, text: string, force: boolean): void {
  try {
    writeFileSync(file, text, { flag: force ? 'w' : 'wx' });
  } catch (error) {
    const { code } = error as NodeJS.ErrnoException;
    if (code === 'EEXIST') throw new Problem({ code: 'would-overwrite', message: `${file} exists`, expected: 'another name, or --force to overwrite it' });
    throw new Problem({ code: 'not-written', message: `${file} cannot be written: ${code === 'ENOENT' ? 'the folder does not exist' : code === 'EISDIR' ? 'it is a folder' : (code ?? 'unknown reason')}`, expected: 'a file in a folder that exists' });
  }
}
