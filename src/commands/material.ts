import { Problem } from '../problems/index.ts';
import { loadMaterial, materialNames, mixtureOf, parseRange, parseState, propertySheet, shippedMaterials, stateOf, type StateText, tableOver, withMaterialsFrom } from '../properties/index.ts';
import { materialCsv, materialDocument, materialTableDocument, materialTableText, materialText, wrapped } from '../report/index.ts';
import { Args, Base, Flags } from './base.ts';

/** `runbrief material`: properties of a material at a state or over a range. */
export default class Material extends Base {
  static override examples = [
    { command: 'runbrief material water --at "60 degC, 2 bar"', description: 'every property with source, range and uncertainty' },
    { command: 'runbrief material steam --at "6 bar, saturated vapour"', description: 'a saturated state' },
    { command: 'runbrief material "humid air" --at "20 degC, 1 atm, humidity 60 %"', description: 'air with its moisture' },
    { command: 'runbrief material "flue gas" --at "180 degC, 1 atm, carbon dioxide 9 % mol, water 18 % mol, oxygen 2 % mol, nitrogen 71 % mol"', description: 'gases by composition; without one the record has its own' },
    { command: 'runbrief material water --over "20 degC .. 90 degC, 2 bar" --table', description: 'a table as CSV' },
    { command: 'runbrief material', description: 'the names of all materials' },
  ];

  static override args = { name: Args.string({ description: 'name, alias or formula; without it all materials are listed' }) };

  static override flags = {
    at: Flags.string({ helpValue: 'STATE', description: 'temperature and pressure, or one of them with "saturated liquid" or "saturated vapour"; humidity, composition, salinity or components where the material takes them', exclusive: ['over'] }),
    over: Flags.string({ helpValue: 'RANGE', description: 'a state of which one number is a range' }),
    table: Flags.boolean({ description: 'the range as CSV with all properties', dependsOn: ['over'] }),
    points: Flags.integer({ default: 15, min: 2, max: 2000, helpValue: 'N', description: 'rows of a range' }),
    materials: Flags.string({ helpValue: 'DIR', description: 'a folder with records of your own' }),
  };

  async run(): Promise<object> {
    const { args, flags } = await this.parse(Material);
    const collection = flags.materials === undefined ? shippedMaterials() : withMaterialsFrom(flags.materials);
    if (args.name === undefined) {
      const names = materialNames(collection);
      this.say(wrapped(names.join(', '), ''));
      return { materials: names };
    }
    const named = loadMaterial(args.name, collection);
    const mixed = ({ components }: StateText): typeof named => (components === undefined ? named : mixtureOf(named, components, collection));
    if (flags.over !== undefined) {
      const range = parseRange(flags.over);
      const material = mixed(range);
      const table = tableOver(material, range, flags.points);
      for (const assumed of range.assumed) this.remark(`assumed: ${assumed}`);
      if (flags.table) for (const note of table.notes) this.remark(note);
      this.say(flags.table ? materialCsv(table) : materialTableText(material.name, table));
      return materialTableDocument(material.name, table);
    }
    if (flags.at === undefined) throw new Problem({ code: 'missing-argument', message: 'a state is needed', expected: '--at "60 degC, 2 bar", --at "60 degC, saturated liquid" or --over "20 degC .. 90 degC, 2 bar"' });
    const said = parseState(flags.at);
    const material = mixed(said);
    const sheet = propertySheet(material, stateOf(material, said));
    this.say([materialText(sheet), ...said.assumed.map((one) => `  assumed: ${one}`)].join('\n'));
    return materialDocument(sheet);
  }
}
