import type { Case, Target } from '../case/index.ts';
import { lawProperties } from '../quantities/index.ts';
import { readQuantity } from '../units/index.ts';
import { quantity, type Definition, type Way } from '../workings/index.ts';

/** Shares of the accuracy asked that each part of a run may use up. Independent parts add by squares: 0.333^2 + 0.2^2 + 0.033^2 + 0.333^2 + 0.1^2 + 0.85^2 = 1. */
const parts = [
  { key: 'mesh', symbol: 'w_mesh', name: 'error the mesh may leave in', share: 1 / 3, formula: 'W/3' },
  { key: 'step', symbol: 'w_step', name: 'error the time step may leave in', share: 1 / 5, formula: 'W/5' },
  { key: 'iteration', symbol: 'w_it', name: 'error unfinished iteration may leave in', share: 1 / 30, formula: 'W/30' },
  { key: 'averaging', symbol: 'w_avg', name: 'error a short average may leave in', share: 1 / 3, formula: 'W/3' },
  { key: 'domain', symbol: 'w_dom', name: 'error the ends of the domain may leave in', share: 1 / 10, formula: 'W/10' },
  { key: 'rest', symbol: 'w_rest', name: 'what inputs, properties and model together may leave in', share: 0.85, formula: '0.85 W' },
] as const;
const budget = 'equal rigour for parts that add by squares, common practice';

/** How many times its half-width an estimate must stand off a limit to decide alone. */
const standOff = {
  low: [0.839, 'one chance in 20 of the wrong side: 1.645/1.96'],
  medium: [1.187, 'one chance in 100 of the wrong side: 2.326/1.96'],
  high: [1.577, 'one chance in 1000 of the wrong side: 3.090/1.96'],
} as const;

/** What a target is about, for its definitions. */
export interface TargetNode {
  readonly target: Target;
  /** Quantity that the tool estimates. */
  readonly id: string;
  readonly unit: string;
  readonly name: string;
}

/**
 * Numbers that belong to a target: the accuracy asked, what each part of a run may use of it, the limit its purpose names and the distance to it.
 * The spread of the estimate is set once it is known; what follows from it is computed here.
 *
 * @param on      the case
 * @param nodes   targets that a quantity estimates
 * @returns       definitions `targets.0.within` and so on
 */
export function targetDefinitions(on: Case, nodes: readonly TargetNode[]): Definition[] {
  return nodes.flatMap((node) => [...accuracy(node), ...spread(on, node), ...follows(node), ...decision(on, node)]);
}

const one = (id: string, symbol: string, name: string, unit: string, ways: readonly Way[], set?: { formula: string; source: string }): Definition =>
  quantity(id, { symbol, name, unit, ...(set === undefined ? {} : { set }) }, ways);
const way = (needs: readonly string[], value: (x: readonly number[]) => number, formula: string, source: string, as?: 'assumed'): Way => ({ needs, value: (of) => value(needs.map((n) => of[n] as number)), formula, source, ...(as === undefined ? {} : { as }) });

function accuracy({ target, id, unit, name }: TargetNode): Definition[] {
  const at = target.path;
  const { relative, ofChange, absolute } = target.within ?? {};
  const heat = unit === 'K' && !/difference/i.test(id);
  const share = ofChange ?? relative ?? 0.02;
  const source = target.within === undefined ? 'nothing is asked: 2 %, of its change for a temperature' : `within ${target.within.written}, the case`;
  const as = target.within === undefined ? 'assumed' as const : undefined;
  const asked: Way[] = absolute !== undefined
    ? [way([], () => absolute, 'W as given', source)]
    : heat
      ? [
          way([id, 'inletTemperature', 'temperatureDifference'], ([t, from, dT]) => share * (Math.abs((t as number) - (from as number)) || (dT as number)), `W = ${share} |T - T_in|`, source, as),
          way([id, 'inletTemperature'], ([t, from]) => share * Math.abs((t as number) - (from as number)), `W = ${share} |T - T_in|`, source, as),
          way(['temperatureDifference'], ([dT]) => share * (dT as number), `W = ${share} dT`, source, as),
        ]
      : [way([id], ([x]) => share * Math.abs(x as number), `W = ${share} |${id}|`, source, as)];
  return [
    one(`${at}.accuracy`, 'W', `accuracy asked of the ${name}`, unit, asked),
    ...parts.map((p) => one(`${at}.${p.key}`, p.symbol, p.name, unit, [way([`${at}.accuracy`], ([w]) => p.share * (w as number), p.formula, budget)])),
    one(`${at}.accuracyShare`, 'W/|x|', `accuracy asked over the ${name}`, '1', [way([`${at}.accuracy`, id], ([w, x]) => (w as number) / Math.abs(x as number), 'W/|x|', 'definition')]),
    one(`${at}.iterationShare`, 'w_it/|x|', `error unfinished iteration may leave in over the ${name}`, '1', [way([`${at}.iteration`, id], ([w, x]) => (w as number) / Math.abs(x as number), 'w_it/|x|', 'definition')]),
    one(`${at}.enough`, 'W/1.5', 'spread at which an estimate is as good as a run', unit, [way([`${at}.accuracy`], ([w]) => (w as number) / 1.5, 'W/1.5', 'common practice')]),
  ];
}

/** What averaged equations leave in: nothing in laminar flow, the published scatter of closures else. */
function closure({ target, id, unit }: TargetNode): Way[] {
  const at = target.path;
  const scatter = way([`${at}.halfWidth`, `${at}.inputWidth`], ([w, given]) => Math.sqrt(Math.max(0, (w as number) ** 2 - (given as number) ** 2)), 'sqrt(w^2 - w_in^2)', 'a closure knows this no better than the law it is held against, common practice');
  const of = (share: number, about: string): Way => way([id], ([x]) => share * Math.abs(x as number), `${share} |${id}|`, `${about}, common practice`);
  const heat = ['W/m^2', 'W/(m^2 K)'].includes(unit) || /nusselt/i.test(id);
  const turbulent = { regime: ['transitional', 'turbulent'] };
  return [
    { ...scatter, when: { flowClass: 'continuum' } },
    { ...way([], () => 0, '0', 'laminar flow: the equations hold no model'), when: { regime: 'laminar' } },
    // Heat rate and outlet temperature follow the transfer coefficient less than in proportion: their own scatter holds that.
    ...(unit === 'K' || unit === 'W' ? [{ ...scatter, when: turbulent }] : [
      { ...of(0.2, 'closures in separated flow, 10 to 25 %'), when: { ...turbulent, separated: 'yes' } },
      { ...(heat ? of(0.125, 'closures at attached walls, heat transfer 10 to 15 %') : of(0.04, 'closures at attached walls, friction 3 to 5 %')), when: turbulent },
    ]),
  ];
}

function spread(on: Case, node: TargetNode): Definition[] {
  const { target, unit, name } = node;
  const at = target.path;
  const [needed, why] = standOff[on.ifWrong as keyof typeof standOff] ?? standOff.medium;
  return [
    one(`${at}.halfWidth`, 'w', `half-width of the hand estimate of the ${name}`, unit, [], { formula: 'root of the squared sum over inputs, properties and scatter of laws, 95 %', source: 'first derivatives over the half-widths; sampled where a word changes' }),
    one(`${at}.inputWidth`, 'w_in', `half-width that inputs and properties alone give the ${name}`, unit, [], { formula: 'the same over inputs and properties alone', source: 'first derivatives over the half-widths' }),
    one(`${at}.ifLaminar`, 'x_lam', `${name} if the flow stays laminar throughout`, unit, [], { formula: 'the estimate by its laminar law', source: 'the verdict on turbulence is open: both branches' }),
    one(`${at}.ifTurbulent`, 'x_turb', `${name} if the flow is turbulent throughout`, unit, [], { formula: 'the estimate by its turbulent law', source: 'the verdict on turbulence is open: both branches' }),
    one(`${at}.model`, 'w_mod', `half-width that the closure of a run leaves in the ${name}`, unit, closure(node)),
    one(`${at}.reach`, 'W_min', 'best that a run could reach', unit, [way([`${at}.inputWidth`, `${at}.model`, `${at}.mesh`, `${at}.iteration`, `${at}.domain`], (x) => Math.hypot(...x), 'sqrt(w_in^2 + w_mod^2 + w_mesh^2 + w_it^2 + w_dom^2)', 'parts are independent')]),
    one(`${at}.widthRatio`, 'w/W', 'spread of the hand estimate over the accuracy asked', '1', [way([`${at}.halfWidth`, `${at}.accuracy`], ([w, W]) => (w as number) / (W as number), 'w/W', 'definition')]),
    one(`${at}.worthwhile`, '0.8 w', 'spread that a run must beat to be worth its while', unit, [way([`${at}.halfWidth`], ([w]) => 0.8 * (w as number), '0.8 w', 'common practice')]),
    one(`${at}.gain`, 'w/W_min', 'how much narrower than the hand estimate a run can be at best', '1', [way([`${at}.halfWidth`, `${at}.reach`], ([w, best]) => (w as number) / (best as number), 'w/W_min', 'definition')]),
    one(`${at}.standOffNeeded`, 'k_c', 'half-widths that an estimate must stand off a limit to decide alone', '1', [way([], () => needed, why, 'normal distribution of the estimate', on.ifWrong === undefined ? 'assumed' : undefined)]),
  ];
}

/** How the target follows each property, all its states moved together: an exponent, for a temperature the change by 1 %. Set once the derivatives are known. */
function follows({ target, unit, name }: TargetNode): Definition[] {
  return lawProperties.map((p) => quantity(`${target.path}.per.${p.id}`, {
    symbol: unit === 'K' ? `0.01 dx/d ln ${p.symbol}` : `d ln x/d ln ${p.symbol}`,
    name: unit === 'K' ? `change of the ${name} by 1 % of ${p.name}` : `exponent of the ${name} in the ${p.name}`,
    unit: unit === 'K' ? 'K' : '1', signed: true,
    set: { formula: 'first derivative, all states of the property moved together', source: 'first derivatives' },
  }));
}

function decision(on: Case, { target, id, unit, name }: TargetNode): Definition[] {
  const limit = limitIn(on.purpose ?? '', unit);
  if (limit === undefined) return [];
  const at = target.path;
  return [
    quantity(`${at}.limit`, { symbol: 'x_lim', name: `limit that the purpose sets to the ${name}`, unit, signed: unit === 'K' }, [{ needs: [], value: () => limit.value, formula: `"${limit.text}"`, source: 'the purpose of the case' }]),
    one(`${at}.margin`, 'm', `distance of the ${name} from its limit`, unit, [way([id, `${at}.limit`], ([x, l]) => Math.abs((x as number) - (l as number)), 'm = |x - x_lim|', 'definition')]),
    one(`${at}.standOff`, 'm/w', 'distance from the limit over the half-width of the estimate', '1', [way([`${at}.margin`, `${at}.halfWidth`], ([m, w]) => (m as number) / (w as number), 'm/w', 'definition')]),
  ];
}

const comparison = /\b(?:below|under|less than|at most|above|over|more than|at least|exceeds?|beyond|up to|stays? within|reach(?:es)?)\s+([-+]?\d[\d.,]*(?:e[-+]?\d+)?\s*[A-Za-z%][^\s,;?!]*)/i;

/** The limit that a sentence names after a word of comparison, where its unit is that of the target. */
export function limitIn(purpose: string, unit: string): { readonly value: number; readonly text: string } | undefined {
  const found = comparison.exec(purpose);
  if (found === null) return undefined;
  const text = (found[1] as string).replace(/\.$/, '');
  try {
    const { value } = readQuantity(text, { unit });
    return Number.isFinite(value) ? { value, text } : undefined;
  } catch {
    return undefined;
  }
}
