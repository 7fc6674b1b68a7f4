import { vocabulary } from '../assemble/index.ts';
import { fieldAt, own } from '../case/index.ts';
import { flows } from '../flows/index.ts';
import { heatKeys } from './alternatives.ts';
import type { View } from './view.ts';

/** A word that may be answered, and what it means. */
export interface Offer {
  readonly word: string;
  readonly means: string;
}

/** One question: what is asked, why, and what may be answered. */
export interface Question {
  /** The path asked for, then others that would serve as well. */
  readonly paths: readonly string[];
  readonly asks: string;
  /** One line: the decisions, the target or the share of the spread that hang on it. */
  readonly why: string;
  readonly offers: readonly Offer[];
  readonly example: string;
  /** The value that stands, where a better one is asked for. */
  readonly now?: string;
  /** Decisions and targets that hang on it. */
  readonly settles: readonly string[];
}

/** Nothing more is asked. */
export interface Done {
  readonly done: 'settled' | 'enough';
}

/** What a question is made of besides its words. */
export interface Asked {
  readonly paths: readonly string[];
  readonly why: string;
  readonly settles?: readonly string[];
  readonly now?: string;
}

/** Names as text. */
const spoken = (id: string): string => id.replaceAll('-', ' ');

/**
 * A list that ends in a count where it is long: `turbulence, roughness and 3 more`.
 *
 * @param before  what stands before it
 * @param names   ids
 * @param width   columns there are
 */
export function fitted(before: string, names: readonly string[], width = 72): string {
  let kept = names.map(spoken);
  const text = (): string => `${before}${kept.join(', ')}${kept.length < names.length ? ` and ${names.length - kept.length} more` : ''}`;
  while (kept.length > 1 && text().length > width) kept = kept.slice(0, -1);
  return text();
}

/**
 * A question in words of the vocabulary.
 *
 * @param flow   id of the flow; empty before it is known
 * @param asked  paths and reason
 * @param view   the answers so far, for what a target may be
 */
export function questionOf(flow: string, asked: Asked, view?: View): Question {
  const path = asked.paths[0] as string;
  const field = fieldAt(vocabulary, flow, path)?.field;
  const keys = heatKeys().map((key) => `.${key}`);
  const heat = asked.paths.length > 1 && asked.paths.every((one) => keys.some((key) => one.endsWith(key)));
  const title = path === 'flow' ? 'what flows where' : heat ? `how heat enters or leaves at ${path.slice(0, path.lastIndexOf('.'))}` : (field?.doc ?? path);
  return { paths: asked.paths, asks: title, why: asked.why, offers: offersOf(flow, asked.paths, view), example: field?.example ?? '', settles: asked.settles ?? [], ...(asked.now === undefined ? {} : { now: asked.now }) };
}

function offersOf(flow: string, paths: readonly string[], view: View | undefined): Offer[] {
  const path = paths[0] as string;
  if (path === 'flow') return Object.keys(flows).map((id) => ({ word: id, means: own(vocabulary.flows, id)?.title ?? '' }));
  if (/^targets\.[^.]+\.quantity$/.test(path)) return view === undefined ? [] : results(view);
  return paths.flatMap((one): Offer[] => {
    const field = fieldAt(vocabulary, flow, one)?.field;
    if (field?.kind === 'flag') return [{ word: one.slice(one.lastIndexOf('.') + 1), means: field.doc }];
    const words = field?.kind === 'word' || field?.kind === 'words' || field?.kind === 'quantity' ? (field.words ?? {}) : {};
    return Object.entries(words).map(([word, { doc }]) => ({ word, means: doc }));
  });
}

/** Numbers that the rules put a price on, as far as this flow has them. */
function results(view: View): Offer[] {
  const { rules, assembled } = view.settled;
  const priced = Object.values(rules.effects).flatMap((rule) => [...rule.price, ...rule.branches.flatMap((b) => b.price)].map((line) => line.of));
  const times = new Map<string, number>();
  for (const id of priced) times.set(id, (times.get(id) ?? 0) + 1);
  const known = assembled.flow.ladder.map((rung) => rung.compares);
  return [...new Set([...[...times].sort((a, b) => b[1] - a[1]).map(([id]) => id), ...known])]
    .filter((id) => assembled.workings.index.has(id) && view.inputs(id) !== undefined && !/Factor|^(density|pressure|massFlow|jetDrop)$/.test(id))
    .slice(0, 8)
    .map((id) => ({ word: id, means: assembled.workings.slots[assembled.workings.index.get(id) ?? -1]?.node.about.name ?? '' }));
}
