import { gasFrictionFactor, liquidFrictionFactor } from '../quantities/index.ts';
import { quantity, way, ways, wordWay, type Definition, type Way } from '../workings/index.ts';

const viscosity = 'viscosityBulkOverWall';
const temperature = 'temperatureBulkOverWall';
const solved = 'momentum and energy of the developed profile, viscosity exponential in temperature, uniform flux through one wall';
const balance = 'momentum balance: the mean of both walls, the adiabatic one near the bulk state';
const one = { channelHeating: 'one', energySolved: 'yes' } as const;
const material = { ...one, fluidGiven: 'material' } as const;

/** Friction of liquid in laminar flow with one heated wall: (mu_w/mu_b)^m, m = 0.173 + 0.05 ln(mu_w/mu_b), within 1 % of the solved profile from 0.5 to 3. */
const laminarLiquid = (bulkOverWall: number): number => { const wall = 1 / bulkOverWall; return wall ** (0.173 + 0.05 * Math.log(wall)); };

/** Half of what both walls would do. */
function half(medium: 'liquid' | 'gas', regime: 'laminar' | 'turbulent', range: readonly [number, number], formula: string, scatter: number): Way {
  const [need, law] = medium === 'liquid' ? [viscosity, liquidFrictionFactor] as const : [temperature, gasFrictionFactor] as const;
  return { needs: [need], when: { ...material, medium, regime: regime === 'laminar' ? 'laminar' : ['transitional', 'turbulent'] }, range: { [need]: range }, scatter, value: (of) => (1 + law({ ratio: of[need] as number, regime })) / 2, formula: `F = (1 + F_2)/2, F_2 = ${formula}`, source: balance };
}

/** One wall heated and the other adiabatic, or both at work; what that makes of friction where properties vary. */
export const channelHeatingDefinitions: Definition[] = [
  quantity('channelHeating', { symbol: '', name: 'walls that exchange heat', unit: 'word', words: ['both', 'one'] }, [
    ...['bottom', 'top'].map((wall) => wordWay({ needs: [], when: { [`wallKind@walls.${wall}`]: 'adiabatic' }, word: () => 'one', formula: `the ${wall} wall is adiabatic`, source: 'definition' })),
    wordWay({ needs: [], word: () => 'both', formula: 'no wall is adiabatic', source: 'definition' }),
  ]),
  ways('viscosityFactorFrictionLaw', [
    way({ needs: [viscosity], when: { ...material, medium: 'liquid', regime: 'laminar' }, range: { [viscosity]: [1 / 3, 2] }, scatter: 0.03, value: (of) => laminarLiquid(of[viscosity]), formula: 'F = (mu_w/mu_b)^(0.173 + 0.05 ln(mu_w/mu_b)), one wall heated', source: solved }),
    half('liquid', 'turbulent', [0.5, 2.86], '(7 - mu_b/mu_w)/6 heated, (mu_w/mu_b)^0.24 cooled', 0.05),
    half('gas', 'laminar', [0.33, 2], 'T_w/T_b heated, (T_w/T_b)^0.81 cooled', 0.1),
    half('gas', 'turbulent', [0.33, 2], '(T_w/T_b)^-0.1', 0.1),
  ]),
  quantity('channelShearShare', { symbol: 'tau_w/tau_m', name: 'shear of a wall over the mean of both', unit: '1', per: ['wall'], plain: 'target' }, [
    way({ needs: [viscosity, 'viscosityFactorFriction'], when: { ...material, medium: 'liquid', regime: 'laminar', wallKind: ['temperature', 'flux', 'coefficient'] }, range: { [viscosity]: [1 / 3, 2] }, value: (of) => of[viscosity] ** -0.397 / of.viscosityFactorFriction, formula: '(mu_w/mu_b)^0.397/F at the heated wall', source: solved }),
    way({ needs: [viscosity, 'viscosityFactorFriction'], when: { ...material, medium: 'liquid', regime: 'laminar', wallKind: 'adiabatic' }, range: { [viscosity]: [1 / 3, 2] }, value: (of) => 2 - of[viscosity] ** -0.397 / of.viscosityFactorFriction, formula: '2 - (mu_w/mu_b)^0.397/F at the adiabatic wall', source: solved }),
    way({ needs: ['viscosityFactorFriction'], when: { ...material, wallKind: ['temperature', 'flux', 'coefficient'] }, value: ({ viscosityFactorFriction }) => 2 - 1 / viscosityFactorFriction, formula: '2 - 1/F at the heated wall', source: balance }),
    way({ needs: ['viscosityFactorFriction'], when: { ...material, wallKind: 'adiabatic' }, value: ({ viscosityFactorFriction }) => 1 / viscosityFactorFriction, formula: '1/F at the adiabatic wall', source: balance }),
    way({ needs: [], value: () => 1, formula: '1', source: 'both walls alike' }),
  ]),
  ways('wallShear', [
    way({ needs: ['channelShearShare', 'frictionFactorDarcy', 'densityBulk', 'speedBulk'], when: one, value: (of) => (of.channelShearShare * of.frictionFactorDarcy * of.densityBulk * of.speedBulk ** 2) / 8, formula: 'tau_w = (tau_w/tau_m) f rho_b U_b^2/8', source: 'definition of the Darcy factor, shared by the walls' }),
  ]),
];
