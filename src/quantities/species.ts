import { quantity, way, type Definition } from '../workings/index.ts';

const per = { per: ['species' as const], plain: 'target' as const };

/** Species carried by the flow: diffusivity and the groups that follow. */
export const species: Definition[] = [
  quantity('diffusivity', { symbol: 'D_m', name: 'molecular diffusivity of a species', unit: 'm^2/s', ...per }),
  quantity('schmidt', { symbol: 'Sc', name: 'Schmidt number', unit: '1', ...per }, [
    way({ needs: ['kinematicViscosity', 'diffusivity'], value: ({ kinematicViscosity, diffusivity }) => kinematicViscosity / diffusivity, formula: 'Sc = nu/D_m', source: 'ISO 80000-11' }),
  ]),
  quantity('lewis', { symbol: 'Le', name: 'Lewis number', unit: '1', ...per }, [
    way({ needs: ['thermalDiffusivity', 'diffusivity'], value: ({ thermalDiffusivity, diffusivity }) => thermalDiffusivity / diffusivity, formula: 'Le = alpha/D_m', source: 'ISO 80000-11' }),
  ]),
  quantity('pecletMass', { symbol: 'Pe_m', name: 'Peclet number of mass transfer', unit: '1', ...per }, [
    way({ needs: ['speed', 'length', 'diffusivity'], value: ({ speed, length, diffusivity }) => (speed * length) / diffusivity, formula: 'Pe_m = U L/D_m', source: 'ISO 80000-11' }),
  ]),
];
