import type { Plan, PlanChoice, PlanEffect, PlanTarget } from '../plan/index.ts';
import { inputsInWords } from '../problems/index.ts';
import { broken } from './columns.ts';
import { cut, fitted, fitting, gutter, joined, noPaint, type Paint, type Part } from './fit.ts';
import { setUpParts } from './screen-set-up.ts';
import { cautionLines, decidingText, factorText, percent, pricedOf, priceText, titled } from './words.ts';
import { oneLine, type Writing } from './writing.ts';

/** Columns and lines that a screen has at least. */
const width = 80;
const height = 48;
const room = width - gutter;

/** What the screen shows beside the plan. */
export interface ScreenOptions {
  /** The case file as the user wrote its name, for the commands that lead further. */
  readonly file: string;
  /** The sentence that says what the run is for. */
  readonly purpose?: string;
  readonly paint?: Paint;
}

/**
 * The plan on one screen: at most 48 lines of 80 columns. What matters least is cut first, with the number of what is not shown.
 *
 * @param plan     the plan
 * @param writing  how its numbers are written
 * @param options  file name, purpose, paint
 * @returns        text without a last newline
 */
export function screen(plan: Plan, writing: Writing, options: ScreenOptions): string {
  const paint = options.paint ?? noPaint;
  const head = [paint.strong(cut(titled(plan), width)), ...(options.purpose === undefined ? [] : broken(oneLine(options.purpose), width).slice(0, 2))];
  const parts: Part[] = [
    { label: 'At odds', items: plan.contradictions.map((c) => wrap(`${oneLine(c.says)}: ${oneLine(c.effect)}. Cure: ${oneLine(c.cure)}`, 3)), least: 2, apart: true, warns: true },
    { label: 'Mind first', items: [...cautionLines(plan, writing).map((text) => wrap(text, 2)), ...strained(plan)], least: 3, apart: true, warns: true },
    { label: 'Target', items: plan.targets.map((t) => [targetText(t, writing), ...branches(t, plan, writing)].join('\n')), least: 3, apart: true },
    ...effectParts(plan, writing),
    { label: 'Choices', ...choiceItems(plan), least: 2 },
    ...setUpParts(plan, writing, room),
    { label: 'Ladder', items: plan.ladder.map((r) => rungText(r, writing)), least: 3, apart: true },
    { label: 'Taken', items: assumed(plan, writing), least: 1 },
    { label: 'More', items: moreItems(options.file, plan), least: 2, apart: true },
  ];
  return [...head, ...fitted(parts, height - head.length, paint)].join('\n');
}

const wrap = (text: string, most: number): string => {
  const lines = broken(text, room);
  return (lines.length <= most ? lines : [...lines.slice(0, most - 1), cut(lines.slice(most - 1).join(' '), room)]).join('\n');
};

function targetText(t: PlanTarget, writing: Writing): string {
  const name = `${oneLine(t.quantity)}${t.place === undefined ? '' : ` at ${oneLine(t.place)}`}`;
  if (!t.computed) return joined([name, 'no hand estimate', ...(t.near?.[0] === undefined ? [] : [`is ${t.near[0]} meant?`]), t.within === undefined ? '' : `asked within ${oneLine(t.within)}`], room, '; ');
  if (t.refused !== undefined) return joined([`${name} no estimate`, `${oneLine(t.refused)} on its way`, t.within === undefined ? '' : `asked within ${oneLine(t.within)}`], room, '; ');
  return joined([
    `${name} ${writing.number(t.quantity)}`,
    t.within === undefined ? '' : `asked within ${oneLine(t.within)}`,
  ], room, '; ');
}

/** What a target is over the operating range, and at both ends where laminar or turbulent is open. */
function branches(t: PlanTarget, plan: Plan, writing: Writing): string[] {
  const range = plan.quantities[t.quantity]?.range;
  const [laminar, turbulent] = [`${t.id}.ifLaminar`, `${t.id}.ifTurbulent`];
  return [
    ...(range === undefined ? [] : [cut(`over the operating range ${writing.like(t.quantity, range.from)} to ${writing.like(t.quantity, range.to)}`, room)]),
    ...(plan.quantities[turbulent] === undefined ? [] : [cut(`open: ${writing.number(laminar)} if laminar, ${writing.number(turbulent)} if turbulent`, room)]),
  ];
}

function effectParts(plan: Plan, writing: Writing): Part[] {
  const judged = plan.effects.filter((e) => e.applies !== false && e.judged);
  const of = (verdict: PlanEffect['verdict']): PlanEffect[] => judged.filter((e) => e.verdict === verdict);
  const wide = Math.min(26, Math.max(12, ...judged.filter((e) => e.verdict !== 'leave-out').map((e) => e.id.length))) + 1;
  const row = (e: PlanEffect, ...pieces: readonly string[]): string => `${e.id.padEnd(wide)}${joined(pieces.filter((p) => p !== ''), room - Math.max(wide, e.id.length), '; ')}`;
  const decided = (e: PlanEffect): string => (e.deciding === undefined ? writing.fill(e.because) : fitting(wordingsOf(e, price(e), writing), room - Math.max(wide, e.id.length)));
  const price = (e: PlanEffect): string => (e.price === undefined ? '' : `; price ${shortPrice(e.price, plan, writing)}`);
  return [
    { label: 'Include', items: sortedBy(of('include'), closeness).map((e) => row(e, decided(e))), least: 6, apart: true },
    { label: 'Check', items: of('borderline').map((e) => row(e, decided(e), e.firstRun === 'leave-out' ? 'first run without it' : 'first run with it', e.check === undefined ? '' : writing.fill(e.check))), least: 3 },
    { label: 'Open', items: of('undecided').map((e) => row(e, (e.missing ?? []).length === 0 ? writing.fill(e.because) : `needs ${oneLine(inputsInWords(e.missing ?? []))}`)), least: 2, warns: true },
    { label: 'Leave out', ...leftOut(plan, sortedBy(of('leave-out'), closeness)), least: 2 },
  ];
}

/** From the fullest to the shortest: the price stays longest, then the margin; one in kelvins, which is long, goes before its price. */
function wordingsOf(e: PlanEffect, price: string, writing: Writing): string[] {
  const full = decidingText(e, writing);
  const plain = decidingText(e, writing, { spread: false });
  return [`${full}${price}`, `${plain}${price}`, `${decidingText(e, writing, { spread: false, limit: false })}${price}`, ...(price === '' || e.deciding?.marginKind !== 'difference' ? [] : [`${decidingText(e, writing, { spread: false, bare: true })}${price}`]), full, plain];
}

/** The price without the name of the target where there is one target alone, else with its symbol. */
const shortPrice = (price: NonNullable<PlanEffect['price']>, plan: Plan, writing: Writing): string => {
  const of = pricedOf(price, plan);
  return plan.targets.length === 1 && plan.targets[0]?.quantity === of ? priceText(price, of).replace(/ of \S+$/, '') : priceText(price, writing.symbol(of));
};

/** Effects nearest to their limit first: these are the ones to look at. */
const closeness = (e: PlanEffect): number => e.deciding?.margin ?? Infinity;
const sortedBy = <T>(items: readonly T[], by: (item: T) => number): T[] => [...items].sort((a, b) => by(a) - by(b) || 0);

/** Items with the number of things in each. */
type Packed = Pick<Part, 'items'> & { readonly counts: readonly number[] };

function leftOut(plan: Plan, effects: readonly PlanEffect[]): Packed {
  const absent = plan.effects.filter((e) => e.applies === false).length;
  const byHand = plan.effects.filter((e) => !e.judged).map((e) => e.id);
  const { items, counts } = packed(effects.map((e) => (factorText(e) === '' ? e.id : `${e.id} ${factorText(e)}`)));
  const others = [...(absent === 0 ? [] : [`${absent} effects cannot occur here`]), ...(byHand.length === 0 ? [] : [`to judge by hand: ${byHand.join(', ')}`])];
  return others.length === 0 ? { items, counts } : { items: [cut(others.join('; '), room), ...items], counts: [1, ...counts] };
}

/** Short texts packed into lines, separated by commas. */
function packed(texts: readonly string[]): Packed {
  const items: string[] = [];
  const counts: number[] = [];
  for (const [i, text] of texts.entries()) {
    const piece = i === texts.length - 1 ? text : `${text},`;
    const last = items.length - 1;
    const longer = `${items[last] ?? ''} ${piece}`;
    if (last >= 0 && longer.length <= room) {
      items[last] = longer;
      counts[last] = (counts[last] ?? 0) + 1;
    } else {
      items.push(cut(piece, room));
      counts.push(1);
    }
  }
  return { items, counts };
}

function choiceItems(plan: Plan): Packed {
  const made = plan.choices.filter((c) => c.applies !== false && c.judged !== false && c.chosen !== 'none');
  const text = (c: PlanChoice): string => `${c.id} ${c.chosen}${c.given === true ? ' (given)' : ''}`;
  const disputed = made.filter((c) => c.advised !== undefined && c.advised !== c.chosen);
  const others = packed(made.filter((c) => !disputed.includes(c)).map(text));
  return { items: [...disputed.map((c) => joined([`${text(c)}, advised is ${c.advised ?? ''}`, oneLine(c.because)], room, ': ')), ...others.items], counts: [...disputed.map(() => 1), ...others.counts] };
}

function rungText(r: Plan['ladder'][number], writing: Writing): string {
  const { atLeast, atMost } = r.limit;
  const bound = (value: number): string => writing.like(r.quantity, value, r.limit.unit);
  const limit = atLeast !== undefined && atMost !== undefined ? `, passes ${bound(atLeast)} .. ${bound(atMost)}` : atMost !== undefined ? `, passes up to ${bound(atMost)}` : atLeast !== undefined ? `, passes from ${bound(atLeast)}` : '';
  const name = r.id.padEnd(25);
  return `${name} ${joined([r.value === undefined ? `no number for these inputs${atMost === undefined ? '' : `, passes within ${percent(atMost).slice(1)}`}` : `${writing.number(r.quantity)}${limit}`, r.value === undefined ? '' : writing.symbol(r.quantity), oneLine(r.changes)], room - name.length - 1, '; ')}`;
}

/** Numbers that a formula gave outside its range. */
function strained(plan: Plan): string[] {
  const ids = [...new Set(Object.values(plan.quantities).flatMap((q) => q.outside ?? []))];
  return ids.length === 0 ? [] : [wrap(`outside the range of their formula, spread doubled: ${ids.join(', ')}`, 2)];
}

function assumed(plan: Plan, writing: Writing): string[] {
  const ids = Object.entries(plan.quantities).filter(([, q]) => q.kind === 'assumed').map(([id]) => id);
  if (ids.length === 0) return [];
  const each = ids.map((id) => `${id} ${writing.number(id)}`);
  return [wrap(`${ids.length} assumed, not given: ${each.join(', ')}`, 2)];
}

function moreItems(file: string, plan: Plan): string[] {
  const name = /^[\w./@%+-]+$/.test(file) ? file : 'FILE';
  const id = plan.quantities['firstCellHeight'] === undefined ? 'ID' : 'firstCellHeight';
  return [joined([`runbrief trace ${name.length > 36 ? 'FILE' : name} ${id}`, 'where it comes from'], room, '   '), 'the same with --full: every section; --into DIR: files; --json: data'];
}
