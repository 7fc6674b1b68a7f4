import { nearestName, Problem } from '../problems/index.ts';
import { dimensionOf, readQuantity, sameDimension, type Quantity } from '../units/index.ts';
import type { Phase } from './record.ts';
import type { Component } from './mixture.ts';
import type { StateText } from './state.ts';

/** A state text with its ranges: what `--over` takes. */
export interface StateRange extends StateText {
  /** From and to [SI] of what runs over a range. */
  readonly over: { readonly of: 'temperature' | 'pressure' | 'humidity' | 'composition'; readonly from: number; readonly to: number } | undefined;
  /** What the text left open, such as absolute pressure. */
  readonly assumed: readonly string[];
}

const saturated: { readonly [words: string]: 'liquid' | 'vapour' } = {
  'saturated liquid': 'liquid',
  'boiling liquid': 'liquid',
  'saturated vapour': 'vapour',
  'saturated vapor': 'vapour',
  'saturated steam': 'vapour',
  'dry saturated vapour': 'vapour',
};
const phases: { readonly [word: string]: Phase } = { liquid: 'liquid', vapour: 'vapour', vapor: 'vapour', gas: 'gas', solid: 'solid', supercritical: 'supercritical' };
const shown = 'for example "60 degC, 2 bar", "60 degC, saturated liquid", "20 degC, 1 atm, humidity 60 %"';

interface Part {
  readonly text: string;
  readonly at: number;
}

/** Parts between commas, with their place in the text. */
function partsOf(text: string): Part[] {
  let at = 0;
  return text.split(',').map((piece) => {
    const lead = piece.length - piece.trimStart().length;
    const part = { text: piece.trim().replaceAll(/\s+/g, ' '), at: at + lead };
    at += piece.length + 1;
    return part;
  });
}

function fault(part: Part, code: string, message: string, expected: string, nearest?: string): Problem {
  return new Problem({ code, message, expected, ...(nearest === undefined ? {} : { nearest }), at: part.at, length: Math.max(1, part.text.length) });
}

/** Reads with the problem placed in the whole text. */
function read(part: Part, text: string, wanted: Parameters<typeof readQuantity>[1]): Quantity {
  try {
    return readQuantity(text, wanted);
  } catch (error) {
    if (!(error instanceof Problem)) throw error;
    throw new Problem(error.list.map((one) => ({ ...one, at: part.at + part.text.indexOf(text) + (one.at ?? 0) })));
  }
}

const kelvin = dimensionOf('K');

/** Whether a quantity text ends in a unit of temperature. */
function isTemperature(text: string): boolean {
  const last = /([A-Za-z°][A-Za-z°_]*)\s*$/.exec(text)?.[1];
  if (last === undefined) return false;
  if (last === 'C' || last === 'F') return true;
  try {
    return sameDimension(dimensionOf(last), kelvin);
  } catch {
    return false;
  }
}

/** A component of a mixture with its share: `oxygen 21 % mol` or `21 % mol oxygen`. */
function componentIn(text: string): { readonly name: string; readonly share: string } | undefined {
  const after = /^([A-Za-z][A-Za-z0-9 ()-]*?)\s+([\d.]+(?:e-?\d+)?\s*(?:%|ppm).*)$/.exec(text);
  if (after !== null) return { name: after[1] as string, share: after[2] as string };
  const before = /^([\d.]+(?:e-?\d+)?\s*(?:%|ppm)(?:\s*(?:by\s+)?(?:mol|mole|mass|vol|volume)(?=\s))?)\s+(?:of\s+)?([A-Za-z][A-Za-z0-9 ()-]*)$/.exec(text);
  return before === null || /^(?:mol|mole|mass|vol|volume)$/.test(before[2] as string) ? undefined : { name: before[2] as string, share: before[1] as string };
}

/**
 * A state from text: temperature and pressure in any order, or one of them with `saturated liquid` or `saturated vapour`;
 * `humidity 60 %`, `composition 30 % mass` (or `salinity 35 g/kg`), components of a mixture of gases (`oxygen 21 % mol`); a phase (`liquid`, `vapour`). One of the numbers may be a range `20 degC .. 90 degC`.
 *
 * @param text  parts separated by commas
 * @returns     the state as said, in SI, with the range that one part may have; `stateOf` completes it
 * @throws      {Problem} unreadable-state, said-twice, wrong-dimension and the like, with `at` and `length` within the text
 * @example     parseRange('60 degC, 2 bar').temperature // 333.15
 */
export function parseRange(text: string): StateRange {
  const out: { -readonly [key in keyof StateRange]?: StateRange[key] } & { assumed: string[] } = { assumed: [] };
  const components: Component[] = [];
  const put = (part: Part, key: 'temperature' | 'pressure' | 'humidity' | 'composition', found: Quantity): void => {
    if (out[key] !== undefined || out.over?.of === key) throw fault(part, 'said-twice', `the state names its ${key} twice`, `one ${key}`);
    if (found.spread !== undefined) throw fault(part, 'unreadable-state', `"${part.text}": a state has no spread`, shown);
    if (found.range === undefined) out[key] = found.value;
    else if (out.over !== undefined) throw fault(part, 'two-ranges', 'one part of the state may run over a range, not two', shown);
    else out.over = { of: key, from: found.range.from, to: found.range.to };
    out.assumed.push(...found.assumed);
  };
  if (text.length > 300) throw new Problem({ code: 'unreadable-state', message: 'the state is longer than 300 characters', expected: shown });
  for (const part of partsOf(text)) {
    const low = part.text.toLowerCase();
    const named = /^(relative humidity|humidity|composition|salinity)\s+(.*)$/.exec(low);
    const component = named === null ? componentIn(part.text) : undefined;
    if (low === '') throw fault(part, 'unreadable-state', 'the state has an empty part', shown);
    if (saturated[low] !== undefined || phases[low] !== undefined) {
      if (out.saturated !== undefined || out.phase !== undefined) throw fault(part, 'said-twice', 'the state names its phase twice', 'one phase');
      const side = saturated[low];
      const phase = phases[low];
      if (side !== undefined) out.saturated = side;
      if (phase !== undefined) out.phase = phase;
    } else if (named !== null) {
      const key = named[1] === 'composition' || named[1] === 'salinity' ? 'composition' : 'humidity';
      const found = read(part, part.text.slice(part.text.length - (named[2] ?? '').length), { unit: '1', kind: 'fraction', name: key === 'humidity' ? 'relative humidity' : 'share' });
      if (key === 'composition' && found.basis !== undefined && found.basis !== 'mass') throw fault(part, 'wrong-basis', `"${part.text}": the composition is a share by mass here`, 'composition 30 % mass');
      put(part, key, found);
    } else if (component !== undefined) {
      const found = read(part, component.share, { unit: '1', kind: 'fraction', name: `share of ${component.name}` });
      if (found.range !== undefined || found.spread !== undefined) throw fault(part, 'unreadable-state', `"${part.text}": a component has one share`, 'oxygen 21 % mol');
      components.push({ name: component.name, share: found.value, ...(found.basis === undefined ? {} : { basis: found.basis }) });
    } else if (isTemperature(part.text)) put(part, 'temperature', read(part, part.text, { unit: 'K', kind: 'temperature' }));
    else if (/^[-+.\d]/.test(part.text)) put(part, 'pressure', read(part, part.text, { unit: 'Pa', kind: 'pressure' }));
    else {
      const words = [...Object.keys(saturated), ...Object.keys(phases), 'humidity', 'composition'];
      throw fault(part, 'unreadable-state', `"${part.text}" is no part of a state`, shown, nearestName(low, words));
    }
  }
  return { ...out, ...(components.length === 0 ? {} : { components }), over: out.over };
}

/**
 * A state from text, without ranges.
 *
 * @param text  parts separated by commas, as for `parseRange`
 * @returns     the state as said, in SI
 * @throws      {Problem} as `parseRange`, and range-in-state
 * @example     parseState('2 bar, saturated vapour').saturated // 'vapour'
 */
export function parseState(text: string): StateText & { readonly assumed: readonly string[] } {
  const { over, ...state } = parseRange(text);
  if (over !== undefined) throw new Problem({ code: 'range-in-state', message: `the ${over.of} of "${text}" is a range`, expected: 'one state; a range belongs to --over' });
  return state;
}
