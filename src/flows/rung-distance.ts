import type { Reference } from '../references/index.ts';
import { quantity, type Definition, type Way } from '../workings/index.ts';

/** Group of the case that a need of a reference stands for, and the factor over which one law is known to hold. */
const yardsticks: Readonly<Record<string, { readonly group: string; readonly factor: number }>> = {
  reynolds: { group: 'reynolds', factor: 10 },
  reynoldsChannel: { group: 'backwardStepReynolds', factor: 10 },
  frictionReynolds: { group: 'frictionReynolds', factor: 10 },
  rayleigh: { group: 'rayleigh', factor: 30 },
  prandtl: { group: 'prandtl', factor: 3 },
  graetz: { group: 'graetz', factor: 10 },
  knudsen: { group: 'knudsen', factor: 3 },
};

/** Groups that a reference has numbers for, so that a case can be held against them. */
export const comparedGroups = (reference: Reference): readonly string[] => reference.needs.flatMap((n) => { const y = yardsticks[n.id]; return y === undefined ? [] : [y.group]; });

/** Answers of turbulent flow; the others are laminar, or know no regime. */
const turbulentAnswer = /^turbulent-/;
const noRegime = new Set(['manufactured-solution', 'two-plates-radiation', 'slab-steady', 'half-space-step', 'side-heated-square', 'ergun-bed', 'sphere-drag', 'shell-cylinder', 'shell-sphere', 'rayleigh-benard-onset']);

/**
 * Distance of a known answer from the case, in the groups that it has numbers for, plus one where it is of another regime.
 *
 * @param id         id of the quantity
 * @param reference  the answer
 * @param from       needs that ids of the case fill
 * @param fixed      needs that the rung fixes
 * @returns          its definition; no number where the answer has no group that the case has
 */
export function distanceDefinition(id: string, reference: Reference, from: readonly (readonly [string, string])[], fixed: Readonly<Record<string, number>>): Definition {
  const mapped = new Map(from);
  const parts = reference.needs.flatMap((need) => {
    const yard = yardsticks[need.id];
    if (yard === undefined) return [];
    const at = mapped.get(need.id);
    // Where a species is carried its own number stands for that of heat.
    if (at?.startsWith(yard.group) === true || at?.startsWith('schmidt') === true) return []; // the answer is taken at the case's own number, at whatever state
    const number = fixed[need.id] ?? (at === undefined ? need.default : undefined);
    return at === undefined && number === undefined ? [] : [{ ...yard, at, number }];
  });
  const needs = [...new Set(parts.flatMap((p) => [p.group, ...(p.at === undefined ? [] : [p.at])]))];
  const groups = (of: Readonly<Record<string, number>>): number => Math.hypot(...parts.map((p) => Math.log((of[p.group] as number) / (p.number ?? (of[p.at as string] as number))) / Math.log(p.factor)), 0);
  const formula = parts.length === 0 ? 'D = 0' : `D = sqrt(sum (ln(g/g_ref)/ln R)^2) over ${parts.map((p) => `${p.group} with R = ${p.factor}`).join(', ')}`;
  const source = 'common practice: R is the factor over which one law is known to hold; weights of 1';
  const other = turbulentAnswer.test(reference.id) ? ['laminar'] : ['transitional', 'turbulent'];
  const ways: Way[] = [
    ...(noRegime.has(reference.id) ? [] : [{ needs: ['regimeGroup', ...needs], when: { regime: other }, value: (of: Readonly<Record<string, number>>) => groups(of) + 1, formula: `${formula}, plus 1 for another regime`, source }]),
    { needs: ['regimeGroup', ...needs], value: groups, formula, source },
  ];
  return quantity(id, { symbol: 'D', name: 'distance of the known answer from the case', unit: '1' }, parts.length === 0 && noRegime.has(reference.id) ? [] : ways);
}
