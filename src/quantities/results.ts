import { quantity, way, type Definition } from '../workings/index.ts';

const factorsOfFriction = ['roughnessFactorFriction', 'viscosityFactorFriction', 'entranceFactorFriction', 'buoyancyFactorShear', 'rarefactionFactorFriction'] as const;
const factorsOfNusselt = ['entranceFactorNusselt', 'viscosityFactorNusselt', 'buoyancyFactorNusselt', 'axialConductionFactorNusselt', 'roughnessFactorNusselt', 'viscousHeatingFactorNusselt', 'rarefactionFactorNusselt'] as const;
const product = (of: Readonly<Record<string, number>>, ids: readonly string[]): number => ids.reduce((p, id) => p * (of[id] as number), 1);

/** Friction, heat transfer and what follows from them. A flow gives the plain values; results carry the factors of the effects that act. */
export const results: Definition[] = [
  quantity('regimeGroup', { symbol: 'x_r', name: 'group that decides the regime', unit: '1' }),
  quantity('regimeLow', { symbol: 'x_lo', name: 'laminar below', unit: '1' }),
  quantity('regimeHigh', { symbol: 'x_hi', name: 'turbulent from', unit: '1' }),
  quantity('unsteadyGroup', { symbol: 'x_u', name: 'group that decides the onset of unsteadiness', unit: '1' }),
  quantity('unsteadyFrom', { symbol: 'x_on', name: 'unsteady from', unit: '1' }),
  quantity('frictionPlain', { symbol: 'f_0', name: 'Darcy friction factor, smooth, developed, constant properties', unit: '1' }),
  quantity('frictionFactorDarcy', { symbol: 'f', name: 'Darcy friction factor', unit: '1' }, [
    way({ needs: ['frictionPlain', ...factorsOfFriction], value: (of) => of.frictionPlain * product(of, factorsOfFriction), formula: 'f = f_0 times the factors of roughness, viscosity, entrance, buoyancy, rarefaction', source: 'factors of the effects that act' }),
  ]),
  quantity('nusseltPlain', { symbol: 'Nu_0', name: 'Nusselt number, developed, constant properties', unit: '1' }),
  quantity('nusselt', { symbol: 'Nu', name: 'Nusselt number, mean', unit: '1' }, [
    way({ needs: ['nusseltPlain', ...factorsOfNusselt], value: (of) => of.nusseltPlain * product(of, factorsOfNusselt), formula: 'Nu = Nu_0 times the factors of entrance, viscosity, buoyancy, axial conduction, roughness, viscous heating, rarefaction', source: 'factors of the effects that act' }),
  ]),
  quantity('nusseltOutlet', { symbol: 'Nu_out', name: 'Nusselt number at the outlet', unit: '1' }, [
    way({ needs: ['nusselt', 'entranceFactorNusselt'], when: { flowClass: 'internal', regime: ['laminar', 'transitional'] }, scatter: 0.06, value: ({ nusselt, entranceFactorNusselt }) => Math.max(nusselt / entranceFactorNusselt, (2 / 3) * nusselt), formula: 'Nu_out = max(Nu/F_e, 2 Nu/3)', source: 'local over mean of the thermal entrance, Leveque, Ann. Mines 13 (1928) 201; developed beyond it' }),
    way({ needs: ['nusselt', 'entranceFactorNusselt'], when: { flowClass: 'internal', regime: 'turbulent' }, value: ({ nusselt, entranceFactorNusselt }) => nusselt / entranceFactorNusselt, formula: 'Nu_out = Nu/F_e', source: 'developed at the outlet' }),
  ]),
  quantity('heatTransferCoefficientPlain', { symbol: 'h_0', name: 'heat-transfer coefficient from the plain Nusselt number', unit: 'W/(m^2 K)' }, coefficient('nusseltPlain', 'Nu_0', 'h_0')),
  quantity('heatTransferCoefficient', { symbol: 'h', name: 'heat-transfer coefficient, mean', unit: 'W/(m^2 K)' }, coefficient('nusselt', 'Nu', 'h')),
  quantity('pressureDropPlain', { symbol: 'dp_0', name: 'frictional pressure drop from the plain factor', unit: 'Pa' }, [drop('frictionPlain', 'f_0')]),
  quantity('pressureDrop', { symbol: 'dp', name: 'frictional pressure drop', unit: 'Pa' }, [drop('frictionFactorDarcy', 'f')]),
  quantity('wallShearPlain', { symbol: 'tau_0', name: 'wall shear stress from the plain factor', unit: 'Pa' }, [shear('frictionPlain', 'f_0')]),
  quantity('wallShear', { symbol: 'tau_w', name: 'wall shear stress', unit: 'Pa', per: ['wall', 'station'], plain: 'target' }, [shear('frictionFactorDarcy', 'f')]),
  quantity('frictionVelocityPlain', { symbol: 'u_tau,0', name: 'friction velocity from the plain factor', unit: 'm/s' }, [
    way({ needs: ['wallShearPlain', 'density'], value: ({ wallShearPlain, density }) => Math.sqrt(wallShearPlain / density), formula: 'u_tau = sqrt(tau_0/rho)', source: 'definition' }),
  ]),
  quantity('frictionVelocity', { symbol: 'u_tau', name: 'friction velocity', unit: 'm/s', per: ['wall', 'station'], plain: 'target' }, [
    way({ needs: ['wallShear', 'densityWall'], value: ({ wallShear, densityWall }) => Math.sqrt(wallShear / densityWall), formula: 'u_tau = sqrt(tau_w/rho_w)', source: 'definition' }),
    way({ needs: ['wallShear', 'density'], value: ({ wallShear, density }) => Math.sqrt(wallShear / density), formula: 'u_tau = sqrt(tau_w/rho)', source: 'definition' }),
  ]),
  quantity('skinFrictionCoefficient', { symbol: 'c_f', name: 'skin-friction coefficient', unit: '1' }, [
    way({ needs: ['frictionFactorDarcy'], when: { flowClass: 'internal' }, value: ({ frictionFactorDarcy }) => frictionFactorDarcy / 4, formula: 'c_f = f/4', source: 'definition' }),
    way({ needs: ['wallShear', 'density', 'speed'], value: ({ wallShear, density, speed }) => (2 * wallShear) / (density * speed ** 2), formula: 'c_f = 2 tau_w/(rho U^2)', source: 'definition' }),
  ]),
  quantity('frictionReynolds', { symbol: 'delta+', name: 'friction Reynolds number: layer in viscous units', unit: '1' }),
  quantity('heatRate', { symbol: 'Q', name: 'heat from the walls', unit: 'W', signed: true }, [
    way({ needs: ['massFlow', 'specificHeatCapacityBulk', 'outletTemperature', 'inletTemperature', 'condensationFactorHeat'], when: { flowClass: ['internal', 'continuum'] }, value: ({ massFlow, specificHeatCapacityBulk, outletTemperature, inletTemperature, condensationFactorHeat }) => condensationFactorHeat * massFlow * specificHeatCapacityBulk * (outletTemperature - inletTemperature), formula: 'Q = F_L m cp (T_out - T_in)', source: 'energy balance; F_L adds the heat of condensation' }),
    way({ needs: ['heatTransferCoefficient', 'wallArea', 'wallTemperature', 'farTemperature', 'radiationFactorHeat', 'condensationFactorHeat'], when: { flowClass: 'body' }, value: ({ heatTransferCoefficient, wallArea, wallTemperature, farTemperature, radiationFactorHeat, condensationFactorHeat }) => condensationFactorHeat * radiationFactorHeat * heatTransferCoefficient * wallArea * (wallTemperature - farTemperature), formula: 'Q = F_L F_r h A_w (T_w - T_far)', source: 'definition; F_r adds the radiation of the wall, F_L the heat of condensation' }),
  ]),
  quantity('dragCoefficient', { symbol: 'C_D', name: 'drag coefficient', unit: '1' }),
  quantity('boundaryLayerThickness', { symbol: 'delta', name: 'thickness of the boundary layer', unit: 'm' }),
  quantity('thermalLayerThickness', { symbol: 'delta_T', name: 'thickness of the thermal layer', unit: 'm' }),
  quantity('entranceLength', { symbol: 'L_e', name: 'length over which the velocity profile develops', unit: 'm' }),
  quantity('entranceLengthThermal', { symbol: 'L_t', name: 'length over which the temperature profile develops', unit: 'm' }),
  quantity('reattachmentLength', { symbol: 'x_R', name: 'distance to reattachment', unit: 'm' }),
  quantity('wakeLength', { symbol: 'L_w', name: 'length of the wake to be resolved', unit: 'm' }),
  quantity('sheddingFrequency', { symbol: 'f_s', name: 'frequency of vortex shedding', unit: 'Hz' }, [
    way({ needs: ['strouhal', 'speed', 'length'], value: ({ strouhal, speed, length }) => (strouhal * speed) / length, formula: 'f_s = St U/L', source: 'definition' }),
  ]),
  quantity('strouhal', { symbol: 'St', name: 'Strouhal number', unit: '1' }),
  quantity('domainUpstream', { symbol: 'L_up', name: 'domain upstream', unit: 'm' }),
  quantity('domainDownstream', { symbol: 'L_dn', name: 'domain downstream', unit: 'm' }),
  quantity('domainSides', { symbol: 'L_s', name: 'domain to each side', unit: 'm' }),
  quantity('domainAbove', { symbol: 'L_a', name: 'domain above', unit: 'm' }),
];

function coefficient(nusselt: string, symbol: string, own: string): ReturnType<typeof way>[] {
  const at = (flowClass: string[], k: string, name: string): ReturnType<typeof way> =>
    way({ needs: [nusselt, k, 'length'], when: { flowClass }, value: (of) => ((of[nusselt] as number) * (of[k] as number)) / (of['length'] as number), formula: `${own} = ${symbol} ${name}/L`, source: 'definition' });
  return [at(['internal', 'continuum'], 'thermalConductivityBulk', 'k_b'), at(['body', 'jet', 'solid'], 'thermalConductivityFilm', 'k_f'), at(['enclosure'], 'thermalConductivity', 'k')];
}
function drop(friction: string, symbol: string): ReturnType<typeof way> {
  return way({ needs: [friction, 'flowLength', 'hydraulicDiameter', 'densityBulk', 'speedBulk'], when: { flowClass: 'internal' }, value: (of) => ((of[friction] as number) * (of['flowLength'] as number) * (of['densityBulk'] as number) * (of['speedBulk'] as number) ** 2) / (2 * (of['hydraulicDiameter'] as number)), formula: `dp = ${symbol} (L/D_h) rho_b U_b^2/2`, source: 'definition of the Darcy factor' });
}
function shear(friction: string, symbol: string): ReturnType<typeof way> {
  return way({ needs: [friction, 'densityBulk', 'speedBulk'], when: { flowClass: 'internal' }, value: (of) => ((of[friction] as number) * (of['densityBulk'] as number) * (of['speedBulk'] as number) ** 2) / 8, formula: `tau_w = ${symbol} rho_b U_b^2/8`, source: 'definition of the Darcy factor' });
}
