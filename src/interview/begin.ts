import { vocabulary } from '../assemble/index.ts';
import { own, type FlowWords } from '../case/index.ts';
import { alternatives, served } from './alternatives.ts';
import { hanging } from './open.ts';
import { fitted, questionOf, type Question } from './question.ts';
import type { State } from './state.ts';
import type { View } from './view.ts';

const properties = /^fluid\.(?!pressure$|temperature$)/;
const scale = 'what flows where: every scale of the flow follows from it';

/** The question that comes before all others. */
export const flowQuestion = (): Question => questionOf('', { paths: ['flow'], why: 'it brings the sizes, the laws, the domain and the ladder' });

/**
 * The start: what flows where, and what is asked of the simulation. Sizes and drive are those that the vocabulary says the flow needs.
 *
 * @param state  the answers so far, the flow among them
 * @param view   what they come to
 * @returns      the first question of the start that is still open
 */
export function startQuestion(state: State, view: View): Question | undefined {
  const words = own(vocabulary.flows, view.on.flow) as FlowWords;
  const sizes = Object.entries(words.sizes).filter(([, size]) => size.required === true).map(([key]) => `sizes.${key}`);
  const open = (path: string): boolean => view.can(path) && !served(view, path);
  const ask = (path: string, why: string): Question => questionOf(view.on.flow, { paths: alternatives(view, path).filter((one) => view.can(one)), ...reason(view, path, why) }, view);
  if (![...state.given.keys()].some((path) => properties.test(path)) && view.can('fluid.material')) return ask('fluid.material', 'properties, phase and the usual cautions follow from it');
  const next = [...sizes, ...words.needs].find(open);
  if (next !== undefined) return ask(next, scale);
  if (view.can('purpose')) return ask('purpose', 'a limit that it names is held against the estimate');
  if (view.on.targets.length === 0 && view.can('targets.0.quantity')) return ask('targets.0.quantity', `what a decision costs is told as a share of it; estimated here: ${view.settled.assembled.flow.answers.join(', ')}`);
  const loose = view.on.targets.map((target) => `${target.path}.within`).find((path) => view.can(path));
  if (loose !== undefined) return ask(loose, 'it sets what may be left out, how fine the mesh is, how long the run');
  const limited = view.on.targets.some((target) => view.settled.assembled.workings.get(`${target.path}.limit`) !== undefined);
  if (limited && view.can('ifWrong')) return ask('ifWrong', 'it sets how far an estimate must stand off the limit to decide alone');
  const place = heatless(view);
  return place === undefined || !open(`${place}.temperature`) ? undefined : ask(`${place}.temperature`, 'the target is one of heat, and no wall is heated or cooled yet');
}

/** The wall to be asked for heat: a target is thermal, and every wall is taken as adiabatic. */
function heatless({ settled: { assembled: { workings, flow, assumptions } } }: View): string | undefined {
  if (workings.word('targetHeat') !== 'yes') return undefined;
  const taken = assumptions.filter(({ id }) => id.startsWith('wallKind@')).map(({ id }) => id.slice('wallKind@'.length));
  if (taken.length < Math.max(1, flow.walls.length)) return undefined;
  return taken.find((place) => place === `walls.${flow.targetWall ?? ''}`) ?? taken[0];
}

function reason(view: View, path: string, why: string): { why: string; settles: readonly string[] } {
  const found = hanging(view).find((h) => h.paths.includes(path));
  return found === undefined ? { why, settles: [] } : hangs(found);
}

/** Why an input is asked on which decisions or targets hang. */
export function hangs({ decisions, targets }: { readonly decisions: readonly string[]; readonly targets: readonly string[] }): { why: string; settles: readonly string[] } {
  const settles = [...targets, ...decisions];
  const what = targets.length > 0 ? (decisions.length > 0 ? 'targets and decisions' : 'targets') : 'decisions';
  return { why: fitted(settles.length === 1 ? `open without it: ` : `${settles.length} open ${what} hang on it: `, settles), settles };
}
