import { quantity, way, ways, type Definition } from '../workings/index.ts';
import { carreauViscosity, cassonViscosity, crossViscosity, hanksReynolds, herschelBulkleyViscosity, metznerReedReynolds, powerLawViscosity } from './correlations/index.ts';
import { pipeWallShearRate } from './pipe-shear.ts';
import { propertyStates } from './property-states.ts';

type Of = Readonly<Record<string, number>>;

/** The unit of a consistency holds the index, so that a change of units needs both. */
const withIndex = { dimensional: 'the unit of the consistency holds the index' } as const;

/** Laws of a case: what each needs of `rheology`, and its apparent viscosity of a shear rate. */
const laws: readonly { readonly word: string; readonly needs: readonly string[]; readonly viscosity: (of: Of, rate: number) => number; readonly formula: string; readonly source: string; readonly dimensional?: string }[] = [

  { word: 'power-law', needs: ['rheology.consistency', 'rheology.index'], viscosity: (of, rate) => powerLawViscosity({ rate, consistency: of['rheology.consistency'] as number, index: of['rheology.index'] as number }), formula: 'K g^(n - 1)', source: 'Ostwald, Kolloid-Z. 36 (1925) 99', ...withIndex },
  { word: 'carreau', needs: ['rheology.zeroShearViscosity', 'rheology.infiniteShearViscosity', 'rheology.timeConstant', 'rheology.index'], viscosity: (of, rate) => carreauViscosity({ rate, zero: of['rheology.zeroShearViscosity'] as number, infinite: of['rheology.infiniteShearViscosity'] as number, time: of['rheology.timeConstant'] as number, index: of['rheology.index'] as number, transition: 2 }), formula: 'mu_inf + (mu_0 - mu_inf)(1 + (l g)^2)^((n - 1)/2)', source: 'Carreau, Trans. Soc. Rheol. 16 (1972) 99' },
  { word: 'cross', needs: ['rheology.zeroShearViscosity', 'rheology.infiniteShearViscosity', 'rheology.timeConstant', 'rheology.index'], viscosity: (of, rate) => crossViscosity({ rate, zero: of['rheology.zeroShearViscosity'] as number, infinite: of['rheology.infiniteShearViscosity'] as number, time: of['rheology.timeConstant'] as number, index: of['rheology.index'] as number }), formula: 'mu_inf + (mu_0 - mu_inf)/(1 + (l g)^(1 - n))', source: 'Cross, J. Colloid Sci. 20 (1965) 417' },
  { word: 'bingham', needs: ['rheology.yieldStress', 'rheology.plasticViscosity'], viscosity: (of, rate) => herschelBulkleyViscosity({ rate, yieldStress: of['rheology.yieldStress'] as number, consistency: of['rheology.plasticViscosity'] as number, index: 1 }), formula: 'tau_y/g + mu_p', source: 'Bingham, Fluidity and Plasticity (1922)' },
  { word: 'herschel-bulkley', needs: ['rheology.yieldStress', 'rheology.consistency', 'rheology.index'], viscosity: (of, rate) => herschelBulkleyViscosity({ rate, yieldStress: of['rheology.yieldStress'] as number, consistency: of['rheology.consistency'] as number, index: of['rheology.index'] as number }), formula: '(tau_y + K g^n)/g', source: 'Herschel and Bulkley, Kolloid-Z. 39 (1926) 291', ...withIndex },
  { word: 'casson', needs: ['rheology.yieldStress', 'rheology.plasticViscosity'], viscosity: (of, rate) => cassonViscosity({ rate, yieldStress: of['rheology.yieldStress'] as number, plastic: of['rheology.plasticViscosity'] as number }), formula: '(sqrt(tau_y) + sqrt(mu_c g))^2/g', source: 'Casson, in Rheology of Disperse Systems (1959) 84' },
];

/** The words of `rheology.law`, and the one of a fluid that has none. */
export const rheologyLaws = ['newtonian', ...laws.map(({ word }) => word)] as const;

const inside = { flowClass: 'internal' } as const;
const rabinowitsch = 'Rabinowitsch, Z. Phys. Chem. A 145 (1929) 1';
/** Ratios of a pure power law are free of its consistency. */
const ratio = (word: string, more: { readonly dimensional?: string }): { readonly dimensional?: string } => (word === 'power-law' ? {} : dimensions(more));
const dimensions = ({ dimensional }: { readonly dimensional?: string }): { readonly dimensional?: string } => (dimensional === undefined ? {} : { dimensional });
const each = (make: (law: (typeof laws)[number]) => Parameters<typeof ways>[1]): Parameters<typeof ways>[1] => laws.flatMap(make);

/** Fluids whose viscosity depends on the shear: the shear of the case, what the law makes of it, the groups that belong to it. */
export const rheologyDefinitions: Definition[] = [
  quantity('nominalShearRate', { symbol: 'g_n', name: 'nominal shear rate', unit: '1/s' }, [
    way({ needs: ['speed', 'hydraulicDiameter'], when: inside, value: ({ speed, hydraulicDiameter }) => (8 * speed) / hydraulicDiameter, formula: 'g_n = 8 U/D_h', source: 'Newtonian flow in a round pipe; beside it within 25 %' }),
    way({ needs: ['speed', 'length'], value: ({ speed, length }) => speed / length, formula: 'g_n = U/L', scatter: 1, source: 'common practice' }),
  ]),
  quantity('wallShearRate', { symbol: 'g_w', name: 'shear rate at the wall', unit: '1/s' }, [
    ...each(({ word, needs, viscosity, formula, source, ...more }) => [{ ...ratio(word, more), needs: ['nominalShearRate', ...needs], when: { rheologyLaw: word, ...inside }, value: (of) => pipeWallShearRate({ nominal: of['nominalShearRate'] as number, stress: (rate) => (rate > 0 ? viscosity(of, rate) * rate : 0) }), formula: `8U/D_h = (4/3)(g_w - int_0^g_w tau^3 dg/tau_w^3), tau = g ${formula}`, source: `${rabinowitsch}; ${source}` }]),
    way({ needs: ['nominalShearRate'], value: ({ nominalShearRate }) => nominalShearRate, formula: 'g_w = g_n', scatter: 0.5, source: 'common practice' }),
  ]),
  quantity('apparentViscosity', { symbol: 'mu_e', name: 'effective viscosity at the wall shear of the case', unit: 'Pa s' }, each(({ word, needs, viscosity, formula, source, ...more }) => [
    { ...dimensions(more), needs: ['wallShearRate', 'nominalShearRate', ...needs], when: { rheologyLaw: word, ...inside }, value: (of) => (viscosity(of, of['wallShearRate'] as number) * (of['wallShearRate'] as number)) / (of['nominalShearRate'] as number), formula: `mu_e = tau(g_w)/g_n, tau = g ${formula}`, source: `Metzner and Reed, AIChE J. 1 (1955) 434; ${source}` },
    { ...dimensions(more), needs: ['wallShearRate', ...needs], when: { rheologyLaw: word }, value: (of) => viscosity(of, of['wallShearRate'] as number), formula: `mu_e = ${formula}`, source },
  ])),
  quantity('rheologySpread', { symbol: 'S_mu', name: 'spread of the viscosity from a tenth of the wall shear to all of it', unit: '1' }, each(({ word, needs, viscosity, formula, source, ...more }) => [
    { ...ratio(word, more), needs: ['wallShearRate', ...needs], when: { rheologyLaw: word }, value: (of) => Math.abs(viscosity(of, 0.1 * (of['wallShearRate'] as number)) / viscosity(of, of['wallShearRate'] as number) - 1), formula: `S_mu = |mu(0.1 g_w) - mu(g_w)|/mu(g_w), mu = ${formula}`, source },
  ])),
  quantity('rheologyFactorShear', { symbol: 'F_mu', name: 'wall shear with the law over that of a constant viscosity, the one of the law at the nominal shear rate 8 U/D_h', unit: '1' }, [
    ...each(({ word, needs, viscosity, formula, source, ...more }) => [{ ...ratio(word, more), needs: ['wallShearRate', 'nominalShearRate', ...needs], when: { rheologyLaw: word, ...inside }, value: (of) => (viscosity(of, of['wallShearRate'] as number) * (of['wallShearRate'] as number)) / (viscosity(of, of['nominalShearRate'] as number) * (of['nominalShearRate'] as number)), formula: `F_mu = tau(g_w)/tau(g_n), tau = g ${formula}`, source: `${rabinowitsch}; ${source}` }]),
    way({ needs: [], when: { rheologyLaw: 'newtonian' }, value: () => 1, formula: 'F_mu = 1', source: 'one viscosity' }),
  ]),
  quantity('rheologyFactorZeroShear', { symbol: 'F_0', name: 'wall shear with the law over that of its zero-shear viscosity', unit: '1' }, [
    way({ needs: ['apparentViscosity', 'rheology.zeroShearViscosity'], when: { rheologyLaw: ['carreau', 'cross'], ...inside }, value: (of) => of.apparentViscosity / of['rheology.zeroShearViscosity'], formula: 'F_0 = tau(g_w)/(mu_0 g_n) = mu_e/mu_0', source: 'Hagen-Poiseuille with mu_0 for the constant viscosity' }),
    way({ needs: [], when: { rheologyLaw: 'newtonian' }, value: () => 1, formula: 'F_0 = 1', source: 'one viscosity' }),
  ]),
  quantity('reynoldsMetznerReed', { symbol: 'Re_MR', name: 'Reynolds number of Metzner and Reed', unit: '1' }, [
    way({ needs: ['density', 'speed', 'hydraulicDiameter', 'rheology.consistency', 'rheology.index'], when: { rheologyLaw: 'power-law', ...inside }, ...withIndex, value: (of) => metznerReedReynolds({ density: of.density, speed: of.speed, diameter: of.hydraulicDiameter, consistency: of['rheology.consistency'], index: of['rheology.index'] }), formula: 'Re_MR = rho U^(2-n) D^n/(8^(n-1) K ((3n+1)/(4n))^n)', source: 'Metzner and Reed, AIChE J. 1 (1955) 434' }),
    way({ needs: ['density', 'speed', 'hydraulicDiameter', 'apparentViscosity'], when: inside, value: ({ density, speed, hydraulicDiameter, apparentViscosity }) => (density * speed * hydraulicDiameter) / apparentViscosity, formula: 'Re_MR = rho U D_h/mu_e', source: 'Metzner and Reed, AIChE J. 1 (1955) 434' }),
  ]),
  quantity('reynoldsBingham', { symbol: 'Re_B', name: 'Reynolds number on the plastic viscosity', unit: '1' }, [
    way({ needs: ['density', 'speed', 'length', 'rheology.plasticViscosity'], value: (of) => (of.density * of.speed * of.length) / of['rheology.plasticViscosity'], formula: 'Re_B = rho U L/mu_p', source: 'definition' }),
  ]),
  quantity('hedstrom', { symbol: 'He', name: 'Hedstrom number', unit: '1' }, [
    way({ needs: ['binghamNumber', 'reynoldsBingham'], value: ({ binghamNumber, reynoldsBingham }) => binghamNumber * reynoldsBingham, formula: 'He = Bm Re_B = rho tau_y L^2/mu_p^2', source: 'Hedstrom, Ind. Eng. Chem. 44 (1952) 651' }),
  ]),
  quantity('reynoldsBinghamCritical', { symbol: 'Re_B,c', name: 'Reynolds number on the plastic viscosity at which a Bingham fluid leaves laminar flow', unit: '1' }, [
    way({ needs: ['hedstrom'], when: { rheologyLaw: 'bingham', ...inside }, scatter: 0.2, value: ({ hedstrom }) => hanksReynolds({ hedstrom }), formula: 'Re_c = He (1 - 4x/3 + x^4/3)/(8x), x/(1 - x)^3 = He/16800', source: 'Hanks, AIChE J. 9 (1963) 306' }),
  ]),
  quantity('plugShare', { symbol: 'phi', name: 'yield stress over wall shear, the radius of the plug', unit: '1' }, [
    way({ needs: ['rheology.yieldStress', 'apparentViscosity', 'nominalShearRate'], when: inside, value: (of) => of['rheology.yieldStress'] / (of.apparentViscosity * of.nominalShearRate), formula: 'phi = tau_y/tau_w', source: 'axial momentum balance' }),
  ]),
];

const gasConstant = 8.31446261815324;

/**
 * Ways by which the viscosity of a case follows from its law at the wall shear, at all states of temperature: the constants hold at the inlet.
 *
 * @returns  ways that go before those of a material
 */
export function rheologyWays(): Definition[] {
  return propertyStates.map(({ suffix, temperature }) => ways(`viscosity${suffix}`, [
    { needs: ['apparentViscosity', 'rheology.activationEnergy', temperature, 'inletTemperature'], value: (of) => (of['apparentViscosity'] as number) * Math.exp(((of['rheology.activationEnergy'] as number) / gasConstant) * (1 / (of[temperature] as number) - 1 / (of['inletTemperature'] as number))), formula: 'mu_e exp(E/R (1/T - 1/T_in))', source: 'Arrhenius 1916; the constants of the law hold at the inlet' },
    { needs: ['apparentViscosity', 'rheology.temperatureFactor', temperature, 'inletTemperature'], value: (of) => (of['apparentViscosity'] as number) * Math.exp(-(of['rheology.temperatureFactor'] as number) * ((of[temperature] as number) - (of['inletTemperature'] as number))), formula: 'mu_e exp(-b (T - T_in))', source: 'Reynolds 1886; the constants of the law hold at the inlet' },
    { needs: ['apparentViscosity'], value: (of) => of['apparentViscosity'] as number, formula: 'mu_e, the same at all temperatures', source: 'the law of the case at its wall shear' },
  ]));
}
