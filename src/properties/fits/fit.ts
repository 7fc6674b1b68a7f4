import { Problem } from '../../problems/index.ts';
import { propertyUnits, type PropertyId } from '../record.ts';
import type { Sampled } from './sampled.ts';
import * as shapes from './shapes.ts';

/** Forms that programs ask for. */
export const fitKinds = ['polynomial', 'table', 'power', 'sutherland', 'vogel', 'piecewise'] as const;
export type FitKind = (typeof fitKinds)[number];

/** A function ready to be typed in. */
export interface Fit {
  readonly property: PropertyId;
  readonly kind: FitKind;
  readonly variable: Sampled['variable'];
  /** Of y; x is in kelvin, pascal or a share. */
  readonly unit: string;
  readonly formula: string;
  readonly coefficients: readonly { readonly name: string; readonly value: number }[];
  readonly rows?: readonly (readonly [number, number])[];
  /** Relative, with the numbers as printed, and where. */
  readonly largestError: number;
  readonly at: number;
  readonly outcome: 'met' | 'missed';
  /** Relative uncertainty of the record itself, the largest along the range. */
  readonly uncertainty: number;
  readonly positive: boolean;
  readonly course: 'rises' | 'falls' | 'constant' | 'turns';
  /** Whether the function turns where the property does not. */
  readonly wiggles: boolean;
  /** Where the function may be used, and what happens to it beyond. */
  readonly safe: { readonly from: number; readonly to: number; readonly beyond?: string };
  readonly flags: readonly string[];
}

/**
 * A property along a range as a function of the chosen form, no longer than the error allows.
 *
 * @param of      the property along its range
 * @param kind    the form; polynomials up to degree 6, tables up to 80 steps
 * @param within  largest relative error, > 0
 * @returns       the function; where no member of the form is near enough, the nearest one with the outcome `missed`
 * @throws        {Problem} no-such-fit where the form cannot belong to the property; wrong-within
 */
export function fitOf(of: Sampled, kind: FitKind, within: number): Fit {
  if (!(within > 0 && within < 1)) throw new Problem({ code: 'wrong-within', message: `an error of ${within * 100} % is not a limit`, expected: 'between 0 % and 100 %, for example "0.5 %"' });
  const { x, y } = of;
  const refuse = (message: string, expected: string): Problem => new Problem({ code: 'no-such-fit', message, expected });
  if (y.some((one) => one === 0 || Math.sign(one) !== Math.sign(y[0] as number))) throw refuse(`${of.property} changes sign in the range, so that no relative error exists`, 'a range on one side of the change');
  if (kind === 'sutherland' && (of.variable !== 'temperature' || of.phase === 'liquid' || of.phase === 'solid' || (of.property !== 'viscosity' && of.property !== 'thermalConductivity'))) throw refuse(`Sutherland's law is one of the viscosity and conductivity of gases over temperature, not of ${of.property} of a ${of.phase} over ${of.variable}`, 'polynomial, power, piecewise or table');
  if (kind === 'vogel' && (of.variable !== 'temperature' || of.phase !== 'liquid' || (of.property !== 'viscosity' && of.property !== 'kinematicViscosity'))) throw refuse(`Vogel's law is one of the viscosity of liquids over temperature, not of ${of.property} of a ${of.phase} over ${of.variable}`, 'polynomial, power, piecewise or table');
  if (kind === 'power' && !((x[0] as number) > 0)) throw refuse('a power law needs a range above zero', 'a range that starts above zero');
  const errorOf = (shape: shapes.Shape): readonly [number, number] => x.reduce<readonly [number, number]>((worst, xi, i) => {
    const off = Math.abs(shape.at(xi) / (y[i] as number) - 1);
    return off > worst[0] ? [off, xi] : worst;
  }, [0, x[0] as number]);
  let best: shapes.Shape | undefined;
  let [off, at] = [Infinity, 0];
  for (const shape of candidates(kind, x, y, within)) {
    const [error, where] = errorOf(shape);
    if (error < off) [best, off, at] = [shape, error, where];
    if (error <= within) break;
  }
  const chosen = best as shapes.Shape;
  const course = courseOf(y);
  const values = x.map(chosen.at);
  return {
    property: of.property, kind, variable: of.variable, unit: propertyUnits[of.property], formula: chosen.formula, coefficients: chosen.coefficients, ...(chosen.rows === undefined ? {} : { rows: chosen.rows }),
    largestError: off, at, outcome: off <= within ? 'met' : 'missed', uncertainty: of.uncertainty,
    positive: values.every((one) => one > 0), course, wiggles: course !== 'turns' && course !== 'constant' && courseOf(values) === 'turns',
    safe: safeRange(chosen, x, course), flags: of.flags,
  };
}

/**
 * The first form that holds.
 *
 * @param of      the property along its range
 * @param kinds   forms in the order of liking; one that cannot belong to the property is passed over
 * @param within  largest relative error, > 0
 * @returns       the function; where none is within, the nearest
 * @throws        {Problem} no-such-fit where no form belongs to the property; wrong-within
 */
export function firstFitOf(of: Sampled, kinds: readonly FitKind[], within: number): Fit {
  let nearest: Fit | undefined;
  let refused: unknown;
  for (const kind of kinds) {
    try {
      const fit = fitOf(of, kind, within);
      if (fit.outcome === 'met') return fit;
      if (nearest === undefined || fit.largestError < nearest.largestError) nearest = fit;
    } catch (error) {
      if (!(error instanceof Problem) || error.list[0]?.code !== 'no-such-fit') throw error;
      refused = error;
    }
  }
  if (nearest === undefined) throw refused;
  return nearest;
}

/** Members of a form, the shortest first; each with as few digits as leave its error alone. */
function* candidates(kind: FitKind, x: readonly number[], y: readonly number[], within: number): Generator<shapes.Shape> {
  const digits = [6, 8, 10, 12, 15];
  const few = Math.max(4, Math.ceil(-Math.log10(within)) + 2);
  if (kind === 'polynomial') for (let degree = 0; degree <= 6; degree++) for (const n of digits) yield shapes.polynomial(x, y, degree, n);
  else if (kind === 'table') for (const steps of [1, 2, 4, 5, 8, 10, 16, 20, 32, 40, 80]) yield shapes.table(x, y, steps, few);
  else if (kind === 'piecewise') yield shapes.piecewise(x, y, within * 0.98, few);
  else for (const n of digits) yield kind === 'power' ? shapes.power(x, y, n) : kind === 'vogel' ? shapes.vogel(x, y, n) : shapes.sutherland(x, y, n);
}

function courseOf(y: readonly number[]): Fit['course'] {
  let [up, down] = [false, false];
  const scale = Math.abs(y[0] as number) * 1e-9;
  for (let i = 1; i < y.length; i++) {
    const step = (y[i] as number) - (y[i - 1] as number);
    if (step > scale) up = true;
    else if (step < -scale) down = true;
  }
  return up && down ? 'turns' : up ? 'rises' : down ? 'falls' : 'constant';
}

/** The range of the fit is where its error is known; beyond it a polynomial soon turns or changes sign, and that is said. */
function safeRange(shape: shapes.Shape, x: readonly number[], course: Fit['course']): Fit['safe'] {
  const [from, to] = [x[0] as number, x.at(-1) as number];
  const span = to - from;
  const sayings: string[] = [];
  for (const [start, step] of [[from, -span / 50], [to, span / 50]] as const) {
    let last = shape.at(start);
    for (let i = 1; i <= 50; i++) {
      const here = start + step * i;
      if (here <= 0) break;
      const value = shape.at(here);
      const rising = (value - last) * Math.sign(step);
      if (!(value > 0) && last > 0) sayings.push(`falls below zero at ${Number(here.toPrecision(4))}`);
      else if ((course === 'rises' && rising < 0) || (course === 'falls' && rising > 0)) sayings.push(`turns at ${Number(here.toPrecision(4))}`);
      else {
        last = value;
        continue;
      }
      break;
    }
  }
  return { from, to, ...(sayings.length === 0 ? {} : { beyond: sayings.join(' and ') }) };
}
