import type { ChoiceRule, Condition, CompiledRules, EffectRule, Limit, PriceLine } from '../decide/index.ts';
import { choiceIds, effectIds, inOrder } from '../decide/index.ts';
import { harmless } from '../problems/index.ts';
import { wrapped } from './wrap.ts';

const signs: Readonly<Record<string, string>> = { equal: 'is', notEqual: 'is not', in: 'is', notIn: 'is not', lessThan: 'below', lessThanInclusive: 'at most', greaterThan: 'above', greaterThanInclusive: 'at least' };

/** A limit in words. */
function limitText(limit: Limit): string {
  return typeof limit === 'number' ? String(limit) : `${limit.times === 1 ? '' : `${limit.times} `}${limit.quantity}`;
}

/** A condition in words. */
function conditionText(condition: Condition, inside = false): string {
  if ('fact' in condition) {
    const { value } = condition;
    const right = typeof value === 'string' ? value : Array.isArray(value) ? value.join(' or ') : limitText(value as Limit);
    return `${condition.fact} ${signs[condition.operator] ?? ''} ${right}`;
  }
  const parts = ('all' in condition ? condition.all : condition.any).map((part) => conditionText(part, true));
  const text = parts.join('all' in condition ? ' and ' : ' or ');
  return inside && parts.length > 1 ? `(${text})` : text;
}

const line = (text: string, indent: number): string[] => [wrapped(harmless(text), ' '.repeat(indent + 2), ' '.repeat(indent))];
const section = (title: string, lines: readonly string[]): string[] => (lines.length === 0 ? [] : ['', title, ...lines]);

function priceText(price: PriceLine): string {
  const when = price.when === undefined ? '' : `, when ${conditionText(price.when)}`;
  return `${price.factor === undefined ? (price.value ?? '') : `1/${price.factor} - 1`} of ${price.of}${when}${price.exempt === true ? ' (printed only)' : ''}`;
}

function limitLine(band: NonNullable<EffectRule['branches'][number]['band']>): string {
  const low = limitText(band.leaveOutAt);
  const high = limitText(band.includeAt);
  const x = band.magnitude ? `|${band.deciding}|` : band.deciding;
  const [below, atLeast] = band.smallMatters ? ['above', 'down to'] : ['below', 'from'];
  return low === high ? `${x}: left out ${below} ${low}, included ${atLeast} ${high}` : `${x}: left out ${below} ${low}, included ${atLeast} ${high}, borderline between`;
}

function branchText(b: EffectRule['branches'][number]): string[] {
  const say = (label: string, c: Condition | undefined): string[] => (c === undefined ? [] : line(`${label} ${conditionText(c)}`, 4));
  return [
    ...line(`${b.id}${b.when === undefined ? '' : `: when ${conditionText(b.when)}`}`, 2),
    ...(b.band === undefined ? line(b.judged ? `verdict: ${b.verdict ?? ''}` : 'not judged yet', 4) : line(limitLine(b.band), 4)),
    ...say('included if', b.includeIf),
    ...say('left out if', b.leaveOutIf),
    ...say('at least borderline if', b.atLeastBorderlineIf),
    ...say('at most borderline if', b.atMostBorderlineIf),
    ...(b.band?.bounds ?? []).flatMap((bound) => line(`not given: ${bound.input} is tried at ${bound.from} and ${bound.to} (${bound.why})`, 4)),
    ...(b.band?.without === undefined ? [] : line(`cannot be had: ${b.band.without.verdict}, ${b.band.without.because}`, 4)),
    ...line(`reason: ${b.because}`, 4),
    ...b.price.flatMap((p) => line(`price: ${priceText(p)}`, 4)),
    ...(b.check === undefined ? [] : line(`check: ${b.check}`, 4)),
    ...line(`source: ${b.source}`, 4),
  ];
}

function exampleText(facts: EffectRule['examples'][number]['facts'], outcome: string, why: string | undefined): string[] {
  const given = Object.entries(facts).map(([id, value]) => `${id} ${typeof value === 'number' ? Number(value.toPrecision(6)) : value}`).join(', ');
  return line(`${outcome}: ${given === '' ? 'nothing known' : given}${why === undefined ? '' : ` (${why})`}`, 2);
}

/**
 * An effect's rule in words, 80 columns.
 *
 * @param rule  the rule
 * @returns     lines joined by newlines
 */
export function effectRuleText(rule: EffectRule): string {
  const reading = rule.combine === 'worst' ? 'The worst of the branches that fit counts' : 'The first branch that fits counts';
  const said = (list: EffectRule['then']): string[] => list.flatMap((t) => line(`- ${t.say}${t.when === undefined ? '' : ` (when ${conditionText(t.when)})`}`, 2));
  return [
    ...line(`${rule.effect}: ${rule.title}`, 0),
    ...section('Applies', line(rule.applies === undefined ? 'always' : `if ${conditionText(rule.applies)}`, 2)),
    ...section(`${reading}${rule.per === undefined ? '' : `, at every ${rule.per}`}`, [
      ...rule.branches.flatMap(branchText),
      ...(rule.otherwise === undefined ? [] : line(`otherwise: ${rule.otherwise.judged ? rule.otherwise.verdict : 'not judged yet'}, ${rule.otherwise.because}`, 2)),
    ]),
    ...section('Price', [...rule.price.flatMap((p) => line(priceText(p), 2)), ...(rule.exempt ? line('exempt: no price moves this verdict', 2) : [])]),
    ...section('The model then needs', said(rule.then)),
    ...section('States beside the verdict', said(rule.attributes)),
    ...(rule.check === undefined ? [] : section('If borderline', line(rule.check, 2))),
    ...section('Examples', rule.examples.flatMap((e) => exampleText(e.facts, e.applies === false ? 'does not apply' : e.verdict, e.why))),
  ].join('\n');
}

/**
 * The rule of a choice in words, 80 columns.
 *
 * @param rule  the rule
 * @returns     lines joined by newlines
 */
export function choiceRuleText(rule: ChoiceRule): string {
  return [
    ...line(`${rule.choice}: ${rule.title} (a choice)`, 0),
    ...section('Applies', line(rule.applies === undefined ? 'always' : `if ${conditionText(rule.applies)}`, 2)),
    ...section('The first that fits is taken', rule.entries.flatMap((e) => [
      ...line(`${typeof e.take === 'string' ? e.take : `what ${e.take.word} says`}: ${e.when === undefined ? 'otherwise' : `when ${conditionText(e.when)}`}`, 2),
      ...(e.needs.length === 0 ? [] : line(`needs: ${e.needs.join(', ')}`, 4)),
      ...line(`reason: ${e.because}`, 4),
      ...(e.check === undefined ? [] : line(`check: ${e.check}`, 4)),
      ...(e.source === undefined ? [] : line(`source: ${e.source}`, 4)),
    ])),
    ...section('Why not', Object.entries(rule.options).flatMap(([option, why]) => line(`${option}: ${why}`, 2))),
    ...section('Sources', rule.sources.flatMap((s) => line(s, 2))),
    ...section('Examples', rule.examples.flatMap((e) => exampleText(e.facts, e.applies === false ? 'does not apply' : e.take, e.why))),
  ].join('\n');
}

/**
 * All decisions by id and title, those without a rule named as such.
 *
 * @param rules  compiled rules
 * @returns      lines joined by newlines
 */
export function rulesListText(rules: CompiledRules): string {
  const list = (title: string, known: readonly string[], of: Readonly<Record<string, { readonly title: string }>>): string[] => {
    const ids = inOrder(Object.keys(of), known);
    const wide = Math.max(...ids.map((id) => id.length)) + 2;
    const missing = ids.filter((id) => of[id] === undefined);
    return [
      title,
      ...ids.flatMap((id) => (of[id] === undefined ? [] : wrapped(harmless(of[id].title), ' '.repeat(wide + 2), `  ${id.padEnd(wide)}`))),
      ...(missing.length === 0 ? [] : line(`no rule yet, left undecided: ${missing.join(', ')}`, 2)),
    ];
  };
  return [...list('Effects: include, leave out, borderline or undecided', effectIds, rules.effects), '', ...list('Choices: one of several options', choiceIds, rules.choices)].join('\n');
}
