import { padded } from './columns.ts';

/** A labelled part of the screen: items by importance, the first being the most important. An item may be several lines. */
export interface Part {
  readonly label: string;
  readonly items: readonly string[];
  /** As many items stay whatever else has to go. */
  readonly least: number;
  /** An empty line stands before it. */
  readonly apart?: true;
  /** How many things each item holds, where that is more than one. */
  readonly counts?: readonly number[];
  /** Its label warns. */
  readonly warns?: true;
}

/** What a terminal may add to text; without effect in a pipe. */
export interface Paint {
  readonly strong: (text: string) => string;
  readonly warn: (text: string) => string;
}
export const noPaint: Paint = { strong: (text) => text, warn: (text) => text };

export const gutter = 11;

/**
 * Parts as lines behind a column of labels, cut to a height: the part with most to spare gives up its least important item, and says how many are hidden.
 *
 * @param parts   parts in the order in which they stand
 * @param height  largest number of lines
 * @param paint   emphasis of labels
 * @returns       lines
 */
export function fitted(parts: readonly Part[], height: number, paint: Paint): string[] {
  const drawn = parts.filter((part) => part.items.length > 0);
  const shown = shownOf(drawn, height);
  return drawn.flatMap((part, k) => {
    const label = (part.warns === true ? paint.warn : paint.strong)(padded(part.label, gutter));
    return [...(part.apart === true ? [''] : []), ...linesOf(part, shown[k] as number).map((text, i) => `${i === 0 ? label : ' '.repeat(gutter)}${text}`.trimEnd())];
  });
}

/** How many items of each part are shown: least important ones go until all fits, then what room is left is given back. */
function shownOf(parts: readonly Part[], height: number): number[] {
  const shown = parts.map((part) => part.items.length);
  const tall = parts.map((part) => part.items.map((item) => item.split('\n').length));
  const total = (): number => parts.reduce((sum, part, k) => {
    const count = shown[k] as number;
    let lines = sum + (part.apart === true ? 1 : 0) + (count < part.items.length ? 1 : 0);
    for (let i = 0; i < count; i++) lines += tall[k]?.[i] as number;
    return lines;
  }, 0);
  const most = (spare: (k: number) => number): number => parts.reduce((best, _, k) => (spare(k) > 0 && (best < 0 || spare(k) > spare(best)) ? k : best), -1);
  while (total() > height) {
    const beyond = most((k) => (shown[k] as number) - (parts[k] as Part).least);
    const k = beyond >= 0 ? beyond : most((at) => (shown[at] as number) - 1);
    if (k < 0) break;
    shown[k] = (shown[k] as number) - 1;
  }
  parts.forEach((part, k) => {
    const kept = shown[k] as number;
    for (let more = part.items.length; more > kept; more--) {
      shown[k] = more;
      if (total() <= height) return;
    }
    shown[k] = kept;
  });
  return shown;
}

function linesOf(part: Part, shown: number): string[] {
  const hidden = part.items.slice(shown).reduce((sum, _, i) => sum + (part.counts?.[shown + i] ?? 1), 0);
  return [...part.items.slice(0, shown).flatMap((item) => item.split('\n')), ...(hidden > 0 ? [`and ${hidden} more (--full)`] : [])];
}

/**
 * As many pieces as fit into a line, most important first; the first always stands, cut at a word where it must be.
 *
 * @param pieces  pieces of text
 * @param width   columns
 * @param joint   what stands between them
 * @returns       one line
 */
export function joined(pieces: readonly string[], width: number, joint: string): string {
  let line = cut(pieces[0] ?? '', width);
  for (const piece of pieces.slice(1)) {
    if (piece === '') continue;
    const longer = `${line}${joint}${piece}`;
    if (longer.length <= width) line = longer;
  }
  return line;
}

/** The first of several wordings, the fullest first, that fits into a width; the last one cut where none does. */
export function fitting(wordings: readonly string[], width: number): string {
  return wordings.find((text) => text.length <= width) ?? cut(wordings.at(-1) ?? '', width);
}

/** Text cut between words to a width, with dots in place of the rest. */
export function cut(text: string, width: number): string {
  if (text.length <= width) return text;
  const room = text.slice(0, width - 3);
  const end = room.lastIndexOf(' ');
  return `${(end > width / 3 ? room.slice(0, end) : room).trimEnd()} ...`.slice(0, width);
}
