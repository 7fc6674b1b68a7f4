import { perKinds, verdicts, type Band, type Branch, type EffectExample, type EffectRule, type Facts, type Fixed, type InputBound, type PriceLine, type Said, type Verdict } from './form.ts';
import type { Node } from './json-text.ts';
import { readCondition, readLimit } from './read-condition.ts';
import type { Fields, Reader } from './reader.ts';

const effectKeys = ['effect', 'title', 'applies', 'branches', 'combine', 'otherwise', 'per', 'price', 'exempt', 'bothRegimes', 'then', 'attributes', 'check', 'examples'];
const branchKeys = ['id', 'when', 'deciding', 'leaveOutAt', 'includeAt', 'magnitude', 'smallMatters', 'without', 'bounds', 'verdict', 'judged', 'includeIf', 'leaveOutIf', 'atLeastBorderlineIf', 'atMostBorderlineIf', 'price', 'because', 'source', 'check'];

/** Leaves out the keys whose value is undefined. */
export function given<T extends object>(of: T): { [K in keyof T]: Exclude<T[K], undefined> } {
  return Object.fromEntries(Object.entries(of).filter(([, v]) => v !== undefined)) as { [K in keyof T]: Exclude<T[K], undefined> };
}

/** Reads an effect; what is wrong goes to the reader's problems. */
export function readEffect(reader: Reader, root: Node): EffectRule | undefined {
  const map = reader.fields(root, 'the rule', effectKeys, ['effect', 'title', 'branches', 'examples']);
  if (map === undefined) return undefined;
  const get = (key: string): Node | undefined => map.get(key)?.value;
  const effect = readId(reader, get('effect'), 'the effect') ?? '';
  const branchNodes = reader.list(get('branches'), '"branches"');
  const branches = branchNodes.flatMap((node) => readBranch(reader, node) ?? []);
  const otherwise = readFixed(reader, get('otherwise'), '"otherwise"');
  if (branches.length === branchNodes.length) {
    const worst = get('combine')?.value === 'worst';
    const sure = worst ? branches.some((b) => b.when === undefined) : branches.length > 0 && branches.at(-1)?.when === undefined;
    if (!sure && !map.has('otherwise')) reader.complain(branchNodes.at(-1) ?? root, 'missing-otherwise', `${worst ? 'every' : 'the last'} branch has a condition, so that none may fit: "otherwise" must say what then holds`);
    if (sure && !worst && map.has('otherwise')) reader.complain(map.get('otherwise')?.key as Node, 'idle-otherwise', 'the last branch always fits, so that "otherwise" never counts');
    const early = branches.findIndex((b) => b.when === undefined);
    if (!worst && early >= 0 && early < branches.length - 1) reader.complain(branchNodes[early] as Node, 'hidden-branch', `the branch ${branches[early]?.id ?? ''} always fits and hides those after it`);
  }
  branches.forEach((b, k) => branches.findIndex((other) => other.id === b.id) === k || reader.complain(branchNodes[k] as Node, 'double-id', `the branch ${b.id} stands twice`));
  const rule: EffectRule = {
    effect,
    title: reader.words(get('title'), 'the title') ?? effect,
    branches,
    combine: reader.oneOf(get('combine'), '"combine"', ['first', 'worst'] as const) ?? 'first',
    price: readPrices(reader, get('price')),
    exempt: reader.flag(get('exempt'), '"exempt"') ?? false,
    bothRegimes: reader.flag(get('bothRegimes'), '"bothRegimes"') ?? true,
    // oxlint-disable-next-line unicorn/no-thenable -- the key of rule files and plans; it holds words
    then: readSaid(reader, get('then'), '"then"'),
    attributes: readSaid(reader, get('attributes'), '"attributes"'),
    examples: reader.list(get('examples'), '"examples"').flatMap((node) => readExample(reader, node) ?? []),
    ...given({ applies: readCondition(reader, get('applies'), '"applies"'), otherwise, per: reader.oneOf(get('per'), '"per"', perKinds), check: reader.words(get('check'), '"check"') }),
  };
  if (reader.problems.length === 0) missingExamples(reader, get('examples') ?? root, rule);
  return rule;
}

/** An id: small letters, digits, hyphens. */
export function readId(reader: Reader, node: Node | undefined, what: string): string | undefined {
  const id = reader.words(node, what);
  if (id === undefined || node === undefined) return undefined;
  return /^[a-z][a-z0-9-]{0,59}$/.test(id) ? id : reader.complain(node, 'wrong-id', `"${id.slice(0, 60)}" is no id`, { expected: 'small letters, digits and hyphens' });
}

function readBranch(reader: Reader, node: Node): Branch | undefined {
  const map = reader.fields(node, 'a branch', branchKeys, ['id', 'because', 'source']);
  if (map === undefined) return undefined;
  const get = (key: string): Node | undefined => map.get(key)?.value;
  const id = readId(reader, get('id'), 'the id of a branch') ?? '';
  const name = `branch ${id}`;
  if (id === 'otherwise' || id === 'none') reader.complain(get('id') as Node, 'wrong-id', `${id} is taken: it names what holds where no branch fits`);
  const judged = reader.flag(get('judged'), '"judged"') ?? true;
  const band = map.has('deciding') ? readBand(reader, node, map, name) : undefined;
  if (!map.has('deciding')) {
    for (const key of ['leaveOutAt', 'includeAt', 'magnitude', 'smallMatters', 'without', 'bounds']) if (map.has(key)) reader.complain(map.get(key)?.key as Node, 'idle-key', `"${key}" of ${name} needs a deciding quantity`);
    if (judged && !map.has('verdict')) reader.complain(node, 'missing-key', `${name} has neither a deciding quantity nor a verdict`);
  } else if (map.has('verdict') || map.has('judged')) reader.complain(map.get(map.has('verdict') ? 'verdict' : 'judged')?.key as Node, 'two-deciders', `${name} has a deciding quantity and a verdict of its own`);
  return {
    id, judged,
    price: readPrices(reader, get('price')),
    because: readTemplate(reader, get('because'), `"because" of ${name}`) ?? '',
    source: reader.words(get('source'), `the source of ${name}`) ?? '',
    ...given({
      band,
      verdict: band !== undefined ? undefined : judged ? reader.oneOf(get('verdict'), `the verdict of ${name}`, verdicts) : ('undecided' as const),
      when: readCondition(reader, get('when'), `"when" of ${name}`),
      includeIf: readCondition(reader, get('includeIf'), `"includeIf" of ${name}`),
      leaveOutIf: readCondition(reader, get('leaveOutIf'), `"leaveOutIf" of ${name}`),
      atLeastBorderlineIf: readCondition(reader, get('atLeastBorderlineIf'), `"atLeastBorderlineIf" of ${name}`),
      atMostBorderlineIf: readCondition(reader, get('atMostBorderlineIf'), `"atMostBorderlineIf" of ${name}`),
      check: reader.words(get('check'), `"check" of ${name}`),
    }),
  };
}

function readBand(reader: Reader, node: Node, map: Fields, name: string): Band | undefined {
  const get = (key: string): Node | undefined => map.get(key)?.value;
  for (const key of ['leaveOutAt', 'includeAt']) if (!map.has(key)) reader.complain(node, 'missing-limit', `${name} has no "${key}"`, { expected: 'a number or { "quantity", "times" }' });
  const deciding = reader.quantity(get('deciding'), `the deciding quantity of ${name}`);
  const leaveOutAt = readLimit(reader, get('leaveOutAt'), `"leaveOutAt" of ${name}`);
  const includeAt = readLimit(reader, get('includeAt'), `"includeAt" of ${name}`);
  const said = reader.flag(get('smallMatters'), '"smallMatters"');
  const numbers = typeof leaveOutAt === 'number' && typeof includeAt === 'number';
  if (numbers && said !== undefined) reader.complain(map.get('smallMatters')?.key as Node, 'said-twice', `the limits of ${name} already say which side matters`);
  const withoutMap = map.has('without') ? reader.fields(get('without') as Node, '"without"', ['verdict', 'because'], ['verdict', 'because']) : undefined;
  const verdict = reader.oneOf(withoutMap?.get('verdict')?.value, '"without"', verdicts);
  const because = reader.words(withoutMap?.get('because')?.value, '"because" of "without"');
  const bounds = reader.list(get('bounds'), '"bounds"').flatMap((one) => readBound(reader, one) ?? []);
  if (bounds.length > 3) reader.complain(get('bounds') as Node, 'too-many', 'more than three bounded inputs');
  if (deciding === undefined || leaveOutAt === undefined || includeAt === undefined) return undefined;
  return {
    deciding, leaveOutAt, includeAt, bounds,
    magnitude: reader.flag(get('magnitude'), '"magnitude"') ?? false,
    smallMatters: numbers ? (leaveOutAt) > (includeAt) : (said ?? false),
    ...(verdict === undefined || because === undefined ? {} : { without: { verdict, because } }),
  };
}

function readBound(reader: Reader, node: Node): InputBound | undefined {
  const map = reader.fields(node, 'a bound', ['input', 'from', 'to', 'why'], ['input', 'from', 'to', 'why']);
  const input = reader.fact(map?.get('input')?.value, 'the input of a bound');
  const from = reader.number(map?.get('from')?.value, '"from"');
  const to = reader.number(map?.get('to')?.value, '"to"');
  const why = reader.words(map?.get('why')?.value, '"why"');
  return input === undefined || from === undefined || to === undefined || why === undefined ? undefined : { input, from, to, why };
}

function readFixed(reader: Reader, node: Node | undefined, what: string): Fixed | undefined {
  if (node === undefined) return undefined;
  const map = reader.fields(node, what, ['verdict', 'judged', 'because', 'source', 'check'], ['because']);
  const judged = reader.flag(map?.get('judged')?.value, '"judged"') ?? true;
  if (map !== undefined && map.has('verdict') === map.has('judged')) reader.complain(node, 'missing-key', `${what} has no verdict, or two`, { expected: '"verdict" or "judged": false' });
  const verdict = judged ? reader.oneOf(map?.get('verdict')?.value, `the verdict of ${what}`, verdicts) : ('undecided' as const);
  const because = readTemplate(reader, map?.get('because')?.value, `"because" of ${what}`);
  if (map === undefined || verdict === undefined || because === undefined) return undefined;
  return { verdict, judged, because, ...given({ source: reader.words(map.get('source')?.value, `the source of ${what}`), check: reader.words(map.get('check')?.value, `"check" of ${what}`) }) };
}

function readPrices(reader: Reader, node: Node | undefined): PriceLine[] {
  return reader.list(node, '"price"').flatMap((one) => {
    const map = reader.fields(one, 'a price', ['factor', 'value', 'of', 'when', 'exempt'], ['of']);
    if (map === undefined) return [];
    if (map.has('factor') === map.has('value')) reader.complain(one, 'missing-key', 'a price has no factor and no value, or both', { expected: '"factor" or "value"' });
    const of = reader.quantity(map.get('of')?.value, '"of" of a price');
    const parts = given({
      factor: reader.quantity(map.get('factor')?.value, 'the factor of a price'),
      value: reader.quantity(map.get('value')?.value, 'the value of a price'),
      when: readCondition(reader, map.get('when')?.value, '"when" of a price'),
      exempt: reader.flag(map.get('exempt')?.value, '"exempt"'),
    });
    return of === undefined ? [] : [{ of, ...parts }];
  });
}

/** Text with quantities in braces. */
export function readTemplate(reader: Reader, node: Node | undefined, what: string): string | undefined {
  const text = reader.words(node, what);
  if (text === undefined || node === undefined) return text;
  for (const [, id] of text.matchAll(/\{([^}]*)\}/g)) reader.fact({ ...node, value: id as string }, what);
  return text;
}

function readSaid(reader: Reader, node: Node | undefined, what: string): Said[] {
  return reader.list(node, what).flatMap((one) => {
    if (typeof one.value === 'string') return { say: one.value };
    const map = reader.fields(one, `a line of ${what}`, ['say', 'when'], ['say', 'when']);
    const say = readTemplate(reader, map?.get('say')?.value, `a line of ${what}`);
    const when = readCondition(reader, map?.get('when')?.value, `"when" of a line of ${what}`);
    return say === undefined ? [] : [{ say, ...given({ when }) }];
  });
}

/** The facts of an example: finite numbers and words. */
export function readFacts(reader: Reader, node: Node | undefined): Facts | undefined {
  if (node === undefined) return undefined;
  if (!(node.value instanceof Map)) return reader.complain(node, 'wrong-form', 'the facts of an example are not an object');
  const facts: [string, number | string][] = [];
  for (const [id, { key, value }] of node.value as Fields) {
    if (reader.fact(key, 'an example') === undefined) continue;
    const list = reader.closedList(id);
    if (typeof value.value === 'number' && list === undefined) facts.push([id, value.value]);
    else if (typeof value.value !== 'string' || (list === undefined && reader.knows)) reader.complain(value, 'wrong-kind', `${id} of an example is ${list === undefined ? 'no number' : 'no word'}`);
    else if (list !== undefined && list !== 'any' && !list.includes(value.value)) reader.complain(value, 'unknown-word', `${id} is never "${value.value}"`, { name: value.value, valid: list });
    else facts.push([id, value.value]);
  }
  return Object.fromEntries(facts);
}

function readExample(reader: Reader, node: Node): EffectExample | undefined {
  const map = reader.fields(node, 'an example', ['facts', 'verdict', 'branch', 'applies', 'missing', 'none', 'why'], ['facts', 'verdict']);
  const facts = readFacts(reader, map?.get('facts')?.value);
  const verdict = reader.oneOf(map?.get('verdict')?.value, 'the verdict of an example', verdicts);
  if (map === undefined || facts === undefined || verdict === undefined) return undefined;
  const ids = (key: string): string[] | undefined => (map.has(key) ? reader.list(map.get(key)?.value, `"${key}"`).flatMap((n) => reader.fact(n, `"${key}" of an example`) ?? []) : undefined);
  return { facts, verdict, ...given({ branch: reader.words(map.get('branch')?.value, '"branch"'), applies: reader.flag(map.get('applies')?.value, '"applies"'), missing: ids('missing'), none: ids('none'), why: reader.words(map.get('why')?.value, '"why"') }) };
}

/** Verdicts that a rule can give. */
function possible(rule: EffectRule): Set<Verdict> {
  const out = new Set<Verdict>();
  for (const b of rule.branches) {
    if (b.band === undefined) out.add(b.verdict ?? 'undecided');
    else {
      out.add('include').add('leave-out').add('undecided');
      if (typeof b.band.leaveOutAt !== 'number' || b.band.leaveOutAt !== b.band.includeAt) out.add('borderline');
    }
    if (b.includeIf !== undefined) out.add('include');
    if (b.leaveOutIf !== undefined) out.add('leave-out');
  }
  if (rule.otherwise !== undefined) out.add(rule.otherwise.verdict);
  return out;
}

function missingExamples(reader: Reader, node: Node, rule: EffectRule): void {
  for (const verdict of possible(rule)) {
    if (!rule.examples.some((e) => e.verdict === verdict && e.applies !== false)) reader.complain(node, 'missing-example', `no example shows the verdict ${verdict}, which can occur`);
  }
  if (rule.applies !== undefined && !rule.examples.some((e) => e.applies === false)) reader.complain(node, 'missing-example', 'no example shows where the effect does not apply', { expected: 'one with "applies": false' });
}
