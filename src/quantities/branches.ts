import { quantity, way, ways, wordWay, type Definition } from '../workings/index.ts';

const definition = 'definition';
const inRegime = (regime: string, need: string, formula: string) => ({ needs: [need], when: { regime }, value: (of: Readonly<Record<string, number>>) => of[need] as number, formula, source: definition });

/** Friction and heat transfer per regime, each with a second published law where there is one, and what a passage adds at its entrance. A flow gives the laws. */
export const branches: Definition[] = [
  quantity('frictionLaminar', { symbol: 'f_lam', name: 'Darcy friction factor of laminar flow', unit: '1' }),
  quantity('frictionTurbulent', { symbol: 'f_turb', name: 'Darcy friction factor of turbulent flow, smooth', unit: '1' }),
  quantity('frictionBetween', { symbol: 'f_tr', name: 'Darcy friction factor between the regimes, smooth', unit: '1' }),
  quantity('frictionSecond', { symbol: 'f_2', name: 'Darcy friction factor by a second law', unit: '1' }),
  quantity('nusseltLaminar', { symbol: 'Nu_lam', name: 'Nusselt number of developed laminar flow', unit: '1' }),
  quantity('nusseltTurbulent', { symbol: 'Nu_turb', name: 'Nusselt number of developed turbulent flow', unit: '1' }),
  quantity('nusseltBetween', { symbol: 'Nu_tr', name: 'Nusselt number between the regimes', unit: '1' }),
  quantity('nusseltSecond', { symbol: 'Nu_2', name: 'Nusselt number by a second law', unit: '1' }),
  ways('frictionPlain', [inRegime('laminar', 'frictionLaminar', 'f_0 = f_lam'), inRegime('transitional', 'frictionBetween', 'f_0 = f_tr'), inRegime('turbulent', 'frictionTurbulent', 'f_0 = f_turb')]),
  ways('nusseltPlain', [inRegime('laminar', 'nusseltLaminar', 'Nu_0 = Nu_lam'), inRegime('transitional', 'nusseltBetween', 'Nu_0 = Nu_tr'), inRegime('turbulent', 'nusseltTurbulent', 'Nu_0 = Nu_turb')]),
  quantity('frictionDisagreement', { symbol: 'f_2/f_0', name: 'second law of friction over the first', unit: '1' }, [
    way({ needs: ['frictionSecond', 'frictionPlain'], value: ({ frictionSecond, frictionPlain }) => frictionSecond / frictionPlain, formula: 'f_2/f_0', source: definition }),
  ]),
  quantity('nusseltDisagreement', { symbol: 'Nu_2/Nu_0', name: 'second law of heat transfer over the first', unit: '1' }, [
    way({ needs: ['nusseltSecond', 'nusseltPlain'], value: ({ nusseltSecond, nusseltPlain }) => nusseltSecond / nusseltPlain, formula: 'Nu_2/Nu_0', source: definition }),
  ]),
  quantity('entryLoss', { symbol: 'K_inf', name: 'what the developing profile adds to the pressure drop, on the dynamic pressure', unit: '1' }),
  quantity('peakOverMean', { symbol: 'u_max/U', name: 'largest speed over the speed scale', unit: '1' }, [
    way({ needs: [], as: 'assumed', value: () => 1.5, formula: 'u_max/U = 1.5', source: 'common practice' }),
  ]),
  quantity('passageScale', { symbol: '', name: 'size class of the passage', unit: 'word', words: ['ordinary', 'small', 'tiny'] }, [
    wordWay({ needs: ['hydraulicDiameter'], word: ({ hydraulicDiameter }) => (hydraulicDiameter > 1e-3 ? 'ordinary' : hydraulicDiameter >= 1e-5 ? 'small' : 'tiny'), formula: 'small from 10 um to 1 mm', source: 'common practice', dimensional: 'the classes are lengths' }),
  ]),
  ...coreMesh(),
];

/** How finely the core of a flow is cut: a length of the flow over a number of cells, for three meshes. */
function coreMesh(): Definition[] {
  const count = (id: string, which: string, n: number): Definition =>
    quantity(id, { symbol: 'n_c', name: `cells over the core length, ${which} mesh`, unit: '1' }, [way({ needs: [], value: () => n, formula: `n_c = ${n}`, source: 'common practice' })]);
  return [
    quantity('coreLength', { symbol: 'L_c', name: 'length that the core of the mesh divides', unit: 'm' }, [way({ needs: ['length'], value: ({ length }) => length, formula: 'L_c = L', source: 'common practice' })]),
    count('coreCellsCoarse', 'coarse', 20),
    count('coreCellsMedium', 'target', 40),
    count('coreCellsFine', 'fine', 80),
    quantity('regionStretch', { symbol: 'a_x', name: 'cell along the flow over the cell across', unit: '1', per: ['region'] }, [way({ needs: [], value: () => 1, formula: 'a_x = 1', source: 'common practice' })]),
  ];
}
