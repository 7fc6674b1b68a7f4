import { reference } from './define.ts';

export const manufacturedSolution = reference('manufactured-solution', {
  title: 'Smooth fields chosen by hand, with the sources that make them a solution',
  kind: 'exact',
  assumes: ['fields without jumps that exercise every term of the case', 'sources worked out by hand or by a computer algebra program', 'exact values on all boundaries'],
  verifies: ['order of every term', 'boundary conditions', 'source terms'],
  source: 'Roache, J. Fluids Eng. 124 (2002) 4-10',
  uncertainty: 0,
  order: 2,
  passLimit: 0.2,
  ifMissed: 'switch terms off one by one until the order is there; boundary values; sources at cell centres against averages',
  flows: ['general'],
  needs: [{ id: 'formalOrder', unit: '1', name: 'order of the scheme on paper', default: 2, range: [1, 6] }],
  values: [{ id: 'order', name: 'observed order between the two finest meshes', unit: '1', formula: 'p = ln(e_2/e_1)/ln r', value: (g) => g.formalOrder }],
});
