const superscripts = '⁰¹²³⁴⁵⁶⁷⁸⁹';

/** The power of ten of a number's first digit; 12 is 1, 0.04 is -2. Rounding at the last of 15 digits is seen through. */
function leadingPlace(value: number): number {
  return value === 0 ? 0 : Number(Math.abs(value).toExponential(14).split('e')[1]);
}

/**
 * The place of the last digit that a spread bears: that of the spread's first digit, one more where that digit is 1 or 2.
 *
 * @param value   the number
 * @param half    its half-width, above zero
 * @param digits  most significant digits to show
 * @returns       power of ten of the last digit; at least the first digit of the value is kept
 */
export function digitsBorne(value: number, half: number, digits: number): number {
  const [mantissa, exponent] = half.toExponential(1).split('e') as [string, string];
  const place = Number(exponent) - (Number(mantissa) < 3 ? 1 : 0);
  const top = leadingPlace(value);
  if (value === 0) return place;
  return Math.max(Math.min(place, top), top - digits + 1);
}

function withExponent(value: number, decimals: number, trim: boolean, unicode: boolean): string {
  const [mantissa, exponent] = value.toExponential(Math.max(0, Math.min(20, decimals))).split('e') as [string, string];
  const short = trim && mantissa.includes('.') ? mantissa.replace(/\.?0+$/, '') : mantissa;
  const power = Number(exponent);
  if (!unicode) return `${short}e${power}`;
  return `${short}×10${power < 0 ? '⁻' : ''}${String(Math.abs(power)).replace(/\d/g, (c) => superscripts[Number(c)] ?? '')}`;
}

/**
 * A number as text: fixed between 0.001 and a million, with an exponent outside.
 *
 * @param value    the number
 * @param digits   significant digits where no place is given; zeros at the end are left out
 * @param place    power of ten of the last digit, zeros kept
 * @param unicode  ×10⁻⁵ in place of e-5, and a true minus sign
 * @returns        the text
 */
export function inDigits(value: number, digits: number, place: number | undefined, unicode: boolean): string {
  if (value === 0) return place === undefined || place >= 0 ? '0' : (0).toFixed(Math.min(20, -place));
  const rounded = place === undefined ? Number(value.toPrecision(digits)) : round(value, place);
  const top = leadingPlace(rounded);
  const sign = (text: string): string => (unicode ? text.replace(/^-/, '\u2212') : text);
  if (rounded === 0) return place !== undefined && place < 0 ? (0).toFixed(Math.min(20, -place)) : '0';
  if (top < -3 || top >= 6) return sign(withExponent(rounded, place === undefined ? digits - 1 : top - place, place === undefined, unicode));
  if (place !== undefined) return sign(place < 0 ? rounded.toFixed(Math.min(20, -place)) : rounded.toFixed(0));
  return sign(String(rounded));
}

function round(value: number, place: number): number {
  const digits = leadingPlace(value) - place + 1;
  if (digits >= 1) return Number(value.toPrecision(Math.min(17, digits)));
  return Math.abs(value) >= 0.5 * 10 ** place ? Math.sign(value) * 10 ** place : 0;
}

/** A share in percent, with one digit from 3 to 10 %, two elsewhere: `2.5`, `5`, `12`. */
export function share(relative: number): string {
  const percent = 100 * relative;
  return String(Number(percent.toPrecision(percent >= 3 && percent < 9.5 ? 1 : 2)));
}
