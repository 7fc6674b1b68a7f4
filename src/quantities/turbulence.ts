import { quantity, way, type Definition } from '../workings/index.ts';

const cMu = 0.09;
const definition = 'Launder and Spalding, Comput. Methods Appl. Mech. Eng. 3 (1974) 269; C_mu = 0.09';
const practice = 'common practice';

/** Turbulence that arrives at the inlet, and the smallest scales of turbulence inside. */
export const turbulence: Definition[] = [
  quantity('turbulenceIntensity', { symbol: 'I', name: 'turbulence intensity at the inlet', unit: '1' }, [
    way({ needs: ['inlet.turbulence.intensity'], value: (of) => of['inlet.turbulence.intensity'], formula: 'I as given', source: 'the case' }),
    way({ needs: ['reynolds'], when: { flowClass: 'internal', regime: ['transitional', 'turbulent'] }, as: 'assumed', scatter: 0.3, value: ({ reynolds }) => 0.16 * reynolds ** -0.125, formula: 'I = 0.16 Re^(-1/8), core of a developed duct', source: `${practice}, from the developed duct` }),
    way({ needs: [], when: { flowClass: ['body', 'jet'], imposedFlow: 'yes' }, as: 'assumed', scatter: 2, value: () => 0.01, formula: 'I = 1 %', source: `${practice}: a quiet stream; 0.1 % in a quiet tunnel to 5 % behind a fan` }),
  ]),
  quantity('turbulenceLength', { symbol: 'l', name: 'turbulence length at the inlet, that of eps = C_mu^(3/4) k^(3/2)/l', unit: 'm' }, [
    way({ needs: ['inlet.turbulence.length'], value: (of) => of['inlet.turbulence.length'], formula: 'l as given', source: 'the case' }),
    way({ needs: ['inlet.turbulence.viscosityRatio', 'turbulentKineticEnergy', 'kinematicViscosity'], value: (of) => (cMu ** -0.25 * of['inlet.turbulence.viscosityRatio'] * of.kinematicViscosity) / Math.sqrt(of.turbulentKineticEnergy), formula: 'l = C_mu^(-1/4) R nu/sqrt(k)', source: definition }),
    way({ needs: ['hydraulicDiameter'], when: { flowClass: 'internal' }, as: 'assumed', scatter: 0.5, value: ({ hydraulicDiameter }) => 0.07 * hydraulicDiameter, formula: 'l = 0.07 D_h', source: `${practice}, developed duct` }),
    way({ needs: ['length'], when: { flowClass: ['body', 'jet'], imposedFlow: 'yes' }, as: 'assumed', scatter: 1, value: ({ length }) => 0.01 * length, formula: 'l = 0.01 L', source: practice }),
  ]),
  quantity('turbulentKineticEnergy', { symbol: 'k_t', name: 'turbulent kinetic energy at the inlet', unit: 'm^2/s^2' }, [
    way({ needs: ['speed', 'turbulenceIntensity'], value: ({ speed, turbulenceIntensity }) => 1.5 * (speed * turbulenceIntensity) ** 2, formula: 'k = 1.5 (U I)^2', source: 'definition of the intensity, isotropic' }),
  ]),
  quantity('dissipationRate', { symbol: 'eps', name: 'dissipation rate at the inlet', unit: 'm^2/s^3' }, [
    way({ needs: ['turbulentKineticEnergy', 'turbulenceLength'], value: ({ turbulentKineticEnergy, turbulenceLength }) => (cMu ** 0.75 * turbulentKineticEnergy ** 1.5) / turbulenceLength, formula: 'eps = C_mu^(3/4) k^(3/2)/l', source: definition }),
  ]),
  quantity('specificDissipationRate', { symbol: 'omega', name: 'specific dissipation rate at the inlet', unit: '1/s' }, [
    way({ needs: ['turbulentKineticEnergy', 'turbulenceLength'], value: ({ turbulentKineticEnergy, turbulenceLength }) => Math.sqrt(turbulentKineticEnergy) / (cMu ** 0.25 * turbulenceLength), formula: 'omega = sqrt(k)/(C_mu^(1/4) l)', source: definition }),
  ]),
  quantity('viscosityRatio', { symbol: 'R', name: 'eddy over molecular viscosity at the inlet', unit: '1' }, [
    way({ needs: ['turbulentKineticEnergy', 'specificDissipationRate', 'kinematicViscosity'], value: ({ turbulentKineticEnergy, specificDissipationRate, kinematicViscosity }) => turbulentKineticEnergy / (specificDissipationRate * kinematicViscosity), formula: 'R = k/(omega nu)', source: definition }),
  ]),
  quantity('meanDissipationRate', { symbol: 'eps_m', name: 'mean dissipation rate of the flow', unit: 'm^2/s^3' }, [
    way({ needs: ['frictionPlain', 'speed', 'hydraulicDiameter'], when: { flowClass: 'internal', regime: ['transitional', 'turbulent'] }, value: ({ frictionPlain, speed, hydraulicDiameter }) => (frictionPlain * speed ** 3) / (2 * hydraulicDiameter), formula: 'eps = f U^3/(2 D_h)', source: 'global energy balance of a developed duct, exact' }),
    way({ needs: ['speed', 'length'], when: { flowClass: ['body', 'jet'], regime: ['transitional', 'turbulent'] }, scatter: 2, value: ({ speed, length }) => (0.015 * speed ** 3) / length, formula: 'eps = 0.015 U^3/L', source: `${practice}, order of a wake or jet` }),
  ]),
  quantity('kolmogorovLength', { symbol: 'eta', name: 'Kolmogorov length', unit: 'm' }, [
    way({ needs: ['kinematicViscosity', 'meanDissipationRate'], value: ({ kinematicViscosity, meanDissipationRate }) => (kinematicViscosity ** 3 / meanDissipationRate) ** 0.25, formula: 'eta = (nu^3/eps)^(1/4)', source: 'Kolmogorov 1941' }),
  ]),
  quantity('kolmogorovTime', { symbol: 'tau_eta', name: 'Kolmogorov time', unit: 's' }, [
    way({ needs: ['kinematicViscosity', 'meanDissipationRate'], value: ({ kinematicViscosity, meanDissipationRate }) => Math.sqrt(kinematicViscosity / meanDissipationRate), formula: 'tau_eta = sqrt(nu/eps)', source: 'Kolmogorov 1941' }),
  ]),
  quantity('kolmogorovSpeed', { symbol: 'u_eta', name: 'Kolmogorov speed', unit: 'm/s' }, [
    way({ needs: ['kinematicViscosity', 'meanDissipationRate'], value: ({ kinematicViscosity, meanDissipationRate }) => (kinematicViscosity * meanDissipationRate) ** 0.25, formula: 'u_eta = (nu eps)^(1/4)', source: 'Kolmogorov 1941' }),
  ]),
  quantity('batchelorLength', { symbol: 'eta_B', name: 'Batchelor length', unit: 'm' }, [
    way({ needs: ['kolmogorovLength', 'schmidt'], when: { 'has.species': 'yes' }, value: ({ kolmogorovLength, schmidt }) => kolmogorovLength / Math.sqrt(schmidt), formula: 'eta_B = eta Sc^(-1/2)', source: 'Batchelor 1959' }),
    way({ needs: ['kolmogorovLength', 'prandtl'], value: ({ kolmogorovLength, prandtl }) => kolmogorovLength * (prandtl >= 1 ? prandtl ** -0.5 : prandtl ** -0.75), formula: 'eta_B = eta Pr^(-1/2), eta Pr^(-3/4) below Pr = 1', source: 'Batchelor 1959; Obukhov 1949, Corrsin 1951' }),
  ]),
];
