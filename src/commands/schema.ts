import { vocabulary } from '../assemble/index.ts';
import { jsonSchema } from '../case/index.ts';
import { Base } from './base.ts';

/** `runbrief schema`: the JSON Schema of the case file. */
export default class Schema extends Base {
  static override examples = [
    { command: 'runbrief schema > case.schema.json', description: 'a file that an editor checks and completes cases with' },
    { command: '# yaml-language-server: $schema=case.schema.json', description: 'first line of a case, for editors that read it' },
  ];

  async run(): Promise<object> {
    await this.parse(Schema);
    const schema = jsonSchema(vocabulary);
    this.say(JSON.stringify(schema, undefined, 2));
    return schema;
  }
}
