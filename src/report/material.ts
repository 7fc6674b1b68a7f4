import { boxText, emissivities, propertyNames, propertyUnits, type PropertyId, type PropertySheet, type PropertyTable, type PropertyValue } from '../properties/index.ts';
import { fromSI, numberParts } from '../units/index.ts';
import { wrapped } from './wrap.ts';

/** A number with as many digits as its uncertainty bears. */
function shown(id: PropertyId, value: PropertyValue): { readonly number: string; readonly spread: string } {
  const unit = propertyUnits[id];
  const half = Math.abs(value.value) * value.uncertainty;
  const { number, unit: name } = numberParts({ value: value.value, unit, half, ...(unit === 'K' ? { difference: true } : {}) });
  return { number: `${number}${name === '' ? '' : ` ${name}`}`, spread: `+/- ${Number((value.uncertainty * 100).toPrecision(2))} %` };
}

/** A state as a line: `60 degC (333.15 K), 2 bar abs`. */
function stateText({ state }: Pick<PropertySheet, 'state'>): string {
  const share = (x: number): string => `${Number((x * 100).toPrecision(4))} %`;
  return [
    `${Number(fromSI(state.temperature, 'degC').toFixed(3))} degC (${Number(state.temperature.toFixed(3))} K)`,
    `${Number(fromSI(state.pressure, 'bar').toPrecision(6))} bar abs`,
    ...(state.humidity === undefined ? [] : [`relative humidity ${share(state.humidity)}`]),
    ...(state.composition === undefined ? [] : [`composition ${share(state.composition)} by mass`]),
  ].join(', ');
}

/**
 * The screen of `material`: every property with spread, then where each comes from and the range in which it holds.
 *
 * @param sheet  the properties at one state
 * @returns      text without a last newline, at most 80 columns wide
 */
export function materialText(sheet: PropertySheet): string {
  const sources: string[] = [];
  const note = (value: PropertyValue): number => {
    const text = `${value.source}. Range: ${boxText(value.range)}${value.notes === undefined || value.notes.startsWith('surface') ? '' : `. Note: ${value.notes}`}`;
    const at = sources.indexOf(text);
    return at < 0 ? sources.push(text) : at + 1;
  };
  const marks = new Map<PropertyId, string>();
  const row = (name: string, id: PropertyId, value: PropertyValue): string => {
    const { number, spread } = shown(id, value);
    const mark = value.of === undefined ? String(note(value)) : [...new Set(value.of.map((one) => marks.get(one) ?? ''))].join(' ');
    marks.set(id, mark);
    return `  ${name.padEnd(36)} ${number.padEnd(16)} ${spread.padEnd(11)} ${value.withinRange ? ' ' : '!'} ${mark}`;
  };
  const rows = sheet.properties.flatMap(({ id, value }) => (id === 'emissivity' ? [] : [row(propertyNames[id], id, value)]));
  rows.push(...emissivities(sheet.material, sheet.state.temperature).map((value) => row(`emissivity, ${(value.notes ?? '').replace('surface: ', '')}`, 'emissivity', value)));
  const about = sheet.material.record.about;
  return [
    wrapped(`${sheet.material.name}, ${sheet.phase}, at ${stateText(sheet)}`, '  ', ''),
    ...(about === undefined ? [] : [wrapped(about, '  ')]),
    '',
    ...rows,
    ...(sheet.flags.length === 0 ? [] : ['', ...sheet.flags.map((flag) => wrapped(flag, '    ', '  ! '))]),
    '',
    ...sources.map((text, i) => wrapped(text, '     ', `  ${i + 1}${i < 9 ? '  ' : ' '}`)),
    '',
    '  Spreads are 95 % half-widths of the correlation.',
  ].join('\n');
}

/**
 * The document of `material --json`.
 *
 * @param sheet  the properties at one state
 * @returns      material, state, properties with value, unit, uncertainty, source, withinRange, range; numbers in SI
 */
export function materialDocument(sheet: PropertySheet): object {
  const { humidity, composition, temperature, pressure } = sheet.state;
  return {
    material: sheet.material.name,
    state: { temperature, pressure, phase: sheet.phase, ...(humidity === undefined ? {} : { humidity }), ...(composition === undefined ? {} : { composition }) },
    properties: Object.fromEntries(sheet.properties.map(({ id, value }) => [id, { value: value.value, unit: propertyUnits[id], uncertainty: value.uncertainty, source: value.source, withinRange: value.withinRange, range: value.range }])),
  };
}

const columns = (table: PropertyTable): readonly PropertyId[] => table.properties.filter((id) => id !== 'molarMass' && id !== 'enthalpy');

/**
 * A property table as CSV: header cells `name [unit]`, numbers in SI with seven digits, empty where a property does not exist; the last cell names the properties that are carried beyond their range.
 *
 * @param table  rows over a range
 * @returns      lines joined by newlines, without a last newline
 */
export function materialCsv(table: PropertyTable): string {
  const ids = columns(table);
  const digits = (x: number | undefined): string => (x === undefined ? '' : String(Number(x.toPrecision(7))));
  const head = ['temperature [K]', 'pressure [Pa]', 'phase', ...ids.map((id) => `${id} [${propertyUnits[id]}]`), 'beyond range'];
  return [head, ...table.rows.map((row) => [digits(row.state.temperature), digits(row.state.pressure), row.phase, ...ids.map((id) => digits(row.values[id]?.value)), ids.filter((id) => row.values[id]?.withinRange === false).join(' ')])].map((cells) => cells.join(',')).join('\n');
}

const few: readonly PropertyId[] = ['density', 'viscosity', 'thermalConductivity', 'specificHeatCapacity', 'prandtl'];

/**
 * A property table on the screen: the five properties asked for most; the CSV has all.
 *
 * @param name   of the material
 * @param table  rows over a range
 * @returns      text without a last newline, at most 80 columns wide
 */
export function materialTableText(name: string, table: PropertyTable): string {
  const ids = few.filter((id) => table.properties.includes(id));
  const cell = (text: string): string => text.padStart(12);
  const heads: { readonly [id: string]: string } = { density: 'rho kg/m^3', viscosity: 'mu Pa s', thermalConductivity: 'k W/(m K)', specificHeatCapacity: 'cp J/(kg K)', prandtl: 'Pr' };
  const lines = table.rows.map((row) => `${fromSI(row.state.temperature, 'degC').toFixed(2).padStart(9)}${fromSI(row.state.pressure, 'bar').toPrecision(4).padStart(10)}${ids.map((id) => cell(row.values[id] === undefined ? '-' : String(Number(row.values[id].value.toPrecision(4))))).join('')}`);
  return [name, `${'degC'.padStart(9)}${'bar abs'.padStart(10)}${ids.map((id) => cell(heads[id] ?? id)).join('')}`, ...lines, ...table.notes.map((text) => wrapped(text, '    ', '  ! ')), '', '  All properties as CSV: --table'].join('\n');
}

/**
 * The document of `material --over --json`.
 *
 * @param name   of the material
 * @param table  rows over a range
 * @returns      material, rows of state and values in SI, notes
 */
export function materialTableDocument(name: string, table: PropertyTable): object {
  const rows = table.rows.map(({ state, phase, values }) => ({ state: { temperature: state.temperature, pressure: state.pressure, phase }, properties: Object.fromEntries(Object.entries(values).map(([id, value]) => [id, { value: value.value, unit: propertyUnits[id as PropertyId], uncertainty: value.uncertainty, withinRange: value.withinRange }])) }));
  return { material: name, rows, notes: table.notes };
}
