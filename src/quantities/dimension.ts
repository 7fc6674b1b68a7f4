import { quantity, way, wordWay, type Definition } from '../workings/index.ts';

/** Extent in the third direction, blockage by what stands around. */
export const dimension: Definition[] = [
  quantity('spanRatio', { symbol: 'L_z/H', name: 'third direction over the gap', unit: '1' }, [
    way({ needs: ['span', 'boundaryLayerThickness'], when: { flowClass: 'body', attached: 'yes' }, value: ({ span, boundaryLayerThickness }) => span / boundaryLayerThickness, formula: 'L_z/delta', source: 'definition, on the layer of an attached flow' }),
    way({ needs: ['span', 'gap'], value: ({ span, gap }) => span / gap, formula: 'L_z/H', source: 'definition' }),
    way({ needs: ['span', 'length'], value: ({ span, length }) => span / length, formula: 'L_z/L', source: 'definition' }),
  ]),
  quantity('sideWallFactorFriction', { symbol: 'F_z', name: 'friction with side walls over that between endless plates', unit: '1' }, [
    way({ needs: ['spanRatio', 'frictionPlain', 'reynoldsBulk'], when: { flowClass: 'internal', ductSection: 'rectangular', regime: 'laminar' }, value: ({ frictionPlain, reynoldsBulk }) => (frictionPlain * reynoldsBulk) / 96, formula: 'F = f Re/96', source: 'Shah and London, Laminar Flow Forced Convection in Ducts (1978)' }),
    way({ needs: [], value: () => 1, formula: 'F = 1', source: 'the effect does not act here' }),
  ]),
  quantity('blockageRatio', { symbol: 'A_b/A', name: 'frontal over cross-section area', unit: '1' }),
  quantity('confined', { symbol: '', name: 'walls stand around the body', unit: 'word', words: ['yes', 'no'] }, [
    wordWay({ needs: ['blockageRatio'], word: ({ blockageRatio }) => (blockageRatio > 0 ? 'yes' : 'no'), formula: 'A_b/A above zero', source: 'definition' }),
    wordWay({ needs: [], word: () => 'no', formula: 'nothing around the body is given', source: 'definition' }),
  ]),
  quantity('blockageFactorDrag', { symbol: 'F_b', name: 'drag in the free stream over drag between the walls', unit: '1' }, [
    way({ needs: ['blockageRatio', 'dragCoefficient'], range: { blockageRatio: [0, 0.3] }, scatter: 0.02, value: ({ blockageRatio, dragCoefficient }) => (1 + 0.25 * dragCoefficient * blockageRatio + 0.82 * blockageRatio ** 2) ** 2, formula: 'F = (U_c/U)^2, U_c/U = 1 + C_D (D/H)/4 + 0.82 (D/H)^2', source: 'Allen and Vincenti, NACA Report 782 (1944), plane flow' }),
    way({ needs: [], value: () => 1, formula: 'F = 1', source: 'the effect does not act here' }),
  ]),
];
