import { quantity, way, type Definition } from '../workings/index.ts';

/** The order the schemes have on paper, and the changes between meshes that the accuracy asked allows. */
export const order: Definition[] = [
  quantity('schemeOrder', { symbol: 'p_th', name: 'order of the schemes on paper, the lowest of convection and diffusion', unit: '1' }, [
    way({ needs: [], when: { 'choice.convection-scheme': ['upwind-1', 'blended', 'shock-capturing'] }, as: 'decided', value: () => 1, formula: 'p_th = 1', source: 'a first-order part counts as first order' }),
    way({ needs: [], as: 'decided', value: () => 2, formula: 'p_th = 2', source: 'central diffusion of second order bounds the whole' }),
  ]),
  quantity('meshChangeAllowed', { symbol: 'e_21', name: 'change between the two finest of three meshes that the accuracy asked allows', unit: '1' }, [
    way({ needs: ['meshTolerance', 'refinementRatio', 'plannedOrder'], value: (of) => (of.meshTolerance * (of.refinementRatio ** of.plannedOrder - 1)) / 1.25, formula: 'e_21 = w_h (r^p - 1)/1.25', source: 'Celik et al., J. Fluids Eng. 130 (2008) 078001' }),
  ]),
  quantity('meshChangeAllowedTwo', { symbol: 'e_21', name: 'change between two meshes alone that the accuracy asked allows', unit: '1' }, [
    way({ needs: ['meshTolerance', 'refinementRatio', 'plannedOrder'], value: (of) => (of.meshTolerance * (of.refinementRatio ** of.plannedOrder - 1)) / 3, formula: 'e_21 = w_h (r^p - 1)/3', source: 'Roache, J. Fluids Eng. 116 (1994) 405: factor 3 with two meshes' }),
  ]),
];
