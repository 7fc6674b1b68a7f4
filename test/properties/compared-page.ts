import { loadMaterial, propertyNames, type PropertyId } from '../../src/properties/index.ts';
import { differs, type Held } from './independent-fluids.ts';

const compared: readonly PropertyId[] = ['density', 'viscosity', 'thermalConductivity', 'specificHeatCapacity', 'speedOfSound', 'vapourPressure', 'latentHeat', 'surfaceTension'];

const percent = (share: number): string => (share < 5e-6 ? '0' : `${Number((100 * share).toPrecision(2))} %`);

/**
 * The page of comparisons: for each material and property the states, the works and the largest differences.
 *
 * @param all  every value held against another program or work
 * @returns    Markdown
 */
export function comparedPage(all: readonly Held[]): string {
  const materials = [...new Set(all.map(({ material }) => material))];
  const lines = [
    '# Pure fluids: what was compared',
    '',
    'Made from test/properties/independent-fluids.csv by its test; do not edit. The table is written by the script of the same name.',
    '',
    '- CoolProp 8.0.0 evaluates the equation that the record names; our constants are the ones it carries, so a difference is one of evaluation, or of the choices listed below.',
    `- Perry (Perry's Chemical Engineers' Handbook, 8th ed.), VDI (VDI Heat Atlas, 2nd ed.), Jasper, Zabransky, TRC: correlations of other works, as chemicals 1.5.2 carries them, for the saturated liquid from 0.45 to 0.85 of the critical temperature and the dilute gas. They are allowed their own uncertainty beside ours: density 1 %, heat capacity 3 %, viscosity 10 %, conductivity 8 %, vapour pressure 3 %, heat of vaporisation 4 %, surface tension 6 %.`,
    '- Declared uncertainties follow the statements of the authors of the equations, rounded up, from memory; for handbook correlations they are no less than the difference of two handbooks.',
    '',
  ];
  for (const material of materials) {
    lines.push(`## ${material}`, '', '| property | states | against | largest difference | declared there |', '|---|---|---|---|---|');
    const mine = all.filter((one) => one.material === material);
    for (const property of new Set(mine.map((one) => one.property))) {
      for (const reference of new Set(mine.filter((one) => one.property === property).map((one) => one.reference))) {
        const held = mine.filter((one) => one.property === property && one.reference === reference && differs(one) === undefined);
        if (held.length === 0) continue;
        const worst = held.reduce((a, b) => (b.off > a.off ? b : a));
        lines.push(`| ${propertyNames[property]} | ${held.length} | ${reference} | ${percent(worst.off)}${worst.off < 5e-6 ? '' : ` at ${Number(worst.T.toPrecision(4))} K`} | ${percent(worst.declared)} |`);
      }
    }
    const missing = compared.filter((property) => loadMaterial(material).properties.includes(property) && !mine.some((one) => one.property === property));
    if (missing.length > 0) lines.push('', `Not compared, as no second work was at hand: ${missing.map((property) => propertyNames[property]).join(', ')}.`);
    const apart = mine.flatMap((one) => {
      const reason = differs(one);
      return reason === undefined || one.off <= one.allowed ? [] : [{ one, reason }];
    });
    for (const reason of new Set(apart.map((each) => each.reason))) {
      const { one } = apart.filter((each) => each.reason === reason).reduce((a, b) => (b.one.off > a.one.off ? b : a));
      lines.push('', `The literature differs: ${propertyNames[one.property]} at ${Number(one.T.toPrecision(4))} K is ${Number(one.value.toPrecision(4))} here and ${Number(one.expected.toPrecision(4))} in ${one.reference} (SI); ${reason}.`);
    }
    lines.push('');
  }
  return `${lines.join('\n').trimEnd()}\n`;
}
