import { describe, expect, it } from 'vitest';
import { flows, type Flow } from '../../src/flows/index.ts';
import { churchillBernstein, churchillChuCylinder, churchillChuPlate, cylinderBubble, laminarPlateFriction, laminarStrouhal, levelPlateStable, meanPlateFriction, planeStepReattachment, pohlhausenMean, roughPlateFriction, shipPlateFriction, turbulentPlateFriction, turbulentPlateThickness, uprightSimilar, zukauskas } from '../../src/quantities/index.ts';
import type { Workings } from '../../src/workings/index.ts';
import { workingsOf } from '../flows/harness.ts';
import { entriesOf, expectedOf, inputsOf } from './published.ts';

type In = Readonly<Record<string, number>>;
type Given = Readonly<Record<string, number | string>>;
const n = (of: In, key: string): number => { const v = of[key]; if (v === undefined) throw new Error(`the entry has no input ${key}`); return v; };
const flow = (id: string): Flow => { const f = flows[id]; if (f === undefined) throw new Error(`no flow ${id}`); return f; };
const got = (w: Workings, id: string): number => { const v = w.get(id); if (v === undefined) throw new Error(`${id} cannot be had`); return v; };
const stream = { imposedFlow: 'yes', axis: 'level', infiniteDepth: 'yes', energySolved: 'no', inletTemperature: 300, pressure: 1e5, medium: 'gas', 'has.layers': 'no', 'has.roughness': 'no', inletProfile: 'uniform', 'wallKind@wall': 'temperature' } as const;
const still = { ...stream, imposedFlow: 'no', inclination: 0 } as const;
const of = (id: string, given: Given, quantity: string): number => got(workingsOf(flow(id), given), quantity);
const plate = (given: Given, quantity: string): number => of('plate', { ...stream, ...given }, quantity);
const cylinder = (given: Given, quantity: string): number => of('cylinder', { ...stream, ...given }, quantity);
const step = (given: Given, quantity: string): number => of('backward-step', { ...stream, inletProfile: 'developed', 'wallKind@walls.bottom': 'temperature', 'sizes.inletHeight': 1, 'sizes.stepHeight': 0.94, ...given }, quantity);
const film = (i: In): Given => ({ reynolds: n(i, 'Re'), reynoldsFilm: n(i, 'Re'), prandtl: n(i, 'Pr'), prandtlFilm: n(i, 'Pr'), peclet: n(i, 'Re') * n(i, 'Pr') });
const local = (i: In): ReturnType<typeof turbulentPlateFriction> => turbulentPlateFriction({ reynolds: n(i, 'Re') });
const tripped = (i: In): number => meanPlateFriction({ reynolds: n(i, 'Re'), transition: 0, law: 'schlichting' });
const rayleigh = (i: In, length: string): number => of('plate', { ...still, gravity: n(i, 'g'), thermalExpansion: i['beta'] ?? 1 / n(i, 'T'), temperatureDifference: n(i, 'dT'), length: n(i, length), kinematicViscosity: n(i, 'nu'), thermalDiffusivity: n(i, 'nu') / n(i, 'Pr') }, 'rayleigh');
const upright = (i: In, ra: number): number => churchillChuPlate({ rayleigh: ra, prandtl: n(i, 'Pr'), wall: 'temperature' });
const similar = (which: 'heat' | 'shear', prandtl: number): number => uprightSimilar({ prandtl, which });

/** Ids of published numbers; what works them out. */
const bound: Readonly<Record<string, Readonly<Record<string, (i: In) => number>>>> = {
  C04_external: {
    'C04-wh-7.6-trans': (i) => meanPlateFriction({ reynolds: n(i, 'Re'), transition: 5e5, law: 'seventh' }),
    'C04-wh-7.6-rough': (i) => roughPlateFriction({ lengthOverGrain: n(i, 'L') / n(i, 'e') }).mean,
    'C04-inc7.1-Re': (i) => plate({ density: 1, viscosity: n(i, 'nu'), 'inlet.speed': n(i, 'V'), 'sizes.length': n(i, 'L') }, 'reynolds'),
    'C04-inc7.1-Nu': (i) => plate(film(i), 'nusseltSecond'),
    'C04-inc7.4-zuk': (i) => zukauskas({ reynolds: n(i, 'Re'), prandtl: n(i, 'Pr'), prandtlWall: n(i, 'Prs') }),
    'C04-inc7.4-cb': (i) => cylinder(film(i), 'nusseltPlain'),
    'C04-ch-7-1-Re': (i) => plate({ density: 1, viscosity: n(i, 'nu'), 'inlet.speed': n(i, 'V'), 'sizes.length': n(i, 'L') }, 'reynolds'),
    'C04-ch-7-1-Nu': (i) => plate(film(i), 'nusseltSecond'),
    'C04-ch-7-2-Nu': (i) => plate(film(i), 'nusseltPlain'),
    'C04-ch-7-2-Nu2': (i) => pohlhausenMean({ reynolds: n(i, 'Re'), prandtl: n(i, 'Pr') }),
    'C04-cb-10000-0.7': (i) => churchillBernstein({ reynolds: n(i, 'Re'), prandtl: n(i, 'Pr') }),
    'C04-cb-40000-0.71': (i) => cylinder(film(i), 'nusseltPlain'),
  },
  C05_natural_convection: {
    'C05-inc9.2b-Nu': (i) => upright(i, n(i, 'Ra') * n(i, 'Pr')),
    'C05-inc9.4-Nu': (i) => of('cylinder', { ...still, rayleigh: n(i, 'Ra'), prandtl: n(i, 'Pr') }, 'nusseltPlain'),
    'C05-ch-9-1-Ra': (i) => rayleigh(i, 'D'),
    'C05-ch-9-1-Nu': (i) => of('cylinder', { ...still, rayleigh: n(i, 'Ra'), prandtl: n(i, 'Pr') }, 'nusseltPlain'),
    'C05-ch-9-2-NuV': (i) => upright(i, rayleigh(i, 'L')),
    'C05-ch-9-2-NuD': (i) => levelPlateStable({ rayleigh: rayleigh(i, 'L') }).first,
    'C05-ccp-100000-0.71': (i) => upright(i, n(i, 'Ra')),
    'C05-ccp-1e+10-0.71': (i) => of('plate', { ...still, axis: 'upright', rayleigh: n(i, 'Ra'), prandtl: n(i, 'Pr') }, 'nusseltPlain'),
    'C05-ccc-10000-0.7': (i) => churchillChuCylinder({ rayleigh: n(i, 'Ra'), prandtl: n(i, 'Pr') }),
    'C05-ccc-1e+06-6': (i) => churchillChuCylinder({ rayleigh: n(i, 'Ra'), prandtl: n(i, 'Pr') }),
  },
  D02_flat_plate: {
    ...Object.fromEntries(['1e+06', '5e+06', '1e+07', '1e+08'].map((re) => [`D02-white-${re}`, (i: In): number => (re === '1e+06' ? local(i).white : plate({ reynolds: n(i, 'Re') }, 'plateFrictionEnd'))])),
    ...Object.fromEntries(['1e+06', '5e+06'].map((re) => [`D02-pr17-${re}`, (i: In): number => local(i).seventh])),
    ...Object.fromEntries(['1e+06', '1e+07'].flatMap((re) => [[`D02-ps-${re}`, tripped], [`D02-ks-${re}`, (i: In): number => shipPlateFriction({ reynolds: n(i, 'Re') }).schoenherr]])),
    ...Object.fromEntries(['1e+06', '1e+08'].map((re) => [`D02-ittc-${re}`, (i: In): number => shipPlateFriction({ reynolds: n(i, 'Re') }).modelLine])),
    'D02-d037-1e+06': (i) => plate({ reynolds: n(i, 'Re'), 'sizes.length': n(i, 'x') }, 'boundaryLayerThickness'),
    'D02-d016-1e+06': (i) => n(i, 'x') * turbulentPlateThickness({ reynolds: n(i, 'Re') }).seventh,
    'D02-d016-5e+06': (i) => n(i, 'x') * turbulentPlateThickness({ reynolds: n(i, 'Re') }).seventh,
    'D02-tmr-sa': (i) => plate({ reynolds: n(i, 'Rex') }, 'plateFrictionSecond'),
    'D02-tmr-sst': (i) => plate({ reynolds: n(i, 'Rex') }, 'plateFrictionSecond'),
  },
};

/** Numbers of these topics that no correlation here gives, with the reason. */
const elsewhere: Readonly<Record<string, string>> = {
  'C04-inc7.6-Nu': 'sphere is not built', 'C04-inc7.6-t': 'cooling of a solid sphere: no flow round it is asked for', 'C04-ch-7-6-Nu': 'sphere is not built', 'C04-bsl6.3-1': 'sphere is not built', 'C04-rm-50-0.7': 'sphere is not built',
  'C05-cs-1e6': 'sphere is not built',
};

/** Numbers of topics that other tests walk whole, as far as a correlation of these flows gives them. */
const alsoBound: Readonly<Record<string, Readonly<Record<string, (i: In) => number>>>> = {
  E03_boundary_layers: {
    'E03-blasius-th': () => laminarPlateFriction({ reynolds: 1 }).local,
    'E03-blasius-H': () => plate({ reynolds: 1e5, 'sizes.length': 1 }, 'plateDisplacementThickness') / plate({ reynolds: 1e5, 'sizes.length': 1 }, 'plateMomentumThickness'),
    'E03-ostr-0.01': () => similar('heat', 0.01),
    'E03-ostr-1.0': () => similar('heat', 1),
    'E03-ostr-10.0': () => similar('heat', 10),
    'E03-ostr-1000.0': () => similar('heat', 1000),
    'E03-ostrF-0.72': () => similar('shear', 0.72),
    'E03-ostrF-10.0': () => similar('shear', 10),
  },
  E08_step_cylinder_sphere: {
    ...Object.fromEntries(['100', '200', '800'].map((re) => [`E08-armaly-${re}`, (i: In): number => step({ reynolds: (n(i, 'Re') * 0.94) / 2, reynoldsBulk: (n(i, 'Re') * 0.94) / 2 }, 'backwardStepReattachment')])),
    'E08-gart-lower-reattachment-length': (i) => planeStepReattachment({ reynolds: n(i, 'Re'), inlet: 'edge' }) / 2,
    'E08-bfs-own-400': (i) => planeStepReattachment({ reynolds: n(i, 'Re'), inlet: 'edge' }) / 2,
    'E08-st-wb-60': (i) => laminarStrouhal({ reynolds: n(i, 'Re') }).williamsonBrown,
    'E08-st-wb-150': (i) => laminarStrouhal({ reynolds: n(i, 'Re') }).williamsonBrown,
    'E08-st-w88-100': (i) => cylinder({ reynolds: n(i, 'Re') }, 'cylinderStrouhalSecond'),
    'E08-st-w88-150': (i) => cylinder({ reynolds: n(i, 'Re') }, 'strouhal'),
    ...Object.fromEntries(['10', '20', '40'].map((re) => [`E08-wake-${re}`, (i: In): number => cylinderBubble({ reynolds: n(i, 'Re') })])),
  },
};

const agrees = (topic: string, binds: Readonly<Record<string, (i: In) => number>>): void => {
  it.each(entriesOf(topic).filter((e) => binds[e.id] !== undefined))('$id', (entry) => {
    const { value, allowed } = expectedOf(entry);
    expect(Math.abs((binds[entry.id] as (i: In) => number)(inputsOf(entry)) - value)).toBeLessThanOrEqual(allowed);
  });
};

describe.each(Object.entries(bound))('published numbers of %s', (topic, binds) => {
  it('are all either worked out or named with the reason', () => {
    const ids = entriesOf(topic).map((e) => e.id);
    expect(ids.filter((id) => (binds[id] === undefined) === (elsewhere[id] === undefined))).toEqual([]);
    expect(Object.keys(binds).filter((id) => !ids.includes(id))).toEqual([]);
  });
  agrees(topic, binds);
});

describe.each(Object.entries(alsoBound))('published numbers of %s, by these flows', (topic, binds) => {
  it('exist', () => expect(Object.keys(binds).filter((id) => !entriesOf(topic).some((e) => e.id === id))).toEqual([]));
  agrees(topic, binds);
});
