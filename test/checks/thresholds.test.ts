import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { bodyTemperature, firstMode } from '../../src/references/body-series.ts';
import { sphereDragStandard } from '../../src/references/sphere-drag.ts';
import { liquidNusseltFactor } from '../../src/quantities/index.ts';
import { numberOf } from '../quantities/effects.harness.ts';
import { entriesOf, expectedOf, inputsOf } from './published.ts';

interface Leaf { readonly fact?: string; readonly value?: unknown; readonly all?: readonly Leaf[]; readonly any?: readonly Leaf[] }
interface Branch extends Readonly<Record<string, unknown>> { readonly id: string; readonly includeIf?: Leaf }
interface Rule { readonly branches: readonly Branch[]; readonly attributes?: readonly { readonly when: Leaf; readonly say: string }[] }
const rule = (path: string): Rule => JSON.parse(readFileSync(new URL(`../../rules/${path}.json`, import.meta.url), 'utf8')) as Rule;

/** A limit as the rule file states it. */
function limit(path: string, branch: string, key: 'leaveOutAt' | 'includeAt'): number {
  const found = rule(path).branches.find((b) => b.id === branch)?.[key];
  if (typeof found !== 'number') throw new Error(`${path}: branch ${branch} has no number ${key}`);
  return found;
}
/** The number that a fact is held against within a condition. */
function against(condition: Leaf | undefined, fact: string): number {
  const leaves = (c: Leaf | undefined): readonly Leaf[] => (c === undefined ? [] : [c, ...[...(c.all ?? []), ...(c.any ?? [])].flatMap(leaves)]);
  const found = leaves(condition).find((l) => l.fact === fact)?.value;
  if (typeof found !== 'number') throw new Error(`${fact} is held against no number`);
  return found;
}
const said = (path: string, words: string): Leaf | undefined => rule(path).attributes?.find((a) => a.say.startsWith(words))?.when;
const exponent = (ratio: number, regime: 'laminar' | 'turbulent'): number => Math.log(liquidNusseltFactor({ ratio, regime })) / Math.log(ratio);
const stream = { flowClass: 'body', imposedFlow: 'yes' };

type Bind = (of: Readonly<Record<string, number>>) => number;
const bound: Readonly<Record<string, Bind>> = {
  'G01-plate-tr': () => numberOf(stream, 'transitionReynolds'),
  'G01-mach': () => limit('density/compressibility', 'band', 'includeAt'),
  'G01-kn-cont': () => limit('fields/rarefaction', rule('fields/rarefaction').branches[0]?.id as string, 'leaveOutAt'),
  'G01-gray-ideal': () => limit('density/real-gas', 'band', 'includeAt'),
  // The temperature difference at which an ideal gas about 15 degC reaches the limit of density change.
  'G01-bous-air': () => {
    const at = limit('density/variable-density', 'band', 'leaveOutAt');
    const change = (dT: number): number => numberOf({ energySolved: 'yes', fluidGiven: 'material', densityHot: 1 / (288.15 + dT / 2), densityCold: 1 / (288.15 - dT / 2) }, 'densityChange');
    let [low, high] = [1, 100];
    for (let k = 0; k < 60; k++) { const middle = (low + high) / 2; if (change(middle) < at) low = middle; else high = middle; }
    return low;
  },
  'G01-ra-turb': () => 8e9 * numberOf({ flowClass: 'body', imposedFlow: 'no', rayleigh: 8e9 }, 'laminarShare') ** 3,
  'G01-ra-cr': () => against(rule('density/buoyancy-driven').attributes?.[0]?.when, 'rayleigh'),
  'G01-na': () => against(rule('heat/viscous-heating').branches.find((b) => b.id === 'thinning')?.includeIf, 'nahme'),
  'G01-st-exp': () => exponent(3, 'laminar'),
  'G01-petukhov-h': () => exponent(3, 'turbulent'),
  'G01-petukhov-c': () => exponent(1 / 3, 'turbulent'),
  'G01-ha-lo': () => limit('reaction/film-reaction', 'hatta', 'leaveOutAt'),
  'G01-optical-thick': () => against(said('heat/participating-radiation', 'optically thick'), 'opticalThickness'),
  'G02-bi-err': (of) => 1 / Math.cos(firstMode('slab', of['Bi'] as number).lambda),
  'G02-fo-err': (of) => { const [bi, fo] = [of['Bi'] as number, of['Fo'] as number]; const { lambda, coefficient } = firstMode('slab', bi); return Math.abs((coefficient * Math.exp(-(lambda ** 2) * fo)) / bodyTemperature('slab', bi, fo, 0) - 1); },
  'G02-stokes-err': (of) => 1 - 24 / (of['Re'] as number) / sphereDragStandard(of['Re'] as number),
  'G02-bous-air-b': (of) => numberOf({ energySolved: 'yes', fluidGiven: 'constants', thermalExpansion: 1 / (of['T'] as number), highestTemperature: (of['T'] as number) + (of['dT'] as number) / 2, lowestTemperature: (of['T'] as number) - (of['dT'] as number) / 2 }, 'densityChange'),
  'G02-wall-biot': (of) => 1 / numberOf({ wallKind: 'coefficient', wallResistance: (of['dw'] as number) / (of['kw'] as number), innerResistance: (of['D'] as number) / (of['kf'] as number), outerResistance: 0 }, 'biotWall'),
  'G02-axial-wall': (of) => numberOf({ flowClass: 'internal', wallAxialConductance: (of['kw'] as number) * (of['Aw'] as number), flowLength: of['L'] as number, massFlow: of['m'] as number, specificHeatCapacityBulk: of['cp'] as number, parallelPassages: 1 }, 'wallAxialRatio'),
  'G02-mfp': (of) => numberOf({ medium: 'gas', viscosity: of['mu'] as number, pressure: of['p'] as number, molarMass: of['M'] as number, referenceTemperature: of['T'] as number }, 'meanFreePath'),
};

const flows = 'held among the numbers that the flows give';
const particles = 'particles and drops are not judged yet';
const walls = 'a number of wall laws, held among those';
/** Thresholds that no limit or factor of the rules corresponds to, with the reason. */
const left: Readonly<Record<string, string>> = {
  'G01-pipe-lam': flows, 'G01-pipe-turb': flows, 'G01-lt-T': flows, 'G01-lt-H': flows, 'G01-cyl-3d': flows,
  'G01-pipe-gniel': 'the law for heat between the regimes ends at 4000 here; 1e4 is where other authors end theirs',
  'G01-sphere-crisis': 'no decision turns on the drag crisis; the drag curve ends there',
  'G01-creep': 'no decision turns on it; its consequence is held as G02-stokes-err',
  'G01-fo-one': 'no decision turns on it: the series is summed; its consequence is held as G02-fo-err',
  'G01-ta-cr': 'turning cylinders are not built',
  'G01-dean-cr': 'vortices of a narrow curved channel; the decision on curved pipes uses De 11.6',
  'G01-petukhov-sc': 'supercritical tubes are not covered by a rule',
  'G01-elg-1': particles, 'G01-elg-2': particles, 'G01-stk': particles, 'G01-oh-break': particles,
  'G01-lt': 'the rounded coefficient of textbooks; the values for 5 % are used',
  'G01-lturb': 'the turbulent entrance follows a law of the Reynolds number, not one number',
  'G01-vd-A': walls, 'G01-kappa-lm': walls, 'G01-visc-sub': walls, 'G01-log-hi': walls,
  'G01-rough-smooth': 'the rule begins at 2.25, the lowest number in use: at 5 sand grains already add 2 % to friction',
  'G01-rough-full': 'the rule includes roughness from 10 on, long before the wall is fully rough',
  'G01-pope-les': 'a check of a run, not a limit of a rule on effects',
  'G01-cfl-exp': 'a limit of the time step, not of a rule on effects',
  'G01-wo-hi': 'the rule includes imposed unsteadiness from 1 on, long before the profile is a plug',
  'G01-thiele-lo': 'the rule leaves pore diffusion out below 0.3: at 0.4 a sphere has lost 8 % of its rate already',
  'G01-thiele-hi': 'no verdict turns on it: the rule includes pore diffusion from 0.6 on and calls it strong from 3',
  'G01-ha-hi': 'no verdict turns on it: the rule includes the reaction from 0.6 on and calls it fast above 3',
  'G01-mr-lam': 'fluids of other rheology are not judged yet',
  'G01-curvature': 'a limit of the cylinder in still fluid, held by that flow',
  'G01-forch': 'porous layers are judged on the permeability, not on the particle',
  'G02-pe-liq': 'an exponential of the Peclet number that no quantity carries; the rule decides on the Peclet number itself',
};

describe.each(['G01_thresholds', 'G02_threshold_consequences'])('%s', (topic) => {
  const entries = entriesOf(topic);
  const own = (ids: Readonly<Record<string, unknown>>): string[] => Object.keys(ids).filter((id) => id.startsWith(topic.slice(0, 3)));
  it('has every entry held or left out with its reason, and no other', () => {
    expect(entries.map((e) => e.id).filter((id) => (bound[id] === undefined) === (left[id] === undefined))).toEqual([]);
    expect([...own(bound), ...own(left)].filter((id) => !entries.some((e) => e.id === id))).toEqual([]);
    for (const because of Object.values(left)) expect(because.length).toBeGreaterThan(20);
  });
  it.each(entries.filter((e) => bound[e.id] !== undefined))('$id $quantity', (entry) => {
    const { value, allowed } = expectedOf(entry);
    const got = (bound[entry.id] as Bind)(inputsOf(entry));
    expect(Math.abs(got - value), `${got} against ${value}`).toBeLessThanOrEqual(allowed);
  });
});
