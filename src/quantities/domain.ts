import { quantity, way, type Definition } from '../workings/index.ts';

const practice = 'common practice';
const definition = 'definition';
const sides = [['Upstream', 'L_up', 'upstream'], ['Downstream', 'L_dn', 'downstream'], ['Sides', 'L_s', 'to each side'], ['Above', 'L_a', 'above']] as const;

/** The region that is computed: its ends in lengths, the larger one of the domain study, what stands in its way, what it may leave out. */
export const domain: Definition[] = [
  ...sides.flatMap(([end, symbol, where]): Definition[] => [
    quantity(`domain${end}Ratio`, { symbol: `${symbol}/L`, name: `domain ${where} in length scales`, unit: '1' }, [{ needs: [`domain${end}`, 'length'], value: (of) => (of[`domain${end}`] as number) / (of['length'] as number), formula: `${symbol}/L`, source: definition }]),
    quantity(`domain${end}Larger`, { symbol: `1.5 ${symbol}`, name: `domain ${where} in the run with the larger region`, unit: 'm' }, [{ needs: [`domain${end}`], value: (of) => 1.5 * (of[`domain${end}`] as number), formula: `1.5 ${symbol}`, source: practice }]),
  ]),
  quantity('regionLength', { symbol: 'L_all', name: 'length of the computed region along the flow', unit: 'm' }, [
    way({ needs: ['domainUpstream', 'flowLength', 'domainDownstream'], when: { flowClass: ['internal', 'continuum'] }, value: (of) => of.domainUpstream + of.flowLength + of.domainDownstream, formula: 'L_up + L_x + L_dn', source: definition }),
    way({ needs: ['domainUpstream', 'flowLength', 'domainDownstream'], when: { flowClass: ['body', 'jet'] }, value: (of) => of.domainUpstream + of.flowLength + of.domainDownstream, formula: 'L_up + L_x + L_dn', source: definition }),
    way({ needs: ['flowLength'], value: ({ flowLength }) => flowLength, formula: 'L_x', source: definition }),
  ]),
  quantity('regionVolumeCheck', { symbol: 'V', name: 'volume of the computed region, for the check of scale', unit: 'm^3' }, [
    way({ needs: ['flowArea', 'regionLength'], when: { flowClass: ['internal', 'continuum'] }, value: ({ flowArea, regionLength }) => flowArea * regionLength, formula: 'A L_all', source: 'geometry' }),
  ]),
  quantity('domainBlockage', { symbol: 'L/(L + 2 L_s)', name: 'share of the height of the region that the body takes', unit: '1' }, [
    way({ needs: ['length', 'domainSides'], when: { flowClass: 'body' }, value: ({ length, domainSides }) => length / (length + 2 * domainSides), formula: 'L/(L + 2 L_s)', source: definition }),
  ]),
  ...([['', 'domainSides'], ['Larger', 'domainSidesLarger']] as const).map(([which, needs]) =>
    quantity(`domainErrorDrag${which}`, { symbol: 'F_b - 1', name: `what sides at ${which === '' ? 'the planned' : '1.5 times the planned'} distance add to the drag`, unit: '1' }, [
      { needs: ['length', needs, 'dragCoefficient'], when: { flowClass: 'body', imposedFlow: 'yes', separated: 'yes' }, range: { dragCoefficient: [0, 2] }, scatter: 0.5, value: (of) => { const b = (of['length'] as number) / ((of['length'] as number) + 2 * (of[needs] as number)); return (1 + 0.25 * (of['dragCoefficient'] as number) * b + 0.82 * b * b) ** 2 - 1; }, formula: '(1 + C_D b/4 + 0.82 b^2)^2 - 1, b = L/(L + 2 L_s)', source: 'Allen and Vincenti, NACA Report 782 (1944)' },
    ])),
  quantity('calmLength', { symbol: '50 D_h', name: 'straight run after which a bend ahead is no longer felt', unit: 'm' }, [
    way({ needs: ['hydraulicDiameter'], when: { flowClass: 'internal' }, value: ({ hydraulicDiameter }) => 50 * hydraulicDiameter, formula: '50 D_h', source: `${practice}: swirl behind a bend` }),
  ]),
  quantity('featureLimit', { symbol: 'h_f', name: 'size below which a feature of a wall may be left out', unit: 'm' }, [
    way({ needs: ['kinematicViscosity', 'frictionVelocity'], when: { regime: ['transitional', 'turbulent'] }, value: (of) => (2.25 * of.kinematicViscosity) / of.frictionVelocity, formula: 'h_f = 2.25 nu/u_tau', source: 'Ligrani and Moffat, J. Fluid Mech. 162 (1986) 69: hydraulically smooth below' }),
    way({ needs: ['boundaryLayerThickness'], value: ({ boundaryLayerThickness }) => boundaryLayerThickness / 20, formula: 'h_f = delta/20', source: `${practice}: a wall cell of a laminar layer` }),
  ]),
  quantity('geometryTolerance', { symbol: 'e_g', name: 'error that the smallest width may have', unit: 'm' }, [
    way({ needs: ['gap', 'targetTolerance'], when: { flowClass: 'internal' }, value: ({ gap, targetTolerance }) => (gap * targetTolerance) / 15, formula: 'e_g = H W/(3 x 5)', source: `${practice}: pressure drop goes with the fifth power of the width at most, a third of the accuracy` }),
    way({ needs: ['length', 'targetTolerance'], value: ({ length, targetTolerance }) => (length * targetTolerance) / 3, formula: 'e_g = L W/3', source: `${practice}: forces and heat go with the size, a third of the accuracy` }),
  ]),
];
