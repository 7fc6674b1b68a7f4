import { nearestName, Problem } from '../problems/index.ts';
import { allSurfaces, fitKinds, fitOf, type Material as Substance, loadMaterial, materialNames, loadSurface, parseRange, parseState, propertyNames, type PropertyId, propertySheet, sampledOver, shippedMaterials, stateOf, type StateText, type Surface, tableOver, withComponents, withMaterialsFrom } from '../properties/index.ts';
import { materialCsv, materialDocument, materialTableDocument, materialTableText, materialText, fitsDocument, fitsText, plotSvg, plotText, surfacesText, surfaceText, wrapped } from '../report/index.ts';
import { readQuantity } from '../units/index.ts';
import { Args, Base, Flags } from './base.ts';
import { writeInto } from './written.ts';

/** `runbrief material`: properties of a material at a state or over a range. */
export default class Material extends Base {
  static override judges = true;

  static override examples = [
    { command: 'runbrief material water --at "60 degC, 2 bar"', description: 'every property with source, range and uncertainty' },
    { command: 'runbrief material steam --at "6 bar, saturated vapour"', description: 'a saturated state' },
    { command: 'runbrief material "humid air" --at "20 degC, 1 atm, humidity 60 %"', description: 'air with its moisture' },
    { command: 'runbrief material "flue gas" --at "180 degC, 1 atm, carbon dioxide 9 % mol, water 18 % mol, oxygen 2 % mol, nitrogen 71 % mol"', description: 'gases by composition; without one the record has its own' },
    { command: 'runbrief material water --over "20 degC .. 90 degC, 2 bar" --table', description: 'a table as CSV' },
    { command: 'runbrief material water --over "20 degC .. 90 degC, 2 bar" --fit polynomial --within "0.1 %"', description: 'functions ready to type in: coefficients, largest error, safe limits' },
    { command: 'runbrief material air --over "250 K .. 700 K, 1 atm" --plot --into curves', description: 'curves on the screen, and as SVG in a folder' },
    { command: 'runbrief material --surface "drawn tubing"', description: 'roughness and emissivity of a surface' },
    { command: 'runbrief material', description: 'the names of all materials' },
  ];

  static override args = { name: Args.string({ description: 'name, alias or formula; without it all materials are listed' }) };

  static override flags = {
    at: Flags.string({ helpValue: 'STATE', description: 'temperature and pressure, or one of them with "saturated liquid" or "saturated vapour"; humidity, composition, salinity or components where the material takes them', exclusive: ['over'] }),
    over: Flags.string({ helpValue: 'RANGE', description: 'a state of which one number is a range' }),
    table: Flags.boolean({ description: 'the range as CSV with all properties', dependsOn: ['over'] }),
    fit: Flags.option({ options: fitKinds, helpValue: 'FORM', description: `the range as a function to type in: ${fitKinds.join(', ')}`, dependsOn: ['over'], exclusive: ['table'] })(),
    within: Flags.string({ default: '0.5 %', helpValue: 'ERROR', description: 'largest relative error of a fit' }),
    of: Flags.string({ helpValue: 'LIST', description: 'properties to fit or plot, by id and with commas between; density, viscosity, conductivity and heat capacity unless said' }),
    plot: Flags.boolean({ description: 'the range as curves', dependsOn: ['over'], exclusive: ['table', 'fit'] }),
    into: Flags.string({ helpValue: 'DIR', description: 'a folder for the curves as SVG', dependsOn: ['plot'] }),
    force: Flags.boolean({ description: 'overwrite what exists', dependsOn: ['into'] }),
    points: Flags.integer({ default: 15, min: 2, max: 2000, helpValue: 'N', description: 'rows of a range' }),
    surface: Flags.string({ helpValue: 'NAME', description: 'a surface by name, its sand grain and emissivity with their scatter; "all" lists the tables', exclusive: ['at', 'over'] }),
    materials: Flags.string({ helpValue: 'DIR', description: 'a folder with records of your own' }),
  };

  async run(): Promise<object> {
    const { args, flags } = await this.parse(Material);
    const collection = flags.materials === undefined ? shippedMaterials() : withMaterialsFrom(flags.materials);
    if (flags.surface !== undefined) {
      const surfaces = flags.surface === 'all' ? allSurfaces() : [loadSurface(flags.surface)];
      this.say(flags.surface === 'all' ? surfacesText(surfaces) : surfaceText(surfaces[0] as Surface));
      return { surfaces };
    }
    if (args.name === undefined) {
      const names = materialNames(collection);
      this.say(wrapped(names.join(', '), ''));
      return { materials: names };
    }
    const named = loadMaterial(args.name, collection);
    const mixed = <T extends StateText>(said: T): { material: Substance; said: T } => withComponents(named, said, collection);
    if (flags.over !== undefined) {
      const { material, said: range } = mixed(parseRange(flags.over));
      if (flags.fit !== undefined || flags.plot) {
        for (const assumed of range.assumed) this.remark(`assumed: ${assumed}`);
        const sampled = sampledOver(material, range, propertiesOf(flags.of, material));
        const title = `${material.name}, ${sampled[0]?.phase ?? ''}, over ${flags.over}`;
        if (flags.fit === undefined) {
          const axis = `${range.over?.of ?? ''} [${{ temperature: 'K', pressure: 'Pa', humidity: '1', composition: '1' }[range.over?.of ?? 'temperature']}]`;
          this.say(plotText(title, sampled, axis));
          if (flags.into !== undefined) for (const path of writeInto(flags.into, [{ name: `${material.id.replaceAll(/[^a-z0-9.-]/gi, '-')}.svg`, text: plotSvg(title, sampled, axis) }], flags.force)) this.remark(`written: ${path}`);
          return { material: material.name, curves: sampled.map(({ property, variable, x, y }) => ({ property, variable, x, y })) };
        }
        const within = readQuantity(flags.within, { unit: '1', kind: 'fraction', name: 'error' }).value;
        const fits = sampled.filter(({ property }) => flags.of !== undefined || belongs(flags.fit as (typeof fitKinds)[number], property)).map((one) => fitOf(one, flags.fit as (typeof fitKinds)[number], within));
        this.say(fitsText(title, fits));
        if (fits.some(({ outcome }) => outcome === 'missed')) this.limitMissed();
        return fitsDocument(material.name, fits);
      }
      const table = tableOver(material, range, flags.points);
      for (const assumed of range.assumed) this.remark(`assumed: ${assumed}`);
      if (flags.table) for (const note of table.notes) this.remark(note);
      this.say(flags.table ? materialCsv(table) : materialTableText(material.name, table));
      return materialTableDocument(material.name, table);
    }
    if (flags.at === undefined) throw new Problem({ code: 'missing-argument', message: 'a state is needed', expected: '--at "60 degC, 2 bar", --at "60 degC, saturated liquid" or --over "20 degC .. 90 degC, 2 bar"' });
    const { material, said } = mixed(parseState(flags.at));
    const sheet = propertySheet(material, stateOf(material, said, collection));
    this.say([materialText(sheet), ...said.assumed.map((one) => `  assumed: ${one}`)].join('\n'));
    return materialDocument(sheet);
  }
}

/** Whether a form is one of the property: two of them are laws of transport. */
const belongs = (kind: (typeof fitKinds)[number], property: PropertyId): boolean => property === 'viscosity' || kind !== 'vogel' && (kind !== 'sutherland' || property === 'thermalConductivity');

const usual: readonly PropertyId[] = ['density', 'viscosity', 'thermalConductivity', 'specificHeatCapacity'];

/** The properties that were asked for, or the usual ones that the material has. */
function propertiesOf(list: string | undefined, material: Substance): readonly PropertyId[] {
  if (list === undefined) return usual.filter((id) => material.properties.includes(id));
  return list.split(',').map((one) => one.trim()).map((id) => {
    const found = material.properties.find((known) => known === id);
    if (found === undefined) throw new Problem({ code: 'unknown-property', message: `${material.name} has no "${id.slice(0, 40)}"`, expected: `one of ${material.properties.join(', ')}`, ...(id in propertyNames ? {} : nearest(id, material.properties)) });
    return found;
  });
}

function nearest(id: string, known: readonly string[]): { nearest?: string } {
  const name = nearestName(id, known);
  return name === undefined ? {} : { nearest: name };
}
