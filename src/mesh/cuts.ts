import { quantity, way, type Definition } from '../workings/index.ts';

const cutNames = ['two-dimensional', 'axisymmetric', 'mirror-left-right', 'mirror-top-bottom', 'periodic-along-flow', 'periodic-along-span'] as const;
const choice = 'choice.dimension-and-cuts';

/** All option words of the choice in which one of the cuts stands. */
function wordsWith(...cuts: readonly (typeof cutNames)[number][]): string[] {
  const out: string[] = [];
  for (let set = 1; set < 2 ** cutNames.length; set++) {
    const members = cutNames.filter((_, k) => (set & (1 << k)) !== 0);
    if (cuts.some((c) => members.includes(c))) out.push(members.join('+'));
  }
  return out;
}

/** The option words under which the mesh has two directions. */
export const plane = wordsWith('two-dimensional', 'axisymmetric');
const mirrors = wordsWith('mirror-left-right', 'mirror-top-bottom');
const both = mirrors.filter((w) => w.includes('mirror-left-right') && w.includes('mirror-top-bottom'));

/** What the chosen cuts make of the region that is meshed. */
export const cuts: Definition[] = [
  quantity('meshDimension', { symbol: 'd', name: 'directions in which the mesh has cells', unit: '1' }, [
    way({ needs: [], when: { [choice]: plane }, as: 'decided', value: () => 2, formula: 'd = 2', source: 'the chosen cuts' }),
    way({ needs: [], as: 'assumed', value: () => 3, formula: 'd = 3', source: 'no cut takes a direction away' }),
  ]),
  quantity('cutShare', { symbol: 's_c', name: 'share of the region that is meshed', unit: '1' }, [
    way({ needs: [], when: { [choice]: both }, value: () => 0.25, formula: 's_c = 1/4: two mirror planes', source: 'geometry' }),
    way({ needs: [], when: { [choice]: mirrors }, value: () => 0.5, formula: 's_c = 1/2: a mirror plane', source: 'geometry' }),
    way({ needs: [], when: { [choice]: wordsWith('axisymmetric') }, value: () => 0.5, formula: 's_c = 1/2: from the axis to the wall', source: 'geometry' }),
    way({ needs: [], value: () => 1, formula: 's_c = 1', source: 'geometry' }),
  ]),
];
