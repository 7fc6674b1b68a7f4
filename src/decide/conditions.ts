import type { FactSource } from './facts.ts';
import type { Condition, Leaf, Limit } from './form.ts';

/** False, true, or not known. */
export type Truth = 0 | 1 | 2;
/** A condition made ready. `gate`: a number that no input could give counts as false, as in `when`, not as unknown. */
export type Test = (facts: FactSource, gate: boolean) => Truth;

const always: Test = () => 1;
const ready = new WeakMap<object, Test>();

/** The test of a condition, made once. No condition always holds. */
export function testOf(condition: Condition | undefined): Test {
  if (condition === undefined) return always;
  let test = ready.get(condition);
  if (test === undefined) ready.set(condition, (test = make(condition)));
  return test;
}

function make(condition: Condition): Test {
  if ('fact' in condition) return makeLeaf(condition);
  const all = 'all' in condition;
  const parts = (all ? condition.all : condition.any).map(testOf);
  const settles: Truth = all ? 0 : 1;
  return (facts, gate) => {
    let open = false;
    for (const part of parts) {
      const truth = part(facts, gate);
      if (truth === settles) return settles;
      if (truth === 2) open = true;
    }
    return open ? 2 : all ? 1 : 0;
  };
}

function makeLeaf(leaf: Leaf): Test {
  const { fact, value } = leaf;
  const compare = comparisons[leaf.operator];
  const scaled = typeof value === 'object' && 'quantity' in value ? value : undefined;
  return (facts, gate) => {
    const left = facts.of(fact);
    if (left === undefined) return gate && !facts.askable(fact) ? 0 : 2;
    if (scaled === undefined) return compare(left, value as Value) ? 1 : 0;
    const right = numberOf(scaled, facts);
    if (right === undefined) return gate && !facts.askable(scaled.quantity) ? 0 : 2;
    return compare(left, right) ? 1 : 0;
  };
}

type Value = number | string | readonly string[];
type Compare = (left: number | string, right: Value) => boolean;
/** Numbers only: words are never put in order. */
const ordered = (compare: (l: number, r: number) => boolean): Compare => (l, r) => typeof l === 'number' && typeof r === 'number' && compare(l, r);

const comparisons: Readonly<Record<Leaf['operator'], Compare>> = {
  equal: (l, r) => l === r,
  notEqual: (l, r) => l !== r,
  in: (l, r) => (r as readonly string[]).includes(l as string),
  notIn: (l, r) => !(r as readonly string[]).includes(l as string),
  lessThan: ordered((l, r) => l < r),
  lessThanInclusive: ordered((l, r) => l <= r),
  greaterThan: ordered((l, r) => l > r),
  greaterThanInclusive: ordered((l, r) => l >= r),
};

/** The number of a limit, or undefined where its quantity is not known. */
export function numberOf(limit: Limit, facts: FactSource): number | undefined {
  if (typeof limit === 'number') return limit;
  const of = facts.of(limit.quantity);
  return typeof of === 'number' ? of * limit.times : undefined;
}

/** The leaves of a condition. */
export function leavesOf(condition: Condition | undefined): readonly Leaf[] {
  if (condition === undefined) return [];
  if ('fact' in condition) return [condition];
  return ('all' in condition ? condition.all : condition.any).flatMap(leavesOf);
}

/** The facts for want of which a condition cannot be told. */
export function unknownOf(condition: Condition | undefined, facts: FactSource, gate: boolean): string[] {
  if (condition === undefined || testOf(condition)(facts, gate) !== 2) return [];
  if (!('fact' in condition)) return ('all' in condition ? condition.all : condition.any).flatMap((part) => unknownOf(part, facts, gate));
  if (facts.of(condition.fact) === undefined) return [condition.fact];
  return [(condition.value as { quantity: string }).quantity];
}

/** Why a condition is false: what its false leaves say. */
export function whyFalse(condition: Condition, facts: FactSource): string[] {
  if (testOf(condition)(facts, false) !== 0) return [];
  if (!('fact' in condition)) return ('all' in condition ? condition.all : condition.any).flatMap((part) => whyFalse(part, facts));
  return [condition.else ?? inWords(condition, facts)];
}

const signs = { equal: 'is', notEqual: 'is', in: 'is', notIn: 'is', lessThan: 'is not below', lessThanInclusive: 'is above', greaterThan: 'is not above', greaterThanInclusive: 'is below' } as const;

function inWords(leaf: Leaf, facts: FactSource): string {
  const { fact, operator, value } = leaf;
  if (typeof facts.of(fact) === 'string') return `${fact} is ${facts.of(fact)}`;
  const right = typeof value !== 'object' ? value : 'quantity' in value ? (numberOf(value, facts) ?? value.quantity) : value.join(' or ');
  return `${fact} ${operator === 'equal' ? 'is not' : signs[operator]} ${right}`;
}
