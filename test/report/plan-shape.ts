/** What a Plan looks like: `?` after a key makes it optional, a list holds the shape of its items, `*` stands for any key. */
type Shape = 'text' | 'number' | 'boolean' | readonly (string | number | boolean)[] | { readonly items: Shape } | { readonly any: readonly Shape[] } | { readonly keys: Readonly<Record<string, Shape>> };

const verdict = ['include', 'leave-out', 'borderline', 'undecided'] as const;
const texts: Shape = { items: 'text' };
const price: Shape = { keys: { 'target?': 'text', of: 'text', 'relative?': 'number', 'value?': 'number', 'unit?': 'text', 'signChange?': [true], acts: 'boolean', formula: 'text' } };
const section: Shape = { keys: { lines: { items: { keys: { text: 'text', quantities: texts } } }, tables: { items: { keys: { title: 'text', columns: texts, rows: { items: { items: { any: ['text', { keys: { id: 'text' } }] } } } } } } } };

export const planShape: Shape = { keys: {
  program: 'text', format: [1],
  case: { keys: { file: 'text', title: 'text', sha256: 'text' } },
  targets: { items: { keys: { id: 'text', quantity: 'text', 'place?': 'text', 'mean?': 'text', 'within?': 'text', computed: 'boolean' } } },
  quantities: { keys: { '*': { keys: { symbol: 'text', name: 'text', value: { any: ['number', 'text'] }, unit: 'text', kind: ['given', 'assumed', 'computed', 'decided'], 'at?': 'text', 'low?': 'number', 'high?': 'number', 'coverage?': [0.95], 'range?': { keys: { from: 'number', to: 'number' } }, formula: 'text', needs: texts, source: 'text', withinRange: 'boolean', 'outside?': texts, 'note?': 'text' } } } },
  effects: { items: { keys: { id: 'text', title: 'text', applies: [true, false, 'unknown'], judged: 'boolean', verdict, 'base?': verdict, 'movedBy?': ['range', 'spread', 'price', 'passes'],
    'deciding?': { keys: { quantity: 'text', value: 'number', leaveOutAt: 'number', includeAt: 'number', 'margin?': 'number', 'marginKind?': ['factor', 'difference'], branch: 'text' } },
    because: 'text', 'flipsAt?': { items: { keys: { path: 'text', value: 'number', unit: 'text', verdict } } }, 'price?': price, 'prices?': { items: price }, 'check?': 'text', 'firstRun?': ['keep', 'leave-out'], 'then?': texts, 'missing?': texts, 'sources?': texts } } },
  choices: { items: { keys: { id: 'text', title: 'text', applies: [true, false, 'unknown'], chosen: 'text', 'given?': [true], 'advised?': 'text', because: 'text', rejected: { items: { keys: { option: 'text', because: 'text' } } }, 'check?': 'text', 'sources?': texts } } },
  ladder: { items: { keys: { id: 'text', changes: 'text', quantity: 'text', 'value?': 'number', 'low?': 'number', 'high?': 'number', limit: { keys: { quantity: 'text', 'atLeast?': 'number', 'atMost?': 'number', unit: 'text' } }, ifMissed: 'text' } } },
  sections: { keys: Object.fromEntries('question physics properties domain boundaries turbulence mesh time numerics coupling cost verification ladder watch afterRun documentation cautions'.split(' ').map((name) => [name, section])) },
  checklist: { items: { keys: { id: 'text', stage: 'text', text: 'text', 'limit?': 'text', 'where?': 'text' } } },
  contradictions: { items: { keys: { code: 'text', path: 'text', 'line?': 'number', says: 'text', effect: 'text', cure: 'text' } } },
} };

/** Every place at which a value departs from a shape. */
export function departures(value: unknown, shape: Shape, at = ''): string[] {
  if (shape === 'text') return typeof value === 'string' ? [] : [`${at} is no text`];
  if (shape === 'number') return typeof value === 'number' && Number.isFinite(value) ? [] : [`${at} is no number`];
  if (shape === 'boolean') return typeof value === 'boolean' ? [] : [`${at} is neither true nor false`];
  if (isList(shape)) return shape.includes(value as string) ? [] : [`${at} is ${JSON.stringify(value)}`];
  if ('any' in shape) return shape.any.some((one) => departures(value, one, at).length === 0) ? [] : [`${at} is ${JSON.stringify(value)}`];
  if ('items' in shape) return Array.isArray(value) ? value.flatMap((one, i) => departures(one, shape.items, `${at}[${i}]`)) : [`${at} is no list`];
  if (typeof value !== 'object' || value === null || Array.isArray(value)) return [`${at} is no object`];
  const { keys } = shape;
  const open = keys['*'];
  const unknown = open === undefined ? Object.keys(value).filter((key) => keys[key] === undefined && keys[`${key}?`] === undefined).map((key) => `${at}.${key} is unknown`) : [];
  const absent = Object.keys(keys).filter((key) => key !== '*' && !key.endsWith('?') && !(key in value)).map((key) => `${at}.${key} is missing`);
  return [...unknown, ...absent, ...Object.entries(value).flatMap(([key, one]) => { const of = open ?? keys[key] ?? keys[`${key}?`]; return of === undefined ? [] : departures(one, of, `${at}.${key}`); })];
}

const isList = (shape: Shape): shape is readonly (string | number | boolean)[] => Array.isArray(shape);
