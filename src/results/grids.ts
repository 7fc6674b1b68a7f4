import { Problem, type ProblemData } from '../problems/index.ts';
import { dimensionText } from '../units/index.ts';
import { meshFamily, type FineBy, type MeshFamily, type Target } from './family.ts';
import { gridCautions, gridSays } from './gridsWords.ts';
import { judgeFamily, type GridKind, type GridNumbers } from './judge.ts';
import { allowed, readLimit, type Limit, type Outcome } from './limit.ts';
import { readTable } from './table.ts';

export interface GridOptions {
  /** 2 or 3; 3 unless said. Counts only where the first column is cells. */
  readonly dimension?: 2 | 3;
  /** What the band must meet, as text: `2 %`, `0.5 K`. */
  readonly within?: string;
  /** Order the schemes have on paper; 2 unless said. */
  readonly formalOrder?: number;
  /** How far the values are from converged iterations, as text. */
  readonly iteration?: string;
}

/** What a family of meshes or steps says about one target. Numbers in SI. */
export interface GridVerdict {
  readonly name: string;
  readonly unit: string;
  readonly kind: GridKind;
  /** Apparent order as it came out; absent where the data give none. */
  readonly order?: number;
  readonly extrapolated?: number;
  /** Half-width of the band over the value on the finest mesh; absent where that value is zero. */
  readonly band?: number;
  readonly bandAbsolute: number;
  readonly safetyFactor: number;
  /** Band by the bare order and a factor of 1.25, relative, where the order gives one. */
  readonly index?: number;
  /** |(f1 - f2)/f1| and |(extrapolated - f1)/extrapolated|. */
  readonly approximateError?: number;
  readonly extrapolatedError?: number;
  readonly asymptoticRatio?: number;
  readonly outcome?: Outcome;
  readonly says: string;
  readonly cautions: readonly string[];
}

export interface GridResult {
  readonly by: FineBy;
  /** Cells, size [m] or step [s], finest first, and the ratios of sizes. */
  readonly marks: readonly number[];
  readonly ratios: readonly number[];
  /** What makes the family a poor witness, for all targets. */
  readonly cautions: readonly string[];
  readonly targets: readonly [GridVerdict, ...GridVerdict[]];
  /** The worst of the targets; absent without a limit. */
  readonly outcome?: Outcome;
}

/**
 * Grid or step convergence of a table of results: order, extrapolated value, band and what they mean, for every target.
 *
 * @param text     the table as CSV: `cells`, `size [m]` or `step [s]`, then targets, one row a mesh in any order
 * @param file     its name, for problems
 * @param options  dimension, limit, formal order, iteration error
 * @returns        the verdict for each target and the worst outcome
 * @throws         {Problem} those of the table and the family; wrong-order; those of the limit
 * @source         Celik et al. 2008; Eca and Hoekstra 2014
 */
export function grids(text: string, file: string, options: GridOptions = {}): GridResult {
  const family = meshFamily(readTable(text, file), options.dimension ?? 3);
  const formalOrder = options.formalOrder ?? 2;
  if (!(formalOrder >= 0.5 && formalOrder <= 8)) throw new Problem({ code: 'wrong-order', message: `${formalOrder} is not the order of a scheme`, expected: 'a number from 0.5 to 8, 1 or 2 as a rule' });
  const problems: ProblemData[] = [];
  const targets = family.targets.flatMap((target) => {
    try {
      return [judgeTarget(target, family, formalOrder, options)];
    } catch (error) {
      if (!(error instanceof Problem)) throw error;
      problems.push(...error.list);
      return [];
    }
  });
  if (problems.length > 0) throw new Problem(problems);
  const outcomes = targets.map((target) => target.outcome);
  const outcome = (['missed', 'cannot tell', 'met'] as const).find((one) => outcomes.includes(one));
  return { by: family.by, marks: family.marks, ratios: family.ratios, cautions: family.cautions, targets: targets as [GridVerdict, ...GridVerdict[]], ...(outcome === undefined ? {} : { outcome }) };
}

function judgeTarget(target: Target, family: MeshFamily, formalOrder: number, options: GridOptions): GridVerdict {
  const fine = target.values[0] as number;
  const largest = Math.max(...target.values.map(Math.abs));
  const stated = options.iteration === undefined ? undefined : allowed(readLimit(options.iteration, target, 'the iteration error'), fine);
  const rounding = target.lastDigit <= largest / 100 ? target.lastDigit / 2 : 0; // a bare 10 says nothing of its digits
  const iterationError = Math.max(stated ?? rounding, 1e-12 * largest);
  const numbers = judgeFamily({ sizes: family.sizes, values: target.values, formalOrder, iterationError });
  const limit = options.within === undefined ? undefined : readLimit(options.within, target, 'the limit');
  const outcome = limit === undefined ? undefined : outcomeOf(numbers, limit, fine);
  const about = { target, family, numbers, formalOrder, iterationError, stated: stated !== undefined, ...(limit === undefined ? {} : { limit }), ...(outcome === undefined ? {} : { outcome }) };
  const { extrapolated, index } = numbers;
  return {
    name: target.name,
    unit: target.unit.factor === 1 && target.unit.offset === 0 ? target.unitText : dimensionText(target.unit.dimension),
    kind: numbers.kind,
    ...(numbers.order === undefined ? {} : { order: numbers.order }),
    ...(extrapolated === undefined ? {} : { extrapolated }),
    ...(fine === 0 ? {} : { band: numbers.halfWidth / Math.abs(fine) }),
    bandAbsolute: numbers.halfWidth,
    safetyFactor: numbers.safetyFactor,
    ...(index === undefined || fine === 0 ? {} : { index: index / Math.abs(fine) }),
    ...(fine === 0 ? {} : { approximateError: Math.abs((fine - (target.values[1] as number)) / fine) }),
    ...(extrapolated === undefined || Math.abs(extrapolated) <= 1e-9 * Math.abs(fine) ? {} : { extrapolatedError: Math.abs((extrapolated - fine) / extrapolated) }),
    ...(numbers.asymptoticRatio === undefined ? {} : { asymptoticRatio: numbers.asymptoticRatio }),
    ...(outcome === undefined ? {} : { outcome }),
    says: gridSays(about),
    cautions: gridCautions(about),
  };
}

/**
 * Met where the band fits into the limit; missed where even the kindest reading of the data does not; else it cannot be told.
 * Data that diverge tell nothing, whatever their size; nor does a share of a value that its own band puts at zero.
 */
function outcomeOf(numbers: GridNumbers, limit: Limit, fine: number): Outcome {
  if (numbers.kind === 'divergent') return 'cannot tell';
  const width = allowed(limit, fine);
  if (numbers.halfWidth <= width) return 'met';
  if ('relative' in limit && numbers.halfWidth >= Math.abs(fine)) return 'cannot tell';
  return numbers.atLeast > width ? 'missed' : 'cannot tell';
}
