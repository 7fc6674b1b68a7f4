import { materialRecords, propertyNames, type Box, type MaterialRecord, type PropertyId } from '../../src/properties/index.ts';
import { ofHandbooks, type Held } from './held.ts';
import { differs } from './literature-differs.ts';
import { worksNamed } from './works-named.ts';

/** A property that a record gives by itself, and where: the rest follows from these. */
interface Declared {
  readonly property: PropertyId;
  readonly boxes: readonly Box[];
}

/** What an equation of state gives on its own; enthalpy, compressibility factor and isentropic exponent follow from these. */
const ofEquation: readonly PropertyId[] = ['density', 'specificHeatCapacity', 'thermalExpansion', 'speedOfSound'];

function declaredOf(record: MaterialRecord): Declared[] {
  const equation = record.thermodynamics === undefined ? [] : ofEquation.map((property): Declared => ({ property, boxes: record.thermodynamics?.ranges ?? [] }));
  // A bound has no value to compare; the saturation temperature is the vapour pressure read the other way.
  const own = Object.entries(record.properties).filter(([property]) => !['boilingFloor', 'freezingCeiling'].includes(property)).filter(([property]) => property !== 'saturationTemperature' || record.properties['vapourPressure'] === undefined);
  return [...equation, ...own.map(([property, entries]): Declared => ({ property: property as PropertyId, boxes: entries.flatMap((entry) => entry.ranges) }))];
}

/** A melting point or a heat of fusion is one value; thirty states of it mean nothing. */
const isSingle = ({ boxes }: Declared): boolean => boxes.every((box) => box.temperature === undefined && box.composition === undefined);

const short = (x: number): string => String(Number(x.toPrecision(4)));
const percent = (share: number): string => (share < 5e-6 ? '0' : `${Number((100 * share).toPrecision(2))} %`);
const listed = (ends: readonly number[]): string => {
  const [low, high] = [Math.min(...ends), Math.max(...ends)];
  return low === high ? short(low) : `${short(low)} to ${short(high)}`;
};

/** Compared and declared temperatures, and shares where the material takes them. */
function span(mine: readonly Held[], boxes: readonly Box[]): string {
  const given = boxes.flatMap(({ temperature }) => temperature ?? []);
  const shares = mine.flatMap(({ share }) => (share === undefined ? [] : 100 * share));
  const wide = boxes.flatMap(({ composition }) => composition ?? []).map((x) => 100 * x);
  return `${listed(mine.map(({ T }) => T))}${given.length === 0 ? '' : ` of ${listed(given)}`}${shares.length === 0 ? '' : `; ${listed(shares)}${wide.length === 0 ? '' : ` of ${listed(wide)}`} %`}`;
}

/** References whose numbers stand in their script from memory. */
const fromMemory = new Set(worksNamed().flatMap(([name, what]) => (what.includes('from memory') ? [name] : [])));
const isFromMemory = (reference: string): boolean => fromMemory.has(reference) || reference.includes('from memory');

function rowsOf(property: PropertyId, mine: readonly Held[], boxes: readonly Box[]): string[] {
  return [...new Set(mine.map(({ reference }) => reference))].map((reference) => {
    const held = mine.filter((one) => one.reference === reference);
    const worst = held.reduce((a, b) => (b.off > a.off ? b : a));
    const apart = held.filter((one) => !(one.off <= one.allowed)).length;
    // Who carries the constants stands in the record.
    const named = reference.replace(/; constants as carried by [^;]*$/, '').replaceAll('|', '/') + (fromMemory.has(reference) ? ' (from memory)' : '');
    return `| ${propertyNames[property]} | ${held.length}${apart === 0 ? '' : `, ${apart} outside`} | ${span(held, boxes)} | ${named} | ${percent(worst.off)}${worst.off < 5e-6 || held.length === 1 ? '' : ` at ${short(worst.T)} K`} | ${percent(worst.declared)} |`;
  });
}

function apartOf(mine: readonly Held[]): string[] {
  const apart = mine.flatMap((one) => (one.off <= one.allowed ? [] : [{ one, reason: differs(one) ?? 'no reason is known' }]));
  return [...new Set(apart.map(({ reason }) => reason))].flatMap((reason) => {
    const { one } = apart.filter((each) => each.reason === reason).reduce((a, b) => (b.one.off > a.one.off ? b : a));
    return ['', `The literature differs: ${propertyNames[one.property]} at ${short(one.T)} K is ${short(one.value)} here and ${short(one.expected)} in ${one.reference} (SI); ${reason}.`];
  });
}

function sectionOf(record: MaterialRecord, mine: readonly Held[]): string[] {
  const declared = declaredOf(record);
  const of = (property: PropertyId): readonly Held[] => mine.filter((one) => one.property === property);
  const derived = [...new Set(mine.map(({ property }) => property))].filter((property) => !declared.some((one) => one.property === property));
  const rows = [...declared, ...derived.map((property): Declared => ({ property, boxes: [] }))].flatMap(({ property, boxes }) => rowsOf(property, of(property), boxes));
  const missing = declared.filter(({ property }) => of(property).length === 0).map(({ property }) => propertyNames[property]);
  return [
    `## ${record.name}`,
    '',
    ...(rows.length === 0 ? [] : ['| property | states | T [K] compared of declared | against | largest difference | declared there |', '|---|---|---|---|---|---|', ...rows]),
    ...(missing.length === 0 ? [] : [...(rows.length === 0 ? [] : ['']), `Not compared: ${missing.join(', ')}.`]),
    ...apartOf(mine),
    '',
  ];
}

/** Where a heading stands in the page, as readers of Markdown name it. */
const anchor = (name: string): string => name.toLowerCase().replaceAll(/[^\p{L}\p{N} -]/gu, '').replaceAll(' ', '-');

/** One link for each first letter, to the first material of it. */
function letters(records: readonly MaterialRecord[]): string {
  const first = new Map<string, string>();
  for (const { name } of records) {
    const letter = (/\p{L}/u.exec(name)?.[0] ?? name[0] ?? '').toUpperCase();
    const sorts = /^\d/.test(name) ? '0-9' : letter;
    if (!first.has(sorts)) first.set(sorts, name);
  }
  return [...first].map(([letter, name]) => `[${letter}](#${anchor(name)})`).join(' ');
}

/** So many of so many, as one table. */
function summary(records: readonly MaterialRecord[], all: readonly Held[]): string[] {
  const counts = new Map<string, { states: number; works: number; printed: number }>();
  for (const { material, property, by, reference } of all) {
    const key = `${material}|${property}`;
    const before = counts.get(key) ?? { states: 0, works: 0, printed: 0 };
    counts.set(key, { states: before.states + 1, works: before.works + (by === 'program' ? 0 : 1), printed: before.printed + (isFromMemory(reference) ? 0 : 1) });
  }
  const lines = (['fluid', 'solid'] as const).map((kind) => {
    const mine = records.filter((record) => record.kind === kind);
    const pairs = mine.flatMap((record) => declaredOf(record).map((one) => ({ single: isSingle(one), ...(counts.get(`${record.name}|${one.property}`) ?? { states: 0, works: 0, printed: 0 }) })));
    const curves = pairs.filter(({ single }) => !single);
    const values = pairs.filter(({ single }) => single);
    const count = (list: typeof pairs, what: (one: (typeof pairs)[number]) => boolean): number => list.filter(what).length;
    return `| ${kind}s | ${mine.filter((record) => all.some((one) => one.material === record.name)).length} of ${mine.length} | ${curves.length} | ${count(curves, (one) => one.states >= 30)} | ${count(curves, (one) => one.states > 0 && one.states < 30)} | ${count(curves, (one) => one.states > 0 && one.works === 0)} | ${count(curves, (one) => one.states > 0 && one.printed === 0)} | ${count(curves, (one) => one.states === 0)} | ${count(values, (one) => one.states > 0)} of ${values.length} |`;
  });
  const inside = all.filter((one) => one.off <= one.declared).length;
  const allowed = all.filter((one) => one.off <= one.allowed).length;
  const share = (n: number): string => `${(Math.floor((1e4 * n) / all.length) / 100).toFixed(2)} %`;
  return [
    '| | materials compared | properties | at 30 states or more | at 1 to 29 | by another program of the same equation alone | by works from memory alone | not compared | single values compared |',
    '|---|---|---|---|---|---|---|---|---|',
    ...lines,
    '',
    `${all.length} values are held: ${share(inside)} lie inside the declared uncertainty alone, ${share(allowed)} where the uncertainty of the reference is allowed as well (handbooks of pure fluids, values named by records); the other ${all.length - allowed} are told with both values and the reason below their table.`,
  ];
}

/**
 * The page of comparisons: for each material and property the states, the works and the largest difference, and what was not compared.
 *
 * @param all  every value held against another program or work
 * @returns    Markdown
 */
export function comparedPage(all: readonly Held[]): string {
  const records = materialRecords().toSorted((a, b) => (a.name.toLowerCase() < b.name.toLowerCase() ? -1 : 1));
  return `${[
    '# What was compared',
    '',
    'Made by test/properties/compared.test.ts from the values it holds the records to; do not edit.',
    '',
    letters(records),
    '',
    ...summary(records, all),
    '',
    'A property counts where a record gives it over temperatures or shares; a melting point or heat of fusion is a single value. Enthalpy, compressibility factor, isentropic exponent and saturation temperature follow from the others. Temperatures and shares stand as compared of declared. The declared uncertainty is that of the state that differs most.',
    '',
    '- CoolProp 8.0.0, iapws 1.5.5 and the values printed by authors: the equation that the record names, evaluated by another; a difference is one of evaluation, or of the choices told.',
    `- Perry (Perry's Chemical Engineers' Handbook, 8th ed.), VDI (VDI Heat Atlas, 2nd ed.), Jasper, Zabransky, TRC: correlations of other works, as chemicals 1.5.2 carries them, for the saturated liquid from 0.45 to 0.85 of the critical temperature and the dilute gas. They are allowed their own uncertainty beside ours: ${Object.entries(ofHandbooks).map(([property, share]) => `${propertyNames[property as PropertyId]} ${percent(share)}`).join(', ')}.`,
    '- Declared uncertainties of pure fluids follow the statements of the authors of the equations, rounded up, from memory, and are wider where two handbooks lie farther off than that, or the only one (scripts/materials/doubts-of-fluids.yaml); for handbook correlations they are no less than the difference of two handbooks.',
    '- Longer names are those of the checks in the records; each check says how close it is held.',
    ...worksNamed().map(([name, what]) => `- ${name}: ${what}`),
    '',
    ...records.flatMap((record) => sectionOf(record, all.filter(({ material }) => material === record.name))),
  ].join('\n').trimEnd()}\n`;
}
