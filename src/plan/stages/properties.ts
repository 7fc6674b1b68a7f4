import { Problem } from '../../problems/index.ts';
import { boxText, propertyAt, type PropertyId, type PropertyValue } from '../../properties/index.ts';
import { stepOf } from '../../workings/index.ts';
import { lines, type Ground, type StageResult } from '../ground.ts';
import { inWords, listed, nameOf, percent } from '../say.ts';
import { targetSpreads } from '../target-spread.ts';
import type { Cell, Line, Table } from '../types.ts';
import { carriedTables } from './properties-species.ts';

/** A property that follows the temperature, and the effect that decides whether it may be held constant. */
const laws = [
  { id: 'density', effect: 'variable-density', always: true },
  { id: 'viscosity', effect: 'variable-viscosity', always: true },
  { id: 'thermalConductivity', effect: 'variable-conductivity', always: false },
  { id: 'specificHeatCapacity', effect: 'variable-heat-capacity', always: false },
  { id: 'thermalExpansion', effect: 'nonlinear-density', always: false },
] as const;
const derived = ['kinematicViscosity', 'thermalDiffusivity', 'prandtl'];
const others = { gas: ['molarMass', 'gasConstant', 'isentropicExponent', 'speedOfSound', 'compressibilityFactor', 'meanFreePath'], liquid: ['saturationTemperature', 'vapourPressure', 'meltingTemperature', 'surfaceTension', 'speedOfSound'] } as const;

/** Every property at its state, with source, uncertainty and range, and whether it may be held constant. */
export function properties(on: Ground): StageResult {
  return { lines: [...stateLines(on), ...variation(on), ...exponents(on), ...effectOnTarget(on), ...phaseLines(on)], tables: numbered([stateTable(on), ...otherTable(on), ...wallTable(on), ...carriedTables(on)]) };
}

/** Sources set below by number, each once: beside the values they would make a narrow column of many lines. */
function numbered(tables: readonly Table[]): Table[] {
  const sources: string[] = [];
  const numberOf = (text: string): string => {
    const parts = text.split('; ');
    // What follows from others has theirs.
    if (parts.length > 1 && parts.every((part) => sources.includes(part))) return parts.map((part) => sources.indexOf(part) + 1).sort((a, b) => a - b).join(' ');
    if (text !== '' && !sources.includes(text)) sources.push(text);
    return text === '' ? '' : String(sources.indexOf(text) + 1);
  };
  const out = tables.map((table) => {
    const at = table.columns.indexOf('source');
    return at < 0 ? table : { ...table, rows: table.rows.map((row) => row.map((cell, k) => (k === at && typeof cell === 'string' ? numberOf(cell) : cell))) };
  });
  return sources.length === 0 ? out : [...out, { title: 'Sources of these properties', columns: ['number', 'source'], rows: sources.map((text, i) => [String(i + 1), text]) }];
}

const heated = (on: Ground): boolean => on.word('energySolved') === 'yes';
const wanted = (on: Ground): (typeof laws)[number][] => laws.filter((p) => on.has(p.id) && (p.always || heated(on)));

function stateLines(on: Ground): Line[] {
  const { workings, fluid } = on.assembled;
  const how = stepOf(workings, 'referenceTemperature');
  const what = fluid === undefined ? 'a fluid of given constants' : `${fluid.name}, ${on.word('medium') ?? 'phase unknown'}`;
  return lines(
    how === undefined
      ? `Properties are those of ${what}; no temperature is given, so they hold at the state that the case names.`
      : `The fluid is ${what}. Plain numbers hold at {referenceTemperature} and {pressure} absolute (${how.formula}: ${how.source})${on.has('bulkTemperature') && on.number('bulkTemperature') !== on.number('referenceTemperature') ? `; laws of friction and heat transfer take {bulkTemperature} in the bulk${on.has('wallTemperature') ? ' and {wallTemperature} at the wall' : ''}` : ''}.`,
    on.word('fluidGiven') === 'constants' && 'The fluid is given by numbers alone: they count as constant, and what needs a property that is not given cannot be judged.',
  );
}

/** Constant or variable, by number. */
function variation(on: Ground): Line[] {
  if (!heated(on) || on.number('highestTemperature') === on.number('lowestTemperature')) return lines(on.has('referenceTemperature') && 'One temperature holds throughout: every property may be typed as the constant of the table.');
  const constant = wanted(on).filter((p) => on.effect(p.effect)?.verdict === 'leave-out').map((p) => nameOf(on, p.id));
  const variable = wanted(on).filter((p) => on.kept(p.effect)).map((p) => nameOf(on, p.id));
  return lines(
    `Between {lowestTemperature} and {highestTemperature} ${variable.length === 0 ? 'every property may be held constant by its limit' : `${listed(variable)} must follow the temperature, as a table or fit over this span held constant beyond its ends, with the cells that reach an end counted`}${constant.length > 0 && variable.length > 0 ? `; ${listed(constant)} may be held constant` : ''}.`,
  );
}

function effectOnTarget(on: Ground): Line[] {
  return targetSpreads(on.assembled).flatMap(({ quantity, from }) => {
    const parts = from.filter((f) => f.kind === 'property' && f.share >= 0.01).slice(0, 3);
    return lines(parts.length > 0
      ? `Of the squared spread of the ${nameOf(on, quantity)} ${listed(parts.map((f) => `${percent(f.share)} comes from the ${nameOf(on, f.label)}`))} of the fluid.`
      : from.some((f) => f.kind === 'property') && `No property of the fluid adds 1 % or more to the squared spread of the ${nameOf(on, quantity)}: better property data would not help.`);
  });
}

/** How each target follows the properties. */
function exponents(on: Ground): Line[] {
  return on.assembled.targets.flatMap(({ id, quantity, computed }) => {
    const followed = laws.filter((p) => on.has(`${id}.per.${p.id}`) && Math.abs(on.number(`${id}.per.${p.id}`) ?? 0) >= 5e-4);
    if (!computed || followed.length === 0) return [];
    const kelvin = on.assembled.workings.slots[on.assembled.workings.index.get(quantity) ?? -1]?.node.about.unit === 'K';
    return lines(kelvin
      ? `One per cent more moves the ${nameOf(on, quantity)} by ${listed(followed.map((p) => `{${id}.per.${p.id}} for ${nameOf(on, p.id)}`))}, every state of the property moved together.`
      : `The ${nameOf(on, quantity)} goes with ${listed(followed.map((p) => `${nameOf(on, p.id)} to the power {${id}.per.${p.id}}`))}, every state of the property moved together.`);
  });
}

function phaseLines(on: Ground): Line[] {
  const { phaseFlags } = on.assembled;
  return lines(
    ...phaseFlags.map((flag) => `Phase: ${flag}.`),
    on.word('medium') === 'liquid' && on.has('saturationTemperature') && on.has('highestTemperature') && `The liquid boils at {saturationTemperature} at the lowest pressure {lowestPressure}; its hottest part is {highestTemperature}${on.has('freezingMargin') ? ', its coldest stands {freezingMargin} above freezing' : ''}.`,
  );
}

/** The record at the reference state; undefined where it has none there. */
function recordOf(on: Ground, id: string): PropertyValue | undefined {
  const { fluid, fluidState, case: given } = on.assembled;
  const [temperature, pressure] = [on.number('referenceTemperature'), on.number('pressure')];
  if (fluid === undefined || temperature === undefined || pressure === undefined || given.has(`fluid.${id}`)) return undefined;
  try {
    return propertyAt(fluid, id as PropertyId, { ...fluidState, temperature, pressure });
  } catch (error) {
    // A state on a phase line has no record; the flags of the phase say so.
    if (error instanceof Problem) return undefined;
    throw error;
  }
}

function stateTable(on: Ground): Table {
  const span = heated(on) && on.number('highestTemperature') !== on.number('lowestTemperature');
  const at = (id: string): Cell => (on.has(id) ? { id } : '');
  const from = (id: string): string[] => {
    const record = recordOf(on, id);
    const step = stepOf(on.assembled.workings, id);
    return [record === undefined ? 'none stated' : percent(record.uncertainty), record === undefined ? '' : `${boxText(record.range)}${record.withinRange ? '' : ', beyond it'}`, record?.source ?? step?.source ?? ''];
  };
  const rows = [
    ...wanted(on).map(({ id, effect }): Cell[] => [nameOf(on, id), at(id), ...(span ? [at(`${id}Cold`), at(`${id}Hot`), constancy(on, effect)] : []), ...from(id)]),
    ...derived.filter((id) => on.has(id) && (heated(on) || id === 'kinematicViscosity')).map((id): Cell[] => [nameOf(on, id), at(id), ...(span ? [at(`${id}Cold`), at(`${id}Hot`), 'follows from the others'] : []), ...from(id)]),
  ];
  return { title: `Properties at ${inWords(on, 'referenceTemperature')} and ${inWords(on, 'pressure')}`, columns: ['property', 'value', ...(span ? ['coldest', 'hottest', 'held constant'] : []), 'uncertainty', 'range', 'source'], rows };
}

function constancy(on: Ground, id: string): string {
  const e = on.effect(id);
  if (e === undefined || e.applies === false || e.verdict === 'leave-out') return 'yes';
  return e.verdict === 'include' ? 'no' : on.kept(id) ? `no, ${e.verdict}` : `yes in the first run, ${e.verdict}`;
}

function otherTable(on: Ground): Table[] {
  const medium = on.word('medium');
  const ids = medium === 'gas' || medium === 'liquid' ? others[medium].filter((id) => on.has(id)) : [];
  if (ids.length === 0) return [];
  return [{ title: 'Further properties that decisions rest on', columns: ['property', 'value', 'source'], rows: ids.map((id) => [nameOf(on, id), { id }, stepOf(on.assembled.workings, id)?.source ?? '']) }];
}

/** Wall layers and surfaces, each with how it is known. */
function wallTable(on: Ground): Table[] {
  const { workings, wallMaterials } = on.assembled;
  const rows = [...workings.index.keys()].flatMap((id): Cell[][] => {
    const layer = /^(walls?(?:\.[\w-]+)?)\.layers\.(\d+)\.thermalConductivity$/.exec(id);
    const surface = /^(emissivity|sandGrain)@([^/]+)$/.exec(id);
    const step = layer === null && surface === null ? undefined : stepOf(workings, id);
    if (step === undefined) return [];
    const place = (layer?.[1] ?? surface?.[2]) as string;
    const what = layer === null ? step.name : `conductivity of ${wallMaterials[place]?.[Number(layer[2])]?.name ?? `layer ${Number(layer[2]) + 1}`}`;
    return [[place, what, { id }, step.kind === 'given' || step.source === 'the case' ? 'given' : step.kind === 'assumed' ? 'assumed' : 'handbook', step.source]];
  });
  return rows.length === 0 ? [] : [{ title: 'Walls', columns: ['wall', 'property', 'value', 'known how', 'source'], rows }];
}
