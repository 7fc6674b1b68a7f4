/** SI names that are shown with a prefix when they lead a unit and have no exponent. */
const leads = /^(m|Pa|W|Hz|J|N|V|A|T|S|mol|s|B|kg)(?![\w^*²³⁻°])(.*)$/;
const prefixes: readonly (readonly [power: number, prefix: string])[] = [[12, 'T'], [9, 'G'], [6, 'M'], [3, 'k'], [0, ''], [-3, 'm'], [-6, 'u'], [-9, 'n'], [-12, 'p']];

/** Seconds beyond 10 000 read better in hours and days. */
function longTime(value: number): string {
  return value >= 1e6 ? 'd' : 'h';
}

/**
 * The unit in which a value reads best: the SI unit itself from 0.1 to 10 000, else one with a prefix.
 *
 * @param value  [SI]
 * @param unit   SI unit, such as `m`, `Pa s`, `J/(kg K)`
 * @returns      that unit or one with a prefix; units led by anything but a plain SI name stay as they are
 */
export function displayUnit(value: number, unit: string): string {
  const size = Math.abs(value);
  if (size === 0 || !Number.isFinite(size) || (size >= 0.0999999 && size < 9999.95)) return unit;
  const found = leads.exec(unit);
  if (found === null) return unit;
  const [, lead = '', rest = ''] = found;
  if (lead === 's' && size > 1) return rest === '' ? longTime(size) : unit;
  if (lead === 'kg' && (size > 1 || /m/.test(rest.replace('mol', '')))) return unit;
  if (unit === 'Pa s' && size >= 1e-4 && size < 0.1) return 'mPa s'; // as the trade prints liquids
  const grams = lead === 'kg' ? 1000 * size : size;
  const power = Math.floor(Math.log10(grams * (1 + 1e-9)) / 3) * 3;
  const prefix = prefixes.find(([p]) => p <= power) ?? prefixes.at(-1);
  return `${prefix?.[1] ?? ''}${lead === 'kg' ? 'g' : lead}${rest}`;
}

/** A unit as shown: nothing for a plain number; with unicode µ, °C and raised exponents. */
export function prettyUnit(unit: string, unicode: boolean): string {
  if (unit === '1') return '';
  if (!unicode) return unit;
  return unit
    .replace(/(?<![A-Za-z])u(?=[A-Za-z])/g, 'µ')
    .replace(/(?<![A-Za-z])deg([CF])/g, '°$1')
    .replace(/\^(-?\d+)(?![.\d])/g, (_, power: string) => power.replace('-', '⁻').replace(/\d/g, (c) => '⁰¹²³⁴⁵⁶⁷⁸⁹'[Number(c)] ?? ''));
}
