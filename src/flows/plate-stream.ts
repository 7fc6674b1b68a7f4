import { churchillOzoe, laminarPlateFriction, lowPrandtlPlate, meanPlateFriction, mixedLowPrandtlPlate, mixedPlateNusselt, plateTransition, pohlhausenMean, turbulentPlateFriction, turbulentPlateThickness, unheatedStart } from '../quantities/index.ts';
import { quantity, way, ways, type Definition, type Way } from '../workings/index.ts';

const stream = { plateSetting: 'stream' };
const laminar = { ...stream, regime: 'laminar' };
const behind = { ...stream, regime: ['transitional', 'turbulent'] };
const definition = 'definition';
const blasius = 'Blasius, Z. Math. Phys. 56 (1908) 1';
const white = 'White, Viscous Fluid Flow, 3rd ed. (2006), eq. (6-78)';
const shaw = 'Abu-Ghannam and Shaw, J. Mech. Eng. Sci. 22 (1980) 213';
const fromTurbulence = 'Re_tr = ((163 + exp(6.91 - Tu))/0.664)^2, Tu in %, not below 1e5';
const laminarTo = [1e3, 3.2e6] as const;
const turbulentOver = [5e5, 1e9] as const;
const temperatureKinds = ['temperature', 'coefficient', 'adiabatic'];

/** Turbulent White law, laminar law ahead of transition. */
const localFriction = (reynolds: number, transition: number): number => (reynolds < transition ? laminarPlateFriction({ reynolds }).local : turbulentPlateFriction({ reynolds }).white);

/** Largest local coefficient: at 5 % of the length, or just behind transition. */
const largestFriction = (reynolds: number, transition: number): number => {
  const front = 0.05 * reynolds;
  const first = localFriction(front, transition);
  return front < transition && transition < reynolds ? Math.max(first, turbulentPlateFriction({ reynolds: transition }).white) : first;
};

/** Where the layer turns turbulent: from the turbulence of the stream where it is given. */
function transitions(id: string, unknown: number, formula: string, source: string): Definition {
  const low = way({ needs: ['inlet.turbulence.intensity'], when: stream, range: { 'inlet.turbulence.intensity': [0.05, 10] }, scatter: 0.5, value: () => 1e5, formula: `${formula} = 1e5, Tu above 5 %`, source: `${shaw}, floor common practice` });
  const quiet = way({ needs: ['inlet.turbulence.intensity'], when: stream, range: { 'inlet.turbulence.intensity': [0, 0.001] }, scatter: 0.5, value: () => plateTransition({ intensity: 0.001 }), formula: `${formula} at Tu = 0.1 %`, source: shaw });
  const law = way({ needs: ['inlet.turbulence.intensity'], when: stream, range: { 'inlet.turbulence.intensity': [0.001, 0.05] }, scatter: 0.5, value: (of) => Math.max(1e5, plateTransition({ intensity: of['inlet.turbulence.intensity'] })), formula: fromTurbulence, source: shaw });
  const plain = way({ needs: [], when: stream, scatter: 1, value: () => unknown, formula: `${formula} = ${unknown}`, source });
  return ways(id, [law, low, quiet, plain]);
}

const regime: Definition[] = [
  quantity('plateTransitionReynolds', { symbol: 'Re_tr', name: 'Reynolds number at which the layer turns turbulent', unit: '1' }),
  transitions('plateTransitionReynolds', 5e5, 'Re_tr', 'Schlichting, Boundary-Layer Theory, ch. 21: 3e5 to 3e6 by the turbulence of the stream; 5e5 belongs to about 1.2 %'),
  transitions('regimeLow', 3e5, 'Re_lo', 'Schlichting, Boundary-Layer Theory, ch. 21; safely laminar below 1e5'),
  ways('regimeGroup', [way({ needs: ['reynolds'], when: stream, value: ({ reynolds }) => reynolds, symbol: 'Re', formula: 'Re on L', source: definition })]),
  ways('regimeHigh', [way({ needs: ['regimeLow'], when: stream, scatter: 0.5, value: ({ regimeLow }) => Math.max(3e6, regimeLow), formula: 'Re_hi = 3e6', source: 'Schlichting, Boundary-Layer Theory, ch. 21' })]),
  ways('laminarShare', [way({ needs: ['plateTransitionReynolds', 'reynolds'], when: stream, value: ({ plateTransitionReynolds, reynolds }) => Math.min(1, plateTransitionReynolds / reynolds), formula: 's = Re_tr/Re_L, at most 1', source: definition })]),
];

const shearFrom = { needs: ['skinFrictionCoefficient', 'density', 'speed'], value: (of: Readonly<Record<'skinFrictionCoefficient' | 'density' | 'speed', number>>) => (of.skinFrictionCoefficient * of.density * of.speed ** 2) / 2 } as const;
const factors = ['roughnessFactorFriction', 'viscosityFactorFriction', 'buoyancyFactorShear', 'rarefactionFactorFriction'] as const;
const product = (of: Readonly<Record<(typeof factors)[number], number>>): number => factors.reduce((p, id) => p * of[id], 1);

const friction: Definition[] = [
  quantity('plateFrictionEnd', { symbol: 'c_f,0', name: 'local skin friction at the end of the plate, smooth', unit: '1' }, [
    way({ needs: ['reynolds'], when: laminar, range: { reynolds: laminarTo }, scatter: 0.02, value: ({ reynolds }) => laminarPlateFriction({ reynolds }).local, formula: 'c_f = 0.664 Re^(-1/2)', source: blasius }),
    way({ needs: ['reynolds', 'plateTransitionReynolds'], when: { ...stream, regime: 'transitional' }, range: { reynolds: [1e5, 1e9] }, scatter: 0.3, value: ({ reynolds, plateTransitionReynolds }) => localFriction(reynolds, plateTransitionReynolds), formula: 'c_f = 0.664 Re^(-1/2) to Re_tr, 0.455/ln^2(0.06 Re) beyond', source: `${blasius}; ${white}`, note: 'transition moves: both laws bracket it' }),
    ...([[5e5, 3e7, 0.08], [3e7, 1e9, 0.12]] as const).map(([from, to, scatter]) => way({ needs: ['reynolds'], when: { ...stream, regime: 'turbulent' }, range: { reynolds: [from, to] }, scatter, value: ({ reynolds }) => turbulentPlateFriction({ reynolds }).white, formula: 'c_f = 0.455/ln^2(0.06 Re)', source: white, note: 'on the safe side: measured friction and the law of Schultz-Grunow lie 4 % lower at 1e6, 8 % at 1e8, 11 % at 1e9; the spread holds both' })),
  ]),
  quantity('plateFrictionWorst', { symbol: 'c_f,max', name: 'largest local skin friction behind the first twentieth', unit: '1' }, [
    way({ needs: ['reynolds'], when: laminar, range: { reynolds: laminarTo }, scatter: 0.05, value: ({ reynolds }) => laminarPlateFriction({ reynolds: 0.05 * reynolds }).local, formula: 'c_f = 0.664 Re_x^(-1/2) at x = 0.05 L', source: blasius }),
    way({ needs: ['reynolds', 'plateTransitionReynolds'], when: behind, range: { reynolds: [1e5, 1e9], plateTransitionReynolds: [1e5, 4e6] }, scatter: 0.15, value: ({ reynolds, plateTransitionReynolds }) => largestFriction(reynolds, plateTransitionReynolds), formula: 'larger of c_f at x = 0.05 L and just behind transition', source: `${blasius}; ${white}` }),
  ]),
  quantity('plateFrictionSecond', { symbol: 'c_f,2', name: 'local skin friction at the end of the plate by a second law', unit: '1' }, [
    way({ needs: ['reynolds'], when: { ...stream, regime: 'turbulent' }, range: { reynolds: turbulentOver }, value: ({ reynolds }) => turbulentPlateFriction({ reynolds }).schultzGrunow, formula: 'c_f = 0.370 (log10 Re)^(-2.584)', source: 'Schultz-Grunow, Luftfahrtforschung 17 (1940) 239' }),
  ]),
  quantity('plateFrictionDisagreement', { symbol: 'c_f,2/c_f,0', name: 'second law of skin friction over the first', unit: '1' }, [
    way({ needs: ['plateFrictionSecond', 'plateFrictionEnd'], value: ({ plateFrictionSecond, plateFrictionEnd }) => plateFrictionSecond / plateFrictionEnd, formula: 'c_f,2/c_f,0', source: definition }),
  ]),
  ways('skinFrictionCoefficient', [
    way({ needs: ['plateFrictionEnd', ...factors], when: stream, value: (of) => of.plateFrictionEnd * product(of), formula: 'c_f = c_f,0 times the factors of roughness, viscosity, buoyancy, rarefaction', source: 'factors of the effects that act; local, at the end of the plate' }),
  ]),
  ways('wallShearPlain', [way({ needs: ['plateFrictionEnd', 'density', 'speed'], when: stream, value: ({ plateFrictionEnd, density, speed }) => (plateFrictionEnd * density * speed ** 2) / 2, formula: 'tau_w = c_f,0 rho U^2/2', source: definition })]),
  ways('wallShear', [way({ ...shearFrom, when: stream, formula: 'tau_w = c_f rho U^2/2 at the end of the plate', source: definition })]),
  ways('wallShear@worst', [
    way({ needs: ['plateFrictionWorst', 'density', 'speed', ...factors], when: stream, value: (of) => (of.plateFrictionWorst * product(of) * of.density * of.speed ** 2) / 2, formula: 'tau_w = c_f,max rho U^2/2 times the factors', source: definition }),
  ]),
  ways('frictionReynolds', [way({ needs: ['frictionVelocityPlain', 'boundaryLayerThickness', 'kinematicViscosity'], value: (of) => (of.frictionVelocityPlain * of.boundaryLayerThickness) / of.kinematicViscosity, formula: 'delta+ = u_tau delta/nu', source: definition })]),
  ways('dragCoefficientPlain', [
    way({ needs: ['reynolds'], when: laminar, range: { reynolds: laminarTo }, scatter: 0.02, value: ({ reynolds }) => laminarPlateFriction({ reynolds }).mean, formula: 'C_F = 1.328 Re^(-1/2)', source: blasius }),
    way({ needs: ['reynolds', 'plateTransitionReynolds'], when: behind, range: { reynolds: [1e5, 1e9], plateTransitionReynolds: [1e5, 4e6] }, scatter: 0.1, value: ({ reynolds, plateTransitionReynolds }) => meanPlateFriction({ reynolds, transition: plateTransitionReynolds, law: 'schlichting' }), formula: 'C_F = 0.455/(log10 Re)^2.58 - A/Re, A from continuity at Re_tr', source: 'Schlichting, Boundary-Layer Theory, ch. 21' }),
  ]),
  ways('dragCoefficientSecond', [
    way({ needs: ['reynolds', 'plateTransitionReynolds'], when: behind, range: { reynolds: [1e5, 1e9], plateTransitionReynolds: [1e5, 4e6] }, scatter: 0.1, value: ({ reynolds, plateTransitionReynolds }) => meanPlateFriction({ reynolds, transition: plateTransitionReynolds, law: 'white' }), formula: 'C_F = 0.523/ln^2(0.06 Re) - A/Re', source: 'White, Viscous Fluid Flow, 3rd ed. (2006)' }),
  ]),
  ways('dragCoefficient', [way({ needs: ['dragCoefficientPlain', ...factors], when: stream, value: (of) => of.dragCoefficientPlain * product(of), formula: 'C_F = C_F,0 times the factors of roughness, viscosity, buoyancy, rarefaction', source: 'one side, mean over the length' })]),
  ways('frontalArea', [way({ needs: ['plateWidth', 'sizes.length'], value: (of) => of.plateWidth * of['sizes.length'], formula: 'A_f = W L, one side', source: definition })]),
];

const metals = [0.004, 0.1] as const;
const solved = 'boundary-layer equations with the turbulent Prandtl number of Kays, J. Heat Transfer 116 (1994) 284, solved for this';
const lowLaw = { temperature: '(0.979 Pe^(1/2) + 1.093e-3 Re^1.06 Pr^1.207) F', flux: '(1.132 Pe^(1/2) + 6.84e-4 Re^1.086 Pr^1.184) F' } as const;
/** A liquid metal behind the transition, a plate shorter than that taken as laminar or as turbulent from its edge: the laws with Pr^(1/3) hold from Pr 0.6 on and would give twice the transfer. */
const metalWays = (reynolds: readonly [number, number], scatter: number, short: 'laminar' | 'turbulent'): Way[] => (['temperature', 'flux'] as const).map((wall) => way({
  needs: ['reynoldsFilm', 'prandtlFilm', 'plateTransitionReynolds', 'plateStartFactor'], when: { ...stream, wallKind: wall === 'flux' ? 'flux' : temperatureKinds }, range: { reynoldsFilm: reynolds, prandtlFilm: metals, plateTransitionReynolds: [1e5, 4e6] }, scatter,
  value: (of) => mixedLowPrandtlPlate({ reynolds: of.reynoldsFilm, prandtl: of.prandtlFilm, wall, transition: short === 'turbulent' && of.reynoldsFilm <= of.plateTransitionReynolds ? 0 : of.plateTransitionReynolds }) * of.plateStartFactor,
  formula: `Nu of Churchill and Ozoe to Re_tr, beyond it the growth of Nu = ${lowLaw[wall]} added, film`, source: `Churchill and Ozoe, J. Heat Transfer 95 (1973) 78; ${solved}`, note: 'the turbulent Prandtl number is uncertain at small Pr: at 0.85 the turbulent part lies up to 20 % above',
}));

const heat: Definition[] = [
  quantity('plateStartFactor', { symbol: 'F_x0', name: 'what an unheated start makes of the mean Nusselt number', unit: '1' }, [
    way({ needs: ['sizes.unheatedStart', 'sizes.length'], when: laminar, range: {}, value: (of) => unheatedStart({ share: of['sizes.unheatedStart'] / of['sizes.length'], layer: 'laminar' }), formula: 'F = (1 - s^(3/4))^(2/3)/(1 - s), s = x_0/L', source: 'Ameel, Int. Commun. Heat Mass Transfer 24 (1997) 1113' }),
    way({ needs: ['sizes.unheatedStart', 'sizes.length'], when: behind, scatter: 0.05, value: (of) => unheatedStart({ share: of['sizes.unheatedStart'] / of['sizes.length'], layer: 'turbulent' }), formula: 'F = (1 - s^(9/10))^(8/9)/(1 - s), s = x_0/L', source: 'Ameel, Int. Commun. Heat Mass Transfer 24 (1997) 1113' }),
    way({ needs: [], value: () => 1, formula: 'F = 1', source: 'heated from the edge' }),
  ]),
  ways('nusseltLaminar', (['temperature', 'flux'] as const).map((wall) => way({
    needs: ['reynoldsFilm', 'prandtlFilm', 'plateStartFactor'], when: { ...stream, wallKind: wall === 'flux' ? 'flux' : temperatureKinds }, range: { reynoldsFilm: laminarTo, prandtlFilm: [1e-3, 1e4] }, scatter: 0.05,
    value: ({ reynoldsFilm, prandtlFilm, plateStartFactor }) => churchillOzoe({ reynolds: reynoldsFilm, prandtl: prandtlFilm, wall }).mean * plateStartFactor,
    formula: wall === 'flux' ? 'Nu = 1.5 x 0.4637 Re^(1/2) Pr^(1/3)/(1 + (0.0207/Pr)^(2/3))^(1/4) F, flux over the mean difference, film' : 'Nu = 2 x 0.3387 Re^(1/2) Pr^(1/3)/(1 + (0.0468/Pr)^(2/3))^(1/4) F, film',
    source: 'Churchill and Ozoe, J. Heat Transfer 95 (1973) 78 and 416',
  }))),
  ways('nusseltBetween', [
    way({ needs: ['reynoldsFilm', 'prandtlFilm', 'plateTransitionReynolds', 'plateStartFactor'], when: stream, range: { reynoldsFilm: [1e5, 1e8], prandtlFilm: [0.6, 60], plateTransitionReynolds: [1e5, 4e6] }, scatter: 0.3, value: ({ reynoldsFilm, prandtlFilm, plateTransitionReynolds, plateStartFactor }) => mixedPlateNusselt({ reynolds: reynoldsFilm, prandtl: prandtlFilm, transition: plateTransitionReynolds }) * plateStartFactor, formula: 'Nu = 0.664 Re^(1/2) Pr^(1/3) F to Re_tr, (0.037 Re^0.8 - B) Pr^(1/3) F beyond, film', source: 'Incropera and DeWitt, Fundamentals of Heat and Mass Transfer, ch. 7', note: 'transition moves: run laminar and turbulent from the edge for the bracket' }),
    ...metalWays([1e5, 1e7], 0.3, 'laminar'),
  ]),
  ways('nusseltTurbulent', [
    way({ needs: ['reynoldsFilm', 'prandtlFilm', 'plateTransitionReynolds', 'plateStartFactor'], when: stream, range: { reynoldsFilm: [5e5, 1e8], prandtlFilm: [0.6, 60], plateTransitionReynolds: [1e5, 4e6] }, scatter: 0.15, value: ({ reynoldsFilm, prandtlFilm, plateTransitionReynolds, plateStartFactor }) => mixedPlateNusselt({ reynolds: reynoldsFilm, prandtl: prandtlFilm, transition: reynoldsFilm > plateTransitionReynolds ? plateTransitionReynolds : 0 }) * plateStartFactor, formula: 'Nu = (0.037 Re^0.8 - B) Pr^(1/3) F, B = 0.037 Re_tr^0.8 - 0.664 Re_tr^(1/2), film', source: 'Incropera and DeWitt, Fundamentals of Heat and Mass Transfer, ch. 7', note: 'a uniform flux gives the same within 4 %' }),
    ...metalWays([3e5, 1e7], 0.2, 'turbulent'),
  ]),
  ways('nusseltSecond', [
    way({ needs: ['reynoldsFilm', 'prandtlFilm', 'plateStartFactor'], when: { ...laminar, wallKind: temperatureKinds }, range: { reynoldsFilm: laminarTo, prandtlFilm: [0.6, 1e4] }, scatter: 0.05, value: ({ reynoldsFilm, prandtlFilm, plateStartFactor }) => pohlhausenMean({ reynolds: reynoldsFilm, prandtl: prandtlFilm }) * plateStartFactor, formula: 'Nu = 0.664 Re^(1/2) Pr^(1/3) F, film', source: 'Pohlhausen, Z. angew. Math. Mech. 1 (1921) 115' }),
    way({ needs: ['reynoldsFilm', 'prandtlFilm', 'plateStartFactor'], when: { ...stream, regime: 'turbulent' }, range: { reynoldsFilm: [5e5, 1e8], prandtlFilm: [0.6, 60] }, scatter: 0.15, value: ({ reynoldsFilm, prandtlFilm, plateStartFactor }) => mixedPlateNusselt({ reynolds: reynoldsFilm, prandtl: prandtlFilm, transition: 0 }) * plateStartFactor, formula: 'Nu = 0.037 Re^0.8 Pr^(1/3) F, turbulent from the edge, film', source: 'Incropera and DeWitt, Fundamentals of Heat and Mass Transfer, ch. 7' }),
    ...(['temperature', 'flux'] as const).map((wall) => way({ needs: ['reynoldsFilm', 'prandtlFilm', 'plateStartFactor'], when: { ...laminar, wallKind: wall === 'flux' ? 'flux' : temperatureKinds }, range: { reynoldsFilm: laminarTo, prandtlFilm: [1e-4, 0.05] }, scatter: 0.2, value: ({ reynoldsFilm, prandtlFilm, plateStartFactor }) => (wall === 'flux' ? 1.329 : 1.128) * Math.sqrt(reynoldsFilm * prandtlFilm) * plateStartFactor, formula: `Nu = ${wall === 'flux' ? 1.329 : 1.128} Pe^(1/2) F, film`, source: 'limit of small Pr, as in Incropera and DeWitt, Fundamentals of Heat and Mass Transfer, ch. 7; 10 % high at Pr 0.01, 20 % at 0.05' })),
    ...(['temperature', 'flux'] as const).map((wall) => way({ needs: ['reynoldsFilm', 'prandtlFilm', 'plateStartFactor'], when: { ...stream, regime: 'turbulent', wallKind: wall === 'flux' ? 'flux' : temperatureKinds }, range: { reynoldsFilm: [3e5, 1e7], prandtlFilm: metals }, scatter: 0.2, value: ({ reynoldsFilm, prandtlFilm, plateStartFactor }) => lowPrandtlPlate({ reynolds: reynoldsFilm, prandtl: prandtlFilm, wall, turbulent: 'constant' }) * plateStartFactor, formula: `Nu = (${wall === 'flux' ? '1.155 Pe^(1/2) + 2.884e-3 Re^0.986 Pr^1.063' : '0.9885 Pe^(1/2) + 4.016e-3 Re^0.968 Pr^1.092'}) F, turbulent from the edge, film`, source: 'the same equations with a turbulent Prandtl number of 0.85' })),
  ]),
];

const thick = (id: string, name: string, symbol: string, c: number, share: number): Definition =>
  quantity(id, { symbol, name: `${name} at the end of the plate`, unit: 'm' }, [
    way({ needs: ['sizes.length', 'reynolds'], when: laminar, value: (of) => (c * of['sizes.length']) / Math.sqrt(of.reynolds), formula: `${symbol} = ${c} L Re^(-1/2)`, source: blasius }),
    way({ needs: ['boundaryLayerThickness'], when: behind, scatter: 0.2, value: ({ boundaryLayerThickness }) => share * boundaryLayerThickness, formula: `${symbol} = ${share.toPrecision(3)} delta`, source: 'one-seventh power profile' }),
  ]);
const laminarThickness = way({ needs: ['sizes.length', 'reynolds'], when: laminar, scatter: 0.02, value: (of) => (4.91 * of['sizes.length']) / Math.sqrt(of.reynolds), formula: 'delta = 4.91 L Re^(-1/2), u = 0.99 U', source: blasius });
const layers: Definition[] = [
  ways('boundaryLayerThickness', [
    laminarThickness,
    way({ needs: ['sizes.length', 'reynolds'], when: behind, range: { reynolds: [3e5, 1e7] }, scatter: 0.15, value: (of) => of['sizes.length'] * turbulentPlateThickness({ reynolds: of.reynolds }).fifth, formula: 'delta = 0.37 L Re^(-1/5)', source: 'Prandtl 1927, one-seventh power profile, turbulent from the edge' }),
    way({ needs: ['sizes.length', 'reynolds'], when: behind, range: { reynolds: [1e7, 1e9] }, scatter: 0.15, value: (of) => of['sizes.length'] * turbulentPlateThickness({ reynolds: of.reynolds }).seventh, formula: 'delta = 0.16 L Re^(-1/7)', source: 'White, Viscous Fluid Flow, 3rd ed. (2006), turbulent from the edge' }),
  ]),
  ways('thermalLayerThickness', [
    way({ needs: ['boundaryLayerThickness', 'prandtl'], when: laminar, range: { prandtl: [0.6, 1e5] }, scatter: 0.05, value: ({ boundaryLayerThickness, prandtl }) => boundaryLayerThickness * prandtl ** (-1 / 3), formula: 'delta_T = delta Pr^(-1/3)', source: 'Pohlhausen, Z. angew. Math. Mech. 1 (1921) 115' }),
    way({ needs: ['sizes.length', 'peclet'], when: laminar, scatter: 0.25, value: (of) => (3.64 * of['sizes.length']) / Math.sqrt(of.peclet), formula: 'delta_T = 3.64 L Pe^(-1/2), Pr below 0.6', source: 'limit of small Pr: the layer moves at U, error function to 99 %' }),
    way({ needs: ['boundaryLayerThickness', 'sizes.length', 'peclet', 'prandtl'], when: behind, range: { prandtl: [1e-4, 0.1] }, scatter: 0.3, value: (of) => Math.max(of.boundaryLayerThickness, (3.64 * of['sizes.length']) / Math.sqrt(of.peclet)), formula: 'delta_T = max(delta, 3.64 L Pe^(-1/2)), Pr below 0.1', source: 'conduction reaches beyond the layer of momentum, error function to 99 %' }),
    way({ needs: ['boundaryLayerThickness'], when: behind, scatter: 0.2, value: ({ boundaryLayerThickness }) => boundaryLayerThickness, formula: 'delta_T = delta', source: 'turbulent mixing carries both alike' }),
  ]),
  thick('plateDisplacementThickness', 'displacement thickness', 'delta*', 1.7208, 1 / 8),
  thick('plateMomentumThickness', 'momentum thickness', 'theta', 0.66412, 7 / 72),
  ways('peakOverMean', [way({ needs: [], when: stream, value: () => 1, formula: 'u_max/U = 1', source: 'flat plate without pressure gradient' })]),
];

/** A plate along a stream. */
export const plateStream: Definition[] = [...regime, ...friction, ...heat, ...layers];
