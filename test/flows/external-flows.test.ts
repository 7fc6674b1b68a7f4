import { planned } from '../cases/expert.ts';
import { describe, expect, it } from 'vitest';
import { flows, type Flow } from '../../src/flows/index.ts';
import { churchillBernstein, churchillChuCylinder, churchillChuLaminar, cylinderDrag, cylinderStrouhal, elSherbiny, berkovskyPolevikov, hilpert, laminarStrouhal, leFevre, meanPlateFriction, morgan, roughPlateFriction, shipPlateFriction, sumOfLocal, turbulentPlateFriction, unheatedStart, uprightSimilar, whiteCylinderDrag, zukauskas } from './external-laws.ts';
import { flagsIn, stepOf, type Workings } from '../../src/workings/index.ts';
import { workingsOf } from './harness.ts';

type Given = Readonly<Record<string, number | string>>;
const flow = (id: string): Flow => { const f = flows[id]; if (f === undefined) throw new Error(id); return f; };
const got = (w: Workings, id: string): number => { const v = w.get(id); if (v === undefined) throw new Error(`${id} cannot be had`); return v; };
const near = (value: number, wanted: number, share: number): void => expect(Math.abs(value / wanted - 1)).toBeLessThan(share);

const base = { 'has.layers': 'no', 'has.roughness': 'no', infiniteDepth: 'yes', pressure: 101325, medium: 'gas', energySolved: 'no' } as const;
const stream = { ...base, imposedFlow: 'yes', axis: 'level', inletTemperature: 300 } as const;
const still = { ...base, imposedFlow: 'no', energySolved: 'yes', 'wallKind@wall': 'temperature' } as const;
const alone = { density: 1, viscosity: 1e-5 } as const;

/** A plate of 1 m in a stream of that Reynolds number. */
const plate = (reynolds: number, more: Given = {}): Workings => workingsOf(flow('plate'), { ...stream, ...alone, 'sizes.length': 1, 'inlet.speed': reynolds * 1e-5, 'wallKind@wall': 'temperature', ...more });
const cylinder = (reynolds: number, more: Given = {}): Workings => workingsOf(flow('cylinder'), { ...stream, ...alone, inletProfile: 'uniform', 'sizes.diameter': 0.1, 'inlet.speed': reynolds * 1e-4, 'wallKind@wall': 'temperature', ...more });

describe('plate along a stream', () => {
  it('air at low pressure over a cooled plate (Bergman, Lavine, Incropera and DeWitt, Example 7.1): Re 9597, Nu 57.4, h 4.18, 570 W per metre', () => {
    // rho from nu = 5.21e-4, k = 0.0364, Pr = 0.687 at the film temperature; the exact value lies between the power law of the example and the law for all Pr of this flow, 1.9 % apart here.
    const w = workingsOf(flow('plate'), { ...stream, energySolved: 'yes', 'wallKind@wall': 'temperature', 'wettedTemperature@wall': 300.15, inletTemperature: 573.15, density: 0.05, viscosity: 0.05 * 5.21e-4, thermalConductivity: 0.0364, specificHeatCapacity: (0.687 * 0.0364) / (0.05 * 5.21e-4), thermalExpansion: 0.0023, 'sizes.length': 0.5, 'inlet.speed': 10 });
    near(got(w, 'reynolds'), 9597, 1e-3);
    near(got(w, 'nusseltSecond'), 57.4, 1e-3);
    near(got(w, 'nusseltPlain'), 57.4, 0.02);
    near(got(w, 'heatTransferCoefficientPlain'), 4.18, 0.02);
    near(got(w, 'wallArea@wall') * got(w, 'heatTransferCoefficientPlain') * 273, 570, 0.02);
  });
  it('mixed layer (Cengel and Ghajar, Example 7-2): Re 1.884e6, Pr 0.7154, Nu 2687', () => near(got(plate(1.884e6, { reynoldsFilm: 1.884e6, prandtlFilm: 0.7154 }), 'nusseltPlain'), 2687, 1e-3));
  it('skin friction by hand: 0.664/sqrt(1e5) = 2.1001e-3; 0.455/ln^2(6e5) = 2.5704e-3', () => {
    near(got(plate(1e5), 'skinFrictionCoefficient'), 2.1001e-3, 1e-4);
    near(got(plate(1e5), 'dragCoefficient'), 4.2002e-3, 1e-4);
    near(got(plate(1e7), 'skinFrictionCoefficient'), 2.5704e-3, 1e-4);
  });
  it('mean friction with transition at 5e5 (White, Example 7.6): 0.00316 at Re 4.36e6 by the one-seventh law, 3 % from the law used', () => near(got(plate(4.36e6), 'dragCoefficient'), 0.00316, 0.03));
  it('the constants of the mean laws come out of continuity: 1614, 1522, 1439', () => {
    // A/Re at Re_tr = 5e5 of the three laws, printed in the handbooks as 1700 or 1610, 1520 and 1440.
    for (const [law, constant] of [['schlichting', 1613.8], ['white', 1521.6], ['seventh', 1438.9]] as const) near((meanPlateFriction({ reynolds: 1e7, transition: 0, law }) - meanPlateFriction({ reynolds: 1e7, transition: 5e5, law })) * 1e7, constant, 3e-4);
  });
  it('the largest shear lies at a twentieth of the length or just behind transition', () => {
    // Laminar at 0.05 Re: 0.664/sqrt(5e4) = 2.970e-3; behind transition at 5e5: 0.455/ln^2(3e4) = 4.2814e-3.
    near(got(plate(1e6), 'plateFrictionWorst'), 4.2814e-3, 2e-3);
    near(got(plate(1e5), 'plateFrictionWorst'), 0.664115 / Math.sqrt(5e3), 1e-6);
    near(got(plate(1e6), 'wallShear@wall/worst') / got(plate(1e6), 'wallShear@wall/target'), got(plate(1e6), 'plateFrictionWorst') / got(plate(1e6), 'plateFrictionEnd'), 1e-9);
  });
  it.each([[0.001, 2.6e6], [0.005, 1.35e6], [0.01, 6.4e5], [0.03, 1.03e5], [0.08, 1e5], [0.0005, 2.6e6]] as const)('a stream of intensity %f turns the layer at %f', (intensity, wanted) => {
    near(got(plate(1e6, { 'inlet.turbulence.intensity': intensity }), 'plateTransitionReynolds'), wanted, 0.02);
    expect(flagsIn(plate(1e6, { 'inlet.turbulence.intensity': intensity }))('plateTransitionReynolds')).toEqual([]);
  });
  it.each([[2.99e5, 'laminar'], [3.01e5, 'transitional'], [2.99e6, 'transitional'], [3.01e6, 'turbulent']] as const)('at Re %f the layer is %s', (re, word) => expect(plate(re).word('regime')).toBe(word));
  it('has no onset of unsteadiness of its own', () => expect(plate(1e6).get('unsteadyFrom')).toBeUndefined());
  it('laminar share is the place of transition', () => {
    near(got(plate(1e7), 'laminarShare'), 0.05, 1e-9);
    expect(got(plate(1e5), 'laminarShare')).toBe(1);
  });
  it('layers by hand: 4.91 mm, 15.5 mm/0.1 share', () => {
    near(got(plate(1e6, { regime: 'laminar' }), 'boundaryLayerThickness'), 4.91e-3, 1e-3);
    near(got(plate(1e7), 'boundaryLayerThickness'), 0.01473, 1e-3);
    near(got(plate(1e5), 'plateDisplacementThickness') / got(plate(1e5), 'plateMomentumThickness'), 2.591, 1e-3);
  });
  it('verification plate of averaged closures: c_f 0.00271 at Re 4.85e6; Schultz-Grunow within 1 %, White 6 % above', () => {
    near(got(plate(4.85e6), 'plateFrictionSecond'), 0.00271, 0.01);
    near(got(plate(4.85e6), 'skinFrictionCoefficient') / 0.00271, 1.06, 0.01);
  });
  it('the local laws stay together, the mean laws too, and the rough law integrates', () => {
    for (const re of [1e6, 1e7, 1e8]) {
      const { white, schlichting, schultzGrunow } = turbulentPlateFriction({ reynolds: re });
      near(schlichting, white, 0.008);
      near(schultzGrunow, white, re > 5e7 ? 0.085 : 0.06);
      for (const mean of [shipPlateFriction({ reynolds: re }).schoenherr, shipPlateFriction({ reynolds: re }).modelLine]) near(mean, meanPlateFriction({ reynolds: re, transition: 0, law: 'schlichting' }), 0.05);
    }
    near(sumOfLocal((x) => roughPlateFriction({ lengthOverGrain: Math.max(1, 1e5 * x) }).local), roughPlateFriction({ lengthOverGrain: 1e5 }).mean, 0.03);
  });
  it('an unheated start agrees with the quadrature of the local law (1.09551 laminar, 1.01087 turbulent at half the length)', () => {
    near(unheatedStart({ share: 0.5, layer: 'laminar' }), 1.0955107, 1e-6);
    near(unheatedStart({ share: 0.5, layer: 'turbulent' }), 1.0108711, 1e-6);
    const at = (x0: number): number => got(plate(1e5, { reynoldsFilm: 1e5, prandtlFilm: 0.7, 'sizes.unheatedStart': x0 }), 'nusseltPlain');
    near(at(0.5) / at(0), 1.0955107, 1e-6);
  });
});

describe('plate in still fluid', () => {
  const air400 = { density: 0.8711, viscosity: 0.8711 * 26.41e-6, thermalConductivity: 0.0338, specificHeatCapacity: 0.0338 / (0.8711 * 38.3e-6), thermalExpansion: 0.0025 };
  const screen = (more: Given = {}): Workings => workingsOf(flow('plate'), { ...still, ...air400, axis: 'upright', inclination: Math.PI / 2, ascent: 'up', infiniteDepth: 'no', 'sizes.length': 0.71, 'sizes.width': 1.02, surroundingsTemperature: 296.15, 'wettedTemperature@wall': 505.15, ...more });
  it('fire screen (Bergman, Lavine, Incropera and DeWitt, Example 9.2): Ra 1.813e9, Nu 147, h 7.0, 1060 W', () => {
    const w = screen();
    near(got(w, 'rayleigh'), 1.813e9, 0.01);
    expect(w.word('regime')).toBe('transitional');
    near(got(w, 'nusseltPlain'), 147, 0.01);
    near(got(w, 'heatTransferCoefficientPlain'), 7, 0.01);
    near(got(w, 'heatTransferCoefficientPlain') * got(w, 'wallArea@wall') * 209, 1060, 0.01);
  });
  it('a given flux closes on the wall temperature against the far fluid, not the film', () => {
    const w = screen({ 'wallKind@wall': 'flux', 'wallHeatFlux@wall': 1463 });
    w.set('wettedTemperature@wall', undefined);
    const t = got(w, 'wallTemperature@wall');
    near(got(w, 'heatTransferCoefficient') * (t - 296.15), 1463, 1e-6);
    near(t - 296.15, 209, 0.03);
  });
  it('laminar shear, peak and layers by hand at Gr 1e8, Pr 0.72, 0.3 m, nu 1.6e-5', () => {
    // tau = 2 mu nu/L^2 Gr^(1/2) 0.676 (Gr/4)^(1/4); u = 2 nu/L Gr^(1/2) 0.2762; delta_T = 4.42 L (4/Gr)^(1/4).
    const w = screen({ rayleigh: 7.2e7, prandtl: 0.72, length: 0.3, kinematicViscosity: 1.6e-5, viscosity: 1.8e-5 });
    near(got(w, 'wallShearPlain'), ((2 * 1.8e-5 * 1.6e-5) / 0.09) * 1e4 * 0.676 * 70.7107, 1e-4);
    near(got(w, 'platePeakSpeed'), 0.29461, 1e-3);
    near(got(w, 'thermalLayerThickness'), 0.018752, 1e-3);
    near(got(w, 'boundaryLayerThickness'), 0.024183, 1e-3);
  });
  it('liquids are judged on the Grashof number', () => {
    expect(screen({ rayleigh: 5e9, prandtl: 7 }).word('regime')).toBe('laminar');
    expect(screen({ rayleigh: 5e9, prandtl: 1 }).word('regime')).toBe('transitional');
  });
  it('an inclined plate takes g sin(theta)', () => near(got(screen({ axis: 'inclined', inclination: Math.PI / 4, rayleigh: 1e8, prandtl: 1 }), 'plateRayleigh'), 1e8 * Math.SQRT1_2, 1e-12));
  it.each([['up', 500, 'unstable'], ['up', 200, 'stable'], ['down', 500, 'stable'], ['down', 200, 'unstable']] as const)('level, %s, wall at %f K against 296 K: %s', (plateFacing, t, word) => {
    expect(screen({ axis: 'level', inclination: 0, ascent: 'none', plateFacing, 'wettedTemperature@wall': t }).word('plateSetting')).toBe(word);
  });
  it('level plate by hand: Nu 17.076 and 8.538 at Ra 1e6, 69.62 at 1e8; length is area over perimeter', () => {
    const level = (plateFacing: string, rayleigh: number): Workings => screen({ axis: 'level', inclination: 0, ascent: 'none', plateFacing, rayleigh });
    near(got(level('up', 1e6), 'nusseltPlain'), 17.0763, 1e-5);
    near(got(level('down', 1e6), 'nusseltPlain'), 8.5381, 1e-4);
    near(got(level('up', 1e8), 'nusseltPlain'), 69.62, 1e-3);
    near(got(level('up', 1e6), 'length'), (0.71 * 1.02) / (2 * 1.73), 1e-12);
  });
  it('a level plate without its side named has no heat transfer, and says what it lacks', () => expect(screen({ axis: 'level', inclination: 0, ascent: 'none' }).get('nusseltPlain')).toBeUndefined());
  it("Churchill and Chu's quarter-power part, LeFevre and the table agree within 0.5 %", () => {
    for (const prandtl of [0.01, 0.1, 0.72, 1, 7, 100, 1000]) {
      near(leFevre({ prandtl }), uprightSimilar({ prandtl, which: 'heat' }), 0.003);
      near((0.67 * prandtl ** 0.25) / (1 + (0.492 / prandtl) ** (9 / 16)) ** (4 / 9), ((4 / 3) * uprightSimilar({ prandtl, which: 'heat' })) / 4 ** 0.25, 0.006);
    }
  });
});

describe('cylinder', () => {
  it('heated in air (Bergman, Lavine, Incropera and DeWitt, Example 7.4): Re 6071, Nu 40.6, h 96', () => {
    const w = cylinder(1, { energySolved: 'yes', density: 0.995, viscosity: 0.995 * 20.92e-6, thermalConductivity: 0.03, prandtlFilm: 0.7, 'sizes.diameter': 0.0127, 'inlet.speed': 10, peclet: 4250, inletTemperature: 299.35, 'wettedTemperature@wall': 401.55, specificHeatCapacity: 1009 });
    near(got(w, 'reynoldsFilm'), 6071, 1e-3);
    near(got(w, 'nusseltPlain'), 40.6, 2e-3);
    near(got(w, 'heatTransferCoefficientPlain'), 96, 2e-3);
  });
  it.each([[20, 2.05], [40, 1.52], [100, 1.33], [200, 1.32]] as const)('drag at Re %f is %f, the benchmark, and the short form lies above it', (re, wanted) => {
    near(got(cylinder(re), 'dragCoefficient'), wanted, 1e-9);
    if (re < 100) expect(whiteCylinderDrag({ reynolds: re })).toBeGreaterThan(1.1 * cylinderDrag({ reynolds: re }));
  });
  it('drag in the subcritical range: 0.98 at 3900, 1.2 at 1e5, within 10 %', () => {
    near(got(cylinder(3900), 'dragCoefficient'), 0.98, 0.1);
    near(got(cylinder(1e5), 'dragCoefficient'), 1.2, 0.1);
  });
  it('the drag crisis is named and has no narrow number', () => {
    for (const re of [3e5, 1e6]) {
      const step = stepOf(cylinder(re), 'cylinderDragFree');
      expect(step?.note).toContain('crisis');
      const c = got(cylinder(re), 'dragCoefficient');
      expect(c).toBeGreaterThan(0.25);
      expect(c).toBeLessThan(0.75);
    }
  });
  it.each([[1e3, 0.212], [1e4, 0.2], [1e5, 0.185]] as const)('Strouhal number at Re %f is %f', (re, wanted) => near(got(cylinder(re), 'strouhal'), wanted, 0.005));
  it('sheds at St U/D, from Re 47 on', () => {
    const w = cylinder(100);
    near(got(w, 'sheddingFrequency'), (0.16484 * 0.01) / 0.1, 1e-4);
    expect(got(cylinder(46), 'unsteadyGroup') / got(cylinder(46), 'unsteadyFrom')).toBeLessThan(1);
    expect(got(cylinder(48), 'unsteadyGroup') / got(cylinder(48), 'unsteadyFrom')).toBeGreaterThan(1);
    for (const re of [60, 100, 150, 178]) near(laminarStrouhal({ reynolds: re }).williamson, cylinderStrouhal({ reynolds: re }), 0.02);
  });
  it('between walls, the channel of Schaefer and Turek: Re 20 steady, C_D 5.58; Re 100 shedding, St 0.302, C_D 3.2', () => {
    const walls = { 'sizes.channelHeight': 0.41, inletProfile: 'developed' } as const;
    const [slow, fast] = [cylinder(20, walls), cylinder(100, walls)];
    near(got(slow, 'blockageRatio'), 0.1 / 0.41, 1e-12);
    expect(got(slow, 'unsteadyGroup')).toBeLessThan(got(slow, 'unsteadyFrom'));
    expect(got(fast, 'unsteadyGroup')).toBeGreaterThan(1.2 * got(fast, 'unsteadyFrom'));
    near(got(slow, 'dragCoefficient'), 5.58, 0.08);
    near(got(fast, 'dragCoefficient'), 3.2, 0.25);
    near(got(fast, 'strouhal'), 0.30184, 0.1);
  });
  it('blockage of 5 % speeds the stream up by 1.5 to 1.7 % (Allen and Vincenti, C_D 1.0 to 1.2)', () => {
    const w = cylinder(1e5, { 'sizes.channelHeight': 2 });
    expect(got(w, 'blockageSpeedRatio') - 1).toBeGreaterThan(0.0145);
    expect(got(w, 'blockageSpeedRatio') - 1).toBeLessThan(0.018);
    expect(got(cylinder(1e5), 'blockageFactorDrag')).toBe(1);
  });
  it('closed wake of 0.93 and 2.13 diameters at Re 20 and 40 (Coutanceau and Bouard)', () => {
    near(got(cylinder(20), 'cylinderBubbleLength') / 0.1, 0.93, 0.01);
    near(got(cylinder(40), 'cylinderBubbleLength') / 0.1, 2.13, 0.01);
  });
  it('the second laws stay within the spread that is stated', () => {
    for (const re of [1, 10, 100, 1e3, 1e4, 1e5]) for (const prandtl of [0.7, 7]) {
      const ratio = zukauskas({ reynolds: re, prandtl, prandtlWall: prandtl }) / churchillBernstein({ reynolds: re, prandtl });
      expect(ratio).toBeGreaterThan(0.83);
      expect(ratio).toBeLessThan(1.11);
    }
    near(hilpert({ reynolds: 3e5, prandtl: 0.7 }) / churchillBernstein({ reynolds: 3e5, prandtl: 0.7 }), 1.31, 0.01);
    for (const ra of [1e-4, 1, 1e3, 1e6, 1e9]) near(morgan({ rayleigh: ra }), churchillChuCylinder({ rayleigh: ra, prandtl: 0.7 }), 0.22);
  });
  const pipe = (more: Given = {}): Workings => workingsOf(flow('cylinder'), { ...still, axis: 'level', inclination: 0, density: 0.9616, viscosity: 0.9616 * 22.8e-6, thermalConductivity: 0.0313, specificHeatCapacity: 0.0313 / (0.9616 * 32.8e-6), thermalExpansion: 2.725e-3, 'sizes.diameter': 0.1, surroundingsTemperature: 296.15, 'wettedTemperature@wall': 438.15, ...more });
  it('level steam pipe (Bergman, Lavine, Incropera and DeWitt, Example 9.4): Ra 5.073e6, Nu 23.3, printed 0.9 % above its own law', () => {
    near(got(pipe(), 'rayleigh'), 5.073e6, 0.003);
    near(got(pipe(), 'nusseltPlain'), 23.3, 0.012);
    expect(got(pipe(), 'unsteadyFrom')).toBe(1e6);
  });
  it('upright: a plate while thick, more when slender', () => {
    const standing = (span: number, diameter: number): number => got(pipe({ axis: 'upright', inclination: Math.PI / 2, infiniteDepth: 'no', 'sizes.span': span, 'sizes.diameter': diameter }), 'heatTransferCoefficientPlain');
    expect(standing(0.3, 10) / ((churchillChuLaminar({ rayleigh: 5.073e6 * 27, prandtl: 0.695, wall: 'temperature' }) * 0.0313) / 0.3)).toBeCloseTo(1, 2);
    expect(standing(0.3, 0.01)).toBeGreaterThan(1.15 * standing(0.3, 10));
  });
});

describe('backward step', () => {
  const step = (reynolds: number, more: Given = {}): Workings => workingsOf(flow('backward-step'), { ...stream, ...alone, 'wallKind@walls.bottom': 'temperature', 'wallKind@walls.top': 'adiabatic', 'sizes.inletHeight': 0.0052, 'sizes.stepHeight': 0.0049, 'inlet.speed': (reynolds * 1e-5) / 0.0104, ...more });
  it('air over the step of Armaly at Re 389: expansion 1.94, reattachment 8 h, plane runs at 8.1 h', () => {
    const w = step(389);
    near(got(w, 'backwardStepReynolds'), 389, 1e-9);
    near(got(w, 'backwardStepExpansion'), 1.94, 0.002);
    near(got(w, 'reattachmentLength') / 0.0049, 8, 1e-9);
    near(got(w, 'backwardStepReattachmentPlane'), 8.05, 0.01);
    expect(w.word('regime')).toBe('laminar');
    expect(got(w, 'unsteadyGroup')).toBeLessThan(0.8 * got(w, 'unsteadyFrom'));
  });
  it.each([[1199, 'laminar'], [1201, 'transitional'], [6599, 'transitional'], [6601, 'turbulent']] as const)('at Re %f it is %s', (re, word) => expect(step(re).word('regime')).toBe(word));
  it('turbulent, expansion 1.125: 6.26 h (Driver and Seegmiller)', () => near(got(step(3e5, { 'sizes.inletHeight': 0.1016, 'sizes.stepHeight': 0.0127, 'inlet.speed': 44.2, viscosity: 1.5e-5 }), 'backwardStepReattachment'), 6.26, 1e-9));
  it('another expansion ratio than measured is flagged, not passed on in silence', () => expect(flagsIn(step(389, { 'sizes.stepHeight': 0.0026 }))('reattachmentLength')).not.toEqual([]));
  it('loses the head of Borda and Carnot: expansion 2, 1 m/s, 1000 kg/m^3: 125 Pa', () => near(got(step(389, { 'sizes.stepHeight': 0.0052, 'inlet.speed': 1, density: 1000, viscosity: 0.0267 }), 'pressureDropPlain'), 125, 1e-9));
  it('shear ahead of the lip is that of the channel: 96/389 rho U^2/8', () => near(got(step(389), 'wallShear@walls.bottom/worst'), ((96 / 389) * (389e-5 / 0.0104) ** 2) / 8, 1e-9));
});

describe('box heated from the side', () => {
  const side = 0.102092;
  const air = { density: 1.177, viscosity: 1.177 * 1.568e-5, thermalConductivity: 0.0262, specificHeatCapacity: 0.0262 / (1.177 * 2.2085e-5), thermalExpansion: 1 / 300 } as const;
  const walls = { 'wallKind@walls.left': 'temperature', 'wallKind@walls.right': 'temperature', 'wallKind@walls.top': 'adiabatic', 'wallKind@walls.bottom': 'adiabatic' } as const;
  const box = (more: Given = {}): Workings => workingsOf(flow('side-heated-cavity'), { ...base, energySolved: 'yes', ...air, ...walls, 'wettedTemperature@walls.left': 305, 'wettedTemperature@walls.right': 295, 'sizes.height': side, 'sizes.width': side, ...more });
  it('square of air at Ra 1e6: Nu 8.82 within the 4 % that the law is high by, v_max 219.4 alpha/W', () => {
    const w = box();
    near(got(w, 'rayleigh'), 1e6, 0.01);
    near(got(w, 'nusseltPlain'), 8.82, 0.05);
    near((got(w, 'sideHeatedCavityPeakSpeed') * side) / got(w, 'thermalDiffusivity'), 219.4, 0.01);
    near(got(w, 'sideHeatedCavityPeakPlace'), 0.038 * side, 0.02);
    near(got(w, 'speed') ** 2, (9.80665 * 10 * side) / 300, 1e-9);
    near(got(w, 'referenceTemperature'), 300, 1e-12);
  });
  it.each([[1e3, 1.118, 0.12], [1e4, 2.243, 0.09], [1e5, 4.519, 0.05], [1e7, 16.523, 0.1], [1e8, 30.225, 0.17]] as const)('at Ra %f it stays %f within %f of the benchmark of de Vahl Davis and Le Quere', (rayleigh, nusselt, share) => {
    const of = box({ rayleigh, rayleighHeight: rayleigh });
    near(got(of, 'nusseltPlain'), nusselt, share);
  });
  it('heat in at one wall is heat out at the other, h A (T_h - T_c)', () => {
    const w = box();
    near(got(w, 'wallHeatFlux@walls.left'), got(w, 'heatTransferCoefficient') * 10, 1e-9);
    near(got(w, 'wallHeatFlux@walls.right'), -got(w, 'wallHeatFlux@walls.left'), 1e-9);
    near(got(w, 'heatRate'), got(w, 'wallHeatFlux@walls.left') * side, 1e-9);
  });
  it('a heated wall against a cold one closes on its temperature', () => {
    const w = box({ 'wallKind@walls.left': 'flux', 'wallHeatFlux@walls.left': 22.6 });
    w.set('wettedTemperature@walls.left', undefined);
    const hot = got(w, 'wallTemperature@walls.left');
    near(got(w, 'heatTransferCoefficient') * (hot - 295), 22.6, 1e-6);
    near(hot, 305, 0.002);
    near(got(w, 'hotTemperature'), hot, 1e-12);
  });
  it('which wall is hot does not matter', () => near(got(box({ 'wettedTemperature@walls.left': 295, 'wettedTemperature@walls.right': 305 }), 'heatRate'), got(box(), 'heatRate'), 1e-12));
  it('conducts only, below 500 H/W, and never less', () => {
    expect(got(box({ rayleigh: 100, rayleighHeight: 100 }), 'nusseltPlain')).toBe(1);
    near(got(box({ rayleighHeight: 500 }), 'sideHeatedCavityConduction'), 1, 1e-9);
  });
  it('a shallow box conducts with a core flow, and beyond its range says so', () => {
    const low = { 'sizes.height': 0.2 * side, rayleighHeight: 1000, rayleigh: 1000 / 0.008 };
    near(got(box(low), 'nusseltPlain'), 1 + 40000 / 362880, 1e-9);
    expect(flagsIn(box(low))('nusseltPlain')).toEqual([]);
    expect(flagsIn(box({ ...low, rayleighHeight: 1e5, rayleigh: 1e5 / 0.008 }))('nusseltPlain')).not.toEqual([]);
  });
  it('each height has its law: 1 to 10 Berkovsky and Polevikov, above ElSherbiny for air, MacGregor and Emery for liquids', () => {
    const law = (height: number, more: Given = {}): string | undefined => stepOf(box({ 'sizes.height': height * side, rayleigh: 1e5, ...more }), 'nusseltPlain')?.source;
    expect([law(1.5), law(5), law(40), law(20, { prandtl: 7 })].map((s) => s?.split(' ')[0])).toEqual(['Berkovsky', 'Berkovsky', 'ElSherbiny,', 'MacGregor']);
    near(elSherbiny({ rayleigh: 1e5, aspect: 40 }), 3.0024, 1e-4);
    expect(berkovskyPolevikov({ rayleigh: 1e3, prandtl: 0.71, aspect: 10 })).toBe(1);
  });
  // Gap of 5 mm, 1 m high: Gr_W = 9.80665/300 * 10 * 0.005^3/1.568e-5^2 = 166 although Ra_H is 9.4e8; 40 mm by 0.8 m: Gr_W = 85094, layers turbulent from 1e10/(0.71 20^3).
  it.each([
    ['a thin slot of air conducts and is laminar', 1, 0.005, {}, 166.2, 8000, 14085 / 8],
    ['a wide tall slot has cells, turbulent layers by the height', 0.8, 0.04, {}, 85094, 8000, 1.7606e6],
    ['a tall slot of oil conducts below Ra_W = 500 H/W', 1, 0.01, { prandtl: 100 }, undefined, 500 * 100 ** 4, 500 * 100 ** 4],
    ['a box of four gaps goes by the height alone', 0.4, 0.1, {}, undefined, 1e8, 1e10],
  ] as const)('%s', (_, height, width, more, group, low, high) => {
    const w = box({ 'sizes.height': height, 'sizes.width': width, ...more });
    near(got(w, 'regimeGroup'), group ?? got(w, 'rayleighHeight'), 0.002);
    near(got(w, 'regimeLow'), low, 1e-9);
    near(got(w, 'regimeHigh'), Math.max(low, high), 0.005);
  });
  it('is unsteady from 1.8e8 for air, far earlier for metals, and in cells for tall slots', () => {
    expect([got(box(), 'unsteadyFrom'), got(box({ prandtl: 0.02 }), 'unsteadyFrom'), got(box({ 'sizes.height': 20 * side }), 'unsteadyFrom')]).toEqual([1.8e8, 3e6, 2e4]);
  });
  // Source: stability equations of the parallel flow, slot-onset.py beside this file. Stationary cells first appear at Gr 7807, 8037, 7869, 7873 for Pr 0.01,
  // 0.71, 7, 12.3 (Korpela, Gozum and Baxi 1973: 8037 for air); at Pr 20 and more the first disturbance travels at 0.008 g beta dT W^2/nu.
  it.each([0.71, 7, 12.3])('cells of a tall slot stand still at their onset, Pr %d: unsteady beyond 8000 only', (prandtl) => {
    const w = box({ 'sizes.height': 20 * side, prandtl });
    expect((got(w, 'unsteadyFrom')) / 8000).toBeGreaterThan(1.2);
  });
  it.each([[20, 2413.8], [50, 1108.7], [100, 749.6], [1000, 251.2]])('in an oil of Pr %d they travel, from Gr %d', (prandtl, grashof) => near(got(box({ 'sizes.height': 20 * side, prandtl }), 'unsteadyFrom'), grashof, 0.3));
  it('argon between panes at Gr 14 400 is near the onset, not beyond it: a steady run comes first', async () => {
    const { plan } = await planned('argon-glazing', [], '../cases');
    expect(plan.effects.find((e) => e.id === 'unsteadiness')?.verdict).toBe('borderline');
    expect(plan.choices.find((c) => c.id === 'run-character')?.chosen).not.toBe('transient');
    expect(plan.quantities['unsteadyFrom']?.formula).toContain('stand still');
  });
});
