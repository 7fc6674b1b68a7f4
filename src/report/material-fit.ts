import { propertyNames, type Fit } from '../properties/index.ts';
import { wrapped } from './wrap.ts';

/** What a number counts in: a share has no unit to print. */
const inUnit = (unit: string): string => (unit.trim() === '' || unit === '1' ? ' as a plain number' : ` in ${unit.trim()}`);
const percent = (x: number): string => `${Number((x * 100).toPrecision(2))} %`;
const units: { readonly [variable in Fit['variable']]: string } = { temperature: ' K', pressure: ' Pa', humidity: '', composition: '' };
const courses: { readonly [course in Fit['course']]: string } = { rises: 'rises all the way', falls: 'falls all the way', constant: 'constant', turns: 'the property itself turns within the range' };

/**
 * Fits as they are typed into a program: formula, numbers, error, limits.
 *
 * @param title  material and range
 * @param fits   one per property
 * @returns      text without a last newline, at most 80 columns wide
 */
export function fitsText(title: string, fits: readonly Fit[]): string {
  return [wrapped(title, '  ', ''), ...fits.flatMap((fit) => ['', ...fitLines(fit)])].join('\n');
}

function fitLines(fit: Fit): string[] {
  const unit = units[fit.variable];
  const number = (x: number): string => (x !== 0 && Math.abs(x) < 1e-4 ? x.toExponential() : String(x));
  const limits = `${Number(fit.safe.from.toPrecision(7))}${unit} to ${Number(fit.safe.to.toPrecision(7))}${unit}`;
  return [
    wrapped(`${propertyNames[fit.property]}, y${inUnit(fit.unit)}, x = ${fit.variable}${inUnit(unit)}`, '    ', '  '),
    wrapped(fit.formula, '      ', '    '),
    ...fit.coefficients.map(({ name, value }) => `      ${name.padEnd(3)} = ${number(value)}`),
    ...(fit.rows === undefined ? [] : [`      ${'x'.padEnd(16)}y`, ...fit.rows.map(([x, y]) => `      ${number(x).padEnd(16)}${number(y)}`)]),
    wrapped(`largest error ${percent(fit.largestError)} at ${Number(fit.at.toPrecision(5))}${unit}${fit.outcome === 'met' ? '' : ': NOT within what was asked'}; the record itself is known to +/- ${percent(fit.uncertainty)}`, '    ', '    '),
    wrapped(`${courses[fit.course]}${fit.wiggles ? ', but the function turns' : ''}, ${fit.positive ? 'positive' : 'NOT positive'}; safe from ${limits}${fit.safe.beyond === undefined ? '' : `; beyond it ${fit.safe.beyond}${unit}`}`, '    ', '    '),
    ...fit.flags.map((flag) => wrapped(flag, '    ', '  ! ')),
  ];
}

/**
 * The document of `material --fit --json`.
 *
 * @param material  its name
 * @param fits      one per property
 * @returns         material and fits, numbers in SI
 */
export function fitsDocument(material: string, fits: readonly Fit[]): object {
  return { material, fits: fits.map(({ rows, ...fit }) => ({ ...fit, ...(rows === undefined ? {} : { rows: rows.map(([x, y]) => [x, y]) }) })) };
}
