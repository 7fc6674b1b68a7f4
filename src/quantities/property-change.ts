import { quantity, way, type Definition, type Way } from '../workings/index.ts';
import { gasFrictionFactor, gasNusseltFactor, liquidFrictionFactor, liquidNusseltFactor } from './correlations/index.ts';
import { factor, noFactor } from './factor.ts';

const definition = 'definition';
const petukhov = 'Petukhov, Adv. Heat Transfer 6 (1970) 503';
const siederTate = 'Sieder and Tate, Ind. Eng. Chem. 28 (1936) 1429';
const exponential = 'developed profile with viscosity exponential in temperature and uniform flux; exponent 0.55 within 0.03';
const kays = 'Kays and Crawford, Convective Heat and Mass Transfer; from memory';

/** How viscosity, conductivity and heat capacity change from the bulk to the wall and over the range, and what that makes of the results. */
export const propertyChange: Definition[] = [...ratios(), ...passageFactors(), ...ranges()];

function ratios(): Definition[] {
  const further = (a: number, b: number): number => (Math.abs(Math.log(a)) >= Math.abs(Math.log(b)) ? a : b);
  return [
    quantity('viscosityBulkOverWall', { symbol: 'mu_b/mu_w', name: 'viscosity of the bulk or the undisturbed fluid over that at the wall', unit: '1' }, [
      way({ needs: [], when: { energySolved: 'no' }, value: () => 1, formula: 'mu_b/mu_w = 1', source: 'one temperature throughout' }),
      way({ needs: ['viscosityBulk', 'viscosityWall'], when: { flowClass: ['internal', 'continuum'] }, value: ({ viscosityBulk, viscosityWall }) => viscosityBulk / viscosityWall, formula: 'mu_b/mu_w', source: definition }),
      way({ needs: ['viscosityCold', 'viscosityWall'], when: { flowClass: ['body', 'solid'], heatDirection: 'heating' }, value: ({ viscosityCold, viscosityWall }) => viscosityCold / viscosityWall, formula: 'mu_far/mu_w, the fluid far away is the coldest', source: definition }),
      way({ needs: ['viscosityHot', 'viscosityWall'], when: { flowClass: ['body', 'solid'], heatDirection: 'cooling' }, value: ({ viscosityHot, viscosityWall }) => viscosityHot / viscosityWall, formula: 'mu_far/mu_w, the fluid far away is the hottest', source: definition }),
      way({ needs: [], when: { flowClass: ['body', 'solid'], heatDirection: 'none' }, value: () => 1, formula: 'mu_far/mu_w = 1', source: 'no heat through the wall' }),
      way({ needs: ['viscosity', 'viscosityHot', 'viscosityCold'], when: { flowClass: 'enclosure' }, value: ({ viscosity, viscosityHot, viscosityCold }) => further(viscosity / viscosityHot, viscosity / viscosityCold), formula: 'mu/mu_w at the wall where it lies further from 1, mu at the mean of the walls', source: definition }),
      way({ needs: ['viscosityCold', 'viscosityHot'], when: { flowClass: 'jet' }, value: ({ viscosityCold, viscosityHot }) => viscosityCold / viscosityHot, formula: 'mu_c/mu_h of the two streams', source: definition }),
    ]),
    quantity('temperatureBulkOverWall', { symbol: 'T_b/T_w', name: 'absolute temperature of the bulk over that of the wall', unit: '1' }, [
      way({ needs: ['bulkTemperature', 'wallTemperature'], value: ({ bulkTemperature, wallTemperature }) => bulkTemperature / wallTemperature, formula: 'T_b/T_w', source: definition }),
    ]),
  ];
}

type Law = (of: { ratio: number; regime: 'laminar' | 'turbulent' }) => number;

/** One law in its two regimes; between them the mean of the logarithms, its spread reaching to both. */
function regimes(medium: 'liquid' | 'gas', need: string, law: Law, about: Readonly<Record<'laminar' | 'turbulent', { readonly formula: string; readonly source: string; readonly range: readonly [number, number]; readonly scatter: number }>>): Way[] {
  const when = { flowClass: 'internal', energySolved: 'yes', fluidGiven: 'material', medium } as const;
  const at = (of: Readonly<Record<string, number>>, regime: 'laminar' | 'turbulent'): number => law({ ratio: of[need] as number, regime });
  const { laminar, turbulent } = about;
  return [
    ...(['laminar', 'turbulent'] as const).map((regime): Way => ({ needs: [need], when: { ...when, regime }, value: (of) => at(of, regime), formula: about[regime].formula, source: about[regime].source, range: { [need]: about[regime].range }, scatter: about[regime].scatter })),
    {
      needs: [need], when: { ...when, regime: 'transitional' }, value: (of) => Math.sqrt(at(of, 'laminar') * at(of, 'turbulent')), scatter: (of) => Math.max(laminar.scatter, turbulent.scatter) + Math.exp(Math.abs(Math.log(at(of, 'laminar') / at(of, 'turbulent'))) / 2) - 1,
      range: { [need]: [Math.max(laminar.range[0], turbulent.range[0]), Math.min(laminar.range[1], turbulent.range[1])] }, formula: 'F = sqrt(F_lam F_turb)', source: `${laminar.source}; ${turbulent.source}`, note: 'between the regimes',
    },
  ];
}

function passageFactors(): Definition[] {
  const [mu, t] = ['viscosityBulkOverWall', 'temperatureBulkOverWall'];
  return [
    ...factor('viscosityFactorNusselt', { symbol: 'F_mu,Nu', name: 'Nusselt number with properties that vary to the wall over that without' }, [
      ...regimes('liquid', mu, liquidNusseltFactor, {
        laminar: { formula: 'F = (mu_b/mu_w)^0.14', source: siederTate, range: [0.0044, 9.75], scatter: 0.03 },
        turbulent: { formula: 'F = (mu_b/mu_w)^0.11 heated, ^0.25 cooled', source: petukhov, range: [0.025, 12.5], scatter: 0.05 },
      }),
      ...regimes('gas', t, gasNusseltFactor, {
        laminar: { formula: 'F = 1', source: kays, range: [0.5, 2], scatter: 0.05 },
        turbulent: { formula: 'F = (T_b/T_w)^0.45 heated, 1 cooled', source: 'Gnielinski, Int. Chem. Eng. 16 (1976) 359', range: [0.5, 2], scatter: 0.05 },
      }),
    ]),
    ...factor('viscosityFactorFriction', { symbol: 'F_mu,f', name: 'friction with properties that vary to the wall over that without' }, [
      ...regimes('liquid', mu, liquidFrictionFactor, {
        laminar: { formula: 'F = (mu_w/mu_b)^0.55', source: exponential, range: [0.2, 5], scatter: 0.03 },
        turbulent: { formula: 'F = (7 - mu_b/mu_w)/6 heated, (mu_w/mu_b)^0.24 cooled', source: petukhov, range: [0.5, 2.86], scatter: 0.05 },
      }),
      ...regimes('gas', t, gasFrictionFactor, {
        laminar: { formula: 'F = T_w/T_b heated, (T_w/T_b)^0.81 cooled', source: kays, range: [0.33, 2], scatter: 0.1 },
        turbulent: { formula: 'F = (T_w/T_b)^-0.1', source: kays, range: [0.33, 2], scatter: 0.1 },
      }),
    ]),
  ];
}

function ranges(): Definition[] {
  const change = (id: string, property: string, symbol: string, name: string): Definition =>
    quantity(id, { symbol, name, unit: '1' }, [
      way({ needs: [], when: { energySolved: 'no' }, value: () => 0, formula: `${symbol} = 0`, source: 'one temperature throughout' }),
      { needs: [`${property}Hot`, `${property}Cold`], value: (of) => { const [h, c] = [of[`${property}Hot`] as number, of[`${property}Cold`] as number]; return (2 * Math.abs(h - c)) / (h + c); }, formula: `${symbol}, highest against lowest temperature, over the mean`, source: definition },
    ]);
  return [
    change('conductivityChange', 'thermalConductivity', '|dk|/k', 'change of thermal conductivity over the temperatures of the case'),
    quantity('conductivityFactorHeat', { symbol: 'F_k', name: 'conducted heat with k(T) over that with k at the cold end', unit: '1' }, [
      way({ needs: ['thermalConductivityHot', 'thermalConductivityCold'], value: ({ thermalConductivityHot: h, thermalConductivityCold: c }) => (h + c) / (2 * c), formula: 'F = 1 +- |dk|/(2 k), k linear in temperature', source: 'integral mean of k' }),
      noFactor,
    ]),
    change('heatCapacityChange', 'specificHeatCapacity', '|dcp|/cp', 'change of heat capacity over the temperatures of the case'),
    quantity('heatCapacityRise', { symbol: 'dT_cp', name: 'outlet temperature with cp of one end against that with the enthalpy', unit: 'K', signed: true }, [
      way({ needs: ['specificHeatCapacity', 'specificHeatCapacityBulk', 'outletTemperature', 'inletTemperature'], when: { flowClass: ['internal', 'continuum'] }, value: (of) => (of.outletTemperature - of.inletTemperature) * (of.specificHeatCapacityBulk / of.specificHeatCapacity - 1), formula: '(T_out - T_in)(cp_b/cp_in - 1)', source: 'energy balance, cp linear in temperature' }),
    ]),
  ];
}
