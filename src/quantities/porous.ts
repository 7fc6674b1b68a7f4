import { quantity, way, type Definition } from '../workings/index.ts';

const none = way({ needs: [], value: () => 1, formula: 'F = 1', source: 'the effect does not act here' });

/** A porous region taken as a continuum: inertia of the drag, wall layer, exchange between fluid and solid. A flow gives the numbers. */
export const porous: Definition[] = [
  quantity('permeability', { symbol: 'K', name: 'permeability', unit: 'm^2' }),
  quantity('forchheimer', { symbol: 'C_F', name: 'inertia coefficient of the drag on sqrt(K)', unit: '1' }),
  quantity('porousInertia', { symbol: 'C_F Re_K', name: 'inertial over viscous drag', unit: '1' }, [
    way({ needs: ['forchheimer', 'permeability', 'speedBulk', 'kinematicViscosityBulk'], value: ({ forchheimer, permeability, speedBulk, kinematicViscosityBulk }) => (forchheimer * speedBulk * Math.sqrt(permeability)) / kinematicViscosityBulk, formula: 'C_F U sqrt(K)/nu', source: 'Ergun 1952, in the form of Forchheimer' }),
  ]),
  quantity('brinkmanLayer', { symbol: 'sqrt(K)/H', name: 'wall layer of the porous region over its width', unit: '1' }, [
    way({ needs: ['permeability', 'gap'], value: ({ permeability, gap }) => Math.sqrt(permeability) / gap, formula: 'sqrt(K)/H', source: 'Brinkman 1949' }),
  ]),
  quantity('inertiaFactorDrag', { symbol: 'F_in', name: 'drag with inertia over viscous drag', unit: '1' }, [
    way({ needs: ['porousInertia'], value: ({ porousInertia }) => 1 + porousInertia, formula: 'F = 1 + C_F Re_K', source: 'Ergun 1952, in the form of Forchheimer' }),
    none,
  ]),
  quantity('exchangeUnits', { symbol: 'NTU', name: 'transfer units between solid and fluid', unit: '1' }),
];
