import { describe, expect, it } from 'vitest';
import { flows, type Flow } from '../../src/flows/index.ts';
import { wallModelledCells, wallResolvedCells } from '../../src/mesh/index.ts';
import { colebrook, jayatilleke, lawsMeet, logLaw, reichardtSpeed, spaldingSpeed, stackHeight, turbulentPlateFriction, vanDriestSpeed } from '../../src/quantities/index.ts';
import { workingsOf } from '../flows/harness.ts';
import { entriesOf, expectedOf, inputsOf } from './published.ts';

type In = Readonly<Record<string, number>>;
interface Covered { readonly covers: RegExp; readonly by: (of: In) => number }
interface Left { readonly leaves: RegExp; readonly because: string }

const n = (of: In, key: string): number => { const v = of[key]; if (v === undefined) throw new Error(`the entry has no input ${key}`); return v; };
const pipe = flows['pipe'] as Flow;
function had(given: Readonly<Record<string, number | string>>, id: string): number {
  const v = workingsOf(pipe, { energySolved: 'no', inletTemperature: 300, pressure: 1e5, storage: 'cell-centred', 'has.period': 'no', ...given }).get(id);
  if (v === undefined) throw new Error(`${id} cannot be had`);
  return v;
}
const firstNode = (of: In): number => {
  const [speed, diameter, nu] = [n(of, 'V'), n(of, 'D'), n(of, 'nu')];
  return had({ density: 1000, viscosity: 1000 * nu, 'inlet.speed': speed, 'sizes.diameter': diameter, frictionFactorDarcy: colebrook({ reynolds: (speed * diameter) / nu, relativeRoughness: 0 }), yPlusTarget: n(of, 'yp') }, 'firstNodeDistance');
};
const plateNode = (of: In): number => {
  const reynolds = (n(of, 'U') * n(of, 'L')) / n(of, 'nu');
  const shear = (1000 * turbulentPlateFriction({ reynolds }).schlichting * n(of, 'U') ** 2) / 2;
  return had({ density: 1000, viscosity: 1000 * n(of, 'nu'), 'wallShear@wall/target': shear, 'wallShear@wall/worst': shear, yPlusTarget: n(of, 'yp') }, 'firstNodeDistance');
};
const layer = (of: In) => ({ reynolds: n(of, 'Re'), from: n(of, 'Rx0'), aspect: n(of, 'asp') });
const eddy = (of: In): Record<string, number> => ({ kinematicViscosity: n(of, 'nu'), meanDissipationRate: n(of, 'eps') });

const bound: Readonly<Record<string, readonly (Covered | Left)[]>> = {
  D04_wall_laws: [
    { covers: /-spald-/, by: (of) => spaldingSpeed({ distance: n(of, 'y') }) },
    { covers: /-reich-/, by: (of) => reichardtSpeed({ distance: n(of, 'y') }) },
    { covers: /-vd-/, by: (of) => vanDriestSpeed({ distance: n(of, 'y') }) },
    { covers: /-log-/, by: (of) => logLaw({ distance: n(of, 'y') }) },
    { covers: /-inter-/, by: (of) => lawsMeet({ kappa: n(of, 'k'), roughness: n(of, 'E') }) },
    { covers: /-y1-(water-plate|air-duct)/, by: plateNode },
    { covers: /-y1-.*-pipe/, by: firstNode },
    { covers: /-layers-/, by: (of) => stackHeight(n(of, 'y1'), n(of, 'r'), n(of, 'n')) },
    { covers: /-jayatilleke-/, by: (of) => jayatilleke({ ratio: n(of, 'a') }) },
  ],
  D05_grid_counts: [
    { covers: /-cm-wmles-exp/, by: () => { const at = (reynolds: number) => Math.log10(wallModelledCells({ reynolds, from: 5e5, aspect: 1, perCube: 2500 })); return at(1e31) - at(1e30); } },
    { covers: /-cm-coef/, by: () => wallModelledCells({ reynolds: 2 ** (7 / 5) * 1e6, from: 1e6, aspect: 1, perCube: 1 }) / (2 ** (7 / 5) * 1e6) ** (2 / 7) },
    { covers: /-cm-wm-1e\+06/, by: (of) => wallModelledCells({ ...layer(of), perCube: n(of, 'n0') }) },
    { covers: /-cm-wr-/, by: (of) => wallResolvedCells({ ...layer(of), across: n(of, 'ny'), along: n(of, 'dxp'), span: n(of, 'dzp') }) },
    { leaves: /-wm-derive-/, because: 'the exact integral has 54.6875 where the published form, kept here, rounds to 54.7: 2.3e-4 apart against a tolerance of 1e-5' },
    { leaves: /-dns-exp|-ch-out-exp/, because: 'bounds of other authors that no mesh of the program is built on' },
    { leaves: /-lm5200-/, because: 'the mesh of one published simulation, no formula' },
  ],
  D06_turbulence_scales: [
    { covers: /-eta-/, by: (of) => had(eddy(of), 'kolmogorovLength') },
    { covers: /-tau-/, by: (of) => had(eddy(of), 'kolmogorovTime') },
    { covers: /-ueta-/, by: (of) => had(eddy(of), 'kolmogorovSpeed') },
    { covers: /-k-/, by: (of) => had({ speed: n(of, 'U'), turbulenceIntensity: n(of, 'I') }, 'turbulentKineticEnergy') },
    { covers: /-I-/, by: (of) => had({ reynolds: n(of, 'Re') }, 'turbulenceIntensity') },
    { covers: /-nut-/, by: (of) => had({ turbulentKineticEnergy: n(of, 'k'), turbulenceLength: n(of, 'l'), kinematicViscosity: 1e-6 }, 'viscosityRatio') * 1e-6 },
    { covers: /-eps-/, by: (of) => had({ turbulentKineticEnergy: n(of, 'k'), turbulenceLength: n(of, 'l') }, 'dissipationRate') },
    { covers: /-om-/, by: (of) => had({ turbulentKineticEnergy: n(of, 'k'), turbulenceLength: n(of, 'l') }, 'specificDissipationRate') },
    { covers: /-lpipe/, by: (of) => had({ 'sizes.diameter': n(of, 'D') }, 'turbulenceLength') },
    { covers: /-cmu34/, by: () => had({ turbulentKineticEnergy: 1, turbulenceLength: 1 }, 'dissipationRate') },
    { leaves: /-relambda|-ratio|-sigma-eps/, because: 'numbers of homogeneous turbulence and of the calibration of a closure: no quantity of a plan' },
  ],
};

describe.each(Object.entries(bound))('published numbers of %s', (topic, rows) => {
  it.each(entriesOf(topic).map((e) => [e.id, e] as const))('%s', (id, entry) => {
    const row = rows.find((r) => ('covers' in r ? r.covers : r.leaves).test(id));
    if (row === undefined) throw new Error(`${id} is neither bound nor left with a reason`);
    if ('leaves' in row) {
      expect(row.because.length).toBeGreaterThan(20);
      return;
    }
    const { value, allowed } = expectedOf(entry);
    expect(Math.abs(row.by(inputsOf(entry)) - value)).toBeLessThanOrEqual(allowed);
  });
});
