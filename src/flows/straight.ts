import { way, ways, type Definition } from '../workings/index.ts';

const practice = 'common practice';

/** What all straight passages share beside their correlations: lengths, extents of the domain, mesh regions, wall layers. */
export const straightDefinitions: Definition[] = [
  ways('flowLength', [way({ needs: ['sizes.length'], value: (of) => of['sizes.length'], formula: 'L_x = L', source: 'geometry' })]),
  ways('boundaryLayerThickness', [way({ needs: ['gap'], value: ({ gap }) => gap / 2, formula: 'delta = gap/2', source: 'developed flow: the layers meet in the middle' })]),
  ways('thermalLayerThickness', [
    way({ needs: ['gap', 'length', 'graetz'], when: { regime: 'laminar' }, scatter: 0.1, value: ({ gap, length, graetz }) => Math.min(gap / 2, 0.93 * length * graetz ** (-1 / 3)), formula: 'delta_T = 0.93 D_h Gz^(-1/3), at most gap/2', source: 'Leveque, Ann. Mines 13 (1928) 201, thickness to 99 %' }),
    way({ needs: ['gap'], value: ({ gap }) => gap / 2, formula: 'delta_T = gap/2', source: 'developed flow: the layers meet in the middle' }),
  ]),
  ways('frictionReynolds', [way({ needs: ['frictionVelocityPlain', 'gap', 'kinematicViscosityBulk'], value: ({ frictionVelocityPlain, gap, kinematicViscosityBulk }) => (frictionVelocityPlain * gap) / (2 * kinematicViscosityBulk), formula: 'delta+ = u_tau (gap/2)/nu_b', source: 'definition' })]),
  ways('wallShear@worst', [
    way({ needs: ['frictionFactorDarcy', 'densityBulk', 'speedBulk'], when: { inletProfile: 'uniform' }, value: (of) => (2 * of.frictionFactorDarcy * of.densityBulk * of.speedBulk ** 2) / 8, formula: 'tau_w = 2 f rho_b U_b^2/8', source: 'common practice: up to twice the developed shear behind a uniform inlet' }),
  ]),
  ways('domainUpstream', [
    way({ needs: [], when: { inletProfile: ['developed', 'power', 'log', 'table', 'uniform'] }, value: () => 0, formula: 'L_up = 0', source: 'the profile is given where the passage begins' }),
    way({ needs: ['entranceLength'], value: ({ entranceLength }) => entranceLength, formula: 'L_up = L_e', source: 'common practice: the profile develops ahead of the stretch that counts' }),
  ]),
  ways('domainDownstream', [
    way({ needs: ['hydraulicDiameter'], scatter: 1, value: ({ hydraulicDiameter }) => 5 * hydraulicDiameter, formula: 'L_dn = 5 D_h', source: `${practice}: 5 to 10 D_h behind the last feature` }),
  ]),
  ways('regionAlong@entry', [
    way({ needs: ['domainUpstream', 'flowLength', 'domainDownstream', 'hydraulicDiameter'], value: (of) => Math.min(10 * of.hydraulicDiameter, of.domainUpstream + of.flowLength + of.domainDownstream), formula: '10 D_h, at most the whole', source: practice }),
  ]),
  ways('regionAlong@run', [
    way({ needs: ['domainUpstream', 'flowLength', 'domainDownstream', 'hydraulicDiameter'], value: (of) => Math.max(0, of.domainUpstream + of.flowLength + of.domainDownstream - 10 * of.hydraulicDiameter), formula: 'L_up + L + L_dn - 10 D_h', source: practice }),
  ]),
  ways('regionAcross', [way({ needs: ['gap'], value: ({ gap }) => gap, formula: 'gap', source: 'geometry' })]),
  ways('coreLength', [way({ needs: ['gap'], value: ({ gap }) => gap, formula: 'L_c = gap', source: practice })]),
  ways('coreCellsFine', [way({ needs: [], value: () => 60, formula: 'n_c = 60', source: practice })]),
  ways('regionStretch@entry', [way({ needs: [], value: () => 4, formula: 'a_x = 4: 0.1 D_h along at D_h/40 across', source: practice })]),
  ways('regionStretch@run', [way({ needs: [], value: () => 18, formula: 'a_x = 18: 0.2 to 1 D_h along at D_h/40 across', source: practice })]),
];
