import { quantity, way, type Definition } from '../workings/index.ts';

const choiMoin = 'Choi and Moin, Phys. Fluids 24 (2012) 011702';

/**
 * Cells of wall-modelled large-eddy simulation of a layer that grows on a plate.
 *
 * @param of  Re_L on the length, Re_x0 where the turbulent layer starts, width over length [1], cells per cube of the layer thickness [1]
 * @returns   number of cells [1]
 * @source    Choi and Moin, Phys. Fluids 24 (2012) 011702, delta = 0.16 x Re_x^(-1/7)
 */
export function wallModelledCells(of: { readonly reynolds: number; readonly from: number; readonly aspect: number; readonly perCube: number }): number {
  return 54.7 * of.perCube * of.aspect * of.reynolds ** (2 / 7) * ((of.reynolds / of.from) ** (5 / 7) - 1);
}

/**
 * Cells at the wall of wall-resolved large-eddy simulation of a layer that grows on a plate, cells of one size in viscous lengths.
 *
 * @param of  Re_L, Re_x0, width over length, cells across [1], cell along and along the span in viscous lengths [1]
 * @returns   number of cells [1]
 * @source    Choi and Moin, Phys. Fluids 24 (2012) 011702, c_f = 0.027 Re_x^(-1/7); without the nested grids that add a third
 */
export function wallResolvedCells(of: { readonly reynolds: number; readonly from: number; readonly aspect: number; readonly across: number; readonly along: number; readonly span: number }): number {
  return ((0.0135 * (7 / 6) * of.across * of.aspect) / (of.along * of.span)) * of.reynolds ** (13 / 7) * (1 - (of.from / of.reynolds) ** (6 / 7));
}

/** What resolving the eddies would take on the same wall, to hold against the mesh of the plan. */
export const eddyCounts: Definition[] = [
  quantity('wallAreaViscous', { symbol: 'A_w+', name: 'wall area in viscous lengths', unit: '1' }, [
    way({ needs: ['wallArea', 'frictionVelocityPlain', 'kinematicViscosity'], when: { regime: ['transitional', 'turbulent'] }, value: (of) => of.wallArea * (of.frictionVelocityPlain / of.kinematicViscosity) ** 2, formula: 'A_w+ = A_w (u_tau/nu)^2', source: 'definition' }),
  ]),
  quantity('cellCountLes', { symbol: 'N_LES', name: 'cells of wall-resolved large-eddy simulation', unit: '1' }, [
    way({ needs: ['wallAreaViscous'], scatter: 1, value: ({ wallAreaViscous }) => (4 / 3) * 25 * (wallAreaViscous / (70 * 20)), formula: 'N_LES = (4/3) 25 A_w+/(70 x 20)', source: `${choiMoin}; 20 to 30 cells to y+ = 100` }),
  ]),
  quantity('cellCountDns', { symbol: 'N_DNS', name: 'cells that resolve every eddy', unit: '1' }, [
    way({ needs: ['wallAreaViscous'], scatter: 1, value: ({ wallAreaViscous }) => 200 * (wallAreaViscous / (10 * 5)), formula: 'N_DNS = 200 A_w+/(10 x 5)', source: 'Moser, Kim and Mansour, Phys. Fluids 11 (1999) 943; 100 to 400 cells across' }),
  ]),
];
