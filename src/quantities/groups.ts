import { quantity, way, type Definition } from '../workings/index.ts';

const iso = 'ISO 80000-11:2019';
const definition = 'definition';

/** Dimensionless groups of flow and heat. Plain ones hold at the state of the plain properties, on the length and speed of the flow. */
export const groups: Definition[] = [
  quantity('reynolds', { symbol: 'Re', name: 'Reynolds number', unit: '1' }, [
    way({ needs: ['density', 'speed', 'length', 'viscosity'], value: ({ density, speed, length, viscosity }) => (density * speed * length) / viscosity, formula: 'Re = rho U L/mu', source: iso }),
  ]),
  quantity('reynoldsBulk', { symbol: 'Re_b', name: 'Reynolds number at the bulk temperature', unit: '1' }, [
    way({ needs: ['densityBulk', 'speedBulk', 'length', 'viscosityBulk'], value: ({ densityBulk, speedBulk, length, viscosityBulk }) => (densityBulk * speedBulk * length) / viscosityBulk, formula: 'Re_b = rho_b U_b L/mu_b', source: iso }),
  ]),
  quantity('reynoldsWall', { symbol: 'Re_w', name: 'Reynolds number of the same mass flow at the wall viscosity', unit: '1' }, [
    way({ needs: ['density', 'speed', 'length', 'viscosityWall'], value: ({ density, speed, length, viscosityWall }) => (density * speed * length) / viscosityWall, formula: 'Re_w = rho U L/mu_w', source: iso }),
  ]),
  quantity('reynoldsFilm', { symbol: 'Re_f', name: 'Reynolds number at the film temperature', unit: '1' }, [
    way({ needs: ['densityFilm', 'speed', 'length', 'viscosityFilm'], value: ({ densityFilm, speed, length, viscosityFilm }) => (densityFilm * speed * length) / viscosityFilm, formula: 'Re_f = rho_f U L/mu_f', source: iso }),
  ]),
  quantity('reynoldsMagnetic', { symbol: 'Re_m', name: 'magnetic Reynolds number', unit: '1' }, [
    way({ needs: ['electricalConductivity', 'speed', 'length'], value: ({ electricalConductivity, speed, length }) => 1.25663706127e-6 * electricalConductivity * speed * length, formula: 'Re_m = mu_0 sigma_e U L', source: `${iso}; mu_0 of CODATA 2022`, dimensional: 'the magnetic constant has a unit' }),
  ]),
  quantity('euler', { symbol: 'Eu', name: 'Euler number', unit: '1' }, [
    way({ needs: ['pressureDrop', 'density', 'speed'], value: ({ pressureDrop, density, speed }) => pressureDrop / (density * speed ** 2), formula: 'Eu = dp/(rho U^2)', source: iso }),
  ]),
  quantity('froude', { symbol: 'Fr', name: 'Froude number', unit: '1' }, [
    way({ needs: ['speed', 'gravity', 'length'], value: ({ speed, gravity, length }) => speed / Math.sqrt(gravity * length), formula: 'Fr = U/sqrt(g L)', source: iso }),
  ]),
  quantity('womersley', { symbol: 'Wo', name: 'Womersley number on half the length scale', unit: '1' }, [
    way({ needs: ['time.period', 'length', 'kinematicViscosity'], value: (of) => (of.length / 2) * Math.sqrt((2 * Math.PI) / (of['time.period'] * of.kinematicViscosity)), formula: 'Wo = (L/2) sqrt(2 pi/(T nu))', source: 'Womersley, J. Physiol. 127 (1955) 553' }),
  ]),
  quantity('mach', { symbol: 'Ma', name: 'Mach number', unit: '1' }, [
    way({ needs: ['speed', 'speedOfSound'], value: ({ speed, speedOfSound }) => speed / speedOfSound, formula: 'Ma = U/c', source: iso }),
  ]),
  quantity('knudsen', { symbol: 'Kn', name: 'Knudsen number', unit: '1' }, [
    way({ needs: ['meanFreePath', 'length'], value: ({ meanFreePath, length }) => meanFreePath / length, formula: 'Kn = lambda/L', source: iso }),
  ]),
  ...buoyant(),
  ...heat(),
  ...interfaces(),
];

function buoyant(): Definition[] {
  const needs = ['gravity', 'thermalExpansion', 'temperatureDifference', 'length', 'kinematicViscosity'] as const;
  return [
    quantity('grashof', { symbol: 'Gr', name: 'Grashof number', unit: '1' }, [
      way({ needs, value: (of) => (of.gravity * Math.abs(of.thermalExpansion) * of.temperatureDifference * of.length ** 3) / of.kinematicViscosity ** 2, formula: 'Gr = g |beta| dT L^3/nu^2', source: iso }),
    ]),
    quantity('grashofBulk', { symbol: 'Gr_b', name: 'Grashof number at the bulk temperature, wall against bulk', unit: '1' }, [
      way({ needs: ['gravity', 'thermalExpansionBulk', 'wallTemperature', 'bulkTemperature', 'length', 'kinematicViscosityBulk'], value: (of) => (of.gravity * Math.abs(of.thermalExpansionBulk) * Math.abs(of.wallTemperature - of.bulkTemperature) * of.length ** 3) / of.kinematicViscosityBulk ** 2, formula: 'Gr_b = g |beta_b| |T_w - T_b| L^3/nu_b^2', source: iso }),
    ]),
    quantity('rayleigh', { symbol: 'Ra', name: 'Rayleigh number', unit: '1' }, [
      way({ needs: [...needs, 'thermalDiffusivity'], value: (of) => (of.gravity * Math.abs(of.thermalExpansion) * of.temperatureDifference * of.length ** 3) / (of.kinematicViscosity * of.thermalDiffusivity), formula: 'Ra = g |beta| dT L^3/(nu alpha)', source: iso }),
    ]),
    quantity('rayleighHeight', { symbol: 'Ra_H', name: 'Rayleigh number on the extent along gravity', unit: '1' }, [
      way({ needs: ['gravity', 'thermalExpansion', 'temperatureDifference', 'passageHeight', 'kinematicViscosity', 'thermalDiffusivity'], value: (of) => (of.gravity * Math.abs(of.thermalExpansion) * of.temperatureDifference * of.passageHeight ** 3) / (of.kinematicViscosity * of.thermalDiffusivity), formula: 'Ra_H = g |beta| dT H^3/(nu alpha)', source: iso }),
    ]),
    quantity('rayleighFlux', { symbol: 'Ra*', name: 'Rayleigh number on the wall heat flux', unit: '1' }, [
      way({ needs: ['gravity', 'thermalExpansion', 'wallHeatFlux', 'length', 'thermalConductivity', 'kinematicViscosity', 'thermalDiffusivity'], value: (of) => (of.gravity * Math.abs(of.thermalExpansion) * Math.abs(of.wallHeatFlux) * of.length ** 4) / (of.thermalConductivity * of.kinematicViscosity * of.thermalDiffusivity), formula: 'Ra* = g |beta| |q| L^4/(k nu alpha)', source: definition }),
    ]),
    quantity('richardson', { symbol: 'Ri', name: 'Richardson number', unit: '1' }, [
      way({ needs: ['gravity', 'thermalExpansion', 'temperatureDifference', 'length', 'speed'], value: (of) => (of.gravity * Math.abs(of.thermalExpansion) * of.temperatureDifference * of.length) / of.speed ** 2, formula: 'Ri = g |beta| dT L/U^2', source: iso }),
    ]),
    quantity('froudeDensimetric', { symbol: 'Fr_d', name: 'densimetric Froude number', unit: '1' }, [
      way({ needs: ['richardson'], value: ({ richardson }) => richardson ** -0.5, formula: 'Fr_d = Ri^(-1/2)', source: definition }),
    ]),
  ];
}

function heat(): Definition[] {
  return [
    quantity('peclet', { symbol: 'Pe', name: 'Peclet number', unit: '1' }, [
      way({ needs: ['speed', 'length', 'thermalDiffusivity'], value: ({ speed, length, thermalDiffusivity }) => (speed * length) / thermalDiffusivity, formula: 'Pe = U L/alpha', source: iso }),
    ]),
    quantity('graetz', { symbol: 'Gz', name: 'Graetz number over the length along the flow', unit: '1' }, [
      way({ needs: ['reynoldsBulk', 'prandtlBulk', 'length', 'flowLength'], value: ({ reynoldsBulk, prandtlBulk, length, flowLength }) => (reynoldsBulk * prandtlBulk * length) / flowLength, formula: 'Gz = Re_b Pr_b D_h/L_x', source: 'definition without the factor pi/4 that some authors put in front' }),
    ]),
    quantity('stanton', { symbol: 'St_h', name: 'Stanton number for heat', unit: '1' }, [
      way({ needs: ['nusselt', 'reynoldsBulk', 'prandtlBulk'], when: { flowClass: ['internal', 'continuum'] }, value: ({ nusselt, reynoldsBulk, prandtlBulk }) => nusselt / (reynoldsBulk * prandtlBulk), formula: 'St_h = Nu/(Re_b Pr_b)', source: iso }),
      way({ needs: ['nusselt', 'reynolds', 'prandtl'], value: ({ nusselt, reynolds, prandtl }) => nusselt / (reynolds * prandtl), formula: 'St_h = Nu/(Re Pr)', source: iso }),
    ]),
    quantity('eckert', { symbol: 'Ec', name: 'Eckert number', unit: '1' }, [
      way({ needs: ['speed', 'specificHeatCapacity', 'temperatureDifference'], value: ({ speed, specificHeatCapacity, temperatureDifference }) => speed ** 2 / (specificHeatCapacity * temperatureDifference), formula: 'Ec = U^2/(cp dT)', source: iso }),
    ]),
    quantity('brinkman', { symbol: 'Br', name: 'Brinkman number', unit: '1' }, [
      way({ needs: ['viscosity', 'speed', 'thermalConductivity', 'temperatureDifference'], value: ({ viscosity, speed, thermalConductivity, temperatureDifference }) => (viscosity * speed ** 2) / (thermalConductivity * temperatureDifference), formula: 'Br = mu U^2/(k dT)', source: iso }),
    ]),
    quantity('nahme', { symbol: 'Na', name: 'Nahme number', unit: '1' }, [
      way({ needs: ['viscosity', 'speed', 'thermalConductivity', 'referenceTemperature', 'pressure'], laws: ['viscosity'], value: (of, laws) => {
        const t = of.referenceTemperature;
        const slope = Math.abs(Math.log(laws.viscosity(t * 1.0005, of.pressure) / laws.viscosity(t * 0.9995, of.pressure))) / (1e-3 * t);
        return (slope * of.viscosity * of.speed ** 2) / of.thermalConductivity;
      }, formula: 'Na = |d ln mu/dT| mu U^2/k', source: 'Nahme, Ing.-Arch. 11 (1940) 191' }),
      way({ needs: [], when: { fluidGiven: 'constants' }, value: () => 0, formula: 'Na = 0', source: 'viscosity given as a constant' }),
    ]),
    quantity('fourier', { symbol: 'Fo', name: 'Fourier number of the fluid over the duration', unit: '1' }, [
      way({ needs: ['thermalDiffusivity', 'time.duration', 'length'], value: (of) => (of.thermalDiffusivity * of['time.duration']) / of.length ** 2, formula: 'Fo = alpha t/L^2', source: iso }),
    ]),
    quantity('gasHeating', { symbol: 'q+', name: 'wall heat flux over the enthalpy carried', unit: '1' }, [
      way({ needs: ['wallHeatFlux', 'density', 'speed', 'specificHeatCapacityBulk', 'bulkTemperature'], value: (of) => Math.abs(of.wallHeatFlux) / (of.density * of.speed * of.specificHeatCapacityBulk * of.bulkTemperature), formula: 'q+ = |q|/(rho U cp_b T_b)', source: 'McEligot, Coon and Perkins, Int. J. Heat Mass Transfer 13 (1970) 431' }),
    ]),
    quantity('jakob', { symbol: 'Ja', name: 'Jakob number of the hottest wall', unit: '1', signed: true }, [
      way({ needs: ['specificHeatCapacity', 'highestTemperature', 'saturationTemperature', 'latentHeat'], value: (of) => (of.specificHeatCapacity * (of.highestTemperature - of.saturationTemperature)) / of.latentHeat, formula: 'Ja = cp (T_max - T_sat)/h_fg', source: iso }),
    ]),
  ];
}

function interfaces(): Definition[] {
  return [
    quantity('weber', { symbol: 'We', name: 'Weber number', unit: '1' }, [
      way({ needs: ['density', 'speed', 'length', 'surfaceTension'], value: ({ density, speed, length, surfaceTension }) => (density * speed ** 2 * length) / surfaceTension, formula: 'We = rho U^2 L/sigma', source: iso }),
    ]),
    quantity('capillary', { symbol: 'Ca', name: 'capillary number', unit: '1' }, [
      way({ needs: ['viscosity', 'speed', 'surfaceTension'], value: ({ viscosity, speed, surfaceTension }) => (viscosity * speed) / surfaceTension, formula: 'Ca = mu U/sigma', source: iso }),
    ]),
    quantity('ohnesorge', { symbol: 'Oh', name: 'Ohnesorge number', unit: '1' }, [
      way({ needs: ['viscosity', 'density', 'surfaceTension', 'length'], value: ({ viscosity, density, surfaceTension, length }) => viscosity / Math.sqrt(density * surfaceTension * length), formula: 'Oh = mu/sqrt(rho sigma L)', source: iso }),
    ]),
    quantity('eotvos', { symbol: 'Eo', name: 'Eotvos or Bond number', unit: '1' }, [
      way({ needs: ['density', 'vapourDensity', 'gravity', 'length', 'surfaceTension'], value: (of) => ((of.density - of.vapourDensity) * of.gravity * of.length ** 2) / of.surfaceTension, formula: 'Eo = (rho - rho_v) g L^2/sigma', source: iso }),
      way({ needs: ['density', 'gravity', 'length', 'surfaceTension'], value: ({ density, gravity, length, surfaceTension }) => (density * gravity * length ** 2) / surfaceTension, formula: 'Eo = rho g L^2/sigma', source: iso, note: 'the density of the other phase is not counted' }),
    ]),
    quantity('morton', { symbol: 'Mo', name: 'Morton number', unit: '1' }, [
      way({ needs: ['gravity', 'viscosity', 'density', 'vapourDensity', 'surfaceTension'], value: (of) => (of.gravity * of.viscosity ** 4 * (of.density - of.vapourDensity)) / (of.density ** 2 * of.surfaceTension ** 3), formula: 'Mo = g mu^4 (rho - rho_v)/(rho^2 sigma^3)', source: definition }),
      way({ needs: ['gravity', 'viscosity', 'density', 'surfaceTension'], value: ({ gravity, viscosity, density, surfaceTension }) => (gravity * viscosity ** 4) / (density * surfaceTension ** 3), formula: 'Mo = g mu^4/(rho sigma^3)', source: definition, note: 'the density of the other phase is not counted' }),
    ]),
  ];
}
