import { between, type Table } from '../quantities/index.ts';
import { quantity, way, type Definition, type Way } from '../workings/index.ts';

const measured = 'step fronts carried on a line, widening read as diffusion';
const scheme = 'choice.convection-scheme';
const log = (rows: readonly (readonly [number, number])[]): Table => rows.map(([n, r]) => [Math.log(n), Math.log(r)] as const);

/** Numerical diffusion over that of first-order upwind, against cells per front. */
const shares: Readonly<Record<'upwind-2' | 'upwind-3' | 'central-2' | 'central-4' | 'limited', Table>> = {
  'upwind-2': log([[3, 0.34], [5, 0.19], [10, 0.056], [20, 0.012], [40, 0.003]]),
  'upwind-3': log([[3, 0.1], [5, 0.045], [10, 0.015], [20, 0.004], [40, 0.001]]),
  'central-2': log([[3, 0.09], [5, 0.023], [10, 0.006], [20, 0.001], [40, 0.0005]]),
  'central-4': log([[3, 0.09], [5, 0.023], [10, 0.006], [20, 0.001], [40, 0.0005]]),
  limited: log([[3, 0.13], [5, 0.064], [10, 0.016], [20, 0.004], [40, 0.001]]),
};

/**
 * Numerical diffusion of a scheme over that of first-order upwind on the same cells.
 *
 * @param kind   option word of the convection scheme
 * @param cells  cells across the front or layer [1]
 * @returns      R(n) [1], held outside 3 to 40 cells
 * @source       own computation, see the table above; first-order upwind is 1
 */
export function diffusionShare(kind: keyof typeof shares, cells: number): number {
  return Math.exp(between(Math.log(cells), shares[kind]));
}

/**
 * Crosswind diffusion of first-order upwind on a rectangular cell.
 *
 * @param of  speed [m/s], cell along and across the mesh lines [m], angle of the flow to the lines [rad]
 * @returns   coefficient [m^2/s]
 * @source    modified equation; de Vahl Davis and Mallinson, Computers and Fluids 4 (1976) 29 for square cells at 45 degrees
 */
export function crosswindDiffusion(of: { readonly speed: number; readonly along: number; readonly across: number; readonly angle: number }): number {
  return (of.speed / 4) * Math.sin(2 * of.angle) * (of.along * Math.sin(of.angle) + of.across * Math.cos(of.angle));
}

const angle = (10 * Math.PI) / 180;
const shareWays: Way[] = (Object.keys(shares) as (keyof typeof shares)[]).map((kind) => way({ needs: ['frontCells'], when: { [scheme]: kind }, value: ({ frontCells }) => diffusionShare(kind, frontCells), formula: `R(n) of ${kind}`, source: measured }));

/** What mesh and scheme add to the diffusion of the flow, and the groups that are then solved. */
export const diffusion: Definition[] = [
  quantity('frontCells', { symbol: 'n_f', name: 'cells across the layers away from walls', unit: '1' }, [
    way({ needs: ['coreLength', 'coreCellSize'], value: ({ coreLength, coreCellSize }) => coreLength / (2 * coreCellSize), formula: 'n_f = L_c/(2 h_c)', source: 'two layers share the core length' }),
  ]),
  quantity('numericalDiffusionFirst', { symbol: 'Gamma_1', name: 'diffusion that first-order upwind would add', unit: 'm^2/s' }, [
    way({ needs: ['speed', 'coreCellSize'], when: { 'choice.mesh-topology': ['hybrid', 'unstructured', 'overlapping'] }, value: ({ speed, coreCellSize }) => 0.212 * speed * coreCellSize, formula: 'Gamma_1 = 0.212 U h_c, mean over all angles', source: 'modified equation of first-order upwind' }),
    way({ needs: ['speed', 'coreCellSize'], value: ({ speed, coreCellSize }) => crosswindDiffusion({ speed, along: coreCellSize, across: coreCellSize, angle }), formula: 'Gamma_1 = U h_c sin(2a)(sin a + cos a)/4, a = 10 degrees to the lines', source: 'modified equation of first-order upwind' }),
  ]),
  quantity('diffusionShare', { symbol: 'R', name: 'numerical diffusion of the scheme over that of first-order upwind', unit: '1' }, [
    ...shareWays,
    way({ needs: [], when: { [scheme]: ['upwind-1', 'blended', 'shock-capturing'] }, value: () => 1, formula: 'R = 1', source: 'counts as first order' }),
  ]),
  quantity('numericalDiffusion', { symbol: 'Gamma_num', name: 'diffusion that mesh and scheme add', unit: 'm^2/s' }, [
    way({ needs: ['numericalDiffusionFirst', 'diffusionShare'], scatter: 1, value: (of) => of.numericalDiffusionFirst * of.diffusionShare, formula: 'Gamma_num = R Gamma_1', source: measured }),
  ]),
  quantity('actingDiffusivity', { symbol: 'Gamma_a', name: 'diffusivity that acts away from walls: molecular, and that of averaged eddies', unit: 'm^2/s' }, [
    way({ needs: ['smallestDiffusivity', 'kinematicViscosity', 'frictionReynolds'], when: { 'choice.turbulence-treatment': ['rans', 'hybrid'] }, scatter: 0.5, value: (of) => of.smallestDiffusivity + (0.41 / 6) * of.frictionReynolds * of.kinematicViscosity, formula: 'Gamma_a = Gamma + (kappa/6) u_tau delta', source: 'mean of the parabolic eddy viscosity kappa u_tau y (1 - y/delta)' }),
    way({ needs: ['smallestDiffusivity'], value: ({ smallestDiffusivity }) => smallestDiffusivity, formula: 'Gamma_a = Gamma', source: 'definition' }),
  ]),
  quantity('numericalShare', { symbol: 'Gamma_num/Gamma', name: 'numerical over acting diffusion', unit: '1' }, [
    way({ needs: ['numericalDiffusion', 'actingDiffusivity'], value: (of) => of.numericalDiffusion / of.actingDiffusivity, formula: 'Gamma_num/Gamma_a', source: 'definition' }),
  ]),
  quantity('numericalShareFirst', { symbol: 'Gamma_1/Gamma', name: 'the same for first-order upwind', unit: '1' }, [
    way({ needs: ['numericalDiffusionFirst', 'actingDiffusivity'], value: (of) => of.numericalDiffusionFirst / of.actingDiffusivity, formula: 'Gamma_1/Gamma_a', source: 'definition' }),
  ]),
  quantity('effectiveReynolds', { symbol: 'Re_eff', name: 'Reynolds number that mesh and scheme solve', unit: '1' }, [
    way({ needs: ['reynolds', 'numericalDiffusion', 'speed', 'length'], value: (of) => 1 / (1 / of.reynolds + of.numericalDiffusion / (of.speed * of.length)), formula: '1/Re_eff = 1/Re + Gamma_num/(U L)', source: 'modified equation' }),
  ]),
  quantity('effectivePeclet', { symbol: 'Pe_eff', name: 'Peclet number that mesh and scheme solve', unit: '1' }, [
    way({ needs: ['peclet', 'numericalDiffusion', 'speed', 'length'], when: { energySolved: 'yes' }, value: (of) => 1 / (1 / of.peclet + of.numericalDiffusion / (of.speed * of.length)), formula: '1/Pe_eff = 1/Pe + Gamma_num/(U L)', source: 'modified equation' }),
  ]),
  quantity('effectiveSchmidt', { symbol: 'Sc_eff', name: 'Schmidt number that mesh and scheme solve', unit: '1' }, [
    way({ needs: ['kinematicViscosity', 'diffusivity', 'numericalDiffusion'], when: { 'has.species': 'yes' }, value: (of) => of.kinematicViscosity / (of.diffusivity + of.numericalDiffusion), formula: 'Sc_eff = nu/(D_m + Gamma_num)', source: 'modified equation' }),
  ]),
];
