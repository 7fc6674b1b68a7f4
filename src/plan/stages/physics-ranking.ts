import { lines, type Ground } from '../ground.ts';
import { beyondAccuracy, called, effectsOf, listed, nameOf, priceText } from '../say.ts';
import { targetSpreads } from '../target-spread.ts';
import type { Line, PlanEffect, Table } from '../types.ts';

/** How well the model of an effect is known to change a target. */
const well = new Set(['variable-density', 'closed-gas-pressure', 'tall-column', 'axial-conduction', 'viscous-heating', 'pressure-work', 'imposed-unsteadiness', 'variable-viscosity', 'variable-conductivity', 'variable-heat-capacity', 'rarefaction', 'stefan-flow', 'conjugate', 'compressibility', 'wall-axial-conduction', 'real-gas', 'nonlinear-density']);
const badly = new Set(['transition', 'swirl', 'participating-radiation', 'turbulence-radiation', 'evaporation', 'condensation', 'settling', 'surface-reaction', 'porous-two-temperature', 'film-reaction', 'turbulence-chemistry', 'boiling', 'cavitation', 'marangoni', 'drop-breakup', 'viscoelasticity', 'electrokinetics', 'soret', 'turbulence-buoyancy']);

type Rank = 'high' | 'medium' | 'low';
const order: readonly Rank[] = ['high', 'medium', 'low'];

/** Importance by the price against the accuracy asked; without a price by verdict and margin. */
function importance(on: Ground, e: PlanEffect): Rank {
  if (e.price?.acts === true && e.price.target !== undefined && (e.price.relative !== undefined || e.price.value !== undefined)) {
    if (beyondAccuracy(on, e.price)) return 'high';
    return e.verdict === 'leave-out' ? 'low' : 'medium';
  }
  if (e.verdict === 'include') return e.deciding?.marginKind === 'factor' && (e.deciding.margin ?? 0) < 3 ? 'medium' : 'high';
  return e.verdict === 'leave-out' ? 'low' : 'medium';
}

function knowledge(on: Ground, e: PlanEffect): 'good' | 'fair' | 'poor' {
  if (e.id === 'buoyancy') return on.word('regime') === 'laminar' ? 'fair' : 'poor';
  if (e.id === 'unsteadiness') return on.word('targetPeak') === 'yes' ? 'poor' : 'fair';
  if (e.id === 'roughness') return on.word('has.roughness') === 'yes' ? 'fair' : 'poor';
  return well.has(e.id) ? 'good' : badly.has(e.id) ? 'poor' : 'fair';
}

interface Ranked { readonly e: PlanEffect; readonly importance: Rank; readonly knowledge: 'good' | 'fair' | 'poor' }

function ranked(on: Ground): Ranked[] {
  const list = effectsOf(on).filter((e) => e.applies !== false && e.judged && !(e.verdict === 'leave-out' && !beyondAccuracy(on, e.price)));
  const blind = ['poor', 'fair', 'good'];
  return list
    .map((e): Ranked => ({ e, importance: importance(on, e), knowledge: knowledge(on, e) }))
    .sort((a, b) => order.indexOf(a.importance) + blind.indexOf(a.knowledge) - order.indexOf(b.importance) - blind.indexOf(b.knowledge) || order.indexOf(a.importance) - order.indexOf(b.importance));
}

/** What to mend first: what matters much and is known badly. */
export function phenomena(on: Ground): Line[] {
  const worst = ranked(on).filter((r) => r.importance === 'high' && r.knowledge === 'poor');
  const law = targetSpreads(on.assembled)[0]?.from[0];
  return lines(
    worst.length > 0 && `Matters much and is known badly: ${listed(worst.map((r) => called(r.e)))}. Before the run ${worst.length === 1 ? 'it asks' : 'they ask'} for data, a better model or a rung of the ladder.`,
    worst.length === 0 && law?.kind === 'scatter' && `No effect both matters much and is known badly; what bounds the answer is how well the law behind the estimate is known (${law.label}).`,
  );
}

export function rankedPhenomena(on: Ground): Table[] {
  const rows = ranked(on).map(({ e, importance: i, knowledge: k }) => [e.title, i, k, priceText(e.price), e.price?.target === undefined ? '' : nameOf(on, on.assembled.targets.find((t) => t.id === e.price?.target)?.quantity ?? ''), action(i, k)]);
  return rows.length === 0 ? [] : [{ title: 'Phenomena by importance and knowledge', columns: ['phenomenon', 'importance', 'knowledge', 'leaving it out', 'of', 'asks for'], rows }];
}

function action(i: Rank, k: string): string {
  if (i === 'high' && k === 'poor') return 'data, a better model or a rung before the run';
  if (i === 'high' || (i === 'medium' && k === 'poor')) return 'a named check or a bracket run';
  return 'nothing further';
}
