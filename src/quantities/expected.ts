import { quantity, way, type Definition, type Way } from '../workings/index.ts';

const practice = 'common practice';
const definition = 'definition';
const cMu = 0.09;
const decaySource = 'k-epsilon equations without shear, C_eps2 = 1.92';
const exponent = 1.92 - 1;

/** Share of k that is left after a run: k/k_0 = [1 + 0.92 (eps_0/k_0) x/U]^(-1/0.92). */
const left = (rate: number, run: number, speed: number): number => (1 + (exponent * rate * run) / speed) ** (-1 / exponent);
const atRatio = (ratio: number): Way =>
  way({ needs: ['turbulentKineticEnergy', 'kinematicViscosity', 'domainUpstream', 'speed'], when: { flowClass: ['body', 'jet'] }, value: (of) => left((cMu * of.turbulentKineticEnergy) / (ratio * of.kinematicViscosity), of.domainUpstream, of.speed), formula: `[1 + 0.92 (C_mu k/(${ratio} nu)) L_up/U]^(-1/0.92)`, source: decaySource });

/** Numbers that a run is to be held against, with the limits of what it may leave open. */
export const expected: Definition[] = [
  quantity('turbulenceKept', { symbol: 'k/k_0', name: 'share of the inlet turbulence that reaches the body', unit: '1' }, [
    way({ needs: ['dissipationRate', 'turbulentKineticEnergy', 'domainUpstream', 'speed'], when: { flowClass: ['body', 'jet'] }, scatter: 0.2, value: (of) => left(of.dissipationRate / of.turbulentKineticEnergy, of.domainUpstream, of.speed), formula: '[1 + 0.92 (eps/k) L_up/U]^(-1/0.92)', source: decaySource }),
  ]),
  quantity('turbulenceIntensityBody', { symbol: 'I_b', name: 'turbulence intensity that reaches the body', unit: '1' }, [
    way({ needs: ['turbulenceIntensity', 'turbulenceKept'], value: ({ turbulenceIntensity, turbulenceKept }) => turbulenceIntensity * Math.sqrt(turbulenceKept), formula: 'I_b = I sqrt(k/k_0)', source: definition }),
  ]),
  ...([['1', 1], ['10', 10], ['100', 100]] as const).map(([word, ratio]) => quantity(`turbulenceKeptRatio${word}`, { symbol: 'k/k_0', name: `share of the inlet turbulence that reaches the body with a viscosity ratio of ${ratio}`, unit: '1' }, [atRatio(ratio)])),
  quantity('eddyViscosityCore', { symbol: 'nu_t/nu', name: 'eddy over molecular viscosity expected in the core', unit: '1' }, [
    way({ needs: ['frictionReynolds'], when: { flowClass: 'internal', regime: ['transitional', 'turbulent'] }, scatter: 0.5, value: ({ frictionReynolds }) => 0.07 * frictionReynolds, formula: 'nu_t/nu = 0.07 delta+', source: `${practice}: parabolic eddy viscosity of a duct` }),
  ]),
  quantity('logLayerTop', { symbol: 'y+_log', name: 'upper end of the logarithmic layer in viscous lengths', unit: '1' }, [
    way({ needs: ['frictionReynolds'], value: ({ frictionReynolds }) => 0.2 * frictionReynolds, formula: 'y+ = 0.2 delta+', source: practice }),
  ]),
  quantity('yPlusAccepted', { symbol: 'y+_max', name: 'largest distance of the first node that is accepted, in viscous lengths', unit: '1' }, [
    way({ needs: ['frictionReynolds'], when: { 'choice.near-wall-treatment': 'law-of-the-wall' }, value: ({ frictionReynolds }) => 0.2 * frictionReynolds, formula: 'y+ = 0.2 delta+', source: practice }),
    way({ needs: ['yPlusTarget'], when: { 'choice.near-wall-treatment': ['resolved', 'blended'] }, value: ({ yPlusTarget }) => 2 * yPlusTarget, formula: 'twice y+ aimed at', source: practice }),
  ]),
  quantity('massClosure', { symbol: 'dm', name: 'imbalance of mass that may be left', unit: 'kg/s' }, [
    way({ needs: ['massFlow', 'massTolerance'], value: ({ massFlow, massTolerance }) => Math.min(1e-4, massTolerance) * massFlow, formula: 'min(1e-4, w_m) m', source: practice }),
  ]),
  quantity('heatClosure', { symbol: 'dQ', name: 'imbalance of heat that may be left', unit: 'W' }, [
    way({ needs: ['heatRate', 'balanceTolerance'], value: ({ heatRate, balanceTolerance }) => Math.min(0.005, balanceTolerance) * Math.abs(heatRate), formula: 'min(0.005, w_b) |Q|', source: practice }),
  ]),
  quantity('returningFlow', { symbol: 'm_ret', name: 'flow that may come back through the outlet', unit: 'kg/s' }, [
    way({ needs: ['massFlow'], value: ({ massFlow }) => 0.01 * massFlow, formula: '0.01 m', source: practice }),
  ]),
  quantity('samplingInterval', { symbol: 'dt_s', name: 'time between samples of a monitor', unit: 's' }, [
    way({ needs: ['frictionVelocity', 'kinematicViscosity'], when: { 'choice.turbulence-treatment': ['les', 'dns'] }, value: (of) => (5 * of.kinematicViscosity) / of.frictionVelocity ** 2, formula: '5 nu/u_tau^2', source: `${practice}: 20 samples in the period 100 nu/u_tau^2 of the eddies at the wall` }),
    way({ needs: ['time.period'], value: (of) => of['time.period'] / 60, formula: 'T/60', source: `${practice}: 20 samples of the third harmonic` }),
    way({ needs: ['sheddingFrequency'], when: { separated: 'yes' }, value: ({ sheddingFrequency }) => 1 / (40 * sheddingFrequency), formula: '1/(20 x 2 f_s)', source: `${practice}: drag swings at twice the frequency of the lift` }),
    way({ needs: ['freeFallTime'], when: { imposedFlow: 'no' }, value: ({ freeFallTime }) => freeFallTime / 10, formula: 't_ff/10', source: practice }),
    way({ needs: ['coreCellSize', 'speed'], when: { 'choice.turbulence-treatment': ['hybrid', 'wall-modelled-les'] }, value: (of) => (4 * of.coreCellSize) / (20 * of.speed), formula: '4 h_c/(20 U)', source: `${practice}: the smallest eddy carried is four cells long` }),
  ]),
  quantity('probeDepth', { symbol: 'delta/3', name: 'wall distance of probes in the layer', unit: 'm' }, [way({ needs: ['boundaryLayerThickness'], value: ({ boundaryLayerThickness }) => boundaryLayerThickness / 3, formula: 'delta/3', source: practice })]),
  quantity('probeOutside', { symbol: '1.5 delta', name: 'wall distance of probes outside the layer', unit: 'm' }, [way({ needs: ['boundaryLayerThickness'], value: ({ boundaryLayerThickness }) => 1.5 * boundaryLayerThickness, formula: '1.5 delta', source: practice })]),
];
