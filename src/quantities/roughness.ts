import { quantity, way, type Definition } from '../workings/index.ts';
import { colebrook } from './correlations/index.ts';

const rough = 'Colebrook, J. Inst. Civ. Eng. 11 (1939) 133';

/** Wall roughness: grain height in viscous lengths, and what it does to friction and heat transfer. */
export const roughness: Definition[] = [
  quantity('sandGrain', { symbol: 'k_s', name: 'height of the equivalent sand grain', unit: 'm', per: ['wall'], plain: 'target' }),
  quantity('relativeRoughness', { symbol: 'k_s/D', name: 'sand grain over hydraulic diameter', unit: '1' }, [
    way({ needs: ['sandGrain', 'hydraulicDiameter'], value: ({ sandGrain, hydraulicDiameter }) => sandGrain / hydraulicDiameter, formula: 'k_s/D_h', source: 'definition' }),
  ]),
  quantity('roughnessReynolds', { symbol: 'k_s+', name: 'sand grain in viscous lengths', unit: '1' }, [
    way({ needs: ['sandGrain', 'frictionVelocityPlain', 'roughnessFactorFriction', 'kinematicViscosityBulk'], value: (of) => (of.sandGrain * of.frictionVelocityPlain * Math.sqrt(of.roughnessFactorFriction)) / of.kinematicViscosityBulk, formula: 'k_s+ = k_s u_tau/nu, u_tau = u_tau,0 F_k^(1/2) of the rough wall', source: 'definition' }),
  ]),
  quantity('roughnessFactorFriction', { symbol: 'F_k', name: 'friction of the rough over the smooth wall', unit: '1' }, [
    way({ needs: ['reynoldsBulk', 'relativeRoughness'], when: { flowClass: 'internal', regime: ['transitional', 'turbulent'] }, range: { relativeRoughness: [0, 0.05] }, value: ({ reynoldsBulk, relativeRoughness }) => colebrook({ reynolds: reynoldsBulk, relativeRoughness }) / colebrook({ reynolds: reynoldsBulk, relativeRoughness: 0 }), formula: 'F = f(Re, k_s/D)/f(Re, 0)', source: rough }),
    way({ needs: [], value: () => 1, formula: 'F = 1', source: 'laminar, or no sand grain known: taken as smooth' }),
  ]),
  quantity('roughnessFactorNusselt', { symbol: 'F_k,Nu', name: 'heat transfer of the rough over the smooth wall', unit: '1' }, [
    way({ needs: ['roughnessFactorFriction'], when: { flowClass: 'internal', regime: ['transitional', 'turbulent'] }, value: ({ roughnessFactorFriction }) => roughnessFactorFriction ** 0.6, scatter: ({ roughnessFactorFriction }) => Math.abs(roughnessFactorFriction ** 0.1 - 1), formula: 'F = (f/f_0)^0.6, exponent 0.5 to 0.7', source: 'Norris 1970, in Kays and Crawford, Convective Heat and Mass Transfer; exponent from memory' }),
    way({ needs: [], value: () => 1, formula: 'F = 1', source: 'the effect does not act here' }),
  ]),
];
