import { Problem, type ProblemData } from '../problems/index.ts';
import { mostQuantities, piGroups, type Dimensioned } from '../quantities/index.ts';
import { groupsText } from '../report/index.ts';
import { dimensionOf } from '../units/index.ts';
import { Args, Base } from './base.ts';

/** `runbrief groups`: independent dimensionless groups of quantities. */
export default class Groups extends Base {
  static override examples = [
    { command: 'runbrief groups "drag: N, speed: m/s, size: m, density: kg/m^3, viscosity: Pa s"', description: 'Reynolds number and force coefficient' },
    { command: 'runbrief groups "h: W/(m^2 K), D: m, k: W/(m K), mu: Pa s, cp: J/(kg K), U: m/s, rho: kg/m^3"', description: 'what heat transfer in a stream depends on' },
  ];
  static override args = { quantities: Args.string({ required: true, description: 'names with units as "name: unit", separated by commas' }) };
  static override flags = {};

  async run(): Promise<object> {
    const { args } = await this.parse(Groups);
    const found = await piGroups(quantitiesIn(args.quantities));
    this.say(groupsText(found));
    return found;
  }
}

const expected = 'names with units, such as "speed: m/s, size: m, viscosity: Pa s, density: kg/m^3"';

/** Names and dimensions from the text of the command line. */
function quantitiesIn(text: string): Dimensioned[] {
  const problems: ProblemData[] = [];
  const out: Dimensioned[] = [];
  const parts = text.split(',');
  if (parts.length > mostQuantities) throw new Problem({ code: 'too-many-quantities', message: `${parts.length} quantities`, expected: `at most ${mostQuantities}` });
  for (const part of parts) {
    const colon = part.indexOf(':');
    const name = part.slice(0, Math.max(0, colon)).trim(), unit = part.slice(colon + 1).trim();
    if (!/^[\p{L}_][\p{L}\p{M}\d_. '-]{0,39}$/u.test(name) || unit === '') problems.push({ code: 'unreadable-quantity', message: `"${part.trim()}" is not a name with a unit`, expected });
    else if (/^[\d.]+(?:[eE][+-]?\d+)? +[A-Za-z]/.test(unit)) problems.push({ code: 'not-a-unit', message: `${name}: "${unit}" is a number with a unit`, expected: 'the unit alone: groups follow from dimensions' });
    else if (out.some((q) => q.name === name)) problems.push({ code: 'duplicate-name', message: `${name} is given twice`, expected: 'every name once' });
    else {
      try {
        out.push({ name, dimension: dimensionOf(unit) });
      } catch (error) {
        if (!(error instanceof Problem)) throw error;
        problems.push(...error.list.map(({ code, message, expected: wanted, nearest }) => ({ code, message: `${name}: ${message}`, ...(wanted === undefined ? {} : { expected: wanted }), ...(nearest === undefined ? {} : { nearest }) })));
      }
    }
  }
  if (problems.length > 0) throw new Problem(problems);
  return out;
}
